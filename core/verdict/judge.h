// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/measure/measurement.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// Judges a measurement by a limit sheet. Never fails: what cannot be judged is "not tested" with
/// its reason. Definitions: core/verdict/decision.h (rules), core/verdict/check_kinds.h (what each
/// check reads).
Verdict judge(const Measurement& measurement, const Limits& limits);

}  // namespace dampwright
