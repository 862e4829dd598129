// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>

#include "tests/bench/accuracy/made_case.h"
#include "tests/bench/accuracy/tally.h"

namespace dampwright::accuracy {

/// Simulates a case, measures it with noise alone and with every error of the rig's certificate,
/// and compares both with the truth.
Tally compare(const MadeCase& made, std::uint64_t seed);

}  // namespace dampwright::accuracy
