// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <string_view>

#include "core/base/units.h"
#include "core/trace/trace.h"

namespace dampwright {

/// A column's name and unit. `unit` is as written, without its brackets, empty where there is none.
struct NameAndUnit {
  std::string name;
  std::string unit;

  bool operator==(const NameAndUnit&) const = default;
};

/// Takes the unit off a name: "Load (N)", "Load [N]", "Load / N", "Load, N", "Load_N", "Load N",
/// "Kraft in N", "Force.N.", "荷重（N）", "velocity_mm_s" ("mm/s"). Where no bracket marks it, a
/// unit must be known and, if it is one letter or a word ("in", "min"), must suit what the name
/// says. In square brackets any text is a unit.
NameAndUnit splitNameAndUnit(std::string_view heading);

/// The unit of a symbol as files write it: brackets taken off, "mm_s" and "mm/sec" understood too.
std::optional<Unit> readUnit(std::string_view symbol);

/// A symbol without the brackets around it.
std::string_view withoutBrackets(std::string_view symbol);

/// What a column is called in a sentence: its name, or its number from 1 where it has none.
std::string columnLabel(std::string_view name, std::size_t number);

/// The quantity that a role is measured in; None for Role::Other.
Quantity quantityOf(Role role);

}  // namespace dampwright
