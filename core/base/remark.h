// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <string>

#include "core/base/named_value.h"

namespace dampwright {

enum class Severity {
  Note,    ///< worth knowing, changes nothing
  Warning  ///< a figure may be off, or something was assumed
};

/// Something that was seen and handled; the result stands. Its sentence is a row of core/words.
struct Remark {
  std::string code;  ///< stable, kebab-case; the list is in formats of the handbook
  Severity severity = Severity::Note;
  Values values;
  std::int64_t count = 0;     ///< how often, 0 where counting makes no sense
  std::int64_t firstRow = 0;  ///< line of the file where it happened first, from 1; 0 unknown

  bool operator==(const Remark&) const = default;
};

}  // namespace dampwright
