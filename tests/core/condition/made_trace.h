// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/trace/trace.h"
#include "tests/support/closed_form_traces.h"

namespace dampwright::test {

/// A made run as intake would hand it over: first data row in line 2.
inline Trace traceOf(const MadeRun& run) {
  Trace trace;
  trace.source.file.name = "made.csv";
  trace.source.firstDataRow = 2;
  trace.time = run.time;
  trace.displacement = run.displacement;
  trace.force = run.force;
  return trace;
}

}  // namespace dampwright::test
