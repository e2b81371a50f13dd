/* From the explored graph to routes: enumeration, filters, and the details of their steps. */
#include "backsaw/format.h"
#include "search/kbest.h"
#include "search/plan.h"

#include <math.h>
#include <string.h>

/* ---- Details of steps -------------------------------------------------------------------------- */

static bool same_precursors(const bs_plan_state *plan, const bs_graph_way *way,
                            const bs_step *found)
{
    if ((uint32_t)found->precursor_count != way->count)
        return false;
    for (int i = 0; i < found->precursor_count; i++) {
        uint32_t mol = bs_explore__find(&plan->x, found->smiles[i]), j = 0;

        while (j < way->count && plan->x.graph.uses[way->first + j].mol != mol)
            j++;
        if (j == way->count)
            return false;
    }
    return true;
}

/* Runs the rule of a way once more: that it gives the step is the check, and it tells rivals. */
static bs_status run_again(bs_plan_state *plan, uint32_t w, bs_plan_detail *detail)
{
    const bs_graph_way *way = &plan->x.graph.ways[w];
    const char *smiles = plan->x.nodes[way->product].smiles;
    bs_ctx *cx = plan->cx;
    bs_steps found = {NULL, 0};
    bs_arena home; /* not the scratch arena, which the callee rewinds */
    bs_mol *mol;
    bs_status st;

    bs_arena_init(&home, cx->gate);
    st = bs_smiles_read(cx, &home, smiles, strlen(smiles), NULL, &mol);
    if (st == BS_OK)
        st = bs_rules_back(cx, &home, plan->opts->rules, (int)way->tag, mol,
                           plan->opts->hooks, 0, &found);
    for (int i = 0; st == BS_OK && !detail->checked && i < found.count; i++) {
        if (!same_precursors(plan, way, &found.items[i]))
            continue;
        detail->checked = true;
        st = bs_plan__rivals(cx, &plan->arena, &found.items[i].rivals, &detail->rivals,
                             &detail->rival_count);
        if (st == BS_OK)
            st = bs_plan__name_clashes(plan, cx, &plan->arena, &found.items[i], &detail->clashes,
                                       &detail->clash_count);
    }
    bs_arena_free(&home);
    return st == BS_ELIMIT ? BS_OK : st;
}

static bs_status find_detail(bs_plan_state *plan, uint32_t way, bs_plan_detail *out)
{
    size_t cursor = 0;
    uint32_t at = bs_map_next(&plan->detail_index, way, &cursor);
    bs_status st;

    *out = (bs_plan_detail){.way = way};
    if (at != BS_MAP_NONE) {
        *out = plan->details[at];
        return BS_OK;
    }
    if (!(plan->x.graph.ways[way].tag & BS_PLAN_KNOWN) &&
        (st = run_again(plan, way, out)) != BS_OK)
        return st;
    st = bs_graph__reserve(plan->cx, &plan->details, &plan->detail_room, plan->detail_count + 1,
                           sizeof *plan->details);
    if (st == BS_OK)
        st = bs_map_add(&plan->detail_index, way, (uint32_t)plan->detail_count);
    if (st == BS_OK)
        plan->details[plan->detail_count++] = *out;
    return st;
}

/* ---- One route ---------------------------------------------------------------------------------- */

/* The parts of a route while they are collected. Structures and offers lie in `home`. */
typedef struct parts {
    bs_plan_state *plan;
    bs_arena home;
    bs_route_molecule *molecules;
    uint32_t *mols; /* by number in the route: the molecule of the graph */
    bs_route_step *steps;
    int molecule_count, step_count;
} parts;

/* The number of a molecule in the route; it is added if it is new. */
static int number_of(parts *p, uint32_t mol)
{
    int at = 0;

    while (at < p->molecule_count && p->mols[at] != mol)
        at++;
    if (at == p->molecule_count) {
        p->mols[at] = mol;
        p->molecules[at] = (bs_route_molecule){
            .smiles = p->plan->x.nodes[mol].smiles,
            .price = -1,
            .offer = {.price_per_gram = -1, .container_g = -1, .lead_days = -1},
        };
        p->molecule_count++;
    }
    return at;
}

