/*
 * Wedges: each centre gets one bond that tells its hand.
 *
 * Good is a bond to a hydrogen or another end of a chain that is no centre and lies in no ring;
 * a bond tells of one centre only. Centres with the fewest good bonds choose first; where all
 * bonds of one are taken, the others move over (augmenting paths, as in bipartite matching).
 */
#include "chem/stereo.h"
#include "layout/drawing.h"

#include <math.h>

enum {
    COST_LONG = 2, /* the neighbour goes on */
    COST_CARBON = 1,
    COST_CENTRE = 20,
    COST_RING = 40,
    COST_UNCLEAR = 100,
    COST_NEVER = 1000
};

typedef struct wedges {
    bs_drawing *d;
    bs_layout *layout;
    uint32_t *centres;
    uint32_t centre_count;
    uint32_t *owner; /* by line (bonds, then drawn hydrogens): place of the centre in `centres` */
    uint32_t *line;  /* by place: the line that it took */
    uint32_t *queue; /* for the search of augmenting paths */
    uint32_t *came;  /* by line: the place from which the search reached it */
} wedges;

#define NOBODY UINT32_MAX

int bs_layout__spokes(const bs_drawing *d, uint32_t centre, bs_spoke spokes[4], uint32_t ends[4])
{
    uint32_t around[6];
    int count = bs_stereo__around(d->mol, centre, BS_STEREO_TETRAHEDRAL, around);
    int n = 0;

    if (count != 4)
        return 0;
    for (int k = 0; k < 4; k++) {
        uint32_t end = around[k] == BS_DRAFT_HYDROGEN ? d->hydrogen[centre] : around[k];

        if (end == UINT32_MAX)
            continue;
        ends[n] = end;
        spokes[n++] = (bs_spoke){d->at[end].x - d->at[centre].x, d->at[end].y - d->at[centre].y, 0};
    }
    return n;
}

static bool is_centre(const bs_mol *mol, uint32_t atom)
{
    return mol->atoms[atom].stereo == BS_STEREO_TETRAHEDRAL;
}

/* The line from a centre to a neighbour or its drawn hydrogen. */
static uint32_t line_to(const wedges *w, uint32_t centre, uint32_t end)
{
    if (end >= w->d->atom_count)
        return w->d->mol->bond_count + end - w->d->atom_count;
    return (uint32_t)bs_mol_bond_between(w->d->mol, (int)centre, (int)end);
}

/* ---- How good a bond is -------------------------------------------------------------------- */

/* Between two bonds less than 180 degrees apart, readers disagree on what the third one says. */
static bool lies_between(const bs_spoke *s, int k)
{
    const bs_spoke *a = &s[(k + 1) % 3];
    const bs_spoke *b = &s[(k + 2) % 3];
    double ab = a->x * b->y - a->y * b->x;
    double ak = a->x * s[k].y - a->y * s[k].x;
    double kb = s[k].x * b->y - s[k].y * b->x;

    return (ab > 0 && ak > 0 && kb > 0) || (ab < 0 && ak < 0 && kb < 0);
}

static int cost_of(const wedges *w, const bs_spoke *spokes, const uint32_t *ends, int count, int k,
                   uint32_t centre)
{
    const bs_mol *mol = w->d->mol;
    double clarity = bs_hand__clarity(spokes, count, k);
    const bs_atom *end;
    const bs_bond *bond;
    int cost = (int)(10 * (1 - clarity));

    if (clarity < BS_HAND_CLEAR * 1.5)
        return COST_NEVER;
    if (clarity < 0.3 || (count == 3 && lies_between(spokes, k)))
        cost += COST_UNCLEAR;
    if (ends[k] >= w->d->atom_count)
        return cost - COST_LONG;
    end = &mol->atoms[ends[k]];
    bond = bs_mol__bonds(mol) + line_to(w, centre, ends[k]);
    if (bond->order != 1)
        return COST_NEVER;
    cost += end->degree > 1 ? COST_LONG : 0;
    cost += end->element == 6 ? COST_CARBON : 0;
    cost += is_centre(mol, ends[k]) ? COST_CENTRE : 0;
    cost += bond->flags & BS_BOND_RING ? COST_RING : 0;
    return cost;
}

/* ---- Who gets which ------------------------------------------------------------------------ */

