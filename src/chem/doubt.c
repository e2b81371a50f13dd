/* What is strange about a molecule, in words, so that a slip of the pen is seen. */
#include "chem/mol.h"

#include <stdlib.h>

typedef struct doubts {
    bs_ctx *cx;
    bs_arena *home;
    char **texts; /* NULL while they are counted */
    int count;
    bs_text line;
} doubts;

static bs_status keep(doubts *d)
{
    bs_status st = BS_OK;

    if (d->texts)
        st = bs_copy_text(d->cx, d->home, d->line.data, d->line.length, &d->texts[d->count]);
    d->count++;
    return st;
}

/* "atom 2 (N+): " */
static bs_status name_atom(doubts *d, const bs_mol *mol, uint32_t atom)
{
    const char *symbol = bs_element_symbol(mol->atoms[atom].element);
    int charge = bs_mol_atom_charge(mol, (int)atom);

    bs_text_clear(&d->line);
    if (charge == 0)
        return bs_text_printf(&d->line, "atom %lu (%s): ", (unsigned long)atom + 1, symbol);
    if (abs(charge) == 1)
        return bs_text_printf(&d->line, "atom %lu (%s%c): ", (unsigned long)atom + 1, symbol,
                              charge > 0 ? '+' : '-');
    return bs_text_printf(&d->line, "atom %lu (%s%d%c): ", (unsigned long)atom + 1, symbol,
                          abs(charge), charge > 0 ? '+' : '-');
}

static bs_status look_at_atom(doubts *d, const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];
    bs_status st;

    if (a->element == 0) {
        if ((st = name_atom(d, mol, atom)) != BS_OK ||
            (st = bs_text_puts(&d->line, "its element is unknown")) != BS_OK ||
            (st = keep(d)) != BS_OK)
            return st;
    }
    if (a->flags & BS_ATOM_ODD) {
        if ((st = name_atom(d, mol, atom)) != BS_OK ||
            (st = bs_text_printf(&d->line, "a valence of %d is unusual", a->valence)) != BS_OK ||
            (st = keep(d)) != BS_OK)
            return st;
    }
    if (a->flags & BS_ATOM_UNMARKED) {
        if ((st = name_atom(d, mol, atom)) != BS_OK ||
            (st = bs_text_puts(&d->line, "it was marked as a stereo centre, but is none")) !=
                BS_OK ||
            (st = keep(d)) != BS_OK)
            return st;
    }
    return BS_OK;
}

static bs_status look_at_bond(doubts *d, const bs_mol *mol, uint32_t bond)
{
    const bs_bond *b = bs_mol__bonds(mol) + bond;
    bs_status st;

    if (!(b->flags & BS_BOND_UNMARKED))
        return BS_OK;
    bs_text_clear(&d->line);
    st = bs_text_printf(&d->line,
                        "atoms %lu and %lu: their double bond was marked as cis or trans, "
                        "but is neither",
                        (unsigned long)b->a + 1, (unsigned long)b->b + 1);
    return st == BS_OK ? keep(d) : st;
}

static bs_status look_at_rings(doubts *d, const bs_mol *mol)
{
    static const char *const words[] = {
        [BS_STRAIN_BRIDGEHEAD] = "a double bond at a bridgehead",
        [BS_STRAIN_ALKYNE] = "a triple bond in a ring of fewer than eight",
        [BS_STRAIN_ALLENE] = "cumulated double bonds in a ring of fewer than nine",
    };
    bs_strain kind;
    int bond = -1;
    bs_status st;

    while ((st = bs_mol_strain(d->cx, mol, bond + 1, &kind, &bond)) == BS_OK &&
           kind != BS_STRAIN_NONE) {
        const bs_bond *b = bs_mol__bonds(mol) + bond;

        bs_text_clear(&d->line);
        st = bs_text_printf(&d->line, "atoms %lu and %lu: %s cannot be kept",
                            (unsigned long)b->a + 1, (unsigned long)b->b + 1, words[kind]);
        if (st != BS_OK || (st = keep(d)) != BS_OK)
            break;
    }
    return st;
}

static bs_status look(doubts *d, const bs_mol *mol)
{
    bs_status st = BS_OK;

    d->count = 0;
    for (uint32_t i = 0; st == BS_OK && i < mol->atom_count; i++)
        st = look_at_atom(d, mol, i);
    for (uint32_t i = 0; st == BS_OK && i < mol->bond_count; i++)
        st = look_at_bond(d, mol, i);
    return st == BS_OK ? look_at_rings(d, mol) : st;
}

bs_status bs_mol_doubts(bs_ctx *cx, bs_arena *home, const bs_mol *mol, char ***texts, int *count)
{
    bs_mark kept = bs_arena_mark(home);
    doubts d = {.cx = cx, .home = home};
    bs_status st;

    *texts = NULL;
    *count = 0;
    bs_text_init(&d.line, cx);
    if ((st = look(&d, mol)) == BS_OK && (st = bs_new(cx, home, d.count + 1, &d.texts)) == BS_OK)
        st = look(&d, mol);
    bs_text_free(&d.line);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        return st;
    }
    *texts = d.texts;
    *count = d.count;
    return BS_OK;
}
