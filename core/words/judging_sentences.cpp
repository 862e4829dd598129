// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/tables.h"

namespace dampwright {
namespace {

constexpr Sentence rows[] = {
    {"no-checks", "The limit sheet asks for nothing.", "Add a check to the limit sheet."},
    {"check-unknown",
     "There is no check called \"{check}\".",
     "Use one of the checks that the handbook lists."},
    {"check-incomplete", "The check lacks {missing}.", "Add it to the limit sheet."},
    {"check-without-limit",
     "The check has no limit.",
     "Give a minimum, a maximum or both, or a target with a tolerance."},
    {"check-with-two-limits",
     "The check has a minimum or maximum and a target or tolerance as well.",
     "Keep one of the two forms."},
    {"check-without-tolerance",
     "The check has a target and no tolerance, so nothing could pass it.",
     "Add a tolerance in percent, in newtons or both."},
    {"check-limits-crossed",
     "The minimum {min} lies above the maximum {max}.",
     "Swap the two, or mend the one that is wrong."},
    {"gas-not-determined",
     "The gas force is not determined by this test.",
     "Add a slow block or a hold to the test, with the force zeroed on an empty cell."},
    {"friction-not-determined",
     "The friction is not determined by this test.",
     "Add a slow block of 5 mm/s or less to the test."},
    {"no-points", "The curve of this direction could not be read.", "See the remarks on the run."},
    {"stroke-not-tested", "No block of the asked stroke was tested.", "Test at that stroke."},
    {"speed-not-tested",
     "{velocity} lies outside the speeds that were tested.",
     "Test this speed too."},
};

}  // namespace

std::span<const Sentence> judgingSentences() { return rows; }

}  // namespace dampwright
