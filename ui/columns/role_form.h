// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QLabel>
#include <QWidget>
#include <array>

#include "ui/columns/columns_preview.h"

class QComboBox;
class QGridLayout;
class QLineEdit;

namespace dampwright {

/// Which column is what, in which unit, of which sign.
class RoleForm : public QWidget {
  Q_OBJECT
 public:
  explicit RoleForm(QWidget* parent = nullptr);

  void show(const ColumnsDraft& draft, const ColumnsPreview& preview);
  void focusOn(const std::string& openPoint);  ///< to what answers it

 signals:
  void changed(const dampwright::ColumnsDraft& draft);
  void refused(const QString& why);  ///< what was typed is no number; empty: it is well again

 private:
  struct Line {
    Role role = Role::Other;
    QComboBox *column = nullptr, *unit = nullptr;
    QStringList names;  ///< of the file's columns
  };

  void addLine(QGridLayout& grid, Line& line, const QString& label, const QStringList& units);
  QComboBox* addChoice(QGridLayout& grid, const QString& label, const QStringList& texts);
  void connectChoices();
  void showLine(Line& line);
  void takeRate();
  Source source() const;

  ColumnsDraft draft_;
  std::optional<RunReading> reading_;
  std::array<Line, 5> lines_;
  QLineEdit* rate_;
  QComboBox *rising_, *force_, *zero_;
};

}  // namespace dampwright
