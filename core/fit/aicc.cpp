// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/fit/aicc.h"

#include <cmath>
#include <limits>

namespace dampwright {

double aicc(double rss, int points, int parameters) {
  const double n = points;
  const double k = parameters + 1;
  if (n <= k + 1) return std::numeric_limits<double>::infinity();
  return n * std::log(rss / n) + 2 * k + 2 * k * (k + 1) / (n - k - 1);
}

}  // namespace dampwright
