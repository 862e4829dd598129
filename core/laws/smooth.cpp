// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <cmath>
#include <limits>

#include "core/laws/law.h"
#include "core/laws/speeds.h"

// F = high·v + (low − high)·knee·(1 − e^(−v/knee)): the slope falls from low to high without a kink
namespace dampwright {
namespace {

using Parameters = std::span<const double>;

constexpr std::array<LawParameter, 3> parameters{{{"low_n_s_per_m", Quantity::Damping},
                                                  {"high_n_s_per_m", Quantity::Damping},
                                                  {"knee_mm_s", Quantity::Velocity}}};
constexpr double beyond = 3;  // a knee may lie so much farther out than the speeds
constexpr int starts = 6;     // knees to start from: the sum of squares may have several minima

/// knee·(1 − e^(−v/knee)), the part that the low slope carries.
double rounded(double knee, double v) { return -knee * std::expm1(-v / knee); }

std::vector<LawRegion> regions(std::span<const LawPoint> points) {
  const std::vector<double> speeds = distinctSpeeds(points);
  if (speeds.size() < 3) return {};
  constexpr double infinite = std::numeric_limits<double>::infinity();
  const double least = speeds.front() / beyond, most = speeds.back() * beyond;
  const double ratio = speeds.back() / speeds.front();
  std::vector<LawRegion> found;
  for (int i = 0; i < starts; ++i) {
    const double start = speeds.front() * std::pow(ratio, (i + 0.5) / starts);
    const auto [low, high] = fitPair(points, [&](double v) {
      const double carried = rounded(start, v);
      return std::pair(carried, v - carried);
    });
    found.push_back({{low, high, start}, {0, 0, least}, {infinite, infinite, most}});
  }
  return found;
}

double force(Parameters p, double v) { return p[1] * v + (p[0] - p[1]) * rounded(p[2], v); }

double slope(Parameters p, double v) { return p[1] + (p[0] - p[1]) * std::exp(-v / p[2]); }

LawGradient gradient(Parameters p, double v) {
  const double carried = rounded(p[2], v), fading = std::exp(-v / p[2]);
  return {carried, v - carried, (p[0] - p[1]) * (carried / p[2] - fading * v / p[2])};
}

/// The asymptote is high·v + (low − high)·knee.
std::optional<double> knee(Parameters p) { return p[2]; }

}  // namespace

extern const Law smoothLaw;
constinit const Law smoothLaw{"smooth", parameters, regions, force, slope, gradient, knee};

}  // namespace dampwright
