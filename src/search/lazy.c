/* The solver of lazy.h: walks down the present answer, and raises bounds on the way back. */
#include "search/lazy.h"

#include <math.h>
#include <string.h>

#define NEAR 1e-13

enum { UNSEEN, ENTERED, LEFT };

bs_status bs_lazy__init(bs_lazy *lazy, const bs_cheapest *solved)
{
    bs_gate *gate = solved->graph->cx->gate;
    size_t n = solved->graph->mol_count;

    *lazy = (bs_lazy){.graph = solved->graph, .mode = solved->mode, .bars = solved};
    lazy->base = bs_gate_alloc(gate, n * sizeof *lazy->base);
    lazy->value = bs_gate_alloc(gate, n * sizeof *lazy->value);
    lazy->base_choice = bs_gate_alloc(gate, n * sizeof *lazy->base_choice);
    lazy->choice = bs_gate_alloc(gate, n * sizeof *lazy->choice);
    lazy->touched = bs_gate_alloc(gate, n * sizeof *lazy->touched);
    lazy->is_touched = bs_gate_alloc(gate, n * sizeof *lazy->is_touched);
    lazy->stack = bs_gate_alloc(gate, n * sizeof *lazy->stack);
    lazy->met = bs_gate_alloc(gate, n * sizeof *lazy->met);
    lazy->state = bs_gate_alloc(gate, n);
    if (!lazy->base || !lazy->value || !lazy->base_choice || !lazy->choice || !lazy->touched ||
        !lazy->is_touched || !lazy->stack || !lazy->met || !lazy->state) {
        bs_lazy__free(lazy);
        return bs_fail_memory(solved->graph->cx);
    }
    memcpy(lazy->base, solved->value, n * sizeof *lazy->base);
    memcpy(lazy->value, solved->value, n * sizeof *lazy->value);
    memcpy(lazy->base_choice, solved->choice, n * sizeof *lazy->choice);
    memcpy(lazy->choice, solved->choice, n * sizeof *lazy->choice);
    return BS_OK;
}

void bs_lazy__free(bs_lazy *lazy)
{
    bs_gate *gate;
    size_t n;

    if (!lazy->graph)
        return;
    gate = lazy->graph->cx->gate;
    n = lazy->graph->mol_count;
    bs_gate_free(gate, lazy->base, n * sizeof *lazy->base);
    bs_gate_free(gate, lazy->value, n * sizeof *lazy->value);
    bs_gate_free(gate, lazy->base_choice, n * sizeof *lazy->base_choice);
    bs_gate_free(gate, lazy->choice, n * sizeof *lazy->choice);
    bs_gate_free(gate, lazy->touched, n * sizeof *lazy->touched);
    bs_gate_free(gate, lazy->is_touched, n * sizeof *lazy->is_touched);
    bs_gate_free(gate, lazy->stack, n * sizeof *lazy->stack);
    bs_gate_free(gate, lazy->met, n * sizeof *lazy->met);
    bs_gate_free(gate, lazy->state, n);
    *lazy = (bs_lazy){.graph = NULL};
}

void bs_lazy__reset(bs_lazy *lazy)
{
    for (uint32_t i = 0; i < lazy->touched_count; i++) {
        uint32_t mol = lazy->touched[i];

        lazy->value[mol] = lazy->base[mol];
        lazy->choice[mol] = lazy->base_choice[mol];
        lazy->is_touched[mol] = false;
    }
    lazy->touched_count = 0;
}

/*
 * Sets value and choice; returns whether either is new. Values that a circle lowered ever less are
 * not met again to the last bit.
 */
static bool put(bs_lazy *lazy, uint32_t mol, double value, uint32_t choice)
{
    bool same;

    if (lazy->value[mol] == value && lazy->choice[mol] == choice)
        return false;
    if (!lazy->is_touched[mol]) {
        lazy->is_touched[mol] = true;
        lazy->touched[lazy->touched_count++] = mol;
    }
    same = lazy->choice[mol] == choice && fabs(lazy->value[mol] - value) <= NEAR * fabs(value);
    lazy->value[mol] = value;
    lazy->choice[mol] = choice;
    return !same;
}

