/*
 * The parsed form of SMARTS, which the matcher compiles and the rewriter edits.
 *
 * A query is a graph of atom and bond expressions. Expressions are trees in post order in one
 * array each: leaf tests, and NOT, AND, OR over them. The rewriter reads it to learn what the
 * product side of a rule writes, builds new queries out of old ones (bs_query_append,
 * bs_query_import, bs_query_join, bs_query_relax) and compiles those.
 *
 * How the text is read where SMARTS leaves a choice: `[H]`, `[2H]`, `[H+]`, `[H:1]` (mass, H,
 * charge and map number only) are a hydrogen atom; everywhere else H counts hydrogens. `D`, `X`,
 * `v`, `H`, `+`, `-` without a number stand for 1; `R`, `r`, `x`, `h` without one for "some".
 * Where a letter pair could be an element or two tests it is the element (`[Sr]`, `[Cr]`), except
 * `[Nh]`, a nitrogen with implicit hydrogens. `@TH1` and `@TH2` are `@` and `@@`.
 */
#ifndef MATCH_QUERY_H
#define MATCH_QUERY_H

#include "backsaw/match.h"

typedef enum bs_test_kind {
    /* logic, in post order */
    BS_TEST_NOT,
    BS_TEST_AND,
    BS_TEST_OR,
    /* atom tests; `value` is the number, or for BS_TEST_RECURSE the index of a sub-query */
    BS_TEST_ANY,
    BS_TEST_ELEMENT,        /* #n */
    BS_TEST_ALIPHATIC_ELEM, /* C */
    BS_TEST_AROMATIC_ELEM,  /* c */
    BS_TEST_ALIPHATIC,      /* A */
    BS_TEST_AROMATIC,       /* a */
    BS_TEST_ISOTOPE,
    BS_TEST_DEGREE,      /* D */
    BS_TEST_HYDROGENS,   /* H, total */
    BS_TEST_IMPLICIT_H,  /* h, those that are no atoms; value -1: at least one */
    BS_TEST_RING_COUNT,  /* R; value -1: in any ring */
    BS_TEST_RING_SIZE,   /* r; value -1: in any ring */
    BS_TEST_VALENCE,     /* v */
    BS_TEST_CONNECTIONS, /* X */
    BS_TEST_RING_BONDS,  /* x; value -1: at least one */
    BS_TEST_CHARGE,
    BS_TEST_HYBRID, /* ^n, an extension */
    BS_TEST_CHIRAL, /* value 1: @, 2: @@; 3 and 4 the same "or unspecified" */
    BS_TEST_RECURSE,
    /* bond tests */
    BS_TEST_BOND_ANY,
    BS_TEST_BOND_SINGLE, /* aliphatic single */
    BS_TEST_BOND_DOUBLE,
    BS_TEST_BOND_TRIPLE,
    BS_TEST_BOND_QUADRUPLE,
    BS_TEST_BOND_AROMATIC,
    BS_TEST_BOND_RING,
    BS_TEST_BOND_UP,     /* '/', implies single; value 1: or unspecified */
    BS_TEST_BOND_DOWN,   /* '\' */
    BS_TEST_BOND_DEFAULT /* nothing written: single or aromatic */
} bs_test_kind;

typedef struct bs_test {
    uint8_t kind;
    int16_t value;
} bs_test;

typedef struct bs_query_expr {
    bs_test *tests; /* post order */
    int count;
} bs_query_expr;

typedef struct bs_query_atom {
    bs_query_expr expr;
    int map;
    int component; /* group of a component-level parenthesis, from 1; 0 for none */
    /*
     * Neighbours in the order of the text, which @ refers to: -1 stands for the H that was
     * written in the bracket, or for the fourth neighbour where only three are written. Only set
     * where the expression has a chirality test.
     */
    int *around;
    int around_count;
    uint32_t offset; /* byte of the text where it starts */
} bs_query_atom;

typedef struct bs_query_bond {
    int a, b; /* the direction of '/' is from a to b */
    bs_query_expr expr;
    uint32_t offset;
} bs_query_bond;

typedef struct bs_query bs_query;

struct bs_query {
    bs_query_atom *atoms;
    bs_query_bond *bonds;
    bs_query **subs; /* recursive parts, index = value of BS_TEST_RECURSE */
    int atom_count, bond_count, sub_count;
    int atom_room, bond_room, sub_room;
    const char *text; /* what it was read from; NULL if it was put together */
};

enum {
    BS_QUERY_MAX_DEPTH = 64,     /* recursion inside recursion */
    BS_QUERY_MAX_ATOMS = 2000,   /* atoms of one query, recursive parts apart */
    BS_QUERY_MAX_TEXT = 1 << 16, /* bytes of SMARTS */
    BS_QUERY_MAX_NUMBER = 999    /* of a test */
};

/* ---- Reading, writing, compiling ------------------------------------------------------- */

/* Parses SMARTS. Errors as bs_pattern_read(); `base` is added to the offsets of errors. */
bs_status bs_query_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length, size_t base,
                        bs_query **out);

/*
 * Writes a query as SMARTS that reads as the same query: same atoms in the same order, same map
 * numbers and groups, same meaning of each expression. Where an expression nests deeper than
 * SMARTS has operators for, a part of it is written as a recursion on one atom.
 */
bs_status bs_query_write(bs_ctx *cx, bs_arena *home, const bs_query *query, char **out);

/* Compiles a query; it is copied as far as needed and may go. Errors as bs_pattern_read(). */
bs_status bs_query_compile(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_pattern **out);

