// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/checks_table.h"

#include <QHeaderView>
#include <QPainter>
#include <QStyledItemDelegate>
#include <algorithm>

#include "ui/look/margin_bar.h"
#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/look/type.h"
#include "ui/text/check_text.h"

namespace dampwright {

namespace {

constexpr int heightOfRow = 40, barWidth = 62, markWidth = 24, rowsAlwaysShown = 4;

// Title and measured value share the first column on two lines; the second column is there for
// readers of the table and takes no room on screen.
class CheckDelegate : public QStyledItemDelegate {
 public:
  using QStyledItemDelegate::QStyledItemDelegate;

  void paint(QPainter* painter,
             const QStyleOptionViewItem& option,
             const QModelIndex& index) const override {
    const Palette& colours = paletteFor(option.palette);
    const auto* model = static_cast<const ChecksModel*>(index.model());
    const CheckVerdict& check = model->check(index.row());
    const QRectF box = option.rect;
    painter->save();
    painter->setRenderHint(QPainter::Antialiasing);
    const bool selected = option.state & QStyle::State_Selected;
    painter->fillRect(box, selected ? colours.selected : colours.card);
    painter->fillRect(QRectF(box.left(), box.bottom() - 1, box.width(), 1), colours.hairline);
    if (index.column() == ChecksModel::Asked) paintWords(*painter, box, check, colours);
    if (index.column() == ChecksModel::Margin)
      paintMarginBar(
          *painter, {box.left() + 2, box.center().y() - 7, box.width() - 6, 14}, check, colours);
    if (index.column() == ChecksModel::Word)
      paintMark(*painter,
                {box.center().x() - 7, box.center().y() - 7, 14, 14},
                check.verdict,
                colours.ink);
    painter->restore();
  }

 private:
  static void paintWords(QPainter& painter,
                         const QRectF& box,
                         const CheckVerdict& check,
                         const Palette& colours) {
    const CheckText text = checkText(check);
    const bool pass = check.verdict == VerdictWord::Pass;
    const TextStyle title{13, !pass, colours.ink}, figures{11, false, colours.quiet};
    const double room = box.width() - 8;
    const QString measured = text.limits.isEmpty()
                                 ? text.measured
                                 : ChecksTable::tr("%1 of %2").arg(text.measured, text.limits);
    drawText(
        painter, {box.left() + 4, box.top() + 3, room, 18}, elided(text.title, room, title), title);
    drawText(painter,
             {box.left() + 4, box.top() + 21, room, 15},
             elided(measured, room, figures),
             figures);
  }
};

}  // namespace

ChecksTable::ChecksTable(QWidget* parent) : QTableView(parent), model_(new ChecksModel(this)) {
  setModel(model_);
  setItemDelegate(new CheckDelegate(this));
  setAccessibleName(tr("Checks"));
  setShowGrid(false);
  setFrameShape(QFrame::NoFrame);
  setSelectionBehavior(QAbstractItemView::SelectRows);
  setSelectionMode(QAbstractItemView::SingleSelection);
  setTabKeyNavigation(false);
  setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  setVerticalScrollMode(QAbstractItemView::ScrollPerPixel);
  horizontalHeader()->hide();
  verticalHeader()->hide();
  horizontalHeader()->setMinimumSectionSize(0);
  verticalHeader()->setDefaultSectionSize(heightOfRow);
  setSizePolicy(QSizePolicy::Expanding, QSizePolicy::Preferred);
}

void ChecksTable::setVerdict(const std::optional<Verdict>& verdict) {
  model_->setVerdict(verdict);
  updateGeometry();
}

QSize ChecksTable::sizeHint() const { return {300, model_->rowCount() * heightOfRow + 2}; }

QSize ChecksTable::minimumSizeHint() const {
  return {200, std::min(model_->rowCount(), rowsAlwaysShown) * heightOfRow + 2};
}

void ChecksTable::resizeEvent(QResizeEvent* event) {
  QTableView::resizeEvent(event);
  const int room = viewport()->width();
  setColumnWidth(ChecksModel::Asked, std::max(room - barWidth - markWidth, 80));
  setColumnWidth(ChecksModel::Measured, 0);
  setColumnWidth(ChecksModel::Margin, barWidth);
  setColumnWidth(ChecksModel::Word, markWidth);
}

}  // namespace dampwright
