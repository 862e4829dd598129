// SPDX-License-Identifier: GPL-3.0-or-later
// Words, objects and lists of core/records/fields.h, and the document around them.
#include <algorithm>
#include <nlohmann/json.hpp>

#include "core/records/fields.h"
#include "core/records/key_unit.h"

namespace dampwright {
namespace {

using OrderedJson = nlohmann::ordered_json;

constexpr std::string_view family = "dampwright ";

const JsonNode* member(const JsonNode& object, std::string_view key) {
  const auto found = object.object()->find(key);
  return found == object.object()->end() ? nullptr : &found->second;
}

// That the text is a document of this kind and of a version that this program knows.
std::optional<Error> headProblem(const JsonNode& root,
                                 const std::string& file,
                                 const DocumentKind& kind) {
  const std::string expected = std::string(family) + std::string(kind.name);
  if (!root.object()) return Error{"document-without-kind", {{"expected", expected}}, {file, 1, 0}};
  const JsonNode* name = member(root, "document");
  const auto* text = name ? std::get_if<std::string>(&name->value) : nullptr;
  if (!text || *text != expected) {
    const Place place{file, name ? name->row : root.row, 0};
    if (!text) return Error{"document-without-kind", {{"expected", expected}}, place};
    return Error{"document-of-another-kind",
                 {{"expected", expected}, {"found", text->substr(0, 60)}},
                 place};
  }
  const JsonNode* version = member(root, "version");
  const auto* number = version ? std::get_if<double>(&version->value) : nullptr;
  const Place place{file, version ? version->row : root.row, 0};
  if (!number || *number < 1) return Error{"document-without-version", {}, place};
  if (*number > kind.version) {
    return Error{"document-from-newer-program",
                 {{"version", *number}, {"known", double(kind.version)}},
                 place};
  }
  return std::nullopt;
}

}  // namespace

std::string quoted(std::span<const std::string_view> words) {
  std::string all;
  for (const std::string_view word : words)
    all.append(all.empty() ? "\"" : ", \"").append(word).append("\"");
  return all;
}

void Fields::derived(std::string_view key, const std::string& value) {
  if (!reading()) {
    (*out_)[std::string(key)] = value;
    return;
  }
  asked_.emplace_back(key);
  const JsonNode* node = member(*node_, key);
  if (node && !node->isNull() && !std::holds_alternative<std::string>(node->value))
    valueError("document-not-text", key, *node, {});
}

void Fields::derived(std::string_view key, double si) {
  if (!reading()) {
    writeNumber(key, si);
    return;
  }
  asked_.emplace_back(key);
  const JsonNode* node = member(*node_, key);
  if (node && !node->isNull() && !std::holds_alternative<double>(node->value))
    valueError("document-not-a-number", key, *node, {});
}

std::optional<std::size_t> Fields::wordIndex(std::string_view key,
                                             std::optional<std::size_t> index,
                                             std::span<const std::string_view> words) {
  std::string text = index ? std::string(words[*index]) : std::string();
  this->text(key, text);
  if (!reading() || text.empty()) return index;
  const auto found = std::find(words.begin(), words.end(), text);
  if (found != words.end()) return static_cast<std::size_t>(found - words.begin());
  valueError("document-unknown-word", key, *member(*node_, key), {{"allowed", quoted(words)}});
  return std::nullopt;
}

void Fields::word(std::string_view key,
                  std::string& value,
                  std::span<const std::string_view> allowed) {
  text(key, value);
  if (!reading() || value.empty()) return;
  if (std::find(allowed.begin(), allowed.end(), value) != allowed.end()) return;
  valueError("document-unknown-word", key, *member(*node_, key), {{"allowed", quoted(allowed)}});
}

void Fields::object(std::string_view key, const std::function<void(Fields&)>& describe) {
  if (!reading()) {
    OrderedJson& inner = (*out_)[std::string(key)] = OrderedJson::object();
    Fields inside(inner);
    describe(inside);
    return;
  }
  if (!objectAt(key)) return;
  Fields inside(*member(*node_, key), *problem_);
  inside.path_ = pathOf(key);
  inside.keys_ = keys_;
  describe(inside);
  inside.finish();
}

bool Fields::openOptional(std::string_view key, bool present) {
  if (reading()) return objectAt(key) != nullptr;
  if (!present) (*out_)[std::string(key)] = nullptr;
  return present;
}

std::size_t Fields::openList(std::string_view key, std::size_t size) {
  if (!reading()) {
    (*out_)[std::string(key)] = OrderedJson::array();
    return size;
  }
  const JsonNode::List* list = listAt(key);
  return list ? list->size() : 0;
}

void Fields::item(std::string_view key,
                  std::size_t index,
                  const std::function<void(Fields&)>& describe) {
  if (!reading()) {
    OrderedJson& list = (*out_)[std::string(key)];
    list.push_back(OrderedJson::object());
    Fields inside(list.back());
    describe(inside);
    return;
  }
  const JsonNode& node = (*member(*node_, key)->list())[index];
  std::string name(key);
  name.append("[").append(std::to_string(index)).append("]");
  if (!node.object()) return valueError("document-not-an-object", name, node, {});
  Fields inside(node, *problem_);
  inside.path_ = pathOf(name);
  inside.keys_ = keys_;
  describe(inside);
  inside.finish();
}

Result<Done> readDocument(std::string_view bytes,
                          std::string_view file,
                          const DocumentKind& kind,
                          const std::function<void(Fields&)>& describe) {
  const Result<JsonNode> root = parseJson(bytes, file);
  if (!root) return root.error();
  if (auto problem = headProblem(root.value(), std::string(file), kind)) return *problem;
  Fields::Problem problem{std::string(file), std::nullopt};
  Fields fields(root.value(), problem);
  fields.derived("document", std::string());
  fields.derived("version", 0.0);
  describe(fields);
  fields.finish();
  if (problem.error) return *problem.error;
  return Done{};
}

std::string writeDocument(const DocumentKind& kind, const std::function<void(Fields&)>& describe) {
  OrderedJson root = {{"document", std::string(family) + std::string(kind.name)},
                      {"version", kind.version}};
  Fields fields(root);
  describe(fields);
  return root.dump(2, ' ', false, OrderedJson::error_handler_t::replace) + "\n";
}

}  // namespace dampwright
