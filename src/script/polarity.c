/* Polarity in Lua: m:polarity(a, b) for a bond, or for two heteroatoms and what lies between. */
#include "script/host.h"

static int check_atom(lua_State *L, int i)
{
    lua_Integer atom = luaL_checkinteger(L, i);

    luaL_argcheck(L, atom >= 1 && atom <= BS_MOL_MAX_ATOMS, i, "atoms are numbered from 1");
    return (int)atom - 1;
}

static void set_atoms(lua_State *L, int a, int b)
{
    lua_createtable(L, 2, 0);
    lua_pushinteger(L, a + 1);
    lua_rawseti(L, -2, 1);
    lua_pushinteger(L, b + 1);
    lua_rawseti(L, -2, 2);
    lua_setfield(L, -2, "atoms");
}

/* The fields relation and verdict; n is 0 for none. */
static void set_relation(lua_State *L, int n, bool dissonant)
{
    if (n == 0)
        return;
    lua_pushfstring(L, "1,%d", n);
    lua_setfield(L, -2, "relation");
    lua_pushstring(L, dissonant ? "dissonant" : "consonant");
    lua_setfield(L, -2, "verdict");
}

void bsl_push_poles(lua_State *L, const bs_pole *ends)
{
    int turned = 0;

    luaL_checkstack(L, 6, "polarity");
    lua_createtable(L, 0, 7);
    set_atoms(L, ends[0].atom, ends[1].atom);
    lua_createtable(L, 2, 0);
    lua_createtable(L, 1, 0);
    for (int i = 0; i < 2; i++) {
        char label[16];

        bs_pole_label(&ends[i], label, sizeof label);
        lua_pushstring(L, label);
        lua_rawseti(L, -3, i + 1);
        if (ends[i].umpolung) {
            lua_pushstring(L, label);
            lua_rawseti(L, -2, ++turned);
        }
        lua_pushinteger(L, ends[i].atom + 1);
        lua_setfield(L, -4, ends[i].acceptor ? "acceptor" : "donor");
    }
    lua_setfield(L, -3, "umpolung");
    lua_setfield(L, -2, "labels");
}

static void push_bond(lua_State *L, const bs_mol *mol, int a, int b)
{
    bs_polarity found;

    if (bs_polarity_of_bond(bsl_host_of(L)->cx, mol, a, b, &found) != BS_OK)
        bsl_raise(L, NULL, 0);
    bsl_push_poles(L, found.ends);
    set_relation(L, found.relation, found.dissonant);
}

/* The fields paths, chain and cuts of a pair. */
static void set_chains(lua_State *L, const bs_mol *mol, const bs_relation *relation)
{
    int atoms = relation->lengths[0] + 2;

    lua_createtable(L, relation->count, 0);
    for (int i = 0; i < relation->count; i++) {
        lua_pushinteger(L, relation->lengths[i]);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "paths");
    lua_createtable(L, atoms, 0);
    for (int i = 0; i < atoms; i++) {
        lua_pushinteger(L, relation->chain[i] + 1);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "chain");
    lua_createtable(L, atoms - 1, 0);
    for (int i = 0; i + 1 < atoms; i++) {
        push_bond(L, mol, relation->chain[i], relation->chain[i + 1]);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "cuts");
}

/* found = m:polarity(a, b): of the bond between two atoms, else of two heteroatoms; or nil */
static int mol_polarity(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    int a = check_atom(L, 2), b = check_atom(L, 3), count = bs_mol_atom_count(mol);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_relation relation;

    if (a < count && b < count && a != b && bs_mol_bond_between(mol, a, b) >= 0) {
        push_bond(L, mol, a, b);
        return 1;
    }
    if (bs_polarity_of_pair(host->cx, &host->results, mol, a, b, &relation) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    if (relation.count == 0) {
        lua_pushnil(L);
    } else {
        lua_createtable(L, 0, 6);
        set_atoms(L, a, b);
        set_relation(L, relation.lengths[0], relation.dissonant);
        set_chains(L, mol, &relation);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

void bsl_open_polarity(lua_State *L)
{
    lua_getfield(L, -1, "molecule_methods");
    lua_pushcfunction(L, mol_polarity);
    lua_setfield(L, -2, "polarity");
    lua_pop(L, 1);
}
