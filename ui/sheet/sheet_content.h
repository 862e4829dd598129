// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QByteArray>
#include <QString>
#include <functional>
#include <memory>
#include <optional>
#include <vector>

#include "core/base/result.h"
#include "core/job/job.h"
#include "core/measure/measure_runs.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// Who prints the sheet; an empty name prints a line to write on.
struct Workshop {
  QString name, address;

  bool operator==(const Workshop&) const = default;
};

/// One test of one damper, as found or after work, at one setting.
struct SheetPhase {
  JobPhase phase;
  std::shared_ptr<const Measured> measured;  ///< nothing: not tested, `problem` may say why
  std::optional<Verdict> verdict;
  std::optional<Error> problem;
};

/// One damper. Without phases it was received, and the sheet says that it was not tested.
struct SheetItem {
  std::string corner;
  DamperCard damper;
  std::vector<SheetPhase> phases;
};

/// A file inside the PDF. `kind`: job | limits | run.
struct SheetAttachment {
  QString kind;
  QString name;  ///< as it was dropped; what stands in the PDF is sanitised
  QByteArray bytes;
};

/// All that a sheet says, as a value: what is printed later does not change it.
struct SheetContent {
  Workshop workshop;
  Job job;          ///< its items are not read, `items` are
  QString printed;  ///< ISO 8601 with offset: when the sheet was made
  std::vector<SheetItem> items;
  std::vector<SheetAttachment> attachments;
};

/// What is known of one phase of a job's item; `item` and `phase` are indices.
using PhaseResult = std::function<SheetPhase(std::size_t item, std::size_t phase)>;
/// The bytes of a run by its hash; an error where they are gone.
using RunBytesOf = std::function<Result<std::string>(const std::string& sha256)>;

/// The sheet of a job, dated now. Places of the vehicle without a damper and without runs are left
/// out. A run whose bytes are gone is an error: a sheet that is no archive is not made.
Result<SheetContent> sheetContent(const Job& job,
                                  const Workshop& workshop,
                                  const PhaseResult& result,
                                  const RunBytesOf& bytesOf);

/// True where the verdict of the phase must not be printed as final: a direction is not confirmed.
bool waits(const SheetPhase& phase);

}  // namespace dampwright
