// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/verdict/judge.h"

#include <gtest/gtest.h>

#include <cmath>

#include "core/words/words.h"
#include "tests/core/verdict/made_measurement.h"

namespace dampwright {
namespace {

// Published workshop limits: a repair manual's bench check of car dampers, stroke 80 mm, 60/min,
// forces are the largest ordinates of the diagram at 47 N per mm; front rebound 21 to 28 mm =
// 987 to 1316 N, compression 3.5 to 6.5 mm = 164.5 to 305.5 N. Source: 21-07.ru, section 5-3-1
// "checking dampers on the stand". Peak speed π·0.080·1 = 0.25133 m/s.
constexpr double stroke = 0.080;
const double speed = pi * stroke * 60 / 60;

Check force(Direction direction, double min, double max) {
  Check check;
  check.check = "force";
  check.direction = direction;
  check.velocity = speed;
  check.reading = "largest";
  check.stroke = stroke;
  check.min = min;
  check.max = max;
  return check;
}

Limits workshopLimits() {
  constexpr double newtonsPerMm = 47;
  Limits limits;
  limits.title = "Front damper, bench check";
  limits.conditions.stroke = stroke;
  limits.checks = {force(Direction::Rebound, 21 * newtonsPerMm, 28 * newtonsPerMm),
                   force(Direction::Compression, 3.5 * newtonsPerMm, 6.5 * newtonsPerMm)};
  return limits;
}

/// Largest ordinates; 1 % of scatter with 4 degrees of freedom, so U is about 2.8 %.
Measurement tested(double rebound, double compression) {
  Measurement made = madeMeasurement();
  addPoint(made, Direction::Rebound, {speed, rebound * 0.9, stroke, rebound, rebound * 0.01});
  addPoint(made,
           Direction::Compression,
           {speed, compression * 0.9, stroke, compression, compression * 0.01});
  return made;
}

TEST(Judge, ThePublishedWorkshopLimitsAreWhatTheManualPrints) {
  const Limits limits = workshopLimits();
  EXPECT_EQ(limits.checks[0].min, 987);
  EXPECT_EQ(limits.checks[0].max, 1316);
  EXPECT_EQ(limits.checks[1].min, 164.5);
  EXPECT_EQ(limits.checks[1].max, 305.5);
  EXPECT_NEAR(speed, 0.25133, 5e-6);  // printed to five digits
}

TEST(Judge, ADamperInTheMiddleOfTheWorkshopLimitsPasses) {
  const Verdict verdict = judge(tested(1150, 235), workshopLimits());
  EXPECT_EQ(verdict.word, VerdictWord::Pass);
  ASSERT_EQ(verdict.checks.size(), 2u);
  EXPECT_DOUBLE_EQ(*verdict.checks[0].measured, 1150);
  EXPECT_DOUBLE_EQ(*verdict.checks[0].margin, 163);
  EXPECT_DOUBLE_EQ(*verdict.checks[1].measured, 235);
  EXPECT_EQ(verdict.title, "Front damper, bench check");
}

TEST(Judge, AWeakReboundFailsTheWhole) {
  const Verdict verdict = judge(tested(850, 235), workshopLimits());
  EXPECT_EQ(verdict.word, VerdictWord::Fail);
  EXPECT_EQ(verdict.checks[0].verdict, VerdictWord::Fail);
  EXPECT_EQ(verdict.checks[0].reason.code, "outside-limits-surely");
  EXPECT_EQ(verdict.checks[1].verdict, VerdictWord::Pass);
}

TEST(Judge, AForceOnTheLimitIsTooCloseToCall) {
  const Verdict verdict = judge(tested(1316, 235), workshopLimits());
  EXPECT_EQ(verdict.word, VerdictWord::TooCloseToCall);
  EXPECT_EQ(verdict.checks[0].reason.code, "close-inside-limit");
}

TEST(Judge, CoverageComesFromTheDegreesOfFreedomAndStandsBesideEachCheck) {
  const Verdict verdict = judge(tested(1150, 235), workshopLimits());
  const CheckVerdict& check = verdict.checks[0];
  // 1 % with 4 degrees of freedom; t95(4) = 2.776, GUM table G.2
  EXPECT_NEAR(check.standardUncertainty, 11.5, 1e-9);
  EXPECT_NEAR(check.dof, 4, 1e-9);
  EXPECT_NEAR(check.coverageFactor, 2.776, 5e-4);
  EXPECT_DOUBLE_EQ(check.expandedUncertainty, check.coverageFactor * check.standardUncertainty);
  ASSERT_EQ(check.budget.size(), 1u);
  EXPECT_EQ(check.budget[0].part, "cycles");
}

TEST(Judge, AnotherStrokeIsNotTestedAndNeverPasses) {
  Limits limits = workshopLimits();
  limits.conditions.stroke = 0.1;
  for (Check& check : limits.checks) check.stroke = std::nullopt;
  const Verdict verdict = judge(tested(1150, 235), limits);
  EXPECT_EQ(verdict.word, VerdictWord::NotTested);
  EXPECT_EQ(verdict.checks[0].reason.code, "stroke-not-tested");
}

TEST(Judge, AnEmptyListOfChecksIsNotTested) {
  EXPECT_EQ(judge(tested(1150, 235), Limits{}).word, VerdictWord::NotTested);
}

TEST(Judge, ANonsensicalCheckIsNotTestedWithItsReason) {
  Limits limits;
  limits.checks.emplace_back().check = "wobble";
  const Verdict verdict = judge(tested(1150, 235), limits);
  EXPECT_EQ(verdict.word, VerdictWord::NotTested);
  EXPECT_EQ(verdict.checks.at(0).reason.code, "check-unknown");
}

Limits gasAndFriction() {
  Limits limits;
  Check gas, friction, dry;
  gas.check = "gas force";
  gas.min = 120;
  gas.max = 200;
  friction.check = "friction";
  friction.max = 60;
  dry = friction;
  dry.basis = "dry";
  limits.checks = {gas, friction, dry};
  return limits;
}

TEST(Judge, GasAndBothFrictionsAreJudgedByTheirOwnFigures) {
  Measurement made = tested(1150, 235);
  made.gas = {};
  made.gas.force = 168;
  made.gas.forceU = 0.5;
  made.gas.forceDof = 30;
  made.friction = {};
  made.friction.halfDifference = 47;
  made.friction.halfDifferenceU = 1;
  made.friction.halfDifferenceDof = 4;
  made.friction.dry = 80;
  made.friction.dryU = 1;
  made.friction.dryDof = 30;
  const Verdict verdict = judge(made, gasAndFriction());
  EXPECT_EQ(verdict.checks[0].measured, 168);
  EXPECT_EQ(verdict.checks[0].verdict, VerdictWord::Pass);
  EXPECT_EQ(verdict.checks[1].measured, 47);
  EXPECT_EQ(verdict.checks[1].verdict, VerdictWord::Pass);
  EXPECT_EQ(verdict.checks[2].measured, 80);
  EXPECT_EQ(verdict.checks[2].verdict, VerdictWord::Fail);
}

TEST(Judge, WhatWasNotDeterminedIsNotTestedWithTheReason) {
  const Verdict verdict = judge(tested(1150, 235), gasAndFriction());
  EXPECT_EQ(verdict.checks[0].reason.code, "gas-not-determined");
  EXPECT_EQ(verdict.checks[1].reason.code, "friction-not-determined");
  EXPECT_EQ(verdict.checks[1].measured, std::nullopt);
  EXPECT_EQ(verdict.checks[1].margin, std::nullopt);
  EXPECT_EQ(verdict.checks[1].max, 60);
  EXPECT_EQ(verdict.word, VerdictWord::NotTested);
}

TEST(Judge, ChecksByDirectionWaitUntilTheDirectionIsConfirmed) {
  Measurement made = tested(1150, 235);
  made.runs[0].directionSettled = false;
  made.friction = {};
  made.friction.halfDifference = 47;
  Limits limits = workshopLimits();
  limits.checks.push_back(gasAndFriction().checks[1]);
  const Verdict verdict = judge(made, limits);
  EXPECT_EQ(verdict.word, VerdictWord::NotTested);
  EXPECT_EQ(verdict.checks[0].reason.code, "direction-not-confirmed");
  EXPECT_EQ(verdict.checks[0].measured, std::nullopt)
      << "the figure could be the other direction's";
  EXPECT_EQ(verdict.checks[2].verdict, VerdictWord::Pass) << "friction has no direction";
  ASSERT_EQ(verdict.waiting.size(), 1u);
  EXPECT_EQ(verdict.waiting[0].code, "direction-not-confirmed");
}

TEST(Judge, ABrokenConditionShowsTheFigureButDoesNotJudgeIt) {
  Limits limits = workshopLimits();
  limits.conditions.temperatureFrom = 60;
  limits.conditions.temperatureTo = 80;
  const Verdict verdict = judge(tested(850, 235), limits);
  EXPECT_EQ(verdict.word, VerdictWord::NotTested);
  EXPECT_EQ(verdict.checks[0].reason.code, "temperature-outside-window");
  EXPECT_EQ(verdict.checks[0].measured, 850);
}

TEST(Judge, EveryReasonReadsAsASentenceWithAllItsValues) {
  Limits limits = workshopLimits();
  limits.checks.push_back(gasAndFriction().checks[1]);
  for (const double rebound : {850.0, 985.0, 990.0, 1150.0}) {
    for (const CheckVerdict& check : judge(tested(rebound, 235), limits).checks) {
      const std::string text = englishText(check.reason.code, check.reason.values);
      EXPECT_NE(text, check.reason.code);
      EXPECT_EQ(text.find('?'), std::string::npos) << text;
    }
  }
}

}  // namespace
}  // namespace dampwright
