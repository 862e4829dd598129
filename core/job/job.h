// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <vector>

#include "core/measure/measurement.h"
#include "core/rig/damper_card.h"
#include "core/rig/read_options.h"
#include "core/verdict/limits.h"

namespace dampwright {

enum class VehicleKind { Car, Motorcycle, SingleDamper };
enum class Phase { AsFound, AfterWork };

/// A run file that belongs to a damper; its bytes are kept by the job book under the hash.
struct JobRun {
  std::string file;  ///< name as dropped
  std::string sha256;
  std::string rig;      ///< name of the rig profile it is read by; empty: the one of its signature
  ReadOptions answers;  ///< what the technician said of this file alone
  std::vector<TimeSpan> struckOut;

  bool operator==(const JobRun&) const = default;
};

/// One adjuster's position at a test.
struct SettingValue {
  std::string adjuster;
  double value = 0;

  bool operator==(const SettingValue&) const = default;
};

/// One measurement's worth of runs: a damper, as found or after work, at one setting.
struct JobPhase {
  Phase phase = Phase::AsFound;
  std::vector<SettingValue> setting;
  std::vector<JobRun> runs;

  bool operator==(const JobPhase&) const = default;
};

/// One place on the vehicle and the damper that sits there.
struct JobItem {
  std::string
      corner;  ///< front left | front right | rear left | rear right | front | rear | damper
  DamperCard damper;
  std::vector<JobPhase> phases;

  bool operator==(const JobItem&) const = default;
};

struct Job {
  std::string number, customer, vehicle, plate, technician;
  std::string opened;  ///< ISO 8601 with offset
  VehicleKind kind = VehicleKind::Car;
  bool invented = false;  ///< the demonstration job: said on screen and on the sheet
  std::vector<JobItem> items;
  std::optional<Limits>
      limits;  ///< a copy as it was chosen, so that a later revision changes nothing here
  std::string notes;

  bool operator==(const Job&) const = default;
};

/// The places of a vehicle, in the order of reading: front before rear, left before right.
std::vector<std::string> cornersOf(VehicleKind kind);

}  // namespace dampwright
