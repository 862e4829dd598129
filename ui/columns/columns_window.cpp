// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/columns_window.h"

#include <QCheckBox>
#include <QComboBox>
#include <QHBoxLayout>
#include <QHeaderView>
#include <QLabel>
#include <QLineEdit>
#include <QPushButton>
#include <QScreen>
#include <QScrollArea>
#include <QStyle>
#include <QTabWidget>
#include <QTableView>
#include <QVBoxLayout>
#include <algorithm>
#include <utility>

#include "ui/columns/rig_form.h"
#include "ui/columns/role_form.h"
#include "ui/columns/rows_model.h"
#include "ui/columns/text_form.h"
#include "ui/look/elided.h"
#include "ui/look/type.h"
#include "ui/plots/loops_view.h"
#include "ui/text/questions.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

constexpr int widest = 220, narrowest = 96, formWidth = 400;

QString freeName(const std::vector<RigProfile>& profiles) {
  for (int i = 1;; ++i) {
    const QString name = QStringLiteral("rig %1").arg(i);
    if (std::ranges::find(profiles, name.toStdString(), &RigProfile::name) == profiles.end()) {
      return name;
    }
  }
}

// A form that a small screen can't hold whole.
QScrollArea* scrolled(QWidget* form) {
  auto* area = new QScrollArea;
  area->setWidget(form);
  area->setWidgetResizable(true);
  area->setFrameShape(QFrame::NoFrame);
  area->setFocusPolicy(Qt::NoFocus);
  area->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  return area;
}

bool stops(const RunReading& reading) { return !reading.trace.has_value(); }

}  // namespace

ColumnsWindow::ColumnsWindow(ColumnsSubject subject,
                             std::vector<RigProfile> profiles,
                             QWidget* parent)
    : QDialog(parent),
      subject_(std::move(subject)),
      profiles_(std::move(profiles)),
      draft_(draftOf(subject_.rig, subject_.answers)),
      said_(new QLabel),
      progress_(new QLabel),
      quiet_(new QLabel),
      table_(new QTableView),
      tabs_(new QTabWidget),
      rows_(new RowsModel(this)),
      roles_(new RoleForm),
      text_(new TextForm),
      rig_(new RigForm),
      loops_(new LoopsView),
      keep_(new QCheckBox(tr("Remem&ber this layout for the rig"))),
      name_(new ElidedComboBox),
      accept_(new QPushButton(tr("Read the run"))) {
  setWindowTitle(tr("Columns of %1").arg(QString::fromStdString(subject_.file)));
  build();
  connectForms();
  preview();
}

void ColumnsWindow::build() {
  said_->setObjectName(QStringLiteral("notice"));
  said_->setTextFormat(Qt::PlainText);  // a file's words are never markup
  said_->setWordWrap(true);
  said_->setMargin(8);
  said_->setTextInteractionFlags(Qt::TextSelectableByMouse);
  table_->setModel(rows_);
  table_->setAccessibleName(tr("First rows of the file"));
  table_->setSelectionMode(QAbstractItemView::SingleSelection);
  table_->setTabKeyNavigation(false);
  table_->verticalHeader()->setDefaultSectionSize(22);
  table_->horizontalHeader()->setDefaultAlignment(Qt::AlignLeft | Qt::AlignTop);
  table_->horizontalHeader()->setSectionsClickable(false);
  table_->setMinimumHeight(150);
  tabs_->addTab(scrolled(roles_), tr("Columns"));
  tabs_->addTab(scrolled(text_), tr("Text"));
  tabs_->addTab(rig_, tr("Rig"));
  tabs_->setFixedWidth(formWidth);
  tabs_->setAccessibleName(tr("What the columns are"));
  auto* lower = new QHBoxLayout;
  lower->setSpacing(12);
  lower->addWidget(tabs_);
  lower->addWidget(loops_, 1);
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(16, 16, 16, 16);
  column->setSpacing(12);
  column->addWidget(said_);
  column->addWidget(table_, 2);
  column->addLayout(lower, 5);
  column->addWidget(buildKeep());
  const QSize frame(16, 40);
  resize(QSize(1240, 860).boundedTo(screen()->availableSize() - frame));
  roles_->setFocus();
}

