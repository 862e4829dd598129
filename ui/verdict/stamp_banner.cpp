// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/stamp_banner.h"

#include <QPainter>

#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/text/names.h"

namespace dampwright {

StampBanner::StampBanner(QWidget* parent) : QWidget(parent) {
  setSizePolicy(QSizePolicy::Expanding, QSizePolicy::Fixed);
  setWord(VerdictWord::NotTested);
}

void StampBanner::setWord(VerdictWord word) {
  word_ = word;
  setAccessibleName(verdictName(word));
  update();
}

void StampBanner::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const QRectF frame = QRectF(rect()).adjusted(1, 1, -1, -1);
  paintStamp(painter, frame, word_, verdictName(word_), paletteFor(palette()));
}

}  // namespace dampwright
