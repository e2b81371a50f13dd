/*
 * The patterns of a drafted transform: the atoms that change, what lies around them, and how each
 * is written in the target and among the precursors.
 */
#include <stdio.h>
#include <string.h>

#include "rule/example.h"

enum { SMALL_RING = 7 };

/* ---- Surroundings ------------------------------------------------------------------------------
 */

/* Atoms up to `radius` bonds from those that change. */
static bs_status spread(const bs_example *ex, int radius, bool *chosen)
{
    const bs_example_side *side = &ex->product;
    bool *fresh;
    bs_status st = bs_new(ex->cx, ex->work, side->count + 1, &fresh);

    for (int i = 0; i < side->count; i++)
        chosen[i] = ex->changes[i];
    for (int step = 0; step < radius && st == BS_OK; step++) {
        memcpy(fresh, chosen, (size_t)side->count * sizeof *fresh);
        for (int i = 0; i < side->count; i++) {
            for (int k = side->start[i]; k < side->start[i + 1] && fresh[i]; k++)
                chosen[side->near[k]] = true;
        }
    }
    return st;
}

static bool is_multiple(int order)
{
    return order >= 2 && order <= 4;
}

/* The other end of a multiple bond belongs to it: carbonyl oxygen, the nitrogen of a nitrile. */
static void add_partners(const bs_example *ex, bool *chosen)
{
    const bs_example_side *side = &ex->product;

    for (int i = 0; i < side->count; i++) {
        for (int k = side->start[i]; k < side->start[i + 1] && chosen[i]; k++) {
            int other = side->near[k];

            if (is_multiple(bs_example__bond(side, i, other)) && side->atoms[other].element != 6)
                chosen[other] = true;
        }
    }
}

/* Whether a ring holds a bond that the reaction makes, or (of the reactants) breaks. */
static bool ring_reacts(const bs_example *ex, bool left, const uint32_t *ring, int size, int base)
{
    const bs_example_side *here = left ? &ex->reactants : &ex->product;
    const bs_example_side *there = left ? &ex->product : &ex->reactants;
    const int *twin = left ? ex->became : ex->image;

    for (int i = 0; i < size; i++) {
        int a = base + (int)ring[i], b = base + (int)ring[(i + 1) % size];
        int order = bs_example__bond(here, a, b);
        bool aromatic = order == BS_EXAMPLE_AROMATIC;

        if (twin[a] < 0 || twin[b] < 0)
            return true;
        if (!bs_example__bond(there, twin[a], twin[b]) ||
            aromatic != (bs_example__bond(there, twin[a], twin[b]) == BS_EXAMPLE_AROMATIC))
            return true;
    }
    return false;
}

/* Small rings that open or close are named whole, so that their size is part of the pattern. */
static void add_rings(const bs_example *ex, bool left, bool *chosen)
{
    const bs_example_side *side = left ? &ex->reactants : &ex->product;

    for (int i = 0; i < side->piece_count; i++) {
        for (int r = 0; r < bs_mol_ring_count(side->pieces[i]); r++) {
            const uint32_t *ring;
            int size = bs_mol_ring(side->pieces[i], r, &ring), base = side->first[i];

            if (size > SMALL_RING || !ring_reacts(ex, left, ring, size, base))
                continue;
            for (int k = 0; k < size; k++) {
                int p = left ? ex->became[base + (int)ring[k]] : base + (int)ring[k];

                if (p >= 0)
                    chosen[p] = true;
            }
        }
    }
}

bs_status bs_example__surround(const bs_example *ex, int radius, bool **chosen)
{
    bs_status st = bs_new(ex->cx, ex->work, ex->product.count + 1, chosen);

    if (st != BS_OK || (st = spread(ex, radius, *chosen)) != BS_OK)
        return st;
    if (radius > 0)
        add_partners(ex, *chosen);
    add_rings(ex, false, *chosen);
    add_rings(ex, true, *chosen);
    return BS_OK;
}

/* ---- Atoms -------------------------------------------------------------------------------------
 */