QWidget* ColumnsWindow::buildKeep() {
  auto* line = new QWidget;
  auto* row = new QHBoxLayout(line);
  row->setContentsMargins(0, 0, 0, 0);
  name_->setEditable(true);
  name_->setInsertPolicy(QComboBox::NoInsert);
  name_->setMinimumWidth(160);
  name_->setAccessibleName(tr("Name of the rig"));
  for (const RigProfile& one : profiles_) name_->addItem(QString::fromStdString(one.name));
  name_->setEditText(draft_.base.name.empty() ? freeName(profiles_)
                                              : QString::fromStdString(draft_.base.name));
  keep_->setChecked(true);
  quiet_->setObjectName(QStringLiteral("quiet"));
  progress_->setObjectName(QStringLiteral("quiet"));
  accept_->setObjectName(QStringLiteral("primary"));
  accept_->setDefault(true);
  auto* cancel = new QPushButton(tr("Cancel"));
  cancel->setAutoDefault(false);
  row->addWidget(keep_);
  row->addWidget(name_);
  row->addWidget(quiet_, 1);
  row->addWidget(progress_);
  row->addWidget(cancel);
  row->addWidget(accept_);
  connect(cancel, &QPushButton::clicked, this, &QDialog::reject);
  connect(accept_, &QPushButton::clicked, this, &ColumnsWindow::confirm);
  connect(keep_, &QCheckBox::toggled, name_, &QWidget::setEnabled);
  connect(keep_, &QCheckBox::toggled, this, &ColumnsWindow::showPreview);
  connect(name_, &QComboBox::activated, this, &ColumnsWindow::chooseRig);
  connect(name_, &QComboBox::editTextChanged, this, &ColumnsWindow::sayPreview);
  return line;
}

void ColumnsWindow::connectForms() {
  connect(roles_, &RoleForm::changed, this, &ColumnsWindow::change);
  connect(text_, &TextForm::changed, this, &ColumnsWindow::change);
  connect(rig_, &RigForm::changed, this, &ColumnsWindow::change);
  connect(roles_, &RoleForm::refused, this, &ColumnsWindow::refuse);
  connect(rig_, &RigForm::refused, this, &ColumnsWindow::refuse);
  connect(rig_, &RigForm::saveWanted, this, &ColumnsWindow::askWhereToSave);
  connect(rig_, &RigForm::openWanted, this, &ColumnsWindow::askWhatToOpen);
}

// Nothing: the field reads again as it was before.
void ColumnsWindow::refuse(const QString& why) {
  const QString before = std::exchange(refusal_, why);
  if (!why.isEmpty()) {
    wantsConfirm_ = false;
    sayPreview();
  } else if (!before.isEmpty()) {
    showPreview();
  }
}

void ColumnsWindow::change(const ColumnsDraft& draft) {
  refusal_.clear();
  draft_ = draft;
  preview();
}

void ColumnsWindow::preview() {
  whole_ = false;
  progress_->setText(tr("reading…"));
  LoadRun load = subject_.load;
  if (preview_.bytes) {
    load = [bytes = preview_.bytes]() -> Result<RunText> { return bytes; };
  }
  work_.start([load, name = subject_.file, draft = draft_](
                  const Progress& progress) { return previewHead(load, name, draft, progress); },
              [this](ColumnsPreview head) { takeHead(std::move(head)); });
}

void ColumnsWindow::takeHead(ColumnsPreview head) {
  const auto measured = std::move(preview_.measured);
  preview_ = std::move(head);
  preview_.measured = measured;  // until there is a newer one
  showPreview();
  focusOnQuestion();
  work_.start(
      [head = preview_, name = subject_.file, draft = draft_](const Progress& progress) {
        ColumnsPreview fresh = head;
        fresh.measured.reset();
        return previewWhole(std::move(fresh), name, draft, progress);
      },
      [this](ColumnsPreview whole) { takeWhole(std::move(whole)); },
      [this](double share) {
        progress_->setText(tr("measuring, %1 %").arg(static_cast<int>(share * 100)));
      });
}

void ColumnsWindow::takeWhole(ColumnsPreview whole) {
  preview_ = std::move(whole);
  whole_ = true;
  progress_->clear();
  loops_->setMeasured(preview_.measured, std::nullopt);
  showPreview();
  emit previewed();
  if (std::exchange(wantsConfirm_, false)) confirm();
}

