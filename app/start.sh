#!/bin/sh
# SPDX-License-Identifier: GPL-3.0-or-later
# Installs what is missing, builds the program and starts it with the demonstration job.
# Without a display it writes the demonstration's sheet and a picture of the window instead, and says where.
set -eu
cd "$(dirname "$0")/.."
. app/packages.sh

# shellcheck disable=SC2086 # the list is meant to split
install_packages $packages_program
[ -f build/release/build.ninja ] || quietly cmake --preset release
if ! ninja -C build/release -n | grep -q "no work to do"; then
  echo "Building Dampwright (a few minutes the first time)"
  quietly cmake --build --preset release
fi

program=build/release/bin/dampwright
if [ -n "${DISPLAY:-}${WAYLAND_DISPLAY:-}" ]; then
  exec "$program" --demonstration "$@"
fi

out=build/demonstration
mkdir -p "$out"
rm -f "$out/book.db" "$out/book.db-wal" "$out/book.db-shm" "$out/book.db-journal"
QT_QPA_PLATFORM=offscreen "$program" --book "$out/book.db" --demonstration \
  --picture "$out/window.png" --sheet "$out/sheet.pdf"
echo "There is no display, so the demonstration was written to files:"
echo "  sheet:  $PWD/$out/sheet.pdf"
echo "  window: $PWD/$out/window.png"
