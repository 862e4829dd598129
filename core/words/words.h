// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <string_view>

#include "core/base/remark.h"
#include "core/base/result.h"

namespace dampwright {

/// A sentence of the one table: `text` says what is so, `hint` what to do (may be empty). Both hold
/// {name} where a named value goes; {row}, {column}, {file}, {count} and {first_row} come from the
/// place or the remark.
struct Sentence {
  std::string_view code;
  std::string_view text;
  std::string_view hint;
};

/// The row of a code; nothing where the code is unknown (a house test keeps that from happening).
const Sentence* findSentence(std::string_view code);

/// English, numbers with a point and a unit fit for a workshop (mm, mm/s, N, °C).
std::string englishText(std::string_view code, const Values& values);
std::string englishText(const Remark& remark);

/// "code: file, row, column: what. what to do." on one line, as the batch program prints it.
std::string englishLine(const Error& error);

}  // namespace dampwright
