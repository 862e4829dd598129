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

/// UTF-8 as words are compared: lower case, accents taken off (ß is ss), full-width forms and the
/// squares of Japanese files as plain letters ("Ｆ" f, "㎜" mm, "℃" °c, "（" a bracket), half-width
/// kana as full-width ones. What is none of these stays.
std::string folded(std::string_view text);

/// One letter of valid UTF-8 at byte `i`, and how many bytes it takes.
struct Letter {
  char32_t point = 0;
  std::size_t bytes = 1;
};
Letter letterAt(std::string_view text, std::size_t i);

/// The text with one letter more, as UTF-8.
std::string withLetter(std::string text, char32_t point);

/// Any letter, also outside ASCII.
bool hasLetter(std::string_view text);

/// Every `from` as `to`.
std::string replaced(std::string_view text, std::string_view from, std::string_view to);

/// At most so many bytes from the start, never a part of a letter.
std::string_view startOf(std::string_view text, std::size_t bytes);

/// Trimmed, runs of blanks made one: names compare equal however they were padded.
std::string withSingleBlanks(std::string_view text);

}  // namespace dampwright
