// SPDX-License-Identifier: GPL-3.0-or-later
// The world goes wrong while a book is written: killed programs, full disks, missing rights,
// others.
#include <gmock/gmock.h>
#include <signal.h>
#include <sys/stat.h>

#include <QFile>
#include <QTemporaryDir>
#include <chrono>
#include <random>
#include <thread>

#include "children.h"
#include "core/book/book.h"
#include "core/book/schema.h"
#include "made_jobs.h"

namespace dampwright {
namespace {

using testing::ElementsAre;

class Faults : public testing::Test {
 protected:
  QString file() const { return folder.filePath("book.sqlite"); }
  std::string path() const { return file().toStdString(); }

  QTemporaryDir folder;
};

TEST_F(Faults, AProgramKilledAtAnyMomentLosesNothingThatWasConfirmed) {
  std::mt19937 random(20310506);  // any seed: the moments are those of the scheduler anyhow
  for (int attempt = 0; attempt < 20; ++attempt) {
    const Child child = startChild("write", path());
    std::string line = lineOf(child);  // it writes; the kill falls somewhere in what comes next
    std::this_thread::sleep_for(std::chrono::microseconds(random() % 40'000));
    kill(child.pid, SIGKILL);
    for (const std::string& more : linesOf(child)) line = more;
    const int confirmed = std::stoi(line);
    const Result<Book> book = Book::open(file());
    ASSERT_TRUE(book) << book.error().code;
    const Result<Job> job = book.value().job("2031-0001");
    ASSERT_TRUE(job) << job.error().code;
    const int kept = std::stoi(job.value().notes);
    EXPECT_TRUE(kept == confirmed || kept == confirmed + 1) << kept << " after " << confirmed;
    const std::string& sha256 = job.value().items[0].phases[0].runs[0].sha256;
    const Result<std::string> bytes = book.value().runFile(sha256);
    ASSERT_TRUE(bytes) << bytes.error().code;
    EXPECT_TRUE(bytes.value() == bytesOf(kept)) << "no half of a drop";
  }
}

TEST_F(Faults, AProgramKilledWhileItMakesTheBookLeavesOneThatOpens) {
  std::mt19937 random(20310507);
  for (int attempt = 0; attempt < 10; ++attempt) {
    const Child child = startChild("write", path());
    std::this_thread::sleep_for(std::chrono::microseconds(random() % 60'000));
    kill(child.pid, SIGKILL);
    linesOf(child);
    const Result<Book> book = Book::open(file());
    ASSERT_TRUE(book) << book.error().code;
    QFile::remove(file());
  }
}

TEST_F(Faults, WithoutTheRightToWriteABookIsReadAndSaysSo) {
  ASSERT_TRUE(Book::open(file()).value().saveJob(madeJob("2031-0001"), "new job"));
  ASSERT_EQ(chmod(path().c_str(), 0444), 0);
  ASSERT_EQ(chmod(folder.path().toStdString().c_str(), 0555), 0);
  EXPECT_THAT(linesOf(startChild("write as nobody", path())),
              ElementsAre("opened", "book-read-only", "read"));
}

TEST_F(Faults, AFolderWithoutTheRightToWriteHoldsNoNewBook) {
  ASSERT_EQ(chmod(folder.path().toStdString().c_str(), 0555), 0);
  EXPECT_THAT(linesOf(startChild("write as nobody", path())), ElementsAre("book-cannot-open"));
}

TEST_F(Faults, AFullDiskIsSaidAndNothingHalfStays) {
  Connection connection = Connection::open(file()).value();
  ASSERT_TRUE(migrate(connection));
  // A limit of the file's pages stands for the end of the disk: SQLite reports both the same way.
  ASSERT_TRUE(connection.run("PRAGMA max_page_count = 200"));
  Book book = Book::open(std::move(connection)).value();
  ASSERT_TRUE(book.saveJob(madeJob("2031-0001"), "new job"));
  const std::string bytes = bytesOf(8, 5'000'000);
  const RunBytes run = runOf(bytes);
  const Job dropped = jobWithRun("2031-0001", "dropped", bytes);
  EXPECT_EQ(book.saveJob(dropped, "drop", std::span(&run, 1)).error().code, "book-disk-full");
  EXPECT_EQ(book.job("2031-0001").value(), madeJob("2031-0001"));
  EXPECT_EQ(book.runFile(run.sha256).error().code, "run-file-missing");
  Book roomAgain = Book::open(file()).value();
  EXPECT_TRUE(roomAgain.saveJob(dropped, "drop", std::span(&run, 1)));
  EXPECT_TRUE(roomAgain.runFile(run.sha256));
}

TEST_F(Faults, ABookThatAnotherProgramHoldsIsSaidAfterSomePatience) {
  Book book = Book::open(file()).value();
  const Connection other = Connection::open(file()).value();
  ASSERT_TRUE(other.run("BEGIN EXCLUSIVE"));
  EXPECT_EQ(book.saveJob(madeJob("2031-0001"), "new job").error().code, "book-locked");
  ASSERT_TRUE(other.run("COMMIT"));
  EXPECT_TRUE(book.saveJob(madeJob("2031-0001"), "new job"));
}

TEST_F(Faults, TwoWritersLoseNothing) {
  ASSERT_TRUE(Book::open(file()));
  const auto write = [this](const std::string& name) {
    Book book = Book::open(file()).value();
    for (int i = 0; i < 30; ++i) {
      const Result<std::string> number = book.addJob(madeJob(""), name);
      ASSERT_TRUE(number) << number.error().code;
    }
  };
  std::thread first(write, "first"), second(write, "second");
  first.join();
  second.join();
  EXPECT_EQ(Book::open(file()).value().recentJobs(100).value().size(), 60u);
}

}  // namespace
}  // namespace dampwright
