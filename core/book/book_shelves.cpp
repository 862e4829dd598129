// SPDX-License-Identifier: GPL-3.0-or-later
// Rig profiles, limit sheets, and files of the rig folder.
#include <QDateTime>
#include <utility>

#include "core/book/book.h"
#include "core/book/text_columns.h"
#include "core/records/documents.h"

namespace dampwright {

Result<Done> Book::saveRigProfile(const RigProfile& profile, std::string_view what) {
  const std::string document = writeRig(profile);
  return connection_.transaction([&]() -> Result<Done> {
    const QString now = QDateTime::currentDateTimeUtc().toString(Qt::ISODateWithMs);
    Result<QSqlQuery> written = connection_.run(
        "INSERT INTO rig_profiles (name, signature, changed, document) VALUES (?, ?, ?, ?) "
        "ON CONFLICT (name) DO UPDATE SET signature = excluded.signature, changed = "
        "excluded.changed, document = excluded.document",
        {text(profile.name), text(profile.signature), now, text(document)});
    if (!written) return written.error();
    return keep("rig", profile.name, what, document);
  });
}

Result<Done> Book::removeRigProfile(std::string_view name, std::string_view what) {
  return connection_.transaction([&]() -> Result<Done> {
    Result<QSqlQuery> removed =
        connection_.run("DELETE FROM rig_profiles WHERE name = ?", {text(name)});
    if (!removed) return removed.error();
    return keep("rig", name, what, "");
  });
}

Result<std::vector<RigProfile>> Book::rigProfiles() const {
  Result<QSqlQuery> rows =
      connection_.run("SELECT name, document FROM rig_profiles ORDER BY changed DESC, name");
  if (!rows) return rows.error();
  std::vector<RigProfile> profiles;
  while (rows.value().next()) {
    Result<RigProfile> profile = readRig(column(rows.value(), 1), column(rows.value(), 0));
    if (!profile) return profile.error();
    profiles.push_back(std::move(profile).value());
  }
  return profiles;
}

Result<Done> Book::addLimits(const Limits& limits) {
  const std::string document = writeLimits(limits);
  return connection_.transaction([&]() -> Result<Done> {
    Result<QSqlQuery> known =
        connection_.run("SELECT document FROM limit_sheets WHERE title = ? AND revision = ?",
                        {text(limits.title), text(limits.revision)});
    if (!known) return known.error();
    if (known.value().next()) {
      if (column(known.value(), 0) == document) return Done{};
      return Error{
          "limits-revision-taken", {{"title", limits.title}, {"revision", limits.revision}}, {}};
    }
    const QString now = QDateTime::currentDateTimeUtc().toString(Qt::ISODateWithMs);
    Result<QSqlQuery> written = connection_.run(
        "INSERT INTO limit_sheets (title, revision, source, added, document) "
        "VALUES (?, ?, ?, ?, ?)",
        {text(limits.title), text(limits.revision), text(limits.source), now, text(document)});
    if (!written) return written.error();
    return keep("limits", limits.title + " " + limits.revision, "added", document);
  });
}

Result<std::vector<Limits>> Book::limitSheets() const {
  Result<QSqlQuery> rows = connection_.run(
      "SELECT title, document FROM limit_sheets AS sheet WHERE added = (SELECT MAX(added) FROM "
      "limit_sheets AS other WHERE other.title = sheet.title) ORDER BY title");
  if (!rows) return rows.error();
  std::vector<Limits> sheets;
  while (rows.value().next()) {
    Result<Limits> limits = readLimits(column(rows.value(), 1), column(rows.value(), 0));
    if (!limits) return limits.error();
    sheets.push_back(std::move(limits).value());
  }
  return sheets;
}

Result<Done> Book::noteOffered(std::string_view sha256, std::string_view name) {
  const QString now = QDateTime::currentDateTimeUtc().toString(Qt::ISODateWithMs);
  Result<QSqlQuery> noted = connection_.run(
      "INSERT INTO offered_files (sha256, name, offered) VALUES (?, ?, ?) "
      "ON CONFLICT (sha256) DO NOTHING",
      {text(sha256), text(name), now});
  if (!noted) return noted.error();
  return Done{};
}

Result<bool> Book::wasOffered(std::string_view sha256) const {
  Result<QSqlQuery> row =
      connection_.run("SELECT 1 FROM offered_files WHERE sha256 = ?", {text(sha256)});
  if (!row) return row.error();
  if (row.value().next()) return true;
  return hasRun(connection_, sha256);
}

}  // namespace dampwright
