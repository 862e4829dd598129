// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/loop_numbers.h"

#include <cmath>
#include <complex>
#include <span>
#include <vector>

#include "core/base/units.h"
#include "core/curves/loop_fit.h"

namespace dampwright {
namespace {

// dx of each grid point: derivative times the grid step.
// Source: eighth-order central difference, Fornberg, Math. Comput. 51 (1988) 699, table 1.
std::vector<double> differentials(std::span<const double> x) {
  constexpr double weights[4] = {4.0 / 5, -1.0 / 5, 4.0 / 105, -1.0 / 280};
  const std::size_t n = x.size();
  std::vector<double> dx(n);
  for (std::size_t i = 0; i < n; ++i)
    for (std::size_t k = 1; k <= 4; ++k)
      dx[i] += weights[k - 1] * (x[(i + k) % n] - x[(i + n - k) % n]);
  return dx;
}

std::complex<double> firstHarmonic(std::span<const double> values) {
  std::complex<double> sum = 0;
  const double step = 2 * pi / static_cast<double>(values.size());
  for (std::size_t i = 0; i < values.size(); ++i)
    sum += values[i] * std::polar(1.0, -step * static_cast<double>(i));
  return sum;
}

double sumOfSquares(std::span<const double> values) {
  double sum = 0;
  for (const double value : values) sum += value * value;
  return sum;
}

// ∮v dx = Σ dx²·N/T. Noise has no part in products of two different cycles.
double speedIntegralOf(const Block& block, std::span<const double> dx) {
  const double scale = static_cast<double>(dx.size()) / block.loop.period;
  if (block.kind != BlockKind::Triangle) return sumOfSquares(block.loop.velocity) / scale;
  const auto n = static_cast<double>(block.singles.size());
  if (block.singles.size() < 2) return sumOfSquares(dx) * scale;
  double alone = 0;
  for (const Loop& single : block.singles)
    alone += sumOfSquares(differentials(single.displacement));
  return (n * n * sumOfSquares(dx) - alone) / (n * (n - 1)) * scale;
}

}  // namespace

LoopNumbers loopNumbers(const Block& block) {
  const Loop& loop = block.loop;
  const std::vector<double> dx = differentials(loop.displacement);
  const double points = static_cast<double>(loop.size());
  LoopNumbers numbers;
  for (std::size_t i = 0; i < loop.size(); ++i) {
    const bool in = static_cast<double>(i) < loop.top * points;
    (in ? numbers.compressionEnergy : numbers.reboundEnergy) += loop.force[i] * dx[i];
  }
  numbers.speedIntegral = speedIntegralOf(block, dx);
  numbers.phaseLag = std::arg(firstHarmonic(loop.velocity) / firstHarmonic(loop.force));
  const int reach = static_cast<int>(points / 90);  // 4 degrees
  numbers.endForces = {closedValue(loop.force, loop.top * points, reach),
                       closedValue(loop.force, 0, reach)};
  return numbers;
}

}  // namespace dampwright
