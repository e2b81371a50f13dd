#!/bin/sh
# usage: compare.sh BACKSAW [REFERENCE [RUNS [MOLECULES.smi...]]]
# Runs the benchmark, alternately with the reference program (bench_reference) if there is one, and
# prints for each file and task the items per second of each run and the ratios. The machine may be
# shared: trust the ratios, not the seconds. Without files: the molecules of the oracle, and larger
# ones.
set -eu
backsaw=$1
reference=${2:-}
runs=${3:-3}
here=$(dirname "$0")
data=$here/../data
folder=$(mktemp -d "${TMPDIR:-/tmp}/backsaw-bench-XXXXXX")
trap 'rm -rf "$folder"' EXIT
if [ $# -gt 3 ]; then shift 3; else set --; fi
if [ $# -eq 0 ]; then
    gzip -dc "$data/oracle/molecules.smi.gz" >"$folder/molecules.smi"
    gzip -dc "$data/bench/larger.smi.gz" >"$folder/larger.smi"
    set -- "$folder/molecules.smi" "$folder/larger.smi"
fi

# Three packs with 111 transforms at the time of writing.
hundred="-l acyl-transfer -l alcohols -l amines"

for file in "$@"; do
    run=0
    while [ "$run" -lt "$runs" ]; do
        run=$((run + 1))
        "$backsaw" "$here/run.lua" "$file" | sed "s/^/ours	/"
        # shellcheck disable=SC2086 # several options
        "$backsaw" --bare $hundred "$here/run.lua" "$file" |
            sed -n "s/^expand/ours	expand_100/p"
        [ -z "$reference" ] || "$reference" "$file" 0 "$data/bench/smarts.txt" \
            "$data/bench/reactions.txt" | sed "s/^/theirs	/"
    done >"$folder/lines"
    echo "$(basename "$file"), items per second of $runs runs:"
    awk -F '\t' '
        $2 ~ /^#/ { if (!said[$1 $2]++) remarks = remarks $1 " " $2 "\n"; next }
        $2 == "task" { next }
        {
            if (!($2 in known)) { known[$2] = 1; order[++count] = $2 }
            figures[$1, $2] = figures[$1, $2] sprintf(" %9d", $5)
            sum[$1, $2] += $4
        }
        END {
            for (i = 1; i <= count; i++) {
                task = order[i]
                printf "  %-11s%s", task, figures["ours", task]
                if (sum["theirs", task])
                    printf "   reference%s   ratio %.1f", figures["theirs", task],
                        sum["theirs", task] / sum["ours", task]
                print ""
            }
            printf "%s", remarks
        }' "$folder/lines"
done
