# Everything comes from Debian; libinchi and coordgen ship no pkg-config file.

find_package(PkgConfig REQUIRED)
find_package(Threads REQUIRED)
pkg_check_modules(LUA REQUIRED IMPORTED_TARGET lua5.4)
pkg_check_modules(EDIT REQUIRED IMPORTED_TARGET libedit)
pkg_check_modules(SQLITE REQUIRED IMPORTED_TARGET sqlite3)
pkg_check_modules(ZLIB REQUIRED IMPORTED_TARGET zlib)
pkg_check_modules(JANSSON REQUIRED IMPORTED_TARGET jansson)
pkg_check_modules(CMOCKA REQUIRED IMPORTED_TARGET cmocka)
find_library(INCHI_LIBRARY inchi REQUIRED)
find_path(INCHI_INCLUDE_DIR inchi_api.h PATH_SUFFIXES inchi REQUIRED)
find_library(COORDGEN_LIBRARY coordgen REQUIRED)
find_path(COORDGEN_INCLUDE_DIR coordgen/sketcherMinimizer.h REQUIRED)
