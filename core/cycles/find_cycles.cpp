// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/find_cycles.h"

#include <algorithm>
#include <cmath>
#include <iterator>

#include "core/signal/robust.h"
#include "core/signal/turning_points.h"

namespace dampwright {
namespace {

constexpr double halvesAlike = 0.1;     // share by which a cycle's half strokes may differ
constexpr double edgeShare = 0.005;     // of the stroke, how near an edge must lie to its turn
constexpr double shortestRest = 0.1;    // s
constexpr double missingShare = 0.125;  // of a cycle that may be missing in one piece

// How long the motion stands still at each turning point [samples].
std::vector<double> restsAt(const std::vector<TurningPoint>& turns,
                            const std::vector<Standstill>& stills) {
  std::vector<double> rests(turns.size());
  for (std::size_t i = 0; i < turns.size(); ++i)
    for (const Standstill& still : stills)
      if (turns[i].sample >= still.from && turns[i].sample < still.to)
        rests[i] = static_cast<double>(still.size());
  return rests;
}

// A rest at a turning point is a dwell of the wave if the motion rests as long at a turning point
// next to it, or at those of its kind both before and after.
bool isDwell(const std::vector<double>& rests, std::size_t turn) {
  const auto likewise = [&](std::ptrdiff_t away) {
    const std::ptrdiff_t other = static_cast<std::ptrdiff_t>(turn) + away;
    if (other < 0 || other >= static_cast<std::ptrdiff_t>(rests.size())) return false;
    const double ratio = rests[static_cast<std::size_t>(other)] / rests[turn];
    return ratio > 0.5 && ratio < 2;
  };
  return likewise(-1) || likewise(1) || (likewise(-2) && likewise(2));
}

// The standstills that are no dwells: they part the motion.
std::vector<Standstill> partingStandstills(const std::vector<Standstill>& stills,
                                           const std::vector<TurningPoint>& turns) {
  const std::vector<double> rests = restsAt(turns, stills);
  std::vector<Standstill> parting;
  for (const Standstill& still : stills) {
    bool dwell = false;
    for (std::size_t i = 1; i + 1 < turns.size() && !dwell; ++i)
      dwell = turns[i].sample >= still.from && turns[i].sample < still.to && isDwell(rests, i);
    if (!dwell) parting.push_back(still);
  }
  return parting;
}

// The stretches between rests; each reaches half way into the rests beside it.
std::vector<Standstill> segmentsBetween(const std::vector<Standstill>& rests, std::size_t size) {
  std::vector<Standstill> segments;
  std::size_t from = 0;
  for (const Standstill& rest : rests) {
    const std::size_t middle = (rest.from + rest.to) / 2;
    if (rest.from > from) segments.push_back({from, middle});
    from = middle;
  }
  const bool moves = rests.empty() || rests.back().to < size;
  if (moves && from < size) segments.push_back({from, size});
  return segments;
}

// Takes away the turning points at the edges where the recording only begins or ends.
std::vector<TurningPoint> withoutFalseEdges(std::vector<TurningPoint> turns, double noise) {
  const auto turned = [&](const TurningPoint& edge, const TurningPoint& same, double stroke) {
    return std::abs(edge.value - same.value) <= std::max(edgeShare * stroke, 6 * noise);
  };
  const auto strokeOf = [&](std::size_t i) {
    return std::abs(turns[i + 1].value - turns[i].value);
  };
  if (turns.size() < 3) return {};
  const std::size_t n = turns.size();
  const bool last = turned(turns[n - 1], turns[n - 3], strokeOf(n - 3));
  const bool first = turned(turns[0], turns[2], strokeOf(1));
  if (!last) turns.pop_back();
  if (!first) turns.erase(turns.begin());
  return turns;
}

// The longest run of samples without displacement inside a cycle.
double longestMissing(const std::vector<char>& doubtful, const RawCycle& cycle) {
  std::size_t longest = 0, run = 0;
  const auto end = std::min(static_cast<std::size_t>(std::ceil(cycle.end)) + 1, doubtful.size());
  for (std::size_t i = cycle.firstSample(); i < end; ++i) {
    run = (doubtful[i] & PlaceMissing) != 0 ? run + 1 : 0;
    longest = std::max(longest, run);
  }
  return static_cast<double>(longest);
}

std::vector<RawCycle> cyclesOf(const Motion& motion,
                               const std::vector<TurningPoint>& turns,
                               std::size_t segment,
                               double offset) {
  std::vector<RawCycle> cycles;
  for (std::size_t i = 0; i + 2 < turns.size(); ++i) {
    if (turns[i].upper) continue;
    const double up = turns[i + 1].value - turns[i].value;
    const double down = turns[i + 1].value - turns[i + 2].value;
    if (std::abs(up - down) > halvesAlike * std::max(up, down)) continue;
    const RawCycle cycle{offset + turns[i].place,
                         offset + turns[i + 1].place,
                         offset + turns[i + 2].place,
                         (up + down) / 2,
                         segment};
    if (longestMissing(motion.doubtful, cycle) <= missingShare * cycle.period())
      cycles.push_back(cycle);
  }
  return cycles;
}

}  // namespace

StrokeSummary findCycles(const Motion& motion, double reversal, double holdTime) {
  const std::span<const double> x = motion.displacement;
  const TurningOptions options{safeHysteresis(x), reversal};
  const double noise = noiseLevel(x);
  StrokeSummary summary;
  const std::vector<TurningPoint> whole = turningPoints(x, options);
  const std::vector<Standstill> parting =
      partingStandstills(findStandstills(motion, shortestRest), whole);
  const double hold = holdTime * motion.rate;
  std::copy_if(parting.begin(),
               parting.end(),
               std::back_inserter(summary.holds),
               [&](const Standstill& still) { return static_cast<double>(still.size()) >= hold; });
  std::size_t segment = 0;
  for (const Standstill& part : segmentsBetween(parting, x.size())) {
    std::vector<TurningPoint> turns =
        parting.empty() ? whole : turningPoints(x.subspan(part.from, part.size()), options);
    for (std::size_t i = 1; i < turns.size(); ++i)
      summary.longestStroke =
          std::max(summary.longestStroke, std::abs(turns[i].value - turns[i - 1].value));
    summary.turningPoints += turns.size();
    turns = withoutFalseEdges(std::move(turns), noise);
    const auto cycles = cyclesOf(motion, turns, segment++, static_cast<double>(part.from));
    summary.cycles.insert(summary.cycles.end(), cycles.begin(), cycles.end());
  }
  return summary;
}

}  // namespace dampwright
