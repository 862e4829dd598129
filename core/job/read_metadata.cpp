// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/read_metadata.h"

#include <algorithm>
#include <array>
#include <charconv>
#include <optional>
#include <string_view>

#include "core/job/words_of.h"

namespace dampwright {

namespace {

bool isOneOf(std::string_view word, std::initializer_list<std::string_view> list) {
  return std::ranges::find(list, word) != list.end();
}

bool tellsSetting(const std::vector<std::string>& words) {
  return std::ranges::any_of(words, [](const std::string& word) {
    return isOneOf(word, {"click", "clicks", "setting", "settings", "adjuster", "klicks"});
  });
}

// The adjuster that is meant, in the words of damper cards; "low speed compression" keeps its
// speed.
std::string adjusterIn(const std::vector<std::string>& words) {
  std::string speed, side;
  for (const std::string& word : words) {
    if (isOneOf(word, {"low", "high"})) speed = word + " speed ";
    if (isOneOf(word, {"rebound", "zugstufe"})) side = "rebound";
    if (isOneOf(word, {"compression", "bump", "druckstufe"})) side = "compression";
  }
  return side.empty() ? std::string() : speed + side;
}

std::optional<double> numberOf(const std::string& word) {
  double value = 0;
  const auto [end, code] = std::from_chars(word.data(), word.data() + word.size(), value);
  if (code != std::errc() || end != word.data() + word.size()) return std::nullopt;
  return value;
}

// "rebound 8, compression 4": each number belongs to the adjuster named before it; a number without
// one belongs to `adjuster`.
void readValues(std::string adjuster, std::string_view text, std::vector<SettingValue>& found) {
  std::vector<std::string> words;
  for (const std::string& word : wordsOf(text)) {
    const std::optional<double> value = numberOf(word);
    if (!value) {
      words.push_back(word);
      continue;
    }
    if (std::string named = adjusterIn(words); !named.empty()) adjuster = std::move(named);
    words.clear();
    const std::string name = adjuster.empty() ? "adjuster" : adjuster;
    if (std::ranges::find(found, name, &SettingValue::adjuster) == found.end()) {
      found.push_back({name, *value});
    }
  }
}

}  // namespace

std::vector<SettingValue> settingOf(const Metadata& metadata) {
  std::vector<SettingValue> found;
  for (const auto& [key, value] : metadata) {
    const std::vector<std::string> words = wordsOf(key);
    if (tellsSetting(words)) readValues(adjusterIn(words), value, found);
  }
  std::ranges::sort(found, {}, &SettingValue::adjuster);
  return found;
}

std::string serialOf(const Metadata& metadata) {
  for (const auto& [key, value] : metadata) {
    const std::vector<std::string> words = wordsOf(key);
    const bool initials =
        words == std::vector<std::string>{"s", "n"} || words == std::vector<std::string>{"sn"};
    const bool rig = std::ranges::any_of(words, [](const std::string& word) {
      return isOneOf(word, {"rig", "bench", "cell", "sensor", "load", "instrument"});
    });
    const bool serial = std::ranges::any_of(words, [](const std::string& word) {
      return isOneOf(word, {"serial", "seriennummer", "serialnumber"});
    });
    if ((initials || serial) && !rig && !value.empty()) return value;
  }
  return {};
}

}  // namespace dampwright
