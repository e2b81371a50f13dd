/* Nearest misses: a branch-and-bound search over the moves of a pattern that counts failed tests.
 */
#include "match/near.h"

#include <string.h>

#include "match/search.h"
#include "match/write.h"

/* What failures count. A failed atom keeps its place as long as that is cheaper than having none.
 */
enum { WRONG_ELEMENT = 4, WRONG_TEST = 2, WRONG_BOND = 5, NO_BOND = 4, NO_ATOM = 8, NO_BRANCH = 1 };

enum { MAX_NEAR_STEPS = 400000 };

/* One of the tests that an atom's expression joins by AND. */
typedef struct demand {
    int atom;
    bs_query_expr expr;
    const bs_pattern *pattern; /* of a single atom */
    int weight;
    bool *passes; /* for each atom of the molecule */
} demand;

typedef struct near {
    bs_ctx *cx;
    const bs_pattern *pattern;
    const bs_query *query;
    const bs_mol *mol;
    demand *demands;
    int demand_count;
    int *atom_cost; /* query atom * atoms of the molecule + atom */
    /* the search, by move */
    uint32_t *at;
    uint32_t *cursor;
    int *cost; /* before the move */
    bool *taken;
    uint32_t *best;
    int best_cost;
    bool found;
    long steps;
} near;

/* ---- Demands ---------------------------------------- */

/* A test that names an element, alone or among others, is about what the atom is. */
static int weight_of(const bs_query_expr *expr)
{
    for (int i = 0; i < expr->count; i++) {
        switch (expr->tests[i].kind) {
        case BS_TEST_ELEMENT:
        case BS_TEST_ALIPHATIC_ELEM:
        case BS_TEST_AROMATIC_ELEM:
            return WRONG_ELEMENT;
        default:
            break;
        }
    }
    return WRONG_TEST;
}

static bs_status add_demand(near *n, int atom, bs_query_expr expr)
{
    bs_ctx *cx = n->cx;
    demand *d = &n->demands[n->demand_count++];
    bs_query_atom alone = {.expr = expr};
    bs_query *query;
    bs_pattern *pattern;
    bs_status st;

    *d = (demand){.atom = atom, .expr = expr, .weight = weight_of(&expr)};
    if ((st = bs_query_new(cx, &cx->scratch, &query)) != BS_OK ||
        (st = bs_query_import(cx, &cx->scratch, query, n->query, &expr, &alone.expr)) != BS_OK ||
        (st = bs_query_add_atom(cx, &cx->scratch, query, &alone, NULL)) != BS_OK ||
        (st = bs_query_compile(cx, &cx->scratch, query, &pattern)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, n->mol->atom_count + 1, &d->passes)) != BS_OK)
        return st;
    d->pattern = pattern;
    for (uint32_t i = 0; i < n->mol->atom_count && st == BS_OK; i++)
        st = bs_pattern__atom_passes(cx, pattern, 0, n->mol, i, &d->passes[i]);
    return st;
}

/* Splits an expression at its ANDs; `pile` holds where trees end that are still to be looked at. */
static bs_status split_expr(near *n, int atom)
{
    const bs_query_expr *expr = &n->query->atoms[atom].expr;
    bs_ctx *cx = n->cx;
    int *size, *pile, height = 0;
    bs_status st;

    if (expr->count == 0 || bs_query_mentions(expr, BS_TEST_CHIRAL))
        return BS_OK;
    if ((st = bs_query_sizes(cx, &cx->scratch, expr, &size)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, expr->count + 1, &pile)) != BS_OK)
        return st;
    pile[height++] = expr->count - 1;
    while (height > 0 && st == BS_OK) {
        int root = pile[--height];

        if (expr->tests[root].kind == BS_TEST_AND) {
            pile[height++] = root - 1;
            pile[height++] = root - 1 - size[root - 1];
        } else {
            st = add_demand(n, atom,
                            (bs_query_expr){expr->tests + root + 1 - size[root], size[root]});
        }
    }
    return st;
}

static bs_status split_all(near *n)
{
    bs_ctx *cx = n->cx;
    size_t room = 1, atoms = n->mol->atom_count;
    bs_status st;

    for (int i = 0; i < n->query->atom_count; i++)
        room += (size_t)n->query->atoms[i].expr.count;
    if ((st = bs_new(cx, &cx->scratch, room, &n->demands)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, (size_t)n->query->atom_count * atoms + 1, &n->atom_cost)) !=
            BS_OK)
        return st;
    for (int i = 0; i < n->query->atom_count && st == BS_OK; i++)
        st = split_expr(n, i);
    for (int k = 0; k < n->demand_count && st == BS_OK; k++) {
        const demand *d = &n->demands[k];

        for (size_t i = 0; i < atoms; i++)
            n->atom_cost[(size_t)d->atom * atoms + i] += d->passes[i] ? 0 : d->weight;
    }
    return st;
}

