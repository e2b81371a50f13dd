/*
 * Planning with known steps: the check graphs of search.json as plans (each molecule of a graph
 * is an unbranched alkane), options, callbacks, limits. The compounds are invented.
 */
#include "support/check.h"

#include <jansson.h>
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "backsaw/format.h"
#include "backsaw/search.h"

#define MOST_STEPS 64
#define MOST_PRECURSORS 8
#define NAME_ROOM 64

static bs_mol *read(fixture *f, const char *smiles)
{
    bs_mol *mol;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, smiles, strlen(smiles), NULL, &mol));
    return mol;
}

/* ---- search.json ------------------------------------------------------------------------------ */

/* The check graph as options. */
typedef struct problem {
    char names[MOST_STEPS][NAME_ROOM]; /* by molecule: its alkane */
    const char *from[MOST_STEPS][MOST_PRECURSORS];
    double equivalents[MOST_STEPS][MOST_PRECURSORS];
    bs_known_step steps[MOST_STEPS];
    int step_count;
    int target;
    bs_shelf *shelf;
} problem;

static int number_of(json_t *molecules, const char *name)
{
    const char *key;
    json_t *value;
    int at = 0;

    json_object_foreach(molecules, key, value) {
        if (strcmp(key, name) == 0)
            return at;
        at++;
    }
    fail_msg("no molecule %s", name);
    return 0;
}

static void load_molecules(fixture *f, json_t *molecules, problem *p)
{
    const char *key;
    json_t *value;
    int at = 0, list;

    check_ok(f, bs_shelf_new(&f->cx, &p->shelf));
    check_ok(f, bs_shelf_add_list(&f->cx, p->shelf, &list));
    json_object_foreach(molecules, key, value) {
        json_t *price = json_object_get(value, "price");

        memset(p->names[at], 'C', (size_t)at + 1);
        p->names[at][at + 1] = '\0';
        if (price)
            check_ok(f, bs_shelf_put(&f->cx, p->shelf, list, read(f, p->names[at]),
                                     json_number_value(price)));
        at++;
    }
}

static void load(fixture *f, json_t *entry, problem *p)
{
    json_t *molecules = json_object_get(entry, "molecules"), *step, *precursor;
    size_t i, j;

    load_molecules(f, molecules, p);
    p->target = number_of(molecules, json_string_value(json_object_get(entry, "target")));
    json_array_foreach(json_object_get(entry, "steps"), i, step) {
        json_t *precursors = json_object_get(step, "precursors");

        json_array_foreach(precursors, j, precursor) {
            p->from[i][j] = p->names[number_of(
                molecules, json_string_value(json_object_get(precursor, "molecule")))];
            p->equivalents[i][j] = json_number_value(json_object_get(precursor, "equivalents"));
        }
        p->steps[i] = (bs_known_step){
            .product = p->names[number_of(
                molecules, json_string_value(json_object_get(step, "product")))],
            .from = p->from[i],
            .equivalents = p->equivalents[i],
            .from_count = (int)json_array_size(precursors),
            .has_cost = true,
            .cost = json_number_value(json_object_get(step, "cost")),
            .yield = 100 * json_number_value(json_object_get(step, "yield")),
            .name = json_string_value(json_object_get(step, "id")),
        };
    }
    p->step_count = (int)json_array_size(json_object_get(entry, "steps"));
}

static void check_graph(fixture *f, json_t *entry, bs_cost_mode mode, const char *mode_name)
{
    json_t *expect = json_object_get(json_object_get(entry, "expect"), mode_name);
    json_t *costs = json_object_get(expect, "routes");
    problem p;
    bs_plan_opts opts = {.mode = mode, .limits = {.depth = 50}};
    bs_routes *routes;

    load(f, entry, &p);
    opts.shelf = p.shelf;
    opts.known = p.steps;
    opts.known_count = p.step_count;
    check_ok(f, bs_plan(&f->cx, read(f, p.names[p.target]), &opts, &routes));
    if ((size_t)routes->count != json_array_size(costs))
        fail_msg("%s, %s: %d routes, not %zu",
                 json_string_value(json_object_get(entry, "name")), mode_name, routes->count,
                 json_array_size(costs));
    assert_true(routes->complete);
    for (int i = 0; i < routes->count; i++) {
        double want = json_number_value(json_array_get(costs, (size_t)i));

        if (fabs(routes->items[i]->cost - want) > 1e-9 * fmax(1, want))
            fail_msg("%s, %s: route %d costs %.12g, not %.12g",
                     json_string_value(json_object_get(entry, "name")), mode_name, i,
                     routes->items[i]->cost, want);
    }
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(p.shelf);
}

