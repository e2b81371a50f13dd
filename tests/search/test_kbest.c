/*
 * The cheapest routes in order: against search.json (hypergraphs with their ten cheapest routes,
 * worked out by brute force outside the project; tests/data/checks), and against a brute force
 * written here.
 */
#include "support/check.h"

#include <jansson.h>
#include <math.h>
#include <stdlib.h>
#include <string.h>

#include "search/kbest.h"

#define NEAR 1e-9

static bool near(double a, double b)
{
    return fabs(a - b) <= NEAR * fmax(1, fmax(fabs(a), fabs(b)));
}

/* ---- search.json ----------------------------------------------------------------------- */

static uint32_t number_of(json_t *molecules, const char *name)
{
    const char *key;
    json_t *value;
    uint32_t at = 0;

    json_object_foreach(molecules, key, value) {
        if (strcmp(key, name) == 0)
            return at;
        at++;
    }
    fail_msg("no molecule %s", name);
    return 0;
}

static void load(fixture *f, json_t *entry, bs_graph *graph, uint32_t *target)
{
    json_t *molecules = json_object_get(entry, "molecules"), *value, *step;
    const char *key;
    uint32_t made;
    size_t i, j;

    json_object_foreach(molecules, key, value) {
        json_t *price = json_object_get(value, "price");

        check_ok(f, bs_graph__add_mol(graph, price ? json_number_value(price) : INFINITY, &made));
    }
    *target = number_of(molecules, json_string_value(json_object_get(entry, "target")));
    json_array_foreach(json_object_get(entry, "steps"), i, step) {
        json_t *precursors = json_object_get(step, "precursors"), *p;
        bs_graph_part parts[8];

        json_array_foreach(precursors, j, p) {
            parts[j].mol =
                number_of(molecules, json_string_value(json_object_get(p, "molecule")));
            parts[j].equivalents = json_number_value(json_object_get(p, "equivalents"));
        }
        check_ok(f, bs_graph__add_way(
                        graph,
                        number_of(molecules, json_string_value(json_object_get(step, "product"))),
                        BS_GRAPH_NONE, parts, (uint32_t)json_array_size(precursors),
                        json_number_value(json_object_get(step, "cost")),
                        json_number_value(json_object_get(step, "yield")), (uint32_t)i, &made));
    }
}

/* Whether the ways of a route are the steps that the check names. */
static bool same_steps(json_t *entry, const bs_graph *graph, const bs_kbest_route *route,
                       json_t *names)
{
    json_t *steps = json_object_get(entry, "steps");
    uint32_t hit = 0;

    if (json_array_size(names) != route->count)
        return false;
    for (uint32_t i = 0; i < route->count; i++) {
        json_t *step = json_array_get(steps, graph->ways[route->ways[i]].tag), *name;
        size_t j;

        json_array_foreach(names, j, name) {
            hit += strcmp(json_string_value(name),
                          json_string_value(json_object_get(step, "id"))) == 0;
        }
    }
    return hit == route->count;
}

