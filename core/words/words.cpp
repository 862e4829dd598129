// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/words.h"

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>

#include "core/words/tables.h"

namespace dampwright {
namespace {

struct WorkshopUnit {
  Quantity quantity;
  double perSi;  ///< shown value = SI value · perSi
  std::string_view symbol;
};

constexpr std::array workshopUnits{
    WorkshopUnit{Quantity::Time, 1, " s"},
    WorkshopUnit{Quantity::Length, 1e3, " mm"},
    WorkshopUnit{Quantity::Velocity, 1e3, " mm/s"},
    WorkshopUnit{Quantity::Force, 1, " N"},
    WorkshopUnit{Quantity::Temperature, 1, " °C"},
    WorkshopUnit{Quantity::Energy, 1, " J"},
    WorkshopUnit{Quantity::Power, 1, " W"},
    WorkshopUnit{Quantity::Damping, 1, " N·s/m"},
    WorkshopUnit{Quantity::Stiffness, 1e-3, " N/mm"},
    WorkshopUnit{Quantity::Mass, 1, " kg"},
    WorkshopUnit{Quantity::Frequency, 1, " Hz"},
    WorkshopUnit{Quantity::Angle, 57.29577951308232, "°"},  // 180/π
    WorkshopUnit{Quantity::Voltage, 1, " V"},
    WorkshopUnit{Quantity::Percent, 1, " %"},
};

std::string inDigits(double value, int decimals) {
  std::array<char, 400> text{};  // the largest double has 309 digits before the point
  const auto end =
      std::to_chars(
          text.data(), text.data() + text.size(), value, std::chars_format::fixed, decimals)
          .ptr;
  return {text.data(), end};
}

// Five significant digits, whole digits before the point always, no zeros hanging at the end.
std::string shortNumber(double value) {
  if (!std::isfinite(value)) return "not a number";
  const double size = std::abs(value);
  const int whole = size >= 1 ? static_cast<int>(std::floor(std::log10(size))) + 1 : 1;
  const int leadingZeros =
      size > 0 && size < 1 ? static_cast<int>(-std::floor(std::log10(size))) : 0;
  const int decimals = std::min(std::max(5 - whole, 0) + leadingZeros, 12);
  std::string text = inDigits(value, decimals);
  if (text.find('.') != std::string::npos) {
    text.erase(text.find_last_not_of('0') + 1);
    if (text.back() == '.') text.pop_back();
  }
  return text == "-0" ? "0" : text;
}

std::string valueText(const NamedValue& named) {
  if (const auto* words = std::get_if<std::string>(&named.value)) return *words;
  return englishQuantity(std::get<double>(named.value), named.quantity);
}

std::string valueOf(std::string_view name, const Values& values) {
  for (const NamedValue& named : values) {
    if (named.name == name) return valueText(named);
  }
  return "?";
}

std::string filled(std::string_view sentence, const Values& values) {
  std::string text;
  while (true) {
    const auto open = sentence.find('{');
    const auto close = sentence.find('}', open);
    if (open == std::string_view::npos || close == std::string_view::npos) break;
    text += sentence.substr(0, open);
    text += valueOf(sentence.substr(open + 1, close - open - 1), values);
    sentence.remove_prefix(close + 1);
  }
  text += sentence;
  return text;
}

NamedValue counted(std::string name, std::int64_t count) {
  return {std::move(name), static_cast<double>(count), Quantity::Count};
}

Values withPlace(Values values, const Place& place) {
  values.push_back({"file", place.file, Quantity::None});
  values.push_back(counted("row", place.row));
  values.push_back(counted("column", place.column));
  return values;
}

std::string placeText(const Place& place) {
  std::string text = place.file;
  const auto add = [&text](std::string_view what, std::int64_t number) {
    if (number == 0) return;
    if (!text.empty()) text += ", ";
    text += what;
    text += std::to_string(number);
  };
  add("row ", place.row);
  add("column ", place.column);
  return text;
}

}  // namespace

const Sentence* findSentence(std::string_view code) {
  for (const auto table : {readingSentences(),
                           measuringSentences(),
                           judgingSentences(),
                           documentSentences(),
                           bookSentences()}) {
    for (const Sentence& row : table) {
      if (row.code == code) return &row;
    }
  }
  return nullptr;
}

std::string englishQuantity(double si, Quantity quantity) {
  if (quantity == Quantity::Count && std::isfinite(si)) return inDigits(si, 0);
  for (const WorkshopUnit& unit : workshopUnits) {
    if (unit.quantity == quantity) {
      return shortNumber(si * unit.perSi) + std::string(unit.symbol);
    }
  }
  return shortNumber(si);
}

std::string englishText(std::string_view code, const Values& values) {
  const Sentence* row = findSentence(code);
  if (row == nullptr) return std::string(code);
  const std::string text = filled(row->text, values);
  return row->hint.empty() ? text : text + " " + filled(row->hint, values);
}

std::string englishText(const Remark& remark) {
  Values values = remark.values;
  values.push_back(counted("count", remark.count));
  values.push_back(counted("first_row", remark.firstRow));
  return englishText(remark.code, values);
}

std::string englishLine(const Error& error) {
  const std::string place = placeText(error.place);
  std::string line = error.code + ": " + (place.empty() ? place : place + ": ");
  line += englishText(error.code, withPlace(error.values, error.place));
  for (char& letter : line) {
    if (letter == '\n' || letter == '\r') letter = ' ';
  }
  return line;
}

}  // namespace dampwright
