/*
 * The part of a hypergraph that cheap routes can touch.
 *
 * The cheapest values give, for each way, a cost below which no route that uses it can be: the
 * cheapest way down from the target to the molecule it makes, with everything beside that way as
 * cheap as it can be. Routes up to some cost need only the ways whose bound is not above it. Such
 * a ring of ways is small even in a graph of a million steps, and what is solved in it is exact
 * for the whole.
 *
 * Where costs are not superior, a way may need less than a mole of a molecule for a mole of
 * product, and the moles that reach a molecule may be few; they are bounded from below, by 0 if a
 * circle makes them ever fewer, and the bounds get weaker, not wrong.
 */
#ifndef SEARCH_PART_H
#define SEARCH_PART_H

#include "search/graph.h"

typedef struct bs_part {
    const bs_graph *graph; /* whole */
    bs_cost_mode mode;
    uint32_t target;
    bool reachable; /* the target can be had */
    double *value;  /* by molecule: the cheapest value */
    double *least;  /* by way: no route with it costs less; INFINITY if none can use it */
    double *sorted; /* the finite ones of these in order */
    uint32_t count; /* of `sorted` */
    double unit;    /* the smallest number that costs are made of: the measure of rounding */
} bs_part;

/* A ring: a graph of its own with the same costs. */
typedef struct bs_ring {
    bs_graph graph;
    uint32_t *origin; /* by way: the way of the whole graph */
    size_t origin_room;
    uint32_t target;
    double bound; /* every route of the whole up to this cost is here; INFINITY: it holds all */
} bs_ring;

/* Works the bounds out: O((ways + uses) log molecules) where costs are superior. */
bs_status bs_part__init(bs_part *part, const bs_graph *graph, bs_cost_mode mode, uint32_t target);
void bs_part__free(bs_part *part);

/* `cost` with what rounding may add to it. */
double bs_part__slack(const bs_part *part, double cost);

/* Builds the ring of at least `ways` ways, if there are so many. Free it even on failure. */
bs_status bs_ring__build(bs_ring *ring, const bs_part *part, uint32_t ways);
void bs_ring__free(bs_ring *ring);

#endif
