/*
 * Exploration with a chemistry of numbers: "7" is made by joining two numbers that add up to it,
 * at 10 a step; "1" is sold at 1. Making n takes n - 1 joins, whatever the order, and n ones, so
 * it costs 11 n - 10 (additive).
 */
#include "support/check.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "search/cheapest.h"
#include "search/explore.h"

typedef struct numbers {
    int met, asked;
    _Atomic int expanded;
    bool threaded;
    double guess_factor; /* 1: the exact cost */
    int stop_after;      /* expansions; 0: never */
    int lure;            /* this number is guessed to be 30 cheaper than it is */
    int fail_at;         /* this number has no answer (BS_ELIMIT) */
    bool break_down;     /* an error of the owner */
    char order[400];     /* what was expanded */
} numbers;

static bs_status expand(void *payload, bs_ctx *cx, bs_arena *home, int lane,
                        const char *smiles, bool closed, bs_proposals *out)
{
    static const double ones[] = {1, 1};
    static const double two[] = {2};
    numbers *n = payload;
    int number = atoi(smiles);
    bs_status st;

    assert_false(closed);
    assert_true(lane >= 0 && lane < 3);
    n->expanded++;
    if (!n->threaded) {
        strcat(n->order, smiles);
        strcat(n->order, " ");
    }
    if (n->stop_after && n->expanded >= n->stop_after)
        atomic_store(cx->stop, true);
    if (number == n->fail_at)
        return bs_fail(cx, BS_ELIMIT, "too much");
    if (n->break_down)
        return bs_fail(cx, BS_ESCRIPT, "broken");
    if ((st = bs_new(cx, home, number, &out->items)) != BS_OK)
        return st;
    for (int a = 1; a <= number / 2; a++) {
        bs_proposal *p = &out->items[out->count++];
        char **parts;

        if ((st = bs_new(cx, home, 2, &parts)) != BS_OK)
            return st;
        for (int i = 0; i < 2; i++) {
            char text[16];

            snprintf(text, sizeof text, "%d", i ? number - a : a);
            if ((st = bs_copy_text(cx, home, text, strlen(text), &parts[i])) != BS_OK)
                return st;
        }
        *p = (bs_proposal){.smiles = (const char *const *)parts,
                           .equivalents = 2 * a == number ? two : ones,
                           .count = 2 * a == number ? 1 : 2,
                           .cost = 10,
                           .yield = 1};
    }
    return BS_OK;
}

static bs_status meet(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                      bs_meeting *out)
{
    numbers *n = payload;
    int number = atoi(smiles);

    (void)cx;
    assert_null(mol);
    n->met++;
    out->price = number == 1 ? 1 : INFINITY;
    out->closed = number == 1;
    out->guess = n->guess_factor * (11 * number - 10) - (number == n->lure ? 30 : 0);
    return BS_OK;
}

static bs_status enough(void *payload, bs_ctx *cx, double open_bound, bool *done)
{
    numbers *n = payload;

    (void)cx;
    n->asked++;
    *done = open_bound >= 100;
    return BS_OK;
}

static void explore(fixture *f, bs_explore *x, numbers *n, const bs_explore_limits *limits,
                    const char *target)
{
    bs_explore_calls calls = {.payload = n, .expand = expand, .meet = meet};

    bs_explore__init(x, &f->cx, &calls, limits, BS_COST_PER_MOLE);
    check_ok(f, bs_explore__run(x, NULL, target));
}

static double cheapest(fixture *f, const bs_explore *x)
{
    bs_cheapest work;
    double value;

    check_ok(f, bs_cheapest__init(&work, &x->graph, BS_COST_PER_MOLE));
    check_ok(f, bs_cheapest__run(&work, NULL, BS_GRAPH_NONE));
    value = work.value[0];
    bs_cheapest__free(&work);
    return value;
}

static const bs_explore_limits wide = {.depth = 100, .molecules = 1000, .batch = 4, .lanes = 3, .threads = 1};

