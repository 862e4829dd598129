// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <filesystem>
#include <fstream>
#include <nlohmann/json.hpp>
#include <sstream>
#include <string>

// The files of sample_runs as they stand in the source tree.
namespace dampwright::samples {

inline std::filesystem::path sampleFolder() {
  return std::filesystem::path(DAMPWRIGHT_SOURCE_DIR) / "sample_runs";
}

/// The bytes of one file; empty where there is none.
inline std::string sampleBytes(const std::string& name) {
  std::ostringstream bytes;
  bytes << std::ifstream(sampleFolder() / name, std::ios::binary).rdbuf();
  return bytes.str();
}

/// What truth.json says of each damper.
inline nlohmann::json sampleTruths() {
  return nlohmann::json::parse(sampleBytes("truth.json")).at("dampers");
}

}  // namespace dampwright::samples
