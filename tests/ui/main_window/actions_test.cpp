// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/actions.h"

#include <gtest/gtest.h>

#include <QMenu>
#include <set>

namespace dampwright {
namespace {

TEST(Actions, EveryActionIsInTheMenuBarAndNoShortcutIsGivenTwice) {
  Actions actions;
  QMenuBar bar;
  actions.fill(bar);
  std::set<QString> shortcuts;
  int shown = 0;
  for (QAction* top : bar.actions()) {
    ASSERT_NE(top->menu(), nullptr);
    for (QAction* action : top->menu()->actions()) {
      if (action->isSeparator()) continue;
      ++shown;
      EXPECT_FALSE(action->text().isEmpty());
      if (action->shortcut().isEmpty()) continue;
      EXPECT_TRUE(shortcuts.insert(action->shortcut().toString()).second)
          << action->text().toStdString();
    }
  }
  EXPECT_EQ(shown, static_cast<int>(ActionId::About) + 1);
}

TEST(Actions, NoTwoEntriesOfAMenuShareALetter) {
  Actions actions;
  QMenuBar bar;
  actions.fill(bar);
  for (QAction* top : bar.actions()) {
    std::set<QChar> letters;
    for (QAction* action : top->menu()->actions()) {
      const auto mark = action->text().indexOf(QLatin1Char('&'));
      if (mark < 0) continue;
      EXPECT_TRUE(letters.insert(action->text().at(mark + 1).toLower()).second)
          << action->text().toStdString();
    }
  }
}

}  // namespace
}  // namespace dampwright
