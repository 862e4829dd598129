// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/session_sheet.h"

#include "ui/sheet/workshop_settings.h"

namespace dampwright {

Result<SheetContent> sheetOf(const Session& session) {
  const Job& job = session.job();
  const auto phaseResult = [&](std::size_t item, std::size_t phase) {
    const JobItem& damper = job.items[item];
    const PhaseState& state =
        session.state({QString::fromStdString(damper.corner), static_cast<int>(phase)});
    return SheetPhase{damper.phases[phase], state.measured, state.verdict, state.problem};
  };
  const auto bytesOf = [&](const std::string& sha256) { return session.bytesOfRun(sha256); };
  return sheetContent(job, keptWorkshop(), phaseResult, bytesOf);
}

}  // namespace dampwright
