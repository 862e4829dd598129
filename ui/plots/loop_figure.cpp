// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/loop_figure.h"

#include <QCoreApplication>
#include <algorithm>
#include <cmath>
#include <limits>

#include "core/base/units.h"
#include "ui/text/numbers.h"

namespace dampwright {

namespace {

struct Plots {
  Q_DECLARE_TR_FUNCTIONS(Plots)
};

constexpr int mostIntervals = 6;
constexpr double barCoverage = 2;  // k of the bars; the checks state their own

double shownForce(double si) { return shownFromSi(si, Quantity::Force); }
double shownVelocity(double si) { return shownFromSi(si, Quantity::Velocity); }
double shownLength(double si) { return shownFromSi(si, Quantity::Length); }

double peakSpeed(const MeasuredBlock& block) {
  return std::max(block.compression.peakVelocity, block.rebound.peakVelocity);
}

LoopLine lineOf(FigureKind kind, const MeasuredBlock& measured, std::size_t index) {
  const Loop& loop = measured.block.loop;
  LoopLine line{
      index, exactText(std::round(peakSpeed(measured) * 1e3) / 1e3, Quantity::Velocity), {}};
  line.points.reserve(loop.size() + 1);
  for (std::size_t i = 0; i <= loop.size(); ++i) {
    const std::size_t at = i % loop.size();
    const double x = kind == FigureKind::ForceVelocity ? shownVelocity(loop.velocity[at])
                                                       : shownLength(loop.displacement[at]);
    line.points.emplace_back(x, shownForce(loop.force[at]));
  }
  return line;
}

std::vector<LoopLine> loopsOf(FigureKind kind, const Measurement& measurement) {
  std::vector<std::pair<double, std::size_t>> bySpeed;
  for (std::size_t i = 0; i < measurement.blocks.size(); ++i) {
    if (measurement.blocks[i].block.loop.size() > 0)
      bySpeed.emplace_back(-peakSpeed(measurement.blocks[i]), i);
  }
  std::sort(bySpeed.begin(), bySpeed.end());
  std::vector<LoopLine> loops;
  for (const auto& [speed, index] : bySpeed)
    loops.push_back(lineOf(kind, measurement.blocks[index], index));
  return loops;
}

std::vector<CurveDot> dotsOf(const Measurement& measurement) {
  std::vector<CurveDot> dots;
  for (const Direction direction : {Direction::Rebound, Direction::Compression}) {
    const double sign = signOf(direction);
    for (const CurvePoint& point : measurement.curve(direction).points) {
      const Reading& reading = point.reading;
      dots.push_back(
          {point.block,
           {sign * shownVelocity(reading.peakVelocity), sign * shownForce(reading.force)},
           barCoverage * shownForce(reading.forceTotalU)});
    }
  }
  return dots;
}

bool isForceCheck(const CheckVerdict& judged) {
  return judged.check.check == "force" && judged.check.direction && judged.check.velocity &&
         (judged.min || judged.max);
}

LimitSpan spanOf(const CheckVerdict& judged, double gasForce) {
  const double sign = signOf(*judged.check.direction);
  const double infinity = std::numeric_limits<double>::infinity();
  const double near = sign * judged.min.value_or(-infinity) + gasForce;
  const double far = sign * judged.max.value_or(infinity) + gasForce;
  return {sign * shownVelocity(*judged.check.velocity),
          shownForce(std::min(near, far)),
          shownForce(std::max(near, far))};
}

std::vector<std::vector<LimitSpan>> bandsOf(const Measurement& measurement,
                                            const Verdict& verdict) {
  const bool gasRemoved = verdict.forceBasis == ForceBasis::GasRemoved;
  const double gasForce = gasRemoved ? measurement.gas.force.value_or(0) : 0;
  std::vector<std::vector<LimitSpan>> bands;
  for (const Direction direction : {Direction::Rebound, Direction::Compression}) {
    std::vector<LimitSpan> band;
    for (const CheckVerdict& judged : verdict.checks) {
      if (isForceCheck(judged) && *judged.check.direction == direction)
        band.push_back(spanOf(judged, gasForce));
    }
    std::sort(band.begin(), band.end(), [](const auto& a, const auto& b) { return a.x < b.x; });
    if (!band.empty()) bands.push_back(band);
  }
  return bands;
}

std::vector<QPointF> gasLineOf(const Measurement& measurement) {
  const Block* widest = nullptr;
  for (const MeasuredBlock& measured : measurement.blocks) {
    const bool wider = widest == nullptr || measured.block.stroke > widest->stroke;
    if (measured.block.loop.size() > 0 && wider) widest = &measured.block;
  }
  if (widest == nullptr || !measurement.gas.force) return {};
  std::vector<QPointF> line;
  constexpr int steps = 48;
  for (int i = 0; i <= steps; ++i) {
    const double x = widest->stroke * (static_cast<double>(i) / steps - 0.5);
    line.emplace_back(shownLength(x), shownForce(measurement.gas.at(widest->mid + x)));
  }
  return line;
}

struct Extent {
  double low = 0, high = 0;  // zero is always shown

