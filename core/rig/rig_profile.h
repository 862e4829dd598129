// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <vector>

#include "core/base/direction.h"

namespace dampwright {

/// What the force channel was zeroed on. With the damper fitted the gas force is hidden, only its
/// rate shows.
enum class ZeroState { Unknown, NoSpecimen, DamperFitted };

/// How one channel stands in this rig's files. `name` or `number` finds the column.
struct RigColumn {
  std::string name;           ///< header text as in the file, may be empty
  std::optional<int> number;  ///< column counted from 1, where there is no name
  std::string unit;           ///< symbol as in core/base/units.h, may be empty
  double scale = 1;           ///< [1] SI value = unit.toSi(raw · scale + offset)
  double offset = 0;          ///< [unit of the column]

  bool operator==(const RigColumn&) const = default;
};

/// The limits of error that the cell's certificate states; rectangular law, u = a/√3.
struct LoadCell {
  std::optional<double> capacity;         ///< N
  std::optional<double> readingPercent;   ///< % of reading
  std::optional<double> capacityPercent;  ///< % of capacity
  std::optional<double> zeroDrift;        ///< N
  std::string calibrated;                 ///< ISO 8601 date, may be empty
  std::string due;                        ///< ISO 8601 date, may be empty

  bool operator==(const LoadCell&) const = default;
};

/// All that is known of one rig and of the files that it writes. Everything is optional.
struct RigProfile {
  std::string name;
  std::string signature;  ///< of the file layout, see core/intake/signature.h; empty: matches
                          ///< nothing by itself
  std::optional<std::string> encoding, delimiter, decimal,
      thousands;  ///< as spelled in formats of the handbook
  std::optional<RigColumn> time, displacement, force, velocity, temperature;
  std::optional<double> sampleRate;  ///< Hz
  std::optional<Direction>
      displacementPositive;  ///< which way a rising displacement moves the damper
  std::optional<Direction>
      forcePositive;  ///< the stroke in which the file's damping force is positive
  ZeroState zeroState = ZeroState::Unknown;
  double forceDelay = 0;               ///< s, force lags displacement by this much
  double forceDelayU = 0;              ///< s, standard uncertainty
  double movingMass = 0;               ///< kg between cell and damper, 0: cell on the fixed end
  std::optional<std::string> lowPass;  ///< "CFC 60" …, nothing: no filter
  LoadCell loadCell;
  std::optional<double> displacementAccuracy;  ///< m, limit of error
  std::optional<double> clockAccuracyPercent;  ///< %, limit of error
  std::optional<double> remountPercent;  ///< %, standard uncertainty from mounting to mounting

  bool operator==(const RigProfile&) const = default;
};

}  // namespace dampwright
