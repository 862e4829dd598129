// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <string_view>

#include "core/base/result.h"
#include "core/intake/read_run.h"
#include "core/job/job.h"
#include "core/measure/measurement.h"
#include "core/rig/damper_card.h"
#include "core/rig/rig_profile.h"
#include "core/verdict/limits.h"
#include "core/verdict/verdict.h"

/// Every document in and out: strict JSON, UTF-8, as in formats of the handbook.
///
/// `bytes` is the whole document, `file` only names the place of an error. Errors, each with path,
/// value, rule and row: document-not-json, document-too-large (64 MB), document-too-deep (64),
/// document-repeated-key, document-unknown-key, document-missing-key, document-not-a-number (-text,
/// -a-flag, -a-list, -an-object), document-out-of-range, document-unknown-word,
/// document-without-kind, document-of-another-kind, document-without-version,
/// document-from-newer-program.
///
/// What is written reads back as the same value; a number whose unit in the document is not SI may
/// differ by one unit in the last place. Output is the same for the same value, in any locale.
namespace dampwright {

Result<RigProfile> readRig(std::string_view bytes, std::string_view file);
std::string writeRig(const RigProfile& rig);

Result<DamperCard> readDamper(std::string_view bytes, std::string_view file);
std::string writeDamper(const DamperCard& card);

/// Also limits-check-incomplete … where a check's fields don't go together, see
/// core/verdict/check_kinds.h.
Result<Limits> readLimits(std::string_view bytes, std::string_view file);
std::string writeLimits(const Limits& limits);

/// Holds the chosen limits whole, so that a job stands by itself; "plate", "kind", "invented" come
/// in addition to the list in formats.
Result<Job> readJob(std::string_view bytes, std::string_view file);
std::string writeJob(const Job& job);

/// How a run file was understood: a reading without its trace. In addition to formats: "file",
/// "sha256", "bytes"; "why" is a code with "why_text" beside it; a remark's "values" (SI, with
/// their unit), so that its sentence can be made again in another language. A metadata key that
/// comes twice is written with " (2)" behind it.
Result<RunReading> readColumns(std::string_view bytes, std::string_view file);
std::string writeColumns(const RunReading& reading);

/// Everything but the loops. A stored measurement can be judged again: in addition to formats it
/// holds the rig's accuracies ("rig"), each figure's part of its uncertainty that comes from the
/// cycles or from the fit ("…_cycles_u", "…_fit_u"), their pooled percentage, each point's block,
/// the cycles' times, the gas column, whether the direction is settled, and all that a "columns"
/// document says of each file. Also measurement-out-of-joint where an index points nowhere.
Result<Measurement> readMeasurement(std::string_view bytes, std::string_view file);
std::string writeMeasurement(const Measurement& measurement);

/// In addition to formats: all keys of the check's kind, "standard_uncertainty", "dof", the
/// reason's code and values, "force_basis", and "waiting": what must be confirmed before checks by
/// direction are judged. Figures stand in the SI unit that "unit" names.
Result<Verdict> readVerdict(std::string_view bytes, std::string_view file);
std::string writeVerdict(const Verdict& verdict);

}  // namespace dampwright
