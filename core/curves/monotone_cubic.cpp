// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/monotone_cubic.h"

#include <algorithm>
#include <cmath>

#include "core/base/expects.h"

namespace dampwright {
namespace {

bool sameSign(double a, double b) { return (a > 0 && b > 0) || (a < 0 && b < 0); }

double endSlope(double h0, double h1, double secant0, double secant1) {
  const double slope = ((2 * h0 + h1) * secant0 - h0 * secant1) / (h0 + h1);
  if (!sameSign(slope, secant0)) return 0;
  if (!sameSign(secant0, secant1) && std::abs(slope) > 3 * std::abs(secant0)) return 3 * secant0;
  return slope;
}

std::vector<double> slopesOf(const std::vector<double>& x, const std::vector<double>& y) {
  const std::size_t n = x.size();
  std::vector<double> h(n - 1), secant(n - 1);
  for (std::size_t i = 0; i + 1 < n; ++i) {
    h[i] = x[i + 1] - x[i];
    secant[i] = (y[i + 1] - y[i]) / h[i];
  }
  if (n == 2) return {secant[0], secant[0]};
  std::vector<double> slopes(n);
  for (std::size_t i = 1; i + 1 < n; ++i) {
    if (!sameSign(secant[i - 1], secant[i])) continue;
    const double before = 2 * h[i] + h[i - 1], after = h[i] + 2 * h[i - 1];
    slopes[i] = (before + after) / (before / secant[i - 1] + after / secant[i]);
  }
  slopes[0] = endSlope(h[0], h[1], secant[0], secant[1]);
  slopes[n - 1] = endSlope(h[n - 2], h[n - 3], secant[n - 2], secant[n - 3]);
  return slopes;
}

}  // namespace

MonotoneCubic::MonotoneCubic(std::vector<double> x, std::vector<double> y)
    : x_(std::move(x)), y_(std::move(y)) {
  expects(x_.size() >= 2 && x_.size() == y_.size());
  slopes_ = slopesOf(x_, y_);
}

std::size_t MonotoneCubic::piece(double x) const {
  const auto above = std::upper_bound(x_.begin() + 1, x_.end() - 1, x);
  return static_cast<std::size_t>(above - x_.begin()) - 1;
}

double MonotoneCubic::at(double x) const {
  const std::size_t i = piece(x);
  const double h = x_[i + 1] - x_[i], t = (x - x_[i]) / h;
  const double rise = y_[i + 1] - y_[i];
  return y_[i] + t * t * (3 - 2 * t) * rise +
         h * t * (1 - t) * ((1 - t) * slopes_[i] - t * slopes_[i + 1]);
}

double MonotoneCubic::slopeAt(double x) const {
  const std::size_t i = piece(x);
  const double h = x_[i + 1] - x_[i], t = (x - x_[i]) / h;
  return 6 * t * (1 - t) * (y_[i + 1] - y_[i]) / h + (1 - t) * (1 - 3 * t) * slopes_[i] +
         t * (3 * t - 2) * slopes_[i + 1];
}

double MonotoneCubic::straightAt(double x) const {
  const std::size_t i = piece(x);
  return y_[i] + (x - x_[i]) * (y_[i + 1] - y_[i]) / (x_[i + 1] - x_[i]);
}

}  // namespace dampwright
