// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/book/schema.h"

#include <gtest/gtest.h>

#include <QFile>
#include <QTemporaryDir>

#include "core/book/book.h"

namespace dampwright {
namespace {

class Schema : public testing::Test {
 protected:
  QString file() const { return folder.filePath("book.sqlite"); }
  QByteArray contents() const {
    QFile book(file());
    EXPECT_TRUE(book.open(QIODevice::ReadOnly));
    return book.readAll();
  }
  void write(const QByteArray& bytes) const {
    QFile book(file());
    ASSERT_TRUE(book.open(QIODevice::WriteOnly));
    book.write(bytes);
  }

  QTemporaryDir folder;
};

TEST_F(Schema, AnEmptyFileBecomesABookOfTheNewestVersion) {
  const Connection connection = Connection::open(file()).value();
  EXPECT_EQ(schemaOf(connection).value(), 0);
  ASSERT_TRUE(migrate(connection));
  EXPECT_EQ(schemaOf(connection).value(), newestSchema());
  ASSERT_TRUE(migrate(connection)) << "once more changes nothing";
}

TEST_F(Schema, ABookOfTheFirstVersionIsBroughtUpToDateWithAllThatItHolds) {
  {
    Book book = Book::open(file()).value();
    ASSERT_TRUE(book.setSetting("last job", "2031-0001"));
    // What version 2 has added is taken away again.
    const Connection connection = Connection::open(file()).value();
    ASSERT_TRUE(connection.run("DROP TABLE offered_files"));
    ASSERT_TRUE(connection.run("DELETE FROM schema_versions WHERE version > 1"));
    ASSERT_EQ(schemaOf(connection).value(), 1);
  }
  Book book = Book::open(file()).value();
  EXPECT_EQ(book.setting("last job").value(), "2031-0001");
  EXPECT_FALSE(book.wasOffered("ab").value());
  EXPECT_EQ(schemaOf(Connection::open(file()).value()).value(), newestSchema());
}

TEST_F(Schema, EveryConnectionKeepsForeignKeysAndSyncsEveryCommit) {
  const Connection connection = Connection::open(file()).value();
  for (const auto& [pragma, value] : {std::pair("foreign_keys", 1), std::pair("synchronous", 2)}) {
    QSqlQuery query = connection.run(QString("PRAGMA %1").arg(pragma)).value();
    ASSERT_TRUE(query.next());
    EXPECT_EQ(query.value(0).toInt(), value) << pragma;
  }
}

TEST_F(Schema, ABookOfANewerProgramIsLeftAsItIs) {
  {
    ASSERT_TRUE(Book::open(file()));
    const Connection connection = Connection::open(file()).value();
    ASSERT_TRUE(connection.run("INSERT INTO schema_versions VALUES (?, '')", {newestSchema() + 1}));
  }
  const QByteArray before = contents();
  const Result<Book> book = Book::open(file());
  ASSERT_FALSE(book);
  EXPECT_EQ(book.error().code, "book-newer-than-program");
  EXPECT_EQ(contents(), before);
}

TEST_F(Schema, SomebodyElsesDatabaseIsLeftAsItIs) {
  ASSERT_TRUE(Connection::open(file()).value().run("CREATE TABLE recipes (name TEXT)"));
  const QByteArray before = contents();
  EXPECT_EQ(Book::open(file()).error().code, "book-foreign");
  EXPECT_EQ(contents(), before);
}

TEST_F(Schema, AFileThatIsNoDatabaseIsLeftAsItIs) {
  write(QByteArray(10'000, 'x'));
  EXPECT_EQ(Book::open(file()).error().code, "book-damaged");
  EXPECT_EQ(contents(), QByteArray(10'000, 'x'));
}

TEST_F(Schema, ABookWithDamagedTablesIsLeftAsItIs) {
  ASSERT_TRUE(Book::open(file()));
  QByteArray damaged = contents();
  // The first page behind the header of 100 bytes holds the list of tables.
  damaged.replace(100, 3000, QByteArray(3000, '\x7f'));
  write(damaged);
  EXPECT_EQ(Book::open(file()).error().code, "book-damaged");
  EXPECT_EQ(contents(), damaged);
}

TEST_F(Schema, AFolderThatIsNotThereIsSaid) {
  EXPECT_EQ(Book::open(folder.filePath("no/such/folder/book.sqlite")).error().code,
            "book-cannot-open");
}

}  // namespace
}  // namespace dampwright
