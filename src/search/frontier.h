/*
 * Which molecules to expand next, and the depth of each.
 *
 * What is known of the graph is kept from look to look, and only what changed is worked out anew.
 */
#ifndef SEARCH_FRONTIER_H
#define SEARCH_FRONTIER_H

#include "search/value.h"

typedef struct bs_explore bs_explore;

/* The cheapest way down to a molecule that a look found. */
typedef struct bs_reach {
    double through; /* cost of the cheapest route through the molecule */
    double moles;   /* of it that this route needs for a mole of target */
    uint32_t look;  /* the look that wrote this */
    bool done;
} bs_reach;

typedef struct bs_frontier {
    bs_values had;       /* by what is known */
    bs_values hoped;     /* with guesses for what is open */
    uint32_t mols, ways; /* of the graph taken in so far */
    uint32_t depth;      /* the limit that was taken in */
    uint32_t open;       /* molecules that could be expanded */
    bs_heap urgent;      /* open molecules that come before all others; by depth, all of them */
    bs_reach *reach;     /* by molecule */
    size_t reach_room;
    uint32_t look;
    bs_heap heap, ready; /* of the look at hand */
    uint32_t *picked;    /* the batch: molecules to expand ... */
    size_t picked_room;
    uint32_t picked_count, picked_at; /* ... of which so many are done */
    uint64_t walked;                  /* molecules that looks came by, ever */
    double *disproof; /* by molecule, for proof-number search (proof.h) */
    size_t disproof_room;
} bs_frontier;

/* With `proof`, front->hoped counts the open molecules that must be had. */
void bs_frontier__init(bs_frontier *front, const bs_graph *graph, bs_cost_mode mode, bool proof);
void bs_frontier__free(bs_frontier *front);

/*
 * Picks the next batch. An open molecule is judged by the cheapest route through it: known costs,
 * guesses for what is open, and for the way from the target down to it the cheapest one. The
 * bottom-up half is front->hoped, the top-down half a Dijkstra search over the same ways that
 * ends when it has the batch; it carries the moles that the target needs along the best way, and
 * is exact where no molecule is needed twice. Ties go to the molecule met first. Molecules that
 * the owner calls urgent come before. Other strategies pick by depth, or by proof numbers.
 */
bs_status bs_frontier__look(bs_explore *x);

/*
 * A lower bound for the cost of every route that uses a step not yet found: what is open counts
 * as the cheapest step could make it.
 */
bs_status bs_frontier__bound(bs_explore *x, double *bound);

#endif
