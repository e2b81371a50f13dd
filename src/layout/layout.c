/*
 * Laying a molecule out: which hydrogens are drawn, places piece by piece, and the pieces side by
 * side.
 */
#include "backsaw/layout.h"

#include "chem/stereo.h"
#include "layout/coordgen.h"
#include "layout/drawing.h"

#include <string.h>

enum {
    LARGEST_PIECE = 200, /* coordgen's time grows with the square of the size and worse */
    LARGE_RING = 9,      /* from here on it searches for a form */
    RINGS_MAX = 5
};

#define GAP 1.0 /* between pieces, in lengths of a bond */

/* ---- Hydrogens ----------------------------------------------------------------------------- */

static bool centre_needs_hydrogen(const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];

    return a->stereo == BS_STEREO_TETRAHEDRAL && a->hydrogens == 1 && a->degree == 3 &&
           a->ring_bonds == 3;
}

static void mark_hydrogens(bs_drawing *d)
{
    memset(d->hydrogen, 0xff, d->atom_count * sizeof *d->hydrogen);
    for (uint32_t i = 0; i < d->atom_count; i++) {
        if (centre_needs_hydrogen(d->mol, i))
            d->hydrogen[i] = 0;
    }
    for (uint32_t i = 0; i < d->mol->bond_count; i++) {
        bs_draft_stereo element;

        if (!bs_stereo__of_bond(d->mol, i, &element))
            continue;
        if (element.around[0] == BS_DRAFT_HYDROGEN)
            d->hydrogen[element.centre] = 0;
        if (element.around[1] == BS_DRAFT_HYDROGEN)
            d->hydrogen[element.second] = 0;
    }
}

bs_status bs_layout__begin(bs_drawing *d, bs_ctx *cx, const bs_mol *mol)
{
    uint32_t count = 0;
    bs_status st;

    *d = (bs_drawing){.cx = cx, .mol = mol, .atom_count = mol->atom_count};
    if ((st = bs_new(cx, &cx->scratch, mol->atom_count, &d->hydrogen)) != BS_OK)
        return st;
    mark_hydrogens(d);
    for (uint32_t i = 0; i < mol->atom_count; i++)
        count += d->hydrogen[i] != UINT32_MAX;
    d->point_count = mol->atom_count + count;
    if ((st = bs_new(cx, &cx->scratch, count, &d->host)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, d->point_count, &d->at)) != BS_OK)
        return st;
    count = 0;
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        if (d->hydrogen[i] == UINT32_MAX)
            continue;
        d->host[count] = i;
        d->hydrogen[i] = mol->atom_count + count++;
    }
    return BS_OK;
}

/* ---- Pieces -------------------------------------------------------------------------------- */

typedef struct piece {
    uint32_t *points; /* atoms, then drawn hydrogens */
    uint32_t atom_count, point_count;
} piece;

typedef struct pieces {
    bs_drawing *d;
    uint32_t *local;    /* by point: its number in its piece */
    uint32_t *piece_of; /* by atom: the first atom of its piece, UINT32_MAX before it is known */
    bool *placed;       /* by point */
    uint32_t *points;   /* piece after piece */
    double right;       /* where the drawing ends so far */
    bool any;
} pieces;

/* Gathers the piece with atom `start`. */
static void gather(pieces *p, uint32_t start, piece *out)
{
    const bs_mol *mol = p->d->mol;
    uint32_t count = 0;

    p->piece_of[start] = start;
    out->points[count++] = start;
    for (uint32_t head = 0; head < count; head++) {
        const bs_link *links = bs_mol__links(mol, out->points[head]);

        for (int k = 0; k < mol->atoms[out->points[head]].degree; k++) {
            if (p->piece_of[links[k].atom] == UINT32_MAX) {
                p->piece_of[links[k].atom] = start;
                out->points[count++] = links[k].atom;
            }
        }
    }
    out->atom_count = count;
    for (uint32_t i = 0; i < out->atom_count; i++) {
        if (p->d->hydrogen[out->points[i]] != UINT32_MAX)
            out->points[count++] = p->d->hydrogen[out->points[i]];
    }
    out->point_count = count;
    for (uint32_t i = 0; i < count; i++)
        p->local[out->points[i]] = i;
}

typedef enum way { WAY_PLAIN, WAY_SHAPED, WAY_OPEN } way;

/*
 * How a piece is drawn, by its large rings. Finding forms for them takes coordgen a time that
 * grows exponentially with their number and size; drawing them open, like chains whose ends meet,
 * is quicker for big ones. The bounds were measured: what they let through takes a few seconds.
 */
