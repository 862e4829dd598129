// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/fast_row.h"

#include <array>
#include <charconv>
#include <limits>

#include "core/intake/letters.h"

namespace dampwright {
namespace {

constexpr double absent = std::numeric_limits<double>::quiet_NaN();

using Parsed = FastRow::Parsed;

Parsed commaNumber(const char* at, const char* end) {
  std::array<char, 64> copy;
  std::size_t length = 0;
  for (; at + length != end && length < copy.size(); ++length) {
    const char letter = at[length];
    const bool part = (letter >= '0' && letter <= '9') || letter == '-' || letter == '+' ||
                      letter == 'e' || letter == 'E' || letter == ',';
    if (!part) break;
    copy[length] = letter == ',' ? '.' : letter;
  }
  Parsed parsed;
  const auto [stop, problem] = std::from_chars(copy.data(), copy.data() + length, parsed.value);
  if (problem == std::errc{} && stop == copy.data() + length) parsed.end = at + length;
  return parsed;
}

Parsed numberAt(const char* at, const char* end, NumberForm form) {
  if (form.thousands != 0) return {};
  if (at != end && *at == '+') ++at;
  const char* const first = at != end && *at == '-' ? at + 1 : at;
  const bool starts = first != end && ((*first >= '0' && *first <= '9') || *first == form.decimal);
  if (!starts) return {};  // also "inf" and "nan", which from_chars would take
  if (form.decimal != '.') return commaNumber(at, end);
  Parsed parsed;
  const auto [stop, problem] = std::from_chars(at, end, parsed.value);
  if (problem == std::errc{}) parsed.end = stop;
  return parsed;
}

}  // namespace

FastRow::FastRow(const Dialect& dialect) : dialect_(dialect), values_(dialect.columns, absent) {
  for (std::size_t column = 0; column < dialect.columns; ++column) {
    plain_.push_back(dialect.numeric[column] != 0 && dialect.units[column].empty() &&
                     dialect.stamps[column].kind == StampKind::None);
  }
}

bool FastRow::read(std::string_view text) {
  const char* at = text.data();
  const char* const end = at + text.size();
  for (std::size_t column = 0; column < dialect_.columns; ++column) {
    at = afterBlanks(at, end);
    if (plain_[column] != 0) {
      const Parsed parsed = numberAt(at, end, dialect_.forms[column]);
      values_[column] = parsed.value;
      at = parsed.end;
    } else if (dialect_.numeric[column] == 0) {
      at = textField(at, end);
    } else if (dialect_.stamps[column].kind != StampKind::None) {
      const Parsed parsed = stamp(at, end, dialect_.stamps[column]);
      values_[column] = parsed.value;
      at = parsed.end;
    } else {
      const Parsed parsed = numberAt(at, end, dialect_.forms[column]);
      values_[column] = parsed.value;
      at = behindUnit(parsed.end, end, dialect_.units[column]);
    }
    if (at == nullptr) return false;
    at = afterBlanks(at, end);
    if (column + 1 == dialect_.columns) break;
    if (at == end) return false;
    if (dialect_.delimiter != blanksDelimiter && *at++ != dialect_.delimiter) return false;
  }
  if (at != end && *at == dialect_.delimiter) at = afterBlanks(at + 1, end);
  return at == end;
}

const char* FastRow::afterBlanks(const char* at, const char* end) const {
  while (at != end && (*at == ' ' || (*at == '\t' && dialect_.delimiter != '\t'))) ++at;
  return at;
}

const char* FastRow::textField(const char* at, const char* end) const {
  while (at != end && *at != dialect_.delimiter) {
    if (*at == '"' || (dialect_.delimiter == blanksDelimiter && *at == '\t')) return nullptr;
    ++at;
  }
  return at;
}

Parsed FastRow::stamp(const char* at, const char* end, StampForm form) const {
  const char* const stop = textField(at, end);
  if (stop == nullptr) return {};
  const auto value = readStamp(trimmed({at, static_cast<std::size_t>(stop - at)}), form);
  return value ? Parsed{stop, *value} : Parsed{};
}

const char* FastRow::behindUnit(const char* at, const char* end, std::string_view unit) {
  if (at == nullptr) return nullptr;
  while (at != end && *at == ' ') ++at;
  const std::string_view rest(at, static_cast<std::size_t>(end - at));
  return rest.starts_with(unit) ? at + unit.size() : nullptr;
}

}  // namespace dampwright
