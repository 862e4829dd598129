// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>

#include "core/cycles/block.h"
#include "core/fit/least_squares.h"
#include "core/laws/dry_friction.h"
#include "core/laws/gas_column.h"

namespace dampwright {

/// How gas is described over the slow stroke.
enum class GasShape {
  Column,  ///< F0·(L/(L − x))^n
  Line     ///< F0 + rate·x: where the cell's zero hides F0, so that F0 is no gas force
};

/// What a slow block says. Standard errors count neighbouring residuals that move together (lag-one
/// correlation r) as fewer points, n·(1 − r)/(1 + r). Such residuals mean that friction has another
/// form than the fitted one, which gas rate and friction then share between them: r times the
/// distance to the half difference at a quarter of the peak speed is a limit of error of both.
/// A valve whose law bends at low speed (an orifice, a power of v) moves both: the distance to a
/// fit with c_dir·v + d_dir·v·|v|, less what noise puts between the two fits, is a standard
/// uncertainty of each.
struct SlowBlockFit {
  FitStatus status = FitStatus::NotConverged;
  GasColumn gas;  ///< x from the block's mid-stroke; inverseLength 0 where |1/L| < 2 errors
  double gasU = 0;
  double rate = 0, rateU = 0;  ///< N/m at mid-stroke, also where 1/L was dropped
  DryFriction friction;
  double dryU = 0;
  double dof = 0;  ///< effective
  double rms = 0;  ///< N, residual

  bool usable() const { return status == FitStatus::Converged || status == FitStatus::AtBound; }
};

/// Fits the decelerating half strokes (from peak speed down to 2 % of it; lost motion lies behind
/// them, and nearer to the reversal an average mixes both directions) of a slow block by F = gas(x)
/// + Fc·tanh(v/v_f) + c_dir·v with v_f and one c for each direction free. v_f is kept between 0.5 %
/// and 25 % of the block's peak speed. Accuracy: gas 0.5 N, dry friction 1 N at 2 N rms noise, ±25
/// mm, 5 mm/s, 2 kHz, one cycle.
SlowBlockFit fitSlowBlock(const Block& block, GasShape shape, double exponent);

}  // namespace dampwright
