// SPDX-License-Identifier: GPL-3.0-or-later
#include <QApplication>
#include <QDir>
#include <QFileInfo>
#include <cstdio>
#include <memory>

#include "app/gui_options.h"
#include "app/sheet_command.h"
#include "app/unattended.h"
#include "ui/main_window/main_window.h"
#include "ui/main_window/theme.h"
#include "ui/session/session.h"

namespace dampwright {
namespace {

void nameApplication() {
  QCoreApplication::setApplicationName(QStringLiteral("dampwright"));
  QCoreApplication::setOrganizationName(QStringLiteral("dampwright"));
  QCoreApplication::setApplicationVersion(QStringLiteral(DAMPWRIGHT_VERSION));
}

// Help, version and wrong usage need no display, so they are settled before there is a window.
ParsedOptions parse(int count, char** arguments) {
  const QCoreApplication application(count, arguments);
  return parseOptions(QCoreApplication::arguments());
}

// What the start brings in, once the book is read.
void begin(Session& session, MainWindow& window, const GuiOptions& options) {
  const bool firstStart = !session.hasJob() && session.recentJobs().empty();
  if (options.demonstration || (firstStart && options.files.isEmpty())) session.openDemonstration();
  if (options.files.isEmpty()) return;
  if (options.unattended() && !session.hasJob()) session.startJob({});
  window.openFiles(options.files);
}

int runWindow(int count, char** arguments, const GuiOptions& options) {
  if (options.unattended() && qEnvironmentVariableIsEmpty("QT_QPA_PLATFORM"))
    qputenv("QT_QPA_PLATFORM", "offscreen");
  QApplication application(count, arguments);
  QApplication::setApplicationDisplayName(QStringLiteral("Dampwright"));
  QGuiApplication::setDesktopFileName(QStringLiteral("dampwright"));
  applyTheme(options.unattended() ? Theme::Light : keptTheme());
  QDir().mkpath(QFileInfo(options.book).absolutePath());
  Session session(options.book, options.sampleRuns);
  MainWindow window(session);
  std::unique_ptr<Unattended> unattended;
  QObject::connect(&session, &Session::bookRead, &window, [&] {
    begin(session, window, options);
    if (options.unattended())
      unattended = std::make_unique<Unattended>(session, window, options);
    else
      window.showSafetyOnce();
  });
  window.show();
  return QApplication::exec();
}

int run(int count, char** arguments) {
  nameApplication();
  if (asksForSheet(count, arguments)) return runSheetCommand(count, arguments);
  const ParsedOptions parsed = parse(count, arguments);
  if (!parsed.leave) return runWindow(count, arguments, parsed.options);
  std::fputs(qPrintable(parsed.output), parsed.status == 0 ? stdout : stderr);
  return parsed.status;
}

}  // namespace
}  // namespace dampwright

int main(int count, char** arguments) { return dampwright::run(count, arguments); }
