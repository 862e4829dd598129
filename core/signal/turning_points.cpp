// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/turning_points.h"

#include <algorithm>
#include <cmath>

#include "core/base/expects.h"
#include "core/signal/robust.h"

namespace dampwright {
namespace {

constexpr double nearLevel = 0.1, farLevel = 0.2;  // of the half stroke
constexpr double twinLevel = 0.3;                  // of the half stroke, steep in any wave
constexpr double edgeLevel = 0.0005;               // of the half stroke, still the edge itself

// Extremes between reversals larger than the hysteresis, the ones at the edges included.
std::vector<TurningPoint> zigzag(std::span<const double> x, double hysteresis) {
  std::vector<TurningPoint> turns;
  std::size_t low = 0, high = 0;
  int direction = 0;  // of the motion: +1 rising, −1 falling, 0 not known yet
  for (std::size_t i = 1; i < x.size(); ++i) {
    if (x[i] > x[high]) high = i;
    if (x[i] < x[low]) low = i;
    if (direction <= 0 && x[i] - x[low] > hysteresis) {
      turns.push_back({low, 0, x[low], false, turns.empty()});
      direction = 1;
      high = i;
    } else if (direction >= 0 && x[high] - x[i] > hysteresis) {
      turns.push_back({high, 0, x[high], true, turns.empty()});
      direction = -1;
      low = i;
    }
  }
  if (direction > 0) turns.push_back({high, 0, x[high], true, true});
  if (direction < 0) turns.push_back({low, 0, x[low], false, true});
  return turns;
}

// Takes out the half strokes that are small between two larger ones, with both their ends.
std::vector<TurningPoint> withoutSmall(const std::vector<TurningPoint>& turns, double share) {
  std::vector<TurningPoint> kept;
  for (const TurningPoint& turn : turns) {
    kept.push_back(turn);
    while (kept.size() >= 4) {
      const auto* last = &kept.back();
      const double before = std::abs(last[-2].value - last[-3].value);
      const double middle = std::abs(last[-1].value - last[-2].value);
      const double after = std::abs(last[0].value - last[-1].value);
      if (middle >= share * std::min(before, after)) break;
      kept.erase(kept.end() - 3, kept.end() - 1);
    }
  }
  return kept;
}

// Coefficients of the parabola x(t) by least squares over [centre − m, centre + m], t from centre.
struct Parabola {
  double c0 = 0, c1 = 0, c2 = 0;
};

Parabola parabolaAround(std::span<const double> x, std::ptrdiff_t centre, std::ptrdiff_t m) {
  double y0 = 0, y1 = 0, y2 = 0;
  for (std::ptrdiff_t k = -m; k <= m; ++k) {
    const double value = x[static_cast<std::size_t>(centre + k)], t = static_cast<double>(k);
    y0 += value;
    y1 += value * t;
    y2 += value * t * t;
  }
  const double n = 2.0 * static_cast<double>(m) + 1, w = static_cast<double>(m);
  const double s2 = n * w * (w + 1) / 3, s4 = s2 * (3 * w * w + 3 * w - 1) / 5;
  const double det = n * s4 - s2 * s2;
  return {(s4 * y0 - s2 * y2) / det, y1 / s2, (n * y2 - s2 * y0) / det};
}

// One side of a turning point: from it to its neighbour. Depth counts from the turning point.
struct Side {
  std::span<const double> x;
  std::ptrdiff_t from, to;
  double top, sign;  // depth = sign·(top − x)

  double depth(std::ptrdiff_t i) const { return sign * (top - x[static_cast<std::size_t>(i)]); }

  std::ptrdiff_t firstBeyond(double wanted) const {
    const std::ptrdiff_t step = to >= from ? 1 : -1;
    std::ptrdiff_t i = from;
    while (i != to && depth(i) < wanted) i += step;
    return i;
  }

