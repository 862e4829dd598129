// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/book/book.h"

#include <QDateTime>

#include "core/book/schema.h"
#include "core/book/text_columns.h"

namespace dampwright {

Result<Book> Book::open(const QString& file) {
  Result<Connection> connection = Connection::open(file);
  if (!connection) return connection.error();
  return open(std::move(connection).value());
}

Result<Book> Book::open(Connection connection) {
  if (Result<Done> ready = migrate(connection); !ready) return ready.error();
  return Book(std::move(connection));
}

Result<Done> Book::keep(std::string_view subject,
                        std::string_view key,
                        std::string_view what,
                        const std::string& document) const {
  const QString now = QDateTime::currentDateTimeUtc().toString(Qt::ISODateWithMs);
  Result<QSqlQuery> noted = connection_.run(
      "INSERT INTO journal (at, program, subject, key, what, document) VALUES (?, ?, ?, ?, ?, ?)",
      {now, DAMPWRIGHT_VERSION, text(subject), text(key), text(what), text(document)});
  if (!noted) return noted.error();
  return Done{};
}

Result<Done> Book::setSetting(std::string_view name, std::string_view value) {
  Result<QSqlQuery> written = connection_.run(
      "INSERT INTO settings (name, value) VALUES (?, ?) "
      "ON CONFLICT (name) DO UPDATE SET value = excluded.value",
      {text(name), text(value)});
  if (!written) return written.error();
  return Done{};
}

Result<std::string> Book::setting(std::string_view name) const {
  Result<QSqlQuery> row =
      connection_.run("SELECT value FROM settings WHERE name = ?", {text(name)});
  if (!row) return row.error();
  return row.value().next() ? column(row.value(), 0) : std::string();
}

Result<std::string> Book::runFile(std::string_view sha256) const {
  return readRunFile(connection_, sha256);
}

Result<std::vector<JournalEntry>> Book::journal(std::string_view subject,
                                                std::string_view key) const {
  Result<QSqlQuery> rows = connection_.run(
      "SELECT at, program, what, document FROM journal WHERE subject = ? AND key = ? "
      "ORDER BY entry",
      {text(subject), text(key)});
  if (!rows) return rows.error();
  std::vector<JournalEntry> entries;
  while (rows.value().next()) {
    const QSqlQuery& row = rows.value();
    entries.push_back({column(row, 0),
                       column(row, 1),
                       std::string(subject),
                       std::string(key),
                       column(row, 2),
                       column(row, 3)});
  }
  return entries;
}

}  // namespace dampwright
