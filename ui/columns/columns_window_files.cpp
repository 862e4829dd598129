// SPDX-License-Identifier: GPL-3.0-or-later
// A rig profile as a document of its own.
#include <QFileDialog>
#include <QFileInfo>
#include <QSaveFile>
#include <filesystem>

#include "core/intake/load_file.h"
#include "core/records/documents.h"
#include "ui/columns/columns_window.h"
#include "ui/text/sentences.h"

namespace dampwright {

void ColumnsWindow::askWhereToSave() {
  const QString suggested = QString::fromStdString(rigName()) + QStringLiteral(".json");
  const QString path = QFileDialog::getSaveFileName(
      this, tr("Save the rig profile"), suggested, tr("Rig profiles (*.json)"));
  if (!path.isEmpty()) saveProfile(path);
}

void ColumnsWindow::askWhatToOpen() {
  const QString path = QFileDialog::getOpenFileName(
      this, tr("Open a rig profile"), {}, tr("Rig profiles (*.json);;All files (*)"));
  if (!path.isEmpty()) openProfile(path);
}

void ColumnsWindow::saveProfile(const QString& path) {
  RigProfile rig = draft_.rig;
  rig.name = rigName();
  if (preview_.reading) {
    rig = remembered(draft_, preview_.reading->source, rigName(), preview_.signature).rig;
  }
  const QByteArray document = QByteArray::fromStdString(writeRig(rig));
  QSaveFile file(path);
  const bool written =
      file.open(QIODevice::WriteOnly) && file.write(document) == document.size() && file.commit();
  if (written) return say(tr("The profile is in %1.").arg(QFileInfo(path).fileName()), "note");
  say(tr("%1 can't be written: %2. Choose another folder.")
          .arg(QFileInfo(path).fileName(), file.errorString()),
      "warning");
}

void ColumnsWindow::openProfile(const QString& path) {
  const std::string name = QFileInfo(path).fileName().toStdString();
  const auto bytes = loadFile(std::filesystem::path(QFile::encodeName(path).toStdString()));
  const auto rig = bytes ? readRig(bytes.value(), name) : Result<RigProfile>(bytes.error());
  if (!rig) return say(sentenceText(rig.error()), "warning");
  const ReadOptions text = draft_.text;
  draft_ = draftOf(rig.value(), {});
  draft_.base = RigProfile{};  // nobody has kept it yet
  draft_.text = text;
  setRigName(rig.value().name);
  preview();
}

}  // namespace dampwright
