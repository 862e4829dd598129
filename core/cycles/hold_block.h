// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "core/condition/motion.h"
#include "core/cycles/block.h"
#include "core/cycles/standstill.h"

namespace dampwright {

/// A standstill as a block of kind Hold: where it stands, its mean force and temperature. The first
/// and the last quarter are left out (the force settles, the rig starts). The standard
/// uncertainty comes from the means of eight parts, so that slow wander counts. Nothing where fewer
/// than 16 sound samples are left.
std::optional<Block> holdBlock(const Motion& motion, const Standstill& still);

}  // namespace dampwright
