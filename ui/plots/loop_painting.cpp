// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/loop_painting.h"

#include <QCoreApplication>
#include <QPolygonF>
#include <algorithm>

#include "ui/look/palette.h"
#include "ui/look/type.h"

namespace dampwright {

namespace {

struct Plots {
  Q_DECLARE_TR_FUNCTIONS(Plots)
};

constexpr int mostVertices = 20000;

// One plot on paper: the axis rectangle and the way from values to places in it.
class Canvas {
 public:
  Canvas(QPainter& painter,
         const QRectF& area,
         const LoopFigure& figure,
         const AxisScale& force,
         const PaperStyle& style)
      : painter_(painter),
        area_(area),
        figure_(figure),
        x_(xScale(figure)),
        y_(force),
        style_(style),
        colours_(printPalette()),
        line_(lineHeight(label())) {
    const double left = widestTick() + line_ + 2.5 * mm();
    const double right = 0.5 * mm();
    const double top = line_ + 2.5 * mm();
    const double bottom = 2 * line_ + 2 * mm();
    axes_ = area.adjusted(left, top, -right, -bottom);
  }

  void paint() {
    painter_.save();
    painter_.setRenderHint(QPainter::Antialiasing);
    paintGrid();
    painter_.setClipRect(axes_);
    paintBands();
    paintZeroLines();
    paintLoops();
    painter_.setClipping(false);
    paintDots();
    paintLabels();
    painter_.restore();
  }

 private:
  TextStyle label() const { return {style_.text, false, colours_.quiet}; }
  double mm() const { return style_.millimetre; }
  QPen pen(const QColor& colour, double widthMm) const { return {colour, widthMm * mm()}; }

  double widestTick() const {
    double widest = 0;
    for (const double tick : ticksOf(y_))
      widest = std::max(widest, textWidth(tickText(tick, y_.step), label()));
    return widest;
  }

  QPointF place(const QPointF& value) const {
    const double x = (value.x() - x_.low) / (x_.high - x_.low);
    // A limit that is open on one side runs out of the plot, not to infinity.
    const double y = std::clamp((value.y() - y_.low) / (y_.high - y_.low), -1.0, 2.0);
    return {axes_.left() + x * axes_.width(), axes_.bottom() - y * axes_.height()};
  }

  void paintGrid() {
    painter_.setPen(pen(colours_.hairline, 0.12));
    for (const double tick : ticksOf(x_)) {
      const double x = place({tick, 0}).x();
      painter_.drawLine(QPointF(x, axes_.top()), QPointF(x, axes_.bottom()));
    }
    for (const double tick : ticksOf(y_)) {
      const double y = place({0, tick}).y();
      painter_.drawLine(QPointF(axes_.left(), y), QPointF(axes_.right(), y));
    }
  }

  void paintZeroLines() {
    painter_.setPen(pen(colours_.quiet, 0.2));
    const QPointF zero = place({0, 0});
    painter_.drawLine(QPointF(axes_.left(), zero.y()), QPointF(axes_.right(), zero.y()));
    painter_.drawLine(QPointF(zero.x(), axes_.top()), QPointF(zero.x(), axes_.bottom()));
  }

  void paintBands() {
    for (const auto& band : figure_.bands) {
      QPolygonF outline;
      for (const LimitSpan& span : band) outline << place({span.x, span.high});
      for (auto span = band.rbegin(); span != band.rend(); ++span)
        outline << place({span->x, span->low});
      painter_.setPen(pen(colours_.bandOutline, 0.2));
      painter_.setBrush(colours_.band);
      painter_.drawPolygon(outline);
      // The limits hold at the speeds of the checks: each stands as a bar of its own.
      painter_.setPen(pen(colours_.bandOutline, 0.45));
      for (const LimitSpan& span : band)
        painter_.drawLine(place({span.x, span.low}), place({span.x, span.high}));
    }
  }

  void paintLoops() {
    painter_.setBrush(Qt::NoBrush);
    QPen dashed = pen(colours_.quiet, 0.25);
    dashed.setDashPattern({5, 3});
    painter_.setPen(dashed);
    painter_.drawPolyline(placed(figure_.gasLine, 1));
    const int stride = loopStride(figure_, mostVertices);
    painter_.setPen(pen(colours_.action, 0.25));
    for (const LoopLine& loop : figure_.loops) painter_.drawPolyline(placed(loop.points, stride));
  }

  QPolygonF placed(const std::vector<QPointF>& points, int stride) const {
    QPolygonF line;
    for (std::size_t i = 0; i < points.size(); i += static_cast<std::size_t>(stride))
      line << place(points[i]);
    if (!points.empty()) line << place(points.back());
    return line;
  }

