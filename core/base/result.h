// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <string>
#include <utility>
#include <variant>

#include "core/base/expects.h"
#include "core/base/named_value.h"

namespace dampwright {

/// Where in the world something is wrong. Rows and columns count from 1 as an editor shows them; 0
/// is unknown.
struct Place {
  std::string file;
  std::int64_t row = 0;
  std::int64_t column = 0;

  bool operator==(const Place&) const = default;
};

/// The world is wrong: a file, data or a document. What it says in words, and what to do,
/// core/words knows by code.
struct Error {
  std::string code;  ///< stable, kebab-case, a row of core/words
  Values values;     ///< what the sentence needs
  Place place;

  bool operator==(const Error&) const = default;
};

/// A value, or the reason why there is none.
template <class T>
class [[nodiscard]] Result {
 public:
  Result(T value) : state_(std::move(value)) {}      // NOLINT: a value is a result
  Result(Error error) : state_(std::move(error)) {}  // NOLINT: an error is a result

  explicit operator bool() const noexcept { return std::holds_alternative<T>(state_); }
  const T& value() const& {
    expects(bool(*this));
    return *std::get_if<T>(&state_);
  }
  T& value() & {
    expects(bool(*this));
    return *std::get_if<T>(&state_);
  }
  T&& value() && {
    expects(bool(*this));
    return std::move(*std::get_if<T>(&state_));
  }
  const Error& error() const {
    expects(!bool(*this));
    return *std::get_if<Error>(&state_);
  }

 private:
  std::variant<T, Error> state_;
};

/// The value of a result that only says whether something was done.
struct Done {
  bool operator==(const Done&) const = default;
};

}  // namespace dampwright
