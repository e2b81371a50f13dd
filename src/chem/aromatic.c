/*
 * Aromaticity: rings and fused rings whose atoms give 4n + 2 electrons to the pi system.
 *
 * The model is the common one of cheminformatics, chosen so that the answers agree with the
 * reference toolkit. Each atom of a ring gives none, one or two electrons according to its
 * valences; a double bond out of the ring to a more electronegative atom takes the electron away.
 * Rings are tried alone, then in connected sets of up to six that share bonds; the bonds on the
 * rim of a set that fits Hückel's rule become aromatic. Rings are the relevant ones, so the answer
 * does not depend on the order of the atoms.
 */
#include "chem/draft.h"
#include "chem/ring.h"
#include "chem/valence.h"

#include <string.h>

enum {
    MAX_SET = 6,
    MAX_FUSED_RING = 24,
    MANY_RINGS = 300 /* above, sets of more than two rings are not tried */
};

/* What an atom gives. */
typedef enum gift { GIFT_NO_PART, GIFT_NONE, GIFT_ONE, GIFT_TWO, GIFT_ANY } gift;

typedef struct aromatic {
    bs_ctx *cx;
    bs_mol *mol;
    const bs_rings *rings;
    uint8_t *gifts;    /* by atom */
    uint32_t *bonds;   /* by place in rings->atoms: the bond to the next atom of the ring */
    bool *fits;        /* by ring: all atoms take part */
    uint32_t *near_at; /* by ring: where its neighbours stand in `near` */
    uint32_t *near;
    uint32_t *group; /* rings of the fused system in hand */
    uint32_t group_count;
    uint32_t open_bonds; /* its bonds that are not aromatic yet */
    uint8_t *atom_count; /* how many rings of the set have the atom */
    uint8_t *bond_count;
    uint32_t *barred; /* by ring: set number that has seen it */
    uint32_t set[MAX_SET];
} aromatic;

/* ---- What an atom gives -------------------------------------------------------------------- */

static int outer_electrons(int element)
{
    switch (element) {
    case 5:
        return 3;
    case 6:
    case 14:
        return 4;
    case 7:
    case 15:
    case 33:
        return 5;
    case 8:
    case 16:
    case 34:
    case 52:
        return 6;
    case 9:
    case 17:
    case 35:
    case 53:
        return 7;
    default:
        return 0;
    }
}

static bool is_more_negative(int a, int b)
{
    int outer_a = outer_electrons(a);
    int outer_b = outer_electrons(b);

    return outer_a > outer_b || (outer_a == outer_b && a < b);
}

/* Multiple bonds of an atom, in rings and out of them. */
typedef struct unsaturation {
    int in, out;
    int partner; /* element at the end of the last one out of a ring */
} unsaturation;

static unsaturation unsaturation_of(const bs_mol *mol, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    unsaturation u = {0, 0, 0};

    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        const bs_bond *b = &bonds[links[k].bond];

        if (b->order < 2)
            continue;
        if (b->flags & BS_BOND_RING) {
            u.in++;
        } else {
            u.out++;
            u.partner = mol->atoms[links[k].atom].element;
        }
    }
    return u;
}

/* Unpaired electrons of an atom with fewer bonds than its element has as a rule. */
static int radicals(const bs_atom *a, int outer)
{
    int hole = 8 - outer - a->valence + a->charge;
    int spare = outer - a->valence - a->charge;

    if (hole < 0)
        hole = 0;
    return spare >= 0 && spare < hole ? spare : hole;
}

/* Electrons that an atom could give at most, or -1 where it takes no part. */
static int spare_electrons(const bs_atom *a, int outer)
{
    int normal = bs_valence__normal(a->element, 0)[0];
    int degree = a->degree + a->hydrogens;
    int pairs = outer - normal - a->charge;
    int spare;

    if (normal <= 1 || degree > 3)
        return -1;
    spare = normal - degree + (pairs > 0 ? pairs : 0) - radicals(a, outer);
    if (spare > 1 && a->valence - degree > 1)
        spare = 1; /* a triple bond or cumulated ones: the second pi bond lies in the plane */
    return spare;
}

