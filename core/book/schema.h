// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/book/connection.h"

namespace dampwright {

/// The version that this program writes: that of the last migration.
int newestSchema();

/// Version of the book; 0 where it is empty. Errors: book-foreign (the file is somebody else's
/// database), those of core/book/book_error.h.
Result<int> schemaOf(const Connection& connection);

/// Brings a book of any earlier version to the newest, each step in a transaction of its own.
/// Errors: book-newer-than-program, book-foreign, those of core/book/book_error.h.
Result<Done> migrate(const Connection& connection);

}  // namespace dampwright
