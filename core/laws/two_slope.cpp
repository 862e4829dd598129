// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <cmath>
#include <limits>

#include "core/laws/law.h"

// F = low·v up to the knee, then low·knee + high·(v − knee)
namespace dampwright {
namespace {

using Parameters = std::span<const double>;

constexpr std::array<LawParameter, 3> parameters{{{"low_n_s_per_m", Quantity::Damping},
                                                  {"high_n_s_per_m", Quantity::Damping},
                                                  {"knee_mm_s", Quantity::Velocity}}};
constexpr double narrow = 0.005;  // [1] speeds nearer than this are one speed

/// Least squares of low and high for a given knee; the law is linear in these two.
std::vector<double> slopesFor(std::span<const LawPoint> points, double knee) {
  double aa = 0, ab = 0, bb = 0, af = 0, bf = 0;
  for (const LawPoint& point : points) {
    const double below = std::min(point.velocity, knee);
    const double above = std::max(point.velocity - knee, 0.0);
    aa += below * below;
    ab += below * above;
    bb += above * above;
    af += below * point.force;
    bf += above * point.force;
  }
  const double determinant = aa * bb - ab * ab;
  const double low = (af * bb - bf * ab) / determinant;
  const double high = (bf * aa - af * ab) / determinant;
  return {std::max(low, 0.0), std::max(high, 0.0), knee};
}

/// One region between each two neighbouring speeds: as a knee crosses a speed, the derivative of
/// the sum of squares jumps. Beyond the last speed but one, knee and high slope are not told apart.
std::vector<LawRegion> regions(std::span<const LawPoint> points) {
  std::vector<double> speeds;
  for (const LawPoint& point : points) {
    if (speeds.empty() || point.velocity > speeds.back() * (1 + narrow)) {
      speeds.push_back(point.velocity);
    }
  }
  constexpr double infinite = std::numeric_limits<double>::infinity();
  std::vector<LawRegion> found;
  for (std::size_t i = 0; i + 2 < speeds.size(); ++i) {
    const double middle = 0.5 * (speeds[i] + speeds[i + 1]);
    found.push_back(
        {slopesFor(points, middle), {0, 0, speeds[i]}, {infinite, infinite, speeds[i + 1]}});
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
