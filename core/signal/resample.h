// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <span>
#include <vector>

namespace dampwright {

/// The even clock that a signal is brought to.
struct EvenClock {
  double start = 0;  ///< s
  double rate = 1;   ///< Hz
  std::size_t count = 0;
};

/// Values on an even clock, by the cubic through the two samples on either side (the nearest four
/// at the ends). Times must rise; at least 4. A sine of N samples a cycle is met to (2π/N)⁴·3/128
/// of its amplitude where the steps are nearly even.
std::vector<double> resample(std::span<const double> times,
                             std::span<const double> values,
                             const EvenClock& clock);

/// out[i] = the signal at i + shift samples, by the polynomial through the 8 nearest samples
/// (error under 2e-7 of the amplitude from 20 samples a cycle, 1e-9 from 40). Beyond its ends the
/// signal stands still. A whole number of samples is moved without any error. At least 8 samples.
/// Source: Laakso et al., IEEE Signal Process. Mag. 13 (1996) 30 (Lagrange fractional delay).
std::vector<double> shifted(std::span<const double> signal, double shift);

}  // namespace dampwright
