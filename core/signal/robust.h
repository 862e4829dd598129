// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
#include <vector>

namespace dampwright {

/// Middle value (mean of the two middle ones); NaN for none. Takes its own copy to sort in.
double median(std::vector<double> values);

/// Standard deviation of a normal law with the same median absolute deviation: 1.4826 · MAD.
double robustSpread(std::span<const double> values);

/// Standard deviation of the white noise on a smooth even signal, from its third differences
/// (at most about 20,000 of them, spread over the signal). A sine of amplitude A with N samples a
/// cycle adds about A·(2π/N)³/8 to it. 0 where most differences vanish, as in coarse steps.
double noiseLevel(std::span<const double> signal);

/// The step of a coarse sensor: first percentile of the differences between neighbours that are not
/// 0 (of at most about 50,000); next to nothing where the digits are fine. 0 for a constant.
double smallestStep(std::span<const double> signal);

}  // namespace dampwright
