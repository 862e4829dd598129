// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/fit/straight_line.h"

#include <gtest/gtest.h>

#include <cmath>
#include <vector>

namespace dampwright {
namespace {

// JCGM 100:2008 (GUM), table H.6: thermometer readings t_k in °C and corrections b_k in °C; the
// line is y1 + y2·(t − 20).
const std::vector<double> readings = {
    21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.010, 26.511};
const std::vector<double> corrections = {
    -0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.160};

StraightLine thermometer() {
  std::vector<double> above20;
  for (const double t : readings) above20.push_back(t - 20);
  return fitLine(above20, corrections);
}

TEST(FitLine, ThermometerOfGumH3) {
  const StraightLine line = thermometer();
  EXPECT_NEAR(line.intercept, -0.17120379, 5e-9);  // the guide prints -0.1712(29)
  EXPECT_NEAR(line.interceptU, 0.0028776, 5e-8);
  EXPECT_NEAR(line.slope, 0.00218270, 5e-9);  // 0.00218(67)
  EXPECT_NEAR(line.slopeU, 0.00066794, 5e-9);
  EXPECT_NEAR(line.correlation, -0.930430, 5e-7);
  EXPECT_NEAR(line.residualDeviation, 0.00349756, 5e-9);
  EXPECT_EQ(line.dof, 9);
}

TEST(FitLine, CorrectionAtThirtyDegreesOfGumH3) {
  const LineValue at30 = thermometer().at(10);
  EXPECT_NEAR(at30.value, -0.14937681, 5e-9);  // the guide prints -0.1494(41)
  EXPECT_NEAR(at30.u, 0.00413860, 5e-9);
  const LineValue observed = thermometer().observationAt(10);
  EXPECT_EQ(observed.value, at30.value);
  EXPECT_NEAR(observed.u, std::hypot(0.00413860, 0.00349756), 1e-8);
}

// M. G. Natrella, NBS Handbook 91 (1963), 5-4.1: Young's modulus of sapphire rods against
// temperature. The numbers below the data are those printed there, carried to more digits.
TEST(FitLine, SapphireRodsOfNatrella) {
  const std::vector<double> celsius = {
      30, 100, 200, 300, 400, 500, 600, 700, 800, 900, 1000, 1100, 1200, 1300, 1400, 1500};
  const std::vector<double> modulus = {4642,
                                       4612,
                                       4565,
                                       4513,
                                       4476,
                                       4433,
                                       4389,
                                       4347,
                                       4303,
                                       4251,
                                       4201,
                                       4140,
                                       4100,
                                       4073,
                                       4024,
                                       3999};
  const StraightLine line = fitLine(celsius, modulus);
  EXPECT_NEAR(line.slope, -0.44985482, 5e-9);
  EXPECT_NEAR(line.intercept, 4654.9846, 5e-5);
  EXPECT_NEAR(line.residualDeviation, 9.277617, 5e-6);
  EXPECT_NEAR(line.slopeU * line.slopeU, 2.5649045e-5, 5e-12);
  EXPECT_NEAR(line.interceptU * line.interceptU, 19.879452, 5e-6);
}

TEST(FitLine, NoScatterHasNoError) {
  const std::vector<double> x = {1, 2, 3, 4};
  const std::vector<double> y = {3, 5, 7, 9};
  const StraightLine line = fitLine(x, y);
  EXPECT_NEAR(line.slope, 2, 1e-14);
  EXPECT_NEAR(line.intercept, 1, 1e-14);
  EXPECT_NEAR(line.slopeU, 0, 1e-14);
}

TEST(FitLine, OneXOnlyHasNoSlope) {
  const std::vector<double> x = {2, 2, 2};
  const std::vector<double> y = {1, 2, 3};
  EXPECT_TRUE(std::isnan(fitLine(x, y).slope));
}

}  // namespace
}  // namespace dampwright
