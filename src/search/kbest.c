/* The enumeration of kbest.h: a heap of problems, each solved when it comes to the top. */
#include "search/kbest.h"

#include "search/cheapest.h"

#include <math.h>
#include <string.h>

/* By default so many problems are solved that about this many ways and uses are looked at. */
#define DEFAULT_WORK 1e9
#define LEAST_SOLVES 1000.0
#define MOST_SOLVES 1e6

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
} problem;

struct bs_kbest {
    bs_ctx *cx;
    bs_graph part;     /* what the target can be made from, and nothing else */
    uint32_t *origin;  /* by way of `part`: the way of the caller's graph */
    uint32_t target;   /* in `part`; BS_GRAPH_NONE if it cannot be had */
    bs_cost_mode mode;
    bs_cheapest work;
    problem *problems;
    uint32_t *bars; /* steps or BS_GRAPH_BUY */
    decision *decisions;
    bs_heap heap; /* of problems */
    uint32_t *seen; /* by molecule: the last walk that met it */
    uint32_t *ways; /* of the route given last */
    uint32_t walk;
    size_t problem_count, bar_count, decision_count;
    size_t problem_room, bar_room, decision_room, ways_room, origin_room, seen_room;
    long solves;
    bool cut;
};

/* ---- The part of the graph that matters -------------------------------------------------- */

static bool way_is_possible(const bs_graph *graph, const bs_cheapest *all, const bs_graph_way *way)
{
    for (uint32_t use = way->first; use < way->first + way->count; use++) {
        uint32_t mol = graph->uses[use].mol;

        if (mol == way->product || !isfinite(all->value[mol]))
            return false;
    }
    return true;
}

/* Numbers the molecules that possible ways reach from the target, breadth first. */
static bs_status number_part(bs_kbest *k, const bs_graph *graph, const bs_cheapest *all,
                             uint32_t target, uint32_t *number, uint32_t *order)
{
    uint32_t at = 0;
    bs_status st;

    order[0] = target;
    if ((st = bs_graph__add_mol(&k->part, graph->mols[target].price, &number[target])) != BS_OK)
        return st;
    for (; at < k->part.mol_count; at++) {
        const bs_graph_mol *mol = &graph->mols[order[at]];

        for (uint32_t w = mol->first_way; w != BS_GRAPH_NONE; w = graph->ways[w].next) {
            const bs_graph_way *way = &graph->ways[w];

            if (!way_is_possible(graph, all, way))
                continue;
            for (uint32_t use = way->first; use < way->first + way->count; use++) {
                uint32_t need = graph->uses[use].mol;

                if (number[need] != BS_GRAPH_NONE)
                    continue;
                order[k->part.mol_count] = need;
                st = bs_graph__add_mol(&k->part, graph->mols[need].price, &number[need]);
                if (st != BS_OK)
                    return st;
            }
        }
    }
    return BS_OK;
}

