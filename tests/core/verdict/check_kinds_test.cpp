// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/verdict/check_kinds.h"

#include <gtest/gtest.h>

#include <set>

#include "core/words/words.h"

namespace dampwright {
namespace {

std::string problem(const Check& check) {
  const auto found = problemOf(check);
  return found ? found->code : "";
}

TEST(CheckKinds, EachIsFoundByItsNameAndNamesNoMemberTwice) {
  for (const CheckKind& kind : checkKinds()) {
    EXPECT_EQ(findCheckKind(kind.name)->name, kind.name);
    std::set<CheckMember> members;
    std::set<std::string_view> keys;
    for (const CheckField& field : kind.fields) {
      EXPECT_TRUE(members.insert(field.member).second) << kind.name << " " << field.key;
      EXPECT_TRUE(keys.insert(field.key).second) << kind.name << " " << field.key;
    }
    EXPECT_TRUE(members.contains(CheckMember::Min) || members.contains(CheckMember::Max));
  }
  EXPECT_EQ(findCheckKind("wobble"), nullptr);
}

TEST(CheckKinds, ACheckWithoutItsNeedsSaysWhatIsMissing) {
  Check check;
  EXPECT_EQ(problem(check), "check-unknown");
  check.check = "force";
  EXPECT_EQ(problem(check), "check-incomplete");
  EXPECT_EQ(std::get<std::string>(problemOf(check)->values.at(0).value), "direction");
  check.direction = Direction::Rebound;
  EXPECT_EQ(std::get<std::string>(problemOf(check)->values.at(0).value), "velocity_mm_s");
  check.velocity = 0.3;
  EXPECT_EQ(problem(check), "check-without-limit");
  check.max = 100;
  EXPECT_EQ(problem(check), "");
  check.min = 200;
  EXPECT_EQ(problem(check), "check-limits-crossed");
  check.min = 100;
  EXPECT_EQ(problem(check), "");
  check.toleranceAbsolute = 1;
  EXPECT_EQ(problem(check), "check-with-two-limits");
  check.min = check.max = std::nullopt;
  check.target = 100;
  EXPECT_EQ(problem(check), "");
  check.toleranceAbsolute = 0;
  EXPECT_EQ(problem(check), "check-without-tolerance");
}

}  // namespace
}  // namespace dampwright
