// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/fit/scaled_qr.h"

namespace dampwright {

using Eigen::MatrixXd;
using Eigen::Upper;
using Eigen::VectorXd;

ScaledQr::ScaledQr(const MatrixXd& jacobian) : count_(jacobian.cols()) {
  norms_ = jacobian.colwise().norm();
  solvable_ = jacobian.rows() >= count_ && (count_ == 0 || norms_.minCoeff() > 0);
  if (solvable_ && count_ > 0) qr_.compute(jacobian * norms_.cwiseInverse().asDiagonal());
}

bool ScaledQr::fullRank(double tolerance) const {
  if (!solvable_ || count_ == 0) return solvable_;
  const VectorXd diagonal = qr_.matrixR().diagonal().cwiseAbs();
  return diagonal.minCoeff() > tolerance * diagonal.maxCoeff();
}

VectorXd ScaledQr::project(const VectorXd& vector) const {
  if (count_ == 0) return VectorXd();
  return (qr_.householderQ().adjoint() * vector).head(count_);
}

VectorXd ScaledQr::solve(const VectorXd& projection) const {
  if (count_ == 0) return VectorXd();
  const auto r = qr_.matrixR().topLeftCorner(count_, count_);
  const VectorXd permuted = r.triangularView<Upper>().solve(projection);
  return (qr_.colsPermutation() * permuted).cwiseQuotient(norms_);
}

MatrixXd ScaledQr::inverseOfSquare() const {
  if (count_ == 0) return MatrixXd();
  const auto r = qr_.matrixR().topLeftCorner(count_, count_);
  const MatrixXd inverse = r.triangularView<Upper>().solve(MatrixXd::Identity(count_, count_));
  const MatrixXd root =
      norms_.cwiseInverse().asDiagonal() * MatrixXd(qr_.colsPermutation() * inverse);
  return root * root.transpose();
}

}  // namespace dampwright
