// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "core/verdict/check_kinds.h"

namespace dampwright {

/// Why the limits do not hold for this figure at all, or nothing: a condition of the limit sheet
/// that was not met, or that nobody can tell. Force is never normalised in silence.
/// stroke-not-tested, setting-differs, setting-not-known, temperature-outside-window,
/// temperature-not-known, waveform-differs.
std::optional<Reason> conditionProblem(const Measurement& measurement,
                                       const LimitConditions& conditions,
                                       const Figure& figure);

}  // namespace dampwright
