// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_law.h"

#include <algorithm>
#include <cmath>
#include <memory>

#include "core/base/expects.h"
#include "core/base/units.h"
#include "tests/support/bench_root.h"

namespace dampwright::bench {

Law linearLaw(double coefficient) {
  return {"linear", [=](double v) { return coefficient * v; }};
}

Law powerLaw(double coefficient, double exponent) {
  return {"power", [=](double v) { return v > 0 ? coefficient * std::pow(v, exponent) : 0.0; }};
}

Law twoSlopeLaw(double low, double high, double knee) {
  return {"two-slope",
          [=](double v) { return v < knee ? low * v : low * knee + high * (v - knee); }};
}

Law smoothLaw(double low, double high, double knee) {
  return {"smooth",
          [=](double v) { return high * v - (low - high) * knee * std::expm1(-v / knee); }};
}

Law bleedAndBlowOffLaw(double bleed, double opening, double valve) {
  const double opensAt = bleed * std::sqrt(opening);
  return {"bleed and blow-off", [=](double v) {
            if (v <= opensAt) return (v / bleed) * (v / bleed);
            // with r = √F: r²/valve + bleed·r − (opening/valve + v) = 0
            const double half = bleed * valve / 2.0;
            const double root = -half + std::sqrt(half * half + opening + v * valve);
            return root * root;
          }};
}

Law leakAndOrificeLaw(double leak, double orifice) {
  const double half = orifice * leak / 2.0;
  return {"leak and orifice", [=](double v) {
            // with r = √F: r² + 2·half·r − v·leak = 0, written without cancellation
            const double root = v * leak / (half + std::sqrt(half * half + v * leak));
            return root * root;
          }};
}

Law arctanShoulderLaw(double shoulder, double at, double high) {
  return {"arctan shoulder",
          [=](double v) { return shoulder * 2.0 / pi * std::atan(v / at) + high * v; }};
}

namespace {

struct Table {
  std::vector<double> v, f, slope;
};

Table monotoneTable(const std::vector<std::pair<double, double>>& points) {
  Table table{{0.0}, {0.0}, {}};
  for (const auto& [speed, force] : points) {
    expects(speed > table.v.back() && force >= table.f.back());
    table.v.push_back(speed);
    table.f.push_back(force);
  }
  const std::size_t n = table.v.size();
  expects(n >= 2);
  std::vector<double> secant(n - 1);
  for (std::size_t i = 0; i + 1 < n; ++i)
    secant[i] = (table.f[i + 1] - table.f[i]) / (table.v[i + 1] - table.v[i]);
  table.slope.assign(n, 0.0);
  table.slope.front() = secant.front();
  table.slope.back() = secant.back();
  for (std::size_t i = 1; i + 1 < n; ++i) {
    const double sum = secant[i - 1] + secant[i];
    table.slope[i] = sum > 0 ? 2.0 * secant[i - 1] * secant[i] / sum : 0.0;
  }
  return table;
}

double tableForce(const Table& table, double v) {
  if (v >= table.v.back()) return table.f.back() + table.slope.back() * (v - table.v.back());
  const auto above = std::upper_bound(table.v.begin(), table.v.end(), std::max(v, 0.0));
  const auto i = static_cast<std::size_t>(above - table.v.begin()) - 1;
  const double width = table.v[i + 1] - table.v[i];
  const double t = (v - table.v[i]) / width;
  const double u = 1.0 - t;
  return table.f[i] * u * u * (1 + 2 * t) + table.f[i + 1] * t * t * (1 + 2 * u) +
         width * t * u * (table.slope[i] * u - table.slope[i + 1] * t);
}

}  // namespace

Law throughPointsLaw(std::vector<std::pair<double, double>> points) {
  const auto table = std::make_shared<const Table>(monotoneTable(points));
  return {"through points", [table](double v) { return tableForce(*table, v); }};
}

Law leakingLaw(Law law, double leak) {
  const auto tight = law.force;
  return {law.form + " with a leak", [=](double v) {
            if (v <= 0) return 0.0;
            // u is the speed of the oil that still goes through the valve
            const auto excess = [&](double u) { return u + tight(u) / leak - v; };
            return tight(rootOfRising(excess, 0.0, v, v / 2));
          }};
}

Law scaledLaw(Law law, double factor) {
  return {law.form, [force = law.force, factor](double v) { return factor * force(v); }};
}

}  // namespace dampwright::bench
