// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <QStringList>
#include <vector>

#include "core/base/progress.h"
#include "core/rig/rig_profile.h"
#include "ui/session/dropped.h"

namespace dampwright {

/// What was dropped, and what the session knew at that moment.
struct DropTask {
  QStringList paths;
  std::vector<RigProfile> profiles;
  QString bookFile;  ///< where damper cards are looked up by serial
};

/// Every file loaded, recognised and read; documents first, so that a rig profile counts for the
/// run files dropped with it. What cannot be taken stands among the items as its problem. Never on
/// the GUI thread.
std::vector<DroppedItem> readDrop(const DropTask& task, const Progress& progress);

/// The JSON documents of a folder and of the folders in it, as readDrop() takes them.
QStringList documentsBelow(const QString& folder);

}  // namespace dampwright
