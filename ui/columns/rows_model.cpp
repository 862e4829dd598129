// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/rows_model.h"

#include <QFont>
#include <QGuiApplication>
#include <algorithm>

#include "ui/look/palette.h"
#include "ui/text/questions.h"

namespace dampwright {

namespace {

bool isOpen(const RunReading& reading, const std::string& point) {
  return std::ranges::count(reading.open, point, &OpenPoint::point) > 0;
}

QString signText(Role role, const RunReading& reading, const RigProfile& rig) {
  if (role == Role::Displacement) {
    if (isOpen(reading, "direction")) return RowsModel::tr("direction not known");
    if (!rig.displacementPositive) return RowsModel::tr("direction as the file says");
    return *rig.displacementPositive == Direction::Compression
               ? RowsModel::tr("rising: compression")
               : RowsModel::tr("rising: rebound");
  }
  if (role == Role::Force) {
    if (!rig.forcePositive) return RowsModel::tr("sign by the loop's energy");
    return *rig.forcePositive == Direction::Compression ? RowsModel::tr("positive in compression")
                                                        : RowsModel::tr("positive in rebound");
  }
  return {};
}

}  // namespace

QString columnHeading(const SourceColumn& column,
                      const RunReading& reading,
                      const ColumnsDraft& draft) {
  QString what = roleName(column.role);
  if (column.role != Role::Other && !column.unit.empty()) {
    what += QStringLiteral(" · ") + QString::fromStdString(column.unit);
  }
  const auto* kept = columnFor(draft.rig, column.role);
  const auto* before = columnFor(draft.base, column.role);
  const bool said = kept != nullptr && *kept && *kept != *before;
  return what + QLatin1Char('\n') + signText(column.role, reading, draft.rig) + QLatin1Char('\n') +
         (said ? RowsModel::tr("You said so.") : reasonText(column));
}

void RowsModel::show(const ColumnsPreview& preview, const ColumnsDraft& draft) {
  beginResetModel();
  rows_ = preview.rows;
  columns_ = 0;
  for (const TextRow& row : rows_)
    columns_ = std::max(columns_, static_cast<int>(row.cells.size()));
  headings_.clear();
  headerLines_.clear();
  firstDataLine_ = 0;
  if (preview.reading) {
    const Source& source = preview.reading->source;
    headerLines_ = source.headerRows;
    if (source.unitRow > 0) headerLines_.push_back(source.unitRow);
    firstDataLine_ = source.firstDataRow;
    for (const SourceColumn& column : source.columns) {
      headings_ << columnHeading(column, *preview.reading, draft);
    }
    columns_ = std::max(columns_, static_cast<int>(headings_.size()));
  }
  endResetModel();
}

int RowsModel::rowOfLine(std::int64_t line) const {
  const auto found = std::ranges::find(rows_, line, &TextRow::line);
  return found == rows_.end() ? 0 : static_cast<int>(found - rows_.begin());
}

int RowsModel::rowCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(rows_.size());
}

int RowsModel::columnCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : columns_;
}

RowsModel::Part RowsModel::partOf(std::int64_t line) const {
  if (std::ranges::find(headerLines_, line) != headerLines_.end()) return Part::Heading;
  return firstDataLine_ > 0 && line >= firstDataLine_ ? Part::Data : Part::Above;
}

QVariant RowsModel::data(const QModelIndex& index, int role) const {
  const TextRow& row = rows_[static_cast<std::size_t>(index.row())];
  const auto column = static_cast<std::size_t>(index.column());
  const Part part = partOf(row.line);
  switch (role) {
    case Qt::DisplayRole:
      return column < row.cells.size() ? QString::fromStdString(row.cells[column]) : QString();
    case Qt::TextAlignmentRole:
      return QVariant::fromValue(part == Part::Data ? Qt::AlignRight | Qt::AlignVCenter
                                                    : Qt::AlignLeft | Qt::AlignVCenter);
    case Qt::FontRole: {
      QFont font = QGuiApplication::font();
      font.setBold(part == Part::Heading);
      return font;
    }
    case Qt::ForegroundRole: {
      const Palette& colours = paletteFor(QGuiApplication::palette());
      return part == Part::Above ? colours.quiet : colours.ink;
    }
    default:
      return {};
  }
}

QVariant RowsModel::headerData(int section, Qt::Orientation orientation, int role) const {
  if (orientation == Qt::Vertical) {
    if (role != Qt::DisplayRole) return {};
    return QVariant::fromValue(rows_[static_cast<std::size_t>(section)].line);
  }
  const QString heading = section < headings_.size() ? headings_[section] : QString();
  if (role == Qt::DisplayRole) return heading;
  if (role == Qt::AccessibleTextRole || role == Qt::ToolTipRole) {
    return QString(heading).replace(QLatin1Char('\n'), QStringLiteral(", "));
  }
  if (role == Qt::TextAlignmentRole) return QVariant::fromValue(Qt::AlignLeft | Qt::AlignTop);
  return {};
}

}  // namespace dampwright
