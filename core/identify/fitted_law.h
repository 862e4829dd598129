// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
#include <string>
#include <vector>

#include "core/base/quantity.h"

namespace dampwright {

struct FittedParameter {
  std::string name;  ///< as in formats of the handbook, with its unit: low_n_s_per_m
  double value = 0;  ///< SI
  double u = 0;      ///< standard error, SI; NaN where it was not determined
  Quantity quantity = Quantity::Damping;
};

/// One damping law fitted to one direction's points (damping force less dry friction).
struct FittedLaw {
  std::string law;  ///< linear | power | two-slope | smooth | bleed and blow-off
  bool chosen = false;
  std::vector<FittedParameter> parameters;  ///< empty where it was not fitted
  double rms = 0;                           ///< N, residual; NaN where it was not fitted
  double aicc = 0;     ///< corrected Akaike criterion; +inf where there are too few points for it
  std::string status;  ///< of the fit: see core/fit; or why it was not fitted: gas-not-determined |
                       ///< friction-not-determined | too-few-points
  std::string why;     ///< why it was chosen: law-lowest-aicc | law-simplest-within-errors |
                       ///< law-closest, else empty

  /// Force of the law at a speed [m/s, magnitude], N without dry friction and gas; 0 where it was
  /// not fitted.
  double at(double velocity) const;
};

/// The chosen law; null where none is.
const FittedLaw* chosenLaw(std::span<const FittedLaw> laws);

}  // namespace dampwright
