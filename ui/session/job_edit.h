// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QUndoCommand>
#include <functional>
#include <utility>

#include "core/job/job.h"

namespace dampwright {

/// Makes `job` the open one and writes it to the book; `what` is the line of the journal.
using PutJob = std::function<void(const Job& job, const QString& what)>;

/// One edit of the open job. A job is small (the samples are not in it), so an edit keeps it whole.
class JobEdit : public QUndoCommand {
 public:
  JobEdit(const QString& text, Job before, Job after, PutJob put)
      : QUndoCommand(text),
        before_(std::move(before)),
        after_(std::move(after)),
        put_(std::move(put)) {}

  void redo() override { put_(after_, text()); }
  void undo() override { put_(before_, QObject::tr("undone: %1").arg(text())); }

 private:
  Job before_, after_;
  PutJob put_;
};

}  // namespace dampwright
