// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/book/run_bytes.h"

#include <gtest/gtest.h>

#include <QTemporaryDir>

#include "core/base/sha256.h"
#include "made_jobs.h"

namespace dampwright {
namespace {

class RunBytesInABook : public testing::Test {
 protected:
  void store(const std::string& bytes) {
    const RunBytes run = runOf(bytes);
    ASSERT_TRUE(Book::open(file()).value().saveJob(madeJob("1"), "drop", std::span(&run, 1)));
  }
  Result<std::string> read(const std::string& bytes) {
    return Book::open(file()).value().runFile(sha256Hex(bytes));
  }
  Connection connection() const { return Connection::open(file()).value(); }
  QString file() const { return folder.filePath("book.sqlite"); }
  int count(const QString& table) const {
    const Connection books = connection();
    QSqlQuery query = books.run("SELECT COUNT(*) FROM " + table).value();
    query.next();
    return query.value(0).toInt();
  }

  QTemporaryDir folder;
};

TEST_F(RunBytesInABook, AFileOfSeveralChunksComesBackByteForByte) {
  const std::string bytes = bytesOf(3, 9'000'001);
  store(bytes);
  EXPECT_EQ(count("run_file_chunks"), 5);  // of 2 MB, the last of 1 000 001 bytes
  ASSERT_TRUE(read(bytes));
  EXPECT_TRUE(read(bytes).value() == bytes);
}

TEST_F(RunBytesInABook, AnEmptyFileComesBackEmpty) {
  store("");
  EXPECT_EQ(read("").value(), "");
}

TEST_F(RunBytesInABook, TheSameBytesAreKeptOnce) {
  store(bytesOf(4));
  store(bytesOf(4));
  EXPECT_EQ(count("run_files"), 1);
  EXPECT_EQ(count("run_file_chunks"), 1);
}

TEST_F(RunBytesInABook, AMissingFileIsAnError) {
  store("a");
  EXPECT_EQ(read("b").error().code, "run-file-missing");
}

TEST_F(RunBytesInABook, OneFlippedBitIsNoticed) {
  const std::string bytes = bytesOf(5);
  store(bytes);
  {
    const Connection books = connection();
    QSqlQuery row = books.run("SELECT data FROM run_file_chunks").value();
    row.next();
    QByteArray data = row.value(0).toByteArray();
    row.finish();
    data[data.size() / 2] = static_cast<char>(data[data.size() / 2] ^ 1);
    ASSERT_TRUE(books.run("UPDATE run_file_chunks SET data = ?", {data}));
  }
  EXPECT_EQ(read(bytes).error().code, "run-file-damaged");
}

TEST_F(RunBytesInABook, ALostChunkIsNoticed) {
  const std::string bytes = bytesOf(6, 5'000'000);
  store(bytes);
  ASSERT_TRUE(connection().run("DELETE FROM run_file_chunks WHERE number = 1"));
  EXPECT_EQ(read(bytes).error().code, "run-file-damaged");
}

TEST_F(RunBytesInABook, ADamagedLengthIsNoticedBeforeMemoryIsAskedFor) {
  const std::string bytes = bytesOf(7);
  store(bytes);
  const QByteArray huge("\xff\xff\xff\xff nonsense", 13);
  ASSERT_TRUE(connection().run("UPDATE run_file_chunks SET data = ?", {huge}));
  EXPECT_EQ(read(bytes).error().code, "run-file-damaged");
}

}  // namespace
}  // namespace dampwright
