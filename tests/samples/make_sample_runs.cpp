// SPDX-License-Identifier: GPL-3.0-or-later
// Writes the files of sample_runs into a folder: make_sample_runs FOLDER
#include <filesystem>
#include <fstream>
#include <iostream>

#include "tests/samples/sample_set.h"

int main(int count, char** words) {
  if (count != 2) {
    std::cerr << "usage: make_sample_runs FOLDER\n";
    return 64;
  }
  const std::filesystem::path folder = words[1];
  std::filesystem::create_directories(folder);
  for (const dampwright::samples::SampleFile& file : dampwright::samples::makeSamples()) {
    std::ofstream stream(folder / file.name, std::ios::binary);
    stream << file.bytes;
    if (!stream.flush()) {
      std::cerr << "cannot write " << folder / file.name << "\n";
      return 4;
    }
  }
}
