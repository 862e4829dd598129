// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <filesystem>
#include <string>

#include "core/base/result.h"

namespace dampwright {

inline constexpr std::int64_t largestFile = std::int64_t{2} << 30;  ///< bytes

/// The bytes of an ordinary file, read in chunks until it ends, so that one which grows or shrinks
/// meanwhile gives what was there and nothing else. The place of an error names the file without
/// its folder. Errors: file-not-found, file-is-folder, file-is-device (pipes, sockets, devices),
/// file-no-permission, file-too-large (over 2 GB), file-unreadable, out-of-memory.
Result<std::string> loadFile(const std::filesystem::path& path);

}  // namespace dampwright