static void check_graph(fixture *f, json_t *entry, bs_cost_mode mode, const char *mode_name)
{
    const char *name = json_string_value(json_object_get(entry, "name"));
    json_t *expect = json_object_get(entry, "expect");
    json_t *costs = json_object_get(json_object_get(expect, mode_name), "routes");
    json_t *sets = json_object_get(json_object_get(expect, mode_name), "steps_of_routes");
    size_t total = (size_t)json_integer_value(json_object_get(expect, "route_count")), found = 0;
    double last = 0;
    bs_kbest *kbest;
    bs_graph graph;
    uint32_t target;

    bs_graph__init(&graph, &f->cx);
    load(f, entry, &graph, &target);
    assert_int_equal(graph.superior, json_is_true(json_object_get(expect, "superior")));
    check_ok(f, bs_kbest__new(&graph, mode, target, NULL, &kbest));
    for (bool more = true; more;) {
        bs_kbest_route route;

        check_ok(f, bs_kbest__next(kbest, &more, &route));
        if (!more)
            break;
        if (route.cost < last && !near(route.cost, last))
            fail_msg("%s, %s: route %zu costs less than the one before", name, mode_name, found);
        last = route.cost;
        if (found < json_array_size(costs)) {
            double want = json_number_value(json_array_get(costs, found));
            double before = found ? json_number_value(json_array_get(costs, found - 1)) : -1;
            double after = found + 1 < json_array_size(costs)
                               ? json_number_value(json_array_get(costs, found + 1))
                               : want;

            if (!near(route.cost, want))
                fail_msg("%s, %s: route %zu costs %.12g, not %.12g", name, mode_name, found,
                         route.cost, want);
            if (!near(before, want) && !near(after, want))
                assert_true(same_steps(entry, &graph, &route, json_array_get(sets, found)));
        }
        found++;
    }
    if (found != total)
        fail_msg("%s, %s: %zu routes, not %zu", name, mode_name, found, total);
    assert_false(bs_kbest__cut(kbest));
    bs_kbest__free(kbest);
    bs_graph__free(&graph);
}

static void kbest__the_check_graphs(void **state)
{
    fixture *f = *state;
    json_error_t error;
    json_t *root = json_load_file(BACKSAW_TEST_DATA "/checks/search.json", 0, &error), *entry;
    size_t i;

    assert_non_null(root);
    assert_int_equal(json_array_size(json_object_get(root, "graphs")), 40);
    json_array_foreach(json_object_get(root, "graphs"), i, entry) {
        check_graph(f, entry, BS_COST_ADDITIVE, "additive");
        check_graph(f, entry, BS_COST_PER_MOLE, "per_mole");
    }
    json_decref(root);
}

/* ---- Brute force ------------------------------------------------------------------------- */

#define MOST_MOLS 7
#define MOST_FOUND 20000

typedef struct brute {
    const bs_graph *graph;
    bs_cost_mode mode;
    uint32_t target;
    uint32_t choice[MOST_MOLS]; /* BS_GRAPH_NONE: not decided */
    double *costs;
    size_t count;
} brute;

/* Marks what the decisions need; returns a needed molecule without decision, or none. */
static uint32_t undecided(const brute *b, bool *needed)
{
    memset(needed, 0, MOST_MOLS);
    needed[b->target] = true;
    for (uint32_t round = 0; round < b->graph->mol_count; round++) {
        for (uint32_t m = 0; m < b->graph->mol_count; m++) {
            if (!needed[m] || b->choice[m] >= BS_GRAPH_BUY)
                continue;
            for (uint32_t i = 0; i < b->graph->ways[b->choice[m]].count; i++)
                needed[b->graph->uses[b->graph->ways[b->choice[m]].first + i].mol] = true;
        }
    }
    for (uint32_t m = 0; m < b->graph->mol_count; m++) {
        if (needed[m] && b->choice[m] == BS_GRAPH_NONE)
            return m;
    }
    return BS_GRAPH_NONE;
}

/* Cost of the target by the decisions, or infinity if they run in a circle. */
static double cost_of(const brute *b, const bool *needed)
{
    double value[MOST_MOLS];

    for (uint32_t m = 0; m < b->graph->mol_count; m++)
        value[m] = b->choice[m] == BS_GRAPH_BUY ? b->graph->mols[m].price : INFINITY;
    for (uint32_t round = 0; round < b->graph->mol_count; round++) {
        for (uint32_t m = 0; m < b->graph->mol_count; m++) {
            const bs_graph_way *way;
            double sum;

            if (!needed[m] || b->choice[m] >= BS_GRAPH_BUY)
                continue;
            way = &b->graph->ways[b->choice[m]];
            sum = way->cost;
            for (uint32_t i = 0; i < way->count; i++) {
                const bs_graph_use *use = &b->graph->uses[way->first + i];

                sum += value[use->mol] * (b->mode == BS_COST_ADDITIVE ? 1 : use->equivalents);
            }
            value[m] = b->mode == BS_COST_ADDITIVE ? sum : sum / way->yield;
        }
    }
    for (uint32_t m = 0; m < b->graph->mol_count; m++) {
        if (needed[m] && isinf(value[m]))
            return INFINITY;
    }
    return value[b->target];
}

