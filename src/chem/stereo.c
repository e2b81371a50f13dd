/*
 * Placing stereo elements on a molecule, and reading them back.
 *
 * Marks that cannot mean anything by the look of the atoms around are dropped here: too few or too
 * many neighbours, two hydrogens, amines that invert, double bonds in small or aromatic rings.
 * Whether neighbours are alike is for the canonical order to tell.
 */
#include "chem/stereo.h"
#include "chem/ring.h"

#include <string.h>

enum { SMALLEST_TRANS_RING = 8 };

/* ---- Surroundings -------------------------------------------------------------------------- */

/* Lists the neighbours of an end of a cumulene: implied hydrogen first, the chain left out. */
static int around_end(const bs_mol *mol, uint32_t end, uint32_t chain, uint32_t out[2])
{
    const bs_link *links = bs_mol__links(mol, end);
    int count = 0;

    /* An end with a lone pair is no end: it straightens. */
    if (mol->atoms[end].degree + mol->atoms[end].hydrogens != 3 || mol->atoms[end].degree < 2)
        return 0;
    if (mol->atoms[end].degree == 2)
        out[count++] = BS_DRAFT_HYDROGEN;
    for (int k = 0; k < mol->atoms[end].degree; k++) {
        if (links[k].atom != chain)
            out[count++] = links[k].atom;
    }
    return count;
}

/*
 * Walks along cumulated double bonds from `from` through `at` to the last atom; *before is the
 * atom before it. Returns how many bonds were walked.
 */
static uint32_t walk_chain(const bs_mol *mol, uint32_t from, uint32_t at, uint32_t *before,
                           uint32_t *end)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t steps = 1;

    for (;;) {
        const bs_link *links = bs_mol__links(mol, at);
        const bs_link *onward;

        *before = from;
        *end = at;
        if (mol->atoms[at].degree != 2 || steps > mol->atom_count)
            return steps;
        onward = links[0].atom == from ? &links[1] : &links[0];
        if (bonds[onward->bond].order != 2)
            return steps;
        from = at;
        at = onward->atom;
        steps++;
    }
}

static int around_allene(const bs_mol *mol, uint32_t atom, uint32_t around[6])
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    uint32_t steps[2];

    if (mol->atoms[atom].degree != 2)
        return 0;
    for (int k = 0; k < 2; k++) {
        uint32_t before;
        uint32_t end;

        if (bonds[links[k].bond].order != 2)
            return 0;
        steps[k] = walk_chain(mol, atom, links[k].atom, &before, &end);
        if (around_end(mol, end, before, around + 2 * k) != 2)
            return 0;
    }
    return steps[0] == steps[1] ? 4 : 0;
}

int bs_stereo__around(const bs_mol *mol, uint32_t atom, int kind, uint32_t around[6])
{
    static const uint8_t sizes[] = {0, 4, 4, 4, 5, 6};
    const bs_link *links = bs_mol__links(mol, atom);
    int degree = mol->atoms[atom].degree;
    int count = 0;

    if (kind == BS_STEREO_ALLENE)
        return around_allene(mol, atom, around);
    if (degree != sizes[kind] && degree + 1 != sizes[kind])
        return 0;
    if (degree + 1 == sizes[kind])
        around[count++] = BS_DRAFT_HYDROGEN;
    for (int k = 0; k < degree; k++)
        around[count++] = links[k].atom;
    return count;
}

/* Three bonds and a lone pair: does the pyramid keep its shape? */
static bool keeps_pyramid(const bs_mol *mol, const bs_atom *a)
{
    (void)mol;
    switch (a->element) {
    case 7:
        /* Amines invert, unless a small ring or a bridgehead holds them. */
        return a->charge == 0 && a->valence == 3 &&
               (a->ring_bonds == 3 || (a->min_ring == 3 && a->ring_bonds == 2));
    case 15:
    case 33:
        return a->charge == 0 && a->valence == 3;
    case 16:
    case 34:
    case 52:
        return (a->charge == 0 && a->valence == 4) || (a->charge == 1 && a->valence == 3);
    default:
        return false;
    }
}

