/* Comparing the two sides of a rewriting: which atoms, bonds and marks change. */
#include "rule/reading.h"

#include <string.h>

#include "backsaw/draft.h"

static bs_status pair_atoms(bs_ctx *cx, bs_arena *home, bs_reading *r)
{
    bs_status st;

    if ((st = bs_new(cx, home, r->to->atom_count + 1, &r->to_slot)) != BS_OK ||
        (st = bs_new(cx, home, r->from->atom_count + 1, &r->from_to)) != BS_OK ||
        (st = bs_new(cx, home, r->from->atom_count + 1, &r->active)) != BS_OK)
        return st;
    r->slot_count = r->from->atom_count;
    for (int i = 0; i < r->from->atom_count; i++)
        r->from_to[i] = bs_side__find(r->to, r->from->atoms[i].map);
    for (int i = 0; i < r->to->atom_count; i++) {
        int twin = bs_side__find(r->from, r->to->atoms[i].map);

        r->to_slot[i] = twin >= 0 ? twin : r->slot_count++;
    }
    return BS_OK;
}

/* The new value, or BS_UNSAID if the other side says the same or this one nothing. */
static int changed(int from, int to)
{
    return from == to ? BS_UNSAID : to;
}

/* What the tests of H or X say about the hydrogens of an atom with two bonds. */
static int hydrogen_hint(const bs_facts *says)
{
    if (says->hydrogens != BS_UNSAID)
        return says->hydrogens;
    return says->connections == 2 || says->connections == 3 ? says->connections - 2 : BS_UNSAID;
}

static bs_atom_edit persisting_edit(const bs_reading *r, int slot, int to_atom, bool reverse)
{
    const bs_facts *a = &r->from->atoms[slot].says;
    const bs_facts *b = &r->to->atoms[to_atom].says;
    bs_atom_edit edit = {.slot = slot};

    edit.element = changed(a->element, b->element);
    edit.aromatic = changed(a->aromatic, b->aromatic);
    edit.charge = changed(a->charge, b->charge);
    edit.isotope = changed(a->isotope, b->isotope);
    edit.hydrogens = reverse ? BS_UNSAID : b->hydrogens;
    edit.hydrogen_hint = hydrogen_hint(b);
    edit.stays_aromatic = a->aromatic == 1 && b->aromatic == 1;
    if (reverse) {
        /* What the one side set, the other unsets. */
        if (b->charge == BS_UNSAID && a->charge != BS_UNSAID && a->charge != 0)
            edit.charge = 0;
        if (b->isotope == BS_UNSAID && a->isotope != BS_UNSAID && a->isotope != 0)
            edit.isotope = 0;
        edit.recount = edit.stays_aromatic && a->hydrogens != BS_UNSAID &&
                       a->hydrogens != b->hydrogens;
    }
    return edit;
}

static bs_atom_edit created_edit(const bs_reading *r, int to_atom)
{
    const bs_facts *b = &r->to->atoms[to_atom].says;
    bs_atom_edit edit = {.slot = r->to_slot[to_atom], .created = true};

    edit.element = b->element;
    edit.aromatic = b->aromatic == 1;
    edit.charge = b->charge == BS_UNSAID ? 0 : b->charge;
    edit.isotope = b->isotope == BS_UNSAID ? 0 : b->isotope;
    edit.hydrogens = b->hydrogens;
    edit.hydrogen_hint = hydrogen_hint(b);
    return edit;
}

static bool says_nothing(const bs_atom_edit *edit)
{
    return !edit->created && edit->element == BS_UNSAID && edit->charge == BS_UNSAID &&
           edit->hydrogens == BS_UNSAID && edit->isotope == BS_UNSAID &&
           edit->aromatic == BS_UNSAID && !edit->recount;
}

/* Whether an edit can change an atom that passes the tests of `from`. */
static bool changes(const bs_reading *r, const bs_atom_edit *edit)
{
    bs_atom_edit other = *edit;

    if (edit->hydrogens == r->from->atoms[edit->slot].says.hydrogens)
        other.hydrogens = BS_UNSAID;
    return !says_nothing(&other);
}

static bs_status edit_atoms(bs_ctx *cx, bs_arena *home, bs_reading *r, bool reverse)
{
    bs_status st = bs_new(cx, home, r->to->atom_count + 1, &r->atoms);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < r->to->atom_count; i++) {
        int slot = r->to_slot[i];
        bs_atom_edit edit =
            slot < r->from->atom_count ? persisting_edit(r, slot, i, reverse) : created_edit(r, i);

        if (edit.created && (edit.element == BS_UNSAID || edit.element > 118))
            return bs_fail_at(cx, BS_EVALUE, r->to->query->atoms[i].offset,
                              "this atom has to be made, so it must name one element");
        if (!edit.created && changes(r, &edit))
            r->active[slot] = true;
        if (!says_nothing(&edit) || edit.hydrogen_hint != BS_UNSAID || edit.stays_aromatic)
            r->atoms[r->atom_edits++] = edit;
    }
    for (int i = 0; i < r->from->atom_count; i++)
        r->active[i] = r->active[i] || r->from_to[i] < 0;
    return BS_OK;
}

