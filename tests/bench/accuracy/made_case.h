// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <string>
#include <vector>

#include "core/rig/rig_profile.h"
#include "core/trace/trace.h"
#include "tests/support/bench_run.h"

namespace dampwright::accuracy {

/// One random damper on one random bench, with everything that is true about it.
struct MadeCase {
  bool knownForms = true;     ///< valve laws and friction are forms that core/laws has
  bool standardBench = true;  ///< 2 kHz, 2 N and 0.01 mm rms, sine or crank
  bench::Damper damper;
  bench::Law compression, rebound;                     ///< the valves
  std::string compressionForm, reboundForm;            ///< name in core/laws; empty where unknown
  std::vector<double> compressionTruth, reboundTruth;  ///< its parameters, SI
  double dry = 0;                                      ///< N, limit of friction for speed -> 0
  bench::DrivePlan plan, between;   ///< what is measured; blocks at speeds that are not
  double rate = 2000;               ///< Hz
  double forceNoise = 2;            ///< N rms
  double displacementNoise = 1e-5;  ///< m rms
  RigProfile rig;                   ///< with the accuracies of its certificate
};

/// The case of a number: every third has forms that core/laws does not have, every second pair a
/// bench drawn at random. Same seed and number, same case.
MadeCase drawCase(std::uint64_t seed, std::uint64_t number);

/// The recording with white noise; everything else is true.
Trace noisyTrace(const MadeCase& made, const bench::Recording& clean, std::uint64_t seed);

/// The recording with noise and one draw of every error that the certificate allows: cell scale,
/// cell zero, displacement and clock rectangular within their limits, mounting normal.
Trace rigTrace(const MadeCase& made, const bench::Recording& clean, std::uint64_t seed);

}  // namespace dampwright::accuracy
