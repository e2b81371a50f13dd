/*
 * Relaxing queries: dropping tests of some kinds so that nothing that passed before fails.
 *
 * The expression is read in negation normal form (Robinson & Voronkov, Handbook of Automated
 * Reasoning, 2001, ch. 5): every test has a sign, and AND and OR swap under NOT. A dropped test
 * is true under either sign; AND and OR then simplify from the leaves up.
 */
#include "match/query.h"

#include <string.h>

/* What becomes of a test. */
typedef enum fate { KEPT, TRUE_NOW, REPLACED } fate;

static unsigned family(int kind)
{
    switch (kind) {
    case BS_TEST_HYDROGENS:
    case BS_TEST_IMPLICIT_H:
        return BS_RELAX_HYDROGENS;
    case BS_TEST_DEGREE:
    case BS_TEST_CONNECTIONS:
        return BS_RELAX_DEGREE;
    case BS_TEST_VALENCE:
        return BS_RELAX_VALENCE;
    case BS_TEST_HYBRID:
        return BS_RELAX_HYBRID;
    case BS_TEST_CHIRAL:
    case BS_TEST_BOND_UP:
    case BS_TEST_BOND_DOWN:
        return BS_RELAX_CHIRAL;
    case BS_TEST_RING_COUNT:
    case BS_TEST_RING_SIZE:
    case BS_TEST_RING_BONDS:
    case BS_TEST_BOND_RING:
        return BS_RELAX_RING;
    case BS_TEST_CHARGE:
        return BS_RELAX_CHARGE;
    case BS_TEST_RECURSE:
        return BS_RELAX_RECURSION;
    case BS_TEST_ALIPHATIC_ELEM:
    case BS_TEST_AROMATIC_ELEM:
    case BS_TEST_ALIPHATIC:
    case BS_TEST_AROMATIC:
    case BS_TEST_BOND_SINGLE:
    case BS_TEST_BOND_DOUBLE:
    case BS_TEST_BOND_AROMATIC:
    case BS_TEST_BOND_DEFAULT:
        return BS_RELAX_AROMATIC;
    default:
        return 0;
    }
}

/* A symbol keeps its element and a direction its single bond, but not where they are negated. */
static fate decide(bs_test *test, unsigned what, bool negated)
{
    if (!(family(test->kind) & what))
        return KEPT;
    if (negated)
        return TRUE_NOW;
    if (test->kind == BS_TEST_ALIPHATIC_ELEM || test->kind == BS_TEST_AROMATIC_ELEM)
        test->kind = BS_TEST_ELEMENT;
    else if ((test->kind == BS_TEST_BOND_UP || test->kind == BS_TEST_BOND_DOWN) &&
             !(what & BS_RELAX_AROMATIC))
        *test = (bs_test){BS_TEST_BOND_SINGLE, 0};
    else
        return TRUE_NOW;
    return REPLACED;
}

/* The sign of each test: whether an odd number of NOTs stands over it. */
static void find_signs(const bs_query_expr *expr, const int *size, bool *negated)
{
    for (int i = expr->count - 1; i >= 0; i--) {
        int kind = expr->tests[i].kind;

        if (kind == BS_TEST_NOT) {
            negated[i - 1] = !negated[i];
        } else if (kind == BS_TEST_AND || kind == BS_TEST_OR) {
            negated[i - 1] = negated[i];
            negated[i - 1 - size[i - 1]] = negated[i];
        }
    }
}

/* A part of the output: where it starts, or that it is true and takes no room. */
typedef struct part {
    int start;
    bool always;
} part;

typedef struct rewrite {
    bs_test *out;
    int count;
    part *parts;
    int part_count;
} rewrite;

static void put_leaf(rewrite *w, bs_test test, unsigned what, bool negated)
{
    part item = {w->count, false};

    if (decide(&test, what, negated) == TRUE_NOW) {
        item.always = true;
    } else {
        w->out[w->count++] = test;
        if (negated)
            w->out[w->count++] = (bs_test){BS_TEST_NOT, 0};
    }
    w->parts[w->part_count++] = item;
}

static void put_logic(rewrite *w, bool is_and)
{
    part b = w->parts[--w->part_count], a = w->parts[--w->part_count];
    part whole = {a.start, false};

    if (a.always && b.always) {
        whole.always = true;
    } else if (a.always || b.always) {
        if (!is_and) {
            whole.always = true;
            w->count = a.start;
        }
    } else {
        w->out[w->count++] = (bs_test){is_and ? BS_TEST_AND : BS_TEST_OR, 0};
    }
    w->parts[w->part_count++] = whole;
}

static bool is_bond(const bs_query_expr *expr)
{
    for (int i = 0; i < expr->count; i++)
        if (expr->tests[i].kind >= BS_TEST_BOND_ANY)
            return true;
    return false;
}

bs_status bs_query_relax_expr(bs_ctx *cx, bs_arena *home, const bs_query_expr *expr, unsigned what,
                              bs_query_expr *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    rewrite w = {NULL, 0, NULL, 0};
    bool *negated;
    int *size;
    bs_status st;

    if ((st = bs_new(cx, home, 2 * expr->count + 1, &w.out)) != BS_OK)
        return st;
    if ((st = bs_query_sizes(cx, &cx->scratch, expr, &size)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, expr->count, &negated)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, expr->count, &w.parts)) != BS_OK)
        goto done;
    find_signs(expr, size, negated);
    for (int i = 0; i < expr->count; i++) {
        bs_test test = expr->tests[i];

        if (test.kind == BS_TEST_AND || test.kind == BS_TEST_OR)
            put_logic(&w, (test.kind == BS_TEST_AND) != negated[i]);
        else if (test.kind != BS_TEST_NOT)
            put_leaf(&w, test, what, negated[i]);
    }
    if (w.count == 0)
        w.out[w.count++] = (bs_test){(uint8_t)(is_bond(expr) ? BS_TEST_BOND_ANY : BS_TEST_ANY), 0};
    *out = (bs_query_expr){w.out, w.count};
done:
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_query_relax(bs_ctx *cx, bs_arena *home, const bs_query *query, unsigned what,
                         bs_query **out)
{
    bs_query *copy;
    bs_status st;

    if ((st = bs_query_copy(cx, home, query, &copy)) != BS_OK)
        return st;
    copy->text = NULL;
    for (int i = 0; i < copy->atom_count; i++) {
        bs_query_atom *atom = &copy->atoms[i];

        if ((st = bs_query_relax_expr(cx, home, &atom->expr, what, &atom->expr)) != BS_OK)
            return st;
        if (what & BS_RELAX_CHIRAL)
            atom->around_count = 0;
    }
    for (int i = 0; i < copy->bond_count; i++) {
        bs_query_expr *expr = &copy->bonds[i].expr;

        if ((st = bs_query_relax_expr(cx, home, expr, what, expr)) != BS_OK)
            return st;
    }
    *out = copy;
    return BS_OK;
}