static void enumerate(brute *b)
{
    bool needed[MOST_MOLS];
    uint32_t m = undecided(b, needed);

    if (m == BS_GRAPH_NONE) {
        double cost = cost_of(b, needed);

        assert_true(b->count < MOST_FOUND);
        if (isfinite(cost))
            b->costs[b->count++] = cost;
        return;
    }
    if (isfinite(b->graph->mols[m].price)) {
        b->choice[m] = BS_GRAPH_BUY;
        enumerate(b);
    }
    for (uint32_t w = b->graph->mols[m].first_way; w != BS_GRAPH_NONE;
         w = b->graph->ways[w].next) {
        b->choice[m] = w;
        enumerate(b);
    }
    b->choice[m] = BS_GRAPH_NONE;
}

static int by_cost(const void *a, const void *b)
{
    double x = *(const double *)a, y = *(const double *)b;

    return (x > y) - (x < y);
}

static uint32_t draw(uint64_t *seed, uint32_t below)
{
    *seed = *seed * 6364136223846793005u + 1442695040888963407u;
    return (uint32_t)(*seed >> 33) % below;
}

/* Few distinct numbers, so that ties, free compounds and split compounds are common. */
static void draw_graph(fixture *f, bs_graph *graph, uint64_t *seed, bool split)
{
    static const double yields[] = {1, 0.5, 0.9, 0.8};
    uint32_t mols = 2 + draw(seed, MOST_MOLS - 1), steps = 1 + draw(seed, 10), made;

    for (uint32_t m = 0; m < mols; m++) {
        bool sold = draw(seed, 5) < (m == 0 ? 1u : 2u);

        check_ok(f, bs_graph__add_mol(graph, sold ? draw(seed, 8) : INFINITY, &made));
    }
    for (uint32_t s = 0; s < steps; s++) {
        bs_graph_part parts[3];
        uint32_t count = 0, wanted = 1 + draw(seed, 3);

        for (uint32_t i = 0; i < wanted; i++) {
            uint32_t m = draw(seed, mols), j = 0;

            while (j < count && parts[j].mol != m)
                j++;
            if (j == count)
                parts[count++] = (bs_graph_part){
                    m, split && draw(seed, 4) == 0 ? 0.3 : 1 + 0.5 * draw(seed, 2)};
        }
        check_ok(f, bs_graph__add_way(graph, draw(seed, mols), BS_GRAPH_NONE, parts, count,
                                      draw(seed, 6), yields[draw(seed, 4)], s, &made));
    }
}

static void check_against_brute_force(fixture *f, const bs_graph *graph, bs_cost_mode mode,
                                      int trial, double *costs)
{
    brute b = {.graph = graph, .mode = mode, .costs = costs};
    bs_kbest_limits narrow = {.first_ring = 1 + (uint32_t)trial % 5};
    bs_kbest *kbest;
    size_t found = 0;

    for (uint32_t m = 0; m < MOST_MOLS; m++)
        b.choice[m] = BS_GRAPH_NONE;
    enumerate(&b);
    qsort(costs, b.count, sizeof *costs, by_cost);
    check_ok(f, bs_kbest__new(graph, mode, 0, trial % 3 ? &narrow : NULL, &kbest));
    for (bool more = true; more; found += more) {
        bs_kbest_route route;

        check_ok(f, bs_kbest__next(kbest, &more, &route));
        if (!more)
            break;
        if (found >= b.count || !near(route.cost, costs[found]))
            fail_msg("trial %d: route %zu of %zu costs %.12g, not %.12g", trial, found, b.count,
                     route.cost, found < b.count ? costs[found] : -1);
    }
    if (found != b.count)
        fail_msg("trial %d: %zu routes, not %zu", trial, found, b.count);
    assert_false(bs_kbest__cut(kbest));
    bs_kbest__free(kbest);
}

