/*
 * Running a reading on molecules: at every place where it fits.
 */
#ifndef RULE_RUN_H
#define RULE_RUN_H

#include "core/map.h"
#include "rule/edit.h"

typedef struct bs_run_opts {
    int limit;        /* at most so many places are tried */
    bool strict;      /* more places are an error (BS_ELIMIT); else the rest is left out */
    long steps;       /* of the matcher, for each part; 0 for its default */
    bool every_place; /* places that give the same result for certain are tried as well */
} bs_run_opts;

/*
 * Gets one result. `where` gives for each atom of `from` the atom in the molecule of its part.
 * What the visitor sets `*keep` for stays in the arena of the results, the rest is given back.
 */
typedef bs_status (*bs_run_fn)(void *payload, bs_ctx *cx, const uint32_t *where,
                               const bs_result *result, bool *keep);

/*
 * Runs a reading; `mols` has one molecule for each part of `from`. Places come in the order of the
 * matches of the first part, then of the second, and so on.
 *
 *   home    arena of the results
 *   errors  as bs_pattern_find(); BS_ELIMIT
 */
bs_status bs_run__all(bs_ctx *cx, bs_arena *home, const bs_reading *reading,
                      const bs_mol *const *mols, const bs_run_opts *opts, bs_run_fn visit,
                      void *payload);

/* ---- Sets of products ---------------------------------------------------------------------- */

/* Sets of products seen so far, by their SMILES; in memory of its own. */
typedef struct bs_seen {
    bs_map map;
    bs_arena arena;
    char **keys;
    int count, room;
} bs_seen;

/* Makes an empty set; free it with bs_seen__free(). Cannot fail. */
void bs_seen__init(bs_seen *seen, bs_ctx *cx);
void bs_seen__free(bs_seen *seen);

/*
 * Adds a set of `count` SMILES, in any order; `*index` is its number, from 0, and `*fresh` tells
 * whether it was not there before.
 */
bs_status bs_seen__add(bs_ctx *cx, bs_seen *seen, char *const *smiles, int count, int *index,
                       bool *fresh);

/* Canonical SMILES of the products, in `home`. */
bs_status bs_result__smiles(bs_ctx *cx, bs_arena *home, const bs_result *result, char ***out);

/* Fills an outcome of which atom k of `from` lies on where[k] of reactant reactant[part of k]. */
bs_status bs_result__outcome(bs_ctx *cx, bs_arena *home, const bs_side *from,
                             const uint32_t *where, const uint32_t *reactant,
                             const bs_result *result, char **smiles, bs_outcome *out);

#endif
