// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QByteArray>
#include <QString>
#include <vector>

#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// A file as it is named inside the PDF.
struct NamedAttachment {
  QString name;
  QString mimeType;
  QByteArray bytes;
};

/// What the PDF carries: the content's attachments under names that every file system takes
/// (letters, digits, dot, hyphen, underline; none twice, letter case left aside; at most 100
/// letters), then manifest.json: name, kind, original name, size and SHA-256 of each.
std::vector<NamedAttachment> namedAttachments(const SheetContent& content);

/// A name without folders, blanks, control and odd letters; "file" where nothing is left.
QString sanitisedName(const QString& name);

}  // namespace dampwright
