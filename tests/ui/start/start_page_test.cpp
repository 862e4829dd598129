// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/start/start_page.h"

#include <gtest/gtest.h>

#include <QComboBox>
#include <QLabel>
#include <QLineEdit>
#include <QPushButton>
#include <QSignalSpy>
#include <QTest>
#include <QTreeWidget>

#include "tests/ui/clipped.h"
#include "ui/start/job_dialog.h"
#include "ui/start/safety_dialog.h"
#include "ui/text/cautions.h"

namespace dampwright {
namespace {

JobSummary summary(const std::string& number, const std::string& customer) {
  return {number,
          customer,
          "rally hatchback",
          "QM 20 ABC",
          "2031-03-04T09:15:00+01:00",
          false,
          VerdictWord::Fail};
}

TEST(StartPage, RecentJobsAreOpenedByEnterOrButton) {
  StartPage page;
  page.setRecentJobs({summary("2041", "Saltmarsh Motor Club"), summary("2040", "Quillmere")});
  page.resize(1000, 700);
  page.show();
  ASSERT_TRUE(QTest::qWaitForWindowExposed(&page));
  QSignalSpy opened(&page, &StartPage::openWanted);
  auto* list = page.findChild<QTreeWidget*>();
  list->setFocus();
  QTest::keyClick(list, Qt::Key_Down);
  QTest::keyClick(list, Qt::Key_Return);
  ASSERT_EQ(opened.count(), 1);
  EXPECT_EQ(opened[0][0].toString(), "2040");
  for (QPushButton* button : page.findChildren<QPushButton*>()) {
    if (button->text() == "&Open job") QTest::mouseClick(button, Qt::LeftButton);
  }
  EXPECT_EQ(opened.count(), 2);
  EXPECT_EQ(made::clippedTexts(&page), QStringList());
}

TEST(StartPage, WithoutJobsItSaysSo) {
  StartPage page;
  page.resize(1000, 700);
  page.show();
  EXPECT_FALSE(page.findChild<QTreeWidget*>()->isVisible());
  EXPECT_EQ(made::clippedTexts(&page), QStringList());
}

TEST(StartPage, TheDemonstrationIsSaidToBeInvented) {
  StartPage page;
  page.show();
  QString said;
  for (const QLabel* label : page.findChildren<QLabel*>()) said += label->text();
  EXPECT_TRUE(said.contains("invented"));
}

TEST(JobDialog, WhatIsTypedComesOutTrimmed) {
  JobDialog dialog(JobDialog::Use::NewJob, {});
  dialog.show();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&dialog));
  QTest::keyClicks(QApplication::focusWidget(), " Saltmarsh ");
  dialog.findChild<QComboBox*>()->setCurrentIndex(1);
  EXPECT_EQ(dialog.job().customer, "Saltmarsh");
  EXPECT_EQ(dialog.job().kind, VehicleKind::Motorcycle);
  EXPECT_EQ(made::clippedTexts(&dialog), QStringList());
}

TEST(JobDialog, AJobsKindStaysBecauseItsRunsBelongToItsCorners) {
  Job job;
  job.kind = VehicleKind::Motorcycle;
  job.number = "2041";
  JobDialog dialog(JobDialog::Use::Details, job);
  EXPECT_FALSE(dialog.findChild<QComboBox*>()->isEnabled());
  EXPECT_EQ(dialog.job(), job);
}

TEST(SafetyDialog, SaysEveryCautionInFull) {
  SafetyDialog dialog;
  dialog.show();
  ASSERT_TRUE(QTest::qWaitForWindowExposed(&dialog));
  QStringList said;
  for (const QLabel* label : dialog.findChildren<QLabel*>()) said << label->text();
  for (const QString& caution : cautions()) EXPECT_TRUE(said.contains(caution));
  EXPECT_EQ(made::clippedTexts(&dialog), QStringList());
}

}  // namespace
}  // namespace dampwright
