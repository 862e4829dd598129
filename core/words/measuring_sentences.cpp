// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/tables.h"

namespace dampwright {
namespace {

constexpr Sentence rows[] = {
    {"direction-assumed",
     "Which sign of displacement is compression was assumed.",
     "Confirm the direction once; it is kept in the rig profile."},
    {"no-full-cycle",
     "The recording holds no full cycle of the damper.",
     "Record at least one whole stroke out and back, better six, and drop that file."},
};

}  // namespace

std::span<const Sentence> measuringSentences() { return rows; }

}  // namespace dampwright
