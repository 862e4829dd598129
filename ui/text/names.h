// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <string>
#include <vector>

#include "core/base/direction.h"
#include "core/base/remark.h"
#include "core/job/job.h"
#include "core/rig/damper_card.h"
#include "core/rig/rig_profile.h"
#include "core/verdict/verdict.h"

namespace dampwright {

// Names of things, translated, with a capital first letter unless said otherwise.

QString verdictName(VerdictWord word);  ///< Pass, Fail, Too close to call, Not tested
QString directionName(Direction direction);
QString phaseName(Phase phase);
QString severityName(Severity severity);
QString vehicleKindName(VehicleKind kind);
QString zeroStateText(ZeroState state);       ///< what the force was zeroed on, lower case
QString decisionRuleName(DecisionRule rule);  ///< lower case
QString forceBasisName(ForceBasis basis);     ///< lower case
QString blockKindName(BlockKind kind);        ///< waveform, lower case

/// "Front left"; a corner that the program does not know reads as it was written.
QString cornerName(const std::string& corner);

/// "rebound 8 clicks, compression 4 clicks"; the unit from the damper's adjusters. Empty where no
/// setting was noted.
QString settingText(const std::vector<SettingValue>& setting,
                    const std::vector<Adjuster>& adjusters);

/// "As found" or "After work, rebound 8 clicks".
QString phaseTitle(const JobPhase& phase, const DamperCard& damper);

/// Serial, or the part number, or "no serial".
QString damperName(const DamperCard& damper);

/// A date and time as people write it here, from ISO 8601; as it stands where it is none.
QString dateText(const std::string& iso);

}  // namespace dampwright
