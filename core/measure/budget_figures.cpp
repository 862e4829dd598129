// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/measure/budget_figures.h"

#include <cmath>

#include "core/curves/force_at.h"
#include "core/identify/gas_and_friction.h"
#include "core/uncertainty/figure_budgets.h"
#include "core/uncertainty/pooled_scatter.h"

namespace dampwright {
namespace {

TypeA scatterPercent(const Measurement& measurement) {
  const double slowSpeed = IdentifyOptions{}.slowSpeed;
  std::vector<Reading> readings;
  for (const Curve* curve : {&measurement.compression, &measurement.rebound}) {
    for (const CurvePoint& point : curve->points) {
      if (point.reading.peakVelocity > slowSpeed) readings.push_back(point.reading);
    }
  }
  return pooledTypeA(readings);
}

/// Which of a reading's two forces is pooled, and where its type A goes.
struct Pooling {
  double Reading::*force;
  double Reading::*u;
  double Reading::*cyclesU;
  double Reading::*cyclesDof;
};
constexpr Pooling atPeak{&Reading::force, &Reading::forceU, &Reading::cyclesU, &Reading::cyclesDof};
constexpr Pooling largest{&Reading::largestForce,
                          &Reading::largestForceU,
                          &Reading::largestCyclesU,
                          &Reading::largestCyclesDof};

std::vector<CurvePoint*> pointsOf(Measurement& measurement) {
  std::vector<CurvePoint*> points;
  for (Curve* curve : {&measurement.compression, &measurement.rebound}) {
    for (CurvePoint& point : curve->points) points.push_back(&point);
  }
  return points;
}

void poolScatter(Measurement& measurement, const Pooling& pooling) {
  std::vector<Scatter> means;
  const std::vector<CurvePoint*> points = pointsOf(measurement);
  for (const CurvePoint* point : points) {
    const Reading& reading = point->reading;
    const bool alone = measurement.blocks[point->block].block.singles.size() < 2;
    const double cycles = alone ? 1 : reading.forceDof + 1;
    means.push_back(
        {reading.*pooling.force, cycles, reading.*pooling.u, reading.noiseU, reading.noiseDof});
  }
  const std::vector<TypeA> pooled = pooledScatter(means);
  for (std::size_t i = 0; i < points.size(); ++i) {
    points[i]->reading.*pooling.cyclesU = pooled[i].u;
    points[i]->reading.*pooling.cyclesDof = pooled[i].dof;
  }
}

/// Adds lines to the budget; what they combine to.
Combined book(Measurement& measurement, const std::vector<BudgetLine>& lines) {
  measurement.budget.insert(measurement.budget.end(), lines.begin(), lines.end());
  return combine(lines);
}

double slopeAt(const Curve& curve, const CurvePoint& point, CurveFigure figure) {
  const ForceAtSpeed found = forceAt(curve, {point.reading.peakVelocity, point.stroke, figure, {}});
  return found ? found.slope : 0;
}

void budgetPoint(Measurement& measurement, const Curve& curve, CurvePoint& point) {
  Reading& reading = point.reading;
  ForceFigure figure;
  figure.quantity = budgetQuantity(curve.direction, "force", point.block);
  figure.force = reading.force;
  figure.slope = slopeAt(curve, point, CurveFigure::Force);
  figure.velocity = reading.peakVelocity;
  figure.amplitude = 0.5 * point.stroke;
  figure.cycles = {reading.cyclesU, reading.cyclesDof};
  const Combined asMeasured = book(measurement, forceBudget(figure, measurement.rig));
  reading.forceTotalU = asMeasured.u;
  reading.forceTotalDof = asMeasured.dof;
  if (!reading.dampingForce) return;
  figure.quantity = budgetQuantity(curve.direction, "damping force", point.block);
  figure.force = *reading.dampingForce;
  figure.slope = slopeAt(curve, point, CurveFigure::DampingForce);
  figure.gas = {measurement.gas.forceU, measurement.gas.forceDof};
  const Combined damping = book(measurement, forceBudget(figure, measurement.rig));
  reading.dampingForceTotalU = damping.u;
  reading.dampingForceTotalDof = damping.dof;
}

void budgetCurve(Measurement& measurement, Curve Measurement::*curve) {
  const Curve before = measurement.*curve;
  for (CurvePoint& point : (measurement.*curve).points) {
    budgetPoint(measurement, before, point);
    MeasuredBlock& block = measurement.blocks[point.block];
    (before.direction == Direction::Compression ? block.compression : block.rebound) =
        point.reading;
  }
}

}  // namespace

std::string budgetQuantity(Direction direction, std::string_view figure, std::size_t block) {
  const char* name = direction == Direction::Compression ? "compression " : "rebound ";
  return name + std::string(figure) + ", block " + std::to_string(block);
}

Measurement withBudget(Measurement measurement) {
  const TypeA scatter = scatterPercent(measurement);
  measurement.typeAPercent = scatter.u;
  measurement.typeADof = scatter.dof;
  poolScatter(measurement, atPeak);
  poolScatter(measurement, largest);
  const Combined gas = book(measurement, gasBudget(measurement.gas, measurement.rig));
  measurement.gas.totalU = gas.u;
  measurement.gas.totalDof = gas.dof;
  Friction& friction = measurement.friction;
  const Combined dry =
      book(measurement, frictionBudget(friction, FrictionKind::Dry, measurement.rig));
  friction.dryTotalU = dry.u;
  friction.dryTotalDof = dry.dof;
  const Combined half =
      book(measurement, frictionBudget(friction, FrictionKind::HalfDifference, measurement.rig));
  friction.halfDifferenceTotalU = half.u;
  friction.halfDifferenceTotalDof = half.dof;
  budgetCurve(measurement, &Measurement::compression);
  budgetCurve(measurement, &Measurement::rebound);
  return measurement;
}

}  // namespace dampwright
