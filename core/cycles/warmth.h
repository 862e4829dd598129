// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "core/base/remark.h"
#include "core/cycles/block.h"

namespace dampwright {

/// Remark not-warm (value: percent) where the force at peak velocity of either direction still
/// moves one way by more than 0.5 % over the last three used cycles, and by more than three
/// standard errors of what noise alone would move it.
std::optional<Remark> notWarm(const Block& block);

}  // namespace dampwright
