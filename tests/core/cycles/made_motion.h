// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/condition/motion.h"
#include "tests/support/closed_form_traces.h"

namespace dampwright::test {

/// A made run as conditioning would hand it over, without asking conditioning.
inline Motion motionOf(const MadeRun& run) {
  Motion motion;
  motion.rate = run.rate;
  motion.displacement = run.displacement;
  motion.velocity = run.velocity;
  motion.force = run.force;
  motion.doubtful.resize(run.force.size());
  return motion;
}

/// A sine, crank or triangle of a peak speed [m/s].
inline MadeWave waveAt(double speed, double cycles, double stroke = 0.05) {
  MadeWave wave;
  wave.stroke = stroke;
  wave.frequency = sineFrequency(stroke, speed);
  wave.cycles = cycles;
  return wave;
}

}  // namespace dampwright::test
