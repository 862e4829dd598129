// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <limits>

#include "core/laws/law.h"

// F = c·v
namespace dampwright {
namespace {

using Parameters = std::span<const double>;

constexpr std::array<LawParameter, 1> parameters{{{"coefficient_n_s_per_m", Quantity::Damping}}};

std::vector<LawRegion> regions(std::span<const LawPoint> points) {
  if (points.empty()) return {};
  double product = 0;
  double square = 0;
  for (const LawPoint& point : points) {
    product += point.velocity * point.force;
    square += point.velocity * point.velocity;
  }
  return {{{std::max(0.0, product / square)}, {0}, {std::numeric_limits<double>::infinity()}}};
}

double force(Parameters p, double v) { return p[0] * v; }

double slope(Parameters p, double) { return p[0]; }

LawGradient gradient(Parameters, double v) { return {v}; }

std::optional<double> knee(Parameters) { return std::nullopt; }

}  // namespace

extern const Law linearLaw;
constinit const Law linearLaw{"linear", parameters, regions, force, slope, gradient, knee};

}  // namespace dampwright