/* All ways to run the step that a chosen way belongs to. */
static bs_status add_ways(parts *p, const bs_graph_way *chosen, bs_route_step *step)
{
    const bs_graph *graph = &p->plan->x.graph;
    bs_ctx *cx = p->plan->cx;
    int count = 0;
    bs_status st;

    for (uint32_t w = graph->mols[chosen->product].first_way; w != BS_GRAPH_NONE;
         w = graph->ways[w].next)
        count += graph->ways[w].step == chosen->step;
    if ((st = bs_new(cx, &cx->scratch, count, &step->ways)) != BS_OK)
        return st;
    for (uint32_t w = graph->mols[chosen->product].first_way; w != BS_GRAPH_NONE;
         w = graph->ways[w].next) {
        const bs_graph_way *way = &graph->ways[w];
        bs_route_way *to = &step->ways[step->way_count];

        if (way->step != chosen->step)
            continue;
        bs_plan__fill_way(p->plan, way->tag, to);
        to->cost = way->cost;
        if ((st = bs_new(cx, &cx->scratch, way->count, &to->equivalents)) != BS_OK)
            return st;
        for (uint32_t i = 0; i < way->count; i++)
            to->equivalents[i] = graph->uses[way->first + i].equivalents;
        step->way_count++;
    }
    return BS_OK;
}

static bs_status add_step(parts *p, uint32_t w)
{
    const bs_graph_way *way = &p->plan->x.graph.ways[w];
    bs_ctx *cx = p->plan->cx;
    bs_route_step *step = &p->steps[p->step_count++];
    bs_plan_detail detail;
    bs_status st = find_detail(p->plan, w, &detail);

    if (st != BS_OK)
        return st;
    *step = (bs_route_step){
        .product = number_of(p, way->product),
        .precursor_count = (int)way->count,
        .known = (way->tag & BS_PLAN_KNOWN) != 0,
        .checked = detail.checked,
        .rivals = detail.rivals,
        .rival_count = detail.rival_count,
        .clashes = detail.clashes,
        .clash_count = detail.clash_count,
    };
    if ((st = bs_new(cx, &cx->scratch, way->count, &step->precursors)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < way->count; i++)
        step->precursors[i] = number_of(p, p->plan->x.graph.uses[way->first + i].mol);
    return add_ways(p, way, step);
}

/* Asks the shelf again for the offer behind the price of a molecule that is bought. */
static bs_status add_offer(parts *p, int at)
{
    bs_ctx *cx = p->plan->cx;
    bs_route_molecule *mol = &p->molecules[at];
    bs_mol *structure;
    double price;
    bool found;
    bs_status st;

    mol->price = p->plan->x.graph.mols[p->mols[at]].price;
    if (!p->plan->opts->shelf)
        return BS_OK;
    st = bs_smiles_read(cx, &p->home, mol->smiles, strlen(mol->smiles), NULL, &structure);
    if (st == BS_OK)
        st = bs_shelf_price(cx, &p->home, p->plan->opts->shelf, structure, mol->smiles, &found,
                            &price, &mol->offer);
    return st;
}

static bs_status add_offers(parts *p)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < p->molecule_count; i++) {
        bool made = false;

        for (int j = 0; j < p->step_count; j++)
            made = made || p->steps[j].product == i;
        if (!made)
            st = add_offer(p, i);
    }
    return st;
}

