// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <functional>

#include "core/curves/curve.h"

namespace dampwright {

/// Gas force [N, positive pushes the rod out] at the place where a point was read.
using GasLine = std::function<double(const CurvePoint&)>;

/// Sets dampingForce: force − gas in compression, force + gas in rebound. Friction stays in. An
/// empty gas line takes dampingForce away (not determined).
Curve removeGas(Curve curve, const GasLine& gas);

}  // namespace dampwright
