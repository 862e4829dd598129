// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/corner_view.h"

#include <QCoreApplication>

#include "ui/text/names.h"
#include "ui/text/numbers.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

struct Corners {
  Q_DECLARE_TR_FUNCTIONS(Corners)
};

QString measuredDetail(const Measurement& measurement) {
  int speeds = 0;
  std::optional<double> warmest;
  for (const MeasuredBlock& measured : measurement.blocks) {
    if (measured.block.kind != BlockKind::Hold) ++speeds;
    const auto temperature = measured.block.temperature;
    if (temperature && (!warmest || *temperature > *warmest)) warmest = temperature;
  }
  QString text = speeds == 1 ? Corners::tr("1 speed") : Corners::tr("%1 speeds").arg(speeds);
  if (warmest) text += QStringLiteral(" · ") + quantityText(*warmest, Quantity::Temperature);
  return text;
}

PhaseView phaseView(const JobPhase& phase, const DamperCard& damper, const PhaseState& state) {
  PhaseView view;
  view.title = phaseTitle(phase, damper);
  for (const JobRun& run : phase.runs) view.files << QString::fromStdString(run.file);
  view.busy = state.busy;
  view.broken = state.problem.has_value();
  if (state.verdict) view.verdict = state.verdict->word;
  if (state.measured) {
    view.detail = measuredDetail(state.measured->measurement);
  } else if (state.problem) {
    view.detail = sentenceText(*state.problem);
  } else {
    view.detail = state.busy ? Corners::tr("being measured") : Corners::tr("no run yet");
  }
  return view;
}

void takePhases(CornerView& view, const JobItem& item, const Session& session) {
  for (std::size_t i = 0; i < item.phases.size(); ++i) {
    const PhaseKey key{QString::fromStdString(view.corner), static_cast<int>(i)};
    const PhaseState& state = session.state(key);
    view.phases.push_back(phaseView(item.phases[i], item.damper, state));
    view.phases.back().selected = key == session.selected();
    view.busy = view.busy || state.busy;
    if (state.busy) view.progress = state.progress;
  }
  if (view.phases.empty()) return;
  view.verdict = view.phases.back().verdict;
  view.broken = view.phases.back().broken;
}

}  // namespace

const CornerView* CornersView::find(const QString& corner) const {
  for (const CornerView& view : corners) {
    if (QString::fromStdString(view.corner) == corner) return &view;
  }
  return nullptr;
}

CornersView cornersView(const Session& session) {
  CornersView view;
  if (!session.hasJob()) return view;
  const Job& job = session.job();
  view.kind = job.kind;
  view.selected = session.selected();
  for (const std::string& corner : cornersOf(job.kind)) {
    CornerView place;
    place.corner = corner;
    place.name = cornerName(corner);
    place.selected = QString::fromStdString(corner) == view.selected.corner;
    for (const JobItem& item : job.items) {
      if (item.corner != corner) continue;
      place.serial = QString::fromStdString(item.damper.serial);
      takePhases(place, item, session);
    }
    view.corners.push_back(place);
  }
  return view;
}

}  // namespace dampwright
