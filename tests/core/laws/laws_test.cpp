// SPDX-License-Identifier: GPL-3.0-or-later
#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <set>
#include <string_view>

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

std::vector<double> startOf(const Law& law, const LawRegion& region) {
  return lawParameters(law, region.start);
}

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
      EXPECT_EQ(law->force(startOf(*law, region), 0), 0) << law->name;
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
      std::vector<double> at = startOf(*law, region);
      for (double& value : at) value = std::max(value, 1e-3);  // a start may stand at 0
      for (const double v : {0.013, 0.07, 0.33, 0.9}) {
        const double step = 1e-5;  // of the value: rounding 1e-11, curvature 1e-10
        const double slope =
            (law->force(at, v * (1 + step)) - law->force(at, v * (1 - step))) / (2 * step * v);
        EXPECT_NEAR(law->slope(at, v), slope, 1e-6 * std::abs(slope)) << law->name;
        for (std::size_t j = 0; j < at.size(); ++j) {
          auto above = at;
          auto below = at;
          above[j] *= 1 + step;
          below[j] *= 1 - step;
          const double derivative =
              (law->force(above, v) - law->force(below, v)) / (above[j] - below[j]);
          EXPECT_NEAR(law->gradient(at, v)[j],
                      derivative,
                      1e-6 * std::abs(derivative) + 1e-9 * law->force(at, v) / at[j])
              << law->name << " parameter " << j << " at " << v;
        }
      }
    }
  }
}

TEST(AllLaws, ChartDerivativesAgreeWithFiniteDifferences) {
  for (const Law* law : allLaws()) {
    if (law->chart == nullptr) continue;
    for (const LawRegion& region : law->regions(points)) {
      const auto derivatives = law->chart->derivatives(region.start);
      for (std::size_t j = 0; j < region.start.size(); ++j) {
        auto above = region.start;
        auto below = region.start;
        above[j] *= 1 + 1e-5;
        below[j] *= 1 - 1e-5;
        const auto high = lawParameters(*law, above), low = lawParameters(*law, below);
        for (std::size_t i = 0; i < region.start.size(); ++i) {
          const double difference = (high[i] - low[i]) / (above[j] - below[j]);
          EXPECT_NEAR(derivatives[i][j], difference, 1e-8 * std::abs(difference)) << i << " " << j;
        }
      }
    }
  }
}

TEST(AllLaws, KneeIsWhereTheTangentAtRestMeetsTheAsymptote) {
  for (const std::string_view name : {"two-slope", "smooth"}) {
    const Law* law = findLaw(name);
    for (const LawRegion& region : law->regions(points)) {
      const double far = 1e3;  // m/s, beyond any bend
      const double tangent = law->slope(region.start, 0);
      const double asymptote = law->slope(region.start, far);
      const double meeting =
          (law->force(region.start, far) - asymptote * far) / (tangent - asymptote);
      EXPECT_NEAR(*law->knee(region.start), meeting, 1e-9 * far / tangent) << name;
    }
  }
}

TEST(AllLaws, WithoutATangentAtRestOrAnAsymptoteThereIsNoKnee) {
  EXPECT_FALSE(findLaw("linear")->knee(std::vector<double>{1500}));
  EXPECT_FALSE(findLaw("power")->knee(std::vector<double>{1500, 0.7}));
}

TEST(BleedAndBlowOff, TheKneeIsTheSpeedAtWhichTheValveOpens) {
  const Law* law = findLaw("bleed and blow-off");
  const std::vector<double> valve = {0.006, 400, 900};
  const double knee = *law->knee(valve);
  EXPECT_DOUBLE_EQ(knee, 0.006 * 20);
  EXPECT_NEAR(law->force(valve, knee), 400, 1e-9);
}

TEST(BleedAndBlowOff, ItsForceBringsItsSpeedBack) {
  const Law* law = findLaw("bleed and blow-off");
  for (const double bleed : {1e-6, 0.002, 0.02}) {
    const std::vector<double> valve = {bleed, 400, 900};
    for (const double v : {0.001, 0.05, 0.2, 1.5}) {
      const double force = law->force(valve, v);
      const double back = bleed * std::sqrt(force) + std::max(0.0, force - 400) / 900;
      EXPECT_NEAR(back, v, 1e-12) << bleed;
    }
  }
}

TEST(Power, StandsForCoulombViscousAndOrifice) {
  const Law* law = findLaw("power");
  EXPECT_DOUBLE_EQ(law->force(std::vector<double>{800, 2}, 0.5), 200);
  EXPECT_DOUBLE_EQ(law->force(std::vector<double>{800, 1}, 0.5), 400);
  EXPECT_DOUBLE_EQ(law->force(std::vector<double>{800, 0.5}, 0.25), 400);
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
