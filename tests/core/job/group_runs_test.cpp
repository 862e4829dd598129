// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/group_runs.h"

#include <gmock/gmock.h>

namespace dampwright {
namespace {

using testing::ElementsAre;

std::vector<RunGroup> grouped(const std::vector<RunIdentity>& runs) {
  return groupRuns(runs, cornersOf(VehicleKind::Car));
}

bool says(const RunGroup& group, std::string_view code) {
  return std::ranges::any_of(group.why, [&](const Remark& remark) { return remark.code == code; });
}

TEST(GroupRuns, AFileASpeedIsOneMeasurementPerCorner) {
  const auto groups = grouped({{"FL_0.2mps.csv", {}, {}},
                               {"FR_0.1mps.csv", {}, {}},
                               {"FL_0.1mps.csv", {}, {}},
                               {"FR_0.2mps.csv", {}, {}}});
  ASSERT_EQ(groups.size(), 2u);
  EXPECT_EQ(groups[0].corner, "front left");
  EXPECT_THAT(groups[0].runs, ElementsAre(2, 0));  // by speed
  EXPECT_THAT(groups[1].runs, ElementsAre(1, 3));
  EXPECT_TRUE(says(groups[0], "runs-by-corner"));
  ASSERT_TRUE(says(groups[0], "runs-by-speeds"));
  EXPECT_EQ(std::get<double>(groups[0].why.back().values[1].value), 0.2);
}

TEST(GroupRuns, EachSettingIsAMeasurementOfItsOwn) {
  const auto groups = grouped({{"front left 8 clicks.txt", {}, {}},
                               {"front left 4 clicks.txt", {}, {}},
                               {"R12 C4.csv", {{"Position", "FL"}}, {}}});
  ASSERT_EQ(groups.size(), 3u);
  EXPECT_EQ(groups[0].setting, (std::vector<SettingValue>{{"adjuster", 8}}));
  EXPECT_EQ(groups[2].setting, (std::vector<SettingValue>{{"compression", 4}, {"rebound", 12}}));
  EXPECT_EQ(groups[2].corner, "front left");
  EXPECT_TRUE(says(groups[2], "runs-by-setting"));
}

TEST(GroupRuns, ThePreambleBeatsTheNameAndTheSerialJoins) {
  const auto groups = grouped({{"a 8 clicks.csv", {{"Serial", "X-1"}, {"Clicks", "3"}}, {}},
                               {"b.csv", {{"Serial", "X-1"}, {"Clicks", "3"}}, {}},
                               {"c.csv", {{"Serial", "X-2"}, {"Clicks", "3"}}, {}}});
  ASSERT_EQ(groups.size(), 2u);
  EXPECT_EQ(groups[0].serial, "X-1");
  EXPECT_THAT(groups[0].runs, ElementsAre(0, 1));
  EXPECT_TRUE(says(groups[0], "runs-by-serial"));
}

TEST(GroupRuns, DifferentSerialsOnOneCornerStayApart) {
  const auto groups =
      grouped({{"FL 1.csv", {{"Serial", "X-1"}}, {}}, {"FL 2.csv", {{"Serial", "X-2"}}, {}}});
  EXPECT_EQ(groups.size(), 2u);
}

TEST(GroupRuns, NamesAlikeJoinOnlyWhereTheSpeedsDiffer) {
  EXPECT_EQ(grouped({{"run 1.csv", {}, {0.1}}, {"run 2.csv", {}, {0.2}}}).size(), 1u);
  EXPECT_EQ(grouped({{"run 1.csv", {}, {0.1, 0.2}}, {"run 2.csv", {}, {0.1005, 0.2}}}).size(), 2u);
  EXPECT_EQ(grouped({{"run 1.csv", {}, {}}, {"run 2.csv", {}, {}}}).size(), 2u);
  const auto named = grouped({{"damper 0.1mps.csv", {}, {}}, {"damper 0.2mps.csv", {}, {}}});
  ASSERT_EQ(named.size(), 1u);
  EXPECT_TRUE(says(named[0], "runs-by-name"));
}

TEST(GroupRuns, NothingMakesNothing) { EXPECT_TRUE(grouped({}).empty()); }

}  // namespace
}  // namespace dampwright
