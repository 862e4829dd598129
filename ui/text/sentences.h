// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <string>

#include "core/base/remark.h"
#include "core/base/result.h"

namespace dampwright {

/// What a code says, translated, with its values in units that people read. Empty for an empty
/// code; the code itself where core/words does not know it.
QString sentenceText(const std::string& code, const Values& values);
/// What to do about it; empty where there is nothing to do.
QString hintText(const std::string& code, const Values& values);

/// The same of a remark: its count and first row stand where the sentence asks for them.
QString sentenceText(const Remark& remark);
QString hintText(const Remark& remark);

/// What, where and what to do: "run7.csv, row 12, column 3: what is so. What to do."
QString sentenceText(const Error& error);

}  // namespace dampwright
