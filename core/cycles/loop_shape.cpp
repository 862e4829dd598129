// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/loop_shape.h"

#include <algorithm>
#include <cmath>
#include <span>

#include "core/signal/harmonics.h"
#include "core/signal/local_polynomial.h"

namespace dampwright {
namespace {

constexpr int highestHarmonic = 20;
// standard errors: 4 let noise pass once in 150 blocks, a 17th harmonic then costs 0.06 % of speed
constexpr double standsOut = 5;
constexpr double straightShare = 0.007;  // of the stroke
constexpr double crankShare = 0.01;      // second harmonic over the first
constexpr double sineShare = 0.03;       // all harmonics over the first
constexpr double harmonicShare = 0.002;  // of the stroke, residual of a motion of few harmonics

struct Ends {
  double low, high;
};

Ends endsOf(std::span<const double> values) {
  const auto [low, high] = std::minmax_element(values.begin(), values.end());
  return {*low, *high};
}

// Root mean square distance from a straight line over the inner 80 % of one half stroke's travel.
double bendOf(std::span<const double> half, const Ends& ends) {
  const double margin = 0.1 * (ends.high - ends.low);
  double n = 0, t1 = 0, t2 = 0, y1 = 0, y2 = 0, ty = 0;
  for (std::size_t i = 0; i < half.size(); ++i) {
    if (half[i] < ends.low + margin || half[i] > ends.high - margin) continue;
    const double t = static_cast<double>(i), y = half[i] - ends.low;
    n += 1;
    t1 += t;
    t2 += t * t;
    y1 += y;
    y2 += y * y;
    ty += t * y;
  }
  const double stt = t2 - t1 * t1 / n, syy = y2 - y1 * y1 / n, sty = ty - t1 * y1 / n;
  if (n < 4 || !(stt > 0)) return ends.high - ends.low;
  return std::sqrt(std::max(0.0, syy - sty * sty / stt) / n);
}

bool isTriangle(std::span<const double> x, double top, const Ends& ends) {
  const auto split = static_cast<std::size_t>(top * static_cast<double>(x.size()));
  const double limit = straightShare * (ends.high - ends.low);
  return bendOf(x.first(split), ends) < limit && bendOf(x.subspan(split), ends) < limit;
}

BlockKind kindOf(const Harmonics& fit) {
  const double first = fit.amplitude(1), second = fit.amplitude(2), third = fit.amplitude(3);
  if (fit.order() < 3 || first == 0) return BlockKind::Other;
  const bool inStep = std::abs(fit.sine[1]) < 0.3 * second;
  double rest = 0;
  for (int h = 2; h <= fit.order(); ++h) rest += fit.amplitude(h) * fit.amplitude(h);
  if (second >= crankShare * first && second < 0.2 * first && inStep && third < 0.2 * second)
    return BlockKind::Crank;
  return std::sqrt(rest) < sineShare * first ? BlockKind::Sine : BlockKind::Other;
}

// Highest and lowest value of a smooth closed curve, between the points of its grid.
Ends smoothEnds(std::span<const double> values) {
  const auto between = [&](std::span<const double>::iterator at) {
    const auto n = values.size();
    const auto i = static_cast<std::size_t>(at - values.begin());
    const double before = values[(i + n - 1) % n], here = values[i], after = values[(i + 1) % n];
    const double bend = before - 2 * here + after, slope = (after - before) / 2;
    return bend == 0 ? here : here - slope * slope / (2 * bend);
  };
  const auto [low, high] = std::minmax_element(values.begin(), values.end());
  return {between(low), between(high)};
}

std::vector<double> localVelocity(std::span<const double> x, double period, double samples) {
  const auto n = static_cast<double>(x.size());
  const int half =
      std::clamp(static_cast<int>(std::ceil(3 * n / samples)), 6, static_cast<int>(x.size()) / 12);
  std::vector<double> closed(x.end() - half, x.end());
  closed.insert(closed.end(), x.begin(), x.end());
  closed.insert(closed.end(), x.begin(), x.begin() + half);
  const std::vector<double> wide = applyLocal({half, 4, 1}, closed, n / period);
  return {wide.begin() + half, wide.end() - half};
}

}  // namespace

LoopShape loopShape(const Loop& loop) {
  const std::span<const double> x = loop.displacement;
  const double period = loop.period;
  const auto n = static_cast<double>(x.size());
  const Ends rough = endsOf(x);
  std::vector<double> times(x.size());
  for (std::size_t i = 0; i < x.size(); ++i) times[i] = static_cast<double>(i) / n * period;
  const int order = std::min(highestHarmonic, static_cast<int>(loop.samples / 3));
  // between samples the spline carries 0.8 of their noise
  const double independent = loop.samples < n ? 0.64 * loop.samples : n;
  const Harmonics fit =
      significantPart(fitHarmonics(times, x, period, order), independent, standsOut);
  LoopShape shape;
  const bool triangle = isTriangle(x, loop.top, rough);
  shape.kind = triangle ? BlockKind::Triangle : kindOf(fit);
  const double residual = fit.rms / (rough.high - rough.low);
  if (triangle || (shape.kind == BlockKind::Other && residual > harmonicShare)) {
    shape.velocity = localVelocity(x, period, loop.samples);
    shape.mid = (rough.low + rough.high) / 2;
    shape.stroke = rough.high - rough.low;
    return shape;
  }
  std::vector<double> smooth;
  for (const double time : times) {
    shape.velocity.push_back(fit.slopeAt(time));
    smooth.push_back(fit.at(time));
  }
  const Ends ends = smoothEnds(smooth);
  shape.mid = (ends.low + ends.high) / 2;
  shape.stroke = ends.high - ends.low;
  return shape;
}

}  // namespace dampwright