static gift gift_of(const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];
    int outer = outer_electrons(a->element);
    unsaturation u = unsaturation_of(mol, atom);
    const uint8_t *normal = bs_valence__normal(a->element, a->charge);
    bool taken;
    int spare;

    if (a->element == 0)
        return u.in + u.out > 1 ? GIFT_NO_PART : GIFT_ANY;
    if (outer == 0 || outer == 7 || u.in + u.out > 1 || a->valence > *normal)
        return GIFT_NO_PART;
    if (radicals(a, outer) > 0 && (a->element != 6 || a->charge != 0))
        return GIFT_NO_PART;
    spare = spare_electrons(a, outer);
    taken = u.out && is_more_negative(u.partner, a->element);
    if (spare < 0)
        return GIFT_NO_PART;
    if (spare == 0)
        return u.out ? GIFT_NONE : u.in ? GIFT_ONE : GIFT_NO_PART;
    if (spare == 1) {
        if (u.out)
            return taken ? GIFT_NONE : GIFT_ONE;
        if (u.in)
            return GIFT_ONE;
        return a->charge == 1 ? GIFT_NONE : GIFT_NO_PART;
    }
    spare -= taken;
    return spare % 2 ? GIFT_ONE : GIFT_TWO;
}

/* ---- Rings that can take part -------------------------------------------------------------- */

static uint32_t ring_size(const aromatic *a, uint32_t ring)
{
    return a->rings->offsets[ring + 1] - a->rings->offsets[ring];
}

static bool ring_fits(const aromatic *a, uint32_t ring)
{
    bool real = false;

    for (uint32_t i = a->rings->offsets[ring]; i < a->rings->offsets[ring + 1]; i++) {
        gift g = a->gifts[a->rings->atoms[i]];

        if (g == GIFT_NO_PART)
            return false;
        real |= a->mol->atoms[a->rings->atoms[i]].element != 0;
    }
    return real;
}

static void note_bonds(aromatic *a, uint32_t ring)
{
    uint32_t start = a->rings->offsets[ring];
    uint32_t size = ring_size(a, ring);

    for (uint32_t i = 0; i < size; i++) {
        uint32_t next = a->rings->atoms[start + (i + 1 < size ? i + 1 : 0)];

        a->bonds[start + i] =
            (uint32_t)bs_mol_bond_between(a->mol, (int)a->rings->atoms[start + i], (int)next);
    }
}

