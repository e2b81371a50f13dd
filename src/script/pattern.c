/*
 * Patterns in Lua. The box owns an arena, because a compiled pattern is no single block; it is
 * made empty and filled after, and its finaliser may run twice. Patterns that are given as
 * strings are compiled once a state.
 */
#include "script/host.h"

#define PATTERN_TYPE "backsaw.pattern"

typedef struct pattern_box {
    bs_arena arena;
    bs_pattern *pattern; /* NULL once closed */
} pattern_box;

/* The pattern at index `i`, or NULL. */
static const bs_pattern *test_pattern(lua_State *L, int i)
{
    pattern_box *box = bsl_test_type(L, i, bsl_host_of(L)->pattern_type);

    if (box && !box->pattern)
        bsl_error(L, BS_EVALUE, "the pattern is closed");
    return box ? box->pattern : NULL;
}

static const bs_pattern *check_pattern(lua_State *L, int i)
{
    const bs_pattern *pattern = test_pattern(L, i);

    if (!pattern)
        bsl_type_error(L, i, "pattern");
    return pattern;
}

/* Compiles SMARTS and pushes the pattern. */
static void read_pattern(lua_State *L, const char *text, size_t length)
{
    bsl_host *host = bsl_host_of(L);
    pattern_box *box = lua_newuserdatauv(L, sizeof *box, 0);

    box->pattern = NULL;
    bs_arena_init(&box->arena, host->session->cx.gate);
    luaL_setmetatable(L, PATTERN_TYPE);
    if (bs_pattern_read(host->cx, &box->arena, text, length, &box->pattern) != BS_OK) {
        box->pattern = NULL;
        bsl_raise(L, text, length);
    }
    bsl_box(L, &box->arena);
}

const bs_pattern *bsl_topattern(lua_State *L, int i)
{
    const bs_pattern *pattern = test_pattern(L, i);
    size_t length;
    const char *text;

    if (pattern)
        return pattern;
    if (lua_type(L, i) != LUA_TSTRING)
        bsl_type_error(L, i, "pattern or SMARTS");
    i = lua_absindex(L, i);
    text = lua_tolstring(L, i, &length);
    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.patterns");
    lua_pushvalue(L, i);
    if (lua_rawget(L, -2) == LUA_TNIL) {
        lua_pop(L, 1);
        read_pattern(L, text, length);
        lua_pushvalue(L, i);
        lua_pushvalue(L, -2);
        lua_rawset(L, -4);
    }
    lua_replace(L, i);
    lua_pop(L, 1);
    return check_pattern(L, i);
}

/* The options of find: nothing, a limit, or { limit = ..., all = ... }. */
static void check_find_options(lua_State *L, int i, bs_match_opts *opts)
{
    lua_Integer limit = 0;

    *opts = (bs_match_opts){0};
    if (lua_istable(L, i)) {
        lua_getfield(L, i, "all");
        opts->every_embedding = lua_toboolean(L, -1);
        lua_getfield(L, i, "limit");
        if (!lua_isnil(L, -1))
            limit = luaL_checkinteger(L, -1);
        lua_pop(L, 2);
    } else {
        limit = luaL_optinteger(L, i, 0);
    }
    luaL_argcheck(L, limit >= 0 && limit <= INT32_MAX, i, "a limit is 1 or more, or 0 for none");
    opts->limit = (int)limit;
}

int bsl_push_matches(lua_State *L, const bs_mol *mol, const bs_pattern *pattern, int options)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_match_opts opts;
    bs_matches matches;

    check_find_options(L, options, &opts);
    if (bs_pattern_find(host->cx, &host->results, pattern, mol, &opts, &matches) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_createtable(L, matches.count, 0);
    for (int i = 0; i < matches.count; i++) {
        lua_createtable(L, matches.width, 0);
        for (int k = 0; k < matches.width; k++) {
            lua_pushinteger(L, (lua_Integer)matches.atoms[i * matches.width + k] + 1);
            lua_rawseti(L, -2, k + 1);
        }
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

int bsl_count_matches(lua_State *L, const bs_mol *mol, const bs_pattern *pattern)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_matches matches;

    if (bs_pattern_find(host->cx, &host->results, pattern, mol, NULL, &matches) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_pushinteger(L, matches.count);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* p = core.pattern(smarts or p) */
static int core_pattern(lua_State *L)
{
    const char *text;
    size_t length;

    lua_settop(L, 1);
    if (test_pattern(L, 1))
        return 1;
    if (lua_type(L, 1) != LUA_TSTRING)
        bsl_type_error(L, 1, "SMARTS");
    text = lua_tolstring(L, 1, &length);
    read_pattern(L, text, length);
    return 1;
}

/* lists = p:find(m [, limit or { limit = ..., all = true }]) */
static int pattern_find(lua_State *L)
{
    const bs_pattern *pattern = check_pattern(L, 1);

    return bsl_push_matches(L, bsl_tomol(L, 2), pattern, 3);
}

/* n = p:count(m) */
static int pattern_count(lua_State *L)
{
    const bs_pattern *pattern = check_pattern(L, 1);

    return bsl_count_matches(L, bsl_tomol(L, 2), pattern);
}

/* found = p:has(m) */
static int pattern_has(lua_State *L)
{
    const bs_pattern *pattern = check_pattern(L, 1);
    const bs_mol *mol = bsl_tomol(L, 2);
    bool found;

    if (bs_pattern_has(bsl_host_of(L)->cx, pattern, mol, &found) != BS_OK)
        return bsl_raise(L, NULL, 0);
    lua_pushboolean(L, found);
    return 1;
}

/* smarts = tostring(p) */
static int pattern_tostring(lua_State *L)
{
    lua_pushstring(L, bs_pattern_text(check_pattern(L, 1)));
    return 1;
}

static int pattern_gc(lua_State *L)
{
    pattern_box *box = luaL_checkudata(L, 1, PATTERN_TYPE);

    box->pattern = NULL;
    bsl_unbox(L, &box->arena);
    bs_arena_free(&box->arena);
    return 0;
}

void bsl_open_pattern(lua_State *L)
{
    static const luaL_Reg methods[] = {
        {"find", pattern_find},
        {"count", pattern_count},
        {"has", pattern_has},
        {NULL, NULL},
    };
    static const luaL_Reg meta[] = {
        {"__tostring", pattern_tostring},
        {"__gc", pattern_gc},
        {NULL, NULL},
    };

    bsl_new_type(L, PATTERN_TYPE, methods, meta);
    luaL_getmetatable(L, PATTERN_TYPE);
    bsl_host_of(L)->pattern_type = lua_topointer(L, -1);
    lua_pop(L, 1);
    lua_newtable(L);
    lua_createtable(L, 0, 1);
    lua_pushliteral(L, "v");
    lua_setfield(L, -2, "__mode");
    lua_setmetatable(L, -2);
    lua_setfield(L, LUA_REGISTRYINDEX, "backsaw.patterns");
    lua_pushcfunction(L, core_pattern);
    lua_setfield(L, -2, "pattern");
}
