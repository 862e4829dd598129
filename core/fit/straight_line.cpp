// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/fit/straight_line.h"

#include <cmath>
#include <numeric>

#include "core/base/expects.h"

namespace dampwright {

LineValue StraightLine::at(double x) const {
  const double variance =
      interceptU * interceptU + x * x * slopeU * slopeU + 2 * x * correlation * interceptU * slopeU;
  return {intercept + slope * x, std::sqrt(variance)};
}

LineValue StraightLine::observationAt(double x) const {
  const LineValue line = at(x);
  return {line.value, std::hypot(line.u, residualDeviation)};
}

StraightLine fitLine(std::span<const double> x, std::span<const double> y) {
  expects(x.size() == y.size() && x.size() >= 2);
  const auto count = static_cast<double>(x.size());
  const double meanX = std::accumulate(x.begin(), x.end(), 0.0) / count;
  const double meanY = std::accumulate(y.begin(), y.end(), 0.0) / count;
  double sxx = 0;
  double sxy = 0;
  for (std::size_t i = 0; i < x.size(); ++i) {
    sxx += (x[i] - meanX) * (x[i] - meanX);
    sxy += (x[i] - meanX) * (y[i] - meanY);
  }
  StraightLine line;
  line.slope = sxy / sxx;
  line.intercept = meanY - line.slope * meanX;
  double rss = 0;
  for (std::size_t i = 0; i < x.size(); ++i) {
    const double residual = y[i] - meanY - line.slope * (x[i] - meanX);
    rss += residual * residual;
  }
  line.dof = count - 2;
  line.residualDeviation = std::sqrt(rss / line.dof);
  line.slopeU = line.residualDeviation / std::sqrt(sxx);
  line.interceptU = line.residualDeviation * std::sqrt(1 / count + meanX * meanX / sxx);
  line.correlation = -meanX / std::sqrt(sxx / count + meanX * meanX);
  return line;
}

}  // namespace dampwright