static void explore__ends_when_all_is_expanded(void **state)
{
    fixture *f = *state;
    numbers n = {.guess_factor = 0.1};
    bs_explore x;

    explore(f, &x, &n, &wide, "12");
    assert_int_equal(x.end, BS_END_EXHAUSTED);
    assert_int_equal(x.graph.mol_count, 12);
    assert_int_equal(n.met, 12);
    assert_int_equal(n.expanded, 11);
    /* 2 x 6 counts one step and two uses: (2 (2 (2 + 1 joined) ...)): every join is paid. */
    assert_float_equal(cheapest(f, &x), 11 * 12 - 10, 1e-9);
    bs_explore__free(&x);
}

/* The same input gives the same order; the target comes first and nothing comes twice. */
static void explore__the_order_is_fixed(void **state)
{
    fixture *f = *state;
    bs_explore_limits one = {.depth = 100, .molecules = 1000, .batch = 1, .lanes = 1, .threads = 1};
    numbers first = {.guess_factor = 1}, again = {.guess_factor = 1};
    bs_explore x;

    explore(f, &x, &first, &one, "16");
    bs_explore__free(&x);
    explore(f, &x, &again, &one, "16");
    bs_explore__free(&x);
    assert_string_equal(first.order, again.order);
    assert_int_equal(strncmp(first.order, "16 ", 3), 0);
    assert_int_equal(first.expanded, 15);
}

/* A guess that makes halves dear and one number cheap leads to that one next. */
static void explore__the_guess_leads(void **state)
{
    fixture *f = *state;
    bs_explore_limits one = {.depth = 100, .molecules = 1000, .batch = 1, .lanes = 1, .threads = 1};
    numbers n = {.guess_factor = 1, .lure = 5}, plain = {.guess_factor = 1};
    bs_explore x;

    explore(f, &x, &n, &one, "16");
    bs_explore__free(&x);
    explore(f, &x, &plain, &one, "16");
    bs_explore__free(&x);
    assert_int_not_equal(strncmp(plain.order, "16 5 ", 5), 0);
    /* 16 = 5 + 11 is the cheapest by the guess, and of the two 5 was met first. */
    assert_int_equal(strncmp(n.order, "16 5 ", 5), 0);
}

static void explore__stops_at_each_limit(void **state)
{
    fixture *f = *state;
    bs_explore_limits few = {.depth = 100, .molecules = 5, .batch = 1, .lanes = 1, .threads = 1};
    bs_explore_limits tight = {.depth = 100, .molecules = 1000, .batch = 1, .lanes = 1, .threads = 1, .memory = 1};
    bs_explore_limits brief = {.depth = 100, .molecules = 1000, .batch = 1, .lanes = 1, .threads = 1, .seconds = 1e-9};
    bs_explore_limits flat = {.depth = 1, .molecules = 1000, .batch = 1, .lanes = 1, .threads = 1};
    const struct { const bs_explore_limits *limits; bs_explore_end end; uint32_t molecules; } want[] = {
        {&few, BS_END_MOLECULES, 5},
        {&tight, BS_END_MEMORY, 12},
        {&brief, BS_END_SECONDS, 12},
        {&flat, BS_END_EXHAUSTED, 12},
    };

    for (size_t i = 0; i < sizeof want / sizeof *want; i++) {
        numbers n = {.guess_factor = 1};
        bs_explore x;

        explore(f, &x, &n, want[i].limits, "12");
        assert_int_equal(x.end, want[i].end);
        assert_int_equal(x.graph.mol_count, want[i].molecules);
        assert_int_equal(n.expanded, 1);
        bs_explore__free(&x);
    }
}

static void explore__a_stop_keeps_what_was_found(void **state)
{
    fixture *f = *state;
    numbers n = {.guess_factor = 1, .stop_after = 3};
    bs_explore x;

    explore(f, &x, &n, &wide, "12");
    assert_int_equal(x.end, BS_END_STOPPED);
    assert_int_equal(n.expanded, 3);
    assert_true(x.graph.step_count > 6);
    atomic_store(f->cx.stop, false);
    bs_explore__free(&x);
}

static void explore__a_molecule_without_answer_is_counted(void **state)
{
    fixture *f = *state;
    numbers n = {.guess_factor = 1, .fail_at = 2};
    bs_explore x;

    explore(f, &x, &n, &wide, "12");
    assert_int_equal(x.end, BS_END_EXHAUSTED);
    assert_int_equal(x.failed, 1);
    assert_true(isinf(cheapest(f, &x))); /* every number is made by way of 2 */
    bs_explore__free(&x);
}

