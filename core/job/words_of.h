// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <string_view>
#include <vector>

namespace dampwright {

/// The words of a name or a line, in small letters: split at all that is neither letter nor digit,
/// between letters and digits, and where a capital follows a small letter ("FrontLeft_2" is front,
/// left, 2). Letters beyond ASCII stay as they are.
std::vector<std::string> wordsOf(std::string_view text);

}  // namespace dampwright
