// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/metadata.h"

#include <algorithm>
#include <array>
#include <cctype>
#include <cmath>

#include "core/intake/letters.h"
#include "core/intake/name_and_unit.h"
#include "core/intake/number_form.h"
#include "core/intake/split_row.h"

namespace dampwright {
namespace {

using Entry = std::pair<std::string, std::string>;

bool hasLetter(std::string_view text) {
  return std::any_of(text.begin(), text.end(), [](char letter) {
    return std::isalpha(static_cast<unsigned char>(letter)) != 0 || (letter & 0x80) != 0;
  });
}

std::string_view withoutCommentMark(std::string_view line) {
  line = trimmed(line);
  while (line.starts_with('#') || line.starts_with('%')) line.remove_prefix(1);
  if (line.starts_with("//")) line.remove_prefix(2);
  return trimmed(line);
}

// "15:55" is no key, "Time: 15:55" is one: behind the sign stands a blank, the end, or no digit.
std::optional<Entry> atSign(std::string_view line) {
  for (std::size_t at = line.find_first_of(":="); at < line.size();
       at = line.find_first_of(":=", at + 1)) {
    const std::string_view key = trimmed(line.substr(0, at));
    if (key.empty() || !hasLetter(key)) return std::nullopt;
    const bool clock = line[at] == ':' &&
                       std::isdigit(static_cast<unsigned char>(key.back())) != 0 &&
                       at + 1 < line.size() && !isBlank(line[at + 1]);
    if (!clock) return Entry{std::string(key), std::string(trimmed(line.substr(at + 1)))};
  }
  return std::nullopt;
}

std::string keyText(const Cell& cell) {
  std::string key = plainText(cell);
  while (looksLikeKey(key))
    key = std::string(trimmed(std::string_view(key).substr(0, key.size() - 1)));
  return key;
}

std::optional<Entry> ofCells(std::string_view line, char delimiter) {
  const auto cells = splitRow(line, delimiter);
  if (cells.size() < 2 || !hasLetter(cells.front().text)) return std::nullopt;
  Entry entry{keyText(cells.front()), {}};
  for (std::size_t i = 1; i < cells.size(); ++i) {
    const std::string value = plainText(cells[i]);
    if (value.empty()) continue;
    entry.second += entry.second.empty() ? value : "; " + value;
  }
  return entry.second.empty() ? std::nullopt : std::optional(entry);
}

Entry entryOf(const Line& line, char delimiter) {
  const std::string_view text = withoutCommentMark(line.text);
  const auto cells = splitRow(text, delimiter);
  const bool keyCell = cells.size() > 1 && looksLikeKey(plainText(cells.front()));
  const std::string whole = plainText(splitRow(text, '\n').front());
  if (!keyCell) {
    if (auto entry = atSign(whole)) return *entry;
  }
  for (const char between : {delimiter, '\t', ';', ','}) {
    if (between == blanksDelimiter) continue;
    if (auto entry = ofCells(text, between)) return *entry;
  }
  return {"line " + std::to_string(line.number), whole};
}

std::string unusedKey(const Metadata& metadata, const std::string& key) {
  const auto taken = [&](const std::string& name) {
    return std::any_of(
        metadata.begin(), metadata.end(), [&](const Entry& entry) { return entry.first == name; });
  };
  std::string name = key;
  for (int n = 2; taken(name); ++n) name = key + " (" + std::to_string(n) + ")";
  return name;
}

struct RateWord {
  std::string_view word;
  bool interval = false;
};

constexpr std::array rateWords{
    RateWord{"sample rate", false},
    RateWord{"samplerate", false},
    RateWord{"sampling rate", false},
    RateWord{"sampling frequency", false},
    RateWord{"sample frequency", false},
    RateWord{"data rate", false},
    RateWord{"abtastrate", false},
    RateWord{"abtastfrequenz", false},
    RateWord{"messrate", false},
    RateWord{"fs", false},
    RateWord{"sample interval", true},
    RateWord{"sampling interval", true},
    RateWord{"sample time", true},
    RateWord{"sampling time", true},
    RateWord{"sample period", true},
    RateWord{"time step", true},
    RateWord{"delta_x", true},
    RateWord{"delta t", true},
    RateWord{"dt", true},
    RateWord{"abtastintervall", true},
    RateWord{"abtastzeit", true},
    RateWord{"zeitschritt", true},
};

// A number with its unit behind it: "2000", "2 kHz", "0,5 ms".
struct Amount {
  double value = 0;
  std::string unit;
};

std::optional<Amount> amountIn(std::string_view text) {
  text = trimmed(text.substr(0, text.find(';')));
  const std::size_t end = std::min(text.find_first_not_of("+-0123456789.,eE"), text.size());
  const std::string_view number = text.substr(0, end);
  const NumberLook look = lookAtNumber(number);
  const NumberForm form{look.decimal == ',' ? ',' : '.', look.thousands};
  const auto value = parseNumber(number, form);
  if (!value) return std::nullopt;
  return Amount{*value, std::string(trimmed(text.substr(end)))};
}

std::optional<double> rateOf(const Amount& amount, const std::string& keyUnit, bool interval) {
  const std::string symbol = amount.unit.empty() ? keyUnit : amount.unit;
  const std::string lower = lowered(symbol);
  double value = amount.value;
  if (interval) {
    const auto unit = readUnit(symbol.empty() ? "s" : symbol);
    if (!unit || unit->quantity != Quantity::Time) return std::nullopt;
    value = 1 / unit->toSi(value);
  } else if (lower == "khz" || lower == "ks/s") {
    value *= 1000;
  } else if (!lower.empty() && lower != "hz" && lower != "1/s" && lower != "s/s" &&
             lower != "samples/s") {
    return std::nullopt;
  }
  return std::isfinite(value) && value > 0 ? std::optional(value) : std::nullopt;
}

}  // namespace

bool looksLikeKey(std::string_view cell) { return cell.ends_with(':') || cell.ends_with('='); }

Metadata readMetadata(std::span<const Line> lines, char delimiter) {
  Metadata metadata;
  for (const Line& line : lines) {
    if (trimmed(line.text).empty()) continue;
    Entry entry = entryOf(line, delimiter);
    if (entry.first.empty() || (entry.second.empty() && entry.first.starts_with("line "))) continue;
    entry.first = unusedKey(metadata, entry.first);
    metadata.push_back(std::move(entry));
  }
  return metadata;
}

std::optional<double> sampleRateIn(const Metadata& metadata) {
  for (const auto& [key, value] : metadata) {
    const NameAndUnit named = splitNameAndUnit(key);
    const std::string name = lowered(named.name), whole = lowered(key);
    for (const RateWord& row : rateWords) {
      const bool found = row.word.size() <= 2 ? name == row.word || whole == row.word
                                              : whole.find(row.word) != whole.npos;
      const auto amount = found ? amountIn(value) : std::nullopt;
      if (!amount) continue;
      if (const auto rate = rateOf(*amount, named.unit, row.interval)) return rate;
    }
  }
  return std::nullopt;
}

}  // namespace dampwright
