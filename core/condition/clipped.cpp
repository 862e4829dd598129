// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/clipped.h"

#include <algorithm>
#include <cmath>

#include "core/signal/robust.h"

namespace dampwright {
namespace {

constexpr std::ptrdiff_t shortest = 4;     // equal samples that raise suspicion
constexpr std::ptrdiff_t jumpSamples = 3;  // a friction step takes no longer

struct Run {
  std::ptrdiff_t from = 0, to = 0;  // [from, to)
  std::ptrdiff_t size() const { return to - from; }
};

std::vector<Run> runsAt(std::span<const double> x, double level) {
  std::vector<Run> runs;
  const auto size = static_cast<std::ptrdiff_t>(x.size());
  for (std::ptrdiff_t i = 0; i < size; ++i) {
    if (x[static_cast<std::size_t>(i)] != level) continue;
    if (!runs.empty() && runs.back().to == i)
      ++runs.back().to;
    else
      runs.push_back({i, i + 1});
  }
  return runs;
}

// One end of a run: the signal seen from its last equal sample outwards.
struct Flank {
  std::span<const double> x;
  std::ptrdiff_t edge, step;
  double level, sign;  // drop = sign·(level − x)

  bool exists() const { return inside(edge + step); }
  bool inside(std::ptrdiff_t i) const {
    return i >= 0 && i < static_cast<std::ptrdiff_t>(x.size());
  }
  double drop(std::ptrdiff_t distance) const {
    const std::ptrdiff_t i = edge + step * distance;
    return inside(i) ? sign * (level - x[static_cast<std::size_t>(i)]) : 0;
  }
  std::ptrdiff_t samplesTo(double wanted) const {
    std::ptrdiff_t distance = 1;
    while (inside(edge + step * distance) && drop(distance) <= wanted) ++distance;
    return distance;
  }
  bool throughZero() const {
    for (std::ptrdiff_t distance = 1; distance <= jumpSamples; ++distance)
      if (drop(distance) > std::abs(level)) return true;
    return false;
  }
  // Full slope: as fast over the last three steps of the sensor as over the three before.
  bool steep(std::ptrdiff_t runSize, double quantum) const {
    const std::ptrdiff_t last = samplesTo(3 * quantum), both = samplesTo(6 * quantum);
    const bool level3 = 2 * last > 3 * (both - last) + 2;
    return drop(std::max<std::ptrdiff_t>(1, runSize / 2)) > 10 * quantum && !level3 &&
           !throughZero();
  }
};

bool cutOff(std::span<const double> x, const Run& run, double sign, double quantum) {
  const double level = x[static_cast<std::size_t>(run.from)];
  const Flank before{x, run.from, -1, level, sign}, after{x, run.to - 1, 1, level, sign};
  if (!before.exists() && !after.exists()) return false;
  return (!before.exists() || before.steep(run.size(), quantum)) &&
         (!after.exists() || after.steep(run.size(), quantum));
}

}  // namespace

std::vector<ClippedSide> findClipped(std::span<const double> x) {
  std::vector<ClippedSide> sides;
  if (x.empty()) return sides;
  const double quantum = smallestStep(x);
  const auto [least, most] = std::minmax_element(x.begin(), x.end());
  for (const double sign : {1.0, -1.0}) {
    const double level = sign > 0 ? *most : *least;
    const std::vector<Run> runs = runsAt(x, level);
    const bool found = std::any_of(runs.begin(), runs.end(), [&](const Run& run) {
      return run.size() >= shortest && cutOff(x, run, sign, quantum);
    });
    if (!found) continue;
    ClippedSide side{level, {}};
    for (const Run& run : runs)
      for (std::ptrdiff_t i = run.from; i < run.to; ++i)
        side.samples.push_back(static_cast<std::size_t>(i));
    sides.push_back(std::move(side));
  }
  return sides;
}

}  // namespace dampwright
