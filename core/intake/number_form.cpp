// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/number_form.h"

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>
#include <string>

#include "core/intake/letters.h"
#include "core/intake/name_and_unit.h"

namespace dampwright {
namespace {

constexpr std::size_t longestNumber = 64;  // letters; longer is no measured value
constexpr std::string_view minusSign = "\xE2\x88\x92";
constexpr std::string_view curlyApostrophe = "\xE2\x80\x99";
constexpr std::string_view noBreakSpace = "\xC2\xA0";
constexpr std::string_view narrowNoBreakSpace = "\xE2\x80\xAF";

bool isDigit(char letter) { return letter >= '0' && letter <= '9'; }

bool isMark(char letter) {
  return letter == '.' || letter == ',' || letter == ' ' || letter == '\'';
}

// A cell in plain letters: sign, then digits and marks, then the exponent's digits.
struct Parts {
  bool negative = false;
  std::string mantissa;
  std::string exponent;  ///< with its sign, empty where there is none
};

std::string_view withoutPrefix(std::string_view text, std::size_t length) {
  return text.substr(length);
}

std::optional<Parts> partsOf(std::string_view cell) {
  if (cell.empty() || cell.size() > longestNumber) return std::nullopt;
  Parts parts;
  if (cell.front() == '-' || cell.front() == '+') {
    parts.negative = cell.front() == '-';
    cell = withoutPrefix(cell, 1);
  } else if (cell.starts_with(minusSign)) {
    parts.negative = true;
    cell = withoutPrefix(cell, minusSign.size());
  }
  cell = trimmed(cell);  // "+ 3.5"
  while (!cell.empty()) {
    if (isDigit(cell.front()) || isMark(cell.front())) {
      parts.mantissa += cell.front();
      cell.remove_prefix(1);
    } else if (cell.starts_with(noBreakSpace) || cell.starts_with(narrowNoBreakSpace)) {
      parts.mantissa += ' ';
      cell.remove_prefix(cell.starts_with(noBreakSpace) ? 2 : 3);
    } else if (cell.starts_with(curlyApostrophe)) {
      parts.mantissa += '\'';
      cell.remove_prefix(curlyApostrophe.size());
    } else {
      break;
    }
  }
  if (parts.mantissa.find_first_of("0123456789") == std::string::npos) return std::nullopt;
  if (cell.empty()) return parts;
  if (std::string_view("eEdD").find(cell.front()) == std::string_view::npos) return std::nullopt;
  parts.exponent = withoutPrefix(cell, 1);
  const std::string_view digits =
      std::string_view(parts.exponent)
          .substr(parts.exponent.starts_with('-') || parts.exponent.starts_with('+') ? 1 : 0);
  if (digits.empty() || !std::all_of(digits.begin(), digits.end(), isDigit)) return std::nullopt;
  return parts;
}

struct Marks {
  std::size_t count = 0;
  char first = 0, last = 0;
  bool alike = true;  ///< all but perhaps the last are the same
};

Marks marksOf(std::string_view mantissa) {
  Marks marks;
  char before = 0;
  for (const char letter : mantissa) {
    if (!isMark(letter)) continue;
    if (marks.count == 0) marks.first = letter;
    if (marks.count > 1 && before != marks.first) marks.alike = false;
    before = marks.last = letter;
    ++marks.count;
  }
  return marks;
}

// "1", "12" or "123", then groups of exactly three digits; never a leading zero.
bool groupedByThree(std::string_view digits, char mark) {
  std::size_t group = digits.find(mark);
  if (group == digits.npos || group == 0 || group > 3 || digits.front() == '0') return false;
  while (group < digits.size()) {
    const std::size_t next = std::min(digits.find(mark, group + 1), digits.size());
    if (next - group != 4) return false;
    group = next;
  }
  return true;
}

// One mark only. "1,234" may be either; any other count of digits, or a leading zero, proves it a
// decimal mark. A plain "0,000" proves nothing and costs nothing.
NumberLook lookAtOneMark(const Parts& parts, char mark) {
  const std::string& digits = parts.mantissa;
  const std::size_t before = digits.find(mark), after = digits.size() - before - 1;
  if (mark == ' ' || mark == '\'') {
    const bool groups = groupedByThree(digits, mark);
    return {groups, 0, groups ? mark : char{0}, 0};
  }
  const bool zero = digits.find_first_of("123456789") == std::string::npos;
  const bool couldGroup = after == 3 && before >= 1 && before <= 3 && parts.exponent.empty();
  if (couldGroup && (zero || digits.front() != '0')) return {true, 0, 0, mark};
  return {true, mark, 0, 0};
}

}  // namespace

NumberLook lookAtNumber(std::string_view cell) {
  const auto parts = partsOf(cell);
  if (!parts) return {};
  const Marks marks = marksOf(parts->mantissa);
  if (marks.count == 0) return {true, 0, 0, 0};
  if (marks.count == 1) return lookAtOneMark(*parts, marks.first);
  if (!marks.alike) return {};
  if (marks.last == marks.first) {
    const bool groups = groupedByThree(parts->mantissa, marks.first);
    return {groups, 0, groups ? marks.first : char{0}, 0};
  }
  const std::size_t decimal = parts->mantissa.rfind(marks.last);
  const std::string_view whole = std::string_view(parts->mantissa).substr(0, decimal);
  const bool fits = (marks.last == '.' || marks.last == ',') && groupedByThree(whole, marks.first);
  return fits ? NumberLook{true, marks.last, marks.first, 0} : NumberLook{};
}

std::optional<NumberWithUnit> splitUnit(std::string_view cell) {
  if (cell.size() > longestNumber) return std::nullopt;
  for (std::size_t i = 0; i + 1 < cell.size(); ++i) {
    if (!isDigit(cell[i]) || isDigit(cell[i + 1])) continue;
    const NumberWithUnit split{cell.substr(0, i + 1), trimmed(cell.substr(i + 1))};
    if (readUnit(split.unit) && lookAtNumber(split.number).number) return split;
  }
  return std::nullopt;
}

std::optional<double> parseNumber(std::string_view cell, NumberForm form) {
  const auto parts = partsOf(cell);
  if (!parts) return std::nullopt;
  std::string text = parts->negative ? "-" : "";
  const std::size_t decimal = parts->mantissa.find(form.decimal);
  std::string whole = parts->mantissa.substr(0, decimal);
  if (form.thousands != 0 && whole.find(form.thousands) != std::string::npos) {
    const bool zero = whole.find_first_of("123456789") == std::string::npos;  // "0.000"
    if (!zero && !groupedByThree(whole, form.thousands)) return std::nullopt;
    whole.erase(std::remove(whole.begin(), whole.end(), form.thousands), whole.end());
  }
  // What is left of other marks, or a second decimal mark, makes no number.
  if (!std::all_of(whole.begin(), whole.end(), isDigit)) return std::nullopt;
  text += whole;
  if (decimal != std::string::npos) text.append(1, '.').append(parts->mantissa, decimal + 1);
  if (!parts->exponent.empty()) {
    text += 'e';
    text += parts->exponent.starts_with('+') ? parts->exponent.substr(1) : parts->exponent;
  }
  double value = 0;
  const auto [end, problem] = std::from_chars(text.data(), text.data() + text.size(), value);
  if (problem != std::errc{} || end != text.data() + text.size()) return std::nullopt;
  return value;
}

bool isMissing(std::string_view cell) {
  static constexpr auto words = std::to_array<std::string_view>(
      {"",        "nan",      "na",        "n/a",     "n.a.",     "#n/a",    "null",     "none",
       "-",       "--",       "---",       "-nan",    "nan(ind)", "#nv",     "inf",      "-inf",
       "+inf",    "infinity", "-infinity", "1.#inf",  "-1.#inf",  "1.#qnan", "-1.#qnan", "1.#ind",
       "-1.#ind", "nil",      "missing",   "#div/0!", "#value!",  "#wert!",  "-.-",      "--.--"});
  if (cell.size() > 9) return false;
  return std::find(words.begin(), words.end(), lowered(cell)) != words.end();
}

void FormVotes::add(const NumberLook& look) {
  if (!look.number) return;
  ++numbers;
  pointDecimal += look.decimal == '.' ? 1 : 0;
  commaDecimal += look.decimal == ',' ? 1 : 0;
  pointOpen += look.open == '.' ? 1 : 0;
  commaOpen += look.open == ',' ? 1 : 0;
  pointGroups += look.thousands == '.' ? 1 : 0;
  commaGroups += look.thousands == ',' ? 1 : 0;
  blankGroups += look.thousands == ' ' ? 1 : 0;
  apostropheGroups += look.thousands == '\'' ? 1 : 0;
}

std::optional<NumberForm> provenForm(const FormVotes& votes) {
  const int pointIsDecimal = votes.pointDecimal + votes.commaGroups;
  const int commaIsDecimal = votes.commaDecimal + votes.pointGroups;
  if (pointIsDecimal + commaIsDecimal == 0) return std::nullopt;
  const bool comma = commaIsDecimal > pointIsDecimal;
  NumberForm form{comma ? ',' : '.', 0};
  if (comma && votes.pointGroups > 0) form.thousands = '.';
  if (!comma && votes.commaGroups > 0) form.thousands = ',';
  if (form.thousands == 0 && votes.blankGroups > 0) form.thousands = ' ';
  if (form.thousands == 0 && votes.apostropheGroups > 0) form.thousands = '\'';
  return form;
}

}  // namespace dampwright
