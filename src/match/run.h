/*
 * One run of a pattern on one molecule: what its parts share.
 *
 * The memo keeps for each recursive part and atom whether it matched there, so that each is
 * searched once in a run. Budget and status are shared by all searches of the run.
 */
#ifndef MATCH_RUN_H
#define MATCH_RUN_H

#include "match/program.h"

enum { BS_MEMO_OPEN, BS_MEMO_NO, BS_MEMO_YES };

typedef struct bs_match_run {
    bs_ctx *cx;
    const bs_mol *mol;
    const bs_pattern *whole;
    uint8_t *memo;        /* sub_count x atom_count, or NULL without recursion */
    uint32_t *components; /* connected piece of each atom, or NULL unless needed */
    long steps;           /* left */
    bs_status status;
} bs_match_run;

/* The search for one pattern: places atoms in the order of visits, the next one at `level`. */
typedef struct bs_match_search {
    bs_match_run *run;
    const bs_pattern *pattern;
    uint32_t *placed; /* by pattern atom */
    uint32_t *cursor; /* by level: the next candidate */
    bool *used;       /* by atom of the molecule */
    int level;
    uint32_t anchor; /* where the first visit must lie, or UINT32_MAX */
    int anchor_atom;
} bs_match_search;

/* Prepares a run; its arrays lie in scratch. */
bs_status bs_match__begin(bs_match_run *run, bs_ctx *cx, const bs_pattern *pattern,
                          const bs_mol *mol, long steps);

/* Prepares a search; its arrays lie in scratch. */
bs_status bs_match__search(bs_match_search *search, bs_match_run *run, const bs_pattern *pattern);

/* Goes on to the next match. False at the end, or after an error, which is in run->status. */
bool bs_match__next(bs_match_search *search);

/* Whether an atom passes an expression; a test for a hand gets `hand` (1 @, 2 @@, 0 none). */
bool bs_match__atom(bs_match_run *run, const bs_program_expr *expr, uint32_t where, int hand);

/* Whether hands and double bonds stand as asked, all atoms being placed. */
bool bs_match__stereo(const bs_match_search *search);

#endif
