/*
 * The route value: order, costs, amounts, measures, text. Yields and amounts of the four-piece
 * trees come from the check data yields.json ("four pieces, linear" and "convergent").
 */
#include "support/check.h"

#include <math.h>
#include <string.h>

#include "backsaw/route.h"

static double ones[] = {1, 1, 1};

static bs_route_molecule sold(const char *smiles, double price)
{
    return (bs_route_molecule){.smiles = smiles, .price = price, .offer = {.price_per_gram = -1}};
}

static bs_route_way way(const char *name, double cost, double yield)
{
    return (bs_route_way){
        .transform = name, .rule = -1, .cost = cost, .yield = yield, .equivalents = ones};
}

static bs_route_step step(int product, int *precursors, int count, bs_route_way *ways)
{
    return (bs_route_step){.product = product,
                           .precursors = precursors,
                           .precursor_count = count,
                           .ways = ways,
                           .way_count = 1,
                           .known = true};
}

/* a + b -> ab, ab + c -> abc, abc + d -> target; 80 % each; given in the wrong order. */
static bs_status linear(fixture *f, bs_route **route)
{
    bs_route_molecule mols[] = {sold("A", 1), sold("B", 1), sold("C", 1),  sold("D", 1),
                                sold("AB", -1), sold("ABC", -1), sold("T", -1)};
    int last[] = {5, 3}, first[] = {0, 1}, middle[] = {4, 2};
    bs_route_way ways[] = {way("one", 10, 80), way("two", 10, 80), way("three", 10, 80)};
    bs_route_step steps[] = {step(6, last, 2, &ways[2]), step(4, first, 2, &ways[0]),
                             step(5, middle, 2, &ways[1])};

    return bs_route_build(&f->cx, &f->home, BS_COST_PER_MOLE, mols, 7, steps, 3, 6, route);
}

static void build__puts_steps_in_bench_order(void **state)
{
    fixture *f = *state;
    bs_route *route;

    check_ok(f, linear(f, &route));
    assert_int_equal(route->step_count, 3);
    assert_string_equal(route->steps[0].ways[0].transform, "one");
    assert_string_equal(route->steps[1].ways[0].transform, "two");
    assert_string_equal(route->steps[2].ways[0].transform, "three");
    assert_string_equal(route->molecules[0].smiles, "T");
    assert_int_equal(route->molecules[0].step, 2);
    assert_false(route->molecules[0].bought);
    assert_string_equal(route->molecules[1].smiles, "ABC");
    assert_string_equal(route->molecules[2].smiles, "D");
    assert_true(route->molecules[2].bought);
}

/* By hand: AB (1 + 1 + 10) / 0.8 = 15; ABC (15 + 1 + 10) / 0.8 = 32.5; T (32.5 + 1 + 10) / 0.8. */
static void build__works_out_costs_and_amounts(void **state)
{
    fixture *f = *state;
    bs_route *route;
    const struct { const char *smiles; double moles; } want[] = {
        {"A", 1.953125}, {"B", 1.953125}, {"C", 1.5625}, {"D", 1.25}, {"T", 1}};

    check_ok(f, linear(f, &route));
    assert_float_equal(route->cost, 54.375, 1e-9);
    for (size_t i = 0; i < sizeof want / sizeof *want; i++) {
        int at = 0;

        while (strcmp(route->molecules[at].smiles, want[i].smiles) != 0)
            at++;
        assert_float_equal(route->molecules[at].moles, want[i].moles, 1e-9);
    }
}

static void measure__linear_tree(void **state)
{
    fixture *f = *state;
    bs_route_measures m;
    bs_route *route;

    check_ok(f, linear(f, &route));
    bs_route_measure(route, &m);
    assert_int_equal(m.steps, 3);
    assert_int_equal(m.longest, 3);
    assert_int_equal(m.leaves, 4);
    assert_float_equal(m.runs, 3, 0);
    assert_float_equal(m.yield, 51.2, 1e-9);
    assert_true(m.checked);
}

/* a + b -> ab, c + d -> cd, ab + cd -> target: two in line, 64 %. */
static void measure__convergent_tree(void **state)
{
    fixture *f = *state;
    bs_route_molecule mols[] = {sold("T", -1), sold("AB", -1), sold("CD", -1), sold("A", 1),
                                sold("B", 1),  sold("C", 1),   sold("D", 1)};
    int last[] = {1, 2}, left[] = {3, 4}, right[] = {5, 6};
    bs_route_way ways[] = {way("one", 0, 80), way("two", 0, 80), way("three", 0, 80)};
    bs_route_step steps[] = {step(0, last, 2, &ways[2]), step(1, left, 2, &ways[0]),
                             step(2, right, 2, &ways[1])};
    bs_route_measures m;
    bs_route *route;

    ways[1].yield_low = 60;
    ways[1].yield_high = 90;
    check_ok(f, bs_route_build(&f->cx, &f->home, BS_COST_PER_MOLE, mols, 7, steps, 3, 0, &route));
    bs_route_measure(route, &m);
    assert_int_equal(m.steps, 3);
    assert_int_equal(m.longest, 2);
    assert_float_equal(m.yield, 64, 1e-9);
    assert_float_equal(m.yield_low, 48, 1e-9);  /* the branch at 60 % is the lowest */
    assert_float_equal(m.yield_high, 64, 1e-9); /* the branch at 80 % is */
    for (int i = 0; i < route->molecule_count; i++) {
        if (route->molecules[i].bought)
            assert_float_equal(route->molecules[i].moles, 1.5625, 1e-9);
    }
}

