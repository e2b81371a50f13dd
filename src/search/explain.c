/* What a search leaves behind for those who ask why: a line on each molecule and transform. */
#include "search/plan.h"
#include "search/value.h"

#include <math.h>
#include <string.h>

bs_status bs_plan__count(bs_plan_state *plan, const char *product, uint32_t tag,
                         bs_verdict_of whose)
{
    uint32_t mol = bs_explore__find(&plan->x, product);
    bs_plan_tally *tally;
    size_t before = plan->tally_room;
    bs_status st;

    if (mol == BS_GRAPH_NONE)
        return BS_OK;
    if (mol >= before) {
        st = bs_graph__reserve(plan->cx, &plan->tallies, &plan->tally_room, (size_t)mol + 1,
                               sizeof *plan->tallies);
        if (st != BS_OK)
            return st;
        memset(plan->tallies + before, 0, (plan->tally_room - before) * sizeof *plan->tallies);
    }
    tally = &plan->tallies[mol];
    tally->found++;
    tally->barred += whose == BS_REFUSED_BY_CONSTRAINT;
    tally->disallowed += whose == BS_REFUSED_BY_ALLOW;
    if ((int64_t)tag < plan->count_count) { /* no known step, nor a rule that came later */
        plan->counts[tag].found++;
        plan->counts[tag].refused += whose != BS_ADMITTED;
    }
    if (plan->x.nodes[mol].depth != UINT32_MAX && plan->x.nodes[mol].depth > plan->deepest)
        plan->deepest = plan->x.nodes[mol].depth;
    return BS_OK;
}

bs_status bs_plan__start_counts(bs_plan_state *plan)
{
    plan->count_count = plan->opts->rules ? bs_rules_count(plan->opts->rules) : 0;
    return bs_new(plan->cx, &plan->arena, plan->count_count, &plan->counts);
}

bs_status bs_plan__merged(void *payload, bs_proposals *found)
{
    bs_plan_state *plan = payload;
    const bs_plan_asked *asked = found->extra;
    bs_status st;

    if (!asked)
        return BS_OK;
    for (int i = 0; i < plan->count_count; i++) {
        if (!bs_rule_faults_find(&plan->faults, i))
            plan->counts[i].tried += asked->tried[i];
    }
    if ((st = bs_plan__note_faults(plan, &asked->faults)) == BS_OK)
        bs_plan__strike(plan, found);
    return st;
}

/* The first precursor that cannot be had, of the way that lacks the fewest. */
static uint32_t find_lack(const bs_plan_state *plan, const bs_values *values, uint32_t mol)
{
    const bs_graph *graph = &plan->x.graph;
    uint32_t best = BS_GRAPH_NONE, fewest = UINT32_MAX;

    for (uint32_t w = graph->mols[mol].first_way; w != BS_GRAPH_NONE; w = graph->ways[w].next) {
        const bs_graph_way *way = &graph->ways[w];
        uint32_t lacking = 0, first = BS_GRAPH_NONE;

        for (uint32_t use = way->first; use < way->first + way->count; use++) {
            if (isfinite(values->items[graph->uses[use].mol].value))
                continue;
            first = lacking++ == 0 ? graph->uses[use].mol : first;
        }
        if (lacking > 0 && lacking < fewest) {
            fewest = lacking;
            best = first;
        }
    }
    return best;
}

static bs_status describe(const bs_plan_state *plan, const bs_values *values, bs_explored *explored,
                          uint32_t mol)
{
    const bs_explore_node *node = &plan->x.nodes[mol];
    const bs_graph_mol *in_graph = &plan->x.graph.mols[mol];
    bs_explored_molecule *to = &explored->molecules[mol];
    double cost = values->items[mol].value;
    const char *smiles;
    char *copy;
    bs_arena home;
    bs_status st;

    bs_arena_init(&home, plan->cx->gate);
    st = bs_tag__plain(plan->cx, &home, &plan->con.tags, node->smiles, &smiles);
    if (st == BS_OK)
        st = bs_copy_text(plan->cx, &explored->arena, smiles, strlen(smiles), &copy);
    if (st == BS_OK) {
        to->smiles = copy;
        to->price = isfinite(in_graph->price) ? in_graph->price : -1;
        to->cost = isfinite(cost) ? cost : -1;
        to->depth = node->depth == UINT32_MAX ? -1 : (int)node->depth;
        to->expanded = node->expanded;
        to->closed = node->closed && !node->urgent;
        to->too_deep = !node->expanded && (int)node->depth >= plan->depth;
        to->ways = in_graph->first_way != BS_GRAPH_NONE;
        if (mol < plan->tally_room) {
            to->found = plan->tallies[mol].found;
            to->barred = plan->tallies[mol].barred;
            to->disallowed = plan->tallies[mol].disallowed;
        }
    }
    bs_arena_free(&home);
    return st;
}

/* How many of the routes use each transform, by the way that is the cheapest. */
static void count_uses(const bs_routes *list, bs_explored *explored)
{
    for (int i = 0; i < list->count; i++) {
        for (int k = 0; k < list->items[i]->step_count; k++) {
            int rule = list->items[i]->steps[k].ways[0].rule;

            if (rule >= 0 && rule < explored->transform_count)
                explored->transforms[rule].used++;
        }
    }
}

static bs_status copy_count(const bs_plan_state *plan, int i, bs_explored *explored)
{
    const char *name = bs_rules_transform(plan->opts->rules, i)->name;
    const bs_rule_fault *fault = bs_rule_faults_find(&plan->faults, i);
    bs_transform_count *to = &explored->transforms[i];
    char *copy = NULL, *message = NULL;
    bs_status st = bs_copy_text(plan->cx, &explored->arena, name, strlen(name), &copy);

    if (st == BS_OK && fault)
        st = bs_copy_text(plan->cx, &explored->arena, fault->message, strlen(fault->message),
                          &message);
    *to = plan->counts[i];
    to->name = copy;
    to->fault = message;
    return st;
}

static bs_status fill(bs_plan_state *plan, const bs_values *values, bs_routes *list)
{
    bs_explored *explored = list->saw;
    bs_status st = BS_OK;

    for (uint32_t m = 0; st == BS_OK && m < plan->x.graph.mol_count; m++)
        st = describe(plan, values, explored, m);
    for (uint32_t m = 0; st == BS_OK && m < plan->x.graph.mol_count; m++) {
        uint32_t lack =
            isfinite(values->items[m].value) ? BS_GRAPH_NONE : find_lack(plan, values, m);

        if (lack != BS_GRAPH_NONE)
            explored->molecules[m].lacks = explored->molecules[lack].smiles;
    }
    for (int i = 0; st == BS_OK && i < plan->count_count; i++)
        st = copy_count(plan, i, explored);
    count_uses(list, explored);
    return st;
}

bs_status bs_plan__explain(bs_plan_state *plan, bs_routes *list)
{
    bs_values values;
    bs_status st =
        bs_explored_new(plan->cx, plan->x.graph.mol_count, plan->count_count, &list->saw);

    if (st != BS_OK)
        return st;
    bs_values__init(&values, &plan->x.graph, plan->opts->mode, false);
    if ((st = bs_values__grow(&values)) == BS_OK && (st = bs_values__settle(&values)) == BS_OK)
        st = fill(plan, &values, list);
    bs_values__free(&values);
    return st;
}
