// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/corner_panel.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QPushButton>
#include <QScrollArea>
#include <QVBoxLayout>

#include "ui/corners/phase_card.h"
#include "ui/corners/vehicle_view.h"
#include "ui/look/elided.h"
#include "ui/look/type.h"

namespace dampwright {

CornerPanel::CornerPanel(QWidget* parent)
    : QFrame(parent),
      vehicle_(new VehicleView),
      heading_(new ElidedLabel(Qt::ElideMiddle)),
      damper_(new QPushButton(tr("Damper…"))),
      add_(new QPushButton(tr("Drop run files here,\nor press to choose them"))) {
  setObjectName(QStringLiteral("card"));
  setFixedWidth(268);
  auto* title = new QLabel(tr("Corners"));
  title->setFont(screenFont(TextSize::Heading));
  heading_->setFont(screenFont(TextSize::Heading));
  damper_->setToolTip(tr("Serial and part number of this damper"));
  add_->setObjectName(QStringLiteral("dropPlace"));
  add_->setMinimumHeight(56);

  auto* runs = new QWidget;
  list_ = new QVBoxLayout(runs);
  list_->setContentsMargins(0, 0, 0, 0);
  list_->setSpacing(6);
  list_->addStretch();
  auto* scroll = new QScrollArea;
  scroll->setWidgetResizable(true);
  scroll->setFrameShape(QFrame::NoFrame);
  scroll->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  scroll->setFocusPolicy(Qt::NoFocus);
  scroll->setWidget(runs);

  auto* row = new QHBoxLayout;
  auto* runsLabel = new QLabel(tr("Runs"));
  runsLabel->setObjectName(QStringLiteral("quiet"));
  row->addWidget(runsLabel, 1);
  row->addWidget(damper_);
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(16, 12, 16, 16);
  column->setSpacing(8);
  column->addWidget(title);
  column->addWidget(vehicle_);
  column->addSpacing(4);
  column->addWidget(heading_);
  column->addLayout(row);
  column->addWidget(scroll, 1);
  column->addWidget(add_);

  connect(vehicle_, &VehicleView::cornerPicked, this, [this](const QString& corner) {
    const CornerView* picked = view_.find(corner);
    const int newest = picked == nullptr ? 0 : static_cast<int>(picked->phases.size()) - 1;
    emit selectWanted({corner, std::max(newest, 0)});
  });
  connect(vehicle_, &VehicleView::filesDropped, this, &CornerPanel::filesDropped);
  connect(
      damper_, &QPushButton::clicked, this, [this] { emit damperWanted(view_.selected.corner); });
  connect(add_, &QPushButton::clicked, this, [this] { emit addRunsWanted(view_.selected.corner); });
}

void CornerPanel::setView(const CornersView& view) {
  view_ = view;
  vehicle_->setView(view);
  const bool selected = view.find(view.selected.corner) != nullptr;
  heading_->setWhole(selectedHeading());
  damper_->setEnabled(selected);
  add_->setEnabled(selected);
  showPhases(view.find(view.selected.corner));
}

QString CornerPanel::selectedHeading() const {
  const CornerView* corner = view_.find(view_.selected.corner);
  if (corner == nullptr) return tr("No corner selected");
  return corner->serial.isEmpty() ? corner->name
                                  : corner->name + QStringLiteral(" · ") + corner->serial;
}

void CornerPanel::showPhases(const CornerView* corner) {
  const std::size_t count = corner == nullptr ? 0 : corner->phases.size();
  while (cards_.size() > count) {
    cards_.back()->hide();
    cards_.back()->deleteLater();
    cards_.pop_back();
  }
  while (cards_.size() < count) addPhaseCard(static_cast<int>(cards_.size()));
  std::vector<std::pair<QString, QString>> others;
  for (const CornerView& other : view_.corners) {
    if (&other != corner) others.emplace_back(QString::fromStdString(other.corner), other.name);
  }
  for (std::size_t i = 0; i < count; ++i) {
    cards_[i]->setView(corner->phases[i]);
    cards_[i]->setOtherCorners(others);
  }
}

void CornerPanel::addPhaseCard(int phase) {
  auto* card = new PhaseCard;
  const auto key = [this, phase] { return PhaseKey{view_.selected.corner, phase}; };
  connect(card, &QAbstractButton::clicked, this, [this, key] { emit selectWanted(key()); });
  connect(card, &PhaseCard::removeWanted, this, [this, key](int run) {
    emit removeWanted(key(), run);
  });
  connect(card, &PhaseCard::moveWanted, this, [this, key](const QString& corner) {
    emit moveWanted(key(), corner);
  });
  list_->insertWidget(list_->count() - 1, card);
  cards_.push_back(card);
}

}  // namespace dampwright
