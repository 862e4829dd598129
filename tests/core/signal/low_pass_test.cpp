// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/low_pass.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <random>
#include <string>
#include <vector>

#include "core/base/units.h"
#include "tests/support/scipy.h"

namespace dampwright {
namespace {

using test::pythonList;
using test::pythonNumbers;

constexpr double tabulated = 1e-12;  // the tables have twelve decimal places

std::vector<double> noise(std::size_t count) {
  std::mt19937_64 random(7);
  std::normal_distribution<double> normal(0, 1);
  std::vector<double> out(count);
  for (double& value : out) value = 100 + normal(random);
  return out;
}

// Gain of both passes at a frequency, from a long sine and its middle part.
double twoPassGain(const Biquad& filter, double rate, double frequency) {
  std::vector<double> sine(40000);
  for (std::size_t i = 0; i < sine.size(); ++i)
    sine[i] = std::cos(2 * pi * frequency * static_cast<double>(i) / rate);
  const std::vector<double> out = zeroPhase(filter, sine, 1000);
  double both = 0, own = 0;
  for (std::size_t i = 10000; i < 30000; ++i) {  // whole periods of every frequency asked here
    both += out[i] * sine[i];
    own += sine[i] * sine[i];
  }
  return both / own;
}

struct Golden {
  double rate, number;
  CfcRule rule;
  double a0, b1, b2, corner;
};

// Formulas: SAE J211-1 appendix C and ISO 6487 annex A, worked out in double precision.
const Golden goldens[] = {
    {10000, 60, CfcRule::SaeJ211, 1.452367473553e-3, 1.889343224222, -0.895152694116, 100.0178},
    {10000, 60, CfcRule::Iso6487, 1.460316305528e-3, 1.889033079395, -0.894874344617, 100.2988},
    {10000, 180, CfcRule::SaeJ211, 1.179627109978e-2, 1.670117463268, -0.717302547667, 300.4909},
    {10000, 180, CfcRule::Iso6487, 1.185768264324e-2, 1.669203142931, -0.716633873504, 301.3374},
    {10000, 600, CfcRule::SaeJ211, 9.718462527937e-2, 0.945574009062, -0.334312510179, 1018.2407},
    {10000, 1000, CfcRule::SaeJ211, 2.192314172190e-1, 0.311896544996, -0.188822213872, 1751.0402},
    {2000, 60, CfcRule::SaeJ211, 2.980607203982e-2, 1.455728213907, -0.574952502066, 100.4553},
    {1000, 60, CfcRule::SaeJ211, 9.718462527937e-2, 0.945574009062, -0.334312510179, 101.8241},
};

TEST(LowPass, CoefficientsAreThoseOfTheTwoStandards) {
  for (const Golden& golden : goldens) {
    const Biquad filter = cfcBiquad({golden.number, golden.rule}, golden.rate);
    EXPECT_NEAR(filter.a0, golden.a0, tabulated * 10 * golden.a0);
    EXPECT_NEAR(filter.b1, golden.b1, tabulated);
    EXPECT_NEAR(filter.b2, golden.b2, tabulated);
    EXPECT_EQ(filter.a1, 2 * filter.a0);
    EXPECT_EQ(filter.a2, filter.a0);
  }
}

TEST(LowPass, CoefficientsAreSciPysButterworth) {
  for (const Golden& golden : goldens) {
    const std::string factor = golden.rule == CfcRule::SaeJ211 ? "2.0775" : "25/12";
    const auto expected = pythonNumbers("from scipy.signal import butter\nb, a = butter(2, " +
                                        std::to_string(golden.number) + "*" + factor + "/" +
                                        std::to_string(golden.rate / 2) + ")\nprint(*b, *a)");
    const Biquad filter = cfcBiquad({golden.number, golden.rule}, golden.rate);
    ASSERT_EQ(expected.size(), 6u);
    EXPECT_NEAR(filter.a0, expected[0], tabulated);
    EXPECT_NEAR(filter.b1, -expected[4], tabulated);
    EXPECT_NEAR(filter.b2, -expected[5], tabulated);
  }
}

TEST(LowPass, Iso600At10kHzIsTheHandCheck) {
  // tan(π/8) = √2 − 1, so b1 = 2√2/3 and b2 = −1/3
  const Biquad filter = cfcBiquad({600, CfcRule::Iso6487}, 10000);
  EXPECT_NEAR(filter.b1, 2 * std::sqrt(2.0) / 3, 1e-14);
  EXPECT_NEAR(filter.b2, -1.0 / 3, 1e-14);
}

TEST(LowPass, OnlyTheRatioOfClassToRateMatters) {
  const Biquad slow = cfcBiquad({60}, 1000), fast = cfcBiquad({600}, 10000);
  EXPECT_NEAR(slow.b1, fast.b1, 1e-14);
  EXPECT_NEAR(slow.a0, fast.a0, 1e-14);
}

TEST(LowPass, TheFactorMakesTwoPassesFallTo3DbAtFiveThirds) {
  EXPECT_NEAR(5.0 / 3 / std::pow(std::sqrt(2.0) - 1, 0.25), 2.0775, 1e-5);
  for (const Golden& golden : goldens) {
    const Biquad filter = cfcBiquad({golden.number, golden.rule}, golden.rate);
    // the corner is tabulated to 5e-5 Hz; the gain falls by about 1 % a percent of frequency
    EXPECT_NEAR(twoPassGain(filter, golden.rate, golden.corner), std::sqrt(0.5), 1e-3);
  }
}

TEST(LowPass, OnePassAnswersImpulseAndStepAsTabulated) {
  const Biquad filter = cfcBiquad({60}, 10000);
  const double impulse[] = {0.001452367474,
                            0.005648755592,
                            0.01082471492,
                            0.015395103002,
                            0.019396860819,
                            0.022866359631};
  const double step[] = {0.001452367474,
                         0.007101123066,
                         0.017925837986,
                         0.033320940989,
                         0.052717801808,
                         0.075584161439};
  const auto toImpulse = filterForward(filter, std::vector<double>{1, 0, 0, 0, 0, 0});
  const auto toStep = filterForward(filter, std::vector<double>(6, 1.0));
  for (std::size_t i = 0; i < 6; ++i) {
    EXPECT_NEAR(toImpulse[i], impulse[i], tabulated);
    EXPECT_NEAR(toStep[i], step[i], tabulated);
  }
}

TEST(LowPass, TwoPassGainsAreThePublishedOnesAndSciPys) {
  const Biquad filter = cfcBiquad({60}, 10000);
  const auto expected = pythonNumbers(
      "import numpy as np\nfrom scipy.signal import butter, freqz\n"
      "b, a = butter(2, 60*2.0775/5000)\n"
      "print(*np.abs(freqz(b, a, worN=[10, 60, 100, 120, 210], fs=10000)[1])**2)");
  const double frequencies[] = {10, 60, 100, 120, 210};
  ASSERT_EQ(expected.size(), 5u);
  for (std::size_t i = 0; i < 5; ++i)
    EXPECT_NEAR(twoPassGain(filter, 10000, frequencies[i]), expected[i], 1e-9);
  EXPECT_NEAR(expected[1], 0.949128, 1e-6);  // SAE J211-1, worked out beforehand
  EXPECT_NEAR(expected[4], 0.110057, 1e-6);
}

TEST(LowPass, AButterworthIsDownTo3DbAtItsCutoffAsSciPys) {
  for (const double rate : {600.0, 2000.0, 10000.0}) {
    const Butterworth filter{200};
    const auto expected = pythonNumbers(
        "import numpy as np\nfrom scipy.signal import butter, freqz\n"
        "w = np.arctan(np.tan(np.pi*200/" +
        std::to_string(rate) +
        ")/(2**0.5-1)**0.25)*2/np.pi\n"
        "b, a = butter(2, w)\nprint(*b, *a, abs(freqz(b, a, worN=[200], fs=" +
        std::to_string(rate) + ")[1][0])**2)");
    ASSERT_EQ(expected.size(), 7u);
    const Biquad biquad = butterworthBiquad(filter, rate);
    EXPECT_NEAR(biquad.a0, expected[0], tabulated);
    EXPECT_NEAR(biquad.b1, -expected[4], tabulated);
    EXPECT_NEAR(biquad.b2, -expected[5], tabulated);
    EXPECT_NEAR(expected[6], std::sqrt(0.5), 1e-6);
    EXPECT_NEAR(twoPassGain(biquad, rate, 200), std::sqrt(0.5), 1e-9);
    EXPECT_EQ(cutoffOf(filter), 200);
    const auto constant = lowPass(filter, rate, std::vector<double>(300, 1234.5));
    for (const double value : constant) EXPECT_NEAR(value, 1234.5, 1234.5 * 1e-12);
  }
}

TEST(LowPass, AConstantStaysConstant) {
  for (const double rate : {600.0, 2000.0, 10000.0}) {
    const auto out = lowPass(CfcClass{60}, rate, std::vector<double>(500, 1234.5));
    for (const double value : out) EXPECT_NEAR(value, 1234.5, 1234.5 * 1e-12);
  }
}

TEST(LowPass, BothPassesAreSciPysSosfiltfilt) {
  const std::vector<double> signal = noise(400);
  for (const std::size_t padding : {9u, 60u}) {
    const auto expected = pythonNumbers(
        "from scipy.signal import butter, sosfiltfilt\nx = " + pythonList(signal) +
        "\nprint(*sosfiltfilt(butter(2, 60*2.0775/1000, output='sos'), x, padtype='odd', padlen=" +
        std::to_string(padding) + "))");
    const auto out = zeroPhase(cfcBiquad({60}, 2000), signal, padding);
    ASSERT_EQ(expected.size(), out.size());
    for (std::size_t i = 0; i < out.size(); ++i)
      EXPECT_NEAR(out[i], expected[i], 1e-10);  // SciPy adds in another order
  }
}

TEST(LowPass, ReversedInTimeGivesReversedOut) {
  std::vector<double> signal = noise(3000);
  const auto forward = lowPass(CfcClass{60}, 2000, signal);
  std::reverse(signal.begin(), signal.end());
  auto backward = lowPass(CfcClass{60}, 2000, signal);
  std::reverse(backward.begin(), backward.end());
  // away from the ends, where the order of the passes still shows
  for (std::size_t i = 500; i < 2500; ++i) EXPECT_NEAR(forward[i], backward[i], 1e-9);
}

TEST(LowPass, OneSampleOrNoneComesBackAsItIs) {
  EXPECT_TRUE(lowPass(CfcClass{60}, 2000, std::vector<double>{}).empty());
  EXPECT_EQ(lowPass(CfcClass{60}, 2000, std::vector<double>{5}).front(), 5);
}

}  // namespace
}  // namespace dampwright
