/*
 * Which atom of the reactants became which atom of the product.
 *
 * Branch and bound over assignments, atom after atom of the product along its bonds, from several
 * first atoms. The price of an assignment is its chemical distance: orders of bonds made and broken
 * and hydrogens moved (Jochum, Gasteiger and Ugi 1980, from memory); bonds between carbon atoms
 * count for more, and an atom without origin for much more. Steps are bounded, so the best mapping
 * found stands for the best one.
 */
#include <string.h>

#include "rule/example.h"

enum {
    NOT_YET = -2,
    DEEPEST = 7, /* shells of atoms that are compared */
    STARTS = 8,
    STEPS_EACH = 1500,
    STEPS_LAST = 20000,
    PRICE_CARBON = 60, /* of an atom without origin */
    PRICE_OTHER = 14
};

typedef struct seeker {
    const bs_example_side *p, *r;
    int *image, *became, *best;
    int *fixed;        /* of each product atom: the origin that its atom class tells, or -1 */
    int *bound;        /* of each product atom: the least price */
    int *local;        /* p.count * r.count: half the price of the bonds around, and of hydrogens */
    uint8_t *alike;    /* p.count * r.count: shells that are equal */
    int *kind;         /* of each reactant atom: equal ones are the same by symmetry */
    int *touched;      /* of each reactant piece: its atoms in use */
    int *order, *rest; /* of depths: the product atom, and the least price from there on */
    int *choices, *choice_count, *next, *price;
    long *keys;
    int best_price;
    long steps;
    bool labelled; /* atom classes break the symmetry */
} seeker;

/* ---- Prices ------------------------------------------------------------------------------------
 */

static int weight(int order)
{
    static const int weights[] = {0, 4, 8, 12, 16, 6, 2};

    return weights[order];
}

static int bond_price(const bs_example_atom *a, const bs_example_atom *b, int before, int after)
{
    int price = weight(before) - weight(after);

    if (price < 0)
        price = -price;
    if ((before == 0) != (after == 0))
        price += a->element == 6 && b->element == 6 ? 4 : 1;
    return price;
}

static int atom_price(const bs_example_atom *a, const bs_example_atom *b)
{
    int h = a->hydrogens - b->hydrogens, q = a->charge - b->charge;

    return 2 * (h < 0 ? -h : h) + 2 * (q < 0 ? -q : q) + (a->isotope != b->isotope ? 8 : 0);
}

static int missing_price(const bs_example_atom *a)
{
    return a->element == 6 ? PRICE_CARBON : PRICE_OTHER;
}

/* Half of what the bonds to each element must change by: no assignment of the neighbours is
 * cheaper. */
static int around_price(const seeker *s, int p, int r)
{
    int sums[120] = {0}, price = 0;

    for (int k = s->p->start[p]; k < s->p->start[p + 1]; k++)
        sums[s->p->atoms[s->p->near[k]].element] +=
            weight(bs_example__bond(s->p, p, s->p->near[k]));
    for (int k = s->r->start[r]; k < s->r->start[r + 1]; k++)
        sums[s->r->atoms[s->r->near[k]].element] -=
            weight(bs_example__bond(s->r, r, s->r->near[k]));
    for (int i = 0; i < 120; i++)
        price += sums[i] < 0 ? -sums[i] : sums[i];
    return price / 2;
}

/* What it costs more that product atom p came from reactant atom r, beside what is settled. */
static int added_price(const seeker *s, int p, int r)
{
    int price =
        r < 0 ? missing_price(&s->p->atoms[p]) : atom_price(&s->p->atoms[p], &s->r->atoms[r]);

    for (int k = s->p->start[p]; k < s->p->start[p + 1]; k++) {
        int q = s->p->near[k], from = s->image[q];

        if (from == NOT_YET)
            continue;
        price += bond_price(&s->p->atoms[p], &s->p->atoms[q],
                            r < 0 || from < 0 ? 0 : bs_example__bond(s->r, r, from),
                            bs_example__bond(s->p, p, q));
    }
    for (int k = r < 0 ? 0 : s->r->start[r]; r >= 0 && k < s->r->start[r + 1]; k++) {
        int other = s->r->near[k], q = s->became[other];

        if (q >= 0 && !bs_example__bond(s->p, p, q))
            price += bond_price(&s->r->atoms[r], &s->r->atoms[other],
                                bs_example__bond(s->r, r, other), 0);
    }
    return price;
}

