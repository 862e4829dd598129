// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/laws/law.h"

namespace dampwright {

extern const Law linearLaw;
extern const Law twoSlopeLaw;

namespace {

constexpr std::array<const Law*, 2> table{&linearLaw, &twoSlopeLaw};

}  // namespace

std::span<const Law* const> allLaws() { return table; }

const Law* findLaw(std::string_view name) {
  for (const Law* law : table) {
    if (law->name == name) return law;
  }
  return nullptr;
}

}  // namespace dampwright
