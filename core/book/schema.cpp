// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/book/schema.h"

#include <QDateTime>
#include <vector>

namespace dampwright {

namespace {

// A migration is never changed once it was released; what comes later is a new one behind it.
// {bytes} and {row number} are the engine's words. Dates are ISO 8601 text, flags are 0 and 1.
const QStringList version1 = {
    R"(CREATE TABLE jobs (
            number TEXT PRIMARY KEY,
            customer TEXT NOT NULL,
            vehicle TEXT NOT NULL,
            plate TEXT NOT NULL,
            technician TEXT NOT NULL,
            opened TEXT NOT NULL,
            changed TEXT NOT NULL,
            invented INTEGER NOT NULL,
            verdict TEXT,
            document TEXT NOT NULL))",
    "CREATE INDEX jobs_by_change ON jobs (changed)",
    R"(CREATE TABLE job_dampers (
            job TEXT NOT NULL REFERENCES jobs (number),
            corner TEXT NOT NULL,
            serial TEXT NOT NULL,
            serial_folded TEXT NOT NULL,
            part_number TEXT NOT NULL,
            document TEXT NOT NULL,
            PRIMARY KEY (job, corner)))",
    "CREATE INDEX job_dampers_by_serial ON job_dampers (serial_folded)",
    R"(CREATE TABLE run_files (
            sha256 TEXT PRIMARY KEY,
            name TEXT NOT NULL,
            bytes BIGINT NOT NULL,
            chunks INTEGER NOT NULL,
            stored TEXT NOT NULL))",
    R"(CREATE TABLE run_file_chunks (
            sha256 TEXT NOT NULL REFERENCES run_files (sha256),
            number INTEGER NOT NULL,
            data {bytes} NOT NULL,
            PRIMARY KEY (sha256, number)))",
    R"(CREATE TABLE job_runs (
            job TEXT NOT NULL REFERENCES jobs (number),
            corner TEXT NOT NULL,
            phase INTEGER NOT NULL,
            run INTEGER NOT NULL,
            sha256 TEXT NOT NULL REFERENCES run_files (sha256),
            PRIMARY KEY (job, corner, phase, run)))",
    "CREATE INDEX job_runs_by_file ON job_runs (sha256)",
    R"(CREATE TABLE rig_profiles (
            name TEXT PRIMARY KEY,
            signature TEXT NOT NULL,
            changed TEXT NOT NULL,
            document TEXT NOT NULL))",
    "CREATE INDEX rig_profiles_by_signature ON rig_profiles (signature)",
    R"(CREATE TABLE limit_sheets (
            title TEXT NOT NULL,
            revision TEXT NOT NULL,
            source TEXT NOT NULL,
            added TEXT NOT NULL,
            document TEXT NOT NULL,
            PRIMARY KEY (title, revision)))",
    "CREATE TABLE settings (name TEXT PRIMARY KEY, value TEXT NOT NULL)",
    R"(CREATE TABLE journal (
            entry {row number},
            at TEXT NOT NULL,
            program TEXT NOT NULL,
            subject TEXT NOT NULL,
            key TEXT NOT NULL,
            what TEXT NOT NULL,
            document TEXT NOT NULL))",
    "CREATE INDEX journal_by_subject ON journal (subject, key)"};

// Files of a watched rig folder that somebody has taken or turned down.
const QStringList version2 = {
    R"(CREATE TABLE offered_files (
            sha256 TEXT PRIMARY KEY,
            name TEXT NOT NULL,
            offered TEXT NOT NULL))"};

const std::vector<QStringList>& migrations() {
  static const std::vector<QStringList> list = {version1, version2};
  return list;
}

Result<Done> step(const Connection& connection, int version) {
  for (QString sql : migrations()[static_cast<std::size_t>(version - 1)]) {
    sql.replace("{bytes}", connection.words().bytes);
    sql.replace("{row number}", connection.words().rowNumber);
    if (Result<QSqlQuery> done = connection.run(sql); !done) return done.error();
  }
  const QString now = QDateTime::currentDateTimeUtc().toString(Qt::ISODateWithMs);
  Result<QSqlQuery> noted = connection.run(
      "INSERT INTO schema_versions (version, applied) VALUES (?, ?)", {version, now});
  if (!noted) return noted.error();
  return Done{};
}

// The step that is next, decided inside the transaction: another program may have been faster.
Result<Done> nextStep(const Connection& connection) {
  if (connection.tables().isEmpty()) {
    Result<QSqlQuery> made = connection.run(
        "CREATE TABLE schema_versions (version INTEGER PRIMARY KEY, applied TEXT NOT NULL)");
    if (!made) return made.error();
  }
  const Result<int> version = schemaOf(connection);
  if (!version) return version.error();
  if (version.value() >= newestSchema()) return Done{};
  return step(connection, version.value() + 1);
}

}  // namespace

int newestSchema() { return static_cast<int>(migrations().size()); }

Result<int> schemaOf(const Connection& connection) {
  const QStringList tables = connection.tables();
  if (tables.isEmpty()) return 0;
  if (!tables.contains("schema_versions")) {
    return Error{"book-foreign", {}, {connection.file().toStdString()}};
  }
  Result<QSqlQuery> answer = connection.run("SELECT MAX(version) FROM schema_versions");
  if (!answer) return answer.error();
  return answer.value().next() ? answer.value().value(0).toInt() : 0;
}

Result<Done> migrate(const Connection& connection) {
  for (;;) {
    const Result<int> version = schemaOf(connection);
    if (!version) return version.error();
    if (version.value() == newestSchema()) return Done{};
    if (version.value() > newestSchema()) {
      return Error{"book-newer-than-program",
                   {{"book", double(version.value()), Quantity::Count},
                    {"program", double(newestSchema()), Quantity::Count}},
                   {connection.file().toStdString()}};
    }
    Result<Done> done = connection.transaction([&] { return nextStep(connection); });
    if (!done) return done.error();
  }
}

}  // namespace dampwright
