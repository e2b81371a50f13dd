/*
 * Values kept up to date, against Knuth's algorithm from scratch (cheapest.h), which is checked
 * against outside data in test_kbest.c.
 */
#include "support/check.h"

#include <math.h>

#include "search/cheapest.h"
#include "search/value.h"

#define MOST 60

static uint32_t draw(uint64_t *seed, uint32_t below)
{
    *seed = *seed * 6364136223846793005u + 1442695040888963407u;
    return (uint32_t)(*seed >> 33) % below;
}

static void add_step(fixture *f, bs_graph *graph, uint64_t *seed)
{
    static const double yields[] = {1, 1, 0.5, 0.8};
    uint32_t n = graph->mol_count, count = 1 + draw(seed, 2), made;
    uint32_t a = draw(seed, n), b = (a + 1 + draw(seed, n - 1)) % n;
    bs_graph_part parts[] = {{a, 1}, {b, 1 + 0.5 * draw(seed, 2)}};

    check_ok(f, bs_graph__add_way(graph, draw(seed, n), BS_GRAPH_NONE, parts, count,
                                  draw(seed, 4), yields[draw(seed, 4)], 0, &made));
}

static void compare(fixture *f, const bs_values *values, const double *leaf, int round)
{
    bs_cheapest fresh;

    check_ok(f, bs_cheapest__init(&fresh, values->graph, values->mode));
    check_ok(f, bs_cheapest__run(&fresh, leaf, BS_GRAPH_NONE));
    for (uint32_t m = 0; m < values->graph->mol_count; m++) {
        double have = values->items[m].value, want = fresh.value[m];

        if (!(have == want || fabs(have - want) <= 1e-9 * fmax(1, want)))
            fail_msg("round %d: molecule %u is worth %.12g, not %.12g", round, m, have, want);
        if (values->items[m].choice < BS_GRAPH_BUY)
            assert_true(bs_values__cost(values, values->items[m].choice) == have);
    }
    bs_cheapest__free(&fresh);
}

/*
 * Molecules and steps are added and leaves become cheaper, dearer and gone, in circles that cost
 * nothing, too.
 */
static void values__are_those_of_a_fresh_run(void **state)
{
    fixture *f = *state;
    uint64_t seed = 42;

    for (int trial = 0; trial < 60; trial++) {
        bs_graph graph;
        bs_values values;
        double leaf[MOST];
        uint32_t made;

        bs_graph__init(&graph, &f->cx);
        bs_values__init(&values, &graph, trial % 2 ? BS_COST_ADDITIVE : BS_COST_PER_MOLE, false);
        for (int round = 0; round < 40; round++) {
            for (uint32_t i = draw(&seed, 4); i > 0 && graph.mol_count < MOST; i--) {
                leaf[graph.mol_count] = draw(&seed, 3) ? INFINITY : draw(&seed, 20);
                check_ok(f, bs_graph__add_mol(&graph, leaf[graph.mol_count], &made));
            }
            for (uint32_t i = draw(&seed, 8); i > 0 && graph.mol_count > 2; i--)
                add_step(f, &graph, &seed);
            check_ok(f, bs_values__grow(&values));
            for (uint32_t i = draw(&seed, 4); i > 0 && graph.mol_count > 0; i--) {
                uint32_t m = draw(&seed, graph.mol_count);

                leaf[m] = draw(&seed, 2) ? INFINITY : draw(&seed, 20);
                check_ok(f, bs_values__set_leaf(&values, m, leaf[m]));
            }
            check_ok(f, bs_values__settle(&values));
            compare(f, &values, leaf, round);
        }
        bs_values__free(&values);
        bs_graph__free(&graph);
    }
}

/* A change at the bottom of one branch is not told to another. */
static void values__only_what_changes_is_looked_at(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    bs_values values;
    uint64_t before;
    uint32_t made;

    bs_graph__init(&graph, &f->cx);
    bs_values__init(&values, &graph, BS_COST_ADDITIVE, false);
    for (uint32_t m = 0; m <= 1023; m++)
        check_ok(f, bs_graph__add_mol(&graph, m > 511 ? m : INFINITY, &made));
    for (uint32_t m = 1; m <= 511; m++) {
        bs_graph_part parts[] = {{2 * m, 1}, {2 * m + 1, 1}};

        check_ok(f, bs_graph__add_way(&graph, m, BS_GRAPH_NONE, parts, 2, 1, 1, 0, &made));
    }
    check_ok(f, bs_values__grow(&values));
    check_ok(f, bs_values__settle(&values));
    before = values.spread;
    check_ok(f, bs_values__set_leaf(&values, 700, 5));
    check_ok(f, bs_values__settle(&values));
    assert_int_equal(values.spread - before, 10); /* 700, 350, 175 ... 1: the path to the root */
    before = values.spread;
    check_ok(f, bs_values__set_leaf(&values, 700, 9));
    check_ok(f, bs_values__settle(&values));
    assert_int_equal(values.spread - before, 20); /* each is taken back and set anew */
    bs_values__free(&values);
    bs_graph__free(&graph);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(values__are_those_of_a_fresh_run),
        check_case(values__only_what_changes_is_looked_at),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
