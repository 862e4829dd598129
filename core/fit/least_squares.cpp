// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/fit/least_squares.h"

#include <Eigen/QR>
#include <algorithm>
#include <cmath>
#include <limits>
#include <vector>

#include "core/base/expects.h"
#include "core/fit/scaled_qr.h"

namespace dampwright {
namespace {

using Eigen::Index;
using Eigen::MatrixXd;
using Eigen::VectorXd;

constexpr double nan = std::numeric_limits<double>::quiet_NaN();
constexpr double smallestStep = 1e-14;   // of a parameter: below, rounding decides
constexpr double largestDamping = 1e20;  // beyond, a step is lost in rounding

/// A place in parameter space with everything known there.
struct Point {
  VectorXd parameters, residuals;
  MatrixXd jacobian;
  double rss = 0;
  std::vector<Index> free;  ///< parameters that no bound holds
};

VectorXd clamp(const LeastSquaresProblem& problem, VectorXd parameters) {
  if (problem.lower.size() > 0) parameters = parameters.cwiseMax(problem.lower);
  if (problem.upper.size() > 0) parameters = parameters.cwiseMin(problem.upper);
  return parameters;
}

MatrixXd numericalJacobian(const LeastSquaresProblem& problem, const VectorXd& parameters) {
  const double share = std::cbrt(std::numeric_limits<double>::epsilon());
  MatrixXd jacobian;
  for (Index j = 0; j < parameters.size(); ++j) {
    const double step = share * std::max(std::abs(parameters[j]), share);
    VectorXd above = parameters;
    VectorXd below = parameters;
    above[j] += step;
    below[j] -= step;
    above = clamp(problem, above);
    below = clamp(problem, below);
    const VectorXd column =
        (problem.residuals(above) - problem.residuals(below)) / (above[j] - below[j]);
    if (jacobian.size() == 0) jacobian.resize(column.size(), parameters.size());
    jacobian.col(j) = column;
  }
  return jacobian;
}

/// Parameters that may move: not those at a bound with the way down pointing outside.
std::vector<Index> freeParameters(const LeastSquaresProblem& problem, const Point& point) {
  const VectorXd gradient = point.jacobian.transpose() * point.residuals;
  std::vector<Index> free;
  for (Index j = 0; j < gradient.size(); ++j) {
    const bool low = problem.lower.size() > 0 && point.parameters[j] <= problem.lower[j];
    const bool high = problem.upper.size() > 0 && point.parameters[j] >= problem.upper[j];
    const bool fixed = low && high;
    if (!fixed && !(low && gradient[j] > 0) && !(high && gradient[j] < 0)) free.push_back(j);
  }
  return free;
}

void differentiate(const LeastSquaresProblem& problem, Point& point) {
  point.jacobian = problem.jacobian ? problem.jacobian(point.parameters)
                                    : numericalJacobian(problem, point.parameters);
  point.free = freeParameters(problem, point);
}

Point evaluate(const LeastSquaresProblem& problem, VectorXd parameters) {
  Point point;
  point.parameters = std::move(parameters);
  point.residuals = problem.residuals(point.parameters);
  point.rss = point.residuals.squaredNorm();
  return point;
}

/// The undamped step at a point, and how far from the minimum it says we are.
struct Outlook {
  double cosine = 0;        ///< ‖Qᵀr‖/‖r‖
  double relativeStep = 0;  ///< largest |δb|/|b|
  bool fullRank = false;
};

Outlook outlook(const Point& point, double rankTolerance) {
  const ScaledQr qr(point.jacobian(Eigen::all, point.free));
  Outlook out;
  out.fullRank = qr.fullRank(rankTolerance);
  if (!out.fullRank) return out;
  const VectorXd projection = qr.project(point.residuals);
  out.cosine = point.rss > 0 ? projection.norm() / std::sqrt(point.rss) : 0;
  const VectorXd step = qr.solve(projection).cwiseAbs();
  const VectorXd at = point.parameters(point.free).cwiseAbs();
  for (Index j = 0; j < step.size(); ++j) {
    if (step[j] > 0) out.relativeStep = std::max(out.relativeStep, step[j] / at[j]);
  }
  return out;
}

/// The damped step over the free parameters: least ‖Jδ + r‖² + λ‖Dδ‖².
VectorXd dampedStep(const Point& point, const VectorXd& scale, double damping) {
  const Index rows = point.residuals.size();
  const Index count = static_cast<Index>(point.free.size());
  MatrixXd stacked = MatrixXd::Zero(rows + count, count);
  stacked.topRows(rows) = point.jacobian(Eigen::all, point.free);
  for (Index j = 0; j < count; ++j) {
    stacked(rows + j, j) = std::sqrt(damping) * scale[point.free[static_cast<std::size_t>(j)]];
  }
  VectorXd right = VectorXd::Zero(rows + count);
  right.head(rows) = -point.residuals;
  const VectorXd partial = stacked.colPivHouseholderQr().solve(right);
  VectorXd step = VectorXd::Zero(point.parameters.size());
  step(point.free) = partial;
  return step;
}

FitStatus statusAt(const Point& point, const Outlook& out, double tolerance) {
  if (!out.fullRank) return FitStatus::RankDeficient;
  const bool near = out.cosine <= tolerance || out.relativeStep <= smallestStep;
  if (!near) return FitStatus::NotConverged;
  const bool held = static_cast<Index>(point.free.size()) < point.parameters.size();
  return held ? FitStatus::AtBound : FitStatus::Converged;
}

FitSummary summarize(const Point& point, FitStatus status, int iterations) {
  FitSummary summary;
  const Index count = point.parameters.size();
  summary.status = status;
  summary.parameters = point.parameters;
  summary.rss = point.rss;
  summary.iterations = iterations;
  summary.dof =
      static_cast<double>(point.residuals.size()) - static_cast<double>(point.free.size());
  if (summary.dof > 0) summary.residualVariance = point.rss / summary.dof;
  summary.standardErrors = VectorXd::Constant(count, nan);
  summary.covariance = MatrixXd::Constant(count, count, nan);
  if (!summary.usable()) return summary;
  summary.covariance(point.free, point.free) =
      summary.residualVariance * ScaledQr(point.jacobian(Eigen::all, point.free)).inverseOfSquare();
  summary.standardErrors = summary.covariance.diagonal().cwiseSqrt();
  return summary;
}

/// Damping between steps, steered by the gain ratio (actual over predicted decrease).
struct Damping {
  double value = 1e-3;
  double growth = 2;

