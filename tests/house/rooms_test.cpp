// SPDX-License-Identifier: GPL-3.0-or-later
// Who may include whom. Link lines alone do not keep such a table: this test reads every #include.
#include <gtest/gtest.h>

#include <filesystem>
#include <fstream>
#include <map>
#include <regex>
#include <set>
#include <sstream>
#include <string>
#include <vector>

namespace {

namespace fs = std::filesystem;
const fs::path root = DAMPWRIGHT_SOURCE_DIR;

using Rooms = std::map<std::string, std::set<std::string>>;

// A room may include itself and the rooms of its row; the table of DEVELOPERS.md.
const Rooms mayInclude = [] {
  Rooms rooms = {
      {"core/base", {}},
      {"core/words", {"base"}},
      {"core/rig", {"base"}},
      {"core/trace", {"base", "rig"}},
      {"core/intake", {"base", "rig", "trace"}},
      {"core/signal", {"base"}},
      {"core/condition", {"base", "rig", "trace", "signal"}},
      {"core/cycles", {"base", "signal", "condition"}},
      {"core/laws", {"base"}},
      {"core/curves", {"base", "signal", "cycles", "laws"}},
      {"core/fit", {"base", "signal"}},
      {"core/identify", {"base", "rig", "signal", "cycles", "curves", "laws", "fit"}},
      {"core/uncertainty", {"base", "rig", "cycles", "curves", "identify"}},
      {"core/measure",
       {"base",
        "rig",
        "trace",
        "intake",
        "signal",
        "condition",
        "cycles",
        "laws",
        "curves",
        "fit",
        "identify",
        "uncertainty"}},
      {"core/verdict", {"base", "measure", "curves", "uncertainty"}},
      {"core/job", {"base", "rig", "trace", "measure", "verdict"}},
  };
  for (auto& [room, allowed] : rooms) {
    std::set<std::string> full;
    for (const std::string& name : allowed) full.insert("core/" + name);
    allowed = full;
  }
  std::set<std::string> core;
  for (const auto& [room, allowed] : rooms) core.insert(room);
  rooms["core/records"] = core;
  core.insert("core/records");
  rooms["core/book"] = core;
  std::set<std::string> ui = core;
  ui.insert("core/book");
  rooms["ui/text"] = ui;
  rooms["ui/look"] = ui;
  rooms["ui/background"] = ui;
  for (const char* shared : {"ui/text", "ui/look", "ui/background"}) ui.insert(shared);
  rooms["ui/session"] = ui;
  ui.insert("ui/session");
  rooms["ui/plots"] = ui;
  ui.insert("ui/plots");
  for (const char* room :
       {"ui/start", "ui/corners", "ui/verdict", "ui/columns", "ui/rig_folder", "ui/sheet"})
    rooms[room] = ui;
  std::set<std::string> all = ui;
  for (const auto& [room, allowed] : rooms) all.insert(room);
  rooms["ui/main_window"] = all;
  all.insert("ui/main_window");
  rooms["app"] = all;
  return rooms;
}();

std::vector<fs::path> sources(const fs::path& folder) {
  std::vector<fs::path> found;
  for (const auto& entry : fs::recursive_directory_iterator(folder)) {
    const auto extension = entry.path().extension();
    if (extension == ".h" || extension == ".cpp") found.push_back(entry.path());
  }
  return found;
}

std::vector<std::string> linesOf(const fs::path& file) {
  std::ifstream stream(file);
  std::vector<std::string> lines;
  for (std::string line; std::getline(stream, line);) lines.push_back(line);
  return lines;
}

std::string roomOf(const fs::path& relative) {
  const fs::path folder = relative.parent_path();
  return folder.generic_string();
}

// The complaint about one include line of a file in `room`, empty where it is allowed.
std::string complaint(const std::string& room, const std::string& line) {
  static const std::regex include("^\\s*#\\s*include\\s*([<\"])([^>\"]+)[>\"]");
  std::smatch match;
  if (!std::regex_search(line, match, include)) return {};
  const std::string target = match[2];
  if (match[1] == "<") {
    const bool qt = std::regex_search(target, std::regex("^Q[A-Z]|^Qt|^qcustomplot"));
    if (qt && room.starts_with("core/") && room != "core/book") return "Qt in " + room;
    if (room == "core/book" &&
        std::regex_search(target, std::regex("^Q(Widget|Application|Gui|Painter|Printer)")))
      return "windows in core/book";
    if (target.find("qcustomplot") != std::string::npos && room != "ui/plots")
      return "qcustomplot outside ui/plots";
    return {};
  }
  const std::string targetRoom = roomOf(target);
  if (targetRoom == room) return {};
  const auto row = mayInclude.find(room);
  if (row == mayInclude.end()) return "room " + room + " is not in the table";
  if (!row->second.contains(targetRoom)) return room + " may not include " + targetRoom;
  return {};
}

TEST(House, RoomsIncludeOnlyWhomTheTableAllows) {
  int read = 0;
  for (const char* part : {"core", "ui", "app"}) {
    for (const fs::path& file : sources(root / part)) {
      const std::string room = roomOf(fs::relative(file, root));
      for (const std::string& line : linesOf(file)) {
        const std::string wrong = complaint(room, line);
        EXPECT_TRUE(wrong.empty()) << fs::relative(file, root) << ": " << wrong << "\n  " << line;
      }
      ++read;
    }
  }
  EXPECT_GT(read, 20);
}

TEST(House, APlantedUpwardIncludeIsCaught) {
  EXPECT_NE(complaint("core/signal", "#include \"core/measure/measurement.h\""), "");
  EXPECT_NE(complaint("core/measure", "#include <QString>"), "");
  EXPECT_NE(complaint("ui/verdict", "#include \"ui/corners/corner_panel.h\""), "");
  EXPECT_NE(complaint("ui/sheet", "#include <qcustomplot.h>"), "");
  EXPECT_EQ(complaint("core/cycles", "#include \"core/condition/motion.h\""), "");
}

TEST(House, TestSupportKnowsNothingOfCoreButBase) {
  for (const fs::path& file : sources(root / "tests" / "support")) {
    for (const std::string& line : linesOf(file)) {
      const bool core = line.find("#include \"core/") != std::string::npos;
      EXPECT_TRUE(!core || line.find("\"core/base/") != std::string::npos) << file << ": " << line;
    }
  }
}

TEST(House, NoFileIsLongerThan400Lines) {
  for (const char* part : {"core", "ui", "app"}) {
    for (const fs::path& file : sources(root / part)) {
      EXPECT_LE(linesOf(file).size(), 400u) << fs::relative(file, root);
    }
  }
}

TEST(House, EveryFileSaysItsLicence) {
  for (const char* part : {"core", "ui", "app", "tests"}) {
    for (const fs::path& file : sources(root / part)) {
      const auto lines = linesOf(file);
      ASSERT_FALSE(lines.empty()) << file;
      EXPECT_EQ(lines.front(), "// SPDX-License-Identifier: GPL-3.0-or-later")
          << fs::relative(file, root);
    }
  }
}

TEST(House, TopLevelHoldsOnlyWhatItShould) {
  const std::set<std::string> allowed = {"CMakeLists.txt",
                                         "CMakePresets.json",
                                         "DEVELOPERS.md",
                                         "LICENSE",
                                         "README.md",
                                         "app",
                                         "build",
                                         "core",
                                         "resources",
                                         "sample_runs",
                                         "tests",
                                         "ui"};
  for (const auto& entry : fs::directory_iterator(root)) {
    const std::string name = entry.path().filename().string();
    EXPECT_TRUE(name.starts_with(".") || allowed.contains(name)) << name;
  }
}

}  // namespace
