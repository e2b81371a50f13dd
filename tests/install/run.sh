#!/bin/sh
# usage: run.sh CMAKE BUILD_DIR SOURCE_DIR LIBDIR COMPILER [FLAG...]
# Installs into a folder of the build tree, then compiles and runs the C example against what was
# installed, as a user would, through pkg-config alone.
set -eu
cmake=$1 build=$2 source=$3 libdir=$4 compiler=$5
shift 5

prefix=$build/tests/install/prefix
rm -rf "$prefix"
"$cmake" --install "$build" --prefix "$prefix" >/dev/null
PKG_CONFIG_PATH=$prefix/$libdir/pkgconfig
export PKG_CONFIG_PATH

# shellcheck disable=SC2046 # the flags are words
"$compiler" -std=c17 -Wall -Wextra -Wpedantic -Werror "$@" "$source/examples/c/formula.c" \
    $(pkg-config --define-variable=prefix="$prefix" --cflags --libs backsaw) -o "$prefix/formula"

# The whole of the library links with what pkg-config names, not only what the example uses.
# shellcheck disable=SC2046
echo 'int main(void) { return 0; }' | "$compiler" "$@" -x c - -x none \
    -Wl,--whole-archive "$prefix/$libdir/libbacksaw.a" -Wl,--no-whole-archive \
    $(pkg-config --define-variable=prefix="$prefix" --libs backsaw) -o "$prefix/whole"

# Caffeine; formula and mass as in IUPAC's atomic weights of 2021 (8 C, 10 H, 4 N, 2 O).
answer=$("$prefix/formula" 'Cn1c(=O)c2c(ncn2C)n(C)c1=O')
case $answer in
*"  C8H10N4O2  194.194 g/mol") ;;
*)
    echo "the example printed: $answer" >&2
    exit 1
    ;;
esac
if "$prefix/formula" 'C1CC' >/dev/null 2>&1; then
    echo "the example accepted an open ring" >&2
    exit 1
fi
test -d "$prefix/share/backsaw/stdlib" || test ! -d "$source/src/cli"
