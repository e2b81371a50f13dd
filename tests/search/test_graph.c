/* The hypergraph kernel and the cheapest way to have each molecule. */
#include "support/check.h"

#include <math.h>

#include "search/cheapest.h"

static uint32_t mol(fixture *f, bs_graph *graph, double price)
{
    uint32_t made = 0;

    check_ok(f, bs_graph__add_mol(graph, price, &made));
    return made;
}

/* Adds a step with one or two precursors, one equivalent each; b may be BS_GRAPH_NONE. */
static uint32_t step(fixture *f, bs_graph *graph, uint32_t product, uint32_t a, uint32_t b,
                     double cost, double yield)
{
    bs_graph_part parts[2] = {{a, 1}, {b, 1}};
    uint32_t way = 0;

    check_ok(f, bs_graph__add_way(graph, product, BS_GRAPH_NONE, parts, b == BS_GRAPH_NONE ? 1 : 2,
                                  cost, yield, 0, &way));
    return way;
}

static double cheapest(fixture *f, const bs_graph *graph, bs_cost_mode mode, uint32_t target)
{
    bs_cheapest work;
    double value;

    check_ok(f, bs_cheapest__init(&work, graph, mode));
    check_ok(f, bs_cheapest__run(&work, NULL, BS_GRAPH_NONE));
    assert_true(work.converged);
    value = work.value[target];
    bs_cheapest__free(&work);
    return value;
}

static void way__bad_numbers_are_refused(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    bs_graph_part part;
    uint32_t t, way;

    bs_graph__init(&graph, &f->cx);
    t = mol(f, &graph, INFINITY);
    part = (bs_graph_part){mol(f, &graph, 1), 1};
    assert_int_equal(bs_graph__add_way(&graph, t, BS_GRAPH_NONE, &part, 1, -1, 1, 0, &way),
                     BS_EVALUE);
    assert_int_equal(bs_graph__add_way(&graph, t, BS_GRAPH_NONE, &part, 1, 1, 0, 0, &way),
                     BS_EVALUE);
    assert_int_equal(bs_graph__add_way(&graph, t, BS_GRAPH_NONE, &part, 1, NAN, 1, 0, &way),
                     BS_EVALUE);
    assert_int_equal(bs_graph__add_way(&graph, t, BS_GRAPH_NONE, &part, 0, 1, 1, 0, &way),
                     BS_EVALUE);
    part.equivalents = 0;
    assert_int_equal(bs_graph__add_way(&graph, t, BS_GRAPH_NONE, &part, 1, 1, 1, 0, &way),
                     BS_EVALUE);
    assert_int_equal(graph.way_count, 0);
    assert_int_equal(graph.step_count, 0);
    assert_int_equal(bs_graph__add_mol(&graph, -1, &t), BS_EVALUE);
    bs_graph__free(&graph);
}

/* (10 + 2 + 5) / 0.5 = 34; without yield 17. */
static void cheapest__counts_yield_per_mole_only(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    uint32_t t, a, b;

    bs_graph__init(&graph, &f->cx);
    t = mol(f, &graph, INFINITY);
    a = mol(f, &graph, 2);
    b = mol(f, &graph, 5);
    step(f, &graph, t, a, b, 10, 0.5);
    assert_float_equal(cheapest(f, &graph, BS_COST_PER_MOLE, t), 34, 1e-12);
    assert_float_equal(cheapest(f, &graph, BS_COST_ADDITIVE, t), 17, 1e-12);
    bs_graph__free(&graph);
}

static void cheapest__circle_without_offer_cannot_be_had(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    uint32_t a, b;

    bs_graph__init(&graph, &f->cx);
    a = mol(f, &graph, INFINITY);
    b = mol(f, &graph, INFINITY);
    step(f, &graph, a, b, BS_GRAPH_NONE, 0, 1);
    step(f, &graph, b, a, BS_GRAPH_NONE, 0, 1);
    assert_true(isinf(cheapest(f, &graph, BS_COST_PER_MOLE, a)));
    bs_graph__free(&graph);
}

static void cheapest__the_cheaper_of_buying_and_making(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    uint32_t t, a, b;

    bs_graph__init(&graph, &f->cx);
    t = mol(f, &graph, INFINITY);
    a = mol(f, &graph, 100);
    b = mol(f, &graph, 1);
    step(f, &graph, t, a, BS_GRAPH_NONE, 0, 1);
    step(f, &graph, a, b, BS_GRAPH_NONE, 9, 1);
    assert_float_equal(cheapest(f, &graph, BS_COST_PER_MOLE, t), 10, 1e-12);
    bs_graph__free(&graph);
}

/* Half a mole of a is enough for a mole of b: b is cheaper than a though it is made of it. */
static void cheapest__a_split_compound_is_settled_again(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    bs_graph_part half;
    uint32_t t, a, b, way;

    bs_graph__init(&graph, &f->cx);
    t = mol(f, &graph, INFINITY);
    a = mol(f, &graph, 10);
    b = mol(f, &graph, 8);
    half = (bs_graph_part){a, 0.5};
    check_ok(f, bs_graph__add_way(&graph, b, BS_GRAPH_NONE, &half, 1, 1, 1, 0, &way));
    step(f, &graph, t, b, BS_GRAPH_NONE, 1, 1);
    assert_false(bs_graph__is_superior(&graph, BS_COST_PER_MOLE));
    assert_true(bs_graph__is_superior(&graph, BS_COST_ADDITIVE));
    assert_float_equal(cheapest(f, &graph, BS_COST_PER_MOLE, t), 7, 1e-12);
    bs_graph__free(&graph);
}

static void graph__memory_that_runs_out_is_reported(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    uint32_t made;

    bs_graph__init(&graph, &f->cx);
    atomic_store(&f->cx.own_gate.fail_after, 0);
    assert_int_equal(bs_graph__add_mol(&graph, 1, &made), BS_ENOMEM);
    atomic_store(&f->cx.own_gate.fail_after, -1);
    assert_int_equal(graph.mol_count, 0);
    bs_graph__free(&graph);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(way__bad_numbers_are_refused),
        check_case(cheapest__counts_yield_per_mole_only),
        check_case(cheapest__circle_without_offer_cannot_be_had),
        check_case(cheapest__the_cheaper_of_buying_and_making),
        check_case(cheapest__a_split_compound_is_settled_again),
        check_case(graph__memory_that_runs_out_is_reported),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