/* ---- Searching ---------------------------------------- */

static int sort_of(const bs_mol *mol, uint32_t bond)
{
    const bs_bond *b = &bs_mol__bonds(mol)[bond];

    return (int)(b->order & 7) | (int)(b->flags & (BS_BOND_AROMATIC | BS_BOND_RING)) << 3;
}

static int bond_cost(const near *n, int32_t move, uint32_t atom, uint32_t sorts)
{
    int bond;

    if (n->at[move] == BS_UNPLACED)
        return 0;
    bond = bs_mol_bond_between(n->mol, (int)n->at[move], (int)atom);
    if (bond < 0)
        return NO_BOND;
    return sorts >> sort_of(n->mol, (uint32_t)bond) & 1 ? 0 : WRONG_BOND;
}

/* What it costs to place the atom of a move. */
static int placing_cost(const near *n, const bs_order *order, int depth, uint32_t atom)
{
    const bs_move *move = &order->moves[depth];
    int cost = n->atom_cost[(size_t)move->atom * n->mol->atom_count + atom];

    if (move->from >= 0)
        cost += bond_cost(n, move->from, atom, move->sorts);
    for (int k = 0; k < move->closure_count; k++) {
        const bs_closure *closure = &order->closures[move->closure_first + k];

        cost += bond_cost(n, closure->move, atom, closure->sorts);
    }
    return cost;
}

/* The next candidate of a move: an atom, BS_UNPLACED for none; false when there are no more. */
static bool next_candidate(near *n, const bs_order *order, int depth, uint32_t *atom)
{
    const bs_move *move = &order->moves[depth];
    uint32_t k = n->cursor[depth]++;
    uint32_t parent = move->from >= 0 ? n->at[move->from] : BS_UNPLACED;
    uint32_t count = move->from < 0          ? n->mol->atom_count
                     : parent == BS_UNPLACED ? 0
                                             : n->mol->atoms[parent].degree;

    *atom = BS_UNPLACED;
    if (k < count)
        *atom = move->from < 0 ? k : bs_mol__links(n->mol, parent)[k].atom;
    return k <= count;
}

static void leave(near *n, int depth)
{
    if (n->at[depth] != BS_UNPLACED)
        n->taken[n->at[depth]] = false;
    n->at[depth] = BS_UNPLACED;
}

/* Tries the next candidate of a move that does not cost too much. */
static bool advance(near *n, const bs_order *order, int depth)
{
    const bs_move *move = &order->moves[depth];
    uint32_t atom;

    leave(n, depth);
    while (next_candidate(n, order, depth, &atom)) {
        int cost = n->cost[depth];

        if (atom != BS_UNPLACED && n->taken[atom])
            continue;
        if (atom != BS_UNPLACED)
            cost += placing_cost(n, order, depth, atom);
        else
            cost += move->from >= 0 && n->at[move->from] == BS_UNPLACED ? NO_BRANCH : NO_ATOM;
        if (cost >= n->best_cost)
            continue;
        n->at[depth] = atom;
        if (atom != BS_UNPLACED)
            n->taken[atom] = true;
        n->cost[depth + 1] = cost;
        return true;
    }
    return false;
}

static bs_status search(near *n, const bs_order *order)
{
    int depth = 0;

    n->cursor[0] = 0;
    n->cost[0] = 0;
    while (depth >= 0 && n->best_cost > 0 && n->steps++ < MAX_NEAR_STEPS) {
        bs_status st = bs_poll(n->cx);

        if (st != BS_OK)
            return st;
        if (!advance(n, order, depth)) {
            depth--;
            continue;
        }
        if (++depth < order->count) {
            n->cursor[depth] = 0;
            continue;
        }
        n->best_cost = n->cost[depth];
        n->found = true;
        memcpy(n->best, n->at, (size_t)order->count * sizeof *n->best);
        depth--;
    }
    return BS_OK;
}

static bs_status prepare(near *n, int moves, int limit)
{
    bs_ctx *cx = n->cx;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, moves + 1, &n->at)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, moves + 1, &n->cursor)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, moves + 1, &n->cost)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, moves + 1, &n->best)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, n->mol->atom_count + 1, &n->taken)) != BS_OK)
        return st;
    for (int i = 0; i < moves; i++)
        n->at[i] = n->best[i] = BS_UNPLACED;
    n->best_cost = limit > 0 ? limit + 1 : NO_ATOM * (moves + 1);
    return BS_OK;
}

