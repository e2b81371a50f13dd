#!/bin/sh
# usage: tidy.sh BUILD_DIR JOBS
# Runs clang-tidy with the checks of .clang-tidy over the sources of the library and the program.
set -eu
find src -name '*.c' | LC_ALL=C sort |
    xargs -P "$2" -n 4 clang-tidy --quiet -p "$1" 2>/dev/null
