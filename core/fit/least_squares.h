// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <Eigen/Core>
#include <functional>
#include <optional>
#include <string_view>

namespace dampwright {

/// What is fitted: parameters b that make ‖r(b)‖² least, with lower <= b <= upper.
struct LeastSquaresProblem {
  std::function<Eigen::VectorXd(const Eigen::VectorXd&)> residuals;  ///< r(b) = model − data
  std::function<Eigen::MatrixXd(const Eigen::VectorXd&)>
      jacobian;           ///< ∂r_i/∂b_j; empty: central differences, good to about 1e-9
  Eigen::VectorXd lower;  ///< empty: none; -inf where one parameter has none; equal to upper: fixed
  Eigen::VectorXd upper;  ///< empty: none; +inf where one parameter has none
};

struct FitOptions {
  int maxIterations = 1000;        ///< trial steps, > 0
  double tolerance = 1e-10;        ///< [1] cos φ that counts as converged, see FitStatus
  double stalledTolerance = 1e-6;  ///< [1] cos φ that counts when rounding allows no better step
  double rankTolerance = 1e-11;    ///< [1] see FitStatus::RankDeficient
};

/// How a fit ended. J has its columns scaled to length 1 and holds the free parameters only (those
/// not held by a bound); J = QR with column pivoting; cos φ = ‖Qᵀr‖/‖r‖.
enum class FitStatus {
  Converged,  ///< cos φ <= tolerance, or every |δb| <= 1e-14·|b| for the undamped step δb, or
              ///< no step lowers ‖r‖ and cos φ <= stalledTolerance; no parameter at a bound
  AtBound,    ///< the same, with a parameter at its bound and −∂‖r‖²/∂b pointing outside
  RankDeficient,  ///< min|R_kk| <= rankTolerance·max|R_kk| at the end: the data do not tell the
                  ///< parameters apart; also: fewer residuals than free parameters
  NotConverged,   ///< maxIterations, or no step lowers ‖r‖, with cos φ above its tolerance
  NotFinite       ///< r or J at the start is not finite
};

/// Stable name of a status, a code of core/words: converged, at-bound, rank-deficient …
std::string_view codeOf(FitStatus status);

struct FitSummary {
  FitStatus status = FitStatus::NotConverged;
  Eigen::VectorXd parameters;      ///< the best found, whatever the status
  Eigen::VectorXd standardErrors;  ///< NaN for a parameter at its bound, and where not usable
  Eigen::MatrixXd covariance;   ///< residualVariance·(JᵀJ)⁻¹ of the free parameters, else NaN
  double rss = 0;               ///< ‖r‖²
  double dof = 0;               ///< residuals − free parameters
  double residualVariance = 1;  ///< rss/dof; 1 where dof is 0
  int iterations = 0;           ///< trial steps

  bool usable() const { return status == FitStatus::Converged || status == FitStatus::AtBound; }
};

/// Levenberg-Marquardt with a running column scaling, damping by the gain ratio, each step a QR
/// solution (never normal equations); bounds by holding what pushes outward and cutting the step.
/// Finds a local minimum: where there are several, the start decides.
///
/// Accuracy: parameters to better than 6 digits on the NIST StRD sets of tests/reference/nist.
/// Source: J. J. Moré, The Levenberg-Marquardt algorithm, LNM 630 (Springer 1978) 105,
/// for the scaling; H. B. Nielsen, IMM-REP-1999-05, for the damping; D. M. Bates, D. G. Watts,
/// Technometrics 23 (1981) 179, for the convergence criterion.
FitSummary fitLeastSquares(const LeastSquaresProblem& problem,
                           const Eigen::VectorXd& start,
                           const FitOptions& options = {});

/// (JᵀJ)⁻¹ where a fit's errors are scaled by something else than its own residuals; nothing where
/// the columns of J are not independent (FitStatus::RankDeficient).
std::optional<Eigen::MatrixXd> unscaledCovariance(const Eigen::MatrixXd& jacobian,
                                                  double rankTolerance = 1e-11);

}  // namespace dampwright
