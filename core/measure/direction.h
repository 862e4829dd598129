// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
#include <vector>

#include "core/measure/measurement.h"
#include "core/trace/trace.h"

namespace dampwright {

/// What a measurement says about which sign of its recordings is compression.
enum class DirectionFinding {
  Known,      ///< every recording says it
  AsRead,     ///< the gas force pushes the rod out as it must: the assumption was right
  Turned,     ///< the gas force pulls: compression is the other way
  NotSettled  ///< nothing settles it; compression stays assumed
};

/// Gas settles the direction only if it is determined, its size exceeds 3 standard uncertainties
/// and 30 N, and no recording was zeroed with the damper fitted. Stiffer rebound is never proof.
DirectionFinding findDirection(const Measurement& measurement);

/// The recordings whose direction is not settled turned round: displacement, velocity and force
/// change their signs.
std::vector<Trace> turned(std::span<const Trace> traces);

/// The measurement with its direction marked as settled by the gas (note direction-from-gas) or as
/// assumed (warning direction-assumed).
Measurement withDirection(Measurement measurement, DirectionFinding finding);

}  // namespace dampwright
