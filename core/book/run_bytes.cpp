// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/book/run_bytes.h"

#include <QDateTime>
#include <QtEndian>
#include <algorithm>

#include "core/base/sha256.h"
#include "core/book/text_columns.h"

namespace dampwright {

namespace {

constexpr std::size_t chunkBytes = 2'000'000;
constexpr int compression = 3;  // run files shrink to a third; higher levels cost time for little

Error damaged(std::string_view sha256, const std::string& name) {
  return {"run-file-damaged", {{"sha256", std::string(sha256)}}, {name}};
}

// qUncompress trusts the length that stands in front, so a damaged one must not reach it.
bool saneLength(const QByteArray& packed) {
  return packed.size() >= 4 && qFromBigEndian<quint32>(packed.constData()) <= chunkBytes;
}

}  // namespace

PackedRun pack(const RunBytes& file) {
  PackedRun packed{file.name, file.sha256, file.bytes->size(), {}};
  for (std::size_t start = 0; start < file.bytes->size(); start += chunkBytes) {
    const std::size_t size = std::min(chunkBytes, file.bytes->size() - start);
    packed.chunks.push_back(qCompress(reinterpret_cast<const uchar*>(file.bytes->data() + start),
                                      static_cast<qsizetype>(size),
                                      compression));
  }
  return packed;
}

Result<bool> hasRun(const Connection& connection, std::string_view sha256) {
  Result<QSqlQuery> row =
      connection.run("SELECT 1 FROM run_files WHERE sha256 = ?", {text(sha256)});
  if (!row) return row.error();
  return row.value().next();
}

Result<Done> writeRun(const Connection& connection, const PackedRun& file) {
  const Result<bool> known = hasRun(connection, file.sha256);
  if (!known) return known.error();
  if (known.value()) return Done{};
  const QString now = QDateTime::currentDateTimeUtc().toString(Qt::ISODateWithMs);
  Result<QSqlQuery> written = connection.run(
      "INSERT INTO run_files (sha256, name, bytes, chunks, stored) VALUES (?, ?, ?, ?, ?)",
      {text(file.sha256),
       text(file.name),
       static_cast<qint64>(file.bytes),
       static_cast<int>(file.chunks.size()),
       now});
  for (std::size_t i = 0; written && i < file.chunks.size(); ++i) {
    written = connection.run("INSERT INTO run_file_chunks (sha256, number, data) VALUES (?, ?, ?)",
                             {text(file.sha256), static_cast<int>(i), file.chunks[i]});
  }
  if (!written) return written.error();
  return Done{};
}

Result<std::string> readRunFile(const Connection& connection, std::string_view sha256) {
  Result<QSqlQuery> row =
      connection.run("SELECT name, bytes FROM run_files WHERE sha256 = ?", {text(sha256)});
  if (!row) return row.error();
  if (!row.value().next()) {
    return Error{"run-file-missing", {{"sha256", std::string(sha256)}}, {}};
  }
  const std::string name = column(row.value(), 0);
  Result<QSqlQuery> chunks = connection.run(
      "SELECT data FROM run_file_chunks WHERE sha256 = ? ORDER BY number", {text(sha256)});
  if (!chunks) return chunks.error();
  std::string bytes;
  while (chunks.value().next()) {
    const QByteArray packed = chunks.value().value(0).toByteArray();
    if (!saneLength(packed)) return damaged(sha256, name);
    const QByteArray chunk = qUncompress(packed);
    bytes.append(chunk.constData(), static_cast<std::size_t>(chunk.size()));
  }
  if (sha256Hex(bytes) != sha256) return damaged(sha256, name);
  return bytes;
}

}  // namespace dampwright
