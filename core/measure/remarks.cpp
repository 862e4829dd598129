// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/measure/remarks.h"

#include <algorithm>

#include "core/identify/gas_and_friction.h"

namespace dampwright {
namespace {

constexpr int enoughSpeeds = 3;
constexpr double oneSpeed = 0.02;   // [1] speeds nearer than this are one
constexpr double oneStroke = 0.02;  // [1] the same of strokes

bool isFast(const CurvePoint& point) {
  return point.reading.peakVelocity > IdentifyOptions{}.slowSpeed;
}

int speedsOf(const Curve& curve) {
  int speeds = 0;
  double last = 0;
  for (const CurvePoint& point : curve.points) {
    const double speed = point.reading.peakVelocity;
    if (!isFast(point) || speed <= last * (1 + oneSpeed)) continue;
    last = speed;
    ++speeds;
  }
  return speeds;
}

bool mixesStrokes(const Curve& curve) {
  double least = 0;
  double most = 0;
  for (const CurvePoint& point : curve.points) {
    if (!isFast(point)) continue;
    least = least == 0 ? point.stroke : std::min(least, point.stroke);
    most = std::max(most, point.stroke);
  }
  return most > least * (1 + oneStroke);
}

}  // namespace

std::vector<Remark> remarksOf(const Measurement& measurement) {
  std::vector<Remark> remarks;
  const int speeds = std::min(speedsOf(measurement.compression), speedsOf(measurement.rebound));
  if (speeds < enoughSpeeds) {
    remarks.push_back({"few-speeds",
                       Severity::Warning,
                       {{"speeds", static_cast<double>(speeds), Quantity::Count}}});
  }
  if (mixesStrokes(measurement.compression) || mixesStrokes(measurement.rebound)) {
    remarks.push_back({"mixed-strokes", Severity::Note, {}});
  }
  if (measurement.typeADof <= 0) {
    remarks.push_back({"scatter-not-known", Severity::Warning, {}});
  }
  const std::string& gas = measurement.gas.reason;
  const std::string& friction = measurement.friction.reason;
  if (!gas.empty()) remarks.push_back({gas, Severity::Note, {}});
  const bool same =
      friction == gas || (gas == "no-slow-block-or-hold" && friction == "no-slow-block");
  if (!friction.empty() && !same) remarks.push_back({friction, Severity::Note, {}});
  return remarks;
}

}  // namespace dampwright
