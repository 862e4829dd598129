// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <functional>
#include <memory>
#include <optional>
#include <string>
#include <vector>

#include "core/base/progress.h"
#include "core/base/result.h"
#include "core/intake/first_rows.h"
#include "core/intake/read_run.h"
#include "core/measure/measure_runs.h"
#include "ui/columns/columns_draft.h"

namespace dampwright {

using RunText = std::shared_ptr<const std::string>;

/// The bytes of the file, from memory or from the job book; for any thread.
using LoadRun = std::function<Result<RunText>()>;

/// How a draft reads the file: first by its head, which is quick however long the file is, then as
/// a whole.
struct ColumnsPreview {
  RunText bytes;                      ///< loaded once
  std::vector<TextRow> rows;          ///< the first rows, cut as the draft says
  std::optional<RunReading> reading;  ///< nothing where there is a problem
  std::optional<Error> problem;       ///< why it cannot be read so
  std::string signature;              ///< as found without any answer; empty: there is no table
  std::shared_ptr<const Measured> measured;  ///< of the whole, where it can be measured
  std::optional<Error> unmeasured;           ///< why not, in a file that can be read
};

/// Rows that the window shows.
inline constexpr std::size_t previewRows = 60;

/// Never on the GUI thread.
ColumnsPreview previewHead(const LoadRun& load,
                           const std::string& name,
                           const ColumnsDraft& draft,
                           const Progress& progress);

/// `head` with the reading, and the measurement, of the whole file.
ColumnsPreview previewWhole(ColumnsPreview head,
                            const std::string& name,
                            const ColumnsDraft& draft,
                            const Progress& progress);

}  // namespace dampwright
