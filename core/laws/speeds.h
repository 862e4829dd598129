// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <functional>
#include <span>
#include <utility>
#include <vector>

#include "core/laws/law.h"

// What the start guesses of several laws share.
namespace dampwright {

/// The speeds of the points [m/s], rising; speeds nearer than 0.5 % are one.
std::vector<double> distinctSpeeds(std::span<const LawPoint> points);

/// Least squares of F = a·basis(v).first + b·basis(v).second; a value below 0 is set to 0.
std::pair<double, double> fitPair(std::span<const LawPoint> points,
                                  const std::function<std::pair<double, double>(double)>& basis);

}  // namespace dampwright
