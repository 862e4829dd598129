// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <string>
#include <string_view>

namespace dampwright {

/// Blanks as files write them: space, tab, carriage return.
constexpr bool isBlank(char letter) { return letter == ' ' || letter == '\t' || letter == '\r'; }

/// Without blanks (and no-break spaces) at either end.
std::string_view trimmed(std::string_view text);

/// UTF-8 in lower case: A to Z and the accented letters of western Europe (U+00C0 to U+00DE).
std::string lowered(std::string_view text);

/// At most so many bytes from the start, never a part of a letter.
std::string_view startOf(std::string_view text, std::size_t bytes);

/// Trimmed, runs of blanks made one: names compare equal however they were padded.
std::string withSingleBlanks(std::string_view text);

}  // namespace dampwright
