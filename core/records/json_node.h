// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <map>
#include <string>
#include <string_view>
#include <variant>
#include <vector>

#include "core/base/result.h"

namespace dampwright {

/// A value of a JSON text that remembers its line, so that an error can point at it.
struct JsonNode {
  using List = std::vector<JsonNode>;
  using Object = std::map<std::string, JsonNode, std::less<>>;

  std::variant<std::monostate, bool, double, std::string, List, Object> value;
  std::int64_t row = 0;   ///< line from 1
  std::size_t order = 0;  ///< rises in the order of the text

  bool isNull() const { return std::holds_alternative<std::monostate>(value); }
  const Object* object() const { return std::get_if<Object>(&value); }
  const List* list() const { return std::get_if<List>(&value); }
};

inline constexpr std::size_t largestDocument = 64u << 20;  ///< [bytes] 64 MB
inline constexpr std::size_t deepestNesting = 64;
inline constexpr std::size_t mostValues = 2'000'000;  ///< keeps a hostile text from filling memory

/// Parses RFC 8259 JSON, UTF-8, strictly: no comments, nothing behind the value, no repeated key.
/// `file` only names the place. Errors, with row: document-too-large, document-too-deep,
/// document-repeated-key, document-not-json (bad UTF-8 and numbers past the range of a double too).
Result<JsonNode> parseJson(std::string_view bytes, std::string_view file);

}  // namespace dampwright