  void accepted(double gain) {
    value *= std::max(1.0 / 3, 1 - std::pow(2 * gain - 1, 3));
    growth = 2;
  }
  void rejected() {
    value *= growth;
    growth *= 2;
  }
};

}  // namespace

std::string_view codeOf(FitStatus status) {
  switch (status) {
    case FitStatus::Converged:
      return "converged";
    case FitStatus::AtBound:
      return "at-bound";
    case FitStatus::RankDeficient:
      return "rank-deficient";
    case FitStatus::NotConverged:
      return "not-converged";
    case FitStatus::NotFinite:
      return "not-finite";
  }
  return {};
}

std::optional<MatrixXd> unscaledCovariance(const MatrixXd& jacobian, double rankTolerance) {
  const ScaledQr qr(jacobian);
  if (!qr.fullRank(rankTolerance)) return std::nullopt;
  return qr.inverseOfSquare();
}

FitSummary fitLeastSquares(const LeastSquaresProblem& problem,
                           const VectorXd& start,
                           const FitOptions& options) {
  expects(bool(problem.residuals) && start.size() > 0 && options.maxIterations > 0);
  Point point = evaluate(problem, clamp(problem, start));
  if (std::isfinite(point.rss)) differentiate(problem, point);
  if (!std::isfinite(point.rss) || !point.jacobian.allFinite()) {
    return summarize(point, FitStatus::NotFinite, 0);
  }
  VectorXd scale = VectorXd::Constant(start.size(), std::numeric_limits<double>::min());
  Damping damping;
  Outlook out = outlook(point, options.rankTolerance);
  int iterations = 0;
  while (iterations < options.maxIterations && damping.value < largestDamping) {
    const FitStatus status = statusAt(point, out, options.tolerance);
    if (status == FitStatus::Converged || status == FitStatus::AtBound) {
      return summarize(point, status, iterations);
    }
    ++iterations;
    scale = scale.cwiseMax(point.jacobian.colwise().norm().transpose());
    const VectorXd trial =
        clamp(problem, point.parameters + dampedStep(point, scale, damping.value));
    const VectorXd step = trial - point.parameters;
    const double predicted = point.rss - (point.residuals + point.jacobian * step).squaredNorm();
    Point next = evaluate(problem, trial);
    const double gain = (point.rss - next.rss) / predicted;
    if (!(predicted > 0 && gain > 0)) {
      damping.rejected();
      continue;
    }
    differentiate(problem, next);
    if (!next.jacobian.allFinite()) {
      damping.rejected();
      continue;
    }
    damping.accepted(gain);
    point = std::move(next);
    out = outlook(point, options.rankTolerance);
  }
  const double tolerance =
      damping.value < largestDamping ? options.tolerance : options.stalledTolerance;
  return summarize(point, statusAt(point, out, tolerance), iterations);
}

}  // namespace dampwright
