// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/name_and_unit.h"

#include <algorithm>
#include <array>
#include <utility>

#include "core/intake/column_words.h"
#include "core/intake/letters.h"

namespace dampwright {
namespace {

constexpr std::array<std::string_view, 4> brackets = {"()", "[]", "{}", "<>"};

// The brackets of Japanese and Chinese text as ours.
std::string withPlainBrackets(std::string_view text) {
  constexpr std::array<std::pair<std::string_view, std::string_view>, 9> pairs{{{"（", "("},
                                                                                {"）", ")"},
                                                                                {"［", "["},
                                                                                {"］", "]"},
                                                                                {"【", "["},
                                                                                {"】", "]"},
                                                                                {"〔", "["},
                                                                                {"〕", "]"},
                                                                                {"　", " "}}};
  std::string plain(text);
  for (const auto& [wide, narrow] : pairs) plain = replaced(plain, wide, narrow);
  return plain;
}

// "Weg in mm", "force_in_N": the word that only leads over to the unit.
std::string_view withoutLeadIn(std::string_view name) {
  constexpr std::string_view separators = " \t_,;:/-.";
  const std::size_t last = name.find_last_not_of(separators);
  name = name.substr(0, last == name.npos ? 0 : last + 1);
  const std::string lower = lowered(name);
  for (const std::string_view word : {" in", "_in", " en", " em"}) {
    if (lower.ends_with(word)) return trimmed(name.substr(0, name.size() - word.size()));
  }
  return trimmed(name);
}

bool suits(Quantity unit, std::optional<Role> role) {
  return role && (unit == quantityOf(*role) || unit == Quantity::Voltage);
}

// The unit in the last pair of brackets, whatever stands behind it.
std::optional<NameAndUnit> inBrackets(std::string_view heading) {
  for (const std::string_view pair : brackets) {
    const std::size_t close = heading.rfind(pair[1]);
    const std::size_t open = close == heading.npos ? close : heading.rfind(pair[0], close);
    if (open == heading.npos) continue;
    const std::string_view inside = trimmed(heading.substr(open + 1, close - open - 1));
    const bool square = pair[0] == '[' && !inside.empty();
    if (!square && !readUnit(inside)) continue;
    std::string name(withoutLeadIn(heading.substr(0, open)));
    const std::string_view behind = trimmed(heading.substr(close + 1));
    if (!behind.empty()) name.append(name.empty() ? "" : " ").append(behind);
    return NameAndUnit{name.empty() ? std::string(heading) : name, std::string(inside)};
  }
  return std::nullopt;
}

// The longest known unit behind a blank, comma, stroke or underscore at the end of the name.
std::optional<NameAndUnit> behindSeparator(std::string_view heading) {
  for (std::size_t at = 1; at + 1 < heading.size(); ++at) {
    if (std::string_view(" \t,/_.:-").find(heading[at]) == std::string_view::npos) continue;
    const std::string_view symbol = trimmed(heading.substr(at + 1));
    const auto unit = readUnit(symbol);
    if (!unit) continue;
    const std::string name(withoutLeadIn(heading.substr(0, at)));
    const auto role = roleOfName(name);
    const std::string lower = lowered(symbol);
    const bool word = symbol.size() == 1 || lower == "in" || lower == "min";
    const bool surely = heading[at] == ',' || heading[at] == '/' || (!role && !word);
    if (name.empty() || !(surely || suits(unit->quantity, role))) continue;
    const bool spelledOut = symbol.find('_') != symbol.npos;
    return NameAndUnit{name, spelledOut ? std::string(unit->symbol) : std::string(symbol)};
  }
  return std::nullopt;
}

}  // namespace

std::string_view withoutBrackets(std::string_view symbol) {
  symbol = trimmed(symbol);
  for (const std::string_view pair : brackets) {
    if (symbol.size() >= 2 && symbol.front() == pair[0] && symbol.back() == pair[1]) {
      return trimmed(symbol.substr(1, symbol.size() - 2));
    }
  }
  return symbol;
}

std::optional<Unit> readUnit(std::string_view symbol) {
  const std::string_view bare = withoutBrackets(symbol);
  if (bare.empty()) return std::nullopt;
  if (const auto unit = unitFromSymbol(bare)) return unit;
  const std::string plain = folded(bare);
  if (const auto unit = unitFromSymbol(withoutBrackets(plain))) return unit;
  std::string spelled = replaced(std::string(withoutBrackets(plain)), "_per_", "/");
  spelled = replaced(spelled, " per ", "/");
  spelled = replaced(replaced(spelled, "_", "/"), " / ", "/");
  if (spelled.ends_with('.')) spelled.pop_back();
  return unitFromSymbol(spelled);
}

NameAndUnit splitNameAndUnit(std::string_view heading) {
  const std::string written = withSingleBlanks(heading);
  if (const auto unit = readUnit(written)) {
    const auto role = roleOfName(written);
    if (!role || quantityOf(*role) == unit->quantity) {
      return {written, std::string(withoutBrackets(written))};
    }
  }
  const std::string tidy = withPlainBrackets(written);
  if (const auto found = inBrackets(tidy)) return *found;
  if (const auto found = behindSeparator(tidy)) return *found;
  // "Water Temp, °C (serial 1024)": a last bracket that holds no unit hides one before it.
  if (const std::size_t open = tidy.rfind('('); open != tidy.npos && tidy.ends_with(')')) {
    const auto found = behindSeparator(trimmed(std::string_view(tidy).substr(0, open)));
    if (found) return {found->name + " " + tidy.substr(open), found->unit};
  }
  return {written, {}};
}

std::string columnLabel(std::string_view name, std::size_t number) {
  return name.empty() ? std::to_string(number) : std::string(name);
}

Quantity quantityOf(Role role) {
  switch (role) {
    case Role::Time:
      return Quantity::Time;
    case Role::Displacement:
      return Quantity::Length;
    case Role::Force:
      return Quantity::Force;
    case Role::Velocity:
      return Quantity::Velocity;
    case Role::Temperature:
      return Quantity::Temperature;
    case Role::Other:
      break;
  }
  return Quantity::None;
}

}  // namespace dampwright
