// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/damper_dialog.h"

#include <gtest/gtest.h>

#include <QLineEdit>
#include <QTest>

namespace dampwright {
namespace {

TEST(DamperDialog, AScannersEnterGoesToTheNextFieldAndClosesFromTheLast) {
  DamperCard card;
  card.kind = "monotube";
  DamperDialog dialog("Front left", card);
  dialog.show();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&dialog));
  QTest::keyClicks(QApplication::focusWidget(), " DA-1107 ");
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_Return);
  EXPECT_TRUE(dialog.isVisible());
  QTest::keyClicks(QApplication::focusWidget(), "KX-4");
  QTest::keyClick(QApplication::focusWidget(), Qt::Key_Return);
  EXPECT_FALSE(dialog.isVisible());
  EXPECT_EQ(dialog.result(), QDialog::Accepted);
  EXPECT_EQ(dialog.card().serial, "DA-1107");
  EXPECT_EQ(dialog.card().partNumber, "KX-4");
  EXPECT_EQ(dialog.card().kind, "monotube");  // the rest of the card is kept
}

}  // namespace
}  // namespace dampwright