/* What the writing of one pair of patterns needs. */
typedef struct pencil {
    const bs_example *ex;
    const bs_example_detail *detail;
    int *maps; /* of each product atom: its number in the text */
} pencil;

/* Adds to the text behind the hand. The longest one fits with room to spare. */
static void add(bs_sketch_atom *out, const char *test, int value)
{
    size_t at = strlen(out->behind);

    snprintf(out->behind + at, sizeof out->behind - at, "%s%d", test, value);
}

/* The symbol, aromatic atoms in lower case. */
static void put_symbol(const bs_example_atom *a, char *out, size_t size)
{
    const char *symbol = bs_element_symbol(a->element);

    if (a->element == 1)
        symbol = "#1";
    if (a->isotope > 0)
        snprintf(out, size, "[%d%s", a->isotope, symbol ? symbol : "*");
    else
        snprintf(out, size, "[%s", symbol ? symbol : "*");
    for (char *c = out; a->aromatic && *c; c++) {
        if (*c >= 'A' && *c <= 'Z')
            *c = (char)(*c - 'A' + 'a');
    }
}

static void add_charge(bs_sketch_atom *out, int charge, bool always)
{
    if (charge < 0)
        add(out, ";-", -charge);
    else if (charge > 0 || always)
        add(out, ";+", charge);
}

/* The map number and the bracket; an atom of the organic subset without tests needs none. */
static void finish_atom(bs_sketch_atom *out, int map)
{
    static const char *const plain[] = {"[B",  "[C",  "[N", "[O", "[F", "[P", "[S",
                                        "[Cl", "[Br", "[I", "[c", "[n", "[o", "[s"};

    if (map > 0)
        add(out, ":", map);
    for (size_t i = 0; i < sizeof plain / sizeof *plain && out->behind[0] == '\0'; i++) {
        if (strcmp(out->before, plain[i]) == 0) {
            memmove(out->before, out->before + 1, strlen(out->before));
            return;
        }
    }
    strcat(out->behind, "]");
}

/* Neighbours and hydrogens. */
static int connections(const bs_example_side *side, int i)
{
    return side->start[i + 1] - side->start[i] + side->atoms[i].hydrogens;
}

static bool has_multiple(const bs_example_side *side, int i)
{
    for (int k = side->start[i]; k < side->start[i + 1]; k++) {
        if (is_multiple(bs_example__bond(side, i, side->near[k])))
            return true;
    }
    return false;
}

/* An atom beside the centre of which only the element matters. */
static bool is_plain(const bs_example *ex, int p)
{
    const bs_example_atom *a = &ex->product.atoms[p];

    return !ex->changes[p] && a->element == 6 && !a->aromatic && !has_multiple(&ex->product, p);
}

/* An atom of the product, with the tests that make it the one of the example. */
static void put_target_atom(const pencil *pen, int p, bs_sketch_atom *out)
{
    const bs_example *ex = pen->ex;
    const bs_example_side *side = &ex->product;
    const bs_example_atom *a = &side->atoms[p];
    const bs_example_atom *from = ex->image[p] >= 0 ? &ex->reactants.atoms[ex->image[p]] : a;
    int gained = a->hydrogens - from->hydrogens;

    if (is_plain(ex, p) && !pen->detail->exact)
        snprintf(out->before, sizeof out->before, "[#6");
    else
        put_symbol(a, out->before, sizeof out->before);
    if (pen->detail->exact || ex->image[p] < 0) {
        add(out, ";X", connections(side, p));
        add(out, ";H", a->hydrogens);
    } else if (ex->changes[p]) {
        if (!a->aromatic)
            add(out, ";X", connections(side, p));
        if (a->element != 6)
            add(out, ";H", a->hydrogens);
        else if (gained > 0)
            add(out, ";!H", 0);
    }
    add_charge(out, a->charge, from->charge != a->charge);
    finish_atom(out, ex->image[p] >= 0 ? pen->maps[p] : 0);
}

