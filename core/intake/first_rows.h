// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "core/base/result.h"

namespace dampwright {

/// One row of a file as text, UTF-8.
struct TextRow {
  std::int64_t line = 0;  ///< of its first line, from 1
  std::vector<std::string> cells;
};

/// The whole lines in the first `most` bytes; all bytes where no line ends there. A file's head
/// reads like the file, in a time that does not grow with it.
std::string_view headOf(std::string_view bytes, std::size_t most);

/// The first `count` rows as they stand, for a person to look at: preamble, header, data and
/// comments alike. `delimiter` as in Source; empty, or not one of its words: each row is one cell.
/// Long cells are cut. Errors: those of decodeText.
Result<std::vector<TextRow>> firstRows(std::string_view bytes,
                                       const std::optional<std::string>& encoding,
                                       std::string_view delimiter,
                                       std::size_t count);

}  // namespace dampwright
