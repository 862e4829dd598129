// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>
#include <vector>

#include "core/book/job_summary.h"

class QLabel;
class QPushButton;
class QTreeWidget;

namespace dampwright {

/// Where the window stands without a job: recent jobs, a new job, the demonstration.
class StartPage : public QWidget {
  Q_OBJECT
 public:
  explicit StartPage(QWidget* parent = nullptr);

  void takeFocus();  ///< to the recent jobs, or to the new job while there are none
  void setRecentJobs(const std::vector<JobSummary>& jobs);

 signals:
  void newJobWanted();
  void demonstrationWanted();
  void openWanted(const QString& number);

 private:
  QWidget* choice(QPushButton* button, const QString& text);
  void openCurrent();

  QPushButton *newJob_, *demonstration_, *open_;
  QTreeWidget* recent_;
  QLabel* none_;
};

}  // namespace dampwright
