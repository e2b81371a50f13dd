/* The order of exploration, in the manner of AO*. */
#include "search/frontier.h"

#include "search/cheapest.h"
#include "search/explore.h"
#include "search/proof.h"

#include <math.h>
#include <string.h>

void bs_frontier__init(bs_frontier *front, const bs_graph *graph, bs_cost_mode mode, bool proof)
{
    *front = (bs_frontier){.depth = 0};
    bs_values__init(&front->had, graph, mode, false);
    bs_values__init(&front->hoped, graph, mode, proof);
}

void bs_frontier__free(bs_frontier *front)
{
    bs_ctx *cx;

    if (!front->had.graph)
        return;
    cx = front->had.graph->cx;
    bs_gate_free(cx->gate, front->reach, front->reach_room * sizeof *front->reach);
    bs_gate_free(cx->gate, front->picked, front->picked_room * sizeof *front->picked);
    bs_gate_free(cx->gate, front->disproof, front->disproof_room * sizeof *front->disproof);
    bs_heap__free(&front->urgent, cx);
    bs_heap__free(&front->heap, cx);
    bs_heap__free(&front->ready, cx);
    bs_values__free(&front->had);
    bs_values__free(&front->hoped);
    *front = (bs_frontier){.depth = 0};
}

/* ---- Taking in what is new ------------------------------------------------------------------- */

static bool is_open(const bs_explore *x, uint32_t mol)
{
    const bs_explore_node *node = &x->nodes[mol];

    return !node->expanded && (!node->closed || node->urgent) && node->depth < x->limits.depth;
}

/* Sees whether a molecule is open, and puts its guess in or out. */
static bs_status refresh(bs_explore *x, uint32_t mol)
{
    bs_frontier *front = &x->front;
    bs_explore_node *node = &x->nodes[mol];
    double price = x->graph.mols[mol].price;
    bool open = is_open(x, mol), breadth = x->limits.strategy == BS_STRATEGY_BREADTH;
    double guess = front->hoped.counts ? 1 : node->guess;
    bs_status st = BS_OK;

    if (open == node->open)
        return BS_OK;
    node->open = open;
    front->open += open ? 1 : -1u;
    if (isinf(price))
        st = bs_values__set_leaf(&front->hoped, mol, open ? guess : price);
    if (st == BS_OK && open && (node->urgent || breadth))
        st = bs_heap__push(&front->urgent, x->cx, breadth ? node->depth : 0, mol);
    return st;
}

static bs_status offer_depth(bs_explore *x, uint32_t mol, uint32_t depth)
{
    if (depth >= x->nodes[mol].depth)
        return BS_OK;
    x->nodes[mol].depth = depth;
    return bs_heap__push(&x->front.heap, x->cx, depth, mol);
}

static bs_status pass_depth(bs_explore *x, uint32_t way)
{
    const bs_graph_way *w = &x->graph.ways[way];
    uint32_t depth = x->nodes[w->product].depth;
    bs_status st = BS_OK;

    for (uint32_t use = w->first; st == BS_OK && use < w->first + w->count; use++)
        st = offer_depth(x, x->graph.uses[use].mol, depth + 1);
    return st;
}

/* New ways make molecules less deep, and those below them; what was too deep may become open. */
static bs_status spread_depths(bs_explore *x)
{
    bs_frontier *front = &x->front;
    bs_status st = front->mols == 0 ? offer_depth(x, 0, 0) : BS_OK;

    for (; st == BS_OK && front->ways < x->graph.way_count; front->ways++) {
        if (x->nodes[x->graph.ways[front->ways].product].depth != UINT32_MAX)
            st = pass_depth(x, front->ways);
    }
    while (st == BS_OK && front->heap.count > 0) {
        bs_heap_entry top = bs_heap__pop(&front->heap);

        if (top.key > x->nodes[top.item].depth)
            continue;
        st = refresh(x, top.item);
        for (uint32_t w = x->graph.mols[top.item].first_way; st == BS_OK && w != BS_GRAPH_NONE;
             w = x->graph.ways[w].next)
            st = pass_depth(x, w);
    }
    return st;
}

/* Brings everything up to date after an expansion, or with another limit of depth. */
static bs_status take_in(bs_explore *x)
{
    bs_frontier *front = &x->front;
    bs_status st;

    front->heap.count = 0;
    if ((st = bs_graph__reserve(x->cx, &front->reach, &front->reach_room, x->graph.mol_count,
                                sizeof *front->reach)) != BS_OK ||
        (st = bs_values__grow(&front->had)) != BS_OK ||
        (st = bs_values__grow(&front->hoped)) != BS_OK)
        return st;
    for (uint32_t m = front->mols; m < x->graph.mol_count; m++)
        front->reach[m] = (bs_reach){.look = 0};
    for (uint32_t i = 0; st == BS_OK && i < front->picked_count; i++)
        st = refresh(x, front->picked[i]);
    if (st == BS_OK)
        st = spread_depths(x);
    front->mols = x->graph.mol_count;
    for (uint32_t m = 0; st == BS_OK && front->depth != x->limits.depth && m < front->mols; m++)
        st = refresh(x, m);
    front->depth = x->limits.depth;
    if (st == BS_OK)
        st = bs_values__settle(&front->had);
    return st == BS_OK ? bs_values__settle(&front->hoped) : st;
}

/* ---- Through ------------------------------------------------------------------------------- */

