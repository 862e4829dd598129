// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>

#include "ui/columns/columns_preview.h"

class QComboBox;
class QFormLayout;
class QSpinBox;

namespace dampwright {

/// How the text of the file is written: encoding, delimiter, decimal mark, header row. What nobody
/// has chosen is found, and the form says as what.
class TextForm : public QWidget {
  Q_OBJECT
 public:
  explicit TextForm(QWidget* parent = nullptr);

  void show(const ColumnsDraft& draft, const ColumnsPreview& preview);

 signals:
  void changed(const dampwright::ColumnsDraft& draft);

 private:
  QComboBox* addChoice(QFormLayout& form,
                       const QString& label,
                       const QStringList& values,
                       std::optional<std::string> ReadOptions::*answer,
                       std::optional<std::string> RigProfile::*kept);

  ColumnsDraft draft_;
  QComboBox *encoding_, *delimiter_, *decimal_;
  QSpinBox* headerRow_;
};

}  // namespace dampwright
