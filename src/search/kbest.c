/* The enumeration of kbest.h: a heap of problems, each solved when it comes to the top. */
#include "search/kbest.h"

#include "search/lazy.h"
#include "search/part.h"

#include <math.h>
#include <string.h>

/* By default the enumeration ends when about so many ways were looked at. */
#define MOST_WORK 4000000000u

/* Marks the number of a problem in the heap that is not solved. */
#define UNSOLVED ((uint32_t)1 << 31)

/* Ways of the first ring, and how much larger the next is. */
#define FIRST_RING 2000
#define RING_GROWTH 8

/* So many times a problem is put off when another may be cheaper, before it is solved anyway. */
#define MOST_PUT_OFF 2

/* One decision: how a molecule is had. */
typedef struct decision {
    uint32_t mol;
    uint32_t way; /* or BS_GRAPH_BUY */
} decision;

/*
 * A problem. The first `kept` decisions of `parent`'s answer hold, and `bars` are forbidden for the
 * molecule of the decision behind them. Once solved it has an answer of its own.
 */
typedef struct problem {
    double bound; /* cost of the answer if solved, else that of the parent */
    uint32_t parent;
    uint32_t kept;
    uint32_t bar_mol; /* BS_GRAPH_NONE for the first problem */
    uint32_t first_bar, bar_count;
    uint32_t first_decision, decision_count;
    bool solved;
    uint8_t put_off;
} problem;

struct bs_kbest {
    bs_ctx *cx;
    bs_part part;
    bs_ring ring; /* the graph that the problems are about */
    uint32_t ring_ways;
    double given; /* routes up to this cost were given from smaller rings */
    bs_cost_mode mode;
    bs_cheapest work; /* for the ring, as is all that follows */
    bs_lazy lazy;
    bool solid; /* the values that the solver starts from are lower bounds */
    problem *problems;
    uint32_t *bars; /* steps or BS_GRAPH_BUY */
    decision *decisions;
    bs_heap heap;   /* of problems */
    uint32_t *seen; /* by molecule: the last walk that met it */
    uint32_t *ways; /* of the route given last */
    uint32_t walk;
    size_t problem_count, bar_count, decision_count;
    size_t problem_room, bar_room, decision_room, ways_room, seen_room;
    long solves;        /* problems that may still be solved; 0 or less: the work counts alone */
    bool limited;       /* `solves` counts */
    uint64_t work_left; /* ways */
    bool cut;
};

/* ---- Problems -------------------------------------------------------------------------------- */

/* Puts a problem into the heap: lower bound first, the older first among equals. */
/* Among problems of the same bound those that are solved come first. */
static bs_status push(bs_kbest *k, uint32_t index)
{
    const problem *p = &k->problems[index];

    return bs_heap__push(&k->heap, k->cx, p->bound, p->solved ? index : index | UNSOLVED);
}

static bs_status add_problem(bs_kbest *k, problem p)
{
    bs_status st = bs_graph__reserve(k->cx, &k->problems, &k->problem_room, k->problem_count + 1,
                                     sizeof *k->problems);

    if (st != BS_OK)
        return st;
    k->problems[k->problem_count] = p;
    if ((st = push(k, (uint32_t)k->problem_count)) == BS_OK)
        k->problem_count++;
    return st;
}

/* ---- Solving one problem ------------------------------------------------------------------- */

static void spend(bs_kbest *k, uint64_t work)
{
    k->work_left = k->work_left > work ? k->work_left - work : 0;
}

static uint32_t step_of(const bs_kbest *k, uint32_t way)
{
    return way == BS_GRAPH_BUY ? BS_GRAPH_BUY : k->ring.graph.ways[way].step;
}

/* Sets the bars of a problem in the working room, or takes them back. */
static void set_bars(bs_kbest *k, const problem *p, bool on)
{
    const decision *kept =
        p->parent == BS_GRAPH_NONE ? NULL : &k->decisions[k->problems[p->parent].first_decision];

    for (uint32_t i = 0; kept && i < p->kept; i++)
        k->work.only[kept[i].mol] = on ? step_of(k, kept[i].way) : BS_GRAPH_NONE;
    for (uint32_t i = 0; i < p->bar_count; i++) {
        uint32_t bar = k->bars[p->first_bar + i];

        if (bar == BS_GRAPH_BUY)
            k->work.no_buy[p->bar_mol] = on;
        else
            k->work.barred[bar] = on;
    }
}

