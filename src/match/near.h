/*
 * The nearest miss: where a pattern would lie if a few of its tests were dropped.
 */
#ifndef MATCH_NEAR_H
#define MATCH_NEAR_H

#include "match/query.h"

#define BS_UNPLACED UINT32_MAX

/* A test that fails there, in words. */
typedef struct bs_miss {
    int atom;       /* of the pattern */
    uint32_t where; /* atom of the molecule, or BS_UNPLACED */
    char *text;     /* such as "atom 2 (C) does not fit [H2]: it has 1 hydrogen" */
} bs_miss;

typedef struct bs_near {
    uint32_t *placed; /* for each atom of the pattern; BS_UNPLACED where there is no atom for it */
    bs_miss *misses;  /* in the order in which the matcher places the atoms */
    int miss_count;   /* 0: the atoms and bonds fit */
} bs_near;

/*
 * Finds a placement of the pattern's atoms, bonded as in the pattern, that fails as few tests as
 * possible: a wrong element counts more than another test, an atom with no place most. Chirality,
 * directions of bonds and component groups are not judged. Within a budget of steps; what was best
 * until then is given.
 *
 *   limit  no placement that costs more is looked for: 2 a test that fails, 4 a wrong element or a
 *          missing bond, 5 a wrong bond, 8 an atom without a place; 0 for no limit
 *   found  whether there is one
 */
bs_status bs_near__find(bs_ctx *cx, bs_arena *home, const bs_pattern *pattern, const bs_mol *mol,
                        int limit, bs_near *out, bool *found);

#endif
