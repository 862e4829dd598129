// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/tables.h"

namespace dampwright {
namespace {

constexpr Sentence rows[] = {
    {"document-too-large",
     "The document {file} is larger than 64 MB or holds more than two million values.",
     "Choose the document itself, not a recording or an archive."},
    {"document-too-deep",
     "The document nests lists and objects more than {limit} deep.",
     "Choose a document that this program wrote."},
    {"document-not-json",
     "The text is not valid JSON in UTF-8; it stops making sense at \"{found}\".",
     "Mend this line, or choose another document."},
    {"document-repeated-key", "The key {key} stands twice in one object.", "Keep one of the two."},
    {"document-without-kind",
     "The text does not say \"document\": \"{expected}\".",
     "Choose a document of this kind, or add the key."},
    {"document-of-another-kind",
     "A \"{expected}\" is needed here, and this is a \"{found}\".",
     "Choose a document of the kind that is needed."},
    {"document-without-version",
     "The document has no version number of 1 or more.",
     "Add \"version\": 1."},
    {"document-from-newer-program",
     "The document has version {version}, and this program knows versions up to {known}: it comes "
     "from a newer program.",
     "Update this program, or write the document with the older one."},
    {"document-unknown-key",
     "The key {key} is not known here; known are {known}.",
     "Mend the spelling, or take the key out."},
    {"document-missing-key", "The key {key} is missing.", "Add it."},
    {"document-not-a-number",
     "The key {key} must be a number, and is {value}.",
     "Write a number without quotes and without a unit."},
    {"document-not-text", "The key {key} must be text, and is {value}.", "Write text in quotes."},
    {"document-not-a-flag",
     "The key {key} must be true or false, and is {value}.",
     "Write true or false without quotes."},
    {"document-not-a-list",
     "The key {key} must be a list, and is {value}.",
     "Write it in square brackets."},
    {"document-not-an-object",
     "The key {key} must be an object, and is {value}.",
     "Write it in braces."},
    {"document-out-of-range", "The key {key} is {value}, and must be {rule}.", "Mend the value."},
    {"document-unknown-word",
     "The key {key} is {value}, and must be one of {allowed}.",
     "Use one of these words as they stand here."},
    {"output-not-written",
     "The output could not be written: {reason}.",
     "Free some room, look at the rights of the folder, or name another place."},
    {"run-given-twice",
     "The file holds the same recording as {other}.",
     "Give each recording once."},
    {"sheet-program-missing",
     "The program that makes sheets is not at {path}.",
     "Install dampwright beside dampwright-batch."},
    {"measurement-out-of-joint",
     "The measurement {file} names a run or a block that it does not hold.",
     "Measure the run files again."},
    {"document-bad-window",
     "The key {key}.temperature_c must hold two numbers, the lower one first.",
     "Write [from, to] in degrees Celsius, or null."},
    {"sheet-not-written",
     "The sheet was not written to {file}: {reason}.",
     "Choose a folder that you may write to and that has room, then save again."},
    {"printer-failed",
     "The printer {printer} did not take the sheet.",
     "Look at the printer, or save the sheet as a PDF and print that."},
};

}  // namespace

std::span<const Sentence> documentSentences() { return rows; }

}  // namespace dampwright
