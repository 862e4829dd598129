// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/student_t.h"

#include <algorithm>
#include <boost/math/distributions/normal.hpp>
#include <boost/math/distributions/students_t.hpp>
#include <cmath>

#include "core/base/expects.h"

namespace dampwright {

double coverageFactor(double confidence, double dof) {
  expects(confidence > 0 && confidence < 1 && dof >= 0);
  const double tail = 0.5 * (1 - confidence);
  if (std::isinf(dof)) {
    return boost::math::quantile(boost::math::complement(boost::math::normal(), tail));
  }
  const boost::math::students_t law(std::max(1.0, std::floor(dof)));
  return boost::math::quantile(boost::math::complement(law, tail));
}

}  // namespace dampwright
