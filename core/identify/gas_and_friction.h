// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>

#include "core/curves/read_block.h"
#include "core/cycles/block.h"
#include "core/identify/gas.h"
#include "core/rig/rig_profile.h"

namespace dampwright {

/// A block with what was read from it.
struct BlockToIdentify {
  const Block* block = nullptr;  ///< never null
  BlockReading reading;          ///< of a hold: not read
};

struct IdentifyOptions {
  ZeroState zeroState = ZeroState::Unknown;  ///< DamperFitted hides the gas force
  double slowSpeed = 0.00525;                ///< m/s, 5 mm/s with 5 % to spare
  double gasExponent = 1.2;                  ///< n
};

struct GasAndFriction {
  Gas gas;
  Friction friction;
};

/// Gas and dry friction, the limits of force for speed → 0.
///
/// From the slowest block up to `slowSpeed` that is no triangle, see fitSlowBlock. The gas comes
/// from it or from a hold, whichever has the smaller standard uncertainty: a hold's force is moved
/// along the column to the slow block's mid-stroke; its uncertainty holds ±Fc as limits (without a
/// slow block: ± half the force difference of the slowest block, which dry friction does not
/// exceed). Of several holds the one nearest to
/// mid-stroke. The half difference at the slowest block's peak speed stands beside the dry
/// friction, gas taken off where its two readings stand; a slow triangle gives only that.
///
/// Reasons where a figure is not determined: no-slow-block-or-hold, no-slow-block,
/// slow-triangle-only, slow-block-not-fitted, zeroed-with-damper (the gas rate is still given).
GasAndFriction identifyGasAndFriction(std::span<const BlockToIdentify> blocks,
                                      const IdentifyOptions& options = {});

}  // namespace dampwright
