// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <vector>

#include "core/base/quantity.h"

namespace dampwright {

struct FittedParameter {
  std::string name;  ///< as in formats of the handbook, with its unit: low_n_s_per_m
  double value = 0;  ///< SI
  double u = 0;      ///< standard error, SI
  Quantity quantity = Quantity::Damping;
};

/// One damping law fitted to one direction's points (damping force less dry friction).
struct FittedLaw {
  std::string law;  ///< linear | two-slope
  bool chosen = false;
  std::vector<FittedParameter> parameters;
  double rms = 0;      ///< N, residual
  double aicc = 0;     ///< corrected Akaike criterion; +inf where there are too few points for it
  std::string status;  ///< of the fit: see core/fit; or why it was not fitted
  std::string why;     ///< why it was chosen, code of core/words, else empty
};

}  // namespace dampwright
