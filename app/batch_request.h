// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <vector>

#include "core/intake/read_run.h"

namespace dampwright {

enum class BatchVerb { Columns, Measure, Judge, Sheet };
enum class Shape { Text, Json };

/// A command line of the batch program, understood.
struct BatchRequest {
  BatchVerb verb = BatchVerb::Columns;
  std::vector<std::string> files;  ///< paths, or "-" for standard input
  ReadOptions read;
  std::string rig, card, limits;  ///< paths of documents, empty: none
  std::string out;                ///< path, empty: standard output
  std::string pdf;                ///< path
  Shape shape = Shape::Text;      ///< of columns
  bool progress = false;
};

/// What a program ends with; the numbers are a promise to scripts.
namespace exit_status {
inline constexpr int done = 0;  ///< and pass, where there is a verdict
inline constexpr int fail = 1;
inline constexpr int open = 2;  ///< too close to call, or not tested
inline constexpr int badInput = 3;
inline constexpr int noOutput = 4;
inline constexpr int wrongUsage = 64;
}  // namespace exit_status

/// The request, or a text to print (help, version, what is wrong) with the status to end with.
struct ParsedRequest {
  std::optional<BatchRequest> request;
  std::string text;
  int status = exit_status::done;
};

/// Reads the arguments behind the program's name.
ParsedRequest parseRequest(int argc, const char* const* argv);

}  // namespace dampwright
