// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/notice.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QPushButton>
#include <QVBoxLayout>

#include "ui/look/elided.h"

namespace dampwright {

namespace {

QLabel* sentence(const QString& text) {
  auto* label = new QLabel(breakable(text));
  label->setTextFormat(Qt::PlainText);  // a file's words are never markup
  label->setWordWrap(true);
  label->setTextInteractionFlags(Qt::TextSelectableByMouse);
  return label;
}

}  // namespace

Notice::Notice(const NoticeView& view, QWidget* parent) : QFrame(parent) {
  setObjectName(QStringLiteral("notice"));
  setProperty("level", view.warning ? "warning" : "note");
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(12, 8, 12, 8);
  column->setSpacing(4);
  if (!view.title.isEmpty()) {
    QLabel* title = sentence(view.title);
    QFont bold = title->font();
    bold.setBold(true);
    title->setFont(bold);
    column->addWidget(title);
  }
  column->addWidget(sentence(view.text));
  if (!view.hint.isEmpty()) {
    QLabel* hint = sentence(view.hint);
    hint->setObjectName(QStringLiteral("quiet"));
    column->addWidget(hint);
  }
  addButtons(view);
  setAccessibleName(
      QStringList{view.title, view.text, view.hint}.join(QLatin1Char(' ')).simplified());
}

void Notice::addButtons(const NoticeView& view) {
  const auto add = [this](const QString& text) {
    auto* button = new QPushButton(text);
    button->setObjectName(QStringLiteral("link"));
    static_cast<QVBoxLayout*>(layout())->addWidget(button, 0, Qt::AlignLeft);
    return button;
  };
  if (view.action == NoticeAction::SettleDirection) {
    connect(add(tr("Rising displacement is compression")), &QPushButton::clicked, this, [this] {
      emit directionSettled(Direction::Compression);
    });
    connect(add(tr("Rising displacement is rebound")), &QPushButton::clicked, this, [this] {
      emit directionSettled(Direction::Rebound);
    });
  }
  const auto addMend = [&](const QString& text, NoticeAction action) {
    connect(add(text), &QPushButton::clicked, this, [this, action, run = view.run] {
      emit mendWanted(action, run);
    });
  };
  if (view.action == NoticeAction::TurnForceSign)
    addMend(tr("Turn the force sign"), NoticeAction::TurnForceSign);
  if (view.action == NoticeAction::ConfirmUnits) {
    addMend(
        view.confirmed.isEmpty() ? tr("Confirm the unit") : tr("Confirm %1").arg(view.confirmed),
        NoticeAction::ConfirmUnits);
    addMend(tr("Another unit…"), NoticeAction::Columns);
  }
  if (view.action == NoticeAction::Columns)
    addMend(tr("Look at the columns…"), NoticeAction::Columns);
  if (view.action == NoticeAction::Dismiss) {
    connect(add(tr("Dismiss")), &QPushButton::clicked, this, [this, index = view.index] {
      emit dismissed(index);
    });
  }
}

}  // namespace dampwright
