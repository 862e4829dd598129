// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/layout.h"

#include <algorithm>
#include <array>
#include <utility>
#include <vector>

#include "core/intake/signature.h"
#include "core/intake/split_row.h"
#include "core/intake/text_lines.h"

namespace dampwright {
namespace {

struct Spelled {
  std::string_view name;
  char letter;
};

constexpr std::array delimiterNames{Spelled{",", ','},
                                    Spelled{";", ';'},
                                    Spelled{"|", '|'},
                                    Spelled{"tab", '\t'},
                                    Spelled{"\t", '\t'},
                                    Spelled{"blanks", blanksDelimiter}};
constexpr std::array decimalNames{Spelled{".", '.'}, Spelled{",", ','}};
constexpr std::array thousandsNames{
    Spelled{",", ','}, Spelled{".", '.'}, Spelled{" ", ' '}, Spelled{"'", '\''}};

template <std::size_t N>
std::optional<char> letterOf(const std::array<Spelled, N>& names, std::string_view name) {
  for (const Spelled& row : names) {
    if (row.name == name) return row.letter;
  }
  return std::nullopt;
}

Error notUnderstood(std::string option, const std::string& value, std::string choices) {
  return Error{"option-not-understood",
               {{"option", std::move(option)}, {"value", value}, {"choices", std::move(choices)}},
               {}};
}

std::optional<std::string> firstOf(const std::optional<std::string>& asked,
                                   const std::optional<std::string>& known) {
  return asked ? asked : known;
}

std::string signatureOfTable(const Table& table, const Dialect& dialect) {
  if (!table.named()) {
    return signatureOfUnnamed(table.columns.size(), delimiterName(dialect.delimiter));
  }
  std::vector<SignatureColumn> columns;
  columns.reserve(table.columns.size());
  for (const NameAndUnit& column : table.columns) columns.push_back({column.name, column.unit});
  return signatureOf(columns);
}

}  // namespace

Result<TextForm> textFormOf(const ReadOptions& options, const std::optional<RigProfile>& rig) {
  const RigProfile known = rig.value_or(RigProfile{});
  TextForm form{firstOf(options.encoding, known.encoding), {}, options.headerRow};
  if (const auto name = firstOf(options.delimiter, known.delimiter)) {
    form.dialect.delimiter = letterOf(delimiterNames, *name);
    if (!form.dialect.delimiter) {
      return notUnderstood("--delimiter", *name, ", (comma), ; (semicolon), |, tab, blanks");
    }
  }
  if (const auto name = firstOf(options.decimal, known.decimal)) {
    form.dialect.decimal = letterOf(decimalNames, *name);
    if (!form.dialect.decimal) {
      return notUnderstood("--decimal", *name, ". (point) or , (comma)");
    }
  }
  if (known.thousands && !known.thousands->empty()) {
    form.dialect.thousands = letterOf(thousandsNames, *known.thousands);
    if (!form.dialect.thousands) {
      return notUnderstood("thousands", *known.thousands, ", (comma), . (point), blank, '");
    }
  }
  return form;
}

Result<Layout> findLayout(std::string_view bytes, const TextForm& form) {
  auto decoded = decodeText(bytes, form.encoding);
  if (!decoded) return decoded.error();
  Layout layout{std::move(decoded).value(), {}, {}, {}, {}};
  layout.lineEnd = findLineEnd(layout.decoded.text());
  if (auto even = withOneLineEnd(layout.decoded.text())) {
    layout.decoded.converted = std::move(even);
    layout.lineEnd.name = "mixed";
  }
  const std::string_view text = layout.decoded.text();
  const auto sample = sampleLines(text, layout.lineEnd.letter);
  if (!sample) return sample.error();
  auto dialect = findDialect(sample.value(), form.dialect);
  if (!dialect) return dialect.error();
  layout.dialect = std::move(dialect).value();
  auto table = findTable(text, sample.value(), layout.dialect, form.headerRow);
  if (!table) return table.error();
  layout.table = std::move(table).value();
  layout.signature = signatureOfTable(layout.table, layout.dialect);
  return layout;
}

Result<Dialect> fullDialect(const Layout& layout, const TextForm& form) {
  const auto lines = everyLine(layout.decoded.text(), layout.lineEnd.letter);
  if (!lines) return lines.error();
  DialectOptions options = form.dialect;
  options.delimiter = layout.dialect.delimiter;
  return findDialect(lines.value(), options);
}

}  // namespace dampwright