  void take(double value) {
    if (!std::isfinite(value)) return;
    low = std::min(low, value);
    high = std::max(high, value);
  }
};

void takeForces(const LoopFigure& figure, Extent& extent) {
  for (const LoopLine& loop : figure.loops) {
    for (const QPointF& point : loop.points) extent.take(point.y());
  }
  for (const CurveDot& dot : figure.dots) {
    extent.take(dot.at.y() - dot.bar);
    extent.take(dot.at.y() + dot.bar);
  }
  for (const auto& band : figure.bands) {
    for (const LimitSpan& span : band) {
      extent.take(span.low);
      extent.take(span.high);
    }
  }
}

}  // namespace

LoopFigure loopFigure(FigureKind kind, const Measurement& measurement, const Verdict* verdict) {
  LoopFigure figure;
  figure.kind = kind;
  figure.loops = loopsOf(kind, measurement);
  if (kind == FigureKind::ForceVelocity) {
    figure.dots = dotsOf(measurement);
    if (verdict != nullptr) figure.bands = bandsOf(measurement, *verdict);
  } else {
    figure.gasLine = gasLineOf(measurement);
  }
  return figure;
}

QString figureTitle(FigureKind kind) {
  return kind == FigureKind::ForceVelocity ? Plots::tr("Force–velocity")
                                           : Plots::tr("Force–displacement");
}

QString figureXTitle(FigureKind kind) {
  return kind == FigureKind::ForceVelocity
             ? Plots::tr("Velocity, %1 (compression →)").arg(unitSymbol(Quantity::Velocity))
             : Plots::tr("Displacement, %1 (compression →)").arg(unitSymbol(Quantity::Length));
}

QString figureYTitle() {
  return Plots::tr("Force, %1 (compression ↑)").arg(unitSymbol(Quantity::Force));
}

QString figureEmptyText(FigureKind kind) {
  return kind == FigureKind::ForceVelocity
             ? Plots::tr("Force against velocity stands here\nonce a run is read.")
             : Plots::tr("Force against displacement stands here\nonce a run is read.");
}

QString figureSummary(const LoopFigure& figure) {
  if (figure.loops.empty()) return figureEmptyText(figure.kind);
  Extent force;
  takeForces({figure.kind, figure.loops, {}, {}, {}}, force);
  const QString fastest = figure.loops.front().label;
  const QString speeds =
      figure.loops.size() == 1
          ? Plots::tr("1 speed, %1.").arg(fastest)
          : Plots::tr("%1 speeds, up to %2.").arg(QString::number(figure.loops.size()), fastest);
  const QString forces =
      Plots::tr("Force from %1 in rebound to %2 in compression.")
          .arg(quantityText(siFromShown(force.low, Quantity::Force), Quantity::Force),
               quantityText(siFromShown(force.high, Quantity::Force), Quantity::Force));
  QString text = speeds + ' ' + forces;
  if (!figure.bands.empty()) text += ' ' + Plots::tr("The band shows the limits.");
  return text;
}

std::vector<LoopLabel> speedLabels(const LoopFigure& figure, double gap) {
  std::vector<LoopLabel> labels;
  if (figure.kind == FigureKind::ForceVelocity) return labels;
  double above = std::numeric_limits<double>::infinity();  // top of the next larger loop
  for (const LoopLine& loop : figure.loops) {
    const auto top = std::max_element(
        loop.points.begin(), loop.points.end(), [](const QPointF& a, const QPointF& b) {
          return a.y() < b.y();
        });
    if (top == loop.points.end()) continue;
    const double room = above - top->y();
    above = top->y();
    if (room < gap) continue;
    labels.push_back({*top, loop.label});
  }
  return labels;
}

AxisScale xScale(const LoopFigure& figure) {
  Extent extent;
  for (const LoopLine& loop : figure.loops) {
    for (const QPointF& point : loop.points) extent.take(point.x());
  }
  for (const auto& band : figure.bands) {
    for (const LimitSpan& span : band) extent.take(span.x);
  }
  // Both directions get the same room, so that left and right compare at a glance.
  const double reach = std::max(extent.high, -extent.low);
  return roomyScale(-reach, reach, mostIntervals);
}

AxisScale commonForceScale(std::initializer_list<const LoopFigure*> figures) {
  Extent extent;
  for (const LoopFigure* figure : figures) takeForces(*figure, extent);
  return roomyScale(extent.low, extent.high, mostIntervals);
}

}  // namespace dampwright
