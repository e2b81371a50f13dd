/* Explanations in Lua: t:why(m), and near misses for m:ideas(). */
#include "script/host.h"

static void push_atoms(lua_State *L, const bs_reason *reason)
{
    lua_createtable(L, reason->atom_count, 0);
    for (int i = 0; i < reason->atom_count; i++) {
        lua_pushinteger(L, (lua_Integer)reason->atoms[i] + 1);
        lua_rawseti(L, -2, i + 1);
    }
}

static void set_smiles(lua_State *L, const char *field, char *const *list, int count)
{
    if (count == 0)
        return;
    bsl_push_words(L, (const char *const *)list, count);
    lua_setfield(L, -2, field);
}

static void push_reason(lua_State *L, const bs_reason *reason)
{
    static const char *const kinds[] = {
        [BS_REASON_PATTERN] = "pattern", [BS_REASON_PRECURSOR] = "precursor",
        [BS_REASON_STRAIN] = "strain",   [BS_REASON_WHEN] = "when",
        [BS_REASON_SAME] = "same",       [BS_REASON_FORWARD] = "forward",
    };

    luaL_checkstack(L, 6, "reason");
    lua_createtable(L, 0, 6);
    lua_pushstring(L, kinds[reason->kind]);
    lua_setfield(L, -2, "kind");
    lua_pushstring(L, reason->text);
    lua_setfield(L, -2, "text");
    push_atoms(L, reason);
    lua_setfield(L, -2, "atoms");
    lua_pushstring(L, reason->marked);
    lua_setfield(L, -2, "marked");
    set_smiles(L, "precursors", reason->precursors, reason->precursor_count);
    set_smiles(L, "instead", reason->instead, reason->instead_count);
}

/* steps, reasons = core.why(index, m), index 0-based */
static int core_why(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    int index = (int)luaL_checkinteger(L, 1);
    const bs_mol *mol = bsl_tomol(L, 2);
    bs_rule_hooks hooks = bsl_session_hooks(host->session);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_reasons reasons;

    if (bs_rules_why(host->cx, &host->results, host->session->rules, index, mol, &hooks,
                     &reasons) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_pushinteger(L, reasons.step_count);
    lua_createtable(L, reasons.count, 0);
    for (int i = 0; i < reasons.count; i++) {
        push_reason(L, &reasons.items[i]);
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 2;
}

/* reason, size = core.near_miss(index, m), or nothing */
static int core_near_miss(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    int index = (int)luaL_checkinteger(L, 1), size;
    const bs_mol *mol = bsl_tomol(L, 2);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_reason reason;
    bool near;

    if (bs_rules_near_miss(host->cx, &host->results, host->session->rules, index, mol, &reason,
                           &size, &near) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    if (near) {
        push_reason(L, &reason);
        lua_pushinteger(L, size);
    }
    bs_arena_rewind(&host->results, mark);
    return near ? 2 : 0;
}

void bsl_open_why(lua_State *L)
{
    lua_pushcfunction(L, core_why);
    lua_setfield(L, -2, "why");
    lua_pushcfunction(L, core_near_miss);
    lua_setfield(L, -2, "near_miss");
}
