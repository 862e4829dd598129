// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <vector>

#include "core/base/remark.h"
#include "core/measure/measurement.h"
#include "core/rig/damper_card.h"
#include "core/rig/rig_profile.h"
#include "core/trace/trace.h"

namespace dampwright {

/// What a recording can't be, or must not be, by what is known of damper, rig and benches:
/// stroke-beyond-damper (more than the card's open less closed length, with 1 % to spare for the
/// calibration), force-beyond-cell (rows over the cell's capacity) and motion-implausible (over 1 m
/// of stroke or 15 m/s: no damper bench does either, so a unit or the clock is wrong).
std::vector<Remark> rangeRemarks(const Trace& trace,
                                 std::span<const MeasuredBlock> blocks,
                                 const LoadCell& cell,
                                 const std::optional<DamperCard>& card);

}  // namespace dampwright
