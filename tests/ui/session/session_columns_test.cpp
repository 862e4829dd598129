// SPDX-License-Identifier: GPL-3.0-or-later
// Runs that ask something, and what the technician says of how they are read.
#include <gmock/gmock.h>

#include "made_session.h"

namespace dampwright {
namespace {

using testing::IsEmpty;
using testing::SizeIs;

const PhaseKey frontLeft{"front left", 0};
const RunPlace firstRun{frontLeft, 0};

// The viscous run with two forces: only a person can tell which one is meant.
QByteArray twoForces(int rows) {
  QByteArray bytes;
  for (QByteArray line : viscousRun(rows, 150).split('\n')) {
    if (line.isEmpty()) continue;
    const QByteArray last = line.mid(line.lastIndexOf(',') + 1);
    bytes += line + (last.startsWith("Load") ? ",Load 2 (N)\n" : "," + last + "5\n");
  }
  return bytes;
}

class ColumnsOfARun : public ASession {
 protected:
  void SetUp() override {
    ASession::SetUp();
    qRegisterMetaType<std::vector<RunPlace>>();
    startCar();
  }
  double peak() const {
    const auto& measured = session->state(frontLeft).measured;
    if (!measured) return 0;
    return measured->measurement.blocks.front().compression.force;
  }
  std::vector<std::string> remarks() const {
    std::vector<std::string> codes;
    for (const Remark& remark : session->state(frontLeft).measured->measurement.runs[0].remarks) {
      codes.push_back(remark.code);
    }
    return codes;
  }
};

TEST_F(ColumnsOfARun, ARunThatAsksIsListedAndKeptAndSaysSo) {
  QSignalSpy asked(session.get(), &Session::questionsAsked);
  drop({write("run.csv", twoForces(8000))}, "front left");
  EXPECT_THAT(problems(), IsEmpty());
  ASSERT_EQ(asked.count(), 1);
  EXPECT_EQ(asked[0][0].value<std::vector<RunPlace>>().front(), firstRun);
  ASSERT_NE(session->run(firstRun), nullptr);
  EXPECT_FALSE(session->reading(firstRun)->trace);
  EXPECT_EQ(session->state(frontLeft).problem->code, "open-points");
  restart();
  ASSERT_TRUE(session->run(firstRun)) << "nothing is lost by closing the program";
  EXPECT_EQ(session->state(frontLeft).problem->code, "open-points");
}

TEST_F(ColumnsOfARun, AnAnswerMeasuresTheRunAndIsUndone) {
  drop({write("run.csv", twoForces(8000))}, "front left");
  ReadOptions answers;
  answers.force = "Load 2";
  session->confirmColumns(firstRun, answers, std::nullopt);
  settle();
  EXPECT_TRUE(session->state(frontLeft).measured);
  EXPECT_EQ(session->run(firstRun)->answers.force, "Load 2");
  session->undoStack()->undo();
  settle();
  EXPECT_EQ(session->state(frontLeft).problem->code, "open-points");
  session->undoStack()->redo();
  settle();
  restart();
  EXPECT_TRUE(session->state(frontLeft).measured) << "the answer is in the book";
}

TEST_F(ColumnsOfARun, ARigIsAskedOnceAndNeverAgain) {
  QSignalSpy asked(session.get(), &Session::questionsAsked);
  drop({write("a.csv", twoForces(8000)), write("b.csv", twoForces(8100))}, "front left");
  ASSERT_EQ(asked.count(), 1);
  EXPECT_THAT(asked[0][0].value<std::vector<RunPlace>>(), SizeIs(1)) << "one layout, one question";
  RigProfile rig;
  rig.name = "bench 9";
  rig.signature = session->reading(firstRun)->source.signature;
  rig.force = RigColumn{"Load", {}, "N"};
  rig.displacementPositive = Direction::Compression;
  session->confirmColumns(firstRun, {}, rig);
  settle();
  ASSERT_TRUE(session->state(frontLeft).measured) << "both files are read by it";
  EXPECT_THAT(session->state(frontLeft).measured->measurement.runs, SizeIs(2));
  restart();
  QSignalSpy again(session.get(), &Session::questionsAsked);
  drop({write("c.csv", twoForces(8200))}, "rear left");
  EXPECT_EQ(again.count(), 0);
  EXPECT_TRUE(session->state({"rear left", 0}).measured);
  EXPECT_EQ(session->run({{"rear left", 0}, 0})->rig, "bench 9");
}

TEST_F(ColumnsOfARun, EditingAProfileMeasuresTheRunsThatUseItAndUndoWorks) {
  RigProfile rig;
  rig.name = "bench 9";
  rig.signature = "time [s]|position [mm]|load [N]";
  rig.displacementPositive = Direction::Compression;
  drop({write("run.csv", viscousRun(8000, 0))}, "front left");
  session->confirmColumns(firstRun, {}, rig);
  settle();
  const double before = peak();
  ASSERT_GT(before, 100);
  rig.force = RigColumn{"Load", {}, "N", 2, 0};
  session->confirmColumns(firstRun, {}, rig);
  settle();
  EXPECT_NEAR(peak(), 2 * before, 1e-6 * before);  // a scale is a factor
  session->undoStack()->undo();
  settle();
  EXPECT_NEAR(peak(), before, 1e-9 * before);
}

TEST_F(ColumnsOfARun, ARunKeepsTheRigThatItWasGivenByName) {
  RigProfile one, other;
  one.name = "one";
  one.signature = other.signature = "time [s]|position [mm]|load [N]";
  one.displacementPositive = other.displacementPositive = Direction::Compression;
  other.name = "other";
  other.force = RigColumn{"Load", {}, "N", 3, 0};
  drop({write("run.csv", viscousRun(8000, 0))}, "front left");
  session->confirmColumns(firstRun, {}, one);
  settle();
  const double before = peak();
  drop({write("second.csv", viscousRun(8100, 0))}, "rear left");
  session->confirmColumns({{"rear left", 0}, 0}, {}, other);
  settle();
  EXPECT_EQ(session->run(firstRun)->rig, "one");
  EXPECT_NEAR(peak(), before, 1e-9 * before) << "a younger profile of the same layout is not its";
}

TEST_F(ColumnsOfARun, AForceSignThatWasGivenWrongIsTurnedWhereItWasGiven) {
  RigProfile rig;
  rig.name = "bench 9";
  rig.signature = "time [s]|position [mm]|load [N]";
  rig.displacementPositive = Direction::Compression;
  rig.forcePositive = Direction::Rebound;
  drop({write("run.csv", viscousRun(8000, 0))}, "front left");
  session->confirmColumns(firstRun, {}, rig);
  settle();
  EXPECT_THAT(remarks(), testing::Contains("force-sign-reversed"));
  session->turnForceSign(firstRun);
  settle();
  EXPECT_THAT(remarks(), testing::Not(testing::Contains("force-sign-reversed")));
  EXPECT_EQ(session->rigProfiles().front().forcePositive, Direction::Compression);
  session->undoStack()->undo();
  settle();
  EXPECT_THAT(remarks(), testing::Contains("force-sign-reversed"));
  ReadOptions answers;
  answers.forcePositive = Direction::Rebound;
  rig.forcePositive.reset();
  session->confirmColumns(firstRun, answers, rig);
  settle();
  session->turnForceSign(firstRun);
  settle();
  EXPECT_EQ(session->run(firstRun)->answers.forcePositive, Direction::Compression);
  EXPECT_THAT(remarks(), testing::Not(testing::Contains("force-sign-reversed")));
}

TEST_F(ColumnsOfARun, AnAssumedUnitIsConfirmedForTheRig) {
  QByteArray bytes = viscousRun(8000, 0);
  bytes.replace("Position (mm)", "Position");
  drop({write("run.csv", bytes)}, "front left");
  ASSERT_THAT(remarks(), testing::Contains("unit-assumed"));
  session->confirmUnits(firstRun);
  settle();
  EXPECT_THAT(remarks(), testing::Not(testing::Contains("unit-assumed")));
  ASSERT_THAT(session->rigProfiles(), SizeIs(1));
  EXPECT_EQ(session->rigProfiles()[0].displacement->unit, "mm");
  session->undoStack()->undo();
  settle();
  EXPECT_THAT(remarks(), testing::Contains("unit-assumed"));
  EXPECT_THAT(session->rigProfiles(), IsEmpty());
}

}  // namespace
}  // namespace dampwright
