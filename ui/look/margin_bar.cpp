// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/margin_bar.h"

#include <QPen>
#include <QPolygonF>
#include <algorithm>
#include <cmath>

namespace dampwright {

namespace {

// share = offset + slope · value
struct Line {
  double offset = 0.5, slope = 0;
  double of(double value) const { return offset + slope * value; }
};

Line through(double value1, double share1, double value2, double share2) {
  if (value1 == value2) return {0.5, 0};
  const double slope = (share2 - share1) / (value2 - value1);
  return {share1 - slope * value1, slope};
}

Line scaleOf(const CheckVerdict& check) {
  if (check.min && check.max) return through(*check.min, 0.25, *check.max, 0.75);
  // One limit: its own size is the ruler; where it is zero, the figure's.
  const double limit = check.max ? *check.max : check.min.value_or(0);
  const double figure = std::abs(check.measured.value_or(0)) + check.expandedUncertainty;
  const double ruler = limit != 0 ? std::abs(limit) : std::max(figure, 1e-9);
  if (check.max) return through(limit, 0.75, limit - ruler, 0.0);
  return through(limit, 0.25, limit + 3 * ruler, 1.0);
}

void paintTicks(QPainter& painter,
                const QRectF& box,
                const MarginScale& scale,
                const CheckVerdict& check,
                const QColor& colour) {
  painter.setPen(QPen(colour, 0.09 * box.height(), Qt::SolidLine, Qt::FlatCap));
  const auto tick = [&](double share) {
    const double x = box.left() + share * box.width();
    painter.drawLine(QPointF(x, box.top() + 0.1 * box.height()),
                     QPointF(x, box.bottom() - 0.1 * box.height()));
  };
  if (check.min) tick(scale.allowedFrom);
  if (check.max) tick(scale.allowedTo);
}

void paintFigure(QPainter& painter,
                 const QRectF& box,
                 const MarginScale& scale,
                 const Palette& palette) {
  const double y = box.center().y();
  const double radius = 0.26 * box.height();
  const double x = std::clamp(box.left() + *scale.at * box.width(),
                              box.left() + 1.25 * radius,
                              box.right() - 1.25 * radius);
  painter.setPen(QPen(palette.ink, 0.11 * box.height(), Qt::SolidLine, Qt::FlatCap));
  painter.drawLine(QPointF(box.left() + scale.from * box.width(), y),
                   QPointF(box.left() + scale.to * box.width(), y));
  painter.setPen(Qt::NoPen);
  painter.setBrush(palette.ink);
  if (!scale.beyond) {
    painter.drawEllipse(QPointF(x, y), radius, radius);
    return;
  }
  const double towards = *scale.at > 0.5 ? 1 : -1;
  painter.drawPolygon(QPolygonF{{x + towards * 1.2 * radius, y},
                                {x - towards * radius, y - 1.2 * radius},
                                {x - towards * radius, y + 1.2 * radius}});
}

}  // namespace

MarginScale marginScale(const CheckVerdict& check) {
  const Line line = scaleOf(check);
  MarginScale scale;
  if (check.min) scale.allowedFrom = line.of(*check.min);
  if (check.max) scale.allowedTo = line.of(*check.max);
  if (!check.measured) return scale;
  const double share = line.of(*check.measured);
  const double half = std::abs(line.slope) * check.expandedUncertainty;
  scale.at = std::clamp(share, 0.0, 1.0);
  scale.beyond = share < 0 || share > 1;
  scale.from = std::clamp(share - half, 0.0, 1.0);
  scale.to = std::clamp(share + half, 0.0, 1.0);
  return scale;
}

void paintMarginBar(QPainter& painter,
                    const QRectF& box,
                    const CheckVerdict& check,
                    const Palette& palette) {
  const MarginScale scale = marginScale(check);
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  const double thin = 0.1 * box.height();
  painter.fillRect(QRectF(box.left(), box.center().y() - thin / 2, box.width(), thin),
                   palette.hairline);
  if (check.min || check.max) {
    const double thick = 0.44 * box.height();
    painter.fillRect(QRectF(box.left() + scale.allowedFrom * box.width(),
                            box.center().y() - thick / 2,
                            (scale.allowedTo - scale.allowedFrom) * box.width(),
                            thick),
                     palette.hairline);
    paintTicks(painter, box, scale, check, palette.quiet);
  }
  if (scale.at) paintFigure(painter, box, scale, palette);
  painter.restore();
}

}  // namespace dampwright