static void build__buying_the_target_has_no_steps(void **state)
{
    fixture *f = *state;
    bs_route_molecule mol = sold("CCO", 4);
    bs_route_measures m;
    bs_route *route;

    check_ok(f, bs_route_build(&f->cx, &f->home, BS_COST_PER_MOLE, &mol, 1, NULL, 0, 0, &route));
    bs_route_measure(route, &m);
    assert_float_equal(route->cost, 4, 0);
    assert_int_equal(m.steps, 0);
    assert_int_equal(m.longest, 0);
    assert_int_equal(m.leaves, 1);
    assert_float_equal(m.yield, 100, 0);
}

static void build__sorts_ways_by_cost(void **state)
{
    fixture *f = *state;
    bs_route_molecule mols[] = {sold("T", -1), sold("A", 1)};
    bs_route_way ways[] = {way("dear", 30, 90), way("cheap", 10, 90), way("poor", 10, 20)};
    int need[] = {1};
    bs_route_step s = step(0, need, 1, ways);
    bs_route *route;

    s.way_count = 3;
    check_ok(f, bs_route_build(&f->cx, &f->home, BS_COST_PER_MOLE, mols, 2, &s, 1, 0, &route));
    assert_string_equal(route->steps[0].ways[0].transform, "cheap");
    assert_string_equal(route->steps[0].ways[1].transform, "dear");
    assert_string_equal(route->steps[0].ways[2].transform, "poor");
    assert_float_equal(route->cost, 11 / 0.9, 1e-9);
}

static void expect_refusal(fixture *f, const bs_route_molecule *mols, int mol_count,
                           const bs_route_step *steps, int step_count, const char *message)
{
    bs_route *route = (bs_route *)f;
    size_t live = f->home.live;

    assert_int_equal(bs_route_build(&f->cx, &f->home, BS_COST_PER_MOLE, mols, mol_count, steps,
                                    step_count, 0, &route),
                     BS_EVALUE);
    assert_null(route);
    assert_int_equal(f->home.live, live);
    assert_string_equal(f->cx.error.message, message);
}

static void build__what_is_no_route_is_refused(void **state)
{
    fixture *f = *state;
    bs_route_molecule mols[] = {sold("T", -1), sold("A", -1), sold("B", 1)};
    bs_route_way w = way("w", 0, 100), bad = way("w", 0, 0);
    int a[] = {1}, b[] = {2}, t[] = {0}, out[] = {9};
    bs_route_step circle[] = {step(0, a, 1, &w), step(1, t, 1, &w)};
    bs_route_step twice[] = {step(0, b, 1, &w), step(0, b, 1, &w)};
    bs_route_step idle[] = {step(0, b, 1, &w), step(1, b, 1, &w)};
    bs_route_step lacking[] = {step(0, a, 1, &w)};
    bs_route_step outside[] = {step(0, out, 1, &w)};
    bs_route_step zero[] = {step(0, b, 1, &bad)};

    expect_refusal(f, mols, 0, NULL, 0, "a route needs a target");
    expect_refusal(f, mols, 3, circle, 2, "the steps run in a circle through T");
    expect_refusal(f, mols, 3, twice, 2, "two steps make T");
    expect_refusal(f, mols, 3, idle, 2, "nothing needs the step that makes A");
    expect_refusal(f, mols, 3, lacking, 1, "A is neither made nor sold");
    expect_refusal(f, mols, 3, outside, 1, "a step needs no molecule of the route");
    mols[1].price = 1;
    expect_refusal(f, mols, 3, zero, 1, "the yield of a step must be above 0");
}

static void copy__shares_nothing_with_the_original(void **state)
{
    fixture *f = *state;
    bs_route *route, *copy;
    bs_text before, after;
    bs_arena other;

    bs_text_init(&before, &f->cx);
    bs_text_init(&after, &f->cx);
    bs_arena_init(&other, f->cx.gate);
    check_ok(f, linear(f, &route));
    check_ok(f, bs_route_text(route, &before));
    check_ok(f, bs_route_copy(&f->cx, &other, route, &copy));
    assert_true(bs_route_same(route, copy));
    bs_arena_free(&f->home);
    check_ok(f, bs_route_text(copy, &after));
    assert_string_equal(before.data, after.data);
    bs_arena_free(&other);
    bs_text_free(&before);
    bs_text_free(&after);
}

