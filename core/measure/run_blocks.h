// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <vector>

#include "core/base/result.h"
#include "core/measure/measure_runs.h"

namespace dampwright {

/// One recording conditioned, cut and read; what a measurement keeps of it.
struct ReadRun {
  MeasuredRun run;
  std::vector<MeasuredBlock> blocks;
  Motion motion;
};

/// condition → findBlocks → readBlock for one recording. Remarks of its blocks stand with the run,
/// each code once with its count. Errors: those of condition and findBlocks, with the file's name.
Result<ReadRun> readRunBlocks(const Trace& trace,
                              std::size_t index,
                              const MeasureOptions& options,
                              const Progress& progress);

}  // namespace dampwright
