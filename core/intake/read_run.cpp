// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/read_run.h"

#include <algorithm>
#include <utility>

#include "core/base/sha256.h"
#include "core/intake/layout.h"
#include "core/intake/make_trace.h"
#include "core/intake/read_columns.h"
#include "core/intake/split_row.h"

namespace dampwright {
namespace {

constexpr std::int64_t fewestRows = 2;

bool settlesForm(const RigProfile& rig) {
  return rig.encoding || rig.delimiter || rig.decimal || rig.thousands;
}

// The decimal mark of a file that mixes both is shown as a comma: that is what a reader must know.
Source sourceOf(const Layout& layout) {
  Source source;
  source.encoding = layout.decoded.encoding;
  source.lineEnd = layout.lineEnd.name;
  source.delimiter = delimiterName(layout.dialect.delimiter);
  char decimal = layout.dialect.decimal;
  for (std::size_t column = 0; column < layout.dialect.columns; ++column) {
    if (layout.dialect.numeric[column] == 0) continue;
    const NumberForm form = layout.dialect.forms[column];
    if (form.decimal == ',' && form.thousands != '.') decimal = ',';
    if (form.thousands != 0 && source.thousands.empty()) {
      source.thousands = std::string(1, form.thousands);
    }
  }
  source.decimal = std::string(1, decimal);
  source.headerRows = layout.table.headerRows;
  source.unitRow = layout.table.unitRow;
  source.firstDataRow = layout.table.firstDataRow;
  source.signature = layout.signature;
  source.metadata = layout.table.metadata;
  return source;
}

std::vector<Remark> remarksOf(const Layout& layout) {
  std::vector<Remark> remarks;
  if (layout.decoded.zeroBytesAtEnd > 0) {
    remarks.push_back(
        Remark{"zero-bytes-at-end", Severity::Warning, {}, layout.decoded.zeroBytesAtEnd, 0});
  }
  if (layout.decoded.zeroBytesInside > 0) {
    remarks.push_back(
        Remark{"zero-bytes-inside", Severity::Warning, {}, layout.decoded.zeroBytesInside, 0});
  }
  for (const std::size_t column : layout.dialect.settledByOthers) {
    if (column >= layout.table.columns.size()) continue;
    const std::string name = columnLabel(layout.table.columns[column].name, column + 1);
    remarks.push_back(Remark{"thousands-marks", Severity::Warning, {{"column", name}}});
  }
  return remarks;
}

std::vector<StampKind> stampsOf(const Layout& layout) {
  std::vector<StampKind> stamps(layout.table.columns.size(), StampKind::None);
  for (std::size_t column = 0; column < std::min(stamps.size(), layout.dialect.columns); ++column) {
    stamps[column] = layout.dialect.stamps[column].kind;
  }
  return stamps;
}

RunReading stoppedAtDecimal(const Layout& layout) {
  RunReading reading;
  reading.source = sourceOf(layout);
  int index = 0;
  for (const NameAndUnit& column : layout.table.columns) {
    reading.source.columns.push_back(
        {++index, column.name, column.unit, Role::Other, false, "column-not-read"});
  }
  reading.remarks = remarksOf(layout);
  reading.open.push_back({"decimal", {".", ","}, "--decimal"});
  return reading;
}

// What all lines of the file say of how numbers are written, where it is not what the sample said.
std::optional<Dialect> otherDialect(const Layout& layout, const TextForm& form) {
  auto full = fullDialect(layout, form);
  if (!full || full.value().columns != layout.dialect.columns) return std::nullopt;
  const bool same =
      full.value().forms == layout.dialect.forms && full.value().open == layout.dialect.open;
  return same ? std::nullopt : std::optional(std::move(full).value());
}

Result<Columns> readRows(const Layout& layout, const Progress& progress) {
  return readColumns(
      layout.decoded.text(), layout.lineEnd.letter, layout.dialect, layout.table, progress);
}

Result<RunReading> readLaidOut(Layout layout,
                               const TextForm& form,
                               const ReadOptions& options,
                               const std::optional<RigProfile>& rig,
                               const Progress& progress) {
  if (!layout.dialect.open.empty()) {
    if (auto other = otherDialect(layout, form)) layout.dialect = std::move(*other);
  }
  if (!layout.dialect.open.empty()) return stoppedAtDecimal(layout);
  auto columns = readRows(layout, progress);
  // The sample may have missed the lines that tell.
  auto other =
      columns && columns.value().unreadable > 0 ? otherDialect(layout, form) : std::nullopt;
  if (other) {
    layout.dialect = std::move(*other);
    if (!layout.dialect.open.empty()) return stoppedAtDecimal(layout);
    columns = readRows(layout, progress);
  }
  if (!columns) return columns.error();
  if (columns.value().rows < fewestRows) {
    return Error{"too-few-rows",
                 {{"rows", static_cast<double>(columns.value().rows), Quantity::Count}},
                 {"", layout.table.firstDataRow, 0}};
  }
  ReadTable table{sourceOf(layout),
                  layout.table.columns,
                  stampsOf(layout),
                  std::move(columns).value(),
                  remarksOf(layout)};
  for (const SectionMark& section : table.columns.sections) {
    table.source.metadata.emplace_back("line " + std::to_string(section.line), section.text);
  }
  table.source.rows = table.columns.rows;
  std::ranges::copy(table.columns.remarks, std::back_inserter(table.remarks));
  table.columns.values.resize(std::max(table.columns.values.size(), table.headings.size()));
  return makeTrace(std::move(table), options, rig);
}

Result<RunReading> readBytes(std::string_view bytes,
                             const ReadOptions& options,
                             const FindProfile& findProfile,
                             const Progress& progress) {
  auto form = textFormOf(options, std::nullopt);
  if (!form) return form.error();
  auto layout = findLayout(bytes, form.value());
  if (!layout) return layout.error();
  const auto rig = findProfile ? findProfile(layout.value().signature) : std::nullopt;
  if (rig && settlesForm(*rig)) {
    form = textFormOf(options, rig);
    if (!form) return form.error();
    const std::string signature = layout.value().signature;
    layout = findLayout(bytes, form.value());
    if (!layout) return layout.error();
    layout.value().signature = signature;  // the one by which the profile is found again
  }
  return readLaidOut(std::move(layout).value(), form.value(), options, rig, progress);
}

}  // namespace

Result<RunReading> readRun(std::string_view bytes,
                           std::string_view name,
                           const ReadOptions& options,
                           const FindProfile& findProfile,
                           const Progress& progress) {
  auto reading = readBytes(bytes, options, findProfile, progress);
  if (!reading) {
    Error error = reading.error();
    error.place.file = name;
    return error;
  }
  const FileIdentity identity{std::string(name), sha256Hex(bytes), bytes.size()};
  reading.value().source.file = identity;
  if (reading.value().trace) reading.value().trace->source.file = identity;
  return reading;
}

}  // namespace dampwright
