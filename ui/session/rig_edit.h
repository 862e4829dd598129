// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QUndoCommand>
#include <functional>
#include <optional>
#include <string>
#include <utility>

#include "core/rig/rig_profile.h"

namespace dampwright {

/// Makes the profile of this name what it is given to be, or none, and writes that to the book.
using PutRig = std::function<void(
    const std::string& name, const std::optional<RigProfile>& rig, const QString& what)>;

/// One edit of a rig profile.
class RigEdit : public QUndoCommand {
 public:
  RigEdit(const QString& text, std::optional<RigProfile> before, RigProfile after, PutRig put)
      : QUndoCommand(text),
        before_(std::move(before)),
        after_(std::move(after)),
        put_(std::move(put)) {}

  void redo() override { put_(after_.name, after_, text()); }
  void undo() override { put_(after_.name, before_, QObject::tr("undone: %1").arg(text())); }

 private:
  std::optional<RigProfile> before_;
  RigProfile after_;
  PutRig put_;
};

}  // namespace dampwright
