/* Disproof numbers, and the way down by both numbers. */
#include "search/proof.h"

#include <math.h>

/* The least disproof number of what a way needs; 1 if all of it leads back towards the target. */
static double disproof_of_way(const bs_explore *x, uint32_t w)
{
    const bs_graph_way *way = &x->graph.ways[w];
    double least = INFINITY;
    bool any = false;

    for (uint32_t use = way->first; use < way->first + way->count; use++) {
        uint32_t need = x->graph.uses[use].mol;

        if (x->nodes[need].depth <= x->nodes[way->product].depth)
            continue;
        any = true;
        least = fmin(least, x->front.disproof[need]);
    }
    return any ? least : 1;
}

static double disproof_of(const bs_explore *x, uint32_t mol)
{
    double sum = 0;

    if (isfinite(x->front.had.items[mol].value))
        return INFINITY;
    if (x->nodes[mol].open)
        return 1;
    for (uint32_t w = x->graph.mols[mol].first_way; w != BS_GRAPH_NONE; w = x->graph.ways[w].next)
        sum += disproof_of_way(x, w);
    return sum;
}

/* Deepest first, so that each is looked at once or a few times. */
static bs_status push(bs_explore *x, uint32_t mol)
{
    return bs_heap__push(&x->front.heap, x->cx, -(double)x->nodes[mol].depth, mol);
}

static bs_status push_users(bs_explore *x, uint32_t mol)
{
    const bs_graph *graph = &x->graph;
    bs_status st = BS_OK;

    for (uint32_t use = graph->mols[mol].first_use; st == BS_OK && use != BS_GRAPH_NONE;
         use = graph->uses[use].next) {
        uint32_t product = graph->ways[graph->uses[use].way].product;

        if (x->nodes[product].depth < x->nodes[mol].depth)
            st = push(x, product);
    }
    return st;
}

bs_status bs_proof__update(bs_explore *x, uint32_t first_new)
{
    bs_frontier *front = &x->front;
    bs_status st = bs_graph__reserve(x->cx, &front->disproof, &front->disproof_room,
                                     x->graph.mol_count, sizeof *front->disproof);

    front->heap.count = 0;
    for (uint32_t m = first_new; st == BS_OK && m < x->graph.mol_count; m++) {
        front->disproof[m] = -1;
        st = push(x, m);
    }
    for (uint32_t i = 0; st == BS_OK && i < front->picked_count; i++)
        st = push(x, front->picked[i]);
    while (st == BS_OK && front->heap.count > 0) {
        uint32_t mol = bs_heap__pop(&front->heap).item;
        double disproof = disproof_of(x, mol);

        if (disproof == front->disproof[mol])
            continue;
        front->disproof[mol] = disproof;
        st = push_users(x, mol);
    }
    return st;
}

/* The way with the least proof number. */
static uint32_t best_way(const bs_explore *x, uint32_t mol)
{
    uint32_t best = BS_GRAPH_NONE;
    double least = INFINITY;

    for (uint32_t w = x->graph.mols[mol].first_way; w != BS_GRAPH_NONE; w = x->graph.ways[w].next) {
        double proof = bs_values__cost(&x->front.hoped, w);

        if (!(proof < least))
            continue;
        least = proof;
        best = w;
    }
    return best;
}

/* What is not yet proved of a way and easiest to disprove. */
static uint32_t next_down(const bs_explore *x, uint32_t w)
{
    const bs_graph_way *way = &x->graph.ways[w];
    uint32_t next = BS_GRAPH_NONE;

    for (uint32_t use = way->first; use < way->first + way->count; use++) {
        uint32_t need = x->graph.uses[use].mol;

        if (x->front.hoped.items[need].value < 0.5)
            continue;
        if (next == BS_GRAPH_NONE || x->front.disproof[need] < x->front.disproof[next])
            next = need;
    }
    return next;
}

uint32_t bs_proof__pick(const bs_explore *x)
{
    uint32_t mol = 0;

    if (isinf(x->front.hoped.items[0].value))
        return BS_GRAPH_NONE;
    /* Proof numbers fall on the way down, so it ends. */
    while (mol != BS_GRAPH_NONE && !x->nodes[mol].open) {
        uint32_t way = best_way(x, mol);

        mol = way == BS_GRAPH_NONE ? BS_GRAPH_NONE : next_down(x, way);
    }
    return mol;
}
