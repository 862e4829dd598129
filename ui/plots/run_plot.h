// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>
#include <optional>
#include <vector>

#include "ui/plots/envelope.h"
#include "ui/plots/instant.h"
#include "ui/plots/run_figure.h"

class QCPAxisRect;
class QCPGraph;
class QCPItemLine;
class QCPItemRect;
class QCPItemText;

namespace dampwright {

class PlotCanvas;

/// The run over time: displacement above, force below, speed blocks shaded and named by speed,
/// conditioning cycles hatched, struck-out cycles cross-hatched. A cycle is chosen by a click or by
/// the arrow keys, struck out or put back by the context menu, by Delete, or from outside.
class RunPlot : public QWidget {
  Q_OBJECT
 public:
  explicit RunPlot(QWidget* parent = nullptr);

  void setFigure(const RunFigure& figure);
  const RunFigure& figure() const { return figure_; }
  std::optional<RunCycle> chosenCycle() const;
  QString readout() const;                      ///< time and cycle pointed at, in words
  std::pair<double, double> timeRange() const;  ///< s, as shown now

 public slots:
  void showInstant(const std::optional<dampwright::Instant>& instant);
  void chooseCycle(const std::optional<std::size_t>& index);  ///< index into the figure's cycles
  void switchChosenCycle();  ///< strikes the chosen cycle out, or puts it back
  void fit();

 signals:
  void instantPointed(const std::optional<dampwright::Instant>& instant);
  void readoutChanged(const QString& text);
  void chosenCycleChanged();
  void strikeOutWanted(int run, const dampwright::TimeSpan& span);
  void putBackWanted(int run, const dampwright::TimeSpan& span);

 protected:
  void keyPressEvent(QKeyEvent* event) override;

 private:
  struct Strip {
    QCPAxisRect* rect = nullptr;
    std::vector<Envelope> channels;  // one for each stretch
    std::vector<QCPGraph*> graphs;
    QCPItemLine* pointer = nullptr;
  };

  void buildStrip(Strip& strip, const QString& title);
  void connectCanvas();
  void applyColours();
  void draw();
  void drawStrip(Strip& strip);
  void shade(double from, double to, const QBrush& brush, const QPen& outline);
  void drawShades();
  void drawCycles();
  void drawChosen();
  void refill();
  void setTimeRange(double from, double to);
  void step(int along, int blocks);
  void showMenu(const QPoint& at);
  double timeAt(double pixel) const;
  QString describe(const RunCycle& cycle) const;

  RunFigure figure_;
  PlotCanvas* canvas_;
  Strip displacement_, force_;
  std::vector<std::pair<RunShade, QCPItemText*>> labels_;
  std::vector<QCPItemRect*> chosenMarks_;
  std::optional<std::size_t> chosen_;
  std::optional<Instant> instant_;
};

}  // namespace dampwright