static void plan__the_check_graphs(void **state)
{
    fixture *f = *state;
    json_error_t error;
    json_t *root = json_load_file(BACKSAW_TEST_DATA "/checks/search.json", 0, &error), *entry;
    size_t i;

    assert_non_null(root);
    json_array_foreach(json_object_get(root, "graphs"), i, entry) {
        check_graph(f, entry, BS_COST_ADDITIVE, "additive");
        check_graph(f, entry, BS_COST_PER_MOLE, "per_mole");
    }
    json_decref(root);
}

/* ---- A small notebook ---------------------------------------------------------------------------- */

/*
 * Benzocaine-like: two ways to the ester, one of them by an acid that two oxidations give; toluene
 * is sold at 1, ethanol at 2. Costs by hand, per mole.
 */
static const char *const from_nitro[] = {"CCOC(=O)c1ccc([N+](=O)[O-])cc1"};
static const char *const from_acid[] = {"OC(=O)c1ccc([N+](=O)[O-])cc1", "OCC"};
static const char *const from_toluene[] = {"Cc1ccc([N+](=O)[O-])cc1"};
static const char *const from_amine[] = {"Nc1ccc(C(=O)O)cc1", "CCO"};
static const char *const from_ring[] = {"Cc1ccccc1"};

static const bs_known_step notebook[] = {
    {.product = "CCOC(=O)c1ccc(N)cc1", .from = from_nitro, .from_count = 1, .has_cost = true,
     .cost = 20, .yield = 80, .name = "reduction"},
    {.product = "CCOC(=O)c1ccc([N+](=O)[O-])cc1", .from = from_acid, .from_count = 2,
     .has_cost = true, .cost = 10, .yield = 100, .name = "ester"},
    {.product = "OC(=O)c1ccc([N+](=O)[O-])cc1", .from = from_toluene, .from_count = 1,
     .has_cost = true, .cost = 10, .yield = 100, .name = "oxidation"},
    {.product = "Cc1ccc([N+](=O)[O-])cc1", .from = from_ring, .from_count = 1, .has_cost = true,
     .cost = 10, .yield = 50, .name = "nitration"},
    {.product = "CCOC(=O)c1ccc(N)cc1", .from = from_amine, .from_count = 2, .has_cost = true,
     .cost = 300, .yield = 100, .name = "ester of the amine"},
};

/* nitration (10 + 1) / 0.5 = 22; acid 32; ester 32 + 2 + 10 = 44; target 64 / 0.8 = 80. */
#define CHEAPEST 80.0
/* 300 + 5 + 2 */
#define SECOND 307.0

typedef struct calls {
    int allowed, kept, ranked;
    const char *barred;
} calls;

static bs_shelf *small_shelf(fixture *f)
{
    bs_shelf *shelf;
    int list;

    check_ok(f, bs_shelf_new(&f->cx, &shelf));
    check_ok(f, bs_shelf_add_list(&f->cx, shelf, &list));
    check_ok(f, bs_shelf_put(&f->cx, shelf, list, read(f, "Cc1ccccc1"), 1));
    check_ok(f, bs_shelf_put(&f->cx, shelf, list, read(f, "CCO"), 2));
    check_ok(f, bs_shelf_put(&f->cx, shelf, list, read(f, "Nc1ccc(C(O)=O)cc1"), 5));
    return shelf;
}

static bs_plan_opts small_opts(bs_shelf *shelf)
{
    return (bs_plan_opts){.shelf = shelf, .known = notebook, .known_count = 5};
}

static bs_routes *plan(fixture *f, const bs_plan_opts *opts)
{
    bs_routes *routes;

    check_ok(f, bs_plan(&f->cx, read(f, "CCOC(=O)c1ccc(N)cc1"), opts, &routes));
    return routes;
}