/* The lines of a centre, cheapest first; returns their number. */
static int lines_of(const wedges *w, uint32_t centre, uint32_t lines[4], int costs[4])
{
    bs_spoke spokes[4];
    uint32_t ends[4];
    int count = bs_layout__spokes(w->d, centre, spokes, ends);
    int found = 0;

    for (int k = 0; k < count; k++) {
        int cost = cost_of(w, spokes, ends, count, k, centre);
        int i = found;

        if (cost >= COST_NEVER)
            continue;
        for (; i > 0 && costs[i - 1] > cost; i--) {
            costs[i] = costs[i - 1];
            lines[i] = lines[i - 1];
        }
        costs[i] = cost;
        lines[i] = line_to(w, centre, ends[k]);
        found++;
    }
    return found;
}

/* The lines from the end of an augmenting path back to its start change hands. */
static void hand_over(wedges *w, uint32_t line)
{
    while (line != NOBODY) {
        uint32_t place = w->came[line];
        uint32_t given_up = w->line[place];

        w->line[place] = line;
        w->owner[line] = place;
        line = given_up;
    }
}

/* Finds a line for a centre; others may have to move over. */
static bool claim(wedges *w, uint32_t place)
{
    uint32_t lines_total = w->d->mol->bond_count + w->d->point_count - w->d->atom_count;
    uint32_t head = 0;
    uint32_t tail = 0;

    for (uint32_t i = 0; i < lines_total; i++)
        w->came[i] = NOBODY;
    w->queue[tail++] = place;
    while (head < tail) {
        uint32_t asks = w->queue[head++];
        uint32_t lines[4];
        int costs[4];
        int count = lines_of(w, w->centres[asks], lines, costs);

        for (int k = 0; k < count; k++) {
            if (w->came[lines[k]] != NOBODY)
                continue;
            w->came[lines[k]] = asks;
            if (w->owner[lines[k]] == NOBODY) {
                hand_over(w, lines[k]);
                return true;
            }
            w->queue[tail++] = w->owner[lines[k]];
        }
    }
    return false;
}

/* Takes the cheapest free line if it is good, or any that is not worse than `worst`. */
static bool take_free(wedges *w, uint32_t place, int worst)
{
    uint32_t lines[4];
    int costs[4];
    int count = lines_of(w, w->centres[place], lines, costs);

    for (int k = 0; k < count && costs[k] < worst; k++) {
        if (w->owner[lines[k]] != NOBODY)
            continue;
        w->owner[lines[k]] = place;
        w->line[place] = lines[k];
        return true;
    }
    return false;
}

/* ---- Drawing them -------------------------------------------------------------------------- */

static void set_wedge(wedges *w, uint32_t centre, uint32_t line, bs_wedge wedge)
{
    const bs_bond *bonds = bs_mol__bonds(w->d->mol);

    if (line >= w->d->mol->bond_count) {
        w->layout->hydrogens[line - w->d->mol->bond_count].wedge = wedge;
        return;
    }
    w->layout->bonds[line].wedge = (uint8_t)wedge;
    w->layout->bonds[line].from_b = bonds[line].b == centre;
}

/* The wedge that tells the perm of a centre by a line. */
static bs_wedge wedge_for(const wedges *w, uint32_t centre, uint32_t line)
{
    bs_spoke spokes[4];
    uint32_t ends[4];
    int count = bs_layout__spokes(w->d, centre, spokes, ends);
    int perm;

    for (int k = 0; k < count; k++) {
        if (line_to(w, centre, ends[k]) == line)
            spokes[k].wedge = 1;
    }
    perm = bs_hand__flat(spokes, count);
    if (perm == 0)
        return BS_WEDGE_NONE;
    return perm == w->d->mol->atoms[centre].perm ? BS_WEDGE_UP : BS_WEDGE_DOWN;
}

/* ---- Allenes ------------------------------------------------------------------------------- */

/*
 * An allene shows its hand by a wedge on a bond of one end. `around` names the atoms of both ends
 * in the order of the perm; the end in the page is the one whose atoms come first.
 */
