// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/signature.h"

#include <gtest/gtest.h>

#include <vector>

namespace dampwright {
namespace {

TEST(Signature, IsALineThatAPersonCanRead) {
  const std::vector<SignatureColumn> columns = {
      {"Time", "s"}, {" Travel  now ", "mm"}, {"Load", "N"}, {"Note", ""}};
  EXPECT_EQ(signatureOf(columns), "time [s]|travel now [mm]|load [N]|note");
}

TEST(Signature, LettersOutsideAsciiStayAsTheyAre) {
  const std::vector<SignatureColumn> columns = {{"KRÄFTE", "kN"}};
  EXPECT_EQ(signatureOf(columns), "krÄfte [kN]");
}

TEST(Signature, FilesWithoutNamesAreKnownByColumnsAndDelimiter) {
  EXPECT_EQ(signatureOfUnnamed(4, "tab"), "unnamed|4 columns|tab");
}

}  // namespace
}  // namespace dampwright
