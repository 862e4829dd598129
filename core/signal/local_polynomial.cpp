// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/local_polynomial.h"

#include <Eigen/Dense>
#include <cmath>

#include "core/base/expects.h"

namespace dampwright {
namespace {

double factorial(int n) { return n <= 1 ? 1.0 : n * factorial(n - 1); }

// d-th derivative of u^k.
double powerDerivative(double u, int k, int d) {
  if (d > k) return 0;
  return factorial(k) / factorial(k - d) * std::pow(u, k - d);
}

double weighted(const std::vector<double>& weights, const double* first) {
  double sum = 0;
  for (std::size_t i = 0; i < weights.size(); ++i) sum += weights[i] * first[i];
  return sum;
}

// The middle of the signal: weights are even or odd about the window's middle, so each pair of
// samples is added or subtracted first.
void applyMiddle(const LocalPolynomial& fit,
                 std::span<const double> signal,
                 double scale,
                 std::vector<double>& out) {
  const std::vector<double> weights = localWeights(fit);
  const int h = fit.halfWidth;
  const double sign = fit.derivative % 2 == 0 ? 1.0 : -1.0;
  std::vector<double> half(weights.begin() + h, weights.end());
  for (double& weight : half) weight *= scale;
  const int last = static_cast<int>(signal.size()) - h;
  for (int i = h; i < last; ++i) {
    const double* at = signal.data() + i;
    double sum = half[0] * at[0];
    for (int k = 1; k <= h; ++k) sum += half[static_cast<std::size_t>(k)] * (at[k] + sign * at[-k]);
    out[static_cast<std::size_t>(i)] = sum;
  }
}

}  // namespace

std::vector<double> localWeights(const LocalPolynomial& fit, double at) {
  const int h = fit.halfWidth, count = 2 * h + 1, terms = fit.degree + 1;
  expects(h >= 1 && count >= terms && fit.derivative <= fit.degree);
  Eigen::MatrixXd powers(count, terms);
  for (int i = 0; i < count; ++i) {
    const double u = static_cast<double>(i - h) / h;
    double power = 1;
    for (int k = 0; k < terms; ++k, power *= u) powers(i, k) = power;
  }
  Eigen::VectorXd wanted(terms);
  for (int k = 0; k < terms; ++k) wanted(k) = powerDerivative(at / h, k, fit.derivative);
  wanted /= std::pow(h, fit.derivative);
  const Eigen::HouseholderQR<Eigen::MatrixXd> qr(powers);
  Eigen::VectorXd weights = Eigen::VectorXd::Zero(count);
  weights.head(terms) =
      qr.matrixQR().topRows(terms).triangularView<Eigen::Upper>().transpose().solve(wanted);
  weights = qr.householderQ() * weights;
  return {weights.data(), weights.data() + count};
}

std::vector<double> applyLocal(const LocalPolynomial& fit,
                               std::span<const double> signal,
                               double rate) {
  const auto h = static_cast<std::size_t>(fit.halfWidth);
  expects(signal.size() >= 2 * h + 1);
  std::vector<double> out(signal.size());
  const double scale = std::pow(rate, fit.derivative);
  applyMiddle(fit, signal, scale, out);
  const double* lastWindow = signal.data() + (signal.size() - 2 * h - 1);
  for (std::size_t i = 0; i < h; ++i) {
    const double at = static_cast<double>(i) - static_cast<double>(h);
    out[i] = scale * weighted(localWeights(fit, at), signal.data());
    out[signal.size() - 1 - i] = scale * weighted(localWeights(fit, -at), lastWindow);
  }
  return out;
}

double derivativeLoss(const LocalPolynomial& fit, double angle) {
  const std::vector<double> weights = localWeights({fit.halfWidth, fit.degree, 1});
  double gain = 0;
  for (int k = -fit.halfWidth; k <= fit.halfWidth; ++k)
    gain += weights[static_cast<std::size_t>(k + fit.halfWidth)] * std::sin(k * angle);
  return 1 - gain / angle;
}

LocalPolynomial derivativeFor(double angle, double loss) {
  LocalPolynomial fit{2, 4, 1};
  for (int h = 3; h <= 25; ++h) {
    if (std::abs(derivativeLoss({h, 4, 1}, angle)) > loss) break;
    fit.halfWidth = h;
  }
  return fit;
}

}  // namespace dampwright
