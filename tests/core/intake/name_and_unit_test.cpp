// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/name_and_unit.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

NameAndUnit split(std::string_view heading) { return splitNameAndUnit(heading); }

TEST(NameAndUnit, EveryWayToWriteAUnitIntoAName) {
  const NameAndUnit load{"Load", "N"};
  for (const char* heading : {"Load (N)",
                              "Load [N]",
                              "Load{N}",
                              "Load / N",
                              "Load/N",
                              "Load, N",
                              "Load_N",
                              "Load N",
                              "Load in N",
                              " Load  ( N ) ",
                              "Load_[N]"}) {
    EXPECT_EQ(split(heading), load) << heading;
  }
  EXPECT_EQ(split("time_s"), (NameAndUnit{"time", "s"}));
  EXPECT_EQ(split("velocity_mm_s"), (NameAndUnit{"velocity", "mm/s"}));
  EXPECT_EQ(split("velocity mm/s"), (NameAndUnit{"velocity", "mm/s"}));
  EXPECT_EQ(split("v_mm_per_s"), (NameAndUnit{"v", "mm/s"}));
  EXPECT_EQ(split("Kraft in kN"), (NameAndUnit{"Kraft", "kN"}));
  EXPECT_EQ(split("Travel (\")"), (NameAndUnit{"Travel", "\""}));
  EXPECT_EQ(split("Body (°C)"), (NameAndUnit{"Body", "°C"}));
}

TEST(NameAndUnit, ABracketWithoutUnitHidesNoUnitBeforeIt) {
  EXPECT_EQ(split("Water Temp, °C (serial 1024)"), (NameAndUnit{"Water Temp (serial 1024)", "°C"}));
}

TEST(NameAndUnit, ANameThatIsAUnitIsBoth) {
  EXPECT_EQ(split("mm"), (NameAndUnit{"mm", "mm"}));
  EXPECT_EQ(split("sec"), (NameAndUnit{"sec", "sec"}));
}

TEST(NameAndUnit, SquareBracketsHoldUnitsThatWeDoNotKnow) {
  EXPECT_EQ(split("Pressure [bar]"), (NameAndUnit{"Pressure", "bar"}));
}

TEST(NameAndUnit, NoUnitIsSeenWhereThereIsNone) {
  for (const char* heading : {"Load",
                              "Load (front)",
                              "Force max",
                              "Channel_C",
                              "Flow rate/step",
                              "Plug in",
                              "Z/ohm",
                              "T",
                              "",
                              "Load ()",
                              "Position_A"}) {
    EXPECT_EQ(split(heading), (NameAndUnit{heading, ""})) << heading;
  }
}

TEST(NameAndUnit, UnitsAreReadHoweverTheyAreSpelled) {
  EXPECT_EQ(readUnit("(mm/sec)")->symbol, "mm/s");
  EXPECT_EQ(readUnit("mm_s")->symbol, "mm/s");
  EXPECT_EQ(readUnit("[ kN ]")->symbol, "kN");
  EXPECT_EQ(readUnit("Sek.")->symbol, "s");
  EXPECT_FALSE(readUnit("bar").has_value());
  EXPECT_FALSE(readUnit("").has_value());
  EXPECT_FALSE(readUnit("()").has_value());
}

}  // namespace
}  // namespace dampwright
