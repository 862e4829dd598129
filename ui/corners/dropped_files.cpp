// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/dropped_files.h"

#include <QCoreApplication>
#include <QUrl>

namespace dampwright {

namespace {

struct Corners {
  Q_DECLARE_TR_FUNCTIONS(Corners)
};

}  // namespace

QStringList droppedFiles(const QMimeData* data) {
  QStringList files;
  if (data == nullptr) return files;
  for (const QUrl& url : data->urls()) {
    if (url.isLocalFile()) files << url.toLocalFile();
  }
  return files;
}

QString dropPromise(const QStringList& files, const QString& place) {
  const QString what =
      files.size() == 1 ? Corners::tr("this file") : Corners::tr("%1 files").arg(files.size());
  return place.isEmpty() ? Corners::tr("Add %1").arg(what)
                         : Corners::tr("Add %1 to %2").arg(what, place);
}

}  // namespace dampwright
