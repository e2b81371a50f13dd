/* From the explored graph to routes: enumeration, filters, and the details of their steps. */
#include "backsaw/format.h"
#include "search/kbest.h"
#include "search/plan.h"

#include <math.h>
#include <string.h>

/* ---- Details of steps --------------------------------------------------------------------------
 */

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
    bs_rule_hooks hooks = plan->opts->hooks ? *plan->opts->hooks : (bs_rule_hooks){0};
    bs_rule_faults faults = plan->faults;
    bs_steps found = {NULL, 0};
    bs_arena home; /* not the scratch arena, which the callee rewinds */
    bs_mol *mol;
    bs_status st;

    hooks.faults = &faults;
    bs_arena_init(&home, cx->gate);
    st = bs_smiles_read(cx, &home, smiles, strlen(smiles), NULL, &mol);
    if (st == BS_OK)
        st = bs_rules_back(cx, &home, plan->opts->rules, (int)way->tag, mol, &hooks, 0, &found);
    if (st == BS_OK)
        st = bs_plan__note_faults(plan, &faults);
    for (int i = 0; st == BS_OK && !detail->checked && i < found.count; i++) {
        if (!same_precursors(plan, way, &found.items[i]))
            continue;
        detail->checked = true;
        st = bs_plan__rivals(plan, cx, &plan->arena, &found.items[i].rivals, &detail->rivals,
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
    if (!(plan->x.graph.ways[way].tag & BS_PLAN_KNOWN) && (st = run_again(plan, way, out)) != BS_OK)
        return st;
    st = bs_graph__reserve(plan->cx, &plan->details, &plan->detail_room, plan->detail_count + 1,
                           sizeof *plan->details);
    if (st == BS_OK)
        st = bs_map_add(&plan->detail_index, way, (uint32_t)plan->detail_count);
    if (st == BS_OK)
        plan->details[plan->detail_count++] = *out;
    return st;
}

/* ---- One route ----------------------------------------------------------------------------------
 */

/*
 * The parts of a route while they are collected, plain. Structures, offers and plain SMILES lie in
 * `home`. With tags, compounds of the graph that differ in their tags only are one compound here;
 * if that is made in two ways, or both made and bought, there is no such route.
 */
typedef struct parts {
    bs_plan_state *plan;
    bs_arena home;
    bs_route_molecule *molecules;
    uint32_t *mols; /* by number in the route: the first molecule of the graph */
    bs_route_step *steps;
    uint32_t *ways; /* of the graph, by step */
    int molecule_count, step_count;
    bool torn; /* there is no such route */
} parts;

/* The number of a molecule in the route; it is added if it is new. */
static bs_status number_of(parts *p, uint32_t mol, int *number)
{
    const char *smiles;
    int at = 0;
    bs_status st = bs_tag__plain(p->plan->cx, &p->home, &p->plan->con.tags,
                                 p->plan->x.nodes[mol].smiles, &smiles);

    if (st != BS_OK)
        return st;
    while (at < p->molecule_count && p->mols[at] != mol &&
           strcmp(p->molecules[at].smiles, smiles) != 0)
        at++;
    if (at == p->molecule_count) {
        p->mols[at] = mol;
        p->molecules[at] = (bs_route_molecule){
            .smiles = smiles,
            .price = -1,
            .step = -1,
            .offer = {.price_per_gram = -1, .container_g = -1, .lead_days = -1},
        };
        p->molecule_count++;
    }
    *number = at;
    return BS_OK;
}

/* Whether two steps of the same product are one: the same compounds, and no two known steps. */
static bool are_one(const parts *p, const bs_route_step *a, uint32_t way_a, const bs_route_step *b,
                    uint32_t way_b)
{
    uint32_t x = p->plan->x.graph.ways[way_a].tag, y = p->plan->x.graph.ways[way_b].tag;

    if (a->precursor_count != b->precursor_count || (x != y && ((x | y) & BS_PLAN_KNOWN)))
        return false;
    for (int i = 0; i < a->precursor_count; i++) {
        int k = 0;

        while (k < b->precursor_count && b->precursors[k] != a->precursors[i])
            k++;
        if (k == b->precursor_count)
            return false;
    }
    return true;
}

/* Adds a step without its ways; one that is there already is not added again. */
static bs_status add_step(parts *p, uint32_t w)
{
    const bs_graph_way *way = &p->plan->x.graph.ways[w];
    bs_route_step *step = &p->steps[p->step_count];
    bs_status st;

    *step = (bs_route_step){.known = (way->tag & BS_PLAN_KNOWN) != 0};
    if ((st = number_of(p, way->product, &step->product)) != BS_OK ||
        (st = bs_new(p->plan->cx, &p->plan->cx->scratch, way->count, &step->precursors)) != BS_OK)
        return st;
    for (uint32_t i = 0; st == BS_OK && i < way->count; i++) {
        int number, k = 0;

        st = number_of(p, p->plan->x.graph.uses[way->first + i].mol, &number);
        while (k < step->precursor_count && step->precursors[k] != number)
            k++;
        if (k == step->precursor_count)
            step->precursors[step->precursor_count++] = number;
    }
    if (st == BS_OK && p->molecules[step->product].step >= 0) {
        int other = p->molecules[step->product].step;

        p->torn = p->torn || !are_one(p, step, w, &p->steps[other], p->ways[other]);
        return BS_OK;
    }
    p->molecules[step->product].step = p->step_count;
    p->ways[p->step_count++] = w;
    return st;
}

/* With tags: whether a compound is bought under the one tag and made under another. */
static bs_status look_for_tears(parts *p, const bs_kbest_route *from)
{
    const bs_graph *graph = &p->plan->x.graph;
    bs_status st = BS_OK;

    for (uint32_t i = 0; st == BS_OK && i < from->count; i++) {
        const bs_graph_way *way = &graph->ways[from->ways[i]];

        for (uint32_t use = way->first; st == BS_OK && use < way->first + way->count; use++) {
            bool made = false;
            int number;

            for (uint32_t k = 0; k < from->count; k++)
                made = made || graph->ways[from->ways[k]].product == graph->uses[use].mol;
            st = number_of(p, graph->uses[use].mol, &number);
            p->torn = p->torn || (!made && p->molecules[number].step >= 0);
        }
    }
    return st;
}

/* What one way of a step says, with the equivalents of the precursors as the route numbers them. */
static bs_status add_way(parts *p, const bs_graph_way *way, bs_route_step *step)
{
    const bs_graph *graph = &p->plan->x.graph;
    bs_route_way *to = &step->ways[step->way_count++];
    bs_status st;

    bs_plan__fill_way(p->plan, way->tag, to);
    to->cost = way->cost;
    st = bs_new(p->plan->cx, &p->plan->cx->scratch, way->count, &to->equivalents);
    for (uint32_t i = 0; st == BS_OK && i < way->count; i++) {
        const bs_graph_use *use = &graph->uses[way->first + i];
        int number, k = 0;

        st = number_of(p, use->mol, &number);
        while (k < step->precursor_count && step->precursors[k] != number)
            k++;
        if (k < step->precursor_count)
            to->equivalents[k] += use->equivalents;
    }
    return st;
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
        count += graph->ways[w].step == chosen->step && isfinite(graph->ways[w].cost);
    st = bs_new(cx, &cx->scratch, count, &step->ways);
    for (uint32_t w = graph->mols[chosen->product].first_way; st == BS_OK && w != BS_GRAPH_NONE;
         w = graph->ways[w].next) {
        if (graph->ways[w].step == chosen->step && isfinite(graph->ways[w].cost))
            st = add_way(p, &graph->ways[w], step);
    }
    return st;
}

/* Ways, check and rivals of the steps. */
static bs_status add_details(parts *p)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < p->step_count; i++) {
        bs_plan_detail detail;

        if ((st = find_detail(p->plan, p->ways[i], &detail)) != BS_OK)
            break;
        p->steps[i].checked = detail.checked;
        p->steps[i].rivals = detail.rivals;
        p->steps[i].rival_count = detail.rival_count;
        p->steps[i].clashes = detail.clashes;
        p->steps[i].clash_count = detail.clash_count;
        st = add_ways(p, &p->plan->x.graph.ways[p->ways[i]], &p->steps[i]);
    }
    return st;
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
        if (p->molecules[i].step < 0)
            st = add_offer(p, i);
    }
    return st;
}

