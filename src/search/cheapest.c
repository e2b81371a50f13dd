/* Knuth's algorithm with a heap that is cleaned late, and settling again where costs are not superior. */
#include "search/cheapest.h"

#include <math.h>
#include <string.h>

/*
 * A molecule is settled again only if it becomes cheaper by more than this part of its value, or
 * of the smallest price: a circle that gives more than it takes would go on for ever.
 */
#define LEAST_GAIN 1e-13

/* Bound on settling again, in rounds through the whole graph. */
#define MOST_ROUNDS 1024.0

static void *take(const bs_graph *graph, size_t count, size_t size)
{
    return bs_gate_alloc(graph->cx->gate, count * size);
}

bs_status bs_cheapest__init(bs_cheapest *work, const bs_graph *graph, bs_cost_mode mode)
{
    size_t n = graph->mol_count;

    *work = (bs_cheapest){.graph = graph, .mode = mode};
    work->value = take(graph, n, sizeof *work->value);
    work->choice = take(graph, n, sizeof *work->choice);
    work->missing = take(graph, graph->way_count, sizeof *work->missing);
    work->counts = take(graph, graph->way_count, sizeof *work->counts);
    work->settled = take(graph, n, sizeof *work->settled);
    work->only = take(graph, n, sizeof *work->only);
    work->barred = take(graph, graph->step_count, sizeof *work->barred);
    work->no_buy = take(graph, n, sizeof *work->no_buy);
    if (!work->value || !work->choice || !work->missing || !work->counts || !work->settled || !work->only ||
        !work->barred || !work->no_buy) {
        bs_cheapest__free(work);
        return bs_fail_memory(graph->cx);
    }
    for (size_t i = 0; i < n; i++)
        work->only[i] = BS_GRAPH_NONE;
    for (uint32_t way = 0; way < graph->way_count; way++)
        work->counts[way] = graph->ways[way].count;
    return BS_OK;
}

void bs_cheapest__free(bs_cheapest *work)
{
    const bs_graph *graph = work->graph;
    bs_gate *gate;
    size_t n;

    if (!graph)
        return;
    gate = graph->cx->gate;
    n = graph->mol_count;
    bs_gate_free(gate, work->value, n * sizeof *work->value);
    bs_gate_free(gate, work->choice, n * sizeof *work->choice);
    bs_gate_free(gate, work->missing, graph->way_count * sizeof *work->missing);
    bs_gate_free(gate, work->counts, graph->way_count * sizeof *work->counts);
    bs_gate_free(gate, work->settled, n * sizeof *work->settled);
    bs_gate_free(gate, work->only, n * sizeof *work->only);
    bs_gate_free(gate, work->barred, graph->step_count * sizeof *work->barred);
    bs_gate_free(gate, work->no_buy, n * sizeof *work->no_buy);
    bs_heap__free(&work->heap, graph->cx);
    *work = (bs_cheapest){.graph = NULL};
}

/* Offers a molecule a new choice; it is taken if it is cheaper. */
static bs_status improve(bs_cheapest *work, uint32_t mol, double value, uint32_t choice)
{
    double old = work->value[mol];

    if (!(value < old) ||
        (work->settled[mol] && old - value <= LEAST_GAIN * fmax(old, work->unit)))
        return BS_OK;
    work->value[mol] = value;
    work->choice[mol] = choice;
    return bs_heap__push(&work->heap, work->graph->cx, value, mol);
}

/* Whether the bars leave this way open. */
static bool is_open(const bs_cheapest *work, const bs_graph_way *way)
{
    uint32_t only = work->only[way->product];

    return !work->barred[way->step] && (only == BS_GRAPH_NONE || only == way->step);
}

double bs_cheapest__unit(const bs_graph *graph)
{
    double least = INFINITY;

    for (uint32_t mol = 0; mol < graph->mol_count; mol++) {
        if (graph->mols[mol].price > 0)
            least = fmin(least, graph->mols[mol].price);
    }
    for (uint32_t way = 0; way < graph->way_count; way++) {
        if (graph->ways[way].cost > 0)
            least = fmin(least, graph->ways[way].cost);
    }
    return isfinite(least) ? least : 1;
}

static bs_status start(bs_cheapest *work, const double *leaf)
{
    const bs_graph *graph = work->graph;
    bs_status st = BS_OK;

    work->heap.count = 0;
    work->converged = true;
    work->unit = bs_graph__is_superior(graph, work->mode) ? 0 : bs_cheapest__unit(graph);
    memset(work->settled, 0, graph->mol_count * sizeof *work->settled);
    if (graph->way_count > 0)
        memcpy(work->missing, work->counts, graph->way_count * sizeof *work->missing);
    for (uint32_t mol = 0; mol < graph->mol_count; mol++) {
        work->value[mol] = INFINITY;
        work->choice[mol] = BS_GRAPH_NONE;
    }
    for (uint32_t mol = 0; st == BS_OK && mol < graph->mol_count; mol++) {
        double price = leaf ? leaf[mol] : graph->mols[mol].price;

        if (work->no_buy[mol] ||
            (work->only[mol] != BS_GRAPH_NONE && work->only[mol] != BS_GRAPH_BUY))
            continue;
        st = improve(work, mol, price, BS_GRAPH_BUY);
    }
    return st;
}

/* Tells the ways that use a molecule that it has a new value. */
static bs_status spread(bs_cheapest *work, uint32_t mol)
{
    const bs_graph *graph = work->graph;
    bool first = !work->settled[mol];
    bs_status st = BS_OK;

    work->settled[mol] = true;
    for (uint32_t use = graph->mols[mol].first_use; st == BS_OK && use != BS_GRAPH_NONE;
         use = graph->uses[use].next) {
        uint32_t way = graph->uses[use].way;
        const bs_graph_way *w = &graph->ways[way];

        if (first)
            work->missing[way]--;
        if (work->missing[way] > 0 || !is_open(work, w))
            continue;
        st = improve(work, w->product, bs_graph__way_cost(graph, way, work->mode, work->value),
                     way);
    }
    return st;
}

bs_status bs_cheapest__run(bs_cheapest *work, const double *leaf, uint32_t target)
{
    const bs_graph *graph = work->graph;
    bool superior = bs_graph__is_superior(graph, work->mode);
    double budget = MOST_ROUNDS * ((double)graph->mol_count + 16);
    bs_status st = start(work, leaf);

    while (st == BS_OK && work->heap.count > 0) {
        bs_heap_entry top = bs_heap__pop(&work->heap);

        if (top.key > work->value[top.item] || (superior && work->settled[top.item]))
            continue; /* it became cheaper after this entry was made */
        if (budget-- <= 0) {
            work->converged = false;
            break;
        }
        st = spread(work, top.item);
        if (superior && top.item == target)
            break;
    }
    return st;
}
