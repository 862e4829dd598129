// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <random>

namespace dampwright::bench {

/// Normal numbers that are the same on every machine: std::normal_distribution may differ between
/// libraries, the bits of std::mt19937_64 may not. Source: Box and Muller, Ann. Math. Stat. 29
/// (1958) 610.
class NormalSource {
 public:
  explicit NormalSource(std::uint64_t seed) : bits_(seed) {}

  /// Mean 0, standard deviation 1.
  double next();

 private:
  double uniform();  ///< in (0, 1]

  std::mt19937_64 bits_;
  double spare_ = 0;
  bool hasSpare_ = false;
};

}  // namespace dampwright::bench
