// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <cstddef>
#include <memory>
#include <optional>
#include <vector>

#include "core/measure/measure_runs.h"
#include "ui/plots/instant.h"

namespace dampwright {

/// One run file on the common clock of the strip: shown time = its own time + shift.
struct RunStretch {
  std::size_t run = 0;
  double from = 0, to = 0;  ///< s, shown
  double shift = 0;         ///< s
};

/// A speed block or a hold, as shaded.
struct RunShade {
  std::size_t block = 0;
  double from = 0, to = 0;  ///< s, shown
  QString label;            ///< its speed without unit, or "hold"
};

/// One cycle. Its span on the clock of its own file is what is struck out and put back.
struct RunCycle {
  std::size_t block = 0, cycle = 0, run = 0;
  double from = 0, to = 0;  ///< s, shown
  TimeSpan span;            ///< s, clock of the file
  bool conditioning = false, struckOut = false;

  bool used() const { return !conditioning && !struckOut; }
};

/// What the run over time shows: all run files of a measurement one behind the other.
struct RunFigure {
  std::shared_ptr<const Measured> measured;  ///< keeps the samples alive
  std::vector<RunStretch> stretches;
  std::vector<RunShade> shades;
  std::vector<RunCycle> cycles;  ///< by rising time

  bool empty() const { return stretches.empty(); }
  double end() const { return stretches.empty() ? 1 : stretches.back().to; }  ///< s, shown
};

RunFigure runFigure(std::shared_ptr<const Measured> measured);

/// The cycle at a shown time; nothing between blocks.
std::optional<std::size_t> cycleAt(const RunFigure& figure, double shownTime);
/// The instant at a shown time, and where an instant stands: in its own cycle, else in the middle
/// one of the block's used cycles.
std::optional<Instant> instantAt(const RunFigure& figure, double shownTime);
std::optional<double> timeOf(const RunFigure& figure, const Instant& instant);

/// The span that was struck out where this cycle lies; the cycle's own where there is none.
TimeSpan struckSpan(const RunFigure& figure, const RunCycle& cycle);

QString runTitle();
QString runEmptyText();
/// "7 speed blocks · 58 cycles used · 4 left out · 1 struck out"
QString runSummary(const RunFigure& figure);

}  // namespace dampwright
