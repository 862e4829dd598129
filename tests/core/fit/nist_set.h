// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <Eigen/Core>
#include <functional>
#include <string>
#include <vector>

namespace dampwright::test {

/// One NIST StRD nonlinear regression set, read from its .dat file in tests/reference/nist.
struct NistSet {
  std::string name;
  Eigen::VectorXd start1, start2, certified, deviations;
  double rss = 0;
  Eigen::VectorXd x, y;
};

using NistModel = std::function<double(double x, const Eigen::VectorXd& b)>;

NistSet readNistSet(const std::string& name);

/// The model that the file states, in the same parameters.
NistModel nistModel(const std::string& name);

/// Right digits: -log10 of the largest relative error, at most 11 as certified.
double rightDigits(const Eigen::VectorXd& found, const Eigen::VectorXd& certified);

}  // namespace dampwright::test
