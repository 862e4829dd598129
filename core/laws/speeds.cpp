// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/laws/speeds.h"

#include <algorithm>

namespace dampwright {

std::vector<double> distinctSpeeds(std::span<const LawPoint> points) {
  constexpr double narrow = 0.005;
  std::vector<double> speeds;
  for (const LawPoint& point : points) {
    if (speeds.empty() || point.velocity > speeds.back() * (1 + narrow)) {
      speeds.push_back(point.velocity);
    }
  }
  return speeds;
}

std::pair<double, double> fitPair(std::span<const LawPoint> points,
                                  const std::function<std::pair<double, double>(double)>& basis) {
  double aa = 0, ab = 0, bb = 0, af = 0, bf = 0;
  for (const LawPoint& point : points) {
    const auto [a, b] = basis(point.velocity);
    aa += a * a;
    ab += a * b;
    bb += b * b;
    af += a * point.force;
    bf += b * point.force;
  }
  const double determinant = aa * bb - ab * ab;
  if (!(determinant > 0)) return {aa > 0 ? std::max(af / aa, 0.0) : 0, 0};
  return {std::max((af * bb - bf * ab) / determinant, 0.0),
          std::max((bf * aa - af * ab) / determinant, 0.0)};
}

}  // namespace dampwright