bool bs_stereo__can_be_centre(const bs_mol *mol, uint32_t atom, int kind)
{
    const bs_atom *a = &mol->atoms[atom];
    int hydrogens = bs_mol__total_hydrogens(mol, atom);
    const bs_link *links = bs_mol__links(mol, atom);

    if (kind != BS_STEREO_TETRAHEDRAL)
        return a->hydrogens <= 1;
    /* Labelled hydrogens are atoms of their own and may differ. */
    for (int k = 0; k < a->degree; k++)
        hydrogens -= mol->atoms[links[k].atom].element == 1 && mol->atoms[links[k].atom].isotope;
    if (hydrogens > 1)
        return false;
    if (a->degree + a->hydrogens == 4)
        return !(a->flags & BS_ATOM_AROMATIC) || a->element != 6;
    return a->degree == 3 && a->hydrogens == 0 && keeps_pyramid(mol, a);
}

uint32_t bs_stereo__reference(const bs_mol *mol, uint32_t end, uint32_t other)
{
    const bs_link *links = bs_mol__links(mol, end);

    for (int k = 0; k < mol->atoms[end].degree; k++) {
        if (links[k].atom != other)
            return links[k].atom;
    }
    return BS_DRAFT_HYDROGEN;
}

/* ---- Placing --------------------------------------------------------------------------------- */

typedef struct placing {
    bs_ctx *cx;
    const uint32_t *order;
    const bs_rings *rings;
    bs_mol *mol;
    uint32_t *bond_ring; /* size of the smallest ring through each bond; made when first needed */
} placing;

static uint32_t mapped(const placing *p, uint32_t draft_atom)
{
    return draft_atom == BS_DRAFT_HYDROGEN ? BS_DRAFT_HYDROGEN : p->order[draft_atom];
}

static bool shares_atom(const uint32_t a[2], const uint32_t b[2])
{
    for (int i = 0; i < 2; i++)
        if (a[i] != BS_DRAFT_HYDROGEN && (a[i] == b[0] || a[i] == b[1]))
            return true;
    return false;
}

/* The two pairs of an allene may come in either order, and each may hold an implied hydrogen. */
static int allene_perm(int perm, const uint32_t from[4], const uint32_t to[4])
{
    bool crossed = !shares_atom(from, to);

    for (int pair = 0; pair < 2; pair++) {
        const uint32_t *f = from + 2 * (crossed ? 1 - pair : pair);
        const uint32_t *t = to + 2 * pair;

        if (f[0] == t[1] && f[1] == t[0])
            perm = 3 - perm;
        else if (f[0] != t[0] || f[1] != t[1])
            return 0;
    }
    return perm;
}

static void place_centre(placing *p, const bs_draft_stereo *element)
{
    uint32_t centre = mapped(p, element->centre);
    uint32_t from[6];
    uint32_t to[6];
    int count;
    int perm;

    if (centre == UINT32_MAX)
        return;
    count = bs_stereo__around(p->mol, centre, element->kind, to);
    if (count == 0 || !bs_stereo__can_be_centre(p->mol, centre, element->kind))
        return;
    for (int k = 0; k < count; k++)
        from[k] = mapped(p, element->around[k]);
    if (element->kind == BS_STEREO_ALLENE)
        perm = allene_perm(element->perm, from, to);
    else
        perm = bs_stereo__permute(element->kind, element->perm, count, from, to);
    if (perm == 0)
        return;
    p->mol->atoms[centre].stereo = element->kind;
    p->mol->atoms[centre].perm = (uint8_t)perm;
}

