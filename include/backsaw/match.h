/*
 * Patterns: SMARTS compiled for matching.
 *
 * A pattern is immutable, holds no pointer into a molecule and can serve several threads at a
 * time. Its atoms are numbered from 0 in the order of the text; map numbers are those written
 * behind a colon. Recursive parts are compiled with it.
 */
#ifndef BACKSAW_MATCH_H
#define BACKSAW_MATCH_H

#include "backsaw/mol.h"

typedef struct bs_pattern bs_pattern;

/*
 * Compiles SMARTS.
 *
 *   home    arena of the pattern; it must outlive the pattern
 *   errors  BS_ESYNTAX, BS_EVALUE with the byte offset
 *           BS_ELIMIT  nested too deep or too large
 */
bs_status bs_pattern_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                          bs_pattern **out);

/* The SMARTS text that it was compiled from. */
const char *bs_pattern_text(const bs_pattern *pattern);

int bs_pattern_atom_count(const bs_pattern *pattern);

/* Map number of a pattern atom, 0 for none. */
int bs_pattern_map(const bs_pattern *pattern, int atom);

typedef struct bs_match_opts {
    int limit;            /* at most so many matches; 0 for all */
    bool every_embedding; /* not only one for each set of atoms */
    long steps;           /* budget; 0 for the default of ten million */
    int anchor_atom;      /* with `anchored`: this pattern atom ... */
    uint32_t anchor;      /* ... must lie on this atom */
    bool anchored;
} bs_match_opts;

/* Matches, each `width` molecule atoms in the order of the pattern's atoms. */
typedef struct bs_matches {
    int count;
    int width;
    uint32_t *atoms;
} bs_matches;

/*
 * Finds matches. Unless every_embedding, matches are unique by their set of atoms, and the first
 * found stands for the set. They come in a fixed order that depends on pattern and molecule only.
 *
 *   home    arena of the result
 *   opts    NULL for the defaults
 *   errors  BS_ELIMIT    the step budget ran out
 *           BS_ESTOPPED
 */
bs_status bs_pattern_find(bs_ctx *cx, bs_arena *home, const bs_pattern *pattern, const bs_mol *mol,
                          const bs_match_opts *opts, bs_matches *out);

/* Whether there is a match. */
bs_status bs_pattern_has(bs_ctx *cx, const bs_pattern *pattern, const bs_mol *mol, bool *yes);

#endif
