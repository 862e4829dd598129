// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/damper_dialog.h"

#include <QDialogButtonBox>
#include <QFormLayout>
#include <QKeyEvent>
#include <QLineEdit>
#include <QPushButton>

namespace dampwright {

DamperDialog::DamperDialog(const QString& cornerName, const DamperCard& card, QWidget* parent)
    : QDialog(parent),
      card_(card),
      serial_(new QLineEdit(QString::fromStdString(card.serial))),
      partNumber_(new QLineEdit(QString::fromStdString(card.partNumber))) {
  setWindowTitle(tr("Damper, %1").arg(cornerName));
  auto* form = new QFormLayout(this);
  form->setContentsMargins(16, 16, 16, 16);
  form->setSpacing(12);
  form->addRow(tr("&Serial"), serial_);
  form->addRow(tr("&Part number"), partNumber_);
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Ok | QDialogButtonBox::Cancel);
  for (QAbstractButton* button : buttons->buttons())
    qobject_cast<QPushButton*>(button)->setAutoDefault(false);
  form->addRow(buttons);
  setMinimumWidth(380);
  serial_->selectAll();
  serial_->setFocus();
  connect(serial_, &QLineEdit::returnPressed, partNumber_, qOverload<>(&QWidget::setFocus));
  connect(partNumber_, &QLineEdit::returnPressed, this, &QDialog::accept);
  connect(buttons, &QDialogButtonBox::accepted, this, &QDialog::accept);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::reject);
}

// Enter is the fields' own here: the dialog's would press its first button.
void DamperDialog::keyPressEvent(QKeyEvent* event) {
  if (event->key() != Qt::Key_Return && event->key() != Qt::Key_Enter)
    QDialog::keyPressEvent(event);
}

DamperCard DamperDialog::card() const {
  DamperCard card = card_;
  card.serial = serial_->text().trimmed().toStdString();
  card.partNumber = partNumber_->text().trimmed().toStdString();
  return card;
}

}  // namespace dampwright
