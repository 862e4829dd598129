// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QDialog>

#include "ui/background/latest_job.h"
#include "ui/columns/columns_preview.h"

class QCheckBox;
class QComboBox;
class QLabel;
class QPushButton;
class QTabWidget;
class QTableView;

namespace dampwright {

class LoopsView;
class RigForm;
class RoleForm;
class RowsModel;
class TextForm;

/// A run file whose columns are looked at.
struct ColumnsSubject {
  std::string file;  ///< its name
  LoadRun load;
  std::optional<RigProfile> rig;  ///< by which it is read now
  ReadOptions answers;            ///< and what was said of it
};

/// What the technician has confirmed.
struct ColumnsConfirmed {
  ReadOptions answers;            ///< of this run
  std::optional<RigProfile> rig;  ///< to be kept, where the layout is remembered
};

/// The columns of a run file: the first rows with what each column is taken for and why, what can
/// be said otherwise, and what comes of it: the loops and the run. Every change is read at once, in
/// the background; what can't be read is said in place, and the window stays open.
class ColumnsWindow : public QDialog {
  Q_OBJECT
 public:
  ColumnsWindow(ColumnsSubject subject,
                std::vector<RigProfile> profiles,
                QWidget* parent = nullptr);

  const ColumnsDraft& draft() const { return draft_; }
  bool busy() const { return !whole_; }  ///< the newest draft is still being read

  /// The profile as a document of its own, and a profile from one. Errors are said in place.
  void saveProfile(const QString& path);
  void openProfile(const QString& path);

 signals:
  void confirmed(const dampwright::ColumnsConfirmed& what);
  void previewed();  ///< the newest draft was read, whole

 private:
  void build();
  QWidget* buildKeep();
  void connectForms();
  void change(const ColumnsDraft& draft);
  void preview();
  void takeHead(ColumnsPreview head);
  void takeWhole(ColumnsPreview whole);
  void showPreview();
  void focusOnQuestion();
  void say(const QString& text, const char* level);
  void sayPreview();
  void chooseRig(int row);
  void confirm();
  void refuse(const QString& why);
  void askWhereToSave();
  void askWhatToOpen();
  void setRigName(const std::string& name);
  std::string rigName() const;
  std::optional<Remembered> toRemember() const;

  ColumnsSubject subject_;
  std::vector<RigProfile> profiles_;
  ColumnsDraft draft_;
  ColumnsPreview preview_;
  bool whole_ = false, wantsConfirm_ = false, focused_ = false;
  QString refusal_;  ///< what was typed last and can't be
  QLabel *said_, *progress_, *quiet_;
  QTableView* table_;
  QTabWidget* tabs_;
  RowsModel* rows_;
  RoleForm* roles_;
  TextForm* text_;
  RigForm* rig_;
  LoopsView* loops_;
  QCheckBox* keep_;
  QComboBox* name_;
  QPushButton* accept_;
  LatestJob work_;
};

}  // namespace dampwright
