// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/samples/scenario.h"

namespace dampwright::samples {
namespace {

constexpr double stroke = 0.05;  // m

bench::DrivePlan carPlan() {
  return samplePlan(stroke, 0.2, {{0.05, 5}, {0.1, 6}, {0.3, 9}, {0.6, 12}, {1.0, 15}});
}

/// What all four share: the nominal valves of the type, a twin tube with a little gas.
SampleDamper carDamper() {
  SampleDamper one;
  one.vehicle = "car";
  one.damper.compression = bench::arctanShoulderLaw(260, 0.06, 500);
  one.damper.rebound = bench::arctanShoulderLaw(850, 0.07, 750);
  one.damper.gas = {.force = 168, .length = 0.8, .exponent = 1.2, .atmosphere = 31.8};
  one.damper.friction = {.dry = 18};
  one.damper.oilStiffness = 6e6;
  one.damper.warmth = {
      .start = 22, .room = 22, .capacity = 1500, .cooling = 1.5, .fadePercentPer10C = -1.5};
  one.plan = carPlan();
  one.instrument.rate = 1000;
  return one;
}

SampleDamper frontLeft() {
  SampleDamper one = carDamper();
  one.corner = "front left";
  one.file = "car_front_left";
  one.serial = "QD-4620-0417";
  one.rig = bench1();
  one.instrument.seed = 101;
  one.preamble = {"Bench,bench 1",
                  "Damper,QD 46-20",
                  "Serial," + one.serial,
                  "Position,FL",
                  "Date,2031-03-12",
                  "Sample rate,1000 Hz",
                  ""};
  one.story = "Good. Close to the middle of every limit.";
  return one;
}

SampleDamper frontRight() {
  SampleDamper one = carDamper();
  one.corner = "front right";
  one.file = "car_front_right";
  one.serial = "QD-4620-0418";
  one.damper.rebound = bench::throughPointsLaw({{0.01, 92},
                                                {0.03, 250},
                                                {0.05, 378},
                                                {0.1, 604},
                                                {0.2, 836},
                                                {0.3, 975},
                                                {0.6, 1268},
                                                {1.0, 1606}});
  one.damper.compression = bench::scaledLaw(one.damper.compression, 1.02);
  one.damper.gas.force = 172;
  one.damper.friction = {
      .form = bench::FrictionForm::Stribeck, .dry = 17, .breakaway = 21, .fadeSpeed = 0.01};
  one.rig = bench1();
  one.instrument.seed = 102;
  one.instrument.displacementOffset = 0.0312;
  one.preamble = {"Bench,bench 1",
                  "Damper,QD 46-20",
                  "Serial," + one.serial,
                  "Position,FR",
                  "Date,2031-03-12",
                  "Sample rate,1000 Hz",
                  ""};
  one.story = "Good. Some 2 % above its mate, well inside the limits.";
  return one;
}

SampleDamper rearLeft() {
  SampleDamper one = carDamper();
  one.corner = "rear left";
  one.file = "car_rear_left";
  one.serial = "QD-4620-0409";
  one.damper.rebound = bench::leakingLaw(one.damper.rebound, 5500);
  one.damper.reboundGap = 0.002;
  one.damper.gas.force = 161;
  one.damper.friction = {.form = bench::FrictionForm::Bristle, .dry = 19, .breakaway = 22};
  for (auto& step : one.plan.steps) std::get<bench::BlockPlan>(step).wave = bench::Wave::Crank;
  one.rig = bench2();
  one.instrument.seed = 103;
  one.instrument.displacementOffset = -0.04;
  one.preamble = {"Prüfstand;Prüfstand 2",
                  "Dämpfer;QD 46-20",
                  "Seriennummer;" + one.serial,
                  "Einbauort;hinten links",
                  "Datum;12.03.2031",
                  "Abtastrate;1000 Hz",
                  ""};
  one.story =
      "A worn check valve: it lets oil past in rebound, and after each reversal into rebound it "
      "closes only after 2 mm.";
  return one;
}

SampleDamper rearRight() {
  SampleDamper one = carDamper();
  one.corner = "rear right";
  one.file = "car_rear_right";
  one.serial = "QD-4620-0411";
  one.damper.rebound = bench::scaledLaw(one.damper.rebound, 0.98);
  one.damper.compression = bench::throughPointsLaw(
      {{0.02, 65}, {0.05, 139}, {0.1, 218}, {0.2, 309}, {0.3, 373}, {0.6, 538}, {1.0, 744}});
  one.damper.gas.force = 24;
  one.rig = bench3();
  one.instrument.seed = 104;
  one.instrument.forceDelay = one.rig.forceDelayMs * 1e-3;
  one.instrument.displacementOffset = 0.025;
  one.preamble = {
      "# bench 3", "# serial: " + one.serial, "# position: rear right", "# date: 2031-03-12"};
  one.story = "Low on gas: its valves are right, but the charge has leaked away.";
  return one;
}

}  // namespace

SampleVehicle car() {
  SampleVehicle one;
  one.key = "car";
  one.jobFile = "demonstration_job.json";
  one.limitsFile = "limits_car.json";
  one.number = "2031-0117";
  one.customer = "T. Ember (invented)";
  one.vehicle = "Larkholt 7 roadster (invented)";
  one.plate = "QM 07 LRK";
  one.limitsTitle = "Larkholt 7, all four corners";
  one.limitsSource = "workshop sheet 12 (invented)";
  one.limitsRevision = std::string("C");
  one.partNumber = "QD 46-20";
  one.kind = "twin tube";
  one.rodMm = 20;
  one.pistonMm = 46;
  one.openMm = 512;
  one.closedMm = 352;
  one.nominalGasN = 168;
  const auto force = [](Direction direction, double speed, double target) {
    return SampleCheck{.check = "force",
                       .direction = direction,
                       .velocityMmS = speed,
                       .minN = {},
                       .maxN = {},
                       .targetN = target,
                       .tolerancePercent = 10};
  };
  one.checks = {force(Direction::Rebound, 100, 610),
                force(Direction::Rebound, 300, 970),
                force(Direction::Rebound, 600, 1255),
                force(Direction::Rebound, 1000, 1580),
                force(Direction::Compression, 100, 240),
                force(Direction::Compression, 300, 395),
                force(Direction::Compression, 600, 560),
                {.check = "gas force", .direction = {}, .minN = 130, .maxN = 200, .targetN = {}},
                {.check = "friction", .direction = {}, .minN = {}, .maxN = 75, .targetN = {}}};
  return one;
}

std::vector<SampleDamper> carDampers() {
  return {frontLeft(), frontRight(), rearLeft(), rearRight()};
}

}  // namespace dampwright::samples
