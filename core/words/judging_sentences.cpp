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
    {"inside-limits",
     "The figure lies {margin} inside the limits; as the limit sheet asks, its uncertainty is not "
     "counted.",
     ""},
    {"outside-limits",
     "The figure lies {beyond} outside the limit of {limit}; as the limit sheet asks, its "
     "uncertainty is not counted.",
     ""},
    {"inside-limits-surely",
     "The figure lies inside the limits by its uncertainty of {uncertainty} and {spare} more.",
     ""},
    {"outside-limits-surely",
     "The figure lies {beyond} outside the limit of {limit}: {excess} more than its uncertainty of "
     "{uncertainty} explains.",
     ""},
    {"limits-narrower-than-uncertainty",
     "The limits are narrower than the uncertainty: they lie {width} apart, {missing} less than "
     "twice the uncertainty of {uncertainty}, so nothing could pass.",
     "Measure more cycles, or use a rig with a smaller uncertainty."},
    {"close-inside-limit",
     "The figure lies {margin} inside the limit of {limit}, and its uncertainty reaches {overlap} "
     "past that limit.",
     "Measure more cycles, or use a rig with a smaller uncertainty."},
    {"close-outside-limit",
     "The figure lies {beyond} outside the limit of {limit}, and its uncertainty reaches {overlap} "
     "back inside.",
     "Measure more cycles, or use a rig with a smaller uncertainty."},
    {"direction-not-confirmed",
     "Which sign of the recording is compression is assumed, not known.",
     "Confirm the direction of the rig."},
    {"figure-hidden",
     "Clipped or missing samples hide this figure.",
     "Repeat the test with a load cell of larger range, or mend the recording."},
    {"largest-with-gas-removed",
     "The largest force of a stroke is only defined as measured, and these limits are for force "
     "with the gas removed.",
     "Ask for the force at peak velocity, or use limits for force as measured."},
    {"no-points",
     "No force could be read in this direction at any speed.",
     "See the remarks on the run, or test this damper at some speeds."},
    {"stroke-not-tested",
     "No block was run at the stroke of {stroke} that the limits ask for.",
     "Test at this stroke; forces of another stroke are not compared."},
    {"setting-differs",
     "The limits are for the setting \"{asked}\", and the run file says \"{found}\".",
     "Test at this setting, or choose the limits of the other."},
    {"setting-not-known",
     "The limits are for the setting \"{asked}\", and a run file does not say its setting.",
     "Note the setting in the run file, or choose limits without one."},
    {"temperature-not-known",
     "The limits hold from {from} to {to}, and no temperature was recorded.",
     "Record the damper's temperature, or choose limits without a temperature."},
    {"temperature-outside-window",
     "The damper was at {temperature}, and the limits hold from {from} to {to}.",
     "Test again inside this window."},
    {"waveform-differs",
     "The limits are for a {asked} motion, and this block is {found}.",
     "Test with this motion."},
    {"rig-accuracy-not-known",
     "The uncertainty holds no part for the load cell, because the rig profile does not say how "
     "accurate it is.",
     "Put the cell's certificate into the rig profile."},
    {"speed-outside-tested",
     "{velocity} lies just outside the speeds that were tested; the force was read along the end "
     "of "
     "the curve.",
     "Test this speed too."},
    {"stroke-not-asked",
     "The limit names no stroke and the curve has several; at {velocity} the block of {stroke} was "
     "used.",
     "Name the stroke in the limit sheet."},
    {"speed-not-tested",
     "{velocity} lies outside the speeds that were tested.",
     "Test this speed too."},
};

}  // namespace

std::span<const Sentence> judgingSentences() { return rows; }

}  // namespace dampwright
