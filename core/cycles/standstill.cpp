// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/standstill.h"

#include <algorithm>
#include <cmath>
#include <span>

#include "core/signal/robust.h"

namespace dampwright {
namespace {

struct Chunk {
  double low = 0, high = 0, mean = 0;
};

Chunk chunkOf(std::span<const double> x) {
  Chunk chunk{x[0], x[0], 0};
  for (const double value : x) {
    chunk.low = std::min(chunk.low, value);
    chunk.high = std::max(chunk.high, value);
    chunk.mean += value / static_cast<double>(x.size());
  }
  return chunk;
}

double meanOf(std::span<const double> x) { return chunkOf(x).mean; }

constexpr double creep = 1e-5;  // m/s, a hydraulic rig that is told to stand still may drift so

// A turn is a parabola: its middle half lies half a sag away from its outer quarters.
bool isFlat(std::span<const double> x, double swing, double duration) {
  const std::size_t trim = x.size() / 10;
  const std::span<const double> inner = x.subspan(trim, x.size() - 2 * trim);
  const std::size_t quarter = inner.size() / 4;
  if (quarter == 0) return false;
  const double first = meanOf(inner.first(quarter)), last = meanOf(inner.last(quarter));
  const double middle = meanOf(inner.subspan(quarter, inner.size() - 2 * quarter));
  const double drift = std::max(0.1 * swing, creep * duration);
  return std::abs(middle - (first + last) / 2) < 0.05 * swing && std::abs(last - first) < drift;
}

// Whole chunks that stand still, joined while they stand at one place.
std::vector<Standstill> stillChunks(std::span<const double> x, std::size_t chunk, double swing) {
  std::vector<Standstill> found;
  double place = 0;
  for (std::size_t from = 0; from + chunk <= x.size(); from += chunk) {
    const Chunk now = chunkOf(x.subspan(from, chunk));
    if (now.high - now.low > swing) continue;
    const bool joins =
        !found.empty() && found.back().to == from && std::abs(now.mean - place) < 0.5 * swing;
    if (joins) {
      found.back().to = from + chunk;
    } else {
      found.push_back({from, from + chunk});
      place = now.mean;
    }
  }
  return found;
}

Standstill drawnOut(Standstill still, std::span<const double> x, double swing) {
  const double place = meanOf(x.subspan(still.from, still.size()));
  const auto near = [&](std::size_t i) { return std::abs(x[i] - place) < swing / 2; };
  while (still.from > 0 && near(still.from - 1)) --still.from;
  while (still.to < x.size() && near(still.to)) ++still.to;
  return still;
}

}  // namespace

std::vector<Standstill> findStandstills(const Motion& motion, double holdTime) {
  const std::span<const double> x = motion.displacement;
  if (x.empty()) return {};
  const auto wanted = static_cast<std::size_t>(std::max(8.0, holdTime * motion.rate));
  const auto [low, high] = std::minmax_element(x.begin(), x.end());
  const double swing = std::max(10 * noiseLevel(x), 0.001 * (*high - *low));
  std::vector<Standstill> stills;
  for (const Standstill& rough : stillChunks(x, std::max<std::size_t>(2, wanted / 4), swing)) {
    Standstill still = drawnOut(rough, x, swing);
    if (!stills.empty()) still.from = std::max(still.from, stills.back().to);
    if (still.from >= still.to || still.size() < wanted) continue;
    const double duration = static_cast<double>(still.size()) / motion.rate;
    if (isFlat(x.subspan(still.from, still.size()), swing, duration)) stills.push_back(still);
  }
  return stills;
}

}  // namespace dampwright
