// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/suggest_corner.h"

#include <algorithm>
#include <array>

#include "core/job/words_of.h"

namespace dampwright {

namespace {

// What one word says of a place; an empty part is not said.
struct PlaceWord {
  std::string_view word, axle, side;
};

constexpr std::array placeWords = std::to_array<PlaceWord>({
    {"front", "front", ""},       {"vorn", "front", ""},    {"vorne", "front", ""},
    {"vorderachse", "front", ""}, {"avant", "front", ""},   {"fork", "front", ""},
    {"rear", "rear", ""},         {"hinten", "rear", ""},   {"hinterachse", "rear", ""},
    {"arriere", "rear", ""},      {"left", "", "left"},     {"links", "", "left"},
    {"gauche", "", "left"},       {"right", "", "right"},   {"rechts", "", "right"},
    {"droite", "", "right"},      {"fl", "front", "left"},  {"lf", "front", "left"},
    {"vl", "front", "left"},      {"avg", "front", "left"}, {"fr", "front", "right"},
    {"rf", "front", "right"},     {"vr", "front", "right"}, {"avd", "front", "right"},
    {"rl", "rear", "left"},       {"lr", "rear", "left"},   {"hl", "rear", "left"},
    {"arg", "rear", "left"},      {"rr", "rear", "right"},  {"hr", "rear", "right"},
    {"ard", "rear", "right"},
});

constexpr std::array positionKeys = std::to_array<std::string_view>(
    {"position", "corner", "place", "location", "axle", "side", "einbauort", "achse", "seite"});

struct Said {
  std::vector<std::string_view> axles, sides;
  bool onlyPlaces = true;  // every word was a place word
};

void add(std::vector<std::string_view>& list, std::string_view word) {
  if (!word.empty() && std::ranges::find(list, word) == list.end()) list.push_back(word);
}

const PlaceWord* findWord(std::string_view word) {
  const auto found = std::ranges::find(placeWords, word, &PlaceWord::word);
  return found == placeWords.end() ? nullptr : &*found;
}

// "frontleft" is two words that lost their gap.
std::array<const PlaceWord*, 2> places(std::string_view word) {
  if (const PlaceWord* whole = findWord(word)) return {whole, nullptr};
  for (std::size_t cut = 4; cut + 4 <= word.size(); ++cut) {
    const PlaceWord* first = findWord(word.substr(0, cut));
    const PlaceWord* second = findWord(word.substr(cut));
    if (first != nullptr && second != nullptr) return {first, second};
  }
  return {nullptr, nullptr};
}

Said placesIn(std::string_view text) {
  Said said;
  for (const std::string& word : wordsOf(text)) {
    const auto [first, second] = places(word);
    if (first == nullptr) said.onlyPlaces = false;
    for (const PlaceWord* place : {first, second}) {
      if (place == nullptr) continue;
      add(said.axles, place->axle);
      add(said.sides, place->side);
    }
  }
  return said;
}

// A corner's own words must all be said, and nothing against them.
std::optional<std::string> cornerOf(const Said& said, const std::vector<std::string>& corners) {
  if (said.axles.size() > 1 || said.sides.size() > 1) return std::nullopt;
  for (const std::string& corner : corners) {
    const Said own = placesIn(corner);
    const bool axle = !own.axles.empty() && own.axles == said.axles;
    const bool side = own.sides.empty() || own.sides == said.sides;
    if (axle && side) return corner;
  }
  return std::nullopt;
}

std::string positionLines(const Metadata& metadata) {
  std::string joined;
  for (const auto& [key, value] : metadata) {
    const std::vector<std::string> words = wordsOf(key);
    const bool tells = std::ranges::any_of(words, [](const std::string& word) {
      return std::ranges::find(positionKeys, word) != positionKeys.end();
    });
    if (tells) joined += " " + value;
  }
  return joined;
}

}  // namespace

std::optional<std::string> cornerFromWords(std::string_view words,
                                           const std::vector<std::string>& corners) {
  const std::string given(words);
  if (std::ranges::find(corners, given) != corners.end()) return given;
  return cornerOf(placesIn(words), corners);
}

std::optional<std::string> suggestCorner(std::string_view fileName,
                                         const Metadata& metadata,
                                         const std::vector<std::string>& corners) {
  if (corners.size() == 1) return corners.front();
  if (auto corner = cornerFromWords(positionLines(metadata), corners)) return corner;
  if (auto corner = cornerFromWords(fileName.substr(0, fileName.rfind('.')), corners)) {
    return corner;
  }
  for (const auto& [key, value] : metadata) {
    for (const std::string& line : {value, key}) {
      const Said said = placesIn(line);
      if (!said.onlyPlaces) continue;
      if (auto corner = cornerOf(said, corners)) return corner;
    }
  }
  return std::nullopt;
}

}  // namespace dampwright
