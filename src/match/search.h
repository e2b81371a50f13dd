/*
 * The search for matches: depth-first over the moves of a pattern, without recursion on its
 * atoms. Recursive parts are searched anchored, at most once for each atom of the molecule.
 */
#ifndef MATCH_SEARCH_H
#define MATCH_SEARCH_H

#include "match/program.h"

enum {
    BS_SEARCH_STEPS = 10000000, /* the default budget */
    BS_SEARCH_SMALL = 64        /* places for which a search needs no memory */
};

typedef struct bs_search {
    bs_ctx *cx;
    const bs_pattern *pattern;
    const bs_mol *mol;
    /* The atoms with all hydrogens in `hydrogens` and those that are atoms in `label`. */
    const bs_atom *atoms;
    const bs_bond *bonds;
    const uint32_t *offsets;
    const bs_link *links;
    bool spelt_hydrogens; /* `atoms` is such a copy; else no hydrogen is an atom */
    uint32_t *placed;     /* atoms of the molecule by slot */
    uint32_t *iter;       /* next candidate by slot */
    uint8_t *memo;        /* part * atoms + atom: 0 unknown, 1 no, 2 yes; NULL without parts */
    uint32_t *component;  /* of each atom; NULL unless the pattern has groups */
    long given, steps;    /* at the beginning, and left */
    bs_status status;
    uint32_t small[2 * BS_SEARCH_SMALL];
} bs_search;

/* A search in one part. */
typedef struct bs_frame {
    const bs_part *part;
    const bs_order *order;
    uint32_t *placed; /* by move */
    uint32_t *iter;
    uint32_t anchor; /* where the first move goes, or BS_FREE */
    int depth;
} bs_frame;

#define BS_FREE UINT32_MAX

/*
 * Whether the molecule has all that the pattern demands; if not, there is no match.
 */
static inline bool bs_search__may_match(const bs_pattern *pattern, const bs_mol *mol)
{
    return (pattern->needs.word[0] & ~mol->features[0]) == 0 &&
           (pattern->needs.word[1] & ~mol->features[1]) == 0 &&
           mol->atom_count >= (uint32_t)pattern->min_atoms &&
           mol->bond_count >= (uint32_t)pattern->min_bonds &&
           mol->ring_count >= (uint32_t)pattern->min_rings;
}

/* Begins a search; its memory is in scratch, the caller rewinds. `steps` 0 for the default. */
bs_status bs_search__begin(bs_search *s, bs_ctx *cx, const bs_pattern *pattern, const bs_mol *mol,
                           long steps);

/* What a search has cost, for bs_spend(). */
static inline size_t bs_search__work(const bs_search *s)
{
    size_t parts = (size_t)s->pattern->part_count;

    return 10 + (parts > 1 ? parts * s->mol->atom_count / 16 : 0) + (size_t)(s->given - s->steps);
}

/* A frame for the whole pattern, or with an order of its own. */
void bs_search__frame(const bs_search *s, const bs_order *order, uint32_t anchor, bs_frame *f);

/*
 * Goes on to the next match of a frame; false when there is none, or when s->status tells that
 * the search broke off.
 */
bool bs_search__next(bs_search *s, bs_frame *f);

/* Whether an atom passes the nodes from `entry`; `centre` NULL while atoms are being placed. */
bool bs_search__passes(bs_search *s, int32_t entry, uint32_t atom, const bs_centre *centre,
                       const bs_frame *f);

/* Whether the centres and double bonds of a complete match have the hands asked for. */
bool bs_search__stereo_fits(bs_search *s, const bs_frame *f);

/* Whether the hand of the centre, seen in the order of the pattern, is the one of the test. */
bool bs_search__hand_fits(const bs_search *s, const bs_centre *centre, const bs_frame *f, int test);

/* ^n: 1 sp, 2 sp2, 3 sp3, 4 sp3d, 5 sp3d2; 0 without neighbours. */
int bs_search__hybridisation(const bs_search *s, uint32_t atom);

#endif
