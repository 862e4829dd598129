// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/rig_fields.h"

#include <QCoreApplication>
#include <QDate>

#include "ui/columns/typed_number.h"

namespace dampwright {

namespace {

constexpr double milli = 1e-3;

const RigField fields[] = {
    {QT_TRANSLATE_NOOP("RigForm", "Displacement scale"),
     "×",
     1,
     true,
     CalibrationField{Role::Displacement, &RigColumn::scale}},
    {QT_TRANSLATE_NOOP("RigForm", "Displacement offset"),
     "+",
     1,
     true,
     CalibrationField{Role::Displacement, &RigColumn::offset}},
    {QT_TRANSLATE_NOOP("RigForm", "Force scale"),
     "×",
     1,
     true,
     CalibrationField{Role::Force, &RigColumn::scale}},
    {QT_TRANSLATE_NOOP("RigForm", "Force offset"),
     "+",
     1,
     true,
     CalibrationField{Role::Force, &RigColumn::offset}},
    {QT_TRANSLATE_NOOP("RigForm", "Force delay"), "ms", milli, true, &RigProfile::forceDelay},
    {QT_TRANSLATE_NOOP("RigForm", "Force delay, standard uncertainty"),
     "ms",
     milli,
     false,
     &RigProfile::forceDelayU},
    {QT_TRANSLATE_NOOP("RigForm", "Moving mass"), "kg", 1, false, &RigProfile::movingMass},
    {QT_TRANSLATE_NOOP("RigForm", "Load cell capacity"), "N", 1, false, &LoadCell::capacity},
    {QT_TRANSLATE_NOOP("RigForm", "Load cell error of reading"),
     "%",
     1,
     false,
     &LoadCell::readingPercent},
    {QT_TRANSLATE_NOOP("RigForm", "Load cell error of capacity"),
     "%",
     1,
     false,
     &LoadCell::capacityPercent},
    {QT_TRANSLATE_NOOP("RigForm", "Load cell zero drift"), "N", 1, false, &LoadCell::zeroDrift},
    {QT_TRANSLATE_NOOP("RigForm", "Load cell calibrated"),
     "YYYY-MM-DD",
     1,
     false,
     &LoadCell::calibrated},
    {QT_TRANSLATE_NOOP("RigForm", "Calibration due"), "YYYY-MM-DD", 1, false, &LoadCell::due},
    {QT_TRANSLATE_NOOP("RigForm", "Displacement limit of error"),
     "mm",
     milli,
     false,
     &RigProfile::displacementAccuracy},
    {QT_TRANSLATE_NOOP("RigForm", "Clock limit of error"),
     "%",
     1,
     false,
     &RigProfile::clockAccuracyPercent},
    {QT_TRANSLATE_NOOP("RigForm", "Mounting to mounting"),
     "%",
     1,
     false,
     &RigProfile::remountPercent},
};

template <class... Cases>
struct Overloaded : Cases... {
  using Cases::operator()...;
};
template <class... Cases>
Overloaded(Cases...) -> Overloaded<Cases...>;

QString numberOr(const std::optional<double>& value, double perShown) {
  return value ? typedText(*value / perShown) : QString();
}

double calibration(const CalibrationField& field, const RigProfile& rig) {
  return columnFor(rig, field.role)->value_or(RigColumn{}).*field.value;
}

// Nothing where the text is neither empty nor a number that may be.
std::optional<std::optional<double>> numberOf(const RigField& field, const QString& text) {
  if (text.isEmpty()) return std::optional<double>();
  const auto number = typedNumber(text);
  if (!number || (!field.mayBeNegative && *number < 0)) return std::nullopt;
  return std::optional(*number * field.perShown);
}

std::optional<ColumnsDraft> calibrated(const CalibrationField& field,
                                       const ColumnsDraft& draft,
                                       const Source& source,
                                       const std::optional<double>& number) {
  const bool isScale = field.value == &RigColumn::scale;
  if (isScale && number == 0.0) return std::nullopt;
  RigColumn column = columnFor(draft.rig, field.role)->value_or(RigColumn{});
  column.*field.value = number.value_or(isScale ? 1 : 0);
  return withCalibration(draft, source, field.role, column.scale, column.offset);
}

}  // namespace

std::span<const RigField> rigFields() { return fields; }

QString fieldText(const RigField& field, const ColumnsDraft& draft) {
  const RigProfile& rig = draft.rig;
  return std::visit(
      Overloaded{
          [&](double RigProfile::*where) { return typedText(rig.*where / field.perShown); },
          [&](std::optional<double> RigProfile::*where) {
            return numberOr(rig.*where, field.perShown);
          },
          [&](std::optional<double> LoadCell::*where) {
            return numberOr(rig.loadCell.*where, field.perShown);
          },
          [&](std::string LoadCell::*where) { return QString::fromStdString(rig.loadCell.*where); },
          [&](const CalibrationField& where) { return typedText(calibration(where, rig)); }},
      field.where);
}

std::optional<ColumnsDraft> withTyped(const RigField& field,
                                      const ColumnsDraft& draft,
                                      const Source& source,
                                      const QString& given) {
  const QString text = given.trimmed();
  ColumnsDraft after = draft;
  if (const auto* date = std::get_if<std::string LoadCell::*>(&field.where)) {
    if (!text.isEmpty() && !QDate::fromString(text, Qt::ISODate).isValid()) return std::nullopt;
    after.rig.loadCell.*(*date) = text.toStdString();
    return after;
  }
  const auto number = numberOf(field, text);
  if (!number) return std::nullopt;
  if (const auto* where = std::get_if<CalibrationField>(&field.where)) {
    return calibrated(*where, draft, source, *number);
  }
  if (const auto* where = std::get_if<double RigProfile::*>(&field.where)) {
    after.rig.*(*where) = number->value_or(0);
  } else if (const auto* maybe = std::get_if<std::optional<double> RigProfile::*>(&field.where)) {
    after.rig.*(*maybe) = *number;
  } else if (const auto* cell = std::get_if<std::optional<double> LoadCell::*>(&field.where)) {
    // A capacity of nothing is none.
    const bool none = *cell == &LoadCell::capacity && *number == 0.0;
    after.rig.loadCell.*(*cell) = none ? std::nullopt : *number;
  }
  return after;
}

}  // namespace dampwright
