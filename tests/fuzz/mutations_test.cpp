// SPDX-License-Identifier: GPL-3.0-or-later
// What the fuzzers do, in little and the same every time: seeds of all dialects and documents, as
// they are and damaged. A broken promise aborts (tests/fuzz/fuzz_cases.h).
#include "tests/fuzz/mutations.h"

#include <gtest/gtest.h>

#include <chrono>
#include <filesystem>
#include <fstream>
#include <iterator>

#include "tests/fuzz/fuzz_cases.h"

namespace dampwright {
namespace {

using std::string_view_literals::operator""sv;

std::vector<std::string> filesIn(const std::string& folder, std::size_t mostBytes) {
  std::vector<std::filesystem::path> paths;
  for (const auto& entry :
       std::filesystem::directory_iterator(DAMPWRIGHT_SOURCE_DIR "/tests/" + folder)) {
    if (entry.is_regular_file()) paths.push_back(entry.path());
  }
  std::sort(paths.begin(), paths.end());
  std::vector<std::string> files;
  for (const auto& path : paths) {
    std::ifstream stream(path, std::ios::binary);
    std::string bytes{std::istreambuf_iterator<char>(stream), {}};
    bytes.resize(std::min(bytes.size(), mostBytes));
    files.push_back(std::move(bytes));
  }
  return files;
}

// `times` damaged seeds, fewer where a sanitizer makes them slow.
void tryMany(void (*read)(std::string_view),
             const std::vector<std::string>& seeds,
             const std::vector<std::string_view>& words,
             int times) {
  for (const std::string& seed : seeds) read(seed);
  std::mt19937 random(20310304);
  const auto end = std::chrono::steady_clock::now() + std::chrono::seconds(4);
  int tried = 0;
  for (; tried < times && std::chrono::steady_clock::now() < end; ++tried) {
    read(mutated(seeds, words, random));
  }
  EXPECT_GT(tried, 100);
}

TEST(Mutations, AnyBytesAreReadAsARunOrRefused) {
  std::vector<std::string> seeds = filesIn("fuzz/seeds", 4000);
  for (std::string& file : filesIn("reference/awkward_csv", 3000)) seeds.push_back(std::move(file));
  const std::vector<std::string_view> words = {",",
                                               ";",
                                               "\t",
                                               "|",
                                               "\n",
                                               "\r",
                                               "\r\n",
                                               "\"",
                                               "\"\"",
                                               "'",
                                               "#",
                                               "nan",
                                               "inf",
                                               "1e999",
                                               "-",
                                               "+",
                                               "--",
                                               "0.5",
                                               "1,234",
                                               "1.234.567",
                                               "12:00:01.5",
                                               "2031-03-04",
                                               "3/4/2031",
                                               "sep=;\n",
                                               "Sample rate: 200 Hz\n",
                                               "Time (s)",
                                               "mm",
                                               " N",
                                               "\xC2\xA0",
                                               "\xE2\x88\x92",
                                               "\xEF\xBB\xBF",
                                               "\xFF\xFE",
                                               "\x8E\x9E\x8A\xD4",
                                               "\0"sv,
                                               "\0\0\0\0\0\0\0\0"sv,
                                               "\x1A",
                                               "\n\n\n",
                                               ";;;;;;;;",
                                               "999999999999999999999"};
  tryMany(readAnyRun, seeds, words, 4000);
}

TEST(Mutations, AnyBytesAreReadAsADocumentOrRefused) {
  const std::vector<std::string> seeds = filesIn("reference/documents", 4000);
  const std::vector<std::string_view> words = {"{",
                                               "}",
                                               "[",
                                               "]",
                                               ":",
                                               ",",
                                               "\"",
                                               "null",
                                               "true",
                                               "false",
                                               "0",
                                               "-1",
                                               "1e308",
                                               "1e999",
                                               "-0.0",
                                               "0.1",
                                               "\\u0000",
                                               "\\ud800",
                                               "\xFF",
                                               "\xC3\xA4",
                                               "\"document\"",
                                               "\"version\": 2,",
                                               "[[[[[[[[[[[[[[[[[[[[",
                                               "{\"a\":{\"a\":{\"a\":",
                                               "\"dampwright job\"",
                                               "9007199254740993",
                                               "\"\"",
                                               "\n"};
  tryMany(readAnyDocument, seeds, words, 4000);
}

}  // namespace
}  // namespace dampwright
