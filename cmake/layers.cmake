# One object library for each folder of src, all with the same strict flags.

set(BACKSAW_WARNINGS -Wall -Wextra -Wpedantic -Wshadow -Wvla -Wwrite-strings
    $<$<COMPILE_LANGUAGE:C>:-Wstrict-prototypes> $<$<COMPILE_LANGUAGE:C>:-Wmissing-prototypes>
    -Wpointer-arith -Wundef)
# gcc 12 sees uninitialised values on paths that do not exist; clang's analyzer looks for real ones.
if(CMAKE_C_COMPILER_ID STREQUAL "GNU")
    list(APPEND BACKSAW_WARNINGS -Wno-maybe-uninitialized)
endif()
if(BACKSAW_WERROR)
    list(APPEND BACKSAW_WARNINGS -Werror)
endif()

# Flags that every target of the project shares.
function(backsaw_flags target)
    target_compile_options(${target} PRIVATE ${BACKSAW_WARNINGS})
    # -std=c17 hides POSIX; the project asks for it here and nowhere else.
    target_compile_definitions(${target} PRIVATE _POSIX_C_SOURCE=200809L _DEFAULT_SOURCE)
    target_include_directories(${target} PRIVATE ${PROJECT_SOURCE_DIR}/src
        ${PROJECT_SOURCE_DIR}/include)
    if(BACKSAW_FUZZ)
        target_compile_options(${target} PRIVATE -fsanitize=fuzzer-no-link)
    endif()
    # Nobody replaces a function of the library at run time, so the compiler may inline it.
    if(CMAKE_C_COMPILER_ID STREQUAL "GNU")
        target_compile_options(${target} PRIVATE -fno-semantic-interposition)
    endif()
    # The tests and the installed archive link without a linker plugin.
    if(CMAKE_INTERPROCEDURAL_OPTIMIZATION AND CMAKE_C_COMPILER_ID STREQUAL "GNU")
        target_compile_options(${target} PRIVATE -ffat-lto-objects)
    endif()
    if(BACKSAW_SANITIZE)
        # The debug arenas pass every request to malloc, so that overruns are seen.
        target_compile_definitions(${target} PRIVATE BS_ARENA_DEBUG=1)
        target_compile_options(${target} PRIVATE -fsanitize=address,undefined
            -fno-sanitize-recover=all -fno-omit-frame-pointer -O1)
        target_link_options(${target} PRIVATE -fsanitize=address,undefined)
    endif()
endfunction()

# backsaw_layer(core a.c b.c) makes the object library backsaw_core.
function(backsaw_layer name)
    add_library(backsaw_${name} OBJECT ${ARGN})
    backsaw_flags(backsaw_${name})
endfunction()
