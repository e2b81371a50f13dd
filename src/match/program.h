/*
 * The compiled form of a pattern: what the compiler makes and the matcher runs.
 *
 * An expression becomes a list of tests with two jumps each, so that evaluation stops at the first
 * test that decides. A bond expression becomes a mask with one bit for each state a bond can be
 * in. Atoms are visited in an order in which each one but the first of a connected part hangs on
 * an earlier one; bonds that close a ring are tested when their later end is placed.
 */
#ifndef MATCH_PROGRAM_H
#define MATCH_PROGRAM_H

#include "match/query.h"

#include "chem/mol.h"

enum { BS_CODE_PASS = -1, BS_CODE_FAIL = -2 };

/* A test and where to go from it: the number of a test, or BS_CODE_PASS or BS_CODE_FAIL. */
typedef struct bs_code {
    uint8_t kind;
    int16_t value; /* of BS_TEST_RECURSE: the number of the recursive part in `subs` of the whole */
    int32_t yes, no;
} bs_code;

typedef struct bs_program_expr {
    bs_code *code;
    int entry;
} bs_program_expr;

/* One atom in the order of visits. */
typedef struct bs_visit {
    int atom;
    int parent; /* an earlier pattern atom, or -1 where a connected part begins */
    uint32_t bond_mask;
    int first_closure, closure_count; /* bonds to other earlier atoms */
    int group;                        /* of a component-level parenthesis */
} bs_visit;

typedef struct bs_closure {
    int other; /* pattern atom */
    uint32_t bond_mask;
} bs_closure;

/* A centre whose hand is asked: the whole expression is tested again when all atoms are placed. */
typedef struct bs_hand_check {
    int atom;
    bs_program_expr whole;
} bs_hand_check;

/* Two neighbours of a double bond, on the same side or not. */
typedef struct bs_geometry_check {
    int end_a, end_b, beside_a, beside_b; /* pattern atoms */
    bool cis;
    bool or_none; /* no geometry will do */
} bs_geometry_check;

struct bs_pattern {
    const bs_query *query;
    const char *text;
    int atom_count;
    bs_program_expr *exprs; /* by pattern atom, without chirality */
    uint32_t *bond_masks;   /* by pattern bond */
    bs_visit *visits;
    bs_closure *closures;
    bs_hand_check *hands;
    int hand_count;
    bs_geometry_check *geometries;
    int geometry_count;
    bool has_groups;
    /* All recursive parts at any depth, the same array for the whole and each part. */
    bs_pattern **subs;
    int sub_count;
};

/* The state of a bond, as the bits of bs_query_bond_mask() count them. */
static inline int bs_bond__state(const bs_bond *bond)
{
    return (int)bond->order | (bond->flags & BS_BOND_AROMATIC ? 8 : 0) |
           (bond->flags & BS_BOND_RING ? 16 : 0);
}

#endif
