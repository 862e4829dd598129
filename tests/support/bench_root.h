// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cmath>

namespace dampwright::bench {

/// The root of a rising function in [low, high]; `guess` inside is a start. `low` where the
/// function is not negative there, `high` where it never turns positive. Secant steps that fall
/// back on halving; accurate to the last bits of the root.
template <class Function>
double rootOfRising(const Function& function, double low, double high, double guess) {
  double lastPoint = low;
  double lastValue = function(low);
  if (lastValue >= 0) return low;
  double point = guess > low && guess < high ? guess : (low + high) / 2;
  double widthBefore = high - low;
  for (int step = 0; step < 200; ++step) {
    const double value = function(point);
    if (value == 0) return point;
    (value < 0 ? low : high) = point;
    double next = point - value * (point - lastPoint) / (value - lastValue);
    const bool look = step % 3 == 2;
    const bool slow = look && high - low > widthBefore / 2;
    if (look) widthBefore = high - low;
    if (slow || !(next > low && next < high)) next = (low + high) / 2;
    if (std::abs(next - point) <= 1e-14 * std::abs(next) || next == low || next == high)
      return next;
    lastPoint = point;
    lastValue = value;
    point = next;
  }
  return point;
}

}  // namespace dampwright::bench
