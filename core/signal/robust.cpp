// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/robust.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace dampwright {
namespace {

constexpr double normalPerMad = 1.482602218505602;  // 1/Φ⁻¹(3/4)

}  // namespace

double median(std::vector<double> values) {
  if (values.empty()) return std::numeric_limits<double>::quiet_NaN();
  const auto middle = values.begin() + static_cast<std::ptrdiff_t>(values.size() / 2);
  std::nth_element(values.begin(), middle, values.end());
  if (values.size() % 2 == 1) return *middle;
  return (*std::max_element(values.begin(), middle) + *middle) / 2;
}

double robustSpread(std::span<const double> values) {
  const double centre = median({values.begin(), values.end()});
  std::vector<double> distances(values.begin(), values.end());
  for (double& value : distances) value = std::abs(value - centre);
  return normalPerMad * median(std::move(distances));
}

double noiseLevel(std::span<const double> signal) {
  if (signal.size() < 4) return 0;
  const std::size_t stride = 1 + signal.size() / 20000;
  std::vector<double> differences;
  for (std::size_t i = 0; i + 3 < signal.size(); i += stride) {
    const double third = signal[i + 3] - 3 * signal[i + 2] + 3 * signal[i + 1] - signal[i];
    if (!std::isnan(third)) differences.push_back(std::abs(third));
  }
  if (differences.empty()) return 0;
  return normalPerMad * median(std::move(differences)) / std::sqrt(20.0);  // 1 + 9 + 9 + 1
}

double smallestStep(std::span<const double> signal) {
  std::vector<double> steps;
  for (std::size_t i = 1; i < signal.size(); i += 1 + signal.size() / 50000)
    if (signal[i] != signal[i - 1]) steps.push_back(std::abs(signal[i] - signal[i - 1]));
  if (steps.empty()) return 0;
  const auto low = steps.begin() + static_cast<std::ptrdiff_t>(steps.size() / 100);
  std::nth_element(steps.begin(), low, steps.end());
  return *low;
}

}  // namespace dampwright
