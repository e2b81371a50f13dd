/*
 * Ranking anew what was explored. Prices and costs are changed in the graph itself, the routes are
 * taken, and what was there before is put back, so that the search can go on.
 */
#include "backsaw/format.h"
#include "search/session.h"

#include <math.h>
#include <string.h>

/* What is put back at the end. */
typedef struct saved {
    bs_graph_mol *mols;
    bs_graph_way *ways;
    double admitted_cost, admitted_count;
    double step_cost, clash_cost;
} saved;

static bs_status save(bs_plan_state *plan, bs_arena *home, saved *s)
{
    const bs_graph *graph = &plan->x.graph;
    bs_status st;

    *s = (saved){
        .admitted_cost = plan->admitted_cost,
        .admitted_count = plan->admitted_count,
        .step_cost = plan->step_cost,
        .clash_cost = plan->clash_cost,
    };
    if ((st = bs_new(plan->cx, home, (size_t)graph->mol_count + 1, &s->mols)) != BS_OK ||
        (st = bs_new(plan->cx, home, (size_t)graph->way_count + 1, &s->ways)) != BS_OK)
        return st;
    if (graph->mol_count > 0)
        memcpy(s->mols, graph->mols, graph->mol_count * sizeof *s->mols);
    if (graph->way_count > 0)
        memcpy(s->ways, graph->ways, graph->way_count * sizeof *s->ways);
    return BS_OK;
}

static void put_back(bs_plan_state *plan, const saved *s)
{
    bs_graph *graph = &plan->x.graph;

    if (graph->mol_count > 0)
        memcpy(graph->mols, s->mols, graph->mol_count * sizeof *s->mols);
    if (graph->way_count > 0)
        memcpy(graph->ways, s->ways, graph->way_count * sizeof *s->ways);
    plan->admitted_cost = s->admitted_cost;
    plan->admitted_count = s->admitted_count;
}

/* ---- Prices ------------------------------------------------------------------------------------
 */

/* Asks the shelf again; `*open` counts molecules that were not worth expanding and now are. */
static bs_status set_prices(bs_plan_state *plan, uint32_t *open)
{
    bs_status st = BS_OK;

    for (uint32_t m = 0; st == BS_OK && m < plan->x.graph.mol_count; m++) {
        const bs_explore_node *node = &plan->x.nodes[m];
        bs_meeting met = {.price = INFINITY};
        bs_arena home;
        bs_mol *mol;

        bs_arena_init(&home, plan->cx->gate);
        st = bs_smiles_read(plan->cx, &home, node->smiles, strlen(node->smiles), NULL, &mol);
        if (st == BS_OK)
            st = bs_plan__meet(plan, plan->cx, mol, node->smiles, &met);
        if (st == BS_OK)
            plan->x.graph.mols[m].price = met.price;
        *open += !node->expanded && node->closed && !met.closed;
        bs_arena_free(&home);
    }
    return st;
}

/* ---- Steps -------------------------------------------------------------------------------------
 */

/* Clashes that the cost of a way of a rule tells of; a cost function of the user's tells nothing.
 */
static double count_clashes(const bs_plan_state *plan, const saved *before, const bs_graph_way *way)
{
    double extra;

    if ((way->tag & BS_PLAN_KNOWN) || plan->own.cost || !(before->clash_cost > 0))
        return 0;
    extra = before->step_cost + bs_rules_transform(plan->opts->rules, (int)way->tag)->step_cost;
    return fmax(0, way->cost - extra) / before->clash_cost;
}

static double default_cost(const bs_plan_state *plan, uint32_t tag)
{
    if (tag & BS_PLAN_KNOWN) {
        const bs_known *known = &plan->known[tag & ~BS_PLAN_KNOWN];

        return known->has_cost ? known->cost : plan->step_cost;
    }
    return plan->step_cost + bs_rules_transform(plan->opts->rules, (int)tag)->step_cost;
}

