// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <limits>
#include <optional>
#include <vector>

#include "core/base/direction.h"
#include "tests/support/bench_damper.h"
#include "tests/support/bench_drive.h"

// Doorway of the simulator: a damper on a bench goes in; the recording as the bench would write it,
// the same recording without any error of measurement, and the truth come out. SI, positive in
// compression. It shares nothing with the analysis: own states, own integration.
namespace dampwright::bench {

/// What the bench's sensors and clock do to the truth. The defaults are a good bench.
struct Instrument {
  double rate = 2000;               ///< Hz, as the file claims
  double clockErrorPercent = 0;     ///< the true clock is slower by this, so time stamps are short
  double clockJitter = 0;           ///< s rms of single sampling instants
  double forceNoise = 2;            ///< N rms
  double displacementNoise = 1e-5;  ///< m rms
  double forceScale = 1;            ///< cell error, factor
  double forceZero = 0;             ///< N
  double forceDrift = 0;            ///< N/s
  double clipAt = std::numeric_limits<double>::infinity();  ///< N, both signs
  double forceStep = 0;                                     ///< N, 0: not quantised
  double displacementStep = 0;                              ///< m
  double displacementScale = 1;                             ///< transducer error, factor
  double displacementOffset = 0;                            ///< m, where the bench counts zero
  double forceDelay = 0;                                    ///< s, force is recorded late
  double movingMass = 0;                                    ///< kg between cell and damper
  double temperatureNoise = 0.05;                           ///< °C rms
  std::uint64_t seed = 1;
};

struct Recording {
  double rate = 0;  ///< Hz
  std::vector<double> time, displacement, velocity, force, temperature;

  std::size_t size() const { return time.size(); }
};

/// One half of a true cycle at its largest speed (a triangle: at mid-stroke).
struct HalfTruth {
  double time = 0;
  double velocity = 0;      ///< m/s, magnitude
  double displacement = 0;  ///< m, from the block's mid-stroke
  double force = 0;         ///< N in the direction that resists, gas included
  double gas = 0;           ///< N, positive
};

struct CycleTruth {
  double start = 0, end = 0;  ///< s
  HalfTruth compression, rebound;
  double energy = 0;       ///< J absorbed
  double temperature = 0;  ///< °C, mean
};

struct BlockTruth {
  BlockPlan plan;
  double start = 0, end = 0;       ///< s, the even part
  std::vector<CycleTruth> cycles;  ///< whole cycles of the even part

  /// Mean over the cycles from `first` on, one direction.
  HalfTruth mean(Direction direction, std::size_t first = 0) const;
  double meanEnergy(std::size_t first = 0) const;
};

struct BenchRun {
  Recording measured;  ///< with noise, scale, clock, delay, mass, clipping, quantisation
  Recording clean;     ///< the same instants without any of them
  std::vector<BlockTruth> blocks;
  double temperatureAtEnd = 0;  ///< °C
};

/// `finestStep` [s] bounds the integration step. Same input, same output to the last bit.
BenchRun simulate(const Damper& damper,
                  const DrivePlan& plan,
                  const Instrument& instrument = {},
                  double finestStep = 2e-5);

}  // namespace dampwright::bench
