// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/book/book_error.h"

#include <string>

namespace dampwright {

namespace {

// Result codes of SQLite; source: https://www.sqlite.org/rescode.html. The low byte is the primary
// code, the rest says more about it.
std::string codeOf(int sqliteCode) {
  switch (sqliteCode & 0xff) {
    case 5: /* SQLITE_BUSY */
    case 6 /* SQLITE_LOCKED */:
      return "book-locked";
    case 8 /* SQLITE_READONLY */:
      return "book-read-only";
    case 13 /* SQLITE_FULL */:
      return "book-disk-full";
    case 11: /* SQLITE_CORRUPT */
    case 26 /* SQLITE_NOTADB */:
      return "book-damaged";
    case 14 /* SQLITE_CANTOPEN */:
      return "book-cannot-open";
    default:
      return "book-cannot-write";
  }
}

}  // namespace

Error bookError(const QSqlError& error, const QString& file) {
  const std::string reason = error.databaseText().toStdString();
  return {codeOf(error.nativeErrorCode().toInt()), {{"reason", reason}}, {file.toStdString()}};
}

}  // namespace dampwright
