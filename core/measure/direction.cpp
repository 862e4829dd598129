// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/measure/direction.h"

#include <algorithm>
#include <cmath>

namespace dampwright {
namespace {

constexpr double leastForce = 30;  // N
constexpr double leastErrors = 3;  // standard uncertainties

bool isBeyondDoubt(const Gas& gas) {
  return gas.force && std::abs(*gas.force) > leastErrors * gas.totalU &&
         std::abs(*gas.force) > leastForce;
}

std::vector<double> negated(std::vector<double> values) {
  for (double& value : values) value = -value;
  return values;
}

}  // namespace

DirectionFinding findDirection(const Measurement& measurement) {
  const auto& runs = measurement.runs;
  const auto isSettled = [](const MeasuredRun& run) { return run.directionSettled; };
  if (std::all_of(runs.begin(), runs.end(), isSettled)) return DirectionFinding::Known;
  const bool none = std::none_of(runs.begin(), runs.end(), isSettled);
  if (!none || !isBeyondDoubt(measurement.gas)) return DirectionFinding::NotSettled;
  return *measurement.gas.force > 0 ? DirectionFinding::AsRead : DirectionFinding::Turned;
}

std::vector<Trace> turned(std::span<const Trace> traces) {
  std::vector<Trace> out(traces.begin(), traces.end());
  for (Trace& trace : out) {
    if (trace.directionSettled) continue;
    trace.displacement = negated(std::move(trace.displacement));
    trace.velocity = negated(std::move(trace.velocity));
    trace.force = negated(std::move(trace.force));
  }
  return out;
}

Measurement withDirection(Measurement measurement, DirectionFinding finding) {
  const Gas& gas = measurement.gas;
  const bool pulls = isBeyondDoubt(gas) && *gas.force < 0;
  if (finding == DirectionFinding::Known && pulls) {
    measurement.remarks.push_back(
        {"gas-force-negative", Severity::Warning, {{"force", *gas.force, Quantity::Force}}});
  }
  if (finding == DirectionFinding::NotSettled) {
    measurement.remarks.push_back({"direction-assumed", Severity::Warning, {}});
  }
  if (finding == DirectionFinding::AsRead || finding == DirectionFinding::Turned) {
    for (MeasuredRun& run : measurement.runs) run.directionSettled = true;
    measurement.remarks.push_back(
        {"direction-from-gas", Severity::Note, {{"force", std::abs(*gas.force), Quantity::Force}}});
  }
  return measurement;
}

}  // namespace dampwright
