// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/resample.h"

#include <algorithm>
#include <array>
#include <cmath>

#include "core/base/expects.h"

namespace dampwright {
namespace {

double cubicThrough(const double* t, const double* y, double at) {
  double sum = 0;
  for (int i = 0; i < 4; ++i) {
    double weight = y[i];
    for (int j = 0; j < 4; ++j)
      if (j != i) weight *= (at - t[j]) / (t[i] - t[j]);
    sum += weight;
  }
  return sum;
}

// Weights of samples −3 … 4 for the place `rest` between samples 0 and 1.
std::array<double, 8> lagrangeWeights(double rest) {
  std::array<double, 8> weights{};
  for (int i = 0; i < 8; ++i) {
    double weight = 1;
    for (int j = 0; j < 8; ++j)
      if (j != i) weight *= (rest + 3 - j) / (i - j);
    weights[static_cast<std::size_t>(i)] = weight;
  }
  return weights;
}

}  // namespace

std::vector<double> resample(std::span<const double> times,
                             std::span<const double> values,
                             const EvenClock& clock) {
  expects(times.size() == values.size() && times.size() >= 4);
  std::vector<double> out(clock.count);
  std::size_t next = 0;  // first time at or behind the wanted one
  for (std::size_t i = 0; i < clock.count; ++i) {
    const double at = clock.start + static_cast<double>(i) / clock.rate;
    while (next < times.size() && times[next] < at) ++next;
    const std::size_t first = std::clamp<std::size_t>(next, 2, times.size() - 2) - 2;
    out[i] = cubicThrough(times.data() + first, values.data() + first, at);
  }
  return out;
}

std::vector<double> shifted(std::span<const double> signal, double shift) {
  const auto size = static_cast<std::ptrdiff_t>(signal.size());
  expects(size >= 8);
  const auto whole = static_cast<std::ptrdiff_t>(std::floor(shift));
  const double rest = shift - static_cast<double>(whole);
  const std::array<double, 8> weights = lagrangeWeights(rest);
  std::vector<double> out(signal.size());
  for (std::ptrdiff_t i = 0; i < size; ++i) {
    const std::ptrdiff_t at = i + whole;
    double sum = 0;
    for (std::ptrdiff_t k = 0; k < 8; ++k) {
      const std::ptrdiff_t from = std::clamp<std::ptrdiff_t>(at + k - 3, 0, size - 1);
      sum += weights[static_cast<std::size_t>(k)] * signal[static_cast<std::size_t>(from)];
    }
    out[static_cast<std::size_t>(i)] = sum;
  }
  return out;
}

}  // namespace dampwright
