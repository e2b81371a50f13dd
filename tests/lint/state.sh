#!/bin/sh
# usage: state.sh ARCHIVE
# Lists variables that can change, in an archive that was built without LTO and sanitizers. The
# library keeps all state in what the caller hands it; the lock around libinchi is the exception.
set -eu
objdump -t "$1" | awk '
/^[^ ]+\.o: / { file = $1 }
$4 ~ /^\.(data|bss)(\.|$)/ && $4 !~ /^\.data\.rel\.ro/ || $3 ~ /^\.(data|bss)(\.|$)/ && $3 !~ /^\.data\.rel\.ro/ {
    name = $NF
    # What the C++ compiler adds to the one file that talks to coordgen is not ours.
    if (name ~ /^\./ || name ~ /^DW\.ref\./ || name == "_ZStL8__ioinit" || name == "library_lock")
        next
    print file, name
    bad = 1
}
END { exit bad }
' || {
    echo "these variables can change; no state may live outside contexts and arenas" >&2
    exit 1
}
