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

}  // namespace dampwright
