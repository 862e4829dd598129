// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/loop_fit.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <optional>

#include "core/signal/local_polynomial.h"

namespace dampwright {
namespace {

constexpr double nan = std::numeric_limits<double>::quiet_NaN();
constexpr std::array<double, 6> windowDegrees = {10, 14, 19, 25, 30, 35};  // to each side
constexpr int degree = 4;
constexpr double fewestSamples = 9;  // in the narrowest window
constexpr double soundSamples = 25;  // from which the residuals tell the noise
constexpr double agreement = 3;      // standard errors of the difference

std::size_t wrapped(std::ptrdiff_t i, std::size_t size) {
  const auto n = static_cast<std::ptrdiff_t>(size);
  return static_cast<std::size_t>(((i % n) + n) % n);
}

// The fit over one window: weights of the grid points about `centre`.
struct Window {
  std::ptrdiff_t centre = 0;
  int half = 0;
  std::vector<double> weights;
  double value = nan;
  double squares = 0;    // Σ weights², times points per independent sample
  double samples = 0;    // independent samples in the window
  double residual2 = 0;  // N², variance of an independent sample about the fit
  double residualDof = 0;

  double valueOf(std::span<const double> force) const {
    double sum = 0;
    for (int k = -half; k <= half; ++k)
      sum += weights[static_cast<std::size_t>(k + half)] * force[wrapped(centre + k, force.size())];
    return sum;
  }
};

// Variance of the samples about the polynomial that the window fits.
double residualVariance(const Window& window, std::span<const double> force) {
  const auto count = 2 * static_cast<std::size_t>(window.half) + 1;
  std::vector<double> cut(count);
  for (std::size_t i = 0; i < count; ++i)
    cut[i] =
        force[wrapped(window.centre + static_cast<std::ptrdiff_t>(i) - window.half, force.size())];
  double sum = 0;
  for (int k = -window.half; k <= window.half; ++k) {
    const std::vector<double> weights = localWeights({window.half, degree, 0}, k);
    double fitted = 0;
    for (std::size_t i = 0; i < count; ++i) fitted += weights[i] * cut[i];
    sum += std::pow(cut[static_cast<std::size_t>(k + window.half)] - fitted, 2);
  }
  const double free = std::max(1.0, window.samples - degree - 1);
  return sum / static_cast<double>(count) * window.samples / free;
}

std::optional<Window> windowAt(const Loop& loop, double place, int half) {
  Window window;
  window.centre = static_cast<std::ptrdiff_t>(std::lround(place));
  window.half = half;
  window.weights = localWeights({half, degree, 0}, place - static_cast<double>(window.centre));
  window.value = window.valueOf(loop.force);
  if (std::isnan(window.value)) return std::nullopt;
  const double points = 2.0 * half + 1;
  window.samples = std::min(points, points * loop.samples / static_cast<double>(loop.size()));
  for (const double weight : window.weights)
    window.squares += weight * weight * points / window.samples;
  return window;
}

// Half widths in grid points, from the narrowest that holds enough samples to the widest that fits.
std::vector<int> halfWidths(const Loop& loop, double place, const GridStretch& inside) {
  const double points = static_cast<double>(loop.size());
  const double room = std::min(place - inside.from, inside.to - place);
  std::vector<int> widths;
  for (const double wide : windowDegrees) {
    const int half = static_cast<int>(wide / 360 * points);
    const bool enough = (2.0 * half + 1) * loop.samples / points >= fewestSamples;
    if (enough && half <= room) widths.push_back(half);
  }
  if (widths.empty()) widths.push_back(std::max(4, static_cast<int>(std::min(room, points / 9))));
  return widths;
}

bool agrees(const Window& wide, const std::vector<Window>& narrower, double noise2) {
  return std::all_of(narrower.begin(), narrower.end(), [&](const Window& narrow) {
    const double variance = noise2 * std::max(0.0, narrow.squares - wide.squares);
    return std::abs(wide.value - narrow.value) <= agreement * std::sqrt(variance);
  });
}

std::optional<Window> bestWindow(const Loop& loop, double place, const GridStretch& inside) {
  std::vector<Window> windows;
  for (const int half : halfWidths(loop, place, inside)) {
    auto window = windowAt(loop, place, half);
    if (!window) break;
    windows.push_back(std::move(*window));
  }
  if (windows.empty()) return std::nullopt;
  const auto telling = std::find_if(windows.begin(), windows.end() - 1, [](const Window& window) {
    return window.samples >= soundSamples;
  });
  const double noise2 = residualVariance(*telling, loop.force);
  const double noiseDof = std::max(1.0, telling->samples - degree - 1);
  std::vector<Window> agreed;
  for (Window& window : windows) {
    if (!agrees(window, agreed, noise2)) break;
    agreed.push_back(std::move(window));
  }
  agreed.back().residual2 = noise2;
  agreed.back().residualDof = noiseDof;
  return agreed.back();
}

LoopFigure withScatter(const Window& window, const std::vector<Loop>& singles) {
  std::vector<double> values;
  for (const Loop& single : singles) {
    const double value = window.valueOf(single.force);
    if (!std::isnan(value)) values.push_back(value);
  }
  const auto n = static_cast<double>(values.size());
  const double noiseU = std::sqrt(window.residual2 * window.squares);
  if (values.size() < 2)
    return {window.value, noiseU, window.residualDof, noiseU, window.residualDof};
  double mean = 0, squares = 0;
  for (const double value : values) mean += value / n;
  for (const double value : values) squares += (value - mean) * (value - mean);
  return {window.value, std::sqrt(squares / (n - 1) / n), n - 1, noiseU, window.residualDof};
}

}  // namespace

double closedValue(std::span<const double> grid, double place, int halfWidth) {
  Window window;
  window.centre = static_cast<std::ptrdiff_t>(std::lround(place));
  window.half = halfWidth;
  window.weights = localWeights({halfWidth, degree, 0}, place - static_cast<double>(window.centre));
  return window.valueOf(grid);
}

LoopFigure forceAtPlace(const Block& block, double place, const GridStretch& inside) {
  const auto window = bestWindow(block.loop, place, inside);
  if (!window) return {nan, nan, 0, nan, 0};
  return withScatter(*window, block.singles);
}

}  // namespace dampwright
