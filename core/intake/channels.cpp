// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/channels.h"

#include <algorithm>
#include <cmath>
#include <limits>

#include "core/intake/column_shape.h"
#include "core/intake/name_and_unit.h"

namespace dampwright {
namespace {

struct Range {
  double low = std::numeric_limits<double>::infinity();
  double high = -std::numeric_limits<double>::infinity();

  double span() const { return high >= low ? high - low : 0; }
  double largest() const { return high >= low ? std::max(std::abs(low), std::abs(high)) : 0; }
};

Range rangeOf(std::span<const double> values) {
  Range range;
  for (const double value : values) {
    if (!std::isfinite(value)) continue;
    range.low = std::min(range.low, value);
    range.high = std::max(range.high, value);
  }
  return range;
}

// Rigs sample at 5 Hz to 100 kHz, and a cycle takes 20 ms to two minutes.
bool plausibleStep(double seconds, const UnitHints& hints) {
  if (hints.sampleRate) return std::abs(seconds * *hints.sampleRate - 1) < 0.05;
  const bool rate = seconds >= 1e-5 && seconds <= 0.2;
  const double cycle = seconds * hints.rowsPerCycle.value_or(0);
  return rate && (!hints.rowsPerCycle || (cycle >= 0.02 && cycle <= 120));
}

struct Guess {
  std::string_view symbol;
  bool assumed = true;
};

Guess timeUnit(std::span<const double> raw, const UnitHints& hints) {
  const double step = medianStep(raw);
  // 30000 to 80000 days since 1900 are the years 1982 to 2119.
  const Range range = rangeOf(raw);
  const bool serialDay = range.low > 30000 && range.high < 80000 && range.span() < 7;
  if (serialDay && plausibleStep(step * 86400, {std::nullopt, hints.sampleRate, {}, {}}))
    return {"d"};
  for (const auto& [symbol, seconds] :
       {std::pair{"s", 1.0}, {"ms", 1e-3}, {"µs", 1e-6}, {"ns", 1e-9}, {"min", 60.0}}) {
    if (plausibleStep(step * seconds, hints)) return {symbol, !hints.sampleRate};
  }
  return {"s"};
}

// A stroke of 0.4 to 1000 is millimetres: 0.4 m is more than any bench strokes.
Guess lengthUnit(std::span<const double> raw) {
  const double span = rangeOf(raw).span();
  if (span < 0.4) return {"m"};
  return {span > 1000 ? std::string_view("µm") : std::string_view("mm")};
}

// A run of 20 units and more is newtons, of less kilonewtons: no bench needs 20 kN, and 20 N is
// little more than a cell's noise.
Guess forceUnit(std::span<const double> raw) {
  const double largest = rangeOf(raw).largest();
  return {largest > 0.02 && largest < 20 ? std::string_view("kN") : std::string_view("N")};
}

// The one whose velocity is the slope of the displacement within a fifth.
Guess velocityUnit(std::span<const double> raw, const UnitHints& hints) {
  const double step = medianStep(hints.time);
  const auto factor = slopeFactor(hints.displacement, raw);
  for (const std::string_view symbol : {"m/s", "mm/s", "in/s", "cm/s"}) {
    const double si = readUnit(symbol)->siPerUnit;
    if (factor && std::abs(*factor / step * si - 1) < 0.2) return {symbol, false};
  }
  return {rangeOf(raw).largest() < 10 ? std::string_view("m/s") : std::string_view("mm/s")};
}

Guess plausibleUnit(Role role, std::span<const double> raw, const UnitHints& hints) {
  if (role == Role::Time) return timeUnit(raw, hints);
  if (role == Role::Displacement) return lengthUnit(raw);
  if (role == Role::Force) return forceUnit(raw);
  if (role == Role::Velocity) return velocityUnit(raw, hints);
  return {rangeOf(raw).low > 200 ? std::string_view("K") : std::string_view("°C")};
}

std::string_view optionOf(Role role) {
  if (role == Role::Time) return "--time-unit";
  if (role == Role::Displacement) return "--displacement-unit";
  if (role == Role::Force) return "--force-unit";
  return role == Role::Velocity ? "--velocity-unit" : "--temperature-unit";
}

std::string_view unitsOf(Role role) {
  if (role == Role::Time) return "s, ms, µs, ns, min, h, d";
  if (role == Role::Displacement) return "mm, cm, m, µm, in";
  if (role == Role::Force) return "N, kN, daN, kgf, lbf";
  return role == Role::Velocity ? "m/s, mm/s, cm/s, in/s" : "°C, °F, K";
}

}  // namespace

Result<ChosenUnit> chooseUnit(Role role,
                              const RoleChoice& choice,
                              const ColumnFacts& column,
                              const std::optional<std::string>& asked,
                              const UnitHints& hints) {
  const Quantity quantity = quantityOf(role);
  if (column.stamps != StampKind::None) return ChosenUnit{*readUnit("s"), "s"};
  if (asked) {
    const auto unit = readUnit(*asked);
    if (unit && unit->quantity == quantity) return ChosenUnit{*unit, *asked};
    return Error{"option-not-understood",
                 {{"option", std::string(optionOf(role))},
                  {"value", *asked},
                  {"choices", std::string(unitsOf(role))}},
                 {}};
  }
  const std::string& known =
      choice.rig && !choice.rig->unit.empty() ? choice.rig->unit : column.heading.unit;
  if (const auto unit = readUnit(known)) {
    if (unit->quantity == quantity) return ChosenUnit{*unit, known};
    if (unit->quantity == Quantity::Voltage) return ChosenUnit{*unit, known, false, true};
  }
  const Guess guess = plausibleUnit(role, column.values, hints);
  return ChosenUnit{*readUnit(guess.symbol), std::string(guess.symbol), guess.assumed};
}

std::vector<double> toSi(std::span<const double> raw, const Unit& unit, const RoleChoice& choice) {
  const double scale = choice.rig ? choice.rig->scale : 1;
  const double offset = choice.rig ? choice.rig->offset : 0;
  std::vector<double> si(raw.size());
  std::transform(raw.begin(), raw.end(), si.begin(), [&](double value) {
    return unit.toSi(value * scale + offset);
  });
  return si;
}

Remark unitAssumed(const SourceColumn& column,
                   const ChosenUnit& chosen,
                   std::span<const double> si) {
  return Remark{"unit-assumed",
                Severity::Warning,
                {{"column", columnLabel(column.name, static_cast<std::size_t>(column.index))},
                 {"unit", chosen.symbol},
                 {"span", rangeOf(si).span(), chosen.unit.quantity}}};
}

}  // namespace dampwright
