// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
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

  bool operator==(const BudgetLine&) const = default;
};

/// A combined standard uncertainty and its effective degrees of freedom.
struct Combined {
  double u = 0;    ///< SI, root of the sum of squares
  double dof = 0;  ///< Welch-Satterthwaite, not truncated; +inf where no line has a finite one
};

/// Combines independent lines: u² = Σu_i², ν = u⁴ / Σ(u_i⁴/ν_i). Without lines u is 0 and ν +inf.
/// Source: JCGM 100:2008 (GUM), 5.1.2 and G.4.1, equation G.2b.
Combined combine(std::span<const BudgetLine> lines);

}  // namespace dampwright
