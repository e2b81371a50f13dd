/* Growing the hypergraph: meeting molecules, merging proposals, and the ends of the search. */
#include "search/explore.h"

#include "search/lane.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#define INDEX_SEED 0x6D6F6C65u
#define CHECK_SEED 0x63756C65u

double bs_explore__clock(void)
{
    struct timespec now;

    if (clock_gettime(CLOCK_MONOTONIC, &now) != 0)
        return 0;
    return (double)now.tv_sec + 1e-9 * (double)now.tv_nsec;
}

void bs_explore__init(bs_explore *x, bs_ctx *cx, const bs_explore_calls *calls,
                      const bs_explore_limits *limits, bs_cost_mode mode)
{
    *x = (bs_explore){
        .cx = cx,
        .calls = *calls,
        .limits = *limits,
        .mode = mode,
        .used_before = atomic_load(&cx->gate->used),
        .started = bs_explore__clock(),
        .next_enough = 16,
    };
    bs_arena_init(&x->arena, cx->gate);
    bs_graph__init(&x->graph, cx);
    bs_map_init(&x->index, cx);
    bs_frontier__init(&x->front, &x->graph, mode, limits->strategy == BS_STRATEGY_PROOF);
}

void bs_explore__free(bs_explore *x)
{
    bs_gate *gate = x->cx->gate;

    bs_map_free(&x->index);
    bs_frontier__free(&x->front);
    bs_graph__free(&x->graph);
    bs_gate_free(gate, x->nodes, x->node_room * sizeof *x->nodes);
    bs_gate_free(gate, x->check, x->check_room * sizeof *x->check);
    bs_arena_free(&x->arena);
    x->nodes = NULL;
    x->check = NULL;
    x->node_room = x->check_room = 0;
}

/* ---- Molecules ------------------------------------------------------------------------------ */

/* Identity is a hash of 128 bits; on a hit the text is compared. */
uint32_t bs_explore__find(const bs_explore *x, const char *smiles)
{
    size_t length = strlen(smiles), cursor = 0;
    uint64_t key = bs_hash_bytes(smiles, length, INDEX_SEED);
    uint64_t check = bs_hash_bytes(smiles, length, CHECK_SEED);
    uint32_t at;

    while ((at = bs_map_next(&x->index, key, &cursor)) != BS_MAP_NONE) {
        if (x->check[at] == check && strcmp(x->nodes[at].smiles, smiles) == 0)
            return at;
    }
    return BS_GRAPH_NONE;
}

static bs_status add_node(bs_explore *x, const char *smiles, const bs_meeting *met, uint32_t *mol)
{
    size_t length = strlen(smiles), needed = (size_t)x->graph.mol_count + 1;
    char *kept;
    bs_status st;

    if ((st = bs_graph__reserve(x->cx, &x->nodes, &x->node_room, needed, sizeof *x->nodes)) ||
        (st = bs_graph__reserve(x->cx, &x->check, &x->check_room, needed, sizeof *x->check)) ||
        (st = bs_copy_text(x->cx, &x->arena, smiles, length, &kept)) ||
        (st = bs_map_add(&x->index, bs_hash_bytes(smiles, length, INDEX_SEED),
                         x->graph.mol_count)))
        return st;
    /* Should this fail, the search ends, and nobody asks the index again. */
    if ((st = bs_graph__add_mol(&x->graph, met->price, mol)) != BS_OK)
        return st;
    x->check[*mol] = bs_hash_bytes(smiles, length, CHECK_SEED);
    x->nodes[*mol] = (bs_explore_node){
        .smiles = kept,
        .guess = met->guess,
        .depth = UINT32_MAX,
        .urgent = met->urgent,
        .closed = met->closed,
    };
    return BS_OK;
}

static bs_status meet(bs_explore *x, const bs_mol *mol, const char *smiles, uint32_t *out)
{
    bs_meeting met = {.price = INFINITY};
    bs_status st;

    *out = bs_explore__find(x, smiles);
    if (*out != BS_GRAPH_NONE)
        return BS_OK;
    st = x->calls.meet(x->calls.payload, x->cx, mol, smiles, &met);
    return st == BS_OK ? add_node(x, smiles, &met, out) : st;
}

/* ---- Proposals ------------------------------------------------------------------------------ */

static int by_mol(const void *a, const void *b)
{
    const bs_graph_part *x = a, *y = b;

    return (x->mol > y->mol) - (x->mol < y->mol);
}

/* Whether the proposal fits into what the limit of molecules leaves. */
static bool has_room(const bs_explore *x, const bs_proposal *p)
{
    uint32_t left = x->limits.molecules > x->graph.mol_count
                        ? x->limits.molecules - x->graph.mol_count
                        : 0;

    for (int i = 0; i < p->count; i++) {
        if (bs_explore__find(x, p->smiles[i]) != BS_GRAPH_NONE)
            continue;
        if (left == 0)
            return false;
        left--;
    }
    return true;
}

