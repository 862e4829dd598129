// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <vector>

namespace dampwright {

/// One row of an uncertainty budget: what contributes how much to the standard uncertainty of which
/// figure.
struct BudgetLine {
  std::string quantity;  ///< e.g. "force", "gas force", "friction"
  std::string part;  ///< cycles | load cell | displacement | clock | gas | remount | interpolation
                     ///< | zero | temperature
  double u = 0;      ///< SI standard uncertainty
  double dof = 0;    ///< degrees of freedom, +inf where the value is known
};

}  // namespace dampwright
