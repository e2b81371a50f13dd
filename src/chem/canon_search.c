/*
 * The search for the canonical order of one connected graph, after McKay, "Practical graph
 * isomorphism", Congressus Numerantium 30 (1981) 45-87.
 *
 * A node of the search tree is an equitable partition; its children single out one atom each of
 * its target cell. Every choice made here depends on colours only, so alike graphs have alike
 * trees. The canonical leaf is the one with the smallest traces on its path, then the smallest
 * certificate.
 *
 * At each node all atoms of the target cell are first tried to be proven alike by exchanges (see
 * chem/canon.h). If that works, one child stands for all and the node never comes back ("settled").
 * Otherwise the node becomes a level to come back to: its atoms that no known automorphism
 * connects are tried one by one. Equal leaves give further automorphisms.
 */
#include "chem/canon.h"

#include <string.h>

#include "core/map.h"

enum {
    CELLS_COMPARED = 16,      /* cells looked at to find a small one */
    WORK_LIMIT = 200 * 1000 * 1000, /* about two seconds */
    POLL_EVERY = 64,
    MAX_LEVELS = 512
};

/* A node to come back to. Members are atoms of its target cell; `leader` joins alike ones. */
typedef struct level {
    bs_mark mark;
    uint32_t *member;
    uint32_t *leader; /* a forest over the places in `member` */
    bool *tried;      /* by place of the leader */
    uint32_t count;
    uint32_t choice;
    uint32_t depth;
    uint32_t first;
    uint32_t splits;
    int order; /* of the path down to this node against the best path: -1, 0 */
} level;

typedef struct search {
    bs_ctx *cx;
    const bs_canon_graph *graph;
    bs_canon_cells cells;
    bs_canon_swap swap;
    uint32_t *before;  /* a colouring to compare with */
    uint32_t *slot;    /* place of an atom in the members of a level */
    uint32_t *orbit;   /* a forest over all atoms, or NULL */
    uint64_t *trace;   /* of the current path, by depth */
    uint64_t *best_trace;
    uint32_t *best_lab; /* atoms by rank in the best leaf */
    uint32_t *certificate;
    uint32_t *best_certificate;
    size_t certificate_length;
    level *levels;
    uint32_t level_count;
    uint32_t level_room;
    uint32_t shared; /* levels that the best path and the current one have in common */
    uint32_t depth;
    uint32_t first; /* cells before this place are discrete */
    uint32_t nodes;
    uint64_t work_limit;
    int order;
    bool has_best;
    bool want_certificate;
} search;

/* ---- Forests of alike atoms ------------------------------------------------------------ */

static uint32_t leader_of(uint32_t *leader, uint32_t i)
{
    while (leader[i] != i) {
        leader[i] = leader[leader[i]];
        i = leader[i];
    }
    return i;
}

static void join(uint32_t *leader, bool *tried, uint32_t i, uint32_t k)
{
    i = leader_of(leader, i);
    k = leader_of(leader, k);
    if (i == k)
        return;
    if (k < i) {
        uint32_t spare = i;

        i = k;
        k = spare;
    }
    leader[k] = i;
    if (tried)
        tried[i] = tried[i] || tried[k];
}

static void join_orbits(search *s, uint32_t atom, uint32_t image)
{
    if (s->orbit)
        join(s->orbit, NULL, atom, image);
}

/* ---- Leaves ---------------------------------------------------------------------------- */

/* Writes the graph as it looks under the discrete colouring of the cells. */
static void certify(search *s)
{
    const bs_canon_graph *graph = s->graph;
    const uint32_t *rank = s->cells.colour;
    uint32_t *out = s->certificate;

    for (uint32_t k = 0; k < graph->element_count; k++)
        bs_canon__add_code(&graph->element[k], rank, s->cells.sum);
    for (uint32_t r = 0; r < graph->atom_count; r++) {
        uint32_t atom = s->cells.lab[r], *first;
        uint64_t key = graph->key[atom], code = s->cells.sum[atom];

        *out++ = (uint32_t)(key >> 32);
        *out++ = (uint32_t)key;
        *out++ = (uint32_t)(code >> 32);
        *out++ = (uint32_t)code;
        *out++ = bs_canon__label(graph, atom);
        s->cells.sum[atom] = 0;
        first = out;
        for (uint32_t e = graph->offset[atom]; e < graph->offset[atom + 1]; e++) {
            uint32_t to = rank[graph->edge[e] >> BS_CANON_TYPE_BITS];

            *out++ = to << BS_CANON_TYPE_BITS |
                     (graph->edge[e] & ((1u << BS_CANON_TYPE_BITS) - 1));
        }
        bs_canon__sort(first, (uint32_t)(out - first), NULL);
    }
    s->cells.work += graph->edge_count + graph->atom_count;
}

