// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <string_view>
#include <vector>

#include "core/measure/measurement.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// A member of `Check` that a limit sheet may set.
enum class CheckMember {
  Direction,
  Velocity,
  Reading,
  Stroke,
  Basis,
  Min,
  Max,
  Target,
  TolerancePercent,
  ToleranceAbsolute
};

enum class Need { Must, May };

/// One key of a check in a limit sheet. The end of the key says the unit.
struct CheckField {
  std::string_view key;
  CheckMember member;
  Need need;
  std::span<const std::string_view> words = {};  ///< what a text may say, empty: it is no text
};

/// What a check measures: a figure with its budget, or the reason why there is none.
struct Figure {
  std::optional<double> value = {};        ///< SI
  std::vector<BudgetLine> budget = {};     ///< of value; combine() gives its standard uncertainty
  std::optional<double> temperature = {};  ///< °C, of the damper while it was read
  std::optional<BlockKind> waveform = {};  ///< of the block it was read from, where that matters
  std::vector<Remark> remarks = {};
  Reason reason = {};  ///< code empty where there is a value
};

/// Whether a figure means anything while it is only assumed which sign is compression.
enum class NeedsDirection { Yes, No };

/// A kind of check: its name in limit sheets, the keys it has, and how its figure is found.
/// A new kind is one file with its row, and that row in checkKinds().
struct CheckKind {
  std::string_view name;
  Quantity quantity;
  NeedsDirection direction;
  std::span<const CheckField> fields;
  Figure (*evaluate)(const Measurement& measurement, const Limits& limits, const Check& check);
};

std::span<const CheckKind> checkKinds();

/// Nothing where there is no such kind.
const CheckKind* findCheckKind(std::string_view name);

/// Why a check cannot be judged by anybody: a code of core/words, nothing where all is well.
/// check-unknown, check-incomplete {key}, check-without-limit, check-with-two-limits (a target
/// beside min or max), check-without-tolerance, check-limits-crossed.
std::optional<Reason> problemOf(const Check& check);

// The rows, each in a file of its own.
extern const CheckKind forceCheckKind;     ///< force_check.cpp
extern const CheckKind gasForceCheckKind;  ///< gas_force_check.cpp
extern const CheckKind frictionCheckKind;  ///< friction_check.cpp

}  // namespace dampwright
