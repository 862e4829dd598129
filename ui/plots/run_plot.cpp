// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/run_plot.h"

#include <QVBoxLayout>
#include <algorithm>
#include <cmath>

#include "ui/look/type.h"
#include "ui/plots/plot_canvas.h"
#include "ui/plots/round_ticker.h"
#include "ui/text/numbers.h"

namespace dampwright {

namespace {

constexpr double panShare = 0.1;
constexpr double shortestView = 0.02;  // s: closer there is nothing more to see

bool ofSameFiles(const RunFigure& a, const RunFigure& b) {
  if (a.empty() || b.empty()) return a.empty() == b.empty();
  return std::ranges::equal(a.measured->measurement.runs,
                            b.measured->measurement.runs,
                            [](const MeasuredRun& left, const MeasuredRun& right) {
                              return left.source.file.sha256 == right.source.file.sha256;
                            });
}

}  // namespace

RunPlot::RunPlot(QWidget* parent) : QWidget(parent), canvas_(new PlotCanvas(this)) {
  auto* layout = new QVBoxLayout(this);
  layout->setContentsMargins(0, 0, 0, 0);
  layout->addWidget(canvas_);
  setFocusProxy(canvas_);
  canvas_->plotLayout()->clear();
  canvas_->plotLayout()->setRowSpacing(0);
  buildStrip(displacement_, tr("Displacement\n%1").arg(unitSymbol(Quantity::Length)));
  buildStrip(force_, tr("Force\n%1").arg(unitSymbol(Quantity::Force)));
  displacement_.rect->axis(QCPAxis::atBottom)->setTickLabels(false);
  force_.rect->axis(QCPAxis::atBottom)->setLabel(tr("Time, %1").arg(unitSymbol(Quantity::Time)));
  canvas_->setAccessibleName(runTitle());
  canvas_->setContextMenuPolicy(Qt::CustomContextMenu);
  connectCanvas();
  applyColours();
}

void RunPlot::buildStrip(Strip& strip, const QString& title) {
  strip.rect = new QCPAxisRect(canvas_);
  canvas_->plotLayout()->addElement(canvas_->plotLayout()->rowCount(), 0, strip.rect);
  canvas_->adopt(strip.rect);
  strip.rect->setMinimumMargins({8, 2, 12, 2});
  QCPAxis* x = strip.rect->axis(QCPAxis::atBottom);
  QCPAxis* y = strip.rect->axis(QCPAxis::atLeft);
  x->setTicker(QSharedPointer<RoundTicker>::create(12));
  y->setTicker(QSharedPointer<RoundTicker>::create(4));
  x->grid()->setZeroLinePen(Qt::NoPen);
  y->setLabel(title);
  strip.rect->setRangeDrag(Qt::Horizontal);
  strip.rect->setRangeZoom(Qt::Horizontal);
  // Both strips keep one left edge, so that an instant stands on one vertical line.
  if (displacement_.rect != strip.rect) {
    auto* sides = new QCPMarginGroup(canvas_);
    displacement_.rect->setMarginGroup(QCP::msLeft | QCP::msRight, sides);
    strip.rect->setMarginGroup(QCP::msLeft | QCP::msRight, sides);
  }
  connect(x, qOverload<const QCPRange&>(&QCPAxis::rangeChanged), this, [this](const QCPRange& r) {
    setTimeRange(r.lower, r.upper);
  });
}

void RunPlot::connectCanvas() {
  connect(canvas_, &PlotCanvas::coloursChanged, this, &RunPlot::applyColours);
  connect(canvas_, &PlotCanvas::pointed, this, [this](const QPointF& pixel) {
    emit instantPointed(instantAt(figure_, timeAt(pixel.x())));
  });
  connect(canvas_, &PlotCanvas::clicked, this, [this](const QPointF& pixel) {
    chooseCycle(cycleAt(figure_, timeAt(pixel.x())));
  });
  connect(canvas_, &PlotCanvas::let, this, [this] { emit instantPointed(std::nullopt); });
  connect(canvas_, &PlotCanvas::stepped, this, &RunPlot::step);
  connect(canvas_, &PlotCanvas::fitWanted, this, &RunPlot::fit);
  connect(canvas_, &PlotCanvas::zoomWanted, this, [this](double factor) {
    const auto [from, to] = timeRange();
    const double half = 0.5 * (to - from) * factor;
    setTimeRange(0.5 * (from + to) - half, 0.5 * (from + to) + half);
  });
  connect(canvas_, &PlotCanvas::panWanted, this, [this](int right, int) {
    const auto [from, to] = timeRange();
    const double way = right * panShare * (to - from);
    setTimeRange(from + way, to + way);
  });
  connect(canvas_, &QCustomPlot::afterLayout, this, &RunPlot::refill);
  connect(canvas_, &QWidget::customContextMenuRequested, this, &RunPlot::showMenu);
}

void RunPlot::setFigure(const RunFigure& figure) {
  // A rig profile may give the same file another clock.
  const bool otherRun = !ofSameFiles(figure, figure_) || figure.end() != figure_.end();
  // The same cycle stays chosen when only its state has changed.
  const std::optional<RunCycle> before = chosenCycle();
  figure_ = figure;
  chosen_.reset();
  if (before && !otherRun) chosen_ = cycleAt(figure_, 0.5 * (before->from + before->to));
  draw();
  if (otherRun) fit();
  showInstant(std::nullopt);
  emit chosenCycleChanged();
}

void RunPlot::applyColours() {
  for (Strip* strip : {&displacement_, &force_})
    strip->rect->axis(QCPAxis::atBottom)->grid()->setZeroLinePen(Qt::NoPen);
  draw();
}

void RunPlot::draw() {
  canvas_->clearItems();
  canvas_->clearPlottables();
  labels_.clear();
  chosenMarks_.clear();
  displacement_.channels.clear();
  force_.channels.clear();
  for (const RunStretch& stretch : figure_.stretches) {
    const Motion& motion = figure_.measured->motions[stretch.run];
    displacement_.channels.emplace_back(motion.displacement, stretch.from, 1 / motion.rate);
    force_.channels.emplace_back(motion.force, stretch.from, 1 / motion.rate);
  }
  drawStrip(displacement_);
  drawStrip(force_);
  drawShades();
  drawCycles();
  drawChosen();
  canvas_->setEmptyText(figure_.empty() ? runEmptyText() : QString());
  canvas_->setAccessibleDescription(figure_.empty() ? runEmptyText() : runSummary(figure_));
  refill();
  canvas_->replot(QCustomPlot::rpQueuedReplot);
}

void RunPlot::drawStrip(Strip& strip) {
  const bool isForce = &strip == &force_;
  const Quantity quantity = isForce ? Quantity::Force : Quantity::Length;
  QCPAxis* x = strip.rect->axis(QCPAxis::atBottom);
  QCPAxis* y = strip.rect->axis(QCPAxis::atLeft);
  strip.graphs.clear();
  double low = INFINITY, high = -INFINITY;
  for (const Envelope& channel : strip.channels) {
    auto* graph = new QCPGraph(x, y);
    graph->setPen(canvas_->dataPen(isForce ? canvas_->colours().action : canvas_->colours().ink));
    graph->setAdaptiveSampling(false);
    strip.graphs.push_back(graph);
    low = std::fmin(low, shownFromSi(channel.smallest(), quantity));
    high = std::fmax(high, shownFromSi(channel.largest(), quantity));
  }
  const double room = high > low ? 0.08 * (high - low) : 1;
  const double labelRoom = isForce ? room : 3.5 * room;  // the speeds stand above
  if (std::isfinite(low) && std::isfinite(high)) y->setRange(low - room, high + labelRoom);
  strip.pointer = new QCPItemLine(canvas_);
  strip.pointer->setLayer(canvas_->overlay());
  strip.pointer->setPen(QPen(canvas_->colours().evidence, 1));
  for (QCPItemPosition* end : {strip.pointer->start, strip.pointer->end}) {
    end->setAxes(x, y);
    end->setAxisRect(strip.rect);
    end->setTypeX(QCPItemPosition::ptPlotCoords);
    end->setTypeY(QCPItemPosition::ptAxisRectRatio);
  }
  strip.pointer->setClipAxisRect(strip.rect);
  strip.pointer->setVisible(false);
}

void RunPlot::shade(double from, double to, const QBrush& brush, const QPen& outline) {
  for (Strip* strip : {&displacement_, &force_}) {
    auto* rect = new QCPItemRect(canvas_);
    rect->setLayer(QStringLiteral("background"));
    for (QCPItemPosition* corner : {rect->topLeft, rect->bottomRight}) {
      corner->setAxes(strip->rect->axis(QCPAxis::atBottom), strip->rect->axis(QCPAxis::atLeft));
      corner->setAxisRect(strip->rect);
      corner->setTypeX(QCPItemPosition::ptPlotCoords);
      corner->setTypeY(QCPItemPosition::ptAxisRectRatio);
    }
    rect->topLeft->setCoords(from, 0);
    rect->bottomRight->setCoords(to, 1);
    rect->setClipAxisRect(strip->rect);
    rect->setBrush(brush);
    rect->setPen(outline);
    if (outline.style() != Qt::NoPen) chosenMarks_.push_back(rect);
  }
}

void RunPlot::drawShades() {
  for (const RunShade& block : figure_.shades) {
    shade(block.from, block.to, canvas_->colours().band, Qt::NoPen);
    auto* label = new QCPItemText(canvas_);
    label->position->setAxes(displacement_.rect->axis(QCPAxis::atBottom),
                             displacement_.rect->axis(QCPAxis::atLeft));
    label->position->setAxisRect(displacement_.rect);
    label->position->setTypeX(QCPItemPosition::ptPlotCoords);
    label->position->setTypeY(QCPItemPosition::ptAxisRectRatio);
    label->setPositionAlignment(Qt::AlignHCenter | Qt::AlignTop);
    label->setClipAxisRect(displacement_.rect);
    label->setText(block.label);
    label->setFont(screenFont(TextSize::Quiet));
    label->setColor(canvas_->colours().quiet);
    labels_.emplace_back(block, label);
  }
}

void RunPlot::drawCycles() {
  const QBrush hatched(canvas_->colours().bandOutline, Qt::BDiagPattern);
  const QBrush crossed(canvas_->colours().evidence, Qt::DiagCrossPattern);
  const RunCycle* open = nullptr;  // first of a row of conditioning cycles
  double to = 0;
  for (const RunCycle& cycle : figure_.cycles) {
    const bool conditioning = cycle.conditioning && !cycle.struckOut;
    const bool goesOn = open != nullptr && conditioning && cycle.block == open->block;
    if (open != nullptr && !goesOn) shade(open->from, to, hatched, Qt::NoPen);
    if (!goesOn) open = conditioning ? &cycle : nullptr;
    to = cycle.to;
    if (cycle.struckOut) shade(cycle.from, cycle.to, crossed, Qt::NoPen);
  }
  if (open != nullptr) shade(open->from, to, hatched, Qt::NoPen);
}

void RunPlot::drawChosen() {
  for (QCPItemRect* mark : chosenMarks_) canvas_->removeItem(mark);
  chosenMarks_.clear();
  if (!chosen_) return;
  const RunCycle& cycle = figure_.cycles[*chosen_];
  shade(cycle.from, cycle.to, Qt::NoBrush, QPen(canvas_->colours().action, 2));
}

void RunPlot::refill() {
  const auto [from, to] = timeRange();
  for (Strip* strip : {&displacement_, &force_}) {
    const Quantity quantity = strip == &force_ ? Quantity::Force : Quantity::Length;
    const int columns = std::max(strip->rect->width(), 1);
    for (std::size_t i = 0; i < strip->graphs.size(); ++i) {
      QVector<QCPGraphData> drawn;
      for (const QPointF& point : strip->channels[i].visible(from, to, columns))
        drawn.append({point.x(), shownFromSi(point.y(), quantity)});
      strip->graphs[i]->data()->set(drawn, true);
    }
  }
  const QCPAxis* x = displacement_.rect->axis(QCPAxis::atBottom);
  for (auto& [block, label] : labels_) {
    const double left = std::max(block.from, from), right = std::min(block.to, to);
    const double room = x->coordToPixel(right) - x->coordToPixel(left);
    const QFontMetrics metrics(label->font());
    label->setVisible(right > left && room > metrics.horizontalAdvance(block.label) + 4);
    label->position->setCoords(0.5 * (left + right), 0.01);
  }
}

void RunPlot::setTimeRange(double from, double to) {
  const double end = figure_.end();
  const double length = std::clamp(to - from, std::min(shortestView, end), end);
  from = std::clamp(from, 0.0, end - length);
  for (Strip* strip : {&displacement_, &force_}) {
    const QSignalBlocker quiet(strip->rect->axis(QCPAxis::atBottom));
    strip->rect->axis(QCPAxis::atBottom)->setRange(from, from + length);
  }
  refill();
  canvas_->replot(QCustomPlot::rpQueuedReplot);
}

void RunPlot::fit() { setTimeRange(0, figure_.end()); }

std::pair<double, double> RunPlot::timeRange() const {
  const QCPRange range = displacement_.rect->axis(QCPAxis::atBottom)->range();
  return {range.lower, range.upper};
}

double RunPlot::timeAt(double pixel) const {
  return displacement_.rect->axis(QCPAxis::atBottom)->pixelToCoord(pixel);
}

void RunPlot::showInstant(const std::optional<Instant>& instant) {
  instant_ = instant;
  const auto time = instant ? timeOf(figure_, *instant) : std::nullopt;
  for (Strip* strip : {&displacement_, &force_}) {
    strip->pointer->setVisible(time.has_value());
    if (!time) continue;
    strip->pointer->start->setCoords(*time, 0);
    strip->pointer->end->setCoords(*time, 1);
  }
  canvas_->overlay()->replot();
  emit readoutChanged(readout());
}

}  // namespace dampwright
