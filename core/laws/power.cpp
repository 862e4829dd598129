// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <cmath>
#include <limits>

#include "core/laws/law.h"
#include "core/laws/speeds.h"

// F = c·v^p: 1/2 as for a blow-off that gapes, 1 for a gap, 2 for an orifice
namespace dampwright {
namespace {

using Parameters = std::span<const double>;

constexpr std::array<LawParameter, 2> parameters{{{"coefficient", Quantity::None},  // N·(s/m)^p
                                                  {"exponent", Quantity::None}}};
constexpr double least = 0.05, most = 4;  // exponents

/// The straight line through the logarithms, each weighted by its force squared: a relative error
/// there is an error in newtons here.
std::vector<LawRegion> regions(std::span<const LawPoint> points) {
  if (distinctSpeeds(points).size() < 2) return {};
  double n = 0, x1 = 0, x2 = 0, y1 = 0, xy = 0;
  for (const LawPoint& point : points) {
    if (point.force <= 0) continue;
    const double weight = point.force * point.force;
    const double x = std::log(point.velocity), y = std::log(point.force);
    n += weight;
    x1 += weight * x;
    x2 += weight * x * x;
    y1 += weight * y;
    xy += weight * x * y;
  }
  const double spread = n * x2 - x1 * x1;
  const double exponent = spread > 0 ? std::clamp((n * xy - x1 * y1) / spread, least, most) : 1;
  const double coefficient = n > 0 ? std::exp((y1 - exponent * x1) / n) : 0;
  constexpr double infinite = std::numeric_limits<double>::infinity();
  return {{{coefficient, exponent}, {0, least}, {infinite, most}}};
}

double force(Parameters p, double v) { return v > 0 ? p[0] * std::pow(v, p[1]) : 0; }

double slope(Parameters p, double v) { return p[0] * p[1] * std::pow(v, p[1] - 1); }

LawGradient gradient(Parameters p, double v) {
  if (!(v > 0)) return {};
  const double power = std::pow(v, p[1]);
  return {power, p[0] * power * std::log(v)};
}

/// The tangent at rest stands upright or lies flat, and no straight line is an asymptote.
std::optional<double> knee(Parameters) { return std::nullopt; }

}  // namespace

extern const Law powerLaw;
constinit const Law powerLaw{"power", parameters, regions, force, slope, gradient, knee};

}  // namespace dampwright
