// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/verdict/conditions.h"

#include <gtest/gtest.h>

#include "tests/core/verdict/made_measurement.h"

namespace dampwright {
namespace {

Measurement tested() {
  Measurement made = madeMeasurement();
  addPoint(made, Direction::Rebound, {0.3, 1000, 0.05});
  return made;
}

std::string problem(const LimitConditions& conditions,
                    const Measurement& made = tested(),
                    const Figure& figure = {}) {
  const auto found = conditionProblem(made, conditions, figure);
  return found ? found->code : "";
}

TEST(Conditions, NoneAskedIsNoneBroken) { EXPECT_EQ(problem({}), ""); }

TEST(Conditions, AStrokeWithinTwoPercentCounts) {
  LimitConditions conditions;
  conditions.stroke = 0.0505;
  EXPECT_EQ(problem(conditions), "");
  conditions.stroke = 0.052;
  EXPECT_EQ(problem(conditions), "stroke-not-tested");
}

TEST(Conditions, AHoldIsNoStroke) {
  Measurement made = tested();
  made.blocks[0].block.kind = BlockKind::Hold;
  LimitConditions conditions;
  conditions.stroke = 0.05;
  EXPECT_EQ(problem(conditions, made), "stroke-not-tested");
}

TEST(Conditions, TheTemperatureMustBeKnownAndInTheWindow) {
  LimitConditions conditions;
  conditions.temperatureFrom = 15;
  conditions.temperatureTo = 35;
  const auto at = [&](std::optional<double> temperature) {
    return problem(conditions, tested(), {.temperature = temperature});
  };
  EXPECT_EQ(at(15), "");
  EXPECT_EQ(at(35), "");
  EXPECT_EQ(at(14.99), "temperature-outside-window");
  EXPECT_EQ(at(35.01), "temperature-outside-window");
  EXPECT_EQ(at(std::nullopt), "temperature-not-known");
}

TEST(Conditions, TheSettingIsWhatTheFileSays) {
  LimitConditions conditions;
  conditions.setting = "10 clicks";
  Measurement made = tested();
  EXPECT_EQ(problem(conditions, made), "setting-not-known");
  made.runs[0].source.metadata.emplace_back("setting", "10 clicks");
  EXPECT_EQ(problem(conditions, made), "");
  made.runs.push_back(made.runs[0]);
  made.runs[1].source.metadata.back().second = "12 clicks";
  EXPECT_EQ(problem(conditions, made), "setting-differs");
}

TEST(Conditions, TheWaveformIsThatOfTheBlockThatWasRead) {
  LimitConditions conditions;
  conditions.waveform = "triangle";
  EXPECT_EQ(problem(conditions, tested(), {.waveform = BlockKind::Sine}), "waveform-differs");
  EXPECT_EQ(problem(conditions, tested(), {.waveform = BlockKind::Triangle}), "");
  EXPECT_EQ(problem(conditions, tested(), {}), "") << "gas and friction have a block of their own";
}

}  // namespace
}  // namespace dampwright
