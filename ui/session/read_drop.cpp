// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/read_drop.h"

#include <QDirIterator>
#include <QFileInfo>
#include <algorithm>
#include <filesystem>
#include <string_view>
#include <utility>

#include "core/base/sha256.h"
#include "core/book/book.h"
#include "core/intake/load_file.h"
#include "core/job/read_metadata.h"
#include "core/records/documents.h"
#include "ui/session/find_profile.h"

namespace dampwright {

namespace {

namespace fs = std::filesystem;

fs::path pathOf(const QString& path) { return {QFile::encodeName(path).toStdString()}; }
std::string nameOf(const QString& path) { return QFileInfo(path).fileName().toStdString(); }

DropProblem problem(const QString& path, Error error) {
  if (error.place.file.empty()) error.place.file = nameOf(path);
  return {QFileInfo(path).fileName(), std::move(error)};
}

bool isDocument(const QString& path) { return path.endsWith(".json", Qt::CaseInsensitive); }

RunBytes runBytes(std::string name, std::string bytes) {
  std::string sha256 = sha256Hex(bytes);
  return {
      std::move(name), std::move(sha256), std::make_shared<const std::string>(std::move(bytes))};
}

// The run files that a job's document names, from the document's own folder.
DroppedItem jobWithFiles(const QString& path, Job job) {
  DroppedJob dropped;
  for (JobItem& item : job.items) {
    for (JobPhase& phase : item.phases) {
      for (JobRun& run : phase.runs) {
        const fs::path name = fs::path(run.file).lexically_normal();
        if (name.is_absolute() || name.string().starts_with("..")) {
          return problem(path, {"run-outside-folder", {{"file", run.file}}, {}});
        }
        Result<std::string> bytes = loadFile(pathOf(path).parent_path() / name);
        if (!bytes) return problem(path, bytes.error());
        RunBytes file = runBytes(name.filename().string(), std::move(bytes).value());
        if (!run.sha256.empty() && run.sha256 != file.sha256) {
          return problem(path, {"run-differs-from-job", {{"file", run.file}}, {}});
        }
        run.file = file.name;
        run.sha256 = file.sha256;
        dropped.files.push_back(std::move(file));
      }
    }
  }
  dropped.job = std::move(job);
  return dropped;
}

// Nothing where the document is of another kind; else what it holds, or why it is wrong.
template <class T>
std::optional<DroppedItem> asKind(const QString& path, Result<T> read) {
  if (!read && read.error().code == "document-of-another-kind") return std::nullopt;
  if (!read) return problem(path, read.error());
  if constexpr (std::is_same_v<T, Job>) {
    return jobWithFiles(path, std::move(read).value());
  } else {
    return DroppedItem(std::move(read).value());
  }
}

DroppedItem document(const QString& path, const std::string& bytes) {
  const std::string name = nameOf(path);
  if (auto item = asKind(path, readLimits(bytes, name))) return *std::move(item);
  if (auto item = asKind(path, readRig(bytes, name))) return *std::move(item);
  if (auto item = asKind(path, readDamper(bytes, name))) return *std::move(item);
  if (auto item = asKind(path, readJob(bytes, name))) return *std::move(item);
  return problem(path, {"document-unknown-kind", {}, {}});
}

std::optional<DamperCard> cardOf(const QString& bookFile, const std::string& serial) {
  if (serial.empty()) return std::nullopt;
  const Result<Book> book = Book::open(bookFile);
  if (!book) return std::nullopt;
  const Result<std::optional<DamperCard>> card = book.value().damperCard(serial);
  return card ? card.value() : std::nullopt;
}

DroppedItem run(const DropTask& task,
                const QString& path,
                std::string bytes,
                const Progress& progress) {
  const FindProfile find = [&](std::string_view signature) {
    return findProfile(task.profiles, signature);
  };
  Result<RunReading> read = readRun(bytes, nameOf(path), {}, find, progress);
  if (!read) return problem(path, read.error());
  DroppedRun dropped;
  dropped.knownCard = cardOf(task.bookFile, serialOf(read.value().source.metadata));
  const auto profile = findProfile(task.profiles, read.value().source.signature);
  dropped.rig = profile ? profile->name : std::string();
  dropped.reading = std::make_shared<const RunReading>(std::move(read).value());
  dropped.bytes = runBytes(nameOf(path), std::move(bytes));
  return dropped;
}

DroppedItem fileOf(const DropTask& task, const QString& path, const Progress& progress) {
  Result<std::string> bytes = loadFile(pathOf(path));
  if (!bytes) return problem(path, bytes.error());
  if (isDocument(path)) return document(path, bytes.value());
  return run(task, path, std::move(bytes).value(), progress);
}

}  // namespace

std::vector<DroppedItem> readDrop(const DropTask& given, const Progress& progress) {
  DropTask task = given;
  std::ranges::stable_partition(task.paths, isDocument);
  std::vector<DroppedItem> items;
  for (qsizetype i = 0; i < task.paths.size() && !progress.cancelled(); ++i) {
    items.push_back(fileOf(task, task.paths[i], progress));
    if (const auto* rig = std::get_if<RigProfile>(&items.back())) {
      task.profiles.insert(task.profiles.begin(), *rig);
    }
  }
  return items;
}

QStringList documentsBelow(const QString& folder) {
  QStringList paths;
  QDirIterator files(folder, {"*.json"}, QDir::Files, QDirIterator::Subdirectories);
  while (files.hasNext()) paths.push_back(files.next());
  paths.sort();
  return paths;
}

}  // namespace dampwright