static bs_status make_route(bs_plan_state *plan, bs_arena *home, const bs_kbest_route *from,
                            bs_route **out)
{
    bs_arena *scratch = &plan->cx->scratch;
    bs_mark temp = bs_arena_mark(scratch);
    parts p = {.plan = plan};
    size_t most = 1;
    bs_status st;

    bs_arena_init(&p.home, plan->cx->gate);
    for (uint32_t i = 0; i < from->count; i++)
        most += 1 + plan->x.graph.ways[from->ways[i]].count;
    if ((st = bs_new(plan->cx, scratch, most, &p.molecules)) != BS_OK ||
        (st = bs_new(plan->cx, scratch, most, &p.mols)) != BS_OK ||
        (st = bs_new(plan->cx, scratch, from->count, &p.steps)) != BS_OK)
        goto done;
    number_of(&p, plan->target);
    for (uint32_t i = 0; st == BS_OK && i < from->count; i++)
        st = add_step(&p, from->ways[i]);
    if (st == BS_OK)
        st = add_offers(&p);
    if (st == BS_OK)
        st = bs_route_build(plan->cx, home, plan->opts->mode, p.molecules, p.molecule_count,
                            p.steps, p.step_count, 0, out);
done:
    bs_arena_free(&p.home);
    bs_arena_rewind(scratch, temp);
    return st;
}

/* ---- All of them --------------------------------------------------------------------------------- */

/* Steps in line of an answer, from its ways alone; precursors come first in it. */
static bs_status find_length(const bs_plan_state *plan, const bs_kbest_route *route, int *length)
{
    const bs_graph *graph = &plan->x.graph;
    bs_arena *scratch = &plan->cx->scratch;
    bs_mark temp = bs_arena_mark(scratch);
    int *line;
    bs_status st = bs_new(plan->cx, scratch, route->count, &line);

    *length = 0;
    for (uint32_t i = 0; st == BS_OK && i < route->count; i++) {
        const bs_graph_way *way = &graph->ways[route->ways[i]];

        for (uint32_t j = 0; j < i; j++) {
            uint32_t made = graph->ways[route->ways[j]].product;

            for (uint32_t use = way->first; use < way->first + way->count; use++) {
                if (graph->uses[use].mol == made && line[j] > line[i])
                    line[i] = line[j];
            }
        }
        if (++line[i] > *length)
            *length = line[i];
    }
    bs_arena_rewind(scratch, temp);
    return st;
}

/* Makes a route of an answer if the limits and the user's filter leave it, else `*out` is NULL. */
static bs_status consider(bs_plan_state *plan, bs_arena *home, const bs_kbest_route *answer,
                          bs_route **out)
{
    const bs_plan_opts *opts = plan->opts;
    bs_mark kept = bs_arena_mark(home);
    bool wanted = true;
    int length;
    bs_status st = find_length(plan, answer, &length);

    *out = NULL;
    if (st != BS_OK || length > plan->depth ||
        (opts->limits.steps > 0 && answer->count > (uint32_t)opts->limits.steps))
        return st;
    st = make_route(plan, home, answer, out);
    if (st == BS_OK && opts->keep)
        st = opts->keep(opts->payload, plan->cx, *out, &wanted);
    if (st != BS_OK || !wanted) {
        bs_arena_rewind(home, kept);
        *out = NULL;
    }
    return st;
}

bs_status bs_plan__take_routes(bs_plan_state *plan, bs_arena *home, long tries, bs_route ***routes,
                               int *count)
{
    bs_kbest *kbest = NULL;
    bs_status st = bs_new(plan->cx, home, plan->pool, routes);

    *count = 0;
    plan->kbest_cut = false;
    if (st != BS_OK)
        return st;
    st = bs_kbest__new(&plan->x.graph, plan->opts->mode, plan->target, NULL, &kbest);
    while (st == BS_OK && *count < plan->pool) {
        bs_kbest_route answer;
        bs_route *route;
        bool found;

        st = bs_kbest__next(kbest, &found, &answer);
        if (st != BS_OK || !found)
            break;
        if (tries-- <= 0) {
            plan->kbest_cut = true;
            break;
        }
        st = consider(plan, home, &answer, &route);
        if (st == BS_OK && route)
            (*routes)[(*count)++] = route;
    }
    plan->kbest_cut = plan->kbest_cut || (kbest && bs_kbest__cut(kbest));
    bs_kbest__free(kbest);
    return st;
}
