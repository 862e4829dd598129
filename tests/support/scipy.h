// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <gtest/gtest.h>
#include <unistd.h>

#include <charconv>
#include <cstdio>
#include <filesystem>
#include <fstream>
#include <span>
#include <sstream>
#include <string>
#include <vector>

// Asks Debian's Python with NumPy and SciPy (python3-numpy, python3-scipy) at test time, so that
// our numbers are compared with an independent library and not with numbers typed in here.
namespace dampwright::test {

/// A Python list of the numbers, each with all its digits.
inline std::string pythonList(std::span<const double> numbers) {
  std::string list = "[";
  for (const double number : numbers) {
    char digits[32];
    const auto end = std::to_chars(digits, digits + sizeof digits, number).ptr;
    list.append(digits, end).append(",");
  }
  return list + "]";
}

/// The numbers that a Python program prints, parted by blanks or line ends. A program that fails,
/// a missing SciPy included, is a failure of the test, never a skipped one.
inline std::vector<double> pythonNumbers(const std::string& program) {
  const std::filesystem::path script =
      std::filesystem::temp_directory_path() / ("dampwright_" + std::to_string(getpid()) + ".py");
  std::ofstream(script) << program;
  const std::string command = "/usr/bin/python3 -I '" + script.string() + "'";
  std::FILE* pipe = popen(command.c_str(), "r");
  std::string printed;
  char part[4096];
  while (pipe != nullptr) {
    const std::size_t size = std::fread(part, 1, sizeof part, pipe);
    if (size == 0) break;
    printed.append(part, size);
  }
  EXPECT_EQ(pipe == nullptr ? -1 : pclose(pipe), 0) << "this Python program failed:\n" << program;
  std::filesystem::remove(script);
  std::vector<double> numbers;
  std::istringstream words(printed);
  for (std::string word; words >> word;) {
    double number = 0;
    const auto [end, error] = std::from_chars(word.data(), word.data() + word.size(), number);
    EXPECT_TRUE(error == std::errc() && end == word.data() + word.size()) << "no number: " << word;
    numbers.push_back(number);
  }
  return numbers;
}

}  // namespace dampwright::test
