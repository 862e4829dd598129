// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/branches.h"

#include <Eigen/Dense>
#include <algorithm>
#include <cmath>
#include <limits>

namespace dampwright {
namespace {

constexpr double nan = std::numeric_limits<double>::quiet_NaN();
constexpr int gridFrom = 2, gridTo = 18;  // twentieths of the peak speed
constexpr double gridReach = 0.1;         // of the peak speed
constexpr double zeroFrom = 0.08, zeroTo = 0.4;
constexpr double halfReach = 0.15;
constexpr std::size_t fewest = 5;  // points of a branch under a quadratic

/// Points of one branch: speed over the peak, force along the direction without gas.
struct Branch {
  std::vector<double> speeds, forces;
};

struct Half {
  double peak = 0;  ///< m/s
  Branch accelerating, decelerating;
};

Half halfOf(const Block& block, Direction direction, const GasOverStroke& gas) {
  const Loop& loop = block.loop;
  const double sign = signOf(direction);
  const auto top = static_cast<std::size_t>(std::ceil(loop.top * static_cast<double>(loop.size())));
  const std::size_t from = direction == Direction::Compression ? 0 : top;
  const std::size_t to = direction == Direction::Compression ? top : loop.size();
  Half half;
  std::size_t fastest = from;
  for (std::size_t i = from; i < to; ++i)
    if (sign * loop.velocity[i] > sign * loop.velocity[fastest]) fastest = i;
  half.peak = sign * loop.velocity[fastest];
  for (std::size_t i = from; i < to; ++i) {
    Branch& branch = i < fastest ? half.accelerating : half.decelerating;
    branch.speeds.push_back(sign * loop.velocity[i] / half.peak);
    branch.forces.push_back(sign * (loop.force[i] - gas(loop.displacement[i])));
  }
  return half;
}

/// The quadratic through the points with speeds in [low, high], read at a speed. NaN where they
/// are few or bunched, or one of them is hidden.
double quadraticAt(const Branch& branch, double low, double high, double at) {
  Eigen::Matrix3d square = Eigen::Matrix3d::Zero();
  Eigen::Vector3d right = Eigen::Vector3d::Zero();
  std::size_t count = 0;
  double least = high, most = low;
  for (std::size_t i = 0; i < branch.speeds.size(); ++i) {
    const double speed = branch.speeds[i];
    if (speed < low || speed > high) continue;
    const double s = (speed - at) / (high - low);
    const Eigen::Vector3d row(1, s, s * s);
    square += row * row.transpose();
    right += branch.forces[i] * row;
    least = std::min(least, speed);
    most = std::max(most, speed);
    ++count;
  }
  if (count < fewest || most - least < 0.6 * (high - low)) return nan;
  return square.ldlt().solve(right)[0];
}

double widthAt(const Half& half, double low, double high, double at) {
  return quadraticAt(half.decelerating, low, high, at) -
         quadraticAt(half.accelerating, low, high, at);
}

}  // namespace

std::vector<BranchPoint> branchesOf(const Block& block,
                                    Direction direction,
                                    const GasOverStroke& gas) {
  std::vector<BranchPoint> points;
  if (block.loop.size() == 0) return points;
  const Half half = halfOf(block, direction, gas);
  for (int k = gridFrom; k <= gridTo; ++k) {
    const double at = k / 20.0;
    const double reach = std::min(gridReach, (1 - at) / 2);  // the branches turn steep at the peak
    const BranchPoint point{at * half.peak,
                            quadraticAt(half.accelerating, at - reach, at + reach, at),
                            quadraticAt(half.decelerating, at - reach, at + reach, at)};
    if (std::isfinite(point.width())) points.push_back(point);
  }
  return points;
}

LoopWidths loopWidths(const Block& block, const GasOverStroke& gas) {
  if (block.loop.size() == 0 || block.kind == BlockKind::Triangle) return {nan, nan};
  LoopWidths widths;
  for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
    const Half half = halfOf(block, direction, gas);
    widths.atZero += widthAt(half, zeroFrom, zeroTo, 0) / 2;
    widths.atHalfSpeed += widthAt(half, 0.5 - halfReach, 0.5 + halfReach, 0.5) / 2;
  }
  return widths;
}

}  // namespace dampwright
