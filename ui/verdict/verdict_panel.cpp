// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/verdict_panel.h"

#include <QAbstractItemView>
#include <QEvent>
#include <QHBoxLayout>
#include <QLabel>
#include <QPushButton>
#include <QVBoxLayout>
#include <algorithm>
#include <utility>

#include "ui/look/elided.h"
#include "ui/look/type.h"
#include "ui/text/names.h"
#include "ui/text/numbers.h"
#include "ui/verdict/checks_table.h"
#include "ui/verdict/notice_list.h"
#include "ui/verdict/stamp_banner.h"

namespace dampwright {

namespace {

template <class Label>
Label* quiet(Label* label) {
  label->setObjectName(QStringLiteral("quiet"));
  label->setFont(screenFont(TextSize::Quiet));
  return label;
}

QLabel* heading(const QString& text) {
  auto* label = new QLabel(text);
  label->setFont(screenFont(TextSize::Heading));
  return label;
}

QString limitsName(const Limits& limits) {
  const QString title = QString::fromStdString(limits.title);
  const QString revision = QString::fromStdString(limits.revision);
  return revision.isEmpty() ? title : VerdictPanel::tr("%1, revision %2").arg(title, revision);
}

}  // namespace

VerdictPanel::VerdictPanel(QWidget* parent)
    : QFrame(parent),
      stamp_(new StampBanner),
      damper_(quiet(new ElidedLabel(Qt::ElideMiddle))),
      line_(new QLabel),
      empty_(new QLabel(tr("Each check stands here: what is asked, what was measured with its "
                           "uncertainty, and the margin."))),
      rule_(quiet(new QLabel)),
      checksHeading_(heading(tr("Checks"))),
      notesHeading_(heading(tr("Reasons and remarks"))),
      limits_(new ElidedComboBox),
      checks_(new ChecksTable),
      notices_(new NoticeList),
      dismissAll_(new QPushButton(tr("Dismiss all"))),
      sheet_(new QPushButton(tr("Print sheet…"))) {
  setObjectName(QStringLiteral("card"));
  setFixedWidth(332);
  line_->setWordWrap(true);
  empty_->setObjectName(QStringLiteral("quiet"));
  empty_->setWordWrap(true);
  limits_->setAccessibleName(tr("Limits"));
  limits_->view()->installEventFilter(this);
  dismissAll_->setObjectName(QStringLiteral("link"));
  dismissAll_->setToolTip(tr("Put away what is said of files that were dropped"));
  sheet_->setObjectName(QStringLiteral("primary"));
  sheet_->setMinimumHeight(40);
  buildColumn();
  connect(limits_, &QComboBox::activated, this, &VerdictPanel::pickLimits);
  connect(sheet_, &QPushButton::clicked, this, &VerdictPanel::sheetWanted);
  connect(notices_, &NoticeList::directionSettled, this, &VerdictPanel::directionSettled);
  connect(notices_, &NoticeList::dismissed, this, &VerdictPanel::dismissed);
  connect(dismissAll_, &QPushButton::clicked, this, &VerdictPanel::allDismissed);
  connect(notices_, &NoticeList::mendWanted, this, &VerdictPanel::mendWanted);
}

void VerdictPanel::buildColumn() {
  auto* limitsRow = new QHBoxLayout;
  auto* limitsLabel = new QLabel(tr("Limits"));
  limitsLabel->setBuddy(limits_);
  limitsRow->addWidget(limitsLabel);
  limitsRow->addWidget(limits_, 1);
  auto* checksRow = new QHBoxLayout;
  checksRow->addWidget(checksHeading_);
  checksRow->addStretch();
  checksRow->addWidget(rule_);
  auto* notesRow = new QHBoxLayout;
  notesRow->addWidget(notesHeading_, 1);
  notesRow->addWidget(dismissAll_);
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(16, 16, 16, 16);
  column->setSpacing(8);
  column->addWidget(stamp_);
  column->addWidget(damper_);
  column->addWidget(line_);
  column->addLayout(limitsRow);
  column->addLayout(checksRow);
  column->addWidget(empty_);
  column->addWidget(checks_);
  column->addLayout(notesRow);
  column->addWidget(notices_, 1);
  column->addStretch();  // keeps all this together where there is nothing to remark
  column->addWidget(sheet_);
}

void VerdictPanel::setView(const VerdictView& view) {
  view_ = view;
  stamp_->setWord(view.word());
  damper_->setWhole(view.damper);
  line_->setText(verdictLine(view));
  checks_->setVerdict(view.verdict);
  const bool judged = view.verdict && !view.verdict->checks.empty();
  checks_->setVisible(judged);
  empty_->setVisible(!judged);
  showNotices();
  sheet_->setEnabled(view.printable);
  showRule();
  showLimits();
}

void VerdictPanel::showNotices() {
  notices_->setNotices(view_.notices);
  notices_->setVisible(!view_.notices.empty());
  notesHeading_->setVisible(!view_.notices.empty());
  const auto files = std::ranges::count(view_.notices, NoticeAction::Dismiss, &NoticeView::action);
  dismissAll_->setVisible(files > 1);
}

void VerdictPanel::showRule() {
  if (!view_.verdict || view_.verdict->checks.empty()) return rule_->clear();
  double factor = 0;
  for (const CheckVerdict& check : view_.verdict->checks)
    factor = std::max(factor, check.coverageFactor);
  rule_->setText(
      factor > 0 ? tr("%1, k up to %2")
                       .arg(decisionRuleName(view_.verdict->decisionRule), numberText(factor, 2))
                 : decisionRuleName(view_.verdict->decisionRule));
}

void VerdictPanel::showLimits() {
  limits_->setEnabled(view_.hasJob);
  if (limits_->view()->isVisible()) return;  // somebody chooses: again when the list is closed
  std::vector<Limits> offered = view_.known;
  if (view_.chosen && std::ranges::find(offered, *view_.chosen) == offered.end())
    offered.insert(offered.begin(), *view_.chosen);
  const QSignalBlocker blocker(limits_);
  if (limits_->count() == 0 || offered != offered_) {
    offered_ = std::move(offered);
    fillLimits();
  }
  const auto row = view_.chosen ? std::ranges::find(offered_, *view_.chosen) : offered_.end();
  limits_->setCurrentIndex(row == offered_.end() ? -1 : static_cast<int>(row - offered_.begin()));
  limits_->setToolTip(limits_->currentText());
}

void VerdictPanel::fillLimits() {
  limits_->clear();
  for (const Limits& limits : offered_) limits_->addItem(limitsName(limits));
  limits_->addItem(tr("From file…"));
  limits_->setPlaceholderText(tr("Choose limits"));
}

// Queued, because the list closes before it says what was chosen.
bool VerdictPanel::eventFilter(QObject* watched, QEvent* event) {
  if (event->type() == QEvent::Hide)
    QMetaObject::invokeMethod(this, &VerdictPanel::showLimits, Qt::QueuedConnection);
  return QFrame::eventFilter(watched, event);
}

void VerdictPanel::pickLimits(int row) {
  if (row >= 0 && row < static_cast<int>(offered_.size())) {
    emit limitsChosen(offered_[static_cast<std::size_t>(row)]);
  } else {
    showLimits();  // "From file" is no choice by itself
    emit limitsFileWanted();
  }
}

void VerdictPanel::takeFocus() {
  QWidget* part = checks_->isVisible() ? static_cast<QWidget*>(checks_) : limits_;
  part->setFocus(Qt::ShortcutFocusReason);
}

void VerdictPanel::openLimits() {
  limits_->setFocus();
  limits_->showPopup();
}

}  // namespace dampwright