/* Asks the functions of the options about a way; one that is not allowed is struck. */
static bs_status ask_way(bs_plan_state *plan, uint32_t w, bs_proposal *p)
{
    bs_graph *graph = &plan->x.graph;
    bs_graph_way *way = &graph->ways[w];
    bs_mark temp = bs_arena_mark(&plan->cx->scratch);
    const char **smiles;
    double *equivalents;
    bool admitted;
    bs_status st;

    if ((st = bs_new(plan->cx, &plan->cx->scratch, way->count, &smiles)) != BS_OK ||
        (st = bs_new(plan->cx, &plan->cx->scratch, way->count, &equivalents)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < way->count; i++) {
        smiles[i] = plan->x.nodes[graph->uses[way->first + i].mol].smiles;
        equivalents[i] = graph->uses[way->first + i].equivalents;
    }
    p->smiles = smiles;
    p->equivalents = equivalents;
    p->count = (int)way->count;
    st = bs_plan__ask(plan, plan->cx, plan->x.nodes[way->product].smiles, p, &admitted);
    if (st == BS_OK)
        way->cost = admitted ? p->cost : INFINITY;
    bs_arena_rewind(&plan->cx->scratch, temp);
    return st;
}

static bs_status set_costs(bs_plan_state *plan, const bs_rerank *what, const saved *before)
{
    bs_graph *graph = &plan->x.graph;
    bs_status st = BS_OK;

    for (uint32_t w = 0; st == BS_OK && w < graph->way_count; w++) {
        bs_proposal p = {.cost = graph->ways[w].cost, .tag = graph->ways[w].tag};

        if (what->costs)
            p.cost = graph->ways[w].cost =
                default_cost(plan, p.tag) +
                plan->clash_cost * count_clashes(plan, before, &before->ways[w]);
        if ((what->costs && plan->opts->cost) || (what->steps && plan->opts->allow))
            st = ask_way(plan, w, &p);
    }
    return st;
}

/* ---- Without ------------------------------------------------------------------------------------
 */

/* Nobody sells a struck compound, and no step makes or uses it. */
static void strike(bs_graph *graph, uint32_t mol)
{
    graph->mols[mol].price = INFINITY;
    for (uint32_t w = graph->mols[mol].first_way; w != BS_GRAPH_NONE; w = graph->ways[w].next)
        graph->ways[w].cost = INFINITY;
    for (uint32_t use = graph->mols[mol].first_use; use != BS_GRAPH_NONE;
         use = graph->uses[use].next)
        graph->ways[graph->uses[use].way].cost = INFINITY;
}

static bs_status strike_all(bs_plan_state *plan, const bs_rerank *what, bs_arena *home)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < what->without_count; i++) {
        char *smiles;

        st = bs_smiles_canonical(plan->cx, home, what->without[i], 0, &smiles);
        for (uint32_t m = 0; st == BS_OK && m < plan->x.graph.mol_count; m++) {
            const char *plain;

            st = bs_tag__plain(plan->cx, home, &plan->con.tags, plan->x.nodes[m].smiles, &plain);
            if (st == BS_OK && strcmp(plain, smiles) == 0)
                strike(&plan->x.graph, m);
        }
    }
    return st;
}

/* ---- All ----------------------------------------------------------------------------------------
 */

/* Why the list may miss routes that a new search would find. */
static bs_status doubt(bs_plan_state *plan, uint32_t open, bs_routes *list)
{
    const char *reason = NULL;
    char *copy;
    bs_status st;

    if (plan->x.end == BS_END_ENOUGH)
        reason = "the search had ended with the routes that were cheapest by its own costs";
    else if (open > 0)
        reason = "compounds that were at hand were not explored";
    else if (plan->depth > (int)plan->x.limits.depth)
        reason = "the search did not go so deep";
    if (!list->complete || !reason)
        return BS_OK;
    if ((st = bs_copy_text(plan->cx, &list->arena, reason, strlen(reason), &copy)) == BS_OK) {
        list->complete = false;
        list->reason = copy;
    }
    return st;
}

static bs_status rerank(bs_plan_state *plan, const bs_rerank *what, const saved *before,
                        bs_arena *home, bs_routes **out)
{
    uint32_t open = 0;
    bs_status st = BS_OK;

    if (what->prices)
        st = set_prices(plan, &open);
    if (st == BS_OK)
        st = set_costs(plan, what, before);
    if (st == BS_OK)
        st = strike_all(plan, what, home);
    if (st == BS_OK)
        st = bs_plan__finish(plan, out);
    if (st == BS_OK && (st = doubt(plan, open, *out)) != BS_OK) {
        bs_routes_free(plan->cx, *out);
        *out = NULL;
    }
    return st;
}

bs_status bs_search_rerank(bs_search *search, const bs_plan_opts *opts, const bs_rerank *what,
                           bs_routes **out)
{
    bs_plan_state *plan = &search->plan;
    bs_plan_opts changed = *opts;
    bs_arena home;
    saved before;
    bs_status st;

    *out = NULL;
    if ((st = bs_plan__check(plan->cx, opts)) != BS_OK)
        return st;
    changed.guess = NULL; /* nothing is explored */
    changed.trace = NULL;
    bs_arena_init(&home, plan->cx->gate);
    if ((st = save(plan, &home, &before)) == BS_OK) {
        plan->opts = &changed;
        bs_plan__read_options(plan);
        st = rerank(plan, what, &before, &home, out);
        plan->opts = &plan->own;
        bs_plan__read_options(plan);
        put_back(plan, &before);
    }
    bs_arena_free(&home);
    return st;
}
