// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/find_roles.h"

#include <algorithm>
#include <cmath>
#include <map>
#include <utility>

#include "core/intake/column_shape.h"
#include "core/intake/column_words.h"
#include "core/intake/letters.h"
#include "core/intake/number_form.h"

namespace dampwright {
namespace {

using Columns = std::span<const ColumnFacts>;
using Indices = std::vector<std::size_t>;

struct RoleRow {
  Role role;
  RoleChoice Roles::*choice;
  std::optional<std::string> ReadOptions::*option;
  std::optional<RigColumn> RigProfile::*rig;
  std::string_view name;
};

constexpr RoleRow roleRows[] = {
    {Role::Time, &Roles::time, &ReadOptions::time, &RigProfile::time, "time"},
    {Role::Displacement,
     &Roles::displacement,
     &ReadOptions::displacement,
     &RigProfile::displacement,
     "displacement"},
    {Role::Force, &Roles::force, &ReadOptions::force, &RigProfile::force, "force"},
    {Role::Velocity, &Roles::velocity, &ReadOptions::velocity, &RigProfile::velocity, "velocity"},
    {Role::Temperature,
     &Roles::temperature,
     &ReadOptions::temperature,
     &RigProfile::temperature,
     "temperature"},
};

// The name, or the number where there is none or another column has it too.
std::string label(Columns columns, std::size_t column) {
  const std::string& name = columns[column].heading.name;
  const auto same = std::ranges::count_if(
      columns, [&](const ColumnFacts& each) { return each.heading.name == name; });
  return columnLabel(same > 1 ? std::string() : name, column + 1);
}

std::string listOf(Columns columns) {
  std::string list;
  for (std::size_t column = 0; column < columns.size(); ++column) {
    list += (list.empty() ? "" : ", ") + label(columns, column);
  }
  return list;
}

std::optional<std::size_t> columnNamed(Columns columns, std::string_view asked) {
  const std::string whole = lowered(withSingleBlanks(asked));
  const std::string bare = lowered(splitNameAndUnit(asked).name);
  for (const std::string& name : {whole, bare}) {
    for (std::size_t column = 0; column < columns.size() && !name.empty(); ++column) {
      if (lowered(columns[column].heading.name) == name) return column;
    }
  }
  return std::nullopt;
}

std::optional<std::size_t> columnNumbered(Columns columns, std::string_view asked) {
  const auto number = parseNumber(trimmed(asked), NumberForm{});
  if (!number || *number < 1 || *number > static_cast<double>(columns.size())) return std::nullopt;
  return static_cast<std::size_t>(*number) - 1;
}

std::optional<std::size_t> columnOf(Columns columns, const RigColumn& rig) {
  if (!rig.name.empty()) return columnNamed(columns, rig.name);
  return rig.number ? columnNumbered(columns, std::to_string(*rig.number)) : std::nullopt;
}

bool isText(const ColumnFacts& column) { return column.values.empty(); }

// What name and unit of a column say. A known unit of another quantity discredits the name.
struct Said {
  std::optional<Role> role;
  std::optional<Quantity> unit;  ///< None where the unit is of none of our quantities
  bool command = false;
};

Said saidBy(const ColumnFacts& column) {
  const NameAndUnit& heading = column.heading;
  Said said{roleOfName(heading.name), std::nullopt, isCommand(heading.name)};
  if (column.stamps != StampKind::None) {
    said.unit = Quantity::Time;
    if (said.role != Role::Other) said.role = Role::Time;
    return said;
  }
  if (heading.unit.empty()) return said;
  const auto unit = readUnit(heading.unit);
  said.unit = unit ? unit->quantity : Quantity::None;
  if (said.role && *said.role != Role::Other && *said.unit != quantityOf(*said.role) &&
      *said.unit != Quantity::Voltage) {
    said.role.reset();
  }
  return said;
}

enum Evidence { None, Command, UnitOnly, NameOnly, NameAndItsUnit };  // in rising order

Evidence evidenceFor(Role role, const Said& said) {
  const bool unitFits = said.unit && *said.unit == quantityOf(role);
  if (said.role ? *said.role != role : !unitFits) return None;
  if (said.command) return Command;
  if (!said.role) return UnitOnly;
  return unitFits ? NameAndItsUnit : NameOnly;
}

class RoleFinder {
 public:
  RoleFinder(Columns columns, const ReadOptions& options, const std::optional<RigProfile>& rig)
      : columns_(columns), options_(options), rig_(rig) {
    for (const ColumnFacts& column : columns) said_.push_back(saidBy(column));
  }

