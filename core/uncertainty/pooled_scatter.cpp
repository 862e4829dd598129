// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/pooled_scatter.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>

namespace dampwright {
namespace {

constexpr int mostPasses = 50;
constexpr double settled = 1e-9;  // [1] of the variances, from pass to pass
// variances of itself that a component must explain: with 0, noise alone was covered 98 % of the
// time
constexpr double worth = 0.25;

using Pair = std::array<double, 2>;

/// One mean: its excess variance over the noise, and what a² and b² put in.
struct Row {
  Pair factors{};  // 1/n and (F/largest)²/n
  double noise2 = 0, excess = 0, dof = 0;
  double modelled(const Pair& squares) const {
    return noise2 + factors[0] * squares[0] + factors[1] * squares[1];
  }
};

/// a² and b² (of the largest force), and the covariance of both.
struct Excess {
  Pair squares{};
  std::array<Pair, 2> covariance{};
};

double largestForce(std::span<const Scatter> means) {
  double largest = 0;
  for (const Scatter& mean : means) largest = std::max(largest, std::abs(mean.force));
  return largest > 0 ? largest : 1;
}

Row rowOf(const Scatter& mean, double largest) {
  const double share = mean.force / largest, n = std::max(mean.cycles, 1.0);
  Row row;
  row.factors = {1 / n, share * share / n};
  row.noise2 = mean.noiseDof > 0 ? mean.noiseU * mean.noiseU : 0;
  row.excess = mean.u * mean.u - row.noise2;
  row.dof = n - 1;
  return row;
}

/// Weighted sums of the normal equations.
struct Sums {
  double aa = 0, ab = 0, bb = 0, ay = 0, by = 0;
};

Sums sumsOf(std::span<const Row> rows, const Pair& squares) {
  Sums sums;
  for (const Row& row : rows) {
    const double variance = row.modelled(squares);
    const double weight = row.dof / (2 * variance * variance);
    const auto [a, b] = row.factors;
    sums.aa += weight * a * a;
    sums.ab += weight * a * b;
    sums.bb += weight * b * b;
    sums.ay += weight * a * row.excess;
    sums.by += weight * b * row.excess;
  }
  return sums;
}

/// The least squares with both squares >= 0, and each only where it takes more than `worth` off the
/// weighted sum of squares.
Excess solve(const Sums& s) {
  const double gainA = s.ay > 0 ? s.ay * s.ay / s.aa : 0;
  const double gainB = s.by > 0 ? s.by * s.by / s.bb : 0;
  const double determinant = s.aa * s.bb - s.ab * s.ab;
  if (determinant > 1e-9 * s.aa * s.bb) {
    const double a = (s.ay * s.bb - s.by * s.ab) / determinant;
    const double b = (s.by * s.aa - s.ay * s.ab) / determinant;
    const double mixed = -s.ab / determinant;
    const bool both = a * s.ay + b * s.by > std::max(gainA, gainB) + worth;
    if (a > 0 && b > 0 && both) {
      return {{a, b}, {{{s.bb / determinant, mixed}, {mixed, s.aa / determinant}}}};
    }
  }
  if (std::max(gainA, gainB) < worth) return {};
  if (gainA >= gainB) return {{s.ay / s.aa, 0}, {{{1 / s.aa, 0}, {0, 0}}}};
  return {{0, s.by / s.bb}, {{{0, 0}, {0, 1 / s.bb}}}};
}

Excess fitExcess(std::span<const Row> rows) {
  Excess found;
  double mean = 0;
  for (const Row& row : rows) mean += (row.excess + row.noise2) / row.factors[0];
  found.squares[0] = mean / static_cast<double>(rows.size());
  if (!(found.squares[0] > 0)) return {};
  for (int pass = 0; pass < mostPasses; ++pass) {
    const Excess next = solve(sumsOf(rows, found.squares));
    double moved = 0;
    for (const Row& row : rows) {
      const double before = row.modelled(found.squares);
      moved = std::max(moved, std::abs(row.modelled(next.squares) - before) / before);
    }
    found = next;
    const bool lost = std::any_of(rows.begin(), rows.end(), [&](const Row& row) {
      return !(row.modelled(found.squares) > 0);
    });
    if (moved < settled || lost) break;
  }
  return found;
}

TypeA typeAOf(const Row& row, double noiseDof, const Excess& excess) {
  const double variance = row.modelled(excess.squares);
  if (!(variance > 0)) return {};
  const auto [a, b] = row.factors;
  const auto& c = excess.covariance;
  double doubt = a * a * c[0][0] + 2 * a * b * c[0][1] + b * b * c[1][1];
  if (row.noise2 > 0) doubt += 2 * row.noise2 * row.noise2 / noiseDof;
  const double dof =
      doubt > 0 ? 2 * variance * variance / doubt : std::numeric_limits<double>::infinity();
  return {std::sqrt(variance), dof};
}

}  // namespace

std::vector<TypeA> pooledScatter(std::span<const Scatter> means) {
  const double largest = largestForce(means);
  std::vector<Row> telling;
  for (const Scatter& mean : means) {
    const Row row = rowOf(mean, largest);
    if (row.dof > 0 && std::isfinite(row.excess)) telling.push_back(row);
  }
  const Excess excess = telling.empty() ? Excess{} : fitExcess(telling);
  std::vector<TypeA> out;
  for (const Scatter& mean : means)
    out.push_back(typeAOf(rowOf(mean, largest), mean.noiseDof, excess));
  return out;
}

}  // namespace dampwright
