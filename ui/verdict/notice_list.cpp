// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/notice_list.h"

#include <QVBoxLayout>

#include "ui/verdict/notice.h"

namespace dampwright {

NoticeList::NoticeList(QWidget* parent) : QScrollArea(parent) {
  auto* inside = new QWidget;
  column_ = new QVBoxLayout(inside);
  column_->setContentsMargins(0, 0, 4, 0);
  column_->setSpacing(8);
  column_->addStretch();
  setWidget(inside);
  setWidgetResizable(true);
  setFrameShape(QFrame::NoFrame);
  setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  setAccessibleName(tr("Remarks"));
}

void NoticeList::setNotices(const std::vector<NoticeView>& notices) {
  if (notices == notices_) return;  // focus stays on a button while nothing changes
  notices_ = notices;
  while (column_->count() > 1) {
    QLayoutItem* item = column_->takeAt(0);
    item->widget()->hide();
    item->widget()->deleteLater();
    delete item;
  }
  for (const NoticeView& view : notices) {
    auto* notice = new Notice(view);
    connect(notice, &Notice::directionSettled, this, &NoticeList::directionSettled);
    connect(notice, &Notice::mendWanted, this, &NoticeList::mendWanted);
    connect(notice, &Notice::dismissed, this, &NoticeList::dismissed);
    column_->insertWidget(column_->count() - 1, notice);
  }
}

}  // namespace dampwright
