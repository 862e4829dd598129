// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <span>
#include <vector>

namespace dampwright {

/// Up to three neighbouring samples that stand alone.
struct Spike {
  std::size_t first = 0;
  std::size_t count = 1;
};

/// Isolated spikes of an even signal: one to three samples that all stand beyond the two samples on
/// either side, by `threshold` robust standard deviations of the 14 samples about them (about their
/// straight line), as many noise levels, three steps of the sensor, and half a percent of the
/// signal's range. So neither a step (monotone), nor the corner of a triangle, nor a toggling last
/// digit is one. Source: Hampel, J. Am. Stat. Assoc. 69 (1974) 383; the side conditions are our
/// own.
std::vector<Spike> findSpikes(std::span<const double> signal, double threshold);

/// The signal with a straight line in place of each spike.
std::vector<double> withoutSpikes(std::vector<double> signal, std::span<const Spike> spikes);

}  // namespace dampwright
