// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/resample.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>
#include <vector>

#include "core/base/units.h"

namespace dampwright {
namespace {

TEST(Resample, ACubicComesOutExactFromUnevenTimes) {
  std::mt19937_64 random(17);
  std::uniform_real_distribution<double> step(0.5, 1.5);
  const auto cubic = [](double t) { return 1 + t * (2 - t * (0.3 - 0.01 * t)); };
  std::vector<double> times, values;
  for (double t = 0; t < 30; t += step(random)) {
    times.push_back(t);
    values.push_back(cubic(t));
  }
  const auto out = resample(times, values, {0, 3, 80});
  for (std::size_t i = 0; i < out.size(); ++i)
    EXPECT_NEAR(out[i], cubic(static_cast<double>(i) / 3), 1e-9);
}

TEST(Resample, AJitteringSineIsMetToItsPromise) {
  std::mt19937_64 random(19);
  std::uniform_real_distribution<double> jitter(-0.1, 0.1);
  std::vector<double> times, values;
  for (int i = 0; i < 400; ++i) {
    times.push_back(i + jitter(random));
    values.push_back(std::sin(2 * pi * times.back() / 100));
  }
  const auto out = resample(times, values, {10, 1, 380});
  for (std::size_t i = 0; i < out.size(); ++i)  // (2π/100)⁴·3/128 = 3.7e-7, jitter adds a quarter
    EXPECT_NEAR(out[i], std::sin(2 * pi * (static_cast<double>(i) + 10) / 100), 6e-7);
}

TEST(Shifted, AFractionOfASampleIsMetToItsPromise) {
  for (const auto& [samples, error] : {std::pair{20.0, 2e-7}, std::pair{40.0, 1e-9}}) {
    std::vector<double> sine(400);
    for (std::size_t i = 0; i < sine.size(); ++i)
      sine[i] = std::sin(2 * pi * static_cast<double>(i) / samples);
    for (const double shift : {0.5, 2.3, -1.7}) {
      const auto out = shifted(sine, shift);
      for (std::size_t i = 50; i < 350; ++i)
        EXPECT_NEAR(out[i], std::sin(2 * pi * (static_cast<double>(i) + shift) / samples), error);
    }
  }
}

TEST(Shifted, WholeSamplesMoveWithoutErrorAndTheEndsStandStill) {
  const std::vector<double> signal = {1, 5, 2, 8, 3, 9, 4, 7, 6, 0};
  const auto out = shifted(signal, 2);
  for (std::size_t i = 0; i + 2 < signal.size(); ++i) EXPECT_EQ(out[i], signal[i + 2]);
  EXPECT_EQ(out.back(), signal.back());
}

}  // namespace
}  // namespace dampwright
