// SPDX-License-Identifier: GPL-3.0-or-later
#include <cmath>

#include "tests/samples/scenario.h"

namespace dampwright::samples {
namespace {

constexpr double stroke = 0.03;  // m
const char* const serial = "QD-4614R-0032";

/// The screw closes a bleed beside the rebound valve: clicks are counted from full soft, 0 to 20.
bench::Law reboundAt(double clicks) {
  const double leak = 3500 / std::pow(1 - clicks / 24, 1.5);  // N·s/m
  return bench::leakingLaw(bench::arctanShoulderLaw(800, 0.04, 900), leak);
}

SampleDamper atClicks(int clicks, const std::string& story) {
  const std::string number = (clicks < 10 ? "0" : "") + std::to_string(clicks);
  SampleDamper one;
  one.vehicle = "motorcycle";
  one.corner = "rear";
  one.file = "motorcycle_rear_rebound_" + number + "_clicks";
  one.serial = serial;
  one.reboundClicks = clicks;
  one.damper.compression = bench::leakAndOrificeLaw(2500, 0.012);
  one.damper.rebound = reboundAt(clicks);
  one.damper.gas = {.force = 185, .length = 0.35, .exponent = 1.2, .atmosphere = 15.6};
  one.damper.friction = {.dry = 12};
  one.damper.oilStiffness = 9e6;
  one.damper.warmth = {
      .start = 23, .room = 22, .capacity = 900, .cooling = 1.2, .fadePercentPer10C = -1};
  one.plan = samplePlan(stroke, 0.2, {{0.05, 5}, {0.1, 6}, {0.3, 12}, {0.6, 16}});
  one.rig = bench4();
  one.rig.channels.front().decimals = 3;
  one.instrument.rate = 1000;
  one.instrument.seed = 200 + static_cast<unsigned>(clicks);
  one.instrument.movingMass = one.rig.movingMassKg;
  one.instrument.displacementOffset = 0.0381;
  one.preamble = {"Bench,bench 4",
                  "Damper,QD 46-14R",
                  std::string("Serial,") + serial,
                  "Position,rear",
                  "Rebound clicks," + std::to_string(clicks),
                  "Counted from,full soft",
                  "Date,2031-03-13",
                  ""};
  one.story = story;
  return one;
}

}  // namespace

SampleVehicle motorcycle() {
  SampleVehicle one;
  one.key = "motorcycle";
  one.jobFile = "motorcycle_job.json";
  one.limitsFile = "limits_motorcycle.json";
  one.number = "2031-0118";
  one.customer = "O. Wend (invented)";
  one.vehicle = "Fennick 650 (invented)";
  one.plate = "QM 65 FNK";
  one.limitsTitle = "Fennick 650, rear";
  one.limitsSource = "workshop sheet 31 (invented)";
  one.limitsRevision = std::string("A");
  one.strokeMm = 30;
  one.partNumber = "QD 46-14R";
  one.kind = "remote reservoir";
  one.rodMm = 14;
  one.pistonMm = 46;
  one.openMm = 335;
  one.closedMm = 270;
  one.nominalGasN = 185;
  const auto force = [](Direction direction, double speed, double low, double high) {
    return SampleCheck{.check = "force",
                       .direction = direction,
                       .velocityMmS = speed,
                       .minN = low,
                       .maxN = high,
                       .targetN = {}};
  };
  one.checks = {force(Direction::Rebound, 100, 425, 557),
                force(Direction::Rebound, 300, 700, 1020),
                force(Direction::Compression, 300, 240, 320),
                {.check = "gas force", .direction = {}, .minN = 150, .maxN = 220, .targetN = {}},
                {.check = "friction", .direction = {}, .minN = {}, .maxN = 60, .targetN = {}}};
  return one;
}

std::vector<SampleDamper> motorcycleDampers() {
  std::vector<SampleDamper> settings = {
      atClicks(2, "Far too soft in rebound."),
      atClicks(6, "Too soft in rebound."),
      atClicks(10, "Right."),
      atClicks(14, "On the upper limit: nobody could honestly say on which side."),
      atClicks(18, "Too hard in rebound.")};
  SampleDamper& middle = settings[2];
  middle.layout = FileLayout::FilePerSpeed;
  middle.instrument.rate = 2000;
  middle.rig = bench4();  // half milliseconds need the fourth decimal
  // every file's first block conditions the damper again: enough cycles for it in each
  for (auto& step : middle.plan.steps) {
    auto& block = std::get<bench::BlockPlan>(step);
    if (block.speed > 0.005) block.turns = block.speed > 0.2 ? 20 : 14;
  }
  return settings;
}

}  // namespace dampwright::samples
