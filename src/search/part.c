/* The bounds of part.h, by two searches from the target downwards, and the rings cut by them. */
#include "search/part.h"

#include "search/cheapest.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

/* A molecule reached by ever fewer moles so often is taken to be in a circle that saves. */
#define MOST_CORRECTIONS 64

#define SLACK 1e-9

/* Working room for one search: the whole graph's molecules. */
typedef struct descent {
    bs_part *part;
    const bs_graph *graph;
    double *moles;   /* by molecule: fewest that a mole of target can need of it, on any path */
    double *through; /* by molecule: bound of the routes that use it */
    uint32_t *corrections;
    bs_heap heap;
} descent;

double bs_part__slack(const bs_part *part, double cost)
{
    return cost + SLACK * (fabs(cost) + part->unit);
}

static bool is_possible(const bs_part *part, const bs_graph_way *way)
{
    for (uint32_t use = way->first; use < way->first + way->count; use++) {
        uint32_t mol = part->graph->uses[use].mol;

        if (mol == way->product || !isfinite(part->value[mol]))
            return false;
    }
    return isfinite(way->cost);
}

/* ---- Moles ------------------------------------------------------------------------------------
 */

static bs_status offer_moles(descent *d, uint32_t mol, double moles)
{
    if (!(moles < d->moles[mol]))
        return BS_OK;
    if (isfinite(d->moles[mol]) && ++d->corrections[mol] > MOST_CORRECTIONS)
        moles = 0;
    d->moles[mol] = moles;
    return bs_heap__push(&d->heap, d->graph->cx, moles, mol);
}

/* Dijkstra's algorithm over products; where factors below 1 occur it corrects what was settled. */
static bs_status find_moles(descent *d)
{
    const bs_graph *graph = d->graph;
    bs_status st = offer_moles(d, d->part->target, 1);

    while (st == BS_OK && d->heap.count > 0) {
        bs_heap_entry top = bs_heap__pop(&d->heap);

        if (top.key > d->moles[top.item])
            continue;
        for (uint32_t w = graph->mols[top.item].first_way; st == BS_OK && w != BS_GRAPH_NONE;
             w = graph->ways[w].next) {
            const bs_graph_way *way = &graph->ways[w];

            if (!is_possible(d->part, way))
                continue;
            for (uint32_t use = way->first; st == BS_OK && use < way->first + way->count; use++) {
                double factor = d->part->mode == BS_COST_ADDITIVE
                                    ? 1
                                    : graph->uses[use].equivalents / way->yield;

                st = offer_moles(d, graph->uses[use].mol, top.key * factor);
            }
        }
    }
    return st;
}

/* ---- Bounds ------------------------------------------------------------------------------------
 */

static bs_status find_bounds(descent *d)
{
    bs_part *part = d->part;
    const bs_graph *graph = d->graph;
    bs_status st;

    d->through[part->target] = part->value[part->target];
    st = bs_heap__push(&d->heap, graph->cx, d->through[part->target], part->target);
    while (st == BS_OK && d->heap.count > 0) {
        bs_heap_entry top = bs_heap__pop(&d->heap);

        if (top.key > d->through[top.item])
            continue;
        for (uint32_t w = graph->mols[top.item].first_way; st == BS_OK && w != BS_GRAPH_NONE;
             w = graph->ways[w].next) {
            const bs_graph_way *way = &graph->ways[w];
            double more, least;

            if (!is_possible(part, way))
                continue;
            more = bs_graph__way_cost(graph, w, part->mode, part->value) - part->value[top.item];
            least = top.key + d->moles[top.item] * fmax(0, more);
            part->least[w] = least;
            for (uint32_t use = way->first; st == BS_OK && use < way->first + way->count; use++) {
                uint32_t need = graph->uses[use].mol;

                if (!(least < d->through[need]))
                    continue;
                d->through[need] = least;
                st = bs_heap__push(&d->heap, graph->cx, least, need);
            }
        }
    }
    return st;
}

static int by_number(const void *a, const void *b)
{
    double x = *(const double *)a, y = *(const double *)b;

    return (x > y) - (x < y);
}

static void sort_bounds(bs_part *part)
{
    for (uint32_t w = 0; w < part->graph->way_count; w++) {
        if (isfinite(part->least[w]))
            part->sorted[part->count++] = part->least[w];
    }
    qsort(part->sorted, part->count, sizeof *part->sorted, by_number);
}

static bs_status descend(bs_part *part, bool converged)
{
    bs_ctx *cx = part->graph->cx;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    descent d = {.part = part, .graph = part->graph};
    size_t n = part->graph->mol_count;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, n, &d.moles)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, n, &d.through)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, n, &d.corrections)) != BS_OK)
        goto done;
    for (size_t i = 0; i < n; i++) {
        d.through[i] = INFINITY;
        d.moles[i] = converged ? INFINITY : 0;
    }
    if (converged)
        st = find_moles(&d);
    if (st == BS_OK)
        st = find_bounds(&d);
    if (st == BS_OK)
        sort_bounds(part);
