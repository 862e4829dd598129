// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/tables.h"

namespace dampwright {
namespace {

constexpr Sentence rows[] = {
    {"run-file-missing",
     "The job book has no run file with checksum {sha256}.",
     "Drop the run file again."},
    {"run-file-damaged",
     "The job book's copy of the run file {file} is damaged: its checksum {sha256} does not match.",
     "Drop the run file again, and have the disk checked."},
    {"book-cannot-open",
     "The job book can't be opened ({reason}).",
     "Look whether the folder exists and you may read and write it."},
    {"book-read-only",
     "The job book can't be written: the file or its folder is read-only.",
     "Allow writing there; what you type is kept and written as soon as that works."},
    {"book-disk-full",
     "The job book can't be written: the disk is full.",
     "Make room on the disk; what you type is kept and written as soon as there is room."},
    {"book-locked",
     "The job book can't be written: another program holds it.",
     "Close the other program; what you type is kept and written as soon as the book is free."},
    {"book-damaged",
     "The job book is damaged ({reason}). It was left as it is.",
     "Put the last backup in its place, or start Dampwright with another book."},
    {"book-newer-than-program",
     "The job book was written by a newer Dampwright (version {book} of its layout; this program "
     "knows {program}). It was left as it is.",
     "Start the newer Dampwright."},
    {"book-foreign",
     "This file is a database, but no job book. It was left as it is.",
     "Choose another file for the job book."},
    {"book-cannot-write",
     "The job book can't be written ({reason}).",
     "Look at the disk; what you type is kept and written as soon as that works."},
    {"job-missing", "The job book has no job {number}.", "Choose a job from the list."},
    {"limits-revision-taken",
     "The job book has a limit sheet {title}, revision {revision}, with other values. A sheet is "
     "never changed.",
     "Give the new sheet a new revision."},
    {"run-already-here",
     "This run is already in the job: at {corner}, as {name}.",
     "Nothing to do; it was not added again."},
    {"serial-on-two-corners",
     "The serial {serial} is at {corner} already, and now at {second} too.",
     "Check which damper was on the rig, and move the runs or correct the card."},
    {"serial-differs",
     "The file says serial {serial}, the card at {corner} says {card}.",
     "Check which damper was on the rig, and move the runs or correct the card."},
    {"corner-differs",
     "The file says {said}, but it was dropped on {corner}.",
     "Check whether the sides were swapped; the runs can be moved."},
    {"corner-unknown",
     "Neither the file nor its name says which corner it belongs to.",
     "Drop it on its corner."},
    {"document-unknown-kind",
     "This JSON file is no limit sheet, rig profile, damper card or job.",
     "Drop run files as the rig writes them, or one of these documents."},
    {"run-differs-from-job",
     "The run file {file} is not the one that the job was made of: its checksum differs.",
     "Get the run file that belongs to the job."},
    {"run-outside-folder",
     "The job names the run file {file}, which is not in the job's own folder.",
     "Put the job's run files beside it and name them so."},
    {"job-was-left",
     "Another job was opened while this was being read, so it was not taken.",
     "Open its job and drop it again."},
    {"no-open-job", "There is no open job that this could belong to.", "Start a new job first."},
    {"demonstration-missing",
     "The sample runs that the demonstration is made of are not there ({folder}).",
     "Install Dampwright again, or start a new job."},
};

}  // namespace

std::span<const Sentence> bookSentences() { return rows; }

}  // namespace dampwright
