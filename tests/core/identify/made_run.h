// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cmath>
#include <deque>
#include <functional>
#include <random>
#include <vector>

#include "core/base/units.h"
#include "core/identify/gas_and_friction.h"

namespace dampwright::test {

/// F(x, v) of a made damper on the rig's scale, signed, N.
using MadeForce = std::function<double(double x, double v)>;

struct MadeBlock {
  BlockKind kind = BlockKind::Sine;
  double amplitude = 0.025;  ///< m
  double peakSpeed = 0.005;  ///< m/s
  double mid = 0;            ///< m, rig scale
  double noise = 0;          ///< N rms on each point of the averaged loop, mt19937
  unsigned seed = 1;
};

/// Blocks in closed form, x = mid − a·cos ωt on 720 points: no integration, nothing of core but its
/// structs. Readings are those of the noise-free loop.
class MadeRun {
 public:
  void add(const MadeForce& force, const MadeBlock& made = {}) {
    constexpr int points = 720;
    Block& block = blocks_.emplace_back();
    std::mt19937 random(made.seed);
    std::normal_distribution<double> scatter(0, 1);
    block.kind = made.kind;
    block.stroke = 2 * made.amplitude;
    block.mid = made.mid;
    for (int i = 0; i < points; ++i) {
      const double phase = 2 * pi * i / points;
      const double x = -made.amplitude * std::cos(phase);
      const double v = made.peakSpeed * std::sin(phase);
      block.loop.displacement.push_back(x);
      block.loop.velocity.push_back(v);
      block.loop.force.push_back(force(made.mid + x, v) + made.noise * scatter(random));
    }
    BlockToIdentify item{&block, {}};
    item.reading.compression.peakVelocity = made.peakSpeed;
    item.reading.compression.force = force(made.mid, made.peakSpeed);
    item.reading.rebound.peakVelocity = made.peakSpeed;
    item.reading.rebound.force = -force(made.mid, -made.peakSpeed);
    items_.push_back(item);
  }

  void addHold(double place, double force, double u) {
    Block& block = blocks_.emplace_back();
    block.kind = BlockKind::Hold;
    block.mid = place;
    block.holdForce = force;
    block.holdForceU = u;
    items_.push_back({&block, {}});
  }

  const Block& block(std::size_t index) const { return blocks_[index]; }
  const std::vector<BlockToIdentify>& items() const { return items_; }

 private:
  std::deque<Block> blocks_;  // a deque: places stay
  std::vector<BlockToIdentify> items_;
};

}  // namespace dampwright::test
