// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/read_metadata.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

using Setting = std::vector<SettingValue>;

TEST(SettingOf, ClicksAreReadWithTheirAdjuster) {
  EXPECT_EQ(settingOf({{"Rebound clicks", "8"}}), (Setting{{"rebound", 8}}));
  EXPECT_EQ(settingOf({{"compression setting", "4"}, {"Rebound clicks", "10"}}),
            (Setting{{"compression", 4}, {"rebound", 10}}));
  EXPECT_EQ(settingOf({{"Setting", "rebound 8, compression 4"}}),
            (Setting{{"compression", 4}, {"rebound", 8}}));
  EXPECT_EQ(settingOf({{"Low speed compression clicks", "12"}}),
            (Setting{{"low speed compression", 12}}));
  EXPECT_EQ(settingOf({{"Setting", "rebound:8"}}), (Setting{{"rebound", 8}}));
  EXPECT_EQ(settingOf({{"Clicks", "3"}}), (Setting{{"adjuster", 3}}));
}

TEST(SettingOf, WhatIsNoSettingMakesNone) {
  EXPECT_EQ(settingOf({{"Rebound force", "800"}, {"Counted from", "full soft"}}), Setting{});
  EXPECT_EQ(settingOf({{"Setting", "full soft"}}), Setting{});
  EXPECT_EQ(settingOf({}), Setting{});
}

TEST(SerialOf, TheDampersSerialIsReadAndTheBenchsIsNot) {
  EXPECT_EQ(serialOf({{"Serial", "QD-1"}}), "QD-1");
  EXPECT_EQ(serialOf({{"Damper serial number", "QD-2"}}), "QD-2");
  EXPECT_EQ(serialOf({{"S/N", "QD-3"}}), "QD-3");
  EXPECT_EQ(serialOf({{"Seriennummer", "QD-4"}}), "QD-4");
  EXPECT_EQ(serialOf({{"Load cell serial", "LC-9"}}), "");
  EXPECT_EQ(serialOf({{"Bench", "bench 1"}}), "");
}

}  // namespace
}  // namespace dampwright
