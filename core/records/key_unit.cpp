// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/key_unit.h"

#include <array>
#include <charconv>
#include <cmath>
#include <limits>

#include "core/base/units.h"

namespace dampwright {
namespace {

constexpr double nan = std::numeric_limits<double>::quiet_NaN();
constexpr double infinity = std::numeric_limits<double>::infinity();

constexpr KeyUnit plain{"", Quantity::None, 1, 1, nan};

// A longer ending stands before a shorter one that it ends with.
constexpr std::array<KeyUnit, 13> units{{
    {"dof", Quantity::None, 1, 1, infinity},
    {"aicc", Quantity::None, 1, 1, infinity},
    {"_mm_s_per_sqrt_n", Quantity::None, 1, 1000, nan},
    {"_n_per_mm", Quantity::Stiffness, 1000, 1, nan},
    {"_n_s_per_m", Quantity::Damping, 1, 1, nan},
    {"_mm_s", Quantity::Velocity, 1, 1000, nan},
    {"_mm", Quantity::Length, 1, 1000, nan},
    {"_ms", Quantity::Time, 1, 1000, nan},
    {"_n", Quantity::Force, 1, 1, nan},
    {"_deg", Quantity::Angle, pi, 180, nan},
    {"_bar", Quantity::None, 1e5, 1, nan},
    // Written as they are kept: the table names them so that nobody adds a factor elsewhere.
    {"_s", Quantity::Time, 1, 1, nan},
    {"_c", Quantity::Temperature, 1, 1, nan},
}};

double fifteenDigits(double value) {
  std::array<char, 40> text{};
  const auto written = std::to_chars(text.data(),
                                     text.data() + text.size(),
                                     value,
                                     std::chars_format::general,
                                     std::numeric_limits<double>::digits10);
  double back = value;
  std::from_chars(text.data(), written.ptr, back);
  return back;
}

}  // namespace

double KeyUnit::fromSi(double si) const {
  const double nearest = si * siDenominator / siNumerator;
  if (!std::isfinite(nearest)) return nearest;
  for (const double candidate : {fifteenDigits(nearest),
                                 nearest,
                                 std::nextafter(nearest, infinity),
                                 std::nextafter(nearest, -infinity)}) {
    if (toSi(candidate) == si) return candidate;
  }
  return nearest;
}

const KeyUnit& unitOfKey(std::string_view key) {
  if (key.ends_with("_u")) key.remove_suffix(2);
  for (const KeyUnit& unit : units) {
    if (key.ends_with(unit.suffix)) return unit;
  }
  return plain;
}

}  // namespace dampwright
