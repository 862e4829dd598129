// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/verdict/check_kinds.h"

#include <algorithm>
#include <array>

namespace dampwright {
namespace {

bool has(const Check& check, CheckMember member) {
  switch (member) {
    case CheckMember::Direction:
      return check.direction.has_value();
    case CheckMember::Velocity:
      return check.velocity.has_value();
    case CheckMember::Reading:
      return !check.reading.empty();
    case CheckMember::Stroke:
      return check.stroke.has_value();
    case CheckMember::Basis:
      return !check.basis.empty();
    case CheckMember::Min:
      return check.min.has_value();
    case CheckMember::Max:
      return check.max.has_value();
    case CheckMember::Target:
      return check.target.has_value();
    case CheckMember::TolerancePercent:
      return check.tolerancePercent > 0;
    case CheckMember::ToleranceAbsolute:
      return check.toleranceAbsolute > 0;
  }
  return false;
}

}  // namespace

std::span<const CheckKind> checkKinds() {
  static const std::array kinds{forceCheckKind, gasForceCheckKind, frictionCheckKind};
  return kinds;
}

const CheckKind* findCheckKind(std::string_view name) {
  const auto kinds = checkKinds();
  const auto found = std::find_if(
      kinds.begin(), kinds.end(), [&](const CheckKind& kind) { return kind.name == name; });
  return found == kinds.end() ? nullptr : &*found;
}

std::optional<Reason> problemOf(const Check& check) {
  const CheckKind* kind = findCheckKind(check.check);
  if (!kind) return Reason{"check-unknown", {{"check", check.check}}};
  for (const CheckField& field : kind->fields) {
    if (field.need == Need::Must && !has(check, field.member))
      return Reason{"check-incomplete", {{"missing", std::string(field.key)}}};
  }
  const bool tolerance = check.tolerancePercent > 0 || check.toleranceAbsolute > 0;
  const bool range = check.min || check.max;
  if (!range && !check.target) return Reason{"check-without-limit", {}};
  if (range && (check.target || tolerance)) return Reason{"check-with-two-limits", {}};
  if (check.target && !tolerance) return Reason{"check-without-tolerance", {}};
  if (check.min && check.max && *check.min > *check.max) {
    return Reason{"check-limits-crossed",
                  {{"min", *check.min, kind->quantity}, {"max", *check.max, kind->quantity}}};
  }
  return std::nullopt;
}

}  // namespace dampwright
