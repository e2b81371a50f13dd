/* What the two files of the SMARTS writer share. */
#ifndef MATCH_WRITE_H
#define MATCH_WRITE_H

#include "match/query.h"

typedef struct bs_writing {
    bs_ctx *cx;
    bs_text *text;
    const bs_query *query;
    int depth; /* recursive parts around this place */
} bs_writing;

/* Writes an atom; `mirror` swaps @ and @@, because its neighbours come in an odd order. */
bs_status bs_write__atom(bs_writing *w, const bs_query_atom *atom, bool mirror);

/* Writes a bond; `back` tells that it is written from its atom b to its atom a. */
bs_status bs_write__bond(bs_writing *w, const bs_query_bond *bond, bool back);

/* Writes a whole query behind what the text holds. */
bs_status bs_write__query(bs_writing *w);

#endif