static bs_status measure_bond_rings(placing *p)
{
    bs_status st = bs_new(p->cx, &p->cx->scratch, p->mol->bond_count, &p->bond_ring);

    for (uint32_t r = 0; r < p->rings->count && st == BS_OK; r++) {
        uint32_t start = p->rings->offsets[r];
        uint32_t size = p->rings->offsets[r + 1] - start;

        for (uint32_t i = 0; i < size; i++) {
            uint32_t next = p->rings->atoms[start + (i + 1 < size ? i + 1 : 0)];
            int bond = bs_mol_bond_between(p->mol, (int)p->rings->atoms[start + i], (int)next);

            if (p->bond_ring[bond] == 0 || size < p->bond_ring[bond])
                p->bond_ring[bond] = size;
        }
    }
    return st;
}

static int double_bonds(const bs_mol *mol, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    int count = 0;

    for (int k = 0; k < mol->atoms[atom].degree; k++)
        count += bonds[links[k].bond].order == 2;
    return count;
}

/*
 * Whether an end of a double bond can have a geometry, and whether the atom named by the mark
 * stands on the other side than the reference.
 */
static bool read_end(const bs_mol *mol, uint32_t end, uint32_t other, uint32_t named, bool *crossed)
{
    const bs_atom *a = &mol->atoms[end];
    uint32_t reference = bs_stereo__reference(mol, end, other);
    int others = a->degree - 1;

    if (double_bonds(mol, end) != 1)
        return false;
    if (others + a->hydrogens > 2 || a->hydrogens > 1)
        return false;
    if (others == 0 && (a->hydrogens != 1 || a->element != 7))
        return false;
    if (others == 2 && named == BS_DRAFT_HYDROGEN)
        return false;
    if (others == 0 && named != BS_DRAFT_HYDROGEN)
        return false;
    *crossed ^= named != reference;
    return named == BS_DRAFT_HYDROGEN || bs_mol_bond_between(mol, (int)end, (int)named) >= 0;
}

/*
 * The bond that carries the geometry of two ends: the one between them, or the middle one of the
 * odd chain of double bonds that joins them; -1 if there is none. inner[] gets the atoms beside
 * the ends on the chain.
 */
static int geometry_bond(const bs_mol *mol, const uint32_t end[2], uint32_t inner[2])
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, end[0]);

    for (uint32_t k = 0; k < mol->atoms[end[0]].degree; k++) {
        uint32_t reached, from = end[0], at = links[k].atom;
        uint32_t steps = walk_chain(mol, from, at, &inner[1], &reached);

        if (bonds[links[k].bond].order != 2 || reached != end[1] || steps % 2 == 0)
            continue;
        inner[0] = at;
        for (uint32_t step = 0; step < steps / 2; step++) {
            const bs_link *onward = bs_mol__links(mol, at);
            uint32_t next = onward[0].atom == from ? onward[1].atom : onward[0].atom;

            from = at;
            at = next;
        }
        return bs_mol_bond_between(mol, (int)from, (int)at);
    }
    return -1;
}

static bs_status place_double(placing *p, const bs_draft_stereo *element)
{
    uint32_t end[2] = {mapped(p, element->centre), mapped(p, element->second)};
    uint32_t inner[2];
    bool crossed = element->perm == 2;
    bs_bond *line;
    int bond;
    bs_status st;

    if (end[0] == UINT32_MAX || end[1] == UINT32_MAX ||
        (bond = geometry_bond(p->mol, end, inner)) < 0)
        return BS_OK;
    line = bs_mol__bonds_mutable(p->mol) + bond;
    if (line->order != 2 || (line->flags & BS_BOND_AROMATIC))
        return BS_OK;
    if (line->flags & BS_BOND_RING) {
        if (!p->bond_ring && (st = measure_bond_rings(p)) != BS_OK)
            return st;
        if (p->bond_ring[bond] < SMALLEST_TRANS_RING)
            return BS_OK;
    }
    for (int k = 0; k < 2; k++)
        if (!read_end(p->mol, end[k], inner[k], mapped(p, element->around[k]), &crossed))
            return BS_OK;
    line->flags &= (unsigned)~(BS_BOND_CIS | BS_BOND_TRANS) & 0xff;
    line->flags |= crossed ? BS_BOND_TRANS : BS_BOND_CIS;
    return BS_OK;
}

