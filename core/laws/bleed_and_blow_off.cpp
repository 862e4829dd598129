// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <cmath>
#include <limits>

#include "core/laws/law.h"
#include "core/laws/speeds.h"

// v = bleed·√F + max(0, F − opening)/valve: an orifice that is always open beside a valve that
// opens at a force. Solved for F below.
namespace dampwright {
namespace {

using Parameters = std::span<const double>;

enum Parameter : std::size_t { Bleed, Opening, Valve };

constexpr std::array<LawParameter, 3> parameters{
    {{"bleed_mm_s_per_sqrt_n", Quantity::None},  // inside: m/s/√N
     {"opening_n", Quantity::Force},
     {"valve_n_s_per_m", Quantity::Damping}}};

double openingSpeed(Parameters p) { return p[Bleed] * std::sqrt(p[Opening]); }

/// √F at a speed v >= 0.
double rootOfForce(Parameters p, double v) {
  if (v <= openingSpeed(p)) return v / p[Bleed];
  const double flow = v + p[Opening] / p[Valve];
  return 2 * flow / (p[Bleed] + std::sqrt(p[Bleed] * p[Bleed] + 4 * flow / p[Valve]));
}

double force(Parameters p, double v) {
  const double root = rootOfForce(p, v);
  return root * root;
}

double slope(Parameters p, double v) {
  const double root = rootOfForce(p, v);
  if (v <= openingSpeed(p)) return 2 * root / p[Bleed];
  return 1 / (p[Bleed] / (2 * root) + 1 / p[Valve]);
}

/// From dv = 0 at a given speed: dF/dp = −(∂v/∂p)·dF/dv.
LawGradient gradient(Parameters p, double v) {
  if (!(v > 0)) return {};
  const double root = rootOfForce(p, v), steep = slope(p, v);
  if (v <= openingSpeed(p)) return {-root * steep, 0, 0};
  const double above = root * root - p[Opening];
  return {-root * steep, steep / p[Valve], steep * above / (p[Valve] * p[Valve])};
}

/// By definition the speed at which the valve opens.
std::optional<double> knee(Parameters p) { return openingSpeed(p); }

// Fitted are the opening speed, opening force and valve: a knee on a tested speed is a kink.
std::vector<double> fromChart(std::span<const double> q) {
  return {q[0] / std::sqrt(q[1]), q[1], q[2]};
}

std::array<LawGradient, maxLawParameters> chartDerivatives(std::span<const double> q) {
  const double root = std::sqrt(q[1]);
  return {{{1 / root, -q[0] / (2 * q[1] * root), 0}, {0, 1, 0}, {0, 0, 1}}};
}

constexpr LawChart chart{fromChart, chartDerivatives};

/// Opening force and valve for a given opening speed: the orifice's from the points below it, the
/// valve's from what flows beside the orifice above it.
std::vector<double> startFor(std::span<const LawPoint> points, double opens) {
  double quartic = 0, product = 0, largest = 0;
  for (const LawPoint& point : points) {
    largest = std::max(largest, point.force);
    if (point.velocity > opens) continue;
    const double square = std::pow(point.velocity / opens, 2);
    quartic += square * square;
    product += square * point.force;
  }
  const double opening = std::clamp(product / quartic, 1e-3 * largest, largest);
  double forces = 0, flows = 0;
  for (const LawPoint& point : points) {
    const double above = point.force - opening;
    if (point.velocity <= opens || above <= 0) continue;
    const double beside = point.velocity - opens * std::sqrt(point.force / opening);
    forces += above * above;
    flows += above * std::max(beside, 0.1 * (point.velocity - opens));
  }
  return {opens, opening, flows > 0 ? forces / flows : largest / points.back().velocity};
}

/// One region between each two neighbouring speeds, as the law has a kink where the valve opens.
/// Below the first speed the orifice alone is never seen, beyond the last but one the valve.
std::vector<LawRegion> regions(std::span<const LawPoint> points) {
  const std::vector<double> speeds = distinctSpeeds(points);
  const auto pushes = [](const LawPoint& point) { return point.force > 0; };
  if (!std::any_of(points.begin(), points.end(), pushes)) return {};
  constexpr double infinite = std::numeric_limits<double>::infinity();
  constexpr double tiny = 1e-9;  // N and N·s/m, that roots and quotients stay finite
  std::vector<LawRegion> found;
  for (std::size_t i = 0; i + 2 < speeds.size(); ++i) {
    found.push_back({startFor(points, 0.5 * (speeds[i] + speeds[i + 1])),
                     {speeds[i], tiny, tiny},
                     {speeds[i + 1], infinite, infinite}});
  }
  return found;
}

}  // namespace

extern const Law bleedAndBlowOffLaw;
constinit const Law bleedAndBlowOffLaw{
    "bleed and blow-off", parameters, regions, force, slope, gradient, knee, &chart};

}  // namespace dampwright
