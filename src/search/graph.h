/*
 * The kernel of the search: a directed hypergraph of numbered molecules and steps, without any
 * chemistry.
 *
 * A step makes one molecule from several and has one or more ways to run it. Ways differ in
 * equivalents, cost and yield; which of them is the cheapest depends on what the precursors cost,
 * so each way is an arc of its own. Everything is numbered from 0 in the order of adding, and
 * nothing is removed.
 */
#ifndef SEARCH_GRAPH_H
#define SEARCH_GRAPH_H

#include "backsaw/route.h"

#define BS_GRAPH_NONE UINT32_MAX
#define BS_GRAPH_BUY (UINT32_MAX - 1) /* in place of a way: the molecule is bought */
#define BS_GRAPH_MOST (UINT32_MAX - 2)

typedef struct bs_graph_mol {
    double price; /* INFINITY if it cannot be bought */
    uint32_t first_way, last_way; /* ways that make it, linked by bs_graph_way.next */
    uint32_t first_use, last_use; /* its places among precursors, linked by bs_graph_use.next */
} bs_graph_mol;

typedef struct bs_graph_way {
    uint32_t product;
    uint32_t step;
    uint32_t first; /* of `count` uses */
    uint32_t count;
    double cost;
    double yield; /* fraction */
    uint32_t next;
    uint32_t tag; /* the owner's business */
} bs_graph_way;

typedef struct bs_graph_use {
    double equivalents;
    uint32_t mol;
    uint32_t way;
    uint32_t next;
} bs_graph_use;

typedef struct bs_graph {
    bs_ctx *cx;
    bs_graph_mol *mols;
    bs_graph_way *ways;
    bs_graph_use *uses;
    uint32_t mol_count, way_count, use_count, step_count;
    size_t mol_room, way_room, use_room;
    bool superior; /* per mole: no use has fewer equivalents than its way's yield */
} bs_graph;

/* One precursor of a way that is added. */
typedef struct bs_graph_part {
    uint32_t mol;
    double equivalents;
} bs_graph_part;

/* Makes an empty graph; its memory comes from the gate of `cx`. */
void bs_graph__init(bs_graph *graph, bs_ctx *cx);
void bs_graph__free(bs_graph *graph);

/* Adds a molecule; `price` is 0 or more, or INFINITY. */
bs_status bs_graph__add_mol(bs_graph *graph, double price, uint32_t *mol);

/*
 * Adds a way to make `product`. `step` is BS_GRAPH_NONE for a new step, which gets the next
 * number, or a step of the same product and precursors. Precursors must differ. A way that
 * needs its own product is kept, though no route can use it.
 *
 *   errors  BS_EVALUE  cost below 0, equivalents or yield not above 0, a number that is not
 *                      finite; BS_ELIMIT, BS_ENOMEM. The graph is as before.
 */
bs_status bs_graph__add_way(bs_graph *graph, uint32_t product, uint32_t step,
                            const bs_graph_part *parts, uint32_t count, double cost, double yield,
                            uint32_t tag, uint32_t *way);

/* Makes room for `needed` elements of `size` bytes in a block of the gate, doubling it. */
bs_status bs_graph__reserve(bs_ctx *cx, void *block, size_t *room, size_t needed, size_t size);

/* Whether every cost of the graph grows with the costs below it and is not less than them. */
bool bs_graph__is_superior(const bs_graph *graph, bs_cost_mode mode);

/* What a way costs if its precursors cost `value[mol]` each. */
double bs_graph__way_cost(const bs_graph *graph, uint32_t way, bs_cost_mode mode,
                          const double *value);

#endif
