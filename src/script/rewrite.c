/*
 * Rewritings in Lua: a bare reaction SMARTS that is applied to molecules. The box is as that of
 * a pattern.
 */
#include "script/host.h"

#define REWRITE_TYPE "backsaw.rewriting"

typedef struct rewrite_box {
    bs_arena arena;
    bs_rewrite *rewrite; /* NULL once closed */
} rewrite_box;

static const bs_rewrite *check_rewrite(lua_State *L, int i)
{
    rewrite_box *box = luaL_testudata(L, i, REWRITE_TYPE);

    if (!box)
        bsl_type_error(L, i, "rewriting");
    if (!box->rewrite)
        bsl_error(L, BS_EVALUE, "the rewriting is closed");
    return box->rewrite;
}

/* r = core.rewrite "A>>B" */
static int core_rewrite(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    rewrite_box *box;
    const char *text;
    size_t length;

    if (lua_type(L, 1) != LUA_TSTRING)
        bsl_type_error(L, 1, "reaction SMARTS");
    text = lua_tolstring(L, 1, &length);
    box = lua_newuserdatauv(L, sizeof *box, 1);
    box->rewrite = NULL;
    bs_arena_init(&box->arena, host->session->cx.gate);
    luaL_setmetatable(L, REWRITE_TYPE);
    lua_pushvalue(L, 1);
    lua_setiuservalue(L, -2, 1);
    if (bs_rewrite_read(host->cx, &box->arena, text, length, &box->rewrite) != BS_OK) {
        box->rewrite = NULL;
        return bsl_raise(L, text, length);
    }
    bsl_box(L, &box->arena);
    return 1;
}

const bs_mol **bsl_collect_mols(lua_State *L, int first, int *count)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol **mols;
    int top = lua_gettop(L);

    *count = top - first + 1 > 0 ? top - first + 1 : 0;
    for (int i = 0; i < *count; i++)
        bsl_tomol(L, first + i);
    if (bs_new(host->cx, &host->results, *count + 1, &mols) != BS_OK)
        bsl_raise(L, NULL, 0);
    for (int i = 0; i < *count; i++)
        mols[i] = bsl_testmol(L, first + i);
    return mols;
}

/* outcomes = r:apply(m, ...): a list of lists of molecules */
static int rewrite_apply(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_rewrite *rewrite = check_rewrite(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_outcomes outcomes;
    int count;
    const bs_mol **mols = bsl_collect_mols(L, 2, &count);

    if (bs_rewrite_apply(host->cx, &host->results, rewrite, mols, count, &outcomes) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_createtable(L, outcomes.count, 0);
    for (int i = 0; i < outcomes.count; i++) {
        const bs_outcome *outcome = &outcomes.items[i];

        bsl_push_mols(L, outcome->products, outcome->smiles, outcome->product_count);
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* text = tostring(r) */
static int rewrite_tostring(lua_State *L)
{
    check_rewrite(L, 1);
    lua_getiuservalue(L, 1, 1);
    return 1;
}

static int rewrite_gc(lua_State *L)
{
    rewrite_box *box = luaL_checkudata(L, 1, REWRITE_TYPE);

    box->rewrite = NULL;
    bsl_unbox(L, &box->arena);
    bs_arena_free(&box->arena);
    return 0;
}

void bsl_open_rewrite(lua_State *L)
{
    static const luaL_Reg methods[] = { { "apply", rewrite_apply }, { NULL, NULL } };
    static const luaL_Reg meta[] = {
        { "__tostring", rewrite_tostring },
        { "__gc", rewrite_gc },
        { NULL, NULL },
    };

    bsl_new_type(L, REWRITE_TYPE, methods, meta);
    lua_pushcfunction(L, core_rewrite);
    lua_setfield(L, -2, "rewrite");
}
