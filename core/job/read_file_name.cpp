// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/read_file_name.h"

#include <algorithm>
#include <array>
#include <charconv>

#include "core/job/words_of.h"

namespace dampwright {
namespace {

constexpr double mostClicks = 99;

// One word of a name, and what it was understood as.
struct NameWord {
  std::string text;
  std::optional<double> number;
  bool used = false;
};

std::string_view withoutSuffix(std::string_view name) {
  const std::size_t point = name.rfind('.');
  const bool suffix = point != name.npos && point > 0 && point + 1 < name.size() &&
                      (name[point + 1] < '0' || name[point + 1] > '9');
  return suffix ? name.substr(0, point) : name;
}

std::optional<double> numberOf(const std::string& word) {
  double value = 0;
  const auto [end, code] = std::from_chars(word.data(), word.data() + word.size(), value);
  if (code != std::errc() || end != word.data() + word.size()) return std::nullopt;
  return value;
}

// "0.1" is one number, although a point parts words.
std::vector<NameWord> wordsOfName(std::string_view fileName) {
  const std::string_view name = withoutSuffix(fileName);
  std::vector<NameWord> words;
  std::size_t from = 0;
  const auto digit = [&](std::size_t i) {
    return i < name.size() && name[i] >= '0' && name[i] <= '9';
  };
  const auto addPlain = [&](std::string_view text) {
    for (const std::string& word : wordsOf(text)) words.push_back({word, numberOf(word)});
  };
  for (std::size_t i = 0; i < name.size(); ++i) {
    if (!digit(i)) continue;
    std::size_t end = i;
    while (digit(end) || ((name[end] == '.' || name[end] == ',') && digit(end + 1))) ++end;
    addPlain(name.substr(from, i - from));
    std::string number(name.substr(i, end - i));
    std::ranges::replace(number, ',', '.');
    words.push_back({number, numberOf(number)});
    from = end;
    i = end - 1;
    if (end >= name.size()) break;
  }
  addPlain(name.substr(from));
  return words;
}

struct SpeedUnit {
  std::array<std::string_view, 2> words;  ///< the second may be empty
  double metresPerSecond;
};
constexpr auto speedUnits = std::to_array<SpeedUnit>({{{"mm", "s"}, 1e-3},
                                                      {{"mm", "sec"}, 1e-3},
                                                      {{"mms", ""}, 1e-3},
                                                      {{"mmps", ""}, 1e-3},
                                                      {{"m", "s"}, 1},
                                                      {{"ms", ""}, 1},
                                                      {{"mps", ""}, 1},
                                                      {{"in", "s"}, 0.0254},
                                                      {{"ips", ""}, 0.0254}});

bool stands(const std::vector<NameWord>& words, std::size_t i, std::string_view text) {
  return i < words.size() && words[i].text == text;
}

std::optional<double> takeSpeed(std::vector<NameWord>& words) {
  for (std::size_t i = 0; i < words.size(); ++i) {
    if (!words[i].number) continue;
    for (const SpeedUnit& unit : speedUnits) {
      const bool two = !unit.words[1].empty();
      if (!stands(words, i + 1, unit.words[0]) || (two && !stands(words, i + 2, unit.words[1])))
        continue;
      for (std::size_t k = i; k <= i + (two ? 2 : 1); ++k) words[k].used = true;
      return *words[i].number * unit.metresPerSecond;
    }
  }
  return std::nullopt;
}

std::string adjusterOf(std::string_view word) {
  constexpr std::array<std::string_view, 5> rebound{
      "rebound", "reb", "zugstufe", "detente", "rebote"};
  constexpr std::array<std::string_view, 6> compression{
      "compression", "comp", "bump", "druckstufe", "compresion", "compressione"};
  if (std::ranges::find(rebound, word) != rebound.end()) return "rebound";
  return std::ranges::find(compression, word) != compression.end() ? "compression" : "";
}

bool isClickWord(const std::vector<NameWord>& words, std::size_t i) {
  constexpr std::array<std::string_view, 6> clicks{
      "click", "clicks", "klick", "klicks", "clics", "clk"};
  return i < words.size() && std::ranges::find(clicks, words[i].text) != clicks.end();
}

bool isPosition(const NameWord& word) {
  return word.number && !word.used && *word.number >= 0 && *word.number <= mostClicks;
}

// "R12 C4", in either order.
std::vector<SettingValue> takeLetters(std::vector<NameWord>& words) {
  for (std::size_t i = 0; i + 3 < words.size(); ++i) {
    const bool pair = (stands(words, i, "r") && stands(words, i + 2, "c")) ||
                      (stands(words, i, "c") && stands(words, i + 2, "r"));
    if (!pair || !isPosition(words[i + 1]) || !isPosition(words[i + 3])) continue;
    for (std::size_t k = i; k < i + 4; ++k) words[k].used = true;
    const bool reboundFirst = words[i].text == "r";
    return {{"compression", *words[i + (reboundFirst ? 3 : 1)].number},
            {"rebound", *words[i + (reboundFirst ? 1 : 3)].number}};
  }
  return {};
}

std::vector<SettingValue> takeSetting(std::vector<NameWord>& words) {
  std::vector<SettingValue> setting = takeLetters(words);
  for (std::size_t i = 0; i < words.size() && setting.size() < 4; ++i) {
    if (!isPosition(words[i])) continue;
    std::string adjuster = i > 0 ? adjusterOf(words[i - 1].text) : "";
    const bool clicks = isClickWord(words, i + 1) || (i > 0 && isClickWord(words, i - 1));
    if (adjuster.empty() && !clicks) continue;
    words[i].used = true;
    if (!adjuster.empty()) words[i - 1].used = true;
    if (isClickWord(words, i + 1)) words[i + 1].used = true;
    if (adjuster.empty()) adjuster = "adjuster";
    if (std::ranges::find(setting, adjuster, &SettingValue::adjuster) == setting.end()) {
      setting.push_back({adjuster, *words[i].number});
    }
  }
  std::ranges::sort(setting, {}, &SettingValue::adjuster);
  return setting;
}

}  // namespace

std::vector<SettingValue> settingInName(std::string_view fileName) {
  std::vector<NameWord> words = wordsOfName(fileName);
  takeSpeed(words);
  return takeSetting(words);
}

std::optional<double> speedInName(std::string_view fileName) {
  std::vector<NameWord> words = wordsOfName(fileName);
  return takeSpeed(words);
}

std::string stemOfName(std::string_view fileName) {
  std::vector<NameWord> words = wordsOfName(fileName);
  takeSpeed(words);
  takeSetting(words);
  std::erase_if(words, [](const NameWord& word) { return word.used; });
  if (words.size() > 1 && words.back().number) words.pop_back();
  std::string stem;
  for (const NameWord& word : words) stem += (stem.empty() ? "" : " ") + word.text;
  return stem;
}

}  // namespace dampwright
