// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/make_trace.h"

#include <algorithm>
#include <cmath>
#include <utility>

#include "core/intake/channels.h"
#include "core/intake/clock.h"
#include "core/intake/column_shape.h"
#include "core/intake/find_roles.h"
#include "core/intake/metadata.h"
#include "core/intake/signs.h"

namespace dampwright {
namespace {

void negate(std::vector<double>& values) {
  for (double& value : values) value = -value;
}

void keepRows(std::vector<double>& values, const std::vector<std::size_t>& kept) {
  if (kept.empty() || values.empty()) return;
  for (std::size_t i = 0; i < kept.size(); ++i) values[i] = values[kept[i]];
  values.resize(kept.size());
}

// core/condition says these again, of the samples that are used.
bool saidByCondition(const Remark& remark) {
  return remark.code == "missing-values" || remark.code == "gap" || remark.code == "uneven-clock";
}

constexpr double halfDay = 12 * 3600.0;

// Times of day without a date fall by a day at midnight.
std::vector<double> pastMidnights(std::vector<double> time, StampKind stamps) {
  if (stamps != StampKind::Clock) return time;
  double shift = 0, last = 0;
  for (double& stamp : time) {
    if (!std::isfinite(stamp)) continue;
    if (stamp + shift < last - halfDay) shift += 2 * halfDay;
    stamp += shift;
    last = stamp;
  }
  return time;
}

// Seconds since 1970, days since 1900 or times of day: counted from the first row, because 1.7e9
// leaves too few digits for the microseconds.
std::vector<double> fromItsStart(std::vector<double> time) {
  constexpr double surelyAbsolute = 3600;
  const auto first =
      std::find_if(time.begin(), time.end(), [](double stamp) { return std::isfinite(stamp); });
  if (first == time.end() || std::abs(*first) < surelyAbsolute) return time;
  const double start = *first;
  for (double& stamp : time) stamp -= start;
  return time;
}

class TraceMaker {
 public:
  TraceMaker(ReadTable table, const ReadOptions& options, const std::optional<RigProfile>& rig)
      : table_(std::move(table)), options_(options), rig_(rig) {
    reading_.remarks = std::move(table_.remarks);
    for (std::size_t column = 0; column < table_.headings.size(); ++column) {
      facts_.push_back(
          {table_.headings[column], table_.columns.values[column], table_.stamps[column]});
      table_.source.columns.push_back(
          {static_cast<int>(column) + 1,
           table_.headings[column].name,
           table_.headings[column].unit,
           Role::Other,
           false,
           facts_.back().values.empty() ? "column-is-text" : "column-not-needed"});
    }
  }

  Result<RunReading> make() {
    auto roles = findRoles(facts_, options_, rig_);
    if (!roles) return roles.error();
    roles_ = std::move(roles).value();
    reading_.open = std::move(roles_.open);
    std::ranges::move(roles_.remarks, std::back_inserter(reading_.remarks));
    findSampleRate();
    if (const auto error = readChannels()) return *error;
    if (reading_.open.empty()) {
      settleSigns();
      trace_.zeroState = options_.zeroState.value_or(rig_ ? rig_->zeroState : ZeroState::Unknown);
      trace_.source = table_.source;
      trace_.remarks = reading_.remarks;
      std::erase_if(trace_.remarks, saidByCondition);
      reading_.trace = std::move(trace_);
    }
    reading_.source = std::move(table_.source);
    return std::move(reading_);
  }

 private:
  // What the file says of itself beats what the profile says of the rig.
  void findSampleRate() {
    rate_ = options_.sampleRate;
    if (!rate_) rate_ = sampleRateIn(table_.source.metadata);
    if (!rate_ && rig_) rate_ = rig_->sampleRate;
  }

  std::optional<Error> readChannels() {
    if (roles_.displacement.column) {
      hints_.rowsPerCycle = rowsPerCycle(facts_[*roles_.displacement.column].values);
    }
    hints_.sampleRate = rate_;
    struct Channel {
      Role role;
      const RoleChoice& choice;
      const std::optional<std::string>& unit;
      std::vector<double> Trace::*values;
    };
    const Channel channels[] = {
        {Role::Displacement, roles_.displacement, options_.displacementUnit, &Trace::displacement},
        {Role::Force, roles_.force, options_.forceUnit, &Trace::force},
        {Role::Temperature, roles_.temperature, options_.temperatureUnit, &Trace::temperature},
        {Role::Time, roles_.time, options_.timeUnit, &Trace::time},
        {Role::Velocity, roles_.velocity, options_.velocityUnit, &Trace::velocity},
    };
    for (const Channel& channel : channels) {
      if (channel.role == Role::Velocity) {
        hints_.time = trace_.time;  // still as stamped: one value for each row
        hints_.displacement = trace_.displacement;
      }
      auto values = readChannel(channel.role, channel.choice, channel.unit);
      if (!values) return values.error();
      trace_.*channel.values = std::move(values).value();
    }
    setClock();
    return std::nullopt;
  }