/* An atom of the precursors: one that persists, or one that leaves. */
static void put_source_atom(const pencil *pen, int r, bs_sketch_atom *out)
{
    const bs_example *ex = pen->ex;
    const bs_example_atom *a = &ex->reactants.atoms[r];
    int p = ex->became[r];
    const bs_example_atom *to = p >= 0 ? &ex->product.atoms[p] : a;
    bool ring_hetero = a->aromatic && a->element != 6;
    bool says_hydrogens =
        p < 0 ? pen->detail->exact || a->charge != 0 || ring_hetero
              : ex->changes[p] &&
                    (pen->detail->exact || (ring_hetero && a->hydrogens + to->hydrogens > 0));

    if (p >= 0 && is_plain(ex, p) && !pen->detail->exact)
        snprintf(out->before, sizeof out->before, "[#6");
    else
        put_symbol(a, out->before, sizeof out->before);
    if (says_hydrogens)
        add(out, ";H", a->hydrogens);
    add_charge(out, a->charge, to->charge != a->charge);
    finish_atom(out, p >= 0 ? pen->maps[p] : 0);
}

/* ---- Sketches ----------------------------------------------------------------------------------
 */

static bool is_firm(const bs_sketch_atom *a)
{
    char c = a->before[0] == '[' ? a->before[1] : a->before[0];

    return c >= 'A' && c <= 'Z';
}

/* A single bond need not be written beside an atom that is not aromatic for certain. */
static const char *bond_text(const bs_sketch_atom *a, const bs_sketch_atom *b, int order)
{
    static const char *const texts[] = {"", "-", "=", "#", "$", ":", "~"};

    return order == 1 && (is_firm(a) || is_firm(b)) ? "" : texts[order];
}

/* The hand of an atom, with its surroundings by their place in the sketch. */
static void put_hand(const bs_example_side *side, int i, const int *place, bs_sketch_atom *out)
{
    const bs_mol *mol = side->pieces[side->atoms[i].piece];
    int count = 0, degree = side->start[i + 1] - side->start[i];

    out->hand = bs_mol_atom_hand(mol, side->atoms[i].atom);
    if (out->hand == BS_HAND_NONE || degree < 3) {
        out->hand = BS_HAND_NONE;
        return;
    }
    if (degree == 3)
        out->around[count++] = BS_SKETCH_HYDROGEN;
    for (int k = side->start[i]; k < side->start[i + 1] && count < 4; k++)
        out->around[count++] = place[side->near[k]] >= 0 ? place[side->near[k]] : BS_SKETCH_OUTSIDE;
}

/* The bond of a sketch between two of its atoms, or -1. */
static int find_bond(const bs_sketch *sketch, int a, int b)
{
    for (int i = 0; i < sketch->bond_count; i++) {
        const bs_sketch_bond *bond = &sketch->bonds[i];

        if ((bond->a == a && bond->b == b) || (bond->a == b && bond->b == a))
            return i;
    }
    return -1;
}

/*
 * A single bond of the sketch at one end of a double bond. `*turned` tells that it is not the one
 * to the first neighbour, by which the molecule states its geometry.
 */
static int find_slope_bond(const bs_example_side *side, int end, int other, const int *place,
                           const bs_sketch *sketch, bool *turned)
{
    bool first = true;

    for (int k = side->start[end]; k < side->start[end + 1]; k++) {
        int next = side->near[k];

        if (next == other)
            continue;
        if (place[next] >= 0 && bs_example__bond(side, end, next) == 1) {
            *turned = !first;
            return find_bond(sketch, place[end], place[next]);
        }
        first = false;
    }
    return -1;
}

/* Adds the geometry of the double bond between atoms a and b, if the reaction touches one of them.
 */