/*
 * Which bond of carbon to a heteroatom breaks more readily, to decide between equals: that of an
 * acyl group, then that of an alkyl group, then that of an arene or alkene.
 */
static int break_price(const bs_example_side *r, int carbon, int hetero)
{
    bool flat = false;

    if (r->atoms[carbon].element != 6 || r->atoms[hetero].element == 6)
        return 0;
    for (int k = r->start[carbon]; k < r->start[carbon + 1]; k++) {
        int order = bs_example__bond(r, carbon, r->near[k]);

        if (order == 2 && r->atoms[r->near[k]].element != 6)
            return 0;
        flat = flat || order != 1;
    }
    return flat ? 2 : 1;
}

/* An atom that moves a hydrogen while its bonds stay, as an azole does; to decide between equals.
 */
static int proton_price(const seeker *s)
{
    int price = 0;

    for (int p = 0; p < s->p->count; p++) {
        int r = s->image[p];

        if (r >= 0 && s->p->atoms[p].aromatic && s->r->atoms[r].aromatic &&
            s->p->atoms[p].hydrogens != s->r->atoms[r].hydrogens &&
            s->p->start[p + 1] - s->p->start[p] == s->r->start[r + 1] - s->r->start[r])
            price++;
    }
    return price;
}

/* Bonds to what leaves. */
static int leaving_price(const seeker *s)
{
    int price = 0;

    for (int i = 0; i < s->r->count; i++) {
        for (int k = s->r->start[i]; k < s->r->start[i + 1] && s->became[i] >= 0; k++) {
            int other = s->r->near[k];

            if (s->became[other] < 0)
                price += bond_price(&s->r->atoms[i], &s->r->atoms[other],
                                    bs_example__bond(s->r, i, other), 0) +
                         break_price(s->r, i, other) + break_price(s->r, other, i);
        }
    }
    return price;
}

/* ---- Likeness ----------------------------------------------------------------------------------
 */

static uint64_t mix(uint64_t a, uint64_t b)
{
    a ^= b + 0x9e3779b97f4a7c15U + (a << 6) + (a >> 2);
    return a * 0xff51afd7ed558ccdU;
}

/* Numbers for the shells around each atom: shells[k * count + i]; equal shells have equal numbers.
 */
static bs_status find_shells(bs_ctx *cx, const bs_example_side *side, uint64_t **out)
{
    bs_status st = bs_new(cx, &cx->scratch, side->count * DEEPEST + 1, out);
    uint64_t *shells = *out;

    for (int i = 0; i < side->count && st == BS_OK; i++) {
        const bs_example_atom *a = &side->atoms[i];

        shells[i] = mix(mix((uint64_t)a->element, a->aromatic), (uint64_t)a->charge + 16);
    }
    for (int k = 1; k < DEEPEST && st == BS_OK; k++) {
        const uint64_t *last = shells + (size_t)(k - 1) * (size_t)side->count;

        for (int i = 0; i < side->count; i++) {
            uint64_t sum = 0;

            for (int n = side->start[i]; n < side->start[i + 1]; n++)
                sum += mix(last[side->near[n]], side->order[i * side->count + side->near[n]]);
            shells[k * side->count + i] = mix(last[i], sum);
        }
    }
    return st;
}

static bs_status compare_atoms(bs_ctx *cx, seeker *s)
{
    uint64_t *ours, *theirs;
    bs_status st;

    if ((st = find_shells(cx, s->p, &ours)) != BS_OK ||
        (st = find_shells(cx, s->r, &theirs)) != BS_OK)
        return st;
    for (int p = 0; p < s->p->count; p++) {
        s->bound[p] = missing_price(&s->p->atoms[p]);
        for (int r = 0; r < s->r->count; r++) {
            int at = p * s->r->count + r, k = 0;

            if (s->p->atoms[p].element != s->r->atoms[r].element)
                continue;
            while (k < DEEPEST && ours[k * s->p->count + p] == theirs[k * s->r->count + r])
                k++;
            s->alike[at] = (uint8_t)k;
            s->local[at] = around_price(s, p, r) + atom_price(&s->p->atoms[p], &s->r->atoms[r]);
            if (s->local[at] < s->bound[p])
                s->bound[p] = s->local[at];
        }
    }
    return BS_OK;
}

