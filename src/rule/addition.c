/*
 * Syn and anti additions: the geometry of a double bond becomes the relation of two centres, and
 * backwards the relation of the centres becomes the geometry.
 *
 * Drawn with the double bond a=b in the plane, a on the left, a1 and b1 above the bond, a2 and b2
 * below it: what comes to a from the front, X, sees b, a1, a2 anticlockwise; what comes to b from
 * the front, Y, sees b1, a, b2 anticlockwise. From the back it is clockwise.
 */
#include <string.h>

#include "rule/edit.h"

enum { LARGEST_CIS_RING = 7 };

/* One end: the two groups that stay, and what comes or goes; BS_DRAFT_HYDROGEN for a hydrogen. */
typedef struct flank {
    uint32_t atom, first, second, extra;
} flank;

/* Neighbours in the reactants, or in the draft as it is now. */
static int neighbours(const bs_edit *edit, uint32_t atom, bool before, uint32_t out[4])
{
    uint32_t count = before ? edit->bench->bond_count : edit->draft.bond_count;
    const bs_draft_bond *bonds = before ? edit->bench->bonds : edit->draft.bonds;
    int n = 0;

    for (uint32_t i = 0; i < count; i++) {
        if ((bonds[i].gone && !before) || (bonds[i].a != atom && bonds[i].b != atom))
            continue;
        if (n < 4)
            out[n] = bonds[i].a == atom ? bonds[i].b : bonds[i].a;
        n++;
    }
    return n;
}

static bool holds(const uint32_t *list, int count, uint32_t atom)
{
    for (int i = 0; i < count; i++) {
        if (list[i] == atom)
            return true;
    }
    return false;
}

/*
 * Describes an end: `open` are its neighbours at the double bond, `full` those at the centre. False
 * if it is no centre, or has other bonds than the change explains.
 */
static bool describe(const bs_edit *edit, uint32_t atom, uint32_t partner, bool adding, flank *out)
{
    uint32_t open[4], full[4];
    int opens = neighbours(edit, atom, adding, open);
    int fulls = neighbours(edit, atom, !adding, full), stay = 0, extra = 0;

    *out = (flank){atom, BS_DRAFT_HYDROGEN, BS_DRAFT_HYDROGEN, BS_DRAFT_HYDROGEN};
    if (opens > 3 || fulls > 4 || fulls < 3)
        return false;
    for (int i = 0; i < fulls; i++) {
        if (full[i] == partner)
            continue;
        if (!holds(open, opens, full[i])) {
            out->extra = full[i];
            extra++;
        } else if (stay++ == 0) {
            out->first = full[i];
        } else {
            out->second = full[i];
        }
    }
    /* Two hydrogens make no centre. */
    return extra <= 1 && stay >= 1 && stay + extra >= 2 && stay == opens - 1;
}

/* ---- Geometry of the double bond
 * -------------------------------------------------------------------- */

static bool stays(const flank *end, uint32_t atom)
{
    return end->first == atom || end->second == atom;
}

/* The groups of both ends that lie in one small ring; false if there is none. */
static bool ring_pair(const bs_edit *edit, int slot, const flank *a, const flank *b, uint32_t *a1,
                      uint32_t *b1)
{
    int part = edit->bench->reading->from->atoms[slot].part;
    const bs_mol *mol = edit->bench->mols[part];
    uint32_t base = edit->bench->base[part];

    for (int r = 0; r < bs_mol_ring_count(mol); r++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(mol, r, &atoms);

        for (int i = 0; i < size && size <= LARGEST_CIS_RING; i++) {
            uint32_t x = base + atoms[i], y = base + atoms[(i + 1) % size];
            uint32_t past_y = base + atoms[(i + 2) % size],
                     past_x = base + atoms[(i + size - 1) % size];

            *a1 = x == a->atom ? past_x : past_y;
            *b1 = x == a->atom ? past_y : past_x;
            if ((x == a->atom ? y == b->atom : x == b->atom && y == a->atom) && stays(a, *a1) &&
                stays(b, *b1))
                return true;
        }
    }
    return false;
}

