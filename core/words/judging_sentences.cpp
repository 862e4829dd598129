// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/tables.h"

namespace dampwright {
namespace {

constexpr Sentence rows[] = {
    {"no-checks", "The limit sheet asks for nothing.", "Add a check to the limit sheet."},
};

}  // namespace

std::span<const Sentence> judgingSentences() { return rows; }

}  // namespace dampwright
