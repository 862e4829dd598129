// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QDialog>

#include "core/rig/damper_card.h"

class QLineEdit;

namespace dampwright {

/// Serial and part number of the damper at one corner. A barcode scanner types into the first field
/// and ends with Enter, which goes on to the next field and closes only from the last.
class DamperDialog : public QDialog {
  Q_OBJECT
 public:
  DamperDialog(const QString& cornerName, const DamperCard& card, QWidget* parent = nullptr);

  DamperCard card() const;  ///< what was given, with what was typed

 protected:
  void keyPressEvent(QKeyEvent* event) override;

 private:
  DamperCard card_;
  QLineEdit *serial_, *partNumber_;
};

}  // namespace dampwright