/* Copies one way into the part, under the step number that its step has there. */
static bs_status copy_way(bs_kbest *k, const bs_graph *graph, uint32_t w, const uint32_t *number,
                          uint32_t *step_number)
{
    const bs_graph_way *way = &graph->ways[w];
    bs_mark mark = bs_arena_mark(&k->cx->scratch);
    bs_graph_part *parts;
    uint32_t made;
    bs_status st;

    if ((st = bs_new(k->cx, &k->cx->scratch, way->count, &parts)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < way->count; i++) {
        const bs_graph_use *use = &graph->uses[way->first + i];

        parts[i] = (bs_graph_part){number[use->mol], use->equivalents};
    }
    st = bs_graph__reserve(k->cx, &k->origin, &k->origin_room, (size_t)k->part.way_count + 1,
                           sizeof *k->origin);
    if (st == BS_OK)
        st = bs_graph__add_way(&k->part, number[way->product], step_number[way->step], parts,
                               way->count, way->cost, way->yield, 0, &made);
    if (st == BS_OK) {
        k->origin[made] = w;
        step_number[way->step] = k->part.ways[made].step;
    }
    bs_arena_rewind(&k->cx->scratch, mark);
    return st;
}

static bs_status copy_ways(bs_kbest *k, const bs_graph *graph, const bs_cheapest *all,
                           const uint32_t *number)
{
    bs_mark mark = bs_arena_mark(&k->cx->scratch);
    uint32_t *step_number;
    bs_status st = bs_new(k->cx, &k->cx->scratch, (size_t)graph->step_count + 1, &step_number);

    if (st != BS_OK)
        return st;
    for (uint32_t i = 0; i < graph->step_count; i++)
        step_number[i] = BS_GRAPH_NONE;
    for (uint32_t w = 0; st == BS_OK && w < graph->way_count; w++) {
        if (number[graph->ways[w].product] != BS_GRAPH_NONE &&
            way_is_possible(graph, all, &graph->ways[w]))
            st = copy_way(k, graph, w, number, step_number);
    }
    bs_arena_rewind(&k->cx->scratch, mark);
    return st;
}

/* Builds `part`: in a large graph few molecules can be had, and only they are solved again. */
static bs_status take_part(bs_kbest *k, const bs_graph *graph, uint32_t target)
{
    bs_mark mark = bs_arena_mark(&k->cx->scratch);
    bs_cheapest all;
    uint32_t *number, *order;
    bs_status st = bs_cheapest__init(&all, graph, k->mode);

    if (st != BS_OK)
        return st;
    st = bs_cheapest__run(&all, NULL, BS_GRAPH_NONE);
    if (st != BS_OK || !isfinite(all.value[target]))
        goto done;
    if ((st = bs_new(k->cx, &k->cx->scratch, graph->mol_count, &number)) != BS_OK ||
        (st = bs_new(k->cx, &k->cx->scratch, graph->mol_count, &order)) != BS_OK)
        goto done;
    for (uint32_t i = 0; i < graph->mol_count; i++)
        number[i] = BS_GRAPH_NONE;
    if ((st = number_part(k, graph, &all, target, number, order)) == BS_OK)
        st = copy_ways(k, graph, &all, number);
    if (st == BS_OK)
        k->target = number[target];
done:
    bs_cheapest__free(&all);
    bs_arena_rewind(&k->cx->scratch, mark);
    return st;
}

/* ---- Problems -------------------------------------------------------------------------------- */

/* Puts a problem into the heap: lower bound first, the older first among equals. */
static bs_status push(bs_kbest *k, uint32_t index)
{
    return bs_heap__push(&k->heap, k->cx, k->problems[index].bound, index);
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

static uint32_t step_of(const bs_kbest *k, uint32_t way)
{
    return way == BS_GRAPH_BUY ? BS_GRAPH_BUY : k->part.ways[way].step;
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

static bs_status add_decision(bs_kbest *k, uint32_t mol)
{
    bs_status st;

    if (k->seen[mol] == k->walk)
        return BS_OK;
    k->seen[mol] = k->walk;
    st = bs_graph__reserve(k->cx, &k->decisions, &k->decision_room, k->decision_count + 1,
                           sizeof *k->decisions);
    if (st == BS_OK)
        k->decisions[k->decision_count++] = (decision){mol, k->work.choice[mol]};
    return st;
}

/*
 * Writes the decisions of the answer, breadth first from the target, so that the molecule of each
 * decision follows from the decisions before it.
 */
static bs_status write_decisions(bs_kbest *k, problem *p)
{
    bs_status st;

    k->walk++;
    p->first_decision = (uint32_t)k->decision_count;
    st = add_decision(k, k->target);
    for (size_t at = p->first_decision; st == BS_OK && at < k->decision_count; at++) {
        uint32_t way = k->decisions[at].way;
        const bs_graph_way *w;

        if (way == BS_GRAPH_BUY)
            continue;
        w = &k->part.ways[way];
        for (uint32_t i = 0; st == BS_OK && i < w->count; i++)
            st = add_decision(k, k->part.uses[w->first + i].mol);
    }
    p->decision_count = (uint32_t)(k->decision_count - p->first_decision);
    return st;
}

/* Solves a problem and puts it back into the heap, unless it has no answer. */
static bs_status solve(bs_kbest *k, uint32_t index)
{
    problem *p = &k->problems[index];
    bs_status st;

    k->solves--;
    set_bars(k, p, true);
    st = bs_cheapest__run(&k->work, NULL, k->target);
    set_bars(k, p, false);
    if (st != BS_OK)
        return st;
    if (!k->work.converged)
        k->cut = true;
    if (!isfinite(k->work.value[k->target]))
        return BS_OK;
    if ((st = write_decisions(k, p)) != BS_OK)
        return st;
    p->solved = true;
    if (k->work.value[k->target] > p->bound)
        p->bound = k->work.value[k->target];
    return push(k, index);
}

/* ---- Partition ------------------------------------------------------------------------------ */

/* Whether a molecule has a way besides those barred: worth a problem of its own. */
static bool has_another(const bs_kbest *k, uint32_t mol, uint32_t chosen)
{
    const bs_graph_mol *m = &k->part.mols[mol];
    uint32_t step = step_of(k, chosen);

    if (step != BS_GRAPH_BUY && isfinite(m->price))
        return true;
    for (uint32_t w = m->first_way; w != BS_GRAPH_NONE; w = k->part.ways[w].next) {
        if (k->part.ways[w].step != step)
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

        value[d[i].mol] = bought ? k->part.mols[d[i].mol].price : INFINITY;
        left += !bought;
    }
    for (bool moved = true; moved && placed < left;) {
        moved = false;
        for (uint32_t i = p->decision_count; i-- > 0;) {
            double cost;

            if (d[i].way == BS_GRAPH_BUY || isfinite(value[d[i].mol]))
                continue;
            cost = bs_graph__way_cost(&k->part, d[i].way, k->mode, value);
            if (!isfinite(cost))
                continue;
            value[d[i].mol] = cost;
            k->ways[placed++] = k->origin[d[i].way];
            moved = true;
        }
    }
    *legal = placed == left;
    *route = (bs_kbest_route){value[k->target], k->ways, placed};
    return BS_OK;
}

bs_status bs_kbest__next(bs_kbest *k, bool *found, bs_kbest_route *route)
{
    bs_status st = BS_OK;

    *found = false;
    while (st == BS_OK && k->heap.count > 0 && !k->cut) {
        uint32_t index;

        index = k->heap.entries[0].item;
        if (atomic_load(k->cx->stop) || (k->solves <= 0 && !k->problems[index].solved)) {
            k->cut = true;
            break;
        }
        bs_heap__pop(&k->heap);
        if (!k->problems[index].solved) {
            st = solve(k, index);
            continue;
        }
        if ((st = partition(k, index)) == BS_OK)
            st = order_ways(k, &k->problems[index], found, route);
        if (*found)
            break;
    }
    return st;
}

bool bs_kbest__cut(const bs_kbest *k)
{
    return k->cut;
}

/* ---- Life ------------------------------------------------------------------------------------- */

static long default_solves(const bs_graph *part)
{
    double size = 100.0 + part->mol_count + part->way_count + part->use_count;

    return (long)fmin(MOST_SOLVES, fmax(LEAST_SOLVES, DEFAULT_WORK / size));
}

static bs_status prepare(bs_kbest *k, const bs_graph *graph, uint32_t target)
{
    bs_status st = take_part(k, graph, target);

    if (st != BS_OK || k->target == BS_GRAPH_NONE)
        return st;
    if (k->solves <= 0)
        k->solves = default_solves(&k->part);
    if ((st = bs_cheapest__init(&k->work, &k->part, k->mode)) != BS_OK)
        return st;
    st = bs_graph__reserve(k->cx, &k->seen, &k->seen_room, k->part.mol_count, sizeof *k->seen);
    if (st != BS_OK)
        return st;
    memset(k->seen, 0, k->seen_room * sizeof *k->seen);
    return add_problem(k, (problem){.parent = BS_GRAPH_NONE, .bar_mol = BS_GRAPH_NONE});
}

bs_status bs_kbest__new(const bs_graph *graph, bs_cost_mode mode, uint32_t target, long solves,
                        bs_kbest **out)
{
    bs_ctx *cx = graph->cx;
    bs_kbest *k = bs_gate_alloc(cx->gate, sizeof *k);
    bs_status st;

    *out = NULL;
    if (!k)
        return bs_fail_memory(cx);
    k->cx = cx;
    k->mode = mode;
    k->target = BS_GRAPH_NONE;
    k->solves = solves;
    bs_graph__init(&k->part, cx);
    if ((st = prepare(k, graph, target)) != BS_OK)
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
    bs_cheapest__free(&k->work);
    bs_graph__free(&k->part);
    bs_gate_free(gate, k->origin, k->origin_room * sizeof *k->origin);
    bs_gate_free(gate, k->problems, k->problem_room * sizeof *k->problems);
    bs_gate_free(gate, k->bars, k->bar_room * sizeof *k->bars);
    bs_gate_free(gate, k->decisions, k->decision_room * sizeof *k->decisions);
    bs_heap__free(&k->heap, k->cx);
    bs_gate_free(gate, k->seen, k->seen_room * sizeof *k->seen);
    bs_gate_free(gate, k->ways, k->ways_room * sizeof *k->ways);
    bs_gate_free(gate, k, sizeof *k);
}
