// SPDX-License-Identifier: GPL-3.0-or-later
#include <cmath>

#include "tests/samples/sample_documents.h"

namespace dampwright::samples {
namespace {

using bench::fixedText;

std::string titleOf(const SampleTruth& truth) {
  std::string title = truth.damper.vehicle + ", " + truth.damper.corner;
  if (truth.damper.reboundClicks)
    title += ", rebound " + fixedText(*truth.damper.reboundClicks, 0) + " clicks";
  return title;
}

std::string head() {
  return R"(# Sample runs

**Everything here is invented**: workshop, benches, customers, vehicles, dampers, names, plates and
dates. No file was recorded on a real bench. All of it is written by `sh sample_runs/make.sh` from
the simulator in `tests/support`, which integrates a damper on a bench in small steps and shares
nothing with the program's own analysis. The same command always writes the same bytes.

## The scenario

The Quillmere Damper Workshop has four benches that each write another kind of text file. On a
morning in March 2031 a *Larkholt 7 roadster* stands on the lift: one type of damper on all four
corners, two of them good, the rear left with a worn check valve, the rear right low on gas. In the
afternoon a *Fennick 650* brings its rear damper, tested at five clicks of its rebound screw.

To try it in the program: drop `car_front_left.csv`, `car_front_right.csv`, `car_rear_left.csv` and
`car_rear_right.csv` on their corners and choose the limit sheet `limits_car.json`.
`demonstration_job.json` and `motorcycle_job.json` hold the same as ready jobs.

)";
}

std::string verdictTable(const std::vector<SampleVehicle>& vehicles,
                         const std::vector<SampleTruth>& truths) {
  std::string text = "## What must come out\n\n";
  text += "| damper | file | limit sheet | verdict | why |\n|---|---|---|---|---|\n";
  for (const SampleTruth& truth : truths) {
    const std::string file = truth.damper.layout == FileLayout::OneFile
                                 ? truth.damper.file + ".csv"
                                 : truth.damper.file + "_*_mm_s.csv, a file a speed";
    for (const SampleVehicle& vehicle : vehicles)
      if (vehicle.key == truth.damper.vehicle)
        text += "| " + titleOf(truth) + " | `" + file + "` | `" + vehicle.limitsFile + "` | **" +
                truth.verdict + "** | " + truth.damper.story + " |\n";
  }
  return text + "\n";
}

std::string rigLine(const SampleRig& rig) {
  const std::string delimiter =
      rig.style.delimiter == '\t' ? "tab" : std::string{rig.style.delimiter};
  return "| " + rig.name + " | `" + rigFile(rig) + "` | " + delimiter + " | " +
         std::string{rig.style.decimalMark} + " | " +
         (rig.style.encoding == bench::Encoding::Windows1252 ? "Windows-1252" : "UTF-8") +
         (rig.style.encoding == bench::Encoding::Utf8WithBom ? " with BOM" : "") + " | " +
         nameOf(rig.positive) + " | " + fixedText(rig.forceDelayMs, 1) + " | " +
         fixedText(rig.movingMassKg, 1) + " |\n";
}

std::string rigTable() {
  std::string text =
      "## The benches\n\n| bench | profile | delimiter | decimal mark | encoding | positive is | "
      "force "
      "delay, ms | moving mass, kg |\n|---|---|---|---|---|---|---|---|\n";
  for (const SampleRig& rig : {bench1(), bench2(), bench3(), bench4()}) text += rigLine(rig);
  return text +
         "\nCells were zeroed without a damper. Noise: 2 N and 0.01 mm rms on every sample.\n\n";
}

std::string speedTable(const SampleTruth& truth) {
  std::string text =
      "| speed, mm/s | compression, N | gas removed | rebound, N | gas removed | energy, J |\n"
      "|---|---|---|---|---|---|\n";
  for (std::size_t i = 0; i < truth.blocks.size(); ++i) {
    const bench::HalfTruth &in = truth.compression[i], &out = truth.rebound[i];
    text += "| " + fixedText(truth.blocks[i].plan.speed * 1e3, 0) + " | " + fixedText(in.force, 1) +
            " | " + fixedText(in.force - in.gas, 1) + " | " + fixedText(out.force, 1) + " | " +
            fixedText(out.force + out.gas, 1) + " | " + fixedText(truth.energy[i], 2) + " |\n";
  }
  return text + "\n";
}

std::string limitText(const SampleCheck& check) {
  if (check.targetN)
    return fixedText(*check.targetN, 0) + " ± " + fixedText(check.tolerancePercent, 0) + " %";
  if (check.minN && check.maxN)
    return fixedText(*check.minN, 0) + " to " + fixedText(*check.maxN, 0);
  return check.minN ? "at least " + fixedText(*check.minN, 0)
                    : "at most " + fixedText(check.maxN.value_or(0), 0);
}

std::string checkTable(const SampleTruth& truth) {
  std::string text = "| check | limit, N | truth, N | verdict |\n|---|---|---|---|\n";
  for (const PromisedCheck& promised : truth.checks) {
    const SampleCheck& check = promised.check;
    std::string name = check.check;
    if (check.direction)
      name += ", " + nameOf(*check.direction) + " at " + fixedText(check.velocityMmS, 0) + " mm/s";
    text += "| " + name + " | " + limitText(check) + " | " + fixedText(promised.truthN, 1) + " | " +
            promised.verdict + " |\n";
  }
  return text + "\n";
}

std::string damperSection(const SampleTruth& truth) {
  const bench::Damper& damper = truth.damper.damper;
  std::string text = "### " + titleOf(truth) + "\n\n" + truth.damper.story + "\n\n";
  text += "Serial " + truth.damper.serial + ", " + truth.damper.rig.name + ". Gas " +
          fixedText(truth.gasN, 1) + " N at mid-stroke and " + fixedText(truth.startC, 0) +
          " °C; dry friction " + fixedText(truth.dryFrictionN, 0) +
          " N; half difference at 5 mm/s " + fixedText(truth.halfDifferenceN, 1) +
          " N; lost motion " + fixedText(damper.compressionGap * 1e3, 1) + " mm in compression, " +
          fixedText(damper.reboundGap * 1e3, 1) + " mm in rebound; " + fixedText(truth.startC, 1) +
          " °C at the start, " + fixedText(truth.endC, 1) +
          " °C at the end. Valves: " + damper.compression.form + " in compression, " +
          damper.rebound.form + " in rebound.\n\n";
  return text + speedTable(truth) + checkTable(truth);
}

}  // namespace

SampleFile readme(const std::vector<SampleVehicle>& vehicles,
                  const std::vector<SampleTruth>& truths) {
  std::string text = head() + verdictTable(vehicles, truths) + rigTable();
  text +=
      "## The truth of each\n\nForces are what the run without noise reads at the instant of the "
      "largest speed, mean of the counted cycles, in the direction that resists the motion. "
      "`truth.json` holds the same for programs.\n\n";
  for (const SampleTruth& truth : truths) text += damperSection(truth);
  text.pop_back();  // one line end at the end of the file
  return {"README.md", text};
}

}  // namespace dampwright::samples
