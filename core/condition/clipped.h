// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <span>
#include <vector>

namespace dampwright {

/// Where a channel sat at the end of its range.
struct ClippedSide {
  double level = 0;  ///< unit of the signal
  std::vector<std::size_t> samples;
};

/// The upper and lower ends at which the signal is cut off (0 to 2 of them): at least four equal
/// extreme samples in a row that the signal runs into, and out of, at full slope. A rounded peak of
/// a coarse sensor levels off first, and a friction step comes through zero within three samples:
/// both are sound. With one end found, every sample at that level counts.
std::vector<ClippedSide> findClipped(std::span<const double> signal);

}  // namespace dampwright
