// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include "core/base/direction.h"
#include "core/base/remark.h"
#include "core/cycles/block.h"
#include "core/job/job.h"
#include "core/records/fields.h"
#include "core/trace/trace.h"
#include "core/verdict/verdict.h"

/// The words that documents use for the program's enumerations.
namespace dampwright::words {

inline constexpr std::array<Word<Direction>, 2> directions{{
    {"compression", Direction::Compression},
    {"rebound", Direction::Rebound},
}};
inline constexpr std::array<Word<ZeroState>, 3> zeroStates{{
    {"no specimen", ZeroState::NoSpecimen},
    {"damper fitted", ZeroState::DamperFitted},
    {"unknown", ZeroState::Unknown},
}};
inline constexpr std::array<Word<Role>, 6> roles{{
    {"time", Role::Time},
    {"displacement", Role::Displacement},
    {"force", Role::Force},
    {"velocity", Role::Velocity},
    {"temperature", Role::Temperature},
    {"other", Role::Other},
}};
inline constexpr std::array<Word<Severity>, 2> severities{{
    {"note", Severity::Note},
    {"warning", Severity::Warning},
}};
inline constexpr std::array<Word<BlockKind>, 6> blockKinds{{
    {"sine", BlockKind::Sine},
    {"crank", BlockKind::Crank},
    {"triangle", BlockKind::Triangle},
    {"sweep", BlockKind::Sweep},
    {"hold", BlockKind::Hold},
    {"other", BlockKind::Other},
}};
inline constexpr std::array<Word<ForceBasis>, 2> forceBases{{
    {"as measured", ForceBasis::AsMeasured},
    {"gas removed", ForceBasis::GasRemoved},
}};
inline constexpr std::array<Word<DecisionRule>, 2> decisionRules{{
    {"guarded", DecisionRule::Guarded},
    {"simple", DecisionRule::Simple},
}};
inline constexpr std::array<Word<VerdictWord>, 4> verdicts{{
    {"pass", VerdictWord::Pass},
    {"fail", VerdictWord::Fail},
    {"too close to call", VerdictWord::TooCloseToCall},
    {"not tested", VerdictWord::NotTested},
}};
inline constexpr std::array<Word<VehicleKind>, 3> vehicleKinds{{
    {"car", VehicleKind::Car},
    {"motorcycle", VehicleKind::Motorcycle},
    {"single damper", VehicleKind::SingleDamper},
}};
inline constexpr std::array<Word<Phase>, 2> phases{{
    {"as found", Phase::AsFound},
    {"after work", Phase::AfterWork},
}};

/// The SI unit that a value written without a unit in its key stands in.
inline constexpr std::array<Word<Quantity>, 16> quantities{{
    {"1", Quantity::None},
    {"count", Quantity::Count},
    {"s", Quantity::Time},
    {"m", Quantity::Length},
    {"m/s", Quantity::Velocity},
    {"N", Quantity::Force},
    {"°C", Quantity::Temperature},
    {"J", Quantity::Energy},
    {"W", Quantity::Power},
    {"N·s/m", Quantity::Damping},
    {"N/m", Quantity::Stiffness},
    {"kg", Quantity::Mass},
    {"Hz", Quantity::Frequency},
    {"rad", Quantity::Angle},
    {"V", Quantity::Voltage},
    {"%", Quantity::Percent},
}};

}  // namespace dampwright::words