/* Atoms that are alike by symmetry, or the same atom of equal pieces, get one number. */
static bs_status find_kinds(bs_example *ex, seeker *s)
{
    const bs_example_side *r = s->r;
    int *classes;
    bs_status st;

    for (int i = 0; i < r->piece_count; i++) {
        if ((st = bs_mol_symmetry(ex->cx, &ex->cx->scratch, r->pieces[i], &classes)) != BS_OK)
            return st;
        for (int k = 0; k < bs_mol_atom_count(r->pieces[i]); k++)
            s->kind[r->first[i] + k] = i * (BS_EXAMPLE_ATOMS + 1) + classes[k];
    }
    return BS_OK;
}

/* ---- The search --------------------------------------------------------------------------------
 */

/* The order of the product's atoms: first `first`, then always one with most neighbours before it.
 */
static void order_atoms(seeker *s, int first)
{
    int count = s->p->count;

    memset(s->next, 0, (size_t)count * sizeof *s->next);
    for (int d = 0; d < count; d++) {
        int best = -1;

        for (int i = 0; i < count && d > 0; i++) {
            if (s->next[i] >= 0 && (best < 0 || s->next[i] > s->next[best]))
                best = i;
        }
        s->order[d] = d == 0 ? first : best;
        s->next[s->order[d]] = -1;
        for (int k = s->p->start[s->order[d]]; k < s->p->start[s->order[d] + 1]; k++) {
            int q = s->p->near[k];

            if (s->next[q] >= 0)
                s->next[q] += s->p->atoms[q].element == 6 ? 2 : 3;
        }
    }
    s->rest[count] = 0;
    for (int d = count - 1; d >= 0; d--)
        s->rest[d] = s->rest[d + 1] + s->bound[s->order[d]];
}

static bool has_twin(const seeker *s, const int *list, int count, int r)
{
    for (int i = 0; i < count && !s->labelled; i++) {
        if (list[i] >= 0 && s->kind[list[i]] == s->kind[r])
            return true;
    }
    return false;
}

/* Lists the origins that the atom at depth `d` may have, the most promising first. */
static void list_choices(seeker *s, int d)
{
    int p = s->order[d], count = 0, room = s->r->count + 1;
    int *list = s->choices + (size_t)d * (size_t)room;
    long *keys = s->keys;

    for (int r = -1; r < s->r->count; r++) {
        long key;
        int at;

        if (s->fixed[p] >= 0 ? r != s->fixed[p] : r >= 0 && s->fixed[s->p->count + r] >= 0)
            continue;
        if (r >= 0 && (s->became[r] >= 0 || s->r->atoms[r].element != s->p->atoms[p].element ||
                       (s->touched[s->r->atoms[r].piece] == 0 && has_twin(s, list, count, r))))
            continue;
        key = (long)added_price(s, p, r) * 16;
        if (r >= 0)
            key += s->local[p * s->r->count + r] * 8 - s->alike[p * s->r->count + r];
        for (at = count++; at > 0 && keys[at - 1] > key; at--) {
            keys[at] = keys[at - 1];
            list[at] = list[at - 1];
        }
        keys[at] = key;
        list[at] = r;
    }
    s->choice_count[d] = count;
    s->next[d] = 0;
}

static void take(seeker *s, int p, int r)
{
    s->image[p] = r;
    if (r >= 0) {
        s->became[r] = p;
        s->touched[s->r->atoms[r].piece]++;
    }
}

static void give_back(seeker *s, int p)
{
    int r = s->image[p];

    if (r >= 0) {
        s->became[r] = -1;
        s->touched[s->r->atoms[r].piece]--;
    }
    s->image[p] = NOT_YET;
}

static void keep_best(seeker *s, int price)
{
    price += leaving_price(s) + proton_price(s);
    if (price >= s->best_price)
        return;
    s->best_price = price;
    memcpy(s->best, s->image, (size_t)s->p->count * sizeof *s->best);
}