static bs_status add_decision(bs_kbest *k, const uint32_t *choice, uint32_t mol)
{
    bs_status st;

    if (k->seen[mol] == k->walk)
        return BS_OK;
    k->seen[mol] = k->walk;
    st = bs_graph__reserve(k->cx, &k->decisions, &k->decision_room, k->decision_count + 1,
                           sizeof *k->decisions);
    if (st == BS_OK)
        k->decisions[k->decision_count++] = (decision){mol, choice[mol]};
    return st;
}

/*
 * Writes the decisions of the answer, breadth first from the target, so that the molecule of each
 * decision follows from the decisions before it.
 */
static bs_status write_decisions(bs_kbest *k, problem *p, const uint32_t *choice)
{
    bs_status st;

    k->walk++;
    p->first_decision = (uint32_t)k->decision_count;
    st = add_decision(k, choice, k->ring.target);
    for (size_t at = p->first_decision; st == BS_OK && at < k->decision_count; at++) {
        uint32_t way = k->decisions[at].way;
        const bs_graph_way *w;

        if (way == BS_GRAPH_BUY)
            continue;
        w = &k->ring.graph.ways[way];
        for (uint32_t i = 0; st == BS_OK && i < w->count; i++)
            st = add_decision(k, choice, k->ring.graph.uses[w->first + i].mol);
    }
    p->decision_count = (uint32_t)(k->decision_count - p->first_decision);
    return st;
}

/* Tries the solver that looks only at what changed. The bars are set. */
static bs_lazy_end try_lazy(bs_kbest *k, const problem *p)
{
    const bs_graph *graph = &k->ring.graph;
    double give_up = bs_part__slack(&k->part, k->ring.bound);
    uint64_t before = k->lazy.looked, budget = 1000 + graph->way_count / 2;
    bs_lazy_end end;

    bs_lazy__reset(&k->lazy);
    if (p->parent == BS_GRAPH_NONE)
        return bs_lazy__solve(&k->lazy, k->ring.target, give_up, budget);
    bs_lazy__revise(&k->lazy, p->bar_mol);
    for (uint32_t i = p->kept; i-- > 0;)
        bs_lazy__revise(&k->lazy, k->decisions[k->problems[p->parent].first_decision + i].mol);
    if (p->put_off < MOST_PUT_OFF && k->heap.count > 0)
        give_up = fmax(p->bound, k->heap.entries[0].key);
    end = bs_lazy__solve(&k->lazy, k->ring.target, give_up, budget);
    spend(k, k->lazy.looked - before);
    return end;
}

/* Solves a problem from scratch. The bars are set. */
static bs_status solve_whole(bs_kbest *k, double *value)
{
    bs_status st = bs_cheapest__run(&k->work, NULL, k->ring.target);

    spend(k, (uint64_t)k->ring.graph.way_count + k->ring.graph.use_count);
    if (!k->work.converged)
        k->cut = true;
    *value = k->work.value[k->ring.target];
    return st;
}

/* Solves a problem, or puts it off, and puts it back into the heap, unless it has no answer. */
static bs_status solve(bs_kbest *k, uint32_t index)
{
    problem *p = &k->problems[index];
    bs_lazy_end end = BS_LAZY_SPENT;
    const uint32_t *choice = k->lazy.choice;
    double value = INFINITY;
    bs_status st = BS_OK;

    k->solves--;
    set_bars(k, p, true);
    if (k->solid) {
        end = try_lazy(k, p);
        value = k->lazy.value[k->ring.target];
    }
    if (end == BS_LAZY_SPENT) {
        st = solve_whole(k, &value);
        choice = k->work.choice;
    }
    set_bars(k, p, false);
    if (st != BS_OK || isinf(value))
        return st;
    p->bound = fmax(p->bound, value);
    if (end == BS_LAZY_ABOVE) {
        p->put_off++;
        return push(k, index);
    }
    if ((st = write_decisions(k, p, choice)) != BS_OK)
        return st;
    p->solved = true;
    return push(k, index);
}

/* ---- Partition ------------------------------------------------------------------------------ */

