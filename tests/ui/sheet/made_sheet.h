// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>

#include "core/base/sha256.h"
#include "tests/ui/made_measured.h"
#include "ui/sheet/sheet_content.h"

namespace dampwright::made {

// Bytes that no text tool may change on their way through the PDF: both line ends, a NUL, no
// newline at the end.
inline std::string runBytes(const std::string& name) {
  return "time,position,load\r\n0,0,0\n" + name + std::string("\0\xff\r", 3);
}

inline Limits limits() {
  Limits limits;
  limits.title = "Rally hatchback, street";
  limits.revision = "C";
  limits.source = "workshop sheet 12";
  limits.forceBasis = ForceBasis::GasRemoved;
  Check force;
  force.check = "force";
  force.direction = Direction::Rebound;
  force.velocity = 0.3;
  force.target = 600;
  force.tolerancePercent = 10;
  limits.checks.push_back(force);
  return limits;
}

inline JobItem item(const std::string& corner, const std::string& serial) {
  JobItem item;
  item.corner = corner;
  item.damper.serial = serial;
  item.damper.partNumber = "PN-4711-B";
  item.damper.kind = "monotube";
  JobPhase phase;
  const std::string file = serial + " as found.csv";
  JobRun run{file, sha256Hex(runBytes(file)), "bench 1", {}, {}};
  run.answers.zeroState = ZeroState::NoSpecimen;
  phase.runs.push_back(std::move(run));
  item.phases.push_back(phase);
  return item;
}

inline Job job(const std::vector<std::string>& corners) {
  Job job;
  job.number = "2031-0041";
  job.customer = "Saltmarsh Motor Club";
  job.vehicle = "rally hatchback";
  job.plate = "KX 31 DMP";
  job.technician = "M. Thornbury";
  job.opened = "2031-03-14T09:20:00+00:00";
  job.limits = limits();
  int serial = 1107;
  for (const std::string& corner : corners) {
    job.items.push_back(item(corner, "DA-" + std::to_string(serial++)));
  }
  return job;
}

inline CheckVerdict scalarCheck(const char* kind,
                                double y,
                                double u,
                                std::optional<double> min,
                                std::optional<double> max,
                                VerdictWord word) {
  CheckVerdict judged;
  judged.check.check = kind;
  judged.measured = y;
  judged.expandedUncertainty = u;
  judged.coverageFactor = 2.06;
  judged.min = min;
  judged.max = max;
  judged.margin = std::min(min ? y - *min : 1e9, max ? *max - y : 1e9);
  judged.verdict = word;
  return judged;
}

// Nine checks like those of a workshop: all pass, one fails, one is too close, or one not tested.
inline Verdict nineChecks(VerdictWord word) {
  Verdict verdict;
  verdict.title = "Rally hatchback, street";
  verdict.forceBasis = ForceBasis::GasRemoved;
  verdict.word = word;
  for (const Direction direction : {Direction::Rebound, Direction::Compression}) {
    for (const double speed : {0.1, 0.3, 0.6}) {
      const double y = readingAt(speed, direction).force;
      verdict.checks.push_back(
          forceCheck(direction, speed, y * 0.92 - 20, y * 1.08 + 20, VerdictWord::Pass));
    }
  }
  verdict.checks[0].check.target = 100;
  verdict.checks[0].check.tolerancePercent = 8;
  verdict.checks[0].check.toleranceAbsolute = 20;
  verdict.checks.push_back(scalarCheck("gas force", 150.3, 3.2, 120, 180, VerdictWord::Pass));
  verdict.checks.push_back(scalarCheck("friction", 24.8, 2.3, {}, 45, VerdictWord::Pass));
  CheckVerdict& last = verdict.checks[4];
  if (word == VerdictWord::NotTested) {
    last.measured.reset();
    last.margin.reset();
    last.coverageFactor = last.expandedUncertainty = 0;
  } else if (word == VerdictWord::Fail) {
    last.max = *last.measured - 31;
    last.min = *last.max - 90;
    last.margin = -31;
  } else if (word == VerdictWord::TooCloseToCall) {
    last.max = *last.measured + 2;
    last.margin = 2;
  }
  last.verdict = word;
  return verdict;
}

inline SheetContent sheet(const Job& job, const std::vector<VerdictWord>& words) {
  const auto result = [&](std::size_t item, std::size_t) {
    SheetPhase phase;
    const auto made = measured();
    MeasuredRun& run = made->measurement.runs[0];
    run.source.file.name = job.items[item].phases[0].runs[0].file;
    run.source.file.sha256 = job.items[item].phases[0].runs[0].sha256;
    run.zeroState = ZeroState::NoSpecimen;
    made->measurement.rig.loadCell.calibrated = "2031-01-10";
    made->measurement.gas.method = "slow block";
    for (std::size_t i = 0; i < made->measurement.blocks.size(); ++i) {
      made->measurement.blocks[i].block.temperature = 30.0 + 0.8 * static_cast<double>(i);
    }
    phase.measured = made;
    phase.verdict = nineChecks(words[item % words.size()]);
    return phase;
  };
  const auto bytesOf = [&](const std::string& hash) -> Result<std::string> {
    for (const JobItem& item : job.items) {
      for (const JobPhase& phase : item.phases) {
        for (const JobRun& run : phase.runs) {
          if (run.sha256 == hash) return runBytes(run.file);
        }
      }
    }
    return Error{"run-file-missing", {}, {}};
  };
  return sheetContent(job, {}, result, bytesOf).value();
}

// Each damper on a rig of its own, at its own temperature, judged by the same nine checks; the
// right ones make 31 N too much in one of them.
inline SheetContent unlikeRigs(SheetContent content) {
  int rig = 1;
  for (SheetItem& item : content.items) {
    SheetPhase& phase = item.phases[0];
    const auto own = std::make_shared<Measured>(*phase.measured);
    for (MeasuredBlock& measured : own->measurement.blocks) *measured.block.temperature += rig;
    *own->measurement.gas.force += rig;
    phase.measured = own;
    phase.phase.runs[0].rig = "bench " + std::to_string(rig);
    phase.verdict = nineChecks(VerdictWord::Pass);
    phase.verdict->checks.push_back(
        forceCheck(Direction::Rebound, 1.0, 2000, 2700, VerdictWord::Pass));
    if (rig % 2 == 0) {
      CheckVerdict& failed = phase.verdict->checks[4];
      failed.measured = *failed.max + 31;
      failed.margin = -31;
      failed.verdict = phase.verdict->word = VerdictWord::Fail;
    }
    ++rig;
  }
  return content;
}

}  // namespace dampwright::made
