// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/verdict_view.h"

#include <QCoreApplication>
#include <algorithm>

#include "ui/text/check_text.h"
#include "ui/text/names.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

struct Panel {
  Q_DECLARE_TR_FUNCTIONS(VerdictPanel)
};

NoticeAction actionFor(const std::string& code) {
  return code == "direction-assumed" ? NoticeAction::SettleDirection : NoticeAction::None;
}

NoticeView noticeOf(const Remark& remark, const QString& title) {
  return {title,
          sentenceText(remark),
          hintText(remark),
          remark.severity == Severity::Warning,
          actionFor(remark.code),
          0};
}

// The same remark may stand with the run and with the measurement: it is shown once.
void add(std::vector<NoticeView>& notices, NoticeView notice) {
  const bool asks = notice.action == NoticeAction::SettleDirection;
  for (const NoticeView& there : notices) {
    if (there == notice || (asks && there.action == notice.action)) return;
  }
  notices.push_back(std::move(notice));
}

void addProblems(VerdictView& view, const Session& session) {
  const auto& problems = session.dropProblems();
  for (std::size_t i = 0; i < problems.size(); ++i) {
    Error error = problems[i].error;
    error.place.file.clear();  // the title says it
    add(view.notices,
        {problems[i].file,
         sentenceText(error),
         {},
         !problems[i].taken,
         NoticeAction::Dismiss,
         static_cast<int>(i)});
  }
}

void addReasons(VerdictView& view) {
  if (!view.verdict) return;
  for (const Reason& reason : view.verdict->waiting)
    add(view.notices,
        {Panel::tr("To be confirmed"),
         sentenceText(reason.code, reason.values),
         hintText(reason.code, reason.values),
         true,
         actionFor(reason.code),
         0});
  for (const CheckVerdict& check : view.verdict->checks) {
    if (check.verdict == VerdictWord::Pass || check.reason.code.empty()) continue;
    add(view.notices,
        {checkTitle(check.check),
         sentenceText(check.reason.code, check.reason.values),
         hintText(check.reason.code, check.reason.values),
         false,
         actionFor(check.reason.code),
         0});
  }
}

void addRemarks(VerdictView& view, const Measurement& measurement) {
  for (const Severity severity : {Severity::Warning, Severity::Note}) {
    for (const MeasuredRun& run : measurement.runs) {
      const QString file = QString::fromStdString(run.source.file.name);
      for (const Remark& remark : run.remarks) {
        if (remark.severity == severity) add(view.notices, noticeOf(remark, file));
      }
    }
    for (const Remark& remark : measurement.remarks) {
      if (remark.severity == severity) add(view.notices, noticeOf(remark, {}));
    }
  }
}

QString damperTitle(const Job& job, const PhaseKey& key) {
  const std::string corner = key.corner.toStdString();
  QString title = cornerName(corner);
  for (const JobItem& item : job.items) {
    if (item.corner == corner && !item.damper.serial.empty())
      title += QStringLiteral(" · ") + QString::fromStdString(item.damper.serial);
  }
  return title;
}

}  // namespace

VerdictView verdictView(const Session& session) {
  VerdictView view;
  view.hasJob = session.hasJob();
  view.known = session.knownLimits();
  addProblems(view, session);
  if (!view.hasJob) return view;
  const PhaseKey key = session.selected();
  const PhaseState& state = session.state(key);
  view.damper = damperTitle(session.job(), key);
  view.chosen = session.job().limits;
  view.busy = state.busy;
  view.measured = state.measured != nullptr;
  view.broken = state.problem.has_value();
  view.printable = isPrintable(session.job());
  view.verdict = state.verdict;
  if (state.problem)
    add(view.notices, {{}, sentenceText(*state.problem), {}, true, NoticeAction::None, 0});
  addReasons(view);
  if (state.measured) addRemarks(view, state.measured->measurement);
  return view;
}

bool isPrintable(const Job& job) {
  return std::any_of(
      job.items.begin(), job.items.end(), [](const JobItem& item) { return !item.phases.empty(); });
}

QString verdictLine(const VerdictView& view) {
  if (view.busy && !view.measured) return Panel::tr("The run is being measured.");
  if (view.broken) return Panel::tr("This run could not be measured.");
  if (!view.measured) return Panel::tr("No run yet. Drop its files on the corner.");
  if (!view.chosen) return Panel::tr("Choose limits to get a verdict.");
  return view.verdict ? verdictSummary(*view.verdict) : QString();
}

}  // namespace dampwright
