// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <functional>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "core/base/progress.h"
#include "core/base/result.h"
#include "core/rig/read_options.h"
#include "core/rig/rig_profile.h"
#include "core/trace/trace.h"

namespace dampwright {

/// A question that the file does not answer by itself.
struct OpenPoint {
  std::string point;                    ///< decimal | force | displacement | unit | sample-rate |
                                        ///< direction (the only one that does not stop)
  std::vector<std::string> candidates;  ///< what it could be
  std::string option;                   ///< the option of the batch command that settles it
};

/// How a file was understood, and the recording when nothing that stops is open.
struct RunReading {
  Source source;
  std::vector<Remark> remarks;
  std::vector<OpenPoint> open;
  std::optional<Trace> trace;  ///< nothing while an open point stops the reading
};

/// Finds the profile of the rig that writes files of this signature; nothing where it is new.
using FindProfile = std::function<std::optional<RigProfile>(std::string_view signature)>;

/// Bytes of a run file to a recording: encoding, dialect, preamble, header, units, roles, clock,
/// signs. `name` is the file's name without its folder. Nothing is dropped without a remark, and
/// nothing guessed: what evidence does not settle is an open point, and all but `direction` leave
/// the reading without a trace. Remarks of a trace are those of its reading, but for
/// missing-values, gap and uneven-clock, which core/condition says itself. Errors (the file holds
/// no run, or an option can't be): file-empty, file-is-picture, file-is-document, file-is-archive,
/// file-is-binary, no-table, one-column, too-few-rows, too-many-columns, line-too-long,
/// header-row-not-found, column-not-found, option-not-understood, stopped; with the file and where
/// it has one the row.
Result<RunReading> readRun(std::string_view bytes,
                           std::string_view name,
                           const ReadOptions& options,
                           const FindProfile& findProfile,
                           const Progress& progress);

}  // namespace dampwright
