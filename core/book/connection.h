// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QSqlDatabase>
#include <QSqlQuery>
#include <QString>
#include <QVariant>
#include <functional>

#include "core/base/result.h"

namespace dampwright {

/// The words in which database engines differ; all other SQL of the book is common to them.
struct EngineWords {
  QString driver;     ///< of Qt SQL
  QString begin;      ///< starts a transaction that may write
  QString bytes;      ///< type of a column of bytes
  QString rowNumber;  ///< type of a primary key that counts by itself
};

/// A database connection that belongs to the thread that opened it.
class Connection {
 public:
  /// Opens or creates an SQLite file: foreign keys on, every commit synced to the disk, 5 s of
  /// patience with other programs. Errors: book-cannot-open, book-damaged, book-locked.
  static Result<Connection> open(const QString& file);
  ~Connection();
  Connection(Connection&& other) noexcept;
  Connection(const Connection&) = delete;
  Connection& operator=(const Connection&) = delete;
  Connection& operator=(Connection&&) = delete;

  const EngineWords& words() const { return words_; }
  const QString& file() const { return file_; }
  QStringList tables() const;

  /// One statement; every ? takes the next of `values`. Errors: those of book_error.h.
  Result<QSqlQuery> run(const QString& sql, const QVariantList& values = {}) const;

  /// All of `work` or nothing of it. Returns what stopped it.
  Result<Done> transaction(const std::function<Result<Done>()>& work) const;

 private:
  Connection(QString name, QString file);
  Result<Done> prepare() const;
  QSqlDatabase database() const;

  QString name_, file_;
  EngineWords words_;
};

}  // namespace dampwright
