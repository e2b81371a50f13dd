# usage: cmake -DFILE=x.json -P json.cmake
# Reads what `backsaw check --json` has written with the JSON reader of CMake (jsoncpp), and fails if
# a value is not what check.lua has put into its packs.
file(READ ${FILE} text)

function(wants expected)
    string(JSON value GET "${text}" ${ARGN})
    if(NOT value STREQUAL expected)
        message(FATAL_ERROR "${ARGN}: '${value}' instead of '${expected}'")
    endif()
endfunction()

wants(ON ok)
wants(0 failed)
wants(0 warned)
wants("[]" unread)
wants("2.0.0" packs 0 version)
wants(0 packs 0 transforms)
wants("[]" packs 0 coverage)
wants(2 packs 1 tests)
wants("[]" packs 1 failures)
wants("a \"q\" \\ µ" packs 1 coverage 0 rule)
wants(1 packs 1 coverage 0 refusals)
wants("quay acid" packs 1 coverage 0 conditions)
wants(invented packs 1 coverage 0 source)
