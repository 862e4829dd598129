// SPDX-License-Identifier: GPL-3.0-or-later
// bench_measure_memory FILE: seconds from the file's bytes in memory to the measurement.
#include <chrono>
#include <cstdio>
#include <fstream>
#include <iterator>
#include <span>
#include <string>

#include "core/intake/read_run.h"
#include "core/measure/measure_runs.h"

int main(int argc, char** argv) {
  using namespace dampwright;
  std::ifstream file(argc > 1 ? argv[1] : "", std::ios::binary);
  const std::string bytes{std::istreambuf_iterator<char>(file), {}};
  const auto start = std::chrono::steady_clock::now();
  const auto reading = readRun(bytes, "run.csv", {}, {}, {});
  if (!reading || !reading.value().trace) return 1;
  const auto measured = measureRuns(std::span(&*reading.value().trace, 1), {}, {});
  const std::chrono::duration<double> seconds = std::chrono::steady_clock::now() - start;
  if (!measured) return 1;
  std::printf("%.6f\n", seconds.count());
  return 0;
}
