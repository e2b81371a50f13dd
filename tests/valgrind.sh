#!/usr/bin/env bash
# usage: tests/valgrind.sh [NAME...]
# Runs the C tests (all, or those whose names hold one of the words) and a few lines of Lua under
# valgrind, in a build of their own in build/valgrind. Any error or leak fails.
set -euo pipefail
cd -P -- "$(dirname -- "${BASH_SOURCE[0]}")/.."

cmake --preset valgrind >/dev/null
cmake --build --preset valgrind

check=(valgrind -q --error-exitcode=9 --leak-check=full "--errors-for-leak-kinds=definite,indirect"
    --suppressions=tests/valgrind.supp)
failed=0
run() {
    local name=$1
    shift
    printf '%s\n' "$name"
    if ! "${check[@]}" "$@" >build/valgrind/output.txt 2>&1; then
        grep -E '^==|\[  FAILED' build/valgrind/output.txt | head -40 || true
        printf '%s FAILED\n' "$name"
        failed=1
    fi
}

wanted() {
    local word
    [ $# -gt 1 ] || return 0
    for word in "${@:2}"; do
        case $1 in *"$word"*) return 0 ;; esac
    done
    return 1
}

for test in build/valgrind/tests/*/test_*; do
    if [ -f "$test" ] && wanted "$(basename "$test")" "$@"; then
        run "$(basename "$test")" "$test"
    fi
done
program=build/valgrind/backsaw
if [ -x "$program" ] && wanted backsaw "$@"; then
    run "backsaw -e" "$program" -e 'print(mol "OCC", #back(mol "CC(=O)Nc1ccccc1"))'
    run "backsaw, an error" "$program" -e 'print(pcall(mol, "C1CC"))'
fi
exit "$failed"