  Result<Roles> find() {
    for (const RoleRow& row : roleRows) {
      if (const auto error = takeOption(row)) return *error;
    }
    for (const RoleRow& row : roleRows) {
      if (const auto error = takeRig(row)) return *error;
    }
    for (const RoleRow& row : roleRows) takeNamed(row);
    takeClockByShape();
    takeVelocityByShape();
    takeRestByShape();
    for (const RoleRow& row : roleRows) {
      const bool needed = row.role == Role::Displacement || row.role == Role::Force;
      if (needed && !(roles_.*row.choice).column) ask(row);
    }
    return std::move(roles_);
  }

 private:
  bool isTaken(std::size_t column) const {
    return std::any_of(std::begin(roleRows), std::end(roleRows), [&](const RoleRow& row) {
      return (roles_.*row.choice).column == column;
    });
  }

  std::optional<Error> takeOption(const RoleRow& row) {
    const auto& asked = options_.*row.option;
    if (!asked) return std::nullopt;
    auto column = columnNamed(columns_, *asked);
    if (!column) column = columnNumbered(columns_, *asked);
    if (!column || isText(columns_[*column])) {
      return Error{"column-not-found",
                   {{"column", *asked},
                    {"option", "--" + std::string(row.name)},
                    {"columns", listOf(columns_)}},
                   {}};
    }
    roles_.*row.choice = {column, "role-by-option", std::nullopt};
    return std::nullopt;
  }

  // Without its force or displacement column the profile is another rig's: its signs would be
  // wrong.
  std::optional<Error> takeRig(const RoleRow& row) {
    RoleChoice& choice = roles_.*row.choice;
    if (choice.column || !rig_ || !((*rig_).*row.rig)) return std::nullopt;
    const RigColumn& known = *((*rig_).*row.rig);
    const auto column = columnOf(columns_, known);
    if (column && !isText(columns_[*column]) && !isTaken(*column)) {
      choice = {column, "role-by-rig", known};
      return std::nullopt;
    }
    const std::string name = known.name.empty() ? std::string(row.name) : known.name;
    if (row.role == Role::Displacement || row.role == Role::Force) {
      return Error{"rig-of-another-file", {{"column", name}, {"columns", listOf(columns_)}}, {}};
    }
    roles_.remarks.push_back(Remark{"rig-column-missing", Severity::Warning, {{"column", name}}});
    return std::nullopt;
  }

  // The columns with the best evidence that name and unit give for a role.
  Indices bestFor(Role role) const {
    Indices best;
    Evidence most = None;
    for (std::size_t column = 0; column < columns_.size(); ++column) {
      if (isText(columns_[column]) || isTaken(column)) continue;
      const Evidence evidence = evidenceFor(role, said_[column]);
      if (evidence == None || evidence < most) continue;
      if (evidence > most) best.clear();
      most = evidence;
      best.push_back(column);
    }
    return best;
  }

  void takeNamed(const RoleRow& row) {
    RoleChoice& choice = roles_.*row.choice;
    if (choice.column) return;
    Indices best = bestFor(row.role);
    const auto drop = [&best, this](bool (*unfit)(std::span<const double>)) {
      std::erase_if(best, [&](std::size_t column) { return unfit(columns_[column].values); });
    };
    if (row.role == Role::Time) {
      drop([](std::span<const double> values) { return medianStep(values) <= 0; });
      if (best.size() > 1) drop([](std::span<const double> values) { return !isClock(values); });
    } else if (best.size() > 1) {
      drop(isConstant);
    }
    if (best.empty()) return;
    const bool mustBeOne = row.role != Role::Time && row.role != Role::Temperature;
    if (best.size() > 1 && mustBeOne && !allAlike(best)) {
      if (row.role != Role::Velocity) candidates_[row.role] = best;
      return;
    }
    choice = {best.front(), "role-by-unit", {}};
    if (said_[best.front()].role) choice.why = "role-by-name";
    if (columns_[best.front()].stamps != StampKind::None) choice.why = "role-by-clock";
  }

  bool allAlike(const Indices& columns) const {
    const auto first = columns_[columns.front()].values;
    return std::all_of(columns.begin(), columns.end(), [&](std::size_t column) {
      return std::ranges::equal(columns_[column].values, first);
    });
  }

  // Columns whose names and units say nothing at all and that move, in enough rows to see how.
  Indices unknown() const {
    Indices found;
    for (std::size_t column = 0; column < columns_.size(); ++column) {
      const Said& said = said_[column];
      if (columns_[column].values.size() >= rowsForShape && !isTaken(column) && !said.role &&
          !said.unit && !said.command && !isConstant(columns_[column].values) &&
          !countsRows(columns_[column].values)) {
        found.push_back(column);
      }
    }
    return found;
  }

