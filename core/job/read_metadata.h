// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <vector>

#include "core/job/job.h"
#include "core/job/suggest_corner.h"

namespace dampwright {

/// The adjusters' positions that a run file tells: "Rebound clicks: 8", "compression setting = 4",
/// "Setting: rebound 8, compression 4". Sorted by adjuster; empty where nothing is told.
std::vector<SettingValue> settingOf(const Metadata& metadata);

/// The damper's serial as a run file tells it ("Serial", "S/N", "damper serial number"), empty
/// where it does not.
std::string serialOf(const Metadata& metadata);

}  // namespace dampwright
