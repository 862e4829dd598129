// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/budget.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>

#include "core/uncertainty/student_t.h"

namespace dampwright {
namespace {

const double known = std::numeric_limits<double>::infinity();

// JCGM 100:2008 (GUM), example H.1, table H.1: end gauge, contributions in nm with their degrees
// of freedom. Parts from memory; they reproduce the published result.
const std::vector<BudgetLine> endGauge = {{"length", "standard", 25, 18},
                                          {"length", "repeats", 5.8, 24},
                                          {"length", "random", 3.9, 5},
                                          {"length", "systematic", 6.7, 8},
                                          {"length", "expansion difference", 2.9, 50},
                                          {"length", "temperature difference", 16.6, 2}};

TEST(Combine, EndGaugeOfGumH1) {
  const Combined combined = combine(endGauge);
  EXPECT_NEAR(combined.u, 31.66, 0.1);    // parts are printed to 0.1 nm
  EXPECT_NEAR(combined.dof, 16.75, 0.2);  // the same
  EXPECT_EQ(std::floor(combined.dof), 16);
  // The guide prints U99 = 93 nm, 92.5 nm from unrounded parts: 2.92 · 31.66.
  EXPECT_NEAR(coverageFactor(0.99, combined.dof) * combined.u, 92.5, 0.3);
}

TEST(Combine, KnownPartsLeaveTheDegreesOfFreedomInfinite) {
  const std::vector<BudgetLine> lines = {{"f", "zero", 3, known}, {"f", "load cell", 4, known}};
  EXPECT_DOUBLE_EQ(combine(lines).u, 5);
  EXPECT_TRUE(std::isinf(combine(lines).dof));
}

TEST(Combine, OnePartKeepsItsDegreesOfFreedom) {
  const std::vector<BudgetLine> lines = {{"f", "cycles", 2, 7}};
  EXPECT_DOUBLE_EQ(combine(lines).dof, 7);
}

TEST(Combine, NoPartsAreNoUncertainty) {
  EXPECT_EQ(combine({}).u, 0);
  EXPECT_TRUE(std::isinf(combine({}).dof));
}

}  // namespace
}  // namespace dampwright
