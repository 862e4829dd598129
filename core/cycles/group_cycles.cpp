// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/group_cycles.h"

#include <algorithm>
#include <cmath>
#include <iterator>
#include <span>

#include "core/signal/robust.h"

namespace dampwright {
namespace {

constexpr std::size_t shortestSweep = 8;  // cycles
constexpr double sweepShare = 0.15;       // change of speed over a sweep
constexpr double sweepStep = 0.002;       // least change of speed from cycle to cycle
constexpr double settledShare = 0.005;    // a cycle that differs by less belongs to the others

bool touch(const RawCycle& before, const RawCycle& after) {
  return before.segment == after.segment && std::abs(after.start - before.end) < 1;
}

double speedOf(const RawCycle& cycle) { return cycle.stroke / cycle.period(); }

// How many of the cycles, from the first on, form a sweep; 0 for none.
std::size_t sweepLength(std::span<const RawCycle> cycles) {
  const auto stepAt = [&](std::size_t i) {
    return std::log(speedOf(cycles[i + 1]) / speedOf(cycles[i]));
  };
  std::size_t count = 1;
  while (count < cycles.size() && touch(cycles[count - 1], cycles[count])) {
    const double step = stepAt(count - 1);
    if (std::abs(step) < sweepStep || step * stepAt(0) < 0) break;
    ++count;
  }
  const double change = std::abs(std::log(speedOf(cycles[count - 1]) / speedOf(cycles[0])));
  return count >= shortestSweep && change >= sweepShare ? count : 0;
}

class Means {
 public:
  explicit Means(const RawCycle& first) { add(first); }
  void add(const RawCycle& cycle) {
    stroke_ += cycle.stroke;
    period_ += cycle.period();
    ++count_;
  }
  bool matches(const RawCycle& cycle, double alike) const {
    return std::abs(cycle.stroke * count_ / stroke_ - 1) < alike &&
           std::abs(cycle.period() * count_ / period_ - 1) < alike;
  }

 private:
  double stroke_ = 0, period_ = 0, count_ = 0;
};

std::size_t groupLength(std::span<const RawCycle> cycles, double alike) {
  Means means(cycles[0]);
  std::size_t count = 1;
  while (count < cycles.size() && touch(cycles[count - 1], cycles[count]) &&
         means.matches(cycles[count], alike) && sweepLength(cycles.subspan(count)) == 0)
    means.add(cycles[count++]);
  return count;
}

bool isRamp(const CycleGroup& group, const CycleGroup* before, const CycleGroup* after) {
  if (group.sweep || group.cycles.size() > 1) return false;
  const auto larger = [](const CycleGroup* other) {
    return other != nullptr && !other->sweep && other->cycles.size() > 1;
  };
  return (larger(before) && touch(before->cycles.back(), group.cycles.front())) ||
         (larger(after) && touch(group.cycles.back(), after->cycles.front()));
}

// Counts what still settles at the start and takes away what already slows down at the end.
CycleGroup trimmed(CycleGroup group) {
  if (group.cycles.size() < 4) return group;
  std::vector<double> periods, strokes;
  for (const RawCycle& cycle : group.cycles) {
    periods.push_back(cycle.period());
    strokes.push_back(cycle.stroke);
  }
  const double period = median(periods), stroke = median(strokes);
  const double periodLimit = std::max(settledShare * period, 6 * robustSpread(periods));
  const double strokeLimit = std::max(settledShare * stroke, 6 * robustSpread(strokes));
  const auto settled = [&](const RawCycle& cycle) {
    return std::abs(cycle.period() - period) <= periodLimit &&
           std::abs(cycle.stroke - stroke) <= strokeLimit;
  };
  while (!settled(group.cycles.back())) group.cycles.pop_back();
  const auto first = std::find_if(group.cycles.begin(), group.cycles.end(), settled);
  group.settling = static_cast<int>(first - group.cycles.begin());
  return group;
}

}  // namespace

std::vector<CycleGroup> groupCycles(const std::vector<RawCycle>& cycles, double alike) {
  std::vector<CycleGroup> groups;
  for (std::span<const RawCycle> rest = cycles; !rest.empty();) {
    const std::size_t sweep = sweepLength(rest);
    const std::size_t count = sweep > 0 ? sweep : groupLength(rest, alike);
    if (sweep > 0)
      for (const RawCycle& cycle : rest.first(count)) groups.push_back({{cycle}, 0, true});
    else
      groups.push_back(
          {{rest.begin(), rest.begin() + static_cast<std::ptrdiff_t>(count)}, 0, false});
    rest = rest.subspan(count);
  }
  std::vector<CycleGroup> kept;
  for (std::size_t i = 0; i < groups.size(); ++i) {
    const CycleGroup* before = i == 0 ? nullptr : &groups[i - 1];
    const CycleGroup* after = i + 1 == groups.size() ? nullptr : &groups[i + 1];
    if (!isRamp(groups[i], before, after)) kept.push_back(trimmed(groups[i]));
  }
  return kept;
}

}  // namespace dampwright
