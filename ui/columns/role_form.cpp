// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/role_form.h"

#include <QComboBox>
#include <QGridLayout>
#include <QLineEdit>
#include <algorithm>
#include <utility>

#include "ui/columns/typed_number.h"
#include "ui/look/elided.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

// The answers of a choice, in the order in which they stand: nothing said, then each value.
template <class T>
int rowOf(const std::optional<T>& value, std::initializer_list<T> values) {
  const auto found = value ? std::ranges::find(values, *value) : values.end();
  return found == values.end() ? 0 : static_cast<int>(found - values.begin()) + 1;
}

std::optional<Direction> directionAt(int row) {
  if (row <= 0) return std::nullopt;
  return row == 1 ? Direction::Compression : Direction::Rebound;
}

ZeroState zeroAt(int row) {
  if (row <= 0) return ZeroState::Unknown;
  return row == 1 ? ZeroState::NoSpecimen : ZeroState::DamperFitted;
}

}  // namespace

RoleForm::RoleForm(QWidget* parent) : QWidget(parent), rate_(new QLineEdit) {
  auto* grid = new QGridLayout(this);
  grid->setContentsMargins(12, 12, 12, 12);
  grid->setHorizontalSpacing(8);
  grid->setVerticalSpacing(8);
  grid->setColumnStretch(1, 1);
  lines_[0].role = Role::Time;
  lines_[1].role = Role::Displacement;
  lines_[2].role = Role::Force;
  lines_[3].role = Role::Velocity;
  lines_[4].role = Role::Temperature;
  addLine(*grid, lines_[0], tr("&Time"), {"s", "ms", "µs", "min"});
  auto* rateLabel = new QLabel(tr("Samples a &second"));
  rateLabel->setBuddy(rate_);
  rate_->setObjectName(QStringLiteral("rate"));
  rate_->setPlaceholderText(tr("by the column of time"));
  const int rateRow = grid->rowCount();
  grid->addWidget(rateLabel, rateRow, 0);
  grid->addWidget(rate_, rateRow, 1, 1, 2);
  addLine(*grid, lines_[1], tr("&Displacement"), {"mm", "cm", "m", "µm", "in"});
  rising_ = addChoice(*grid,
                      tr("&Rising displacement is"),
                      {tr("as the file says"),
                       directionName(Direction::Compression),
                       directionName(Direction::Rebound)});
  addLine(*grid, lines_[2], tr("&Force"), {"N", "kN", "daN", "kgf", "lbf"});
  force_ = addChoice(*grid,
                     tr("Force is &positive in"),
                     {tr("found by the loop's energy"),
                      directionName(Direction::Compression),
                      directionName(Direction::Rebound)});
  zero_ = addChoice(*grid,
                    tr("Force was &zeroed"),
                    {tr("not said"),
                     zeroStateText(ZeroState::NoSpecimen),
                     zeroStateText(ZeroState::DamperFitted)});
  addLine(*grid, lines_[3], tr("&Velocity"), {"m/s", "mm/s", "cm/s", "in/s"});
  addLine(*grid, lines_[4], tr("Te&mperature"), {"°C", "°F", "K"});
  grid->setRowStretch(grid->rowCount(), 1);
  setFocusProxy(lines_[0].column);
  connectChoices();
}

void RoleForm::connectChoices() {
  connect(rate_, &QLineEdit::editingFinished, this, &RoleForm::takeRate);
  connect(rising_, &QComboBox::activated, this, [this](int row) {
    draft_.rig.displacementPositive = directionAt(row);
    emit changed(draft_);
  });
  connect(force_, &QComboBox::activated, this, [this](int row) {
    draft_.rig.forcePositive = directionAt(row);
    emit changed(draft_);
  });
  connect(zero_, &QComboBox::activated, this, [this](int row) {
    draft_.rig.zeroState = zeroAt(row);
    emit changed(draft_);
  });
}

