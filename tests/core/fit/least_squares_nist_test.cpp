// SPDX-License-Identifier: GPL-3.0-or-later
// NIST/ITL Statistical Reference Datasets, nonlinear regression: certified parameters, standard
// deviations and residual sums of squares; origin in tests/reference/nist/README.txt.
#include <gtest/gtest.h>

#include <cstdio>

#include "core/fit/least_squares.h"
#include "tests/core/fit/nist_set.h"

namespace dampwright {
namespace {

using Eigen::VectorXd;

FitSummary fit(const test::NistSet& set, const VectorXd& start) {
  const test::NistModel model = test::nistModel(set.name);
  const auto residuals = [&](const VectorXd& b) {
    VectorXd r(set.x.size());
    for (Eigen::Index i = 0; i < r.size(); ++i) r[i] = model(set.x[i], b) - set.y[i];
    return r;
  };
  return fitLeastSquares({residuals, {}, {}, {}}, start);
}

void print(const char* from, const test::NistSet& set, const FitSummary& found) {
  std::printf("%-8s %s: %-14s %4d steps, digits: parameters %.1f, errors %.1f\n",
              set.name.c_str(),
              from,
              std::string(codeOf(found.status)).c_str(),
              found.iterations,
              test::rightDigits(found.parameters, set.certified),
              test::rightDigits(found.standardErrors, set.deviations));
}

class NistSets : public testing::TestWithParam<std::string> {};

TEST_P(NistSets, HoldWhatTheFileCertifies) {
  const test::NistSet set = test::readNistSet(GetParam());
  const test::NistModel model = test::nistModel(set.name);
  double rss = 0;
  for (Eigen::Index i = 0; i < set.x.size(); ++i) {
    const double r = model(set.x[i], set.certified) - set.y[i];
    rss += r * r;
  }
  EXPECT_NEAR(rss, set.rss, 1e-8 * set.rss);  // parameters are printed to 11 digits
}

TEST_P(NistSets, FromStart2SixDigitsAndFourInTheErrors) {
  const test::NistSet set = test::readNistSet(GetParam());
  const FitSummary found = fit(set, set.start2);
  print("start 2", set, found);
  EXPECT_EQ(found.status, FitStatus::Converged);
  EXPECT_GE(test::rightDigits(found.parameters, set.certified), 6);
  EXPECT_GE(test::rightDigits(found.standardErrors, set.deviations), 4);
  EXPECT_NEAR(found.rss, set.rss, 1e-9 * set.rss);
}

TEST_P(NistSets, FromStart1RightOrHonest) {
  const test::NistSet set = test::readNistSet(GetParam());
  const FitSummary found = fit(set, set.start1);
  print("start 1", set, found);
  if (!found.usable()) return;  // an honest status
  EXPECT_GE(test::rightDigits(found.parameters, set.certified), 6);
  EXPECT_GE(test::rightDigits(found.standardErrors, set.deviations), 4);
}

INSTANTIATE_TEST_SUITE_P(Strd,
                         NistSets,
                         testing::Values("Misra1a", "Hahn1", "MGH17", "Thurber", "MGH09", "Rat43"),
                         [](const auto& set) { return set.param; });

// The file says: a local minimum at (+inf, -14.07…, -inf, -inf) with rss 0.00102734.
TEST(NistMgh09, TheMinimumAtInfinityIsNeverASuccess) {
  const test::NistSet set = test::readNistSet("MGH09");
  int reached = 0;
  for (const double size : {1e1, 1e2, 1e3, 1e4, 1e6, 1e8, 1e10}) {
    const VectorXd start = VectorXd{{size, -14.07, -size, -size}};
    const FitSummary found = fit(set, start);
    const bool there = std::abs(found.rss - 0.00102734) < 1e-6;
    reached += there ? 1 : 0;
    EXPECT_FALSE(there && found.usable()) << "from " << size;
  }
  EXPECT_GT(reached, 0);  // the trap was really entered
}

}  // namespace
}  // namespace dampwright
