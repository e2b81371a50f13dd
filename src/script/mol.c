/*
 * Molecules in Lua. A molecule is copied into its userdata block, so it needs no finaliser; its
 * canonical SMILES is kept as the first uservalue once it was asked for, what its file says of it
 * as the second.
 */
#include "script/host.h"

#include <string.h>

#define MOL_TYPE "backsaw.molecule"

void bsl_pushmol(lua_State *L, const bs_mol *mol, const char *smiles)
{
    size_t bytes = bs_mol_bytes(mol);
    void *block = lua_newuserdatauv(L, bytes, 2);

    memcpy(block, mol, bytes);
    luaL_setmetatable(L, MOL_TYPE);
    if (smiles) {
        lua_pushstring(L, smiles);
        lua_setiuservalue(L, -2, 1);
    }
}

const bs_mol *bsl_checkmol(lua_State *L, int i)
{
    const bs_mol *mol = bsl_testmol(L, i);

    if (!mol)
        bsl_type_error(L, i, "molecule");
    return mol;
}

const bs_mol *bsl_testmol(lua_State *L, int i)
{
    return bsl_test_type(L, i, bsl_host_of(L)->mol_type);
}

/* Skips blanks; returns the place of the first other byte at or behind `at`. */
static size_t skip_blanks(const char *text, size_t length, size_t at)
{
    while (at < length && (text[at] == ' ' || text[at] == '\t' || text[at] == '\n' ||
                           text[at] == '\r'))
        at++;
    return at;
}

/* Reads SMILES that fills the whole string and pushes the molecule. */
static void read_smiles(lua_State *L, const char *text, size_t length)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    size_t start = skip_blanks(text, length, 0), used = 0;
    bs_mol *mol;

    if (start == length) {
        bs_fail_at(host->cx, BS_ESYNTAX, 0, "the SMILES is empty");
        bsl_raise(L, text, length);
    }
    if (bs_smiles_read(host->cx, &host->results, text + start, length - start, &used, &mol) !=
        BS_OK) {
        if (host->cx->error.offset >= 0)
            host->cx->error.offset += (long)start;
        bsl_raise_from(L, mark, text, length);
    }
    used = skip_blanks(text, length, start + used);
    if (used < length) {
        bs_fail_at(host->cx, BS_ESYNTAX, used, "text behind the SMILES; one molecule is expected");
        bsl_raise_from(L, mark, text, length);
    }
    bsl_pushmol(L, mol, NULL);
    bs_arena_rewind(&host->results, mark);
}

const bs_mol *bsl_tomol(lua_State *L, int i)
{
    const bs_mol *mol = bsl_testmol(L, i);
    const char *text;
    size_t length;

    if (mol)
        return mol;
    if (lua_type(L, i) != LUA_TSTRING)
        bsl_type_error(L, i, "molecule or SMILES");
    text = lua_tolstring(L, i, &length);
    i = lua_absindex(L, i);
    read_smiles(L, text, length);
    lua_replace(L, i);
    return bsl_testmol(L, i);
}

const char *bsl_push_canonical(lua_State *L, int i)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, i);
    bs_mark mark = bs_arena_mark(&host->results);
    char *text;

    i = lua_absindex(L, i);
    if (lua_getiuservalue(L, i, 1) == LUA_TSTRING)
        return lua_tostring(L, -1);
    lua_pop(L, 1);
    if (bs_smiles_canonical(host->cx, &host->results, mol, 0, &text) != BS_OK)
        bsl_raise_from(L, mark, NULL, 0);
    lua_pushstring(L, text);
    bs_arena_rewind(&host->results, mark);
    lua_pushvalue(L, -1);
    lua_setiuservalue(L, i, 1);
    return lua_tostring(L, -1);
}

void bsl_push_mols(lua_State *L, bs_mol *const *mols, char *const *smiles, int count)
{
    luaL_checkstack(L, 4, "list of molecules");
    lua_createtable(L, count, 0);
    for (int i = 0; i < count; i++) {
        bsl_pushmol(L, mols[i], smiles ? smiles[i] : NULL);
        lua_rawseti(L, -2, i + 1);
    }
}

