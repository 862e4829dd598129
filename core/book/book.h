// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <memory>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

#include "core/base/result.h"
#include "core/book/connection.h"
#include "core/book/job_summary.h"
#include "core/book/run_bytes.h"
#include "core/job/job.h"
#include "core/rig/rig_profile.h"
#include "core/verdict/limits.h"

namespace dampwright {

/// One line of the journal: which document became what, when and by which edit.
struct JournalEntry {
  std::string at;       ///< ISO 8601, UTC
  std::string program;  ///< version that wrote it
  std::string subject;  ///< job | rig | limits
  std::string key;      ///< job number, rig name, title and revision
  std::string what;     ///< the edit in words
  std::string
      document;  ///< as it was after the edit; the entry before it is what it was until then
};

/// The job book: everything a workshop ever measured. Every function that writes is one transaction
/// with its line in the journal, and returns only when it is on the disk. Values in, values out.
/// Belongs to the thread that opened it; every thread opens its own.
/// Errors of every function: book-read-only, book-disk-full, book-locked, book-damaged,
/// book-cannot-write; besides those named.
class Book {
 public:
  /// Opens or creates the book and brings it to the newest schema. A book that is damaged, newer
  /// or not ours is left as it is. Errors: book-cannot-open, book-newer-than-program, book-foreign.
  static Result<Book> open(const QString& file);
  static Result<Book> open(Connection connection);

  /// A new job under its own number, or, where it has none or the number is taken, under the next
  /// free one: year of opening, hyphen, four digits or more ("2031-0007"). Returns the number.
  Result<std::string> addJob(Job job, std::string_view what, std::span<const RunBytes> files = {});
  /// The job as it is now, with the bytes of runs that are not in the book yet. A job of this
  /// number is overwritten (the journal keeps what it was).
  Result<Done> saveJob(const Job& job, std::string_view what, std::span<const RunBytes> files = {});
  /// What the job came out as; no edit, so not in the journal.
  Result<Done> setVerdict(std::string_view number, std::optional<VerdictWord> verdict);
  /// Errors: job-missing, and those of core/records.
  Result<Job> job(std::string_view number) const;
  Result<std::vector<JobSummary>> recentJobs(int count) const;  ///< last changed first

  /// Bytes as they came, checked against their hash. Errors: run-file-missing, run-file-damaged.
  Result<std::string> runFile(std::string_view sha256) const;

  /// The card that a serial had last, letter case and outer blanks left aside.
  Result<std::optional<DamperCard>> damperCard(std::string_view serial) const;

  /// Kept under its name; of several profiles of one signature the last saved counts.
  Result<Done> saveRigProfile(const RigProfile& profile, std::string_view what);
  Result<Done> removeRigProfile(std::string_view name, std::string_view what);
  Result<std::vector<RigProfile>> rigProfiles() const;  ///< last saved first

  /// A sheet is never changed: the same again is no error, another one of the same title and
  /// revision is. Errors: limits-revision-taken.
  Result<Done> addLimits(const Limits& limits);
  /// The newest revision of each title, by title.
  Result<std::vector<Limits>> limitSheets() const;

  /// A file of the rig folder that was taken or turned down.
  Result<Done> noteOffered(std::string_view sha256, std::string_view name);
  /// Whether it was, or its bytes are in the book: it need not be offered again.
  Result<bool> wasOffered(std::string_view sha256) const;

  Result<Done> setSetting(std::string_view name, std::string_view value);
  Result<std::string> setting(std::string_view name) const;  ///< empty where it was never set

  Result<std::vector<JournalEntry>> journal(std::string_view subject, std::string_view key) const;

 private:
  explicit Book(Connection connection) : connection_(std::move(connection)) {}
  Result<std::vector<PackedRun>> packNew(std::span<const RunBytes> files) const;
  Result<Done> storeJob(const Job& job, std::string_view what, std::span<const PackedRun> files);
  Result<Done> storeRows(const Job& job) const;
  Result<Done> keep(std::string_view subject,
                    std::string_view key,
                    std::string_view what,
                    const std::string& document) const;
  Result<std::string> freeNumber(const Job& job) const;

  Connection connection_;
};

}  // namespace dampwright
