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
  const std::string written = replaced(line.text, "：", ":");
  const std::string_view text = withoutCommentMark(written);
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

// Parted by "|", as `folded` makes them; English, German, French, Italian, Spanish, Portuguese,
// Dutch, Japanese, Chinese.
struct RateWords {
  std::string_view words;
  bool interval = false;
};

constexpr std::array rateWords{
    RateWords{"sample rate|samplerate|sampling rate|sampling frequency|sample frequency|data "
              "rate|scan rate|acquisition rate|logging rate|fs",
              false},
    RateWords{"abtastrate|abtastfrequenz|messrate|messfrequenz|samplingrate", false},
    RateWords{"frequence d'echantillonnage|frequence d'acquisition|taux d'echantillonnage|freq. "
              "d'echantillonnage|cadence d'acquisition",
              false},
    RateWords{"frequenza di campionamento|freq. di campionamento|frequenza campionamento|frequenza "
              "di acquisizione|velocita di campionamento",
              false},
    RateWords{
        "frecuencia de muestreo|tasa de muestreo|velocidad de muestreo|frecuencia de adquisicion",
        false},
    RateWords{
        "frequencia de amostragem|taxa de amostragem|taxa de aquisicao|frequencia de aquisicao",
        false},
    RateWords{"bemonsteringsfrequentie|samplefrequentie|meetfrequentie|bemonsteringssnelheid",
              false},
    RateWords{
        "サンプリング周波数|サンプリングレート|サンプル周波数|サンプルレート|サンプリング速度",
        false},
    RateWords{"采样频率|采样率|采样速率|採樣頻率|採樣率|取樣頻率|取樣率", false},
    RateWords{"sample interval|sampling interval|sample time|sampling time|sample period|sampling "
              "period|time step|time increment|scan interval|delta_x|delta t|dt",
              true},
    RateWords{"abtastintervall|abtastzeit|zeitschritt|messintervall", true},
    RateWords{"periode d'echantillonnage|intervalle d'echantillonnage|pas de temps", true},
    RateWords{"periodo di campionamento|intervallo di campionamento|tempo di campionamento|passo "
              "temporale",
              true},
    RateWords{"periodo de muestreo|intervalo de muestreo|tiempo de muestreo", true},
    RateWords{"periodo de amostragem|intervalo de amostragem|tempo de amostragem", true},
    RateWords{"bemonsteringsinterval|sampletijd|meetinterval|tijdstap", true},
    RateWords{"サンプリング周期|サンプリング間隔|サンプル間隔|サンプリング時間", true},
    RateWords{"采样间隔|采样周期|采样时间|採樣間隔|採樣週期|取樣間隔|取樣週期", true},
};

// A word of two letters must be the whole name.
bool namesRate(std::string_view list, const std::string& name, const std::string& whole) {
  while (!list.empty()) {
    const std::size_t end = std::min(list.find('|'), list.size());
    const std::string_view word = list.substr(0, end);
    const bool found =
        word.size() <= 2 ? name == word || whole == word : whole.find(word) != whole.npos;
    if (found) return true;
    list.remove_prefix(std::min(end + 1, list.size()));
  }
  return false;
}

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

constexpr std::array<std::string_view, 14> perSecond{"hz",
                                                     "hertz",
                                                     "1/s",
                                                     "s-1",
                                                     "s/s",
                                                     "sps",
                                                     "samples/s",
                                                     "samples/sec",
                                                     "samples per second",
                                                     "s/sec",
                                                     "/s",
                                                     "ヘルツ",
                                                     "赫兹",
                                                     "赫茲"};

std::optional<double> rateOf(const Amount& amount, const std::string& keyUnit, bool interval) {
  const std::string symbol = amount.unit.empty() ? keyUnit : amount.unit;
  const std::string lower = folded(symbol);
  double value = amount.value;
  if (interval) {
    const auto unit = readUnit(symbol.empty() ? "s" : symbol);
    if (!unit || unit->quantity != Quantity::Time) return std::nullopt;
    value = 1 / unit->toSi(value);
  } else if (lower == "khz" || lower == "ks/s") {
    value *= 1000;
  } else if (!lower.empty() && std::ranges::find(perSecond, lower) == perSecond.end()) {
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
    const std::string name = folded(named.name), whole = folded(key);
    for (const RateWords& row : rateWords) {
      const bool found = namesRate(row.words, name, whole);
      const auto amount = found ? amountIn(value) : std::nullopt;
      if (!amount) continue;
      if (const auto rate = rateOf(*amount, named.unit, row.interval)) return rate;
    }
  }
  return std::nullopt;
}

}  // namespace dampwright
