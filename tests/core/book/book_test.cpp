// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/book/book.h"

#include <gmock/gmock.h>

#include <QTemporaryDir>

#include "made_jobs.h"

namespace dampwright {
namespace {

class Books : public testing::Test {
 protected:
  QString file() const { return folder.filePath("book.sqlite"); }
  Book open() const {
    Result<Book> book = Book::open(file());
    EXPECT_TRUE(book) << book.error().code;
    return std::move(book).value();
  }

  QTemporaryDir folder;
};

TEST_F(Books, AJobComesBackAsItWasSaved) {
  const std::string bytes = bytesOf(1);
  const RunBytes run = runOf(bytes);
  const Job job = jobWithRun("2031-0001", "n\u00f6tes", bytes);
  ASSERT_TRUE(open().saveJob(job, "new job", std::span(&run, 1)));
  const Result<Job> back = open().job("2031-0001");
  ASSERT_TRUE(back) << back.error().code;
  EXPECT_EQ(back.value(), job);
  EXPECT_EQ(open().runFile(run.sha256).value(), bytes);
}

TEST_F(Books, ANewJobGetsTheNextFreeNumberOfItsYear) {
  Book book = open();
  Job job = madeJob("");
  EXPECT_EQ(book.addJob(job, "new job").value(), "2031-0001");
  EXPECT_EQ(book.addJob(job, "new job").value(), "2031-0002");
  job.number = "2031-0002";
  EXPECT_EQ(book.addJob(job, "new job").value(), "2031-0003")
      << "a taken number is not overwritten";
  job.number = "shelf 9";
  EXPECT_EQ(book.addJob(job, "new job").value(), "shelf 9");
  job.number = "2031-draft";
  EXPECT_EQ(book.addJob(job, "new job").value(), "2031-draft");
  job = madeJob("2031-9999");
  EXPECT_EQ(book.addJob(job, "new job").value(), "2031-9999");
  job.number = "";
  EXPECT_EQ(book.addJob(job, "new job").value(), "2031-10000");
  job.opened = "2032-01-01T00:00:00+00:00";
  EXPECT_EQ(book.addJob(job, "new job").value(), "2032-0001");
}

TEST_F(Books, AFileIsKnownOnceItWasOfferedOrKept) {
  const std::string bytes = bytesOf(1);
  const RunBytes run = runOf(bytes);
  EXPECT_FALSE(open().wasOffered(run.sha256).value());
  ASSERT_TRUE(open().saveJob(jobWithRun("2031-0001", "", bytes), "new job", std::span(&run, 1)));
  EXPECT_TRUE(open().wasOffered(run.sha256).value());
  EXPECT_FALSE(open().wasOffered("ab").value());
  ASSERT_TRUE(open().noteOffered("ab", "run.csv"));
  ASSERT_TRUE(open().noteOffered("ab", "copy.csv")) << "twice is no error";
  EXPECT_TRUE(open().wasOffered("ab").value());
}

TEST_F(Books, TheJournalKeepsEveryStateInOrder) {
  Book book = open();
  Job job = madeJob("2031-0001");
  ASSERT_TRUE(book.saveJob(job, "new job"));
  job.notes = "changed";
  ASSERT_TRUE(book.saveJob(job, "notes"));
  job.notes = "";
  ASSERT_TRUE(book.saveJob(job, "undone: notes"));
  const auto entries = book.journal("job", "2031-0001").value();
  ASSERT_EQ(entries.size(), 3u);
  EXPECT_EQ(entries[1].what, "notes");
  EXPECT_NE(entries[1].document.find("\"changed\""), std::string::npos);
  EXPECT_EQ(entries[2].what, "undone: notes");
  EXPECT_EQ(entries[0].document, entries[2].document);
  EXPECT_LE(entries[0].at, entries[2].at);
}

TEST_F(Books, RecentJobsStandInTheOrderOfTheirLastChange) {
  Book book = open();
  ASSERT_TRUE(book.saveJob(madeJob("a"), "new job"));
  ASSERT_TRUE(book.saveJob(madeJob("b"), "new job"));
  ASSERT_TRUE(book.saveJob(madeJob("c"), "new job"));
  Job again = madeJob("a");
  again.customer = "B. Customer";
  // A later millisecond: that is how fine the book tells times apart.
  const auto before = book.journal("job", "c").value().back().at;
  do {
    ASSERT_TRUE(book.saveJob(again, "customer"));
  } while (book.journal("job", "a").value().back().at <= before);
  ASSERT_TRUE(book.setVerdict("a", VerdictWord::TooCloseToCall));
  const std::vector<JobSummary> jobs = book.recentJobs(2).value();
  ASSERT_EQ(jobs.size(), 2u);
  EXPECT_EQ(jobs[0].number, "a");
  EXPECT_EQ(jobs[0].customer, "B. Customer");
  EXPECT_EQ(jobs[0].verdict, VerdictWord::TooCloseToCall);
  EXPECT_EQ(jobs[0].plate, "AB 123");
  EXPECT_EQ(jobs[1].verdict, std::nullopt);
}

TEST_F(Books, AJobThatIsNotThereIsAnError) {
  EXPECT_EQ(open().job("nothing").error().code, "job-missing");
}

TEST_F(Books, ARunThatWasNeverStoredKeepsTheWholeSaveOut) {
  Book book = open();
  ASSERT_TRUE(book.saveJob(madeJob("2031-0001"), "new job"));
  const Result<Done> saved = book.saveJob(jobWithRun("2031-0001", "new", "bytes"), "drop");
  ASSERT_FALSE(saved);
  EXPECT_EQ(saved.error().code, "book-cannot-write");
  EXPECT_EQ(book.job("2031-0001").value(), madeJob("2031-0001"));
  EXPECT_EQ(book.journal("job", "2031-0001").value().size(), 1u);
}

TEST_F(Books, ADamperIsFoundAgainByItsSerialWithItsNewestCard) {
  Book book = open();
  EXPECT_EQ(book.damperCard("SN-0042").value(), std::nullopt);
  Job job = madeJob("2031-0001");
  ASSERT_TRUE(book.saveJob(job, "new job"));
  ASSERT_TRUE(book.damperCard(" sN-0042 ").value().has_value());
  job.items[0].damper.partNumber = "P 8";
  ASSERT_TRUE(book.saveJob(job, "card"));
  EXPECT_EQ(book.damperCard("sn-0042").value()->partNumber, "P 8");
  EXPECT_EQ(book.damperCard("").value(), std::nullopt) << "no serial is no damper";
}

TEST_F(Books, RigProfilesAreReplacedUnderTheirName) {
  Book book = open();
  RigProfile rig;
  rig.name = "bench 1";
  rig.signature = "Time [s]; Load [N]";
  ASSERT_TRUE(book.saveRigProfile(rig, "new"));
  rig.displacementPositive = Direction::Rebound;
  ASSERT_TRUE(book.saveRigProfile(rig, "direction"));
  EXPECT_EQ(open().rigProfiles().value(), std::vector{rig});
  ASSERT_TRUE(book.removeRigProfile("bench 1", "undone"));
  EXPECT_TRUE(open().rigProfiles().value().empty());
  EXPECT_EQ(book.journal("rig", "bench 1").value().size(), 3u);
}

Limits madeLimits(const std::string& revision, double most) {
  Limits limits;
  limits.title = "Estate car, front";
  limits.revision = revision;
  Check check;
  check.check = "gas force";
  check.max = most;
  limits.checks = {check};
  return limits;
}

TEST_F(Books, ALimitSheetIsNeverChanged) {
  Book book = open();
  ASSERT_TRUE(book.addLimits(madeLimits("A", 200)));
  ASSERT_TRUE(book.addLimits(madeLimits("A", 200))) << "the same again is no change";
  EXPECT_EQ(book.addLimits(madeLimits("A", 250)).error().code, "limits-revision-taken");
  EXPECT_EQ(book.limitSheets().value(), std::vector{madeLimits("A", 200)});
}

TEST_F(Books, TheNewestRevisionOfALimitSheetCounts) {
  Book book = open();
  ASSERT_TRUE(book.addLimits(madeLimits("A", 200)));
  ASSERT_TRUE(book.addLimits(madeLimits("B", 250)));
  EXPECT_EQ(book.limitSheets().value(), std::vector{madeLimits("B", 250)});
}

TEST_F(Books, ASettingIsKept) {
  ASSERT_TRUE(open().setSetting("last job", "2031-0001"));
  ASSERT_TRUE(open().setSetting("last job", "2031-0002"));
  EXPECT_EQ(open().setting("last job").value(), "2031-0002");
  EXPECT_EQ(open().setting("never set").value(), "");
}

}  // namespace
}  // namespace dampwright
