// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/fields.h"

#include <algorithm>
#include <cmath>
#include <nlohmann/json.hpp>

#include "core/records/key_unit.h"

namespace dampwright {
namespace {

using OrderedJson = nlohmann::ordered_json;

const std::string wholeRule = "0, 1, 2, …";
constexpr double largestWhole = 9007199254740992.0;  // 2^53: every whole number up to it is exact

// The first bytes of a text that an error may print, cut between characters.
std::string clipped(const std::string& text) {
  constexpr std::size_t most = 60;
  if (text.size() <= most) return text;
  std::size_t end = most;
  while (end > 0 && (static_cast<unsigned char>(text[end]) & 0xC0u) == 0x80u) --end;
  return text.substr(0, end) + "…";
}

NamedValue shown(const JsonNode& node) {
  NamedValue value{"value", std::string("null")};
  if (const auto* flag = std::get_if<bool>(&node.value)) value.value = *flag ? "true" : "false";
  if (const auto* number = std::get_if<double>(&node.value)) value.value = *number;
  if (const auto* text = std::get_if<std::string>(&node.value))
    value.value = "\"" + clipped(*text) + "\"";
  if (node.list()) value.value = "[ ]";
  if (node.object()) value.value = "{ }";
  return value;
}

bool isDate(std::string_view text) {
  constexpr std::string_view shape = "dddd-dd-dd";
  if (text.size() < shape.size()) return false;
  for (std::size_t i = 0; i < shape.size(); ++i) {
    const bool digit = text[i] >= '0' && text[i] <= '9';
    if (shape[i] == 'd' ? !digit : text[i] != shape[i]) return false;
  }
  const int month = (text[5] - '0') * 10 + text[6] - '0';
  const int day = (text[8] - '0') * 10 + text[9] - '0';
  const bool ends = text.size() == shape.size() || text[shape.size()] == 'T';
  return ends && month >= 1 && month <= 12 && day >= 1 && day <= 31;
}

// The name, or the name with a number behind it where the object has it already.
std::string freeName(const OrderedJson& object, const std::string& name) {
  std::string free = name;
  for (int number = 2; object.contains(free); ++number)
    free = std::string(name).append(" (").append(std::to_string(number)).append(")");
  return free;
}

OrderedJson jsonNumber(double number) {
  if (!std::isfinite(number)) return nullptr;
  if (number == std::floor(number) && std::abs(number) < largestWhole)
    return static_cast<std::int64_t>(number);
  return number;
}

// The members of an object as they stand in the text.
std::vector<std::pair<std::string, const JsonNode*>> inOrder(const JsonNode::Object& object) {
  std::vector<std::pair<std::string, const JsonNode*>> members;
  for (const auto& [name, node] : object) members.emplace_back(name, &node);
  std::sort(members.begin(), members.end(), [](const auto& a, const auto& b) {
    return a.second->order < b.second->order;
  });
  return members;
}

OrderedJson textOrNull(const std::string& text) {
  return text.empty() ? OrderedJson(nullptr) : OrderedJson(text);
}

}  // namespace

std::string Fields::pathOf(std::string_view key) const {
  return path_.empty() || key.empty() ? path_ + std::string(key) : path_ + "." + std::string(key);
}

void Fields::error(const std::string& code, std::string_view key, Values values, std::int64_t row) {
  if (problem_->error) return;
  values.insert(values.begin(), {"key", pathOf(key)});
  problem_->error = Error{code, std::move(values), {problem_->file, row, 0}};
}

void Fields::valueError(const std::string& code,
                        std::string_view key,
                        const JsonNode& node,
                        Values more) {
  more.insert(more.begin(), shown(node));
  error(code, key, std::move(more), node.row);
}

void Fields::complain(const std::string& code, Values values) {
  expects(reading());
  if (problem_->error) return;
  error(code, "", std::move(values), node_->row);
  weak_ = true;
}

const JsonNode* Fields::find(std::string_view key) {
  asked_.emplace_back(key);
  const auto found = node_->object()->find(key);
  if (found != node_->object()->end()) return &found->second;
  if (keys_ == Keys::Required && !problem_->error) {
    error("document-missing-key", key, {}, node_->row);
    weak_ = true;
  }
  return nullptr;
}

const JsonNode* Fields::findPresent(std::string_view key) {
  const JsonNode* node = find(key);
  return node && !node->isNull() ? node : nullptr;
}

// A key that is misspelt is missing too: then say what stands there.
void Fields::finish() {
  if (!reading() || (problem_->error && !weak_)) return;
  for (const auto& [key, node] : *node_->object()) {
    if (std::find(asked_.begin(), asked_.end(), key) != asked_.end()) continue;
    problem_->error.reset();
    const std::vector<std::string_view> known(asked_.begin(), asked_.end());
    error("document-unknown-key", clipped(key), {{"known", quoted(known)}}, node.row);
    return;
  }
}

std::optional<std::string> Fields::textAt(std::string_view key) {
  const JsonNode* node = findPresent(key);
  if (!node) return std::nullopt;
  if (const auto* text = std::get_if<std::string>(&node->value)) return *text;
  valueError("document-not-text", key, *node, {});
  return std::nullopt;
}

std::optional<double> Fields::numberAt(std::string_view key, const Range& range) {
  const JsonNode* node = findPresent(key);
  if (!node) return std::nullopt;
  const auto* number = std::get_if<double>(&node->value);
  if (!number) {
    valueError("document-not-a-number", key, *node, {});
    return std::nullopt;
  }
  const double si = unitOfKey(key).toSi(*number);
  const bool fits = *number >= range.low && *number <= range.high;
  if (fits && std::isfinite(si)) return si;
  const std::string rule(fits ? "< 1e300" : range.rule);
  valueError("document-out-of-range", key, *node, {{"rule", rule}});
  return std::nullopt;
}

void Fields::wholeNumber(std::string_view key, std::optional<double>& value, double most) {
  if (!reading()) {
    (*out_)[std::string(key)] = value ? jsonNumber(*value) : OrderedJson(nullptr);
    return;
  }
  value.reset();
  const JsonNode* node = findPresent(key);
  if (!node) return;
  const auto* number = std::get_if<double>(&node->value);
  if (!number) return valueError("document-not-a-number", key, *node, {});
  const bool whole = *number >= 0 && *number == std::floor(*number);
  if (whole && *number <= std::min(most, largestWhole)) {
    value = *number;
  } else {
    valueError("document-out-of-range", key, *node, {{"rule", wholeRule}});
  }
}

const JsonNode::List* Fields::listAt(std::string_view key) {
  const JsonNode* node = findPresent(key);
  if (!node) return nullptr;
  if (!node->list()) valueError("document-not-a-list", key, *node, {});
  return node->list();
}

const JsonNode::Object* Fields::objectAt(std::string_view key) {
  const JsonNode* node = findPresent(key);
  if (!node) return nullptr;
  if (!node->object()) valueError("document-not-an-object", key, *node, {});
  return node->object();
}

void Fields::text(std::string_view key, std::string& value) {
  if (reading())
    value = textAt(key).value_or("");
  else
    (*out_)[std::string(key)] = textOrNull(value);
}

void Fields::text(std::string_view key, std::optional<std::string>& value) {
  if (reading())
    value = textAt(key);
  else
    (*out_)[std::string(key)] = value ? OrderedJson(*value) : OrderedJson(nullptr);
}

void Fields::date(std::string_view key, std::string& value) {
  text(key, value);
  if (!reading() || value.empty() || isDate(value)) return;
  valueError("document-out-of-range",
             key,
             node_->object()->find(key)->second,
             {{"rule", std::string("YYYY-MM-DD")}});
}

void Fields::flag(std::string_view key, bool& value) {
  if (!reading()) {
    (*out_)[std::string(key)] = value;
    return;
  }
  const JsonNode* node = findPresent(key);
  if (!node) return;
  if (const auto* flag = std::get_if<bool>(&node->value))
    value = *flag;
  else
    valueError("document-not-a-flag", key, *node, {});
}

void Fields::writeNumber(std::string_view key, double si) {
  (*out_)[std::string(key)] = jsonNumber(unitOfKey(key).fromSi(si));
}

void Fields::number(std::string_view key, double& si, const Range& range) {
  if (!reading()) {
    writeNumber(key, si);
    return;
  }
  const double missing = keys_ == Keys::Required ? unitOfKey(key).whenNull : si;
  si = numberAt(key, range).value_or(missing);
}

void Fields::number(std::string_view key, std::optional<double>& si, const Range& range) {
  if (reading())
    si = numberAt(key, range);
  else
    writeNumber(key, si.value_or(std::numeric_limits<double>::quiet_NaN()));
}

void Fields::texts(std::string_view key, std::vector<std::string>& values) {
  if (!reading()) {
    (*out_)[std::string(key)] = values;
    return;
  }
  values.clear();
  const JsonNode::List* list = listAt(key);
  if (!list) return;
  for (const JsonNode& node : *list) {
    const auto* text = std::get_if<std::string>(&node.value);
    if (!text) return valueError("document-not-text", key, node, {});
    values.push_back(*text);
  }
}

void Fields::numbers(std::string_view key, std::vector<double>& values) {
  const KeyUnit& unit = unitOfKey(key);
  if (!reading()) {
    OrderedJson list = OrderedJson::array();
    for (const double si : values) list.push_back(jsonNumber(unit.fromSi(si)));
    (*out_)[std::string(key)] = std::move(list);
    return;
  }
  values.clear();
  const JsonNode::List* list = listAt(key);
  if (!list) return;
  for (const JsonNode& node : *list) {
    const auto* number = std::get_if<double>(&node.value);
    if (!number && !node.isNull()) return valueError("document-not-a-number", key, node, {});
    values.push_back(number ? unit.toSi(*number) : unit.whenNull);
  }
}

void Fields::counts(std::string_view key, std::vector<std::int64_t>& values) {
  std::vector<double> numbers(values.begin(), values.end());
  this->numbers(key, numbers);
  if (!reading()) return;
  values.clear();
  for (const double number : numbers) {
    if (!(number >= 0 && number <= largestWhole && number == std::floor(number)))
      return valueError(
          "document-out-of-range", key, node_->object()->find(key)->second, {{"rule", wholeRule}});
    values.push_back(static_cast<std::int64_t>(number));
  }
}

void Fields::textByName(std::string_view key,
                        std::vector<std::pair<std::string, std::string>>& values) {
  if (!reading()) {
    OrderedJson object = OrderedJson::object();
    for (const auto& [name, text] : values) object[freeName(object, name)] = text;
    (*out_)[std::string(key)] = std::move(object);
    return;
  }
  values.clear();
  const JsonNode::Object* object = objectAt(key);
  if (!object) return;
  for (const auto& [name, node] : inOrder(*object)) {
    const auto* text = std::get_if<std::string>(&node->value);
    if (!text) return valueError("document-not-text", std::string(key) + "." + name, *node, {});
    values.emplace_back(name, *text);
  }
}

void Fields::numberByName(std::string_view key,
                          std::vector<std::pair<std::string, double>>& values,
                          NameUnits units) {
  const auto unitOf = [units](const std::string& name) {
    return unitOfKey(units == NameUnits::InName ? std::string_view(name) : std::string_view());
  };
  if (!reading()) {
    OrderedJson object = OrderedJson::object();
    for (const auto& [name, si] : values)
      object[freeName(object, name)] = jsonNumber(unitOf(name).fromSi(si));
    (*out_)[std::string(key)] = std::move(object);
    return;
  }
  values.clear();
  const JsonNode::Object* object = objectAt(key);
  if (!object) return;
  for (const auto& [name, node] : inOrder(*object)) {
    const auto* number = std::get_if<double>(&node->value);
    const std::string path = std::string(key) + "." + name;
    if (!number && !node->isNull()) return valueError("document-not-a-number", path, *node, {});
    const KeyUnit unit = unitOf(name);
    values.emplace_back(name, number ? unit.toSi(*number) : unit.whenNull);
  }
}

}  // namespace dampwright
