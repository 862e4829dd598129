// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/budget.h"

#include <cmath>
#include <limits>

namespace dampwright {

Combined combine(std::span<const BudgetLine> lines) {
  double squares = 0;
  double fourths = 0;
  for (const BudgetLine& line : lines) {
    const double square = line.u * line.u;
    squares += square;
    fourths += square * square / line.dof;
  }
  const double infinite = std::numeric_limits<double>::infinity();
  return {std::sqrt(squares), fourths > 0 ? squares * squares / fourths : infinite};
}

}  // namespace dampwright
