// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <optional>

namespace dampwright {

/// One instant of a measurement, the same in all three plots: a phase of a block's loop and, in
/// the run over time, of one of its cycles.
struct Instant {
  std::size_t block = 0;             ///< index into the measurement's blocks
  double phase = 0;                  ///< [1] 0 at the lower turning point, below 1
  std::optional<std::size_t> cycle;  ///< of the block; nothing where only the loop was pointed at

  bool operator==(const Instant&) const = default;
};

}  // namespace dampwright
