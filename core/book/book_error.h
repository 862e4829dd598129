// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QSqlError>
#include <QString>

#include "core/base/result.h"

namespace dampwright {

/// What a database error means for the workshop: book-cannot-open, book-read-only, book-disk-full,
/// book-locked, book-damaged, or book-cannot-write for all others, with the engine's own {reason}.
Error bookError(const QSqlError& error, const QString& file);

}  // namespace dampwright
