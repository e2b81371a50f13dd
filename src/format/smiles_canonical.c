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

/* Whether a hydrogen is an atom of its own for its label only. */
static bool is_labelled_hydrogen(const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];

    return a->element == 1 && a->label != 0 && a->isotope == 0 && a->charge == 0 &&
           a->degree == 1 && mol->atoms[bs_mol__links(mol, atom)->atom].element != 1;
}

/*
 * A copy in which hydrogens that are atoms for their labels only are folded; `became` leads from
 * atoms to those of the copy, and stays NULL where there are no such hydrogens.
 */
static bs_status fold_labelled(bs_ctx *cx, const bs_mol **mol, uint32_t **became)
{
    bs_draft draft;
    bs_mol *plain;
    uint32_t found = 0;
    bs_status st;

    *became = NULL;
    for (uint32_t i = 0; i < (*mol)->atom_count; i++)
        found += is_labelled_hydrogen(*mol, i);
    if (found == 0)
        return BS_OK;
    bs_draft_init(&draft, cx, &cx->scratch);
    if ((st = bs_draft_from_mol(&draft, *mol)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < draft.atom_count; i++) {
        if (is_labelled_hydrogen(*mol, i))
            draft.atoms[i].label = 0;
    }
    if ((st = bs_draft_finish(&draft, &cx->scratch, became, &plain)) == BS_OK)
        *mol = plain;
    return st;
}

/*
 * Turns places and atoms of the folded copy into those of the molecule. Folded hydrogens come
 * last, at the place of their neighbour.
 */
static bs_status unfold(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const uint32_t *became,
                        uint32_t **order, uint32_t **at)
{
    uint32_t atoms = mol->atom_count;
    uint32_t *origin;
    uint32_t *places;
    uint32_t *new_order;
    uint32_t *new_at;
    uint32_t next = 0;
    bs_status st;

    if ((st = bs_new(cx, home, atoms, &new_order)) != BS_OK ||
        (st = bs_new(cx, home, atoms, &new_at)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, atoms, &origin)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, atoms, &places)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < atoms; i++) {
        if (became[i] != UINT32_MAX) {
            origin[became[i]] = i;
            next++;
        }
    }
    for (uint32_t k = 0; k < next; k++) {
        new_order[k] = origin[(*order)[k]];
        new_at[k] = places[new_order[k]] = at ? (*at)[k] : 0;
    }
    for (uint32_t i = 0; i < atoms; i++) {
        if (became[i] == UINT32_MAX) {
            new_order[next] = i;
            new_at[next++] = places[bs_mol__links(mol, i)->atom];
        }
    }
    *order = new_order;
    if (at)
        *at = new_at;
    return BS_OK;
}

bs_status bs_smiles_canonical_order(bs_ctx *cx, bs_arena *home, const bs_mol *mol, unsigned flags,
                                    char **out, uint32_t **order, uint32_t **at)
{
    smiles_plan plan = {.cx = cx, .mol = mol, .flags = flags, .tidy = true};
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    uint32_t *became = NULL;
    int *rank;
    bs_status st = BS_OK;

    *out = NULL;
    bs_spend(cx, 100 + 20 * (size_t)mol->atom_count);
    if (!(flags & BS_SMILES_LABELS))
        st = fold_labelled(cx, &plan.mol, &became);
    if (st == BS_OK && (flags & BS_SMILES_NO_STEREO))
        st = strip_stereo(cx, plan.mol, &plan.mol);
    if (st == BS_OK && (st = bs_mol__order(cx, &cx->scratch, plan.mol, flags & BS_SMILES_LABELS,
                                           &rank)) == BS_OK) {
        plan.rank = rank;
        if ((st = smiles_plan_make(&plan)) == BS_OK)
            st = smiles_write_plan(&plan, true, home, out, order, at);
        if (st == BS_OK && became && order)
            st = unfold(cx, home, mol, became, order, at);
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
