// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QObject>
#include <functional>

#include "ui/rig_folder/rig_folder.h"
#include "ui/session/session.h"

class QWidget;

namespace dampwright {

class OfferBar;

/// The watched rig folder and the line that offers its new files: what is taken is handed to `take`
/// as if it had been dropped, and neither that nor what is left is offered again.
class RigOffers : public QObject {
  Q_OBJECT
 public:
  RigOffers(Session& session,
            std::function<void(const QStringList& files)> take,
            QObject* parent = nullptr);

  OfferBar* bar() const { return bar_; }
  RigFolder& folder() { return folder_; }
  /// Asks for the folder to watch, or, while one is watched, whether to go on with it.
  void choose(QWidget* parent);

 private:
  void settle(const std::vector<OfferedFile>& offers);

  Session& session_;
  std::function<void(const QStringList& files)> take_;
  OfferBar* bar_;
  RigFolder folder_;
};

}  // namespace dampwright
