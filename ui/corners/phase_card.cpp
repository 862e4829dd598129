// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/phase_card.h"

#include <QMenu>
#include <QPainter>
#include <QToolButton>

#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/look/type.h"
#include "ui/text/names.h"

namespace dampwright {

PhaseCard::PhaseCard(QWidget* parent) : QAbstractButton(parent), more_(new QToolButton(this)) {
  setCheckable(true);
  setAutoExclusive(true);
  setFocusPolicy(Qt::StrongFocus);
  setCursor(Qt::PointingHandCursor);
  setSizePolicy(QSizePolicy::Expanding, QSizePolicy::Fixed);
  more_->setObjectName(QStringLiteral("more"));
  more_->setText(QStringLiteral("⋯"));
  more_->setToolTip(tr("Remove or move these runs"));
  more_->setAccessibleName(more_->toolTip());
  more_->setCursor(Qt::ArrowCursor);
  connect(more_, &QToolButton::clicked, this, &PhaseCard::showMenu);
}

void PhaseCard::setView(const PhaseView& view) {
  view_ = view;
  setChecked(view.selected);
  setText(view.title);
  QString spoken = view.title + QStringLiteral(", ") + view.detail;
  if (view.verdict) spoken += QStringLiteral(", ") + verdictName(*view.verdict);
  setAccessibleName(spoken);
  setToolTip((QStringList{view.title, view.detail} + view.files).join(QLatin1Char('\n')));
  more_->setVisible(!view.files.isEmpty());
  update();
}

void PhaseCard::setOtherCorners(const std::vector<std::pair<QString, QString>>& corners) {
  otherCorners_ = corners;
}

void PhaseCard::resizeEvent(QResizeEvent*) {
  more_->setGeometry(width() - 36, (height() - 28) / 2, 28, 28);
}

void PhaseCard::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const Palette& colours = paletteFor(palette());
  const bool marked = hasFocus() || underMouse() || isChecked();
  painter.setBrush(isChecked() ? colours.selected : colours.card);
  painter.setPen(QPen(marked ? colours.action : colours.hairline, hasFocus() ? 2 : 1));
  painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), 6, 6);
  const VerdictWord word = view_.verdict.value_or(VerdictWord::NotTested);
  paintMark(painter, {10, height() / 2.0 - 7, 14, 14}, word, colours.ink);
  const double left = 34, room = width() - left - 40;
  const TextStyle title{13, true, colours.ink};
  const TextStyle detail{11, false, view_.broken ? colours.evidence : colours.quiet};
  drawText(painter, {left, 6, room, 18}, elided(view_.title, room, title), title);
  drawText(painter, {left, 25, room, 15}, elided(view_.detail, room, detail), detail);
}

void PhaseCard::showMenu() {
  auto* menu = new QMenu(this);
  menu->setAttribute(Qt::WA_DeleteOnClose);
  for (int run = 0; run < view_.files.size(); ++run)
    menu->addAction(
        tr("Remove %1").arg(view_.files[run]), this, [this, run] { emit removeWanted(run); });
  if (!otherCorners_.empty()) menu->addSeparator();
  for (const auto& [corner, name] : otherCorners_) {
    const QString to = corner;
    menu->addAction(tr("Move to %1").arg(name), this, [this, to] { emit moveWanted(to); });
  }
  menu->popup(more_->mapToGlobal(more_->rect().bottomLeft()));
}

}  // namespace dampwright
