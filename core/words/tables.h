// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>

#include "core/words/words.h"

namespace dampwright {

// The one table in five files, split by where a code comes from. Inside core/words only; a new code
// is one new row at the end of the file of its origin.
std::span<const Sentence> readingSentences();    ///< files and core/intake
std::span<const Sentence> measuringSentences();  ///< core/condition up to core/measure
std::span<const Sentence> judgingSentences();    ///< core/verdict
std::span<const Sentence> documentSentences();   ///< core/records and the batch program
std::span<const Sentence> bookSentences();       ///< core/book and the open job

}  // namespace dampwright
