/*
 * Tautomers of azoles: the hydrogen on another nitrogen of the ring.
 *
 * An azole is drawn with its hydrogen on one nitrogen and reacts at any. A forward run that makes
 * or breaks bonds at such a nitrogen looks at the other forms as well.
 */
#include "backsaw/draft.h"
#include "chem/mol.h"
#include "rule/book.h"

static bool is_azole_nitrogen(const bs_mol *mol, uint32_t atom, int hydrogens)
{
    const bs_atom *a = &mol->atoms[atom];

    return a->element == 7 && a->charge == 0 && a->degree == 2 && a->hydrogens == hydrogens &&
           (a->flags & BS_ATOM_AROMATIC) && a->min_ring == 5;
}

/* Marks the atoms that hang together with `start` by aromatic bonds. */
static void spread(const bs_mol *mol, uint32_t start, bool *system, uint32_t *stack)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t top = 0;

    stack[top++] = start;
    system[start] = true;
    while (top > 0) {
        uint32_t atom = stack[--top];
        const bs_link *links = bs_mol__links(mol, atom);

        for (int k = 0; k < mol->atoms[atom].degree; k++) {
            if (!(bonds[links[k].bond].flags & BS_BOND_AROMATIC) || system[links[k].atom])
                continue;
            system[links[k].atom] = true;
            stack[top++] = links[k].atom;
        }
    }
}

/* The molecule with a hydrogen moved; `*out` is NULL if that leaves no Kekulé form. */
static bs_status move_hydrogen(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const bool *system,
                               uint32_t from, uint32_t to, bs_mol **out)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    bs_draft draft;
    bs_status st;

    *out = NULL;
    bs_draft_init(&draft, cx, home);
    if ((st = bs_draft_from_mol(&draft, mol)) != BS_OK)
        return st;
    draft.atoms[from].hydrogens = 0;
    draft.atoms[to].hydrogens = 1;
    for (uint32_t i = 0; i < draft.bond_count; i++) {
        if ((bonds[i].flags & BS_BOND_AROMATIC) && system[bonds[i].a])
            draft.bonds[i].order = BS_DRAFT_ORDER_AROMATIC;
    }
    for (uint32_t i = 0; i < draft.atom_count; i++)
        draft.atoms[i].aromatic = system[i];
    st = bs_draft_finish(&draft, home, NULL, out);
    return st == BS_EVALUE ? BS_OK : st;
}

bs_status bs_azole__forms(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_azole_form *out,
                          int room, int *count)
{
    bool *system;
    uint32_t *stack;
    bs_status st = BS_OK;

    *count = 0;
    for (uint32_t i = 0; i < mol->atom_count && st == BS_OK; i++) {
        if (!is_azole_nitrogen(mol, i, 1))
            continue;
        if ((st = bs_new(cx, home, mol->atom_count, &system)) != BS_OK ||
            (st = bs_new(cx, home, mol->atom_count, &stack)) != BS_OK)
            return st;
        spread(mol, i, system, stack);
        for (uint32_t k = 0; k < mol->atom_count && *count < room && st == BS_OK; k++) {
            bs_mol *form;

            if (!system[k] || !is_azole_nitrogen(mol, k, 0))
                continue;
            st = move_hydrogen(cx, home, mol, system, i, k, &form);
            if (st == BS_OK && form && form->atom_count == mol->atom_count)
                out[(*count)++] = (bs_azole_form){form, k};
        }
    }
    return st;
}
