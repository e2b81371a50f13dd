/* Facts out of the post-order trees of match/query.h. */
#include "rule/expr.h"

#include "backsaw/draft.h"

static const bs_facts no_facts = {BS_UNSAID, BS_UNSAID, BS_UNSAID, BS_UNSAID,
                                 BS_UNSAID, BS_UNSAID, BS_UNSAID};
static const bs_bond_facts no_bond_facts = {BS_UNSAID, BS_UNSAID, BS_UNSAID};

/* In a conjunction the side that says something is heard; the first one if both do. */
static int heard(int a, int b)
{
    return a != BS_UNSAID ? a : b;
}

/* In a choice only what both sides say. */
static int agreed(int a, int b)
{
    return a == b ? a : BS_UNSAID;
}

static bs_facts leaf_facts(const bs_test *test)
{
    bs_facts f = no_facts;

    switch (test->kind) {
    case BS_TEST_ELEMENT:
        f.element = test->value;
        break;
    case BS_TEST_ALIPHATIC_ELEM:
        f.element = test->value;
        f.aromatic = 0;
        break;
    case BS_TEST_AROMATIC_ELEM:
        f.element = test->value;
        f.aromatic = 1;
        break;
    case BS_TEST_ALIPHATIC:
        f.aromatic = 0;
        break;
    case BS_TEST_AROMATIC:
        f.aromatic = 1;
        break;
    case BS_TEST_ISOTOPE:
        f.isotope = test->value;
        break;
    case BS_TEST_HYDROGENS:
        f.hydrogens = test->value >= 0 ? test->value : BS_UNSAID;
        break;
    case BS_TEST_CHARGE:
        f.charge = test->value;
        break;
    case BS_TEST_CONNECTIONS:
        f.connections = test->value;
        break;
    case BS_TEST_CHIRAL:
        f.mark = test->value > 2 ? test->value - 2 : test->value;
        break;
    default:
        break;
    }
    return f;
}

static bs_facts join_facts(bs_facts a, bs_facts b, int (*join)(int, int))
{
    return (bs_facts){.element = join(a.element, b.element),
                      .aromatic = join(a.aromatic, b.aromatic),
                      .charge = join(a.charge, b.charge),
                      .hydrogens = join(a.hydrogens, b.hydrogens),
                      .isotope = join(a.isotope, b.isotope),
                      .mark = join(a.mark, b.mark),
                      .connections = join(a.connections, b.connections)};
}

bs_status bs_expr__atom_facts(bs_ctx *cx, const bs_query_expr *expr, bs_facts *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_facts *stack;
    int top = 0;
    bs_status st = bs_new(cx, &cx->scratch, expr->count + 1, &stack);

    *out = no_facts;
    if (st != BS_OK)
        return st;
    for (int i = 0; i < expr->count; i++) {
        const bs_test *test = &expr->tests[i];

        if (test->kind == BS_TEST_NOT && top > 0) {
            stack[top - 1] = no_facts;
        } else if ((test->kind == BS_TEST_AND || test->kind == BS_TEST_OR) && top > 1) {
            stack[top - 2] = join_facts(stack[top - 2], stack[top - 1],
                                        test->kind == BS_TEST_AND ? heard : agreed);
            top--;
        } else {
            stack[top++] = leaf_facts(test);
        }
    }
    if (top > 0)
        *out = stack[top - 1];
    bs_arena_rewind(&cx->scratch, temp);
    return BS_OK;
}

static bs_bond_facts bond_leaf(const bs_test *test)
{
    bs_bond_facts f = no_bond_facts;

    switch (test->kind) {
    case BS_TEST_BOND_SINGLE:
        f.order = 1;
        break;
    case BS_TEST_BOND_DOUBLE:
        f.order = 2;
        break;
    case BS_TEST_BOND_TRIPLE:
        f.order = 3;
        break;
    case BS_TEST_BOND_QUADRUPLE:
        f.order = 4;
        break;
    case BS_TEST_BOND_AROMATIC:
        f.order = BS_DRAFT_ORDER_AROMATIC;
        break;
    case BS_TEST_BOND_UP:
    case BS_TEST_BOND_DOWN:
        f.order = 1;
        f.slope = test->kind == BS_TEST_BOND_UP ? 1 : -1;
        break;
    case BS_TEST_BOND_DEFAULT:
        f.order = BS_ORDER_DEFAULT;
        break;
    case BS_TEST_BOND_RING:
        f.ring = 1;
        break;
    default:
        break;
    }
    return f;
}

static bs_bond_facts join_bond(bs_bond_facts a, bs_bond_facts b, int (*join)(int, int))
{
    return (bs_bond_facts){join(a.order, b.order), join(a.slope, b.slope), join(a.ring, b.ring)};
}

static bs_bond_facts opposite(bs_bond_facts f)
{
    bs_bond_facts g = no_bond_facts;

    if (f.ring != BS_UNSAID && f.order == BS_UNSAID)
        g.ring = !f.ring;
    return g;
}

bs_status bs_expr__bond_facts(bs_ctx *cx, const bs_query_expr *expr, bs_bond_facts *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_bond_facts *stack;
    int top = 0;
    bs_status st = bs_new(cx, &cx->scratch, expr->count + 1, &stack);

    *out = no_bond_facts;
    if (st != BS_OK)
        return st;
    for (int i = 0; i < expr->count; i++) {
        const bs_test *test = &expr->tests[i];

        if (test->kind == BS_TEST_NOT && top > 0) {
            stack[top - 1] = opposite(stack[top - 1]);
        } else if ((test->kind == BS_TEST_AND || test->kind == BS_TEST_OR) && top > 1) {
            stack[top - 2] = join_bond(stack[top - 2], stack[top - 1],
                                       test->kind == BS_TEST_AND ? heard : agreed);
            top--;
        } else {
            stack[top++] = bond_leaf(test);
        }
    }
    if (top > 0)
        *out = stack[top - 1];
    bs_arena_rewind(&cx->scratch, temp);
    return BS_OK;
}
