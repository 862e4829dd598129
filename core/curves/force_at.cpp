// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/force_at.h"

#include <algorithm>
#include <cmath>
#include <vector>

#include "core/curves/monotone_cubic.h"

namespace dampwright {
namespace {

constexpr double strokeAlike = 0.02;   // strokes that differ by less are one
constexpr double speedAlike = 0.02;    // a point this near is used itself
constexpr double speedSame = 0.005;    // points this near are one
constexpr double outsideShare = 0.05;  // how far the end slope carries

std::optional<double> figureOf(const Reading& reading, CurveFigure figure) {
  switch (figure) {
    case CurveFigure::Force:
      return reading.force;
    case CurveFigure::LargestForce:
      if (std::isnan(reading.largestForce)) return std::nullopt;
      return reading.largestForce;
    case CurveFigure::DampingForce:
      return reading.dampingForce;
  }
  return std::nullopt;
}

bool alike(double a, double b, double share) { return std::abs(a - b) <= share * std::abs(b); }

struct Selected {
  std::vector<std::size_t> points;  // indices into the curve, by rising velocity
  double stroke = 0;
  bool several = false;
  std::string reason;
};

std::size_t nearestOf(const Curve& curve, const std::vector<std::size_t>& points, double speed) {
  return *std::min_element(points.begin(), points.end(), [&](std::size_t a, std::size_t b) {
    return std::abs(curve.points[a].reading.peakVelocity - speed) <
           std::abs(curve.points[b].reading.peakVelocity - speed);
  });
}

// The points that count: with the figure asked for, and all of one stroke.
Selected select(const Curve& curve, const ForceQuery& query) {
  Selected selected;
  std::vector<std::size_t> all;
  for (std::size_t i = 0; i < curve.points.size(); ++i)
    if (figureOf(curve.points[i].reading, query.figure)) all.push_back(i);
  if (all.empty()) {
    const bool gas = query.figure == CurveFigure::DampingForce && !curve.points.empty();
    selected.reason = gas ? "gas-not-determined" : "no-points";
    return selected;
  }
  const auto strokeOf = [&](std::size_t i) { return curve.points[i].stroke; };
  selected.stroke = query.stroke ? *query.stroke : strokeOf(nearestOf(curve, all, query.speed));
  for (const std::size_t i : all)
    if (alike(strokeOf(i), selected.stroke, strokeAlike)) selected.points.push_back(i);
  selected.several = !query.stroke && selected.points.size() < all.size();
  if (selected.points.empty()) selected.reason = "stroke-not-tested";
  return selected;
}

// Points of one speed made one: the mean of both coordinates.
struct Merged {
  std::vector<double> speeds, forces;
};

Merged merge(const Curve& curve, const Selected& selected, CurveFigure figure) {
  Merged merged;
  double count = 0;
  for (const std::size_t i : selected.points) {
    const double speed = curve.points[i].reading.peakVelocity;
    const double force = *figureOf(curve.points[i].reading, figure);
    if (!merged.speeds.empty() && alike(speed, merged.speeds.back(), speedSame)) {
      count += 1;
      merged.speeds.back() += (speed - merged.speeds.back()) / count;
      merged.forces.back() += (force - merged.forces.back()) / count;
    } else {
      count = 1;
      merged.speeds.push_back(speed);
      merged.forces.push_back(force);
    }
  }
  return merged;
}

double slopeOfLaw(const std::function<double(double)>& law, double speed) {
  const double step = 1e-4 * speed;
  return (law(speed + step) - law(speed - step)) / (2 * step);
}

// One measured speed only: its slope is the law's, without a law the secant from zero.
ForceAtSpeed fromOnePoint(const Merged& merged, const ForceQuery& query) {
  const double speed = merged.speeds[0], force = merged.forces[0];
  const double away = query.speed - speed;
  ForceAtSpeed out;
  out.slope = query.law ? slopeOfLaw(query.law, speed) : force / speed;
  out.force = force + out.slope * away;
  out.how = alike(query.speed, speed, speedAlike) ? HowRead::AtPoint : HowRead::EndSlope;
  out.uInterpolation = std::abs(out.slope * away) / std::sqrt(3.0);
  return out;
}

ForceAtSpeed fromPoint(const MonotoneCubic& cubic, double speed, double force, double asked) {
  ForceAtSpeed out;
  out.how = HowRead::AtPoint;
  out.slope = cubic.slopeAt(speed);
  out.force = force + out.slope * (asked - speed);
  return out;
}

ForceAtSpeed fromMany(const Merged& merged, const ForceQuery& query) {
  const MonotoneCubic cubic(merged.speeds, merged.forces);
  std::size_t nearest = 0;
  for (std::size_t i = 1; i < merged.speeds.size(); ++i)
    if (std::abs(merged.speeds[i] - query.speed) < std::abs(merged.speeds[nearest] - query.speed))
      nearest = i;
  if (alike(query.speed, merged.speeds[nearest], speedAlike))
    return fromPoint(cubic, merged.speeds[nearest], merged.forces[nearest], query.speed);
  const bool inside = query.speed > merged.speeds.front() && query.speed < merged.speeds.back();
  ForceAtSpeed out = fromPoint(cubic, merged.speeds[nearest], merged.forces[nearest], query.speed);
  out.how = HowRead::EndSlope;
  if (inside) {
    out.how = HowRead::Between;
    out.force = cubic.at(query.speed);
    out.slope = cubic.slopeAt(query.speed);
  }
  const double other = query.law ? query.law(query.speed) : cubic.straightAt(query.speed);
  out.uInterpolation = std::abs(out.force - other) / std::sqrt(3.0);
  return out;
}

ForceAtSpeed notRead(std::string reason) {
  ForceAtSpeed out;
  out.reason = std::move(reason);
  return out;
}

}  // namespace

ForceAtSpeed forceAt(const Curve& curve, const ForceQuery& query) {
  const Selected selected = select(curve, query);
  if (!selected.reason.empty()) return notRead(selected.reason);
  const Merged merged = merge(curve, selected, query.figure);
  const bool tooSlow = query.speed < (1 - outsideShare) * merged.speeds.front();
  const bool tooFast = query.speed > (1 + outsideShare) * merged.speeds.back();
  if (!(query.speed > 0) || tooSlow || tooFast) return notRead("speed-not-tested");
  ForceAtSpeed out =
      merged.speeds.size() == 1 ? fromOnePoint(merged, query) : fromMany(merged, query);
  out.stroke = selected.stroke;
  out.severalStrokes = selected.several;
  out.nearest = nearestOf(curve, selected.points, query.speed);
  return out;
}

}  // namespace dampwright
