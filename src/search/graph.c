/* The arrays of the hypergraph and the cost of a way. */
#include "search/graph.h"

#include <math.h>
#include <string.h>

void bs_graph__init(bs_graph *graph, bs_ctx *cx)
{
    *graph = (bs_graph){.cx = cx, .superior = true};
}

void bs_graph__free(bs_graph *graph)
{
    bs_gate *gate = graph->cx->gate;

    bs_gate_free(gate, graph->mols, graph->mol_room * sizeof *graph->mols);
    bs_gate_free(gate, graph->ways, graph->way_room * sizeof *graph->ways);
    bs_gate_free(gate, graph->uses, graph->use_room * sizeof *graph->uses);
    bs_graph__init(graph, graph->cx);
}

bs_status bs_graph__reserve(bs_ctx *cx, void *block, size_t *room, size_t needed, size_t size)
{
    size_t more = *room ? *room : 16;
    void *old, *moved;

    if (needed <= *room)
        return BS_OK;
    while (more < needed) {
        if (more > SIZE_MAX / 4)
            return bs_fail_memory(cx);
        more *= 2;
    }
    if (more > SIZE_MAX / 2 / size)
        return bs_fail_memory(cx);
    memcpy(&old, block, sizeof old);
    moved = old ? bs_gate_resize(cx->gate, old, *room * size, more * size)
                : bs_gate_alloc(cx->gate, more * size);
    if (!moved)
        return bs_fail_memory(cx);
    memcpy(block, &moved, sizeof moved);
    *room = more;
    return BS_OK;
}

bs_status bs_graph__add_mol(bs_graph *graph, double price, uint32_t *mol)
{
    bs_status st;

    if (isnan(price) || price < 0)
        return bs_fail(graph->cx, BS_EVALUE, "a price must be 0 or more");
    if (graph->mol_count >= BS_GRAPH_MOST)
        return bs_fail(graph->cx, BS_ELIMIT, "too many molecules for one search");
    st = bs_graph__reserve(graph->cx, &graph->mols, &graph->mol_room, (size_t)graph->mol_count + 1,
                           sizeof *graph->mols);
    if (st != BS_OK)
        return st;
    graph->mols[graph->mol_count] = (bs_graph_mol){
        .price = price,
        .first_way = BS_GRAPH_NONE,
        .last_way = BS_GRAPH_NONE,
        .first_use = BS_GRAPH_NONE,
        .last_use = BS_GRAPH_NONE,
    };
    *mol = graph->mol_count++;
    return BS_OK;
}

static bs_status check_way(bs_graph *graph, const bs_graph_part *parts, uint32_t count, double cost,
                           double yield)
{
    if (!isfinite(cost) || cost < 0)
        return bs_fail(graph->cx, BS_EVALUE, "the cost of a step must be a number of 0 or more");
    if (!isfinite(yield) || yield <= 0)
        return bs_fail(graph->cx, BS_EVALUE, "the yield of a step must be above 0");
    if (count == 0)
        return bs_fail(graph->cx, BS_EVALUE, "a step needs a precursor");
    for (uint32_t i = 0; i < count; i++) {
        if (!isfinite(parts[i].equivalents) || parts[i].equivalents <= 0)
            return bs_fail(graph->cx, BS_EVALUE, "equivalents must be above 0");
    }
    if (graph->way_count >= BS_GRAPH_MOST || graph->use_count > BS_GRAPH_MOST - count)
        return bs_fail(graph->cx, BS_ELIMIT, "too many steps for one search");
    return BS_OK;
}

/* Appends the last way to the list of its product, and its uses to those of their molecules. */
static void link_way(bs_graph *graph, uint32_t way)
{
    const bs_graph_way *w = &graph->ways[way];
    bs_graph_mol *product = &graph->mols[w->product];

    if (product->last_way == BS_GRAPH_NONE)
        product->first_way = way;
    else
        graph->ways[product->last_way].next = way;
    product->last_way = way;
    for (uint32_t use = w->first; use < w->first + w->count; use++) {
        bs_graph_mol *mol = &graph->mols[graph->uses[use].mol];

        if (mol->last_use == BS_GRAPH_NONE)
            mol->first_use = use;
        else
            graph->uses[mol->last_use].next = use;
        mol->last_use = use;
    }
}

bs_status bs_graph__add_way(bs_graph *graph, uint32_t product, uint32_t step,
                            const bs_graph_part *parts, uint32_t count, double cost, double yield,
                            uint32_t tag, uint32_t *way)
{
    bs_status st = check_way(graph, parts, count, cost, yield);

    if (st == BS_OK)
        st = bs_graph__reserve(graph->cx, &graph->ways, &graph->way_room,
                               (size_t)graph->way_count + 1, sizeof *graph->ways);
    if (st == BS_OK)
        st = bs_graph__reserve(graph->cx, &graph->uses, &graph->use_room,
                               (size_t)graph->use_count + count, sizeof *graph->uses);
    if (st != BS_OK)
        return st;
    *way = graph->way_count++;
    graph->ways[*way] = (bs_graph_way){
        .product = product,
        .step = step == BS_GRAPH_NONE ? graph->step_count++ : step,
        .first = graph->use_count,
        .count = count,
        .cost = cost,
        .yield = yield,
        .next = BS_GRAPH_NONE,
        .tag = tag,
    };
    for (uint32_t i = 0; i < count; i++) {
        graph->uses[graph->use_count++] = (bs_graph_use){
            .equivalents = parts[i].equivalents,
            .mol = parts[i].mol,
            .way = *way,
            .next = BS_GRAPH_NONE,
        };
        if (parts[i].equivalents < yield)
            graph->superior = false;
    }
    link_way(graph, *way);
    return BS_OK;
}

bool bs_graph__is_superior(const bs_graph *graph, bs_cost_mode mode)
{
    return mode == BS_COST_ADDITIVE || graph->superior;
}

double bs_graph__way_cost(const bs_graph *graph, uint32_t way, bs_cost_mode mode,
                          const double *value)
{
    const bs_graph_way *w = &graph->ways[way];
    const bs_graph_use *uses = &graph->uses[w->first];
    double sum = w->cost;

    if (mode == BS_COST_ADDITIVE) {
        for (uint32_t i = 0; i < w->count; i++)
            sum += value[uses[i].mol];
        return sum;
    }
    for (uint32_t i = 0; i < w->count; i++)
        sum += uses[i].equivalents * value[uses[i].mol];
    return sum / w->yield;
}
