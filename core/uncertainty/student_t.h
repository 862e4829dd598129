// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// Two-sided coverage factor of Student's t: the k for which ±k·u holds `confidence` of the values.
///
/// Degrees of freedom are truncated to the next lower whole number as the GUM does, never below 1;
/// +inf gives the normal law's factor. By Boost.Math, because its quantile holds full double
/// precision from 1 degree of freedom to infinity, which a short formula of our own would not.
/// @param confidence  [1] in (0, 1)
/// @param dof         >= 0, may be +inf
/// Source: JCGM 100:2008 (GUM), G.3.4 and G.4.1.
double coverageFactor(double confidence, double dof);

}  // namespace dampwright
