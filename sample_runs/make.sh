#!/bin/sh
# SPDX-License-Identifier: GPL-3.0-or-later
# Makes the sample runs again, the same bytes each time: sh sample_runs/make.sh [FOLDER]
set -e
into=$(realpath -m "${1:-$(dirname "$0")}")
cd "$(dirname "$0")/.."
[ -f build/dev/CMakeCache.txt ] || cmake --preset dev -DDAMPWRIGHT_UI=OFF >/dev/null
cmake --build --preset dev --target make_sample_runs >/dev/null
build/dev/bin/make_sample_runs "$into"
