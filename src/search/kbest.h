/*
 * Routes of a hypergraph in the order of their cost, one after the other, exactly.
 *
 * A route decides one way (a step, or buying) for the target and for every molecule that a chosen
 * step needs. The cheapest route is found by bs_cheapest__run(). The others differ from it in some
 * first decision: for each of its decisions there is one smaller problem, in which the decisions
 * before are kept and this one is barred. This is Lawler's partition (Manage. Sci. 1972, 18, 401)
 * as used for the K shortest hyperpaths by Nielsen, Andersen & Pretolani (Comput. Oper. Res. 2005,
 * 32, 1477). No route is given twice and none is left out.
 *
 * Problems are solved in a ring of the graph (part.h) that holds all routes up to some cost, and
 * by looking only at what a bar changes (lazy.h); a larger ring follows when one is used up.
 *
 * Where costs are not superior, the answer of a problem may be a circle. It is no route; it is
 * partitioned like one, and its cost is a lower bound for all routes of its problem, so the order
 * stays exact.
 */
#ifndef SEARCH_KBEST_H
#define SEARCH_KBEST_H

#include "search/graph.h"

/* A route: the chosen ways, those of precursors first, ascending otherwise. */
typedef struct bs_kbest_route {
    double cost;
    const uint32_t *ways; /* valid until the next call */
    uint32_t count;
} bs_kbest_route;

typedef struct bs_kbest bs_kbest;

/* Zeros are defaults. */
typedef struct bs_kbest_limits {
    long solves;         /* problems that may be solved; by default the work on them is bounded */
    uint32_t first_ring; /* ways of the first ring */
} bs_kbest_limits;

/* Prepares the enumeration; `limits` may be NULL. The graph must not change while it lasts. */
bs_status bs_kbest__new(const bs_graph *graph, bs_cost_mode mode, uint32_t target,
                        const bs_kbest_limits *limits, bs_kbest **out);
void bs_kbest__free(bs_kbest *kbest);

/* The next route; `found` is false when there is none left, or when bs_kbest__cut() is true. */
bs_status bs_kbest__next(bs_kbest *kbest, bool *found, bs_kbest_route *route);

/* Whether the enumeration ended early: out of work, or stopped. */
bool bs_kbest__cut(const bs_kbest *kbest);

#endif
