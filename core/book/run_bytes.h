// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QByteArray>
#include <cstdint>
#include <memory>
#include <string>
#include <string_view>
#include <vector>

#include "core/base/result.h"
#include "core/book/connection.h"

namespace dampwright {

/// A run file on its way into the book.
struct RunBytes {
  std::string name, sha256;
  std::shared_ptr<const std::string> bytes;
};

/// The same cut into pieces of 2 MB, each compressed, so that no row of the database grows large.
struct PackedRun {
  std::string name, sha256;
  std::uint64_t bytes = 0;
  std::vector<QByteArray> chunks;
};

PackedRun pack(const RunBytes& file);

Result<bool> hasRun(const Connection& connection, std::string_view sha256);

/// Inside a transaction; a file that is there already is left alone.
Result<Done> writeRun(const Connection& connection, const PackedRun& file);

/// Errors: run-file-missing, run-file-damaged.
Result<std::string> readRunFile(const Connection& connection, std::string_view sha256);

}  // namespace dampwright
