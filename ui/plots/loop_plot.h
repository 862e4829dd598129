// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>
#include <optional>

#include "ui/plots/instant.h"
#include "ui/plots/loop_figure.h"

class QCPCurve;
class QCPItemText;

namespace dampwright {

class PlotCanvas;

/// A loop plot on screen: draws a LoopFigure, points out one instant, zooms and pans.
class LoopPlot : public QWidget {
  Q_OBJECT
 public:
  explicit LoopPlot(FigureKind kind, QWidget* parent = nullptr);

  /// Another figure; the view is fitted when `force` or the speeds have changed.
  void setFigure(const LoopFigure& figure, const AxisScale& force);
  const LoopFigure& figure() const { return figure_; }
  QString readout() const;      ///< the instant's values in words, empty where there is none
  QRect axisRectangle() const;  ///< in pixels of this widget: both plots' are of one size
  std::pair<double, double> forceRange() const;  ///< N, as shown now

 public slots:
  void showInstant(const std::optional<dampwright::Instant>& instant);
  void showForceRange(double low, double high);  ///< the other plot was zoomed
  void fit();

 signals:
  void instantPointed(const std::optional<dampwright::Instant>& instant);
  void forceRangeChanged(double low, double high);
  void readoutChanged(const QString& text);

 private:
  void connectCanvas();
  void applyColours();
  void draw();
  void drawBands();
  void drawLoops();
  void drawDots();
  void drawLabels();
  QCPItemText* addLabel(const QString& text, Qt::Alignment anchor);
  void pointAt(const QPointF& pixel);
  void step(int along, int blocks);
  const LoopLine* lineOf(std::size_t block) const;
  std::optional<QPointF> pointOf(const Instant& instant) const;

  FigureKind kind_;
  LoopFigure figure_;
  AxisScale force_;
  std::optional<Instant> instant_;
  PlotCanvas* canvas_;
  QCPCurve* pointedLoop_;
  QCPCurve* pointedDot_;
};

}  // namespace dampwright
