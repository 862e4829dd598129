// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <vector>

#include "core/condition/motion.h"

namespace dampwright {

/// Samples [from, to) over which the rig stands still.
struct Standstill {
  std::size_t from = 0, to = 0;

  std::size_t size() const { return to - from; }
};

/// Stretches of at least `holdTime` seconds whose displacement stays within its own noise (ten
/// noise levels, or 0.1 % of the recording's range where there is less noise) and is flat: the slow
/// turn of a slow cycle bulges and is none.
std::vector<Standstill> findStandstills(const Motion& motion, double holdTime);

}  // namespace dampwright
