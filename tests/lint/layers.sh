#!/bin/sh
# shellcheck disable=SC2016 # $0 is for awk
# usage: layers.sh SOURCE_DIR
# Fails if a layer includes one above it, if script or cli include more than the public headers,
# or if Lua, a terminal or the standard streams appear in a layer that must not know them.
set -eu
cd "$1"
find src include -name '*.[ch]' | LC_ALL=C sort | xargs awk '
BEGIN {
    # Lowest first, as in DEVELOPERS.md.
    count = split("core chem layout format match rule catalogue route search draw report script cli",
                  names, " ")
    for (i = 1; i <= count; i++)
        rank[names[i]] = i
    # Public headers that are not named after their layer.
    module["mol"] = "chem"
    module["draft"] = "chem"
    module["descriptor"] = "chem"
    module["polarity"] = "rule"
    module["direct"] = "rule"
    module["group"] = "rule"
    module["why"] = "rule"
    module["example"] = "rule"
    module["file"] = "format"
}

function complain(text)
{
    printf "%s:%d: %s\n", FILENAME, FNR, text
    bad = 1
}

# The layer of a public header, from its path.
function layer_of(path,    name)
{
    name = path
    sub(/.*backsaw\//, "", name)
    sub(/\.h$/, "", name)
    return (name in module) ? module[name] : name
}

FNR == 1 {
    split(FILENAME, part, "/")
    public = part[1] == "include"
    own = public ? (FILENAME == "include/backsaw.h" ? "cli" : layer_of(FILENAME)) : part[2]
    if (!(own in rank) && FILENAME !~ /\/CMakeLists/)
        complain("no layer is called \"" own "\"")
    if ($0 !~ /^\/\*/)
        complain("a file opens with a comment that says what it is for")
    upper = !public && rank[own] >= rank["script"]
}

/^#[ \t]*include[ \t]*"/ {
    split($0, quoted, "\"")
    split(quoted[2], part, "/")
    from = quoted[2] == "backsaw.h" ? "cli" : part[1] == "backsaw" ? layer_of(quoted[2]) : part[1]
    if (!(from in rank))
        complain("include \"" quoted[2] "\" names no layer")
    else if (rank[from] > rank[own] && !upper)
        complain("layer " own " includes \"" quoted[2] "\" of the higher layer " from)
    else if (upper && part[1] != "backsaw" && quoted[2] != "backsaw.h" && part[1] != own)
        complain("layer " own " may include public headers only, not \"" quoted[2] "\"")
    else if (public && part[1] != "backsaw")
        complain("a public header includes public headers only, not \"" quoted[2] "\"")
}

/^#[ \t]*include[ \t]*<(lua|lualib|lauxlib)\.h>/ && rank[own] != rank["script"] {
    complain("only script knows Lua")
}

/^#[ \t]*include[ \t]*<(histedit|editline\/readline)\.h>/ && own != "cli" {
    complain("only cli knows a terminal")
}

/(^|[^A-Za-z_0-9>."])(printf|puts|putchar|perror|abort|exit|_Exit)[ \t]*\(/ && own != "cli" &&
!/^[ \t]*(\/\*|\*|\/\/)/ && !/format\(printf/ && !/format\(__printf__/ {
    complain("nothing below cli prints, exits or aborts")
}

/(TODO|FIXME|XXX)/ { complain("do it, or leave it out") }

END { exit bad }
'
