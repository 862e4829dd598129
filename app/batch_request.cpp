// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/batch_request.h"

#include <CLI/CLI.hpp>

namespace dampwright {
namespace {

constexpr const char* statuses =
    "Messages go to standard error as \"code: file, place: what is so. What to do.\"\n"
    "Exit status: 0 done, or pass; 1 fail; 2 too close to call or not tested; 3 the input can't "
    "be\n"
    "used; 4 the output can't be written; 64 wrong usage. Output is written whole or not at all.";

// Answers as they are typed, before they are put into ReadOptions.
struct TypedAnswers {
  std::string displacementPositive, forcePositive, zeroState;
};

template <class T>
void add(CLI::App& verb, const char* name, std::optional<T>& value, const char* what) {
  verb.add_option(name, value, what)->group("What the file leaves open");
}

void addDirections(CLI::App& verb, TypedAnswers& typed) {
  const std::vector<std::string> directions{"compression", "rebound"};
  const char* group = "What the file leaves open";
  verb.add_option("--displacement-positive",
                  typed.displacementPositive,
                  "which way a rising displacement moves the damper")
      ->check(CLI::IsMember(directions))
      ->group(group);
  verb.add_option("--force-positive",
                  typed.forcePositive,
                  "the stroke in which the file's force is positive")
      ->check(CLI::IsMember(directions))
      ->group(group);
  verb.add_option("--zero-state", typed.zeroState, "what the force was zeroed on")
      ->check(CLI::IsMember(std::vector<std::string>{"no specimen", "damper fitted"}))
      ->group(group);
}

// One option for each point that a file can leave open.
void addAnswers(CLI::App& verb, ReadOptions& read, TypedAnswers& typed) {
  add(verb, "--encoding", read.encoding, "of the text: utf-8, utf-16le, windows-1252 …");
  add(verb, "--delimiter", read.delimiter, "between columns: a character, tab or blanks");
  add(verb, "--decimal", read.decimal, "mark of the numbers: . or ,");
  add(verb, "--header-row", read.headerRow, "line of the column names, from 1");
  add(verb, "--time", read.time, "column of time, name or number from 1");
  add(verb, "--displacement", read.displacement, "column of displacement");
  add(verb, "--force", read.force, "column of force");
  add(verb, "--velocity", read.velocity, "column of velocity");
  add(verb, "--temperature", read.temperature, "column of temperature");
  add(verb, "--time-unit", read.timeUnit, "s, ms, µs, min …");
  add(verb, "--displacement-unit", read.displacementUnit, "mm, cm, m, in …");
  add(verb, "--force-unit", read.forceUnit, "N, kN, kgf, lbf …");
  add(verb, "--velocity-unit", read.velocityUnit, "m/s, mm/s, in/s …");
  add(verb, "--temperature-unit", read.temperatureUnit, "°C, °F, K");
  verb.add_option("--rate", read.sampleRate, "samples a second, where there is no time column")
      ->check(CLI::PositiveNumber)
      ->group("What the file leaves open");
  addDirections(verb, typed);
}

CLI::App* addVerb(CLI::App& app, const char* name, const char* what, BatchRequest& request) {
  CLI::App* verb = app.add_subcommand(name, what);
  verb->add_option("--rig", request.rig, "rig profile (JSON); used whatever its signature says")
      ->type_name("RIG.json");
  verb->add_option("--out", request.out, "write here instead of to standard output")
      ->type_name("FILE");
  verb->add_flag("--progress", request.progress, "say on standard error how far the work is");
  return verb;
}

void addFiles(CLI::App& verb, BatchRequest& request, int most) {
  const char* what = most == 1 ? "a run file; - is standard input"
                               : "run files of one damper at one setting; - is standard input";
  verb.add_option("files", request.files, what)->required()->expected(1, most)->type_name("FILE");
}

void addCard(CLI::App& verb, BatchRequest& request) {
  verb.add_option("--card", request.card, "damper card (JSON)")->type_name("CARD.json");
}

void addLimits(CLI::App& verb, BatchRequest& request) {
  verb.add_option("--limits", request.limits, "limit sheet (JSON)")
      ->type_name("LIMITS.json")
      ->required();
}

void takeTyped(const TypedAnswers& typed, ReadOptions& read) {
  const auto direction = [](const std::string& word) {
    return word == "compression" ? Direction::Compression : Direction::Rebound;
  };
  if (!typed.displacementPositive.empty())
    read.displacementPositive = direction(typed.displacementPositive);
  if (!typed.forcePositive.empty()) read.forcePositive = direction(typed.forcePositive);
  if (!typed.zeroState.empty()) {
    read.zeroState =
        typed.zeroState == "no specimen" ? ZeroState::NoSpecimen : ZeroState::DamperFitted;
  }
}

ParsedRequest wrongUsage(const std::string& what) {
  return {std::nullopt,
          "wrong-usage: " + what + ". Look at dampwright-batch --help.\n",
          exit_status::wrongUsage};
}

}  // namespace

ParsedRequest parseRequest(int argc, const char* const* argv) {
  BatchRequest request;
  TypedAnswers typed;
  CLI::App app("Reads, measures and judges the run files of a vehicle damper bench.",
               "dampwright-batch");
  app.set_version_flag("--version", "dampwright-batch " DAMPWRIGHT_VERSION);
  app.fallthrough();
  app.require_subcommand(1);
  app.footer(statuses);
  constexpr int anyNumber = CLI::detail::expected_max_vector_size;

  CLI::App* columns = addVerb(app, "columns", "say how a file is understood", request);
  addFiles(*columns, request, 1);
  bool json = false;
  columns->add_flag("--json", json, "as a columns document");

  CLI::App* measure = addVerb(app, "measure", "measure one damper at one setting", request);
  addFiles(*measure, request, anyNumber);
  addCard(*measure, request);

  CLI::App* judge = addVerb(app, "judge", "measure and judge by a limit sheet", request);
  addFiles(*judge, request, anyNumber);
  addLimits(*judge, request);
  addCard(*judge, request);
  judge->footer("A stored measurement document may stand in for the run files.");

  CLI::App* sheet = addVerb(app, "sheet", "make the customer's sheet", request);
  addFiles(*sheet, request, anyNumber);
  addLimits(*sheet, request);
  addCard(*sheet, request);
  sheet->add_option("--pdf", request.pdf, "where the sheet goes")->type_name("OUT.pdf")->required();

  for (CLI::App* verb : {columns, measure, judge, sheet}) addAnswers(*verb, request.read, typed);

  try {
    app.parse(argc, argv);
  } catch (const CLI::CallForHelp&) {
    return {std::nullopt, app.help(), exit_status::done};
  } catch (const CLI::CallForVersion& version) {
    return {std::nullopt, std::string(version.what()) + "\n", exit_status::done};
  } catch (const CLI::ParseError& problem) {
    return wrongUsage(problem.what());
  }
  takeTyped(typed, request.read);
  request.shape = json ? Shape::Json : Shape::Text;
  request.verb = columns->parsed()   ? BatchVerb::Columns
                 : measure->parsed() ? BatchVerb::Measure
                 : judge->parsed()   ? BatchVerb::Judge
                                     : BatchVerb::Sheet;
  return {request, {}, exit_status::done};
}

}  // namespace dampwright
