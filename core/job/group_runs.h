// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <span>
#include <string>
#include <utility>
#include <vector>

#include "core/base/remark.h"
#include "core/job/job.h"

namespace dampwright {

/// What is known of a run before it is put anywhere.
struct RunIdentity {
  std::string file;                                           ///< name as dropped
  std::vector<std::pair<std::string, std::string>> metadata;  ///< preamble, in file order
  std::vector<double>
      speeds;  ///< m/s, peak speeds of its blocks; empty where it was not measured yet
};

/// Runs that belong to one damper at one setting: one measurement.
struct RunGroup {
  std::vector<std::size_t> runs;  ///< indices of the runs given, by speed, then by name
  std::string corner;             ///< one of those given, empty where nothing tells
  std::string serial;             ///< empty where nothing tells
  std::vector<SettingValue> setting;
  std::vector<Remark>
      why;  ///< runs-by-serial, -corner, -setting, -name, -speeds, with their values
};

/// The setting that a run tells: by its preamble, else by its file's name.
std::vector<SettingValue> settingOfRun(const RunIdentity& run);

/// Proposes which runs make one measurement. Two runs are kept apart by different serials, corners
/// or settings; they are put together by the same serial, the same corner, or names that differ by
/// their speed only. Runs that are alike in nothing but such a name and were driven at the same
/// speeds are kept apart: a repetition, or another damper. Groups stand in the order of their first
/// run.
std::vector<RunGroup> groupRuns(std::span<const RunIdentity> runs,
                                const std::vector<std::string>& corners);

}  // namespace dampwright