/* The query of a compiled pattern, in the pattern's arena. */
const bs_query *bs_pattern__query(const bs_pattern *pattern);

/*
 * Whether one atom of a molecule passes one atom's expression (recursion included). Chirality
 * needs the neighbours: a chirality test counts as passed.
 */
bs_status bs_pattern__atom_passes(bs_ctx *cx, const bs_pattern *pattern, int atom,
                                  const bs_mol *mol, uint32_t where, bool *passes);

/* Whether one bond of a molecule passes one bond's expression; a direction counts as single. */
bool bs_pattern__bond_passes(const bs_pattern *pattern, int bond, const bs_mol *mol,
                             uint32_t where);

/* ---- Putting queries together ---------------------------------------------------------- */

/* An empty query in `home`. */
bs_status bs_query_new(bs_ctx *cx, bs_arena *home, bs_query **out);

/* A copy that shares nothing with the original but lies in `home`. */
bs_status bs_query_copy(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_query **out);

/*
 * Adds an atom, a bond or a recursive part. Expressions and `around` are taken over as they are
 * and must live as long as the query. *index may be NULL.
 *
 *   home    the arena of the query
 *   errors  BS_ELIMIT above BS_QUERY_MAX_ATOMS
 */
bs_status bs_query_add_atom(bs_ctx *cx, bs_arena *home, bs_query *query, const bs_query_atom *atom,
                            int *index);
bs_status bs_query_add_bond(bs_ctx *cx, bs_arena *home, bs_query *query, const bs_query_bond *bond,
                            int *index);
bs_status bs_query_add_sub(bs_ctx *cx, bs_arena *home, bs_query *query, bs_query *sub, int *index);

/*
 * Appends copies of all atoms, bonds and recursive parts of `from`; *first is the number that its
 * atom 0 got. Groups keep their numbers.
 */
bs_status bs_query_append(bs_ctx *cx, bs_arena *home, bs_query *into, const bs_query *from,
                          int *first);

/* Copies an expression of `from` for use in `into`, with the recursive parts that it needs. */
bs_status bs_query_import(bs_ctx *cx, bs_arena *home, bs_query *into, const bs_query *from,
                          const bs_query_expr *expr, bs_query_expr *out);

/* An expression of one test. */
bs_status bs_query_leaf(bs_ctx *cx, bs_arena *home, bs_test_kind kind, int value,
                        bs_query_expr *out);

/*
 * Joins two expressions of one query by BS_TEST_AND or BS_TEST_OR into a new one. With
 * BS_TEST_NOT the first is negated and `b` is not used.
 */
bs_status bs_query_join(bs_ctx *cx, bs_arena *home, bs_test_kind logic, const bs_query_expr *a,
                        const bs_query_expr *b, bs_query_expr *out);

/* ---- Reading expressions --------------------------------------------------------------- */

/* Whether a test is met with anywhere in the expression. */
bool bs_query_mentions(const bs_query_expr *expr, bs_test_kind kind);

/*
 * Whether the expression demands a test of this kind: it is the whole expression or a part that
 * is joined by AND only. *value gets the number of the first such test; it may be NULL.
 */
bool bs_query_demands(const bs_query_expr *expr, bs_test_kind kind, int *value);

/*
 * For each place in the expression the number of tests of the tree that ends there (its own
 * included), so that the right operand of `i` ends at i - 1 and the left one at i - 1 - size[i -
 * 1].
 *
 *   errors  BS_EVALUE  not one tree in post order
 */
bs_status bs_query_sizes(bs_ctx *cx, bs_arena *home, const bs_query_expr *expr, int **size);

/*
 * The sorts of bond that an expression accepts: bit `order | aromatic << 3 | ring << 4`. A
 * direction counts as a single bond; under NOT it excludes nothing, since a single bond may point
 * the other way.
 */
bs_status bs_query_bond_mask(bs_ctx *cx, const bs_query_expr *expr, uint32_t *mask);

/* ---- Relaxing -------------------------------------------------------------------------- */

/* Which tests bs_query_relax() drops. */
enum {
    BS_RELAX_HYDROGENS = 1, /* H and h */
    BS_RELAX_DEGREE = 2,    /* D and X */
    BS_RELAX_VALENCE = 4,
    BS_RELAX_HYBRID = 8,
    BS_RELAX_CHIRAL = 16, /* @, and the directions of bonds, which become single */
    BS_RELAX_RING = 32,   /* R, r, x and ring bonds */
    BS_RELAX_CHARGE = 64,
    BS_RELAX_AROMATIC = 128,  /* c and C become #6; a, A and aromatic bonds are dropped */
    BS_RELAX_RECURSION = 256, /* recursive parts are dropped; else they stay as they are */
    BS_RELAX_EDITED = 31      /* what an edit next to the atom changes at least */
};

/*
 * A copy with tests of some kinds dropped, so that it accepts all that the original accepts: a
 * dropped test counts as passed, and so does its negation. Expressions stay in their order; NOT
 * over AND or OR is pushed down to the tests. Map numbers, groups and atoms stay.
 */
bs_status bs_query_relax(bs_ctx *cx, bs_arena *home, const bs_query *query, unsigned what,
                         bs_query **out);

/* The same for one expression of `query`; nothing is copied of its recursive parts. */
bs_status bs_query_relax_expr(bs_ctx *cx, bs_arena *home, const bs_query_expr *expr, unsigned what,
                              bs_query_expr *out);

#endif
