// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/start/start_page.h"

#include <QFrame>
#include <QHBoxLayout>
#include <QHeaderView>
#include <QLabel>
#include <QPushButton>
#include <QTreeWidget>
#include <QVBoxLayout>

#include "ui/look/type.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

constexpr int pageWidth = 960;

enum Column { Number, Customer, Vehicle, Plate, Opened, Word, ColumnCount };

QTreeWidgetItem* rowOf(const JobSummary& job) {
  auto* row = new QTreeWidgetItem;
  const QString number = QString::fromStdString(job.number);
  row->setData(Number, Qt::UserRole, number);
  row->setText(Number, job.invented ? StartPage::tr("%1 (invented)").arg(number) : number);
  row->setText(Customer, QString::fromStdString(job.customer));
  row->setText(Vehicle, QString::fromStdString(job.vehicle));
  row->setText(Plate, QString::fromStdString(job.plate));
  row->setText(Opened, dateText(job.opened));
  row->setText(Word, job.verdict ? verdictName(*job.verdict) : QString());
  for (int column = 0; column < ColumnCount; ++column) row->setToolTip(column, row->text(column));
  return row;
}

}  // namespace

StartPage::StartPage(QWidget* parent)
    : QWidget(parent),
      newJob_(new QPushButton(tr("&New job…"))),
      demonstration_(new QPushButton(tr("Open the &demonstration"))),
      open_(new QPushButton(tr("&Open job"))),
      recent_(new QTreeWidget),
      none_(new QLabel(tr("No jobs yet. The first one that you start stands here."))) {
  auto* title = new QLabel(tr("What comes on the bench?"));
  title->setFont(screenFont(TextSize::Verdict));
  newJob_->setObjectName(QStringLiteral("primary"));
  auto* choices = new QHBoxLayout;
  choices->setSpacing(12);
  choices->addWidget(choice(
      newJob_, tr("Customer and vehicle, then drop the run files on the corners of the plan.")));
  choices->addWidget(choice(
      demonstration_,
      tr("An invented car with four dampers, to try everything on. Nothing in it was measured.")));
  auto* heading = new QLabel(tr("Recent jobs"));
  heading->setFont(screenFont(TextSize::Heading));
  recent_->setAccessibleName(heading->text());
  recent_->setColumnCount(ColumnCount);
  recent_->setHeaderLabels(
      {tr("Job"), tr("Customer"), tr("Vehicle"), tr("Plate"), tr("Opened"), tr("Verdict")});
  recent_->setRootIsDecorated(false);
  recent_->setUniformRowHeights(true);
  recent_->setTextElideMode(Qt::ElideRight);
  recent_->header()->setSectionResizeMode(Customer, QHeaderView::Stretch);
  recent_->header()->setSectionResizeMode(Vehicle, QHeaderView::Stretch);
  recent_->header()->setStretchLastSection(false);
  none_->setObjectName(QStringLiteral("quiet"));

  auto* page = new QWidget;
  page->setMaximumWidth(pageWidth);
  auto* column = new QVBoxLayout(page);
  column->setSpacing(16);
  column->addWidget(title);
  column->addLayout(choices);
  column->addSpacing(8);
  column->addWidget(heading);
  column->addWidget(none_);
  column->addWidget(recent_, 1);
  column->addWidget(open_, 0, Qt::AlignRight);
  column->addStretch();
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(24, 48, 24, 24);
  row->addStretch(1);
  row->addWidget(page, 20);
  row->addStretch(1);

  connect(newJob_, &QPushButton::clicked, this, &StartPage::newJobWanted);
  connect(demonstration_, &QPushButton::clicked, this, &StartPage::demonstrationWanted);
  connect(open_, &QPushButton::clicked, this, &StartPage::openCurrent);
  connect(recent_, &QTreeWidget::itemActivated, this, &StartPage::openCurrent);
  setRecentJobs({});
}

QWidget* StartPage::choice(QPushButton* button, const QString& text) {
  auto* card = new QFrame;
  card->setObjectName(QStringLiteral("card"));
  auto* label = new QLabel(text);
  label->setWordWrap(true);
  card->setSizePolicy(QSizePolicy::Preferred, QSizePolicy::Maximum);
  button->setMinimumHeight(44);
  auto* column = new QVBoxLayout(card);
  column->setContentsMargins(16, 16, 16, 16);
  column->setSpacing(12);
  column->addWidget(label);
  column->addStretch();
  column->addWidget(button);
  return card;
}

void StartPage::setRecentJobs(const std::vector<JobSummary>& jobs) {
  recent_->clear();
  for (const JobSummary& job : jobs) recent_->addTopLevelItem(rowOf(job));
  for (const int column : {Number, Plate, Opened, Word}) recent_->resizeColumnToContents(column);
  const bool any = !jobs.empty();
  recent_->setVisible(any);
  open_->setVisible(any);
  none_->setVisible(!any);
  if (any) recent_->setCurrentItem(recent_->topLevelItem(0));
}

void StartPage::takeFocus() {
  QWidget* first = recent_->topLevelItemCount() > 0 ? static_cast<QWidget*>(recent_) : newJob_;
  first->setFocus(Qt::OtherFocusReason);
}

void StartPage::openCurrent() {
  const QTreeWidgetItem* current = recent_->currentItem();
  if (current != nullptr) emit openWanted(current->data(Number, Qt::UserRole).toString());
}

}  // namespace dampwright
