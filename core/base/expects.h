// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <source_location>

namespace dampwright {

/// Stops the program where our own code broke a promise. Always on; never for bad input or poor
/// numbers.
void expects(bool condition, std::source_location where = std::source_location::current());

}  // namespace dampwright
