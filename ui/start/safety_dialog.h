// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QDialog>

namespace dampwright {

/// The cautions, at the first start and whenever asked for.
class SafetyDialog : public QDialog {
  Q_OBJECT
 public:
  explicit SafetyDialog(QWidget* parent = nullptr);
};

}  // namespace dampwright