/* Collects the parts of an answer, as far as the limits and constraints look at them. */
static bs_status collect(parts *p, const bs_kbest_route *from)
{
    bs_ctx *cx = p->plan->cx;
    size_t most = 1;
    int target;
    bs_status st;

    for (uint32_t i = 0; i < from->count; i++)
        most += 1 + p->plan->x.graph.ways[from->ways[i]].count;
    if ((st = bs_new(cx, &cx->scratch, most, &p->molecules)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, most, &p->mols)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, (size_t)from->count + 1, &p->steps)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, (size_t)from->count + 1, &p->ways)) != BS_OK ||
        (st = number_of(p, p->plan->target, &target)) != BS_OK)
        return st;
    for (uint32_t i = 0; st == BS_OK && i < from->count; i++)
        st = add_step(p, from->ways[i]);
    if (st == BS_OK && p->plan->con.tags.count > 0)
        st = look_for_tears(p, from);
    return st;
}

static bs_status is_wanted(parts *p, int length, bool *wanted)
{
    const bs_plan_state *plan = p->plan;
    bs_outline outline = {
        .molecules = p->molecules,
        .molecule_count = p->molecule_count,
        .steps = p->steps,
        .ways = p->ways,
        .step_count = p->step_count,
        .longest = length,
    };

    *wanted =
        !p->torn && (plan->opts->limits.steps <= 0 || p->step_count <= plan->opts->limits.steps);
    return *wanted ? bs_constraint__judge(p->plan, &outline, wanted) : BS_OK;
}

