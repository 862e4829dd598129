// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/load_file.h"

#include <algorithm>
#include <array>
#include <cerrno>
#include <cstdio>
#include <cstring>
#include <memory>
#include <new>
#include <optional>
#include <string_view>

#include "core/intake/recognise_other.h"

namespace dampwright {
namespace {

namespace fs = std::filesystem;

struct Closer {
  void operator()(std::FILE* file) const { static_cast<void>(std::fclose(file)); }
};
using OpenFile = std::unique_ptr<std::FILE, Closer>;

Place placeOf(const fs::path& path) {
  const fs::path name = path.filename();
  return {name.empty() ? path.string() : name.string(), 0, 0};
}

Error systemError(int number, const fs::path& path) {
  if (number == ENOENT || number == ENOTDIR) return {"file-not-found", {}, placeOf(path)};
  if (number == EACCES || number == EPERM) return {"file-no-permission", {}, placeOf(path)};
  if (number == ENOMEM) return {"out-of-memory", {}, placeOf(path)};
  return {"file-unreadable", {{"reason", std::strerror(number)}}, placeOf(path)};
}

// Never opened to find out: opening a pipe would wait for its other end.
std::optional<Error> notAnOrdinaryFile(const fs::path& path) {
  std::error_code problem;
  const fs::file_status status = fs::status(path, problem);
  if (status.type() == fs::file_type::not_found) return Error{"file-not-found", {}, placeOf(path)};
  if (problem) return systemError(problem.value(), path);
  if (fs::is_directory(status)) return Error{"file-is-folder", {}, placeOf(path)};
  if (!fs::is_regular_file(status)) return Error{"file-is-device", {}, placeOf(path)};
  return std::nullopt;
}

// A gigabyte of no text is refused by its beginning, before room is made for it.
std::optional<Error> noTextAtItsStart(std::FILE* file, const fs::path& path) {
  std::array<char, 65536> start{};
  const std::size_t got = std::fread(start.data(), 1, start.size(), file);
  if (std::ferror(file) != 0) return systemError(errno, path);
  const std::string_view text(start.data(), got);
  std::optional<Error> other = recogniseOther(text);
  if (text.find_first_not_of('\0') == std::string_view::npos)
    other = Error{"file-is-binary", {}, {}};
  if (other) {
    other->place = placeOf(path);
    return other;
  }
  std::rewind(file);
  return std::nullopt;
}

Result<std::string> readToEnd(std::FILE* file, std::size_t expected, const fs::path& path) {
  constexpr std::size_t chunk = std::size_t{4} << 20;
  std::string bytes;
  std::size_t filled = 0;
  while (true) {
    const std::size_t wanted = filled == 0 ? expected + 1 : filled + chunk;  // + 1 meets the end
    if (wanted > static_cast<std::size_t>(largestFile) + 1) {
      return Error{"file-too-large", {}, placeOf(path)};
    }
    bytes.resize(wanted);
    const std::size_t got = std::fread(bytes.data() + filled, 1, wanted - filled, file);
    filled += got;
    if (std::ferror(file) != 0) return systemError(errno, path);
    if (filled < wanted) break;
  }
  bytes.resize(filled);
  return bytes;
}

}  // namespace

Result<std::string> loadFile(const fs::path& path) {
  if (const auto refused = notAnOrdinaryFile(path)) return *refused;
  std::error_code problem;
  const auto size = fs::file_size(path, problem);
  if (problem) return systemError(problem.value(), path);
  if (size > static_cast<std::uintmax_t>(largestFile)) {
    return Error{"file-too-large", {}, placeOf(path)};
  }
  const OpenFile file(std::fopen(path.c_str(), "rb"));
  if (file == nullptr) return systemError(errno, path);
  constexpr std::uintmax_t large = std::uintmax_t{16} << 20;
  if (size > large) {
    if (const auto refused = noTextAtItsStart(file.get(), path)) return *refused;
  }
  try {
    return readToEnd(file.get(), static_cast<std::size_t>(size), path);
  } catch (const std::bad_alloc&) {
    return Error{"out-of-memory", {}, placeOf(path)};
  }
}

}  // namespace dampwright
