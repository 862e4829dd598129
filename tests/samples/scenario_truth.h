// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <vector>

#include "tests/samples/scenario.h"

namespace dampwright::samples {

/// What a limit check reads on the run without noise, and the word that must come out.
struct PromisedCheck {
  SampleCheck check;
  double truthN = 0;     ///< the same reading on the noise-free run
  double expectedU = 0;  ///< N, what the bench's certificate alone makes of k = 2
  std::string verdict;   ///< pass | fail | too close to call
};

/// One file of a damper as it was simulated.
struct SampleFile {
  std::string name;
  std::string bytes;
};

/// A damper at one setting with everything that is true of it.
struct SampleTruth {
  SampleDamper damper;
  std::vector<bench::BlockTruth> blocks;
  std::vector<bench::HalfTruth> compression, rebound;  ///< of each block, conditioning left out
  std::vector<double> energy;                          ///< J, of each block
  double gasN = 0;                                     ///< at mid-stroke of the slow block
  double dryFrictionN = 0;                             ///< of sliding, as its speed goes to zero
  double halfDifferenceN = 0;                          ///< at the slow block's largest speed
  double startC = 0, endC = 0;
  std::vector<PromisedCheck> checks;
  std::string verdict;  ///< of the whole
  std::vector<SampleFile> files;
};

/// Runs the damper on its bench, writes its files and works out what a limit sheet must say.
/// Aborts where a promise would be ambiguous: a margin between 0.35 and 1.5 times the expected U.
SampleTruth truthOf(const SampleDamper& damper, const SampleVehicle& vehicle);

}  // namespace dampwright::samples
