// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/average_loop.h"

#include <algorithm>
#include <cmath>
#include <limits>

#include "core/base/expects.h"

namespace dampwright {
namespace {

constexpr double nan = std::numeric_limits<double>::quiet_NaN();

std::vector<std::uint32_t> countsBefore(const std::vector<char>& doubtful) {
  std::vector<std::uint32_t> counts(doubtful.size() + 1);
  for (std::size_t i = 0; i < doubtful.size(); ++i)
    counts[i + 1] = counts[i] + (doubtful[i] != 0 ? 1 : 0);
  return counts;
}

// A straight line across each doubtful stretch, so that nothing of it leaks into the spline beside
// it.
std::vector<double> bridged(std::vector<double> values,
                            const std::vector<char>& doubtful,
                            int bits) {
  const auto bad = [&](std::size_t i) { return (doubtful[i] & bits) != 0; };
  for (std::size_t from = 0; from < values.size(); ++from) {
    if (!bad(from)) continue;
    std::size_t to = from;
    while (to < values.size() && bad(to)) ++to;
    if (from == 0 && to == values.size()) break;
    const double before = from > 0 ? values[from - 1] : values[to];
    const double after = to < values.size() ? values[to] : before;
    const double length = static_cast<double>(to - from + 1);
    for (std::size_t i = from; i < to; ++i)
      values[i] = before + (after - before) * static_cast<double>(i - from + 1) / length;
    from = to;
  }
  return values;
}

// Mean and standard deviation of the sound forces of all cycles at one grid point.
struct Moments {
  double mean = nan, spread = nan;
};

Moments momentsAt(const std::vector<Loop>& singles, std::size_t point) {
  double sum = 0, squares = 0, count = 0;
  for (const Loop& loop : singles) {
    if (std::isnan(loop.force[point])) continue;
    sum += loop.force[point];
    count += 1;
  }
  if (count == 0) return {};
  const double mean = sum / count;
  for (const Loop& loop : singles)
    if (!std::isnan(loop.force[point])) squares += std::pow(loop.force[point] - mean, 2);
  return {mean, count > 1 ? std::sqrt(squares / (count - 1)) : nan};
}

Loop meanOf(const std::vector<Loop>& singles) {
  Loop mean;
  mean.cycles = static_cast<int>(singles.size());
  mean.displacement.resize(loopSize);
  mean.top = 0;
  for (const Loop& loop : singles) {
    const double share = 1 / static_cast<double>(singles.size());
    mean.period += loop.period * share;
    mean.top += loop.top * share;
    mean.samples += loop.samples * share;
    for (std::size_t i = 0; i < loopSize; ++i) mean.displacement[i] += loop.displacement[i] * share;
  }
  for (std::size_t i = 0; i < loopSize; ++i) {
    const Moments moments = momentsAt(singles, i);
    mean.force.push_back(moments.mean);
    if (singles.size() > 1) mean.forceSpread.push_back(moments.spread);
  }
  return mean;
}

}  // namespace

LoopAverager::LoopAverager(const Motion& motion)
    : rate_(motion.rate),
      displacement_(bridged(motion.displacement, motion.doubtful, PlaceMissing)),
      force_(bridged(motion.force, motion.doubtful, ForceClipped | ForceMissing | PlaceMissing)),
      doubtBefore_(countsBefore(motion.doubtful)) {}

bool LoopAverager::sound(double from, double to) const {
  const double last = static_cast<double>(doubtBefore_.size() - 1);
  const auto a = static_cast<std::size_t>(std::clamp(std::floor(from) - 1, 0.0, last));
  const auto b = static_cast<std::size_t>(std::clamp(std::ceil(to) + 2, 0.0, last));
  return doubtBefore_[a] == doubtBefore_[b];
}

Loop LoopAverager::single(const RawCycle& cycle) const {
  Loop loop;
  loop.period = cycle.period() / rate_;
  loop.top = (cycle.top - cycle.start) / cycle.period();
  loop.samples = cycle.period();
  loop.cycles = 1;
  loop.displacement.resize(loopSize);
  loop.force.resize(loopSize);
  const double cell = cycle.period() / static_cast<double>(loopSize);
  for (std::size_t i = 0; i < loopSize; ++i) {
    const double from = cycle.start + (static_cast<double>(i) - 0.5) * cell, to = from + cell;
    loop.displacement[i] = displacement_.meanOver(from, to);
    loop.force[i] = sound(from, to) ? force_.meanOver(from, to) : nan;
  }
  return loop;
}

AveragedLoop LoopAverager::average(const std::vector<RawCycle>& cycles) const {
  expects(!cycles.empty());
  AveragedLoop out;
  for (const RawCycle& cycle : cycles) out.singles.push_back(single(cycle));
  out.mean = meanOf(out.singles);
  out.shape = loopShape(out.mean);
  out.mean.velocity = out.shape.velocity;
  for (double& place : out.mean.displacement) place -= out.shape.mid;
  for (Loop& loop : out.singles) {
    for (double& place : loop.displacement) place -= out.shape.mid;
    loop.velocity = out.mean.velocity;
    for (double& velocity : loop.velocity) velocity *= out.mean.period / loop.period;
  }
  return out;
}

}  // namespace dampwright
