// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/choose_files.h"

#include <QCoreApplication>
#include <QFileDialog>
#include <QSettings>

namespace dampwright {

namespace {

struct Files {
  Q_DECLARE_TR_FUNCTIONS(Files)
};

const QString folderKey = QStringLiteral("files/folder");

QStringList choose(QWidget* parent, const QString& title, const QString& kinds) {
  return QFileDialog::getOpenFileNames(
      parent, title, QSettings().value(folderKey).toString(), kinds);
}

}  // namespace

QStringList chooseRunFiles(QWidget* parent) {
  return choose(
      parent,
      Files::tr("Run files, limit sheets, damper cards"),
      Files::tr("Run files (*.csv *.txt *.dat *.tsv *.asc);;Documents (*.json);;All files (*)"));
}

QStringList chooseLimitSheets(QWidget* parent) {
  return choose(
      parent, Files::tr("Limit sheet"), Files::tr("Limit sheets (*.json);;All files (*)"));
}

void keepFolderOf(const QString& file) {
  QSettings().setValue(folderKey, QFileInfo(file).absolutePath());
}

}  // namespace dampwright
