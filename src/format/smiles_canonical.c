/* Canonical SMILES: the writer led by the canonical order. */
#include "format/smiles_write.h"

#include <string.h>

#include "chem/canon.h"

/* A copy without stereo, so that isomers that differ only there get one order. */
static bs_status strip_stereo(bs_ctx *cx, const bs_mol *mol, const bs_mol **out)
{
    bs_mol *plain;
    bs_bond *bonds;
    bs_status st = bs_mol_copy(cx, &cx->scratch, mol, &plain);

    if (st != BS_OK)
        return st;
    for (uint32_t i = 0; i < plain->atom_count; i++) {
        plain->atoms[i].stereo = BS_STEREO_NONE;
        plain->atoms[i].perm = 0;
    }
    bonds = bs_mol__bonds_mutable(plain);
    for (uint32_t i = 0; i < plain->bond_count; i++)
        bonds[i].flags = bonds[i].flags & ~(unsigned)(BS_BOND_CIS | BS_BOND_TRANS) & 0xff;
    *out = plain;
    return BS_OK;
}

bs_status bs_smiles_canonical_order(bs_ctx *cx, bs_arena *home, const bs_mol *mol, unsigned flags,
                                    char **out, uint32_t **order, uint32_t **at)
{
    smiles_plan plan = {.cx = cx, .mol = mol, .flags = flags, .tidy = true};
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int *rank;
    bs_status st = BS_OK;

    *out = NULL;
    if (flags & BS_SMILES_NO_STEREO)
        st = strip_stereo(cx, mol, &plan.mol);
    if (st == BS_OK && (st = bs_mol__order(cx, &cx->scratch, plan.mol, flags & BS_SMILES_LABELS,
                                           &rank)) == BS_OK) {
        plan.rank = rank;
        if ((st = smiles_plan_make(&plan)) == BS_OK)
            st = smiles_write_plan(&plan, true, home, out, order, at);
    }
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}

bs_status bs_smiles_canonical(bs_ctx *cx, bs_arena *home, const bs_mol *mol, unsigned flags,
                              char **out)
{
    return bs_smiles_canonical_order(cx, home, mol, flags, out, NULL, NULL);
}
