// SPDX-License-Identifier: GPL-3.0-or-later
#include <cstddef>
#include <cstdint>

#include "tests/fuzz/fuzz_cases.h"

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  dampwright::readAnyDocument({reinterpret_cast<const char*>(data), size});
  return 0;
}
