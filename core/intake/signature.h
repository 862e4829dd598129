// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <span>
#include <string>
#include <string_view>

namespace dampwright {

/// One column of a file as its signature sees it: the name and the unit as they stand in the file,
/// the unit without its brackets and already taken off the name ("Load (N)": "Load" and "N").
struct SignatureColumn {
  std::string_view name;
  std::string_view unit;
};

/// By what the layout of a rig's files is known again: a line that a person can read and type.
/// Each column is its name, trimmed, inner blanks made one, A to Z in lower case, and where it has
/// a unit a blank and the unit in square brackets as written; columns are joined by "|": `time
/// [s]|travel [mm]|load [N]`. Letters outside A to Z stay as they are.
std::string signatureOf(std::span<const SignatureColumn> columns);

/// Of a file without names: `unnamed|4 columns|,`. `delimiter` as in Source: "," ";" "|" "tab"
/// "blanks".
std::string signatureOfUnnamed(std::size_t columns, std::string_view delimiter);

}  // namespace dampwright
