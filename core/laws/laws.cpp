// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/laws/law.h"

namespace dampwright {

extern const Law linearLaw;
extern const Law powerLaw;
extern const Law twoSlopeLaw;
extern const Law smoothLaw;
extern const Law bleedAndBlowOffLaw;

namespace {

constexpr std::array<const Law*, 5> table{
    &linearLaw, &powerLaw, &twoSlopeLaw, &smoothLaw, &bleedAndBlowOffLaw};

}  // namespace

std::span<const Law* const> allLaws() { return table; }

std::vector<double> lawParameters(const Law& law, std::span<const double> q) {
  return law.chart != nullptr ? law.chart->parameters(q) : std::vector<double>(q.begin(), q.end());
}

const Law* findLaw(std::string_view name) {
  for (const Law* law : table) {
    if (law->name == name) return law;
  }
  return nullptr;
}

}  // namespace dampwright
