// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <cstdint>
#include <functional>
#include <initializer_list>
#include <limits>
#include <nlohmann/json_fwd.hpp>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

#include "core/base/result.h"
#include "core/records/json_node.h"

namespace dampwright {

/// What a number of a document may be; `rule` is what an error prints.
struct Range {
  double low = -std::numeric_limits<double>::infinity();
  double high = std::numeric_limits<double>::infinity();
  std::string_view rule;
};
inline constexpr Range anyNumber{};
inline constexpr Range positive{
    std::numeric_limits<double>::denorm_min(), std::numeric_limits<double>::infinity(), "> 0"};
inline constexpr Range notNegative{0, std::numeric_limits<double>::infinity(), ">= 0"};

/// A word of a document and what it means inside.
template <class E>
struct Word {
  std::string_view text;
  E value;
};

/// Whether a key may be left out. In settings that people write it may (the default stands, and
/// `null` says the same); in results it may not (`null` says "not determined" there).
enum class Keys { Optional, Required };

/// Whether the names of an object say units (parameters of a law) or are a person's own words.
enum class NameUnits { InName, None };

/// One object of a document, on its way in or out. The same list of calls reads and writes, so the
/// two cannot drift apart. Numbers are SI inside; the end of the key says the document's unit
/// (key_unit.h). The first thing wrong is kept with its path, row and rule; nothing throws.
class Fields {
 public:
  /// What the objects of one document share while it is read.
  struct Problem {
    std::string file;
    std::optional<Error> error;  ///< the first
  };

  Fields(const JsonNode& node, Problem& problem) : node_(&node), problem_(&problem) {}
  explicit Fields(nlohmann::ordered_json& out) : out_(&out) {}

  bool reading() const { return node_ != nullptr; }
  void require(Keys keys) { keys_ = keys; }  ///< for the calls that follow and objects inside

  void text(std::string_view key, std::string& value);  ///< empty stands for null
  void text(std::string_view key, std::optional<std::string>& value);
  void date(std::string_view key, std::string& value);  ///< text, empty or YYYY-MM-DD…
  void flag(std::string_view key, bool& value);
  void number(std::string_view key, double& si, const Range& range = anyNumber);
  void number(std::string_view key, std::optional<double>& si, const Range& range = anyNumber);
  /// A whole number >= 0.
  template <class Whole>
  void count(std::string_view key, Whole& value) {
    std::optional<double> whole = double(value);
    wholeNumber(key, whole, double(std::numeric_limits<Whole>::max()));
    if (whole) value = static_cast<Whole>(*whole);
  }
  template <class Whole>
  void count(std::string_view key, std::optional<Whole>& value) {
    std::optional<double> whole = value ? std::optional<double>(double(*value)) : std::nullopt;
    wholeNumber(key, whole, double(std::numeric_limits<Whole>::max()));
    value = whole ? std::optional<Whole>(static_cast<Whole>(*whole)) : std::nullopt;
  }
  void counts(std::string_view key, std::vector<std::int64_t>& values);
  void texts(std::string_view key, std::vector<std::string>& values);
  void numbers(std::string_view key, std::vector<double>& values);

  /// Names and texts, or names and numbers, in their order. A name that comes twice is written with
  /// " (2)" behind it.
  void textByName(std::string_view key, std::vector<std::pair<std::string, std::string>>& values);
  void numberByName(std::string_view key,
                    std::vector<std::pair<std::string, double>>& values,
                    NameUnits units);

  /// Something that follows from the rest: written for the reader's sake, not read.
  void derived(std::string_view key, const std::string& value);
  void derived(std::string_view key, double si);

  /// One of the words, or empty.
  void word(std::string_view key, std::string& value, std::span<const std::string_view> allowed);
  void word(std::string_view key,
            std::string& value,
            std::initializer_list<std::string_view> allowed) {
    word(key, value, std::span<const std::string_view>(allowed.begin(), allowed.size()));
  }

  template <class E, std::size_t N>
  void word(std::string_view key, std::optional<E>& value, const std::array<Word<E>, N>& words) {
    std::array<std::string_view, N> texts;
    std::optional<std::size_t> index;
    for (std::size_t i = 0; i < N; ++i) {
      texts[i] = words[i].text;
      if (value && *value == words[i].value) index = i;
    }
    index = wordIndex(key, index, texts);
    if (reading()) value = index ? std::optional<E>(words[*index].value) : std::nullopt;
  }

  template <class E, std::size_t N>
  void word(std::string_view key, E& value, const std::array<Word<E>, N>& words) {
    std::optional<E> maybe = value;
    word(key, maybe, words);
    if (maybe) value = *maybe;
  }

  /// An object inside this one; left alone where it is absent or null.
  void object(std::string_view key, const std::function<void(Fields&)>& describe);

  template <class T, class Describe>
  void object(std::string_view key, std::optional<T>& value, Describe describe) {
    if (!openOptional(key, value.has_value())) {
      value.reset();
      return;
    }
    if (reading()) value.emplace();
    object(key, [&](Fields& inside) { describe(inside, *value); });
  }

  template <class T, class Describe>
  void list(std::string_view key, std::vector<T>& items, Describe describe) {
    const std::size_t size = openList(key, items.size());
    if (reading()) items.resize(size);
    for (std::size_t i = 0; i < size; ++i)
      item(key, i, [&](Fields& inside) { describe(inside, items[i]); });
  }

  /// For rules that hold between several keys: the object itself is wrong. Reading only.
  void complain(const std::string& code, Values values);

  /// To be called after the last key: every key that nobody asked for is unknown.
  void finish();

 private:
  const JsonNode* find(std::string_view key);
  const JsonNode* findPresent(std::string_view key);
  std::optional<std::string> textAt(std::string_view key);
  std::optional<double> numberAt(std::string_view key, const Range& range);
  void wholeNumber(std::string_view key, std::optional<double>& value, double most);
  const JsonNode::List* listAt(std::string_view key);
  const JsonNode::Object* objectAt(std::string_view key);
  std::optional<std::size_t> wordIndex(std::string_view key,
                                       std::optional<std::size_t> index,
                                       std::span<const std::string_view> words);
  bool openOptional(std::string_view key, bool present);
  std::size_t openList(std::string_view key, std::size_t size);
  void item(std::string_view key, std::size_t index, const std::function<void(Fields&)>& describe);
  void error(const std::string& code, std::string_view key, Values values, std::int64_t row);
  void valueError(const std::string& code, std::string_view key, const JsonNode& node, Values more);
  void writeNumber(std::string_view key, double si);
  std::string pathOf(std::string_view key) const;

  const JsonNode* node_ = nullptr;         // what is read, or
  nlohmann::ordered_json* out_ = nullptr;  // what is written
  Problem* problem_ = nullptr;
  std::string path_;
  Keys keys_ = Keys::Optional;
  std::vector<std::string> asked_;
  bool weak_ = false;  // the problem may come from a misspelt key of this object
};

/// "one", "two", "three": how an error lists words.
std::string quoted(std::span<const std::string_view> words);

/// A document: its name behind "dampwright ", and the highest version that this program knows.
struct DocumentKind {
  std::string_view name;
  int version = 1;
};

/// Reads the bytes as a document of this kind; `describe(fields, value)` lists its keys.
Result<Done> readDocument(std::string_view bytes,
                          std::string_view file,
                          const DocumentKind& kind,
                          const std::function<void(Fields&)>& describe);

/// The document's text, indented by two, with a line end at its end.
std::string writeDocument(const DocumentKind& kind, const std::function<void(Fields&)>& describe);

}  // namespace dampwright
