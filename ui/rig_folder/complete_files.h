// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <map>
#include <string>
#include <string_view>
#include <vector>

namespace dampwright {

/// A file as a folder's listing has it.
struct ListedFile {
  std::string name;
  std::uint64_t bytes = 0;
  std::int64_t modified = 0;  ///< ns since 1970
  std::uint64_t node = 0;     ///< changes where another file takes the name

  bool operator==(const ListedFile&) const = default;
};

/// Whether a program may have left it there for itself: hidden, a lock, half of a download.
bool isForPrograms(std::string_view name);

/// Tells from one look at a folder to the next which files have come and are written to their end.
/// Knows neither clocks nor folders: it is given both.
///
/// A file is complete when it has stood unchanged (size, time, identity) over two looks or more and
/// for as long as it takes: 2 s, or three times the longest pause between two growths that it was
/// seen to make, so that a slow logger is waited for. One that changes after all is withdrawn, and
/// complete again later. An empty file is never complete.
class CompleteFiles {
 public:
  struct Look {
    std::vector<ListedFile> complete;    ///< since this look
    std::vector<std::string> withdrawn;  ///< were complete before, and are changed or gone
  };

  /// What of `known` is still as it was is old, and never complete.
  explicit CompleteFiles(std::vector<ListedFile> known = {});

  /// @param now  [ms] of any clock that does not go back
  Look look(const std::vector<ListedFile>& listing, std::int64_t now);

  /// It could not be read after all: to be looked at as if it had just changed.
  void again(const std::string& name, std::int64_t now);

  static constexpr std::int64_t shortestQuiet = 2000;  ///< ms

 private:
  struct Seen {
    ListedFile file;
    std::int64_t changed = 0;       ///< ms, when it was first seen so
    std::int64_t longestPause = 0;  ///< ms between two changes
    bool given = false;
  };

  static bool isQuiet(const Seen& seen, std::int64_t now);
  bool isOld(const ListedFile& file) const;

  std::vector<ListedFile> known_;  ///< by name
  std::map<std::string, Seen> seen_;
};

}  // namespace dampwright
