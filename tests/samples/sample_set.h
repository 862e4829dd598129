// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "tests/samples/scenario_truth.h"

namespace dampwright::samples {

/// Every file of sample_runs but make.sh: runs, documents, truth.json and README.md. The same bytes
/// each time.
std::vector<SampleFile> makeSamples();

}  // namespace dampwright::samples
