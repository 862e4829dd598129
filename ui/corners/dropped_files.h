// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QMimeData>
#include <QStringList>

namespace dampwright {

/// The files of this machine that something dragged in holds; empty where there are none.
QStringList droppedFiles(const QMimeData* data);

/// What will happen when they are let go: "Add this file to Front left", "Add 4 files". `place` may
/// be empty: then name or metadata of a file suggest the corner.
QString dropPromise(const QStringList& files, const QString& place);

}  // namespace dampwright
