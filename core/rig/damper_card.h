// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <vector>

namespace dampwright {

struct Adjuster {
  std::string name;
  std::string actsOn;  ///< rebound | compression | both
  std::string unit;    ///< clicks | turns | amperes
  double from = 0;
  double to = 0;
  std::string zero;  ///< full soft | full hard

  bool operator==(const Adjuster&) const = default;
};

/// What the maker says of the gas charge.
struct NominalGas {
  std::optional<double> force;        ///< N
  std::optional<double> temperature;  ///< °C
  std::optional<double> length;       ///< m, damper length at which `force` holds
  std::optional<double> pressure;     ///< Pa gauge

  bool operator==(const NominalGas&) const = default;
};

/// One physical damper, found again by its serial. Everything is optional.
struct DamperCard {
  std::string serial, partNumber, position,
      kind;  ///< kind: twin tube | monotube | remote reservoir | fork leg | cartridge | other
  std::optional<double> rodDiameter, pistonDiameter, openLength, closedLength;  ///< m
  NominalGas gas;
  std::vector<Adjuster> adjusters;
  bool positionDependent = false;
  bool springFitted = false;
  std::string orientation;  ///< rod up | rod down | either
  std::string notes;

  bool operator==(const DamperCard&) const = default;
};

}  // namespace dampwright
