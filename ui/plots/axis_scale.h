// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <vector>

namespace dampwright {

/// What an axis shows. Unit: whatever the axis shows.
struct AxisScale {
  double low = -1, high = 1;
  double step = 1;  ///< from tick to tick, > 0: 1, 2, 2.5 or 5 times a power of ten

  bool operator==(const AxisScale&) const = default;
};

/// The smallest scale of at most `mostIntervals` (>= 2) steps that holds both values. Values that
/// are equal or not finite get room around them, so that the scale is never empty.
AxisScale niceScale(double low, double high, int mostIntervals);

/// A scale with a little room beyond both values, so that a mark on the outermost one is whole. Its
/// ends are no ticks; its step is the one of niceScale.
AxisScale roomyScale(double low, double high, int mostIntervals);

/// The ticks inside a scale by rising value, ends included.
std::vector<double> ticksOf(const AxisScale& scale);

/// Ticks of this step that lie inside a range, for a view that does not end on ticks.
std::vector<double> ticksInside(double low, double high, double step);

/// How ticks of this step read: with as many decimals as tell them apart, in the locale's digits.
QString tickText(double value, double step);

}  // namespace dampwright