  void paintDots() {
    const double radius = 0.8 * mm();
    painter_.setPen(pen(colours_.ink, 0.3));
    painter_.setBrush(Qt::white);
    for (const CurveDot& dot : figure_.dots) {
      const QPointF centre = place(dot.at);
      const double half = centre.y() - place({dot.at.x(), dot.at.y() + dot.bar}).y();
      if (half > radius) painter_.drawLine(centre - QPointF(0, half), centre + QPointF(0, half));
      painter_.drawEllipse(centre, radius, radius);
    }
  }

  void paintLabels() {
    for (const double tick : labelledTicks()) {
      const QRectF box(
          place({tick, 0}).x() - 50 * mm(), axes_.bottom() + 0.7 * mm(), 100 * mm(), line_);
      drawText(painter_, box, tickText(tick, x_.step), label(), Qt::AlignCenter);
    }
    for (const double tick : ticksOf(y_)) {
      const QRectF box(
          axes_.left() - 51 * mm(), place({0, tick}).y() - line_, 50 * mm(), 2 * line_);
      drawText(painter_, box, tickText(tick, y_.step), label(), Qt::AlignRight | Qt::AlignVCenter);
    }
    paintXTitle();
    paintSidewaysTitle();
    paintDirectLabels();
    drawText(painter_,
             {area_.left(), area_.top(), area_.width(), line_},
             figureTitle(figure_.kind),
             {style_.text, true, colours_.ink});
  }

  // Of a narrow plot every second or third tick, counted from zero, so that no labels touch.
  std::vector<double> labelledTicks() const {
    double widest = 0;
    for (const double tick : ticksOf(x_))
      widest = std::max(widest, textWidth(tickText(tick, x_.step), label()));
    const double spacing = axes_.width() * x_.step / (x_.high - x_.low);
    const double stride = std::ceil((widest + mm()) / spacing);
    std::vector<double> ticks = ticksOf(x_);
    std::erase_if(ticks, [&](double tick) {
      return std::abs(std::remainder(std::round(tick / x_.step), stride)) > 0.5;
    });
    return ticks;
  }

  // Under the middle of the axis, or as near to it as the area allows.
  void paintXTitle() {
    const QString title = figureXTitle(figure_.kind);
    const double width = textWidth(title, label());
    const double left =
        std::max(area_.left(), std::min(axes_.center().x() - width / 2, area_.right() - width));
    drawText(painter_, {left, area_.bottom() - line_, width, line_}, title, label());
  }

  void paintSidewaysTitle() {
    painter_.save();
    painter_.translate(area_.left(), axes_.center().y());
    painter_.rotate(-90);
    const QRectF box(-axes_.height() / 2, 0, axes_.height(), line_);
    drawText(painter_, box, figureYTitle(), label(), Qt::AlignCenter);
    painter_.restore();
  }

  void paintDirectLabels() {
    if (!figure_.bands.empty()) {
      const LimitSpan& end = figure_.bands.back().back();
      const double bottom = std::max(place({end.x, end.high}).y(), axes_.top() + line_);
      labelAt({place({end.x, 0}).x() - 50 * mm(), bottom - line_, 50 * mm(), line_},
              Plots::tr("limits"),
              Qt::AlignRight);
    }
    if (!figure_.gasLine.empty()) {
      // On the line of the title: beside the dashed line and among the loops there is no room.
      labelAt({axes_.right() - 50 * mm(), area_.top(), 50 * mm(), line_},
              Plots::tr("dashed: gas"),
              Qt::AlignRight);
    }
    const double gap = 1.1 * line_ * (y_.high - y_.low) / axes_.height();
    for (const LoopLabel& speed : speedLabels(figure_, gap)) {
      const QPointF at = place(speed.at);
      labelAt({at.x() - 25 * mm(), at.y() - line_, 50 * mm(), line_}, speed.text, Qt::AlignHCenter);
    }
  }

  void labelAt(const QRectF& box, const QString& text, Qt::Alignment side) {
    drawText(painter_, box, text, label(), side | Qt::AlignVCenter);
  }

  QPainter& painter_;
  QRectF area_, axes_;
  const LoopFigure& figure_;
  AxisScale x_, y_;
  const PaperStyle& style_;
  const Palette& colours_;
  double line_;
};

}  // namespace

int loopStride(const LoopFigure& figure, int most) {
  const auto vertices = [&figure](std::size_t stride) {
    std::size_t sum = 0;
    for (const LoopLine& loop : figure.loops) sum += (loop.points.size() + stride - 1) / stride + 1;
    return sum;
  };
  std::size_t stride = 1;
  // With a point a loop there is nothing left to leave out.
  while (vertices(stride) > static_cast<std::size_t>(most) && stride < 1000) ++stride;
  return static_cast<int>(stride);
}

void paintLoopFigure(QPainter& painter,
                     const QRectF& area,
                     const LoopFigure& figure,
                     const AxisScale& force,
                     const PaperStyle& style) {
  Canvas(painter, area, figure, force, style).paint();
}

}  // namespace dampwright
