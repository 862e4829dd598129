// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <algorithm>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "core/rig/rig_profile.h"

namespace dampwright {

/// The first profile of a file layout's signature; the book hands them out last saved first.
inline std::optional<RigProfile> findProfile(const std::vector<RigProfile>& profiles,
                                             std::string_view signature) {
  for (const RigProfile& profile : profiles) {
    if (!signature.empty() && profile.signature == signature) return profile;
  }
  return std::nullopt;
}

/// The profile that a run was given by name, else the one of its file's signature.
inline std::optional<RigProfile> findProfile(const std::vector<RigProfile>& profiles,
                                             std::string_view name,
                                             std::string_view signature) {
  const auto named = std::ranges::find(profiles, name, &RigProfile::name);
  if (!name.empty() && named != profiles.end()) return *named;
  return findProfile(profiles, signature);
}

}  // namespace dampwright