  // Where the depth passes `wanted`, between samples: from a parabola over the samples about there.
  double crossing(double wanted) const {
    const std::ptrdiff_t at = firstBeyond(wanted);
    std::ptrdiff_t m = std::max<std::ptrdiff_t>(2, std::abs(at - firstBeyond(0.6 * wanted)));
    m = std::min({m, at, static_cast<std::ptrdiff_t>(x.size()) - 1 - at});
    if (m < 1) return static_cast<double>(at);
    const double level = top - sign * wanted;
    const Parabola fit = parabolaAround(x, at, m);
    const double curvature = m > 1 ? fit.c2 : 0;
    double t = 0;
    for (int i = 0; i < 4; ++i) {
      const double slope = fit.c1 + 2 * curvature * t;
      if (slope == 0) break;
      t -= (fit.c0 - level + t * (fit.c1 + curvature * t)) / slope;
      t = std::clamp(t, -static_cast<double>(m), static_cast<double>(m));
    }
    return static_cast<double>(at) + t;
  }
};

Side sideOf(std::span<const double> x, const TurningPoint& turn, const TurningPoint& neighbour) {
  return {x,
          static_cast<std::ptrdiff_t>(turn.sample),
          static_cast<std::ptrdiff_t>(neighbour.sample),
          turn.value,
          turn.upper ? 1.0 : -1.0};
}

double placeBetween(const Side& left, const Side& right, double halfStroke) {
  const double near =
      (left.crossing(nearLevel * halfStroke) + right.crossing(nearLevel * halfStroke)) / 2;
  const double far =
      (left.crossing(farLevel * halfStroke) + right.crossing(farLevel * halfStroke)) / 2;
  return near + (near - far) * nearLevel / (farLevel - nearLevel);
}

// Where the motion stood at the edge, and over which samples: the median of those beside the
// extreme one, since the extreme itself is the largest of the noise.
struct EdgeRest {
  double value = 0, first = 0, last = 0;
};

EdgeRest restAtEdge(const Side& side, double halfStroke, double noise) {
  const double reach = std::max(edgeLevel * halfStroke, 8 * noise);
  const auto size = static_cast<std::ptrdiff_t>(side.x.size());
  std::ptrdiff_t from = side.from, to = side.from;
  while (from > 0 && side.depth(from - 1) <= reach) --from;
  while (to + 1 < size && side.depth(to + 1) <= reach) ++to;
  return {median({side.x.begin() + from, side.x.begin() + to + 1}),
          static_cast<double>(from),
          static_cast<double>(to)};
}

// Drawn out as of a sine.
double drawnOut(const Side& side, double halfStroke) {
  const double near = side.crossing(nearLevel * halfStroke);
  const double far = side.crossing(farLevel * halfStroke);
  const double nearAngle = std::acos(1 - 2 * nearLevel), farAngle = std::acos(1 - 2 * farLevel);
  return near + (near - far) * nearAngle / (farAngle - nearAngle);
}

double strokeBetween(const TurningPoint& a, const TurningPoint& b) {
  return std::abs(a.value - b.value);
}

// The first (step 1) or last (step −1) turning point; those inside are placed already.
double placeAtEdge(std::span<const double> x,
                   const std::vector<TurningPoint>& turns,
                   std::ptrdiff_t edge,
                   std::ptrdiff_t step,
                   double noise) {
  const auto at = [&](std::ptrdiff_t away) {
    return turns[static_cast<std::size_t>(edge + step * away)];
  };
  const double halfStroke = strokeBetween(at(0), at(1));
  Side side = sideOf(x, at(0), at(1));
  const EdgeRest rest = restAtEdge(side, halfStroke, noise);
  side.top = rest.value;
  double place = drawnOut(side, halfStroke);
  const bool hasTwin = turns.size() > 3 && std::abs(at(2).value - rest.value) < 0.01 * halfStroke &&
                       std::abs(strokeBetween(at(2), at(3)) - halfStroke) < 0.05 * halfStroke;
  if (hasTwin) {
    const Side twin = sideOf(x, at(2), at(3));
    side.top = twin.top;
    place =
        side.crossing(twinLevel * halfStroke) - twin.crossing(twinLevel * halfStroke) + at(2).place;
  }
  return std::clamp(place, rest.first - 1, rest.last + 1);
}

}  // namespace

std::vector<TurningPoint> turningPoints(std::span<const double> x, const TurningOptions& options) {
  expects(options.hysteresis >= 0 && options.share >= 0);
  std::vector<TurningPoint> turns = withoutSmall(zigzag(x, options.hysteresis), options.share);
  if (turns.size() < 2) return {};
  const auto last = static_cast<std::ptrdiff_t>(turns.size()) - 1;
  for (std::size_t i = 1; i + 1 < turns.size(); ++i) {
    TurningPoint& turn = turns[i];
    const double halfStroke =
        std::min(strokeBetween(turn, turns[i - 1]), strokeBetween(turn, turns[i + 1]));
    turn.place =
        placeBetween(sideOf(x, turn, turns[i - 1]), sideOf(x, turn, turns[i + 1]), halfStroke);
  }
  const double noise = noiseLevel(x);
  turns.front().place = placeAtEdge(x, turns, 0, 1, noise);
  turns.back().place = placeAtEdge(x, turns, last, -1, noise);
  return turns;
}

double safeHysteresis(std::span<const double> signal) {
  if (signal.empty()) return 0;
  const auto [low, high] = std::minmax_element(signal.begin(), signal.end());
  return std::max(12 * noiseLevel(signal), 0.004 * (*high - *low));
}

}  // namespace dampwright