/* m = core.mol(smiles or m) */
static int core_mol(lua_State *L)
{
    lua_settop(L, 1);
    bsl_tomol(L, 1);
    return 1;
}

/* text = m:smiles(): canonical SMILES; m:smiles "labels" writes the labels too, m:smiles "plain"
   leaves stereo out */
static int mol_smiles(lua_State *L)
{
    static const char *const names[] = { "canonical", "labels", "plain", NULL };
    static const unsigned flags[] = { 0, BS_SMILES_LABELS, BS_SMILES_NO_STEREO };
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    int choice = luaL_checkoption(L, 2, "canonical", names);
    bs_mark mark = bs_arena_mark(&host->results);
    char *text;

    if (choice == 0) {
        bsl_push_canonical(L, 1);
        return 1;
    }
    if (bs_smiles_canonical(host->cx, &host->results, mol, flags[choice], &text) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_pushstring(L, text);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* text = tostring(m) */
static int mol_tostring(lua_State *L)
{
    bsl_push_canonical(L, 1);
    return 1;
}

/* same = a == b */
static int mol_eq(lua_State *L)
{
    const bs_mol *a = bsl_testmol(L, 1), *b = bsl_testmol(L, 2);

    if (!a || !b) {
        lua_pushboolean(L, 0);
        return 1;
    }
    bsl_push_canonical(L, 1);
    bsl_push_canonical(L, 2);
    lua_pushboolean(L, lua_rawequal(L, -1, -2));
    return 1;
}

/* text = m:formula() */
static int mol_formula(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    char *text;

    if (bs_mol_formula(host->cx, &host->results, mol, &text) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_pushstring(L, text);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* g_per_mol = m:mass() */
static int mol_mass(lua_State *L)
{
    const bs_mol *mol = bsl_checkmol(L, 1);
    double mass;

    if (bs_mol_mass(bsl_host_of(L)->cx, mol, &mass) != BS_OK)
        return bsl_raise(L, NULL, 0);
    lua_pushnumber(L, mass);
    return 1;
}

/* u = m:exact_mass() */
static int mol_exact_mass(lua_State *L)
{
    const bs_mol *mol = bsl_checkmol(L, 1);
    double mass;

    if (bs_mol_exact_mass(bsl_host_of(L)->cx, mol, &mass) != BS_OK)
        return bsl_raise(L, NULL, 0);
    lua_pushnumber(L, mass);
    return 1;
}

/* index = m:complexity() */
static int mol_complexity(lua_State *L)
{
    const bs_mol *mol = bsl_checkmol(L, 1);
    double index;

    if (bs_mol_complexity(bsl_host_of(L)->cx, mol, &index) != BS_OK)
        return bsl_raise(L, NULL, 0);
    lua_pushnumber(L, index);
    return 1;
}

/* n = m:charge() */
static int mol_charge(lua_State *L)
{
    lua_pushinteger(L, bs_mol_charge(bsl_checkmol(L, 1)));
    return 1;
}

/* list = m:doubts(): what is strange about it, and what its file says that was left out */
static int mol_doubts(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    char **texts;
    int count, more = 0;

    if (bs_mol_doubts(host->cx, &host->results, mol, &texts, &count) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    bsl_push_words(L, (const char *const *)texts, count);
    bs_arena_rewind(&host->results, mark);
    if (lua_getiuservalue(L, 1, BSL_MOL_RECORD) != LUA_TTABLE)
        lua_pop(L, 1);
    else if (lua_getfield(L, -1, "doubts") == LUA_TTABLE) {
        while (lua_rawgeti(L, -1, ++more) != LUA_TNIL)
            lua_rawseti(L, -4, count + more);
        lua_pop(L, 3);
    } else {
        lua_pop(L, 2);
    }
    return 1;
}

static int push_inchi(lua_State *L, bool key)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    char *text;

    if (bs_inchi(host->cx, &host->results, mol, key, &text) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_pushstring(L, text);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* text = m:inchi() */
static int mol_inchi(lua_State *L)
{
    return push_inchi(L, false);
}

/* text = m:inchikey() */
static int mol_inchikey(lua_State *L)
{
    return push_inchi(L, true);
}

/* found = m:has(p) */
static int mol_has(lua_State *L)
{
    const bs_mol *mol = bsl_checkmol(L, 1);
    const bs_pattern *pattern = bsl_topattern(L, 2);
    bool found;

    if (bs_pattern_has(bsl_host_of(L)->cx, pattern, mol, &found) != BS_OK)
        return bsl_raise(L, NULL, 0);
    lua_pushboolean(L, found);
    return 1;
}

/* n = m:count(p) */
static int mol_count(lua_State *L)
{
    return bsl_count_matches(L, bsl_checkmol(L, 1), bsl_topattern(L, 2));
}

/* lists = m:find(p [, limit or { limit = ..., all = true }]): for each match the atoms in the order of the pattern */
static int mol_find(lua_State *L)
{
    return bsl_push_matches(L, bsl_checkmol(L, 1), bsl_topattern(L, 2), 3);
}

const int *bsl_symmetry(lua_State *L, const bs_mol *mol, bs_mark mark)
{
    bsl_host *host = bsl_host_of(L);
    int *classes;

    if (bs_mol_symmetry(host->cx, &host->results, mol, &classes) != BS_OK)
        bsl_raise_from(L, mark, NULL, 0);
    return classes;
}

void bsl_push_atom(lua_State *L, const bs_mol *mol, const int *classes, int atom)
{
    const char *symbol = bs_element_symbol(bs_mol_atom_element(mol, atom));

    lua_createtable(L, 0, 11);
    lua_pushstring(L, symbol ? symbol : "*");
    lua_setfield(L, -2, "element");
    lua_pushinteger(L, bs_mol_atom_hydrogens(mol, atom));
    lua_setfield(L, -2, "hydrogens");
    lua_pushinteger(L, bs_mol_atom_charge(mol, atom));
    lua_setfield(L, -2, "charge");
    lua_pushinteger(L, bs_mol_atom_isotope(mol, atom));
    lua_setfield(L, -2, "isotope");
    lua_pushboolean(L, bs_mol_atom_is_aromatic(mol, atom));
    lua_setfield(L, -2, "aromatic");
    lua_pushboolean(L, bs_mol_atom_in_ring(mol, atom));
    lua_setfield(L, -2, "ring");
    lua_pushinteger(L, bs_mol_atom_degree(mol, atom));
    lua_setfield(L, -2, "degree");
    lua_pushinteger(L, bs_mol_atom_carbons(mol, atom));
    lua_setfield(L, -2, "carbons");
    lua_pushinteger(L, bs_mol_atom_label(mol, atom));
    lua_setfield(L, -2, "label");
    lua_pushinteger(L, classes[atom] + 1);
    lua_setfield(L, -2, "symmetry");
    lua_pushinteger(L, bs_mol_atom_hybridisation(mol, atom));
    lua_setfield(L, -2, "hybridisation");
}

/* The CIP labels of a molecule; NULL where it is too large for them. */
static void find_cip(lua_State *L, const bs_mol *mol, bs_mark mark, char **atoms, char **bonds)
{
    bsl_host *host = bsl_host_of(L);
    bs_status st = bs_mol_cip(host->cx, &host->results, mol, atoms, bonds);

    if (st != BS_OK && st != BS_ELIMIT)
        bsl_raise_from(L, mark, NULL, 0);
}

/* Sets the field `cip` of the table on top if there is a label. */
static void set_cip(lua_State *L, const char *labels, int i)
{
    if (!labels || !labels[i])
        return;
    lua_pushlstring(L, labels + i, 1);
    lua_setfield(L, -2, "cip");
}

/* list = m:atoms() */
static int mol_atoms(lua_State *L)
{
    const bs_mol *mol = bsl_checkmol(L, 1);
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    const int *classes = bsl_symmetry(L, mol, mark);
    int count = bs_mol_atom_count(mol);
    char *labels, *bond_labels;

    find_cip(L, mol, mark, &labels, &bond_labels);
    lua_createtable(L, count, 0);
    for (int i = 0; i < count; i++) {
        bsl_push_atom(L, mol, classes, i);
        set_cip(L, labels, i);
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* list = m:bonds(): each with its two atoms as [1] and [2], order, aromatic, ring, geometry, cip */
static int mol_bonds(lua_State *L)
{
    static const char *const geometry[] = { NULL, "cis", "trans" };
    const bs_mol *mol = bsl_checkmol(L, 1);
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    int count = bs_mol_bond_count(mol), a, b;
    char *labels, *atom_labels;

    find_cip(L, mol, mark, &atom_labels, &labels);
    lua_createtable(L, count, 0);
    for (int i = 0; i < count; i++) {
        bs_mol_bond_ends(mol, i, &a, &b);
        lua_createtable(L, 2, 5);
        lua_pushinteger(L, a + 1);
        lua_rawseti(L, -2, 1);
        lua_pushinteger(L, b + 1);
        lua_rawseti(L, -2, 2);
        lua_pushinteger(L, bs_mol_bond_order(mol, i));
        lua_setfield(L, -2, "order");
        lua_pushboolean(L, bs_mol_bond_is_aromatic(mol, i));
        lua_setfield(L, -2, "aromatic");
        lua_pushboolean(L, bs_mol_bond_in_ring(mol, i));
        lua_setfield(L, -2, "ring");
        lua_pushstring(L, geometry[bs_mol_bond_geometry(mol, i)]);
        lua_setfield(L, -2, "geometry");
        set_cip(L, labels, i);
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* list = m:fragments(): the connected pieces */
static int mol_fragments(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_checkmol(L, 1);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_mol **pieces;
    int count;

    if (bs_mol_fragments(host->cx, &host->results, mol, &pieces, &count) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    bsl_push_mols(L, pieces, NULL, count);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* m.formula, m.name, ...: methods, and what the file of the molecule says of it */
static int mol_index(lua_State *L)
{
    lua_settop(L, 2);
    lua_pushvalue(L, 2);
    if (lua_rawget(L, lua_upvalueindex(1)) != LUA_TNIL)
        return 1;
    if (!bsl_testmol(L, 1) || lua_getiuservalue(L, 1, BSL_MOL_RECORD) != LUA_TTABLE) {
        lua_pushnil(L);
        return 1;
    }
    lua_pushvalue(L, 2);
    lua_rawget(L, -2);
    return 1;
}

void bsl_open_mol(lua_State *L)
{
    static const luaL_Reg methods[] = {
        { "smiles", mol_smiles },
        { "formula", mol_formula },
        { "mass", mol_mass },
        { "exact_mass", mol_exact_mass },
        { "charge", mol_charge },
        { "complexity", mol_complexity },
        { "doubts", mol_doubts },
        { "inchi", mol_inchi },
        { "inchikey", mol_inchikey },
        { "has", mol_has },
        { "count", mol_count },
        { "find", mol_find },
        { "atoms", mol_atoms },
        { "bonds", mol_bonds },
        { "fragments", mol_fragments },
        { NULL, NULL },
    };
    static const luaL_Reg meta[] = {
        { "__tostring", mol_tostring },
        { "__eq", mol_eq },
        { NULL, NULL },
    };

    bsl_new_type(L, MOL_TYPE, NULL, meta);
    lua_newtable(L);
    luaL_setfuncs(L, methods, 0);
    lua_pushvalue(L, -1);
    lua_setfield(L, -3, "molecule_methods");
    luaL_getmetatable(L, MOL_TYPE);
    bsl_host_of(L)->mol_type = lua_topointer(L, -1);
    lua_insert(L, -2);
    lua_pushcclosure(L, mol_index, 1);
    lua_setfield(L, -2, "__index");
    lua_pop(L, 1);
    lua_pushcfunction(L, core_mol);
    lua_setfield(L, -2, "mol");
}
