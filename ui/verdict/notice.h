// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QFrame>

#include "core/base/direction.h"
#include "ui/verdict/verdict_view.h"

namespace dampwright {

/// One thing said in plain words, with the buttons that mend it.
class Notice : public QFrame {
  Q_OBJECT
 public:
  explicit Notice(const NoticeView& view, QWidget* parent = nullptr);

 signals:
  void directionSettled(dampwright::Direction displacementPositive);
  void mendWanted(dampwright::NoticeAction action, int run);
  void dismissed(int problem);

 private:
  void addButtons(const NoticeView& view);
};

}  // namespace dampwright
