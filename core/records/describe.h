// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/job/job.h"
#include "core/records/fields.h"
#include "core/rig/damper_card.h"
#include "core/rig/rig_profile.h"
#include "core/verdict/limits.h"

/// The keys of values that stand in more than one document.
namespace dampwright {

void describe(Fields& io, LoadCell& cell);
void describe(Fields& io, DamperCard& card);
void describe(Fields& io, Limits& limits);
void describeSpans(Fields& io, std::string_view key, std::vector<TimeSpan>& spans);

}  // namespace dampwright
