// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/samples/sample_documents.h"

#include <algorithm>
#include <nlohmann/json.hpp>
#include <set>

#include "core/base/sha256.h"

namespace dampwright::samples {
namespace {

using Json = nlohmann::ordered_json;

std::string fileSafe(std::string name) {
  std::replace(name.begin(), name.end(), ' ', '_');
  return name;
}

SampleFile asFile(const std::string& name, const Json& json) { return {name, json.dump(2) + "\n"}; }

Json document(const std::string& kind) {
  return {{"document", "dampwright " + kind}, {"version", 1}};
}

Json rigJson(const SampleRig& rig) {
  Json json = document("rig");
  json["name"] = rig.name;
  json["signature"] = signatureOf(rig);
  const char* const keys[] = {"time", "displacement", "velocity", "force", "temperature"};
  for (const RigChannel& channel : rig.channels)
    json["columns"][keys[static_cast<int>(channel.channel)]] = {{"name", channel.name},
                                                                {"unit", channel.unit}};
  json["displacement_positive"] = nameOf(rig.positive);
  json["force_positive"] = nameOf(rig.positive);
  json["zero_state"] = "no specimen";
  json["force_delay_ms"] = rig.forceDelayMs;
  json["force_delay_u_ms"] = rig.forceDelayMs > 0 ? 0.02 : 0.0;
  json["moving_mass_kg"] = rig.movingMassKg;
  json["load_cell"] = {{"capacity_n", rig.capacityN},
                       {"reading_percent", rig.readingPercent},
                       {"capacity_percent", rig.capacityPercent},
                       {"zero_drift_n", rig.zeroDriftN},
                       {"calibrated", "2031-01-10"},
                       {"due", "2032-01-10"}};
  json["displacement_accuracy_mm"] = rig.displacementAccuracyMm;
  json["clock_accuracy_percent"] = rig.clockAccuracyPercent;
  json["remount_percent"] = rig.remountPercent;
  return json;
}

/// A card without its heading, as it stands in a job too.
Json cardJson(const SampleDamper& damper, const SampleVehicle& vehicle) {
  Json json;
  json["serial"] = damper.serial;
  json["part_number"] = vehicle.partNumber;
  json["position"] = damper.corner;
  json["kind"] = vehicle.kind;
  json["rod_diameter_mm"] = vehicle.rodMm;
  json["piston_diameter_mm"] = vehicle.pistonMm;
  json["open_length_mm"] = vehicle.openMm;
  json["closed_length_mm"] = vehicle.closedMm;
  json["gas"] = {{"force_n", vehicle.nominalGasN}, {"at_c", 20}};
  if (damper.reboundClicks)
    json["adjusters"] = Json::array({{{"name", "rebound"},
                                      {"acts_on", "rebound"},
                                      {"unit", "clicks"},
                                      {"from", 0},
                                      {"to", 20},
                                      {"zero", "full soft"}}});
  json["orientation"] = vehicle.kind == "twin tube" ? "rod up" : "either";
  json["notes"] = "Invented.";
  return json;
}

Json checkJson(const SampleCheck& check) {
  Json json = {{"check", check.check}};
  if (check.direction) {
    json["direction"] = nameOf(*check.direction);
    json["velocity_mm_s"] = check.velocityMmS;
    json["reading"] = "at peak velocity";
  }
  if (check.check == "friction") json["basis"] = "half difference";
  if (check.targetN) {
    json["target_n"] = *check.targetN;
    json["tolerance_percent"] = check.tolerancePercent;
  }
  if (check.minN) json["min_n"] = *check.minN;
  if (check.maxN) json["max_n"] = *check.maxN;
  return json;
}

/// A limit sheet without its heading, as it stands in a job too.
Json limitsJson(const SampleVehicle& vehicle) {
  Json json;
  json["title"] = vehicle.limitsTitle;
  json["source"] = vehicle.limitsSource;
  json["revision"] = vehicle.limitsRevision;
  json["force_basis"] = "gas removed";
  json["decision_rule"] = "guarded";
  json["coverage_factor"] = 2;
  json["conditions"] = {{"stroke_mm", vehicle.strokeMm}};
  for (const SampleCheck& check : vehicle.checks) json["checks"].push_back(checkJson(check));
  return json;
}

Json phaseJson(const SampleTruth& truth) {
  Json phase = {{"phase", "as found"}};
  if (truth.damper.reboundClicks) phase["setting"] = {{"rebound", *truth.damper.reboundClicks}};
  phase["runs"] = Json::array();
  for (const SampleFile& file : truth.files)
    phase["runs"].push_back({{"file", file.name},
                             {"sha256", sha256Hex(file.bytes)},
                             {"rig", truth.damper.rig.name},
                             {"zero_state", "no specimen"}});
  return phase;
}

Json jobJson(const SampleVehicle& vehicle, const std::vector<SampleTruth>& truths) {
  Json json = document("job");
  json["number"] = vehicle.number;
  json["customer"] = vehicle.customer;
  json["vehicle"] = vehicle.vehicle;
  json["plate"] = vehicle.plate;
  json["kind"] = vehicle.key;
  json["technician"] = "R. Osk (invented)";
  json["opened"] = "2031-03-12T08:40:00+01:00";
  json["invented"] = true;
  for (const SampleTruth& truth : truths) {
    if (truth.damper.vehicle != vehicle.key) continue;
    Json& items = json["items"];
    if (items.empty() || items.back()["corner"] != truth.damper.corner)
      items.push_back({{"corner", truth.damper.corner},
                       {"damper", cardJson(truth.damper, vehicle)},
                       {"phases", Json::array()}});
    items.back()["phases"].push_back(phaseJson(truth));
  }
  json["limits"] = limitsJson(vehicle);
  json["notes"] = "Workshop, customer, vehicle, dampers and runs are invented.";
  return json;
}

const SampleVehicle& vehicleOf(const SampleDamper& damper,
                               const std::vector<SampleVehicle>& vehicles) {
  return *std::find_if(vehicles.begin(), vehicles.end(), [&](const SampleVehicle& one) {
    return one.key == damper.vehicle;
  });
}

/// Numbers of the truth to a thousandth, so that the document stays readable.
double rounded(double value) { return std::round(value * 1e3) / 1e3; }

Json halfJson(const bench::HalfTruth& half) {
  return {{"peak_velocity_mm_s", rounded(half.velocity * 1e3)},
          {"force_n", rounded(half.force)},
          {"gas_n", rounded(half.gas)}};
}

Json truthJson(const SampleTruth& truth, const SampleVehicle& vehicle) {
  const SampleDamper& damper = truth.damper;
  Json json = {{"vehicle", damper.vehicle},
               {"corner", damper.corner},
               {"serial", damper.serial},
               {"rig", rigFile(damper.rig)},
               {"card", cardFile(damper)},
               {"limits", vehicle.limitsFile},
               {"job", vehicle.jobFile}};
  if (damper.reboundClicks) json["rebound_clicks"] = *damper.reboundClicks;
  for (const SampleFile& file : truth.files) json["files"].push_back(file.name);
  json["gas_force_n"] = rounded(truth.gasN);
  json["dry_friction_n"] = truth.dryFrictionN;
  json["half_difference_n"] = rounded(truth.halfDifferenceN);
  json["lost_motion_mm"] = {{"compression", rounded(damper.damper.compressionGap * 1e3)},
                            {"rebound", rounded(damper.damper.reboundGap * 1e3)}};
  json["temperature_c"] = {rounded(truth.startC), rounded(truth.endC)};
  for (std::size_t i = 0; i < truth.blocks.size(); ++i)
    json["blocks"].push_back({{"speed_mm_s", rounded(truth.blocks[i].plan.speed * 1e3)},
                              {"stroke_mm", rounded(truth.blocks[i].plan.stroke * 1e3)},
                              {"energy_j", rounded(truth.energy[i])},
                              {"compression", halfJson(truth.compression[i])},
                              {"rebound", halfJson(truth.rebound[i])}});
  json["verdict"] = truth.verdict;
  for (const PromisedCheck& check : truth.checks) {
    Json one = checkJson(check.check);
    one["truth_n"] = rounded(check.truthN);
    one["verdict"] = check.verdict;
    json["checks"].push_back(one);
  }
  return json;
}

}  // namespace

std::string nameOf(Direction direction) {
  return direction == Direction::Compression ? "compression" : "rebound";
}

std::string rigFile(const SampleRig& rig) { return "rig_" + fileSafe(rig.name) + ".json"; }

std::string cardFile(const SampleDamper& damper) {
  return "damper_" + fileSafe(damper.vehicle + " " + damper.corner) + ".json";
}

std::vector<SampleFile> documentsOf(const std::vector<SampleVehicle>& vehicles,
                                    const std::vector<SampleTruth>& truths) {
  std::vector<SampleFile> files;
  std::set<std::string> written;
  for (const SampleVehicle& vehicle : vehicles) {
    Json limits = document("limits");
    limits.update(limitsJson(vehicle));
    files.push_back(asFile(vehicle.limitsFile, limits));
    files.push_back(asFile(vehicle.jobFile, jobJson(vehicle, truths)));
  }
  for (const SampleTruth& truth : truths) {
    if (written.insert(rigFile(truth.damper.rig)).second)
      files.push_back(asFile(rigFile(truth.damper.rig), rigJson(truth.damper.rig)));
    if (!written.insert(cardFile(truth.damper)).second) continue;
    Json card = document("damper");
    card.update(cardJson(truth.damper, vehicleOf(truth.damper, vehicles)));
    files.push_back(asFile(cardFile(truth.damper), card));
  }
  return files;
}

SampleFile truthDocument(const std::vector<SampleVehicle>& vehicles,
                         const std::vector<SampleTruth>& truths) {
  Json json = {{"invented", true}, {"dampers", Json::array()}};
  for (const SampleTruth& truth : truths)
    json["dampers"].push_back(truthJson(truth, vehicleOf(truth.damper, vehicles)));
  return asFile("truth.json", json);
}

}  // namespace dampwright::samples
