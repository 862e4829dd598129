// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/rig_folder/offer_bar.h"

#include <QFileInfo>
#include <QHBoxLayout>
#include <QPushButton>

#include "ui/look/elided.h"

namespace dampwright {

namespace {

QString namesOf(const std::vector<OfferedFile>& offers) {
  QStringList names;
  for (const OfferedFile& offer : offers) names << QFileInfo(offer.path).fileName();
  return names.join(QStringLiteral(", "));
}

}  // namespace

OfferBar::OfferBar(QWidget* parent)
    : QFrame(parent),
      what_(new ElidedLabel(Qt::ElideMiddle)),
      take_(new QPushButton(tr("Add to the job"))),
      leave_(new QPushButton(tr("Leave"))) {
  setObjectName(QStringLiteral("topBar"));
  setAccessibleName(tr("Rig folder"));
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(20, 6, 20, 6);
  row->setSpacing(12);
  row->addWidget(what_, 1);
  row->addWidget(take_);
  row->addWidget(leave_);
  hide();
  // Both slots change the offers: they are given a copy.
  connect(take_, &QPushButton::clicked, this, [this] { emit taken(std::vector(offers_)); });
  connect(leave_, &QPushButton::clicked, this, [this] { emit left(std::vector(offers_)); });
}

void OfferBar::setOffers(const std::vector<OfferedFile>& offers) {
  offers_ = offers;
  const int count = static_cast<int>(offers.size());
  what_->setWhole(count == 1
                      ? tr("From the rig folder: %1").arg(namesOf(offers))
                      : tr("%1 files from the rig folder: %2").arg(count).arg(namesOf(offers)));
  take_->setText(count == 1 ? tr("Add to the job") : tr("Add all to the job"));
  setVisible(count > 0);
}

}  // namespace dampwright
