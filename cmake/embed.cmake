# Writes Lua files as byte arrays into one C file: cmake -DFILES=a.lua;b.lua -DOUTPUT=x.c -P embed.cmake

set(arrays "")
set(rows "")
foreach(file IN LISTS FILES)
    get_filename_component(name ${file} NAME_WE)
    file(READ ${file} bytes HEX)
    string(REGEX REPLACE "([0-9a-f][0-9a-f])" "0x\\1," bytes "${bytes}")
    string(REGEX REPLACE "(0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,0x..,)"
        "\\1\n" bytes "${bytes}")
    string(APPEND arrays "static const unsigned char text_${name}[] = {\n${bytes}0x00};\n")
    string(APPEND rows "    { \"${name}\", text_${name}, sizeof text_${name} - 1 },\n")
endforeach()

file(WRITE ${OUTPUT} "/* Made by cmake/embed.cmake from lua/backsaw. */
#include \"script/host.h\"

#include <string.h>

${arrays}
static const struct {
    const char *name;
    const unsigned char *text;
    size_t length;
} files[] = {
${rows}};

const char *bsl_embedded(const char *name, size_t *length)
{
    for (size_t i = 0; i < sizeof files / sizeof *files; i++) {
        if (strcmp(files[i].name, name) != 0)
            continue;
        *length = files[i].length;
        return (const char *)files[i].text;
    }
    return NULL;
}
")