static void same__another_precursor_is_another_route(void **state)
{
    fixture *f = *state;
    bs_route_molecule mols[] = {sold("T", -1), sold("A", 1), sold("B", 1)};
    bs_route_way w = way("w", 0, 100);
    int a[] = {1}, b[] = {2};
    bs_route_step one = step(0, a, 1, &w), two = step(0, b, 1, &w);
    bs_route *first, *second;

    check_ok(f, bs_route_build(&f->cx, &f->home, BS_COST_PER_MOLE, mols, 3, &one, 1, 0, &first));
    check_ok(f, bs_route_build(&f->cx, &f->home, BS_COST_PER_MOLE, mols, 3, &two, 1, 0, &second));
    assert_true(bs_route_same(first, first));
    assert_false(bs_route_same(first, second));
    assert_int_equal(first->molecule_count, 2);
}

/* An intermediate that two steps need is unfolded once; the layout is the project's own. */
static void text__a_shared_intermediate_is_unfolded_once(void **state)
{
    fixture *f = *state;
    bs_route_molecule mols[] = {sold("T", -1), sold("AB", -1), sold("A", -1), sold("B", 0)};
    int last[] = {1, 2}, middle[] = {2}, first[] = {3};
    bs_route_way ways[] = {way("join", 10, 100), way("turn", 10, 100), way("make\x1b[2J", 10, 100)};
    bs_route_step steps[] = {step(0, last, 2, &ways[0]), step(1, middle, 1, &ways[1]),
                             step(2, first, 1, &ways[2])};
    bs_route *route;
    bs_text text;

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_route_build(&f->cx, &f->home, BS_COST_PER_MOLE, mols, 4, steps, 3, 0, &route));
    check_ok(f, bs_route_text(route, &text));
    assert_non_null(strstr(text.data, "as above"));
    assert_null(strchr(text.data, '\x1b'));
    assert_non_null(strstr(text.data, "at hand"));
    assert_null(strstr(strstr(text.data, "at hand") + 1, "at hand"));
    assert_float_equal(route->steps[2].runs, 4, 0);
    bs_text_free(&text);
}

static void table__columns_are_aligned(void **state)
{
    fixture *f = *state;
    bs_route *route;
    bs_routes *list;
    bs_text text;
    const bs_route *items[2];
    char *line, *title, *name;

    bs_text_init(&text, &f->cx);
    check_ok(f, linear(f, &route));
    items[0] = items[1] = route;
    check_ok(f, bs_routes_pick(&f->cx, items, 2, NULL, &list));
    list->reason = "it was stopped";
    check_ok(f, bs_routes_table(list, &text));
    title = strstr(text.data, "last step");
    line = strchr(text.data, '\n') + 1;
    name = strstr(line, "three");
    assert_int_equal(title - text.data, name - line);
    assert_non_null(strstr(text.data, "54.38"));
    assert_non_null(strstr(text.data, "incomplete: it was stopped\n"));
    bs_text_free(&text);
    bs_routes_free(&f->cx, list);
}

static void pick__every_failed_allocation_is_rolled_back(void **state)
{
    fixture *f = *state;
    bs_route *route;
    bs_status st = BS_ENOMEM;

    check_ok(f, linear(f, &route));
    for (long allowed = 0; st == BS_ENOMEM; allowed++) {
        const bs_route *items[1] = {route};
        size_t used = atomic_load(&f->cx.own_gate.used);
        bs_routes *list = NULL;

        atomic_store(&f->cx.own_gate.fail_after, allowed);
        st = bs_routes_pick(&f->cx, items, 1, NULL, &list);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        bs_routes_free(&f->cx, list);
        assert_int_equal(atomic_load(&f->cx.own_gate.used), used);
        assert_true(allowed < 1000);
    }
    assert_int_equal(st, BS_OK);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(build__puts_steps_in_bench_order),
        check_case(build__works_out_costs_and_amounts),
        check_case(measure__linear_tree),
        check_case(measure__convergent_tree),
        check_case(build__buying_the_target_has_no_steps),
        check_case(build__sorts_ways_by_cost),
        check_case(build__what_is_no_route_is_refused),
        check_case(copy__shares_nothing_with_the_original),
        check_case(same__another_precursor_is_another_route),
        check_case(text__a_shared_intermediate_is_unfolded_once),
        check_case(table__columns_are_aligned),
        check_case(pick__every_failed_allocation_is_rolled_back),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