static int compare_words(const uint32_t *a, const uint32_t *b, size_t length)
{
    for (size_t i = 0; i < length; i++)
        if (a[i] != b[i])
            return a[i] < b[i] ? -1 : 1;
    return 0;
}

int bs_canon__compare(const bs_canon_order *a, const bs_canon_order *b)
{
    if (a->certificate_length != b->certificate_length)
        return a->certificate_length < b->certificate_length ? -1 : 1;
    return compare_words(a->certificate, b->certificate, a->certificate_length);
}

static void keep_leaf(search *s)
{
    uint32_t *spare = s->best_certificate;

    s->best_certificate = s->certificate;
    s->certificate = spare;
    memcpy(s->best_lab, s->cells.lab, s->graph->atom_count * sizeof *s->best_lab);
    memcpy(s->best_trace, s->trace, (s->depth + 1) * sizeof *s->best_trace);
    for (uint32_t k = 0; k < s->level_count; k++)
        s->levels[k].order = 0;
    s->shared = s->level_count;
    s->has_best = true;
    s->order = 0;
}

/* The current leaf equals the best one: joins what the automorphism between them connects. */
static void use_equal_leaf(search *s)
{
    const uint32_t *rank = s->cells.colour;
    uint32_t last = s->shared < s->level_count ? s->shared : s->level_count - 1;

    for (uint32_t k = 0; k <= last; k++) {
        level *at = &s->levels[k];

        for (uint32_t i = 0; i < at->count; i++)
            s->slot[at->member[i]] = i;
        for (uint32_t i = 0; i < at->count; i++)
            join(at->leader, at->tried, i, s->slot[s->best_lab[rank[at->member[i]]]]);
    }
    for (uint32_t atom = 0; s->orbit && atom < s->graph->atom_count; atom++)
        join_orbits(s, atom, s->best_lab[rank[atom]]);
    /* What lies below the fork is alike what was seen below the best leaf's side of it. */
    while (s->level_count > last + 1) {
        s->level_count--;
        bs_arena_rewind(&s->cx->scratch, s->levels[s->level_count].mark);
    }
}

static void visit_leaf(search *s)
{
    int order;

    if (!s->has_best) {
        if (s->level_count > 0 || s->want_certificate)
            certify(s);
        keep_leaf(s);
        return;
    }
    certify(s);
    order = s->order;
    if (order == 0)
        order = compare_words(s->certificate, s->best_certificate, s->certificate_length);
    if (order < 0)
        keep_leaf(s);
    else if (order == 0)
        use_equal_leaf(s);
}

/* ---- Nodes ----------------------------------------------------------------------------- */

/* The smallest of the next few cells with more than one atom. */
static uint32_t target_cell(search *s)
{
    const uint32_t *size = s->cells.size;
    uint32_t n = s->graph->atom_count, best = BS_CANON_NONE, seen = 0;

    while (s->first < n && size[s->first] == 1)
        s->first++;
    for (uint32_t at = s->first; at < n && seen < CELLS_COMPARED; at += size[at]) {
        s->cells.work++;
        if (size[at] == 1)
            continue;
        seen++;
        if (best == BS_CANON_NONE || size[at] < size[best])
            best = at;
        if (size[at] == 2)
            break;
    }
    return best;
}

/* Singles out an atom and refines; returns the trace of that. */
static uint64_t enter(search *s, uint32_t atom)
{
    s->nodes++;
    s->cells.trace = s->cells.colour[atom];
    bs_canon__single_out(&s->cells, atom);
    bs_canon__refine(&s->cells, s->graph);
    return s->cells.trace;
}