static void explore__an_error_of_the_owner_is_passed_on(void **state)
{
    fixture *f = *state;
    numbers n = {.guess_factor = 1, .break_down = true};
    bs_explore_calls calls = {.payload = &n, .expand = expand, .meet = meet};
    bs_explore x;

    bs_explore__init(&x, &f->cx, &calls, &wide, BS_COST_PER_MOLE);
    assert_int_equal(bs_explore__run(&x, NULL, "5"), BS_ESCRIPT);
    assert_string_equal(f->cx.error.message, "broken");
    bs_explore__free(&x);
}

/*
 * 12 costs 122 and can be had while 5, 6 and 7 are still open. If no step can cost less than 200,
 * nothing open can help; if a step may cost nothing, it could.
 */
static void explore__ends_when_nothing_open_can_be_cheaper(void **state)
{
    fixture *f = *state;

    for (int free_steps = 0; free_steps < 2; free_steps++) {
        numbers n = {.guess_factor = 1};
        bs_explore_calls calls = {.payload = &n, .expand = expand, .meet = meet, .enough = enough};
        bs_explore_limits limits = {.depth = 100, .molecules = 1000, .batch = 1,
                                    .lanes = 1, .threads = 1, .least_step = free_steps ? 0 : 200};
        bs_explore x;

        bs_explore__init(&x, &f->cx, &calls, &limits, BS_COST_PER_MOLE);
        x.next_enough = 1;
        check_ok(f, bs_explore__run(&x, NULL, "12"));
        assert_int_equal(x.end, free_steps ? BS_END_EXHAUSTED : BS_END_ENOUGH);
        assert_int_equal(n.asked, !free_steps);
        assert_float_equal(cheapest(f, &x), 122, 1e-9);
        assert_int_equal(n.expanded < 11, !free_steps);
        bs_explore__free(&x);
    }
}

static void assert_same_graph(const bs_explore *a, const bs_explore *b)
{
    assert_int_equal(a->expanded, b->expanded);
    assert_int_equal(a->graph.mol_count, b->graph.mol_count);
    assert_int_equal(a->graph.way_count, b->graph.way_count);
    for (uint32_t i = 0; i < a->graph.mol_count; i++)
        assert_string_equal(a->nodes[i].smiles, b->nodes[i].smiles);
    for (uint32_t i = 0; i < a->graph.way_count; i++) {
        assert_int_equal(a->graph.ways[i].product, b->graph.ways[i].product);
        assert_int_equal(a->graph.uses[a->graph.ways[i].first].mol,
                         b->graph.uses[b->graph.ways[i].first].mol);
    }
}

/* The graph is the same, molecule for molecule and way for way, whatever the number of threads. */
static void explore__threads_change_nothing(void **state)
{
    fixture *f = *state;
    bs_explore_limits limits = wide;
    numbers n = {.guess_factor = 0.5};
    bs_explore one;

    limits.molecules = 38;
    explore(f, &one, &n, &limits, "40");
    for (int threads = 2; threads <= 5; threads++) {
        numbers m = {.guess_factor = 0.5, .threaded = true};
        bs_explore x;

        limits.threads = threads;
        explore(f, &x, &m, &limits, "40");
        assert_int_equal(x.end, one.end);
        assert_same_graph(&x, &one);
        bs_explore__free(&x);
    }
    bs_explore__free(&one);
}

/* However often a limit of molecules cuts in, the graph grows as without. */
static void explore__goes_on_as_in_one_go(void **state)
{
    fixture *f = *state;
    bs_explore_limits limits = wide;
    numbers n = {.guess_factor = 0.5};
    bs_explore one;

    limits.molecules = 38;
    explore(f, &one, &n, &limits, "40");
    for (uint32_t part = 1; part < 38; part++) {
        numbers m = {.guess_factor = 0.5, .threaded = part % 2};
        bs_explore x;

        limits.threads = part % 2 ? 3 : 1;
        limits.molecules = part;
        explore(f, &x, &m, &limits, "40");
        assert_int_equal(x.end, BS_END_MOLECULES);
        assert_true(x.graph.mol_count <= part);
        while (x.limits.molecules < 38) {
            x.limits.molecules += part < 38 - x.limits.molecules ? part : 38 - x.limits.molecules;
            check_ok(f, bs_explore__run(&x, NULL, "40"));
        }
        assert_int_equal(x.end, one.end);
        assert_same_graph(&x, &one);
        bs_explore__free(&x);
    }
    bs_explore__free(&one);
}

