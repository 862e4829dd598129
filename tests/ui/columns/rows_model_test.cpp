// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/rows_model.h"

#include <gtest/gtest.h>

#include <QAbstractItemModelTester>
#include <QFont>

#include "made_run.h"

namespace dampwright {
namespace {

TEST(RowsModel, ShowsTheFileWithWhatEachColumnIsTakenFor) {
  RowsModel model;
  const QAbstractItemModelTester tester(&model,
                                        QAbstractItemModelTester::FailureReportingMode::Fatal);
  const std::string text = made::viscousRun("Rig: 1\nTime (s),Travel (mm),Load (N)\n");
  const ColumnsPreview head = previewHead(made::inMemory(text), "run.csv", {}, {});
  model.show(head, {});
  EXPECT_EQ(model.columnCount(), 3);
  EXPECT_EQ(model.data(model.index(1, 2), Qt::DisplayRole), "Load (N)");
  EXPECT_TRUE(model.data(model.index(1, 2), Qt::FontRole).value<QFont>().bold());
  EXPECT_FALSE(model.data(model.index(2, 2), Qt::FontRole).value<QFont>().bold());
  EXPECT_EQ(model.headerData(1, Qt::Vertical, Qt::DisplayRole).toInt(), 2) << "line of the file";
  EXPECT_EQ(model.headerData(0, Qt::Horizontal, Qt::DisplayRole), "Time · s\n\nIts name says so.");
  EXPECT_EQ(model.headerData(1, Qt::Horizontal, Qt::DisplayRole),
            "Displacement · mm\ndirection not known\nIts name says so.");
  EXPECT_EQ(model.headerData(2, Qt::Horizontal, Qt::DisplayRole),
            "Force · N\nsign by the loop's energy\nIts name says so.");
  EXPECT_EQ(model.rowOfLine(2), 1);
  EXPECT_EQ(model.rowOfLine(9999), 0);
}

TEST(RowsModel, WhatTheTechnicianSaidIsSaidToBeHis) {
  const std::string text = made::viscousRun("Time (s),Travel (mm),Load (N)\n");
  ColumnsDraft draft;
  draft.rig.displacementPositive = Direction::Rebound;
  draft.rig.force = RigColumn{"Load", {}, "kN"};
  const ColumnsPreview head = previewHead(made::inMemory(text), "run.csv", draft, {});
  RowsModel model;
  model.show(head, draft);
  EXPECT_EQ(model.headerData(1, Qt::Horizontal, Qt::DisplayRole),
            "Displacement · mm\nrising: rebound\nIts name says so.");
  EXPECT_EQ(model.headerData(2, Qt::Horizontal, Qt::DisplayRole),
            "Force · kN\nsign by the loop's energy\nYou said so.");
}

TEST(RowsModel, RaggedRowsAndNoTableDoNoHarm) {
  RowsModel model;
  const QAbstractItemModelTester tester(&model,
                                        QAbstractItemModelTester::FailureReportingMode::Fatal);
  ColumnsPreview preview;
  preview.rows = {{1, {"a"}}, {2, {"1", "2", "3"}}, {3, {}}};
  model.show(preview, {});
  EXPECT_EQ(model.columnCount(), 3);
  EXPECT_EQ(model.data(model.index(0, 2), Qt::DisplayRole), "");
  EXPECT_EQ(model.headerData(1, Qt::Horizontal, Qt::DisplayRole), "");
  model.show({}, {});
  EXPECT_EQ(model.rowCount(), 0);
}

}  // namespace
}  // namespace dampwright