static way way_of(const pieces *p, const piece *pc)
{
    /* By number of large rings: largest ring and sum of sizes that are shaped, sum that is open. */
    static const struct {
        int largest, shaped, open;
    } bounds[RINGS_MAX] = {{0, 0, 0}, {30, 30, 1000}, {24, 48, 1000}, {16, 48, 80}, {16, 48, 0}};
    int count = 0;
    int largest = 0;
    int sum = 0;

    if (pc->atom_count > LARGEST_PIECE)
        return WAY_PLAIN;
    for (uint32_t r = 0; r < p->d->mol->ring_count && count < RINGS_MAX; r++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(p->d->mol, (int)r, &atoms);

        if (size < LARGE_RING || p->piece_of[atoms[0]] != pc->points[0])
            continue;
        count++;
        sum += size;
        largest = size > largest ? size : largest;
    }
    if (count == 0)
        return WAY_SHAPED;
    if (count == RINGS_MAX)
        return WAY_PLAIN;
    if (largest <= bounds[count].largest && sum <= bounds[count].shaped)
        return WAY_SHAPED;
    return sum <= bounds[count].open ? WAY_OPEN : WAY_PLAIN;
}

static void copy_bond(const pieces *p, uint32_t bond, bs_coordgen_bond *out)
{
    const bs_bond *b = bs_mol__bonds(p->d->mol) + bond;
    bs_draft_stereo element;
    uint32_t beside[2];

    *out = (bs_coordgen_bond){.a = p->local[b->a], .b = p->local[b->b]};
    out->order = (uint8_t)(b->order < 1 ? 1 : b->order > 3 ? 3 : b->order);
    /* coordgen knows no geometry of longer chains of double bonds; mending sees to those. */
    if (!bs_stereo__of_bond(p->d->mol, bond, &element) || element.centre != b->a ||
        element.second != b->b)
        return;
    for (int k = 0; k < 2; k++)
        beside[k] = element.around[k] != BS_DRAFT_HYDROGEN ? element.around[k]
                                                           : p->d->hydrogen[k == 0 ? b->a : b->b];
    out->geometry = element.perm;
    out->beside_a = p->local[beside[0]];
    out->beside_b = p->local[beside[1]];
}

/* The bonds of a piece in coordgen's terms, in the order of the atoms at whose end they stand. */
static uint32_t copy_bonds(const pieces *p, const piece *pc, bs_coordgen_bond *out)
{
    const bs_bond *bonds = bs_mol__bonds(p->d->mol);
    uint32_t count = 0;

    for (uint32_t i = 0; i < pc->atom_count; i++) {
        uint32_t atom = pc->points[i];
        const bs_link *links = bs_mol__links(p->d->mol, atom);

        for (int k = 0; k < p->d->mol->atoms[atom].degree; k++) {
            if (bonds[links[k].bond].a == atom)
                copy_bond(p, links[k].bond, &out[count++]);
        }
    }
    for (uint32_t i = pc->atom_count; i < pc->point_count; i++) {
        uint32_t host = p->d->host[pc->points[i] - p->d->atom_count];

        out[count++] = (bs_coordgen_bond){.a = p->local[host], .b = i, .order = 1};
    }
    return count;
}

/* Places a piece through coordgen; *done is false if it needs the plain drawing. */
static bs_status place_well(pieces *p, const piece *pc, bool open, bool *done)
{
    bs_ctx *cx = p->d->cx;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    uint32_t room = 0;
    uint8_t *elements;
    bs_coordgen_bond *bonds;
    double *places; /* x and y of each point */
    bs_coordgen_result result;
    bs_status st;

    for (uint32_t i = 0; i < pc->atom_count; i++)
        room += p->d->mol->atoms[pc->points[i]].degree;
    if ((st = bs_new(cx, &cx->scratch, pc->point_count, &elements)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, 2 * (size_t)pc->point_count, &places)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, room + pc->point_count, &bonds)) != BS_OK)
        goto done;
    for (uint32_t i = 0; i < pc->point_count; i++)
        elements[i] = i < pc->atom_count ? p->d->mol->atoms[pc->points[i]].element : 1;
    result = bs_coordgen__place(pc->point_count, elements, copy_bonds(p, pc, bonds), bonds, open,
                                places);
    if (result == BS_COORDGEN_NO_MEMORY)
        st = bs_fail_memory(cx);
    *done = result == BS_COORDGEN_DONE;
    for (uint32_t i = 0; i < pc->point_count && *done; i++)
        p->d->at[pc->points[i]] = (bs_point){places[2 * i], places[2 * i + 1]};
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* Moves a piece to the right of what is there, centred on the line y = 0. */
static void move_beside(pieces *p, const piece *pc)
{
    bs_point low = p->d->at[pc->points[0]];
    bs_point high = low;
    double dx;
    double dy;

    for (uint32_t i = 1; i < pc->point_count; i++) {
        const bs_point *at = &p->d->at[pc->points[i]];

        low.x = at->x < low.x ? at->x : low.x;
        low.y = at->y < low.y ? at->y : low.y;
        high.x = at->x > high.x ? at->x : high.x;
        high.y = at->y > high.y ? at->y : high.y;
    }
    dx = p->right + (p->any ? GAP : 0) - low.x;
    dy = -(low.y + high.y) / 2;
    for (uint32_t i = 0; i < pc->point_count; i++) {
        p->d->at[pc->points[i]].x += dx;
        p->d->at[pc->points[i]].y += dy;
    }
    p->right = high.x + dx;
    p->any = true;
}

