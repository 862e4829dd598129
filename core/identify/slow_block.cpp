// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/identify/slow_block.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <vector>

namespace dampwright {
namespace {

using Eigen::Index;
using Eigen::MatrixXd;
using Eigen::VectorXd;

constexpr double nan = std::numeric_limits<double>::quiet_NaN();
constexpr double infinite = std::numeric_limits<double>::infinity();
constexpr double smallestChange = 0.005, largestChange = 0.25;  // v_f over the peak speed
constexpr std::array<double, 3> changeStarts{0.02, 0.06, 0.2};  // the same; the best fit is taken
constexpr double directFrom = 0.15, directTo = 0.35;            // |v| over the peak speed
constexpr double nearReversal =
    0.02;  // |v| over the peak speed: nearer, a mean mixes both directions
constexpr double largestReach = 0.9;  // |x/L|
constexpr double significant = 2;     // standard errors, for 1/L to be kept

// Order of the parameters.
enum Parameter : Index { Force, Shape, Dry, Change, CompressionSlope, ReboundSlope, Count };
// Behind them in the richer model: a valve that is not straight at low speed, N at the peak speed.
enum Curve : Index { CompressionCurve = Count, ReboundCurve, RichCount };

struct Samples {
  VectorXd x, v, force;
  double peakSpeed = 0, amplitude = 0;
};

Samples deceleratingHalves(const Loop& loop) {
  const auto& v = loop.velocity;
  const auto fastestIn = std::max_element(v.begin(), v.end()) - v.begin();
  const auto fastestOut = std::min_element(v.begin(), v.end()) - v.begin();
  if (loop.size() == 0) return {};
  const double least = nearReversal * *std::max_element(v.begin(), v.end());
  std::vector<std::size_t> chosen;
  for (std::size_t i = 0; i < loop.size(); ++i) {
    const auto at = static_cast<std::ptrdiff_t>(i);
    const bool in = v[i] > least && at >= fastestIn && at < fastestOut;
    const bool out = v[i] < -least && at >= fastestOut;
    if ((in || out) && std::isfinite(loop.force[i])) chosen.push_back(i);
  }
  const auto count = static_cast<Index>(chosen.size());
  Samples samples{VectorXd(count), VectorXd(count), VectorXd(count)};
  for (Index k = 0; k < count; ++k) {
    const std::size_t i = chosen[static_cast<std::size_t>(k)];
    samples.x[k] = loop.displacement[i];
    samples.v[k] = v[i];
    samples.force[k] = loop.force[i];
  }
  if (count > 0) {
    samples.peakSpeed = samples.v.cwiseAbs().maxCoeff();
    samples.amplitude = samples.x.cwiseAbs().maxCoeff();
  }
  return samples;
}

/// The model; `shape` says what the parameter Shape is: 1/L of a column, or the rate of a line.
struct Model {
  const Samples& samples;
  GasShape shape;
  double exponent;

  double curve(double v) const { return v * std::abs(v) / std::pow(samples.peakSpeed, 2); }
  GasColumn columnOf(const VectorXd& b) const { return {b[Force], b[Shape], exponent}; }

  VectorXd residuals(const VectorXd& b) const {
    const DryFriction friction{b[Dry], b[Change]};
    VectorXd r(samples.x.size());
    for (Index i = 0; i < r.size(); ++i) {
      const double x = samples.x[i];
      const double v = samples.v[i];
      const double gas = shape == GasShape::Column ? columnOf(b).at(x) : b[Force] + b[Shape] * x;
      const double slope = v > 0 ? b[CompressionSlope] : b[ReboundSlope];
      r[i] = gas + friction.at(v) + slope * v - samples.force[i];
      if (b.size() == RichCount) r[i] += b[v > 0 ? CompressionCurve : ReboundCurve] * curve(v);
    }
    return r;
  }

