// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/rig_form.h"

#include <QFormLayout>
#include <QHBoxLayout>
#include <QLabel>
#include <QLineEdit>
#include <QPushButton>
#include <QScrollArea>
#include <QVBoxLayout>

#include "ui/columns/rig_fields.h"

namespace dampwright {

namespace {

constexpr int longestUnit = 6;  // letters

QString labelOf(const RigField& field) { return RigForm::tr(field.label); }

}  // namespace

RigForm::RigForm(QWidget* parent) : QWidget(parent) {
  auto* inside = new QWidget;
  auto* form = new QFormLayout(inside);
  form->setContentsMargins(12, 12, 12, 12);
  form->setSpacing(6);
  for (const RigField& field : rigFields()) addField(*form, field);
  setFocusProxy(edits_[2]);  // the scale of the force, which volts ask for
  auto* scroll = new QScrollArea;
  scroll->setWidget(inside);
  scroll->setWidgetResizable(true);
  scroll->setFrameShape(QFrame::NoFrame);
  scroll->setFocusPolicy(Qt::NoFocus);
  scroll->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  auto* files = new QHBoxLayout;
  files->setContentsMargins(12, 0, 12, 8);
  auto* open = new QPushButton(tr("&Open a profile…"));
  auto* save = new QPushButton(tr("Save the profile as &file…"));
  for (QPushButton* button : {open, save}) {
    button->setAutoDefault(false);
    files->addWidget(button);
  }
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(0, 0, 0, 0);
  column->addWidget(scroll, 1);
  column->addLayout(files);
  connect(open, &QPushButton::clicked, this, &RigForm::openWanted);
  connect(save, &QPushButton::clicked, this, &RigForm::saveWanted);
}

void RigForm::addField(QFormLayout& form, const RigField& field) {
  auto* edit = new QLineEdit;
  edit->setFixedWidth(112);
  edit->setAccessibleName(tr("%1, %2").arg(labelOf(field), QString::fromUtf8(field.unit)));
  auto* row = new QHBoxLayout;
  const QString unit = QString::fromUtf8(field.unit);
  row->addWidget(edit);
  if (unit.size() > longestUnit) {  // the form of a date stands where it is typed
    edit->setPlaceholderText(unit);
  } else {
    auto* after = new QLabel(unit);
    after->setObjectName(QStringLiteral("quiet"));
    row->addWidget(after);
  }
  row->addStretch();
  auto* label = new QLabel(labelOf(field));
  label->setBuddy(edit);
  form.addRow(label, row);
  edits_.push_back(edit);
  connect(edit, &QLineEdit::editingFinished, this, [this, &field, edit] { take(field, *edit); });
}

void RigForm::show(const ColumnsDraft& draft, const ColumnsPreview& preview) {
  draft_ = draft;
  if (preview.reading) source_ = preview.reading->source;
  for (std::size_t i = 0; i < edits_.size(); ++i) {
    if (!edits_[i]->hasFocus()) edits_[i]->setText(fieldText(rigFields()[i], draft));
  }
}

void RigForm::take(const RigField& field, QLineEdit& edit) {
  if (edit.text().trimmed() == fieldText(field, draft_)) {
    emit refused({});
    return;
  }
  const auto after = withTyped(field, draft_, source_, edit.text());
  if (!after) {
    emit refused(tr("%1: “%2” can't be.").arg(labelOf(field), edit.text().trimmed()));
    return;
  }
  draft_ = *after;
  emit changed(draft_);
}

}  // namespace dampwright
