#!/usr/bin/env bash
# Runs fuzz targets for some seconds each, from the checked-in seeds:
#     tests/fuzz/run.sh BUILD SECONDS [NAME...]
# New inputs and findings land in BUILD/corpus/NAME.
set -euo pipefail

here=$(cd -P -- "$(dirname -- "${BASH_SOURCE[0]}")" && pwd)
build=$1
seconds=$2
shift 2
if [[ $# -eq 0 ]]; then
    set -- smiles smarts molfile round rewrite
fi
export LSAN_OPTIONS="suppressions=$here/../support/lsan.supp:print_suppressions=0"

for name in "$@"; do
    corpus=$build/corpus/$name
    mkdir -p "$corpus"
    longest=400
    if [[ $name == molfile ]]; then
        longest=4000
    fi
    printf '%s: ' "$name"
    "$build/tests/fuzz/fuzz_$name" -max_total_time="$seconds" -timeout=60 -rss_limit_mb=2048 \
        -max_len="$longest" -dict="$here/smiles.dict" -artifact_prefix="$corpus.found-" \
        -print_final_stats=1 "$corpus" "$here/seeds/$name" >"$corpus.log" 2>&1 || {
        tail -n 40 "$corpus.log"
        exit 1
    }
    sed -n 's/^stat::number_of_executed_units: *\(.*\)/\1 runs, none failed/p' "$corpus.log"
done
