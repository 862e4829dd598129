// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <string_view>

#include "core/base/result.h"
#include "core/intake/decode_text.h"
#include "core/intake/dialect.h"
#include "core/intake/find_table.h"
#include "core/intake/read_run.h"

namespace dampwright {

/// How the text of a file is laid out, before anything is known of its columns' meaning.
struct Layout {
  DecodedText decoded;
  LineEnd lineEnd;
  Dialect dialect;
  Table table;
  std::string signature;
};

/// What the options, and behind them the rig profile, say of the text's form.
struct TextForm {
  std::optional<std::string> encoding;
  DialectOptions dialect;
  std::optional<std::int64_t> headerRow;
};

/// Errors: option-not-understood.
Result<TextForm> textFormOf(const ReadOptions& options, const std::optional<RigProfile>& rig);

/// Errors: those of decodeText, sampleLines, findDialect and findTable.
Result<Layout> findLayout(std::string_view bytes, const TextForm& form);

/// The dialect judged by every line of the file, where the sample left something open.
Result<Dialect> fullDialect(const Layout& layout, const TextForm& form);

}  // namespace dampwright
