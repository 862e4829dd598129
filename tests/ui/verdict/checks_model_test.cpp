// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/checks_model.h"

#include <gtest/gtest.h>

#include <QAbstractItemModelTester>

#include "tests/ui/made_measured.h"

namespace dampwright {
namespace {

TEST(ChecksModel, KeepsTheRulesOfATableModel) {
  ChecksModel model;
  QAbstractItemModelTester tester(&model, QAbstractItemModelTester::FailureReportingMode::Fatal);
  model.setVerdict(made::verdict());
  EXPECT_EQ(model.rowCount(), 4);
  model.setVerdict(std::nullopt);
  EXPECT_EQ(model.rowCount(), 0);
}

TEST(ChecksModel, TheMostPressingCheckComesFirst) {
  Verdict verdict = made::verdict();
  verdict.checks[2].verdict = VerdictWord::TooCloseToCall;
  verdict.checks[3].verdict = VerdictWord::NotTested;
  ChecksModel model;
  model.setVerdict(verdict);
  EXPECT_EQ(model.check(0).verdict, VerdictWord::Fail);
  EXPECT_EQ(model.check(1).verdict, VerdictWord::TooCloseToCall);
  EXPECT_EQ(model.check(2).verdict, VerdictWord::NotTested);
  EXPECT_EQ(model.check(3).verdict, VerdictWord::Pass);
}

TEST(ChecksModel, ARowReadsAsWordsForThoseWhoDoNotSeeTheBar) {
  ChecksModel model;
  model.setVerdict(made::verdict());
  QString row;
  for (int column = 0; column < model.columnCount(); ++column)
    row += model.index(0, column).data(Qt::AccessibleTextRole).toString() + ';';
  EXPECT_TRUE(row.contains("Rebound at 600")) << row.toStdString();
  EXPECT_TRUE(row.contains("1350.0")) << row.toStdString();
  EXPECT_TRUE(row.contains("Fail"));
}

}  // namespace
}  // namespace dampwright
