// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/actions.h"

#include <QCoreApplication>
#include <QMenu>
#include <optional>

#include "ui/look/action_icon.h"

namespace dampwright {

namespace {

enum class MenuId { File, Edit, View, Help };

struct MenuRow {
  MenuId id;
  const char* text;
};

constexpr MenuRow menus[] = {
    {MenuId::File, QT_TRANSLATE_NOOP("Actions", "&File")},
    {MenuId::Edit, QT_TRANSLATE_NOOP("Actions", "&Edit")},
    {MenuId::View, QT_TRANSLATE_NOOP("Actions", "&View")},
    {MenuId::Help, QT_TRANSLATE_NOOP("Actions", "&Help")},
};

enum class Line { None, Above };

struct ActionRow {
  ActionId id;
  MenuId menu;
  const char* text;
  const char* shortcut = "";
  std::optional<ActionIcon> icon = std::nullopt;
  Line line = Line::None;  ///< a dividing line above it
};

const ActionRow table[] = {
    {ActionId::NewJob,
     MenuId::File,
     QT_TRANSLATE_NOOP("Actions", "&New job…"),
     "Ctrl+N",
     ActionIcon::NewJob},
    {ActionId::StartPage,
     MenuId::File,
     QT_TRANSLATE_NOOP("Actions", "&Recent jobs"),
     "Ctrl+J",
     ActionIcon::JobBook},
    {ActionId::Demonstration,
     MenuId::File,
     QT_TRANSLATE_NOOP("Actions", "Open the &demonstration"),
     "",
     ActionIcon::Demonstration},
    {ActionId::AddRuns,
     MenuId::File,
     QT_TRANSLATE_NOOP("Actions", "&Open runs…"),
     "Ctrl+O",
     ActionIcon::AddRuns,
     Line::Above},
    {ActionId::RigFolder, MenuId::File, QT_TRANSLATE_NOOP("Actions", "&Watch a rig folder…")},
    {ActionId::Limits,
     MenuId::File,
     QT_TRANSLATE_NOOP("Actions", "Choose &limits"),
     "Ctrl+L",
     ActionIcon::Limits},
    {ActionId::PrintSheet,
     MenuId::File,
     QT_TRANSLATE_NOOP("Actions", "&Print sheet…"),
     "Ctrl+P",
     ActionIcon::Sheet},
    {ActionId::Quit,
     MenuId::File,
     QT_TRANSLATE_NOOP("Actions", "&Quit"),
     "Ctrl+Q",
     std::nullopt,
     Line::Above},
    {ActionId::Undo,
     MenuId::Edit,
     QT_TRANSLATE_NOOP("Actions", "&Undo"),
     "Ctrl+Z",
     ActionIcon::Undo},
    {ActionId::Redo,
     MenuId::Edit,
     QT_TRANSLATE_NOOP("Actions", "&Redo"),
     "Ctrl+Shift+Z",
     ActionIcon::Redo},
    {ActionId::JobDetails,
     MenuId::Edit,
     QT_TRANSLATE_NOOP("Actions", "&Job details…"),
     "Ctrl+I",
     std::nullopt,
     Line::Above},
    {ActionId::Damper, MenuId::Edit, QT_TRANSLATE_NOOP("Actions", "Da&mper…"), "Ctrl+D"},
    {ActionId::Columns, MenuId::Edit, QT_TRANSLATE_NOOP("Actions", "&Columns…"), "Ctrl+E"},
    {ActionId::StrikeOut,
     MenuId::Edit,
     QT_TRANSLATE_NOOP("Actions", "&Strike the chosen cycle out"),
     "Ctrl+K",
     ActionIcon::Remove},
    {ActionId::GoToCorners, MenuId::View, QT_TRANSLATE_NOOP("Actions", "Go to &corners"), "Alt+1"},
    {ActionId::GoToLoops, MenuId::View, QT_TRANSLATE_NOOP("Actions", "Go to &loops"), "Alt+2"},
    {ActionId::GoToVerdict, MenuId::View, QT_TRANSLATE_NOOP("Actions", "Go to &verdict"), "Alt+3"},
    {ActionId::FitPlots,
     MenuId::View,
     QT_TRANSLATE_NOOP("Actions", "&Fit the plots"),
     "Ctrl+0",
     std::nullopt,
     Line::Above},
    {ActionId::Dark, MenuId::View, QT_TRANSLATE_NOOP("Actions", "&Dark"), "", ActionIcon::Theme},
    {ActionId::Safety, MenuId::Help, QT_TRANSLATE_NOOP("Actions", "&Safety"), "F1"},
    {ActionId::About, MenuId::Help, QT_TRANSLATE_NOOP("Actions", "&About Dampwright")},
};

QString translated(const char* text) { return QCoreApplication::translate("Actions", text); }

}  // namespace

Actions::Actions(QObject* parent) : QObject(parent) {
  for (const ActionRow& row : table) {
    auto* action = new QAction(translated(row.text), this);
    action->setShortcut(QKeySequence(QString::fromLatin1(row.shortcut)));
    actions_[row.id] = action;
  }
  actions_[ActionId::Dark]->setCheckable(true);
  actions_[ActionId::AddRuns]->setIconText(tr("Add runs"));
  actions_[ActionId::Limits]->setIconText(tr("Limits"));
  actions_[ActionId::PrintSheet]->setIconText(tr("Print sheet"));
}

void Actions::fill(QMenuBar& bar) const {
  for (const MenuRow& menuRow : menus) {
    QMenu* menu = bar.addMenu(translated(menuRow.text));
    for (const ActionRow& row : table) {
      if (row.menu != menuRow.id) continue;
      if (row.line == Line::Above) menu->addSeparator();
      menu->addAction(actions_.at(row.id));
    }
  }
}

void Actions::setColours(const Palette& colours) {
  for (const ActionRow& row : table) {
    if (row.icon) actions_[row.id]->setIcon(actionIcon(*row.icon, colours));
  }
}

}  // namespace dampwright
