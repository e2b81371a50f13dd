/*
 * Stereo marks of a SMILES as elements of the draft.
 *
 * Each bond knows where it is named beside either of its ends, so the order of the neighbours of an
 * atom in the text is the order of those places: the atom before it (place 0), ring digits,
 * branches. An implied hydrogen follows the atom before. A lone pair does so too, and where the
 * centre leads the string it follows the first neighbour; the references agree on that.
 */
#include "format/smiles_read.h"

/* Bonds around each draft atom. */
typedef struct around {
    smiles_reader *r;
    uint32_t *offsets;
    uint32_t *bonds;
} around;

static bs_status gather(around *a)
{
    const bs_draft *d = &a->r->draft;
    bs_arena *scratch = &a->r->cx->scratch;
    uint32_t *fill;
    bs_status st;

    if ((st = bs_new(a->r->cx, scratch, d->atom_count + 1, &a->offsets)) != BS_OK ||
        (st = bs_new(a->r->cx, scratch, d->atom_count, &fill)) != BS_OK ||
        (st = bs_new(a->r->cx, scratch, 2 * (size_t)d->bond_count, &a->bonds)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < d->bond_count; i++) {
        a->offsets[d->bonds[i].a + 1]++;
        a->offsets[d->bonds[i].b + 1]++;
    }
    for (uint32_t i = 0; i < d->atom_count; i++)
        a->offsets[i + 1] += a->offsets[i];
    for (uint32_t i = 0; i < d->bond_count; i++) {
        uint32_t x = d->bonds[i].a;
        uint32_t y = d->bonds[i].b;

        a->bonds[a->offsets[x] + fill[x]++] = i;
        a->bonds[a->offsets[y] + fill[y]++] = i;
    }
    return BS_OK;
}

static uint32_t place_at(const around *a, uint32_t bond, uint32_t atom)
{
    const smiles_bond *b = &a->r->bonds[bond];

    return a->r->draft.bonds[bond].a == atom ? b->place_a : b->place_b;
}

static uint32_t other_end(const around *a, uint32_t bond, uint32_t atom)
{
    const bs_draft_bond *b = &a->r->draft.bonds[bond];

    return b->a == atom ? b->b : b->a;
}

static uint32_t degree(const around *a, uint32_t atom)
{
    return a->offsets[atom + 1] - a->offsets[atom];
}

/*
 * The neighbours of an atom in the order of the text, at most `most`, an implied hydrogen or lone
 * pair among them if one place is missing. `skip` is left out (UINT32_MAX for none). Returns their
 * number, 0 if there are too many or too few.
 */
static int in_text_order(const around *a, uint32_t atom, uint32_t skip, int most, uint32_t *out)
{
    uint32_t places[6];
    int count = 0;
    bool follows = false;
    int16_t hydrogens = a->r->draft.atoms[atom].hydrogens;
    int where;

    for (uint32_t k = a->offsets[atom]; k < a->offsets[atom + 1]; k++) {
        uint32_t bond = a->bonds[k];
        uint32_t place = place_at(a, bond, atom);
        int i = count;

        if (other_end(a, bond, atom) == skip)
            continue;
        if (count == most)
            return 0;
        for (; i > 0 && places[i - 1] > place; i--) {
            places[i] = places[i - 1];
            out[i] = out[i - 1];
        }
        places[i] = place;
        out[i] = other_end(a, bond, atom);
        follows |= place == 0;
        count++;
    }
    if (count == most)
        return most;
    if (count < most - 1 || count == 0)
        return 0;
    where = follows || hydrogens == 0 ? 1 : 0;
    for (int i = count; i > where; i--)
        out[i] = out[i - 1];
    out[where] = BS_DRAFT_HYDROGEN;
    return most;
}

/* ---- Centres -------------------------------------------------------------------------------- */

/* Follows cumulated double bonds from `from` through `at`; *before is the last atom but one. */
static uint32_t walk_chain(const around *a, uint32_t from, uint32_t at, uint32_t *before,
                           uint32_t *end)
{
    const bs_draft *d = &a->r->draft;
    uint32_t steps = 1;

    for (;;) {
        uint32_t onward;

        *before = from;
        *end = at;
        if (degree(a, at) != 2 || steps > d->bond_count)
            return steps;
        onward = a->bonds[a->offsets[at]];
        if (other_end(a, onward, at) == from)
            onward = a->bonds[a->offsets[at] + 1];
        if (d->bonds[onward].order != 2)
            return steps;
        from = at;
        at = other_end(a, onward, at);
        steps++;
    }
}

/* One end of an allene: its two neighbours in the order of the text. */
static bool allene_end(const around *a, uint32_t centre, uint32_t next, uint32_t *out)
{
    uint32_t before;
    uint32_t end;

    walk_chain(a, centre, next, &before, &end);
    return in_text_order(a, end, before, 2, out) == 2;
}

static bool fill_allene(const around *a, uint32_t atom, uint32_t *out)
{
    uint32_t first = a->bonds[a->offsets[atom]];
    uint32_t second = a->bonds[a->offsets[atom] + 1];

    if (place_at(a, first, atom) > place_at(a, second, atom)) {
        uint32_t swap = first;

        first = second;
        second = swap;
    }
    return allene_end(a, atom, other_end(a, first, atom), out) &&
           allene_end(a, atom, other_end(a, second, atom), out + 2);
}

static bs_status add_centre(around *a, uint32_t atom)
{
    static const uint8_t sizes[] = {0, 4, 4, 4, 5, 6};
    bs_draft_stereo element = {.centre = atom, .written = true};
    int kind = a->r->atoms[atom].kind;
    bool fits;

    if (kind == SMILES_BARE_MARK) {
        uint32_t bonds = degree(a, atom);

        kind = bonds == 2   ? BS_STEREO_ALLENE
               : bonds == 5 ? BS_STEREO_TRIGONAL_BIPYRAMID
               : bonds == 6 ? BS_STEREO_OCTAHEDRON
                            : BS_STEREO_TETRAHEDRAL;
    }
    element.kind = (uint8_t)kind;
    element.perm = a->r->atoms[atom].perm;
    if (kind == BS_STEREO_ALLENE)
        fits = degree(a, atom) == 2 && fill_allene(a, atom, element.around);
    else
        fits = in_text_order(a, atom, UINT32_MAX, sizes[kind], element.around) > 0;
    if (!fits)
        element.perm = 0;
    return bs_draft_add_stereo(&a->r->draft, element);
}

/* ---- Double bonds ---------------------------------------------------------------------------- */

/* What the marks beside one end of a double bond say. */
typedef struct marks {
    uint32_t named; /* a marked neighbour, or UINT32_MAX if there is no mark */
    bool below;     /* whether it stands below the end */
    bool torn;      /* both neighbours are on the same side */
} marks;

static marks read_marks(const around *a, uint32_t end)
{
    const bs_draft *d = &a->r->draft;
    marks m = {.named = UINT32_MAX};

    for (uint32_t k = a->offsets[end]; k < a->offsets[end + 1]; k++) {
        uint32_t bond = a->bonds[k];
        char mark = a->r->bonds[bond].mark;
        bool below = (mark == '/') == (d->bonds[bond].b == end);

        if (mark == 0)
            continue;
        if (m.named != UINT32_MAX) {
            m.torn |= below == m.below;
            continue;
        }
        m.named = other_end(a, bond, end);
        m.below = below;
    }
    return m;
}

static int double_bonds(const around *a, uint32_t atom)
{
    int count = 0;

    for (uint32_t k = a->offsets[atom]; k < a->offsets[atom + 1]; k++)
        count += a->r->draft.bonds[a->bonds[k]].order == 2;
    return count;
}

/* The geometry of the double bond, or of the cumulene with an odd number of them, from `end`. */
static bs_status add_geometry(around *a, uint32_t end, uint32_t next)
{
    uint32_t before;
    uint32_t far;
    marks near;
    marks distant;

    if (double_bonds(a, end) != 1 || walk_chain(a, end, next, &before, &far) % 2 == 0 || far < end)
        return BS_OK;
    near = read_marks(a, end);
    distant = read_marks(a, far);
    /* Marks at one end only belong to other double bonds, as in dibenzylideneacetone. */
    if (near.named == UINT32_MAX || distant.named == UINT32_MAX)
        return BS_OK;
    if (near.torn || distant.torn)
        return bs_fail_at(a->r->cx, BS_EVALUE, a->r->atoms[near.torn ? end : far].at,
                          "both neighbours of this atom are marked on one side of its double bond");
    return bs_draft_add_stereo(&a->r->draft,
                               (bs_draft_stereo){.kind = BS_DRAFT_DOUBLE,
                                                 .perm = near.below == distant.below ? 1 : 2,
                                                 .centre = end,
                                                 .second = far,
                                                 .around = {near.named, distant.named},
                                                 .written = true});
}

bs_status smiles_read_stereo(smiles_reader *r)
{
    around a = {.r = r};
    bs_status st = BS_OK;

    if (!r->has_marks && !r->has_slants)
        return BS_OK;
    if ((st = gather(&a)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < r->draft.atom_count && st == BS_OK && r->has_marks; i++) {
        if (r->atoms[i].kind != BS_STEREO_NONE)
            st = add_centre(&a, i);
    }
    for (uint32_t i = 0; i < r->draft.bond_count && st == BS_OK && r->has_slants; i++) {
        const bs_draft_bond *b = &r->draft.bonds[i];

        if (b->order != 2)
            continue;
        if ((st = add_geometry(&a, b->a, b->b)) == BS_OK)
            st = add_geometry(&a, b->b, b->a);
    }
    return st;
}
