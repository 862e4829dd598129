// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "ui/sheet/labelled_grid.h"
#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// Test conditions: speeds, stroke, waveform, temperature, cycles averaged and left out, force
/// basis, zero state, gas, rig and its calibration, recordings with the start of their checksums.
/// One entry for each thing that two tests may or may not share. The phase must have been measured.
std::vector<LabelledText> conditionWords(const SheetPhase& phase);

/// Neighbours of one label on one line: "waveform sine; stroke 50 mm".
std::vector<LabelledText> joined(const std::vector<LabelledText>& words);

/// Conditions that every measured test of a sheet shares word for word; they are printed once.
/// Empty where there is one test only.
using CommonConditions = std::vector<LabelledText>;
CommonConditions commonConditions(const SheetContent& content);

/// Those of one test that are not common to all.
std::vector<LabelledText> ownConditions(const SheetPhase& phase, const CommonConditions& common);

}  // namespace dampwright
