// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <string>
#include <utility>
#include <vector>

#include "core/intake/text_lines.h"

namespace dampwright {

using Metadata = std::vector<std::pair<std::string, std::string>>;

/// The lines above a table as keys and values: "key: value", "key = value", "key;value",
/// "key,value", with quotes or behind a comment mark; further values of a line follow after "; ". A
/// line of another form is kept under the key "line N". A key that comes again gets " (2)" and so
/// on.
Metadata readMetadata(std::span<const Line> lines, char delimiter);

/// Hz, from an entry that names a sample rate ("Sample rate: 2 kHz", "Abtastrate;1000") or the time
/// between samples ("dt [ms] = 0.5"); nothing where none does or the number makes no sense.
std::optional<double> sampleRateIn(const Metadata& metadata);

/// Whether a cell is a key with its sign: "Serial:" or "Rate =".
bool looksLikeKey(std::string_view cell);

}  // namespace dampwright
