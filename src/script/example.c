/* draft "reactants>>product" in Lua: the text of a transform from one example. */
#include <string.h>

#include "script/host.h"

static void read_options(lua_State *L, int i, bs_example_opts *opts)
{
    static const char *const known[] = {"radius", "name"};
    lua_Integer radius;

    if (lua_isnoneornil(L, i))
        return;
    luaL_checktype(L, i, LUA_TTABLE);
    for (lua_pushnil(L); lua_next(L, i); lua_pop(L, 1)) {
        const char *key = lua_type(L, -2) == LUA_TSTRING ? lua_tostring(L, -2) : "?";

        if (strcmp(key, known[0]) != 0 && strcmp(key, known[1]) != 0)
            bsl_error(L, BS_EVALUE, "draft: there is no option \"%s\"; radius and name are", key);
    }
    lua_getfield(L, i, "radius");
    if (!lua_isnil(L, -1)) {
        radius = lua_isinteger(L, -1) ? lua_tointeger(L, -1) : -1;
        if (radius < 0 || radius > 20)
            bsl_error(L, BS_EVALUE, "draft: radius is a whole number from 0 to 20");
        opts->radius = (int)radius;
    }
    lua_getfield(L, i, "name");
    if (!lua_isnil(L, -1)) {
        if (lua_type(L, -1) != LUA_TSTRING)
            bsl_error(L, BS_EVALUE, "draft: name is a text");
        opts->name = lua_tostring(L, -1); /* the table keeps it */
    }
}

/* text, works = draft("A.B>>P", { radius = 1, name = "draft" }) */
static int core_draft(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_example_opts opts = {.radius = 1};
    const char *text;
    size_t length;
    char *out;
    bool works;

    if (lua_type(L, 1) != LUA_TSTRING)
        bsl_type_error(L, 1, "reaction SMILES");
    text = lua_tolstring(L, 1, &length);
    read_options(L, 2, &opts);
    if (bs_example_draft(host->cx, &host->results, text, length, &opts, &out, &works) != BS_OK)
        return bsl_raise_from(L, mark, text, length);
    lua_pushstring(L, out);
    lua_pushboolean(L, works);
    bs_arena_rewind(&host->results, mark);
    return 2;
}

void bsl_open_example(lua_State *L)
{
    lua_pushcfunction(L, core_draft);
    lua_setfield(L, -2, "draft");
}
