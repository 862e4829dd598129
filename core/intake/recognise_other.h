// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string_view>

#include "core/base/result.h"

namespace dampwright {

/// What a file is, if its first bytes say that it is no text: file-is-picture, file-is-document
/// (PDF), file-is-archive (zip and what hides in one, such as spreadsheets) or file-is-binary, with
/// {kind}. Nothing where it may be text.
std::optional<Error> recogniseOther(std::string_view bytes);

}  // namespace dampwright
