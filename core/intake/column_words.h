// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string_view>

#include "core/base/direction.h"
#include "core/trace/trace.h"

namespace dampwright {

/// What a column's name says that it holds, by the table of trade words in column_words.cpp: a new
/// language is a few more rows there. Of several words in one name the last one counts ("stroke
/// speed", "Hubgeschwindigkeit"). Role::Other where a word says that it is none of ours (pressure,
/// sample number, setpoint); nothing where the name holds no word of the table.
std::optional<Role> roleOfName(std::string_view name);

/// The name says that it is what was asked of the rig, not what was measured.
bool isCommand(std::string_view name);

/// Which way the damper moves where this column of displacement rises, if the name says so
/// ("bump travel", "Ausfederweg"); nothing where it names no stroke or both.
std::optional<Direction> directionOfName(std::string_view name);

/// The same from a line of the preamble about signs ("displacement: compression positive",
/// "Vorzeichen: Druck positiv"). Lines about force say nothing of displacement.
std::optional<Direction> directionOfLine(std::string_view line);

}  // namespace dampwright
