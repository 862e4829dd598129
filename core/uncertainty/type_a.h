// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// A standard uncertainty with its degrees of freedom.
struct TypeA {
  double u = 0;    ///< in the unit that its place names
  double dof = 0;  ///< 0: not known
};

}  // namespace dampwright