/* ---- Words ---------------------------------------- */

static const char *plural(int count)
{
    return count == 1 ? "" : "s";
}

/* "atom 2 (C)" */
static bs_status name_atom(bs_text *text, const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];

    return bs_text_printf(text, "atom %lu (%s%s)", (unsigned long)atom + 1,
                          a->flags & BS_ATOM_AROMATIC ? "aromatic " : "",
                          bs_element_symbol(a->element));
}

/* What the atom has of the thing that a single test asks for. */
static bs_status say_what_it_has(bs_text *text, const bs_mol *mol, uint32_t atom, int kind)
{
    const bs_atom *a = &mol->atoms[atom];
    int hydrogens = bs_mol_atom_hydrogens(mol, (int)atom);

    switch (kind) {
    case BS_TEST_HYDROGENS:
    case BS_TEST_IMPLICIT_H:
        return bs_text_printf(text, ": it has %d hydrogen%s", hydrogens, plural(hydrogens));
    case BS_TEST_CONNECTIONS:
        return bs_text_printf(text, ": it has %d connections", a->degree + a->hydrogens);
    case BS_TEST_DEGREE:
        return bs_text_printf(text, ": it has %d neighbour%s", a->degree, plural(a->degree));
    case BS_TEST_RING_COUNT:
    case BS_TEST_RING_BONDS:
        return bs_text_printf(text, ": it is in %d ring%s", a->ring_count, plural(a->ring_count));
    case BS_TEST_RING_SIZE:
        if (a->min_ring == 0)
            return bs_text_puts(text, ": it is in no ring");
        return bs_text_printf(text, ": its smallest ring has %d members", a->min_ring);
    case BS_TEST_VALENCE:
        return bs_text_printf(text, ": its valence is %d", a->valence);
    case BS_TEST_CHARGE:
        return bs_text_printf(text, ": its charge is %d", a->charge);
    case BS_TEST_ISOTOPE:
        return bs_text_printf(text, ": its isotope is %d", a->isotope);
    default:
        return BS_OK;
    }
}

/* The kind of test that an expression is about, or -1 if it joins several. */
static int only_kind(const bs_query_expr *expr)
{
    int kind = -1;

    for (int i = 0; i < expr->count; i++) {
        int one = expr->tests[i].kind;

        if (one == BS_TEST_NOT || one == BS_TEST_AND || one == BS_TEST_OR)
            continue;
        if (kind >= 0 && kind != one)
            return -1;
        kind = one;
    }
    return kind;
}

typedef struct telling {
    near *n;
    bs_arena *home;
    bs_near *out;
    bs_text text;
} telling;

static bs_status keep_miss(telling *t, int atom, uint32_t where)
{
    bs_miss *miss = &t->out->misses[t->out->miss_count];

    *miss = (bs_miss){.atom = atom, .where = where};
    t->out->miss_count++;
    return bs_copy_text(t->n->cx, t->home, t->text.data, t->text.length, &miss->text);
}

/* SMARTS of one atom of the pattern, as it was written. */
static bs_status put_query_atom(telling *t, int atom)
{
    bs_writing w = {.cx = t->n->cx, .text = &t->text, .query = t->n->query};

    return bs_write__atom(&w, &t->n->query->atoms[atom], false);
}

static bs_status tell_demand(telling *t, const demand *d, uint32_t where)
{
    bs_ctx *cx = t->n->cx;
    char *smarts;
    bs_status st;

    bs_text_clear(&t->text);
    if ((st = name_atom(&t->text, t->n->mol, where)) != BS_OK ||
        (st = bs_query_write(cx, &cx->scratch, bs_pattern__query(d->pattern), &smarts)) != BS_OK ||
        (st = bs_text_printf(&t->text, " does not fit %s", smarts)) != BS_OK)
        return st;
    if ((st = say_what_it_has(&t->text, t->n->mol, where, only_kind(&d->expr))) != BS_OK)
        return st;
    return keep_miss(t, d->atom, where);
}

