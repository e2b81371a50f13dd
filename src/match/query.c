/* Putting queries together: atoms, bonds, recursive parts, expressions. */
#include "match/query.h"

#include <string.h>

/* Makes room for one element more in an array of `home`, doubling it. */
static bs_status grow(bs_ctx *cx, bs_arena *home, void *array, int count, int *room, size_t size)
{
    void *old, *wide;
    int want = *room ? *room * 2 : 4;
    bs_status st;

    if (count < *room)
        return BS_OK;
    if ((st = bs_new_array(cx, home, (size_t)want, size, &wide)) != BS_OK)
        return st;
    memcpy(&old, array, sizeof old);
    if (count > 0)
        memcpy(wide, old, (size_t)count * size);
    memcpy(array, &wide, sizeof wide);
    *room = want;
    return BS_OK;
}

bs_status bs_query_new(bs_ctx *cx, bs_arena *home, bs_query **out)
{
    return bs_new(cx, home, 1, out);
}

bs_status bs_query_add_atom(bs_ctx *cx, bs_arena *home, bs_query *query, const bs_query_atom *atom,
                            int *index)
{
    bs_status st;

    if (query->atom_count >= BS_QUERY_MAX_ATOMS)
        return bs_fail_at(cx, BS_ELIMIT, atom->offset, "more than %d atoms in a pattern",
                          BS_QUERY_MAX_ATOMS);
    st = grow(cx, home, &query->atoms, query->atom_count, &query->atom_room, sizeof *atom);
    if (st != BS_OK)
        return st;
    if (index)
        *index = query->atom_count;
    query->atoms[query->atom_count++] = *atom;
    return BS_OK;
}

bs_status bs_query_add_bond(bs_ctx *cx, bs_arena *home, bs_query *query, const bs_query_bond *bond,
                            int *index)
{
    bs_status st;

    if (query->bond_count >= 4 * BS_QUERY_MAX_ATOMS)
        return bs_fail_at(cx, BS_ELIMIT, bond->offset, "more than %d bonds in a pattern",
                          4 * BS_QUERY_MAX_ATOMS);
    st = grow(cx, home, &query->bonds, query->bond_count, &query->bond_room, sizeof *bond);
    if (st != BS_OK)
        return st;
    if (index)
        *index = query->bond_count;
    query->bonds[query->bond_count++] = *bond;
    return BS_OK;
}

bs_status bs_query_add_sub(bs_ctx *cx, bs_arena *home, bs_query *query, bs_query *sub, int *index)
{
    bs_status st;

    if (query->sub_count >= INT16_MAX)
        return bs_fail(cx, BS_ELIMIT, "too many recursive parts in a pattern");
    st = grow(cx, home, &query->subs, query->sub_count, &query->sub_room, sizeof *query->subs);
    if (st != BS_OK)
        return st;
    if (index)
        *index = query->sub_count;
    query->subs[query->sub_count++] = sub;
    return BS_OK;
}

static bs_status copy_expr(bs_ctx *cx, bs_arena *home, const bs_query_expr *expr,
                           bs_query_expr *out)
{
    bs_status st = bs_new(cx, home, expr->count, &out->tests);

    if (st != BS_OK)
        return st;
    out->count = expr->count;
    if (expr->count > 0)
        memcpy(out->tests, expr->tests, (size_t)expr->count * sizeof *expr->tests);
    return BS_OK;
}

/* Moves the numbers of recursive parts in an expression that was copied from another query. */
static void shift_subs(bs_query_expr *expr, int by)
{
    for (int i = 0; i < expr->count; i++)
        if (expr->tests[i].kind == BS_TEST_RECURSE)
            expr->tests[i].value = (int16_t)(expr->tests[i].value + by);
}

static bs_status append_atoms(bs_ctx *cx, bs_arena *home, bs_query *into, const bs_query *from,
                              int sub_shift)
{
    int first = into->atom_count;
    bs_status st;

    for (int i = 0; i < from->atom_count; i++) {
        bs_query_atom atom = from->atoms[i];

        if ((st = copy_expr(cx, home, &from->atoms[i].expr, &atom.expr)) != BS_OK)
            return st;
        shift_subs(&atom.expr, sub_shift);
        if ((st = bs_new(cx, home, atom.around_count, &atom.around)) != BS_OK)
            return st;
        for (int k = 0; k < atom.around_count; k++) {
            int other = from->atoms[i].around[k];
            atom.around[k] = other < 0 ? other : other + first;
        }
        if ((st = bs_query_add_atom(cx, home, into, &atom, NULL)) != BS_OK)
            return st;
    }
    return BS_OK;
}

static bs_status append_bonds(bs_ctx *cx, bs_arena *home, bs_query *into, const bs_query *from,
                              int first)
{
    bs_status st;

    for (int i = 0; i < from->bond_count; i++) {
        bs_query_bond bond = from->bonds[i];

        bond.a += first;
        bond.b += first;
        if ((st = copy_expr(cx, home, &from->bonds[i].expr, &bond.expr)) != BS_OK)
            return st;
        if ((st = bs_query_add_bond(cx, home, into, &bond, NULL)) != BS_OK)
            return st;
    }
    return BS_OK;
}

/* A copy of a query down to `depth` levels of recursion. */
static bs_status copy_query(bs_ctx *cx, bs_arena *home, const bs_query *query, int depth,
                            bs_query **out);

static bs_status append_subs(bs_ctx *cx, bs_arena *home, bs_query *into, const bs_query *from,
                             int depth)
{
    bs_query *sub;
    bs_status st;

    for (int i = 0; i < from->sub_count; i++) {
        if ((st = copy_query(cx, home, from->subs[i], depth - 1, &sub)) != BS_OK)
            return st;
        if ((st = bs_query_add_sub(cx, home, into, sub, NULL)) != BS_OK)
            return st;
    }
    return BS_OK;
}

