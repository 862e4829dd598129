// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "core/trace/trace.h"
#include "tests/support/bench_run.h"

namespace dampwright::test {

/// The noise-free recording of a simulated run with noise of its own: 2 N and 0.01 mm rms unless
/// said, mt19937_64 of the seed. So many seeds cost one simulation.
struct Noise {
  unsigned seed = 1;
  double force = 2;            ///< N rms
  double displacement = 1e-5;  ///< m rms
};

Trace traceOf(const bench::Recording& recording);
Trace noisyTrace(const bench::Recording& clean, const Noise& noise);

/// A damper whose laws and friction core/laws has: two-slope, 160 N of gas, 24 N of tanh friction.
bench::Damper knownDamper();

/// A damper of forms that core/laws does not have: soft blow-off and leaking jet, bristle friction
/// of 24 N.
bench::Damper unknownDamper();

/// A slow sine of 5 mm/s, then 50 to 1000 mm/s at ±25 mm: the programme of the targets.
bench::DrivePlan programme();

}  // namespace dampwright::test
