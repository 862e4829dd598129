// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>

#include "core/base/result.h"

namespace dampwright {

/// The bytes of a file, or of standard input where the path is "-" (up to 2 GB). Errors as
/// core/intake/load_file.h; the place names the path as it was given.
Result<std::string> loadInput(const std::string& path);

/// Writes the text whole or not at all: to a file beside `path` that then takes its place, or into
/// `path` where that is a device or a pipe; to standard output where `path` is empty.
/// Errors: output-not-written {reason}.
Result<Done> writeOutput(const std::string& path, const std::string& text);

}  // namespace dampwright
