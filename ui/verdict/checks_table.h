// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QTableView>

#include "ui/verdict/checks_model.h"

namespace dampwright {

/// The checks as rows of two lines: what is asked over what was measured, then the margin as a bar
/// and the mark. A real table, so that a screen reader reads its cells.
class ChecksTable : public QTableView {
  Q_OBJECT
 public:
  explicit ChecksTable(QWidget* parent = nullptr);

  void setVerdict(const std::optional<Verdict>& verdict);
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override;

 protected:
  void resizeEvent(QResizeEvent* event) override;

 private:
  ChecksModel* model_;
};

}  // namespace dampwright
