// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/tables.h"

namespace dampwright {
namespace {

constexpr Sentence rows[] = {
    {"run-file-missing",
     "The job book has no run file with checksum {sha256}.",
     "Drop the run file again."},
};

}  // namespace

std::span<const Sentence> bookSentences() { return rows; }

}  // namespace dampwright
