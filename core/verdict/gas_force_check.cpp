// SPDX-License-Identifier: GPL-3.0-or-later
#include <array>

#include "core/uncertainty/figure_budgets.h"
#include "core/verdict/check_kinds.h"

namespace dampwright {
namespace {

constexpr std::array<CheckField, 5> fields{{
    {"min_n", CheckMember::Min, Need::May},
    {"max_n", CheckMember::Max, Need::May},
    {"target_n", CheckMember::Target, Need::May},
    {"tolerance_percent", CheckMember::TolerancePercent, Need::May},
    {"tolerance_n", CheckMember::ToleranceAbsolute, Need::May},
}};

Figure gasForce(const Measurement& measurement, const Limits&, const Check&) {
  const Gas& gas = measurement.gas;
  if (!gas.force) return {.reason = {gas.reason.empty() ? "gas-not-determined" : gas.reason, {}}};
  return {.value = gas.force,
          .budget = gasBudget(gas, measurement.rig),
          .temperature = gas.temperature};
}

}  // namespace

/// Gas force at mid-stroke, positive where it pushes the rod out: its sign is only known with the
/// direction.
const CheckKind gasForceCheckKind{
    "gas force", Quantity::Force, NeedsDirection::Yes, fields, gasForce};

}  // namespace dampwright