static bs_status prepare(aromatic *a)
{
    bs_arena *scratch = &a->cx->scratch;
    uint32_t total = a->rings->offsets[a->rings->count];
    bs_status st;

    if ((st = bs_new(a->cx, scratch, a->mol->atom_count, &a->gifts)) != BS_OK ||
        (st = bs_new(a->cx, scratch, a->mol->atom_count, &a->atom_count)) != BS_OK ||
        (st = bs_new(a->cx, scratch, a->mol->bond_count, &a->bond_count)) != BS_OK ||
        (st = bs_new(a->cx, scratch, total, &a->bonds)) != BS_OK ||
        (st = bs_new(a->cx, scratch, a->rings->count, &a->fits)) != BS_OK ||
        (st = bs_new(a->cx, scratch, a->rings->count, &a->group)) != BS_OK ||
        (st = bs_new(a->cx, scratch, a->rings->count, &a->barred)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < a->mol->atom_count; i++) {
        if (a->mol->atoms[i].flags & BS_ATOM_RING)
            a->gifts[i] = (uint8_t)gift_of(a->mol, i);
    }
    for (uint32_t r = 0; r < a->rings->count; r++) {
        a->fits[r] = ring_fits(a, r);
        if (a->fits[r])
            note_bonds(a, r);
    }
    return BS_OK;
}

/* ---- Which rings share a bond ---------------------------------------------------------------- */

/* Calls for each pair of fitting rings that share a bond: counts them, or notes them. */
typedef struct fusion {
    uint32_t *first; /* by bond: place + 1 of the last ring through it */
    uint32_t *next;  /* by place: place + 1 of the ring before through the same bond */
    uint32_t *ring;  /* by place */
} fusion;

static bs_status chain_bonds(aromatic *a, fusion *f)
{
    uint32_t total = a->rings->offsets[a->rings->count];
    bs_status st;

    if ((st = bs_new(a->cx, &a->cx->scratch, a->mol->bond_count, &f->first)) != BS_OK ||
        (st = bs_new(a->cx, &a->cx->scratch, total, &f->next)) != BS_OK ||
        (st = bs_new(a->cx, &a->cx->scratch, total, &f->ring)) != BS_OK)
        return st;
    for (uint32_t r = 0; r < a->rings->count; r++) {
        if (!a->fits[r] || ring_size(a, r) > MAX_FUSED_RING)
            continue;
        for (uint32_t i = a->rings->offsets[r]; i < a->rings->offsets[r + 1]; i++) {
            f->ring[i] = r;
            f->next[i] = f->first[a->bonds[i]];
            f->first[a->bonds[i]] = i + 1;
        }
    }
    return BS_OK;
}

/*
 * The rings fused to `ring`: those that share exactly one bond with it. Rings that share more
 * are bridged. `seen` and `shared` are by ring. Writes them to `out` unless it is NULL.
 */
static uint32_t fused_to(const aromatic *a, const fusion *f, uint32_t ring, uint32_t *shared,
                         uint32_t *touched, uint32_t *out)
{
    uint32_t count = 0;
    uint32_t found = 0;

    if (!a->fits[ring] || ring_size(a, ring) > MAX_FUSED_RING)
        return 0;
    for (uint32_t i = a->rings->offsets[ring]; i < a->rings->offsets[ring + 1]; i++) {
        for (uint32_t at = f->first[a->bonds[i]]; at != 0; at = f->next[at - 1]) {
            uint32_t other = f->ring[at - 1];

            if (other != ring && shared[other]++ == 0)
                touched[found++] = other;
        }
    }
    for (uint32_t i = 0; i < found; i++) {
        if (shared[touched[i]] == 1) {
            if (out)
                out[count] = touched[i];
            count++;
        }
        shared[touched[i]] = 0;
    }
    return count;
}

static bs_status find_neighbours(aromatic *a)
{
    fusion f;
    uint32_t *shared;
    uint32_t *touched;
    bs_status st;

    if ((st = chain_bonds(a, &f)) != BS_OK ||
        (st = bs_new(a->cx, &a->cx->scratch, a->rings->count, &shared)) != BS_OK ||
        (st = bs_new(a->cx, &a->cx->scratch, a->rings->count, &touched)) != BS_OK ||
        (st = bs_new(a->cx, &a->cx->scratch, a->rings->count + 1, &a->near_at)) != BS_OK)
        return st;
    for (uint32_t r = 0; r < a->rings->count; r++)
        a->near_at[r + 1] = a->near_at[r] + fused_to(a, &f, r, shared, touched, NULL);
    if ((st = bs_new(a->cx, &a->cx->scratch, a->near_at[a->rings->count], &a->near)) != BS_OK)
        return st;
    for (uint32_t r = 0; r < a->rings->count; r++)
        fused_to(a, &f, r, shared, touched, a->near + a->near_at[r]);
    return BS_OK;
}

/* ---- Sets of rings -----------------------------------------------------------------------------
 */

/* Counts the electrons of the set in hand; atoms of three or more of its rings lie inside. */
static bool obeys_rule(const aromatic *a, int size)
{
    int low = 0;
    int high = 0;
    int any = 0;

    for (int s = 0; s < size; s++) {
        for (uint32_t i = a->rings->offsets[a->set[s]]; i < a->rings->offsets[a->set[s] + 1]; i++) {
            uint32_t atom = a->rings->atoms[i];
            bool first = true;

            for (int t = 0; t < s && first && a->atom_count[atom] > 1; t++) {
                for (uint32_t j = a->rings->offsets[a->set[t]];
                     j < a->rings->offsets[a->set[t] + 1]; j++)
                    first = first && a->rings->atoms[j] != atom;
            }
            if (!first || a->atom_count[atom] > 2)
                continue;
            any += a->gifts[atom] == GIFT_ANY;
            low += a->gifts[atom] == GIFT_NONE ? 0 : a->gifts[atom] == GIFT_TWO ? 2 : 1;
            high += a->gifts[atom] == GIFT_NONE ? 0 : a->gifts[atom] == GIFT_ONE ? 1 : 2;
        }
    }
    if (any > 1)
        return false;
    if (high < 6)
        return high == 2;
    for (int n = low; n <= high; n++) {
        if (n % 4 == 2)
            return true;
    }
    return false;
}

static void mark_rim(aromatic *a, int size)
{
    bs_bond *bonds = bs_mol__bonds_mutable(a->mol);

    for (int s = 0; s < size; s++) {
        for (uint32_t i = a->rings->offsets[a->set[s]]; i < a->rings->offsets[a->set[s] + 1]; i++) {
            bs_bond *b = &bonds[a->bonds[i]];

            if (a->bond_count[a->bonds[i]] != 1 || (b->flags & BS_BOND_AROMATIC))
                continue;
            a->mol->atoms[b->a].flags |= BS_ATOM_AROMATIC;
            a->mol->atoms[b->b].flags |= BS_ATOM_AROMATIC;
            /* A triple bond stays one (arynes): no other Kekulé form has it elsewhere. */
            if (b->order > 2)
                continue;
            b->flags |= BS_BOND_AROMATIC;
            a->open_bonds--;
        }
    }
}

static void count_ring(aromatic *a, uint32_t ring, int by)
{
    for (uint32_t i = a->rings->offsets[ring]; i < a->rings->offsets[ring + 1]; i++) {
        a->atom_count[a->rings->atoms[i]] = (uint8_t)(a->atom_count[a->rings->atoms[i]] + by);
        a->bond_count[a->bonds[i]] = (uint8_t)(a->bond_count[a->bonds[i]] + by);
    }
}

static void try_set(aromatic *a, int size)
{
    for (int s = 0; s < size; s++)
        count_ring(a, a->set[s], 1);
    if (obeys_rule(a, size))
        mark_rim(a, size);
    for (int s = 0; s < size; s++)
        count_ring(a, a->set[s], -1);
}

/*
 * Tries every connected set of `size` rings whose first ring is set[0], each once, as in
 * S. Wernicke, IEEE/ACM Trans. Comput. Biol. Bioinf. 2006, 3, 347: rings numbered above the first
 * only, and a ring that was left out at one place stays out below it. The depth is at most
 * MAX_SET.
 */
static bs_status extend(aromatic *a, int have, int size)
{
    bs_status st = BS_OK;
    uint32_t first = a->set[0];

    if (have >= size || have >= MAX_SET) {
        try_set(a, size);
        return bs_poll(a->cx);
    }
    for (int s = 0; s < have && st == BS_OK; s++) {
        for (uint32_t k = a->near_at[a->set[s]]; k < a->near_at[a->set[s] + 1]; k++) {
            uint32_t ring = a->near[k];

            if (ring < first || a->barred[ring] != 0 || a->open_bonds == 0 || st != BS_OK)
                continue;
            a->barred[ring] = (uint32_t)have;
            a->set[have] = ring;
            st = extend(a, have + 1, size);
        }
    }
    /* Lift the bars that this level has set. */
    for (int s = 0; s < have; s++) {
        for (uint32_t k = a->near_at[a->set[s]]; k < a->near_at[a->set[s] + 1]; k++) {
            if (a->barred[a->near[k]] == (uint32_t)have)
                a->barred[a->near[k]] = 0;
        }
    }
    return st;
}

static bs_status try_group(aromatic *a)
{
    int largest = a->group_count > MANY_RINGS ? 2 : MAX_SET;
    bs_status st = BS_OK;

    for (int size = 1; size <= largest && (uint32_t)size <= a->group_count; size++) {
        for (uint32_t i = 0; i < a->group_count && a->open_bonds > 0 && st == BS_OK; i++) {
            a->set[0] = a->group[i];
            a->barred[a->set[0]] = UINT32_MAX;
            st = extend(a, 1, size);
            a->barred[a->set[0]] = 0;
        }
    }
    return st;
}

/* Gathers the rings that hang together with `ring`, and counts their bonds. */
static void gather(aromatic *a, uint32_t ring, bool *done)
{
    bs_bond *bonds = bs_mol__bonds_mutable(a->mol);

    a->group_count = 0;
    a->open_bonds = 0;
    a->group[a->group_count++] = ring;
    done[ring] = true;
    for (uint32_t i = 0; i < a->group_count; i++) {
        for (uint32_t k = a->near_at[a->group[i]]; k < a->near_at[a->group[i] + 1]; k++) {
            if (!done[a->near[k]]) {
                done[a->near[k]] = true;
                a->group[a->group_count++] = a->near[k];
            }
        }
    }
    for (int by = 1; by >= 0; by--) {
        for (uint32_t i = 0; i < a->group_count; i++) {
            for (uint32_t k = a->rings->offsets[a->group[i]];
                 k < a->rings->offsets[a->group[i] + 1]; k++) {
                uint32_t bond = a->bonds[k];

                if (by && !a->bond_count[bond] && !(bonds[bond].flags & BS_BOND_AROMATIC))
                    a->open_bonds++;
                a->bond_count[bond] = (uint8_t)by;
            }
        }
    }
}

bs_status bs_aromatic__mark(bs_ctx *cx, bs_mol *mol, const bs_rings *rings)
{
    aromatic a = {.cx = cx, .mol = mol, .rings = rings};
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bool *done;
    bs_status st;

    if (rings->count == 0)
        return BS_OK;
    if ((st = prepare(&a)) == BS_OK && (st = find_neighbours(&a)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, rings->count, &done)) == BS_OK) {
        for (uint32_t r = 0; r < rings->count && st == BS_OK; r++) {
            if (!a.fits[r] || done[r])
                continue;
            gather(&a, r, done);
            st = try_group(&a);
        }
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
