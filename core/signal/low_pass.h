// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <span>
#include <variant>
#include <vector>

namespace dampwright {

/// How the design frequency follows from the class: 2.0775 times the class (SAE J211) or 25/12
/// times (ISO 6487).
enum class CfcRule { SaeJ211, Iso6487 };

/// Channel frequency class: −3 dB at 5/3 of the class in Hz, after both passes.
struct CfcClass {
  double number = 60;  ///< 60 | 180 | 600 | 1000, any number > 0 works alike
  CfcRule rule = CfcRule::SaeJ211;
};

/// A Butterworth low-pass by its cutoff.
struct Butterworth {
  double cutoff = 100;  ///< Hz, −3 dB after both passes
};

using LowPass = std::variant<CfcClass, Butterworth>;

/// Hz, −3 dB after both passes: 5/3 of a class (to 2 % where the rate is 10 times the class).
double cutoffOf(const LowPass& filter);

/// y[t] = a0·x[t] + a1·x[t−1] + a2·x[t−2] + b1·y[t−1] + b2·y[t−2].
struct Biquad {
  double a0 = 1, a1 = 0, a2 = 0, b1 = 0, b2 = 0;
};

/// The two-pole Butterworth low-pass of a class at a sample rate [Hz].
/// Needs rate > 4.2 · class number; a sound measurement samples at 10 times the class or more.
/// Source: SAE J211-1 appendix C, ISO 6487 annex A.
Biquad cfcBiquad(const CfcClass& cfc, double rate);

/// The two-pole Butterworth low-pass whose two passes fall to 1/√2 at the cutoff, exactly. Needs
/// rate > 2.6 · cutoff.
Biquad butterworthBiquad(const Butterworth& filter, double rate);

/// One pass, from a state at rest at zero.
std::vector<double> filterForward(const Biquad& filter, std::span<const double> signal);

/// One pass forward, one backward: no phase, four poles. The ends are padded with the signal turned
/// about its end points, `padding` samples long (at most size − 1), and each pass starts settled,
/// so that a constant stays constant to 1e-12 of itself. Source: Gustafsson, IEEE Trans. Signal
/// Process. 44 (1996) 988; padding as in SciPy's sosfiltfilt.
std::vector<double> zeroPhase(const Biquad& filter,
                              std::span<const double> signal,
                              std::size_t padding);

/// The zero-phase low-pass, padded with three periods of its cutoff.
std::vector<double> lowPass(const LowPass& filter, double rate, std::span<const double> signal);

}  // namespace dampwright
