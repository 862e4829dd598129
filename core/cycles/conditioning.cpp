// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/conditioning.h"

#include <algorithm>

namespace dampwright {

bool isSlow(double speed, const CycleOptions& options) {
  return speed <= 1.05 * options.slowSpeed;  // a rig set to 5 mm/s runs at 5 mm/s and a little
}

Conditioning conditioningOf(const CycleGroup& group,
                            const BlockPlace& place,
                            const CycleOptions& options) {
  const int third = static_cast<int>(group.cycles.size() / 3);
  Conditioning conditioning;
  if (isSlow(place.speed, options)) return conditioning;
  conditioning.wanted =
      place.firstFast ? options.firstBlockConditioning : options.laterBlockConditioning;
  conditioning.leftOut = std::min(std::max(conditioning.wanted, group.settling), third);
  return conditioning;
}

}  // namespace dampwright