/* Whether a way needs just these molecules; `parts` are sorted as the uses of every way are. */
static bool same_parts(const bs_graph *graph, const bs_graph_way *way, const bs_graph_part *parts,
                       uint32_t count)
{
    if (way->count != count)
        return false;
    for (uint32_t i = 0; i < count; i++) {
        if (graph->uses[way->first + i].mol != parts[i].mol)
            return false;
    }
    return true;
}

/*
 * The step of `product` from these parts that was made since `since`, or none. `*known` tells
 * that it has the very same way already.
 */
static uint32_t find_step(const bs_explore *x, uint32_t product, uint32_t since,
                          const bs_graph_part *parts, const bs_proposal *p, bool *known)
{
    const bs_graph *graph = &x->graph;
    uint32_t step = BS_GRAPH_NONE;

    *known = false;
    for (uint32_t w = graph->mols[product].first_way; w != BS_GRAPH_NONE;
         w = graph->ways[w].next) {
        const bs_graph_way *way = &graph->ways[w];

        if (w < since || !same_parts(graph, way, parts, (uint32_t)p->count))
            continue;
        step = way->step;
        if (way->tag == p->tag)
            *known = true;
    }
    return step;
}

/* Adds one admitted proposal: a step, or a way of a step that joins the same compounds. */
static bs_status add_proposal(bs_explore *x, uint32_t product, uint32_t since,
                              const bs_proposal *p)
{
    bs_arena *scratch = &x->cx->scratch;
    bs_mark temp = bs_arena_mark(scratch);
    uint32_t step = BS_GRAPH_NONE, way;
    bool known = false;
    bs_graph_part *parts;
    bs_status st = bs_new(x->cx, scratch, p->count, &parts);

    for (int i = 0; st == BS_OK && i < p->count; i++) {
        parts[i].equivalents = p->equivalents[i];
        st = meet(x, p->mols ? p->mols[i] : NULL, p->smiles[i], &parts[i].mol);
        known = known || parts[i].mol == product; /* no route can use it */
    }
    if (st == BS_OK && !known) {
        qsort(parts, (size_t)p->count, sizeof *parts, by_mol);
        if (!p->apart)
            step = find_step(x, product, since, parts, p, &known);
        if (!known)
            st = bs_graph__add_way(&x->graph, product, step, parts, (uint32_t)p->count, p->cost,
                                   p->yield, p->tag, &way);
    }
    bs_arena_rewind(scratch, temp);
    return st;
}

/*
 * Merges what the expansion of a molecule gave, or the rest of it after a limit or a stop cut it
 * short. Steps apart come first in it, so that ways added after them never join one: x->since
 * is the first way that may be joined.
 */
static bs_status merge(bs_explore *x, uint32_t mol, bs_proposals *found)
{
    bs_status st = BS_OK;

    if (!x->partial) {
        x->next_proposal = 0;
        x->since = x->graph.way_count;
        if (x->calls.merged && (st = x->calls.merged(x->calls.payload, found)) != BS_OK)
            return st;
    }
    x->partial = true;
    for (; x->next_proposal < found->count; x->next_proposal++) {
        bs_proposal *p = &found->items[x->next_proposal];
        bool admitted = true;

        if (p->count < 1)
            continue;
        x->crowded = !has_room(x, p);
        if (x->crowded)
            return BS_OK;
        if (x->calls.admit)
            st = x->calls.admit(x->calls.payload, x->cx, x->nodes[mol].smiles, p, &admitted);
        if (st == BS_OK && admitted)
            st = add_proposal(x, mol, x->since, p);
        if (st != BS_OK)
            return st;
        if (p->apart)
            x->since = x->graph.way_count;
    }
    x->partial = false;
    return BS_OK;
}

/*
 * Merges the answer of a job; one of BS_ELIMIT is counted and passed over. A molecule whose answer
 * was cut short is still to be expanded.
 */
static bs_status take_answer(bs_explore *x, uint32_t mol, bs_lane_job *job)
{
    bs_status st = job->status;

    if (st != BS_OK)
        x->cx->error = job->error;
    else
        st = merge(x, mol, &job->found);
    if (st == BS_ESTOPPED || x->crowded)
        return st;
    x->partial = false;
    x->nodes[mol].expanded = true;
    x->expanded++;
    x->front.picked_at++;
    if (st == BS_ELIMIT) {
        x->failed++;
        st = BS_OK;
    }
    return st;
}

/* ---- The search ------------------------------------------------------------------------------ */

/* Whether a limit ends the search now; tells which. */
static bool is_over(bs_explore *x)
{
    size_t used = atomic_load(&x->cx->gate->used);

    if (atomic_load(x->cx->stop))
        x->end = BS_END_STOPPED;
    else if (x->crowded || x->graph.mol_count >= x->limits.molecules)
        x->end = BS_END_MOLECULES;
    else if (x->limits.seconds > 0 && bs_explore__clock() - x->started >= x->limits.seconds)
        x->end = BS_END_SECONDS;
    else if (x->limits.memory > 0 && used > x->used_before &&
             used - x->used_before > x->limits.memory)
        x->end = BS_END_MEMORY;
    else
        return false;
    return true;
}