static void search_from(seeker *s, int first, long steps)
{
    int d = 0, count = s->p->count, room = s->r->count + 1;

    order_atoms(s, first);
    s->price[0] = 0;
    list_choices(s, 0);
    for (s->steps = 0; d >= 0;) {
        int p = s->order[d], r, price;

        if (s->image[p] != NOT_YET)
            give_back(s, p);
        if (s->next[d] == s->choice_count[d] || s->steps > steps) {
            d--;
            continue;
        }
        s->steps++;
        r = s->choices[(size_t)d * (size_t)room + (size_t)s->next[d]++];
        price = s->price[d] + added_price(s, p, r);
        if (price + s->rest[d + 1] >= s->best_price)
            continue;
        take(s, p, r);
        if (d + 1 == count) {
            keep_best(s, price);
            continue;
        }
        s->price[++d] = price;
        list_choices(s, d);
    }
}

/* First atoms: those with the largest equal surroundings, and those with the smallest. */
static int next_start(const seeker *s, const bool *had, int turn)
{
    int best = -1, best_value = 0;

    for (int p = 0; p < s->p->count; p++) {
        int value = 0;

        for (int r = 0; r < s->r->count; r++) {
            if (s->alike[p * s->r->count + r] > value)
                value = s->alike[p * s->r->count + r];
        }
        value = value * 4 + (s->p->atoms[p].element != 6);
        if (turn % 2)
            value = -value;
        if (!had[p] && (best < 0 || value > best_value)) {
            best = p;
            best_value = value;
        }
    }
    return best;
}

static bs_status search(bs_ctx *cx, seeker *s)
{
    int best_start = 0;
    bool *had;
    bs_status st = bs_new(cx, &cx->scratch, s->p->count + 1, &had);

    s->best_price = 1 << 28;
    for (int i = 0; i < STARTS && i < s->p->count && st == BS_OK; i++) {
        int start = next_start(s, had, i), before = s->best_price;

        had[start] = true;
        search_from(s, start, STEPS_EACH);
        if (s->best_price < before)
            best_start = start;
        st = bs_poll(cx);
    }
    if (st == BS_OK)
        search_from(s, best_start, STEPS_LAST);
    return st;
}

/* ---- Atom classes ------------------------------------------------------------------------------
 */

static bs_status check_labels(bs_ctx *cx, const bs_example_side *side, const char *where)
{
    for (int i = 0; i < side->count; i++) {
        for (int k = 0; k < i && side->atoms[i].label > 0; k++) {
            if (side->atoms[k].label == side->atoms[i].label)
                return bs_fail(cx, BS_EVALUE, "atom class %d stands twice in the %s",
                               side->atoms[i].label, where);
        }
    }
    return BS_OK;
}

/* Fills `fixed`: for the product's atoms, and behind them for those of the reactants. */
static bs_status read_labels(bs_ctx *cx, seeker *s)
{
    bs_status st;

    if ((st = check_labels(cx, s->r, "reactants")) != BS_OK ||
        (st = check_labels(cx, s->p, "product")) != BS_OK)
        return st;
    for (int i = 0; i < s->p->count + s->r->count; i++)
        s->fixed[i] = -1;
    for (int p = 0; p < s->p->count; p++) {
        for (int r = 0; r < s->r->count && s->p->atoms[p].label > 0; r++) {
            if (s->r->atoms[r].label != s->p->atoms[p].label)
                continue;
            if (s->r->atoms[r].element != s->p->atoms[p].element)
                return bs_fail(cx, BS_EVALUE,
                               "atom class %d is %s in the reactants and %s in the product",
                               s->p->atoms[p].label, bs_element_symbol(s->r->atoms[r].element),
                               bs_element_symbol(s->p->atoms[p].element));
            s->fixed[p] = r;
            s->labelled = true;
            s->fixed[s->p->count + r] = p;
        }
    }
    return BS_OK;
}

/* ---- All of it ---------------------------------------------------------------------------------
 */