/* The first of the cheapest choices that the bars leave; the present one if it is among them. */
static bool revise(bs_lazy *lazy, uint32_t mol)
{
    const bs_graph *graph = lazy->graph;
    const bs_cheapest *bars = lazy->bars;
    uint32_t only = bars->only[mol], choice = BS_GRAPH_NONE;
    double best = INFINITY;

    if (!bars->no_buy[mol] && (only == BS_GRAPH_NONE || only == BS_GRAPH_BUY)) {
        best = graph->mols[mol].price;
        choice = isfinite(best) ? BS_GRAPH_BUY : BS_GRAPH_NONE;
    }
    for (uint32_t w = graph->mols[mol].first_way; w != BS_GRAPH_NONE; w = graph->ways[w].next) {
        uint32_t step = graph->ways[w].step;
        double cost;

        lazy->looked++;
        if (bars->barred[step] || (only != BS_GRAPH_NONE && only != step))
            continue;
        cost = bs_graph__way_cost(graph, w, lazy->mode, lazy->value);
        if (cost < best || (cost == best && w == lazy->choice[mol] && isfinite(cost))) {
            best = cost;
            choice = w;
        }
    }
    return put(lazy, mol, best, choice);
}

void bs_lazy__revise(bs_lazy *lazy, uint32_t mol)
{
    (void)revise(lazy, mol);
}

static void enter(bs_lazy *lazy, uint32_t mol)
{
    lazy->state[mol] = ENTERED;
    lazy->met[lazy->met_count++] = mol;
    lazy->stack[lazy->stack_count++] = mol;
}

/*
 * Enters the first precursor of the choice of `mol` that was not seen in this walk. `*circle` is
 * set if one is still on the way down.
 */
static bool enter_next(bs_lazy *lazy, uint32_t mol, bool *circle)
{
    const bs_graph_way *way;

    if (lazy->choice[mol] >= BS_GRAPH_BUY)
        return false;
    way = &lazy->graph->ways[lazy->choice[mol]];
    for (uint32_t use = way->first; use < way->first + way->count; use++) {
        uint32_t need = lazy->graph->uses[use].mol;

        if (lazy->state[need] == ENTERED)
            *circle = true;
        if (lazy->state[need] != UNSEEN)
            continue;
        enter(lazy, need);
        return true;
    }
    return false;
}

/* One walk through the present answer; returns whether anything was raised. */
static bool walk(bs_lazy *lazy, uint32_t target, bool *circle)
{
    bool changed = false;

    *circle = false;
    enter(lazy, target);
    while (lazy->stack_count > 0) {
        uint32_t mol = lazy->stack[lazy->stack_count - 1];

        if (enter_next(lazy, mol, circle))
            continue;
        lazy->stack_count--;
        lazy->state[mol] = LEFT;
        changed = revise(lazy, mol) || changed;
    }
    for (uint32_t i = 0; i < lazy->met_count; i++)
        lazy->state[lazy->met[i]] = UNSEEN;
    lazy->met_count = 0;
    return changed;
}

bs_lazy_end bs_lazy__solve(bs_lazy *lazy, uint32_t target, double give_up, uint64_t budget)
{
    uint64_t end = lazy->looked + budget;
    bool changed = true, circle = false;

    while (changed) {
        changed = walk(lazy, target, &circle);
        if (isinf(lazy->value[target]))
            return BS_LAZY_NONE;
        if (lazy->value[target] > give_up)
            return BS_LAZY_ABOVE;
        if (lazy->looked >= end)
            return BS_LAZY_SPENT;
    }
    return circle ? BS_LAZY_SPENT : BS_LAZY_SOLVED;
}
