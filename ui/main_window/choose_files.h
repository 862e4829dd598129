// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QStringList>
#include <QWidget>

namespace dampwright {

/// Asks for files, in the folder where some were taken last; empty where nothing was chosen.
QStringList chooseRunFiles(QWidget* parent);
QStringList chooseLimitSheets(QWidget* parent);

/// Where the next choice begins.
void keepFolderOf(const QString& file);

}  // namespace dampwright
