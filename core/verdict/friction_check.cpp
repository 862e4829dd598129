// SPDX-License-Identifier: GPL-3.0-or-later
#include <array>

#include "core/uncertainty/figure_budgets.h"
#include "core/verdict/check_kinds.h"

namespace dampwright {
namespace {

constexpr std::array<std::string_view, 2> bases{"half difference", "dry"};
constexpr std::array<CheckField, 6> fields{{
    {"basis", CheckMember::Basis, Need::May, bases},
    {"min_n", CheckMember::Min, Need::May},
    {"max_n", CheckMember::Max, Need::May},
    {"target_n", CheckMember::Target, Need::May},
    {"tolerance_percent", CheckMember::TolerancePercent, Need::May},
    {"tolerance_n", CheckMember::ToleranceAbsolute, Need::May},
}};

Figure friction(const Measurement& measurement, const Limits&, const Check& check) {
  const Friction& found = measurement.friction;
  const bool dry = check.basis == "dry";
  const std::optional<double>& value = dry ? found.dry : found.halfDifference;
  if (!value) {
    const bool known = dry && !found.reason.empty();
    return {.reason = {known ? found.reason : "friction-not-determined", {}}};
  }
  const auto kind = dry ? FrictionKind::Dry : FrictionKind::HalfDifference;
  return {.value = value,
          .budget = frictionBudget(found, kind, measurement.rig),
          .temperature = measurement.gas.temperature};
}

}  // namespace

/// Two figures under one name, never mixed: the half difference (default) and the dry friction.
const CheckKind frictionCheckKind{
    "friction", Quantity::Force, NeedsDirection::No, fields, friction};

}  // namespace dampwright
