// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/column_shape.h"

#include <algorithm>
#include <cmath>
#include <limits>
#include <vector>

namespace dampwright {
namespace {

constexpr std::size_t rowsLookedAt = 100000;  // enough to see cycles, quick on any file

std::span<const double> start(std::span<const double> values) {
  return values.first(std::min(values.size(), rowsLookedAt));
}

std::vector<double> stepsOf(std::span<const double> values) {
  std::vector<double> steps;
  for (std::size_t i = 1; i < values.size(); ++i) {
    const double step = values[i] - values[i - 1];
    if (std::isfinite(step)) steps.push_back(step);
  }
  return steps;
}

// The value below which `share` of the values lie.
double quantile(std::vector<double> values, double share) {
  const auto at = static_cast<std::ptrdiff_t>(share * static_cast<double>(values.size() - 1));
  std::nth_element(values.begin(), values.begin() + at, values.end());
  return values[static_cast<std::size_t>(at)];
}

double meanOf(std::span<const double> values) {
  double sum = 0;
  std::size_t count = 0;
  for (const double value : values) {
    if (!std::isfinite(value)) continue;
    sum += value;
    ++count;
  }
  return count == 0 ? 0 : sum / static_cast<double>(count);
}

}  // namespace

bool isClock(std::span<const double> values) {
  const auto steps = stepsOf(start(values));
  if (steps.size() < 3) return false;
  const auto wrong =
      std::count_if(steps.begin(), steps.end(), [](double step) { return step <= 0; });
  const double median = quantile(steps, 0.5);
  return static_cast<double>(wrong) <= 0.01 * static_cast<double>(steps.size()) && median > 0 &&
         quantile(steps, 0.9) - quantile(steps, 0.1) < 0.5 * median;
}

bool countsRows(std::span<const double> values) {
  values = start(values);
  for (std::size_t i = 1; i < values.size(); ++i) {
    if (values[i] - values[i - 1] != 1 || values[i] != std::floor(values[i])) return false;
  }
  return values.size() > 2;
}

bool isConstant(std::span<const double> values) {
  return std::all_of(values.begin(), values.end(), [&](double value) {
    return !std::isfinite(value) || value == values.front();
  });
}

double roughness(std::span<const double> values) {
  values = start(values);
  double first = 0, second = 0;
  for (std::size_t i = 2; i < values.size(); ++i) {
    const double step = values[i - 1] - values[i - 2];
    const double bend = values[i] - 2 * values[i - 1] + values[i - 2];
    if (!std::isfinite(bend)) continue;
    first += step * step;
    second += bend * bend;
  }
  return first > 0 ? std::sqrt(second / first) : std::numeric_limits<double>::infinity();
}

std::optional<double> slopeFactor(std::span<const double> a, std::span<const double> b) {
  a = start(a);
  b = start(b);
  double aa = 0, ab = 0, bb = 0;
  for (std::size_t i = 1; i + 1 < std::min(a.size(), b.size()); ++i) {
    const double slope = (a[i + 1] - a[i - 1]) / 2;
    if (!std::isfinite(slope) || !std::isfinite(b[i])) continue;
    aa += slope * slope;
    ab += slope * b[i];
    bb += b[i] * b[i];
  }
  if (aa <= 0 || bb <= 0 || ab / std::sqrt(aa * bb) < 0.95) return std::nullopt;
  return ab / aa;
}

std::optional<double> rowsPerCycle(std::span<const double> values) {
  values = start(values);
  const double mean = meanOf(values);
  double swing = 0;
  for (const double value : values) {
    if (std::isfinite(value)) swing = std::max(swing, std::abs(value - mean));
  }
  // A crossing counts once the value has been well below the mean: noise makes no cycles.
  std::vector<double> rows;
  std::size_t last = 0;
  bool below = false, first = true;
  for (std::size_t i = 0; i < values.size(); ++i) {
    if (values[i] < mean - 0.2 * swing) below = true;
    if (!below || !(values[i] > mean + 0.2 * swing)) continue;
    if (!first) rows.push_back(static_cast<double>(i - last));
    last = i;
    first = below = false;
  }
  return rows.empty() ? std::nullopt : std::optional(quantile(std::move(rows), 0.5));
}

double medianStep(std::span<const double> values) {
  auto steps = stepsOf(start(values));
  std::erase(steps, 0.0);
  return steps.empty() ? 0 : quantile(std::move(steps), 0.5);
}

}  // namespace dampwright
