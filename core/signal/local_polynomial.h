// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
#include <vector>

namespace dampwright {

/// A polynomial fitted by least squares to 2·halfWidth + 1 neighbouring samples.
struct LocalPolynomial {
  int halfWidth = 2;   ///< samples, 2·halfWidth >= degree
  int degree = 4;      ///< >= derivative
  int derivative = 0;  ///< which derivative is read, 0 the value itself
};

/// Weights whose sum with the samples gives the value or derivative at `at` samples from the middle
/// of the window, in units of one sample step. Exact for polynomials up to the degree.
/// Source: Savitzky & Golay, Anal. Chem. 36 (1964) 1627, as corrected by Steinier et al. 44 (1972)
/// 1906; off the middle: Gorry, Anal. Chem. 62 (1990) 570.
std::vector<double> localWeights(const LocalPolynomial& fit, double at = 0);

/// The local polynomial at every sample of an even signal. The first and last halfWidth samples are
/// read off the polynomial of the first and last full window. Needs at least one window of samples.
/// @param rate  [Hz] of the samples; the result is per second to the power of the derivative
std::vector<double> applyLocal(const LocalPolynomial& fit,
                               std::span<const double> signal,
                               double rate);

/// Share by which the first derivative of a sine of `angle` [rad] a sample is too small.
/// Degree 4, halfWidth·angle <= 0.45: under 1e-4.
double derivativeLoss(const LocalPolynomial& fit, double angle);

/// The smoothing derivative for a motion whose fastest part turns by `angle` [rad] a sample: degree
/// 4, the widest window (at most 25 samples to each side) that loses less than `loss` of it. At 40
/// samples a cycle 5 points are left, whose loss is 2e-5.
LocalPolynomial derivativeFor(double angle, double loss = 2.5e-5);

}  // namespace dampwright
