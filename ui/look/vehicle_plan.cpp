// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/vehicle_plan.h"

#include <QPainterPath>
#include <QPen>
#include <algorithm>

namespace dampwright {

namespace {

constexpr double besideShare = 0.3;  // of the width that a motorcycle or a damper is drawn in

// Everything below is drawn in the unit square of `box`, x to the right, y to the rear.
QPointF in(const QRectF& box, double x, double y) {
  return {box.left() + x * box.width(), box.top() + y * box.height()};
}

QRectF in(const QRectF& box, double x, double y, double w, double h) {
  return {in(box, x, y), QSizeF(w * box.width(), h * box.height())};
}

QSizeF cardThatFits(VehicleKind kind, const QRectF& area, const QSizeF& card) {
  const int rows = kind == VehicleKind::SingleDamper ? 1 : 2;
  const double width =
      kind == VehicleKind::Car ? 0.46 * area.width() : (1 - besideShare) * area.width();
  return {std::min(card.width(), width), std::min(card.height(), 0.94 * area.height() / rows)};
}

// Top edge of a row of cards: of two at 7 % and 93 % of the space, of one in the middle.
double rowTop(VehicleKind kind, const QRectF& area, double height, bool rear) {
  const double space = area.height() - height;
  if (kind == VehicleKind::SingleDamper) return area.top() + space / 2;
  const double inset = std::min(0.09 * area.height(), (area.height() - 2 * height) / 2);
  return rear ? area.bottom() - height - inset : area.top() + inset;
}

QRectF besideBox(const QRectF& area) {
  return {area.left(), area.top(), besideShare * area.width(), area.height()};
}

void paintCar(QPainter& painter, const QRectF& area, const QSizeF& card) {
  // The body's sides run behind the cards, so that nose, tail, glass and roof stay in sight.
  const QSizeF size = cardThatFits(VehicleKind::Car, area, card);
  const double inset = 0.62 * size.width();
  const QRectF body = area.adjusted(inset, 0, -inset, 0).adjusted(0, 1, 0, -1);
  QPainterPath hull;
  hull.moveTo(in(body, 0, 0.14));
  hull.cubicTo(in(body, 0.02, 0.02), in(body, 0.2, 0), in(body, 0.5, 0));
  hull.cubicTo(in(body, 0.8, 0), in(body, 0.98, 0.02), in(body, 1, 0.14));
  hull.lineTo(in(body, 1, 0.9));
  hull.cubicTo(in(body, 0.99, 0.98), in(body, 0.84, 1), in(body, 0.5, 1));
  hull.cubicTo(in(body, 0.16, 1), in(body, 0.01, 0.98), in(body, 0, 0.9));
  hull.closeSubpath();
  painter.drawPath(hull);
  QPainterPath glass;
  glass.moveTo(in(body, 0.08, 0.34));
  glass.quadTo(in(body, 0.5, 0.26), in(body, 0.92, 0.34));
  glass.lineTo(in(body, 0.82, 0.43));
  glass.quadTo(in(body, 0.5, 0.39), in(body, 0.18, 0.43));
  glass.closeSubpath();
  glass.moveTo(in(body, 0.2, 0.74));
  glass.quadTo(in(body, 0.5, 0.77), in(body, 0.8, 0.74));
  glass.lineTo(in(body, 0.88, 0.82));
  glass.quadTo(in(body, 0.5, 0.86), in(body, 0.12, 0.82));
  glass.closeSubpath();
  painter.drawPath(glass);
  painter.drawLine(in(body, 0.18, 0.43), in(body, 0.2, 0.74));
  painter.drawLine(in(body, 0.82, 0.43), in(body, 0.8, 0.74));
}

void paintMotorcycle(QPainter& painter, const QRectF& area) {
  const QRectF box = besideBox(area);
  const double tyre = 0.16;
  const double round = 0.5 * tyre * box.width();
  painter.drawRoundedRect(in(box, 0.5 - tyre / 2, 0.02, tyre, 0.24), round, round);
  painter.drawRoundedRect(in(box, 0.5 - tyre / 2, 0.74, tyre, 0.24), round, round);
  QPainterPath bars;
  bars.moveTo(in(box, 0.04, 0.34));
  bars.cubicTo(in(box, 0.3, 0.3), in(box, 0.4, 0.25), in(box, 0.5, 0.25));
  bars.cubicTo(in(box, 0.6, 0.25), in(box, 0.7, 0.3), in(box, 0.96, 0.34));
  painter.drawPath(bars);
  QPainterPath tank;
  tank.moveTo(in(box, 0.5, 0.28));
  tank.cubicTo(in(box, 0.92, 0.3), in(box, 0.74, 0.5), in(box, 0.62, 0.52));
  tank.cubicTo(in(box, 0.72, 0.6), in(box, 0.66, 0.72), in(box, 0.5, 0.76));
  tank.cubicTo(in(box, 0.34, 0.72), in(box, 0.28, 0.6), in(box, 0.38, 0.52));
  tank.cubicTo(in(box, 0.26, 0.5), in(box, 0.08, 0.3), in(box, 0.5, 0.28));
  painter.drawPath(tank);
}

void paintDamper(QPainter& painter, const QRectF& area) {
  const double height = std::min(area.height(), 3.4 * besideShare * area.width());
  const QRectF column = besideBox(area);
  const QRectF box(column.left(), area.center().y() - height / 2, column.width(), height);
  const double eye = 0.07 * height;
  painter.drawEllipse(in(box, 0.5, 0.08), eye, eye);
  painter.drawEllipse(in(box, 0.5, 0.08), 0.45 * eye, 0.45 * eye);
  painter.drawRect(in(box, 0.46, 0.15, 0.08, 0.27));
  painter.drawRoundedRect(in(box, 0.34, 0.42, 0.32, 0.43), 0.04 * height, 0.02 * height);
  painter.drawLine(in(box, 0.34, 0.47), in(box, 0.66, 0.47));
  painter.drawEllipse(in(box, 0.5, 0.92), eye, eye);
  painter.drawEllipse(in(box, 0.5, 0.92), 0.45 * eye, 0.45 * eye);
}

}  // namespace

std::vector<VehiclePlace> vehiclePlaces(VehicleKind kind, const QRectF& area, const QSizeF& card) {
  const QSizeF size = cardThatFits(kind, area, card);
  std::vector<VehiclePlace> places;
  for (const std::string& corner : cornersOf(kind)) {
    const bool left = corner.find("left") != std::string::npos;
    const bool rear = corner.find("rear") != std::string::npos;
    const double x = left ? area.left() : area.right() - size.width();
    places.push_back({corner, QRectF(QPointF(x, rowTop(kind, area, size.height(), rear)), size)});
  }
  return places;
}

void paintVehicle(QPainter& painter,
                  VehicleKind kind,
                  const QRectF& area,
                  const QSizeF& card,
                  const Palette& palette) {
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  painter.setPen(QPen(palette.quiet, std::min(area.width(), area.height()) / 200));
  painter.setBrush(Qt::NoBrush);
  switch (kind) {
    case VehicleKind::Car:
      paintCar(painter, area, card);
      break;
    case VehicleKind::Motorcycle:
      paintMotorcycle(painter, area);
      break;
    case VehicleKind::SingleDamper:
      paintDamper(painter, area);
      break;
  }
  painter.restore();
}

}  // namespace dampwright
