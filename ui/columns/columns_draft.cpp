// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/columns_draft.h"

#include <algorithm>
#include <charconv>
#include <utility>

namespace dampwright {

namespace {

struct RoleRow {
  Role role;
  std::optional<RigColumn> RigProfile::*column;
  std::optional<std::string> ReadOptions::*answer;
  std::optional<std::string> ReadOptions::*unit;
};

constexpr RoleRow roleRows[] = {
    {Role::Time, &RigProfile::time, &ReadOptions::time, &ReadOptions::timeUnit},
    {Role::Displacement,
     &RigProfile::displacement,
     &ReadOptions::displacement,
     &ReadOptions::displacementUnit},
    {Role::Force, &RigProfile::force, &ReadOptions::force, &ReadOptions::forceUnit},
    {Role::Velocity, &RigProfile::velocity, &ReadOptions::velocity, &ReadOptions::velocityUnit},
    {Role::Temperature,
     &RigProfile::temperature,
     &ReadOptions::temperature,
     &ReadOptions::temperatureUnit},
};

// "3" is the third column, anything else a name.
void nameColumn(RigColumn& column, const std::string& answer) {
  int number = 0;
  const char* const end = answer.data() + answer.size();
  const auto [stop, problem] = std::from_chars(answer.data(), end, number);
  const bool isNumber = problem == std::errc{} && stop == end && number > 0;
  column.name = isNumber ? std::string() : answer;
  column.number = isNumber ? std::optional(number) : std::nullopt;
}

const SourceColumn* columnOfRole(const Source& source, Role role) {
  const auto found = std::ranges::find(source.columns, role, &SourceColumn::role);
  return found == source.columns.end() ? nullptr : &*found;
}

bool same(const RigColumn& one, const RigColumn& other) {
  return one.name == other.name && one.number == other.number;
}

// The role's entry, made of the column that the reading has for it.
RigColumn& entryOf(ColumnsDraft& draft, const Source& source, Role role) {
  std::optional<RigColumn>& entry = *columnFor(draft.rig, role);
  for (const RoleRow& row : roleRows) {
    if (row.role == role) (draft.text.*row.unit).reset();
  }
  if (!entry) {
    const SourceColumn* column = columnOfRole(source, role);
    entry = column != nullptr ? rigColumn(source, column->index) : RigColumn{};
  }
  return *entry;
}

std::string answerOf(const RigColumn& column) {
  if (!column.name.empty()) return column.name;
  return column.number ? std::to_string(*column.number) : std::string();
}

// The profile without what the answers of a single run can say too.
RigProfile rigAlone(RigProfile rig) {
  for (const RoleRow& row : roleRows) {
    std::optional<RigColumn>& column = rig.*row.column;
    if (!column) continue;
    const bool calibrated = column->scale != 1 || column->offset != 0;
    column = calibrated ? std::optional(RigColumn{{}, {}, {}, column->scale, column->offset})
                        : std::nullopt;
  }
  rig.displacementPositive.reset();
  rig.forcePositive.reset();
  rig.zeroState = ZeroState::Unknown;
  return rig;
}

}  // namespace

ColumnsDraft draftOf(const std::optional<RigProfile>& rig, const ReadOptions& answers) {
  ColumnsDraft draft{rig.value_or(RigProfile{}), rig.value_or(RigProfile{}), {}};
  for (const RoleRow& row : roleRows) {
    std::optional<RigColumn>& column = draft.rig.*row.column;
    if (answers.*row.answer && !column) column = RigColumn{};
    if (answers.*row.answer) nameColumn(*column, *(answers.*row.answer));
    if (!(answers.*row.unit)) continue;
    if (column) {
      column->unit = *(answers.*row.unit);
    } else {
      draft.text.*row.unit = answers.*row.unit;  // of a column that nobody has named
    }
  }
  if (answers.displacementPositive) draft.rig.displacementPositive = answers.displacementPositive;
  if (answers.forcePositive) draft.rig.forcePositive = answers.forcePositive;
  if (answers.zeroState) draft.rig.zeroState = *answers.zeroState;
  draft.text.encoding = answers.encoding;
  draft.text.delimiter = answers.delimiter;
  draft.text.decimal = answers.decimal;
  draft.text.headerRow = answers.headerRow;
  draft.text.sampleRate = answers.sampleRate;
  return draft;
}

std::optional<RigColumn>* columnFor(RigProfile& rig, Role role) {
  const auto row = std::ranges::find(roleRows, role, &RoleRow::role);
  return row == std::end(roleRows) ? nullptr : &(rig.*row->column);
}

const std::optional<RigColumn>* columnFor(const RigProfile& rig, Role role) {
  const auto row = std::ranges::find(roleRows, role, &RoleRow::role);
  return row == std::end(roleRows) ? nullptr : &(rig.*row->column);
}

RigColumn rigColumn(const Source& source, int index) {
  RigColumn column;
  const auto found = std::ranges::find(source.columns, index, &SourceColumn::index);
  const std::string name = found == source.columns.end() ? std::string() : found->name;
  const auto alike = std::ranges::count(source.columns, name, &SourceColumn::name);
  if (name.empty() || alike > 1) {
    column.number = index;
  } else {
    column.name = name;
  }
  return column;
}

ColumnsDraft withRole(ColumnsDraft draft, const Source& source, Role role, int index) {
  const RigColumn chosen = rigColumn(source, index);
  for (const RoleRow& row : roleRows) {
    std::optional<RigColumn>& other = draft.rig.*row.column;
    if (row.role != role && other && same(*other, chosen)) other.reset();
  }
  std::optional<RigColumn>& entry = *columnFor(draft.rig, role);
  if (entry && same(*entry, chosen)) return draft;
  const std::string unit = entry ? entry->unit : std::string();
  entry = chosen;
  const auto column = std::ranges::find(source.columns, index, &SourceColumn::index);
  const bool saysItsUnit = column != source.columns.end() && !column->unit.empty();
  if (!saysItsUnit) entry->unit = unit;
  return draft;
}

ColumnsDraft withUnit(ColumnsDraft draft,
                      const Source& source,
                      Role role,
                      const std::string& unit) {
  entryOf(draft, source, role).unit = unit;
  return draft;
}

ColumnsDraft withCalibration(
    ColumnsDraft draft, const Source& source, Role role, double scale, double offset) {
  RigColumn& entry = entryOf(draft, source, role);
  entry.scale = scale;
  entry.offset = offset;
  return draft;
}

Remembered remembered(const ColumnsDraft& draft,
                      const Source& source,
                      const std::string& name,
                      const std::string& signature) {
  Remembered kept{draft.rig, {}};
  kept.rig.name = name;
  kept.rig.signature = signature;
  for (const RoleRow& row : roleRows) {
    const SourceColumn* column = columnOfRole(source, row.role);
    std::optional<RigColumn>& entry = kept.rig.*row.column;
    if (column == nullptr) continue;
    const RigColumn before = entry.value_or(RigColumn{});
    entry = rigColumn(source, column->index);
    entry->unit = column->unit;
    entry->scale = before.scale;
    entry->offset = before.offset;
  }
  if (draft.text.encoding) kept.rig.encoding = draft.text.encoding;
  if (draft.text.delimiter) kept.rig.delimiter = draft.text.delimiter;
  if (draft.text.decimal) kept.rig.decimal = draft.text.decimal;
  if (draft.text.sampleRate) kept.rig.sampleRate = draft.text.sampleRate;
  // A profile is looked up after the file was cut into columns: without a signature it comes too
  // late for how to cut it, and stamps in a file beat the rate of its rig.
  kept.answers = signature.empty() ? draft.text : ReadOptions{};
  kept.answers.headerRow = draft.text.headerRow;
  if (columnOfRole(source, Role::Time) != nullptr) {
    kept.answers.sampleRate = draft.text.sampleRate;
  }
  return kept;
}

ReadOptions answersOf(const ColumnsDraft& draft) {
  ReadOptions answers = draft.text;
  for (const RoleRow& row : roleRows) {
    const std::optional<RigColumn>& now = draft.rig.*row.column;
    const std::optional<RigColumn>& before = draft.base.*row.column;
    if (!now || now == before) continue;
    const bool moved = !before || !same(*now, *before);
    if (moved && !answerOf(*now).empty()) answers.*row.answer = answerOf(*now);
    if (!now->unit.empty() && (!before || now->unit != before->unit)) {
      answers.*row.unit = now->unit;
    }
  }
  if (draft.rig.displacementPositive != draft.base.displacementPositive) {
    answers.displacementPositive = draft.rig.displacementPositive;
  }
  if (draft.rig.forcePositive != draft.base.forcePositive) {
    answers.forcePositive = draft.rig.forcePositive;
  }
  if (draft.rig.zeroState != draft.base.zeroState) answers.zeroState = draft.rig.zeroState;
  return answers;
}

bool needsProfile(const ColumnsDraft& draft) { return rigAlone(draft.rig) != rigAlone(draft.base); }

}  // namespace dampwright
