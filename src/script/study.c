/*
 * What the commands that study packs need: synthons by number, folders of packs, the hash of a
 * text, and a look into a pack in a session of its own, so that two versions of one pack can be
 * compared and nothing of it stays.
 */
#include "script/host.h"

#include <dirent.h>
#include <stdio.h>
#include <string.h>
#include <sys/stat.h>

/* table = core.nth_synthon(index), 0-based: false for one out of use, nil behind the last */
static int core_nth_synthon(lua_State *L)
{
    const bs_rules *rules = bsl_host_of(L)->session->rules;
    lua_Integer index = luaL_checkinteger(L, 1);
    const bs_synthon_def *def;

    if (index < 0 || index >= bs_rules_synthon_count(rules))
        return 0;
    def = bs_rules_synthon(rules, (int)index);
    if (!def) {
        lua_pushboolean(L, 0);
        return 1;
    }
    lua_createtable(L, 0, 4);
    lua_pushstring(L, def->name);
    lua_setfield(L, -2, "name");
    lua_pushstring(L, def->kind == BS_DONOR ? "donor" : "acceptor");
    lua_setfield(L, -2, "kind");
    lua_pushstring(L, def->origin);
    lua_setfield(L, -2, "origin");
    lua_createtable(L, def->equivalent_count, 0);
    for (int i = 0; i < def->equivalent_count; i++) {
        const bs_equivalent_def *one = &def->equivalents[i];

        lua_pushstring(L, one->attach ? one->attach : one->rewrite);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "equivalents");
    return 1;
}

#define FOLDER_LIMIT 1000

/* Reads the names of the Lua files in a folder; *count is -1 if it is none. */
static bs_status list_folder(bsl_host *host, const char *path, char ***names, int *count)
{
    DIR *dir = opendir(path);
    const struct dirent *entry;
    bs_status st;

    *count = dir ? 0 : -1;
    if (!dir)
        return BS_OK;
    st = bs_new(host->cx, &host->results, FOLDER_LIMIT, names);
    while (st == BS_OK && *count < FOLDER_LIMIT && (entry = readdir(dir))) {
        size_t length = strlen(entry->d_name);

        if (length <= 4 || entry->d_name[0] == '.' ||
            strcmp(entry->d_name + length - 4, ".lua") != 0)
            continue;
        st = bs_copy_text(host->cx, &host->results, entry->d_name, length, &(*names)[*count]);
        if (st == BS_OK)
            ++*count;
    }
    closedir(dir);
    return st;
}

