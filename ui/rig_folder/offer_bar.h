// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QFrame>
#include <vector>

#include "ui/rig_folder/rig_folder.h"

class QPushButton;

namespace dampwright {

class ElidedLabel;

/// A line that offers what has come into the rig folder. Hidden while there is nothing.
class OfferBar : public QFrame {
  Q_OBJECT
 public:
  explicit OfferBar(QWidget* parent = nullptr);

  void setOffers(const std::vector<OfferedFile>& offers);

 signals:
  void taken(const std::vector<dampwright::OfferedFile>& offers);
  void left(const std::vector<dampwright::OfferedFile>& offers);

 private:
  std::vector<OfferedFile> offers_;
  ElidedLabel* what_;
  QPushButton *take_, *leave_;
};

}  // namespace dampwright
