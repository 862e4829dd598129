#!/bin/sh
# SPDX-License-Identifier: GPL-3.0-or-later
# Installs what is missing, builds everything with warnings as errors, and runs all tests.
set -eu
cd "$(dirname "$0")/.."
. app/packages.sh

# shellcheck disable=SC2086 # the lists are meant to split
install_packages $packages_program $packages_tests
[ -f build/dev/build.ninja ] || quietly cmake --preset dev
echo "Building Dampwright and its tests (several minutes the first time)"
quietly cmake --build --preset dev
QT_QPA_PLATFORM=offscreen ctest --preset dev --output-on-failure -j "$(nproc)" "$@"
