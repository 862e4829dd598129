// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <span>
#include <vector>

namespace dampwright {

/// Where a motion turns round.
struct TurningPoint {
  std::size_t sample = 0;  ///< the extreme sample
  double place = 0;        ///< in samples, between them
  double value = 0;        ///< of the extreme sample
  bool upper = false;
  bool atEdge = false;  ///< first or last of the list: only one side of it was recorded
};

struct TurningOptions {
  double hysteresis = 0;  ///< unit of the signal; a reversal must exceed it, > the noise's swing
  double share = 0.1;     ///< [1] and this share of the smaller of the two half strokes beside it
};

/// The turning points of an even signal, upper and lower by turns. The first and the last are the
/// extremes next to the edges of the signal (atEdge); whether the motion really turned there is for
/// the caller to say. None where the signal never moves by more than the hysteresis.
///
/// A turning point is placed by the middles between the crossings of two levels, 10 and 20 % of the
/// smaller half stroke away from it, drawn out to the extreme: exact for any motion that runs out
/// and back alike (sine, crank, triangle, also with a dwell) and for straight ramps of unlike
/// speed. At an edge the motion is laid over that at the next turning point of its kind, where that
/// one lies inside and at the same value; else the extreme is drawn out from one side as of a sine.
/// Either way at most one sample beyond those that stand at the extreme (a rest, or the few about
/// it).
/// Standard error inside, tried on sines of ±25 mm with 0.01 mm noise at 2 kHz: 6e-6 of the period
/// at 5 mm/s, 6e-5 at 1 m/s.
std::vector<TurningPoint> turningPoints(std::span<const double> signal,
                                        const TurningOptions& options);

/// A hysteresis that neither noise nor one step of a coarse sensor passes: the larger of 12 noise
/// levels and 0.4 % of the signal's range.
double safeHysteresis(std::span<const double> signal);

}  // namespace dampwright
