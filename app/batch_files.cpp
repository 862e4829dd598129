// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/batch_files.h"

#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

#include <cerrno>
#include <cstring>
#include <filesystem>

#include "core/intake/load_file.h"

namespace dampwright {
namespace {

constexpr std::size_t chunk = 1u << 20;

Error notWritten(const std::string& path, int cause) {
  return Error{"output-not-written", {{"reason", std::string(std::strerror(cause))}}, {path, 0, 0}};
}

Result<std::string> loadStandardInput() {
  const Place place{"-", 0, 0};
  std::string bytes;
  while (true) {
    const std::size_t before = bytes.size();
    if (before > static_cast<std::size_t>(largestFile)) return Error{"file-too-large", {}, place};
    bytes.resize(before + chunk);
    const ssize_t got = ::read(STDIN_FILENO, bytes.data() + before, chunk);
    bytes.resize(before + static_cast<std::size_t>(got > 0 ? got : 0));
    if (got == 0) return bytes;
    if (got < 0 && errno != EINTR)
      return Error{"file-unreadable", {{"reason", std::string(std::strerror(errno))}}, place};
  }
}

// 0, or the cause why not all of it could be written.
int writeAll(int file, const std::string& text) {
  for (std::size_t at = 0; at < text.size();) {
    const ssize_t put = ::write(file, text.data() + at, text.size() - at);
    if (put < 0 && errno == EINTR) continue;
    if (put < 0) return errno;
    at += static_cast<std::size_t>(put);
  }
  return 0;
}

Result<Done> writeInto(int file, const std::string& path, const std::string& text) {
  if (file < 0) return notWritten(path, errno);
  int cause = writeAll(file, text);
  if (::close(file) != 0 && cause == 0) cause = errno;
  if (cause != 0) return notWritten(path, cause);
  return Done{};
}

std::string besideOf(const std::string& path) {
  const std::filesystem::path target(path);
  const std::string name =
      std::string(".").append(target.filename().string()).append(".") + std::to_string(::getpid());
  return (target.parent_path() / name).string();
}

}  // namespace

Result<std::string> loadInput(const std::string& path) {
  Result<std::string> bytes = path == "-" ? loadStandardInput() : loadFile(path);
  if (bytes) return bytes;
  Error error = bytes.error();
  error.place.file = path;
  return error;
}

Result<Done> writeOutput(const std::string& path, const std::string& text) {
  if (path.empty()) {
    const int cause = writeAll(STDOUT_FILENO, text);
    if (cause != 0) return notWritten("-", cause);
    return Done{};
  }
  struct stat status {};
  const bool there = ::stat(path.c_str(), &status) == 0;
  if (there && S_ISDIR(status.st_mode)) return notWritten(path, EISDIR);
  if (there && !S_ISREG(status.st_mode))
    return writeInto(::open(path.c_str(), O_WRONLY | O_CLOEXEC), path, text);
  const std::string beside = besideOf(path);
  const int file = ::open(beside.c_str(), O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, 0666);
  if (const auto written = writeInto(file, path, text); !written) {
    if (file >= 0) ::unlink(beside.c_str());
    return written;
  }
  if (::rename(beside.c_str(), path.c_str()) == 0) return Done{};
  const int cause = errno;
  ::unlink(beside.c_str());
  return notWritten(path, cause);
}

}  // namespace dampwright
