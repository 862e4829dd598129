// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <string>
#include <utility>
#include <vector>

#include "core/base/remark.h"
#include "core/rig/rig_profile.h"

namespace dampwright {

enum class Role { Time, Displacement, Force, Velocity, Temperature, Other };

struct FileIdentity {
  std::string name;    ///< as dropped, without its folder
  std::string sha256;  ///< of the bytes as they came, 64 hexadecimal digits
  std::uint64_t bytes = 0;
};

/// One column of the file and what it was taken for.
struct SourceColumn {
  int index = 0;     ///< from 1
  std::string name;  ///< header text, may be empty
  std::string unit;  ///< symbol, may be empty
  Role role = Role::Other;
  bool assumed = false;  ///< the unit or role was not settled by evidence
  std::string why;       ///< the evidence, as a code of core/words
};

/// How the file was understood; the same facts that `columns` prints.
struct Source {
  FileIdentity file;
  std::int64_t rows = 0;  ///< data rows kept
  std::string encoding = "utf-8", lineEnd = "LF", delimiter = ",", decimal = ".", thousands;
  std::vector<std::int64_t> headerRows;  ///< lines from 1
  std::int64_t unitRow = 0;              ///< line from 1, 0 none
  std::int64_t firstDataRow = 0;         ///< line from 1
  std::string signature;
  std::vector<std::pair<std::string, std::string>>
      metadata;  ///< preamble key and value, in file order
  std::vector<SourceColumn> columns;
};

/// One recording in SI, signed as everywhere: displacement and force positive in compression. The
/// force is the damper's resistance against being compressed, as the cell read it (moving mass not
/// yet taken off). All channels that are present have the same length; an absent value inside a
/// channel is NaN.
struct Trace {
  Source source;
  std::vector<double> time;          ///< s, never falling
  std::vector<double> displacement;  ///< m
  std::vector<double> force;         ///< N
  std::vector<double> velocity;      ///< m/s, the file's own channel, empty where there is none
  std::vector<double> temperature;   ///< °C, empty where there is none
  ZeroState zeroState = ZeroState::Unknown;
  bool directionSettled = false;  ///< which sign is compression is known, not assumed
  std::vector<Remark> remarks;
};

}  // namespace dampwright
