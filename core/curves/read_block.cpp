// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/read_block.h"

#include <algorithm>
#include <cmath>
#include <limits>
#include <tuple>

#include "core/base/expects.h"
#include "core/curves/loop_fit.h"
#include "core/curves/loop_numbers.h"

namespace dampwright {
namespace {

constexpr double nan = std::numeric_limits<double>::quiet_NaN();

struct Peak {
  double place = 0;  // grid points
  double speed = 0;  // m/s, magnitude
};

GridStretch halfOf(const Loop& loop, Direction direction) {
  const double points = static_cast<double>(loop.size()), top = loop.top * points;
  return direction == Direction::Compression ? GridStretch{0, top} : GridStretch{top, points};
}

std::size_t firstPoint(const GridStretch& half) {
  return static_cast<std::size_t>(std::ceil(half.from));
}

std::size_t endPoint(const GridStretch& half) {
  return static_cast<std::size_t>(std::ceil(half.to));
}

// Largest |v| of the half, between grid points by the parabola through three.
Peak fastestPlace(const Loop& loop, Direction direction) {
  const double sign = signOf(direction);
  const GridStretch half = halfOf(loop, direction);
  std::size_t best = firstPoint(half);
  for (std::size_t i = best; i < endPoint(half); ++i)
    if (sign * loop.velocity[i] > sign * loop.velocity[best]) best = i;
  const std::size_t n = loop.size();
  const double before = sign * loop.velocity[(best + n - 1) % n], here = sign * loop.velocity[best],
               after = sign * loop.velocity[(best + 1) % n];
  const double bend = before - 2 * here + after, slope = (after - before) / 2;
  const double shift = bend < 0 ? std::clamp(-slope / bend, -0.5, 0.5) : 0.0;
  return {static_cast<double>(best) + shift, here + slope * shift + bend * shift * shift / 2};
}

// Mid-stroke of a triangle's half, and the slope of the straight line through the middle half of
// its travel.
Peak middlePlace(const Block& block, Direction direction) {
  const Loop& loop = block.loop;
  const GridStretch half = halfOf(loop, direction);
  double n = 0, t1 = 0, t2 = 0, y1 = 0, ty = 0;
  for (std::size_t i = firstPoint(half); i < endPoint(half); ++i) {
    const double t = static_cast<double>(i), y = loop.displacement[i];
    if (std::abs(y) > block.stroke / 4) continue;
    n += 1;
    t1 += t;
    t2 += t * t;
    y1 += y;
    ty += t * y;
  }
  const double slope = (ty - t1 * y1 / n) / (t2 - t1 * t1 / n);
  const double middle = t1 / n - y1 / n / slope;
  return {middle, std::abs(slope) * static_cast<double>(loop.size()) / loop.period};
}

// Where the running mean over 10° of the force along the direction is largest, inside the half.
double largestPlace(const Loop& loop, Direction direction) {
  const GridStretch half = halfOf(loop, direction);
  const double sign = signOf(direction);
  const std::size_t from = firstPoint(half), to = endPoint(half), reach = loop.size() / 72;
  double best = -std::numeric_limits<double>::infinity();
  std::size_t place = from;
  for (std::size_t i = from; i < to; ++i) {
    const std::size_t width = std::min({reach, i - from, to - 1 - i});
    double sum = 0;
    for (std::size_t k = i - width; k <= i + width; ++k) sum += sign * loop.force[k];
    const double mean = sum / static_cast<double>(2 * width + 1);
    if (std::isnan(mean)) return nan;
    if (width < reach / 2 && i != from && i != to - 1) continue;
    if (mean > best) best = mean, place = i;
  }
  return static_cast<double>(place);
}

LoopFigure largestFigure(const Block& block, Direction direction) {
  const double place = largestPlace(block.loop, direction);
  if (std::isnan(place)) return {nan, nan, 0, nan, 0};
  return forceAtPlace(block, place, halfOf(block.loop, direction));
}

Reading readDirection(const Block& block, Direction direction, double energy) {
  const double sign = signOf(direction);
  const Peak peak = block.kind == BlockKind::Triangle ? middlePlace(block, direction)
                                                      : fastestPlace(block.loop, direction);
  const LoopFigure force = forceAtPlace(block, peak.place, halfOf(block.loop, direction));
  const LoopFigure largest = largestFigure(block, direction);
  Reading reading;
  reading.peakVelocity = peak.speed;
  reading.displacement =
      closedValue(block.loop.displacement, peak.place, static_cast<int>(block.loop.size() / 36));
  reading.force = sign * force.value;
  reading.forceU = force.u;
  reading.forceDof = force.dof;
  reading.noiseU = force.noiseU;
  reading.noiseDof = force.noiseDof;
  const bool peakIsLargest = sign * force.value >= sign * largest.value;
  reading.largestForce = peakIsLargest ? reading.force : sign * largest.value;
  reading.largestForceU = peakIsLargest ? force.u : largest.u;
  reading.energy = energy;
  return reading;
}

BlockReading unread() {
  Reading none;
  none.peakVelocity = none.displacement = none.force = none.forceU = none.largestForce =
      none.largestForceU = none.energy = nan;
  return {nan, nan, nan, nan, {nan, nan}, none, none};
}

}  // namespace

BlockReading readBlock(const Block& block) {
  if (block.kind == BlockKind::Hold || block.loop.size() == 0) return unread();
  const LoopNumbers numbers = loopNumbers(block);
  BlockReading reading;
  reading.energy = numbers.energy();
  reading.meanPower = numbers.energy() / block.loop.period;
  reading.equivalentDamping = numbers.energy() / numbers.speedIntegral;
  reading.phaseLag = numbers.phaseLag;
  reading.endForces = numbers.endForces;
  reading.compression = readDirection(block, Direction::Compression, numbers.compressionEnergy);
  reading.rebound = readDirection(block, Direction::Rebound, numbers.reboundEnergy);
  return reading;
}

Curve makeCurve(Direction direction, std::vector<CurvePoint> points) {
  std::erase_if(points, [](const CurvePoint& point) { return !point.reading.isRead(); });
  std::stable_sort(points.begin(), points.end(), [](const CurvePoint& a, const CurvePoint& b) {
    return std::tie(a.reading.peakVelocity, a.stroke) < std::tie(b.reading.peakVelocity, b.stroke);
  });
  return {direction, std::move(points)};
}

}  // namespace dampwright
