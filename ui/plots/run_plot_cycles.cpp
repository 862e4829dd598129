// SPDX-License-Identifier: GPL-3.0-or-later
// Choosing a cycle of the run over time, and saying which one it is.
#include <QKeyEvent>
#include <QMenu>
#include <algorithm>

#include "ui/plots/plot_canvas.h"
#include "ui/plots/run_plot.h"
#include "ui/text/numbers.h"

namespace dampwright {

std::optional<RunCycle> RunPlot::chosenCycle() const {
  if (!chosen_ || *chosen_ >= figure_.cycles.size()) return std::nullopt;
  return figure_.cycles[*chosen_];
}

void RunPlot::chooseCycle(const std::optional<std::size_t>& index) {
  chosen_ = index && *index < figure_.cycles.size() ? index : std::nullopt;
  drawChosen();
  canvas_->replot(QCustomPlot::rpQueuedReplot);
  emit readoutChanged(readout());
  emit chosenCycleChanged();
}

void RunPlot::switchChosenCycle() {
  const std::optional<RunCycle> cycle = chosenCycle();
  if (!cycle) return;
  const int run = static_cast<int>(cycle->run);
  if (cycle->struckOut) {
    emit putBackWanted(run, struckSpan(figure_, *cycle));
  } else {
    emit strikeOutWanted(run, cycle->span);
  }
}

void RunPlot::keyPressEvent(QKeyEvent* event) {
  if (event->key() == Qt::Key_Delete) return switchChosenCycle();
  QWidget::keyPressEvent(event);
}

void RunPlot::step(int along, int blocks) {
  if (figure_.cycles.empty()) return;
  const int last = static_cast<int>(figure_.cycles.size()) - 1;
  int at = chosen_ ? static_cast<int>(*chosen_) + along : 0;
  at = std::clamp(at, 0, last);
  if (blocks != 0) {
    const std::size_t block = figure_.cycles[static_cast<std::size_t>(at)].block;
    const auto inBlock = [&](int i) {
      return figure_.cycles[static_cast<std::size_t>(i)].block == block;
    };
    while (at + blocks >= 0 && at + blocks <= last && inBlock(at)) at += blocks;
  }
  chooseCycle(static_cast<std::size_t>(at));
  const RunCycle& cycle = figure_.cycles[static_cast<std::size_t>(at)];
  emit instantPointed(Instant{cycle.block, 0.5, cycle.cycle});
}

void RunPlot::showMenu(const QPoint& at) {
  const auto under = cycleAt(figure_, timeAt(at.x()));
  if (under) chooseCycle(under);
  const std::optional<RunCycle> cycle = chosenCycle();
  if (!cycle) return;
  auto* menu = new QMenu(this);
  menu->setAttribute(Qt::WA_DeleteOnClose);
  menu->addAction(cycle->struckOut ? tr("Put this cycle back") : tr("Strike this cycle out"),
                  this,
                  &RunPlot::switchChosenCycle);
  menu->popup(canvas_->mapToGlobal(at));
}

QString RunPlot::describe(const RunCycle& cycle) const {
  const QString name = tr("cycle %1").arg(cycle.cycle + 1);
  if (cycle.struckOut) return tr("%1, struck out").arg(name);
  if (cycle.conditioning) return tr("%1, conditioning").arg(name);
  return name;
}

QString RunPlot::readout() const {
  if (figure_.empty()) return {};
  const auto time = instant_ ? timeOf(figure_, *instant_) : std::nullopt;
  if (!time) {
    const auto chosen = chosenCycle();
    return chosen ? tr("Chosen: %1").arg(describe(*chosen)) : runSummary(figure_);
  }
  const auto index = cycleAt(figure_, *time);
  const QString at = quantityText(*time, Quantity::Time);
  return index ? at + QStringLiteral(" · ") + describe(figure_.cycles[*index]) : at;
}

}  // namespace dampwright
