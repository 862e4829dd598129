// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <array>
#include <cmath>

#include "core/curves/force_at.h"
#include "core/uncertainty/figure_budgets.h"
#include "core/verdict/check_kinds.h"

namespace dampwright {
namespace {

constexpr std::string_view atPeakVelocity = "at peak velocity";
constexpr std::string_view largest = "largest";
constexpr std::array<std::string_view, 2> readings{atPeakVelocity, largest};
constexpr std::array<CheckField, 9> fields{{
    {"direction", CheckMember::Direction, Need::Must},
    {"velocity_mm_s", CheckMember::Velocity, Need::Must},
    {"reading", CheckMember::Reading, Need::May, readings},
    {"stroke_mm", CheckMember::Stroke, Need::May},
    {"min_n", CheckMember::Min, Need::May},
    {"max_n", CheckMember::Max, Need::May},
    {"target_n", CheckMember::Target, Need::May},
    {"tolerance_percent", CheckMember::TolerancePercent, Need::May},
    {"tolerance_n", CheckMember::ToleranceAbsolute, Need::May},
}};

// The chosen law says damping force less dry friction; the figure holds friction, and as measured
// the gas too. Empty where there is no law, and for the largest ordinate, which no law describes.
std::function<double(double)> lawOf(const Measurement& measurement,
                                    Direction direction,
                                    CurveFigure figure) {
  const FittedLaw* law = chosenLaw(measurement.laws(direction));
  if (!law || figure == CurveFigure::LargestForce) return {};
  double added = measurement.friction.dry.value_or(0);
  if (figure == CurveFigure::Force) added += signOf(direction) * measurement.gas.force.value_or(0);
  return [law, added](double velocity) { return law->at(velocity) + added; };
}

// Cycle-to-cycle scatter of the nearest point; of a larger force than there, its percentage.
TypeA scatterOf(const Reading& nearest, double force, CurveFigure figure) {
  const bool ordinate = figure == CurveFigure::LargestForce;
  const double there = std::abs(ordinate ? nearest.largestForce : nearest.force);
  const double growth = there > 0 ? std::max(1.0, std::abs(force) / there) : 1;
  return ordinate ? TypeA{growth * nearest.largestCyclesU, nearest.largestCyclesDof}
                  : TypeA{growth * nearest.cyclesU, nearest.cyclesDof};
}

std::vector<BudgetLine> budgetOf(const Measurement& measurement,
                                 const Reading& nearest,
                                 const ForceAtSpeed& at,
                                 const ForceQuery& query) {
  ForceFigure figure;
  figure.force = at.force;
  figure.slope = at.slope;
  figure.velocity = query.speed;
  figure.amplitude = at.stroke / 2;
  figure.cycles = scatterOf(nearest, at.force, query.figure);
  if (query.figure == CurveFigure::DampingForce)
    figure.gas = {measurement.gas.forceU, measurement.gas.forceDof};
  figure.interpolationU = at.uInterpolation;
  return forceBudget(figure, measurement.rig);
}

std::vector<Remark> remarksOf(const ForceAtSpeed& at, const ForceQuery& query) {
  std::vector<Remark> remarks;
  const NamedValue velocity{"velocity", query.speed, Quantity::Velocity};
  if (at.how == HowRead::EndSlope)
    remarks.push_back(Remark{"speed-outside-tested", Severity::Warning, {velocity}});
  if (at.severalStrokes) {
    const NamedValue stroke{"stroke", at.stroke, Quantity::Length};
    remarks.push_back(Remark{"stroke-not-asked", Severity::Warning, {velocity, stroke}});
  }
  return remarks;
}

Reason reasonOf(const ForceAtSpeed& at, const ForceQuery& query) {
  Reason reason{at.reason, {{"velocity", query.speed, Quantity::Velocity}}};
  if (query.stroke) reason.values.push_back({"stroke", *query.stroke, Quantity::Length});
  return reason;
}

Figure force(const Measurement& measurement, const Limits& limits, const Check& check) {
  const bool gasRemoved = limits.forceBasis == ForceBasis::GasRemoved;
  if (check.reading == largest && gasRemoved) return {.reason = {"largest-with-gas-removed", {}}};
  const Curve& curve = measurement.curve(*check.direction);
  ForceQuery query;
  query.speed = *check.velocity;
  query.stroke = check.stroke ? check.stroke : limits.conditions.stroke;
  query.figure = check.reading == largest ? CurveFigure::LargestForce
                 : gasRemoved             ? CurveFigure::DampingForce
                                          : CurveFigure::Force;
  query.law = lawOf(measurement, *check.direction, query.figure);
  const ForceAtSpeed at = forceAt(curve, query);
  if (!at) return {.reason = reasonOf(at, query)};
  const Block& block = measurement.blocks[curve.points[at.nearest].block].block;
  Figure figure;
  figure.value = at.force;
  figure.budget = budgetOf(measurement, curve.points[at.nearest].reading, at, query);
  figure.temperature = block.temperature;
  figure.waveform = block.kind;
  figure.remarks = remarksOf(at, query);
  return figure;
}

}  // namespace

/// Force in the direction that resists the motion, at a speed: at the instant of peak velocity
/// (default), or the largest ordinate, which is only defined as measured.
const CheckKind forceCheckKind{"force", Quantity::Force, NeedsDirection::Yes, fields, force};

}  // namespace dampwright