static bool says_aromatic(const bs_side *side, const bs_side_bond *bond, int value)
{
    return side->atoms[bond->a].says.aromatic == value &&
           side->atoms[bond->b].says.aromatic == value;
}

/* Whether one end is written as aliphatic, so that the bond cannot be aromatic. */
static bool is_aliphatic(const bs_side *side, const bs_side_bond *bond)
{
    return side->atoms[bond->a].says.aromatic == 0 || side->atoms[bond->b].says.aromatic == 0;
}

/*
 * The order that a bond of `to` gives, BS_UNSAID if it leaves the bond as it is. `f` is the bond
 * of `from` between the same atoms, or NULL.
 */
static int bond_order(const bs_reading *r, const bs_side_bond *t, const bs_side_bond *f)
{
    int written = t->says.order;
    bool ring = t->in_ring && says_aromatic(r->to, t, 1);

    /* A bond of which only the ring is asked, beside a multiple one: a single bond. */
    if (written == BS_UNSAID && f && t->says.ring != BS_UNSAID && f->says.order > 1 &&
        f->says.order <= 4)
        return 1;
    if (written == BS_UNSAID)
        return f ? BS_UNSAID : 1;
    if (written != BS_ORDER_DEFAULT)
        return f && f->says.order == written ? BS_UNSAID : written;
    if (!f)
        return ring ? BS_DRAFT_ORDER_AROMATIC : 1;
    if (ring) {
        bool was = f->says.order == BS_DRAFT_ORDER_AROMATIC || says_aromatic(r->from, f, 1);

        return was ? BS_UNSAID : BS_DRAFT_ORDER_AROMATIC;
    }
    if (f->says.order == 2 || f->says.order == 3 || f->says.order == 4)
        return 1;
    if (f->says.order == BS_DRAFT_ORDER_AROMATIC || says_aromatic(r->from, f, 1))
        return is_aliphatic(r->to, t) ? 1 : BS_UNSAID;
    return BS_UNSAID;
}

static void add_bond_edit(bs_reading *r, int x, int y, int order)
{
    r->bonds[r->bond_edits++] = (bs_bond_edit){x, y, order};
    if (x < r->from->atom_count)
        r->active[x] = true;
    if (y < r->from->atom_count)
        r->active[y] = true;
}

static bs_status edit_bonds(bs_ctx *cx, bs_arena *home, bs_reading *r)
{
    bs_status st = bs_new(cx, home, r->to->bond_count + r->from->bond_count + 1, &r->bonds);
    int persisting = r->from->atom_count;

    if (st != BS_OK)
        return st;
    for (int i = 0; i < r->from->bond_count; i++) {
        const bs_side_bond *f = &r->from->bonds[i];
        int a = r->from_to[f->a], b = r->from_to[f->b];

        if (a >= 0 && b >= 0 && !bs_side__bond(r->to, a, b))
            add_bond_edit(r, f->a, f->b, 0);
        else if ((a >= 0) != (b >= 0))
            r->active[f->a] = r->active[f->b] = true;
    }
    for (int i = 0; i < r->to->bond_count; i++) {
        const bs_side_bond *t = &r->to->bonds[i];
        int x = r->to_slot[t->a], y = r->to_slot[t->b];
        const bs_side_bond *f = NULL;
        int order;

        if (x < persisting && y < persisting)
            f = bs_side__bond(r->from, x, y);
        order = bond_order(r, t, f);
        if (order != BS_UNSAID)
            add_bond_edit(r, x, y, order);
    }
    return BS_OK;
}

/* Where the neighbours of a centre stand in `around` of `to`, in slots. */
static void around_in_slots(const bs_reading *r, const bs_side_atom *atom, int out[4])
{
    for (int i = 0; i < 4; i++)
        out[i] = atom->around[i] == BS_SIDE_REST ? BS_SIDE_REST : r->to_slot[atom->around[i]];
}

static int place_in(const int around[4], int slot)
{
    for (int i = 0; i < 4; i++) {
        if (around[i] == slot)
            return i;
    }
    return -1;
}

/* Whether the order of four places is an odd number of exchanges away from 0 1 2 3. */
static bool is_odd(const int places[4])
{
    bool odd = false;

    for (int i = 0; i < 4; i++) {
        for (int k = i + 1; k < 4; k++)
            odd ^= places[i] > places[k];
    }
    return odd;
}

/*
 * Compares a centre that is marked on both sides. A neighbour that goes and the one that comes
 * count as one; where more than one is exchanged, nothing can be said.
 */
static bs_hand_way compare_hands(const bs_reading *r, int slot, int to_atom)
{
    const bs_side_atom *a = &r->from->atoms[slot];
    const bs_side_atom *b = &r->to->atoms[to_atom];
    int before[4], after[4], places[4];
    int missing = -1, free_place = 6; /* 0 + 1 + 2 + 3 */

    memcpy(before, a->around, sizeof before);
    around_in_slots(r, b, after);
    for (int i = 0; i < 4; i++) {
        places[i] = place_in(before, after[i]);
        if (places[i] >= 0) {
            free_place -= places[i];
        } else if (missing >= 0) {
            return BS_HAND_LOSE;
        } else {
            missing = i;
        }
    }
    if (missing >= 0)
        places[missing] = free_place;
    return is_odd(places) != (a->says.mark != b->says.mark) ? BS_HAND_TURN : BS_HAND_KEEP;
}

