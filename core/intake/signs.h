// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>

#include "core/base/direction.h"
#include "core/intake/metadata.h"

namespace dampwright {

/// Which way the damper moves where displacement rises, and whether anything says so: option, rig
/// profile, the column's name, a line of the preamble; else compression is assumed.
struct DirectionChoice {
  Direction rising = Direction::Compression;
  bool settled = false;
};

DirectionChoice chooseDirection(const std::optional<Direction>& asked,
                                const std::optional<Direction>& rig,
                                std::string_view columnName,
                                const Metadata& metadata);

/// ∮F dx over the whole recording [J], of force less its mean, so that neither preload nor gas nor
/// a cell's zero weighs in. Positive where the damper takes energy up, which any damper does:
/// negative says that the force's sign is turned against the displacement's. Samples with NaN are
/// left out.
double absorbedEnergy(std::span<const double> displacement, std::span<const double> force);

}  // namespace dampwright
