/* Where reactions go: what preferences of rules ask about the atoms of a molecule. */
#include "script/host.h"

#include "backsaw/direct.h"

/* The atom number at `i`, 1-based in Lua; 0-based here. */
static int check_atom(lua_State *L, int i, const bs_mol *mol)
{
    lua_Integer atom = luaL_checkinteger(L, i);

    if (atom < 1 || atom > bs_mol_atom_count(mol))
        bsl_error(L, BS_ERANGE, "the molecule has no atom %d", (int)atom);
    return (int)atom - 1;
}

/* The same, where the atom may be missing. */
static int optional_atom(lua_State *L, int i, const bs_mol *mol)
{
    return lua_isnoneornil(L, i) ? BS_NO_SKIP : check_atom(L, i, mol);
}

/* rate = m:rate(atom, "electrophile" or "nucleophile" [, without [, bulk]]) */
static int mol_rate(lua_State *L)
{
    static const char *const kinds[] = {"electrophile", "nucleophile", NULL};
    const bs_mol *mol = bsl_checkmol(L, 1);
    int atom = check_atom(L, 2, mol), kind = luaL_checkoption(L, 3, NULL, kinds);
    int skip = optional_atom(L, 4, mol);
    double bulk = luaL_optnumber(L, 5, 1), rate;

    luaL_argcheck(L, bulk >= 0 && bulk <= 100, 5, "a number from 0 to 100 is expected");
    if (bs_arene_rate(bsl_host_of(L)->cx, mol, atom, skip, (bs_attack)kind, bulk, &rate) != BS_OK)
        return bsl_raise(L, NULL, 0);
    lua_pushnumber(L, rate);
    return 1;
}

/* number = m:stability(atom, "cation", "radical" or "anion" [, without]) */
static int mol_stability(lua_State *L)
{
    static const char *const kinds[] = {"cation", "radical", "anion", NULL};
    const bs_mol *mol = bsl_checkmol(L, 1);
    int atom = check_atom(L, 2, mol), kind = luaL_checkoption(L, 3, NULL, kinds);

    lua_pushnumber(L, bs_atom_stability(mol, atom, optional_atom(L, 4, mol), (bs_charge_kind)kind));
    return 1;
}

static void push_neighbour(lua_State *L, const bs_mol *mol, int other, int bond)
{
    lua_createtable(L, 0, 9);
    lua_pushinteger(L, other + 1);
    lua_setfield(L, -2, "index");
    lua_pushinteger(L, bs_mol_bond_order(mol, bond));
    lua_setfield(L, -2, "order");
    lua_pushstring(L, bs_element_symbol(bs_mol_atom_element(mol, other)));
    lua_setfield(L, -2, "element");
    lua_pushinteger(L, bs_mol_atom_hydrogens(mol, other));
    lua_setfield(L, -2, "hydrogens");
    lua_pushinteger(L, bs_mol_atom_carbons(mol, other));
    lua_setfield(L, -2, "carbons");
    lua_pushinteger(L, bs_mol_atom_degree(mol, other));
    lua_setfield(L, -2, "degree");
    lua_pushinteger(L, bs_mol_atom_charge(mol, other));
    lua_setfield(L, -2, "charge");
    lua_pushboolean(L, bs_mol_atom_is_aromatic(mol, other));
    lua_setfield(L, -2, "aromatic");
    lua_pushboolean(L, bs_mol_bond_in_ring(mol, bond));
    lua_setfield(L, -2, "ring");
}

/* list = m:neighbours(atom): { index, order, element, hydrogens, ... } of each neighbour */
static int mol_neighbours(lua_State *L)
{
    const bs_mol *mol = bsl_checkmol(L, 1);
    int atom = check_atom(L, 2, mol);

    lua_createtable(L, bs_mol_atom_degree(mol, atom), 0);
    for (int n = 0; n < bs_mol_atom_degree(mol, atom); n++) {
        int other, bond;

        bs_mol_neighbour(mol, atom, n, &other, &bond);
        push_neighbour(L, mol, other, bond);
        lua_rawseti(L, -2, n + 1);
    }
    return 1;
}

void bsl_open_direct(lua_State *L)
{
    static const luaL_Reg methods[] = {
        {"rate", mol_rate},
        {"stability", mol_stability},
        {"neighbours", mol_neighbours},
        {NULL, NULL},
    };

    lua_getfield(L, -1, "molecule_methods");
    luaL_setfuncs(L, methods, 0);
    lua_pop(L, 1);
}
