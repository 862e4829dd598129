// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_preview.h"

#include <gtest/gtest.h>

#include <QComboBox>
#include <QLabel>
#include <QLineEdit>
#include <QPushButton>
#include <QSettings>
#include <QTest>

#include "tests/ui/sheet/made_sheet.h"
#include "tests/ui/sheet/pdf_tools.h"
#include "ui/sheet/sheet_pages.h"
#include "ui/sheet/workshop_settings.h"

namespace dampwright {
namespace {

class SheetPreviews : public testing::Test {
 protected:
  void SetUp() override {
    QCoreApplication::setOrganizationName(QStringLiteral("dampwright-test"));
    QSettings().clear();
  }
  SheetContent content_ = made::sheet(made::job({"rear left"}), {VerdictWord::Pass});
};

TEST_F(SheetPreviews, TheChosenPaperIsLaidOutAndRemembered) {
  {
    SheetPreview preview(content_);
    auto* paper = preview.findChild<QComboBox*>();
    paper->setCurrentIndex(1);
    emit paper->activated(1);
    EXPECT_EQ(preview.document().paper(), PaperSize::Letter);
  }
  EXPECT_EQ(SheetPreview(content_).document().paper(), PaperSize::Letter);
}

TEST_F(SheetPreviews, TheWorkshopIsTypedOnceAndKept) {
  SheetPreview preview(content_);
  auto* name = preview.findChildren<QLineEdit*>().constFirst();
  QTest::keyClicks(name, QStringLiteral("Quay Damper Works"));
  QTest::keyClick(name, Qt::Key_Return);
  EXPECT_EQ(preview.document().content().workshop.name, QStringLiteral("Quay Damper Works"));
  EXPECT_EQ(keptWorkshop().name, QStringLiteral("Quay Damper Works"));
}

TEST_F(SheetPreviews, SavesAPdfAndSaysWhereOrWhyNot) {
  QTemporaryDir folder;
  SheetPreview preview(content_);
  const QString path = folder.filePath(QStringLiteral("s.pdf"));
  preview.savePdfAs(path);
  EXPECT_TRUE(bytesOfFile(path).startsWith("%PDF"));
  const auto said = [&preview](const QString& words) {
    for (const QLabel* label : preview.findChildren<QLabel*>()) {
      if (!label->isHidden() && label->text().contains(words)) return true;
    }
    return false;
  };
  EXPECT_TRUE(said(path));
  preview.savePdfAs(QStringLiteral("/no/such/folder/s.pdf"));
  EXPECT_TRUE(said(QStringLiteral("was not written")));
}

TEST_F(SheetPreviews, PagesKeepTheProportionsOfThePaper) {
  SheetPages pages;
  pages.show(SheetDocument(content_, PaperSize::A4));
  // one page of 297:210 inside 16 pixels all around
  EXPECT_NEAR(pages.heightForWidth(632), 600 * 297.0 / 210 + 32, 1);  // whole pixels
}

TEST_F(SheetPreviews, EveryControlHasANameForThoseWhoDoNotSeeIt) {
  SheetPreview preview(content_);
  for (const QWidget* widget : preview.findChildren<QLineEdit*>()) {
    EXPECT_FALSE(widget->accessibleName().isEmpty());
  }
  EXPECT_FALSE(preview.findChild<QComboBox*>()->accessibleName().isEmpty());
  EXPECT_FALSE(preview.findChild<SheetPages*>()->accessibleDescription().isEmpty());
  for (const QPushButton* one : preview.findChildren<QPushButton*>()) {
    EXPECT_TRUE(one->text().contains(QLatin1Char('&'))) << one->text().toStdString();
  }
}

}  // namespace
}  // namespace dampwright
