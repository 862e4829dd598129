// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cmath>
#include <cstdio>
#include <memory>
#include <string>

#include "core/base/units.h"
#include "ui/columns/columns_preview.h"

namespace dampwright::made {

/// A purely viscous damper, 2000 N·s/m: a sine of 50 mm at 1.6 Hz, sampled at 500 Hz, as rows of
/// time [s], displacement [mm] and force [N] with `between` them, below `head`.
inline std::string viscousRun(const std::string& head, int rows = 4000, char between = ',') {
  std::string text = head;
  for (int i = 0; i < rows; ++i) {
    const double time = i / 500.0;
    const double phase = 2 * pi * 1.6 * time;
    const double force = 2000 * 0.025 * 2 * pi * 1.6 * std::cos(phase);
    char row[80];
    std::snprintf(
        row, sizeof row, "%.4f%c%.3f%c%.1f\n", time, between, 25 * std::sin(phase), between, force);
    text += row;
  }
  return text;
}

inline LoadRun inMemory(const std::string& text) {
  const auto bytes = std::make_shared<const std::string>(text);
  return [bytes]() -> Result<RunText> { return bytes; };
}

/// Two forces: only a person can tell which one is meant.
inline std::string twoForces(int rows = 4000) {
  std::string text = "Time (s),Travel (mm),Load A (N),Load B (N)\n";
  const std::string plain = viscousRun({}, rows);
  for (std::size_t from = 0; from < plain.size();) {
    const std::size_t end = plain.find('\n', from);
    const std::string row = plain.substr(from, end - from);
    text += row + "," + row.substr(row.rfind(',') + 1) + "5\n";
    from = end + 1;
  }
  return text;
}

}  // namespace dampwright::made