/* The same when the stop flag cuts in after each number of expansions, and the search goes on. */
static void explore__goes_on_after_a_stop(void **state)
{
    fixture *f = *state;
    numbers n = {.guess_factor = 0.5};
    bs_explore one;

    explore(f, &one, &n, &wide, "40");
    for (int stop = 1; stop < 39; stop++) {
        numbers m = {.guess_factor = 0.5, .stop_after = stop};
        bs_explore x;

        explore(f, &x, &m, &wide, "40");
        assert_int_equal(x.end, BS_END_STOPPED);
        assert_int_equal(m.expanded, stop);
        m.stop_after = 0;
        atomic_store(f->cx.stop, false);
        check_ok(f, bs_explore__run(&x, NULL, "40"));
        assert_int_equal(x.end, BS_END_EXHAUSTED);
        assert_same_graph(&x, &one);
        bs_explore__free(&x);
    }
    bs_explore__free(&one);
}

/*
 * By depth: the parts of 16 before theirs. By proof: sums with a 1, and of equal parts, are one
 * molecule to prove, so it is done before all is expanded.
 */
static void explore__other_strategies(void **state)
{
    fixture *f = *state;
    bs_explore_limits limits = {.depth = 100, .molecules = 1000, .batch = 4, .lanes = 3, .threads = 1};
    numbers n = {.guess_factor = 1}, m = {.guess_factor = 1}, none = {.guess_factor = 1, .fail_at = 2};
    bs_explore x;

    limits.strategy = BS_STRATEGY_BREADTH;
    explore(f, &x, &n, &limits, "16");
    assert_string_equal(n.order, "16 15 2 14 3 13 4 12 5 11 6 10 7 9 8 ");
    assert_int_equal(x.end, BS_END_EXHAUSTED);
    bs_explore__free(&x);
    limits.strategy = BS_STRATEGY_PROOF;
    explore(f, &x, &m, &limits, "16");
    assert_int_equal(x.end, BS_END_PROVED);
    assert_true(isfinite(cheapest(f, &x)));
    assert_true(m.expanded < 15);
    bs_explore__free(&x);
    explore(f, &x, &none, &limits, "16");
    assert_int_equal(x.end, BS_END_EXHAUSTED);
    assert_true(isinf(cheapest(f, &x)));
    bs_explore__free(&x);
}

static void explore__every_failed_allocation_leaks_nothing(void **state)
{
    fixture *f = *state;
    bs_status st = BS_ENOMEM;

    for (long allowed = 0; st == BS_ENOMEM; allowed++) {
        numbers n = {.guess_factor = 1};
        bs_explore_calls calls = {.payload = &n, .expand = expand, .meet = meet};
        bs_explore x;

        bs_explore__init(&x, &f->cx, &calls, &wide, BS_COST_PER_MOLE);
        atomic_store(&f->cx.own_gate.fail_after, allowed);
        st = bs_explore__run(&x, NULL, "6");
        atomic_store(&f->cx.own_gate.fail_after, -1);
        bs_explore__free(&x);
        assert_int_equal(f->cx.scratch.live, 0);
        assert_true(allowed < 5000);
    }
    assert_int_equal(st, BS_OK);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(explore__ends_when_all_is_expanded),
        check_case(explore__the_order_is_fixed),
        check_case(explore__the_guess_leads),
        check_case(explore__stops_at_each_limit),
        check_case(explore__a_stop_keeps_what_was_found),
        check_case(explore__a_molecule_without_answer_is_counted),
        check_case(explore__an_error_of_the_owner_is_passed_on),
        check_case(explore__ends_when_nothing_open_can_be_cheaper),
        check_case(explore__threads_change_nothing),
        check_case(explore__goes_on_as_in_one_go),
        check_case(explore__goes_on_after_a_stop),
        check_case(explore__other_strategies),
        check_case(explore__every_failed_allocation_leaks_nothing),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
