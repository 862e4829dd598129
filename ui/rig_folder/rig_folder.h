// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QElapsedTimer>
#include <QFileSystemWatcher>
#include <QObject>
#include <QString>
#include <QTimer>
#include <optional>
#include <vector>

#include "ui/background/ordered_jobs.h"
#include "ui/rig_folder/complete_files.h"

namespace dampwright {

/// A file of the rig folder that is written to its end.
struct OfferedFile {
  QString path, sha256;

  bool operator==(const OfferedFile&) const = default;
};

/// Watches the folder into which a rig writes its run files, and offers each new one when it is
/// complete and was not offered before. Looks every two seconds, and at once where the system tells
/// of a change: a network folder may not. Everything slow runs elsewhere.
class RigFolder : public QObject {
  Q_OBJECT
 public:
  /// Goes on with the folder that was watched last. `bookFile` knows what was offered before.
  explicit RigFolder(const QString& bookFile, QObject* parent = nullptr);

  /// What is there now is old. Empty: no folder is watched any more. Both are kept for later.
  void watch(const QString& folder);
  const QString& folder() const { return folder_; }
  const std::vector<OfferedFile>& offers() const { return offers_; }
  void settle(const QString& sha256);  ///< taken or turned down: no longer offered here

 signals:
  void offersChanged();
  void folderChanged();
  void troubleChanged(bool gone);  ///< the folder can't be seen, or is there again

 private:
  struct Checked;

  void start(std::vector<ListedFile> known);
  void takeFirst(const QString& folder, std::vector<ListedFile> known);
  void look();
  void takeLook(const std::optional<std::vector<ListedFile>>& listing);
  void check(const ListedFile& file);
  void takeCheck(const ListedFile& file, const Checked& checked);
  void withdraw(const std::string& name);

  QString bookFile_, folder_;
  CompleteFiles files_;
  std::vector<OfferedFile> offers_;
  bool looking_ = false, gone_ = false;
  QElapsedTimer clock_;
  QTimer every_;
  QFileSystemWatcher system_;
  OrderedJobs work_;  // last: its destructor waits for the work that uses the rest
};

}  // namespace dampwright
