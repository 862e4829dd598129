// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/tables.h"

namespace dampwright {
namespace {

constexpr Sentence rows[] = {
    {"stopped", "The work was stopped.", ""},
    {"file-empty", "{file} is empty.", "Record the run again, or pick the file that holds it."},
};

}  // namespace

std::span<const Sentence> readingSentences() { return rows; }

}  // namespace dampwright
