// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/base/expects.h"

#include <cstdio>
#include <cstdlib>

namespace dampwright {

void expects(bool condition, std::source_location where) {
  if (condition) return;
  (void)std::fprintf(stderr,
                     "dampwright: broken promise at %s:%u in %s\n",
                     where.file_name(),
                     static_cast<unsigned>(where.line()),
                     where.function_name());
  std::abort();
}

}  // namespace dampwright
