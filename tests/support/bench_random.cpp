// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_random.h"

#include <cmath>

#include "core/base/units.h"

namespace dampwright::bench {

double NormalSource::uniform() {
  return (static_cast<double>(bits_() >> 11) + 1.0) * 0x1p-53;  // 53 bits, never 0
}

double NormalSource::next() {
  if (hasSpare_) {
    hasSpare_ = false;
    return spare_;
  }
  const double radius = std::sqrt(-2.0 * std::log(uniform()));
  const double angle = 2.0 * pi * uniform();
  spare_ = radius * std::sin(angle);
  hasSpare_ = true;
  return radius * std::cos(angle);
}

}  // namespace dampwright::bench
