// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <functional>
#include <string>
#include <utility>
#include <vector>

namespace dampwright::bench {

/// Damping force of one direction [N] at a valve speed v >= 0 [m/s]: zero at zero, never falling.
struct Law {
  std::string form;
  std::function<double(double)> force;
};

/// c·v.
Law linearLaw(double coefficient);

/// c·v^p, p > 0; c in N·(s/m)^p.
Law powerLaw(double coefficient, double exponent);

/// low·v up to the knee [m/s], from there with the slope `high`.
Law twoSlopeLaw(double low, double high, double knee);

/// high·v + (low − high)·knee·(1 − e^(−v/knee)).
Law smoothLaw(double low, double high, double knee);

/// v = bleed·√F + max(0, F − opening)/valve; bleed in m/s/√N, opening in N, valve in N·s/m.
Law bleedAndBlowOffLaw(double bleed, double opening, double valve);

/// v = F/leak + orifice·√F: a laminar leak beside a sharp-edged hole, as oil flows through a worn
/// seal and a jet. leak in N·s/m, orifice in m/s/√N.
Law leakAndOrificeLaw(double leak, double orifice);

/// shoulder·(2/π)·atan(v/at) + high·v: a blow-off valve that opens softly.
Law arctanShoulderLaw(double shoulder, double at, double high);

/// Monotone cubic through (0, 0) and the points (speed m/s, force N, both rising), the last slope
/// beyond. Source: Fritsch and Carlson, SIAM J. Numer. Anal. 17 (1980) 238, slopes by their
/// harmonic mean.
Law throughPointsLaw(std::vector<std::pair<double, double>> points);

/// The same valve with a laminar leak beside it: v = v_law(F) + F/leak.
Law leakingLaw(Law law, double leak);

/// Every force times `factor`.
Law scaledLaw(Law law, double factor);

}  // namespace dampwright::bench
