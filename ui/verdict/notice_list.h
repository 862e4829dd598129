// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QScrollArea>
#include <vector>

#include "core/base/direction.h"
#include "ui/verdict/verdict_view.h"

class QVBoxLayout;

namespace dampwright {

/// Notices below each other, scrolled where there are many.
class NoticeList : public QScrollArea {
  Q_OBJECT
 public:
  explicit NoticeList(QWidget* parent = nullptr);

  void setNotices(const std::vector<NoticeView>& notices);
  QSize sizeHint() const override { return {300, 96}; }
  QSize minimumSizeHint() const override { return {200, 96}; }

 signals:
  void directionSettled(dampwright::Direction displacementPositive);
  void mendWanted(dampwright::NoticeAction action, int run);
  void dismissed(int problem);

 private:
  std::vector<NoticeView> notices_;
  QVBoxLayout* column_;
};

}  // namespace dampwright
