// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_damper.h"

#include <algorithm>
#include <cmath>

#include "tests/support/bench_root.h"

namespace dampwright::bench {
namespace {

constexpr double kelvinAtZeroC = 273.15;
constexpr double stiffest = 1e11;  // N/m, stands for rigid: a lag c/k of some 10 ns

}  // namespace

double GasColumn::at(double x, double kelvinRatio) const {
  const double squeezed = std::isfinite(length) ? std::pow(length / (length - x), exponent) : 1.0;
  return (force + atmosphere) * squeezed * kelvinRatio - atmosphere;
}

DryFriction::Answer DryFriction::at(double v, double bristle, double dt) const {
  if (form == FrictionForm::Tanh) return {dry * std::tanh(v / roundness), 0};
  const double slow = std::exp(-(v / fadeSpeed) * (v / fadeSpeed));
  const double slips = dry + (breakaway - dry) * slow;
  if (form == FrictionForm::Stribeck) return {slips * std::tanh(v / roundness), 0};
  const double next = (bristle + dt * v) / (1 + dt * stiffness * std::abs(v) / slips);
  return {stiffness * next + damping * (next - bristle) / dt, next};
}

DamperState::DamperState(const Damper& damper, double crosshead, double dt)
    : damper_(damper),
      alpha_(dt / 1.5),
      dt_(dt),
      stiffness_(std::min(damper.oilStiffness, stiffest)),
      temperature_(damper.warmth.start),
      rigid_(!std::isfinite(damper.rigStiffness) && damper.play == 0) {
  const double pushed = damper.gas.at(crosshead, 1);
  // at rest under its gas the rod stands off by the rig's deflection and half the play
  const double deflection = rigid_ ? 0 : pushed / std::min(damper.rigStiffness, stiffest);
  rod_ = rodBefore_ = crosshead - deflection - damper.play / 2;
  valve_ = valveBefore_ = rod_;
  gasForce_ = pushed;
}

DamperState::Balance DamperState::valveAt(double rod) const {
  const double free = rod - valveBase_;  // deflection if the valve does not move
  const double over = free > gapHigh_ ? free - gapHigh_ : free < gapLow_ ? gapLow_ - free : 0;
  if (over == 0) return {};
  const double sign = free > gapHigh_ ? 1 : -1;
  const Law& law = sign > 0 ? damper_.compression : damper_.rebound;
  const auto excess = [&](double speed) {
    return fade_ * law.force(speed) + stiffness_ * (alpha_ * speed - over);
  };
  const double speed = rootOfRising(excess, 0, over / alpha_, sign * valveSpeed_);
  return {sign * stiffness_ * (over - alpha_ * speed), sign * speed};
}

DamperState::Balance DamperState::balanceAt(double rod) const {
  const double speed = (rod - rodBase_) / alpha_;
  Balance balance = valveAt(rod);
  balance.force +=
      damper_.gas.at(rod, kelvinRatio_) + damper_.friction.at(speed, bristle_, dt_).force;
  return balance;
}

double DamperState::mountForce(double stretch) const {
  const double half = damper_.play / 2;
  const double over = std::max(std::abs(stretch) - half, 0.0);
  return std::copysign(std::min(damper_.rigStiffness, stiffest) * over, stretch);
}

double DamperState::solveRod(double crosshead) const {
  if (rigid_) return crosshead;
  const auto excess = [&](double rod) {
    return balanceAt(rod).force - mountForce(crosshead - rod);
  };
  double reach = damper_.play + 1e-5;
  while (excess(crosshead - reach) > 0 || excess(crosshead + reach) < 0) reach *= 2;
  return rootOfRising(excess, crosshead - reach, crosshead + reach, 2 * rod_ - rodBefore_);
}

double DamperState::step(double crosshead) {
  rodBase_ = (4 * rod_ - rodBefore_) / 3;
  valveBase_ = (4 * valve_ - valveBefore_) / 3;
  const double rod = solveRod(crosshead);
  const auto [force, valveSpeed] = balanceAt(rod);
  valveSpeed_ = valveSpeed;
  const double speed = (rod - rodBase_) / alpha_;
  bristle_ = damper_.friction.at(speed, bristle_, dt_).bristle;
  valveBefore_ = valve_;
  valve_ = valveBase_ + alpha_ * valveSpeed_;
  const double deflection = rod - valve_;
  if (deflection > gapHigh_) gapLow_ = gapHigh_ - damper_.reboundGap;
  if (deflection < gapLow_) gapHigh_ = gapLow_ + damper_.compressionGap;
  gasForce_ = damper_.gas.at(rod, kelvinRatio_);
  const double heat = (force - gasForce_) * (rod - rod_) / damper_.warmth.capacity;
  const double loss =
      damper_.warmth.cooling * (temperature_ - damper_.warmth.room) * dt_ / damper_.warmth.capacity;
  temperature_ += heat - loss;
  rodBefore_ = rod_;
  rod_ = rod;
  const double warmer = temperature_ - damper_.warmth.start;
  kelvinRatio_ = 1 + warmer / (damper_.warmth.start + kelvinAtZeroC);
  fade_ = 1 + damper_.warmth.fadePercentPer10C / 100 * warmer / 10;
  return force;
}

}  // namespace dampwright::bench
