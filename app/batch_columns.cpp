// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>
#include <array>

#include "app/batch_verbs.h"
#include "core/records/document_words.h"
#include "core/records/documents.h"
#include "core/words/words.h"

namespace dampwright {
namespace {

std::string_view nameOf(Role role) {
  return std::find_if(words::roles.begin(),
                      words::roles.end(),
                      [&](const Word<Role>& word) { return word.value == role; })
      ->text;
}

std::size_t letters(std::string_view text) {
  return static_cast<std::size_t>(
      std::count_if(text.begin(), text.end(), [](char byte) { return (byte & 0xC0) != 0x80; }));
}

std::string padded(std::string text, std::size_t width) {
  const std::size_t wide = letters(text);
  return text.append(wide < width ? width - wide : 0, ' ');
}

std::string line(std::string_view head, const std::string& text) {
  return padded(std::string(head), 14) + text + "\n";
}

std::string rowsText(const std::vector<std::int64_t>& rows) {
  std::string text;
  for (const std::int64_t row : rows)
    text.append(text.empty() ? "" : ", ").append(std::to_string(row));
  return text;
}

std::string formText(const Source& source) {
  std::string text = line("text", source.encoding + ", lines end in " + source.lineEnd);
  std::string form =
      "\"" + source.delimiter + "\" between columns, \"" + source.decimal + "\" as decimal mark";
  if (!source.thousands.empty()) form += ", \"" + source.thousands + "\" between thousands";
  text += line("numbers", form);
  std::string head = source.headerRows.empty() ? "none" : "line " + rowsText(source.headerRows);
  if (source.unitRow > 0) head += ", units in line " + std::to_string(source.unitRow);
  text += line("header", head);
  return text + line("data",
                     std::to_string(source.rows) + " rows from line " +
                         std::to_string(source.firstDataRow));
}

std::string columnsText(const std::vector<SourceColumn>& columns) {
  std::vector<std::array<std::string, 5>> table{{"column", "name", "unit", "taken for", "why"}};
  for (const SourceColumn& column : columns) {
    std::string role(nameOf(column.role));
    if (column.assumed) role += " (assumed)";
    table.push_back({std::to_string(column.index),
                     column.name,
                     column.unit,
                     role,
                     column.why.empty() ? "" : englishText(column.why, {})});
  }
  std::array<std::size_t, 5> widths{};
  for (const auto& row : table)
    for (std::size_t i = 0; i < row.size(); ++i) widths[i] = std::max(widths[i], letters(row[i]));
  std::string text = "\n";
  for (const auto& row : table) {
    std::string one;
    for (std::size_t i = 0; i < row.size(); ++i) one += padded(row[i], widths[i] + 2);
    text += one.erase(one.find_last_not_of(' ') + 1) + "\n";
  }
  return text;
}

std::string remarksText(const std::vector<Remark>& remarks) {
  std::string text;
  for (const Remark& remark : remarks) {
    text += remark.severity == Severity::Warning ? "warning: " : "note: ";
    text += englishText(remark) + " (" + remark.code + ")\n";
  }
  return remarks.empty() ? text : "\n" + text;
}

std::string openText(const std::vector<OpenPoint>& points) {
  std::string text;
  for (const OpenPoint& point : points) {
    std::string choices;
    for (const std::string& candidate : point.candidates)
      choices.append(choices.empty() ? "" : " | ").append(candidate);
    text += "open: " + point.point + "; answer with " + point.option + " " + choices + "\n";
  }
  return points.empty() ? text : "\n" + text;
}

std::string readableText(const RunReading& reading) {
  const Source& source = reading.source;
  std::string text =
      line("file", source.file.name + ", " + std::to_string(source.file.bytes) + " bytes");
  text += formText(source) + line("signature", source.signature);
  for (const auto& [key, value] : source.metadata) text += line("says", key + ": " + value);
  text += columnsText(source.columns);
  return text + remarksText(reading.remarks) + openText(reading.open);
}

}  // namespace

Result<BatchAnswer> columnsVerb(const BatchRequest& request) {
  const auto reading = readRunFile(request, request.files.front());
  if (!reading) return reading.error();
  const bool json = request.shape == Shape::Json;
  return BatchAnswer{json ? writeColumns(reading.value()) : readableText(reading.value()),
                     exit_status::done};
}

}  // namespace dampwright
