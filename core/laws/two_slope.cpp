// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <limits>

#include "core/laws/law.h"
#include "core/laws/speeds.h"

// F = low·v up to the knee, then low·knee + high·(v − knee)
namespace dampwright {
namespace {

using Parameters = std::span<const double>;

constexpr std::array<LawParameter, 3> parameters{{{"low_n_s_per_m", Quantity::Damping},
                                                  {"high_n_s_per_m", Quantity::Damping},
                                                  {"knee_mm_s", Quantity::Velocity}}};
/// One region between each two neighbouring speeds: as a knee crosses a speed, the derivative of
/// the sum of squares jumps. Beyond the last speed but one, knee and high slope are not told apart.
std::vector<LawRegion> regions(std::span<const LawPoint> points) {
  const std::vector<double> speeds = distinctSpeeds(points);
  constexpr double infinite = std::numeric_limits<double>::infinity();
  std::vector<LawRegion> found;
  for (std::size_t i = 0; i + 2 < speeds.size(); ++i) {
    const double middle = 0.5 * (speeds[i] + speeds[i + 1]);
    const auto [low, high] = fitPair(points, [&](double v) {
      return std::pair(std::min(v, middle), std::max(v - middle, 0.0));
    });
    found.push_back({{low, high, middle}, {0, 0, speeds[i]}, {infinite, infinite, speeds[i + 1]}});
  }
  return found;
}

double force(Parameters p, double v) {
  return p[0] * std::min(v, p[2]) + p[1] * std::max(v - p[2], 0.0);
}

double slope(Parameters p, double v) { return v <= p[2] ? p[0] : p[1]; }

LawGradient gradient(Parameters p, double v) {
  return {std::min(v, p[2]), std::max(v - p[2], 0.0), v <= p[2] ? 0.0 : p[0] - p[1]};
}

std::optional<double> knee(Parameters p) { return p[2]; }

}  // namespace

extern const Law twoSlopeLaw;
constinit const Law twoSlopeLaw{"two-slope", parameters, regions, force, slope, gradient, knee};

}  // namespace dampwright
