// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/verdict_panel.h"

#include <gtest/gtest.h>

#include <QAbstractItemView>
#include <QComboBox>
#include <QLabel>
#include <QPushButton>
#include <QSignalSpy>
#include <QTest>

#include "tests/ui/clipped.h"
#include "tests/ui/made_measured.h"
#include "ui/verdict/checks_table.h"

namespace dampwright {
namespace {

Limits named(const std::string& title) {
  Limits limits;
  limits.title = title;
  return limits;
}

class VerdictPanelTest : public testing::Test {
 protected:
  void SetUp() override {
    view.hasJob = true;
    view.measured = true;
    view.printable = true;
    view.damper = "Rear left · DA-1109";
    view.verdict = made::verdict();
    view.known = {named("Car limits"), named("Motorcycle limits")};
    view.chosen = view.known[0];
    panel.resize(332, 640);
    panel.setView(view);
    panel.show();
    ASSERT_TRUE(QTest::qWaitForWindowExposed(&panel));
  }
  QPushButton* button(const QString& text) {
    for (QPushButton* found : panel.findChildren<QPushButton*>()) {
      if (found->text() == text && found->isVisible()) return found;
    }
    return nullptr;
  }
  QString everythingSaid() {
    QString said;
    for (const QLabel* label : panel.findChildren<QLabel*>()) {
      if (label->isVisible()) said += label->text() + '\n';
    }
    return said;
  }

