/*
 * The parsed form of SMARTS, which the matcher compiles and the rewriter edits.
 *
 * A query is a graph of atom and bond expressions. Expressions are trees in post order in one
 * array each: leaf tests, and NOT, AND, OR over them. The rewriter reads it to learn what the
 * product side of a rule writes, builds new queries out of old ones (bs_query_combine) and
 * compiles those.
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
    BS_TEST_IMPLICIT_H,  /* h; value -1: at least one */
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
    int component; /* group of a component-level parenthesis, 0 for none */
    /*
     * Neighbours in the order of the text, which @ refers to: -1 stands for the H that was
     * written in the bracket. Only set where the expression has a chirality test.
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
    const char *text;
};

/* Parses SMARTS. Errors as bs_pattern_read(); `base` is added to the offsets of errors. */
bs_status bs_query_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length, size_t base,
                        bs_query **out);

/* Writes a query as SMARTS. */
bs_status bs_query_write(bs_ctx *cx, bs_arena *home, const bs_query *query, char **out);

/* Compiles a query; it is copied as far as needed and may go. */
bs_status bs_query_compile(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_pattern **out);

/* Whether one atom of a molecule passes one atom's expression (recursion included). */
bs_status bs_pattern__atom_passes(bs_ctx *cx, const bs_pattern *pattern, int atom,
                                  const bs_mol *mol, uint32_t where, bool *passes);

#endif
