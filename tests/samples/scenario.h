// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <utility>
#include <vector>

#include "tests/support/bench_text.h"

// The one invented scenario of sample_runs: a workshop with four benches, a car, a motorcycle.
// Everything here is made up; what it says is the truth that the made files hide under noise.
namespace dampwright::samples {

/// How a bench writes its column names.
enum class NameForm { UnitInRound, UnitInSquare, UnitInRow };

struct RigChannel {
  bench::Channel channel = bench::Channel::Time;
  std::string name, unit;
  double siPerUnit = 1;  ///< of the unit, always positive
  int decimals = 3;
};

/// A bench: its files' layout, what its certificate states, and how it counts.
struct SampleRig {
  std::string name;  ///< "bench 1"
  std::vector<RigChannel> channels;
  NameForm nameForm = NameForm::UnitInRound;
  bench::TextStyle style;                       ///< without columns and preamble
  Direction positive = Direction::Compression;  ///< of displacement and of force
  double capacityN = 10000, readingPercent = 0.3, capacityPercent = 0.02, zeroDriftN = 1;
  double displacementAccuracyMm = 0.02, clockAccuracyPercent = 0.01, remountPercent = 0.5;
  double forceDelayMs = 0, movingMassKg = 0;
};

enum class FileLayout { OneFile, FilePerSpeed };

/// A damper at one setting, as it goes onto a bench.
struct SampleDamper {
  std::string vehicle;  ///< key of its SampleVehicle
  std::string corner;   ///< "front left"
  std::string file;     ///< file name without ending
  std::string serial;
  std::optional<double> reboundClicks;
  bench::Damper damper;
  bench::DrivePlan plan;
  bench::Instrument instrument;
  SampleRig rig;
  FileLayout layout = FileLayout::OneFile;
  std::vector<std::string> preamble;  ///< lines above the table
  std::string story;                  ///< what is the matter with it, for people
};

/// One line of a limit sheet, in the units of the sheet (mm/s, N).
struct SampleCheck {
  std::string check;  ///< force | gas force | friction
  std::optional<Direction> direction;
  double velocityMmS = 0;
  std::optional<double> minN, maxN, targetN;
  double tolerancePercent = 0;
};

struct SampleVehicle {
  std::string key;  ///< "car"
  std::string jobFile, limitsFile;
  std::string number, customer, vehicle, plate;
  std::string limitsTitle, limitsSource, limitsRevision;
  double strokeMm = 50;
  std::string partNumber, kind;
  double rodMm = 0, pistonMm = 0, openMm = 0, closedMm = 0, nominalGasN = 0;
  std::vector<SampleCheck> checks;
};

SampleVehicle car();
SampleVehicle motorcycle();
std::vector<SampleDamper> carDampers();
std::vector<SampleDamper> motorcycleDampers();

SampleRig bench1();
SampleRig bench2();
SampleRig bench3();
SampleRig bench4();

/// The slow block, a warm-up block at `warmUp`, then the speeds; all in m and m/s.
bench::DrivePlan samplePlan(double stroke,
                            double warmUp,
                            const std::vector<std::pair<double, int>>& speedsAndTurns);

/// The layout's line by which a rig profile is found again.
std::string signatureOf(const SampleRig& rig);

/// The bench's style with its columns named, scaled and signed as it writes them.
bench::TextStyle styleOf(const SampleRig& rig);

}  // namespace dampwright::samples
