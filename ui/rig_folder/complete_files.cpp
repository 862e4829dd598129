// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/rig_folder/complete_files.h"

#include <algorithm>
#include <set>
#include <utility>

namespace dampwright {

namespace {

constexpr std::int64_t pausesToWait = 3;

}  // namespace

bool isForPrograms(std::string_view name) {
  if (name.empty() || name.front() == '.' || name.front() == '~' || name.back() == '~') return true;
  for (const std::string_view end : {".tmp", ".part", ".partial", ".crdownload", ".lock", ".swp"}) {
    if (name.ends_with(end)) return true;
  }
  return false;
}

CompleteFiles::CompleteFiles(std::vector<ListedFile> known) : known_(std::move(known)) {
  std::ranges::sort(known_, {}, &ListedFile::name);
}

bool CompleteFiles::isOld(const ListedFile& file) const {
  const auto found = std::ranges::lower_bound(known_, file.name, {}, &ListedFile::name);
  // Another disk's identities may differ after a restart: name, size and time tell enough here.
  return found != known_.end() && found->name == file.name && found->bytes == file.bytes &&
         found->modified == file.modified;
}

bool CompleteFiles::isQuiet(const Seen& seen, std::int64_t now) {
  return now - seen.changed >= std::max(shortestQuiet, pausesToWait * seen.longestPause);
}

CompleteFiles::Look CompleteFiles::look(const std::vector<ListedFile>& listing, std::int64_t now) {
  Look look;
  std::set<std::string_view> there;
  for (const ListedFile& file : listing) {
    if (isForPrograms(file.name) || isOld(file)) continue;
    there.insert(file.name);
    const auto [found, fresh] = seen_.try_emplace(file.name, Seen{file, now, 0, false});
    Seen& seen = found->second;
    if (fresh) continue;
    if (seen.file != file) {
      if (seen.given) look.withdrawn.push_back(file.name);
      // Another file under this name says nothing of how fast this one grows.
      const bool same = seen.file.node == file.node && file.bytes >= seen.file.bytes;
      const std::int64_t pause = same ? std::max(seen.longestPause, now - seen.changed) : 0;
      seen = Seen{file, now, pause, false};
    } else if (!seen.given && file.bytes > 0 && isQuiet(seen, now)) {
      seen.given = true;
      look.complete.push_back(file);
    }
  }
  for (auto entry = seen_.begin(); entry != seen_.end();) {
    if (there.contains(entry->first)) {
      ++entry;
      continue;
    }
    if (entry->second.given) look.withdrawn.push_back(entry->first);
    entry = seen_.erase(entry);
  }
  return look;
}

void CompleteFiles::again(const std::string& name, std::int64_t now) {
  const auto found = seen_.find(name);
  if (found == seen_.end()) return;
  found->second.given = false;
  found->second.changed = now;
}

}  // namespace dampwright
