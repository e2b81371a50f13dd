/*
 * One side of a rewriting: its pattern, what it writes, and its parts.
 *
 * A part is a reactant or a product: a connected piece of the pattern, or a component-level group
 * `(A.B)`, whose pieces lie in one molecule. Parts are numbered in the order of the text.
 */
#ifndef RULE_SIDE_H
#define RULE_SIDE_H

#include "rule/expr.h"

/* In `around`: the hydrogen, the lone pair or the one neighbour that is not written. */
enum { BS_SIDE_REST = -1 };

typedef struct bs_side_atom {
    bs_facts says;
    int map;  /* 0 for none */
    int part; /* and its place in the pattern of the part: */
    int place;
    int around[4]; /* meaningful if says.mark is 1 or 2; as in OpenSMILES */
} bs_side_atom;

typedef struct bs_side_bond {
    int a, b;
    bs_bond_facts says;
    bool in_ring; /* of the side's own graph */
} bs_side_bond;

typedef struct bs_side {
    const bs_query *query;
    bs_side_atom *atoms;
    bs_side_bond *bonds;
    int atom_count, bond_count, part_count;
    int *part_size;
    bs_pattern **patterns; /* one for each part; NULL until compiled */
} bs_side;

/*
 * Works out a side from its query, which must live as long.
 *
 *   errors  BS_EVALUE  a map number stands twice, with the offset
 */
bs_status bs_side__read(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_side *out);

/* Compiles the patterns of the parts, without the tests for @ and @@. */
bs_status bs_side__compile(bs_ctx *cx, bs_arena *home, bs_side *side);

/* The atom with a map number, or -1. */
int bs_side__find(const bs_side *side, int map);

/* The bond between two atoms of the side, or NULL. */
const bs_side_bond *bs_side__bond(const bs_side *side, int a, int b);

#endif
