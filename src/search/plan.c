/* bs_plan(): options, exploration, and the list of routes. */
#include "search/plan.h"

#include "backsaw/format.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

#define DEFAULT_DEPTH 16
#define DEFAULT_MOLECULES 20000
#define DEFAULT_BEST 10
#define DEFAULT_BATCH 16
#define DEFAULT_GAPS 10
#define DEFAULT_LANES 8
#define MOST_THREADS 256
#define MOST_BEST 100000
#define MOST_MOLECULES 50000000L
#define ASK_TRIES 100     /* routes looked at beyond the pool, while the search goes on ... */
#define LAST_TRIES 5000   /* ... and at its end, ... */
#define LAST_JUDGED 50000 /* ... where constraints judge them, which is cheap */
#define RANK_POOL 10      /* so many times `best` routes are ranked ... */
#define RANK_MOST 200     /* ... but not more than this, unless `best` is */

/* ---- Options ----------------------------------------------------------------------------------
 */

bs_status bs_plan__check(bs_ctx *cx, const bs_plan_opts *o)
{
    const bs_plan_limits *l = &o->limits;

    if (l->depth < 0 || l->steps < 0 || l->molecules < 0 || l->molecules > MOST_MOLECULES ||
        !(l->seconds >= 0))
        return bs_fail(cx, BS_EVALUE,
                       "limits: depth, steps, molecules and seconds must be 0 or "
                       "more, molecules at most %ld",
                       MOST_MOLECULES);
    if (o->best < 0 || o->best > MOST_BEST)
        return bs_fail(cx, BS_EVALUE, "best: must be 1 to %d", MOST_BEST);
    if (o->has_step_cost && !(isfinite(o->step_cost) && o->step_cost >= 0))
        return bs_fail(cx, BS_EVALUE, "cost: the step cost must be a number of 0 or more");
    if (o->has_clash_cost && !(isfinite(o->clash_cost) && o->clash_cost >= 0))
        return bs_fail(cx, BS_EVALUE, "clash_cost: must be a number of 0 or more");
    if (o->has_overlap && !(o->overlap >= 0 && o->overlap <= 1))
        return bs_fail(cx, BS_EVALUE, "diverse: must be 0 to 1");
    if (o->threads < 0 || o->threads > MOST_THREADS)
        return bs_fail(cx, BS_EVALUE, "threads: must be 1 to %d", MOST_THREADS);
    if (o->batch < 0 || o->transform_count < 0 || (o->lane_hooks && o->lane_count < 1))
        return bs_fail(cx, BS_EVALUE, "a count must be 0 or more");
    for (int i = 0; o->transforms && i < o->transform_count; i++) {
        if (!o->rules || o->transforms[i] < 0 || o->transforms[i] >= bs_rules_count(o->rules))
            return bs_fail(cx, BS_EVALUE, "transforms: there is no transform number %d",
                           o->transforms[i]);
    }
    return BS_OK;
}

/* The least that a step not yet found can cost. */
static double least_step(const bs_plan_state *plan)
{
    const bs_plan_opts *opts = plan->opts;
    double least = opts->cost || !plan->rules_on ? 0 : plan->step_cost;

    for (int i = 0; plan->rules_on && i < bs_rules_count(opts->rules); i++) {
        double extra = bs_rules_transform(opts->rules, i)->step_cost;

        if (extra < 0)
            least = fmin(least, fmax(0, plan->step_cost + extra));
    }
    for (int i = 0; i < opts->known_count; i++)
        least = fmin(least, plan->known[i].cost);
    return least;
}

void bs_plan__read_options(bs_plan_state *plan)
{
    const bs_plan_opts *o = plan->opts;

    plan->rules_on =
        o->rules && bs_rules_count(o->rules) > 0 && !(o->transforms && o->transform_count == 0);
    plan->depth = o->limits.depth > 0 ? o->limits.depth : DEFAULT_DEPTH;
    plan->best = o->best > 0 ? o->best : DEFAULT_BEST;
    plan->step_cost = o->has_step_cost ? o->step_cost : BS_DEFAULT_STEP_COST;
    plan->clash_cost = o->has_clash_cost ? o->clash_cost
                                         : BS_DEFAULT_CLASH_STEPS * plan->step_cost;
    plan->pool = plan->best;
    if (o->rank) {
        plan->pool = plan->best * RANK_POOL < RANK_MOST ? plan->best * RANK_POOL : RANK_MOST;
        if (plan->pool < plan->best)
            plan->pool = plan->best;
    }
}

/* ---- Ends of the exploration -------------------------------------------------------------------
 */

