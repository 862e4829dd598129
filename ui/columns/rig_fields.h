// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <optional>
#include <span>
#include <variant>

#include "ui/columns/columns_draft.h"

namespace dampwright {

/// Scale or offset of the column of a role.
struct CalibrationField {
  Role role;
  double RigColumn::*value;
};

/// One thing that is known of a rig, and how it is typed.
struct RigField {
  const char* label;  ///< to be translated in the context RigForm
  const char* unit;   ///< as shown
  double perShown;    ///< [SI] what one of that unit is
  bool mayBeNegative;
  std::variant<double RigProfile::*,
               std::optional<double> RigProfile::*,
               std::optional<double> LoadCell::*,
               std::string LoadCell::*,  ///< a date
               CalibrationField>
      where;
};

std::span<const RigField> rigFields();

/// As it stands in the draft; empty where nothing is known.
QString fieldText(const RigField& field, const ColumnsDraft& draft);

/// The draft with what was typed; nothing where that can't be.
std::optional<ColumnsDraft> withTyped(const RigField& field,
                                      const ColumnsDraft& draft,
                                      const Source& source,
                                      const QString& text);

}  // namespace dampwright
