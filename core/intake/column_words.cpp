// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/column_words.h"

#include <algorithm>
#include <array>
#include <string>
#include <vector>

#include "core/intake/letters.h"

namespace dampwright {
namespace {

enum class Where {
  Anywhere,  ///< also inside a longer word ("Kolbenweg")
  Tail,      ///< a word ends with it ("Radlast")
  Alone,     ///< a word of its own ("pos")
  Whole      ///< all there is ("t")
};

struct ColumnWord {
  std::string_view word;  ///< lower case
  Role role;
  Where where = Where::Anywhere;
};

// English and German. Other: the column is none that a damper run needs.
constexpr ColumnWord words[] = {
    {"time", Role::Time},
    {"elapsed", Role::Time},
    {"seconds", Role::Time, Where::Alone},
    {"sec", Role::Time, Where::Alone},
    {"clock", Role::Time, Where::Alone},
    {"t", Role::Time, Where::Whole},
    {"zeit", Role::Time},
    {"sekunden", Role::Time, Where::Alone},

    {"displ", Role::Displacement},
    {"disp", Role::Displacement, Where::Alone},
    {"position", Role::Displacement},
    {"pos", Role::Displacement, Where::Alone},
    {"travel", Role::Displacement},
    {"stroke", Role::Displacement},
    {"deflection", Role::Displacement},
    {"extension", Role::Displacement},
    {"compression", Role::Displacement},
    {"lvdt", Role::Displacement},
    {"x", Role::Displacement, Where::Whole},
    {"weg", Role::Displacement},
    {"hub", Role::Displacement, Where::Tail},
    {"auslenkung", Role::Displacement},
    {"einfederung", Role::Displacement},
    {"ausfederung", Role::Displacement},
    {"verschiebung", Role::Displacement},

    {"force", Role::Force},
    {"load", Role::Force},
    {"f", Role::Force, Where::Whole},
    {"kraft", Role::Force},
    {"last", Role::Force, Where::Tail},

    {"velocity", Role::Velocity},
    {"veloc", Role::Velocity},
    {"vel", Role::Velocity, Where::Alone},
    {"speed", Role::Velocity},
    {"v", Role::Velocity, Where::Whole},
    {"geschw", Role::Velocity},

    {"temperature", Role::Temperature},
    {"temp", Role::Temperature, Where::Alone},
    {"thermo", Role::Temperature},
    {"temperatur", Role::Temperature},

    {"index", Role::Other, Where::Alone},
    {"sample", Role::Other, Where::Alone},
    {"samples", Role::Other, Where::Alone},
    {"scan", Role::Other, Where::Alone},
    {"point", Role::Other, Where::Alone},
    {"count", Role::Other},
    {"cycle", Role::Other},
    {"number", Role::Other},
    {"no", Role::Other, Where::Alone},
    {"nr", Role::Other, Where::Alone},
    {"step", Role::Other, Where::Alone},
    {"pressure", Role::Other},
    {"voltage", Role::Other},
    {"current", Role::Other, Where::Alone},
    {"accel", Role::Other},
    {"acceleration", Role::Other},
    {"frequency", Role::Other},
    {"energy", Role::Other},
    {"power", Role::Other},
    {"error", Role::Other},
    {"comment", Role::Other},
    {"marker", Role::Other},
    {"zyklus", Role::Other},
    {"druck", Role::Other, Where::Tail},
    {"spannung", Role::Other},
    {"strom", Role::Other, Where::Tail},
    {"beschleunigung", Role::Other},
    {"frequenz", Role::Other},
    {"energie", Role::Other},
    {"leistung", Role::Other},
    {"regelabweichung", Role::Other},
    {"bemerkung", Role::Other},
};

constexpr std::string_view commandWords[] = {
    "command", "cmd", "setpoint", "set point", "target", "demand", "desired", "soll", "vorgabe"};

struct StrokeWord {
  std::string_view word;
  Direction direction;
};

constexpr StrokeWord strokeWords[] = {
    {"compress", Direction::Compression},
    {"bump", Direction::Compression},
    {"jounce", Direction::Compression},
    {"einfeder", Direction::Compression},
    {"druck", Direction::Compression},
    {"rebound", Direction::Rebound},
    {"extension", Direction::Rebound},
    {"ausfeder", Direction::Rebound},
    {"zug", Direction::Rebound},
};

bool isLetter(char letter) {
  return (letter >= 'a' && letter <= 'z') || static_cast<unsigned char>(letter) >= 0x80;
}

bool standsThere(std::string_view text, std::size_t at, const ColumnWord& word) {
  const std::size_t end = at + word.word.size();
  const bool starts = at == 0 || !isLetter(text[at - 1]);
  const bool ends = end == text.size() || !isLetter(text[end]);
  if (word.where == Where::Whole) return trimmed(text) == word.word;
  if (word.where == Where::Alone) return starts && ends;
  return word.where == Where::Anywhere || ends;
}

// Where the last such word ends, 0 where there is none.
std::size_t lastEndOf(const ColumnWord& word, std::string_view text) {
  for (std::size_t at = text.rfind(word.word); at != text.npos;
       at = text.rfind(word.word, at - 1)) {
    if (standsThere(text, at, word)) return at + word.word.size();
    if (at == 0) break;
  }
  return 0;
}

std::optional<Direction> onlyDirectionIn(std::string_view text) {
  std::optional<Direction> found;
  for (const StrokeWord& stroke : strokeWords) {
    if (text.find(stroke.word) == text.npos) continue;
    if (found && *found != stroke.direction) return std::nullopt;
    found = stroke.direction;
  }
  return found;
}

std::vector<std::string_view> clausesOf(std::string_view line) {
  std::vector<std::string_view> clauses;
  while (true) {
    const std::size_t end = std::min(line.find_first_of(",;|/"), line.size());
    clauses.push_back(line.substr(0, end));
    if (end == line.size()) return clauses;
    line.remove_prefix(end + 1);
  }
}

bool holds(std::string_view text, std::string_view word) { return text.find(word) != text.npos; }

}  // namespace

std::optional<Role> roleOfName(std::string_view name) {
  const std::string text = lowered(name);
  std::optional<Role> role;
  std::size_t lastEnd = 0, length = 0;
  for (const ColumnWord& word : words) {
    const std::size_t end = lastEndOf(word, text);
    if (end == 0 || end < lastEnd || (end == lastEnd && word.word.size() < length)) continue;
    role = word.role;
    lastEnd = end;
    length = word.word.size();
  }
  return role;
}

bool isCommand(std::string_view name) {
  const std::string text = lowered(name);
  return std::any_of(std::begin(commandWords), std::end(commandWords), [&](std::string_view word) {
    return holds(text, word);
  });
}

std::optional<Direction> directionOfName(std::string_view name) {
  return onlyDirectionIn(lowered(name));
}

std::optional<Direction> directionOfLine(std::string_view line) {
  const std::string text = lowered(line);
  if (holds(text, "force") || holds(text, "load") || holds(text, "kraft")) return std::nullopt;
  for (const std::string_view clause : clausesOf(text)) {
    if (!holds(clause, "positiv") || holds(clause, "negativ")) continue;
    if (const auto direction = onlyDirectionIn(clause)) return direction;
  }
  return std::nullopt;
}

}  // namespace dampwright
