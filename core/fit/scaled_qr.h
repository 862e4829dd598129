// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <Eigen/Core>
#include <Eigen/QR>

namespace dampwright {

/// QR of a Jacobian with its columns scaled to length 1 first, so that units do not decide rank.
class ScaledQr {
 public:
  explicit ScaledQr(const Eigen::MatrixXd& jacobian);

  /// min|R_kk| > tolerance·max|R_kk|, no empty column and as many rows as columns at least.
  bool fullRank(double tolerance) const;
  /// The part of a vector that the columns explain, in the basis Q. Needs full rank, as the rest.
  Eigen::VectorXd project(const Eigen::VectorXd& vector) const;
  /// Parameters b of least ‖Jb − vector‖ from the vector's projection.
  Eigen::VectorXd solve(const Eigen::VectorXd& projection) const;
  /// (JᵀJ)⁻¹
  Eigen::MatrixXd inverseOfSquare() const;

 private:
  Eigen::Index count_;
  bool solvable_ = false;
  Eigen::VectorXd norms_;
  Eigen::ColPivHouseholderQR<Eigen::MatrixXd> qr_;
};

}  // namespace dampwright
