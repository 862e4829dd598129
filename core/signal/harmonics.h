// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
#include <vector>

namespace dampwright {

/// mean + Σ cosine[h−1]·cos(h·ω·t) + sine[h−1]·sin(h·ω·t), ω = 2π/period.
struct Harmonics {
  double period = 1;  ///< unit of the times
  double mean = 0;
  std::vector<double> cosine, sine;
  double rms = 0;  ///< of the residuals about the fit

  int order() const { return static_cast<int>(cosine.size()); }
  double amplitude(int harmonic) const;  ///< harmonic from 1
  double at(double time) const;
  double slopeAt(double time) const;  ///< first derivative
};

/// Least squares on times as they come, even or not; NaN values are left out. `order` falls to what
/// the number of values can carry (a third of them). On an even grid over whole periods this is the
/// discrete Fourier transform; standard error of each coefficient: rms·√(2/count).
Harmonics fitHarmonics(std::span<const double> times,
                       std::span<const double> values,
                       double period,
                       int order);

/// The fit without those harmonics above the first whose amplitude is under `threshold` standard
/// errors, where the residuals hold `samples` independent values.
Harmonics significantPart(Harmonics fit, double samples, double threshold);

}  // namespace dampwright
