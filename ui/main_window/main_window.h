// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QMainWindow>
#include <functional>

#include "ui/session/session.h"

class QLabel;
class QStackedWidget;

namespace dampwright {

class Actions;
enum class ActionId;
class ColumnsDesk;
class JobPage;
class RigOffers;
class StartPage;
class TopBar;

/// The window: start page or job page under the top bar, the menu, and what needs a dialog. Files
/// may be dropped anywhere on it.
class MainWindow : public QMainWindow {
  Q_OBJECT
 public:
  explicit MainWindow(Session& session, QWidget* parent = nullptr);
  ~MainWindow() override;

  const Actions& actions() const { return *actions_; }
  JobPage* jobPage() const { return jobPage_; }
  StartPage* startPage() const { return startPage_; }
  const ColumnsDesk& columns() const { return *columns_; }
  RigOffers& rigOffers() const { return *offers_; }
  void openFiles(const QStringList& files);  ///< as if dropped on the window
  /// The cautions, unless somebody here has read them before.
  void showSafetyOnce();

 protected:
  void changeEvent(QEvent* event) override;
  void closeEvent(QCloseEvent* event) override;
  void dragEnterEvent(QDragEnterEvent* event) override;
  void dragLeaveEvent(QDragLeaveEvent* event) override;
  void dropEvent(QDropEvent* event) override;

 private:
  void build();
  void connectActions();
  void connectEditActions();
  void connectSession();
  void on(ActionId id, const std::function<void()>& does);
  void refresh();
  void showStartPage();
  void showJobPage();
  void startNewJob(const QStringList& filesToAdd);
  void takeFiles(const QStringList& files, const QString& corner);
  void editJob();
  void editDamper(const QString& corner);
  void showSheet();

  Session& session_;
  Actions* actions_;
  TopBar* top_;
  QLabel *trouble_, *promise_;
  QStackedWidget* pages_;
  StartPage* startPage_;
  JobPage* jobPage_;
  ColumnsDesk* columns_;
  RigOffers* offers_;
};

}  // namespace dampwright
