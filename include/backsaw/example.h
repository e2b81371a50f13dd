/*
 * From one example reaction to the text of a transform that makes it, ready to be edited.
 *
 * The reaction is written as SMILES, `A.B>agents>P`. Where atom classes do not say which atom
 * became which, the mapping with the least chemical distance is looked for: the fewest bonds made
 * and broken and hydrogens moved (Jochum, Gasteiger and Ugi 1980, from memory).
 */
#ifndef BACKSAW_EXAMPLE_H
#define BACKSAW_EXAMPLE_H

#include "backsaw/core.h"

typedef struct bs_example_opts {
    int radius;       /* bonds around the atoms that change that the target names; 0 to 20 */
    const char *name; /* of the transform; NULL for "draft" */
} bs_example_opts;

/*
 * Drafts a transform from one reaction: Lua text with the reaction as its example. Drafts that do
 * not give their example back, backwards and forwards, are tightened step by step; should none do
 * it,
 * `*works` is false and a comment in the text says what was in the way.
 *
 *   opts    NULL for radius 1
 *   errors  BS_ESYNTAX, BS_EVALUE  with the byte offset where there is one
 *           BS_ELIMIT              more than 250 atoms on one side
 *           BS_ENOMEM, BS_ESTOPPED
 *   cost    bounded in steps, so that the result is the same each time
 */
bs_status bs_example_draft(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                           const bs_example_opts *opts, char **out, bool *works);

#endif
