#!/bin/sh
# usage: few.sh BACKSAW COUNT
# Runs the benchmark script on the first molecules of the larger ones.
set -eu
here=$(dirname "$0")
list=$(mktemp "${TMPDIR:-/tmp}/backsaw-bench-XXXXXX")
trap 'rm -f "$list"' EXIT
gzip -dc "$here/../data/bench/larger.smi.gz" >"$list"
"$1" "$here/run.lua" "$list" "$2"