void RoleForm::addLine(QGridLayout& grid,
                       Line& line,
                       const QString& label,
                       const QStringList& units) {
  const int row = grid.rowCount();
  line.column = new ElidedComboBox;
  line.unit = new ElidedComboBox;
  line.unit->addItems(units);
  line.unit->setMinimumWidth(84);
  auto* name = new QLabel(label);
  name->setBuddy(line.column);
  line.column->setAccessibleName(tr("Column of %1").arg(QString(label).remove(QLatin1Char('&'))));
  line.unit->setAccessibleName(tr("Unit of %1").arg(QString(label).remove(QLatin1Char('&'))));
  grid.addWidget(name, row, 0);
  grid.addWidget(line.column, row, 1);
  grid.addWidget(line.unit, row, 2);
  const Role role = line.role;
  connect(line.column, &QComboBox::activated, this, [this, role, box = line.column](int chosen) {
    draft_ = withRole(draft_, source(), role, box->itemData(chosen).toInt());
    emit changed(draft_);
  });
  connect(line.unit, &QComboBox::activated, this, [this, role, box = line.unit](int chosen) {
    draft_ = withUnit(draft_, source(), role, box->itemText(chosen).toStdString());
    emit changed(draft_);
  });
}

QComboBox* RoleForm::addChoice(QGridLayout& grid, const QString& label, const QStringList& texts) {
  const int row = grid.rowCount();
  auto* box = new ElidedComboBox;
  box->addItems(texts);
  auto* name = new QLabel(label);
  name->setBuddy(box);
  box->setAccessibleName(QString(label).remove(QLatin1Char('&')));
  grid.addWidget(name, row, 0);
  grid.addWidget(box, row, 1, 1, 2);
  return box;
}

void RoleForm::focusOn(const std::string& openPoint) {
  QWidget* answers = lines_[0].column;
  if (openPoint == "displacement") answers = lines_[1].column;
  if (openPoint == "force") answers = lines_[2].column;
  if (openPoint == "sample-rate") answers = rate_;
  if (openPoint == "direction") answers = rising_;
  answers->setFocus();
}

Source RoleForm::source() const { return reading_ ? reading_->source : Source{}; }

void RoleForm::show(const ColumnsDraft& draft, const ColumnsPreview& preview) {
  draft_ = draft;
  // While a draft can't be read, its columns are those that could be read last.
  if (preview.reading) reading_ = preview.reading;
  for (Line& line : lines_) showLine(line);
  rising_->setCurrentIndex(
      rowOf(draft.rig.displacementPositive, {Direction::Compression, Direction::Rebound}));
  force_->setCurrentIndex(
      rowOf(draft.rig.forcePositive, {Direction::Compression, Direction::Rebound}));
  zero_->setCurrentIndex(
      rowOf(std::optional(draft.rig.zeroState), {ZeroState::NoSpecimen, ZeroState::DamperFitted}));
  if (!rate_->hasFocus()) {
    const auto rate = draft.text.sampleRate ? draft.text.sampleRate : draft.rig.sampleRate;
    rate_->setText(rate ? typedText(*rate) : QString());
  }
}

void RoleForm::showLine(Line& line) {
  line.column->setPlaceholderText(tr("none"));
  QStringList names;
  int current = -1;
  for (const SourceColumn& column : source().columns) {
    const QString name = QString::fromStdString(column.name);
    if (column.role == line.role) current = static_cast<int>(names.size());
    names << (name.isEmpty() ? tr("column %1").arg(column.index)
                             : QStringLiteral("%1 · %2").arg(column.index).arg(name));
  }
  if (names != line.names) {  // a list that is open just now stays open
    line.names = names;
    line.column->clear();
    for (int i = 0; i < names.size(); ++i) line.column->addItem(names[i], i + 1);
  }
  line.column->setCurrentIndex(current);
  line.column->setEnabled(line.column->count() > 0);
  line.unit->setEnabled(current >= 0);
  int unit = -1;
  if (current >= 0) {
    const SourceColumn column = source().columns[static_cast<std::size_t>(current)];
    const QString symbol = QString::fromStdString(column.unit);
    unit = line.unit->findText(symbol);
    if (unit < 0 && !symbol.isEmpty()) {
      line.unit->insertItem(0, symbol);
      unit = 0;
    }
  }
  line.unit->setCurrentIndex(unit);
}

void RoleForm::takeRate() {
  const QString text = rate_->text().trimmed();
  const auto rate = typedNumber(text);
  if (!text.isEmpty() && (!rate || *rate <= 0)) {
    emit refused(tr("Samples a second: “%1” is no number above 0.").arg(text));
    return;
  }
  const auto before = draft_.text.sampleRate ? draft_.text.sampleRate : draft_.rig.sampleRate;
  if (rate == before) {
    emit refused({});
    return;
  }
  draft_.text.sampleRate = rate;
  if (!rate) draft_.rig.sampleRate.reset();
  emit changed(draft_);
}

}  // namespace dampwright
