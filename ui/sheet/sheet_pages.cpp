// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_pages.h"

#include <QPaintEvent>
#include <QPainter>

#include "ui/look/palette.h"

namespace dampwright {

namespace {

constexpr double gap = 16;  // px around and between pages
constexpr int usualWidth = 760;

}  // namespace

SheetPages::SheetPages(QWidget* parent) : QWidget(parent) {
  setAccessibleName(tr("Sheet"));
  QSizePolicy policy(QSizePolicy::Expanding, QSizePolicy::Preferred);
  policy.setHeightForWidth(true);
  setSizePolicy(policy);
}

void SheetPages::show(const SheetDocument& document) {
  document_.emplace(document);
  setAccessibleDescription(
      tr("%1, %n page(s)", nullptr, document.pageCount()).arg(document.title()));
  updateGeometry();
  update();
}

QRectF SheetPages::pageBox(int page, int width) const {
  const QSizeF paper = paperFormat(document_->paper()).size;
  const double pageWidth = width - 2 * gap;
  const double pageHeight = pageWidth * paper.height() / paper.width();
  return {gap, gap + page * (pageHeight + gap), pageWidth, pageHeight};
}

int SheetPages::heightForWidth(int width) const {
  if (!document_) return width;
  return qRound(pageBox(document_->pageCount() - 1, width).bottom() + gap);
}

QSize SheetPages::sizeHint() const { return {usualWidth, heightForWidth(usualWidth)}; }

void SheetPages::paintEvent(QPaintEvent* event) {
  if (!document_) return;
  QPainter painter(this);
  const QSizeF paper = paperFormat(document_->paper()).size;
  for (int page = 0; page < document_->pageCount(); ++page) {
    const QRectF box = pageBox(page, width());
    if (!box.intersects(event->rect())) continue;
    painter.save();
    painter.translate(box.topLeft());
    const double scale = box.width() / paper.width();
    painter.scale(scale, scale);
    document_->paintPage(painter, page);
    painter.restore();
    painter.setPen(paletteFor(palette()).hairline);
    painter.drawRect(box);
  }
}

}  // namespace dampwright
