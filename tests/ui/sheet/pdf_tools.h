// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <gtest/gtest.h>

#include <QDir>
#include <QFile>
#include <QProcess>
#include <QString>
#include <QStringList>
#include <QTemporaryDir>

namespace dampwright {

// What other programs (poppler-utils) find in a PDF.

inline QString outputOf(const QString& program, const QStringList& arguments) {
  QProcess process;
  process.start(program, arguments);
  EXPECT_TRUE(process.waitForFinished(60000)) << program.toStdString();
  EXPECT_EQ(process.exitCode(), 0) << process.readAllStandardError().toStdString();
  return QString::fromUtf8(process.readAllStandardOutput());
}

/// Ligatures and unbroken spaces taken apart, runs of blanks as one.
inline QString plainText(const QString& text) {
  return text.normalized(QString::NormalizationForm_KC).simplified();
}

inline QString pdfText(const QString& path) {
  return plainText(outputOf(QStringLiteral("pdftotext"),
                            {QStringLiteral("-layout"), path, QStringLiteral("-")}));
}

inline QString pdfPageText(const QString& path, int page) {
  const QString number = QString::number(page);
  return plainText(outputOf(QStringLiteral("pdftotext"),
                            {QStringLiteral("-layout"),
                             QStringLiteral("-f"),
                             number,
                             QStringLiteral("-l"),
                             number,
                             path,
                             QStringLiteral("-")}));
}

/// A line of pdfinfo: "Pages", "Page size" …
inline QString pdfFact(const QString& path, const QString& name) {
  for (const QString& line : outputOf(QStringLiteral("pdfinfo"), {path}).split(QLatin1Char('\n'))) {
    if (line.startsWith(name + QLatin1Char(':'))) return line.mid(name.size() + 1).trimmed();
  }
  return {};
}

inline QByteArray bytesOfFile(const QString& path) {
  QFile file(path);
  EXPECT_TRUE(file.open(QIODevice::ReadOnly)) << path.toStdString();
  return file.readAll();
}

}  // namespace dampwright
