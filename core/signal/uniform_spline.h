// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
#include <vector>

namespace dampwright {

/// The cubic spline through the samples of an even signal, mirrored at its ends. Places are counted
/// in samples, 0 to size − 1, and clamped to that range. A sine of N samples a cycle is met to
/// (2π/N)⁴/384 of its amplitude: 1.6e-6 at 40 samples a cycle.
/// Source: Unser, Aldroubi & Eden, IEEE Trans. Signal Process. 41 (1993) 821.
class UniformSpline {
 public:
  /// Needs at least 4 samples, all finite.
  explicit UniformSpline(std::span<const double> signal);

  double at(double place) const;

  /// Mean over the stretch [from, to], from < to: the integral of the spline over its length. To
  /// about 1e-12 of the signal's size times the number of samples, over the length.
  double meanOver(double from, double to) const;

 private:
  double integralTo(double place) const;

  std::vector<double> coefficients_;  // one more before, two more behind
  std::vector<double> integrals_;     // from the first sample to each sample
};

}  // namespace dampwright
