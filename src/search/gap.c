/* Gaps: what to buy, or which rule to write, to open the most. */
#include "search/cheapest.h"
#include "search/plan.h"

#include <math.h>
#include <stdlib.h>

/* When so many uses were looked at, the molecules met last are not tried. */
#define MOST_LOOKED 20000000u

/* Which molecules can be had, and how many precursors each way still lacks. */
typedef struct closure {
    const bs_graph *graph;
    uint64_t looked; /* uses */
    bool *had;
    uint32_t *lacking;
    uint32_t *queue;
} closure;

static bs_status find_had(closure *c)
{
    bs_cheapest work;
    bs_status st = bs_cheapest__init(&work, c->graph, BS_COST_ADDITIVE);

    if (st != BS_OK)
        return st;
    if ((st = bs_cheapest__run(&work, NULL, BS_GRAPH_NONE)) == BS_OK) {
        for (uint32_t m = 0; m < c->graph->mol_count; m++)
            c->had[m] = isfinite(work.value[m]);
        for (uint32_t w = 0; w < c->graph->way_count; w++) {
            const bs_graph_way *way = &c->graph->ways[w];

            c->lacking[w] = isinf(way->cost); /* struck */
            for (uint32_t use = way->first; use < way->first + way->count; use++)
                c->lacking[w] += !c->had[c->graph->uses[use].mol];
        }
    }
    bs_cheapest__free(&work);
    return st;
}

/*
 * What could be had if `mol` could: spreads through the ways that lack nothing else, counts, and
 * takes everything back.
 */
static bs_gap try_molecule(closure *c, uint32_t mol, uint32_t target)
{
    const bs_graph *graph = c->graph;
    uint32_t head = 0, tail = 0;
    bs_gap gap = {.opens = -1};

    c->queue[tail++] = mol;
    c->had[mol] = true;
    while (head < tail) {
        uint32_t at = c->queue[head++];

        gap.opens++;
        gap.opens_target = gap.opens_target || at == target;
        for (uint32_t use = graph->mols[at].first_use; use != BS_GRAPH_NONE;
             use = graph->uses[use].next) {
            uint32_t way = graph->uses[use].way, product = graph->ways[way].product;

            c->looked++;
            gap.steps += at == mol;
            if (--c->lacking[way] > 0 || c->had[product])
                continue;
            c->had[product] = true;
            c->queue[tail++] = product;
        }
    }
    for (uint32_t i = 0; i < tail; i++) {
        c->had[c->queue[i]] = false;
        for (uint32_t use = graph->mols[c->queue[i]].first_use; use != BS_GRAPH_NONE;
             use = graph->uses[use].next)
            c->lacking[graph->uses[use].way]++;
    }
    return gap;
}

typedef struct ranked {
    bs_gap gap;
    uint32_t mol;
} ranked;

static int by_worth(const void *a, const void *b)
{
    const ranked *x = a, *y = b;

    if (x->gap.opens_target != y->gap.opens_target)
        return x->gap.opens_target ? -1 : 1;
    if (x->gap.opens != y->gap.opens)
        return x->gap.opens > y->gap.opens ? -1 : 1;
    if (x->gap.steps != y->gap.steps)
        return x->gap.steps > y->gap.steps ? -1 : 1;
    return (x->mol > y->mol) - (x->mol < y->mol);
}

static bs_status rank_molecules(const bs_explore *x, uint32_t target, ranked **list, int *count)
{
    bs_ctx *cx = x->cx;
    size_t n = x->graph.mol_count;
    closure c = {.graph = &x->graph};
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, n, &c.had)) || (st = bs_new(cx, &cx->scratch, n, &c.queue)) ||
        (st = bs_new(cx, &cx->scratch, x->graph.way_count, &c.lacking)) ||
        (st = bs_new(cx, &cx->scratch, n, list)) || (st = find_had(&c)))
        return st;
    for (uint32_t m = 0; m < n && c.looked < MOST_LOOKED; m++) {
        bs_gap gap;

        /* The target alone would open itself; a molecule that something makes is no gap. */
        if (c.had[m] || m == target)
            continue;
        gap = try_molecule(&c, m, target);
        if (gap.opens > 0)
            (*list)[(*count)++] = (ranked){gap, m};
    }
    qsort(*list, (size_t)*count, sizeof **list, by_worth);
    return BS_OK;
}

bs_status bs_plan__find_gaps(const bs_explore *x, bs_arena *home, uint32_t target, int most,
                             bs_gap **gaps, int *count)
{
    bs_mark temp = bs_arena_mark(&x->cx->scratch);
    ranked *list = NULL;
    int found = 0;
    bs_status st = rank_molecules(x, target, &list, &found);

    *count = 0;
    if (st == BS_OK)
        st = bs_new(x->cx, home, found < most ? found : most, gaps);
    for (int i = 0; st == BS_OK && i < found && i < most; i++) {
        const char *smiles = x->nodes[list[i].mol].smiles;
        char *copy;
        size_t length = 0;

        while (smiles[length])
            length++;
        if ((st = bs_copy_text(x->cx, home, smiles, length, &copy)) != BS_OK)
            break;
        (*gaps)[i] = list[i].gap;
        (*gaps)[i].smiles = copy;
        (*count)++;
    }
    bs_arena_rewind(&x->cx->scratch, temp);
    return st;
}