  MatrixXd jacobian(const VectorXd& b) const {
    const DryFriction friction{b[Dry], b[Change]};
    MatrixXd j = MatrixXd::Zero(samples.x.size(), b.size());
    for (Index i = 0; i < j.rows(); ++i) {
      const double x = samples.x[i];
      const double v = samples.v[i];
      const GasColumnGradient gas =
          shape == GasShape::Column ? gradientOf(columnOf(b), x) : GasColumnGradient{1, x};
      const DryFrictionGradient dry = gradientOf(friction, v);
      j(i, Force) = gas.byForce;
      j(i, Shape) = gas.byInverseLength;
      j(i, Dry) = dry.byForce;
      j(i, Change) = dry.byChangeSpeed;
      j(i, v > 0 ? CompressionSlope : ReboundSlope) = v;
      if (b.size() == RichCount) j(i, v > 0 ? CompressionCurve : ReboundCurve) = curve(v);
    }
    return j;
  }
};

VectorXd startOf(const Model& model, double changeShare) {
  const Samples& samples = model.samples;
  Index in = 0;
  Index out = 0;
  samples.x.maxCoeff(&in);
  samples.x.minCoeff(&out);
  const double middle = 0.5 * (samples.force[in] + samples.force[out]);
  const double rate = (samples.force[in] - samples.force[out]) / (2 * samples.amplitude);
  Index fastIn = 0;
  Index fastOut = 0;
  samples.v.maxCoeff(&fastIn);
  samples.v.minCoeff(&fastOut);
  VectorXd start(Count);
  const double limit = 0.5 * largestReach / samples.amplitude;
  const double inverse = middle != 0 ? rate / (model.exponent * middle) : 0;
  start[Force] = middle;
  start[Shape] = model.shape == GasShape::Line ? rate : std::clamp(inverse, -limit, limit);
  start[Dry] = std::max(0.0, 0.5 * (samples.force[fastIn] - samples.force[fastOut]));
  start[Change] = changeShare * samples.peakSpeed;
  start[CompressionSlope] = 0;
  start[ReboundSlope] = 0;
  return start;
}

/// Largest |Shape| and Dry; 0 takes that part out of the model.
struct Limits {
  double shape = infinite, dry = infinite;
};

FitSummary fitModel(const Model& model, const Limits& limits) {
  const Samples& samples = model.samples;
  LeastSquaresProblem problem{[&](const VectorXd& b) { return model.residuals(b); },
                              [&](const VectorXd& b) { return model.jacobian(b); },
                              VectorXd::Constant(Count, -infinite),
                              VectorXd::Constant(Count, infinite)};
  problem.lower[Shape] = -limits.shape;
  problem.upper[Shape] = limits.shape;
  problem.lower[Dry] = 0;
  problem.upper[Dry] = limits.dry;
  problem.lower[Change] = smallestChange * samples.peakSpeed;
  problem.upper[Change] = (limits.dry > 0 ? largestChange : smallestChange) * samples.peakSpeed;
  FitSummary best;
  for (const double share : changeStarts) {
    const FitSummary found = fitLeastSquares(problem, startOf(model, share));
    const bool better = found.usable() && (!best.usable() || found.rss < best.rss);
    if (best.parameters.size() == 0 || better) best = found;
  }
  return best;
}

/// The full model, or where the data do not hold all of it, less of it: without friction the change
/// speed means nothing, without gas force its length.
FitSummary fitFullestModel(const Model& model) {
  const double reach =
      model.shape == GasShape::Column ? largestReach / model.samples.amplitude : infinite;
  FitSummary found;
  for (const Limits& limits : {Limits{reach, infinite}, {reach, 0}, {0, infinite}, {0, 0}}) {
    found = fitModel(model, limits);
    if (found.usable()) break;
  }
  return found;
}

/// What a bend of the valve's law at low speed would do to gas force and dry friction: the distance
/// to a fit that has one, less what noise alone puts between both fits; to the gas also its greater
/// standard error there, because noise may hide the bend.
struct FormDoubt {
  double gas = 0, dry = 0;
};

FormDoubt formDoubt(const Model& model, const FitSummary& found, double widening) {
  LeastSquaresProblem problem{[&](const VectorXd& b) { return model.residuals(b); },
                              [&](const VectorXd& b) { return model.jacobian(b); },
                              VectorXd::Constant(RichCount, -infinite),
                              VectorXd::Constant(RichCount, infinite)};
  const double peak = model.samples.peakSpeed;
  problem.lower[Dry] = 0;
  problem.lower[Change] = smallestChange * peak;
  problem.upper[Change] = largestChange * peak;
  VectorXd start = VectorXd::Zero(RichCount);
  start.head(Count) = found.parameters;
  const FitSummary rich = fitLeastSquares(problem, start);
  if (!rich.usable()) return {};
  const auto doubt = [&](Parameter which) {
    const double distance = rich.parameters[which] - found.parameters[which];
    const double noise = std::pow(widening * rich.standardErrors[which], 2) -
                         std::pow(widening * found.standardErrors[which], 2);
    return std::sqrt(std::max(0.0, distance * distance - std::max(0.0, noise)));
  };
  const double hidden = widening * rich.standardErrors[Force];
  const double own = widening * found.standardErrors[Force];
  return {std::hypot(doubt(Force), std::sqrt(std::max(0.0, hidden * hidden - own * own))),
          doubt(Dry)};
}

/// Standard error of the dry friction, as if no bound held another parameter. Where the friction
/// itself stands at 0, its change speed says nothing, and it is the error with that speed given.
double dryError(const Model& model, const FitSummary& found) {
  if (!found.usable()) return nan;
  MatrixXd jacobian = model.jacobian(found.parameters);
  if (found.parameters[Dry] == 0) {
    jacobian.col(Change) = jacobian.col(Count - 1);
    jacobian = jacobian.leftCols(Count - 1).eval();
  }
  const auto covariance = unscaledCovariance(jacobian);
  return covariance ? std::sqrt(found.residualVariance * (*covariance)(Dry, Dry)) : nan;
}

/// Half the force difference between both directions at one place, at low speed near both ends: a
/// friction that needs no form, though it holds the slope's share and suffers from lost motion.
double directHalfDifference(const Loop& loop) {
  const auto& v = loop.velocity;
  const double peak = *std::max_element(v.begin(), v.end());
  double sum = 0;
  int count = 0;
  for (std::size_t i = 0; i < loop.size(); ++i) {
    if (v[i] < directFrom * peak || v[i] > directTo * peak) continue;
    double nearest = infinite;
    double opposite = nan;
    for (std::size_t k = 0; k < loop.size(); ++k) {
      const double distance = std::abs(loop.displacement[k] - loop.displacement[i]);
      if (v[k] >= 0 || distance >= nearest) continue;
      nearest = distance;
      opposite = loop.force[k];
    }
    const double half = 0.5 * (loop.force[i] - opposite);
    if (!std::isfinite(half)) continue;
    sum += half;
    ++count;
  }
  return sum / std::max(count, 1);
}

/// Lag-one correlation of residuals, not below 0; 0 where there is nothing but rounding.
double neighbourCorrelation(const VectorXd& residuals) {
  const Index last = residuals.size() - 1;
  const double square = residuals.squaredNorm();
  if (last < 1 || !(square > 0)) return 0;
  return std::clamp(residuals.head(last).dot(residuals.tail(last)) / square, 0.0, 0.99);
}

}  // namespace

SlowBlockFit fitSlowBlock(const Block& block, GasShape shape, double exponent) {
  SlowBlockFit out;
  const Samples samples = deceleratingHalves(block.loop);
  if (samples.x.size() <= Count) {
    out.status = FitStatus::RankDeficient;
    return out;
  }
  const Model model{samples, shape, exponent};
  const FitSummary found = fitFullestModel(model);
  const VectorXd& b = found.parameters;
  const double correlation = neighbourCorrelation(model.residuals(b));
  const double widening = std::sqrt((1 + correlation) / (1 - correlation));
  const double doubt =
      correlation * std::abs(b[Dry] - directHalfDifference(block.loop)) / std::sqrt(3.0);
  const double shapeU = widening * found.standardErrors[Shape];
  const bool kept = shape == GasShape::Column && std::abs(b[Shape]) > significant * shapeU;
  const double ratePerShape = shape == GasShape::Column ? b[Force] * exponent : 1;
  out.status = found.status;
  out.gas = {b[Force], kept ? b[Shape] : 0, exponent};
  const FormDoubt form = found.usable() ? formDoubt(model, found, widening) : FormDoubt{};
  out.gasU = std::hypot(widening * found.standardErrors[Force], form.gas);
  out.rate = ratePerShape * b[Shape];
  out.rateU = std::hypot(ratePerShape * shapeU, doubt / samples.amplitude);
  out.friction = {b[Dry], b[Change]};
  out.dryU = std::hypot(widening * dryError(model, found), std::max(doubt, form.dry));
  const auto count = static_cast<double>(samples.x.size());
  out.dof = std::max(1.0, count / (widening * widening) - (count - found.dof));
  out.rms = std::sqrt(found.rss / count);
  return out;
}

}  // namespace dampwright
