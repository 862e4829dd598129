// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/vehicle_view.h"

#include <QPainter>

#include "ui/corners/corner_place.h"
#include "ui/look/palette.h"
#include "ui/look/vehicle_plan.h"

namespace dampwright {

namespace {

constexpr int partWidth = 236;  // of the part less its margins

}  // namespace

VehicleView::VehicleView(QWidget* parent) : QWidget(parent) {
  setSizePolicy(QSizePolicy::Expanding, QSizePolicy::Fixed);
}

QSize VehicleView::sizeHint() const {
  switch (view_.kind) {
    case VehicleKind::Car:
      return {partWidth, 256};
    case VehicleKind::Motorcycle:
      return {partWidth, 228};
    case VehicleKind::SingleDamper:
      return {partWidth, 112};
  }
  return {partWidth, 256};
}

void VehicleView::setView(const CornersView& view) {
  const bool otherPlaces = view.kind != view_.kind || view.corners.size() != places_.size();
  view_ = view;
  if (otherPlaces) rebuild();
  for (std::size_t i = 0; i < places_.size(); ++i) places_[i]->setView(view_.corners[i]);
  update();
}

void VehicleView::rebuild() {
  for (CornerPlace* place : places_) {
    place->hide();
    place->deleteLater();  // it may be in the middle of its own event
  }
  places_.clear();
  for (const CornerView& corner : view_.corners) {
    auto* place = new CornerPlace(this);
    const QString key = QString::fromStdString(corner.corner);
    connect(place, &QAbstractButton::clicked, this, [this, key] { emit cornerPicked(key); });
    connect(place, &CornerPlace::filesDropped, this, [this, key](const QStringList& files) {
      emit filesDropped(files, key);
    });
    places_.push_back(place);
    place->setVisible(true);
  }
  updateGeometry();
  layOut();
}

CornerPlace* VehicleView::place(const QString& corner) const {
  for (std::size_t i = 0; i < places_.size(); ++i) {
    if (QString::fromStdString(view_.corners[i].corner) == corner) return places_[i];
  }
  return nullptr;
}

void VehicleView::takeFocus() {
  CornerPlace* selected = place(view_.selected.corner);
  if (selected == nullptr && !places_.empty()) selected = places_.front();
  if (selected != nullptr) selected->setFocus(Qt::ShortcutFocusReason);
}

void VehicleView::layOut() {
  if (places_.empty()) return;
  const QSizeF card = places_.front()->sizeHint();
  const auto spots = vehiclePlaces(view_.kind, rect(), card);
  for (std::size_t i = 0; i < places_.size() && i < spots.size(); ++i)
    places_[i]->setGeometry(spots[i].card.toAlignedRect());
}

void VehicleView::resizeEvent(QResizeEvent*) { layOut(); }

void VehicleView::paintEvent(QPaintEvent*) {
  if (places_.empty()) return;
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  paintVehicle(painter, view_.kind, rect(), places_.front()->sizeHint(), paletteFor(palette()));
}

}  // namespace dampwright
