// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/harmonics.h"

#include <Eigen/Dense>
#include <algorithm>
#include <cmath>

#include "core/base/expects.h"
#include "core/base/units.h"

namespace dampwright {
namespace {

// One row of the design: 1, cos θ, sin θ, cos 2θ, sin 2θ … by turning on.
void fillRow(Eigen::MatrixXd& design, Eigen::Index row, double angle, int order) {
  const double c = std::cos(angle), s = std::sin(angle);
  double cosine = 1, sine = 0;
  design(row, 0) = 1;
  for (Eigen::Index h = 1; h <= order; ++h) {
    const double next = cosine * c - sine * s;
    sine = sine * c + cosine * s;
    cosine = next;
    design(row, 2 * h - 1) = cosine;
    design(row, 2 * h) = sine;
  }
}

}  // namespace

double Harmonics::amplitude(int harmonic) const {
  const auto i = static_cast<std::size_t>(harmonic - 1);
  return i < cosine.size() ? std::hypot(cosine[i], sine[i]) : 0.0;
}

double Harmonics::at(double time) const {
  double sum = mean;
  for (int h = 1; h <= order(); ++h) {
    const double angle = 2 * pi * h * time / period;
    const auto i = static_cast<std::size_t>(h - 1);
    if (cosine[i] == 0 && sine[i] == 0) continue;
    sum += cosine[i] * std::cos(angle) + sine[i] * std::sin(angle);
  }
  return sum;
}

double Harmonics::slopeAt(double time) const {
  double sum = 0;
  for (int h = 1; h <= order(); ++h) {
    const double omega = 2 * pi * h / period;
    const auto i = static_cast<std::size_t>(h - 1);
    if (cosine[i] == 0 && sine[i] == 0) continue;
    sum += omega * (sine[i] * std::cos(omega * time) - cosine[i] * std::sin(omega * time));
  }
  return sum;
}

Harmonics fitHarmonics(std::span<const double> times,
                       std::span<const double> values,
                       double period,
                       int order) {
  expects(times.size() == values.size() && period > 0);
  std::vector<std::size_t> sound;
  for (std::size_t i = 0; i < values.size(); ++i)
    if (!std::isnan(values[i])) sound.push_back(i);
  Harmonics fit;
  fit.period = period;
  if (sound.empty()) return fit;
  const int kept = std::min(order, static_cast<int>(sound.size()) / 3);
  const auto rows = static_cast<Eigen::Index>(sound.size());
  Eigen::MatrixXd design(rows, 2 * kept + 1);
  Eigen::VectorXd target(rows);
  for (Eigen::Index row = 0; row < rows; ++row) {
    const std::size_t i = sound[static_cast<std::size_t>(row)];
    fillRow(design, row, 2 * pi * times[i] / period, kept);
    target(row) = values[i];
  }
  const Eigen::VectorXd solved =
      (design.transpose() * design).ldlt().solve(design.transpose() * target);
  fit.mean = solved(0);
  for (Eigen::Index h = 1; h <= kept; ++h) {
    fit.cosine.push_back(solved(2 * h - 1));
    fit.sine.push_back(solved(2 * h));
  }
  const auto free = std::max<double>(1, static_cast<double>(rows - design.cols()));
  fit.rms = std::sqrt((target - design * solved).squaredNorm() / free);
  return fit;
}

Harmonics significantPart(Harmonics fit, double samples, double threshold) {
  const double error = fit.rms * std::sqrt(2 / std::max(samples, 1.0));
  for (int h = 2; h <= fit.order(); ++h) {
    if (fit.amplitude(h) >= threshold * error) continue;
    fit.cosine[static_cast<std::size_t>(h - 1)] = 0;
    fit.sine[static_cast<std::size_t>(h - 1)] = 0;
  }
  return fit;
}

}  // namespace dampwright
