// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/job_page.h"

#include <QHBoxLayout>

#include "ui/corners/corner_panel.h"
#include "ui/plots/loops_view.h"
#include "ui/plots/run_plot.h"
#include "ui/verdict/verdict_panel.h"

namespace dampwright {

JobPage::JobPage(Session& session, QWidget* parent)
    : QWidget(parent),
      session_(session),
      corners_(new CornerPanel),
      loops_(new LoopsView),
      verdict_(new VerdictPanel) {
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(16, 12, 16, 16);
  row->setSpacing(12);
  row->addWidget(corners_);
  row->addWidget(loops_, 1);
  row->addWidget(verdict_);
  connectParts();
  followSession();
  refreshSides();
  refreshLoops();
}

void JobPage::connectParts() {
  connect(corners_, &CornerPanel::selectWanted, &session_, &Session::select);
  connect(corners_, &CornerPanel::filesDropped, &session_, &Session::dropFiles);
  connect(corners_, &CornerPanel::removeWanted, &session_, &Session::removeRun);
  connect(corners_, &CornerPanel::moveWanted, &session_, &Session::moveRuns);
  connect(corners_, &CornerPanel::addRunsWanted, this, &JobPage::addRunsWanted);
  connect(corners_, &CornerPanel::damperWanted, this, &JobPage::damperWanted);
  connect(verdict_, &VerdictPanel::limitsChosen, &session_, &Session::chooseLimits);
  connect(verdict_, &VerdictPanel::limitsFileWanted, this, &JobPage::limitsFileWanted);
  connect(verdict_, &VerdictPanel::dismissed, &session_, &Session::dismissDropProblem);
  connect(verdict_, &VerdictPanel::allDismissed, &session_, &Session::dismissDropProblems);
  connect(verdict_, &VerdictPanel::sheetWanted, this, &JobPage::sheetWanted);
  connect(verdict_, &VerdictPanel::directionSettled, this, [this](Direction direction) {
    session_.settleDirection(session_.selected(), direction);
  });
  connect(verdict_, &VerdictPanel::mendWanted, this, &JobPage::mend);
  connect(loops_->run(), &RunPlot::strikeOutWanted, this, [this](int run, const TimeSpan& span) {
    session_.strikeOut(session_.selected(), run, span);
  });
  connect(loops_->run(), &RunPlot::putBackWanted, this, [this](int run, const TimeSpan& span) {
    session_.putBack(session_.selected(), run, span);
  });
}

void JobPage::mend(NoticeAction action, int run) {
  const RunPlace place{session_.selected(), run};
  if (action == NoticeAction::TurnForceSign) session_.turnForceSign(place);
  if (action == NoticeAction::ConfirmUnits) session_.confirmUnits(place);
  if (action == NoticeAction::Columns) emit columnsWanted(place);
}

void JobPage::followSession() {
  connect(&session_, &Session::jobChanged, this, [this] {
    refreshSides();
    refreshLoops();
  });
  connect(&session_, &Session::selectionChanged, this, [this] {
    refreshSides();
    refreshLoops();
  });
  connect(&session_, &Session::stateChanged, this, [this](const PhaseKey& key) {
    refreshCorners();
    if (key != session_.selected()) return;
    refreshVerdict();
    // The plots keep what is pointed at until there is something else to draw.
    if (!session_.state(key).busy) refreshLoops();
  });
  connect(&session_, &Session::progressChanged, this, &JobPage::refreshCorners);
  connect(&session_, &Session::limitsKnownChanged, this, &JobPage::refreshVerdict);
  connect(&session_, &Session::dropProblemsChanged, this, &JobPage::refreshVerdict);
}

void JobPage::refreshSides() {
  refreshCorners();
  refreshVerdict();
}

void JobPage::refreshCorners() { corners_->setView(cornersView(session_)); }

void JobPage::refreshVerdict() { verdict_->setView(verdictView(session_)); }

void JobPage::refreshLoops() {
  if (!session_.hasJob()) return loops_->setMeasured(nullptr, std::nullopt);
  const PhaseState& state = session_.state(session_.selected());
  loops_->setMeasured(state.measured, state.verdict);
}

}  // namespace dampwright