// Once, when the file was looked at first: whoever opened the window is asked something.
void ColumnsWindow::focusOnQuestion() {
  if (std::exchange(focused_, true) || !preview_.reading || preview_.reading->open.empty()) return;
  const std::string& point = preview_.reading->open.front().point;
  if (point == "decimal") {
    tabs_->setCurrentIndex(1);
    text_->setFocus();
  } else if (point == "unit") {
    tabs_->setCurrentIndex(2);
    rig_->setFocus();
  } else {
    roles_->focusOn(point);
  }
}

void ColumnsWindow::showPreview() {
  rows_->show(preview_, draft_);
  roles_->show(draft_, preview_);
  text_->show(draft_, preview_);
  rig_->show(draft_, preview_);
  table_->resizeColumnsToContents();
  for (int i = 0; i < rows_->columnCount(); ++i) {
    table_->setColumnWidth(i, std::clamp(table_->columnWidth(i), narrowest, widest));
  }
  if (preview_.reading && !preview_.reading->source.headerRows.empty()) {
    const int row = rows_->rowOfLine(preview_.reading->source.headerRows.front());
    table_->scrollTo(rows_->index(std::max(row, 0), 0), QAbstractItemView::PositionAtTop);
  }
  sayPreview();
}

void ColumnsWindow::say(const QString& text, const char* level) {
  said_->setText(breakable(text));
  said_->setProperty("level", level);
  said_->style()->unpolish(said_);
  said_->style()->polish(said_);
}

// The most pressing thing: what can't be read, what is asked, what can't be measured, or all well.
void ColumnsWindow::sayPreview() {
  const auto known = std::ranges::find(profiles_, rigName(), &RigProfile::name);
  const bool replaces = keep_->isChecked() && known != profiles_.end() &&
                        !known->signature.empty() && !preview_.signature.empty() &&
                        known->signature != preview_.signature;
  quiet_->setText(replaces ? tr("Its other file layout is forgotten.") : QString());
  if (!refusal_.isEmpty()) return say(refusal_, "warning");
  if (preview_.problem) return say(sentenceText(*preview_.problem), "warning");
  if (!preview_.reading) return say(tr("The file is being read."), "note");
  const QString asked = questionsText(*preview_.reading);
  if (!asked.isEmpty()) return say(asked, "warning");
  if (preview_.unmeasured) return say(sentenceText(*preview_.unmeasured), "warning");
  for (const Remark& remark : preview_.reading->remarks) {
    if (remark.severity == Severity::Warning) {
      return say(sentenceText(remark) + QLatin1Char(' ') + hintText(remark), "note");
    }
  }
  say(tr("The file is understood. Look whether the columns are what they are taken for."), "note");
}

void ColumnsWindow::chooseRig(int row) {
  if (row < 0 || row >= static_cast<int>(profiles_.size())) return;
  const ReadOptions text = draft_.text;
  draft_ = draftOf(profiles_[static_cast<std::size_t>(row)], {});
  draft_.text = text;
  preview();
}

void ColumnsWindow::setRigName(const std::string& name) {
  if (!name.empty()) name_->setEditText(QString::fromStdString(name));
}

std::string ColumnsWindow::rigName() const { return name_->currentText().trimmed().toStdString(); }

std::optional<Remembered> ColumnsWindow::toRemember() const {
  if (!keep_->isChecked() || !preview_.reading) return std::nullopt;
  return remembered(draft_, preview_.reading->source, rigName(), preview_.signature);
}

void ColumnsWindow::confirm() {
  if (!whole_ && refusal_.isEmpty()) {
    wantsConfirm_ = true;  // what was typed last must be read first
    return;
  }
  sayPreview();
  if (!refusal_.isEmpty() || !preview_.reading || stops(*preview_.reading)) return;
  if (keep_->isChecked() && rigName().empty()) {
    name_->setFocus();
    return say(tr("Give the rig a name, or do not remember its layout."), "warning");
  }
  if (!keep_->isChecked() && needsProfile(draft_)) {
    keep_->setFocus();
    return say(tr("Calibration, delay and load cell belong to a rig: remember the layout for one."),
               "warning");
  }
  const auto kept = toRemember();
  emit confirmed(kept ? ColumnsConfirmed{kept->answers, kept->rig}
                      : ColumnsConfirmed{answersOf(draft_), std::nullopt});
  accept();
}

}  // namespace dampwright
