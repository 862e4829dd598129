// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <optional>
#include <span>

namespace dampwright {

/// Rises evenly: never more than one step in a hundred falls or stands, and the middle 80 % of the
/// steps differ by less than half of the median one.
bool isClock(std::span<const double> values);

/// Whole numbers that rise by exactly one from row to row: a counter, no clock.
bool countsRows(std::span<const double> values);

/// Never moves.
bool isConstant(std::span<const double> values);

/// Root mean square of the second differences over that of the first: about ω·Δt for a clean
/// oscillation, 1.7 for noise. Large where the column is constant.
double roughness(std::span<const double> values);

/// k of b ≈ k · da/dn, where b is the slope of a against the row number: regression through zero,
/// only where the correlation is above 0.95; nothing otherwise.
std::optional<double> slopeFactor(std::span<const double> a, std::span<const double> b);

/// Rows from one rising crossing of the mean to the next, median; nothing below two of them.
std::optional<double> rowsPerCycle(std::span<const double> values);

/// Median step from row to row that is not zero; 0 where there is none.
double medianStep(std::span<const double> values);

}  // namespace dampwright
