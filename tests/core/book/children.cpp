// SPDX-License-Identifier: GPL-3.0-or-later
#include "children.h"

#include <grp.h>
#include <sys/wait.h>
#include <unistd.h>

#include <QString>
#include <cstdio>
#include <cstring>

#include "core/base/sha256.h"
#include "core/book/book.h"
#include "made_jobs.h"

namespace dampwright {

namespace {

int writeUntilKilled(const QString& file) {
  Result<Book> book = Book::open(file);
  if (!book) return 1;
  for (int i = 1;; ++i) {
    const Job job = jobWithRun("2031-0001", std::to_string(i), bytesOf(i));
    const RunBytes run = runOf(bytesOf(i));
    const Result<Done> saved = book.value().saveJob(job, "drop", std::span(&run, 1));
    if (!saved) return 2;
    std::printf("%d\n", i);
    std::fflush(stdout);
  }
}

int writeAsNobody(const QString& file) {
  if (geteuid() == 0 && (setgroups(0, nullptr) != 0 || setgid(65534) != 0 || setuid(65534) != 0)) {
    return 1;
  }
  Result<Book> book = Book::open(file);
  std::printf("%s\n", book ? "opened" : book.error().code.c_str());
  if (!book) return 0;
  const Result<Done> saved = book.value().saveJob(madeJob("2031-0002"), "edit");
  std::printf("%s\n", saved ? "saved" : saved.error().code.c_str());
  const Result<Job> old = book.value().job("2031-0001");
  std::printf("%s\n", old ? "read" : old.error().code.c_str());
  return 0;
}

}  // namespace

Child startChild(const std::string& part, const std::string& book) {
  int ends[2];
  if (pipe(ends) != 0) return {};
  const pid_t pid = fork();
  if (pid == 0) {
    dup2(ends[1], STDOUT_FILENO);
    close(ends[0]);
    execl("/proc/self/exe", "test_book", "--part", part.c_str(), book.c_str(), nullptr);
    _exit(127);
  }
  close(ends[1]);
  return {pid, ends[0]};
}

std::string lineOf(const Child& child) {
  std::string line;
  for (char c = 0; read(child.output, &c, 1) == 1; line += c) {
    if (c == '\n') return line;
  }
  return {};
}

std::vector<std::string> linesOf(const Child& child) {
  std::vector<std::string> lines;
  for (std::string line = lineOf(child); !line.empty(); line = lineOf(child)) lines.push_back(line);
  close(child.output);
  waitpid(child.pid, nullptr, 0);
  return lines;
}

int playPart(int argc, char** argv) {
  if (argc != 4 || std::strcmp(argv[1], "--part") != 0) return -1;
  const QString file = QString::fromUtf8(argv[3]);
  if (std::strcmp(argv[2], "write") == 0) return writeUntilKilled(file);
  return writeAsNobody(file);
}

}  // namespace dampwright
