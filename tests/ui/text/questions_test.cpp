// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/questions.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

TEST(Questions, EachOpenPointIsASentenceOfItsOwn) {
  RunReading reading;
  for (const char* point :
       {"decimal", "force", "displacement", "unit", "sample-rate", "direction"}) {
    const QString question = questionText({point, {"A", "B"}, "--x"});
    EXPECT_TRUE(question.contains(QLatin1Char('?'))) << question.toStdString();
    EXPECT_FALSE(question.contains(QStringLiteral("--x"))) << "options are for the command line";
    for (const OpenPoint& other : reading.open) EXPECT_NE(questionText(other), question);
    reading.open.push_back({point, {"A", "B"}, "--x"});
  }
  EXPECT_EQ(questionText({"force", {"Load", "Load 2"}, ""}),
            "Which column is the force? It could be: Load, Load 2.");
  EXPECT_TRUE(questionText({"something-new", {}, ""}).contains("something-new"));
}

TEST(Questions, AnAssumedUnitIsSaidBesideTheReason) {
  EXPECT_EQ(reasonText({1, "Load", "N", Role::Force, false, "role-by-name"}), "Its name says so.");
  EXPECT_EQ(reasonText({1, "Load", "N", Role::Force, true, "role-by-name"}),
            "Its name says so. The unit is assumed.");
}

}  // namespace
}  // namespace dampwright