static void kbest__random_graphs_against_brute_force(void **state)
{
    fixture *f = *state;
    double *costs = malloc(MOST_FOUND * sizeof *costs);
    uint64_t seed = 20260101;
    int split_seen = 0;

    assert_non_null(costs);
    for (int trial = 0; trial < 2000; trial++) {
        bs_graph graph;

        bs_graph__init(&graph, &f->cx);
        draw_graph(f, &graph, &seed, trial % 2);
        split_seen += !graph.superior;
        check_against_brute_force(f, &graph, BS_COST_PER_MOLE, trial, costs);
        check_against_brute_force(f, &graph, BS_COST_ADDITIVE, trial, costs);
        bs_graph__free(&graph);
    }
    assert_true(split_seen > 500);
    free(costs);
}

/* ---- Rings -------------------------------------------------------------------------------- */

#define RING_MOLS 40
#define RING_ROUTES 60

/* A graph too large for brute force: several ways to each molecule, circles, many sold. */
static void draw_wide_graph(fixture *f, bs_graph *graph, uint64_t *seed, bool split)
{
    uint32_t made;

    for (uint32_t m = 0; m < RING_MOLS; m++) {
        bool sold = m > 0 && draw(seed, 3) == 0;

        check_ok(f, bs_graph__add_mol(graph, sold ? draw(seed, 1000) : INFINITY, &made));
    }
    for (uint32_t s = 0; s < 4 * RING_MOLS; s++) {
        uint32_t product = draw(seed, RING_MOLS), a = draw(seed, RING_MOLS);
        uint32_t b = (a + 1 + draw(seed, RING_MOLS - 1)) % RING_MOLS;
        bs_graph_part parts[] = {{a, split && draw(seed, 10) == 0 ? 0.4 : 1}, {b, 1.2}};

        check_ok(f, bs_graph__add_way(graph, product, BS_GRAPH_NONE, parts, 1 + draw(seed, 2),
                                      draw(seed, 100), 0.6 + 0.1 * draw(seed, 5), s, &made));
    }
}

static int take_costs(fixture *f, const bs_graph *graph, uint32_t first_ring, double *costs)
{
    bs_kbest_limits limits = {.first_ring = first_ring};
    bs_kbest *kbest;
    int count = 0;

    check_ok(f, bs_kbest__new(graph, BS_COST_PER_MOLE, 0, &limits, &kbest));
    while (count < RING_ROUTES) {
        bs_kbest_route route;
        bool more;

        check_ok(f, bs_kbest__next(kbest, &more, &route));
        if (!more)
            break;
        costs[count++] = route.cost;
    }
    assert_false(bs_kbest__cut(kbest));
    bs_kbest__free(kbest);
    return count;
}

/* The size of the first ring must not show; 1000 ways hold the whole graph. */
static void kbest__rings_do_not_show(void **state)
{
    fixture *f = *state;
    uint64_t seed = 7;
    int full = 0;

    for (int trial = 0; trial < 200; trial++) {
        double small[RING_ROUTES], large[RING_ROUTES];
        bs_graph graph;
        int count;

        bs_graph__init(&graph, &f->cx);
        draw_wide_graph(f, &graph, &seed, trial % 2);
        count = take_costs(f, &graph, 1000, large);
        assert_int_equal(take_costs(f, &graph, 1 + (uint32_t)trial % 9, small), count);
        for (int i = 0; i < count; i++) {
            if (!near(small[i], large[i]))
                fail_msg("trial %d: route %d costs %.12g and %.12g", trial, i, small[i], large[i]);
        }
        full += count == RING_ROUTES;
        bs_graph__free(&graph);
    }
    assert_true(full > 100);
}

