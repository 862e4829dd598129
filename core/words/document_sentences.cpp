// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/tables.h"

namespace dampwright {
namespace {

constexpr Sentence rows[] = {
    {"document-too-large",
     "The document {file} is larger than 64 MB.",
     "Choose the document itself, not a recording or an archive."},
};

}  // namespace

std::span<const Sentence> documentSentences() { return rows; }

}  // namespace dampwright