static void plan__gives_routes_in_bench_order(void **state)
{
    fixture *f = *state;
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = small_opts(shelf);
    bs_routes *routes = plan(f, &opts);
    bs_route_measures m;

    assert_true(routes->complete);
    assert_null(routes->reason);
    assert_int_equal(routes->count, 2);
    assert_float_equal(routes->items[0]->cost, CHEAPEST, 1e-9);
    assert_float_equal(routes->items[1]->cost, SECOND, 1e-9);
    bs_route_measure(routes->items[0], &m);
    assert_int_equal(m.steps, 4);
    assert_int_equal(m.longest, 4);
    assert_float_equal(m.yield, 40, 1e-9);
    assert_string_equal(routes->items[0]->steps[0].ways[0].transform, "nitration");
    assert_string_equal(routes->items[0]->steps[3].ways[0].transform, "reduction");
    assert_string_equal(routes->target, routes->items[0]->molecules[0].smiles);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static bs_status allow(void *payload, bs_ctx *cx, const bs_route *step, bool *allowed)
{
    calls *c = payload;

    (void)cx;
    c->allowed++;
    assert_int_equal(step->step_count, 1);
    assert_int_equal(step->steps[0].product, 0);
    *allowed = strcmp(step->steps[0].ways[0].transform, c->barred) != 0;
    return BS_OK;
}

static void plan__a_step_that_is_not_allowed_is_not_used(void **state)
{
    fixture *f = *state;
    calls c = {.barred = "oxidation"};
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = small_opts(shelf);
    bs_routes *routes;

    opts.payload = &c;
    opts.allow = allow;
    routes = plan(f, &opts);
    assert_int_equal(routes->count, 1);
    assert_float_equal(routes->items[0]->cost, SECOND, 1e-9);
    assert_true(c.allowed >= 4);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static bs_status keep(void *payload, bs_ctx *cx, const bs_route *route, bool *kept)
{
    bs_route_measures m;

    (void)cx;
    ((calls *)payload)->kept++;
    bs_route_measure(route, &m);
    *kept = m.steps < 3;
    return BS_OK;
}

static void plan__routes_that_are_not_kept_make_room(void **state)
{
    fixture *f = *state;
    calls c = {0};
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = small_opts(shelf);
    bs_routes *routes;

    opts.payload = &c;
    opts.keep = keep;
    opts.best = 1;
    routes = plan(f, &opts);
    assert_int_equal(routes->count, 1);
    assert_float_equal(routes->items[0]->cost, SECOND, 1e-9);
    assert_true(c.kept >= 2);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static bs_status rank(void *payload, bs_ctx *cx, const bs_route *route, double *value)
{
    (void)cx;
    ((calls *)payload)->ranked++;
    *value = route->step_count;
    return BS_OK;
}

static void plan__rank_orders_the_routes(void **state)
{
    fixture *f = *state;
    calls c = {0};
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = small_opts(shelf);
    bs_routes *routes;

    opts.payload = &c;
    opts.rank = rank;
    opts.best = 1; /* the pool that is ranked is larger */
    routes = plan(f, &opts);
    assert_int_equal(routes->count, 1);
    assert_int_equal(routes->items[0]->step_count, 1);
    assert_float_equal(routes->items[0]->rank, 1, 0);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static bs_status cost(void *payload, bs_ctx *cx, const bs_route *step, double *value)
{
    (void)payload;
    (void)cx;
    assert_float_equal(step->steps[0].ways[0].cost, BS_DEFAULT_STEP_COST, 0);
    *value = 7;
    return BS_OK;
}

/* Known steps with a cost are not asked; one without gets 7: (7 + 1) / 0.85. */
static void plan__the_cost_function_prices_what_has_no_price(void **state)
{
    fixture *f = *state;
    bs_known_step step = {.product = "OC(=O)c1ccccc1", .from = from_ring, .from_count = 1};
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = {.shelf = shelf, .known = &step, .known_count = 1, .cost = cost};
    bs_routes *routes;

    check_ok(f, bs_plan(&f->cx, read(f, "O=C(O)c1ccccc1"), &opts, &routes));
    assert_int_equal(routes->count, 1);
    assert_float_equal(routes->items[0]->cost, 8 / 0.85, 1e-9);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static void plan__limits_hold(void **state)
{
    fixture *f = *state;
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = small_opts(shelf);
    bs_routes *routes;

    opts.limits.depth = 3;
    routes = plan(f, &opts);
    assert_int_equal(routes->count, 1);
    assert_float_equal(routes->items[0]->cost, SECOND, 1e-9);
    bs_routes_free(&f->cx, routes);
    opts.limits = (bs_plan_limits){.steps = 3};
    routes = plan(f, &opts);
    assert_int_equal(routes->count, 1);
    bs_routes_free(&f->cx, routes);
    opts.limits = (bs_plan_limits){.molecules = 4};
    routes = plan(f, &opts);
    assert_false(routes->complete);
    assert_string_equal(routes->reason, "the limit of 4 molecules was reached");
    assert_int_equal(routes->molecules, 4);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static void plan__what_blocks_the_target_is_a_gap(void **state)
{
    fixture *f = *state;
    bs_plan_opts opts = {.known = notebook, .known_count = 4};
    bs_shelf *shelf;
    bs_routes *routes;
    int list;

    check_ok(f, bs_shelf_new(&f->cx, &shelf));
    check_ok(f, bs_shelf_add_list(&f->cx, shelf, &list));
    check_ok(f, bs_shelf_put(&f->cx, shelf, list, read(f, "CCO"), 2));
    opts.shelf = shelf;
    routes = plan(f, &opts);
    assert_int_equal(routes->count, 0);
    assert_true(routes->complete);
    assert_true(routes->gap_count >= 1);
    assert_true(routes->gaps[0].opens_target);
    /* Toluene opens the nitro compound, the acid, the ester and the target. */
    assert_string_equal(routes->gaps[0].smiles, "Cc1ccccc1");
    assert_int_equal(routes->gaps[0].opens, 4);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static void plan__two_known_steps_with_the_same_compounds_stay_two(void **state)
{
    fixture *f = *state;
    const bs_known_step steps[] = {
        {.product = "CCO", .from = from_ring, .from_count = 1, .has_cost = true, .cost = 1,
         .yield = 100, .name = "one"},
        {.product = "OCC", .from = from_ring, .from_count = 1, .has_cost = true, .cost = 1,
         .yield = 100, .name = "two"},
    };
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = {.shelf = shelf, .known = steps, .known_count = 2};
    bs_routes *routes;

    check_ok(f, bs_plan(&f->cx, read(f, "CCO"), &opts, &routes));
    assert_int_equal(routes->count, 3); /* and buying it, at 2 as well: fewest steps first */
    assert_int_equal(routes->items[0]->step_count, 0);
    assert_float_equal(routes->items[0]->cost, 2, 0);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static void expect_refusal(fixture *f, const bs_known_step *step, bs_status code,
                           const char *message)
{
    bs_plan_opts opts = {.known = step, .known_count = 1};
    bs_routes *routes = (bs_routes *)f;

    assert_int_equal(bs_plan(&f->cx, read(f, "CCO"), &opts, &routes), code);
    assert_null(routes);
    if (strncmp(f->cx.error.message, message, strlen(message)) != 0)
        fail_msg("\"%s\", not \"%s\"", f->cx.error.message, message);
}

static void plan__bad_known_steps_are_refused(void **state)
{
    fixture *f = *state;
    const char *const broken[] = {"CC", "C(("};
    const double none[] = {1, 0};
    bs_known_step step = {.product = "CCO", .from = broken, .from_count = 2};

    expect_refusal(f, &step, BS_ESYNTAX, "known step 1: from 2: ");
    assert_true(f->cx.error.offset >= 0);
    step.product = "CX";
    expect_refusal(f, &step, BS_ESYNTAX, "known step 1: product: ");
    step.product = "CCO";
    step.from_count = 0;
    expect_refusal(f, &step, BS_EVALUE, "known step 1: from: no precursor");
    step.from_count = 1;
    step.yield = 101;
    expect_refusal(f, &step, BS_EVALUE, "known step 1: yield: must be above 0");
    step.yield = 50;
    step.has_cost = true;
    step.cost = -1;
    expect_refusal(f, &step, BS_EVALUE, "known step 1: cost: must be");
    step.cost = NAN;
    expect_refusal(f, &step, BS_EVALUE, "known step 1: cost: must be");
    step.cost = 1;
    step.equivalents = none;
    step.from_count = 2;
    expect_refusal(f, &step, BS_EVALUE, "known step 1: equiv 2: must be above 0");
}

static bs_status stop(void *payload, bs_ctx *cx, const bs_route *step, bool *allowed)
{
    (void)step;
    *allowed = true;
    if (++((calls *)payload)->allowed == 2)
        atomic_store(cx->stop, true);
    return BS_OK;
}

/* The second step that is looked at makes the target from what is sold. */
static void plan__a_stop_gives_what_was_found(void **state)
{
    fixture *f = *state;
    calls c = {0};
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = small_opts(shelf);
    bs_routes *routes;
    const bs_mol *target = read(f, "CCOC(=O)c1ccc(N)cc1");

    opts.payload = &c;
    opts.allow = stop;
    check_ok(f, bs_plan(&f->cx, target, &opts, &routes));
    atomic_store(f->cx.stop, false);
    assert_false(routes->complete);
    assert_string_equal(routes->reason, "the search was stopped");
    assert_int_equal(routes->count, 1);
    assert_float_equal(routes->items[0]->cost, SECOND, 1e-9);
    bs_routes_free(&f->cx, routes);
    bs_shelf_free(shelf);
}

static bs_status break_down(void *payload, bs_ctx *cx, const bs_route *step, bool *allowed)
{
    (void)payload;
    (void)step;
    (void)allowed;
    return bs_fail(cx, BS_ESCRIPT, "the notebook is closed");
}

typedef struct countdown {
    int left;
    atomic_bool *stop;
} countdown;

static bs_status count_down(void *payload, bs_ctx *cx, const bs_route *step, bool *allowed)
{
    countdown *c = payload;

    (void)cx;
    (void)step;
    *allowed = true;
    if (--c->left == 0)
        atomic_store(c->stop, true);
    return BS_OK;
}

/* Stopped after the n-th step is found, a search gives routes of the whole search, and may go on. */
static void stop_after(fixture *f, const problem *p, bs_plan_opts opts, const bs_routes *whole,
                       int n)
{
    countdown c = {n, f->cx.stop};
    bs_search *search;
    bs_routes *part;

    opts.allow = count_down;
    opts.payload = &c;
    check_ok(f, bs_search_new(&f->cx, read(f, p->names[p->target]), &opts, &search));
    for (int run = 0; run < 2; run++) {
        check_ok(f, bs_search_run(search, &part));
        assert_true(part->count <= whole->count);
        assert_true(run == 0 || part->count == whole->count);
        for (int i = 0; i < part->count; i++) {
            int k = 0;

            while (k < whole->count && !bs_route_same(part->items[i], whole->items[k]))
                k++;
            assert_true(k < whole->count);
        }
        bs_routes_free(&f->cx, part);
        atomic_store(f->cx.stop, false);
    }
    bs_search_free(search);
}

static void plan__stopped_anywhere_its_routes_are_routes(void **state)
{
    fixture *f = *state;
    json_error_t error;
    json_t *root = json_load_file(BACKSAW_TEST_DATA "/checks/search.json", 0, &error), *entry;
    size_t i;

    assert_non_null(root);
    json_array_foreach(json_object_get(root, "graphs"), i, entry) {
        problem p;
        bs_plan_opts opts = {.limits = {.depth = 50}, .best = 400};
        bs_routes *whole;

        load(f, entry, &p);
        opts.shelf = p.shelf;
        opts.known = p.steps;
        opts.known_count = p.step_count;
        check_ok(f, bs_plan(&f->cx, read(f, p.names[p.target]), &opts, &whole));
        for (int n = 1; whole->count < 100 && n <= p.step_count && n <= 12; n++)
            stop_after(f, &p, opts, whole, n);
        bs_routes_free(&f->cx, whole);
        bs_shelf_free(p.shelf);
    }
    json_decref(root);
}

static void plan__an_error_of_a_callback_is_passed_on(void **state)
{
    fixture *f = *state;
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = small_opts(shelf);
    bs_routes *routes;

    opts.allow = break_down;
    assert_int_equal(bs_plan(&f->cx, read(f, "CCOC(=O)c1ccc(N)cc1"), &opts, &routes), BS_ESCRIPT);
    assert_string_equal(f->cx.error.message, "the notebook is closed");
    assert_null(routes);
    bs_shelf_free(shelf);
}

static void plan__the_same_input_gives_the_same_text(void **state)
{
    fixture *f = *state;
    bs_shelf *shelf = small_shelf(f);
    bs_plan_opts opts = small_opts(shelf);
    bs_text text[2];

    for (int i = 0; i < 2; i++) {
        bs_routes *routes;

        opts.threads = i + 1;
        routes = plan(f, &opts);
        bs_text_init(&text[i], &f->cx);
        check_ok(f, bs_routes_table(routes, &text[i]));
        for (int j = 0; j < routes->count; j++)
            check_ok(f, bs_route_text(routes->items[j], &text[i]));
        bs_routes_free(&f->cx, routes);
    }
    assert_string_equal(text[0].data, text[1].data);
    bs_text_free(&text[0]);
    bs_text_free(&text[1]);
    bs_shelf_free(shelf);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(plan__the_check_graphs),
        check_case(plan__gives_routes_in_bench_order),
        check_case(plan__a_step_that_is_not_allowed_is_not_used),
        check_case(plan__routes_that_are_not_kept_make_room),
        check_case(plan__rank_orders_the_routes),
        check_case(plan__the_cost_function_prices_what_has_no_price),
        check_case(plan__limits_hold),
        check_case(plan__what_blocks_the_target_is_a_gap),
        check_case(plan__two_known_steps_with_the_same_compounds_stay_two),
        check_case(plan__bad_known_steps_are_refused),
        check_case(plan__a_stop_gives_what_was_found),
        check_case(plan__stopped_anywhere_its_routes_are_routes),
        check_case(plan__an_error_of_a_callback_is_passed_on),
        check_case(plan__the_same_input_gives_the_same_text),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