bs_status bs_stereo__place(bs_ctx *cx, const bs_draft *draft, const uint32_t *order,
                           const bs_rings *rings, bs_mol *mol)
{
    placing p = {cx, order, rings, mol, NULL};
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_status st = BS_OK;

    for (uint32_t i = 0; i < draft->stereo_count && st == BS_OK; i++) {
        const bs_draft_stereo *element = &draft->stereo[i];

        if (element->perm == 0)
            continue;
        if (element->kind == BS_DRAFT_DOUBLE)
            st = place_double(&p, element);
        else
            place_centre(&p, element);
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* Whether an atom has a double bond beside the one to `other`, or a neighbour has one. */
static bool is_conjugated(const bs_mol *mol, uint32_t atom, uint32_t other)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);

    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        uint32_t near = links[k].atom;
        const bs_link *next = bs_mol__links(mol, near);

        if (near == other)
            continue;
        for (int i = 0; i < mol->atoms[near].degree; i++) {
            if (bonds[next[i].bond].order == 2 && !(bonds[next[i].bond].flags & BS_BOND_AROMATIC))
                return true;
        }
    }
    return false;
}

static void note_bond(bs_mol *mol, uint32_t a, uint32_t b)
{
    enum { NO_DOUBT = BS_BOND_CIS | BS_BOND_TRANS | BS_BOND_RING };
    int bond = bs_mol_bond_between(mol, (int)a, (int)b);

    if (bond >= 0 && !(bs_mol__bonds(mol)[bond].flags & NO_DOUBT) && !is_conjugated(mol, a, b) &&
        !is_conjugated(mol, b, a))
        bs_mol__bonds_mutable(mol)[bond].flags |= BS_BOND_UNMARKED;
}

void bs_stereo__note_unmarked(const bs_draft *draft, const uint32_t *order, bs_mol *mol)
{
    for (uint32_t i = 0; i < draft->stereo_count; i++) {
        const bs_draft_stereo *element = &draft->stereo[i];
        uint32_t atom = order[element->centre];

        if (!element->written || atom == UINT32_MAX)
            continue;
        if (element->kind != BS_DRAFT_DOUBLE && mol->atoms[atom].stereo == BS_STEREO_NONE)
            mol->atoms[atom].flags |= BS_ATOM_UNMARKED;
        else if (element->kind == BS_DRAFT_DOUBLE && order[element->second] != UINT32_MAX)
            note_bond(mol, atom, order[element->second]);
    }
}

/* ---- Reading back ---------------------------------------------------------------------------- */

bool bs_stereo__of_atom(const bs_mol *mol, uint32_t atom, bs_draft_stereo *out)
{
    const bs_atom *a = &mol->atoms[atom];

    if (a->stereo == BS_STEREO_NONE)
        return false;
    memset(out, 0, sizeof *out);
    out->kind = a->stereo;
    out->perm = a->perm;
    out->centre = atom;
    return bs_stereo__around(mol, atom, a->stereo, out->around) > 0;
}

bool bs_stereo__of_bond(const bs_mol *mol, uint32_t bond, bs_draft_stereo *out)
{
    const bs_bond *b = bs_mol__bonds(mol) + bond;
    uint32_t inner[2];

    if (!(b->flags & (BS_BOND_CIS | BS_BOND_TRANS)))
        return false;
    memset(out, 0, sizeof *out);
    out->kind = BS_DRAFT_DOUBLE;
    out->perm = b->flags & BS_BOND_CIS ? 1 : 2;
    walk_chain(mol, b->b, b->a, &inner[0], &out->centre);
    walk_chain(mol, b->a, b->b, &inner[1], &out->second);
    out->around[0] = bs_stereo__reference(mol, out->centre, inner[0]);
    out->around[1] = bs_stereo__reference(mol, out->second, inner[1]);
    return true;
}
