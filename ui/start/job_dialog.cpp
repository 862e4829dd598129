// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/start/job_dialog.h"

#include <QDialogButtonBox>
#include <QFormLayout>
#include <QLineEdit>
#include <QPlainTextEdit>
#include <QPushButton>

#include "ui/look/elided.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

QLineEdit* field(const std::string& text) { return new QLineEdit(QString::fromStdString(text)); }

std::string typed(const QLineEdit* edit) { return edit->text().trimmed().toStdString(); }

}  // namespace

JobDialog::JobDialog(Use use, const Job& job, QWidget* parent)
    : QDialog(parent),
      job_(job),
      kind_(new ElidedComboBox),
      customer_(field(job.customer)),
      vehicle_(field(job.vehicle)),
      plate_(field(job.plate)),
      technician_(field(job.technician)),
      notes_(new QPlainTextEdit(QString::fromStdString(job.notes))) {
  const bool isNew = use == Use::NewJob;
  setWindowTitle(isNew ? tr("New job") : tr("Job details"));
  for (const VehicleKind kind :
       {VehicleKind::Car, VehicleKind::Motorcycle, VehicleKind::SingleDamper})
    kind_->addItem(vehicleKindName(kind), static_cast<int>(kind));
  kind_->setCurrentIndex(kind_->findData(static_cast<int>(job.kind)));
  kind_->setEnabled(isNew);
  notes_->setFixedHeight(72);
  notes_->setTabChangesFocus(true);
  auto* form = new QFormLayout(this);
  form->setContentsMargins(16, 16, 16, 16);
  form->setSpacing(12);
  form->addRow(tr("&Kind of vehicle"), kind_);
  form->addRow(tr("&Customer"), customer_);
  form->addRow(tr("&Vehicle"), vehicle_);
  form->addRow(tr("&Plate"), plate_);
  form->addRow(tr("&Technician"), technician_);
  form->addRow(tr("&Notes"), notes_);
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Cancel);
  QPushButton* accept =
      buttons->addButton(isNew ? tr("Start job") : tr("Keep"), QDialogButtonBox::AcceptRole);
  accept->setObjectName(QStringLiteral("primary"));
  accept->setDefault(true);
  form->addRow(buttons);
  setMinimumWidth(460);
  customer_->setFocus();
  connect(buttons, &QDialogButtonBox::accepted, this, &QDialog::accept);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::reject);
}

Job JobDialog::job() const {
  Job job = job_;
  job.kind = static_cast<VehicleKind>(kind_->currentData().toInt());
  job.customer = typed(customer_);
  job.vehicle = typed(vehicle_);
  job.plate = typed(plate_);
  job.technician = typed(technician_);
  job.notes = notes_->toPlainText().toStdString();
  return job;
}

}  // namespace dampwright
