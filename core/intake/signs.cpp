// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/signs.h"

#include <algorithm>
#include <cmath>

#include "core/intake/column_words.h"

namespace dampwright {

DirectionChoice chooseDirection(const std::optional<Direction>& asked,
                                const std::optional<Direction>& rig,
                                std::string_view columnName,
                                const Metadata& metadata) {
  if (asked) return {*asked, true};
  if (rig) return {*rig, true};
  if (const auto named = directionOfName(columnName)) return {*named, true};
  for (const auto& [key, value] : metadata) {
    std::string line = key;
    line.append(" ").append(value);
    if (const auto said = directionOfLine(line)) return {*said, true};
  }
  return {};
}

double absorbedEnergy(std::span<const double> displacement, std::span<const double> force) {
  const std::size_t size = std::min(displacement.size(), force.size());
  double sum = 0;
  std::size_t count = 0;
  for (const double each : force.first(size)) {
    if (!std::isfinite(each)) continue;
    sum += each;
    ++count;
  }
  const double mean = count > 0 ? sum / static_cast<double>(count) : 0;
  double energy = 0;
  for (std::size_t i = 1; i < size; ++i) {
    const double part =
        ((force[i] + force[i - 1]) / 2 - mean) * (displacement[i] - displacement[i - 1]);
    if (std::isfinite(part)) energy += part;
  }
  return energy;
}

}  // namespace dampwright
