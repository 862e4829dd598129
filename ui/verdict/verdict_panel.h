// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QFrame>

#include "core/base/direction.h"
#include "ui/verdict/verdict_view.h"

class QLabel;
class QPushButton;

namespace dampwright {

class ChecksTable;
class ElidedComboBox;
class ElidedLabel;
class NoticeList;
class StampBanner;

/// The right part of the window: the verdict in one word, the checks, and what is to be said.
/// Stamp, checks and the sheet's button never scroll away.
class VerdictPanel : public QFrame {
  Q_OBJECT
 public:
  explicit VerdictPanel(QWidget* parent = nullptr);

  void setView(const VerdictView& view);
  void takeFocus();   ///< to the checks, or to the limits while there are none
  void openLimits();  ///< opens the list of limit sheets, for the action in menu and top bar

 signals:
  void limitsChosen(const dampwright::Limits& limits);
  void limitsFileWanted();
  void directionSettled(dampwright::Direction displacementPositive);
  void dismissed(int problem);  ///< index of a drop problem
  void allDismissed();
  void mendWanted(dampwright::NoticeAction action, int run);
  void sheetWanted();

 protected:
  bool eventFilter(QObject* watched, QEvent* event) override;

 private:
  void buildColumn();
  void showLimits();
  void fillLimits();
  void showNotices();
  void pickLimits(int row);
  void showRule();

  VerdictView view_;
  std::vector<Limits> offered_;  // the rows of the list, in its order
  StampBanner* stamp_;
  ElidedLabel* damper_;
  QLabel *line_, *empty_, *rule_, *checksHeading_, *notesHeading_;
  ElidedComboBox* limits_;
  ChecksTable* checks_;
  NoticeList* notices_;
  QPushButton *dismissAll_, *sheet_;
};

}  // namespace dampwright