  Result<std::vector<double>> readChannel(Role role,
                                          const RoleChoice& choice,
                                          const std::optional<std::string>& asked) {
    if (!choice.column) return std::vector<double>{};
    const ColumnFacts& column = facts_[*choice.column];
    const auto chosen = chooseUnit(role, choice, column, asked, hints_);
    if (!chosen) return chosen.error();
    SourceColumn& shown = table_.source.columns[*choice.column];
    shown.role = role;
    shown.why = choice.why;
    shown.unit = chosen.value().symbol;
    shown.assumed = chosen.value().assumed || choice.why == "role-by-shape";
    if (chosen.value().volts) {
      reading_.open.push_back({"unit", {columnLabel(shown.name, *choice.column + 1)}, "--rig"});
      return std::vector<double>{};
    }
    auto values = toSi(column.values, chosen.value().unit, choice);
    if (role == Role::Time && column.stamps != StampKind::None) {
      addClockTimes(shown, column.stamps);
      return pastMidnights(std::move(values), column.stamps);
    }
    if (role == Role::Time && chosen.value().assumed && disagreesWithRate(values)) {
      shown.role = Role::Other;
      shown.why = "column-not-needed";
      reading_.remarks.push_back(Remark{"rate-instead-of-time",
                                        Severity::Warning,
                                        {{"column", columnLabel(shown.name, *choice.column + 1)},
                                         {"rate", *rate_, Quantity::Frequency}}});
      return std::vector<double>{};
    }
    if (chosen.value().assumed && !(role == Role::Time && options_.sampleRate)) {
      reading_.remarks.push_back(unitAssumed(shown, chosen.value(), values));
    }
    return values;
  }

  void addClockTimes(const SourceColumn& shown, StampKind stamps) {
    reading_.remarks.push_back(
        Remark{"clock-times",
               Severity::Note,
               {{"column", columnLabel(shown.name, static_cast<std::size_t>(shown.index))},
                {"form", std::string(stampName(stamps))}}});
  }

  bool disagreesWithRate(std::span<const double> seconds) const {
    const double step = medianStep(seconds);
    return rate_ && !options_.sampleRate && !(std::abs(step * *rate_ - 1) < 0.05);
  }

  void setClock() {
    const auto rows = static_cast<std::size_t>(table_.columns.rows);
    if (!trace_.time.empty() && !options_.sampleRate) {
      Clock clock = makeClock(fromItsStart(std::move(trace_.time)));
      trace_.time = std::move(clock.time);
      for (auto* values :
           {&trace_.displacement, &trace_.force, &trace_.velocity, &trace_.temperature}) {
        keepRows(*values, clock.kept);
      }
      for (Remark& remark : clock.remarks) {
        if (remark.count > 0) remark.firstRow = table_.columns.lineOf(remark.firstRow);
        reading_.remarks.push_back(std::move(remark));
      }
    } else if (rate_) {
      trace_.time = evenClock(rows, *rate_);
    } else {
      reading_.open.push_back({"sample-rate", {}, "--rate"});
    }
  }

  void settleSigns() {
    const DirectionChoice direction =
        chooseDirection(options_.displacementPositive,
                        rig_ ? rig_->displacementPositive : std::nullopt,
                        facts_[*roles_.displacement.column].heading.name,
                        table_.source.metadata);
    trace_.directionSettled = direction.settled;
    if (direction.rising == Direction::Rebound) {
      negate(trace_.displacement);
      negate(trace_.velocity);
    }
    if (!direction.settled) {
      reading_.open.push_back({"direction", {"compression", "rebound"}, "--displacement-positive"});
    }
    const auto claimed = options_.forcePositive ? options_.forcePositive
                         : rig_                 ? rig_->forcePositive
                                                : std::nullopt;
    if (claimed == Direction::Rebound) negate(trace_.force);
    if (absorbedEnergy(trace_.displacement, trace_.force) >= 0) return;
    negate(trace_.force);
    if (claimed) reading_.remarks.push_back(Remark{"force-sign-reversed", Severity::Warning, {}});
  }

  ReadTable table_;
  const ReadOptions& options_;
  const std::optional<RigProfile>& rig_;
  std::vector<ColumnFacts> facts_;
  Roles roles_;
  UnitHints hints_;
  std::optional<double> rate_;
  RunReading reading_;
  Trace trace_;
};

}  // namespace

Result<RunReading> makeTrace(ReadTable table,
                             const ReadOptions& options,
                             const std::optional<RigProfile>& rig) {
  return TraceMaker(std::move(table), options, rig).make();
}

}  // namespace dampwright
