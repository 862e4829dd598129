// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <random>
#include <string>
#include <string_view>
#include <vector>

namespace dampwright {

/// One seed with a few bytes flipped, put in, taken out, doubled, or parts of another seed put in;
/// `words` are what the format knows. The same generator gives the same bytes on every machine.
std::string mutated(const std::vector<std::string>& seeds,
                    const std::vector<std::string_view>& words,
                    std::mt19937& random);

}  // namespace dampwright
