// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/json_node.h"

#include <iterator>
#include <nlohmann/json.hpp>
#include <optional>
#include <utility>

namespace dampwright {
namespace {

using Json = nlohmann::json;

// Where the parser has come to; the iterator that feeds it moves the row along.
struct Cursor {
  std::int64_t row = 1;
  char last = 0;

  // The parser reads one character past a number: a line end there belongs to the row before.
  std::int64_t rowOfToken() const { return last == '\n' ? row - 1 : row; }
};

class CountingIterator {
 public:
  using iterator_category = std::input_iterator_tag;
  using value_type = char;
  using difference_type = std::ptrdiff_t;
  using pointer = const char*;
  using reference = const char&;

  CountingIterator(const char* at, Cursor* cursor) : at_(at), cursor_(cursor) {}
  reference operator*() const { return *at_; }
  CountingIterator& operator++() {
    cursor_->last = *at_;
    cursor_->row += *at_ == '\n' ? 1 : 0;
    ++at_;
    return *this;
  }
  CountingIterator operator++(int) {
    CountingIterator before = *this;
    ++*this;
    return before;
  }
  bool operator==(const CountingIterator& other) const { return at_ == other.at_; }

 private:
  const char* at_;
  Cursor* cursor_;
};

// Builds the tree from the parser's events and stops at the first thing that is not allowed.
class TreeBuilder : public nlohmann::json_sax<Json> {
 public:
  TreeBuilder(const Cursor& cursor, std::string_view file) : cursor_(cursor), file_(file) {}

  bool null() override { return add(std::monostate{}) != nullptr; }
  bool boolean(bool value) override { return add(value) != nullptr; }
  bool number_integer(number_integer_t value) override { return number(double(value)); }
  bool number_unsigned(number_unsigned_t value) override { return number(double(value)); }
  bool number_float(number_float_t value, const string_t&) override { return number(value); }
  bool string(string_t& value) override { return add(std::move(value)) != nullptr; }
  bool binary(binary_t&) override { return error("document-not-json", {}); }
  bool start_object(std::size_t) override { return open(JsonNode::Object{}); }
  bool end_object() override { return close(); }
  bool start_array(std::size_t) override { return open(JsonNode::List{}); }
  bool end_array() override { return close(); }

  bool key(string_t& value) override {
    keyRow_ = cursor_.row;
    key_ = std::move(value);
    auto& object = std::get<JsonNode::Object>(open_.back()->value);
    if (object.contains(key_)) return error("document-repeated-key", {{"key", path(key_)}});
    return true;
  }

  bool parse_error(std::size_t,
                   const std::string& token,
                   const nlohmann::detail::exception&) override {
    return error("document-not-json", {{"found", token.substr(0, 40)}});
  }

  Result<JsonNode> take() && {
    if (error_) return std::move(*error_);
    return std::move(root_);
  }

 private:
  template <class Value>
  JsonNode* add(Value value) {
    if (++values_ > mostValues) {
      error("document-too-large", {});
      return nullptr;
    }
    if (open_.empty()) {
      root_ = {std::move(value), cursor_.rowOfToken(), values_};
      return &root_;
    }
    JsonNode& parent = *open_.back();
    if (auto* list = std::get_if<JsonNode::List>(&parent.value)) {
      list->push_back({std::move(value), cursor_.rowOfToken(), values_});
      return &list->back();
    }
    auto& object = std::get<JsonNode::Object>(parent.value);
    names_.back() = key_;
    return &object.insert_or_assign(key_, JsonNode{std::move(value), keyRow_, values_})
                .first->second;
  }

  bool number(double value) { return add(value) != nullptr; }

  template <class Container>
  bool open(Container container) {
    if (open_.size() >= deepestNesting)
      return error("document-too-deep", {{"limit", double(deepestNesting), Quantity::Count}});
    JsonNode* node = add(std::move(container));
    if (!node) return false;
    open_.push_back(node);
    names_.emplace_back();
    return true;
  }

  bool close() {
    open_.pop_back();
    names_.pop_back();
    return true;
  }

  std::string path(const std::string& key) const {
    std::string whole;
    for (std::size_t i = 0; i + 1 < names_.size(); ++i) {
      const auto* list = open_[i]->list();
      if (list)
        whole.append("[").append(std::to_string(list->size() - 1)).append("]");
      else
        whole += names_[i];
      if (!open_[i + 1]->list()) whole += ".";
    }
    return whole + key;
  }

  bool error(const char* code, Values values) {
    if (!error_)
      error_ = Error{code, std::move(values), {std::string(file_), cursor_.rowOfToken(), 0}};
    return false;
  }

  const Cursor& cursor_;
  std::string_view file_;
  JsonNode root_;
  std::vector<JsonNode*> open_;     // containers not yet closed, outermost first
  std::vector<std::string> names_;  // for each open object the key that is being read
  std::string key_;
  std::int64_t keyRow_ = 0;
  std::size_t values_ = 0;
  std::optional<Error> error_;
};

}  // namespace

Result<JsonNode> parseJson(std::string_view bytes, std::string_view file) {
  if (bytes.size() > largestDocument)
    return Error{"document-too-large", {}, {std::string(file), 0, 0}};
  Cursor cursor;
  TreeBuilder builder(cursor, file);
  const CountingIterator first(bytes.data(), &cursor), last(bytes.data() + bytes.size(), &cursor);
  const bool parsed = Json::sax_parse(first, last, &builder);
  Result<JsonNode> tree = std::move(builder).take();
  expects(parsed == bool(tree));
  return tree;
}

}  // namespace dampwright