/* Whether `first` of a and `first` of b stand on the same side: 1, 0, or -1 if nobody knows. */
static int same_side(const bs_edit *edit, const flank *a, const flank *b)
{
    const bs_addition *addition = &edit->bench->reading->addition;
    uint32_t near_a, near_b;
    int cis = -1;

    for (uint32_t i = 0; i < edit->bench->stereo_count && cis < 0; i++) {
        const bs_draft_stereo *e = &edit->bench->stereo[i];
        bool straight = e->centre == a->atom && e->second == b->atom;

        if (e->kind != BS_DRAFT_DOUBLE || e->perm == 0 ||
            !(straight || (e->centre == b->atom && e->second == a->atom)))
            continue;
        near_a = e->around[straight ? 0 : 1];
        near_b = e->around[straight ? 1 : 0];
        cis = e->perm == 1;
    }
    if (cis < 0 && ring_pair(edit, addition->x, a, b, &near_a, &near_b))
        cis = 1;
    if (cis < 0)
        return -1;
    return (near_a == a->first) == (near_b == b->first) ? cis : !cis;
}

/* ---- Adding
 * ------------------------------------------------------------------------------------------- */

static bs_status add_centre(bs_edit *edit, uint32_t centre, bool anticlockwise, uint32_t from,
                            uint32_t p, uint32_t q, uint32_t r)
{
    bs_draft_stereo element = {.kind = BS_STEREO_TETRAHEDRAL,
                               .perm = anticlockwise ? 1 : 2,
                               .centre = centre,
                               .around = {from, p, q, r}};

    return bs_draft_add_stereo(&edit->draft, element);
}

static bs_status make_centres(bs_edit *edit, uint32_t x, uint32_t y, bool syn)
{
    flank a, b;
    bool ok_a = describe(edit, x, y, true, &a), ok_b = describe(edit, y, x, true, &b);
    uint32_t swap;
    int cis;
    bs_status st;

    if (!ok_a || !ok_b || (cis = same_side(edit, &a, &b)) < 0)
        return BS_OK;
    if (cis == 0) {
        swap = b.first;
        b.first = b.second;
        b.second = swap;
    }
    st = add_centre(edit, x, true, a.extra, y, a.first, a.second);
    return st == BS_OK ? add_centre(edit, y, syn, b.extra, b.first, x, b.second) : st;
}

/* ---- Taking away
 * ---------------------------------------------------------------------------------------- */

/* Whether the centre of the reactants shows p, q, r anticlockwise from `from`: 1, 0, or -1. */
static int turns(const bs_edit *edit, uint32_t centre, uint32_t from, uint32_t p, uint32_t q,
                 uint32_t r)
{
    const uint32_t wanted[4] = {from, p, q, r};

    for (uint32_t i = 0; i < edit->bench->stereo_count; i++) {
        const bs_draft_stereo *e = &edit->bench->stereo[i];
        int place[4];
        bool odd = false;

        if (e->kind != BS_STEREO_TETRAHEDRAL || e->centre != centre || e->perm == 0)
            continue;
        for (int k = 0; k < 4; k++) {
            place[k] = -1;
            for (int n = 0; n < 4; n++)
                place[k] = e->around[n] == wanted[k] ? n : place[k];
            if (place[k] < 0)
                return -1;
            for (int n = 0; n < k; n++)
                odd ^= place[n] > place[k];
        }
        return (e->perm == 1) != odd;
    }
    return -1;
}

static bs_status make_double(bs_edit *edit, uint32_t x, uint32_t y, bool syn)
{
    const bs_addition *addition = &edit->bench->reading->addition;
    bs_draft_stereo element = {.kind = BS_DRAFT_DOUBLE, .centre = x, .second = y};
    flank a, b;
    uint32_t p, q;
    int turn_a, turn_b;

    if (!describe(edit, x, y, false, &a) || !describe(edit, y, x, false, &b))
        return BS_OK;
    turn_a = turns(edit, x, a.extra, y, a.first, a.second);
    turn_b = turns(edit, y, b.extra, b.first, x, b.second);
    if (turn_a < 0 || turn_b < 0)
        return BS_OK;
    element.perm = (turn_a == turn_b) == syn ? 1 : 2;
    if (ring_pair(edit, addition->x, &a, &b, &p, &q)) {
        /* A small ring holds the double bond one way only. */
        edit->barred = ((a.first == p) == (b.first == q)) != (element.perm == 1);
        return BS_OK;
    }
    element.around[0] = a.first;
    element.around[1] = b.first;
    return bs_draft_add_stereo(&edit->draft, element);
}

bs_status bs_edit__add_faces(bs_edit *edit)
{
    const bs_addition *addition = &edit->bench->reading->addition;
    uint32_t x, y;

    if (addition->way == BS_ADDITION_NONE)
        return BS_OK;
    x = edit->slot[addition->x];
    y = edit->slot[addition->y];
    return addition->adding ? make_centres(edit, x, y, addition->way == BS_ADDITION_SYN)
                            : make_double(edit, x, y, addition->way == BS_ADDITION_SYN);
}