done:
    bs_heap__free(&d.heap, cx);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_part__init(bs_part *part, const bs_graph *graph, bs_cost_mode mode, uint32_t target)
{
    bs_gate *gate = graph->cx->gate;
    size_t n = graph->mol_count, w = graph->way_count;
    bs_cheapest all;
    bs_status st;

    *part = (bs_part){.graph = graph, .mode = mode, .target = target};
    if ((st = bs_cheapest__init(&all, graph, mode)) != BS_OK)
        return st;
    if ((st = bs_cheapest__run(&all, NULL, BS_GRAPH_NONE)) != BS_OK)
        goto done;
    part->reachable = isfinite(all.value[target]);
    part->unit = bs_cheapest__unit(graph);
    if (!part->reachable)
        goto done;
    part->value = bs_gate_alloc(gate, n * sizeof *part->value);
    part->least = bs_gate_alloc(gate, w * sizeof *part->least);
    part->sorted = bs_gate_alloc(gate, w * sizeof *part->sorted);
    if (!part->value || (w > 0 && (!part->least || !part->sorted))) {
        st = bs_fail_memory(graph->cx);
        goto done;
    }
    memcpy(part->value, all.value, n * sizeof *part->value);
    for (size_t i = 0; i < w; i++)
        part->least[i] = INFINITY;
    bool converged = all.converged;
    bs_cheapest__free(&all);
    st = descend(part, converged);
done:
    bs_cheapest__free(&all);
    if (st != BS_OK)
        bs_part__free(part);
    return st;
}

void bs_part__free(bs_part *part)
{
    bs_gate *gate;

    if (!part->graph)
        return;
    gate = part->graph->cx->gate;
    bs_gate_free(gate, part->value, part->graph->mol_count * sizeof *part->value);
    bs_gate_free(gate, part->least, part->graph->way_count * sizeof *part->least);
    bs_gate_free(gate, part->sorted, part->graph->way_count * sizeof *part->sorted);
    *part = (bs_part){.graph = NULL};
}

/* ---- Rings -------------------------------------------------------------------------------------
 */

/* What building a ring needs: numbers of the whole graph to those of the ring. */
typedef struct cut {
    const bs_part *part;
    bs_ring *ring;
    double bound;
    uint32_t *number;      /* by molecule */
    uint32_t *order;       /* by molecule of the ring: that of the whole */
    uint32_t *step_number; /* by step */
} cut;

static bs_status number_mol(cut *c, uint32_t mol)
{
    uint32_t made;
    bs_status st;

    if (c->number[mol] != BS_GRAPH_NONE)
        return BS_OK;
    if ((st = bs_graph__add_mol(&c->ring->graph, c->part->graph->mols[mol].price, &made)) != BS_OK)
        return st;
    c->number[mol] = made;
    c->order[made] = mol;
    return BS_OK;
}

/* Copies one way into the ring, under the step number that its step has there. */
static bs_status copy_way(cut *c, uint32_t w)
{
    const bs_graph *graph = c->part->graph;
    const bs_graph_way *way = &graph->ways[w];
    bs_ring *ring = c->ring;
    bs_mark mark = bs_arena_mark(&graph->cx->scratch);
    bs_graph_part *parts;
    uint32_t made;
    bs_status st = bs_new(graph->cx, &graph->cx->scratch, way->count, &parts);

    for (uint32_t i = 0; st == BS_OK && i < way->count; i++) {
        const bs_graph_use *use = &graph->uses[way->first + i];

        st = number_mol(c, use->mol);
        parts[i] = (bs_graph_part){c->number[use->mol], use->equivalents};
    }
    if (st == BS_OK)
        st = bs_graph__reserve(graph->cx, &ring->origin, &ring->origin_room,
                               (size_t)ring->graph.way_count + 1, sizeof *ring->origin);
    if (st == BS_OK)
        st = bs_graph__add_way(&ring->graph, c->number[way->product], c->step_number[way->step],
                               parts, way->count, way->cost, way->yield, 0, &made);
    if (st == BS_OK) {
        ring->origin[made] = w;
        c->step_number[way->step] = ring->graph.ways[made].step;
    }
    bs_arena_rewind(&graph->cx->scratch, mark);
    return st;
}

/* Copies what the bound leaves, breadth first from the target. */
static bs_status copy_ways(cut *c)
{
    const bs_graph *graph = c->part->graph;
    bs_status st = number_mol(c, c->part->target);

    for (uint32_t at = 0; st == BS_OK && at < c->ring->graph.mol_count; at++) {
        for (uint32_t w = graph->mols[c->order[at]].first_way; st == BS_OK && w != BS_GRAPH_NONE;
             w = graph->ways[w].next) {
            if (c->part->least[w] <= c->bound && isfinite(c->part->least[w]))
                st = copy_way(c, w);
        }
    }
    return st;
}

bs_status bs_ring__build(bs_ring *ring, const bs_part *part, uint32_t ways)
{
    const bs_graph *graph = part->graph;
    bs_ctx *cx = graph->cx;
    bs_mark mark = bs_arena_mark(&cx->scratch);
    cut c = {.part = part, .ring = ring};
    bs_status st;

    *ring = (bs_ring){.target = 0};
    bs_graph__init(&ring->graph, cx);
    ring->bound = ways < part->count ? part->sorted[ways] : INFINITY;
    c.bound = bs_part__slack(part, ring->bound);
    if ((st = bs_new(cx, &cx->scratch, graph->mol_count, &c.number)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, graph->mol_count, &c.order)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, (size_t)graph->step_count + 1, &c.step_number)) == BS_OK) {
        for (uint32_t i = 0; i < graph->mol_count; i++)
            c.number[i] = BS_GRAPH_NONE;
        for (uint32_t i = 0; i < graph->step_count; i++)
            c.step_number[i] = BS_GRAPH_NONE;
        st = copy_ways(&c);
    }
    if (st == BS_OK && ring->graph.way_count == part->count)
        ring->bound = INFINITY;
    bs_arena_rewind(&cx->scratch, mark);
    return st;
}

void bs_ring__free(bs_ring *ring)
{
    bs_ctx *cx = ring->graph.cx;

    if (!cx)
        return;
    bs_gate_free(cx->gate, ring->origin, ring->origin_room * sizeof *ring->origin);
    bs_graph__free(&ring->graph);
    *ring = (bs_ring){.target = 0};
}
