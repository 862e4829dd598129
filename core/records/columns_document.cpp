// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/describe.h"
#include "core/records/document_words.h"
#include "core/records/documents.h"
#include "core/words/words.h"

namespace dampwright {
namespace {

constexpr DocumentKind columnsDocument{"columns", 1};

void describe(Fields& io, NamedValue& value) {
  auto* number = std::get_if<double>(&value.value);
  auto* text = std::get_if<std::string>(&value.value);
  std::optional<double> asNumber = number ? std::optional(*number) : std::nullopt;
  std::optional<std::string> asText = text ? std::optional(*text) : std::nullopt;
  io.text("name", value.name);
  io.number("number", asNumber);
  io.word("unit", value.quantity, words::quantities);
  io.text("text", asText);
  if (asText)
    value.value = *asText;
  else
    value.value = asNumber.value_or(std::numeric_limits<double>::quiet_NaN());
}

void describe(Fields& io, OpenPoint& point) {
  io.text("point", point.point);
  io.texts("candidates", point.candidates);
  io.text("option", point.option);
}

// A line of a file; null where it is unknown.
void describeLine(Fields& io, std::string_view key, std::int64_t& line) {
  std::optional<std::int64_t> known = line > 0 ? std::optional(line) : std::nullopt;
  io.count(key, known);
  line = known.value_or(0);
}

void describe(Fields& io, RunReading& reading) {
  io.require(Keys::Required);
  describe(io, reading.source);
  describeRemarks(io, reading.remarks);
  io.list("open", reading.open, [](Fields& one, OpenPoint& point) { describe(one, point); });
}

}  // namespace

void describeValues(Fields& io, std::string_view key, Values& values) {
  io.list(key, values, [](Fields& one, NamedValue& value) { describe(one, value); });
}

void describe(Fields& io, Remark& remark) {
  io.text("code", remark.code);
  io.word("severity", remark.severity, words::severities);
  io.derived("text", englishText(remark));
  io.count("count", remark.count);
  io.count("first_row", remark.firstRow);
  describeValues(io, "values", remark.values);
}

void describeRemarks(Fields& io, std::vector<Remark>& remarks) {
  io.list("remarks", remarks, [](Fields& one, Remark& remark) { describe(one, remark); });
}

void describe(Fields& io, SourceColumn& column) {
  io.count("index", column.index);
  io.text("name", column.name);
  io.text("unit", column.unit);
  io.word("role", column.role, words::roles);
  io.flag("assumed", column.assumed);
  io.text("why", column.why);
  io.derived("why_text", englishText(column.why, {}));
}

void describe(Fields& io, Source& source) {
  io.text("file", source.file.name);
  io.text("sha256", source.file.sha256);
  io.count("bytes", source.file.bytes);
  io.text("encoding", source.encoding);
  io.text("line_end", source.lineEnd);
  io.text("delimiter", source.delimiter);
  io.text("decimal", source.decimal);
  io.text("thousands", source.thousands);
  io.counts("header_rows", source.headerRows);
  describeLine(io, "unit_row", source.unitRow);
  describeLine(io, "first_data_row", source.firstDataRow);
  io.count("rows", source.rows);
  io.text("signature", source.signature);
  io.textByName("metadata", source.metadata);
  io.list("columns", source.columns, [](Fields& one, SourceColumn& c) { describe(one, c); });
}

Result<RunReading> readColumns(std::string_view bytes, std::string_view file) {
  RunReading reading;
  const auto read =
      readDocument(bytes, file, columnsDocument, [&](Fields& io) { describe(io, reading); });
  if (!read) return read.error();
  return reading;
}

std::string writeColumns(const RunReading& reading) {
  RunReading copy{reading.source, reading.remarks, reading.open, std::nullopt};
  return writeDocument(columnsDocument, [&](Fields& io) { describe(io, copy); });
}

}  // namespace dampwright
