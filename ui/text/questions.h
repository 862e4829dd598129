// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>

#include "core/intake/read_run.h"

namespace dampwright {

/// What a file leaves open, as a question to the technician.
QString questionText(const OpenPoint& point);

/// All questions of a reading, one sentence after another; empty where nothing is open.
QString questionsText(const RunReading& reading);

/// "Time", "Displacement" …; "not used" for Role::Other.
QString roleName(Role role);

/// Why a column was taken for what it is: a sentence.
QString reasonText(const SourceColumn& column);

}  // namespace dampwright
