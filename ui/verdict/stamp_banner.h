// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>

#include "core/verdict/verdict.h"

namespace dampwright {

/// The verdict as a large stamp.
class StampBanner : public QWidget {
 public:
  explicit StampBanner(QWidget* parent = nullptr);

  void setWord(VerdictWord word);
  VerdictWord word() const { return word_; }
  QSize sizeHint() const override { return {300, 64}; }

 protected:
  void paintEvent(QPaintEvent* event) override;

 private:
  VerdictWord word_ = VerdictWord::NotTested;
};

}  // namespace dampwright
