// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/read_file_name.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

using Setting = std::vector<SettingValue>;

TEST(ReadFileName, ClicksAreReadWithTheirAdjuster) {
  EXPECT_EQ(settingInName("front left 8 clicks.txt"), (Setting{{"adjuster", 8}}));
  EXPECT_EQ(settingInName("R12 C4.csv"), (Setting{{"compression", 4}, {"rebound", 12}}));
  EXPECT_EQ(settingInName("FL_c4_r12_50mms.csv"), (Setting{{"compression", 4}, {"rebound", 12}}));
  EXPECT_EQ(settingInName("rear_rebound_10_clicks_0100_mm_s.csv"), (Setting{{"rebound", 10}}));
  EXPECT_EQ(settingInName("Reb08Comp04.csv"), (Setting{{"compression", 4}, {"rebound", 8}}));
  EXPECT_EQ(settingInName("Klicks 3.csv"), (Setting{{"adjuster", 3}}));
}

TEST(ReadFileName, OtherNumbersAreNoSetting) {
  for (const char* name : {"R1.csv",
                           "run 12.csv",
                           "FL_0.1mps.csv",
                           "2031-03-04.csv",
                           "rebound 800 N.txt",
                           "",
                           ".csv"}) {
    EXPECT_EQ(settingInName(name), Setting{}) << name;
  }
}

TEST(ReadFileName, TheSpeedStandsBeforeItsUnit) {
  EXPECT_DOUBLE_EQ(speedInName("FL_0.1mps.csv").value_or(0), 0.1);
  EXPECT_DOUBLE_EQ(speedInName("FL_0,25 m_s.csv").value_or(0), 0.25);
  EXPECT_DOUBLE_EQ(speedInName("run_0100_mm_s.csv").value_or(0), 0.1);
  EXPECT_DOUBLE_EQ(speedInName("VL 50mm-s").value_or(0), 0.05);
  EXPECT_DOUBLE_EQ(speedInName("10ips.csv").value_or(0), 0.254);
  EXPECT_EQ(speedInName("FL_50mm.csv"), std::nullopt);
  EXPECT_EQ(speedInName("front left 8 clicks.txt"), std::nullopt);
}

TEST(ReadFileName, TheStemIsWhatIsLeft) {
  EXPECT_EQ(stemOfName("FL_0.1mps.csv"), "fl");
  EXPECT_EQ(stemOfName("front left 8 clicks 50 mm_s.txt"), "front left");
  EXPECT_EQ(stemOfName("damper A run 3.csv"), "damper a run");
  EXPECT_EQ(stemOfName("7.csv"), "7");
}

}  // namespace
}  // namespace dampwright