/* ---- The rest ------------------------------------------------------------------------------ */

/* A graph in which t is made from a by two ways of one step, and a is sold. */
static void two_ways(fixture *f, bs_graph *graph, bool one_step)
{
    bs_graph_part part = {1, 1};
    uint32_t made, way;

    check_ok(f, bs_graph__add_mol(graph, INFINITY, &made));
    check_ok(f, bs_graph__add_mol(graph, 1, &made));
    check_ok(f, bs_graph__add_way(graph, 0, BS_GRAPH_NONE, &part, 1, 9, 1, 0, &way));
    check_ok(f, bs_graph__add_way(graph, 0, one_step ? 0 : BS_GRAPH_NONE, &part, 1, 4, 1, 1, &way));
}

static int count_routes(fixture *f, const bs_graph *graph, long solves, double *first, bool *cut)
{
    bs_kbest_limits limits = {.solves = solves};
    bs_kbest *kbest;
    int count = 0;

    check_ok(f, bs_kbest__new(graph, BS_COST_PER_MOLE, 0, &limits, &kbest));
    for (;;) {
        bs_kbest_route route;
        bool more;

        check_ok(f, bs_kbest__next(kbest, &more, &route));
        if (!more)
            break;
        if (count++ == 0)
            *first = route.cost;
    }
    *cut = bs_kbest__cut(kbest);
    bs_kbest__free(kbest);
    return count;
}

static void kbest__ways_of_one_step_are_one_route(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    double first = 0;
    bool cut;

    for (int one_step = 0; one_step < 2; one_step++) {
        bs_graph__init(&graph, &f->cx);
        two_ways(f, &graph, one_step);
        assert_int_equal(count_routes(f, &graph, 0, &first, &cut), one_step ? 1 : 2);
        assert_float_equal(first, 5, 1e-12);
        assert_false(cut);
        bs_graph__free(&graph);
    }
}

static void kbest__a_spent_budget_and_a_stop_are_told(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    double first = 0;
    bool cut;

    bs_graph__init(&graph, &f->cx);
    two_ways(f, &graph, false);
    assert_int_equal(count_routes(f, &graph, 1, &first, &cut), 1);
    assert_true(cut);
    atomic_store(f->cx.stop, true);
    assert_int_equal(count_routes(f, &graph, 0, &first, &cut), 0);
    assert_true(cut);
    bs_graph__free(&graph);
}

static void kbest__every_failed_allocation_leaks_nothing(void **state)
{
    fixture *f = *state;
    bs_graph graph;
    bs_status st = BS_ENOMEM;

    bs_graph__init(&graph, &f->cx);
    two_ways(f, &graph, false);
    for (long allowed = 0; st == BS_ENOMEM; allowed++) {
        size_t used = atomic_load(&f->cx.own_gate.used);
        bs_kbest *kbest = NULL;
        bs_kbest_route route;
        bool more = true;

        atomic_store(&f->cx.own_gate.fail_after, allowed);
        st = bs_kbest__new(&graph, BS_COST_PER_MOLE, 0, NULL, &kbest);
        while (st == BS_OK && more)
            st = bs_kbest__next(kbest, &more, &route);
        bs_kbest__free(kbest);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        assert_int_equal(f->cx.scratch.live, 0);
        if (f->cx.scratch.top == NULL)
            assert_int_equal(atomic_load(&f->cx.own_gate.used), used);
        assert_true(allowed < 1000);
    }
    assert_int_equal(st, BS_OK);
    bs_graph__free(&graph);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(kbest__the_check_graphs),
        check_case(kbest__random_graphs_against_brute_force),
        check_case(kbest__rings_do_not_show),
        check_case(kbest__ways_of_one_step_are_one_route),
        check_case(kbest__a_spent_budget_and_a_stop_are_told),
        check_case(kbest__every_failed_allocation_leaks_nothing),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
