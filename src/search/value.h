/*
 * Cheapest values of a hypergraph that grows, kept up to date.
 *
 * A change is spread only to molecules whose value changes: the algorithm of G. Ramalingam and
 * T. Reps (J. Algorithms 1996, 21, 267) for the grammar problem, of which Knuth's is the special
 * case without a past. It needs costs that are strictly superior, or a circle that costs nothing
 * would hold itself up after its support is gone. So a molecule that is made counts at least the
 * next number above each of its precursors, which is less than any price can tell. Where a way
 * needs less than a mole of a precursor for a mole of product, this is too dear; the values then
 * serve to find an order of exploration, and not as an answer.
 */
#ifndef SEARCH_VALUE_H
#define SEARCH_VALUE_H

#include "search/graph.h"
#include "search/heap.h"

typedef struct bs_value {
    double value;    /* as told to the ways that use the molecule */
    double now;      /* as its ways and leaf give it; the same when all is settled */
    double leaf;     /* cost without any way, or INFINITY */
    uint32_t choice; /* a way, BS_GRAPH_BUY for the leaf, or BS_GRAPH_NONE */
} bs_value;

typedef struct bs_values {
    const bs_graph *graph;
    bs_cost_mode mode;
    bool counts;     /* the cost of a way is the sum of its precursors: numbers of leaves */
    bs_value *items; /* by molecule */
    size_t room;
    uint32_t mols, ways; /* of the graph taken in so far */
    bs_heap heap;
    uint64_t spread; /* molecules told to their ways, ever */
} bs_values;

void bs_values__init(bs_values *values, const bs_graph *graph, bs_cost_mode mode, bool counts);
void bs_values__free(bs_values *values);

/* Takes in molecules added to the graph, each with its price as leaf, and then ways. */
bs_status bs_values__grow(bs_values *values);

/* Changes a leaf. */
bs_status bs_values__set_leaf(bs_values *values, uint32_t mol, double leaf);

/* Spreads what changed. Values are right after it. */
bs_status bs_values__settle(bs_values *values);

/* What a way costs by the values; INFINITY if a precursor cannot be had. */
double bs_values__cost(const bs_values *values, uint32_t way);

#endif
