// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/warmth.h"

#include <algorithm>
#include <cmath>
#include <span>

namespace dampwright {
namespace {

constexpr double movingShare = 0.005;
constexpr double standardErrors = 3;
constexpr std::size_t halfWindow = 20;  // grid points, 10 degrees

struct PeakForce {
  double force = 0;     // N, mean about the peak
  double variance = 0;  // N², of single grid points about the mean loop
};

PeakForce peakForce(const Loop& single, const Loop& mean, std::size_t peak) {
  const std::size_t n = single.size(), width = 2 * halfWindow + 1;
  PeakForce out;
  double offset = 0;
  for (std::size_t k = 0; k < width; ++k) {
    const std::size_t i = (peak + n + k - halfWindow) % n;
    out.force += single.force[i] / static_cast<double>(width);
    offset += (single.force[i] - mean.force[i]) / static_cast<double>(width);
  }
  for (std::size_t k = 0; k < width; ++k) {
    const std::size_t i = (peak + n + k - halfWindow) % n;
    out.variance +=
        std::pow(single.force[i] - mean.force[i] - offset, 2) / static_cast<double>(width);
  }
  return out;
}

// Percent by which the peak force moves over the last three cycles; 0 where it does not, or noise
// may be all.
double movement(const Block& block, std::size_t peak) {
  const std::span<const Loop> last = std::span(block.singles).last(3);
  const PeakForce a = peakForce(last[0], block.loop, peak);
  const PeakForce b = peakForce(last[1], block.loop, peak);
  const PeakForce c = peakForce(last[2], block.loop, peak);
  const double moved = c.force - a.force, limit = movingShare * std::abs(c.force);
  const double window = (2.0 * halfWindow + 1) / static_cast<double>(block.loop.size());
  const double samples = std::max(1.0, std::min(block.loop.samples * window, 2.0 * halfWindow + 1));
  const double error = std::sqrt((a.variance + c.variance) / samples);
  const bool oneWay = (b.force - a.force) * (c.force - b.force) > 0;
  if (!(oneWay && std::abs(moved) > std::max(limit, standardErrors * error))) return 0;
  return 100 * moved / c.force;
}

}  // namespace

std::optional<Remark> notWarm(const Block& block) {
  if (block.singles.size() < 3) return std::nullopt;
  const std::vector<double>& v = block.loop.velocity;
  const auto [rebound, compression] = std::minmax_element(v.begin(), v.end());
  const double in = movement(block, static_cast<std::size_t>(compression - v.begin()));
  const double out = movement(block, static_cast<std::size_t>(rebound - v.begin()));
  const double worst = std::abs(in) > std::abs(out) ? in : out;
  if (worst == 0) return std::nullopt;
  Remark remark{"not-warm", Severity::Warning, {}, 0, 0};
  remark.values = {{"percent", worst, Quantity::Percent}};
  return remark;
}

}  // namespace dampwright
