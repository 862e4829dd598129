// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QComboBox>
#include <QLabel>

namespace dampwright {

/// One line that leaves out its middle or end (…) where it has no room; the whole text is then its
/// tooltip, and always what a screen reader reads. Never asks for more width than there is.
class ElidedLabel : public QLabel {
 public:
  explicit ElidedLabel(Qt::TextElideMode mode = Qt::ElideRight, QWidget* parent = nullptr);

  void setWhole(const QString& text);
  const QString& whole() const { return whole_; }

 protected:
  void resizeEvent(QResizeEvent* event) override;

 private:
  void elide();

  Qt::TextElideMode mode_;
  QString whole_;
};

/// The same for a list of choices: the chosen one is elided, the open list shows all in full. It
/// draws its own arrow, which a style sheet takes away from Qt's.
class ElidedComboBox : public QComboBox {
 public:
  explicit ElidedComboBox(QWidget* parent = nullptr);

  void showPopup() override;

 protected:
  void paintEvent(QPaintEvent* event) override;
};

/// Words longer than `most` letters (a checksum, a file name) get places where a line may break.
QString breakable(const QString& text, int most = 24);

}  // namespace dampwright
