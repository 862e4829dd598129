// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cmath>
#include <string>

#include "core/intake/read_run.h"
#include "tests/core/intake/made_text.h"

namespace dampwright {

inline constexpr int madeRows = 240;

struct Sample {
  double time, displacement, force;  // s, mm, N
};

// x = 25 mm · sin ωt; the force has a third harmonic, so that it is the rougher of the two.
inline Sample sampleAt(int i) {
  const double t = i / madeRate, phase = 4 * pi * t;
  return {t, 25 * std::sin(phase), 60 + 800 * std::cos(phase) + 250 * std::cos(3 * phase)};
}

// What is wrong with the reading, empty where nothing is.
inline std::string faultOf(const Result<RunReading>& reading) {
  if (!reading) return "refused: " + reading.error().code;
  if (!reading.value().trace) {
    std::string asked = "asks:";
    for (const OpenPoint& open : reading.value().open) asked += " " + open.point;
    return asked;
  }
  const Trace& trace = *reading.value().trace;
  if (trace.time.size() != madeRows) return "rows: " + std::to_string(trace.time.size());
  double sign = 0;
  for (int i = 0; i < madeRows; ++i) {
    const auto at = static_cast<std::size_t>(i);
    const Sample sample = sampleAt(i);
    const double time = trace.time[at] - trace.time[0];
    // Half a digit of the time as written, a millisecond's half at the worst; of x 1e-4 mm, of F
    // 0.01 N.
    if (!(std::abs(time - sample.time) < 6e-4)) return "time in row " + std::to_string(i);
    if (!(std::abs(trace.displacement[at] - sample.displacement / 1000) < 5.1e-8))
      return "displacement in row " + std::to_string(i);
    if (sign == 0) sign = trace.force[at] * sample.force > 0 ? 1 : -1;
    if (!(std::abs(sign * trace.force[at] - sample.force) < 5.1e-3))
      return "force in row " + std::to_string(i);
  }
  return {};
}

}  // namespace dampwright
