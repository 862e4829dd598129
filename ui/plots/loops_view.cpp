// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/loops_view.h"

#include <QFrame>
#include <QGridLayout>
#include <QHBoxLayout>
#include <QVBoxLayout>

#include "ui/look/elided.h"
#include "ui/look/type.h"
#include "ui/plots/loop_plot.h"
#include "ui/plots/run_plot.h"

namespace dampwright {

LoopsView::LoopsView(QWidget* parent)
    : QWidget(parent),
      forceVelocity_(new LoopPlot(FigureKind::ForceVelocity)),
      forceDisplacement_(new LoopPlot(FigureKind::ForceDisplacement)),
      run_(new RunPlot),
      velocityReadout_(new ElidedLabel),
      displacementReadout_(new ElidedLabel),
      runReadout_(new ElidedLabel) {
  auto* grid = new QGridLayout(this);
  grid->setContentsMargins(0, 0, 0, 0);
  grid->setSpacing(12);
  grid->addWidget(
      card(figureTitle(FigureKind::ForceVelocity), forceVelocity_, velocityReadout_), 0, 0);
  grid->addWidget(
      card(figureTitle(FigureKind::ForceDisplacement), forceDisplacement_, displacementReadout_),
      0,
      1);
  grid->addWidget(card(runTitle(), run_, runReadout_), 1, 0, 1, 2);
  grid->setColumnStretch(0, 1);
  grid->setColumnStretch(1, 1);
  grid->setRowStretch(0, 58);
  grid->setRowStretch(1, 42);

  for (LoopPlot* plot : {forceVelocity_, forceDisplacement_})
    connect(plot, &LoopPlot::instantPointed, this, &LoopsView::showInstant);
  connect(run_, &RunPlot::instantPointed, this, &LoopsView::showInstant);
  connect(
      forceVelocity_, &LoopPlot::forceRangeChanged, forceDisplacement_, &LoopPlot::showForceRange);
  connect(
      forceDisplacement_, &LoopPlot::forceRangeChanged, forceVelocity_, &LoopPlot::showForceRange);
  connect(forceVelocity_, &LoopPlot::readoutChanged, velocityReadout_, &ElidedLabel::setWhole);
  connect(
      forceDisplacement_, &LoopPlot::readoutChanged, displacementReadout_, &ElidedLabel::setWhole);
  connect(run_, &RunPlot::readoutChanged, runReadout_, &ElidedLabel::setWhole);
}

QWidget* LoopsView::card(const QString& title, QWidget* plot, ElidedLabel* readout) {
  auto* frame = new QFrame;
  frame->setObjectName(QStringLiteral("card"));
  auto* heading = new QLabel(title);
  heading->setFont(screenFont(TextSize::Heading));
  readout->setFont(screenFont(TextSize::Quiet));
  readout->setAlignment(Qt::AlignRight | Qt::AlignVCenter);
  // The readout changes with every move of the mouse: it must not move the plots.
  readout->setSizePolicy(QSizePolicy::Ignored, QSizePolicy::Preferred);
  auto* top = new QHBoxLayout;
  top->setContentsMargins(16, 12, 16, 0);
  top->addWidget(heading);
  top->addWidget(readout, 1);
  auto* column = new QVBoxLayout(frame);
  column->setContentsMargins(0, 0, 0, 8);
  column->setSpacing(4);
  column->addLayout(top);
  column->addWidget(plot, 1);
  return frame;
}

void LoopsView::setMeasured(const std::shared_ptr<const Measured>& measured,
                            const std::optional<Verdict>& verdict) {
  LoopFigure velocity, displacement;
  displacement.kind = FigureKind::ForceDisplacement;
  if (measured) {
    const Verdict* limits = verdict ? &*verdict : nullptr;
    velocity = loopFigure(FigureKind::ForceVelocity, measured->measurement, limits);
    displacement = loopFigure(FigureKind::ForceDisplacement, measured->measurement, limits);
  }
  const AxisScale force = commonForceScale({&velocity, &displacement});
  forceVelocity_->setFigure(velocity, force);
  forceDisplacement_->setFigure(displacement, force);
  run_->setFigure(runFigure(measured));
}

void LoopsView::showInstant(const std::optional<Instant>& instant) {
  forceVelocity_->showInstant(instant);
  forceDisplacement_->showInstant(instant);
  run_->showInstant(instant);
}

void LoopsView::fit() {
  forceVelocity_->fit();
  forceDisplacement_->fit();
  run_->fit();
}

}  // namespace dampwright