static bs_status make_room(bs_example *ex, seeker *s)
{
    bs_arena *a = &ex->cx->scratch;
    bs_ctx *cx = ex->cx;
    int p = s->p->count + 2, r = s->r->count + 2;
    bs_status st;

    if ((st = bs_new(cx, a, p, &s->image)) != BS_OK ||
        (st = bs_new(cx, a, r, &s->became)) != BS_OK ||
        (st = bs_new(cx, a, p, &s->best)) != BS_OK ||
        (st = bs_new(cx, a, p + r, &s->fixed)) != BS_OK ||
        (st = bs_new(cx, a, p, &s->bound)) != BS_OK ||
        (st = bs_new(cx, a, p * r, &s->local)) != BS_OK ||
        (st = bs_new(cx, a, p * r, &s->alike)) != BS_OK ||
        (st = bs_new(cx, a, r, &s->kind)) != BS_OK ||
        (st = bs_new(cx, a, r, &s->touched)) != BS_OK ||
        (st = bs_new(cx, a, p, &s->order)) != BS_OK || (st = bs_new(cx, a, p, &s->rest)) != BS_OK ||
        (st = bs_new(cx, a, p * r, &s->choices)) != BS_OK ||
        (st = bs_new(cx, a, p, &s->choice_count)) != BS_OK ||
        (st = bs_new(cx, a, p, &s->next)) != BS_OK || (st = bs_new(cx, a, p, &s->price)) != BS_OK ||
        (st = bs_new(cx, a, r, &s->keys)) != BS_OK)
        return st;
    for (int i = 0; i < s->p->count; i++)
        s->image[i] = NOT_YET;
    for (int i = 0; i < s->r->count; i++)
        s->became[i] = -1;
    return BS_OK;
}

/* Whether a centre with the same neighbours on both sides gets the other hand. */
static bool is_turned(const bs_example *ex, int p)
{
    const bs_example_side *left = &ex->reactants, *right = &ex->product;
    int r = ex->image[p], degree = right->start[p + 1] - right->start[p], odd = 0, at[4];
    bs_hand before = bs_mol_atom_hand(left->pieces[left->atoms[r].piece], left->atoms[r].atom);
    bs_hand after = bs_mol_atom_hand(right->pieces[0], p);

    if (before == BS_HAND_NONE || after == BS_HAND_NONE || degree > 4)
        return false;
    for (int k = 0; k < degree; k++) {
        int from = ex->image[right->near[right->start[p] + k]];

        at[k] = 0;
        while (at[k] < degree && left->near[left->start[r] + at[k]] != from)
            at[k]++;
    }
    for (int i = 0; i < degree; i++) {
        for (int k = i + 1; k < degree; k++)
            odd += at[i] > at[k];
    }
    return (odd % 2 != 0) != (before != after);
}

/* Whether the reaction changes an atom of the product: its bonds, its charge or its hydrogens. */
static bool is_changed(const bs_example *ex, int p)
{
    const bs_example_side *left = &ex->reactants, *right = &ex->product;
    int r = ex->image[p];

    if (r < 0 || left->atoms[r].charge != right->atoms[p].charge ||
        left->atoms[r].hydrogens != right->atoms[p].hydrogens ||
        left->atoms[r].aromatic != right->atoms[p].aromatic)
        return true;
    for (int k = right->start[p]; k < right->start[p + 1]; k++) {
        int q = right->near[k], from = ex->image[q];

        if (from < 0 || bs_example__bond(left, r, from) != bs_example__bond(right, p, q))
            return true;
    }
    for (int k = left->start[r]; k < left->start[r + 1]; k++) {
        int q = ex->became[left->near[k]];

        if (q < 0 || !bs_example__bond(right, p, q))
            return true;
    }
    return is_turned(ex, p);
}

static bs_status settle(bs_example *ex, const int *image)
{
    bs_status st;

    if ((st = bs_new(ex->cx, ex->work, ex->product.count + 1, &ex->image)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, ex->product.count + 1, &ex->changes)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, ex->reactants.count + 1, &ex->became)) != BS_OK)
        return st;
    for (int i = 0; i < ex->reactants.count; i++)
        ex->became[i] = -1;
    for (int i = 0; i < ex->product.count; i++) {
        ex->image[i] = image[i];
        if (image[i] >= 0)
            ex->became[image[i]] = i;
    }
    for (int i = 0; i < ex->product.count; i++)
        ex->changes[i] = is_changed(ex, i);
    return BS_OK;
}

bs_status bs_example__map(bs_example *ex)
{
    bs_mark temp = bs_arena_mark(&ex->cx->scratch);
    seeker s = {.p = &ex->product, .r = &ex->reactants};
    bs_status st;

    if ((st = make_room(ex, &s)) == BS_OK && (st = read_labels(ex->cx, &s)) == BS_OK &&
        (st = compare_atoms(ex->cx, &s)) == BS_OK && (st = find_kinds(ex, &s)) == BS_OK &&
        (st = search(ex->cx, &s)) == BS_OK)
        st = settle(ex, s.best);
    bs_arena_rewind(&ex->cx->scratch, temp);
    return st;
}
