// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/uniform_spline.h"

#include <algorithm>
#include <cmath>

#include "core/base/expects.h"

namespace dampwright {
namespace {

const double pole = std::sqrt(3.0) - 2;

// B-spline coefficients of the mirrored signal, one pass forward, one backward.
std::vector<double> coefficientsOf(std::span<const double> signal) {
  const std::size_t n = signal.size();
  std::vector<double> c(n + 3);
  const std::size_t around = 2 * n - 2;  // samples until the mirrored signal comes back
  double power = 1, start = 0;
  for (std::size_t k = 0; k < 30; ++k, power *= pole) {  // pole^30 is under 1e-17
    const std::size_t there = k % around;
    start += 6 * power * signal[there < n ? there : around - there];
  }
  c[1] = start;
  for (std::size_t k = 1; k < n; ++k) c[k + 1] = 6 * signal[k] + pole * c[k];
  c[n] = pole / (pole * pole - 1) * (c[n] + pole * c[n - 1]);
  for (std::size_t k = n - 1; k > 0; --k) c[k] = pole * (c[k + 1] - c[k]);
  c[0] = c[2];
  c[n + 1] = c[n - 1];
  c[n + 2] = c[n - 2];
  return c;
}

struct Knot {
  std::size_t index;
  double rest;  // 0 to 1
};

Knot knotOf(double place, std::size_t size) {
  const double inside = std::clamp(place, 0.0, static_cast<double>(size - 1));
  const auto index = std::min(static_cast<std::size_t>(inside), size - 2);
  return {index, inside - static_cast<double>(index)};
}

}  // namespace

UniformSpline::UniformSpline(std::span<const double> signal) {
  expects(signal.size() >= 4);
  coefficients_ = coefficientsOf(signal);
  integrals_.resize(signal.size());
  const double* c = coefficients_.data();
  for (std::size_t i = 0; i + 1 < signal.size(); ++i, ++c)
    integrals_[i + 1] = integrals_[i] + (c[0] + 11 * (c[1] + c[2]) + c[3]) / 24;
}

double UniformSpline::at(double place) const {
  const auto [index, f] = knotOf(place, integrals_.size());
  const double* c = coefficients_.data() + index;
  const double g = 1 - f;
  return (c[0] * g * g * g + c[1] * (4 - 6 * f * f + 3 * f * f * f) +
          c[2] * (4 - 6 * g * g + 3 * g * g * g) + c[3] * f * f * f) /
         6;
}

double UniformSpline::integralTo(double place) const {
  const auto [index, f] = knotOf(place, integrals_.size());
  const double* c = coefficients_.data() + index;
  const double g = 1 - f, f2 = f * f, f3 = f2 * f, f4 = f2 * f2;
  return integrals_[index] + (c[0] * (1 - g * g * g * g) + c[1] * (16 * f - 8 * f3 + 3 * f4) +
                              c[2] * (4 * f + 6 * f2 + 4 * f3 - 3 * f4) + c[3] * f4) /
                                 24;
}

double UniformSpline::meanOver(double from, double to) const {
  const double last = static_cast<double>(integrals_.size() - 1);
  const double a = std::clamp(from, 0.0, last), b = std::clamp(to, 0.0, last);
  if (b - a < 1e-6) return at((a + b) / 2);
  return (integralTo(b) - integralTo(a)) / (b - a);
}

}  // namespace dampwright
