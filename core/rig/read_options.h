// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <optional>
#include <string>

#include "core/base/direction.h"
#include "core/rig/rig_profile.h"

namespace dampwright {

/// Answers that the technician or the command line gives of one file; each settles one open point
/// and beats all evidence and the rig profile.
struct ReadOptions {
  std::optional<std::string> encoding, delimiter, decimal;
  std::optional<std::int64_t> headerRow;  ///< line from 1
  std::optional<std::string> time, displacement, force, velocity,
      temperature;  ///< column name or number from 1
  std::optional<std::string> timeUnit, displacementUnit, forceUnit, velocityUnit, temperatureUnit;
  std::optional<double> sampleRate;  ///< Hz
  std::optional<Direction> displacementPositive, forcePositive;
  std::optional<ZeroState> zeroState;

  bool operator==(const ReadOptions&) const = default;
};

}  // namespace dampwright
