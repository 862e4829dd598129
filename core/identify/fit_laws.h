// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <string_view>
#include <vector>

#include "core/curves/curve.h"
#include "core/identify/fitted_law.h"
#include "core/identify/gas.h"
#include "core/laws/law.h"

namespace dampwright {

/// A point with what is known of its scatter.
struct ScatteredPoint {
  LawPoint point;
  double u = 0;  ///< N, standard error of the force alone; 0 where not known
};

/// Lays every law of core/laws through the points by least squares of equal weight, and chooses.
///
/// Chosen is the lowest AICc where every law has at least k + 3 points (k its parameters and the
/// dry friction, which was determined apart but belongs to it), else the simplest law whose
/// residuals all lie within 2 standard errors of their points, else the closest. Standard errors of
/// parameters come from the larger of the residual variance and the points' own mean variance, so
/// that an accidental fit through few points looks no better than its points. A knee on a tested
/// speed, where the sum of squares has its least from both sides, is converged.
/// @param points  by rising velocity
/// @param offsetU  [N] standard uncertainty of what was taken off all forces alike (gas, dry
///   friction); it goes into the standard errors of the parameters
/// @return one entry for each law, the simplest first
std::vector<FittedLaw> fitLaws(std::span<const ScatteredPoint> points, double offsetU = 0);

/// The laws of one direction: its damping forces less dry friction, of the stroke that has most
/// points. Nothing is fitted while gas or dry friction is not determined; the status says so.
std::vector<FittedLaw> identifyLaws(const Curve& curve, const Gas& gas, const Friction& friction);

}  // namespace dampwright
