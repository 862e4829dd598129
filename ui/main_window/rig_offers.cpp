// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/rig_offers.h"

#include <QDir>
#include <QFileDialog>
#include <QFileInfo>
#include <QMessageBox>
#include <QPushButton>
#include <utility>

#include "ui/rig_folder/offer_bar.h"

namespace dampwright {

RigOffers::RigOffers(Session& session,
                     std::function<void(const QStringList& files)> take,
                     QObject* parent)
    : QObject(parent),
      session_(session),
      take_(std::move(take)),
      bar_(new OfferBar),
      folder_(session.bookFile()) {
  connect(&folder_, &RigFolder::offersChanged, this, [this] { bar_->setOffers(folder_.offers()); });
  connect(bar_, &OfferBar::left, this, &RigOffers::settle);
  connect(bar_, &OfferBar::taken, this, [this](const std::vector<OfferedFile>& offers) {
    settle(offers);
    QStringList files;
    for (const OfferedFile& offer : offers) files << offer.path;
    take_(files);
  });
}

void RigOffers::settle(const std::vector<OfferedFile>& offers) {
  for (const OfferedFile& offer : offers) {
    session_.noteOffered(offer.sha256, QFileInfo(offer.path).fileName());
    folder_.settle(offer.sha256);
  }
}

void RigOffers::choose(QWidget* parent) {
  if (!folder_.folder().isEmpty()) {
    QMessageBox question(QMessageBox::Question,
                         tr("Rig folder"),
                         tr("New run files in this folder are offered:\n%1")
                             .arg(QDir::toNativeSeparators(folder_.folder())),
                         QMessageBox::NoButton,
                         parent);
    QPushButton* other = question.addButton(tr("Another folder…"), QMessageBox::ActionRole);
    QPushButton* stop = question.addButton(tr("Stop watching"), QMessageBox::DestructiveRole);
    question.setDefaultButton(question.addButton(tr("Go on"), QMessageBox::RejectRole));
    question.exec();
    if (question.clickedButton() == stop) return folder_.watch({});
    if (question.clickedButton() != other) return;
  }
  const QString chosen = QFileDialog::getExistingDirectory(
      parent, tr("The folder into which the rig writes its run files"), folder_.folder());
  if (!chosen.isEmpty()) folder_.watch(chosen);
}

}  // namespace dampwright
