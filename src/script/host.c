/*
 * The life of a Lua state: its memory, its bounds, its embedded modules, and calls into it.
 */
#include "script/host.h"

#include <stdlib.h>
#include <string.h>

#define HOOK_PERIOD 1000
#define PACK_MEMORY_LIMIT ((size_t)256 << 20)
#define PACK_STRING_LIMIT (((size_t)256 << 10) + 64) /* a header goes with the bytes */
#define BYTES_A_UNIT 64 /* taking memory costs as much as an instruction for so many bytes */

/* Whether a pack state may have another block; what it costs is taken from its budget. */
static bool may_grow(bsl_host *host, size_t old, size_t new_size, bool is_string)
{
    if (!host->memory_limit)
        return true;
    host->budget -= (long)(new_size / BYTES_A_UNIT);
    if (host->memory + host->boxed > host->memory_limit ||
        new_size - old > host->memory_limit - host->memory - host->boxed)
        host->breach = "the memory limit of 256 MiB for packs is reached";
    else if (is_string && new_size > PACK_STRING_LIMIT)
        host->breach = "a string of more than 256 KiB in a pack";
    else
        return true;
    return false;
}

/* Lua's allocator contract: freeing and shrinking never fail; with a NULL block the old size is
   the type of the object. */
static void *allocate(void *payload, void *block, size_t old_size, size_t new_size)
{
    bsl_host *host = payload;
    size_t old = block ? old_size : 0;
    void *fresh;

    if (new_size == 0) {
        free(block);
        host->memory -= old;
        return NULL;
    }
    if (new_size > old && !may_grow(host, old, new_size, !block && old_size == LUA_TSTRING))
        return NULL;
    fresh = realloc(block, new_size);
    if (!fresh)
        return new_size <= old ? block : NULL;
    host->memory += new_size - old;
    return fresh;
}

void bsl_box(lua_State *L, const bs_arena *arena)
{
    bsl_host *host = bsl_host_of(L);

    host->boxed += arena->live;
    if (host->memory_limit && host->memory + host->boxed > host->memory_limit) {
        host->breach = "the memory limit of 256 MiB for packs is reached";
        bsl_error(L, BS_ELIMIT, "%s", host->breach);
    }
}

void bsl_unbox(lua_State *L, const bs_arena *arena)
{
    bsl_host_of(L)->boxed -= arena->live;
}

void bsl_check_growth(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    size_t used = atomic_load(&host->session->cx.gate->used);

    if (host->kind == BSL_PACKS && used > host->grown_from &&
        used - host->grown_from > PACK_MEMORY_LIMIT) {
        host->breach = "the memory limit of 256 MiB for packs is reached";
        bsl_error(L, BS_ELIMIT, "%s", host->breach);
    }
}

static void stop_hook(lua_State *L, lua_Debug *ar)
{
    (void)ar;
    lua_sethook(L, NULL, 0, 0);
    bsl_error(L, BS_ESTOPPED, "stopped");
}

/* Counts instructions in a pack state; packs have no pcall, so nothing there swallows it. */
static void count_hook(lua_State *L, lua_Debug *ar)
{
    bsl_host *host = bsl_host_of(L);

    (void)ar;
    host->budget -= HOOK_PERIOD;
    if (host->budget < 0) {
        host->breach = "the limit of instructions for a pack is reached";
        bsl_error(L, BS_ELIMIT, "%s", host->breach);
    }
    if (atomic_load(host->cx->stop))
        bsl_error(L, BS_ESTOPPED, "stopped");
}

bsl_host *bsl_host_of(lua_State *L)
{
    return *(bsl_host **)lua_getextraspace(L);
}

/* The methods of strings in the pack state are the bounded ones, and their metatable is locked. */
static void guard_strings(lua_State *L)
{
    lua_pushliteral(L, "");
    lua_getmetatable(L, -1);
    bsl_push_module(L, "sandbox");
    lua_getfield(L, -1, "strings");
    lua_setfield(L, -3, "__index");
    lua_pushboolean(L, 0);
    lua_setfield(L, -3, "__metatable");
    lua_pop(L, 3);
}