static bool is_marked(const bs_side_atom *atom)
{
    return atom->says.mark == 1 || atom->says.mark == 2;
}

static void add_hand_edit(bs_reading *r, int slot, int to_atom)
{
    const bs_side_atom *to = &r->to->atoms[to_atom];
    const bs_side_atom *from = slot < r->from->atom_count ? &r->from->atoms[slot] : NULL;
    bs_hand_edit edit = {.slot = slot, .way = BS_HAND_KEEP};

    if (from && is_marked(from) && is_marked(to)) {
        edit.way = compare_hands(r, slot, to_atom);
    } else if (from && is_marked(from)) {
        edit.way = BS_HAND_LOSE;
    } else if (is_marked(to)) {
        edit.way = BS_HAND_MAKE;
        edit.mark = to->says.mark;
        around_in_slots(r, to, edit.around);
    }
    if (edit.way == BS_HAND_KEEP)
        return;
    r->hands[r->hand_edits++] = edit;
    if (from)
        r->active[slot] = true;
    for (int i = 0; i < 4 && edit.way == BS_HAND_MAKE; i++) {
        if (edit.around[i] >= 0 && edit.around[i] < r->from->atom_count)
            r->active[edit.around[i]] = true;
    }
}

static bs_status edit_hands(bs_ctx *cx, bs_arena *home, bs_reading *r)
{
    bs_status st = bs_new(cx, home, r->to->atom_count + 1, &r->hands);

    for (int i = 0; i < r->to->atom_count && st == BS_OK; i++)
        add_hand_edit(r, r->to_slot[i], i);
    return st;
}

/*
 * The neighbour of `end` (not `other`) whose bond is written with a slope, or -1; `slope` is that
 * of the bond read towards the double bond if `inward`, else away from it.
 */
static int sloped_neighbour(const bs_side *side, int end, int other, bool inward, int *slope)
{
    for (int i = 0; i < side->bond_count; i++) {
        const bs_side_bond *bond = &side->bonds[i];
        int neighbour = bond->a == end ? bond->b : bond->a;

        if (bond->says.slope == BS_UNSAID || (bond->a != end && bond->b != end) ||
            neighbour == other)
            continue;
        *slope = (bond->a == end) == inward ? -bond->says.slope : bond->says.slope;
        return neighbour;
    }
    return -1;
}

/* The geometry that a side writes for a double bond: 0 none, 1 cis, 2 trans for *ra and *rb. */
static int written_geometry(const bs_side *side, const bs_side_bond *bond, int *ra, int *rb)
{
    int sa = 0, sb = 0;

    if (bond->says.order != 2)
        return 0;
    *ra = sloped_neighbour(side, bond->a, bond->b, true, &sa);
    *rb = sloped_neighbour(side, bond->b, bond->a, false, &sb);
    if (*ra < 0 || *rb < 0)
        return 0;
    return sa == sb ? 2 : 1;
}

static void activate(bs_reading *r, int slot)
{
    if (slot < r->from->atom_count)
        r->active[slot] = true;
}

static bs_status edit_slopes(bs_ctx *cx, bs_arena *home, bs_reading *r)
{
    bs_status st = bs_new(cx, home, r->to->bond_count + 1, &r->slopes);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < r->to->bond_count; i++) {
        const bs_side_bond *t = &r->to->bonds[i];
        int x = r->to_slot[t->a], y = r->to_slot[t->b];
        const bs_side_bond *f = NULL;
        bs_slope_edit edit = {.x = x, .y = y};
        int ra = -1, rb = -1;

        if (x < r->from->atom_count && y < r->from->atom_count)
            f = bs_side__bond(r->from, x, y);
        edit.perm = written_geometry(r->to, t, &ra, &rb);
        if (edit.perm == 0 && (!f || !written_geometry(r->from, f, &ra, &rb)))
            continue;
        if (edit.perm != 0) {
            edit.rx = r->to_slot[ra];
            edit.ry = r->to_slot[rb];
            activate(r, edit.rx);
            activate(r, edit.ry);
        }
        activate(r, x);
        activate(r, y);
        r->slopes[r->slope_edits++] = edit;
    }
    return BS_OK;
}

bs_status bs_reading__make(bs_ctx *cx, bs_arena *home, const bs_side *from, const bs_side *to,
                           bool reverse, bs_reading *out)
{
    bs_status st;

    *out = (bs_reading){.from = from, .to = to};
    if ((st = pair_atoms(cx, home, out)) != BS_OK ||
        (st = edit_atoms(cx, home, out, reverse)) != BS_OK ||
        (st = edit_bonds(cx, home, out)) != BS_OK || (st = edit_hands(cx, home, out)) != BS_OK)
        return st;
    return edit_slopes(cx, home, out);
}
