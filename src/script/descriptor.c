/* Descriptors in Lua: rings, the skeleton, environments of atoms and bonds, likeness of molecules.
 */
#include "script/host.h"

#include "backsaw/descriptor.h"

enum { RADIUS = 2, BITS = 2048, MOST_BITS = 65536 };

/* ---- Rings ----------------------------------------------------------------------------------- */

/* Pushes a list of atoms or bonds, counted from 1. */
static void push_numbers(lua_State *L, const uint32_t *items, int count)
{
    luaL_checkstack(L, 3, "list of numbers");
    lua_createtable(L, count, 0);
    for (int k = 0; k < count; k++) {
        lua_pushinteger(L, (lua_Integer)items[k] + 1);
        lua_rawseti(L, -2, k + 1);
    }
}

static void push_lists(lua_State *L, const bs_atom_lists *lists)
{
    lua_createtable(L, lists->count, 0);
    for (int i = 0; i < lists->count; i++) {
        push_numbers(L, lists->atoms + lists->offsets[i],
                     (int)(lists->offsets[i + 1] - lists->offsets[i]));
        lua_rawseti(L, -2, i + 1);
    }
}

static void push_smallest(lua_State *L, const bs_mol *mol)
{
    int count = bs_mol_ring_count(mol);

    lua_createtable(L, count, 0);
    for (int i = 0; i < count; i++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(mol, i, &atoms);

        push_numbers(L, atoms, size);
        lua_rawseti(L, -2, i + 1);
    }
}

/*
 * lists = m:rings(): for each ring of a smallest set its atoms in order around it; m:rings
 * "relevant" gives all rings that are no sum of shorter ones.
 */
static int mol_rings(lua_State *L)
{
    static const char *const names[] = {"smallest", "relevant", NULL};
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_atom_lists rings;

    if (luaL_checkoption(L, 2, "smallest", names) == 0) {
        push_smallest(L, mol);
        return 1;
    }
    if (bs_mol_relevant_rings(host->cx, &host->results, mol, &rings) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    push_lists(L, &rings);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* lists = m:ring_systems(): the atoms of rings that share bonds */
static int mol_ring_systems(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_atom_lists systems;

    if (bs_mol_ring_systems(host->cx, &host->results, mol, &systems) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    push_lists(L, &systems);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* m = m:skeleton(): rings and what joins them; nil without rings */
static int mol_skeleton(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_mol *skeleton;

    if (bs_mol_skeleton(host->cx, &host->results, mol, &skeleton) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    if (skeleton)
        bsl_pushmol(L, skeleton, NULL);
    else
        lua_pushnil(L);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* ---- Environments ---------------------------------------------------------------------------- */

static uint32_t check_atom(lua_State *L, int i, const bs_mol *mol, int arg)
{
    lua_Integer atom = lua_isinteger(L, i) ? lua_tointeger(L, i) : 0;

    luaL_argcheck(L, atom >= 1 && atom <= bs_mol_atom_count(mol), arg, "no such atom");
    return (uint32_t)(atom - 1);
}

/*
 * t = m:environment(atom, radius) or m:environment({ a, b }, radius): atoms, nearest first, their
 * distances, bonds, and a key that alike environments share
 */
static int mol_environment(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    lua_Integer radius = luaL_optinteger(L, 3, 1);
    uint32_t centres[2];
    int count = 1;
    bs_environment e;

    luaL_argcheck(L, radius >= 0 && radius <= 10, 3, "a radius must be 0 to 10");
    if (lua_istable(L, 2)) {
        luaL_argcheck(L, lua_rawlen(L, 2) == 2, 2, "an atom or two are expected");
        for (count = 0; count < 2; count++) {
            lua_rawgeti(L, 2, count + 1);
            centres[count] = check_atom(L, -1, mol, 2);
            lua_pop(L, 1);
        }
    } else {
        centres[0] = check_atom(L, 2, mol, 2);
    }
    if (bs_mol_environment(host->cx, &host->results, mol, centres, count, (int)radius, &e) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_createtable(L, 0, 4);
    push_numbers(L, e.atoms, e.atom_count);
    lua_setfield(L, -2, "atoms");
    push_numbers(L, e.bonds, e.bond_count);
    lua_setfield(L, -2, "bonds");
    lua_createtable(L, e.atom_count, 0);
    for (int i = 0; i < e.atom_count; i++) {
        lua_pushinteger(L, (lua_Integer)e.distances[i]);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "distances");
    lua_pushinteger(L, (lua_Integer)e.key);
    lua_setfield(L, -2, "key");
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* ---- Fingerprints ------------------------------------------------------------------------------
 */

/* Makes the fingerprint of a molecule; `words` has room for `bits`. */
static void fold(lua_State *L, const bs_mol *mol, int radius, int bits, uint64_t *words)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_surrounding *items;
    int count;

    if (bs_mol_surroundings(host->cx, &host->results, mol, radius, &items, &count) != BS_OK)
        bsl_raise_from(L, mark, NULL, 0);
    bs_fingerprint_fold(items, count, bits, words);
    bs_arena_rewind(&host->results, mark);
}

/* list = m:fingerprint([radius [, bits]]): the numbers of the bits that are set, ascending */
static int mol_fingerprint(lua_State *L)
{
    const bs_mol *mol = bsl_checkmol(L, 1);
    lua_Integer radius = luaL_optinteger(L, 2, RADIUS), bits = luaL_optinteger(L, 3, BITS);
    uint64_t words[MOST_BITS / 64];
    int count = 0;

    luaL_argcheck(L, radius >= 0 && radius <= 10, 2, "a radius must be 0 to 10");
    luaL_argcheck(L, bits >= 64 && bits <= MOST_BITS && (bits & (bits - 1)) == 0, 3,
                  "bits must be a power of two, 64 to 65536");
    fold(L, mol, (int)radius, (int)bits, words);
    lua_newtable(L);
    for (lua_Integer i = 0; i < bits; i++) {
        if (!(words[i / 64] >> i % 64 & 1))
            continue;
        lua_pushinteger(L, i + 1);
        lua_rawseti(L, -2, ++count);
    }
    return 1;
}

/* number = m:similarity(other): Tanimoto's coefficient of the fingerprints, 0 to 1 */
static int mol_similarity(lua_State *L)
{
    const bs_mol *mols[2] = {bsl_checkmol(L, 1), bsl_tomol(L, 2)};
    uint64_t words[2][BITS / 64];

    for (int i = 0; i < 2; i++)
        fold(L, mols[i], RADIUS, BITS, words[i]);
    lua_pushnumber(L, bs_fingerprint_tanimoto(words[0], words[1], BITS));
    return 1;
}

void bsl_open_descriptor(lua_State *L)
{
    static const luaL_Reg methods[] = {
        {"rings", mol_rings},
        {"ring_systems", mol_ring_systems},
        {"skeleton", mol_skeleton},
        {"environment", mol_environment},
        {"fingerprint", mol_fingerprint},
        {"similarity", mol_similarity},
        {NULL, NULL},
    };

    lua_getfield(L, -1, "molecule_methods");
    luaL_setfuncs(L, methods, 0);
    lua_pop(L, 1);
}