/* Notes the trace of the child that was entered; false if its path is worse than the best. */
static bool descend(search *s, uint64_t trace)
{
    s->depth++;
    s->trace[s->depth] = trace;
    if (!s->has_best || s->order < 0)
        return true;
    if (trace > s->best_trace[s->depth])
        return false;
    if (trace < s->best_trace[s->depth])
        s->order = -1;
    return true;
}

/* Joins the members of a node that the exchange found connects. */
static void use_swap(search *s, level *at)
{
    for (uint32_t i = 0; i < at->count; i++) {
        uint32_t image = s->swap.image[at->member[i]];

        if (image != BS_CANON_NONE)
            join(at->leader, NULL, i, s->slot[image]);
    }
    for (uint32_t k = 0; s->orbit && k < s->swap.met_count; k++)
        join_orbits(s, s->swap.met[k], s->swap.image[s->swap.met[k]]);
}

/*
 * Tries to prove all members alike. If it works, the cells are those of a child, whose trace goes
 * to *trace; if not, they are those of the node.
 */
static bool settle(search *s, level *at, uint64_t *trace)
{
    uint32_t base = at->count - 1;

    *trace = enter(s, at->member[base]);
    memcpy(s->before, s->cells.colour, s->graph->atom_count * sizeof *s->before);
    for (uint32_t i = 0; i < base; i++) {
        bool alike;

        if (leader_of(at->leader, i) == leader_of(at->leader, base))
            continue;
        bs_canon__undo(&s->cells, at->splits);
        alike = enter(s, at->member[i]) == *trace &&
                bs_canon__swap_find(&s->swap, s->graph, s->before, s->cells.colour,
                                    at->member[base], at->member[i]);
        if (alike)
            use_swap(s, at);
        s->cells.work += s->swap.work;
        s->swap.work = 0;
        bs_canon__swap_clear(&s->swap);
        if (!alike) {
            bs_canon__undo(&s->cells, at->splits);
            return false;
        }
    }
    return true;
}

/* Makes a level of the current node, whose target cell starts at `start`. */
static bs_status open_level(search *s, uint32_t start, level *at)
{
    bs_ctx *cx = s->cx;
    bs_status st;

    memset(at, 0, sizeof *at);
    at->mark = bs_arena_mark(&cx->scratch);
    at->count = s->cells.size[start];
    at->depth = s->depth;
    at->first = s->first;
    at->splits = s->cells.split_count;
    at->order = s->order;
    if ((st = bs_new(cx, &cx->scratch, at->count, &at->member)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, at->count, &at->leader)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, at->count, &at->tried)) != BS_OK)
        return st;
    memcpy(at->member, s->cells.lab + start, at->count * sizeof *at->member);
    for (uint32_t i = 0; i < at->count; i++) {
        at->leader[i] = i;
        s->slot[at->member[i]] = i;
    }
    return BS_OK;
}

/* Takes the next atom of the innermost level; false if its path is worse than the best. */
static bool take_choice(search *s, level *at, uint32_t choice)
{
    at->choice = choice;
    at->tried[leader_of(at->leader, choice)] = true;
    s->depth = at->depth;
    s->first = at->first;
    s->order = at->order;
    return descend(s, enter(s, at->member[choice]));
}

static bs_status push_level(search *s, const level *at)
{
    if (s->level_count == s->level_room)
        return bs_fail(s->cx, BS_ELIMIT,
                       "the molecule is too symmetrical for a canonical order within the limit");
    s->levels[s->level_count++] = *at;
    return BS_OK;
}

/*
 * Goes one step down from a node that is not discrete. *on is false where the path is worse than
 * the best.
 */
static bs_status step_down(search *s, bool *on)
{
    level at;
    uint64_t trace;
    bs_status st;

    if ((st = open_level(s, target_cell(s), &at)) != BS_OK)
        return st;
    if (settle(s, &at, &trace)) {
        bs_arena_rewind(&s->cx->scratch, at.mark);
        *on = descend(s, trace);
        return BS_OK;
    }
    if ((st = push_level(s, &at)) != BS_OK)
        return st;
    *on = take_choice(s, &s->levels[s->level_count - 1], 0);
    return BS_OK;
}

