/*
 * Stereo of a molfile: from wedges and places, from places in space, or from parities.
 *
 * What cannot be a stereo element is left to the finishing of the draft; here only the drawing is
 * read.
 */
#include "chem/mol.h"
#include "format/molfile.h"
#include "layout/hand.h"

#include <math.h>
#include <string.h>

#define DEPTH 0.01 /* a smaller z counts for none */

typedef enum dimension { NO_PLACES, FLAT, SOLID } dimension;

typedef struct stereo {
    const bs_molfile *file;
    bs_draft *draft;
    dimension dimension;
    uint32_t *offsets; /* by atom */
    uint32_t *bonds;   /* around each atom, in the order of the file */
} stereo;

static dimension dimension_of(const bs_molfile *file)
{
    dimension d = NO_PLACES;

    for (uint32_t i = 0; i < file->atom_count; i++) {
        const bs_molfile_atom *a = &file->atoms[i];

        if (fabs(a->z) > DEPTH)
            return SOLID;
        if (a->x != 0 || a->y != 0)
            d = FLAT;
    }
    return d;
}

static bool counts(const bs_molfile_bond *b)
{
    return b->type != BS_MOLFILE_BOND_HYDROGEN;
}

static bs_status list_bonds(stereo *s)
{
    const bs_molfile *file = s->file;
    bs_arena *scratch = &file->cx->scratch;
    uint32_t *fill;
    bs_status st;

    if ((st = bs_new(file->cx, scratch, file->atom_count + 1, &s->offsets)) != BS_OK ||
        (st = bs_new(file->cx, scratch, file->atom_count, &fill)) != BS_OK ||
        (st = bs_new(file->cx, scratch, 2 * (size_t)file->bond_count, &s->bonds)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < file->bond_count; i++) {
        if (counts(&file->bonds[i])) {
            s->offsets[file->bonds[i].a + 1]++;
            s->offsets[file->bonds[i].b + 1]++;
        }
    }
    for (uint32_t i = 0; i < file->atom_count; i++)
        s->offsets[i + 1] += s->offsets[i];
    for (uint32_t i = 0; i < file->bond_count; i++) {
        uint32_t a = file->bonds[i].a;
        uint32_t b = file->bonds[i].b;

        if (counts(&file->bonds[i])) {
            s->bonds[s->offsets[a] + fill[a]++] = i;
            s->bonds[s->offsets[b] + fill[b]++] = i;
        }
    }
    return BS_OK;
}

static uint32_t degree(const stereo *s, uint32_t atom)
{
    return s->offsets[atom + 1] - s->offsets[atom];
}

static const bs_molfile_bond *bond_at(const stereo *s, uint32_t atom, uint32_t k)
{
    return &s->file->bonds[s->bonds[s->offsets[atom] + k]];
}

static uint32_t other_end(const bs_molfile_bond *b, uint32_t atom)
{
    return b->a == atom ? b->b : b->a;
}

static bs_vector place(const stereo *s, uint32_t atom)
{
    const bs_molfile_atom *a = &s->file->atoms[atom];

    return (bs_vector){a->x, a->y, s->dimension == SOLID ? a->z : 0};
}

static bs_vector bond_vector(const stereo *s, uint32_t from, uint32_t to)
{
    bs_vector p = place(s, from);
    bs_vector q = place(s, to);

    return (bs_vector){q.x - p.x, q.y - p.y, q.z - p.z};
}

/* What a bond says at the atom: 1 up, -1 down, 0 nothing. */
static int wedge_at(const bs_molfile_bond *b, uint32_t atom)
{
    if (b->a != atom)
        return 0;
    return b->mark == BS_MARK_UP ? 1 : b->mark == BS_MARK_DOWN ? -1 : 0;
}

/* Whether a wavy bond starts at the atom. */
static bool is_wavy(const stereo *s, uint32_t atom)
{
    for (uint32_t k = 0; k < degree(s, atom); k++) {
        const bs_molfile_bond *b = bond_at(s, atom, k);

        if (b->a == atom && b->mark == BS_MARK_EITHER && b->type != 2)
            return true;
    }
    return false;
}

/* ---- Centres ------------------------------------------------------------------------------- */

static int perm_of_wedges(const stereo *s, uint32_t atom)
{
    bs_spoke spokes[4];
    uint32_t count = degree(s, atom);

    for (uint32_t k = 0; k < count; k++) {
        const bs_molfile_bond *b = bond_at(s, atom, k);
        bs_vector v = bond_vector(s, atom, other_end(b, atom));

        spokes[k] = (bs_spoke){v.x, v.y, wedge_at(b, atom)};
    }
    return bs_hand__flat(spokes, (int)count);
}

static int perm_of_places(const stereo *s, uint32_t atom)
{
    bs_vector around[4];
    uint32_t count = degree(s, atom);

    for (uint32_t k = 0; k < count; k++)
        around[k] = bond_vector(s, atom, other_end(bond_at(s, atom, k), atom));
    return bs_hand__solid(around, (int)count);
}

/*
 * The perm that a parity says. Parity 1: with the highest number (a hydrogen counts as the
 * highest) away from the viewer, the others run clockwise by rising numbers; seen from it,
 * anticlockwise. `around` gets the atoms, the highest first, then by rising numbers.
 */
static int perm_of_parity(const stereo *s, uint32_t atom, uint32_t around[4])
{
    uint32_t sorted[4];
    int n = 0;
    int highest = -1;

    for (uint32_t k = 0; k < degree(s, atom); k++) {
        uint32_t end = other_end(bond_at(s, atom, k), atom);
        int i = n++;

        for (; i > 0 && sorted[i - 1] > end; i--)
            sorted[i] = sorted[i - 1];
        sorted[i] = end;
    }
    if (n == 3)
        sorted[n] = BS_DRAFT_HYDROGEN;
    else
        n--;
    for (int i = 0; i < 4 && n == 3; i++) {
        if (sorted[i] != BS_DRAFT_HYDROGEN && s->file->atoms[sorted[i]].element == 1)
            highest = i;
    }
    if (highest < 0)
        highest = 3;
    around[0] = sorted[highest];
    n = 1;
    for (int i = 0; i < 4; i++) {
        if (i != highest)
            around[n++] = sorted[i];
    }
    return s->file->atoms[atom].parity;
}

static bs_status add_centre(stereo *s, uint32_t atom)
{
    bs_draft_stereo element = {.kind = BS_STEREO_TETRAHEDRAL, .centre = atom};
    uint32_t count = degree(s, atom);
    int perm = 0;
    int n = 0;

    if ((count != 3 && count != 4) || is_wavy(s, atom))
        return BS_OK;
    if (s->dimension == NO_PLACES) {
        perm = perm_of_parity(s, atom, element.around);
    } else {
        perm = s->dimension == FLAT ? perm_of_wedges(s, atom) : perm_of_places(s, atom);
        if (count == 3)
            element.around[n++] = BS_DRAFT_HYDROGEN;
        for (uint32_t k = 0; k < count; k++)
            element.around[n++] = other_end(bond_at(s, atom, k), atom);
    }
    element.perm = (uint8_t)perm;
    element.written = s->dimension == FLAT;
    return perm ? bs_draft_add_stereo(s->draft, element) : BS_OK;
}

/* ---- Double bonds -------------------------------------------------------------------------- */

/*
 * Walks from `from` through `at` along cumulated double bonds to their end; *before is the atom
 * before it. Returns the number of bonds behind `at`; *open tells of a crossed one among them.
 */
static uint32_t walk_chain(const stereo *s, uint32_t from, uint32_t at, uint32_t *before,
                           uint32_t *end, bool *open)
{
    uint32_t steps = 0;

    while (degree(s, at) == 2 && steps < s->file->bond_count) {
        const bs_molfile_bond *onward = bond_at(s, at, 0);

        if (other_end(onward, at) == from)
            onward = bond_at(s, at, 1);
        if (onward->type != 2)
            break;
        *open |= onward->mark == BS_MARK_EITHER;
        from = at;
        at = other_end(onward, at);
        steps++;
    }
    *before = from;
    *end = at;
    return steps;
}

/*
 * The neighbour of one end of a double bond (or of a chain of them) that shows its geometry, best
 * one far from its line. False if the end has none, or both on one side, or a wavy bond.
 */
static bool end_beside(const stereo *s, uint32_t end, uint32_t before, uint32_t *beside)
{
    bs_vector axis = bond_vector(s, end, before);
    double best = 0;
    uint32_t found[2];
    int count = 0;

    if (degree(s, end) < 2 || degree(s, end) > 3 || is_wavy(s, end))
        return false;
    for (uint32_t k = 0; k < degree(s, end); k++) {
        const bs_molfile_bond *b = bond_at(s, end, k);
        uint32_t atom = other_end(b, end);
        double sine;

        if (atom == before)
            continue;
        if (b->type == 2 || b->type == 3 || count == 2)
            return false;
        found[count++] = atom;
        sine = bs_hand__sine(axis, bond_vector(s, end, atom));
        if (sine > (best > 0 ? best + 0.2 : BS_HAND_CLEAR)) {
            best = sine;
            *beside = atom;
        }
    }
    /* Two on one side look cis if one of them is taken for a neighbour of the other end. */
    return best > 0 && (count < 2 || bs_hand__double(place(s, before), place(s, end),
                                                     place(s, found[0]), place(s, found[1])) != 1);
}

/* Reads the geometry of a double bond, or of the odd chain of which it is the middle. */
static bs_status add_double(stereo *s, const bs_molfile_bond *bond)
{
    bs_draft_stereo element = {.kind = BS_DRAFT_DOUBLE};
    bool open = bond->mark == BS_MARK_EITHER;
    uint32_t before[2];

    if (bond->type != 2 ||
        walk_chain(s, bond->b, bond->a, &before[0], &element.centre, &open) !=
            walk_chain(s, bond->a, bond->b, &before[1], &element.second, &open) ||
        open || !end_beside(s, element.centre, before[0], &element.around[0]) ||
        !end_beside(s, element.second, before[1], &element.around[1]))
        return BS_OK;
    element.perm =
        (uint8_t)bs_hand__double(place(s, element.centre), place(s, element.second),
                                 place(s, element.around[0]), place(s, element.around[1]));
    return element.perm ? bs_draft_add_stereo(s->draft, element) : BS_OK;
}

/* ---- Allenes ------------------------------------------------------------------------------- */

typedef struct allene_end {
    uint32_t atom;
    uint32_t beside[2]; /* BS_DRAFT_HYDROGEN for an implied one, which comes second */
    int wedge;          /* of the bond to the first, counted for the second if only that has one */
    uint32_t steps;
} allene_end;

/* Walks from the middle of a cumulene to one end; false if that is no end of an allene. */
static bool walk_to_end(const stereo *s, uint32_t middle, uint32_t k, allene_end *out)
{
    uint32_t before;
    bool open = bond_at(s, middle, k)->mark == BS_MARK_EITHER;
    int n = 0;

    *out = (allene_end){.beside = {BS_DRAFT_HYDROGEN, BS_DRAFT_HYDROGEN}};
    out->steps =
        walk_chain(s, middle, other_end(bond_at(s, middle, k), middle), &before, &out->atom, &open);
    if (open || degree(s, out->atom) < 2 || degree(s, out->atom) > 3 || is_wavy(s, out->atom))
        return false;
    for (uint32_t i = 0; i < degree(s, out->atom); i++) {
        const bs_molfile_bond *side = bond_at(s, out->atom, i);
        uint32_t atom = other_end(side, out->atom);

        if (atom == before)
            continue;
        if (n == 2)
            return false;
        if (wedge_at(side, out->atom) != 0 && out->wedge == 0)
            out->wedge = n == 0 ? wedge_at(side, out->atom) : -wedge_at(side, out->atom);
        out->beside[n++] = atom;
    }
    return true;
}

static int perm_of_allene(const stereo *s, const allene_end *a, const allene_end *b)
{
    bs_vector beside = place(s, a->beside[0]);

    if (s->dimension == SOLID)
        return bs_hand__solid_allene(place(s, a->atom), place(s, b->atom), beside,
                                     place(s, b->beside[0]));
    return b->wedge ? bs_hand__flat_allene(place(s, a->atom), place(s, b->atom), beside, b->wedge)
                    : 0;
}

static bs_status add_allene(stereo *s, uint32_t atom)
{
    bs_draft_stereo element = {.kind = BS_STEREO_ALLENE, .centre = atom};
    allene_end a;
    allene_end b;
    int perm;
    int back;

    if (degree(s, atom) != 2 || bond_at(s, atom, 0)->type != 2 || bond_at(s, atom, 1)->type != 2 ||
        !walk_to_end(s, atom, 0, &a) || !walk_to_end(s, atom, 1, &b) || a.steps != b.steps)
        return BS_OK;
    /* Either end may be the one that is drawn in the page; if both have wedges they must agree. */
    perm = perm_of_allene(s, &a, &b);
    back = perm_of_allene(s, &b, &a);
    if (perm == 0)
        perm = back;
    if (perm == 0 || (back != 0 && back != perm))
        return BS_OK;
    element.perm = (uint8_t)perm;
    memcpy(element.around, a.beside, sizeof a.beside);
    memcpy(element.around + 2, b.beside, sizeof b.beside);
    return bs_draft_add_stereo(s->draft, element);
}

/* ---- All together -------------------------------------------------------------------------- */

bs_status bs_molfile__add_stereo(const bs_molfile *file, bs_draft *draft)
{
    stereo s = {.file = file, .draft = draft, .dimension = dimension_of(file)};
    bs_status st = list_bonds(&s);

    for (uint32_t i = 0; i < file->atom_count && st == BS_OK; i++) {
        st = add_centre(&s, i);
        if (st == BS_OK && s.dimension != NO_PLACES)
            st = add_allene(&s, i);
    }
    for (uint32_t i = 0; i < file->bond_count && st == BS_OK && s.dimension != NO_PLACES; i++)
        st = add_double(&s, &file->bonds[i]);
    return st;
}
