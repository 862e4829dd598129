// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QGuiApplication>
#include <QImage>
#include <QPainter>
#include <QRect>

namespace dampwright {

/// Fonts need an application; every test that draws asks for the same one, without a screen.
inline void needApplication() {
  if (QGuiApplication::instance() != nullptr) return;
  static int count = 1;
  static char name[] = "test";
  static char* arguments[] = {name, nullptr};
  qputenv("QT_QPA_PLATFORM", "offscreen");
  static QGuiApplication application(count, arguments);
}

/// What `paint` draws on white, as grey levels.
template <class Paint>
QImage drawn(const QSize& size, Paint paint) {
  needApplication();
  QImage image(size, QImage::Format_RGB32);
  image.fill(Qt::white);
  QPainter painter(&image);
  paint(painter);
  painter.end();
  return image.convertToFormat(QImage::Format_Grayscale8);
}

/// The smallest rectangle that holds every pixel darker than light grey.
inline QRect inkBounds(const QImage& grey) {
  QRect bounds;
  for (int y = 0; y < grey.height(); ++y) {
    for (int x = 0; x < grey.width(); ++x) {
      if (qGray(grey.pixel(x, y)) < 200) bounds |= QRect(x, y, 1, 1);
    }
  }
  return bounds;
}

/// Share of a rectangle's pixels darker than middle grey.
inline double inkShare(const QImage& grey, const QRect& part) {
  int dark = 0;
  for (int y = part.top(); y <= part.bottom(); ++y) {
    for (int x = part.left(); x <= part.right(); ++x) dark += qGray(grey.pixel(x, y)) < 140 ? 1 : 0;
  }
  return static_cast<double>(dark) / (part.width() * part.height());
}

}  // namespace dampwright
