// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>

#include "core/base/result.h"

namespace dampwright {

/// A file's bytes as UTF-8. `text()` looks into the bytes given, or into the converted copy.
struct DecodedText {
  std::string encoding;  ///< utf-8 | utf-16le | utf-16be | windows-1252 | shift-jis | gb18030
  std::string_view raw;  ///< byte order mark and trailing zero bytes taken off
  std::optional<std::string> converted;  ///< present where the file was not UTF-8
  std::int64_t zeroBytesAtEnd = 0;       ///< cut off: what a logger leaves that lost its power
  std::int64_t zeroBytesInside = 0;      ///< among the text, made blanks

  std::string_view text() const { return converted ? std::string_view(*converted) : raw; }
};

/// Finds the encoding, and makes sure that the text is valid UTF-8 (what is no letter becomes
/// U+FFFD): `asked` if given, byte order mark, UTF-16 by its zero bytes, UTF-8 if valid, Shift-JIS
/// or GB18030 where the bytes are clean and its trade words or usual letters stand there, else
/// Windows-1252. Only the first 4096 bytes decide that a file is no text, so that 2 GB of zeros are
/// refused at once. Errors: file-empty, file-is-picture, file-is-document, file-is-archive,
/// file-is-binary, option-not-understood.
Result<DecodedText> decodeText(std::string_view bytes, const std::optional<std::string>& asked);

}  // namespace dampwright
