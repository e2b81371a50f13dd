/* Which molecules to expand next. */
#ifndef SEARCH_FRONTIER_H
#define SEARCH_FRONTIER_H

#include "search/explore.h"

/* What a look at the frontier found. Lists lie in the arena that was given. */
typedef struct bs_frontier {
    uint32_t *picked; /* molecules to expand, at most a batch */
    int picked_count;
    uint32_t open;     /* molecules that could be expanded and matter */
    uint32_t too_deep; /* molecules that matter and are left alone for their depth */
    double cheapest;   /* cost of the cheapest route found so far, or INFINITY */
} bs_frontier;

/*
 * Finds the depth of each molecule and picks the next batch. An open molecule is judged by the
 * cheapest route through it: known costs, guesses for what is open, and for the way from the
 * target down to it the cheapest one. The bottom-up half is bs_cheapest__run(), the top-down half
 * a Dijkstra search over the same ways; it carries the moles that the target needs along the best
 * way, and is exact where no molecule is needed twice. Ties go to the molecule met first.
 */
bs_status bs_frontier__look(bs_explore *x, bs_arena *home, bs_frontier *out);

/*
 * A lower bound for the cost of every route that uses a step not yet found: what is open counts
 * as the cheapest step could make it.
 */
bs_status bs_frontier__bound(bs_explore *x, double *bound);

#endif
