/* Groups and clashes in Lua: m:groups(), m:clashes(conditions, ...), and those of steps. */
#include "script/host.h"

#include <string.h>

static void push_atoms(lua_State *L, const uint32_t *atoms, int count)
{
    lua_createtable(L, count, 0);
    for (int i = 0; i < count; i++) {
        lua_pushinteger(L, (lua_Integer)atoms[i] + 1);
        lua_rawseti(L, -2, i + 1);
    }
}

/* list = m:groups(): { group =, atoms = }, those without that a narrower one covers */
static int mol_groups(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_rules *rules = host->session->rules;
    bs_mark mark = bs_arena_mark(&host->results);
    bs_group_hits hits;

    if (bs_groups_find(host->cx, &host->results, rules, bsl_checkmol(L, 1), &hits) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_createtable(L, hits.count, 0);
    for (int i = 0; i < hits.count; i++) {
        lua_createtable(L, 0, 2);
        lua_pushstring(L, bs_rules_group(rules, hits.items[i].group)->name);
        lua_setfield(L, -2, "group");
        push_atoms(L, hits.items[i].atoms, hits.items[i].count);
        lua_setfield(L, -2, "atoms");
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

void bsl_push_clashes(lua_State *L, const bs_clashes *clashes, bs_fate fate, bool precursors)
{
    int n = 0;

    lua_newtable(L);
    for (int i = 0; i < clashes->count; i++) {
        const bs_clash *clash = &clashes->items[i];

        if (clash->fate != fate)
            continue;
        lua_createtable(L, 0, 6);
        lua_pushstring(L, clash->group);
        lua_setfield(L, -2, "group");
        lua_pushstring(L, clash->other);
        lua_setfield(L, -2, "other");
        push_atoms(L, clash->atoms, clash->count);
        lua_setfield(L, -2, "atoms");
        lua_pushstring(L, bs_fate_word(clash->fate));
        lua_setfield(L, -2, "verdict");
        lua_pushstring(L, clash->why);
        lua_setfield(L, -2, "why");
        if (precursors) {
            lua_pushinteger(L, clash->precursor + 1);
            lua_setfield(L, -2, "precursor");
        }
        lua_rawseti(L, -2, ++n);
    }
}

/* Marks the atoms listed in the table at `i`, 1-based, for a molecule of `count` atoms. */
static bool *read_atoms(lua_State *L, int i, int count)
{
    bsl_host *host = bsl_host_of(L);
    bool *marked;

    if (bs_new(host->cx, &host->results, count + 1, &marked) != BS_OK)
        bsl_raise(L, NULL, 0);
    for (lua_Integer k = 1; k <= (lua_Integer)lua_rawlen(L, i); k++) {
        lua_Integer atom = 0;

        if (lua_rawgeti(L, i, k) == LUA_TNUMBER)
            atom = lua_tointeger(L, -1);
        if (atom < 1 || atom > count)
            bsl_error(L, BS_EVALUE,
                      "clashes: 'reacting': entry %d is no atom; numbers from 1 to %d are expected",
                      (int)k, count);
        marked[atom - 1] = true;
        lua_pop(L, 1);
    }
    return marked;
}

/* clashes, cautions = core.clashes(m, class, atoms or nil) */
static int core_clashes(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_rules *rules = host->session->rules;
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    int conditions = bs_rules_find_conditions(rules, luaL_checkstring(L, 2));
    bool *reacting = NULL;
    bs_clashes clashes;

    if (conditions < 0)
        return bsl_error(L, BS_ENOTFOUND, "no class of conditions '%s'", lua_tostring(L, 2));
    if (lua_istable(L, 3))
        reacting = read_atoms(L, 3, bs_mol_atom_count(mol));
    if (bs_clashes_find(host->cx, &host->results, rules, mol, conditions, reacting, &clashes) !=
        BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    bsl_push_clashes(L, &clashes, BS_ATTACKED, false);
    bsl_push_clashes(L, &clashes, BS_SLOW, false);
    bs_arena_rewind(&host->results, mark);
    return 2;
}

/* ---- Steps ----------------------------------------------------------------------------- */

static void push_reacting(lua_State *L, const bs_step *step)
{
    lua_createtable(L, step->precursor_count, 0);
    for (int i = 0; i < step->precursor_count; i++) {
        int n = 0;

        lua_newtable(L);
        for (int k = 0; k < bs_mol_atom_count(step->precursors[i]); k++) {
            if (!step->reacting[i][k])
                continue;
            lua_pushinteger(L, k + 1);
            lua_rawseti(L, -2, ++n);
        }
        lua_rawseti(L, -2, i + 1);
    }
}

void bsl_set_clashes(lua_State *L, const bs_step *step)
{
    bsl_host *host = bsl_host_of(L);
    bs_clashes clashes;

    if (bs_step_clashes(host->cx, &host->results, host->session->rules, step, &clashes) != BS_OK)
        bsl_raise(L, NULL, 0);
    bsl_push_clashes(L, &clashes, BS_ATTACKED, true);
    lua_setfield(L, -2, "clashes");
    bsl_push_clashes(L, &clashes, BS_SLOW, true);
    lua_setfield(L, -2, "worries");
    push_reacting(L, step);
    lua_setfield(L, -2, "reacting");
}

/* The step in the table at `i`, in the results arena; the table keeps the molecules alive. */
static void read_step(lua_State *L, int i, bs_step *step)
{
    bsl_host *host = bsl_host_of(L);
    const char *name = bsl_text_field(L, i, "transform");

    *step = (bs_step){ .transform = name ? bs_rules_find(host->session->rules, name) : -1 };
    if (step->transform < 0)
        bsl_error(L, BS_ENOTFOUND, "protections: the step's transform is not in use");
    lua_getfield(L, i, "precursors");
    lua_getfield(L, i, "reacting");
    luaL_checktype(L, -2, LUA_TTABLE);
    luaL_checktype(L, -1, LUA_TTABLE);
    step->precursor_count = (int)lua_rawlen(L, -2);
    if (bs_new(host->cx, &host->results, step->precursor_count + 1, &step->precursors) != BS_OK ||
        bs_new(host->cx, &host->results, step->precursor_count + 1, &step->reacting) != BS_OK)
        bsl_raise(L, NULL, 0);
    for (int k = 0; k < step->precursor_count; k++) {
        const bs_mol *mol;

        lua_rawgeti(L, -2, k + 1);
        mol = bsl_checkmol(L, -1);
        step->precursors[k] = (bs_mol *)mol;
        lua_rawgeti(L, -2, k + 1);
        luaL_checktype(L, -1, LUA_TTABLE);
        step->reacting[k] = read_atoms(L, lua_gettop(L), bs_mol_atom_count(mol));
        lua_pop(L, 2);
    }
    lua_pop(L, 2);
}

static void set_class(lua_State *L, const char *field, const bs_rules *rules, int conditions)
{
    lua_pushstring(L, bs_rules_conditions(rules, conditions)->name);
    lua_setfield(L, -2, field);
}

static void push_protection(lua_State *L, const bs_rules *rules, const bs_protection *found,
                            const bs_clash *clash)
{
    const bs_protecting_def *def = bs_rules_protecting(rules, found->protecting);

    lua_createtable(L, 0, 10);
    lua_pushstring(L, def->name);
    lua_setfield(L, -2, "name");
    lua_pushstring(L, def->title);
    lua_setfield(L, -2, "title");
    lua_pushinteger(L, clash->precursor + 1);
    lua_setfield(L, -2, "precursor");
    lua_pushstring(L, clash->group);
    lua_setfield(L, -2, "group");
    push_atoms(L, clash->atoms, clash->count);
    lua_setfield(L, -2, "atoms");
    lua_pushstring(L, bs_fate_word(found->fate));
    lua_setfield(L, -2, "verdict");
    set_class(L, "installed_by", rules, found->installed_by);
    set_class(L, "removed_by", rules, found->removed_by);
    lua_pushstring(L, def->install_reagents);
    lua_setfield(L, -2, "install_reagents");
    lua_pushstring(L, def->removal_reagents);
    lua_setfield(L, -2, "removal_reagents");
    lua_pushstring(L, def->remarks);
    lua_setfield(L, -2, "remarks");
}

/* list = core.protections(step): for a step of the rule book, with reacting */
static int core_protections(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_rules *rules = host->session->rules;
    bs_mark mark = bs_arena_mark(&host->results);
    bs_protections found;
    bs_clashes clashes;
    bs_step step;

    luaL_checktype(L, 1, LUA_TTABLE);
    lua_settop(L, 1);
    read_step(L, 1, &step);
    lua_getfield(L, 1, "product");
    if (bs_step_clashes(host->cx, &host->results, rules, &step, &clashes) != BS_OK ||
        bs_step_protections(host->cx, &host->results, rules, &step, bsl_checkmol(L, 2), &clashes,
                            &found) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_createtable(L, found.count, 0);
    for (int i = 0; i < found.count; i++) {
        push_protection(L, rules, &found.items[i], &clashes.items[found.items[i].clash]);
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

void bsl_open_clash(lua_State *L)
{
    static const luaL_Reg functions[] = {
        { "clashes", core_clashes },
        { "protections", core_protections },
        { NULL, NULL },
    };

    luaL_setfuncs(L, functions, 0);
    lua_getfield(L, -1, "molecule_methods");
    lua_pushcfunction(L, mol_groups);
    lua_setfield(L, -2, "groups");
    lua_pop(L, 1);
}