static bs_status append_all(bs_ctx *cx, bs_arena *home, bs_query *into, const bs_query *from,
                            int depth)
{
    int first = into->atom_count, sub_shift = into->sub_count;
    bs_status st;

    if ((st = append_atoms(cx, home, into, from, sub_shift)) != BS_OK)
        return st;
    if ((st = append_bonds(cx, home, into, from, first)) != BS_OK)
        return st;
    return append_subs(cx, home, into, from, depth);
}

static bs_status copy_query(bs_ctx *cx, bs_arena *home, const bs_query *query, int depth,
                            bs_query **out)
{
    bs_query *copy;
    char *text;
    bs_status st;

    if (depth < 0)
        return bs_fail(cx, BS_ELIMIT, "recursion nested deeper than %d", BS_QUERY_MAX_DEPTH);
    if ((st = bs_query_new(cx, home, &copy)) != BS_OK)
        return st;
    if ((st = append_all(cx, home, copy, query, depth)) != BS_OK)
        return st;
    if (query->text) {
        if ((st = bs_copy_text(cx, home, query->text, strlen(query->text), &text)) != BS_OK)
            return st;
        copy->text = text;
    }
    *out = copy;
    return BS_OK;
}

bs_status bs_query_copy(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_query **out)
{
    return copy_query(cx, home, query, BS_QUERY_MAX_DEPTH, out);
}

bs_status bs_query_append(bs_ctx *cx, bs_arena *home, bs_query *into, const bs_query *from,
                          int *first)
{
    if (first)
        *first = into->atom_count;
    return append_all(cx, home, into, from, BS_QUERY_MAX_DEPTH);
}

bs_status bs_query_import(bs_ctx *cx, bs_arena *home, bs_query *into, const bs_query *from,
                          const bs_query_expr *expr, bs_query_expr *out)
{
    bs_query_expr copy;
    bs_query *sub;
    bs_status st;
    int index;

    if ((st = copy_expr(cx, home, expr, &copy)) != BS_OK)
        return st;
    for (int i = 0; i < copy.count && into != from; i++) {
        bs_test *test = &copy.tests[i];

        if (test->kind != BS_TEST_RECURSE)
            continue;
        if ((st = bs_query_copy(cx, home, from->subs[test->value], &sub)) != BS_OK)
            return st;
        if ((st = bs_query_add_sub(cx, home, into, sub, &index)) != BS_OK)
            return st;
        test->value = (int16_t)index;
    }
    *out = copy;
    return BS_OK;
}

bs_status bs_query_leaf(bs_ctx *cx, bs_arena *home, bs_test_kind kind, int value,
                        bs_query_expr *out)
{
    bs_status st = bs_new(cx, home, 1, &out->tests);

    if (st != BS_OK)
        return st;
    out->count = 1;
    out->tests[0] = (bs_test){(uint8_t)kind, (int16_t)value};
    return BS_OK;
}

bs_status bs_query_join(bs_ctx *cx, bs_arena *home, bs_test_kind logic, const bs_query_expr *a,
                        const bs_query_expr *b, bs_query_expr *out)
{
    int second = logic == BS_TEST_NOT ? 0 : b->count;
    int count = a->count + second + 1;
    bs_test *tests;
    bs_status st = bs_new(cx, home, count, &tests);

    if (st != BS_OK)
        return st;
    memcpy(tests, a->tests, (size_t)a->count * sizeof *tests);
    if (second > 0)
        memcpy(tests + a->count, b->tests, (size_t)second * sizeof *tests);
    tests[count - 1] = (bs_test){(uint8_t)logic, 0};
    out->tests = tests;
    out->count = count;
    return BS_OK;
}

bool bs_query_mentions(const bs_query_expr *expr, bs_test_kind kind)
{
    for (int i = 0; i < expr->count; i++)
        if (expr->tests[i].kind == kind)
            return true;
    return false;
}

/*
 * Walks the post order from its end: `skip` counts the tests that belong to a NOT or an OR and so
 * demand nothing by themselves.
 */
bool bs_query_demands(const bs_query_expr *expr, bs_test_kind kind, int *value)
{
    bool found = false;
    int skip = 0;

    for (int i = expr->count - 1; i >= 0; i--) {
        const bs_test *test = &expr->tests[i];

        if (test->kind == BS_TEST_NOT) {
            skip += skip == 0;
        } else if (test->kind == BS_TEST_OR || test->kind == BS_TEST_AND) {
            skip += skip > 0 ? 1 : test->kind == BS_TEST_OR ? 2 : 0;
        } else if (skip > 0) {
            skip--;
        } else if (test->kind == kind) {
            found = true;
            if (value)
                *value = test->value;
        }
    }
    return found;
}

bs_status bs_query_sizes(bs_ctx *cx, bs_arena *home, const bs_query_expr *expr, int **size)
{
    bs_status st = bs_new(cx, home, expr->count, size);
    int ends = 0;

    if (st != BS_OK)
        return st;
    for (int i = 0; i < expr->count; i++) {
        int kind = expr->tests[i].kind;
        int operands = kind == BS_TEST_NOT ? 1 : kind == BS_TEST_AND || kind == BS_TEST_OR ? 2 : 0;
        int total = 1;

        if (ends < operands)
            return bs_fail(cx, BS_EVALUE, "an operator of a pattern lacks an operand");
        for (int k = 0, at = i - 1; k < operands; k++, at = i - total)
            total += (*size)[at];
        (*size)[i] = total;
        ends += 1 - operands;
    }
    if (ends != 1)
        return bs_fail(cx, BS_EVALUE, "an expression of a pattern is no single tree");
    return BS_OK;
}
