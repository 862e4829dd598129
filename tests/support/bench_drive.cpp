// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_drive.h"

#include <algorithm>
#include <cmath>

#include "core/base/expects.h"
#include "core/base/units.h"

namespace dampwright::bench {
namespace {

/// A wave of amplitude 1 over its phase, -1 at phase 0, with its first two derivatives.
struct Shape {
  double x = 0, d1 = 0, d2 = 0;
};

Shape sineShape(double phase) { return {-std::cos(phase), std::sin(phase), std::cos(phase)}; }

Shape crankShape(double phase, double ratio) {
  const double s = std::sin(phase), c = std::cos(phase);
  const double root = std::sqrt(1 - ratio * ratio * s * s);
  const double bend = c * c - s * s + ratio * ratio * s * s * s * s;
  return {
      -c + (1 - root) / ratio, s + ratio * s * c / root, c + ratio * bend / (root * root * root)};
}

/// Constant speed but for a parabola around each turning point; `corner` is the share of half a
/// period that turns.
Shape triangleShape(double phase, double corner) {
  const double turn = std::fmod(phase, 2 * pi);
  const double inHalf = turn < pi ? turn : 2 * pi - turn;  // 0 at the lower, pi at the upper end
  const double reach = corner * pi / 2;   // phase from a turning point to full speed
  const double slope = 2 / (pi - reach);  // so that the wave spans -1 to 1
  const double sign = turn < pi ? 1.0 : -1.0;
  if (inHalf < reach)
    return {
        -1 + slope * inHalf * inHalf / (2 * reach), sign * slope * inHalf / reach, slope / reach};
  if (inHalf > pi - reach) {
    const double left = pi - inHalf;
    return {1 - slope * left * left / (2 * reach), sign * slope * left / reach, -slope / reach};
  }
  return {slope * (inHalf - pi / 2), sign * slope, 0};
}

Shape shapeOf(const DrivePlan& drive, Wave wave, double phase) {
  if (wave == Wave::Crank) return crankShape(phase, drive.rodRatio);
  if (wave == Wave::Triangle) return triangleShape(phase, drive.cornerShare);
  return sineShape(phase);
}

/// Largest slope of the wave over its phase.
double largestSlope(const DrivePlan& drive, Wave wave) {
  if (wave == Wave::Sine) return 1.0;
  if (wave == Wave::Triangle) return 2 / (pi - drive.cornerShare * pi / 2);
  double low = pi / 4, high = pi / 2;  // the crank's slope peaks before mid-stroke
  for (int i = 0; i < 200; ++i) {
    const double middle = (low + high) / 2;
    (crankShape(middle, drive.rodRatio).d2 > 0 ? low : high) = middle;
  }
  return crankShape(low, drive.rodRatio).d1;
}

}  // namespace

DrivePlan speedsPlan(
    double stroke, double slowSpeed, int slowTurns, const std::vector<double>& speeds, int turns) {
  DrivePlan plan;
  plan.steps.push_back(BlockPlan{.speed = slowSpeed, .stroke = stroke, .turns = slowTurns});
  for (const double speed : speeds)
    plan.steps.push_back(BlockPlan{.speed = speed, .stroke = stroke, .turns = turns});
  return plan;
}

Drive::Drive(const DrivePlan& plan) : plan_(plan) {
  expects(!plan.steps.empty());
  const auto startOf = [](const std::variant<BlockPlan, HoldPlan>& step) {
    if (const auto* hold = std::get_if<HoldPlan>(&step)) return hold->position;
    const auto& block = std::get<BlockPlan>(step);
    return block.mid - block.stroke / 2;
  };
  place_ = startOf(plan.steps.front());
  stand(plan.dwell);
  for (const auto& step : plan.steps) {
    moveTo(startOf(step));
    if (const auto* hold = std::get_if<HoldPlan>(&step)) stand(hold->duration);
    if (const auto* block = std::get_if<BlockPlan>(&step)) turn(*block);
    stand(plan.dwell);
  }
}

void Drive::stand(double seconds) {
  if (seconds <= 0) return;
  Piece piece;
  piece.start = duration_;
  piece.end = duration_ += seconds;
  piece.from = piece.to = place_;
  pieces_.push_back(piece);
}

void Drive::moveTo(double place) {
  const double way = std::abs(place - place_);
  if (way < 1e-12) return;
  Piece piece;
  piece.start = duration_;
  piece.end = duration_ += way / plan_.moveSpeed;
  piece.from = place_;
  piece.to = place_ = place;
  pieces_.push_back(piece);
}

/// Appends a turning piece that goes on from `state`, and says in which state it ends.
Drive::Piece Drive::addTurning(Piece state,
                               double seconds,
                               double rateAtEnd,
                               double driftPerSecond) {
  state.start = duration_;
  state.end = duration_ += seconds;
  state.growth = (rateAtEnd - state.rate) / seconds;
  state.driftPerSecond = driftPerSecond;
  pieces_.push_back(state);
  state.phase += state.rate * seconds + state.growth * seconds * seconds / 2;
  state.rate = rateAtEnd;
  state.drifted += driftPerSecond * seconds;
  return state;
}

void Drive::turn(const BlockPlan& plan) {
  const double perSpeed = 2 / (plan.stroke * largestSlope(plan_, plan.wave));
  const double rate = plan.speed * perSpeed;
  const double endRate = plan.endSpeed.value_or(plan.speed) * perSpeed;
  const double evenPhase = 2 * pi * plan.turns - (rate + endRate) * plan.ramp / 2;
  expects(plan.speed > 0 && plan.stroke > 0 && plan.ramp > 0 && evenPhase > 0);
  const double seconds = evenPhase / ((rate + endRate) / 2);
  Piece rest;
  rest.turning = true;
  rest.plan = plan;
  const Piece even = addTurning(rest, plan.ramp, rate, 0);
  DriveBlock block{plan, duration_, duration_ + seconds, {}};
  const Piece done = addTurning(even, seconds, endRate, 1 / seconds);
  const double growth = (endRate - rate) / seconds;
  const double small = 0.35;  // rad that a ramp may take of a turn that still counts as even
  if (even.phase < small) block.lowerTurnings.push_back(block.start - plan.ramp);
  for (int turn = 1; turn < plan.turns; ++turn) {
    const double way = 2 * pi * turn - even.phase;
    if (way < 0 || way > evenPhase) continue;
    const double rateThere = std::sqrt(rate * rate + 2 * growth * way);
    block.lowerTurnings.push_back(block.start + 2 * way / (rate + rateThere));
  }
  if (endRate * plan.ramp / 2 < small) block.lowerTurnings.push_back(block.end + plan.ramp);
  blocks_.push_back(block);
  addTurning(done, plan.ramp, 0, 0);
  place_ = at(duration_).x;
}

DrivePoint Drive::turningAt(const Piece& piece, double time) const {
  const double t = time - piece.start;
  const double phase = piece.phase + piece.rate * t + piece.growth * t * t / 2;
  const double rate = piece.rate + piece.growth * t;
  const Shape shape = shapeOf(plan_, piece.plan.wave, phase);
  const double drifted = piece.drifted + piece.driftPerSecond * t;
  const double half = piece.plan.stroke / 2;
  const double size = half * (1 + piece.plan.strokeDrift * drifted);
  const double growth = half * piece.plan.strokeDrift * piece.driftPerSecond;
  const double mid = piece.plan.mid + piece.plan.midDrift * drifted;
  return {mid + size * shape.x,
          piece.plan.midDrift * piece.driftPerSecond + growth * shape.x + size * shape.d1 * rate,
          2 * growth * shape.d1 * rate + size * (shape.d2 * rate * rate + shape.d1 * piece.growth)};
}

DrivePoint Drive::at(double time) const {
  const auto after = std::upper_bound(
      pieces_.begin(), pieces_.end(), time, [](double t, const Piece& p) { return t < p.end; });
  const Piece& piece = after == pieces_.end() ? pieces_.back() : *after;
  const double t = std::clamp(time, piece.start, piece.end);
  if (piece.turning) return turningAt(piece, t);
  const double span = piece.end - piece.start;
  const double s = (t - piece.start) / span;
  const double way = piece.to - piece.from;
  // 10 s³ − 15 s⁴ + 6 s⁵: starts and ends at rest, without a jerk
  return {piece.from + way * s * s * s * (10 + s * (-15 + 6 * s)),
          way / span * 30 * s * s * (1 - s) * (1 - s),
          way / (span * span) * 60 * s * (1 - s) * (1 - 2 * s)};
}

}  // namespace dampwright::bench
