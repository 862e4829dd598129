// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/rig_folder/rig_folder.h"

#include <sys/stat.h>

#include <QDir>
#include <QFile>
#include <QSettings>
#include <algorithm>
#include <chrono>
#include <filesystem>
#include <utility>

#include "core/base/sha256.h"
#include "core/book/book.h"
#include "core/intake/first_rows.h"
#include "core/intake/load_file.h"

namespace dampwright {

/// What became of a complete file when it was read.
struct RigFolder::Checked {
  enum class Word { New, OfferedBefore, NoText, NotNow } word = Word::NotNow;
  QString sha256;
};

namespace {

namespace fs = std::filesystem;

constexpr std::chrono::seconds everyLook{2};
constexpr qsizetype mostKnown = 50'000;
constexpr std::size_t headBytes = 4096;

const QString folderKey = QStringLiteral("rigFolder/path");
const QString knownKey = QStringLiteral("rigFolder/known");

fs::path pathOf(const QString& path) { return {QFile::encodeName(path).toStdString()}; }

std::optional<ListedFile> listed(const fs::path& path) {
  struct stat found {};
  if (::stat(path.c_str(), &found) != 0 || !S_ISREG(found.st_mode)) return std::nullopt;
  constexpr std::int64_t nanoseconds = 1'000'000'000;
  return ListedFile{path.filename().string(),
                    static_cast<std::uint64_t>(found.st_size),
                    found.st_mtim.tv_sec * nanoseconds + found.st_mtim.tv_nsec,
                    static_cast<std::uint64_t>(found.st_ino)};
}

// Nothing where the folder can't be seen.
std::optional<std::vector<ListedFile>> listing(const QString& folder) {
  std::error_code problem;
  fs::directory_iterator entries(pathOf(folder), problem);
  if (problem) return std::nullopt;
  std::vector<ListedFile> files;
  while (entries != fs::directory_iterator()) {
    if (auto file = listed(entries->path())) files.push_back(std::move(*file));
    entries.increment(problem);
    if (problem) return std::nullopt;
  }
  return files;
}

QString lineOf(const ListedFile& file) {
  return QStringLiteral("%1 %2 %3")
      .arg(file.bytes)
      .arg(file.modified)
      .arg(QString::fromStdString(file.name));
}

std::vector<ListedFile> knownIn(const QStringList& lines) {
  std::vector<ListedFile> known;
  for (const QString& line : lines) {
    const qsizetype first = line.indexOf(QLatin1Char(' '));
    const qsizetype second = line.indexOf(QLatin1Char(' '), first + 1);
    if (first < 0 || second < 0) continue;
    known.push_back({line.mid(second + 1).toStdString(),
                     line.left(first).toULongLong(),
                     line.mid(first + 1, second - first - 1).toLongLong(),
                     0});
  }
  return known;
}

}  // namespace

RigFolder::RigFolder(const QString& bookFile, QObject* parent)
    : QObject(parent), bookFile_(bookFile) {
  clock_.start();
  connect(&every_, &QTimer::timeout, this, &RigFolder::look);
  connect(&system_, &QFileSystemWatcher::directoryChanged, this, &RigFolder::look);
  const QSettings settings;
  folder_ = settings.value(folderKey).toString();
  if (!folder_.isEmpty()) start(knownIn(settings.value(knownKey).toStringList()));
}

void RigFolder::watch(const QString& folder) {
  work_.stop();
  every_.stop();
  if (!system_.directories().isEmpty()) system_.removePaths(system_.directories());
  looking_ = false;
  offers_.clear();
  folder_ = folder;
  emit offersChanged();
  emit folderChanged();
  if (folder.isEmpty()) {
    QSettings().remove(QStringLiteral("rigFolder"));
    return;
  }
  work_.add([folder](const Progress&) { return listing(folder); },
            [this, folder](std::optional<std::vector<ListedFile>> files) {
              takeFirst(folder, files.value_or(std::vector<ListedFile>{}));
            });
}

void RigFolder::takeFirst(const QString& folder, std::vector<ListedFile> known) {
  QStringList lines;
  for (const ListedFile& file : known) {
    if (lines.size() < mostKnown) lines << lineOf(file);
  }
  QSettings settings;
  settings.setValue(folderKey, folder);
  settings.setValue(knownKey, lines);
  start(std::move(known));
}

void RigFolder::start(std::vector<ListedFile> known) {
  files_ = CompleteFiles(std::move(known));
  every_.start(everyLook);
  look();
}

void RigFolder::look() {
  if (std::exchange(looking_, true)) return;
  work_.add([folder = folder_](const Progress&) { return listing(folder); },
            [this](const std::optional<std::vector<ListedFile>>& files) { takeLook(files); });
}

void RigFolder::takeLook(const std::optional<std::vector<ListedFile>>& listing) {
  looking_ = false;
  const bool gone = !listing.has_value();
  if (std::exchange(gone_, gone) != gone) emit troubleChanged(gone);
  if (gone) return;
  // A folder that was away must be told to the system again; asking twice does no harm.
  if (system_.directories().isEmpty()) system_.addPath(folder_);
  const CompleteFiles::Look look = files_.look(*listing, clock_.elapsed());
  for (const std::string& name : look.withdrawn) withdraw(name);
  for (const ListedFile& file : look.complete) check(file);
}

// Read whole and hashed; what changes meanwhile is no more complete than it was.
void RigFolder::check(const ListedFile& file) {
  using Word = Checked::Word;
  const fs::path path = pathOf(folder_) / file.name;
  work_.add(
      [file, path, bookFile = bookFile_](const Progress&) -> Checked {
        const Result<std::string> bytes = loadFile(path);
        if (!bytes || listed(path) != file) return {Word::NotNow, {}};
        if (!firstRows(headOf(bytes.value(), headBytes), std::nullopt, "", 1)) {
          return {Word::NoText, {}};
        }
        const std::string sha256 = sha256Hex(bytes.value());
        const Result<Book> book = Book::open(bookFile);
        const Result<bool> offered =
            book ? book.value().wasOffered(sha256) : Result<bool>(book.error());
        if (!offered) return {Word::NotNow, {}};
        return {offered.value() ? Word::OfferedBefore : Word::New, QString::fromStdString(sha256)};
      },
      [this, file](const Checked& checked) { takeCheck(file, checked); });
}

void RigFolder::takeCheck(const ListedFile& file, const Checked& checked) {
  if (checked.word == Checked::Word::NotNow) files_.again(file.name, clock_.elapsed());
  if (checked.word != Checked::Word::New) return;
  const bool there = std::ranges::count(offers_, checked.sha256, &OfferedFile::sha256) > 0;
  if (there) return;  // the same bytes under another name
  offers_.push_back({QDir(folder_).filePath(QString::fromStdString(file.name)), checked.sha256});
  emit offersChanged();
}

void RigFolder::withdraw(const std::string& name) {
  const QString path = QDir(folder_).filePath(QString::fromStdString(name));
  if (std::erase_if(offers_, [&](const OfferedFile& offer) { return offer.path == path; }) > 0) {
    emit offersChanged();
  }
}

void RigFolder::settle(const QString& sha256) {
  const auto gone = [&](const OfferedFile& offer) { return offer.sha256 == sha256; };
  if (std::erase_if(offers_, gone) > 0) emit offersChanged();
}

}  // namespace dampwright
