// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAbstractButton>

#include "ui/corners/corner_view.h"

class QToolButton;

namespace dampwright {

/// One phase of a damper in the list of runs: title, detail, verdict mark, and a menu for its
/// files.
class PhaseCard : public QAbstractButton {
  Q_OBJECT
 public:
  explicit PhaseCard(QWidget* parent = nullptr);

  void setView(const PhaseView& view);
  /// Places that its runs could move to, as (corner, name).
  void setOtherCorners(const std::vector<std::pair<QString, QString>>& corners);
  QSize sizeHint() const override { return {200, 48}; }

 signals:
  void removeWanted(int run);
  void moveWanted(const QString& corner);

 protected:
  void paintEvent(QPaintEvent* event) override;
  void resizeEvent(QResizeEvent* event) override;

 private:
  void showMenu();

  PhaseView view_;
  std::vector<std::pair<QString, QString>> otherCorners_;
  QToolButton* more_;
};

}  // namespace dampwright
