// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <gtest/gtest.h>

#include <QFile>
#include <QSignalSpy>
#include <QTemporaryDir>
#include <QTest>
#include <cmath>
#include <memory>
#include <string>
#include <utility>
#include <vector>

#include "core/base/units.h"
#include "ui/session/session.h"

namespace dampwright {

inline constexpr int patience = 120'000;  // ms, only ever waited out by a failure

inline QString sampleRuns() { return QStringLiteral(DAMPWRIGHT_SOURCE_DIR "/sample_runs"); }
inline QString sample(const QString& name) { return sampleRuns() + "/" + name; }

/// A run file of a purely viscous damper, 2000 N·s/m, with `gas` [N]: a sine of 50 mm at 1.6 Hz,
/// sampled at 2 kHz.
inline QByteArray viscousRun(int rows, double gas) {
  QByteArray bytes = "Time (s),Position (mm),Load (N)\n";
  for (int i = 0; i < rows; ++i) {
    const double t = i / 2000.0;
    const double phase = 2 * pi * 1.6 * t;
    const double force = gas + 2000 * 0.025 * 2 * pi * 1.6 * std::cos(phase);
    for (const auto& [value, digits] : {std::pair(t, 4), std::pair(25 * std::sin(phase), 3)}) {
      bytes += QByteArray::number(value, 'f', digits) + ',';
    }
    bytes += QByteArray::number(force, 'f', 1) + '\n';
  }
  return bytes;
}

/// A session on a book of its own, which a test may close and open again.
class ASession : public testing::Test {
 protected:
  void SetUp() override { start(); }

  void start() {
    session = std::make_unique<Session>(book(), sampleRuns());
    settle();
  }
  void restart() {
    session.reset();
    start();
  }
  void settle() const {
    ASSERT_TRUE(QTest::qWaitFor([this] { return !session->busy(); }, patience));
  }
  void drop(const QStringList& paths, const QString& corner = {}) const {
    session->dropFiles(paths, corner);
    settle();
  }
  void startCar() const {
    Job draft;
    draft.customer = "A. Customer";
    draft.vehicle = "invented estate car";
    session->startJob(draft);
    settle();
  }
  QString write(const QString& name, const QByteArray& bytes) const {
    QFile file(folder.filePath(name));
    EXPECT_TRUE(file.open(QIODevice::WriteOnly));
    file.write(bytes);
    return file.fileName();
  }
  std::vector<std::string> problems() const {
    std::vector<std::string> codes;
    for (const DropProblem& problem : session->dropProblems()) codes.push_back(problem.error.code);
    return codes;
  }
  std::vector<std::string> files() const {
    std::vector<std::string> names;
    for (const DropProblem& problem : session->dropProblems())
      names.push_back(problem.file.toStdString());
    return names;
  }
  QString book() const { return folder.filePath("book.sqlite"); }

  QTemporaryDir folder;
  std::unique_ptr<Session> session;
};

}  // namespace dampwright
