/*
 * Double bonds whose geometry is open: the molecule does not say it, but it makes a difference.
 */
#include "chem/stereo.h"
#include "layout/drawing.h"

enum { SMALLEST_TRANS_RING = 8 };

/*
 * Walks from `from` through `at` to the end of a chain of double bonds; *before is the atom before
 * it. Returns the number of bonds walked.
 */
static uint32_t walk_chain(const bs_mol *mol, uint32_t from, uint32_t at, uint32_t *before,
                           uint32_t *end)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t steps = 0;

    while (mol->atoms[at].degree == 2 && steps < mol->bond_count) {
        const bs_link *links = bs_mol__links(mol, at);
        const bs_link *onward = links[0].atom == from ? &links[1] : &links[0];

        if (bonds[onward->bond].order != 2)
            break;
        from = at;
        at = onward->atom;
        steps++;
    }
    *before = from;
    *end = at;
    return steps;
}

/* Whether the two sides of one end of a double bond differ. */
static bool end_tells(const bs_mol *mol, uint32_t end, uint32_t other, const int *classes)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, end);
    const bs_atom *a = &mol->atoms[end];
    int found[2] = {-1, -1};
    int count = 0;

    if (a->degree > 3 || a->degree < 2 || a->degree + a->hydrogens > 3)
        return false;
    for (int k = 0; k < a->degree; k++) {
        if (links[k].atom == other)
            continue;
        if (bonds[links[k].bond].order > 1)
            return false;
        found[count++] = classes[links[k].atom];
    }
    return found[0] != found[1];
}

static bool in_small_ring(const bs_mol *mol, uint32_t a, uint32_t b)
{
    for (uint32_t r = 0; r < mol->ring_count; r++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(mol, (int)r, &atoms);

        for (int k = 0; k < size && size < SMALLEST_TRANS_RING; k++) {
            uint32_t next = atoms[(k + 1) % size];

            if ((atoms[k] == a && next == b) || (atoms[k] == b && next == a))
                return true;
        }
    }
    return false;
}

static bool may_be_open(const bs_mol *mol, const bs_bond *bond)
{
    return bond->order == 2 && !(bond->flags & (BS_BOND_AROMATIC | BS_BOND_CIS | BS_BOND_TRANS)) &&
           (!(bond->flags & BS_BOND_RING) || !in_small_ring(mol, bond->a, bond->b));
}

/* Only the middle bond of a chain of double bonds stands for its geometry. */
static bool is_open(const bs_mol *mol, const bs_bond *bond, const int *classes)
{
    uint32_t before[2];
    uint32_t end[2];

    return walk_chain(mol, bond->a, bond->b, &before[0], &end[0]) ==
               walk_chain(mol, bond->b, bond->a, &before[1], &end[1]) &&
           end_tells(mol, end[0], before[0], classes) && end_tells(mol, end[1], before[1], classes);
}

bs_status bs_layout__mark_undecided(bs_drawing *d, bs_layout *layout)
{
    const bs_mol *mol = d->mol;
    const bs_bond *bonds = bs_mol__bonds(mol);
    bs_mark temp = bs_arena_mark(&d->cx->scratch);
    int *classes = NULL;
    bs_status st = BS_OK;

    for (uint32_t i = 0; i < mol->bond_count && st == BS_OK; i++) {
        if (!may_be_open(mol, &bonds[i]))
            continue;
        if (!classes && (st = bs_mol_symmetry(d->cx, &d->cx->scratch, mol, &classes)) != BS_OK)
            break;
        layout->bonds[i].undecided = is_open(mol, &bonds[i], classes);
    }
    bs_arena_rewind(&d->cx->scratch, temp);
    return st;
}
