// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/hold_block.h"

#include <array>
#include <cmath>

namespace dampwright {
namespace {

constexpr std::size_t parts = 8;

struct Mean {
  double sum = 0, count = 0;
  void add(double value) {
    sum += value;
    count += 1;
  }
  double value() const { return sum / count; }
};

}  // namespace

std::optional<Block> holdBlock(const Motion& motion, const Standstill& still) {
  const std::size_t from = still.from + still.size() / 4, to = still.to - still.size() / 4;
  Mean place, force, temperature;
  std::array<Mean, parts> partForces;
  for (std::size_t i = from; i < to; ++i) {
    if (motion.doubtful[i] != 0) continue;
    place.add(motion.displacement[i]);
    force.add(motion.force[i]);
    partForces[(i - from) * parts / (to - from)].add(motion.force[i]);
    if (!motion.temperature.empty()) temperature.add(motion.temperature[i]);
  }
  if (force.count < 16) return std::nullopt;
  Mean squares;
  for (const Mean& part : partForces)
    if (part.count > 0) squares.add(std::pow(part.value() - force.value(), 2));
  Block block;
  block.kind = BlockKind::Hold;
  block.start = motion.timeOf(still.from);
  block.end = motion.timeOf(still.to - 1);
  block.mid = place.value();
  block.holdForce = force.value();
  if (squares.count > 1) block.holdForceU = std::sqrt(squares.value() / (squares.count - 1));
  if (temperature.count > 0) block.temperature = temperature.value();
  return block;
}

}  // namespace dampwright
