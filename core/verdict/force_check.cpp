// SPDX-License-Identifier: GPL-3.0-or-later
#include <array>

#include "core/verdict/check_kinds.h"

namespace dampwright {
namespace {

constexpr std::array<std::string_view, 2> readings{"at peak velocity", "largest"};
constexpr std::array<CheckField, 9> fields{{
    {"direction", CheckMember::Direction, Need::Must},
    {"velocity_mm_s", CheckMember::Velocity, Need::Must},
    {"reading", CheckMember::Reading, Need::May, readings},
    {"stroke_mm", CheckMember::Stroke, Need::May},
    {"min_n", CheckMember::Min, Need::May},
    {"max_n", CheckMember::Max, Need::May},
    {"target_n", CheckMember::Target, Need::May},
    {"tolerance_percent", CheckMember::TolerancePercent, Need::May},
    {"tolerance_n", CheckMember::ToleranceAbsolute, Need::May},
}};

Figure force(const Measurement&, const Limits&, const Check& check) {
  return {{}, {}, {"speed-not-tested", {{"velocity", *check.velocity, Quantity::Velocity}}}};
}

}  // namespace

const CheckKind forceCheckKind{"force", Quantity::Force, fields, force};

}  // namespace dampwright
