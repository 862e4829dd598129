// SPDX-License-Identifier: GPL-3.0-or-later
#include <QDateTime>
#include <algorithm>
#include <array>
#include <charconv>
#include <utility>

#include "core/book/book.h"
#include "core/book/text_columns.h"
#include "core/records/documents.h"

namespace dampwright {

namespace {

constexpr std::array<std::pair<VerdictWord, const char*>, 4> verdictWords = {
    {{VerdictWord::Pass, "pass"},
     {VerdictWord::Fail, "fail"},
     {VerdictWord::TooCloseToCall, "too close to call"},
     {VerdictWord::NotTested, "not tested"}}};

QVariant verdictColumn(std::optional<VerdictWord> verdict) {
  for (const auto& [word, name] : verdictWords) {
    if (verdict == word) return QString(name);
  }
  return QVariant(QMetaType::fromType<QString>());  // NULL
}

std::optional<VerdictWord> verdictOf(const std::string& column) {
  for (const auto& [word, name] : verdictWords) {
    if (column == name) return word;
  }
  return std::nullopt;
}

std::string folded(std::string_view serial) {
  return text(serial).trimmed().toCaseFolded().toStdString();
}

// The part of a number behind the year, 0 where it is no count.
int countOf(std::string_view number, std::string_view year) {
  number.remove_prefix(std::min(number.size(), year.size() + 1));
  int count = 0;
  const auto [end, code] = std::from_chars(number.data(), number.data() + number.size(), count);
  return code == std::errc() && end == number.data() + number.size() ? count : 0;
}

}  // namespace

// Compressing takes its time: before the transaction, and only what the book does not have.
Result<std::vector<PackedRun>> Book::packNew(std::span<const RunBytes> files) const {
  std::vector<PackedRun> packed;
  for (const RunBytes& file : files) {
    const Result<bool> known = hasRun(connection_, file.sha256);
    if (!known) return known.error();
    if (!known.value()) packed.push_back(pack(file));
  }
  return packed;
}

Result<std::string> Book::freeNumber(const Job& job) const {
  if (!job.number.empty()) {
    Result<QSqlQuery> taken =
        connection_.run("SELECT 1 FROM jobs WHERE number = ?", {text(job.number)});
    if (!taken) return taken.error();
    if (!taken.value().next()) return job.number;
  }
  const std::string year = job.opened.size() >= 4
                               ? job.opened.substr(0, 4)
                               : QDate::currentDate().toString("yyyy").toStdString();
  Result<QSqlQuery> rows =
      connection_.run("SELECT number FROM jobs WHERE number LIKE ?", {text(year + "-%")});
  if (!rows) return rows.error();
  int last = 0;
  while (rows.value().next()) last = std::max(last, countOf(column(rows.value(), 0), year));
  return year + "-" + QString::number(last + 1).rightJustified(4, '0').toStdString();
}

Result<std::string> Book::addJob(Job job, std::string_view what, std::span<const RunBytes> files) {
  const Result<std::vector<PackedRun>> packed = packNew(files);
  if (!packed) return packed.error();
  Result<Done> added = connection_.transaction([&]() -> Result<Done> {
    const Result<std::string> number = freeNumber(job);
    if (!number) return number.error();
    job.number = number.value();
    return storeJob(job, what, packed.value());
  });
  if (!added) return added.error();
  return job.number;
}

Result<Done> Book::saveJob(const Job& job, std::string_view what, std::span<const RunBytes> files) {
  expects(!job.number.empty());
  const Result<std::vector<PackedRun>> packed = packNew(files);
  if (!packed) return packed.error();
  return connection_.transaction([&] { return storeJob(job, what, packed.value()); });
}

Result<Done> Book::storeJob(const Job& job,
                            std::string_view what,
                            std::span<const PackedRun> files) {
  for (const PackedRun& file : files) {
    if (Result<Done> written = writeRun(connection_, file); !written) return written;
  }
  const std::string document = writeJob(job);
  const QString now = QDateTime::currentDateTimeUtc().toString(Qt::ISODateWithMs);
  Result<QSqlQuery> written = connection_.run(
      "INSERT INTO jobs (number, customer, vehicle, plate, technician, opened, changed, invented, "
      "document) VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?) ON CONFLICT (number) DO UPDATE SET customer = "
      "excluded.customer, vehicle = excluded.vehicle, plate = excluded.plate, technician = "
      "excluded.technician, opened = excluded.opened, changed = excluded.changed, invented = "
      "excluded.invented, document = excluded.document",
      {text(job.number),
       text(job.customer),
       text(job.vehicle),
       text(job.plate),
       text(job.technician),
       text(job.opened),
       now,
       job.invented ? 1 : 0,
       text(document)});
  if (!written) return written.error();
  if (Result<Done> rows = storeRows(job); !rows) return rows;
  return keep("job", job.number, what, document);
}

Result<Done> Book::storeRows(const Job& job) const {
  Result<QSqlQuery> done =
      connection_.run("DELETE FROM job_dampers WHERE job = ?", {text(job.number)});
  if (done) done = connection_.run("DELETE FROM job_runs WHERE job = ?", {text(job.number)});
  for (const JobItem& item : job.items) {
    if (!done) return done.error();
    done = connection_.run(
        "INSERT INTO job_dampers (job, corner, serial, serial_folded, part_number, document) "
        "VALUES (?, ?, ?, ?, ?, ?)",
        {text(job.number),
         text(item.corner),
         text(item.damper.serial),
         text(folded(item.damper.serial)),
         text(item.damper.partNumber),
         text(writeDamper(item.damper))});
    for (std::size_t phase = 0; phase < item.phases.size(); ++phase) {
      const std::vector<JobRun>& runs = item.phases[phase].runs;
      for (std::size_t run = 0; done && run < runs.size(); ++run) {
        done = connection_.run(
            "INSERT INTO job_runs (job, corner, phase, run, sha256) VALUES (?, ?, ?, ?, ?)",
            {text(job.number),
             text(item.corner),
             static_cast<int>(phase),
             static_cast<int>(run),
             text(runs[run].sha256)});
      }
    }
  }
  if (!done) return done.error();
  return Done{};
}

Result<Done> Book::setVerdict(std::string_view number, std::optional<VerdictWord> verdict) {
  Result<QSqlQuery> written = connection_.run("UPDATE jobs SET verdict = ? WHERE number = ?",
                                              {verdictColumn(verdict), text(number)});
  if (!written) return written.error();
  return Done{};
}

Result<Job> Book::job(std::string_view number) const {
  Result<QSqlQuery> row =
      connection_.run("SELECT document FROM jobs WHERE number = ?", {text(number)});
  if (!row) return row.error();
  if (!row.value().next()) {
    return Error{"job-missing", {{"number", std::string(number)}}, {}};
  }
  return readJob(column(row.value(), 0), number);
}

Result<std::vector<JobSummary>> Book::recentJobs(int count) const {
  Result<QSqlQuery> rows = connection_.run(
      "SELECT number, customer, vehicle, plate, opened, invented, verdict FROM jobs "
      "ORDER BY changed DESC, number DESC LIMIT ?",
      {count});
  if (!rows) return rows.error();
  std::vector<JobSummary> jobs;
  while (rows.value().next()) {
    const QSqlQuery& row = rows.value();
    jobs.push_back({column(row, 0),
                    column(row, 1),
                    column(row, 2),
                    column(row, 3),
                    column(row, 4),
                    row.value(5).toInt() != 0,
                    verdictOf(column(row, 6))});
  }
  return jobs;
}

Result<std::optional<DamperCard>> Book::damperCard(std::string_view serial) const {
  const std::string key = folded(serial);
  if (key.empty()) return std::optional<DamperCard>();
  Result<QSqlQuery> row = connection_.run(
      "SELECT job_dampers.document FROM job_dampers JOIN jobs ON jobs.number = job_dampers.job "
      "WHERE serial_folded = ? ORDER BY jobs.changed DESC LIMIT 1",
      {text(key)});
  if (!row) return row.error();
  if (!row.value().next()) return std::optional<DamperCard>();
  Result<DamperCard> card = readDamper(column(row.value(), 0), serial);
  if (!card) return card.error();
  return std::optional<DamperCard>(std::move(card).value());
}

}  // namespace dampwright
