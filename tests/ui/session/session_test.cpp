// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/session.h"

#include <gmock/gmock.h>

#include "core/records/documents.h"
#include "made_session.h"

namespace dampwright {
namespace {

using testing::ElementsAre;
using testing::IsEmpty;

const PhaseKey frontLeft{"front left", 0};

Limits readSampleLimits(const QString& name) {
  QFile file(sample(name));
  EXPECT_TRUE(file.open(QIODevice::ReadOnly));
  return readLimits(file.readAll().toStdString(), name.toStdString()).value();
}

class EditsOfASession : public ASession {
 protected:
  void SetUp() override {
    ASession::SetUp();
    startCar();
    drop({sample("rig_bench_1.json"), sample("car_front_left.csv")}, "front left");
    session->undoStack()->clear();
    ASSERT_TRUE(session->state(frontLeft).measured);
  }
};

TEST_F(EditsOfASession, ChosenLimitsJudgeWithoutMeasuringAgain) {
  const auto before = session->state(frontLeft).measured;
  ASSERT_FALSE(session->state(frontLeft).verdict);
  session->chooseLimits(readSampleLimits("limits_car.json"));
  settle();
  const PhaseState state = session->state(frontLeft);
  EXPECT_EQ(state.measured, before) << "the very same measurement";
  ASSERT_TRUE(state.verdict);
  EXPECT_EQ(state.verdict->word, VerdictWord::Pass);  // as sample_runs/README.md promises
  EXPECT_EQ(session->knownLimits().size(), 1u);
}

TEST_F(EditsOfASession, ChangedLimitsOfAKnownRevisionBecomeANewRevision) {
  Limits limits = readSampleLimits("limits_car.json");
  session->chooseLimits(limits);
  limits.checks.pop_back();
  session->chooseLimits(limits);
  settle();
  EXPECT_NE(session->job().limits->revision, limits.revision);
  EXPECT_EQ(session->job().limits->checks, limits.checks);
}

TEST_F(EditsOfASession, LimitsCanBeUndoneAndTheVerdictGoesWithThem) {
  session->chooseLimits(readSampleLimits("limits_car.json"));
  settle();
  session->undoStack()->undo();
  settle();
  EXPECT_FALSE(session->job().limits);
  EXPECT_FALSE(session->state(frontLeft).verdict);
  session->undoStack()->redo();
  settle();
  EXPECT_TRUE(session->state(frontLeft).verdict);
}

TEST_F(EditsOfASession, AStruckOutCycleIsLeftOutAndPutBack) {
  const Block& block = session->state(frontLeft).measured->measurement.blocks[1].block;
  const int used = block.cyclesUsed();
  const Cycle cycle = block.cycles.back();
  ASSERT_TRUE(cycle.used());
  session->strikeOut(frontLeft, 0, {cycle.start, cycle.end});
  EXPECT_TRUE(session->state(frontLeft).busy);
  EXPECT_TRUE(session->state(frontLeft).measured)
      << "the old one stands until the new one is there";
  settle();
  EXPECT_EQ(session->state(frontLeft).measured->measurement.blocks[1].block.cyclesUsed(), used - 1);
  session->putBack(frontLeft, 0, {cycle.start, cycle.end});
  settle();
  EXPECT_EQ(session->state(frontLeft).measured->measurement.blocks[1].block.cyclesUsed(), used);
}

TEST_F(EditsOfASession, MovedRunsKeepTheirMeasurement) {
  const auto before = session->state(frontLeft).measured;
  session->moveRuns(frontLeft, "rear left");
  EXPECT_FALSE(session->state(frontLeft).measured);
  EXPECT_EQ(session->state({"rear left", 0}).measured, before);
  EXPECT_FALSE(session->busy() && session->state({"rear left", 0}).busy);
  session->undoStack()->undo();
  EXPECT_EQ(session->state(frontLeft).measured, before);
}

TEST_F(EditsOfASession, ARemovedRunComesBackByUndo) {
  session->removeRun(frontLeft, 0);
  EXPECT_FALSE(session->state(frontLeft).measured);
  session->undoStack()->undo();
  settle();
  EXPECT_TRUE(session->state(frontLeft).measured);
}

TEST_F(EditsOfASession, EveryEditIsUndoneAndRedoneAndAllOfItIsInTheJournal) {
  const Job before = session->job();
  DamperCard card;
  card.serial = "S 9";
  session->setDamper("rear left", card);
  Job details = before;
  details.notes = "leaks";
  session->setJobDetails(details);
  const Job after = session->job();
  while (session->undoStack()->canUndo()) session->undoStack()->undo();
  EXPECT_EQ(session->job(), before);
  while (session->undoStack()->canRedo()) session->undoStack()->redo();
  EXPECT_EQ(session->job(), after);
  settle();
  const Book opened = Book::open(book()).value();
  EXPECT_EQ(opened.job(after.number).value(), after);
  // new job, run, card, details, two undone, two redone
  EXPECT_EQ(opened.journal("job", after.number).value().size(), 8u);
}

TEST_F(EditsOfASession, ASettledDirectionIsKeptInTheRigsProfileAndAskedNoMore) {
  Session& open = *session;
  open.settleDirection(frontLeft, Direction::Rebound);
  settle();
  EXPECT_TRUE(open.state(frontLeft).measured->measurement.runs[0].directionSettled);
  const std::vector<RigProfile> rigs = Book::open(book()).value().rigProfiles().value();
  ASSERT_EQ(rigs.size(), 1u);
  EXPECT_EQ(rigs[0].displacementPositive, Direction::Rebound);
  open.undoStack()->undo();
  settle();
  EXPECT_EQ(Book::open(book()).value().rigProfiles().value()[0].displacementPositive,
            Direction::Compression);
}

TEST_F(ASession, ADirectionSettledWithoutAProfileMakesOneForThatLayout) {
  startCar();
  // Without gas nothing in the numbers says which way is compression.
  drop({write("first.csv", viscousRun(40'000, 0))}, "front left");
  ASSERT_TRUE(session->state(frontLeft).measured);
  EXPECT_FALSE(session->state(frontLeft).measured->measurement.runs[0].directionSettled);
  session->settleDirection(frontLeft, Direction::Compression);
  settle();
  EXPECT_TRUE(session->state(frontLeft).measured->measurement.runs[0].directionSettled);
  drop({write("second.csv", viscousRun(50'000, 0))}, "front right");
  EXPECT_TRUE(session->state({"front right", 0}).measured->measurement.runs[0].directionSettled)
      << "the same rig is never asked twice";
}

TEST_F(EditsOfASession, StoppedWorkSaysSoAndTheNextEditMeasuresAgain) {
  session->strikeOut(frontLeft, 0, {0, 0.1});
  session->stopWork();
  EXPECT_FALSE(session->state(frontLeft).busy);
  EXPECT_EQ(session->state(frontLeft).problem->code, "stopped");
  session->putBack(frontLeft, 0, {0, 0.1});
  settle();
  EXPECT_FALSE(session->state(frontLeft).problem);
  EXPECT_TRUE(session->state(frontLeft).measured);
}

TEST_F(EditsOfASession, EditsInARowDeliverTheMeasurementOfTheLast) {
  const auto spans = session->state(frontLeft).measured->measurement.blocks[2].block.cycles;
  int expected = session->state(frontLeft).measured->measurement.blocks[2].block.cyclesUsed();
  for (std::size_t i = spans.size() - 3; i < spans.size(); ++i) {
    session->strikeOut(frontLeft, 0, {spans[i].start, spans[i].end});
    --expected;
  }
  settle();
  EXPECT_EQ(session->state(frontLeft).measured->measurement.blocks[2].block.cyclesUsed(), expected);
}

TEST_F(ASession, IdleIsSaidOnceWhenAllWorkIsDone) {
  QSignalSpy idle(session.get(), &Session::idle);
  startCar();
  QTest::qWait(10);
  idle.clear();
  drop({sample("rig_bench_1.json"), sample("car_front_left.csv")}, "front left");
  QTest::qWait(10);
  EXPECT_EQ(idle.size(), 1);
}

TEST_F(ASession, ADeletedSessionStopsItsWorkMidway) {
  startCar();
  session->dropFiles({sample("car_front_left.csv"), sample("car_front_right.csv")}, {});
  session.reset();
  QTest::qWait(50);  // nothing may come home to it
}

}  // namespace
}  // namespace dampwright