  Indices numbersLeft() const {
    Indices found;
    for (std::size_t column = 0; column < columns_.size(); ++column) {
      if (!isText(columns_[column]) && !isTaken(column)) found.push_back(column);
    }
    return found;
  }

  void takeByShape(RoleChoice& choice, std::size_t column) {
    choice = {column, "role-by-shape", std::nullopt};
    const auto row = std::ranges::find_if(
        roleRows, [&](const RoleRow& each) { return &(roles_.*each.choice) == &choice; });
    roles_.remarks.push_back(Remark{"role-assumed",
                                    Severity::Note,
                                    {{"column", label(columns_, column)},
                                     {"role", std::string(row->name)},
                                     {"option", "--" + std::string(row->name)}}});
  }

  void takeClockByShape() {
    if (roles_.time.column) return;
    Indices clocks = unknown();
    std::erase_if(clocks, [this](std::size_t column) { return !isClock(columns_[column].values); });
    if (clocks.size() == 1) takeByShape(roles_.time, clocks.front());
  }

  // In whatever units: the factor from slope to velocity is a power of 1000 (mm and m, ms and s).
  bool isVelocityOf(std::size_t displacement, std::size_t column) const {
    const double step = medianStep(columns_[*roles_.time.column].values);
    const auto factor = slopeFactor(columns_[displacement].values, columns_[column].values);
    if (!factor || !(step > 0)) return false;
    const double thousands = std::log10(*factor * step) / 3;
    return std::abs(thousands - std::round(thousands)) < 0.005;  // within 3.5 %
  }

  void takeVelocityByShape() {
    if (!roles_.time.column || roles_.velocity.column) return;
    const Indices columns = unknown();
    if (columns.size() > mostCompared) return;
    const Indices movers =
        roles_.displacement.column ? Indices{*roles_.displacement.column} : columns;
    for (const std::size_t mover : movers) {
      for (const std::size_t column : columns) {
        if (column == mover || !isVelocityOf(mover, column)) continue;
        if (!roles_.displacement.column) takeByShape(roles_.displacement, mover);
        takeByShape(roles_.velocity, column);
        return;
      }
    }
  }

  void takeRestByShape() {
    const Indices columns = unknown();
    RoleChoice& displacement = roles_.displacement;
    RoleChoice& force = roles_.force;
    const bool askedAlready =
        candidates_.contains(Role::Displacement) || candidates_.contains(Role::Force);
    if (askedAlready) return;
    if (columns.size() == 1 && displacement.column.has_value() != force.column.has_value()) {
      takeByShape(displacement.column ? force : displacement, columns.front());
    } else if (columns.size() == 2 && !displacement.column && !force.column) {
      const double first = roughness(columns_[columns[0]].values);
      const double second = roughness(columns_[columns[1]].values);
      const std::size_t smoother = first < second ? columns[0] : columns[1];
      const bool clear = std::max(first, second) >= clearlyRougher * std::min(first, second);
      if (!clear || !oscillates(columns_[smoother].values)) return;
      takeByShape(displacement, smoother);
      takeByShape(force, first < second ? columns[1] : columns[0]);
    }
  }

  void ask(const RoleRow& row) {
    Indices candidates = candidates_[row.role];
    if (candidates.empty()) candidates = unknown();
    if (candidates.empty()) candidates = numbersLeft();
    OpenPoint point{std::string(row.name), {}, "--" + std::string(row.name)};
    for (const std::size_t column : candidates) point.candidates.push_back(label(columns_, column));
    roles_.open.push_back(std::move(point));
  }

  static constexpr double clearlyRougher = 1.5;
  static constexpr std::size_t rowsForShape = 50;
  static constexpr std::size_t mostCompared = 12;  // each with each takes time
  static constexpr double rowsOfACycle = 10;

  static bool oscillates(std::span<const double> values) {
    return rowsPerCycle(values).value_or(0) >= rowsOfACycle;
  }

  Columns columns_;
  const ReadOptions& options_;
  const std::optional<RigProfile>& rig_;
  std::vector<Said> said_;
  std::map<Role, Indices> candidates_;
  Roles roles_;
};

}  // namespace

Result<Roles> findRoles(std::span<const ColumnFacts> columns,
                        const ReadOptions& options,
                        const std::optional<RigProfile>& rig) {
  return RoleFinder(columns, options, rig).find();
}

}  // namespace dampwright
