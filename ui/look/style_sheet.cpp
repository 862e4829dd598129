// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/style_sheet.h"

namespace dampwright {

namespace {

// @role is replaced by the palette's colour. Controls are at least 28 high, corners 6.
constexpr const char* sheet = R"(
#card { background: @card; border: 1px solid @hairline; border-radius: 6px; }
#notice { background: @paper; border: 1px solid @hairline; border-radius: 6px; }
#notice[level="warning"] { border: 1px solid @evidence; }
#topBar { background: @card; border: none; border-bottom: 1px solid @hairline; }
QLabel#chip { background: @paper; color: @quiet; border: 1px solid @hairline; border-radius: 6px;
  padding: 2px 8px; }
QLabel#trouble { background: @paper; color: @evidence; border-bottom: 1px solid @evidence;
  padding: 6px 20px; }
QLabel#promise { background: @action; color: @onAction; border-radius: 6px; padding: 10px 20px;
  font-weight: bold; }
QPushButton#dropPlace { border: 2px dashed @bandOutline; background: @card; color: @quiet; }
QPushButton#dropPlace:hover, QPushButton#dropPlace:focus { border: 2px dashed @action;
  color: @action; }
QDialog QLabel { padding-right: 3px; }
QDialogButtonBox { dialogbuttonbox-buttons-have-icons: 0; }
QLabel#quiet { color: @quiet; }
QLabel#warning { color: @evidence; }
QToolTip { background: @card; color: @ink; border: 1px solid @hairline; padding: 4px; }

QPushButton, QToolButton { background: @card; color: @ink; border: 1px solid @hairline;
  border-radius: 6px; padding: 4px 12px; min-height: 20px; }
QPushButton:hover, QToolButton:hover { border-color: @action; }
QPushButton:focus, QToolButton:focus { border: 2px solid @action; padding: 3px 11px; }
QPushButton:pressed, QToolButton:pressed { background: @selected; }
QPushButton:disabled, QToolButton:disabled { color: @quiet; background: @paper; }
QToolButton#more { border: 1px solid transparent; padding: 0; }
QToolButton#more:focus, QToolButton#more:hover { border: 1px solid @action; }
QPushButton#primary, QToolButton#primary { background: @action; color: @onAction; border-color: @action;
  font-weight: bold; }
QPushButton#primary:focus, QToolButton#primary:focus { border: 2px solid @ink; }
QPushButton#primary:disabled, QToolButton#primary:disabled { background: @paper; color: @quiet; border-color: @hairline; }
QPushButton#link { border: none; background: transparent; color: @action; padding: 2px 4px;
  text-align: left; font-weight: bold; }
QPushButton#link:focus { border: 2px solid @action; padding: 0px 2px; }

QLineEdit, QComboBox, QPlainTextEdit { background: @card; color: @ink;
  border: 1px solid @hairline; border-radius: 6px; padding: 3px 8px; min-height: 20px;
  selection-background-color: @action; selection-color: @onAction; }
QLineEdit:focus, QComboBox:focus, QPlainTextEdit:focus { border: 2px solid @action;
  padding: 2px 7px; }
QComboBox::drop-down { border: none; width: 24px; }
QComboBox QAbstractItemView { background: @card; color: @ink; border: 1px solid @hairline;
  selection-background-color: @action; selection-color: @onAction; }

QMenuBar { background: @paper; color: @ink; }
QMenuBar::item { padding: 4px 10px; background: transparent; border-radius: 4px; }
QMenuBar::item:selected { background: @selected; }
QMenu { background: @card; color: @ink; border: 1px solid @hairline; padding: 4px; }
QMenu::item { padding: 5px 28px 5px 28px; border-radius: 4px; }
QMenu::icon { padding-left: 8px; }
QMenu::item:selected { background: @action; color: @onAction; }
QMenu::item:disabled { color: @quiet; background: transparent; }
QMenu::separator { height: 1px; background: @hairline; margin: 4px 8px; }

QTreeWidget, QTableView { background: @card; color: @ink; border: 1px solid @hairline;
  border-radius: 6px; selection-background-color: @selected; selection-color: @ink; }
QTreeWidget::item { min-height: 28px; padding: 0 4px; }
QTreeWidget:focus { border: 2px solid @action; }
QTableView { border: none; }
QTableView:focus { border: none; }
QHeaderView::section { background: @card; color: @quiet; border: none;
  border-bottom: 1px solid @hairline; padding: 4px 6px; }
QScrollArea, QScrollArea > QWidget > QWidget { background: transparent; border: none; }
QScrollBar:vertical { background: transparent; width: 10px; margin: 0; }
QScrollBar::handle:vertical { background: @bandOutline; border-radius: 4px; min-height: 28px;
  margin: 1px; }
QScrollBar::add-line, QScrollBar::sub-line { width: 0; height: 0; }
QProgressBar { background: @card; border: 1px solid @hairline; border-radius: 4px; height: 8px;
  text-align: center; }
QProgressBar::chunk { background: @action; border-radius: 3px; }
)";

QString filled(QString text, const char* role, const QColor& colour) {
  return text.replace(QLatin1Char('@') + QLatin1String(role) + QLatin1Char(';'),
                      colour.name() + QLatin1Char(';'));
}

}  // namespace

QString styleSheet(const Palette& palette) {
  QString text = QString::fromLatin1(sheet);
  text = filled(text, "paper", palette.paper);
  text = filled(text, "card", palette.card);
  text = filled(text, "ink", palette.ink);
  text = filled(text, "quiet", palette.quiet);
  text = filled(text, "hairline", palette.hairline);
  text = filled(text, "action", palette.action);
  text = filled(text, "onAction", palette.onAction);
  text = filled(text, "selected", palette.selected);
  text = filled(text, "evidence", palette.evidence);
  return filled(text, "bandOutline", palette.bandOutline);
}

}  // namespace dampwright