/* Whether the pool is full of routes that nothing still to be found can beat. */
static bs_status is_enough(void *payload, bs_ctx *cx, double open_bound, bool *done)
{
    bs_plan_state *plan = payload;
    bs_arena home;
    bs_route **routes;
    int count;
    bs_status st;

    *done = false;
    plan->target = 0;
    bs_arena_init(&home, cx->gate);
    st = bs_plan__take_routes(plan, &home, 2L * plan->pool + ASK_TRIES, &routes, &count);
    if (st == BS_OK)
        *done = count == plan->pool && routes[count - 1]->cost <= open_bound;
    bs_arena_free(&home);
    return st;
}

static void pass_progress(void *payload, const bs_plan_progress *now)
{
    bs_plan_state *plan = payload;
    bs_plan_progress more = *now;
    bs_plan_event event = {.kind = BS_EVENT_LOOK, .now = &more};

    more.routes = plan->routes_seen;
    more.depth = (int)plan->deepest;
    if (plan->opts->progress)
        plan->opts->progress(plan->opts->payload, &more);
    if (plan->opts->trace && plan->trace_status == BS_OK)
        plan->trace_status = plan->opts->trace(plan->opts->payload, plan->cx, &event);
}

bs_status bs_plan__explore(bs_plan_state *plan)
{
    const bs_plan_opts *o = plan->opts;
    bs_explore_calls calls = {
        .payload = plan,
        .expand = bs_plan__expand,
        .admit = bs_plan__admit,
        .begin = bs_plan__begin,
        .merged = bs_plan__merged,
        .meet = bs_plan__meet,
        .enough = is_enough,
        .progress = pass_progress,
    };
    bs_explore_limits limits = {
        .depth = (uint32_t)plan->depth,
        .molecules = (uint32_t)(o->limits.molecules > 0 ? o->limits.molecules : DEFAULT_MOLECULES),
        .seconds = o->limits.seconds,
        .memory = o->limits.memory,
        .batch = o->batch > 0 ? o->batch : DEFAULT_BATCH,
        .lanes = o->lane_hooks ? o->lane_count : DEFAULT_LANES,
        .threads = o->threads > 1 && (!o->hooks || o->lane_hooks) ? o->threads : 1,
        .least_step = least_step(plan),
        .strategy = o->strategy,
    };

    if (!plan->x.cx)
        bs_explore__init(&plan->x, plan->cx, &calls, &limits, o->mode);
    plan->x.limits = limits;
    return bs_explore__run(&plan->x, plan->mol, plan->smiles);
}

static bs_status say_why(bs_plan_state *plan, bs_routes *list)
{
    const bs_plan_limits *limits = &plan->opts->limits;
    bs_text text;
    bs_status st = BS_OK;
    char *copy = NULL;

    bs_text_init(&text, plan->cx);
    switch (plan->x.end) {
    case BS_END_MOLECULES:
        st = bs_text_printf(&text, "the limit of %lu molecules was reached",
                            (unsigned long)plan->x.limits.molecules);
        break;
    case BS_END_SECONDS:
        st = bs_text_printf(&text, "the limit of %g seconds was reached", limits->seconds);
        break;
    case BS_END_MEMORY:
        st = bs_text_printf(&text, "the limit of %zu bytes was reached", limits->memory);
        break;
    case BS_END_STOPPED:
        st = bs_text_puts(&text, "the search was stopped");
        break;
    case BS_END_PROVED:
        st = bs_text_puts(&text, "the search ended with the proof that there is a route");
        break;
    case BS_END_EXHAUSTED:
    case BS_END_ENOUGH:
        if (plan->kbest_cut)
            st = bs_text_printf(&text,
                                "limits, constraints or keep leave out too many routes; "
                                "the %ld cheapest were looked at",
                                plan->looked_at);
        else if (plan->x.failed > 0)
            st = bs_text_printf(&text, "%lu molecules were too much for the rules",
                                (unsigned long)plan->x.failed);
        break;
    }
    list->complete = text.length == 0;
    if (st == BS_OK && text.length > 0)
        st = bs_copy_text(plan->cx, &list->arena, text.data, text.length, &copy);
    list->reason = copy;
    bs_text_free(&text);
    return st;
}

/* ---- The list of routes ------------------------------------------------------------------------
 */

/* Fewer steps first among routes of the same cost, then as they were found. */
static void settle_ties(bs_route **routes, int count)
{
    for (int i = 1; i < count; i++) {
        bs_route *route = routes[i];
        int at = i;

        for (; at > 0; at--) {
            const bs_route *other = routes[at - 1];

            if (fabs(other->cost - route->cost) > 1e-9 * fmax(1, fabs(route->cost)) ||
                other->step_count <= route->step_count)
                break;
            routes[at] = routes[at - 1];
        }
        routes[at] = route;
    }
}

