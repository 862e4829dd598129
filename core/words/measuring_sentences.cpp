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
    {"direction-from-gas",
     "The gas force of {force} settles which sign of the recording is compression.",
     ""},
    {"gas-force-negative",
     "The gas force is {force}: it pulls the rod in, which no damper does.",
     "Check which way is compression in the rig profile, and the zero of the load cell."},
    {"block-absorbs-no-energy",
     "In the block at {start} the damper gives energy instead of taking it.",
     "Check the sign of the force and the delay between the channels."},
    {"few-speeds",
     "The damper was tested at {speeds} speeds only, so its curve between them is uncertain.",
     "Test at five speeds or more."},
    {"mixed-strokes",
     "Blocks of different stroke were tested; their forces stand beside each other and are not "
     "joined to one curve.",
     "Test all speeds at one stroke."},
    {"scatter-not-known",
     "Each block has one cycle only, so nothing is known of the scatter from cycle to cycle.",
     "Record five cycles or more at each speed."},
    {"no-slow-block-or-hold",
     "Gas and friction are not determined: the test has no slow block and no hold.",
     "Add a sine block of 5 mm/s peak speed, or a standstill at mid-stroke."},
    {"no-slow-block",
     "Friction is not determined: the test has no slow block.",
     "Add a sine block of 5 mm/s peak speed."},
    {"slow-triangle-only",
     "Dry friction is not determined: the slow block runs at one speed only.",
     "Use a sine for the slow block."},
    {"slow-block-not-fitted",
     "Gas and friction are not determined: the slow block does not fit gas and friction.",
     "Look at the slow block's loop, and record two slow cycles without a pause."},
    {"zeroed-with-damper",
     "The gas force is hidden, because the force was zeroed with the damper fitted.",
     "Zero the load cell with no damper in the rig."},
    {"converged", "The fit found its minimum.", ""},
    {"at-bound", "The fit ended at the edge of what makes sense.", "Test more speeds."},
    {"rank-deficient", "The points do not tell the parameters apart.", "Test more speeds."},
    {"not-converged", "The fit found no minimum.", ""},
    {"not-finite", "The fit had no numbers to start from.", ""},
    {"too-few-points", "There are too few speeds for this law.", "Test more speeds."},
    {"law-lowest-aicc", "Chosen for the best balance of closeness and simplicity (AICc).", ""},
    {"law-simplest-within-errors",
     "Chosen as the simplest law within two standard errors of every point.",
     ""},
    {"law-closest", "Chosen as the closest, since no law meets every point.", ""},
};

}  // namespace

std::span<const Sentence> measuringSentences() { return rows; }

}  // namespace dampwright
