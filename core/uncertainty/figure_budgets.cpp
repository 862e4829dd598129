// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/figure_budgets.h"

#include <algorithm>
#include <cmath>

namespace dampwright {
namespace {

constexpr double known = std::numeric_limits<double>::infinity();
constexpr double smallestShare = 0.05;  // of the largest force: below, a percentage says nothing

double ofLimit(double limit) { return limit / std::sqrt(3.0); }

double ofPercent(double percent, double value) { return std::abs(percent / 100 * value); }

/// The lines of one figure; a part without uncertainty leaves no line.
class Lines {
 public:
  explicit Lines(std::string quantity) : quantity_(std::move(quantity)) {}

  void add(const char* part, double u, double dof = known) {
    if (u > 0 && dof > 0) lines_.push_back({quantity_, part, u, dof});
  }
  void addLoadCell(const LoadCell& cell, double force) {
    const double reading = ofLimit(ofPercent(cell.readingPercent.value_or(0), force));
    const double capacity =
        ofLimit(ofPercent(cell.capacityPercent.value_or(0), cell.capacity.value_or(0)));
    add("load cell", std::hypot(reading, capacity));
  }
  void addZero(const LoadCell& cell) { add("zero", ofLimit(cell.zeroDrift.value_or(0))); }
  void addRemount(const RigAccuracy& rig, double force) {
    add("remount", ofPercent(rig.remountPercent.value_or(0), force));
  }
  std::vector<BudgetLine> take() { return std::move(lines_); }

 private:
  std::string quantity_;
  std::vector<BudgetLine> lines_;
};

}  // namespace

std::vector<BudgetLine> forceBudget(const ForceFigure& figure, const RigAccuracy& rig) {
  Lines lines(figure.quantity);
  lines.add("cycles", figure.cycles.u, figure.cycles.dof);
  lines.addLoadCell(rig.loadCell, figure.force);
  const double perRelativeSpeed = std::abs(figure.slope * figure.velocity);
  if (figure.amplitude > 0) {
    lines.add("displacement",
              perRelativeSpeed * ofLimit(rig.displacementAccuracy.value_or(0)) / figure.amplitude);
  }
  lines.add("clock", perRelativeSpeed * ofLimit(rig.clockAccuracyPercent.value_or(0) / 100));
  lines.add("gas", figure.gas.u, figure.gas.dof);
  lines.addZero(rig.loadCell);
  lines.addRemount(rig, figure.force);
  lines.add("interpolation", figure.interpolationU);
  return lines.take();
}

std::vector<BudgetLine> gasBudget(const Gas& gas, const RigAccuracy& rig) {
  if (!gas.force) return {};
  Lines lines("gas force");
  lines.add(gas.method == "hold" ? "gas" : "cycles", gas.forceU, gas.forceDof);
  lines.addLoadCell(rig.loadCell, *gas.force);
  lines.add("displacement",
            std::abs(gas.rate.value_or(0)) * ofLimit(rig.displacementAccuracy.value_or(0)));
  lines.addZero(rig.loadCell);
  lines.addRemount(rig, *gas.force);
  return lines.take();
}

std::vector<BudgetLine> frictionBudget(const Friction& friction,
                                       FrictionKind kind,
                                       const RigAccuracy& rig) {
  const bool dry = kind == FrictionKind::Dry;
  const std::optional<double>& value = dry ? friction.dry : friction.halfDifference;
  if (!value) return {};
  Lines lines(dry ? "dry friction" : "half difference");
  if (dry) {
    lines.add("cycles", friction.dryU, friction.dryDof);
  } else {
    lines.add("cycles", friction.halfDifferenceU, friction.halfDifferenceDof);
  }
  lines.addLoadCell(rig.loadCell, *value);
  lines.addRemount(rig, *value);
  return lines.take();
}

TypeA pooledTypeA(const std::vector<Reading>& readings) {
  double largest = 0;
  for (const Reading& reading : readings) largest = std::max(largest, std::abs(reading.force));
  double squares = 0;
  double dof = 0;
  for (const Reading& reading : readings) {
    if (reading.forceDof <= 0 || std::abs(reading.force) <= smallestShare * largest) continue;
    const double relative = reading.forceU / reading.force;
    squares += reading.forceDof * relative * relative;
    dof += reading.forceDof;
  }
  return dof > 0 ? TypeA{100 * std::sqrt(squares / dof), dof} : TypeA{};
}

}  // namespace dampwright
