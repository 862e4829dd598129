// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/intake/read_run.h"
#include "core/job/job.h"
#include "core/records/fields.h"
#include "core/rig/damper_card.h"
#include "core/rig/rig_profile.h"
#include "core/verdict/verdict.h"

/// The keys of values that stand in more than one document.
namespace dampwright {

void describe(Fields& io, LoadCell& cell);
void describe(Fields& io, DamperCard& card);
void describe(Fields& io, Check& check);  ///< the keys of its kind
void describe(Fields& io, Limits& limits);
void describe(Fields& io, SourceColumn& column);
void describe(Fields& io, Source& source);
void describe(Fields& io, Remark& remark);
void describe(Fields& io, BudgetLine& line);

void describeSpans(Fields& io, std::string_view key, std::vector<TimeSpan>& spans);
void describeRemarks(Fields& io, std::vector<Remark>& remarks);
void describeValues(Fields& io, std::string_view key, Values& values);

}  // namespace dampwright