/* Goes back to the innermost level with an atom left to try; false if there is none. */
static bool step_back(search *s, bool *on)
{
    while (s->level_count > 0) {
        level *at = &s->levels[s->level_count - 1];

        bs_canon__undo(&s->cells, at->splits);
        for (uint32_t i = at->choice + 1; i < at->count; i++) {
            if (at->tried[leader_of(at->leader, i)])
                continue;
            if (s->shared >= s->level_count)
                s->shared = s->level_count - 1;
            *on = take_choice(s, at, i);
            return true;
        }
        s->level_count--;
        if (s->shared > s->level_count)
            s->shared = s->level_count;
        bs_arena_rewind(&s->cx->scratch, at->mark);
    }
    return false;
}

static bs_status check_bounds(search *s)
{
    if (s->cells.work > s->work_limit)
        return bs_fail(s->cx, BS_ELIMIT,
                       "the molecule is too symmetrical for a canonical order within the limit");
    return s->nodes % POLL_EVERY == 0 ? bs_poll(s->cx) : BS_OK;
}

static bs_status walk(search *s)
{
    bool on = true;
    bs_status st;

    for (;;) {
        if ((st = check_bounds(s)) != BS_OK)
            return st;
        if (on && s->cells.cell_count < s->graph->atom_count) {
            if ((st = step_down(s, &on)) != BS_OK)
                return st;
            continue;
        }
        if (on)
            visit_leaf(s);
        if (!step_back(s, &on))
            return BS_OK;
    }
}

/* ---- The whole ------------------------------------------------------------------------- */

static bs_status make_room(search *s, const bs_canon_task *task)
{
    bs_ctx *cx = s->cx;
    size_t n = s->graph->atom_count, length = 5 * n + s->graph->edge_count;
    uint32_t *words;
    bs_status st;

    s->certificate_length = length;
    s->level_room = n < MAX_LEVELS ? (uint32_t)n : MAX_LEVELS;
    /* The levels are filled before they are read, so their room need not be cleared. */
    s->levels = bs_arena_alloc(&cx->scratch, s->level_room * sizeof *s->levels);
    if (!s->levels)
        return bs_fail_memory(cx);
    if ((st = bs_canon__cells_new(cx, (uint32_t)n, &s->cells)) != BS_OK ||
        (st = bs_canon__swap_new(cx, (uint32_t)n, &s->swap)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, 2 * (n + 1), &s->trace)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, 4 * n + 2 * length, &words)) != BS_OK)
        return st;
    s->best_trace = s->trace + n + 1;
    s->before = words;
    s->slot = words + n;
    s->best_lab = words + 2 * n;
    s->certificate = words + 4 * n;
    s->best_certificate = s->certificate + length;
    if (task->orbits) {
        s->orbit = words + 3 * n;
        for (uint32_t i = 0; i < n; i++)
            s->orbit[i] = i;
    }
    return BS_OK;
}

static bs_status report(search *s, bs_canon_order *out)
{
    uint32_t n = s->graph->atom_count;
    bs_status st;

    if ((st = bs_new(s->cx, &s->cx->scratch, n, &out->rank)) != BS_OK)
        return st;
    for (uint32_t r = 0; r < n; r++)
        out->rank[s->best_lab[r]] = r;
    if (s->want_certificate) {
        out->certificate = s->best_certificate;
        out->certificate_length = s->certificate_length;
    }
    for (uint32_t i = 0; s->orbit && i < n; i++)
        s->orbit[i] = leader_of(s->orbit, i);
    out->orbit = s->orbit;
    out->work = s->cells.work;
    return BS_OK;
}

bs_status bs_canon__search(bs_ctx *cx, const bs_canon_graph *graph, const bs_canon_task *task,
                           bs_canon_order *out)
{
    search s = {.cx = cx, .graph = graph, .want_certificate = task->certificate};
    bs_status st;

    memset(out, 0, sizeof *out);
    s.work_limit = task->work_limit ? task->work_limit : WORK_LIMIT;
    if ((st = make_room(&s, task)) != BS_OK)
        return st;
    bs_canon__cells_start(&s.cells, graph);
    for (uint32_t k = 0; k < task->fixed_count; k++)
        bs_canon__set_apart(&s.cells, &graph->element[task->fixed[k]]);
    bs_canon__refine(&s.cells, graph);
    st = walk(&s);
    bs_spend(cx, s.cells.work);
    if (st != BS_OK)
        return st;
    return report(&s, out);
}
