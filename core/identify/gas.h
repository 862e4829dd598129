// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>

namespace dampwright {

/// The gas column, as the limit of force for speed → 0 with dry friction taken out.
/// F(x) = force · (L/(L − x))^n with x from the slow block's mid-stroke.
struct Gas {
  std::optional<double>
      force;          ///< N at mid-stroke, positive pushes the rod out; nothing: not determined
  double forceU = 0;  ///< N, standard error of the identification alone; ±Fc is in it for a hold
  double forceDof = 0;
  double totalU = 0;  ///< N, combined with the rig's parts, see core/uncertainty
  double totalDof = 0;
  std::optional<double> rate;  ///< N/m at mid-stroke
  double rateU = 0;            ///< N/m
  double columnLength = 0;     ///< m, L; 0 where the rate was too small to tell (constant force)
  double exponent = 1.2;       ///< n
  double mid = 0;              ///< m, rig scale, where x is zero
  std::optional<double> temperature;  ///< °C
  std::string method;                 ///< slow block | hold | empty
  std::string reason;                 ///< code of core/words why it is not determined, else empty

  /// Gas force at x [m] on the rig's scale; 0 while not determined.
  double at(double rigDisplacement) const;
};

/// Dry friction, and the half difference that standards call friction. They are two figures, never
/// mixed.
struct Friction {
  std::optional<double> dry;  ///< N
  double dryU = 0;            ///< N, standard error of the identification alone
  double dryDof = 0;
  double dryTotalU = 0;  ///< N, combined with the rig's parts
  double dryTotalDof = 0;
  std::optional<double>
      halfDifference;          ///< N, half the force difference at the slow block's peak speed
  double halfDifferenceU = 0;  ///< N, type A from cycle to cycle
  double halfDifferenceDof = 0;
  double halfDifferenceTotalU = 0;  ///< N, combined with the rig's parts
  double halfDifferenceTotalDof = 0;
  double atVelocity = 0;  ///< m/s
  std::string method;     ///< slow block | empty
  std::string reason;     ///< code why dry is not determined, else empty
};

}  // namespace dampwright
