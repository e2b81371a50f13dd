/* The order of exploration, in the manner of AO*. */
#include "search/frontier.h"

#include "search/cheapest.h"

#include <math.h>
#include <stdlib.h>

/* The top-down half: the cheapest route through each molecule. */
typedef struct look {
    bs_explore *x;
    bs_cheapest work;
    double *leaf;    /* price, or guess of what is open */
    double *through; /* cost of the cheapest route through the molecule */
    double *moles;   /* of it that this route needs for a mole of target */
    bool *done;
    bs_heap heap;
} look;

static bool is_open(const bs_explore *x, uint32_t mol)
{
    const bs_explore_node *node = &x->nodes[mol];

    return !node->expanded && (!node->closed || node->urgent) && node->depth < x->limits.depth;
}

/* ---- Depth --------------------------------------------------------------------------------- */

/* Breadth first from the target, over all ways. */
static bs_status find_depths(bs_explore *x)
{
    bs_arena *scratch = &x->cx->scratch;
    bs_mark temp = bs_arena_mark(scratch);
    uint32_t head = 0, tail = 0, *queue;
    bs_status st = bs_new(x->cx, scratch, x->graph.mol_count, &queue);

    if (st != BS_OK)
        return st;
    for (uint32_t m = 1; m < x->graph.mol_count; m++)
        x->nodes[m].depth = UINT32_MAX;
    x->nodes[0].depth = 0;
    queue[tail++] = 0;
    while (head < tail) {
        uint32_t mol = queue[head++];

        for (uint32_t w = x->graph.mols[mol].first_way; w != BS_GRAPH_NONE;
             w = x->graph.ways[w].next) {
            const bs_graph_way *way = &x->graph.ways[w];

            for (uint32_t use = way->first; use < way->first + way->count; use++) {
                bs_explore_node *need = &x->nodes[x->graph.uses[use].mol];

                if (need->depth != UINT32_MAX)
                    continue;
                need->depth = x->nodes[mol].depth + 1;
                queue[tail++] = x->graph.uses[use].mol;
            }
        }
    }
    bs_arena_rewind(scratch, temp);
    return BS_OK;
}

/* ---- Through ------------------------------------------------------------------------------- */

static bs_status push(look *l, double key, uint32_t mol)
{
    return bs_heap__push(&l->heap, l->x->cx, key, mol);
}

/* Passes the best way down to `mol` on to what its ways need. */
static bs_status pass_down(look *l, uint32_t mol)
{
    const bs_graph *graph = &l->x->graph;
    bs_status st = BS_OK;

    for (uint32_t w = graph->mols[mol].first_way; st == BS_OK && w != BS_GRAPH_NONE;
         w = graph->ways[w].next) {
        const bs_graph_way *way = &graph->ways[w];
        double cost = bs_graph__way_cost(graph, w, l->x->mode, l->work.value);
        double key = l->through[mol] + l->moles[mol] * fmax(0, cost - l->work.value[mol]);

        for (uint32_t use = way->first;
             st == BS_OK && isfinite(cost) && use < way->first + way->count; use++) {
            uint32_t need = graph->uses[use].mol;

            if (!(key < l->through[need]) || l->done[need])
                continue;
            l->through[need] = key;
            l->moles[need] = l->moles[mol];
            if (l->x->mode == BS_COST_PER_MOLE)
                l->moles[need] *= graph->uses[use].equivalents / way->yield;
            st = push(l, key, need);
        }
    }
    return st;
}

static bs_status find_through(look *l)
{
    bs_status st;

    if (!isfinite(l->work.value[0]))
        return BS_OK;
    l->through[0] = l->work.value[0];
    l->moles[0] = 1;
    st = push(l, l->through[0], 0);
    while (st == BS_OK && l->heap.count > 0) {
        bs_heap_entry top = bs_heap__pop(&l->heap);

        if (l->done[top.item])
            continue;
        l->done[top.item] = true;
        st = pass_down(l, top.item);
    }
    return st;
}

/* ---- Picking ------------------------------------------------------------------------------- */

static int by_key(const void *a, const void *b)
{
    const bs_heap_entry *x = a, *y = b;

    if (x->key != y->key)
        return x->key < y->key ? -1 : 1;
    return (x->item > y->item) - (x->item < y->item);
}

/*
 * Sorts the open molecules. One that is sold is worth expanding only if made it could compete, so
 * it waits for the difference between its guess and its price.
 */
static bs_status pick(look *l, bs_arena *home, bs_frontier *out)
{
    bs_explore *x = l->x;
    bs_arena *scratch = &x->cx->scratch;
    bs_heap_entry *open;
    bs_status st = bs_new(x->cx, scratch, x->graph.mol_count, &open);

    if (st != BS_OK)
        return st;
    for (uint32_t m = 0; m < x->graph.mol_count; m++) {
        const bs_explore_node *node = &x->nodes[m];
        double key = l->through[m];

        if (!isfinite(key) || node->expanded || (node->closed && !node->urgent))
            continue;
        if (!is_open(x, m)) {
            out->too_deep++;
            continue;
        }
        if (isfinite(x->graph.mols[m].price))
            key += l->moles[m] * fmax(0, node->guess - x->graph.mols[m].price);
        open[out->open++] = (bs_heap_entry){node->urgent ? -1 : key, m};
    }
    qsort(open, out->open, sizeof *open, by_key);
    out->picked_count = x->limits.batch;
    if ((uint32_t)out->picked_count > out->open)
        out->picked_count = (int)out->open;
    if ((st = bs_new(x->cx, home, out->picked_count, &out->picked)) != BS_OK)
        return st;
    for (int i = 0; i < out->picked_count; i++)
        out->picked[i] = open[i].item;
    return BS_OK;
}

