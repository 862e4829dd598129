// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/elided.h"

#include <QAbstractItemView>
#include <QStyle>
#include <QStylePainter>
#include <algorithm>

namespace dampwright {

ElidedLabel::ElidedLabel(Qt::TextElideMode mode, QWidget* parent) : QLabel(parent), mode_(mode) {
  setTextFormat(Qt::PlainText);
  setSizePolicy(QSizePolicy::Ignored, QSizePolicy::Preferred);
}

void ElidedLabel::setWhole(const QString& text) {
  whole_ = text;
  setAccessibleName(text);
  elide();
}

void ElidedLabel::elide() {
  const QString shown = fontMetrics().elidedText(whole_, mode_, contentsRect().width());
  setText(shown);
  setToolTip(shown == whole_ ? QString() : whole_);
}

void ElidedLabel::resizeEvent(QResizeEvent* event) {
  QLabel::resizeEvent(event);
  elide();
}

ElidedComboBox::ElidedComboBox(QWidget* parent) : QComboBox(parent) {
  constexpr int fewestPixels = 96;
  setSizePolicy(QSizePolicy::Ignored, QSizePolicy::Fixed);
  setMinimumWidth(fewestPixels);
}

void ElidedComboBox::showPopup() {
  constexpr int frame = 24;  // margins of a row and the frame around the list
  int widest = width();
  for (int row = 0; row < count(); ++row)
    widest = std::max(widest, fontMetrics().horizontalAdvance(itemText(row)) + frame);
  view()->setMinimumWidth(widest);
  QComboBox::showPopup();
}

void ElidedComboBox::paintEvent(QPaintEvent*) {
  QStylePainter painter(this);
  QStyleOptionComboBox option;
  initStyleOption(&option);
  const QRect field =
      style()->subControlRect(QStyle::CC_ComboBox, &option, QStyle::SC_ComboBoxEditField, this);
  if (currentIndex() < 0) option.currentText = placeholderText();
  option.currentText =
      fontMetrics().elidedText(option.currentText, Qt::ElideRight, field.width() - 4);
  painter.drawComplexControl(QStyle::CC_ComboBox, option);
  painter.drawControl(QStyle::CE_ComboBoxLabel, option);
  painter.setRenderHint(QPainter::Antialiasing);
  painter.setPen(QPen(
      palette().color(isEnabled() ? QPalette::Active : QPalette::Disabled, QPalette::Text), 1.5));
  const QPointF tip(width() - 14, 0.5 * height() + 2.5);
  painter.drawPolyline(QPolygonF{tip - QPointF(5, 5), tip, tip + QPointF(5, -5)});
}

QString breakable(const QString& text, int most) {
  QString broken;
  int run = 0;
  for (const QChar letter : text) {
    run = letter.isSpace() ? 0 : run + 1;
    if (run > most) {
      broken += QChar(0x200B);  // zero-width space
      run = 1;
    }
    broken += letter;
  }
  return broken;
}

}  // namespace dampwright
