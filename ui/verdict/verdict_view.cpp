// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/verdict_view.h"

#include <QCoreApplication>
#include <algorithm>
#include <map>

#include "ui/text/check_text.h"
#include "ui/text/names.h"
#include "ui/text/questions.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

struct Panel {
  Q_DECLARE_TR_FUNCTIONS(VerdictPanel)
};

// What one choice of the technician mends; a load cell that was too small stays too small.
NoticeAction actionFor(const std::string& code) {
  static const std::map<std::string, NoticeAction> actions = {
      {"direction-assumed", NoticeAction::SettleDirection},
      {"force-sign-reversed", NoticeAction::TurnForceSign},
      {"unit-assumed", NoticeAction::ConfirmUnits},
      {"velocity-disagrees", NoticeAction::Columns},
      {"uneven-clock", NoticeAction::Columns},
      {"clock-restarts", NoticeAction::Columns},
      {"bad-stamps", NoticeAction::Columns},
      {"repeated-stamps", NoticeAction::Columns},
      {"unreadable-cells", NoticeAction::Columns},
      {"thousands-marks", NoticeAction::Columns},
      {"rig-column-missing", NoticeAction::Columns}};
  const auto found = actions.find(code);
  return found == actions.end() ? NoticeAction::None : found->second;
}

QString unitIn(const Remark& remark) {
  for (const NamedValue& value : remark.values) {
    const auto* words = std::get_if<std::string>(&value.value);
    if (value.name == "unit" && words != nullptr) return QString::fromStdString(*words);
  }
  return {};
}

NoticeView noticeOf(const Remark& remark, const QString& title, int run) {
  return {title,
          sentenceText(remark),
          hintText(remark),
          remark.severity == Severity::Warning,
          actionFor(remark.code),
          0,
          run,
          unitIn(remark)};
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
    for (std::size_t i = 0; i < measurement.runs.size(); ++i) {
      const MeasuredRun& run = measurement.runs[i];
      const QString file = QString::fromStdString(run.source.file.name);
      for (const Remark& remark : run.remarks) {
        if (remark.severity == severity)
          add(view.notices, noticeOf(remark, file, static_cast<int>(i)));
      }
    }
    for (const Remark& remark : measurement.remarks) {
      if (remark.severity == severity) add(view.notices, noticeOf(remark, {}, 0));
    }
  }
}

// A run that asks first keeps its phase from being measured; so does one that can't be read as its
// profile or its answers say, which the columns window may mend too.
void addQuestions(VerdictView& view, const Session& session) {
  const PhaseKey key = session.selected();
  const PhaseState& state = session.state(key);
  if (!state.problem) return;
  if (state.problem->code != "open-points") {
    const std::string& file = state.problem->place.file;
    int at = -1;
    for (int i = 0; session.run({key, i}) != nullptr; ++i) {
      if (session.run({key, i})->file == file) at = i;
    }
    const NoticeAction action = at < 0 ? NoticeAction::None : NoticeAction::Columns;
    add(view.notices, {{}, sentenceText(*state.problem), {}, true, action, 0, std::max(at, 0), {}});
    return;
  }
  for (int i = 0; session.run({key, i}) != nullptr; ++i) {
    const auto reading = session.reading({key, i});
    if (!reading || reading->trace) continue;
    add(view.notices,
        {QString::fromStdString(session.run({key, i})->file),
         questionsText(*reading),
         {},
         true,
         NoticeAction::Columns,
         0,
         i,
         {}});
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
  addQuestions(view, session);
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
