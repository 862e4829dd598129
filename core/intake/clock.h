// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <span>
#include <vector>

#include "core/base/remark.h"

namespace dampwright {

/// Stamps made usable, and what had to be done. Counts and first rows of the remarks are rows of
/// the table from 0 in `firstRow`; the caller turns them into lines.
struct Clock {
  std::vector<std::size_t> kept;  ///< rows that have a stamp; empty where all have one
  std::vector<double> time;       ///< s, one per kept row, rising
  std::vector<Remark> remarks;    ///< rows-without-time, bad-stamps, clock-restarts,
                                  ///< repeated-stamps, gap, uneven-clock
};

/// Makes a rising clock of the stamps of a time column [s]. A single stamp out of line is put
/// between its neighbours; a clock that falls back for good goes on by one usual step; equal stamps
/// are spread evenly up to the next one, as a clock coarser than the sampling makes them. Gaps
/// (more than three usual steps) and jitter (over 5 % rms of the usual step) are only remarked.
Clock makeClock(std::vector<double> stamps);

/// Row i at i/rate.
std::vector<double> evenClock(std::size_t rows, double rate);

}  // namespace dampwright
