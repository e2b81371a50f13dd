#!/bin/sh
# usage: headers.sh SOURCE_DIR COMPILER
# Compiles each public header alone, as a user's first include, with warnings as errors.
set -eu
cd "$1/include"
find . -name '*.h' | LC_ALL=C sort | while read -r header; do
    printf '#include "%s"\n#include "%s"\nint backsaw_header_check;\n' "${header#./}" \
        "${header#./}" |
        "$2" -std=c17 -fsyntax-only -Wall -Wextra -Wpedantic -Wstrict-prototypes -Werror -I. \
            -x c - || {
        echo "include/${header#./} does not compile alone" >&2
        exit 1
    }
done
