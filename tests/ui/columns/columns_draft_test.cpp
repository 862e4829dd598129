// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/columns_draft.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

Source threeColumns() {
  Source source;
  source.columns = {{1, "Time", "s", Role::Time, false, "role-by-name"},
                    {2, "Travel", "mm", Role::Displacement, true, "role-by-name"},
                    {3, "Load", "N", Role::Force, false, "role-by-name"},
                    {4, "Load", "N", Role::Other, false, "column-not-needed"},
                    {5, "", "", Role::Other, false, "column-not-needed"}};
  return source;
}

RigProfile bench() {
  RigProfile rig;
  rig.name = "bench 1";
  rig.signature = "time [s]|travel [mm]|load [N]";
  rig.force = RigColumn{"Load", {}, "N", 2, 10};
  rig.displacementPositive = Direction::Rebound;
  return rig;
}

TEST(ColumnsDraft, OfNothingChangesNothing) {
  const ColumnsDraft draft = draftOf(bench(), {});
  EXPECT_EQ(draft.rig, bench());
  EXPECT_EQ(answersOf(draft), ReadOptions{});
  EXPECT_FALSE(needsProfile(draft));
}

TEST(ColumnsDraft, AnswersOfARunComeBackAsTheyWere) {
  ReadOptions answers;
  answers.encoding = "utf-16le";
  answers.headerRow = 12;
  answers.displacement = "4";
  answers.force = "Cell";
  answers.forceUnit = "kN";
  answers.sampleRate = 500;
  answers.displacementPositive = Direction::Compression;
  answers.zeroState = ZeroState::DamperFitted;
  EXPECT_EQ(answersOf(draftOf(bench(), answers)), answers);
  EXPECT_EQ(answersOf(draftOf(std::nullopt, answers)), answers);
}

TEST(ColumnsDraft, AUnitOfAColumnThatNobodyNamedStaysAnAnswer) {
  ReadOptions answers;
  answers.displacementUnit = "in";
  const ColumnsDraft draft = draftOf(std::nullopt, answers);
  EXPECT_FALSE(draft.rig.displacement) << "a column without name or number is no column";
  EXPECT_EQ(answersOf(draft), answers);
  const ColumnsDraft changed = withUnit(draft, threeColumns(), Role::Displacement, "cm");
  EXPECT_EQ(changed.rig.displacement->unit, "cm");
  EXPECT_FALSE(changed.text.displacementUnit);
}

TEST(ColumnsDraft, AColumnIsNamedWhereItsNameIsItsOwn) {
  EXPECT_EQ(rigColumn(threeColumns(), 2).name, "Travel");
  EXPECT_EQ(rigColumn(threeColumns(), 3).number, 3);  // there are two of that name
  EXPECT_EQ(rigColumn(threeColumns(), 5).number, 5);
}

TEST(ColumnsDraft, AColumnHasOneRole) {
  ColumnsDraft draft = withRole(draftOf(std::nullopt, {}), threeColumns(), Role::Displacement, 2);
  draft = withRole(draft, threeColumns(), Role::Force, 2);
  EXPECT_EQ(draft.rig.force->name, "Travel");
  EXPECT_FALSE(draft.rig.displacement);
}

TEST(ColumnsDraft, ANewColumnDoesNotInheritAScale) {
  const ColumnsDraft draft = withRole(draftOf(bench(), {}), threeColumns(), Role::Force, 4);
  EXPECT_EQ(draft.rig.force->number, 4);
  EXPECT_EQ(draft.rig.force->scale, 1);
}

TEST(ColumnsDraft, WhatIsRememberedNamesEveryColumnAndUnit) {
  ColumnsDraft draft = draftOf(bench(), {});
  draft.text.delimiter = ";";
  draft.text.headerRow = 3;
  draft.text.sampleRate = 500;
  const Remembered kept = remembered(draft, threeColumns(), "bench 2", "sig");
  EXPECT_EQ(kept.rig.name, "bench 2");
  EXPECT_EQ(kept.rig.signature, "sig");
  EXPECT_EQ(kept.rig.time->name, "Time");
  EXPECT_EQ(kept.rig.displacement->unit, "mm") << "an assumed unit was confirmed";
  EXPECT_EQ(kept.rig.force->number, 3);
  EXPECT_EQ(kept.rig.force->scale, 2);
  EXPECT_EQ(kept.rig.force->offset, 10);
  EXPECT_EQ(kept.rig.delimiter, ";");
  EXPECT_FALSE(kept.answers.delimiter) << "the profile says it";
  EXPECT_EQ(kept.answers.headerRow, 3) << "a profile can't";
  EXPECT_EQ(kept.answers.sampleRate, 500) << "stamps beat the rate of a profile";
}

TEST(ColumnsDraft, WithoutASignatureTheTextFormStaysWithTheRun) {
  ColumnsDraft draft = draftOf(std::nullopt, {});
  draft.text.delimiter = ";";
  EXPECT_EQ(remembered(draft, threeColumns(), "x", "").answers.delimiter, ";");
}

TEST(ColumnsDraft, CalibrationAndTheRigItselfNeedAProfile) {
  ColumnsDraft draft = draftOf(std::nullopt, {});
  draft.rig.forcePositive = Direction::Rebound;
  draft = withUnit(draft, threeColumns(), Role::Force, "kN");
  EXPECT_FALSE(needsProfile(draft));
  EXPECT_TRUE(needsProfile(withCalibration(draft, threeColumns(), Role::Force, 500, 0)));
  draft.rig.forceDelay = 0.001;
  EXPECT_TRUE(needsProfile(draft));
}

}  // namespace
}  // namespace dampwright