static bs_status reach(bs_explore *x, uint32_t mol, double through, double moles)
{
    bs_frontier *front = &x->front;
    bs_reach *r = &front->reach[mol];

    if (r->look == front->look && (r->done || !(through < r->through)))
        return BS_OK;
    *r = (bs_reach){.through = through, .moles = moles, .look = front->look};
    return bs_heap__push(&front->heap, x->cx, through, mol);
}

/* Passes the best way down to `mol` on to what its ways need. */
static bs_status pass_down(bs_explore *x, uint32_t mol)
{
    const bs_graph *graph = &x->graph;
    const bs_values *hoped = &x->front.hoped;
    const bs_reach *r = &x->front.reach[mol];
    bs_status st = BS_OK;

    for (uint32_t w = graph->mols[mol].first_way; st == BS_OK && w != BS_GRAPH_NONE;
         w = graph->ways[w].next) {
        const bs_graph_way *way = &graph->ways[w];
        double cost = bs_values__cost(hoped, w);
        double key = r->through + r->moles * fmax(0, cost - hoped->items[mol].value);

        if (isinf(cost))
            continue;
        for (uint32_t use = way->first; st == BS_OK && use < way->first + way->count; use++) {
            double factor =
                x->mode == BS_COST_PER_MOLE ? graph->uses[use].equivalents / way->yield : 1;

            st = reach(x, graph->uses[use].mol, key, r->moles * factor);
        }
    }
    return st;
}

/* ---- Picking ------------------------------------------------------------------------------- */

static bool is_full(const bs_explore *x)
{
    return x->front.picked_count >= (uint32_t)x->limits.batch;
}

static void pick(bs_explore *x, uint32_t mol)
{
    x->front.picked[x->front.picked_count++] = mol;
}

/*
 * Settles the molecule at the top. If it is open, it waits for its turn; one that is sold is worth
 * expanding only if made it could compete, so it waits for the difference between its guess and
 * its price, too.
 */
static bs_status settle_top(bs_explore *x)
{
    bs_frontier *front = &x->front;
    bs_heap_entry top = bs_heap__pop(&front->heap);
    bs_reach *r = &front->reach[top.item];
    const bs_explore_node *node = &x->nodes[top.item];
    double price = x->graph.mols[top.item].price, wait = 0;
    bs_status st = BS_OK;

    if (r->done)
        return BS_OK;
    r->done = true;
    front->walked++;
    if (node->open && !node->urgent) {
        if (isfinite(price))
            wait = r->moles * fmax(0, node->guess - price);
        st = bs_heap__push(&front->ready, x->cx, r->through + wait, top.item);
    }
    return st == BS_OK ? pass_down(x, top.item) : st;
}

/* Goes down from the target, cheapest first, until the batch is full. */
static bs_status pick_cheapest(bs_explore *x)
{
    bs_frontier *front = &x->front;
    bs_status st = BS_OK;

    front->look++;
    front->heap.count = front->ready.count = 0;
    if (isfinite(front->hoped.items[0].value))
        st = reach(x, 0, front->hoped.items[0].value, 1);
    while (st == BS_OK && !is_full(x) && (front->heap.count > 0 || front->ready.count > 0)) {
        if (front->ready.count > 0 &&
            (front->heap.count == 0 || front->ready.entries[0].key < front->heap.entries[0].key))
            pick(x, bs_heap__pop(&front->ready).item);
        else
            st = settle_top(x);
    }
    return st;
}

static bs_status pick_proving(bs_explore *x)
{
    uint32_t mol = bs_proof__pick(x);

    if (mol != BS_GRAPH_NONE)
        pick(x, mol);
    return BS_OK;
}

static bs_status pick_rest(bs_explore *x)
{
    switch (x->limits.strategy) {
    case BS_STRATEGY_BREADTH:
        return BS_OK; /* the urgent ones are all */
    case BS_STRATEGY_PROOF:
        return x->front.picked_count > 0 ? BS_OK : pick_proving(x);
    case BS_STRATEGY_CHEAPEST:
        break;
    }
    return pick_cheapest(x);
}

bs_status bs_frontier__look(bs_explore *x)
{
    bs_frontier *front = &x->front;
    uint32_t first_new = front->mols;
    bs_status st;

    if ((st = take_in(x)) != BS_OK ||
        (x->limits.strategy == BS_STRATEGY_PROOF &&
         (st = bs_proof__update(x, first_new)) != BS_OK) ||
        (st = bs_graph__reserve(x->cx, &front->picked, &front->picked_room, (size_t)x->limits.batch,
                                sizeof *front->picked)) != BS_OK)
        return st;
    front->picked_count = front->picked_at = 0;
    while (front->urgent.count > 0 && !is_full(x)) {
        uint32_t mol = bs_heap__pop(&front->urgent).item;

        if (x->nodes[mol].open)
            pick(x, mol);
    }
    return is_full(x) ? BS_OK : pick_rest(x);
}

/* ---- Bound --------------------------------------------------------------------------------- */

typedef struct look {
    bs_explore *x;
    bs_cheapest work;
    double *leaf;    /* price, or the least that what is open can cost */
    double *through; /* cost of having the molecule by way of something open */
    bool *done;
    bs_heap heap;
} look;

static bs_status push(look *l, double key, uint32_t mol)
{
    return bs_heap__push(&l->heap, l->x->cx, key, mol);
}

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

static bs_status take_room(look *l)
{
    bs_arena *scratch = &l->x->cx->scratch;
    size_t n = l->x->graph.mol_count;
    bs_status st;

    if ((st = bs_new(l->x->cx, scratch, n, &l->leaf)) != BS_OK ||
        (st = bs_new(l->x->cx, scratch, n, &l->through)) != BS_OK ||
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