/* Asks `enough`, now and then: it is dear, since it counts routes. */
static bs_status ask_enough(bs_explore *x, bool *done)
{
    double cheapest = x->front.had.items[0].value, bound;
    bs_status st;

    *done = false;
    if (!x->calls.enough || isinf(cheapest) || x->expanded < x->next_enough)
        return BS_OK;
    x->next_enough = x->expanded + x->expanded / 4 + 1;
    if ((st = bs_frontier__bound(x, &bound)) != BS_OK || bound < cheapest)
        return st;
    return x->calls.enough(x->calls.payload, x->cx, bound, done);
}

static void report(const bs_explore *x)
{
    bs_plan_progress now = {
        .molecules = x->graph.mol_count,
        .expanded = x->expanded,
        .steps = x->graph.step_count,
        .open = x->front.open,
        .seconds = bs_explore__clock() - x->started,
        .solved = isfinite(x->front.had.items[0].value),
        .cheapest = x->front.had.items[0].value,
    };

    if (x->calls.progress)
        x->calls.progress(x->calls.payload, &now);
}

/*
 * Expands what is left of the batch. With one thread each molecule is merged before the next is
 * expanded, so that a limit of time is heeded between them; what is merged is the same.
 */
static bs_status expand_batch(bs_explore *x, bs_arena *home, bool *over)
{
    uint32_t first = x->front.picked_at, last = x->front.picked_count;
    int count = (int)(last - first);
    bs_lane_job *jobs;
    bs_status st = bs_new(x->cx, home, count, &jobs);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < count; i++) {
        const bs_explore_node *node = &x->nodes[x->front.picked[first + (uint32_t)i]];

        jobs[i].smiles = node->smiles;
        jobs[i].closed = node->closed;
        jobs[i].lane = (int)(first + (uint32_t)i) % x->limits.lanes;
        bs_arena_init(&jobs[i].home, x->cx->gate);
    }
    if (x->calls.begin)
        x->calls.begin(x->calls.payload);
    if (x->limits.threads > 1)
        st = bs_lane__run_all(x, jobs, count);
    for (int i = 0; st == BS_OK && !*over && i < count; i++) {
        if (!jobs[i].ran && x->limits.threads <= 1)
            bs_lane__run(x, x->cx, &jobs[i]);
        if (jobs[i].ran)
            st = take_answer(x, x->front.picked[first + (uint32_t)i], &jobs[i]);
        *over = st == BS_OK && is_over(x);
        bs_arena_free(&jobs[i].home);
    }
    for (int i = 0; i < count; i++)
        bs_arena_free(&jobs[i].home);
    return st;
}

/* Whether what was looked at ends the search; tells why. */
static bs_status look_for_end(bs_explore *x, bool *over)
{
    bool done = false;
    bs_status st = BS_OK;

    *over = true;
    if (x->limits.strategy == BS_STRATEGY_PROOF && isfinite(x->front.had.items[0].value)) {
        x->end = BS_END_PROVED;
    } else if (x->front.picked_count == 0) {
        x->end = BS_END_EXHAUSTED;
    } else {
        st = ask_enough(x, &done);
        *over = done;
        if (done)
            x->end = BS_END_ENOUGH;
    }
    return st;
}

/* One round: look, perhaps end, expand a batch. */
static bs_status go_round(bs_explore *x, bs_arena *home, bool *over)
{
    bs_status st;

    if (x->front.picked_at == x->front.picked_count) {
        if ((st = bs_frontier__look(x)) != BS_OK)
            return st;
        report(x);
    }
    if (x->front.picked_at == 0 && ((st = look_for_end(x, over)) != BS_OK || *over))
        return st;
    return expand_batch(x, home, over);
}

bs_status bs_explore__run(bs_explore *x, const bs_mol *target, const char *smiles)
{
    uint32_t mol;
    bool over = false;
    bs_status st;

    if (x->limits.batch < 1 || x->limits.lanes < 1 || x->limits.threads < 1)
        return bs_fail(x->cx, BS_EBUG, "batch, lanes and threads must be 1 or more");
    x->started = bs_explore__clock();
    if (x->end == BS_END_ENOUGH)
        x->next_enough = x->expanded; /* ask again at once */
    st = meet(x, target, smiles, &mol);
    if (st == BS_OK && !x->nodes[mol].expanded)
        x->nodes[mol].closed = false; /* the target is always worth it */
    while (st == BS_OK && !over) {
        bs_arena round;

        bs_arena_init(&round, x->cx->gate);
        st = go_round(x, &round, &over);
        bs_arena_free(&round);
    }
    if (st == BS_ESTOPPED) {
        x->end = BS_END_STOPPED;
        st = BS_OK;
    }
    return st;
}
