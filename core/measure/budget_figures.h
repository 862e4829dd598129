// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>

#include "core/measure/measurement.h"

namespace dampwright {

/// The measurement with the budget of every figure and with the combined uncertainties that follow
/// (`…TotalU`). Needs blocks, curves, gas, friction and the rig's accuracy in place. Cycle-to-cycle
/// scatter is pooled over the readings above slow speed.
Measurement withBudget(Measurement measurement);

/// Name of a curve point's figure in the budget: "compression force, block 3"; blocks count from 0
/// as in the measurement's own list.
std::string budgetQuantity(Direction direction, std::string_view figure, std::size_t block);

}  // namespace dampwright
