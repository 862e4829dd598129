// SPDX-License-Identifier: GPL-3.0-or-later
// The session and its book: restarts, the demonstration, trouble, a killed program.
#include <gmock/gmock.h>
#include <signal.h>
#include <sys/wait.h>
#include <unistd.h>

#include <QDir>
#include <QProcess>
#include <random>

#include "core/book/book.h"
#include "made_session.h"

namespace dampwright {
namespace {

using testing::ElementsAre;
using testing::SizeIs;

TEST_F(ASession, AFirstStartHasNoJobAndSaysWhenTheBookIsRead) {
  Session fresh(folder.filePath("other.sqlite"), sampleRuns());
  QSignalSpy read(&fresh, &Session::bookRead);
  EXPECT_TRUE(fresh.busy());
  ASSERT_TRUE(QTest::qWaitFor([&] { return !fresh.busy(); }, patience));
  EXPECT_EQ(read.size(), 1);
  EXPECT_FALSE(fresh.hasJob());
  EXPECT_TRUE(fresh.recentJobs().empty());
}

TEST_F(ASession, ANewJobIsOpenAtOnceAndItsNumberFollows) {
  Job draft;
  draft.opened = "2031-05-06T07:08:09+02:00";
  session->startJob(draft);
  ASSERT_TRUE(session->hasJob());
  EXPECT_THAT(session->job().items, SizeIs(4));
  draft = session->job();
  draft.notes = "typed before the number was there";
  session->setJobDetails(draft);
  settle();
  EXPECT_EQ(session->job().number, "2031-0001");
  EXPECT_EQ(Book::open(book()).value().job("2031-0001").value(), session->job());
  ASSERT_THAT(session->recentJobs(), SizeIs(1));
  EXPECT_EQ(session->recentJobs()[0].number, "2031-0001");
}

TEST_F(ASession, ARestartBringsTheLastJobBackAndMeasuresIt) {
  startCar();
  drop({sample("rig_bench_1.json"), sample("limits_car.json"), sample("car_front_left.csv")},
       "front left");
  const Job before = session->job();
  const auto word = session->state({"front left", 0}).verdict->word;
  restart();
  ASSERT_TRUE(session->hasJob());
  EXPECT_EQ(session->job(), before);
  ASSERT_TRUE(session->state({"front left", 0}).verdict);
  EXPECT_EQ(session->state({"front left", 0}).verdict->word, word);
  EXPECT_EQ(session->recentJobs()[0].verdict, word);
  EXPECT_EQ(session->selected(), (PhaseKey{"front left", 0}));
}

TEST_F(ASession, AnotherJobCanBeOpenedAndAMissingOneIsSaid) {
  startCar();
  const QString first = QString::fromStdString(session->job().number);
  startCar();
  ASSERT_NE(QString::fromStdString(session->job().number), first);
  session->openJob(first);
  settle();
  EXPECT_EQ(QString::fromStdString(session->job().number), first);
  session->openJob("nothing");
  settle();
  EXPECT_THAT(problems(), ElementsAre("job-missing"));
  EXPECT_EQ(QString::fromStdString(session->job().number), first);
}

TEST_F(ASession, TheDemonstrationIsMadeOnceAndIsMarkedInvented) {
  session->openDemonstration();
  settle();
  ASSERT_TRUE(session->hasJob()) << testing::PrintToString(problems());
  EXPECT_TRUE(session->job().invented);
  EXPECT_EQ(session->state({"front left", 0}).verdict->word, VerdictWord::Pass);
  EXPECT_EQ(session->state({"rear left", 0}).verdict->word, VerdictWord::Fail);
  EXPECT_THAT(problems(), SizeIs(0));
  const std::string number = session->job().number;
  const std::size_t jobs = session->recentJobs().size();
  startCar();
  session->openDemonstration();
  settle();
  EXPECT_EQ(session->job().number, number);
  EXPECT_EQ(session->recentJobs().size(), jobs + 1) << "the car of before, and no second one";
}

TEST_F(ASession, WithoutSampleRunsTheDemonstrationSaysSo) {
  Session other(folder.filePath("other.sqlite"), folder.filePath("nothing here"));
  other.openDemonstration();
  ASSERT_TRUE(QTest::qWaitFor([&] { return !other.busy(); }, patience));
  ASSERT_THAT(other.dropProblems(), SizeIs(1));
  EXPECT_EQ(other.dropProblems()[0].error.code, "demonstration-missing");
}

TEST_F(ASession, TheBytesOfARunAreHandedOutAsTheyCame) {
  startCar();
  drop({sample("car_front_left.csv")}, "front left");
  QFile file(sample("car_front_left.csv"));
  ASSERT_TRUE(file.open(QIODevice::ReadOnly));
  const std::string& sha256 = session->job().items[0].phases[0].runs[0].sha256;
  EXPECT_TRUE(session->bytesOfRun(sha256).value() == file.readAll().toStdString());
  EXPECT_EQ(session->bytesOfRun("nothing").error().code, "run-file-missing");
}

TEST_F(ASession, WithoutABookEverythingIsKeptAndWrittenWhenItCanBe) {
  const QString late = folder.filePath("late");
  Session other(late + "/book.sqlite", sampleRuns());
  QSignalSpy trouble(&other, &Session::bookTrouble);
  Job draft;
  draft.customer = "A. Customer";
  other.startJob(draft);
  other.dropFiles({sample("car_front_left.csv")}, "front left");
  ASSERT_TRUE(QTest::qWaitFor([&] { return !other.busy(); }, patience));
  ASSERT_GE(trouble.size(), 1);
  EXPECT_FALSE(trouble[0][0].toString().isEmpty());
  EXPECT_TRUE(other.hasUnwritten());
  EXPECT_TRUE(other.state({"front left", 0}).measured) << "work goes on";
  EXPECT_TRUE(other.bytesOfRun(other.job().items[0].phases[0].runs[0].sha256));
  QDir().mkdir(late);
  ASSERT_TRUE(QTest::qWaitFor([&] { return !other.hasUnwritten(); }, patience));
  EXPECT_TRUE(trouble.back()[0].toString().isEmpty()) << "well again";
  const Book written = Book::open(late + "/book.sqlite").value();
  EXPECT_EQ(written.job(other.job().number).value(), other.job());
  EXPECT_TRUE(written.runFile(other.job().items[0].phases[0].runs[0].sha256));
}

TEST_F(ASession, AProgramKilledBetweenDropsLosesNoneThatWasConfirmed) {
  std::mt19937 random(20310508);  // any seed: the moments are those of the scheduler anyhow
  session.reset();
  for (int attempt = 0; attempt < 8; ++attempt) {
    const QString file = folder.filePath(QString("killed %1.sqlite").arg(attempt));
    QProcess child;
    child.setReadChannel(QProcess::StandardOutput);
    child.start("/proc/self/exe", {"--drop-into", file});
    ASSERT_TRUE(QTest::qWaitFor([&] { return child.canReadLine(); }, patience));
    QTest::qWait(static_cast<int>(random() % 1000));
    child.kill();
    child.waitForFinished();
    int confirmed = 0;
    while (child.canReadLine()) confirmed = child.readLine().trimmed().toInt();
    const Result<Book> left = Book::open(file);
    ASSERT_TRUE(left) << left.error().code;
    const auto jobs = left.value().recentJobs(10).value();
    ASSERT_THAT(jobs, SizeIs(1));
    const Job job = left.value().job(jobs[0].number).value();
    int runs = 0;
    for (const JobItem& item : job.items) {
      for (const JobPhase& phase : item.phases) {
        for (const JobRun& run : phase.runs) {
          EXPECT_TRUE(left.value().runFile(run.sha256)) << run.file;
          ++runs;
        }
      }
    }
    EXPECT_GE(runs, confirmed);
  }
}

}  // namespace
}  // namespace dampwright
