// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_damper.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <vector>

#include "core/base/units.h"

namespace dampwright::bench {
namespace {

constexpr double amplitude = 0.05;           // m
constexpr double omega = 2 * pi * 100 / 60;  // rad/s: the published 100 mm at 100/min

/// The last of `cycles` sine cycles from the lower end, on an even grid.
struct Cycle {
  std::vector<double> x, v, force, rod;
  double dt = 0, energy = 0;

  double largest() const { return *std::max_element(force.begin(), force.end()); }
  double smallest() const { return *std::min_element(force.begin(), force.end()); }
};

Cycle lastCycle(const Damper& damper,
                double size = amplitude,
                double rate = omega,
                int cycles = 3,
                int steps = 30000) {
  Cycle cycle;
  cycle.dt = 2 * pi / rate / steps;
  DamperState state(damper, -size, cycle.dt);
  for (int i = 1; i <= cycles * steps; ++i) {
    const double phase = 2 * pi * i / steps;
    const double x = -size * std::cos(phase), v = size * rate * std::sin(phase);
    const double force = state.step(x);
    if (i <= (cycles - 1) * steps) continue;
    cycle.x.push_back(x);
    cycle.v.push_back(v);
    cycle.force.push_back(force);
    cycle.rod.push_back(state.rodPlace());
    cycle.energy += force * v * cycle.dt;
  }
  return cycle;
}

Damper viscous(double coefficient) {
  Damper damper;
  damper.compression = damper.rebound = linearLaw(coefficient);
  return damper;
}

Damper withFriction(FrictionForm form, double dry) {
  Damper damper;
  damper.friction.form = form;
  damper.friction.dry = damper.friction.breakaway = dry;
  damper.friction.roundness = 1e-6;
  return damper;
}

// W = πcωX²; 1500 N·s/m, 100 mm, 100/min: 123.370055 J, 785.398163 N. Chopra, Dynamics of
// Structures, section 3.8.
TEST(BenchDamper, ViscousEnergyAndForce) {
  const Cycle cycle = lastCycle(viscous(1500));
  EXPECT_NEAR(cycle.energy, 123.370055, 1e-5);  // steps of 1/30000: (ωdt)²/6 and rigid = 1e11 N/m
  EXPECT_NEAR(cycle.largest(), 785.398163, 1e-4);
}

// W = 4·Fc·X: 60 N, 50 mm: 12.000 J. Stutts, Equivalent viscous damping, eq. 10.
TEST(BenchDamper, CoulombEnergyWhateverTheFormOfFriction) {
  EXPECT_NEAR(lastCycle(withFriction(FrictionForm::Tanh, 60)).energy, 12.0, 1e-3);
  EXPECT_NEAR(lastCycle(withFriction(FrictionForm::Stribeck, 60)).energy, 12.0, 1e-3);
  // bristles bend Fc/σ = 0.03 mm before they slip, each way: 4·Fc·(X − Fc/σ)
  EXPECT_NEAR(lastCycle(withFriction(FrictionForm::Bristle, 60)).energy, 12.0, 12.0 * 1e-3);
}

TEST(BenchDamper, ViscousAndCoulombAdd) {
  Damper damper = viscous(1500);
  damper.friction = withFriction(FrictionForm::Tanh, 60).friction;
  EXPECT_NEAR(lastCycle(damper).energy, 135.370055, 1e-3);
  EXPECT_NEAR(lastCycle(damper, 0.025).energy, 36.842514, 1e-3);
}

// c = 2000 in series with 2e5 N/m: 1041.50245 N, 5.97821°, 162.709102 J, 108.47273 N at the
// stroke's end. Storage and loss of the Maxwell element, r = ωc/k.
TEST(BenchDamper, MaxwellForcePhaseAndEnergy) {
  Damper damper = viscous(2000);
  damper.oilStiffness = 2e5;
  const Cycle cycle = lastCycle(damper);
  EXPECT_NEAR(cycle.largest(), 1041.50245, 1e-3);
  EXPECT_NEAR(cycle.energy, 162.709102, 1e-4);
  double real = 0, imaginary = 0;  // first harmonic against displacement and velocity
  for (std::size_t i = 0; i < cycle.x.size(); ++i) {
    real += cycle.force[i] * cycle.x[i] / amplitude;
    imaginary += cycle.force[i] * cycle.v[i] / (amplitude * omega);
  }
  EXPECT_NEAR(std::atan2(real, imaginary) * 180 / pi, 5.97821, 1e-4);
  EXPECT_NEAR(cycle.force[cycle.force.size() / 2 - 1], 108.47273, 1e-3);
}

TEST(BenchDamper, TheSameStiffnessInTheRigGivesTheSameLoop) {
  Damper oil = viscous(2000), rig = viscous(2000);
  oil.oilStiffness = 2e5;
  rig.rigStiffness = 2e5;
  const Cycle first = lastCycle(oil), second = lastCycle(rig);
  for (std::size_t i = 0; i < first.force.size(); i += 500)
    EXPECT_NEAR(first.force[i], second.force[i], 0.01);  // rigid stands for 1e11 N/m
}

// F = (p − p_atm)·A, p = p0·(V0/(V0 − A·x))^n with a rod of 11 mm, 25 bar gauge and 100 cm³ at full
// extension: 237.5829 N, at 80 mm 262.1889 N (n = 1.2) or 257.9241 N (n = 1); rate 281.920 N/m.
TEST(BenchDamper, GasForceFollowsItsColumn) {
  const double area = 95.0332e-6, length = 100e-6 / area;
  const double air = 101325 * area;
  const GasColumn gas{.force = 237.5829, .length = length, .exponent = 1.2, .atmosphere = air};
  EXPECT_NEAR(gas.at(0, 1), 237.5829, 1e-9);
  EXPECT_NEAR(gas.at(0.08, 1), 262.1889, 1e-3);
  EXPECT_NEAR((gas.at(1e-6, 1) - gas.at(-1e-6, 1)) / 2e-6, 281.920, 1e-2);
  const GasColumn isothermal{
      .force = 237.5829, .length = length, .exponent = 1.0, .atmosphere = air};
  EXPECT_NEAR(isothermal.at(0.08, 1), 257.9241, 1e-3);
}

// A charge warmed from 20 to 80 °C: absolute pressure × 1.2047 at fixed volume.
TEST(BenchDamper, GasWarmsByItsAbsolutePressure) {
  const GasColumn gas{.force = 237.5829, .atmosphere = 9.629};
  EXPECT_NEAR(gas.at(0, 353.15 / 293.15), (237.5829 + 9.629) * 1.20467 - 9.629, 1e-2);
}

TEST(BenchDamper, LostMotionIsTravelWithoutForceAfterEachReversal) {
  Damper damper = viscous(2000);
  damper.oilStiffness = 1e8;
  damper.reboundGap = 0.002;
  damper.compressionGap = 0.0005;
  const Cycle cycle = lastCycle(damper);
  double reboundTravel = 0, compressionTravel = 0;
  for (std::size_t i = 1; i < cycle.x.size(); ++i) {
    if (cycle.force[i] != 0) continue;
    (cycle.v[i] < 0 ? reboundTravel : compressionTravel) += std::abs(cycle.x[i] - cycle.x[i - 1]);
  }
  EXPECT_NEAR(reboundTravel, 0.002, 1e-5);  // a step's travel at each side, and F/k
  EXPECT_NEAR(compressionTravel, 0.0005, 1e-5);
  EXPECT_NEAR(cycle.largest(), 2000 * amplitude * omega, 0.01);  // mid-stroke knows nothing of it
}

TEST(BenchDamper, WithGasLostMotionBeginsAtTheGasForceAndPlayAtZero) {
  Damper damper = viscous(2000);
  damper.gas.force = 200;
  damper.oilStiffness = 1e8;
  damper.reboundGap = 0.002;
  int atGas = 0;
  for (const double force : lastCycle(damper).force) atGas += std::abs(force - 200) < 0.01 ? 1 : 0;
  EXPECT_GT(atGas, 1000);

  Damper loose = viscous(2000);
  loose.gas.force = 200;
  loose.play = 0.001;
  loose.rigStiffness = 1e8;
  const Cycle cycle = lastCycle(loose);
  double travel = 0;
  for (std::size_t i = 1; i < cycle.x.size(); ++i) {
    const double stretch = cycle.x[i] - cycle.rod[i];
    EXPECT_LT(std::abs(stretch), 0.0005 + 1300 / 1e8);
    if (std::abs(stretch) < 0.0005 - 1e-9) {
      EXPECT_NEAR(cycle.force[i], 0, 0.01);
      travel = std::max(travel, std::abs(stretch));
    }
  }
  EXPECT_GT(travel, 0.0004);  // the gap is crossed
  // 200 N of gas against 2000 N·s/m: it is crossed away from the turning points
  EXPECT_GT(cycle.force[cycle.force.size() / 2 - 1], 150);
}

TEST(BenchDamper, GasHoldsPlayShutWhereTheDamperPullsLessThanIt) {
  Damper damper = viscous(300);  // 157 N at most
  damper.gas.force = 200;
  damper.play = 0.001;
  damper.rigStiffness = 1e8;
  EXPECT_GT(lastCycle(damper).smallest(), 40);
}

TEST(BenchDamper, FadeFollowsTheEnergyThatWarmsTheOil) {
  Damper damper = viscous(1500);
  damper.warmth = {.start = 20, .room = 20, .capacity = 100, .fadePercentPer10C = -2};
  const double dt = 2 * pi / omega / 5000;
  DamperState state(damper, -amplitude, dt);
  double energy = 0, lastPeak = 0;
  for (int i = 1; i <= 20 * 5000; ++i) {
    const double phase = 2 * pi * i / 5000;
    const double force = state.step(-amplitude * std::cos(phase));
    energy += force * amplitude * omega * std::sin(phase) * dt;
    if (i % 5000 == 1250) lastPeak = force;
  }
  EXPECT_NEAR(state.temperature(), 20 + energy / 100, 0.01);
  const double atPeak = 20 + (energy - 0.75 * energy / 20) / 100;  // three quarters of a cycle ago
  EXPECT_NEAR(lastPeak / (1500 * amplitude * omega), 1 - 0.002 * (atPeak - 20), 5e-4);
}

TEST(BenchDamper, StiffElementsStayStableAtCoarseSteps) {
  Damper damper;
  damper.compression = leakAndOrificeLaw(4000, 0.02);
  damper.rebound = throughPointsLaw({{0.05, 300}, {0.3, 900}, {1.0, 1500}});
  damper.oilStiffness = 5e7;
  damper.rigStiffness = 5e7;
  damper.friction = {.dry = 20};
  const Cycle coarse = lastCycle(damper, amplitude, omega, 3, 600);
  const Cycle fine = lastCycle(damper, amplitude, omega, 3, 60000);
  for (std::size_t i = 20; i < 280; ++i)  // compression, away from the reversal
    EXPECT_NEAR(coarse.force[i], fine.force[i * 100 + 99], 1.0) << i;
}

}  // namespace
}  // namespace dampwright::bench