static void draw_allene(wedges *w, uint32_t centre, const uint32_t around[4], uint32_t a,
                        uint32_t b)
{
    const bs_mol *mol = w->d->mol;
    int in_page = around[0] == BS_DRAFT_HYDROGEN;
    bs_vector beside = bs_layout__vector(w->d, around[in_page]);

    for (int k = 2; k < 4; k++) {
        uint32_t line;
        int perm;

        if (around[k] == BS_DRAFT_HYDROGEN)
            continue;
        line = line_to(w, b, around[k]);
        if (bs_mol__bonds(mol)[line].order != 1 || w->owner[line] != NOBODY)
            continue;
        perm =
            bs_hand__flat_allene(bs_layout__vector(w->d, a), bs_layout__vector(w->d, b), beside, 1);
        if (perm == 0)
            break;
        if ((in_page == 1) != (k == 3))
            perm = 3 - perm;
        w->owner[line] = NOBODY - 1;
        set_wedge(w, b, line, perm == mol->atoms[centre].perm ? BS_WEDGE_UP : BS_WEDGE_DOWN);
        return;
    }
    w->layout->lost++;
}

/* The end of an allene: the neighbour of `beside` that is no atom of `around`. */
static uint32_t allene_end(const bs_mol *mol, uint32_t centre, int which)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t from = centre;
    uint32_t at = bs_mol__links(mol, centre)[which].atom;

    for (uint32_t steps = 0; steps < mol->atom_count && mol->atoms[at].degree == 2; steps++) {
        const bs_link *links = bs_mol__links(mol, at);
        const bs_link *onward = links[0].atom == from ? &links[1] : &links[0];

        if (bonds[onward->bond].order != 2)
            break;
        from = at;
        at = onward->atom;
    }
    return at;
}

static void show_allene(wedges *w, uint32_t centre)
{
    const bs_mol *mol = w->d->mol;
    uint32_t around[6];

    if (bs_stereo__around(mol, centre, BS_STEREO_ALLENE, around) != 4) {
        w->layout->lost++;
        return;
    }
    draw_allene(w, centre, around, allene_end(mol, centre, 0), allene_end(mol, centre, 1));
}

/* ---- All together -------------------------------------------------------------------------- */

static bs_status begin(wedges *w)
{
    const bs_mol *mol = w->d->mol;
    bs_arena *scratch = &w->d->cx->scratch;
    uint32_t lines = mol->bond_count + w->d->point_count - w->d->atom_count;
    bs_status st;

    for (uint32_t i = 0; i < mol->atom_count; i++)
        w->centre_count += is_centre(mol, i);
    if ((st = bs_new(w->d->cx, scratch, w->centre_count, &w->centres)) != BS_OK ||
        (st = bs_new(w->d->cx, scratch, w->centre_count, &w->line)) != BS_OK ||
        (st = bs_new(w->d->cx, scratch, lines + 1, &w->queue)) != BS_OK ||
        (st = bs_new(w->d->cx, scratch, lines, &w->came)) != BS_OK ||
        (st = bs_new(w->d->cx, scratch, lines, &w->owner)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < lines; i++)
        w->owner[i] = NOBODY;
    w->centre_count = 0;
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        if (is_centre(mol, i)) {
            w->line[w->centre_count] = NOBODY;
            w->centres[w->centre_count++] = i;
        }
    }
    return BS_OK;
}

bs_status bs_layout__choose_wedges(bs_drawing *d, bs_layout *layout)
{
    /* Good lines first, then those in rings or between centres, then unclear ones. */
    static const int worst[] = {COST_CENTRE, COST_RING, COST_UNCLEAR};
    bs_mark temp = bs_arena_mark(&d->cx->scratch);
    wedges w = {.d = d, .layout = layout};
    bs_status st = begin(&w);

    for (uint32_t i = 0; i < d->atom_count && st == BS_OK; i++) {
        if (d->mol->atoms[i].stereo == BS_STEREO_ALLENE)
            show_allene(&w, i);
        else if (d->mol->atoms[i].stereo > BS_STEREO_ALLENE)
            layout->lost++;
    }
    for (size_t round = 0; round < sizeof worst / sizeof *worst && st == BS_OK; round++) {
        for (uint32_t i = 0; i < w.centre_count; i++) {
            if (w.line[i] == NOBODY)
                take_free(&w, i, worst[round]);
        }
    }
    for (uint32_t i = 0; i < w.centre_count && st == BS_OK; i++) {
        if (w.line[i] == NOBODY && ((st = bs_poll(d->cx)) != BS_OK || !claim(&w, i)))
            layout->lost++;
    }
    for (uint32_t i = 0; i < w.centre_count && st == BS_OK; i++) {
        if (w.line[i] != NOBODY)
            set_wedge(&w, w.centres[i], w.line[i], wedge_for(&w, w.centres[i], w.line[i]));
    }
    bs_arena_rewind(&d->cx->scratch, temp);
    return st;
}