/* Whether a molecule has a way besides those barred: worth a problem of its own. */
static bool has_another(const bs_kbest *k, uint32_t mol, uint32_t chosen)
{
    const bs_graph_mol *m = &k->ring.graph.mols[mol];
    uint32_t step = step_of(k, chosen);

    if (step != BS_GRAPH_BUY && isfinite(m->price))
        return true;
    for (uint32_t w = m->first_way; w != BS_GRAPH_NONE; w = k->ring.graph.ways[w].next) {
        if (k->ring.graph.ways[w].step != step)
            return true;
    }
    return false;
}

static bs_status add_bar(bs_kbest *k, uint32_t bar)
{
    bs_status st =
        bs_graph__reserve(k->cx, &k->bars, &k->bar_room, k->bar_count + 1, sizeof *k->bars);

    if (st == BS_OK)
        k->bars[k->bar_count++] = bar;
    return st;
}

/* The problem that keeps `at` decisions of a solved one and bars the next. */
static bs_status branch(bs_kbest *k, uint32_t index, uint32_t at)
{
    problem parent = k->problems[index];
    decision d = k->decisions[parent.first_decision + at];
    problem child = {
        .bound = parent.bound,
        .parent = index,
        .kept = at,
        .bar_mol = d.mol,
        .first_bar = (uint32_t)k->bar_count,
    };
    bs_status st = BS_OK;

    /* The decision at which the parent branched off carries the parent's bars on. */
    for (uint32_t i = 0; at == parent.kept && st == BS_OK && i < parent.bar_count; i++)
        st = add_bar(k, k->bars[parent.first_bar + i]);
    if (st == BS_OK)
        st = add_bar(k, step_of(k, d.way));
    child.bar_count = (uint32_t)k->bar_count - child.first_bar;
    return st == BS_OK ? add_problem(k, child) : st;
}

static bs_status partition(bs_kbest *k, uint32_t index)
{
    uint32_t first = k->problems[index].first_decision, count = k->problems[index].decision_count;
    bs_status st = BS_OK;

    for (uint32_t at = k->problems[index].kept; st == BS_OK && at < count; at++) {
        decision d = k->decisions[first + at];

        if (has_another(k, d.mol, d.way))
            st = branch(k, index, at);
    }
    return st;
}

/* ---- Answers --------------------------------------------------------------------------------- */

/*
 * Orders the ways of an answer so that precursors come first, and works its cost out again from
 * below. `*legal` is false if the choices run in a circle.
 */
static bs_status order_ways(bs_kbest *k, const problem *p, bool *legal, bs_kbest_route *route)
{
    const decision *d = &k->decisions[p->first_decision];
    double *value = k->work.value;
    uint32_t left = 0, placed = 0;
    bs_status st = bs_graph__reserve(k->cx, &k->ways, &k->ways_room, (size_t)p->decision_count + 1,
                                     sizeof *k->ways);

    if (st != BS_OK)
        return st;
    for (uint32_t i = 0; i < p->decision_count; i++) {
        bool bought = d[i].way == BS_GRAPH_BUY;

        value[d[i].mol] = bought ? k->ring.graph.mols[d[i].mol].price : INFINITY;
        left += !bought;
    }
    for (bool moved = true; moved && placed < left;) {
        moved = false;
        for (uint32_t i = p->decision_count; i-- > 0;) {
            double cost;

            if (d[i].way == BS_GRAPH_BUY || isfinite(value[d[i].mol]))
                continue;
            cost = bs_graph__way_cost(&k->ring.graph, d[i].way, k->mode, value);
            if (!isfinite(cost))
                continue;
            value[d[i].mol] = cost;
            k->ways[placed++] = k->ring.origin[d[i].way];
            moved = true;
        }
    }
    *legal = placed == left;
    *route = (bs_kbest_route){value[k->ring.target], k->ways, placed};
    return BS_OK;
}

/* ---- Rings ----------------------------------------------------------------------------------- */

static void drop_ring(bs_kbest *k)
{
    bs_gate_free(k->cx->gate, k->seen, k->seen_room * sizeof *k->seen);
    k->seen = NULL;
    k->seen_room = 0;
    bs_lazy__free(&k->lazy);
    bs_cheapest__free(&k->work);
    bs_ring__free(&k->ring);
    k->problem_count = k->bar_count = k->decision_count = k->heap.count = 0;
}

