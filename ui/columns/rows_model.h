// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAbstractTableModel>
#include <vector>

#include "ui/columns/columns_preview.h"

namespace dampwright {

/// What stands on top of a column: what it is taken for, its unit, its sign, and why.
QString columnHeading(const SourceColumn& column,
                      const RunReading& reading,
                      const ColumnsDraft& draft);

/// The first rows of a file as they stand; on top of each column what it is taken for, at the side
/// the line of the file.
class RowsModel : public QAbstractTableModel {
  Q_OBJECT
 public:
  using QAbstractTableModel::QAbstractTableModel;

  void show(const ColumnsPreview& preview, const ColumnsDraft& draft);
  int rowOfLine(std::int64_t line) const;  ///< 0 where there is none

  int rowCount(const QModelIndex& parent = {}) const override;
  int columnCount(const QModelIndex& parent = {}) const override;
  QVariant data(const QModelIndex& index, int role) const override;
  QVariant headerData(int section, Qt::Orientation orientation, int role) const override;

 private:
  enum class Part { Above, Heading, Data };
  Part partOf(std::int64_t line) const;

  std::vector<TextRow> rows_;
  std::vector<std::int64_t> headerLines_;
  std::int64_t firstDataLine_ = 0;
  QStringList headings_;
  int columns_ = 0;
};

}  // namespace dampwright
