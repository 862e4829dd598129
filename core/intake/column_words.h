// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <optional>
#include <string_view>

#include "core/base/direction.h"
#include "core/trace/trace.h"

namespace dampwright {

/// What a column's name says that it holds, by the trade words of nine languages in
/// column_word_table.cpp; letter case, accents and full-width forms do not count. Of several words
/// in one name the last one counts ("stroke speed", "Hubgeschwindigkeit"), of those before a
/// linking word ("force de compression", "speed of the piston"). Role::Other where a word says that
/// it is none of ours (pressure, sample number); nothing where the name holds no word of the table.
std::optional<Role> roleOfName(std::string_view name);

/// The name says that it is what was asked of the rig, not what was measured.
bool isCommand(std::string_view name);

/// Which way the damper moves where this column of displacement rises, if the name says so
/// ("bump travel", "Ausfederweg"); nothing where it names no stroke or both.
std::optional<Direction> directionOfName(std::string_view name);

/// The same from a line of the preamble about signs ("displacement: compression positive",
/// "Vorzeichen: Druck positiv"). Lines about force say nothing of displacement.
std::optional<Direction> directionOfLine(std::string_view line);

/// How many of the table's words stand in a text: tells which encoding makes sense of its bytes.
std::size_t tradeWordsIn(std::string_view text);

}  // namespace dampwright
