// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/gui_options.h"

#include <QCommandLineParser>
#include <QCoreApplication>
#include <QDir>
#include <QStandardPaths>

namespace dampwright {

namespace {

constexpr int wrongUsage = 64;

// Beside the program where it was installed, else in the tree that it was built from.
QString defaultSampleRuns() {
  const QDir installed(QCoreApplication::applicationDirPath() +
                       QStringLiteral("/../share/dampwright/sample_runs"));
  return installed.exists() ? installed.canonicalPath() : QStringLiteral(DAMPWRIGHT_SAMPLE_RUNS);
}

QString defaultBook() {
  return QStandardPaths::writableLocation(QStandardPaths::AppDataLocation) +
         QStringLiteral("/job_book.sqlite");
}

QCommandLineOption withValue(const char* name, const char* text, const char* value) {
  return {QString::fromLatin1(name), QString::fromLatin1(text), QString::fromLatin1(value)};
}

ParsedOptions leaveWith(int status, const QString& output) { return {{}, true, status, output}; }

}  // namespace

// Options and help are English, as the batch program's.
ParsedOptions parseOptions(const QStringList& arguments) {
  const QCommandLineOption help({QStringLiteral("h"), QStringLiteral("help")},
                                QStringLiteral("Show this help."));
  const QCommandLineOption version({QStringLiteral("v"), QStringLiteral("version")},
                                   QStringLiteral("Show the version."));
  const QCommandLineOption demonstration(QStringLiteral("demonstration"),
                                         QStringLiteral("Open the invented demonstration job."));
  const QCommandLineOption book = withValue("book", "Job book to use.", "file");
  const QCommandLineOption samples = withValue("samples", "Folder of the sample runs.", "folder");
  const QCommandLineOption picture = withValue(
      "picture", "Write a picture of the window when all work is done, then leave.", "png");
  const QCommandLineOption sheet =
      withValue("sheet", "Write the open job's sheet when all work is done, then leave.", "pdf");
  QCommandLineParser parser;
  parser.setApplicationDescription(QStringLiteral(
      "Dampwright judges vehicle dampers from their run files.\n"
      "\"dampwright sheet FILE... --limits LIMITS --pdf OUT\" writes a sheet without a window; see "
      "\"dampwright sheet --help\"."));
  parser.addOptions({help, version, demonstration, book, samples, picture, sheet});
  parser.addPositionalArgument(QStringLiteral("files"),
                               QStringLiteral("Run files, limit sheets, damper cards to drop in."),
                               QStringLiteral("[files...]"));
  if (!parser.parse(arguments))
    return leaveWith(wrongUsage,
                     QStringLiteral("dampwright: ") + parser.errorText() +
                         QStringLiteral("\nTry \"dampwright --help\".\n"));
  if (parser.isSet(version))
    return leaveWith(0, QStringLiteral("dampwright " DAMPWRIGHT_VERSION "\n"));
  if (parser.isSet(help)) return leaveWith(0, parser.helpText());
  GuiOptions options;
  options.demonstration = parser.isSet(demonstration);
  options.book = parser.isSet(book) ? parser.value(book) : defaultBook();
  options.sampleRuns = parser.isSet(samples) ? parser.value(samples) : defaultSampleRuns();
  options.picture = parser.value(picture);
  options.sheet = parser.value(sheet);
  for (const QString& file : parser.positionalArguments())
    options.files << QDir::current().absoluteFilePath(file);
  return {options, false, 0, {}};
}

}  // namespace dampwright
