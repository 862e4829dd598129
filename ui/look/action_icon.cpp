// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/action_icon.h"

#include <QIconEngine>
#include <QPainter>
#include <QPainterPath>
#include <QPen>
#include <QPixmap>

namespace dampwright {

namespace {

void polyline(QPainterPath& path, std::initializer_list<QPointF> points) {
  bool first = true;
  for (const QPointF& point : points) {
    if (first)
      path.moveTo(point);
    else
      path.lineTo(point);
    first = false;
  }
}

void page(QPainterPath& path) {
  polyline(path, {{14, 3}, {6, 3}, {6, 21}, {18, 21}, {18, 7}, {14, 3}, {14, 7}, {18, 7}});
}

void arrow(QPainterPath& path, double sign) {  // undo for +1, redo for −1, about x = 12
  const auto x = [sign](double right) { return 12 + sign * right; };
  polyline(path, {{x(-4), 5}, {x(-8), 9}, {x(-4), 13}});
  path.moveTo(x(-8), 9);
  path.lineTo(x(2), 9);
  path.cubicTo(x(9), 9, x(9), 19, x(2), 19);
  path.lineTo(x(-3), 19);
}

void book(QPainterPath& path) {
  path.addRoundedRect(5, 3, 14, 18, 2, 2);
  polyline(path, {{9, 3}, {9, 21}});
  polyline(path, {{12, 8}, {16, 8}});
}

QPainterPath drawing(ActionIcon icon) {
  QPainterPath path;
  switch (icon) {
    case ActionIcon::NewJob:
      page(path);
      polyline(path, {{12, 11}, {12, 17}});
      polyline(path, {{9, 14}, {15, 14}});
      break;
    case ActionIcon::AddRuns:
      path.moveTo(3, 10);
      path.cubicTo(6, 1, 9, 1, 12, 10);
      path.cubicTo(13, 13, 14, 14.5, 15.5, 15);
      polyline(path, {{19, 13}, {19, 21}});
      polyline(path, {{15, 17}, {23, 17}});
      break;
    case ActionIcon::JobBook:
      book(path);
      break;
    case ActionIcon::Demonstration:
      path.addEllipse(QPointF(12, 12), 9, 9);
      polyline(path, {{10, 8}, {16, 12}, {10, 16}, {10, 8}});
      break;
    case ActionIcon::Limits:
      polyline(path, {{3, 6}, {21, 6}});
      polyline(path, {{3, 18}, {21, 18}});
      path.moveTo(4, 15);
      path.cubicTo(9, 15, 14, 10, 20, 9);
      break;
    case ActionIcon::Sheet:
      page(path);
      polyline(path, {{9, 15}, {11, 17}, {15, 12}});
      break;
    case ActionIcon::SavePdf:
      polyline(path, {{12, 3}, {12, 15}});
      polyline(path, {{7, 10}, {12, 15}, {17, 10}});
      polyline(path, {{4, 16}, {4, 21}, {20, 21}, {20, 16}});
      break;
    case ActionIcon::Undo:
      arrow(path, 1);
      break;
    case ActionIcon::Redo:
      arrow(path, -1);
      break;
    case ActionIcon::Remove:
      polyline(path, {{6, 6}, {18, 18}});
      polyline(path, {{18, 6}, {6, 18}});
      break;
    case ActionIcon::Theme:
      path.addEllipse(QPointF(12, 12), 9, 9);
      path.moveTo(12, 3);
      path.cubicTo(7, 7, 7, 17, 12, 21);
      break;
    case ActionIcon::Handbook:
      path.addEllipse(QPointF(12, 12), 9, 9);
      path.moveTo(9, 9.5);
      path.cubicTo(9, 5.5, 15, 5.5, 15, 9.5);
      path.cubicTo(15, 12, 12, 11.5, 12, 14);
      polyline(path, {{12, 16.6}, {12, 17}});
      break;
  }
  return path;
}

class DrawnIcon : public QIconEngine {
 public:
  DrawnIcon(ActionIcon icon, const Palette& palette)
      : path_(drawing(icon)), colour_(palette.ink), disabled_(palette.bandOutline) {}

  QIconEngine* clone() const override { return new DrawnIcon(*this); }

  void paint(QPainter* painter, const QRect& rect, QIcon::Mode mode, QIcon::State) override {
    const double side = std::min(rect.width(), rect.height());
    painter->save();
    painter->setRenderHint(QPainter::Antialiasing);
    painter->translate(QRectF(rect).center() - QPointF(side / 2, side / 2));
    painter->scale(side / 24, side / 24);
    painter->setPen(QPen(mode == QIcon::Disabled ? disabled_ : colour_,
                         1.7,
                         Qt::SolidLine,
                         Qt::RoundCap,
                         Qt::RoundJoin));
    painter->drawPath(path_);
    painter->restore();
  }

  QPixmap pixmap(const QSize& size, QIcon::Mode mode, QIcon::State state) override {
    QPixmap pixmap(size);
    pixmap.fill(Qt::transparent);
    QPainter painter(&pixmap);
    paint(&painter, QRect(QPoint(0, 0), size), mode, state);
    return pixmap;
  }

 private:
  QPainterPath path_;
  QColor colour_, disabled_;
};

}  // namespace

QIcon actionIcon(ActionIcon icon, const Palette& palette) {
  return QIcon(new DrawnIcon(icon, palette));
}

}  // namespace dampwright