static void put_slope(const bs_example *ex, bool left, int a, int b, const int *place,
                      bs_sketch *out)
{
    const bs_example_side *side = left ? &ex->reactants : &ex->product;
    int base = side->first[side->atoms[a].piece];
    const bs_mol *mol = side->pieces[side->atoms[a].piece];
    bs_geometry geometry = bs_mol_bond_geometry(mol, bs_mol_bond_between(mol, a - base, b - base));
    int p = left ? ex->became[a] : a, q = left ? ex->became[b] : b, x, y;
    bool turned_a = false, turned_b = false;

    if (geometry == BS_GEOMETRY_NONE || bs_example__bond(side, a, b) != 2 ||
        (p >= 0 && q >= 0 && !ex->changes[p] && !ex->changes[q]))
        return;
    x = find_slope_bond(side, a, b, place, out, &turned_a);
    y = find_slope_bond(side, b, a, place, out, &turned_b);
    if (x >= 0 && y >= 0)
        out->slopes[out->slope_count++] = (bs_sketch_slope){
            .x = x,
            .y = y,
            .a = place[a],
            .b = place[b],
            .trans = (geometry == BS_GEOMETRY_TRANS) != (turned_a != turned_b),
        };
}

/* Puts the atoms with `place` >= 0 and the bonds between them into a sketch. */
static bs_status make_sketch(const pencil *pen, bool left, const int *place, bs_sketch *out)
{
    const bs_example *ex = pen->ex;
    const bs_example_side *side = left ? &ex->reactants : &ex->product;
    bs_status st;

    if ((st = bs_new(ex->cx, ex->work, side->count + 1, &out->atoms)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, side->start[side->count] + 1, &out->slopes)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, side->start[side->count] + 1, &out->bonds)) != BS_OK)
        return st;
    for (int i = 0; i < side->count; i++) {
        bs_sketch_atom *atom = &out->atoms[place[i] >= 0 ? place[i] : 0];
        int p = left ? ex->became[i] : i;

        if (place[i] < 0)
            continue;
        out->atom_count++;
        if (left)
            put_source_atom(pen, i, atom);
        else
            put_target_atom(pen, i, atom);
        atom->part = left ? side->atoms[i].piece : 0;
        if (pen->detail->stereo && p >= 0 && ex->image[p] >= 0 && ex->changes[p])
            put_hand(side, i, place, atom);
    }
    for (int i = 0; i < side->count; i++) {
        for (int k = side->start[i]; k < side->start[i + 1]; k++) {
            int other = side->near[k];

            if (other < i || place[i] < 0 || place[other] < 0)
                continue;
            out->bonds[out->bond_count++] =
                (bs_sketch_bond){place[i], place[other],
                                 bond_text(&out->atoms[place[i]], &out->atoms[place[other]],
                                           bs_example__bond(side, i, other))};
        }
    }
    for (int i = 0; i < side->count && pen->detail->stereo; i++) {
        for (int k = side->start[i]; k < side->start[i + 1]; k++) {
            if (side->near[k] > i && place[i] >= 0 && place[side->near[k]] >= 0)
                put_slope(ex, left, i, side->near[k], place, out);
        }
    }
    return BS_OK;
}

bs_status bs_example__patterns(const bs_example *ex, const bs_example_detail *detail, char **target,
                               char **from)
{
    pencil pen = {.ex = ex, .detail = detail};
    bs_sketch right = {0}, left = {0};
    bool *chosen;
    int *place, *origin, count = 0, maps = 0;
    bs_status st;

    if ((st = bs_example__surround(ex, detail->radius, &chosen)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, ex->product.count + 1, &pen.maps)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, ex->product.count + 1, &place)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, ex->reactants.count + 1, &origin)) != BS_OK)
        return st;
    for (int i = 0; i < ex->product.count; i++) {
        place[i] = chosen[i] ? count++ : -1;
        pen.maps[i] = chosen[i] && ex->image[i] >= 0 ? ++maps : 0;
    }
    count = 0;
    for (int i = 0; i < ex->reactants.count; i++)
        origin[i] = ex->became[i] < 0 || chosen[ex->became[i]] ? count++ : -1;
    if ((st = make_sketch(&pen, false, place, &right)) != BS_OK ||
        (st = make_sketch(&pen, true, origin, &left)) != BS_OK ||
        (st = bs_sketch__write(ex->cx, ex->work, &right, target)) != BS_OK)
        return st;
    return bs_sketch__write(ex->cx, ex->work, &left, from);
}
