// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

namespace dampwright {

/// Preamble lines of a run file: key and value, in file order.
using Metadata = std::vector<std::pair<std::string, std::string>>;

/// The corner (one of `corners`) that a run file says it comes from: by a line that tells a
/// position ("Position: FL"), else by the file's name ("VL_50mm.csv", "rear right.txt"), else by
/// any short line ("front left"). English and German words and their initials, French initials for
/// the axle and side. Where front and rear, or left and right, are both said, it says nothing.
std::optional<std::string> suggestCorner(std::string_view fileName,
                                         const Metadata& metadata,
                                         const std::vector<std::string>& corners);

/// The corner that a few words name, as on a damper card: "front left", "HR", "left fork leg".
std::optional<std::string> cornerFromWords(std::string_view words,
                                           const std::vector<std::string>& corners);

}  // namespace dampwright
