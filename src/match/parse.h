/*
 * What the files of the SMARTS parser share: the place in the text, and the buffer in which the
 * tests of an expression pile up.
 */
#ifndef MATCH_PARSE_H
#define MATCH_PARSE_H

#include "match/query.h"

typedef struct bs_parse {
    bs_ctx *cx;
    bs_arena *home; /* of the query */
    const char *text;
    size_t length;
    size_t at;   /* next byte */
    size_t base; /* added to the offsets of errors */
    int depth;   /* recursive parts around this place */
    bs_query *query;
    /* A pile in scratch; an expression owns what lies above the height at which it began. */
    bs_test *tests;
    int test_count, test_room;
} bs_parse;

/* The next byte, or -1 at the end. */
static inline int bs_parse__peek(const bs_parse *p)
{
    return p->at < p->length ? (unsigned char)p->text[p->at] : -1;
}

/* Fails with "expected <what>, found <the next character>". */
bs_status bs_parse__expected(bs_parse *p, const char *what);

/* Fails at a byte of the text. */
bs_status bs_parse__fail(bs_parse *p, size_t at, bs_status code, const char *message);

/*
 * Reads digits if there are any; *found tells whether. BS_EVALUE above `limit`.
 */
bs_status bs_parse__number(bs_parse *p, int limit, int *value, bool *found);

/* Moves the tests above `height` into an expression of the query. */
bs_status bs_parse__take(bs_parse *p, int height, bs_query_expr *out);

/* Reads an atom: a bracket, or a symbol that may stand without one. Fills expr, map, offset. */
bs_status bs_parse__atom(bs_parse *p, bs_query_atom *atom);

/* Reads a bond expression; the next character must be able to begin one. */
bs_status bs_parse__bond(bs_parse *p, bs_query_expr *out);

/* Whether the next character can begin a bond expression. */
bool bs_parse__starts_bond(const bs_parse *p);

/* Reads the query at this place, up to the end of the text or, inside a recursion, its `)`. */
bs_status bs_parse__query(bs_parse *p, bs_query **out);

#endif
