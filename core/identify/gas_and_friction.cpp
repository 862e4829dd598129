// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/identify/gas_and_friction.h"

#include <algorithm>
#include <cmath>
#include <limits>

#include "core/identify/slow_block.h"

namespace dampwright {
namespace {

constexpr double infinite = std::numeric_limits<double>::infinity();

constexpr double midStroke = 0.1;  // [1] of the stroke: farther away a standstill is a rig at rest

using Blocks = std::span<const BlockToIdentify>;

bool isHold(const BlockToIdentify& item) { return item.block->kind == BlockKind::Hold; }

bool isTriangle(const BlockToIdentify& item) { return item.block->kind == BlockKind::Triangle; }

double speedOf(const BlockToIdentify& item) {
  return std::max(item.reading.compression.peakVelocity, item.reading.rebound.peakVelocity);
}

bool isRead(const BlockToIdentify& item) {
  return !isHold(item) && item.reading.compression.isRead() && item.reading.rebound.isRead() &&
         speedOf(item) > 0;
}

/// The slowest readable block of those that `wanted` accepts; null where there is none.
template <class Wanted>
const BlockToIdentify* slowest(Blocks blocks, Wanted wanted) {
  const BlockToIdentify* found = nullptr;
  for (const BlockToIdentify& item : blocks) {
    if (!isRead(item) || !wanted(item)) continue;
    if (found == nullptr || speedOf(item) < speedOf(*found)) found = &item;
  }
  return found;
}

const BlockToIdentify* nearestHold(Blocks blocks, double place) {
  const BlockToIdentify* found = nullptr;
  for (const BlockToIdentify& item : blocks) {
    if (!isHold(item) || !std::isfinite(item.block->holdForce)) continue;
    const double distance = std::abs(item.block->mid - place);
    if (found == nullptr || distance < std::abs(found->block->mid - place)) found = &item;
  }
  return found;
}

bool isAtMidStroke(const Block& hold, const Block& slow) {
  return std::abs(hold.mid - slow.mid) <= midStroke * slow.stroke;
}

double meanMid(Blocks blocks) {
  double sum = 0;
  int count = 0;
  for (const BlockToIdentify& item : blocks) {
    if (isHold(item)) continue;
    sum += item.block->mid;
    ++count;
  }
  return count > 0 ? sum / count : 0;
}

double halfDifference(const BlockToIdentify& item, const Gas& gas) {
  const auto gasAt = [&](const Reading& reading) {
    return gas.at(item.block->mid + reading.displacement);
  };
  const Reading& in = item.reading.compression;
  const Reading& out = item.reading.rebound;
  return 0.5 * ((in.force - gasAt(in)) + (out.force + gasAt(out)));
}

void setHalfDifference(Friction& friction, const BlockToIdentify& item, const Gas& gas) {
  const Reading& in = item.reading.compression;
  const Reading& out = item.reading.rebound;
  friction.halfDifference = halfDifference(item, gas);
  friction.atVelocity = 0.5 * (in.peakVelocity + out.peakVelocity);
  const double inSquare = in.forceU * in.forceU;
  const double outSquare = out.forceU * out.forceU;
  friction.halfDifferenceU = 0.5 * std::sqrt(inSquare + outSquare);
  const double fourths = inSquare * inSquare / std::max(in.forceDof, 1.0) +
                         outSquare * outSquare / std::max(out.forceDof, 1.0);
  const double square = inSquare + outSquare;
  friction.halfDifferenceDof = fourths > 0 ? square * square / fourths : infinite;
}

/// Gas of a slow block's fit; the force only where the cell's zero does not hide it.
Gas gasOf(const SlowBlockFit& fit, const Block& block, ZeroState zeroState) {
  Gas gas;
  gas.mid = block.mid;
  gas.temperature = block.temperature;
  gas.exponent = fit.gas.exponent;
  if (std::isfinite(fit.rateU)) {
    gas.rate = fit.rate;
    gas.rateU = fit.rateU;
  }
  gas.method = "slow block";
  if (zeroState == ZeroState::DamperFitted) return gas;
  gas.force = fit.gas.force;
  gas.forceU = fit.gasU;
  gas.forceDof = fit.dof;
  gas.columnLength = fit.gas.inverseLength == 0 ? 0 : 1 / fit.gas.inverseLength;
  return gas;
}

/// The hold's force in place of the slow block's, moved along its column to the same place.
/// `limit` is what the hold's friction may add or take away.
Gas gasOfHold(const Gas& slow, const Block& hold, double limit) {
  Gas gas = slow;
  if (slow.method.empty()) gas.mid = hold.mid;
  const double ratio = slow.force && *slow.force != 0 ? slow.at(hold.mid) / *slow.force : 1;
  gas.force = hold.holdForce / ratio;
  gas.forceU = std::hypot(hold.holdForceU, limit / std::sqrt(3.0)) / ratio;
  gas.forceDof = infinite;
  gas.temperature = hold.temperature ? hold.temperature : slow.temperature;
  gas.method = "hold";
  gas.reason.clear();
  return gas;
}

void setDryFriction(Friction& friction, const SlowBlockFit& fit) {
  friction.dry = fit.friction.force;
  friction.dryU = fit.dryU;
  friction.dryDof = fit.dof;
  friction.method = "slow block";
  friction.reason.clear();
}

}  // namespace

GasAndFriction identifyGasAndFriction(Blocks blocks, const IdentifyOptions& options) {
  GasAndFriction out;
  Gas& gas = out.gas;
  Friction& friction = out.friction;
  gas.exponent = options.gasExponent;
  const bool hidden = options.zeroState == ZeroState::DamperFitted;
  const auto isSlow = [&](const BlockToIdentify& item) {
    return speedOf(item) <= options.slowSpeed;
  };
  const BlockToIdentify* slow = slowest(
      blocks, [&](const BlockToIdentify& item) { return isSlow(item) && !isTriangle(item); });
  const BlockToIdentify* anySlow = slow != nullptr ? slow : slowest(blocks, isSlow);

  gas.reason = "no-slow-block-or-hold";
  friction.reason = anySlow != nullptr ? "slow-triangle-only" : "no-slow-block";
  if (slow != nullptr) {
    const GasShape shape = hidden ? GasShape::Line : GasShape::Column;
    const SlowBlockFit fit = fitSlowBlock(*slow->block, shape, options.gasExponent);
    if (fit.usable()) {
      gas = gasOf(fit, *slow->block, options.zeroState);
      setDryFriction(friction, fit);
    } else {
      gas.reason = "slow-block-not-fitted";
      friction.reason = "slow-block-not-fitted";
    }
  }
  const double place = slow != nullptr ? slow->block->mid : meanMid(blocks);
  const BlockToIdentify* hold = nearestHold(blocks, place);
  if (slow != nullptr && hold != nullptr && !isAtMidStroke(*hold->block, *slow->block)) {
    hold = nullptr;
  }
  const BlockToIdentify* least = slowest(blocks, [](const BlockToIdentify&) { return true; });
  if (hold != nullptr && !hidden) {
    const double difference = least != nullptr ? std::abs(halfDifference(*least, gas)) : 0;
    const Gas held = gasOfHold(gas, *hold->block, friction.dry.value_or(difference));
    if (!gas.force || !(gas.forceU <= held.forceU)) gas = held;
  }
  if (hidden) gas.reason = "zeroed-with-damper";
  if (anySlow != nullptr) setHalfDifference(friction, *anySlow, gas);
  return out;
}

}  // namespace dampwright
