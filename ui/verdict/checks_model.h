// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAbstractTableModel>
#include <optional>
#include <vector>

#include "core/verdict/verdict.h"

namespace dampwright {

/// The checks of a verdict as a table, the most pressing first: fails, too close to call, not
/// tested, passes, each in the order of the limit sheet.
class ChecksModel : public QAbstractTableModel {
  Q_OBJECT
 public:
  enum Column { Asked, Measured, Margin, Word, ColumnCount };

  explicit ChecksModel(QObject* parent = nullptr);

  /// Rows that ask the same as before keep their place, and with it selection and scroll.
  void setVerdict(const std::optional<Verdict>& verdict);
  const CheckVerdict& check(int row) const { return checks_[static_cast<std::size_t>(row)]; }

  int rowCount(const QModelIndex& parent = {}) const override;
  int columnCount(const QModelIndex& parent = {}) const override;
  QVariant data(const QModelIndex& index, int role) const override;
  QVariant headerData(int section, Qt::Orientation orientation, int role) const override;

 private:
  std::vector<CheckVerdict> checks_;
};

}  // namespace dampwright
