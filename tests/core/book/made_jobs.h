// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>

#include "core/book/book.h"

namespace dampwright {

/// A car with one damper card and nothing measured; all of it invented.
Job madeJob(const std::string& number);

/// The same with one run of these bytes at the front left, and `notes`.
Job jobWithRun(const std::string& number, const std::string& notes, const std::string& bytes);

RunBytes runOf(const std::string& bytes);

/// 100 kB that differ for each seed and do not compress to nothing.
std::string bytesOf(int seed, std::size_t size = 100'000);

}  // namespace dampwright
