/* Kinds of rivals: how another product set stands to the wanted one. */
#include <string.h>

#include "backsaw/format.h"
#include "chem/mol.h"
#include "rule/book.h"

const char *bs_rival_word(bs_rival_kind kind)
{
    static const char *const words[] = {NULL, "regio", "chemo", "stereo", "over-reaction"};

    return words[kind];
}

/* Marks the aromatic system of every marked atom. */
static void spread_aromatic(const bs_mol *mol, uint8_t *marks)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    bool again = true;

    while (again) {
        again = false;
        for (uint32_t i = 0; i < mol->bond_count; i++) {
            uint32_t a = bonds[i].a, b = bonds[i].b;

            if (!(bonds[i].flags & BS_BOND_AROMATIC) || (marks[a] != 0) == (marks[b] != 0))
                continue;
            marks[a] = marks[b] = 1;
            again = true;
        }
    }
}

/*
 * Whether two outcomes touch the same group of a molecule: a common atom, or the same aromatic
 * system. True as well where one of them leaves the molecule alone.
 */
static bs_status same_group(bs_ctx *cx, const bs_outcome *a, const bs_outcome *b, const bs_mol *mol,
                            uint32_t number, bool *same)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bool any_a = false, any_b = false;
    uint8_t *marks;
    bs_status st = bs_new(cx, &cx->scratch, mol->atom_count + 1, &marks);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < a->site_count; i++) {
        if (a->site_reactant[i] == number) {
            marks[a->site_atom[i]] = 1;
            any_a = true;
        }
    }
    spread_aromatic(mol, marks);
    *same = false;
    for (int i = 0; i < b->site_count; i++) {
        if (b->site_reactant[i] == number) {
            any_b = true;
            *same = *same || marks[b->site_atom[i]];
        }
    }
    *same = *same || !any_a || !any_b;
    bs_arena_rewind(&cx->scratch, temp);
    return BS_OK;
}

bs_status bs_rival__kind(bs_ctx *cx, const bs_outcome *wanted, const bs_outcome *other,
                         const bs_mol *const *mols, int count, bs_rival_kind *kind)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    char *a, *b;
    bs_status st;

    *kind = BS_RIVAL_REGIO;
    if ((st = bs_smiles_canonical(cx, &cx->scratch, wanted->products[0], BS_SMILES_NO_STEREO,
                                  &a)) != BS_OK ||
        (st = bs_smiles_canonical(cx, &cx->scratch, other->products[0], BS_SMILES_NO_STEREO, &b)) !=
            BS_OK)
        return st;
    if (strcmp(a, b) == 0)
        *kind = BS_RIVAL_STEREO;
    bs_arena_rewind(&cx->scratch, temp);
    for (int i = 0; i < count && st == BS_OK && *kind == BS_RIVAL_REGIO; i++) {
        bool same;

        st = same_group(cx, wanted, other, mols[i], (uint32_t)i, &same);
        if (!same)
            *kind = BS_RIVAL_CHEMO;
    }
    return st;
}
