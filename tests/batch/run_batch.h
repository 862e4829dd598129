// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <filesystem>
#include <string>

#include "core/measure/measurement.h"
#include "core/verdict/limits.h"

namespace dampwright {

struct Ended {
  int status = -1;
  std::string out, err;
};

/// A folder of its own that is gone with the test.
class Folder {
 public:
  Folder();
  ~Folder();
  Folder(const Folder&) = delete;
  Folder& operator=(const Folder&) = delete;

  const std::filesystem::path& path() const { return path_; }
  void write(const std::string& name, const std::string& bytes) const;
  std::string read(const std::string& name) const;
  int entries() const;

  /// Runs a line of sh in the folder; $BATCH is the program.
  Ended shell(const std::string& line) const;
  /// `dampwright-batch ARGUMENTS` in the folder.
  Ended batch(const std::string& arguments) const { return shell("$BATCH " + arguments); }

 private:
  std::filesystem::path path_;
};

/// Time, displacement, force of a damper of `coefficient` N·s/m and no gas, ±25 mm, sine blocks of
/// 8 cycles at peak speeds 100, 200 and 300 mm/s, 1 kHz, a header with units. Cycle i has a force
/// 1 + 0.002·(−1)^i times as large, so that there is a scatter.
std::string linearDamperRun(double coefficient);

/// Rebound 600 N, compression 600 N at 300 mm/s, with a scatter of 1 %.
Measurement storedMeasurement();

/// One force check in rebound at 300 mm/s.
Limits reboundLimits(double min, double max);

}  // namespace dampwright
