// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QDialog>

#include "core/job/job.h"

class QLineEdit;
class QPlainTextEdit;

namespace dampwright {

class ElidedComboBox;

/// Customer, vehicle, plate, technician and notes of a job. For a new job also the kind of vehicle;
/// for a job that has one it stays as it is, because its runs belong to its corners.
class JobDialog : public QDialog {
  Q_OBJECT
 public:
  enum class Use { NewJob, Details };
  JobDialog(Use use, const Job& job, QWidget* parent = nullptr);

  Job job() const;  ///< what was given, with what was typed and chosen

 private:
  Job job_;
  ElidedComboBox* kind_;
  QLineEdit *customer_, *vehicle_, *plate_, *technician_;
  QPlainTextEdit* notes_;
};

}  // namespace dampwright
