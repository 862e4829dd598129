// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/identify/fit_laws.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <random>

#include "tests/support/scipy.h"

namespace dampwright {
namespace {

const std::vector<double> speeds = {0.005, 0.02, 0.05, 0.1, 0.15, 0.25, 0.4, 0.6, 1.0};

double twoSlope(double low, double high, double knee, double v) {
  return low * std::min(v, knee) + high * std::max(v - knee, 0.0);
}

/// low 3000, high 900 N·s/m, normal scatter of `u` N, mt19937.
std::vector<ScatteredPoint> made(double knee, double u, unsigned seed) {
  std::mt19937 random(seed);
  std::normal_distribution<double> scatter(0, 1);
  std::vector<ScatteredPoint> points;
  for (const double v : speeds) {
    points.push_back({{v, twoSlope(3000, 900, knee, v) + u * scatter(random)}, u});
  }
  return points;
}

const FittedLaw& lawOf(const std::vector<FittedLaw>& laws, const std::string& name) {
  return *std::find_if(laws.begin(), laws.end(), [&](const auto& law) { return law.law == name; });
}

TEST(FitLaws, ExactPointsGiveTheTruth) {
  for (const double knee : {0.06, 0.11, 0.3, 0.1, 0.25}) {  // the last two stand on a tested speed
    const auto laws = fitLaws(made(knee, 0, 1));
    const FittedLaw& law = lawOf(laws, "two-slope");
    EXPECT_EQ(law.status, "converged");
    EXPECT_TRUE(law.chosen);
    EXPECT_EQ(law.why, "law-lowest-aicc");
    EXPECT_NEAR(law.parameters[0].value, 3000, 1e-6);
    EXPECT_NEAR(law.parameters[1].value, 900, 1e-6);
    EXPECT_NEAR(law.parameters[2].value, knee, 1e-9);
    EXPECT_EQ(law.parameters[2].name, "knee_mm_s");
    EXPECT_EQ(law.parameters[2].quantity, Quantity::Velocity);
  }
}

TEST(FitLaws, KneeAndSlopesWithinHalfAPercentAtTenthsOfANewton) {
  for (unsigned seed = 1; seed <= 20; ++seed) {
    for (const double knee : {0.11, 0.15}) {
      const FittedLaw law = lawOf(fitLaws(made(knee, 0.2, seed)), "two-slope");
      EXPECT_EQ(law.status, "converged") << seed << " " << knee;
      EXPECT_NEAR(law.parameters[0].value, 3000, 15);
      EXPECT_NEAR(law.parameters[1].value, 900, 4.5);
      EXPECT_NEAR(law.parameters[2].value, knee, 0.005 * knee);
    }
  }
}

TEST(FitLaws, StandardErrorsCoverTheTruth) {
  int inside = 0;
  const int runs = 300;
  for (unsigned seed = 1; seed <= runs; ++seed) {
    const FittedLaw law = lawOf(fitLaws(made(0.12, 3, seed)), "two-slope");
    inside += std::abs(law.parameters[2].value - 0.12) < 2 * law.parameters[2].u ? 1 : 0;
  }
  // 2 errors with known scatter: 95 %; three standard deviations of 300 runs below that is 91.7 %
  EXPECT_GE(inside, 275);
}

TEST(FitLaws, AgreeWithSciPyInTheLeastSumOfSquares) {
  const auto points = made(0.13, 5, 11);
  std::vector<double> v, f;
  for (const ScatteredPoint& point : points) {
    v.push_back(point.point.velocity);
    f.push_back(point.point.force);
  }
  const auto scipy = test::pythonNumbers(
      "import numpy as np\nfrom scipy.optimize import least_squares\nv = np.array(" +
      test::pythonList(v) + ")\nf = np.array(" + test::pythonList(f) +
      ")\nr = lambda p: p[0]*np.minimum(v, p[2]) + p[1]*np.maximum(v - p[2], 0) - f\n"
      "best = min((least_squares(r, [3000, 900, k], xtol=1e-15, ftol=1e-15, gtol=1e-15)\n"
      "            for k in np.linspace(0.01, 0.5, 60)), key=lambda s: s.cost)\n"
      "print(np.sqrt(2 * best.cost / len(v)), *best.x)\n");
  ASSERT_EQ(scipy.size(), 4u);
  const FittedLaw law = lawOf(fitLaws(points), "two-slope");
  EXPECT_NEAR(law.rms, scipy[0], 1e-6 * scipy[0]);
  // SciPy's differences of the kinked law end with about 1e-5
  for (std::size_t j = 0; j < 3; ++j) {
    EXPECT_NEAR(law.parameters[j].value, scipy[1 + j], 1e-4 * scipy[1 + j]);
  }
}

/// A law with a truth, and the same in NumPy with a range of its last free start.
struct KnownLaw {
  std::string name;
  std::vector<double> truth;
  std::string python;  ///< F of p and v
  std::string starts;  ///< list of lists
};

const std::vector<KnownLaw> knownLaws = {
    {"power", {1400, 0.72}, "p[0]*v**p[1]", "[[1000, k] for k in (0.5, 1, 1.5)]"},
    {"smooth",
     {3000, 700, 0.12},
     "p[1]*v + (p[0]-p[1])*p[2]*(1-np.exp(-v/p[2]))",
     "[[2500, 800, k] for k in np.geomspace(0.02, 0.6, 12)]"},
    {"bleed and blow-off",
     {0.0065, 420, 900},
     "np.where(v < p[0]*np.sqrt(p[1]), (v/p[0])**2,\n"
     " (2*(v+p[1]/p[2])/(p[0]+np.sqrt(p[0]**2+4*(v+p[1]/p[2])/p[2])))**2)",
     "[[k/20, 400, 800] for k in np.linspace(0.06, 0.3, 40)]"}};

std::vector<ScatteredPoint> pointsOf(const KnownLaw& known, double u, unsigned seed) {
  std::mt19937 random(seed);
  std::normal_distribution<double> scatter(0, 1);
  std::vector<ScatteredPoint> points;
  for (const double v : speeds)
    points.push_back({{v, findLaw(known.name)->force(known.truth, v) + u * scatter(random)}, u});
  return points;
}

TEST(FitLaws, EveryLawFindsItsOwnTruth) {
  for (const KnownLaw& known : knownLaws) {
    const auto laws = fitLaws(pointsOf(known, 0, 1));
    const FittedLaw& law = lawOf(laws, known.name);
    EXPECT_EQ(law.status, "converged") << known.name;
    EXPECT_TRUE(law.chosen) << known.name;
    ASSERT_EQ(law.parameters.size(), known.truth.size());
    for (std::size_t j = 0; j < known.truth.size(); ++j)
      EXPECT_NEAR(law.parameters[j].value, known.truth[j], 1e-6 * known.truth[j]) << known.name;
  }
}

TEST(FitLaws, EveryLawAgreesWithSciPyWithItsErrors) {
  for (const KnownLaw& known : knownLaws) {
    const auto points = pointsOf(known, 4, 21);
    std::vector<double> v, f;
    for (const ScatteredPoint& point : points) {
      v.push_back(point.point.velocity);
      f.push_back(point.point.force);
    }
    const auto scipy = test::pythonNumbers(
        "import numpy as np\nfrom scipy.optimize import least_squares\nv = np.array(" +
        test::pythonList(v) + ")\nf = np.array(" + test::pythonList(f) + ")\nr = lambda p: (" +
        known.python +
        ") - f\nbest = min((least_squares(r, s, jac='3-point', "
        "x_scale='jac', xtol=1e-15, ftol=1e-15, gtol=1e-15)\n for s in " +
        known.starts +
        "), key=lambda s: s.cost)\nC = np.linalg.inv(best.jac.T @ best.jac)\n"
        "print(np.sqrt(2*best.cost/len(v)), *best.x, *np.sqrt(np.diag(C)))\n");
    const std::size_t count = known.truth.size();
    ASSERT_EQ(scipy.size(), 1 + 2 * count) << known.name;
    const FittedLaw law = lawOf(fitLaws(points), known.name);
    EXPECT_EQ(law.status, "converged") << known.name;
    EXPECT_NEAR(law.rms, scipy[0], 1e-6 * scipy[0]) << known.name;
    const double dof = static_cast<double>(v.size() - count);
    const double s = std::max(4.0, law.rms * std::sqrt(static_cast<double>(v.size()) / dof));
    for (std::size_t j = 0; j < count; ++j) {
      // SciPy's three-point differences leave about 1e-6 of a standard error
      EXPECT_NEAR(law.parameters[j].value, scipy[1 + j], 1e-3 * law.parameters[j].u) << known.name;
      EXPECT_NEAR(law.parameters[j].u, s * scipy[1 + count + j], 1e-4 * law.parameters[j].u)
          << known.name;
    }
  }
}

TEST(FitLaws, AValveThatOpensOnATestedSpeedConverges) {
  const KnownLaw onSpeed{"bleed and blow-off", {0.15 / std::sqrt(420.0), 420, 900}, "", ""};
  for (unsigned seed = 1; seed <= 20; ++seed) {
    const FittedLaw law = lawOf(fitLaws(pointsOf(onSpeed, 0.5, seed)), onSpeed.name);
    EXPECT_EQ(law.status, "converged") << seed;
    EXPECT_NEAR(law.parameters[1].value, 420, 5) << seed;
  }
}

TEST(FitLaws, LinearPointsAreCalledLinear) {
  int linear = 0;
  for (unsigned seed = 1; seed <= 50; ++seed) {
    std::mt19937 random(seed);
    std::normal_distribution<double> scatter(0, 2);
    std::vector<ScatteredPoint> points;
    for (const double v : speeds) points.push_back({{v, 1500 * v + scatter(random)}, 2});
    const auto laws = fitLaws(points);
    linear += chosenLaw(laws)->law == "linear" ? 1 : 0;
  }
  EXPECT_GE(linear, 45);  // AICc with nine points pays 10 for two parameters
}

TEST(FitLaws, FewPointsTakeTheSimplestWithinTheirErrors) {
  const std::vector<ScatteredPoint> straight = {{{0.1, 151}, 1}, {{0.2, 299}, 1}, {{0.4, 600}, 1}};
  const auto laws = fitLaws(straight);
  EXPECT_EQ(chosenLaw(laws)->law, "linear");
  EXPECT_EQ(chosenLaw(laws)->why, "law-simplest-within-errors");

  const std::vector<ScatteredPoint> bent = {{{0.1, 250}, 1}, {{0.2, 340}, 1}, {{0.4, 500}, 1}};
  const auto bentLaws = fitLaws(bent);
  EXPECT_EQ(chosenLaw(bentLaws)->law, "two-slope");  // three points, three parameters
  EXPECT_TRUE(std::isinf(lawOf(bentLaws, "two-slope").aicc));
}

TEST(FitLaws, SixPointsOfABentCurveAreNotCalledLinear) {
  // AICc would pay 40 for a law of three parameters here, more than the points can say.
  const std::vector<ScatteredPoint> bent = {{{0.005, 2}, 0.1},
                                            {{0.05, 20}, 0.1},
                                            {{0.1, 50}, 0.1},
                                            {{0.2, 143}, 0.1},
                                            {{0.3, 260}, 0.1},
                                            {{0.6, 700}, 0.1}};
  const auto laws = fitLaws(bent);
  EXPECT_EQ(findLaw(chosenLaw(laws)->law)->parameters.size(), 3u);
  EXPECT_EQ(chosenLaw(laws)->why, "law-closest");
}

TEST(FitLaws, NothingWithinErrorsTakesTheClosest) {
  const std::vector<ScatteredPoint> humped = {
      {{0.1, 100}, 1}, {{0.2, 300}, 1}, {{0.3, 200}, 1}, {{0.4, 500}, 1}};
  EXPECT_EQ(chosenLaw(fitLaws(humped))->why, "law-closest");
}

TEST(FitLaws, OnePointIsEnoughForTheLinearLawOnly) {
  const auto laws = fitLaws(std::vector<ScatteredPoint>{{{0.3, 450}, 1}});
  EXPECT_EQ(lawOf(laws, "linear").parameters[0].value, 1500);
  EXPECT_NEAR(lawOf(laws, "linear").parameters[0].u, 1 / 0.3, 1e-9);  // the point's own error
  EXPECT_EQ(lawOf(laws, "two-slope").status, "too-few-points");
  EXPECT_TRUE(fitLaws({}).front().parameters.empty());
}

TEST(FitLaws, ScalingTheForceScalesTheLaw) {
  auto points = made(0.12, 2, 3);
  const FittedLaw one = lawOf(fitLaws(points), "two-slope");
  for (ScatteredPoint& point : points) {
    point.point.force *= 10;
    point.u *= 10;
  }
  const FittedLaw ten = lawOf(fitLaws(points), "two-slope");
  EXPECT_NEAR(
      ten.parameters[0].value, 10 * one.parameters[0].value, 1e-6 * ten.parameters[0].value);
  EXPECT_NEAR(ten.parameters[2].value, one.parameters[2].value, 1e-9);
}

Curve curveOf(const std::vector<double>& strokes) {
  Curve curve;
  for (std::size_t i = 0; i < strokes.size(); ++i) {
    CurvePoint point;
    point.stroke = strokes[i];
    point.reading.peakVelocity = 0.1 * static_cast<double>(i + 1);
    point.reading.dampingForce = 30 + 1000 * point.reading.peakVelocity;
    point.reading.forceU = 0.1;
    curve.points.push_back(point);
  }
  return curve;
}

TEST(IdentifyLaws, DryFrictionIsTakenOffFirst) {
  Gas gas;
  gas.force = 100;
  Friction friction;
  friction.dry = 30;
  const auto laws = identifyLaws(curveOf({0.05, 0.05, 0.05, 0.05}), gas, friction);
  EXPECT_NEAR(lawOf(laws, "linear").parameters[0].value, 1000, 1e-6);
  EXPECT_NEAR(chosenLaw(laws)->at(0.25), 250, 1e-6);
}

TEST(IdentifyLaws, WithoutGasOrFrictionNothingIsFittedAndTheStatusSaysSo) {
  Gas gas;
  Friction friction;
  EXPECT_EQ(identifyLaws(curveOf({0.05, 0.05}), gas, friction)[0].status, "gas-not-determined");
  gas.force = 100;
  const auto laws = identifyLaws(curveOf({0.05, 0.05}), gas, friction);
  EXPECT_EQ(laws.size(), allLaws().size());
  for (const FittedLaw& law : laws) {
    EXPECT_EQ(law.status, "friction-not-determined");
    EXPECT_TRUE(law.parameters.empty());
    EXPECT_EQ(law.at(0.3), 0);
  }
  EXPECT_EQ(chosenLaw(laws), nullptr);
}

TEST(IdentifyLaws, OnlyTheStrokeWithMostPointsCounts) {
  Gas gas;
  gas.force = 100;
  Friction friction;
  friction.dry = 30;
  Curve curve = curveOf({0.05, 0.05, 0.025, 0.0502, 0.05});
  curve.points[2].reading.dampingForce = 5000;
  const auto laws = identifyLaws(curve, gas, friction);
  EXPECT_NEAR(lawOf(laws, "linear").parameters[0].value, 1000, 1e-6);
}

}  // namespace
}  // namespace dampwright
