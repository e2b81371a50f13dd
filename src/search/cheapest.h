/*
 * The cheapest way to have each molecule of a hypergraph.
 *
 * Knuth's generalisation of Dijkstra's algorithm (D. E. Knuth, Inf. Process. Lett. 1977, 6, 1)
 * settles molecules in the order of their cost, which is exact for superior cost functions,
 * cycles included. Where a way needs less than a mole of a precursor for a mole of product, a
 * molecule may become cheaper after it was settled; it is then settled again, until nothing
 * changes. The values are then the infimum over all trees, a lower bound for routes; the choices
 * may run in a circle, which the caller must look for.
 */
#ifndef SEARCH_CHEAPEST_H
#define SEARCH_CHEAPEST_H

#include "search/graph.h"
#include "search/heap.h"

/* Working room and result; made once for a graph that no longer grows, and used again. */
typedef struct bs_cheapest {
    const bs_graph *graph;
    bs_cost_mode mode;
    double *value;     /* by molecule; INFINITY if it cannot be had */
    uint32_t *choice;  /* by molecule: a way, BS_GRAPH_BUY or BS_GRAPH_NONE */
    uint32_t *missing; /* by way: precursors that have no value yet */
    uint32_t *counts;  /* by way: its precursors */
    bool *settled;
    uint32_t *only; /* by molecule: BS_GRAPH_NONE, or the only step or BS_GRAPH_BUY allowed */
    bool *barred;   /* by step */
    bool *no_buy;   /* by molecule */
    bs_heap heap;
    double unit;    /* changes of a small part of it do not count */
    bool converged; /* false if the bound on settling again was hit */
} bs_cheapest;

/* Room for the molecules and ways that `graph` has now; nothing is barred. */
bs_status bs_cheapest__init(bs_cheapest *work, const bs_graph *graph, bs_cost_mode mode);
void bs_cheapest__free(bs_cheapest *work);

/*
 * Fills value and choice under the bars that are set.
 *
 *   leaf    by molecule, a price that stands in for the graph's; or NULL for the graph's own
 *   target  with a superior cost the search ends when this molecule is settled, and others may
 *           then be unknown; BS_GRAPH_NONE settles all
 *   cost    O((ways + uses) log molecules) with a superior cost
 */
bs_status bs_cheapest__run(bs_cheapest *work, const double *leaf, uint32_t target);

/* The smallest number above 0 that costs are made of, or 1: the measure of what is negligible. */
double bs_cheapest__unit(const bs_graph *graph);

#endif
