/*
 * Laying a small pattern over a target: which atoms both name.
 *
 * A rewriting of a synthon knows its atoms by their own numbers. Where the target names a
 * neighbour that can be the same atom, it is that one; else the atom is added.
 */
#include <string.h>

#include "rule/book.h"

enum { MAX_OVERLAYS = 12 };

typedef struct overlay {
    bs_ctx *cx;
    bs_arena *home;
    const bs_query *query, *target;
    int barred, anchor;
    int *order;  /* atoms of the query, each behind a neighbour of its own */
    int *parent; /* for each atom of the query, that neighbour, or -1 */
    int *bound;  /* for each atom of the query */
    bool *used;  /* for each atom of the target */
    int reach;   /* length of `order` */
    int **found;
    int count;
} overlay;

static const bs_query_bond *bond_between(const bs_query *query, int a, int b)
{
    for (int i = 0; i < query->bond_count; i++) {
        const bs_query_bond *bond = &query->bonds[i];

        if ((bond->a == a && bond->b == b) || (bond->a == b && bond->b == a))
            return bond;
    }
    return NULL;
}

static bool differ(int a, int b)
{
    return a != BS_UNSAID && b != BS_UNSAID && a != b;
}

static bool demands_differ(const bs_query_expr *a, const bs_query_expr *b, bs_test_kind kind)
{
    int x, y;

    return bs_query_demands(a, kind, &x) && bs_query_demands(b, kind, &y) && x != y;
}

/* Whether an atom of both patterns can be one, as far as their demands tell. */
static bs_status can_be_one(bs_ctx *cx, const bs_query_expr *a, const bs_query_expr *b, bool *yes)
{
    bs_facts f, g;
    bs_status st;

    if ((st = bs_expr__atom_facts(cx, a, &f)) != BS_OK ||
        (st = bs_expr__atom_facts(cx, b, &g)) != BS_OK)
        return st;
    *yes = !differ(f.element, g.element) && !differ(f.aromatic, g.aromatic) &&
           !differ(f.charge, g.charge) && !differ(f.hydrogens, g.hydrogens) &&
           !differ(f.connections, g.connections) && !demands_differ(a, b, BS_TEST_DEGREE);
    return BS_OK;
}

static bs_status bonds_can_be_one(bs_ctx *cx, const bs_query_bond *a, const bs_query_bond *b,
                                  bool *yes)
{
    bs_bond_facts f, g;
    bs_status st;

    if ((st = bs_expr__bond_facts(cx, &a->expr, &f)) != BS_OK ||
        (st = bs_expr__bond_facts(cx, &b->expr, &g)) != BS_OK)
        return st;
    /* Nothing written is a single bond here: rewritings are about aliphatic atoms. */
    if (f.order == BS_ORDER_DEFAULT)
        f.order = g.order == 5 ? 5 : 1;
    if (g.order == BS_ORDER_DEFAULT)
        g.order = f.order == 5 ? 5 : 1;
    *yes = !differ(f.order, g.order);
    return BS_OK;
}

static bs_status fits(overlay *o, int ours, int theirs, bool *yes)
{
    int parent = o->parent[ours];
    const bs_query_bond *mine = bond_between(o->query, parent, ours);
    const bs_query_bond *other = bond_between(o->target, o->bound[parent], theirs);
    bs_status st;

    *yes = false;
    if (!mine || !other || o->used[theirs] ||
        (o->bound[parent] == o->anchor && theirs == o->barred) ||
        (o->bound[parent] == o->barred && theirs == o->anchor))
        return BS_OK;
    st = can_be_one(o->cx, &o->query->atoms[ours].expr, &o->target->atoms[theirs].expr, yes);
    if (st != BS_OK || !*yes)
        return st;
    return bonds_can_be_one(o->cx, mine, other, yes);
}

static bs_status record(overlay *o)
{
    bs_status st = bs_new(o->cx, o->home, o->query->atom_count + 1, &o->found[o->count]);

    if (st == BS_OK)
        memcpy(o->found[o->count++], o->bound, (size_t)o->query->atom_count * sizeof *o->bound);
    return st;
}

/* Binds the atoms from order[depth] on. The depth is that of the small query, so it is bounded. */
static bs_status bind(overlay *o, int depth)
{
    int ours;
    bool any = false;
    bs_status st;

    if (o->count == MAX_OVERLAYS)
        return BS_OK;
    if (depth == o->reach)
        return record(o);
    ours = o->order[depth];
    for (int t = 0; t < o->target->atom_count && o->bound[o->parent[ours]] >= 0; t++) {
        bool yes;

        if ((st = fits(o, ours, t, &yes)) != BS_OK)
            return st;
        if (!yes)
            continue;
        any = true;
        o->bound[ours] = t;
        o->used[t] = true;
        st = bind(o, depth + 1);
        o->used[t] = false;
        o->bound[ours] = -1;
        if (st != BS_OK)
            return st;
    }
    return any ? BS_OK : bind(o, depth + 1);
}

/* Atoms that hang together with `first`, each behind its parent. */
static void find_order(overlay *o, int first)
{
    int reach = 0;

    for (int i = 0; i < o->query->atom_count; i++)
        o->parent[i] = -2;
    o->parent[first] = -1;
    o->order[reach++] = first;
    for (int k = 0; k < reach; k++) {
        for (int i = 0; i < o->query->bond_count; i++) {
            const bs_query_bond *bond = &o->query->bonds[i];
            int next = bond->a == o->order[k] ? bond->b : bond->a;

            if ((bond->a != o->order[k] && bond->b != o->order[k]) || o->parent[next] != -2)
                continue;
            o->parent[next] = o->order[k];
            o->order[reach++] = next;
        }
    }
    o->reach = reach;
}

bs_status bs_overlay__find(bs_ctx *cx, bs_arena *home, const bs_query *query, int ours,
                           const bs_query *target, int anchor, int barred, int ***out, int *count)
{
    overlay o = {.cx = cx, .home = home, .query = query, .target = target, .anchor = anchor,
                 .barred = barred};
    bs_status st;

    if (query->atom_count > 40)
        return bs_fail(cx, BS_ELIMIT, "a rewriting of a synthon has at most 40 atoms");
    if ((st = bs_new(cx, home, MAX_OVERLAYS + 1, &o.found)) != BS_OK ||
        (st = bs_new(cx, home, query->atom_count + 1, &o.order)) != BS_OK ||
        (st = bs_new(cx, home, query->atom_count + 1, &o.parent)) != BS_OK ||
        (st = bs_new(cx, home, query->atom_count + 1, &o.bound)) != BS_OK ||
        (st = bs_new(cx, home, target->atom_count + 1, &o.used)) != BS_OK)
        return st;
    find_order(&o, ours);
    for (int i = 0; i < query->atom_count; i++)
        o.bound[i] = -1;
    o.bound[ours] = anchor;
    o.used[anchor] = true;
    st = bind(&o, 1);
    *out = o.found;
    *count = o.count;
    return st;
}
