// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <map>
#include <string>
#include <vector>

namespace dampwright::accuracy {

/// One figure of one run against its truth.
struct Error {
  double error = 0;      ///< in the unit of the quantity
  double allowed = 0;    ///< the same: the target's limit of this figure
  double bound = 0;      ///< the same: standard error at the Cramer-Rao bound; 0: none is stated
  double interval = -1;  ///< half width of the stated 95 % interval; below 0: none is stated
};

/// What the last column judges: the targets of accuracy are stated for one bench, coverage for all.
enum class Judged { Everything, CoverageOnly };

/// Quantities by name, each with its errors.
class Tally {
 public:
  void add(const std::string& quantity, const Error& error) { errors_[quantity].push_back(error); }
  void missing(const std::string& quantity) { ++missing_[quantity]; }
  void merge(const Tally& other);
  /// Bias, spread, the 95th percentile over the target's limit, spread over the bound, coverage,
  /// and ok or miss for each quantity, as lines of a table.
  void print(Judged judged) const;

 private:
  std::map<std::string, std::vector<Error>> errors_;
  std::map<std::string, int> missing_;
};

}  // namespace dampwright::accuracy