static bs_status tell_bond(telling *t, const bs_order *order, int move, int32_t from,
                           uint32_t sorts)
{
    uint32_t here = t->n->best[move], there = t->n->best[from];
    int bond;
    bs_status st;

    if (there == BS_UNPLACED)
        return BS_OK;
    bond = bs_mol_bond_between(t->n->mol, (int)here, (int)there);
    if (bond >= 0 && sorts >> sort_of(t->n->mol, (uint32_t)bond) & 1)
        return BS_OK;
    bs_text_clear(&t->text);
    st = bs_text_printf(&t->text, "atoms %lu and %lu ",
                        (unsigned long)(here < there ? here : there) + 1,
                        (unsigned long)(here < there ? there : here) + 1);
    if (st == BS_OK && bond < 0)
        st = bs_text_puts(&t->text, "are not bonded");
    else if (st == BS_OK)
        st =
            bs_text_printf(&t->text, "are joined by the wrong kind of bond: %s%s",
                           bs_mol_bond_in_ring(t->n->mol, bond) ? "in a ring, " : "not in a ring, ",
                           bs_mol_bond_is_aromatic(t->n->mol, bond)  ? "aromatic"
                           : bs_mol_bond_order(t->n->mol, bond) == 1 ? "single"
                           : bs_mol_bond_order(t->n->mol, bond) == 2 ? "double"
                                                                     : "triple");
    return st == BS_OK ? keep_miss(t, order->moves[move].atom, here) : st;
}

static bs_status tell_unplaced(telling *t, const bs_order *order, int move)
{
    int32_t from = order->moves[move].from;
    bs_status st;

    bs_text_clear(&t->text);
    if (from >= 0 && t->n->best[from] == BS_UNPLACED)
        return BS_OK; /* it hangs on an atom that has no place itself */
    if ((from >= 0 && ((st = name_atom(&t->text, t->n->mol, t->n->best[from])) != BS_OK ||
                       (st = bs_text_puts(&t->text, " has no neighbour left for ")) != BS_OK)) ||
        (from < 0 && (st = bs_text_puts(&t->text, "there is no atom for ")) != BS_OK) ||
        (st = put_query_atom(t, order->moves[move].atom)) != BS_OK)
        return st;
    return keep_miss(t, order->moves[move].atom, from >= 0 ? t->n->best[from] : BS_UNPLACED);
}

static bs_status tell_move(telling *t, const bs_order *order, int i)
{
    const bs_move *move = &order->moves[i];
    uint32_t where = t->n->best[i];
    bs_status st = BS_OK;

    t->out->placed[move->atom] = where;
    if (where == BS_UNPLACED)
        return tell_unplaced(t, order, i);
    for (int k = 0; k < t->n->demand_count && st == BS_OK; k++) {
        const demand *d = &t->n->demands[k];

        if (d->atom == move->atom && !d->passes[where])
            st = tell_demand(t, d, where);
    }
    if (st == BS_OK && move->from >= 0)
        st = tell_bond(t, order, i, move->from, move->sorts);
    for (int k = 0; k < move->closure_count && st == BS_OK; k++) {
        const bs_closure *closure = &order->closures[move->closure_first + k];

        st = tell_bond(t, order, i, closure->move, closure->sorts);
    }
    return st;
}

static bs_status tell_all(near *n, bs_arena *home, const bs_order *order, bs_near *out)
{
    telling t = {.n = n, .home = home, .out = out};
    size_t room = (size_t)(n->demand_count + n->query->bond_count + n->query->atom_count) + 1;
    bs_status st;

    if ((st = bs_new(n->cx, home, n->query->atom_count + 1, &out->placed)) != BS_OK ||
        (st = bs_new(n->cx, home, room, &out->misses)) != BS_OK)
        return st;
    bs_text_init(&t.text, n->cx);
    for (int i = 0; i < order->count && st == BS_OK; i++)
        st = tell_move(&t, order, i);
    bs_text_free(&t.text);
    return st;
}

bs_status bs_near__find(bs_ctx *cx, bs_arena *home, const bs_pattern *pattern, const bs_mol *mol,
                        int limit, bs_near *out, bool *found)
{
    bs_mark kept = bs_arena_mark(home), temp = bs_arena_mark(&cx->scratch);
    const bs_order *order = &pattern->parts[0].order;
    near n = {.cx = cx, .pattern = pattern, .query = pattern->query, .mol = mol};
    bs_status st;

    *out = (bs_near){0};
    if ((st = split_all(&n)) == BS_OK && (st = prepare(&n, order->count, limit)) == BS_OK &&
        (st = search(&n, order)) == BS_OK && n.found)
        st = tell_all(&n, home, order, out);
    bs_arena_rewind(&cx->scratch, temp);
    *found = st == BS_OK && n.found;
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *out = (bs_near){0};
    }
    return st;
}
