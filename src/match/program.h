/*
 * Compiled patterns.
 *
 * A pattern is a list of parts: part 0 is the query itself, the others are its recursive parts at
 * every depth. A part has a move for each of its atoms, in the order in which they are placed:
 * the first on any atom of the molecule, the others over a bond from an atom placed before.
 *
 * An atom expression is a graph of nodes, each with two ways on, for yes and no, so that nothing
 * is asked twice and no stack is needed. Most tests compare fields of the 16 bytes of `bs_atom`;
 * one node compares several of them at once, as two masked words.
 */
#ifndef MATCH_PROGRAM_H
#define MATCH_PROGRAM_H

#include "chem/features.h"
#include "match/query.h"

typedef enum bs_node_kind {
    BS_NODE_FIELDS,
    BS_NODE_CONNECTIONS, /* X */
    BS_NODE_IMPLICIT_H,  /* h; -1: some */
    BS_NODE_HYBRID,
    BS_NODE_RECURSE, /* argument: part */
    BS_NODE_CHIRAL
} bs_node_kind;

enum { BS_NODE_YES = -1, BS_NODE_NO = -2 };

typedef struct bs_node {
    uint64_t mask[2], value[2];
    int32_t yes, no; /* next node, BS_NODE_YES or BS_NODE_NO */
    int16_t argument;
    uint8_t kind;
} bs_node;

/* A bond to an atom placed before, other than the one over which a move goes. */
typedef struct bs_closure {
    int32_t move; /* that placed the other atom */
    uint32_t sorts;
} bs_closure;

/*
 * The beginning of an atom's tests: a comparison of fields by which most atoms are refused (one
 * that is always met where the expression begins with something else), and the node that follows.
 */
typedef struct bs_opening {
    uint64_t mask[2], value[2];
    int32_t rest;
} bs_opening;

typedef struct bs_move {
    bs_opening opening;
    int32_t atom;   /* of the query */
    int32_t from;   /* move that placed the atom before, -1 for the first of a component */
    uint32_t sorts; /* of bond, see bs_query_bond_mask() */
    int32_t closure_first, closure_count;
    int32_t group; /* component-level group, 0 for none */
    uint8_t min_degree, min_ring_bonds;
} bs_move;

/* An order of the atoms of a part. */
typedef struct bs_order {
    bs_move *moves;
    bs_closure *closures;
    int32_t *place; /* move of each atom */
    int count;
} bs_order;

/* An atom whose expression has a chirality test; asked again when all atoms are placed. */
typedef struct bs_centre {
    int32_t atom;
    int32_t entry;
    int32_t around[4]; /* atoms in the order of the text, -1 for the one not written */
    int32_t around_count;
} bs_centre;

/*
 * A double bond, or a chain of an odd number of them, with directions at both ends. The molecule
 * keeps the geometry on the middle bond. All are atoms of the query.
 */
typedef struct bs_turn {
    int32_t middle[2];
    int32_t end[2];
    int32_t before[2]; /* neighbour of the end in the chain */
    int32_t beside[2]; /* neighbour of the end that has the direction */
    bool cis;
    bool or_unspecified;
} bs_turn;

/* What the graph of a query demands, by itself. */
typedef struct bs_shape {
    uint8_t *degree;     /* of each atom: it has so many neighbours at least */
    uint8_t *ring_bonds; /* of each atom: it has so many bonds in rings at least */
    bool *cyclic;        /* of each bond: it lies in a ring */
} bs_shape;

typedef struct bs_part {
    const bs_query *query;
    bs_shape shape;
    bs_order order;
    int32_t *entries; /* of each atom, chirality left out */
    bs_opening *openings;
    int32_t *rarity; /* of each atom: how many a usual molecule has, scaled */
    uint32_t *sorts; /* of each bond */
    bs_centre *centres;
    bs_turn *turns;
    int centre_count, turn_count;
    int slot; /* where its places begin in the slots of a search */
    bool grouped;
} bs_part;

struct bs_pattern {
    const bs_query *query;
    const char *text;
    bs_part *parts;
    bs_node *nodes;
    int part_count, node_count;
    int slot_count;
    int min_atoms, min_bonds, min_rings;
    bool grouped;
    bs_features needs;
};

/* Finds the demands of a query's graph; the arrays lie in `home`. O(atoms + bonds). */
bs_status bs_shape__find(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_shape *out);

/* What a pattern demands of a molecule, and how rare each atom of a query is. */
bs_status bs_screen__needs(bs_ctx *cx, const bs_query *query, bs_features *needs);
bs_status bs_screen__rarity(bs_ctx *cx, const bs_query *query, const bs_shape *shape,
                            int32_t *rarity);

/* The sorts of bond (see bs_query_bond_mask()) that lie in a ring. */
#define BS_SORTS_IN_RINGS 0xFFFF0000u

/* The nodes of a pattern while they are made, in scratch. */
typedef struct bs_nodes {
    bs_ctx *cx;
    bs_node *items;
    int count, room;
} bs_nodes;

/* Compiles an expression; `parts` tells the part of each recursive part. */
bs_status bs_nodes__add(bs_nodes *nodes, const bs_query_expr *expr, const int *parts,
                        int32_t *entry);

/*
 * Finds an order of the atoms that starts at `root`, or at the rarest atom for -1, and goes on
 * along bonds to the atom with the most bonds to those placed, then the rarest, then the first.
 */
bs_status bs_order__find(bs_ctx *cx, bs_arena *home, const bs_part *part, int root, bs_order *out);

#endif