/* Makes a route of an answer if limits and constraints leave it, else `*out` is NULL. */
static bs_status make_route(bs_plan_state *plan, bs_arena *home, const bs_kbest_route *from,
                            int length, bs_route **out)
{
    bs_mark temp = bs_arena_mark(&plan->cx->scratch);
    parts p = {.plan = plan};
    bool wanted = false;
    bs_status st;

    *out = NULL;
    bs_arena_init(&p.home, plan->cx->gate);
    if ((st = collect(&p, from)) == BS_OK && (st = is_wanted(&p, length, &wanted)) == BS_OK &&
        wanted && (st = add_details(&p)) == BS_OK && (st = add_offers(&p)) == BS_OK)
        st = bs_route_build(plan->cx, home, plan->opts->mode, p.molecules, p.molecule_count,
                            p.steps, p.step_count, 0, out);
    bs_arena_free(&p.home);
    bs_arena_rewind(&plan->cx->scratch, temp);
    return st;
}

/* ---- All of them
 * --------------------------------------------------------------------------------- */

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

/* Makes a route of an answer if nothing leaves it out, else `*out` is NULL. */
static bs_status consider(bs_plan_state *plan, bs_arena *home, const bs_kbest_route *answer,
                          bs_route **out)
{
    const bs_plan_opts *opts = plan->opts;
    bs_mark kept = bs_arena_mark(home);
    bool wanted = true;
    int length;
    bs_status st = find_length(plan, answer, &length);

    *out = NULL;
    if (st != BS_OK || length > plan->depth)
        return st;
    st = make_route(plan, home, answer, length, out);
    if (st == BS_OK && *out && opts->keep)
        st = opts->keep(opts->payload, plan->cx, *out, &wanted);
    if (st != BS_OK || !wanted) {
        bs_arena_rewind(home, kept);
        *out = NULL;
    }
    return st;
}

/*
 * Whether a route is among those taken: with tags, or with ways that are steps of their own, the
 * graph has several answers for it, of which the first is the cheapest.
 */
static bool is_taken(const bs_plan_state *plan, bs_route *const *routes, int count,
                     const bs_route *route)
{
    if (!plan->con.by_way && plan->con.tags.count == 0)
        return false;
    for (int i = 0; i < count; i++) {
        if (bs_route_same(routes[i], route))
            return true;
    }
    return false;
}

/* ---- Diversity ----------------------------------------------------------------------------- */

static bool has_carbon_atom(const char *smiles)
{
    for (const char *c = smiles; *c; c++) {
        if ((*c == 'C' || *c == 'c') && !(c[0] == 'C' && strchr("laroudsemnf", c[1]) && c[1]))
            return true;
    }
    return false;
}

/* Whether a step is a key disconnection: it joins what stands apart. */
static bool is_key(const bs_plan_state *plan, const bs_route *route, const bs_route_step *step)
{
    int carbon = 0;

    if (!step->known)
        return bs_rules_transform(plan->opts->rules, step->ways[0].rule)->kind == BS_DISCONNECTION;
    for (int i = 0; i < step->precursor_count; i++)
        carbon += has_carbon_atom(route->molecules[step->precursors[i]].smiles);
    return carbon > 1;
}

/* Whether two routes have too many key disconnections in common, measured by those of `kept`. */
static bool overlaps(const bs_plan_state *plan, const bs_route *kept, const bs_route *route)
{
    int keys = 0, shared = 0, others = 0;

    for (int i = 0; i < route->step_count; i++)
        others += is_key(plan, route, &route->steps[i]);
    for (int i = 0; i < kept->step_count; i++) {
        bool same = false;

        if (!is_key(plan, kept, &kept->steps[i]))
            continue;
        keys++;
        for (int k = 0; k < route->step_count; k++)
            same = same || bs_route_same_step(kept, i, route, k);
        shared += same;
    }
    if (keys == 0)
        return others == 0;
    return shared > plan->opts->overlap * keys;
}

static bool is_like_another(const bs_plan_state *plan, bs_route *const *routes, int count,
                            const bs_route *route)
{
    for (int i = 0; plan->opts->has_overlap && i < count; i++) {
        if (overlaps(plan, routes[i], route))
            return true;
    }
    return false;
}

/* ---- The list ------------------------------------------------------------------------------- */

bs_status bs_plan__take_routes(bs_plan_state *plan, bs_arena *home, long tries, bs_route ***routes,
                               int *count)
{
    bs_kbest *kbest = NULL;
    bs_status st = bs_new(plan->cx, home, plan->pool, routes);

    *count = 0;
    plan->kbest_cut = false;
    plan->looked_at = 0;
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
        plan->looked_at++;
        st = consider(plan, home, &answer, &route);
        if (st == BS_OK && route && !is_taken(plan, *routes, *count, route) &&
            !is_like_another(plan, *routes, *count, route))
            (*routes)[(*count)++] = route;
    }
    plan->routes_seen = *count;
    plan->kbest_cut = plan->kbest_cut || (kbest && bs_kbest__cut(kbest));
    bs_kbest__free(kbest);
    return st;
}
