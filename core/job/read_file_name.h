// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "core/job/job.h"

namespace dampwright {

/// The adjusters' positions that a file's name tells: "front left 8 clicks.txt", "R12 C4.csv",
/// "rebound_10_clicks_0100_mm_s.csv". Single letters count only as a pair of R and C, for R1 alone
/// may be a run. Sorted by adjuster; empty where nothing is told.
std::vector<SettingValue> settingInName(std::string_view fileName);

/// m/s, the speed that a file's name tells: "FL_0.1mps.csv", "run 0100_mm_s.csv", "50mms.txt".
std::optional<double> speedInName(std::string_view fileName);

/// The words of a file's name without its suffix, its speed, its setting and a number at its end:
/// what runs of one damper have in common ("fl", "front left").
std::string stemOfName(std::string_view fileName);

}  // namespace dampwright