static bs_status take_room(look *l)
{
    bs_arena *scratch = &l->x->cx->scratch;
    size_t n = l->x->graph.mol_count;
    bs_status st;

    if ((st = bs_new(l->x->cx, scratch, n, &l->leaf)) != BS_OK ||
        (st = bs_new(l->x->cx, scratch, n, &l->through)) != BS_OK ||
        (st = bs_new(l->x->cx, scratch, n, &l->moles)) != BS_OK ||
        (st = bs_new(l->x->cx, scratch, n, &l->done)) != BS_OK)
        return st;
    for (size_t i = 0; i < n; i++)
        l->through[i] = INFINITY;
    return bs_cheapest__init(&l->work, &l->x->graph, l->x->mode);
}

static void drop_room(look *l)
{
    bs_cheapest__free(&l->work);
    bs_heap__free(&l->heap, l->x->cx);
}

bs_status bs_frontier__look(bs_explore *x, bs_arena *home, bs_frontier *out)
{
    bs_mark temp = bs_arena_mark(&x->cx->scratch);
    look l = {.x = x};
    bs_status st;

    *out = (bs_frontier){.cheapest = INFINITY};
    if ((st = find_depths(x)) != BS_OK || (st = take_room(&l)) != BS_OK ||
        (st = bs_cheapest__run(&l.work, NULL, BS_GRAPH_NONE)) != BS_OK)
        goto done;
    out->cheapest = l.work.value[0];
    for (uint32_t m = 0; m < x->graph.mol_count; m++) {
        double price = x->graph.mols[m].price;

        l.leaf[m] = isinf(price) && is_open(x, m) ? x->nodes[m].guess : price;
    }
    if ((st = bs_cheapest__run(&l.work, l.leaf, BS_GRAPH_NONE)) == BS_OK &&
        (st = find_through(&l)) == BS_OK)
        st = pick(&l, home, out);
done:
    drop_room(&l);
    bs_arena_rewind(&x->cx->scratch, temp);
    return st;
}

/* ---- Bound --------------------------------------------------------------------------------- */

/*
 * With through[] as the cost of having a molecule by way of something open: a way that needs one
 * precursor so, and the others as cheaply as can be.
 */
static bs_status pass_up(look *l, uint32_t mol)
{
    const bs_graph *graph = &l->x->graph;
    bs_status st = BS_OK;

    for (uint32_t use = graph->mols[mol].first_use; st == BS_OK && use != BS_GRAPH_NONE;
         use = graph->uses[use].next) {
        uint32_t w = graph->uses[use].way, product = graph->ways[w].product;
        double cost = bs_graph__way_cost(graph, w, l->x->mode, l->work.value);
        double more = fmax(0, l->through[mol] - l->work.value[mol]);

        if (!isfinite(cost))
            continue;
        if (l->x->mode == BS_COST_PER_MOLE)
            more *= graph->uses[use].equivalents / graph->ways[w].yield;
        if (!(cost + more < l->through[product]))
            continue;
        l->through[product] = cost + more;
        st = push(l, cost + more, product);
    }
    return st;
}

bs_status bs_frontier__bound(bs_explore *x, double *bound)
{
    bs_mark temp = bs_arena_mark(&x->cx->scratch);
    look l = {.x = x};
    bs_status st;

    *bound = 0;
    if (!bs_graph__is_superior(&x->graph, x->mode))
        return BS_OK;
    if ((st = take_room(&l)) != BS_OK)
        goto done;
    for (uint32_t m = 0; m < x->graph.mol_count; m++) {
        double price = x->graph.mols[m].price;

        l.leaf[m] = is_open(x, m) ? fmin(price, x->limits.least_step) : price;
    }
    if ((st = bs_cheapest__run(&l.work, l.leaf, BS_GRAPH_NONE)) != BS_OK)
        goto done;
    for (uint32_t m = 0; st == BS_OK && m < x->graph.mol_count; m++) {
        if (!is_open(x, m))
            continue;
        l.through[m] = x->limits.least_step;
        st = push(&l, l.through[m], m);
    }
    while (st == BS_OK && l.heap.count > 0) {
        bs_heap_entry top = bs_heap__pop(&l.heap);

        if (top.key == l.through[top.item] && !l.done[top.item]) {
            l.done[top.item] = true;
            st = pass_up(&l, top.item);
        }
    }
    *bound = l.through[0];
done:
    drop_room(&l);
    bs_arena_rewind(&x->cx->scratch, temp);
    return st;
}
