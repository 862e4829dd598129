// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/plot_canvas.h"

#include "ui/look/type.h"

namespace dampwright {

namespace {

constexpr int frameMs = 16;
constexpr int fastSteps = 10;  // with Shift

void colourAxis(QCPAxis* axis, const Palette& colours) {
  axis->setTickLabelColor(colours.quiet);
  axis->setLabelColor(colours.quiet);
  axis->setTickLabelFont(screenFont(TextSize::Quiet));
  axis->setLabelFont(screenFont(TextSize::Quiet));
  axis->setBasePen(Qt::NoPen);
  axis->setTickPen(Qt::NoPen);
  axis->setSubTickPen(Qt::NoPen);
  axis->setTickLength(0);
  axis->setSubTickLength(0);
  axis->grid()->setPen(QPen(colours.hairline, 1));
  axis->grid()->setZeroLinePen(QPen(colours.quiet, 1));
}

}  // namespace

PlotCanvas::PlotCanvas(QWidget* parent) : QCustomPlot(parent) {
  setFocusPolicy(Qt::StrongFocus);
  setMouseTracking(true);
  addLayer(QStringLiteral("pointing"), layer(QStringLiteral("main")), limAbove);
  overlay_ = layer(QStringLiteral("pointing"));
  overlay_->setMode(QCPLayer::lmBuffered);
  constexpr double fineScreen = 1.5;
  if (devicePixelRatioF() >= fineScreen) setPlottingHint(QCP::phFastPolylines);
  setInteractions(QCP::iRangeDrag | QCP::iRangeZoom);
  hover_.setSingleShot(true);
  hover_.setInterval(frameMs);
  connect(&hover_, &QTimer::timeout, this, [this] { emit pointed(hoverAt_); });
  adopt(axisRect());
  applyColours();
}

void PlotCanvas::adopt(QCPAxisRect* rect) {
  rect->setMinimumMargins({8, 6, 12, 4});
  for (QCPAxis* axis : rect->axes()) {
    axis->setNumberFormat(QStringLiteral("f"));
    axis->setNumberPrecision(0);
    axis->grid()->setSubGridVisible(false);
    colourAxis(axis, colours_);
  }
}

void PlotCanvas::applyColours() {
  colours_ = paletteFor(palette());
  setBackground(QBrush(colours_.card));
  for (QCPAxisRect* rect : axisRects()) {
    for (QCPAxis* axis : rect->axes()) colourAxis(axis, colours_);
  }
  emit coloursChanged();
  replot(rpQueuedReplot);
}

void PlotCanvas::changeEvent(QEvent* event) {
  QCustomPlot::changeEvent(event);
  if (event->type() == QEvent::PaletteChange) applyColours();
}

QPen PlotCanvas::dataPen(const QColor& colour) const {
  return QPen(colour, plottingHints().testFlag(QCP::phFastPolylines) ? 1.25 : 1);
}

void PlotCanvas::setEmptyText(const QString& text) {
  if (emptyText_ == text) return;
  emptyText_ = text;
  for (QCPAxisRect* rect : axisRects()) {
    for (const auto side : {QCPAxis::atBottom, QCPAxis::atLeft})
      rect->axis(side)->setVisible(text.isEmpty());
  }
  replot(rpQueuedReplot);
}

void PlotCanvas::mouseMoveEvent(QMouseEvent* event) {
  QCustomPlot::mouseMoveEvent(event);
  hoverAt_ = event->position();
  if (!hover_.isActive()) hover_.start();
}

void PlotCanvas::mousePressEvent(QMouseEvent* event) {
  QCustomPlot::mousePressEvent(event);
  pressedAt_ = event->position();
  if (event->button() == Qt::LeftButton) setCursor(Qt::ClosedHandCursor);
}

void PlotCanvas::mouseReleaseEvent(QMouseEvent* event) {
  QCustomPlot::mouseReleaseEvent(event);
  unsetCursor();
  const QPointF moved = event->position() - pressedAt_;
  if (event->button() == Qt::LeftButton &&
      moved.manhattanLength() < QApplication::startDragDistance())
    emit clicked(event->position());
}

void PlotCanvas::mouseDoubleClickEvent(QMouseEvent* event) {
  QCustomPlot::mouseDoubleClickEvent(event);
  emit fitWanted();
}

void PlotCanvas::leaveEvent(QEvent* event) {
  QCustomPlot::leaveEvent(event);
  hover_.stop();
  emit let();
}

bool PlotCanvas::arrow(QKeyEvent* event) {
  const int right = event->key() == Qt::Key_Right ? 1 : event->key() == Qt::Key_Left ? -1 : 0;
  const int up = event->key() == Qt::Key_Up ? 1 : event->key() == Qt::Key_Down ? -1 : 0;
  if (right == 0 && up == 0) return false;
  if (event->modifiers() & Qt::ControlModifier) {
    emit panWanted(right, up);
  } else {
    emit stepped(event->modifiers() & Qt::ShiftModifier ? right * fastSteps : right, up);
  }
  return true;
}

void PlotCanvas::keyPressEvent(QKeyEvent* event) {
  if (arrow(event)) return;
  constexpr double zoomIn = 0.8;
  switch (event->key()) {
    case Qt::Key_Plus:
    case Qt::Key_Equal:
      return emit zoomWanted(zoomIn);
    case Qt::Key_Minus:
      return emit zoomWanted(1 / zoomIn);
    case Qt::Key_Home:
    case Qt::Key_0:
      return emit fitWanted();
    case Qt::Key_Escape:
      return emit let();
    default:
      QCustomPlot::keyPressEvent(event);
  }
}

void PlotCanvas::paintEvent(QPaintEvent* event) {
  QCustomPlot::paintEvent(event);
  QPainter painter(this);
  if (!emptyText_.isEmpty()) {
    painter.setPen(colours_.quiet);
    painter.setFont(screenFont(TextSize::Text));
    painter.drawText(
        rect().adjusted(16, 0, -16, 0), Qt::AlignCenter | Qt::TextWordWrap, emptyText_);
  }
  if (hasFocus()) {
    painter.setPen(QPen(colours_.action, 2));
    painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), 4, 4);
  }
}

void PlotCanvas::focusInEvent(QFocusEvent* event) {
  QCustomPlot::focusInEvent(event);
  update();
}

void PlotCanvas::focusOutEvent(QFocusEvent* event) {
  QCustomPlot::focusOutEvent(event);
  update();
}

}  // namespace dampwright