/* Sorts by rank; insertion keeps routes of the same rank in their order. */
static bs_status rank_routes(bs_plan_state *plan, bs_route **routes, int count)
{
    const bs_plan_opts *opts = plan->opts;

    if (!opts->rank)
        return BS_OK;
    for (int i = 0; i < count; i++) {
        bs_status st = opts->rank(opts->payload, plan->cx, routes[i], &routes[i]->rank);

        if (st != BS_OK)
            return st;
        if (isnan(routes[i]->rank))
            return bs_fail(plan->cx, BS_EVALUE, "rank: must be a number");
    }
    for (int i = 1; i < count; i++) {
        bs_route *route = routes[i];
        int at = i;

        for (; at > 0 && routes[at - 1]->rank > route->rank; at--)
            routes[at] = routes[at - 1];
        routes[at] = route;
    }
    return BS_OK;
}

static bs_status trace_list(bs_plan_state *plan, const bs_routes *list)
{
    const bs_plan_opts *opts = plan->opts;
    bs_plan_event event = {.kind = BS_EVENT_ROUTE};
    bs_status st = plan->trace_status;

    if (!opts->trace)
        return BS_OK;
    for (int i = 0; st == BS_OK && i < list->count; i++) {
        event.route = list->items[i];
        st = opts->trace(opts->payload, plan->cx, &event);
    }
    event = (bs_plan_event){.kind = BS_EVENT_END, .routes = list};
    return st == BS_OK ? opts->trace(opts->payload, plan->cx, &event) : st;
}

static bs_status fill_list(bs_plan_state *plan, bs_arena *home, bs_routes **out)
{
    int gaps = plan->opts->gaps ? plan->opts->gaps : DEFAULT_GAPS, count;
    bs_routes *list = NULL;
    bs_route **routes;
    long tries = 20L * plan->pool + (plan->con.whole ? LAST_JUDGED : LAST_TRIES);
    bs_status st = bs_plan__take_routes(plan, home, tries, &routes, &count);

    if (st != BS_OK)
        return st;
    settle_ties(routes, count);
    if ((st = rank_routes(plan, routes, count)) != BS_OK)
        return st;
    if (count > plan->best)
        count = plan->best;
    st = bs_routes_pick(plan->cx, (const bs_route *const *)routes, count, NULL, &list);
    if (st != BS_OK)
        return st;
    list->molecules = plan->x.graph.mol_count;
    list->expanded = plan->x.expanded;
    list->steps = plan->x.graph.step_count;
    if ((st = say_why(plan, list)) == BS_OK)
        st = bs_plan__warn(plan, list);
    if (st == BS_OK && plan->x.graph.mol_count > 0) {
        const char *smiles;
        char *copy;

        st = bs_tag__plain(plan->cx, home, &plan->con.tags, plan->x.nodes[plan->target].smiles,
                           &smiles);
        if (st == BS_OK)
            st = bs_copy_text(plan->cx, &list->arena, smiles, strlen(smiles), &copy);
        if (st == BS_OK)
            list->target = copy;
    }
    if (st == BS_OK)
        st = bs_plan__explain(plan, list);
    if (st == BS_OK)
        st = trace_list(plan, list);
    if (st == BS_OK && gaps > 0)
        st = bs_plan__find_gaps(&plan->x, &list->arena, plan->target, gaps, &list->gaps,
                                &list->gap_count);
    for (int i = 0; st == BS_OK && i < list->gap_count; i++)
        st = bs_tag__plain(plan->cx, &list->arena, &plan->con.tags, list->gaps[i].smiles,
                           &list->gaps[i].smiles);
    if (st != BS_OK)
        bs_routes_free(plan->cx, list);
    else
        *out = list;
    return st;
}

/*
 * Makes the list. After a stop the flag stays set, and whoever polls it would refuse to work, so
 * the context gets a flag at rest meanwhile; what remains to be done is bounded.
 */
bs_status bs_plan__finish(bs_plan_state *plan, bs_routes **out)
{
    atomic_bool *stop = plan->cx->stop;
    atomic_bool rest;
    bs_arena home;
    bs_status st;

    atomic_init(&rest, false);
    if (plan->x.end == BS_END_STOPPED)
        plan->cx->stop = &rest;
    bs_arena_init(&home, plan->cx->gate);
    st = fill_list(plan, &home, out);
    bs_arena_free(&home);
    plan->cx->stop = stop;
    return st;
}
