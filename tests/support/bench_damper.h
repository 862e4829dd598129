// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <limits>

#include "tests/support/bench_law.h"

namespace dampwright::bench {

/// A gas column that pushes the rod out: absolute pressure times rod area, less the atmosphere.
/// F(x) = (force + atmosphere)·(length/(length − x))^exponent·T/T0 − atmosphere, T in kelvin.
struct GasColumn {
  double force = 0;  ///< N at x = 0 and the temperature at the start
  double length = std::numeric_limits<double>::infinity();  ///< m
  double exponent = 1.2;
  double atmosphere = 0;  ///< N, air pressure on the rod area; 0: the gauge form

  double at(double x, double kelvinRatio) const;
};

enum class FrictionForm {
  Tanh,      ///< dry·tanh(v/roundness)
  Stribeck,  ///< more when slow: (dry + (breakaway − dry)·e^(−(v/fade)²))·tanh(v/roundness)
  Bristle    ///< the LuGre form: bristles of `stiffness` that slip at the Stribeck force
};

struct DryFriction {
  FrictionForm form = FrictionForm::Tanh;
  double dry = 0;             ///< N, at speed
  double roundness = 0.0005;  ///< m/s
  double breakaway = 0;       ///< N, when slow (Stribeck, Bristle)
  double fadeSpeed = 0.005;   ///< m/s, where the breakaway has faded (Stribeck, Bristle)
  double stiffness = 2e6;     ///< N/m of the bristles
  double damping = 200;       ///< N·s/m of the bristles

  /// Force at velocity v; `bristle` [m] is the state, advanced by `dt`.
  /// Source of the bristle form: Canudas de Wit et al., IEEE Trans. Autom. Control 40 (1995) 419.
  struct Answer {
    double force = 0, bristle = 0;
  };
  Answer at(double v, double bristle, double dt) const;
};

/// Oil and body warm up by the energy absorbed; the valves fade with it.
struct Warmth {
  double start = 22;                                          ///< °C
  double room = 22;                                           ///< °C
  double capacity = std::numeric_limits<double>::infinity();  ///< J/K
  double cooling = 0;                                         ///< W/K
  double fadePercentPer10C = 0;  ///< of valve force, against `start`; negative: loses force
};

/// A damper and how it is held. Compression and rebound valves see the speed behind the series
/// stiffness; after a reversal a valve carries no force for the direction's gap.
struct Damper {
  Law compression = linearLaw(0), rebound = linearLaw(0);
  GasColumn gas;
  DryFriction friction;
  double oilStiffness = std::numeric_limits<double>::infinity();  ///< N/m, in series with the valve
  double compressionGap = 0, reboundGap = 0;                      ///< m, lost motion
  double rigStiffness =
      std::numeric_limits<double>::infinity();  ///< N/m, between crosshead and rod
  double play = 0;  ///< m, free travel of the mounting, where the total force crosses zero
  Warmth warmth;
};

/// The damper between a moving crosshead and the fixed end, in small steps of equal length.
/// BDF2 (second order, stable however stiff the series elements are) on the valve's and the rod's
/// place; the force balance of a step is solved to the last bits.
/// Source: Gear, Numerical initial value problems in ODEs (1971); from memory.
class DamperState {
 public:
  DamperState(const Damper& damper, double crosshead, double dt);

  /// Advances by dt to the crosshead's new place [m]; the force on the crosshead [N].
  double step(double crosshead);

  double temperature() const { return temperature_; }  ///< °C
  double gasForce() const { return gasForce_; }        ///< N, at the rod's place now
  double rodPlace() const { return rod_; }             ///< m

 private:
  /// The forces if the rod stands there at the end of this step.
  struct Balance {
    double force = 0;       ///< N, all that pushes the rod out
    double valveSpeed = 0;  ///< m/s
  };
  Balance valveAt(double rod) const;
  Balance balanceAt(double rod) const;
  double mountForce(double stretch) const;
  double solveRod(double crosshead) const;

  const Damper& damper_;
  double alpha_ = 0, dt_ = 0, stiffness_ = 0;
  double rod_ = 0, rodBefore_ = 0, rodBase_ = 0;        // m; base: the BDF2 mean of the past
  double valve_ = 0, valveBefore_ = 0, valveBase_ = 0;  // m
  double valveSpeed_ = 0;                               // m/s, start of the next search
  double gapLow_ = 0, gapHigh_ = 0;                     // m, deflection that carries no force
  double bristle_ = 0, temperature_ = 0, kelvinRatio_ = 1, fade_ = 1;
  double gasForce_ = 0;
  bool rigid_ = true;
};

}  // namespace dampwright::bench
