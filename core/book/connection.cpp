// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/book/connection.h"

#include <QSqlError>
#include <QUuid>
#include <utility>

#include "core/book/book_error.h"

namespace dampwright {

namespace {

const char* const patience = "QSQLITE_BUSY_TIMEOUT=5000";  // ms, then book-locked

EngineWords sqliteWords() {
  // Immediate: the right to write is taken at the start, where waiting for it is possible.
  return {"QSQLITE", "BEGIN IMMEDIATE", "BLOB", "INTEGER PRIMARY KEY AUTOINCREMENT"};
}

Result<QString> firstWord(Result<QSqlQuery> query) {
  if (!query) return query.error();
  QSqlQuery answer = std::move(query).value();
  return answer.next() ? answer.value(0).toString() : QString();
}

}  // namespace

Connection::Connection(QString name, QString file)
    : name_(std::move(name)), file_(std::move(file)), words_(sqliteWords()) {}

Connection::Connection(Connection&& other) noexcept
    : name_(std::exchange(other.name_, {})),
      file_(std::move(other.file_)),
      words_(std::move(other.words_)) {}

Connection::~Connection() {
  if (name_.isEmpty()) return;
  database().close();
  QSqlDatabase::removeDatabase(name_);
}

QSqlDatabase Connection::database() const { return QSqlDatabase::database(name_, false); }

QStringList Connection::tables() const { return database().tables(); }

Result<Connection> Connection::open(const QString& file) {
  const QString name = "book " + QUuid::createUuid().toString(QUuid::WithoutBraces);
  Connection connection(name, file);
  QSqlDatabase database = QSqlDatabase::addDatabase(connection.words_.driver, name);
  database.setDatabaseName(file);
  database.setConnectOptions(patience);
  if (!database.open()) return bookError(database.lastError(), file);
  if (Result<Done> ready = connection.prepare(); !ready) return ready.error();
  return connection;
}

Result<Done> Connection::prepare() const {
  // Without these an SQLite connection keeps no foreign keys; the mode that keeps one file, and no
  // shared memory, is the one that also stands a network folder.
  const std::pair<const char*, QStringList> wanted[] = {
      {"journal_mode", {"delete", "wal"}}, {"foreign_keys", {"1"}}, {"synchronous", {"2"}}};
  for (const char* sql : {"PRAGMA foreign_keys = ON", "PRAGMA synchronous = FULL"}) {
    if (Result<QSqlQuery> done = run(sql); !done) return done.error();
  }
  for (const auto& [name, allowed] : wanted) {
    const Result<QString> mode = firstWord(run(QString("PRAGMA %1").arg(name)));
    if (!mode) return mode.error();
    if (!allowed.contains(mode.value())) {
      return Error{"book-cannot-open",
                   {{"reason", QString("%1 is %2").arg(name, mode.value()).toStdString()}},
                   {file_.toStdString()}};
    }
  }
  return Done{};
}

Result<QSqlQuery> Connection::run(const QString& sql, const QVariantList& values) const {
  QSqlQuery query(database());
  query.setForwardOnly(true);
  if (!query.prepare(sql)) return bookError(query.lastError(), file_);
  for (const QVariant& value : values) query.addBindValue(value);
  if (!query.exec()) return bookError(query.lastError(), file_);
  return query;
}

Result<Done> Connection::transaction(const std::function<Result<Done>()>& work) const {
  if (Result<QSqlQuery> begun = run(words_.begin); !begun) return begun.error();
  Result<Done> done = work();
  if (done) {
    const Result<QSqlQuery> committed = run("COMMIT");
    if (committed) return done;
    done = committed.error();
  }
  // A failed rollback means that the engine has rolled back already.
  (void)run("ROLLBACK");
  return done;
}

}  // namespace dampwright
