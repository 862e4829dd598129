// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <string_view>

#include "core/base/remark.h"
#include "core/base/result.h"

namespace dampwright {

// Codes in, English out. Every code that core hands out has exactly one row in the tables beside
// this file; tests/house finds the codes where they stand as a literal in one of these forms:
//   Error{"code", ...}   Remark{"code", ...}   Reason{"code", ...}   (also with a variable's name)
//   someError("code", ...)   remark("code", ...)   any function whose name ends in error, remark,
//   reason, warning, note or why
//   .code = "code"   .reason = "code"   .why = "code"
// so write a code as a literal there, never put together or chosen by ?: inside the braces.

/// A sentence of the one table: `text` says what is so, `hint` what to do (may be empty); each is
/// whole sentences with a full stop. Both hold {name} where a named value goes; {row}, {column},
/// {file}, {count} and {first_row} come from the place or the remark.
struct Sentence {
  std::string_view code;
  std::string_view text;
  std::string_view hint;
};

/// The row of a code; nothing where the code is unknown (a house test keeps that from happening).
const Sentence* findSentence(std::string_view code);

/// A number in a workshop's unit with the unit behind it ("25.4 mm", "-262 mm/s", "1.5 kN" never:
/// forces stay in N), at most five significant digits, decimal point, no locale.
std::string englishQuantity(double si, Quantity quantity);

/// Text and hint of the code with the values put in. A value that the sentence asks for and does
/// not get is "?"; an unknown code is shown as the code itself.
std::string englishText(std::string_view code, const Values& values);
std::string englishText(const Remark& remark);

/// "code: file, row N, column N: what. what to do." on one line, as the batch program prints it.
std::string englishLine(const Error& error);

}  // namespace dampwright
