// SPDX-License-Identifier: GPL-3.0-or-later
#include <gtest/gtest.h>

#include <cmath>
#include <set>

#include "core/laws/law.h"

namespace dampwright {
namespace {

// 8 speeds of a bench programme; forces of low 3000, high 900 N·s/m, knee 110 mm/s.
const std::vector<LawPoint> points = [] {
  std::vector<LawPoint> made;
  for (const double v : {0.02, 0.05, 0.1, 0.15, 0.25, 0.4, 0.6, 1.0}) {
    made.push_back({v, v < 0.11 ? 3000 * v : 330 + 900 * (v - 0.11)});
  }
  return made;
}();

TEST(AllLaws, HaveTheirOwnNamesAndAreFoundByThem) {
  std::set<std::string_view> names;
  for (const Law* law : allLaws()) {
    names.insert(law->name);
    EXPECT_EQ(findLaw(law->name), law);
    EXPECT_LE(law->parameters.size(), maxLawParameters);
  }
  EXPECT_EQ(names.size(), allLaws().size());
  EXPECT_EQ(findLaw("no such law"), nullptr);
}

TEST(AllLaws, StandFromTheSimplestToTheRichest) {
  for (std::size_t i = 1; i < allLaws().size(); ++i) {
    EXPECT_LE(allLaws()[i - 1]->parameters.size(), allLaws()[i]->parameters.size());
  }
}

TEST(AllLaws, HaveNoForceAtStandstill) {
  for (const Law* law : allLaws()) {
    for (const LawRegion& region : law->regions(points)) {
      EXPECT_EQ(law->force(region.start, 0), 0) << law->name;
    }
  }
}

TEST(AllLaws, StartInsideTheirBounds) {
  for (const Law* law : allLaws()) {
    const auto regions = law->regions(points);
    ASSERT_FALSE(regions.empty()) << law->name;
    for (const LawRegion& region : regions) {
      ASSERT_EQ(region.start.size(), law->parameters.size());
      for (std::size_t j = 0; j < region.start.size(); ++j) {
        EXPECT_LE(region.lower[j], region.start[j]) << law->name << " " << j;
        EXPECT_GE(region.upper[j], region.start[j]) << law->name << " " << j;
      }
    }
  }
}

TEST(AllLaws, DerivativesAgreeWithFiniteDifferences) {
  for (const Law* law : allLaws()) {
    for (const LawRegion& region : law->regions(points)) {
      for (const double v : {0.013, 0.07, 0.33, 0.9}) {
        const double step = 1e-6;  // of the value: both laws are piecewise linear, rounding decides
        const double slope =
            (law->force(region.start, v * (1 + step)) - law->force(region.start, v * (1 - step))) /
            (2 * step * v);
        EXPECT_NEAR(law->slope(region.start, v), slope, 1e-6 * std::abs(slope)) << law->name;
        for (std::size_t j = 0; j < region.start.size(); ++j) {
          auto above = region.start;
          auto below = region.start;
          above[j] *= 1 + step;
          below[j] *= 1 - step;
          const double derivative =
              (law->force(above, v) - law->force(below, v)) / (above[j] - below[j]);
          EXPECT_NEAR(law->gradient(region.start, v)[j], derivative, 1e-6 * std::abs(derivative))
              << law->name << " parameter " << j << " at " << v;
        }
      }
    }
  }
}

TEST(AllLaws, KneeIsWhereTheTangentAtRestMeetsTheAsymptote) {
  for (const Law* law : allLaws()) {
    for (const LawRegion& region : law->regions(points)) {
      const double far = 1e3;  // m/s, beyond any bend
      const double tangent = law->slope(region.start, 0);
      const double asymptote = law->slope(region.start, far);
      const auto knee = law->knee(region.start);
      if (!knee) {
        EXPECT_EQ(tangent, asymptote) << law->name;
        continue;
      }
      const double meeting =
          (law->force(region.start, far) - asymptote * far) / (tangent - asymptote);
      EXPECT_NEAR(*knee, meeting, 1e-9 * far / tangent) << law->name;
    }
  }
}

TEST(TwoSlope, TheRegionThatHoldsTheKneeStartsNearTheTruth) {
  const auto regions = findLaw("two-slope")->regions(points);
  EXPECT_EQ(regions.size(), 6u);  // between neighbours, but not beyond the last speed but one
  const LawRegion& region = regions[2];
  EXPECT_LE(region.lower[2], 0.11);
  EXPECT_GE(region.upper[2], 0.11);
  EXPECT_NEAR(region.start[0], 3000, 300);
  EXPECT_NEAR(region.start[1], 900, 30);
}

TEST(TwoSlope, TwoSpeedsAreTooFew) {
  EXPECT_TRUE(findLaw("two-slope")->regions(std::span(points).first(2)).empty());
  const std::vector<LawPoint> twice = {{0.1, 100}, {0.1001, 101}, {0.2, 180}};
  EXPECT_TRUE(findLaw("two-slope")->regions(twice).empty());
}

TEST(AllLaws, NoPointsGiveNoRegion) {
  for (const Law* law : allLaws()) EXPECT_TRUE(law->regions({}).empty()) << law->name;
}

}  // namespace
}  // namespace dampwright