/* list = core.folder(path): the names of its files that end in .lua, or nil if it is no folder */
static int core_folder(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    char **names;
    int count;

    if (list_folder(host, luaL_checkstring(L, 1), &names, &count) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    if (count < 0)
        return 0;
    bsl_push_words(L, (const char *const *)names, count);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* list, library = core.places(): folders where packs are found; that of the standard library, or
 * nil */
static int core_places(lua_State *L)
{
    const bs_session *session = bsl_host_of(L)->session;
    int n = 0;

    lua_newtable(L);
    for (const char *folder = session->folders; *folder; folder += strlen(folder) + 1) {
        lua_pushstring(L, folder);
        lua_rawseti(L, -2, ++n);
    }
    lua_pushstring(L, session->opts.bare ? NULL : session->library);
    return 2;
}

#define PACK_SIZE_LIMIT ((size_t)8 << 20)

/* text = core.pack_text(path), or nil and whether there is something else */
static int core_pack_text(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const char *path = luaL_checkstring(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    struct stat st;
    char *text;
    size_t length;

    if (stat(path, &st) != 0 || !S_ISREG(st.st_mode)) {
        lua_pushnil(L);
        lua_pushboolean(L, stat(path, &st) == 0);
        return 2;
    }
    if (bs_read_file(host->cx, &host->results, path, PACK_SIZE_LIMIT, &text, &length) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_pushlstring(L, text, length);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* hex = core.sha256(text) */
static int core_sha256(lua_State *L)
{
    size_t length;
    const char *text = luaL_checklstring(L, 1, &length);
    char hex[65];

    bs_sha256(text, length, hex);
    lua_pushstring(L, hex);
    return 1;
}

/* ---- A look into a pack ---------------------------------------------------------------- */

#define COPY_DEPTH 8

/* Pushes a copy of the value at the top of `from` onto `to`; what is no plain data becomes nil. */
static void copy_value(lua_State *from, lua_State *to, int depth)
{
    size_t length;
    const char *text;

    luaL_checkstack(to, 4, "pack");
    if (lua_type(from, -1) == LUA_TSTRING) {
        text = lua_tolstring(from, -1, &length);
        lua_pushlstring(to, text, length);
    } else if (lua_isinteger(from, -1)) {
        lua_pushinteger(to, lua_tointeger(from, -1));
    } else if (lua_type(from, -1) == LUA_TNUMBER) {
        lua_pushnumber(to, lua_tonumber(from, -1));
    } else if (lua_isboolean(from, -1)) {
        lua_pushboolean(to, lua_toboolean(from, -1));
    } else if (lua_istable(from, -1) && depth > 0 && lua_checkstack(from, 4)) {
        lua_newtable(to);
        lua_pushnil(from);
        while (lua_next(from, -2)) {
            lua_pushvalue(from, -2);
            copy_value(from, to, 0); /* the key */
            lua_pop(from, 1);
            copy_value(from, to, depth - 1);
            lua_pop(from, 1);
            lua_rawset(to, -3);
        }
    } else {
        lua_pushnil(to);
    }
}

/* table = copy(other state), protected, so that the other session is freed in any case */
static int copy_top(lua_State *L)
{
    copy_value(lua_touserdata(L, 1), L, COPY_DEPTH);
    return 1;
}

/* In the other session: table = describe(number of the pack) */
static int describe(lua_State *L)
{
    bsl_open_study(L);
    bsl_push_module(L, "study");
    lua_getfield(L, -1, "describe");
    lua_pushvalue(L, 1);
    lua_call(L, 1, 1);
    return 1;
}

/* Reads the pack in `child` and leaves its description on that session's stack. */
static bs_status study_pack(bs_session *child, const char *path, bsl_fault *fault)
{
    lua_State *L = child->main->L;
    int number;
    bs_status st = bsl_use(child, path, false, &number, fault);

    if (st != BS_OK)
        return st;
    lua_settop(L, 0);
    lua_pushcfunction(L, describe);
    lua_pushinteger(L, number);
    if (bsl_call(child->main, L, 1, 1, 0) == LUA_OK)
        return BS_OK;
    bsl_take_fault(L, fault);
    return BS_ESCRIPT;
}

/* table = core.inspect(path, folder): a pack as study.describe() gives it; its needs are looked for
   in `folder` first */
static int core_inspect(lua_State *L)
{
    bs_session *session = bsl_host_of(L)->session, *child;
    const char *path = luaL_checkstring(L, 1);
    bs_session_opts opts = session->opts;
    bsl_fault fault = {.code = BS_OK};
    int status = LUA_OK;
    bs_status st;

    opts.script_folder = luaL_checkstring(L, 2);
    opts.bare = true;
    st = bs_session_new(&opts, &child);
    if (st != BS_OK) {
        fault.code = st;
        snprintf(fault.message, sizeof fault.message, "%s",
                 child ? bs_session_message(child) : "out of memory");
    } else {
        child->cx.stop = session->cx.stop;
        st = study_pack(child, path, &fault);
    }
    if (st == BS_OK) {
        lua_pushcfunction(L, copy_top);
        lua_pushlightuserdata(L, child->main->L);
        status = lua_pcall(L, 1, 1, 0);
    }
    bs_session_free(child);
    if (st != BS_OK)
        return bsl_raise_fault(L, &fault);
    return status == LUA_OK ? 1 : lua_error(L);
}

void bsl_open_study(lua_State *L)
{
    static const luaL_Reg functions[] = {
        {"nth_synthon", core_nth_synthon},
        {"folder", core_folder},
        {"places", core_places},
        {"pack_text", core_pack_text},
        {"sha256", core_sha256},
        {"inspect", core_inspect},
        {NULL, NULL},
    };

    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.core");
    luaL_setfuncs(L, functions, 0);
    lua_pop(L, 1);
}