  VerdictView view;
  VerdictPanel panel;
};

TEST_F(VerdictPanelTest, TheVerdictStandsThereAsOneWord) {
  bool found = false;
  for (const QWidget* widget : panel.findChildren<QWidget*>())
    found = found || widget->accessibleName() == "Fail";
  EXPECT_TRUE(found);
  EXPECT_TRUE(everythingSaid().contains("1 of 4 checks")) << everythingSaid().toStdString();
}

TEST_F(VerdictPanelTest, StampChecksAndSheetStayInViewOnASmallScreen) {
  for (int i = 0; i < 12; ++i)
    view.notices.push_back(
        {"run.csv", "Something was seen.", "Look at it.", false, NoticeAction::None, i});
  panel.setView(view);
  panel.resize(332, 640);
  QTest::qWait(20);
  EXPECT_LE(panel.height(), 640);
  const QWidget* sheet = button(QString::fromUtf8("Print sheet…"));
  ASSERT_NE(sheet, nullptr);
  EXPECT_TRUE(panel.rect().contains(sheet->geometry()));
  const auto* checks = panel.findChild<ChecksTable*>();
  EXPECT_TRUE(panel.rect().contains(checks->geometry()));
  EXPECT_GE(checks->height(), 4 * 40);
  EXPECT_EQ(made::clippedTexts(&panel), QStringList());
}

TEST_F(VerdictPanelTest, LimitsAreChosenFromTheListOrAFile) {
  QSignalSpy chosen(&panel, &VerdictPanel::limitsChosen);
  QSignalSpy file(&panel, &VerdictPanel::limitsFileWanted);
  auto* box = panel.findChild<QComboBox*>();
  ASSERT_EQ(box->count(), 3);
  EXPECT_EQ(box->currentText(), "Car limits");
  box->setFocus();
  QTest::keyClick(box, Qt::Key_Down);
  ASSERT_EQ(chosen.count(), 1);
  EXPECT_EQ(chosen[0][0].value<Limits>().title, "Motorcycle limits");
  QTest::keyClick(box, Qt::Key_Down);
  EXPECT_EQ(file.count(), 1);
  EXPECT_EQ(box->currentText(), "Car limits");
}

TEST_F(VerdictPanelTest, LimitsOfTheJobAreShownThoughTheBookHasOthersByNow) {
  view.chosen = named("Limits of last year");
  panel.setView(view);
  EXPECT_EQ(panel.findChild<QComboBox*>()->currentText(), "Limits of last year");
}

TEST_F(VerdictPanelTest, AnAssumedDirectionIsSettledByOneOfTwoButtons) {
  view.notices.push_back({"run.csv",
                          "Which way is compression was assumed.",
                          "Confirm it.",
                          true,
                          NoticeAction::SettleDirection,
                          0});
  panel.setView(view);
  QSignalSpy settled(&panel, &VerdictPanel::directionSettled);
  QTest::mouseClick(button("Rising displacement is rebound"), Qt::LeftButton);
  ASSERT_EQ(settled.count(), 1);
  EXPECT_EQ(settled[0][0].value<Direction>(), Direction::Rebound);
}

TEST_F(VerdictPanelTest, EachRemarkThatAChoiceMendsHasItsButton) {
  const auto notice = [](NoticeAction action, int run) {
    return NoticeView{"run.csv", "Something is so.", {}, true, action, 0, run, "mm"};
  };
  view.notices = {notice(NoticeAction::TurnForceSign, 0),
                  notice(NoticeAction::ConfirmUnits, 1),
                  notice(NoticeAction::Columns, 2)};
  panel.setView(view);
  QSignalSpy mend(&panel, &VerdictPanel::mendWanted);
  for (const char* text :
       {"Turn the force sign", "Confirm mm", "Another unit…", "Look at the columns…"}) {
    ASSERT_NE(button(QString::fromUtf8(text)), nullptr) << text;
    QTest::mouseClick(button(QString::fromUtf8(text)), Qt::LeftButton);
  }
  ASSERT_EQ(mend.count(), 4);
  EXPECT_EQ(mend[0][0].value<NoticeAction>(), NoticeAction::TurnForceSign);
  EXPECT_EQ(mend[1][0].value<NoticeAction>(), NoticeAction::ConfirmUnits);
  EXPECT_EQ(mend[1][1].toInt(), 1);
  EXPECT_EQ(mend[2][0].value<NoticeAction>(), NoticeAction::Columns);
  EXPECT_EQ(mend[3][1].toInt(), 2);
  EXPECT_EQ(made::clippedTexts(&panel), QStringList());
}

TEST_F(VerdictPanelTest, AWrongFileSaysWhyInPlaceAndIsPutAway) {
  view.notices = {{"holiday.jpg",
                   "This is a picture, not a run file.",
                   "Drop the text file.",
                   true,
                   NoticeAction::Dismiss,
                   0}};
  panel.setView(view);
  EXPECT_TRUE(everythingSaid().contains("holiday.jpg"));
  EXPECT_TRUE(everythingSaid().contains("This is a picture"));
  EXPECT_EQ(button("Dismiss all"), nullptr);  // one has a button of its own
  QSignalSpy dismissed(&panel, &VerdictPanel::dismissed);
  QTest::mouseClick(button("Dismiss"), Qt::LeftButton);
  ASSERT_EQ(dismissed.count(), 1);
  EXPECT_EQ(dismissed[0][0].toInt(), 0);
  view.notices.clear();
  panel.setView(view);
  EXPECT_FALSE(everythingSaid().contains("holiday.jpg"));
}

TEST_F(VerdictPanelTest, SeveralWrongFilesStandBelowEachOtherAndArePutAwayTogether) {
  view.notices = {{"a.csv", "It is empty.", {}, true, NoticeAction::Dismiss, 0},
                  {"b.csv", "It holds no numbers.", {}, true, NoticeAction::Dismiss, 1}};
  panel.setView(view);
  EXPECT_TRUE(everythingSaid().contains("a.csv"));
  EXPECT_TRUE(everythingSaid().contains("b.csv"));
  QSignalSpy all(&panel, &VerdictPanel::allDismissed);
  QTest::mouseClick(button("Dismiss all"), Qt::LeftButton);
  EXPECT_EQ(all.count(), 1);
}

TEST_F(VerdictPanelTest, ANewVerdictOfTheSameChecksKeepsTheSelectedRow) {
  auto* checks = panel.findChild<ChecksTable*>();
  checks->selectRow(2);
  view.verdict->checks[0].measured = 601;
  panel.setView(view);
  ASSERT_EQ(checks->selectionModel()->selectedRows().size(), 1);
  EXPECT_EQ(checks->selectionModel()->selectedRows()[0].row(), 2);
  const QModelIndex measured = checks->model()->index(1, ChecksModel::Measured);
  EXPECT_TRUE(measured.data().toString().contains("601")) << qPrintable(measured.data().toString());
}

TEST_F(VerdictPanelTest, TheListOfLimitsStaysAsItIsWhileSomebodyChooses) {
  QSignalSpy chosen(&panel, &VerdictPanel::limitsChosen);
  auto* box = panel.findChild<QComboBox*>();
  panel.openLimits();
  ASSERT_TRUE(QTest::qWaitFor([&] { return box->view()->isVisible(); }));
  view.known.insert(view.known.begin(), named("Bus limits"));
  panel.setView(view);
  EXPECT_EQ(box->count(), 3);
  box->view()->setCurrentIndex(box->model()->index(1, 0));
  QTest::keyClick(box->view(), Qt::Key_Return);
  ASSERT_EQ(chosen.count(), 1);
  EXPECT_EQ(chosen[0][0].value<Limits>().title, "Motorcycle limits");
  EXPECT_TRUE(QTest::qWaitFor([&] { return box->count() == 4; }));
  EXPECT_EQ(box->currentText(), "Car limits");  // until the session says another
}

TEST_F(VerdictPanelTest, TheSameLimitsAreNotFilledInAgain) {
  auto* box = panel.findChild<QComboBox*>();
  QSignalSpy filled(box->model(), &QAbstractItemModel::rowsInserted);
  panel.setView(view);
  EXPECT_EQ(filled.count(), 0);
}

TEST_F(VerdictPanelTest, AFilesWordsAreNeverMarkup) {
  view.notices = {{"<b>bold</b>.csv", "<h1>big</h1>", {}, true, NoticeAction::Dismiss, 0}};
  panel.setView(view);
  for (const QLabel* label : panel.findChildren<QLabel*>()) {
    if (!label->text().contains('<')) continue;
    EXPECT_EQ(label->textFormat(), Qt::PlainText);
  }
}

TEST_F(VerdictPanelTest, WithoutARunItSaysWhatIsMissing) {
  view.measured = view.printable = false;
  view.verdict.reset();
  panel.setView(view);
  EXPECT_TRUE(everythingSaid().contains("No run yet"));
  EXPECT_TRUE(everythingSaid().contains("Each check stands here"));
  EXPECT_FALSE(button(QString::fromUtf8("Print sheet…"))->isEnabled());
  view.broken = true;
  panel.setView(view);
  EXPECT_TRUE(everythingSaid().contains("could not be measured"));
  view.broken = false;
  view.measured = true;
  view.chosen.reset();
  panel.setView(view);
  EXPECT_TRUE(everythingSaid().contains("Choose limits"));
  EXPECT_EQ(made::clippedTexts(&panel), QStringList());
}

}  // namespace
}  // namespace dampwright
