// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/fit/least_squares.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <random>

#include "tests/support/scipy.h"

namespace dampwright {
namespace {

using Eigen::MatrixXd;
using Eigen::VectorXd;

const double infinite = std::numeric_limits<double>::infinity();

/// y = b0·e^(−b1·x) + b2 with normal scatter 0.02, mt19937 seed 7.
struct Decay {
  VectorXd x = VectorXd::LinSpaced(40, 0, 4), y = VectorXd(40);

  Decay() {
    std::mt19937 random(7);
    std::normal_distribution<double> scatter(0, 0.02);
    for (Eigen::Index i = 0; i < x.size(); ++i) {
      y[i] = 2.5 * std::exp(-1.3 * x[i]) + 0.5 + scatter(random);
    }
  }
  LeastSquaresProblem problem() const {
    return {[this](const VectorXd& b) -> VectorXd {
              return (b[0] * (-b[1] * x.array()).exp() + b[2]).matrix() - y;
            },
            [this](const VectorXd& b) {
              MatrixXd jacobian(x.size(), 3);
              jacobian.col(0) = (-b[1] * x.array()).exp();
              jacobian.col(1) = -b[0] * x.array() * (-b[1] * x.array()).exp();
              jacobian.col(2).setOnes();
              return jacobian;
            },
            {},
            {}};
  }
};

std::string scipyFit(const Decay& decay, const std::string& bounds) {
  return "import numpy as np\nfrom scipy.optimize import least_squares\nx = np.array(" +
         test::pythonList({decay.x.data(), 40}) + ")\ny = np.array(" +
         test::pythonList({decay.y.data(), 40}) +
         ")\n"
         "f = lambda b: b[0] * np.exp(-b[1] * x) + b[2] - y\n"
         "j = lambda b: np.stack([np.exp(-b[1]*x), -b[0]*x*np.exp(-b[1]*x), 1 + 0*x], 1)\n"
         "s = least_squares(f, [1, 1, 0], j, bounds=" +
         bounds +
         ", xtol=1e-15, ftol=1e-15, gtol=1e-15)\n"
         "free = s.active_mask == 0\n"
         "jf = s.jac[:, free]\n"
         "c = np.linalg.inv(jf.T @ jf) * 2 * s.cost / (40 - free.sum())\n"
         "print(*s.x, *np.sqrt(np.diag(c)), 2 * s.cost)\n";
}

TEST(FitLeastSquares, AgreesWithSciPyInParametersAndErrors) {
  const Decay decay;
  const FitSummary found = fitLeastSquares(decay.problem(), VectorXd{{1, 1, 0}});
  const auto scipy = test::pythonNumbers(scipyFit(decay, "(-np.inf, np.inf)"));
  ASSERT_EQ(scipy.size(), 7u);
  EXPECT_EQ(found.status, FitStatus::Converged);
  for (int j = 0; j < 3; ++j) {
    // both end at cos φ of 1e-8 or better, which is 1e-8 of a standard error
    EXPECT_NEAR(found.parameters[j], scipy[j], 1e-7 * found.standardErrors[j]);
    EXPECT_NEAR(found.standardErrors[j], scipy[3 + j], 1e-7 * scipy[3 + j]);
  }
  EXPECT_NEAR(found.rss, scipy[6], 1e-10 * scipy[6]);
  EXPECT_EQ(found.dof, 37);
}

TEST(FitLeastSquares, ABoundThatHoldsAgreesWithSciPyAndSaysSo) {
  const Decay decay;
  LeastSquaresProblem problem = decay.problem();
  problem.lower = VectorXd{{-infinite, -infinite, -infinite}};
  problem.upper = VectorXd{{2.3, infinite, infinite}};
  const FitSummary found = fitLeastSquares(problem, VectorXd{{1, 1, 0}});
  const auto scipy = test::pythonNumbers(scipyFit(decay, "(-np.inf, [2.3, np.inf, np.inf])"));
  ASSERT_EQ(scipy.size(), 6u);  // one parameter is held, two have errors
  EXPECT_EQ(found.status, FitStatus::AtBound);
  EXPECT_TRUE(found.usable());
  EXPECT_EQ(found.parameters[0], 2.3);
  EXPECT_TRUE(std::isnan(found.standardErrors[0]));
  for (int j = 1; j < 3; ++j) {
    // SciPy stays a little inside its bound
    EXPECT_NEAR(found.parameters[j], scipy[j], 1e-4 * found.standardErrors[j]);
    EXPECT_NEAR(found.standardErrors[j], scipy[2 + j], 1e-4 * found.standardErrors[j]);
  }
  EXPECT_EQ(found.dof, 38);
}

TEST(FitLeastSquares, AParameterThatStartsAtItsBoundCanLeaveIt) {
  const Decay decay;
  LeastSquaresProblem problem = decay.problem();
  problem.lower = VectorXd{{1, 1, 0}};
  problem.upper = VectorXd{{3, 3, 3}};
  const FitSummary found = fitLeastSquares(problem, problem.lower);
  const FitSummary unbound = fitLeastSquares(decay.problem(), problem.lower);
  EXPECT_EQ(found.status, FitStatus::Converged);
  EXPECT_TRUE(found.parameters.isApprox(unbound.parameters, 1e-9));
}

TEST(FitLeastSquares, TheNumericalJacobianGivesTheSameFit) {
  const Decay decay;
  LeastSquaresProblem numerical = decay.problem();
  numerical.jacobian = {};
  const VectorXd start{{1, 1, 0}};
  const FitSummary exact = fitLeastSquares(decay.problem(), start);
  const FitSummary found = fitLeastSquares(numerical, start);
  EXPECT_EQ(found.status, FitStatus::Converged);
  // central differences with a step of cube root of the machine precision: 1e-9 relative
  EXPECT_TRUE(found.parameters.isApprox(exact.parameters, 1e-8));
  EXPECT_TRUE(found.standardErrors.isApprox(exact.standardErrors, 1e-7));
}

TEST(FitLeastSquares, ScalingAParameterScalesItsErrorAndNothingElse) {
  const Decay decay;
  const LeastSquaresProblem plain = decay.problem();
  const VectorXd factor{{1e6, 1e-4, 1}};
  LeastSquaresProblem scaled;
  scaled.residuals = [&](const VectorXd& b) { return plain.residuals(b.cwiseProduct(factor)); };
  scaled.jacobian = [&](const VectorXd& b) -> MatrixXd {
    return plain.jacobian(b.cwiseProduct(factor)) * factor.asDiagonal();
  };
  const VectorXd start{{1, 1, 0}};
  const FitSummary one = fitLeastSquares(plain, start);
  const FitSummary other = fitLeastSquares(scaled, start.cwiseQuotient(factor));
  EXPECT_EQ(one.iterations, other.iterations);
  EXPECT_TRUE(one.parameters.isApprox(other.parameters.cwiseProduct(factor), 1e-9));
  EXPECT_TRUE(one.standardErrors.isApprox(other.standardErrors.cwiseProduct(factor), 1e-9));
}

TEST(FitLeastSquares, DataWithoutScatterConvergeToTheTruth) {
  Decay decay;
  decay.y = (2.5 * (-1.3 * decay.x.array()).exp() + 0.5).matrix();
  const FitSummary found = fitLeastSquares(decay.problem(), VectorXd{{1, 1, 0}});
  EXPECT_EQ(found.status, FitStatus::Converged);
  EXPECT_TRUE(found.parameters.isApprox(VectorXd{{2.5, 1.3, 0.5}}, 1e-10));
}

TEST(FitLeastSquares, TwoParametersThatActAlikeAreRankDeficient) {
  const VectorXd x = VectorXd::LinSpaced(10, 0, 1);
  const auto residuals = [&](const VectorXd& b) -> VectorXd {
    return (b[0] + b[1]) * x - 3 * x - 0.1 * x.cwiseProduct(x);
  };
  const FitSummary found = fitLeastSquares({residuals, {}, {}, {}}, VectorXd{{1, 1}});
  EXPECT_EQ(found.status, FitStatus::RankDeficient);
  EXPECT_FALSE(found.usable());
  EXPECT_TRUE(std::isnan(found.standardErrors[0]));
}

TEST(FitLeastSquares, FewerPointsThanParametersIsRankDeficient) {
  const auto residuals = [](const VectorXd& b) -> VectorXd {
    return VectorXd{{b[0] + b[1] * b[1] - 1}};
  };
  const FitSummary found = fitLeastSquares({residuals, {}, {}, {}}, VectorXd{{1, 1}});
  EXPECT_EQ(found.status, FitStatus::RankDeficient);
}

TEST(UnscaledCovariance, IsTheInverseOfTheNormalMatrixOrNothing) {
  const Decay decay;
  const MatrixXd jacobian = decay.problem().jacobian(VectorXd{{2, 1, 0}});
  const auto covariance = unscaledCovariance(jacobian);
  ASSERT_TRUE(covariance);
  const MatrixXd one = *covariance * (jacobian.transpose() * jacobian);
  EXPECT_TRUE(one.isApprox(MatrixXd::Identity(3, 3), 1e-10));
  MatrixXd alike = jacobian;
  alike.col(2) = 3 * alike.col(0);
  EXPECT_FALSE(unscaledCovariance(alike));
}

TEST(FitLeastSquares, AFixedParameterStaysAndTheOthersAreFitted) {
  const Decay decay;
  LeastSquaresProblem problem = decay.problem();
  problem.lower = VectorXd{{-infinite, -infinite, 0.5}};
  problem.upper = VectorXd{{infinite, infinite, 0.5}};
  const FitSummary found = fitLeastSquares(problem, VectorXd{{1, 1, 0.5}});
  EXPECT_EQ(found.status, FitStatus::AtBound);
  EXPECT_EQ(found.parameters[2], 0.5);
  EXPECT_EQ(found.dof, 38);
  EXPECT_NEAR(found.parameters[0], 2.5, 5 * found.standardErrors[0]);
}

TEST(FitLeastSquares, TooFewStepsIsNotConverged) {
  const Decay decay;
  const FitSummary found =
      fitLeastSquares(decay.problem(), VectorXd{{1, 1, 0}}, {.maxIterations = 2});
  EXPECT_EQ(found.status, FitStatus::NotConverged);
  EXPECT_FALSE(found.usable());
}

TEST(FitLeastSquares, AModelWithoutANumberAtTheStartIsNotFinite) {
  const auto residuals = [](const VectorXd& b) -> VectorXd {
    return VectorXd::Constant(5, std::log(b[0]));
  };
  EXPECT_EQ(fitLeastSquares({residuals, {}, {}, {}}, VectorXd{{-1.0}}).status,
            FitStatus::NotFinite);
}

TEST(FitLeastSquares, AStepIntoNowhereIsTakenBack) {
  // sqrt has no value below 0; the full Gauss-Newton step from 9 for sqrt(b) = 0.1 goes to -8.4.
  const auto residuals = [](const VectorXd& b) -> VectorXd {
    return VectorXd::Constant(3, std::sqrt(b[0]) - 0.1);
  };
  const FitSummary found = fitLeastSquares({residuals, {}, {}, {}}, VectorXd{{9.0}});
  EXPECT_EQ(found.status, FitStatus::Converged);
  EXPECT_NEAR(found.parameters[0], 0.01, 1e-9);
}

}  // namespace
}  // namespace dampwright
