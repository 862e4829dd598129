// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/text_form.h"

#include <QComboBox>
#include <QFormLayout>
#include <QLabel>
#include <QSpinBox>

#include "ui/look/elided.h"

namespace dampwright {

namespace {

constexpr int lastHeaderLine = 100'000;

// As core spells it, and as people call it.
QString shown(const QString& value) {
  if (value == QStringLiteral(",")) return TextForm::tr("comma ,");
  if (value == QStringLiteral(".")) return TextForm::tr("point .");
  if (value == QStringLiteral(";")) return TextForm::tr("semicolon ;");
  if (value == QStringLiteral("|")) return TextForm::tr("bar |");
  if (value == QStringLiteral("tab")) return TextForm::tr("tab");
  if (value == QStringLiteral("blanks")) return TextForm::tr("blanks");
  return value;
}

void showChoice(QComboBox& box,
                const std::optional<std::string>& chosen,
                const std::string& found) {
  const QString known = QString::fromStdString(found);
  box.setItemText(0,
                  known.isEmpty() ? TextForm::tr("found by itself")
                                  : TextForm::tr("found: %1").arg(shown(known)));
  const int row = chosen ? box.findData(QString::fromStdString(*chosen)) : 0;
  box.setCurrentIndex(std::max(row, 0));
}

}  // namespace

TextForm::TextForm(QWidget* parent) : QWidget(parent), headerRow_(new QSpinBox) {
  auto* form = new QFormLayout(this);
  form->setContentsMargins(12, 12, 12, 12);
  form->setSpacing(8);
  encoding_ = addChoice(*form,
                        tr("&Encoding"),
                        {"utf-8", "windows-1252", "utf-16le", "utf-16be", "shift-jis", "gb18030"},
                        &ReadOptions::encoding,
                        &RigProfile::encoding);
  delimiter_ = addChoice(*form,
                         tr("De&limiter"),
                         {",", ";", "tab", "|", "blanks"},
                         &ReadOptions::delimiter,
                         &RigProfile::delimiter);
  decimal_ = addChoice(
      *form, tr("De&cimal mark"), {".", ","}, &ReadOptions::decimal, &RigProfile::decimal);
  headerRow_->setRange(0, lastHeaderLine);
  headerRow_->setSpecialValueText(tr("found by itself"));
  headerRow_->setKeyboardTracking(false);
  headerRow_->setMinimumHeight(28);
  headerRow_->setAccessibleName(tr("Line of the column names"));
  form->addRow(tr("Column &names in line"), headerRow_);
  setFocusProxy(decimal_);
  connect(headerRow_, &QSpinBox::valueChanged, this, [this](int line) {
    draft_.text.headerRow = line > 0 ? std::optional<std::int64_t>(line) : std::nullopt;
    emit changed(draft_);
  });
}

QComboBox* TextForm::addChoice(QFormLayout& form,
                               const QString& label,
                               const QStringList& values,
                               std::optional<std::string> ReadOptions::*answer,
                               std::optional<std::string> RigProfile::*kept) {
  auto* box = new ElidedComboBox;
  box->addItem(tr("found by itself"));
  for (const QString& value : values) box->addItem(shown(value), value);
  box->setAccessibleName(QString(label).remove(QLatin1Char('&')));
  form.addRow(label, box);
  connect(box, &QComboBox::activated, this, [this, box, answer, kept](int row) {
    const std::string value = box->itemData(row).toString().toStdString();
    draft_.text.*answer = value.empty() ? std::nullopt : std::optional(value);
    if (value.empty()) (draft_.rig.*kept).reset();
    emit changed(draft_);
  });
  return box;
}

void TextForm::show(const ColumnsDraft& draft, const ColumnsPreview& preview) {
  draft_ = draft;
  Source found;
  found.encoding = found.delimiter = found.decimal = std::string();
  if (preview.reading) found = preview.reading->source;
  const auto chosen = [](const auto& answer, const auto& kept) { return answer ? answer : kept; };
  showChoice(*encoding_, chosen(draft.text.encoding, draft.rig.encoding), found.encoding);
  showChoice(*delimiter_, chosen(draft.text.delimiter, draft.rig.delimiter), found.delimiter);
  showChoice(*decimal_, chosen(draft.text.decimal, draft.rig.decimal), found.decimal);
  const QSignalBlocker quiet(headerRow_);
  headerRow_->setSpecialValueText(found.headerRows.empty()
                                      ? tr("found by itself")
                                      : tr("found: line %1").arg(found.headerRows.front()));
  headerRow_->setValue(static_cast<int>(draft.text.headerRow.value_or(0)));
}

}  // namespace dampwright
