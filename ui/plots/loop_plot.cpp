// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/loop_plot.h"

#include <QVBoxLayout>
#include <algorithm>
#include <cmath>

#include "ui/look/type.h"
#include "ui/plots/plot_canvas.h"
#include "ui/plots/round_ticker.h"
#include "ui/text/numbers.h"

namespace dampwright {

namespace {

constexpr double catchPixels = 24;  // farther from every loop the mouse points at nothing
constexpr double stepsPerTurn = 360;
constexpr double panShare = 0.1;

void setTicker(QCPAxis* axis) {
  constexpr int mostIntervals = 6;
  axis->setTicker(QSharedPointer<RoundTicker>::create(mostIntervals));
}

QCPCurve* addCurve(PlotCanvas* canvas, const QPen& pen) {
  auto* curve = new QCPCurve(canvas->xAxis, canvas->yAxis);
  curve->setPen(pen);
  curve->setSelectable(QCP::stNone);
  return curve;
}

void setPoints(QCPCurve* curve, const std::vector<QPointF>& points) {
  QVector<QCPCurveData> data;
  data.reserve(static_cast<qsizetype>(points.size()));
  double t = 0;
  for (const QPointF& point : points) data.append({t++, point.x(), point.y()});
  curve->data()->set(data, true);
}

}  // namespace

LoopPlot::LoopPlot(FigureKind kind, QWidget* parent)
    : QWidget(parent), kind_(kind), canvas_(new PlotCanvas(this)) {
  figure_.kind = kind;
  auto* layout = new QVBoxLayout(this);
  layout->setContentsMargins(0, 0, 0, 0);
  layout->addWidget(canvas_);
  setFocusProxy(canvas_);
  canvas_->xAxis->setLabel(figureXTitle(kind));
  canvas_->yAxis->setLabel(figureYTitle());
  setTicker(canvas_->xAxis);
  setTicker(canvas_->yAxis);
  pointedLoop_ = addCurve(canvas_, {});
  pointedDot_ = addCurve(canvas_, {});
  pointedLoop_->setLayer(canvas_->overlay());
  pointedDot_->setLayer(canvas_->overlay());
  pointedDot_->setLineStyle(QCPCurve::lsNone);
  canvas_->setAccessibleName(figureTitle(kind));
  connectCanvas();
  applyColours();
  fit();
}

void LoopPlot::connectCanvas() {
  connect(canvas_, &PlotCanvas::coloursChanged, this, &LoopPlot::applyColours);
  connect(canvas_, &PlotCanvas::pointed, this, &LoopPlot::pointAt);
  connect(canvas_, &PlotCanvas::let, this, [this] { emit instantPointed(std::nullopt); });
  connect(canvas_, &PlotCanvas::stepped, this, &LoopPlot::step);
  connect(canvas_, &PlotCanvas::fitWanted, this, &LoopPlot::fit);
  connect(canvas_, &PlotCanvas::zoomWanted, this, [this](double factor) {
    canvas_->xAxis->scaleRange(factor);
    canvas_->yAxis->scaleRange(factor);
    canvas_->replot(QCustomPlot::rpQueuedReplot);
  });
  connect(canvas_, &PlotCanvas::panWanted, this, [this](int right, int up) {
    canvas_->xAxis->moveRange(right * panShare * canvas_->xAxis->range().size());
    canvas_->yAxis->moveRange(up * panShare * canvas_->yAxis->range().size());
    canvas_->replot(QCustomPlot::rpQueuedReplot);
  });
  connect(canvas_->yAxis,
          qOverload<const QCPRange&>(&QCPAxis::rangeChanged),
          this,
          [this](const QCPRange& range) { emit forceRangeChanged(range.lower, range.upper); });
}

void LoopPlot::setFigure(const LoopFigure& figure, const AxisScale& force) {
  const bool otherView = !(force == force_) || !(xScale(figure) == xScale(figure_));
  figure_ = figure;
  force_ = force;
  instant_.reset();
  draw();
  if (otherView) fit();
  showInstant(std::nullopt);
}

void LoopPlot::applyColours() {
  const Palette& colours = canvas_->colours();
  pointedLoop_->setPen(QPen(colours.action, 2));
  pointedDot_->setScatterStyle(
      QCPScatterStyle(QCPScatterStyle::ssCircle, QPen(colours.evidence, 2), colours.card, 9));
  draw();
}

void LoopPlot::draw() {
  canvas_->clearItems();
  for (int i = canvas_->plottableCount() - 1; i >= 0; --i) {
    QCPAbstractPlottable* plottable = canvas_->plottable(i);
    if (plottable != pointedLoop_ && plottable != pointedDot_) canvas_->removePlottable(i);
  }
  drawBands();
  drawLoops();
  drawDots();
  drawLabels();
  canvas_->setEmptyText(figure_.empty() ? figureEmptyText(kind_) : QString());
  canvas_->setAccessibleDescription(figureSummary(figure_));
  canvas_->replot(QCustomPlot::rpQueuedReplot);
}

void LoopPlot::drawBands() {
  // A limit that is open on one side runs out of the view, however far that is zoomed out.
  const double far = 100 * (force_.high - force_.low);
  for (const auto& band : figure_.bands) {
    std::vector<QPointF> outline;
    for (const LimitSpan& span : band) outline.emplace_back(span.x, std::min(span.high, far));
    for (auto span = band.rbegin(); span != band.rend(); ++span)
      outline.emplace_back(span->x, std::max(span->low, -far));
    outline.push_back(outline.front());
    QCPCurve* area = addCurve(canvas_, QPen(canvas_->colours().bandOutline, 1));
    area->setBrush(canvas_->colours().band);
    setPoints(area, outline);
    for (const LimitSpan& span : band) {
      setPoints(addCurve(canvas_, QPen(canvas_->colours().bandOutline, 1)),
                {{span.x, std::max(span.low, -far)}, {span.x, std::min(span.high, far)}});
    }
  }
}

void LoopPlot::drawLoops() {
  if (!figure_.gasLine.empty())
    setPoints(addCurve(canvas_, QPen(canvas_->colours().quiet, 1, Qt::DashLine)), figure_.gasLine);
  for (const LoopLine& loop : figure_.loops)
    setPoints(addCurve(canvas_, canvas_->dataPen(canvas_->colours().action)), loop.points);
}

void LoopPlot::drawDots() {
  if (figure_.dots.empty()) return;
  constexpr double diameter = 8;
  constexpr double hiddenShare = 0.012;  // of the axis: a bar that its circle covers
  const QPen pen(canvas_->colours().ink, 1);
  auto* barred = canvas_->addGraph();
  barred->setLineStyle(QCPGraph::lsNone);
  auto* bars = new QCPErrorBars(canvas_->xAxis, canvas_->yAxis);
  bars->setDataPlottable(barred);
  bars->setPen(pen);
  auto* circles = canvas_->addGraph();
  circles->setLineStyle(QCPGraph::lsNone);
  circles->setScatterStyle(
      QCPScatterStyle(QCPScatterStyle::ssCircle, pen, canvas_->colours().card, diameter));
  for (const CurveDot& dot : figure_.dots) {
    circles->addData(dot.at.x(), dot.at.y());
    if (dot.bar < hiddenShare * (force_.high - force_.low)) continue;
    barred->addData(dot.at.x(), dot.at.y());
    bars->addData(dot.bar);
  }
}

QCPItemText* LoopPlot::addLabel(const QString& text, Qt::Alignment anchor) {
  auto* label = new QCPItemText(canvas_);
  label->setPositionAlignment(anchor);
  label->setText(text);
  label->setColor(canvas_->colours().quiet);
  label->setFont(screenFont(TextSize::Quiet));
  label->setPadding({4, 1, 4, 1});
  return label;
}

void LoopPlot::drawLabels() {
  if (!figure_.bands.empty()) {
    const LimitSpan& end = figure_.bands.back().back();
    addLabel(tr("limits"), Qt::AlignRight | Qt::AlignBottom)
        ->position->setCoords(end.x, std::min(end.high, force_.high));
  }
  if (!figure_.gasLine.empty()) {
    // Loops leave the corners of their plot empty; beside the line there is no room for words.
    QCPItemPosition* corner =
        addLabel(tr("dashed: gas force"), Qt::AlignRight | Qt::AlignBottom)->position;
    corner->setType(QCPItemPosition::ptAxisRectRatio);
    corner->setCoords(1, 1);
  }
  constexpr double gapShare = 0.05;  // of the axis: about a line of text
  for (const LoopLabel& speed : speedLabels(figure_, gapShare * (force_.high - force_.low)))
    addLabel(speed.text, Qt::AlignHCenter | Qt::AlignBottom)->position->setCoords(speed.at);
}

void LoopPlot::fit() {
  const AxisScale x = xScale(figure_);
  canvas_->xAxis->setRange(x.low, x.high);
  canvas_->yAxis->setRange(force_.low, force_.high);
  canvas_->replot(QCustomPlot::rpQueuedReplot);
}

void LoopPlot::showForceRange(double low, double high) {
  const QCPRange now = canvas_->yAxis->range();
  if (now.lower == low && now.upper == high) return;
  canvas_->yAxis->setRange(low, high);
  canvas_->replot(QCustomPlot::rpQueuedReplot);
}

const LoopLine* LoopPlot::lineOf(std::size_t block) const {
  const auto found = std::find_if(figure_.loops.begin(),
                                  figure_.loops.end(),
                                  [block](const LoopLine& line) { return line.block == block; });
  return found == figure_.loops.end() ? nullptr : &*found;
}

std::optional<QPointF> LoopPlot::pointOf(const Instant& instant) const {
  const LoopLine* line = lineOf(instant.block);
  if (line == nullptr || line->points.empty()) return std::nullopt;
  const double at = instant.phase * static_cast<double>(line->points.size() - 1);
  const auto index = static_cast<std::size_t>(std::lround(at));
  return line->points[std::min(index, line->points.size() - 1)];
}

void LoopPlot::showInstant(const std::optional<Instant>& instant) {
  instant_ = instant;
  const auto point = instant ? pointOf(*instant) : std::nullopt;
  setPoints(pointedLoop_, point ? lineOf(instant->block)->points : std::vector<QPointF>{});
  setPoints(pointedDot_, point ? std::vector<QPointF>{*point} : std::vector<QPointF>{});
  canvas_->overlay()->replot();
  emit readoutChanged(readout());
}

QString LoopPlot::readout() const {
  const auto point = instant_ ? pointOf(*instant_) : std::nullopt;
  if (!point) return {};
  const Quantity across =
      kind_ == FigureKind::ForceVelocity ? Quantity::Velocity : Quantity::Length;
  return quantityText(siFromShown(point->x(), across), across) + QStringLiteral(" · ") +
         quantityText(siFromShown(point->y(), Quantity::Force), Quantity::Force);
}

void LoopPlot::pointAt(const QPointF& pixel) {
  double nearest = catchPixels * catchPixels;
  std::optional<Instant> found;
  for (const LoopLine& line : figure_.loops) {
    for (std::size_t i = 0; i + 1 < line.points.size(); ++i) {
      const double dx = canvas_->xAxis->coordToPixel(line.points[i].x()) - pixel.x();
      const double dy = canvas_->yAxis->coordToPixel(line.points[i].y()) - pixel.y();
      if (dx * dx + dy * dy >= nearest) continue;
      nearest = dx * dx + dy * dy;
      const double turn = static_cast<double>(line.points.size() - 1);
      found = Instant{line.block, static_cast<double>(i) / turn, std::nullopt};
    }
  }
  emit instantPointed(found);
}

void LoopPlot::step(int along, int blocks) {
  if (figure_.loops.empty()) return;
  Instant next = instant_.value_or(Instant{figure_.loops.front().block, 0, std::nullopt});
  next.cycle.reset();
  next.phase += along / stepsPerTurn;
  next.phase -= std::floor(next.phase);
  const LoopLine* line = lineOf(next.block);
  const auto last = static_cast<int>(figure_.loops.size()) - 1;
  const int at = line == nullptr ? 0 : static_cast<int>(line - figure_.loops.data());
  // The loops stand by falling speed: one up is one faster.
  next.block = figure_.loops[static_cast<std::size_t>(std::clamp(at - blocks, 0, last))].block;
  emit instantPointed(next);
}

QRect LoopPlot::axisRectangle() const { return canvas_->axisRect()->rect(); }

std::pair<double, double> LoopPlot::forceRange() const {
  return {canvas_->yAxis->range().lower, canvas_->yAxis->range().upper};
}

}  // namespace dampwright