/* core.is_molecule(value) and its like: the type is the upvalue */
static int core_is(lua_State *L)
{
    lua_pushboolean(L, lua_type(L, 1) == LUA_TUSERDATA &&
                           luaL_testudata(L, 1, lua_tostring(L, lua_upvalueindex(1))) != NULL);
    return 1;
}

static void open_kinds(lua_State *L)
{
    static const char *const kinds[] = { "molecule", "pattern", "catalogue", "transform" };

    for (size_t i = 0; i < sizeof kinds / sizeof *kinds; i++) {
        lua_pushfstring(L, "is_%s", kinds[i]);
        lua_pushfstring(L, "backsaw.%s", kinds[i]);
        lua_pushcclosure(L, core_is, 1);
        lua_rawset(L, -3);
    }
}

/* value = core.module(name) */
static int core_module(lua_State *L)
{
    bsl_push_module(L, luaL_checkstring(L, 1));
    return 1;
}

/* Fills a new state: libraries, types, private table. Runs protected. */
static int open_state(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);

    luaL_openlibs(L);
    lua_newtable(L);
    lua_pushvalue(L, -1);
    lua_setfield(L, LUA_REGISTRYINDEX, "backsaw.core");
    lua_newtable(L);
    lua_setfield(L, LUA_REGISTRYINDEX, "backsaw.modules");
    lua_newtable(L);
    lua_setfield(L, LUA_REGISTRYINDEX, "backsaw.hooks");
    lua_pushboolean(L, host->kind != BSL_MAIN);
    lua_setfield(L, -2, "packed");
    lua_pushcfunction(L, core_module);
    lua_setfield(L, -2, "module");
    bsl_open_fault(L);
    bsl_open_mol(L);
    bsl_open_pattern(L);
    bsl_open_rewrite(L);
    bsl_open_polarity(L);
    bsl_open_example(L);
    bsl_open_why(L);
    bsl_open_descriptor(L);
    bsl_open_direct(L);
    open_kinds(L);
    bsl_open_define(L);
    bsl_open_group(L);
    bsl_open_clash(L);
    bsl_open_transform(L);
    bsl_open_pack(L);
    if (host->kind == BSL_MAIN) {
        bsl_open_file(L);
        bsl_open_writer(L);
        bsl_open_catalogue(L);
        bsl_open_route(L);
        bsl_open_report(L);
        bsl_open_explain(L);
        bsl_open_plan(L);
    }
    host->calls = lua_newthread(L);
    lua_setfield(L, LUA_REGISTRYINDEX, "backsaw.calls");
    bsl_push_module(L, "prelude");
    if (host->kind != BSL_MAIN)
        guard_strings(L);
    return 0;
}

bs_status bsl_host_new(bs_session *session, bs_ctx *cx, bsl_kind kind, bsl_host **out)
{
    bsl_host *host = bs_gate_alloc(cx->gate, sizeof *host);
    bsl_fault fault;

    *out = NULL;
    if (!host)
        return bs_fail_memory(cx);
    host->session = session;
    host->kind = kind;
    host->cx = cx;
    bs_arena_init(&host->results, session->cx.gate);
    host->memory_limit = kind == BSL_MAIN ? 0 : PACK_MEMORY_LIMIT;
    host->L = lua_newstate(allocate, host);
    if (!host->L) {
        bsl_host_free(host);
        return bs_fail_memory(cx);
    }
    *(bsl_host **)lua_getextraspace(host->L) = host;
    lua_pushcfunction(host->L, open_state);
    if (lua_pcall(host->L, 0, 0, 0) != LUA_OK) {
        bsl_take_fault(host->L, &fault);
        bsl_host_free(host);
        return bsl_fail_fault(cx, &fault);
    }
    *out = host;
    return BS_OK;
}