/* Cuts a ring of k->ring_ways ways, and begins anew in it. */
static bs_status enter_ring(bs_kbest *k)
{
    bs_status st;

    drop_ring(k);
    if ((st = bs_ring__build(&k->ring, &k->part, k->ring_ways)) != BS_OK ||
        (st = bs_cheapest__init(&k->work, &k->ring.graph, k->mode)) != BS_OK ||
        (st = bs_cheapest__run(&k->work, NULL, BS_GRAPH_NONE)) != BS_OK ||
        (st = bs_lazy__init(&k->lazy, &k->work)) != BS_OK ||
        (st = bs_graph__reserve(k->cx, &k->seen, &k->seen_room, k->ring.graph.mol_count,
                                sizeof *k->seen)) != BS_OK)
        return st;
    memset(k->seen, 0, k->seen_room * sizeof *k->seen);
    k->walk = 0;
    k->solid = k->work.converged;
    return add_problem(k, (problem){.parent = BS_GRAPH_NONE, .bar_mol = BS_GRAPH_NONE});
}

/* Whether nothing is left in the ring that could be a route up to its bound. */
static bool ring_is_done(const bs_kbest *k)
{
    return k->heap.count == 0 || k->heap.entries[0].key > bs_part__slack(&k->part, k->ring.bound);
}

/* Goes on in a larger ring; what costs no more than the bound of this one was given. */
static bs_status grow_ring(bs_kbest *k)
{
    k->given = k->ring.bound;
    k->ring_ways =
        k->ring_ways > UINT32_MAX / RING_GROWTH ? UINT32_MAX : k->ring_ways * RING_GROWTH;
    return enter_ring(k);
}

/* Takes the first problem off: solves it, or makes a route of its answer. */
static bs_status take_first(bs_kbest *k, bool *found, bs_kbest_route *route)
{
    uint32_t item = bs_heap__pop(&k->heap).item;
    bool legal;
    bs_status st;

    if (item & UNSOLVED)
        return solve(k, item & ~UNSOLVED);
    if ((st = partition(k, item)) == BS_OK)
        st = order_ways(k, &k->problems[item], &legal, route);
    *found = st == BS_OK && legal && route->cost > k->given && route->cost <= k->ring.bound;
    return st;
}

bs_status bs_kbest__next(bs_kbest *k, bool *found, bs_kbest_route *route)
{
    bs_status st = BS_OK;

    *found = false;
    while (st == BS_OK && !*found && !k->cut && k->part.reachable) {
        if (ring_is_done(k)) {
            if (isinf(k->ring.bound))
                break;
            st = grow_ring(k);
        } else if (atomic_load(k->cx->stop) || k->work_left == 0 ||
                   (k->limited && k->solves <= 0 && (k->heap.entries[0].item & UNSOLVED))) {
            k->cut = true;
        } else {
            st = take_first(k, found, route);
        }
    }
    return st;
}

bool bs_kbest__cut(const bs_kbest *k)
{
    return k->cut;
}

/* ---- Life -------------------------------------------------------------------------------------
 */

bs_status bs_kbest__new(const bs_graph *graph, bs_cost_mode mode, uint32_t target,
                        const bs_kbest_limits *limits, bs_kbest **out)
{
    bs_ctx *cx = graph->cx;
    bs_kbest *k = bs_gate_alloc(cx->gate, sizeof *k);
    bs_status st;

    *out = NULL;
    if (!k)
        return bs_fail_memory(cx);
    k->cx = cx;
    k->mode = mode;
    k->solves = limits ? limits->solves : 0;
    k->limited = k->solves > 0;
    k->ring_ways = limits && limits->first_ring > 0 ? limits->first_ring : FIRST_RING;
    k->work_left = MOST_WORK;
    k->given = -INFINITY;
    st = bs_part__init(&k->part, graph, mode, target);
    if (st == BS_OK && k->part.reachable)
        st = enter_ring(k);
    if (st != BS_OK)
        bs_kbest__free(k);
    else
        *out = k;
    return st;
}

void bs_kbest__free(bs_kbest *k)
{
    bs_gate *gate;

    if (!k)
        return;
    gate = k->cx->gate;
    drop_ring(k);
    bs_part__free(&k->part);
    bs_gate_free(gate, k->problems, k->problem_room * sizeof *k->problems);
    bs_gate_free(gate, k->bars, k->bar_room * sizeof *k->bars);
    bs_gate_free(gate, k->decisions, k->decision_room * sizeof *k->decisions);
    bs_heap__free(&k->heap, k->cx);
    bs_gate_free(gate, k->ways, k->ways_room * sizeof *k->ways);
    bs_gate_free(gate, k, sizeof *k);
}
