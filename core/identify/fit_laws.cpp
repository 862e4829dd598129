// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/identify/fit_laws.h"

#include <algorithm>
#include <cmath>
#include <limits>

#include "core/fit/aicc.h"
#include "core/fit/least_squares.h"

namespace dampwright {
namespace {

using Eigen::Index;
using Eigen::MatrixXd;
using Eigen::VectorXd;

constexpr double nan = std::numeric_limits<double>::quiet_NaN();
constexpr double rounding = 1e-9;     // [1] of the largest force: residuals below say nothing
constexpr double sameStroke = 0.02;   // [1] strokes nearer than this are one
constexpr int pointsToSpare = 4;      // beyond the law's parameters: the friction's, and three
constexpr double withinErrors = 2.0;  // standard errors

std::span<const double> spanOf(const VectorXd& vector) {
  return {vector.data(), static_cast<std::size_t>(vector.size())};
}

VectorXd vectorOf(const std::vector<double>& values) {
  return Eigen::Map<const VectorXd>(values.data(), static_cast<Index>(values.size()));
}

VectorXd residuals(const Law& law, std::span<const ScatteredPoint> points, const VectorXd& at) {
  VectorXd r(static_cast<Index>(points.size()));
  for (Index i = 0; i < r.size(); ++i) {
    const LawPoint& point = points[static_cast<std::size_t>(i)].point;
    r[i] = law.force(spanOf(at), point.velocity) - point.force;
  }
  return r;
}

MatrixXd jacobian(const Law& law, std::span<const ScatteredPoint> points, const VectorXd& at) {
  MatrixXd j(static_cast<Index>(points.size()), at.size());
  for (Index i = 0; i < j.rows(); ++i) {
    const double velocity = points[static_cast<std::size_t>(i)].point.velocity;
    const LawGradient gradient = law.gradient(spanOf(at), velocity);
    for (Index k = 0; k < j.cols(); ++k) j(i, k) = gradient[static_cast<std::size_t>(k)];
  }
  return j;
}

/// Parameters at a point of the law's chart.
VectorXd fromChart(const Law& law, const VectorXd& q) {
  return vectorOf(lawParameters(law, spanOf(q)));
}

MatrixXd chartJacobian(const Law& law, std::span<const ScatteredPoint> points, const VectorXd& q) {
  MatrixXd byParameters = jacobian(law, points, fromChart(law, q));
  if (law.chart == nullptr) return byParameters;
  MatrixXd derivatives(q.size(), q.size());
  const auto rows = law.chart->derivatives(spanOf(q));
  for (Index i = 0; i < q.size(); ++i) {
    for (Index k = 0; k < q.size(); ++k) {
      derivatives(i, k) = rows[static_cast<std::size_t>(i)][static_cast<std::size_t>(k)];
    }
  }
  return byParameters * derivatives;
}

/// The best fit of all regions in the law's chart, and whether a parameter stands at the edge of
/// all of them.
struct BestFit {
  FitSummary summary;
  bool atEdge = false;
};

bool standsAtEdge(const VectorXd& found, std::span<const LawRegion> regions) {
  for (Index k = 0; k < found.size(); ++k) {
    const auto j = static_cast<std::size_t>(k);
    double lower = regions.front().lower[j];
    double upper = regions.front().upper[j];
    for (const LawRegion& region : regions) {
      lower = std::min(lower, region.lower[j]);
      upper = std::max(upper, region.upper[j]);
    }
    if (found[k] <= lower || found[k] >= upper) return true;
  }
  return false;
}

BestFit bestFit(const Law& law,
                std::span<const ScatteredPoint> points,
                std::span<const LawRegion> regions) {
  BestFit best;
  for (const LawRegion& region : regions) {
    const FitSummary found = fitLeastSquares(
        {[&](const VectorXd& q) { return residuals(law, points, fromChart(law, q)); },
         [&](const VectorXd& q) { return chartJacobian(law, points, q); },
         vectorOf(region.lower),
         vectorOf(region.upper)},
        vectorOf(region.start));
    const bool better = found.usable() && (!best.summary.usable() || found.rss < best.summary.rss);
    if (best.summary.parameters.size() == 0 || better) best.summary = found;
  }
  best.atEdge = standsAtEdge(best.summary.parameters, regions);
  return best;
}

double meanVariance(std::span<const ScatteredPoint> points) {
  double sum = 0;
  for (const ScatteredPoint& point : points) sum += point.u * point.u;
  return sum / static_cast<double>(points.size());
}

VectorXd standardErrors(const Law& law,
                        std::span<const ScatteredPoint> points,
                        const FitSummary& found,
                        double offsetU) {
  const VectorXd at = fromChart(law, found.parameters);
  const MatrixXd byParameters = jacobian(law, points, at);
  const auto covariance = unscaledCovariance(byParameters);
  if (!found.usable() || !covariance) return VectorXd::Constant(found.parameters.size(), nan);
  const double dof = static_cast<double>(points.size()) - static_cast<double>(covariance->rows());
  const double ofResiduals = dof > 0 ? found.rss / dof : 0;
  const double variance = std::max(ofResiduals, meanVariance(points));
  if (!(variance > 0) && !(dof > 0)) return VectorXd::Constant(found.parameters.size(), nan);
  // one newton more on all forces moves the parameters by (JᵀJ)⁻¹Jᵀ·1
  const VectorXd byOffset = *covariance * byParameters.colwise().sum().transpose() * offsetU;
  return (variance * covariance->diagonal() + byOffset.cwiseAbs2()).cwiseSqrt();
}

FittedLaw notFitted(const Law& law, std::string_view status) {
  FittedLaw fitted;
  fitted.law = law.name;
  fitted.status = status;
  fitted.rms = nan;
  fitted.aicc = std::numeric_limits<double>::infinity();
  return fitted;
}

FittedLaw fitLaw(const Law& law, std::span<const ScatteredPoint> points, double offsetU) {
  std::vector<LawPoint> bare;
  double largest = 0;
  for (const ScatteredPoint& point : points) {
    bare.push_back(point.point);
    largest = std::max(largest, std::abs(point.point.force));
  }
  const std::vector<LawRegion> regions = law.regions(bare);
  if (regions.empty()) return notFitted(law, "too-few-points");
  const BestFit best = bestFit(law, points, regions);
  FittedLaw fitted = notFitted(law, codeOf(best.summary.status));
  if (best.summary.status == FitStatus::AtBound && !best.atEdge) fitted.status = "converged";
  const VectorXd values = fromChart(law, best.summary.parameters);
  const VectorXd errors = standardErrors(law, points, best.summary, offsetU);
  for (std::size_t j = 0; j < law.parameters.size(); ++j) {
    const auto k = static_cast<Index>(j);
    fitted.parameters.push_back(
        {std::string(law.parameters[j].name), values[k], errors[k], law.parameters[j].quantity});
  }
  const auto count = static_cast<double>(points.size());
  fitted.rms = std::sqrt(best.summary.rss / count);
  const double floor = count * std::pow(rounding * largest, 2);
  fitted.aicc = aicc(std::max(best.summary.rss, floor),
                     static_cast<int>(points.size()),
                     static_cast<int>(law.parameters.size()));
  return fitted;
}

bool isUsable(const FittedLaw& law) {
  return law.status == codeOf(FitStatus::Converged) || law.status == codeOf(FitStatus::AtBound);
}

bool liesWithinErrors(const FittedLaw& law, std::span<const ScatteredPoint> points) {
  return std::all_of(points.begin(), points.end(), [&](const ScatteredPoint& point) {
    return std::abs(law.at(point.point.velocity) - point.point.force) <= withinErrors * point.u;
  });
}

/// Marks the law that the rule of the header chooses. `laws` stand from simple to rich.
void choose(std::vector<FittedLaw>& laws, std::span<const ScatteredPoint> points) {
  std::vector<FittedLaw*> usable;
  std::size_t most = 0;
  for (FittedLaw& law : laws) {
    if (isUsable(law)) usable.push_back(&law);
    most = std::max(most, findLaw(law.law)->parameters.size());
  }
  if (usable.empty()) return;
  FittedLaw* best = nullptr;
  if (points.size() >= most + pointsToSpare) {
    const auto lower = [](const FittedLaw* a, const FittedLaw* b) { return a->aicc < b->aicc; };
    best = *std::min_element(usable.begin(), usable.end(), lower);
    best->why = "law-lowest-aicc";
  } else {
    const auto within = std::find_if(usable.begin(), usable.end(), [&](const FittedLaw* law) {
      return liesWithinErrors(*law, points);
    });
    const auto lower = [](const FittedLaw* a, const FittedLaw* b) { return a->rms < b->rms; };
    const bool found = within != usable.end();
    best = found ? *within : *std::min_element(usable.begin(), usable.end(), lower);
    best->why = found ? "law-simplest-within-errors" : "law-closest";
  }
  best->chosen = true;
}

std::vector<FittedLaw> noneFitted(std::string_view status) {
  std::vector<FittedLaw> laws;
  for (const Law* law : allLaws()) laws.push_back(notFitted(*law, status));
  return laws;
}

/// The points of the stroke that has most of them; of equals, the longest stroke.
std::vector<CurvePoint> pointsOfOneStroke(const Curve& curve) {
  std::vector<CurvePoint> most;
  for (const CurvePoint& reference : curve.points) {
    std::vector<CurvePoint> alike;
    for (const CurvePoint& point : curve.points) {
      if (std::abs(point.stroke - reference.stroke) <= sameStroke * reference.stroke) {
        alike.push_back(point);
      }
    }
    const bool longer = alike.size() == most.size() && reference.stroke > most.front().stroke;
    if (alike.size() > most.size() || longer) most = std::move(alike);
  }
  return most;
}

}  // namespace

std::vector<FittedLaw> fitLaws(std::span<const ScatteredPoint> points, double offsetU) {
  std::vector<FittedLaw> laws;
  for (const Law* law : allLaws()) laws.push_back(fitLaw(*law, points, offsetU));
  choose(laws, points);
  return laws;
}

std::vector<FittedLaw> identifyLaws(const Curve& curve, const Gas& gas, const Friction& friction) {
  if (!gas.force) return noneFitted("gas-not-determined");
  if (!friction.dry) return noneFitted("friction-not-determined");
  std::vector<ScatteredPoint> points;
  for (const CurvePoint& point : pointsOfOneStroke(curve)) {
    const Reading& reading = point.reading;
    if (!reading.dampingForce || !(reading.peakVelocity > 0)) continue;
    points.push_back(
        {{reading.peakVelocity, *reading.dampingForce - *friction.dry}, reading.forceU});
  }
  return fitLaws(points, std::hypot(gas.forceU, friction.dryU));
}

}  // namespace dampwright
