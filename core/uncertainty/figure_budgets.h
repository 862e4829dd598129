// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <limits>
#include <string>
#include <vector>

#include "core/curves/curve.h"
#include "core/identify/gas.h"
#include "core/rig/rig_accuracy.h"
#include "core/uncertainty/budget.h"
#include "core/uncertainty/type_a.h"

// The budget of each kind of figure. Parts that are unknown or nothing have no line. Limits of
// error are rectangular, u = a/√3, with infinite degrees of freedom.
namespace dampwright {

/// A force read or interpolated at a speed, as its budget sees it.
struct ForceFigure {
  std::string quantity = "force";  ///< name that the lines carry
  double force = 0;                ///< N, the figure itself (as measured, or gas removed)
  double slope = 0;                ///< N·s/m, local dF/dv of the curve
  double velocity = 0;             ///< m/s, magnitude
  double amplitude = 0;            ///< m, half the stroke; 0 where unknown
  TypeA cycles{};                  ///< N, of this mean force, see pooledScatter
  TypeA gas{};                ///< N, of the gas that was taken off; u 0 for a force as measured
  double interpolationU = 0;  ///< N, |cubic − chosen law|/√3; 0 at a measured speed
};

/// Lines: cycles, load cell (reading and capacity limits), displacement and
/// clock (|slope|·v times u_x/X and u_clock), gas, zero, remount (percent of force), interpolation.
/// @return lines whose combine() is the figure's standard uncertainty
std::vector<BudgetLine> forceBudget(const ForceFigure& figure, const RigAccuracy& rig);

/// Lines of the gas force: identification ("cycles", or "gas" where a hold's ±Fc is in it), load
/// cell, displacement (gas rate times u_x), zero, remount. Nothing while it is not determined.
std::vector<BudgetLine> gasBudget(const Gas& gas, const RigAccuracy& rig);

enum class FrictionKind { Dry, HalfDifference };

/// Lines of a friction: cycles, load cell, remount. The cell's zero cancels in a half difference.
/// Nothing while it is not determined.
std::vector<BudgetLine> frictionBudget(const Friction& friction,
                                       FrictionKind kind,
                                       const RigAccuracy& rig);

/// For the eye: cycle-to-cycle scatter of one averaged peak force in percent, pooled over readings:
/// p² = Σν(u/F)²/Σν, ν = Σν. Readings below 5 % of the largest force are left out, because a
/// percentage of a force near zero says nothing; dof is 0 where no reading has any.
/// @return u in %
TypeA pooledTypeA(const std::vector<Reading>& readings);

}  // namespace dampwright
