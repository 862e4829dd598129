// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <string_view>

namespace dampwright {

/// Windows-1252 as UTF-8; the five bytes without a letter become U+FFFD.
std::string fromWindows1252(std::string_view bytes);

/// UTF-16 as UTF-8. `high`: which byte of each pair is the more significant, 0 or 1. Halves of
/// pairs become U+FFFD; an odd last byte is left out: a file still being written.
std::string fromUtf16(std::string_view bytes, std::size_t high);

/// Shift-JIS (as Windows writes it) or GB18030 as UTF-8, by the C library's own tables.
enum class WideEncoding { ShiftJis, Gb18030 };

/// Nothing where the bytes are not clean, or the C library has no such table; a letter cut short by
/// the end is left out.
std::optional<std::string> fromClean(std::string_view bytes, WideEncoding encoding);

/// The same of any bytes: what is no letter becomes U+FFFD. Nothing where there is no such table.
std::optional<std::string> fromAny(std::string_view bytes, WideEncoding encoding);

/// How much the bytes look like text of the encoding, by where its usual letters lie: the share of
/// letters outside ASCII that are kana or usual characters, 0 to 1; of Windows-1252 those that
/// stand alone between ASCII letters or are signs such as the degree. 0 where there are fewer than
/// three.
double usualShare(std::string_view bytes, WideEncoding encoding);
double usualShareOfWindows1252(std::string_view bytes);

}  // namespace dampwright
