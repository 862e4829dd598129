// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/run_figure.h"

#include <QCoreApplication>
#include <QStringList>
#include <algorithm>
#include <cmath>

#include "ui/text/numbers.h"

namespace dampwright {

namespace {

struct Plots {
  Q_DECLARE_TR_FUNCTIONS(Plots)
};

// Between one file and the next the strip stays empty for this share of all of them.
constexpr double gapShare = 0.01;

std::vector<RunStretch> stretchesOf(const std::vector<Motion>& motions) {
  double sum = 0;
  for (const Motion& motion : motions) sum += static_cast<double>(motion.size()) / motion.rate;
  std::vector<RunStretch> stretches;
  double at = 0;
  for (std::size_t run = 0; run < motions.size(); ++run) {
    const double length = static_cast<double>(motions[run].size()) / motions[run].rate;
    stretches.push_back({run, at, at + length, at - motions[run].startTime});
    at += length + gapShare * sum;
  }
  return stretches;
}

QString shadeLabel(const MeasuredBlock& measured) {
  if (measured.block.kind == BlockKind::Hold) return Plots::tr("hold");
  const double speed = std::max(measured.compression.peakVelocity, measured.rebound.peakVelocity);
  return numberText(std::round(shownFromSi(speed, Quantity::Velocity)), 0);
}

void takeBlock(RunFigure& figure, std::size_t index) {
  const MeasuredBlock& measured = figure.measured->measurement.blocks[index];
  if (measured.run >= figure.stretches.size()) return;
  const double shift = figure.stretches[measured.run].shift;
  const Block& block = measured.block;
  figure.shades.push_back({index, block.start + shift, block.end + shift, shadeLabel(measured)});
  for (std::size_t i = 0; i < block.cycles.size(); ++i) {
    const Cycle& cycle = block.cycles[i];
    figure.cycles.push_back({index,
                             i,
                             measured.run,
                             cycle.start + shift,
                             cycle.end + shift,
                             {cycle.start, cycle.end},
                             cycle.conditioning,
                             cycle.struckOut});
  }
}

const RunCycle* cycleOf(const RunFigure& figure, const Instant& instant) {
  std::vector<const RunCycle*> used;
  const RunCycle* any = nullptr;
  for (const RunCycle& cycle : figure.cycles) {
    if (cycle.block != instant.block) continue;
    if (instant.cycle && *instant.cycle == cycle.cycle) return &cycle;
    any = &cycle;
    if (cycle.used()) used.push_back(&cycle);
  }
  return used.empty() ? any : used[used.size() / 2];
}

}  // namespace

RunFigure runFigure(std::shared_ptr<const Measured> measured) {
  RunFigure figure;
  figure.measured = std::move(measured);
  if (!figure.measured) return figure;
  figure.stretches = stretchesOf(figure.measured->motions);
  for (std::size_t i = 0; i < figure.measured->measurement.blocks.size(); ++i) takeBlock(figure, i);
  std::sort(figure.cycles.begin(), figure.cycles.end(), [](const auto& a, const auto& b) {
    return a.from < b.from;
  });
  return figure;
}

std::optional<std::size_t> cycleAt(const RunFigure& figure, double shownTime) {
  const auto after = std::upper_bound(
      figure.cycles.begin(), figure.cycles.end(), shownTime, [](double time, const RunCycle& c) {
        return time < c.from;
      });
  if (after == figure.cycles.begin() || shownTime > std::prev(after)->to) return std::nullopt;
  return static_cast<std::size_t>(std::prev(after) - figure.cycles.begin());
}

std::optional<Instant> instantAt(const RunFigure& figure, double shownTime) {
  const auto index = cycleAt(figure, shownTime);
  if (!index) return std::nullopt;
  const RunCycle& cycle = figure.cycles[*index];
  if (!(cycle.to > cycle.from)) return std::nullopt;
  const double phase = std::min((shownTime - cycle.from) / (cycle.to - cycle.from), 1 - 1e-9);
  return Instant{cycle.block, phase, cycle.cycle};
}

std::optional<double> timeOf(const RunFigure& figure, const Instant& instant) {
  const RunCycle* cycle = cycleOf(figure, instant);
  if (cycle == nullptr) return std::nullopt;
  return cycle->from + instant.phase * (cycle->to - cycle->from);
}

TimeSpan struckSpan(const RunFigure& figure, const RunCycle& cycle) {
  const double middle = 0.5 * (cycle.span.start + cycle.span.end);
  const auto& runs = figure.measured->measurement.runs;
  if (cycle.run >= runs.size()) return cycle.span;
  for (const TimeSpan& span : runs[cycle.run].struckOut) {
    if (span.start <= middle && middle <= span.end) return span;
  }
  return cycle.span;
}

QString runTitle() { return Plots::tr("Run over time"); }

QString runEmptyText() {
  return Plots::tr("The run over time stands here, with its speed blocks shaded.");
}

QString runSummary(const RunFigure& figure) {
  if (figure.empty()) return {};
  int used = 0, conditioning = 0, struckOut = 0;
  for (const RunCycle& cycle : figure.cycles) {
    used += cycle.used() ? 1 : 0;
    struckOut += cycle.struckOut ? 1 : 0;
    conditioning += cycle.conditioning && !cycle.struckOut ? 1 : 0;
  }
  int blocks = 0;
  for (const RunShade& shade : figure.shades) {
    const BlockKind kind = figure.measured->measurement.blocks[shade.block].block.kind;
    blocks += kind == BlockKind::Hold ? 0 : 1;
  }
  QStringList parts;
  parts << (blocks == 1 ? Plots::tr("1 speed block") : Plots::tr("%1 speed blocks").arg(blocks));
  parts << (used == 1 ? Plots::tr("1 cycle used") : Plots::tr("%1 cycles used").arg(used));
  if (conditioning > 0) parts << Plots::tr("%1 conditioning left out").arg(conditioning);
  if (struckOut > 0) parts << Plots::tr("%1 struck out").arg(struckOut);
  return parts.join(QStringLiteral(" · "));
}

}  // namespace dampwright
