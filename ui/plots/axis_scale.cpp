// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/axis_scale.h"

#include <algorithm>
#include <array>
#include <cmath>

#include "core/base/expects.h"
#include "ui/text/numbers.h"

namespace dampwright {

namespace {

// Above this many ticks a view is no view any more; guards against a step far too small.
constexpr double mostTicks = 1000;

AxisScale scaleOfStep(double low, double high, double step) {
  // A value on a tick but for rounding must not open one more interval.
  const double slack = 1e-9;
  return {std::floor(low / step + slack) * step, std::ceil(high / step - slack) * step, step};
}

}  // namespace

AxisScale niceScale(double low, double high, int mostIntervals) {
  expects(mostIntervals >= 2);
  if (!std::isfinite(low) || !std::isfinite(high)) return {-1, 1, 1};
  if (low > high) std::swap(low, high);
  if (high - low <= 1e-9 * std::max(std::abs(low), std::abs(high)) || high == low) {
    const double room = low == 0 ? 1 : 0.1 * std::abs(low);
    low -= room;
    high += room;
  }
  double power = std::pow(10.0, std::floor(std::log10((high - low) / mostIntervals)));
  for (;; power *= 10) {
    for (const double factor : {1.0, 2.0, 2.5, 5.0}) {
      const AxisScale scale = scaleOfStep(low, high, factor * power);
      if ((scale.high - scale.low) / scale.step < mostIntervals + 0.5) return scale;
    }
  }
}

AxisScale roomyScale(double low, double high, int mostIntervals) {
  constexpr double room = 0.05;
  const AxisScale nice = niceScale(low, high, mostIntervals);
  if (!(low < high)) return nice;
  return {low - room * (high - low), high + room * (high - low), nice.step};
}

std::vector<double> ticksOf(const AxisScale& scale) {
  return ticksInside(scale.low, scale.high, scale.step);
}

std::vector<double> ticksInside(double low, double high, double step) {
  std::vector<double> ticks;
  if (!(step > 0) || !(high >= low) || (high - low) / step > mostTicks) return ticks;
  const double slack = 1e-9;
  const double last = std::floor(high / step + slack);
  for (double i = std::ceil(low / step - slack); i <= last; ++i) ticks.push_back(i * step);
  return ticks;
}

QString tickText(double value, double step) {
  const double power = step > 0 ? std::floor(std::log10(step) + 1e-9) : 0;
  const bool halfStep = std::abs(step / std::pow(10.0, power) - 2.5) < 1e-6;
  const int decimals = std::clamp(static_cast<int>(-power) + (halfStep ? 1 : 0), 0, 9);
  return numberText(value, decimals);
}

}  // namespace dampwright
