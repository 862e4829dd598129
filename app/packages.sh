# SPDX-License-Identifier: GPL-3.0-or-later
# Sourced by app/start.sh, tests/run.sh and .ci/run: the Debian 12 packages and one way to install what is missing.

packages_program="g++ cmake ninja-build qt6-base-dev libqcustomplot-dev libqt6sql6-sqlite libeigen3-dev
  nlohmann-json3-dev libssl-dev libboost-dev libcli11-dev fonts-dejavu-core"
packages_tests="libgtest-dev libgmock-dev python3 python3-scipy python3-pandas poppler-utils"
packages_ci="clang-16 clang-tidy-16 clang-format-16"

# install_packages NAME...: installs those that are missing, as root or through sudo; says nothing when none is.
install_packages() {
  missing=""
  for package in "$@"; do
    case "$(dpkg-query -W -f '${Status}' "$package" 2>/dev/null)" in
      "install ok installed") ;;
      *) missing="$missing $package" ;;
    esac
  done
  [ -z "$missing" ] && return 0
  as_root=""
  if [ "$(id -u)" -ne 0 ]; then
    command -v sudo >/dev/null 2>&1 || {
      echo "These packages are missing and need root or sudo to install:$missing" >&2
      return 1
    }
    as_root="sudo"
  fi
  echo "Installing:$missing"
  log=$(mktemp)
  # shellcheck disable=SC2086 # the list is meant to split
  if $as_root apt-get -qq update >"$log" 2>&1 &&
    $as_root env DEBIAN_FRONTEND=noninteractive apt-get -qq install -y --no-install-recommends $missing >"$log" 2>&1; then
    rm -f "$log"
  else
    cat "$log" >&2
    rm -f "$log"
    echo "The packages could not be installed; the lines above say why." >&2
    return 1
  fi
}

# quietly COMMAND...: shows the command's output only when it fails.
quietly() {
  log=$(mktemp)
  if "$@" >"$log" 2>&1; then
    rm -f "$log"
  else
    tail -n 60 "$log" >&2
    rm -f "$log"
    return 1
  fi
}
