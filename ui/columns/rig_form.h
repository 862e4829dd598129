// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>
#include <vector>

#include "ui/columns/columns_preview.h"

class QFormLayout;
class QLineEdit;

namespace dampwright {

struct RigField;

/// What is known of the rig besides its files: calibration, force delay, moving mass, load cell and
/// the limits of error of its certificates.
class RigForm : public QWidget {
  Q_OBJECT
 public:
  explicit RigForm(QWidget* parent = nullptr);

  void show(const ColumnsDraft& draft, const ColumnsPreview& preview);

 signals:
  void changed(const dampwright::ColumnsDraft& draft);
  void refused(const QString& why);  ///< what was typed can't be; empty: it is well again
  void saveWanted();                 ///< the profile as a file
  void openWanted();

 private:
  void addField(QFormLayout& form, const RigField& field);
  void take(const RigField& field, QLineEdit& edit);

  ColumnsDraft draft_;
  Source source_;
  std::vector<QLineEdit*> edits_;  ///< in the order of rigFields()
};

}  // namespace dampwright
