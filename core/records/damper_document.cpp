// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/describe.h"
#include "core/records/documents.h"

namespace dampwright {
namespace {

constexpr DocumentKind damperDocument{"damper", 1};

void describe(Fields& io, Adjuster& adjuster) {
  io.text("name", adjuster.name);
  io.word("acts_on", adjuster.actsOn, {"rebound", "compression", "both"});
  io.word("unit", adjuster.unit, {"clicks", "turns", "amperes"});
  io.number("from", adjuster.from);
  io.number("to", adjuster.to);
  io.word("zero", adjuster.zero, {"full soft", "full hard"});
}

}  // namespace

void describe(Fields& io, DamperCard& card) {
  io.text("serial", card.serial);
  io.text("part_number", card.partNumber);
  io.text("position", card.position);
  io.word("kind",
          card.kind,
          {"twin tube", "monotube", "remote reservoir", "fork leg", "cartridge", "other"});
  io.number("rod_diameter_mm", card.rodDiameter, positive);
  io.number("piston_diameter_mm", card.pistonDiameter, positive);
  io.number("open_length_mm", card.openLength, positive);
  io.number("closed_length_mm", card.closedLength, positive);
  io.object("gas", [&](Fields& gas) {
    gas.number("force_n", card.gas.force);
    gas.number("at_c", card.gas.temperature);
    gas.number("at_length_mm", card.gas.length, positive);
    gas.number("pressure_bar", card.gas.pressure, notNegative);
  });
  io.list("adjusters", card.adjusters, [](Fields& one, Adjuster& a) { describe(one, a); });
  io.flag("position_dependent", card.positionDependent);
  io.flag("spring_fitted", card.springFitted);
  io.word("orientation", card.orientation, {"rod up", "rod down", "either"});
  io.text("notes", card.notes);
}

Result<DamperCard> readDamper(std::string_view bytes, std::string_view file) {
  DamperCard card;
  const auto read =
      readDocument(bytes, file, damperDocument, [&](Fields& io) { describe(io, card); });
  if (!read) return read.error();
  return card;
}

std::string writeDamper(const DamperCard& card) {
  DamperCard copy = card;
  return writeDocument(damperDocument, [&](Fields& io) { describe(io, copy); });
}

}  // namespace dampwright
