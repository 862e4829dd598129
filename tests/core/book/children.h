// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <sys/types.h>

#include <string>
#include <vector>

namespace dampwright {

/// A second process of this test program that plays one of the parts below with a book.
struct Child {
  pid_t pid = 0;
  int output = -1;  ///< its standard output, to be read
};

/// Parts: "write" saves job after job, each with a new run file, and prints the number of each when
/// it is confirmed; "write as nobody" opens and saves once as a user without rights, and prints
/// the codes of the errors.
Child startChild(const std::string& part, const std::string& book);

/// The next whole line that the child prints; empty where it ended before.
std::string lineOf(const Child& child);

/// Everything that the child printed until it ended, line by line. Only whole lines.
std::vector<std::string> linesOf(const Child& child);

/// Plays the part that the command line asks for; -1 where it asks for none.
int playPart(int argc, char** argv);

}  // namespace dampwright
