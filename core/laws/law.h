// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <optional>
#include <span>
#include <string_view>
#include <vector>

#include "core/base/quantity.h"

// Damping laws: force F(v) of one direction over the magnitude of velocity, dry friction taken off,
// F(0) = 0. A law is one file with one `Law` and one row of the table in laws.cpp.
namespace dampwright {

/// A point that a law is laid through: both magnitudes along the direction.
struct LawPoint {
  double velocity = 0;  ///< m/s, > 0
  double force = 0;     ///< N
};

struct LawParameter {
  std::string_view name;  ///< as in the documents, with its unit: low_n_s_per_m, knee_mm_s
  Quantity quantity = Quantity::Damping;  ///< inside the program it is SI
};

inline constexpr std::size_t maxLawParameters = 3;
using LawGradient = std::array<double, maxLawParameters>;

/// Where a fit may search, and where it starts. A law with a kink gives a region for each stretch
/// in which its fit is smooth; the best of all regions is the fit.
struct LawRegion {
  std::vector<double> start, lower, upper;  ///< SI, one for each parameter, in the law's chart
};

/// Fit coordinates q of a law, where its own parameters are no good axes to search along: with a
/// kink, its place must be one of them, so that a bound can hold it between two speeds.
struct LawChart {
  std::vector<double> (*parameters)(std::span<const double> q);
  /// dp_i/dq_j, row by row.
  std::array<LawGradient, maxLawParameters> (*derivatives)(std::span<const double> q);
};

struct Law {
  std::string_view name;
  std::span<const LawParameter> parameters;
  /// Regions for these points, by rising velocity; none where they are too few for the law.
  std::vector<LawRegion> (*regions)(std::span<const LawPoint> points);
  double (*force)(std::span<const double> parameters, double velocity);          ///< N
  double (*slope)(std::span<const double> parameters, double velocity);          ///< dF/dv, N·s/m
  LawGradient (*gradient)(std::span<const double> parameters, double velocity);  ///< dF/dp, SI
  /// m/s, where the tangent at v = 0 meets the high-speed asymptote; nothing where they are one.
  /// Also nothing where one of the two does not exist, as for a power of v.
  std::optional<double> (*knee)(std::span<const double> parameters);
  const LawChart* chart = nullptr;  ///< of the regions; null: the parameters themselves
};

/// All laws, the simplest first.
std::span<const Law* const> allLaws();

/// Parameters of a point of the law's chart.
std::vector<double> lawParameters(const Law& law, std::span<const double> q);

/// The law of a name; null where there is none.
const Law* findLaw(std::string_view name);

}  // namespace dampwright
