// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>
#include <memory>
#include <optional>

#include "core/measure/measure_runs.h"
#include "core/verdict/verdict.h"
#include "ui/look/elided.h"
#include "ui/plots/instant.h"

namespace dampwright {

class LoopPlot;
class RunPlot;

/// The middle of the window: both loops side by side, always of one width and on one force axis,
/// and the run over time below. What is pointed at in one is marked in all three.
class LoopsView : public QWidget {
  Q_OBJECT
 public:
  explicit LoopsView(QWidget* parent = nullptr);

  /// What to show; nothing shows what will stand there. `verdict` gives the limit band.
  void setMeasured(const std::shared_ptr<const Measured>& measured,
                   const std::optional<Verdict>& verdict);

  LoopPlot* forceVelocity() const { return forceVelocity_; }
  LoopPlot* forceDisplacement() const { return forceDisplacement_; }
  RunPlot* run() const { return run_; }

 public slots:
  void showInstant(const std::optional<dampwright::Instant>& instant);
  void fit();

 private:
  QWidget* card(const QString& title, QWidget* plot, ElidedLabel* readout);

  LoopPlot* forceVelocity_;
  LoopPlot* forceDisplacement_;
  RunPlot* run_;
  ElidedLabel *velocityReadout_, *displacementReadout_, *runReadout_;
};

}  // namespace dampwright
