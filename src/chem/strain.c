/*
 * Multiple bonds that no ring of their size can hold: bridgehead alkenes (Bredt's rule), alkynes
 * and cumulated double bonds in small rings.
 */
#include "chem/mol.h"

/* The smallest rings that are known to hold such a bond and can be kept at room temperature. */
enum { SMALLEST_TRANS = 8, SMALLEST_ALKYNE = 8, SMALLEST_ALLENE = 9, FAR = 13 };

typedef struct strain {
    bs_ctx *cx;
    const bs_mol *mol;
    uint32_t *queue, *distance, *start; /* made when first needed */
} strain;

static bs_status make_room(strain *s)
{
    bs_status st;

    if (s->queue)
        return BS_OK;
    if ((st = bs_new(s->cx, &s->cx->scratch, s->mol->atom_count, &s->queue)) != BS_OK ||
        (st = bs_new(s->cx, &s->cx->scratch, s->mol->atom_count, &s->start)) != BS_OK)
        return st;
    return bs_new(s->cx, &s->cx->scratch, s->mol->atom_count, &s->distance);
}

/* A smallest ring through three atoms in a row, p, middle and q. */
typedef struct corner {
    uint32_t size;               /* FAR if there is none that is smaller */
    uint32_t behind_p, behind_q; /* where it goes on */
} corner;

static corner ring_through(strain *s, uint32_t p, uint32_t middle, uint32_t q)
{
    corner ring = {FAR, p, q};
    uint32_t count = 0;

    s->queue[count++] = middle;
    s->distance[middle] = 1;
    s->queue[count++] = p;
    s->distance[p] = 2;
    for (uint32_t i = 1; i < count && ring.size == FAR; i++) {
        uint32_t atom = s->queue[i];
        const bs_link *links = bs_mol__links(s->mol, atom);

        for (int k = 0; k < s->mol->atoms[atom].degree && s->distance[atom] + 1 < FAR; k++) {
            uint32_t next = links[k].atom;

            if (s->distance[next] > 0)
                continue;
            s->distance[next] = s->distance[atom] + 1;
            s->start[next] = atom == p ? next : s->start[atom];
            s->queue[count++] = next;
            if (next == q)
                ring = (corner){s->distance[next], s->start[next], atom};
        }
    }
    for (uint32_t i = 0; i < count; i++)
        s->distance[s->queue[i]] = 0;
    return ring;
}

/*
 * Whether the double bond from `head` to `other` breaks Bredt's rule. It lies in two rings and is
 * trans in the larger one, which needs eight members. `head` is a bridgehead if any two of its
 * three rings have more than one bond in common; rings that are merely fused there have just one.
 */
static bool is_bridgehead_alkene(strain *s, uint32_t head, uint32_t other)
{
    const bs_link *links = bs_mol__links(s->mol, head);
    const bs_bond *bonds = bs_mol__bonds(s->mol);
    corner near, far, across;
    uint32_t sides[2];
    int count = 0;

    for (int k = 0; k < s->mol->atoms[head].degree; k++) {
        if (links[k].atom != other && (bonds[links[k].bond].flags & BS_BOND_RING) && count < 2)
            sides[count++] = links[k].atom;
    }
    if (count < 2)
        return false;
    near = ring_through(s, other, head, sides[0]);
    far = ring_through(s, other, head, sides[1]);
    if (near.size >= SMALLEST_TRANS || far.size >= SMALLEST_TRANS)
        return false;
    across = ring_through(s, sides[0], head, sides[1]);
    return near.behind_p == far.behind_p && near.behind_q == across.behind_p &&
           far.behind_q == across.behind_q;
}

/* The other double bond of an allene's middle atom, as the atom at its far end; or none. */
static bool has_cumulated(const bs_mol *mol, uint32_t middle, uint32_t end, uint32_t *far)
{
    const bs_link *links = bs_mol__links(mol, middle);

    if (mol->atoms[middle].element != 6)
        return false;
    for (int k = 0; k < mol->atoms[middle].degree; k++) {
        const bs_bond *bond = bs_mol__bonds(mol) + links[k].bond;

        if (links[k].atom != end && bond->order == 2 && (bond->flags & BS_BOND_RING)) {
            *far = links[k].atom;
            return true;
        }
    }
    return false;
}

/* Ring through a bond: the smallest one through it and a neighbour of its second end. */
static uint32_t smallest_ring(strain *s, uint32_t a, uint32_t b)
{
    const bs_link *links = bs_mol__links(s->mol, b);
    uint32_t smallest = FAR;

    for (int k = 0; k < s->mol->atoms[b].degree; k++) {
        uint32_t size = links[k].atom == a ? FAR : ring_through(s, a, b, links[k].atom).size;

        smallest = size < smallest ? size : smallest;
    }
    return smallest;
}

static bs_strain judge(strain *s, const bs_bond *bond)
{
    const uint32_t ends[2] = {bond->a, bond->b};

    if (bond->order == 3)
        return smallest_ring(s, ends[0], ends[1]) < SMALLEST_ALKYNE ? BS_STRAIN_ALKYNE
                                                                    : BS_STRAIN_NONE;
    for (int i = 0; i < 2; i++) {
        uint32_t far;

        if (has_cumulated(s->mol, ends[i], ends[1 - i], &far) &&
            ring_through(s, ends[1 - i], ends[i], far).size < SMALLEST_ALLENE)
            return BS_STRAIN_ALLENE;
        if (s->mol->atoms[ends[i]].element == 6 && s->mol->atoms[ends[i]].ring_bonds == 3 &&
            is_bridgehead_alkene(s, ends[i], ends[1 - i]))
            return BS_STRAIN_BRIDGEHEAD;
    }
    return BS_STRAIN_NONE;
}

bs_status bs_mol_strain(bs_ctx *cx, const bs_mol *mol, int from, bs_strain *kind, int *bond)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    strain s = {.cx = cx, .mol = mol};
    bs_status st = BS_OK;

    *kind = BS_STRAIN_NONE;
    *bond = -1;
    for (uint32_t i = (uint32_t)from; i < mol->bond_count && *kind == BS_STRAIN_NONE; i++) {
        const bs_bond *b = bs_mol__bonds(mol) + i;

        if (b->order < 2 || !(b->flags & BS_BOND_RING) || (b->flags & BS_BOND_AROMATIC))
            continue;
        if ((st = make_room(&s)) != BS_OK)
            break;
        *kind = judge(&s, b);
        *bond = *kind == BS_STRAIN_NONE ? -1 : (int)i;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
