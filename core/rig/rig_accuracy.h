// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>

#include "core/rig/rig_profile.h"

namespace dampwright {

/// What an uncertainty budget needs to know of the rig: the limits of error of its certificate
/// (rectangular law, u = a/√3) and the spread from mounting to mounting. A measurement keeps a
/// copy, so that it can be judged when the profile has changed.
struct RigAccuracy {
  LoadCell loadCell;
  std::optional<double> displacementAccuracy;  ///< m, limit of error
  std::optional<double> clockAccuracyPercent;  ///< %, limit of error
  std::optional<double> remountPercent;        ///< %, standard uncertainty
  std::optional<std::string> lowPass;          ///< filter that was used, as in the profile

  bool operator==(const RigAccuracy&) const = default;
};

inline RigAccuracy accuracyOf(const RigProfile& rig) {
  return {rig.loadCell,
          rig.displacementAccuracy,
          rig.clockAccuracyPercent,
          rig.remountPercent,
          rig.lowPass};
}

}  // namespace dampwright
