// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// Compression shortens the damper (x rises, v > 0), rebound lengthens it.
enum class Direction { Compression, Rebound };

/// +1 in compression, -1 in rebound: turns a signed force or velocity into its magnitude along the
/// direction.
constexpr double signOf(Direction direction) {
  return direction == Direction::Compression ? 1.0 : -1.0;
}

}  // namespace dampwright
