// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <optional>

#include "core/base/quantity.h"

namespace dampwright {

// The only place where SI becomes a unit that people read: mm, mm/s, N, °C, J, W, N·s/m, N/mm, kg,
// Hz, °. Numbers follow the locale of the screen (QLocale()), have no thousands marks, a true minus
// sign, and a space before the unit that never breaks. A number that is not finite reads "–".

/// Symbol of the unit shown for a quantity; empty for plain numbers and counts.
QString unitSymbol(Quantity quantity);

/// SI to the unit shown, for an axis or an entry field; and back, exactly inverse up to rounding.
double shownFromSi(double si, Quantity quantity);
double siFromShown(double shown, Quantity quantity);

/// A bare number with this many decimals (0 to 9), without unit. `-0.0` reads "0.0".
QString numberText(double shown, int decimals);

/// A value with its unit, as many digits as the quantity deserves (four significant ones, never
/// finer than a workshop reads: 0.1 N, 0.01 mm, 0.1 mm/s, 1 °C …), trailing zeros dropped.
QString quantityText(double si, Quantity quantity);

/// A limit or target as it was typed: up to seven significant digits, trailing zeros dropped, with
/// its unit.
QString exactText(double si, Quantity quantity);

/// Decimals of the shown unit that give the expanded uncertainty two significant digits (0 to 9).
/// Source: JCGM 100:2008 (GUM) 7.2.6. An uncertainty of 0 takes the quantity's own decimals.
int decimalsForUncertainty(double expandedSi, Quantity quantity);

/// "964.0 ± 9.1 N": the uncertainty with two significant digits, the value to the same decimal.
/// An uncertainty of 0 is left out.
QString measuredText(double si, double expandedSi, Quantity quantity);
QString measuredText(double si, double expandedSi, Quantity quantity, int decimals);

/// "870–1120 N", "≤ 45 N", "≥ 120 N"; empty where there is neither. Written as exactText.
QString rangeText(std::optional<double> minSi, std::optional<double> maxSi, Quantity quantity);

}  // namespace dampwright
