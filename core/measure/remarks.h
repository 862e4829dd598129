// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "core/measure/measurement.h"

namespace dampwright {

/// Remarks of the measurement as a whole: few-speeds (fewer than three above slow speed),
/// mixed-strokes (more than 2 % apart), scatter-not-known, and the reasons why gas or friction is
/// not determined.
std::vector<Remark> remarksOf(const Measurement& measurement);

}  // namespace dampwright