static bs_status place_pieces(bs_drawing *d, int *wrong)
{
    bs_arena *scratch = &d->cx->scratch;
    bs_mark temp = bs_arena_mark(scratch);
    pieces p = {.d = d};
    uint32_t used = 0;
    bs_status st;

    if ((st = bs_new(d->cx, scratch, d->point_count, &p.local)) != BS_OK ||
        (st = bs_new(d->cx, scratch, d->atom_count, &p.piece_of)) != BS_OK ||
        (st = bs_new(d->cx, scratch, d->point_count, &p.placed)) != BS_OK ||
        (st = bs_new(d->cx, scratch, d->point_count, &p.points)) != BS_OK)
        goto done;
    memset(p.piece_of, 0xff, d->atom_count * sizeof *p.piece_of);
    for (uint32_t i = 0; i < d->atom_count && st == BS_OK; i++) {
        piece pc = {.points = p.points + used};
        bool done = false;
        way chosen;

        if (p.piece_of[i] != UINT32_MAX)
            continue;
        gather(&p, i, &pc);
        used += pc.point_count;
        chosen = way_of(&p, &pc);
        if ((st = bs_poll(d->cx)) == BS_OK && chosen != WAY_PLAIN)
            st = place_well(&p, &pc, chosen == WAY_OPEN, &done);
        if (st == BS_OK && !done)
            st = bs_layout__plain(d, i, p.placed);
    }
    if (st == BS_OK)
        st = bs_layout__mend_doubles(d, wrong);
    for (uint32_t at = 0; at < used && st == BS_OK;) {
        piece pc = {.points = p.points + at};

        /* A piece ends where numbering starts again. */
        do
            pc.point_count++;
        while (at + pc.point_count < used && p.local[p.points[at + pc.point_count]] != 0);
        move_beside(&p, &pc);
        at += pc.point_count;
    }
done:
    bs_arena_rewind(scratch, temp);
    return st;
}

/* ---- The result ---------------------------------------------------------------------------- */

static bs_status make_result(bs_ctx *cx, bs_arena *home, const bs_drawing *d, bs_layout **out)
{
    uint32_t hydrogens = d->point_count - d->atom_count;
    bs_layout *layout;
    bs_status st;

    if ((st = bs_new(cx, home, 1, &layout)) != BS_OK ||
        (st = bs_new(cx, home, d->atom_count, &layout->atoms)) != BS_OK ||
        (st = bs_new(cx, home, d->mol->bond_count, &layout->bonds)) != BS_OK ||
        (st = bs_new(cx, home, hydrogens, &layout->hydrogens)) != BS_OK)
        return st;
    layout->atom_count = (int)d->atom_count;
    layout->bond_count = (int)d->mol->bond_count;
    layout->hydrogen_count = (int)hydrogens;
    if (d->atom_count > 0)
        memcpy(layout->atoms, d->at, d->atom_count * sizeof *d->at);
    for (uint32_t i = 0; i < hydrogens; i++) {
        layout->hydrogens[i].atom = (int)d->host[i];
        layout->hydrogens[i].at = d->at[d->atom_count + i];
    }
    *out = layout;
    return BS_OK;
}

bs_status bs_layout_make(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_layout **out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_layout *layout = NULL;
    bs_drawing d;
    int wrong = 0;
    bs_status st;

    *out = NULL;
    if ((st = bs_layout__begin(&d, cx, mol)) == BS_OK && (st = place_pieces(&d, &wrong)) == BS_OK &&
        (st = make_result(cx, home, &d, &layout)) == BS_OK &&
        (st = bs_layout__choose_wedges(&d, layout)) == BS_OK)
        st = bs_layout__mark_undecided(&d, layout);
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        return st;
    }
    layout->lost += wrong;
    *out = layout;
    return BS_OK;
}