void bsl_host_free(bsl_host *host)
{
    bs_gate *gate;

    if (!host)
        return;
    gate = host->session->cx.gate;
    if (host->L)
        lua_close(host->L);
    bs_arena_free(&host->results);
    bs_gate_free(gate, host, sizeof *host);
}

int bsl_call(bsl_host *host, lua_State *L, int arguments, int results, long budget)
{
    bs_mark mark = bs_arena_mark(&host->results);
    bs_ctx *cx = host->cx;
    long kept = host->budget, *outer = cx->budget;
    int status;

    if (host->kind != BSL_MAIN) {
        if (budget)
            host->budget = budget;
        cx->budget = &host->budget;
        lua_sethook(L, count_hook, LUA_MASKCOUNT, HOOK_PERIOD);
    }
    status = lua_pcall(L, arguments, results, 0);
    cx->budget = outer;
    if (budget)
        host->budget = kept;
    bs_arena_rewind(&host->results, mark);
    return status;
}

void bsl_interrupt(bsl_host *host)
{
    int mask = LUA_MASKCALL | LUA_MASKRET | LUA_MASKLINE | LUA_MASKCOUNT;

    lua_sethook(host->L, stop_hook, mask, 1);
    lua_sethook(host->calls, stop_hook, mask, 1);
}

void bsl_calm(bsl_host *host)
{
    lua_sethook(host->L, NULL, 0, 0);
    lua_sethook(host->calls, NULL, 0, 0);
}

void bsl_push_module(lua_State *L, const char *name)
{
    size_t length;
    const char *text;

    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.modules");
    if (lua_getfield(L, -1, name) != LUA_TNIL) {
        lua_remove(L, -2);
        return;
    }
    lua_pop(L, 1);
    text = bsl_embedded(name, &length);
    if (!text)
        luaL_error(L, "no module '%s'", name);
    lua_pushfstring(L, "=[backsaw %s]", name);
    if (luaL_loadbufferx(L, text, length, lua_tostring(L, -1), "t") != LUA_OK)
        lua_error(L);
    lua_remove(L, -2);
    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.core");
    lua_call(L, 1, 1);
    if (lua_isnil(L, -1)) {
        lua_pop(L, 1);
        lua_pushboolean(L, 1);
    }
    lua_pushvalue(L, -1);
    lua_setfield(L, -3, name);
    lua_remove(L, -2);
}

void bsl_new_type(lua_State *L, const char *type, const luaL_Reg *methods, const luaL_Reg *meta)
{
    luaL_newmetatable(L, type);
    lua_pushstring(L, type + strlen("backsaw."));
    lua_setfield(L, -2, "__name");
    if (meta)
        luaL_setfuncs(L, meta, 0);
    lua_newtable(L);
    if (methods)
        luaL_setfuncs(L, methods, 0);
    lua_setfield(L, -2, "__index");
    lua_pushboolean(L, 0);
    lua_setfield(L, -2, "__metatable");
    lua_pop(L, 1);
}

void *bsl_test_type(lua_State *L, int i, const void *type)
{
    void *block = lua_touserdata(L, i);
    bool same;

    if (!block || !lua_getmetatable(L, i))
        return NULL;
    same = lua_topointer(L, -1) == type;
    lua_pop(L, 1);
    return same ? block : NULL;
}

static int push_text(lua_State *L)
{
    const bs_text *text = lua_touserdata(L, 1);

    lua_pushlstring(L, text->data ? text->data : "", text->length);
    return 1;
}

int bsl_push_text(lua_State *L, bs_text *text)
{
    int status;

    lua_pushcfunction(L, push_text);
    lua_pushlightuserdata(L, text);
    status = lua_pcall(L, 1, 1, 0);
    bs_text_free(text);
    return status == LUA_OK ? 1 : lua_error(L);
}
