/*
 * The cheapest answer of a problem that differs little from one already solved.
 *
 * The cheapest values of the unrestricted graph are lower bounds once ways are barred. From the
 * target down only what the present best answer needs is looked at, and bounds that do not hold
 * are raised until an answer is found that meets them; then it is exact. This is the revision of
 * costs of AO* (Nilsson 1980) with a perfect guess.
 *
 * Circles raise bounds by little and little, or meet them without being an answer; then the
 * solver gives up, and the caller solves the problem as a whole (cheapest.h).
 */
#ifndef SEARCH_LAZY_H
#define SEARCH_LAZY_H

#include "search/cheapest.h"

typedef enum bs_lazy_end {
    BS_LAZY_SOLVED, /* choice[] from the target down is the answer, value[] its costs */
    BS_LAZY_ABOVE,  /* the target costs more than `give_up`, at least value[target] */
    BS_LAZY_NONE,   /* there is no answer */
    BS_LAZY_SPENT   /* nothing is known but that it costs at least value[target] */
} bs_lazy_end;

typedef struct bs_lazy {
    const bs_graph *graph;
    bs_cost_mode mode;
    const bs_cheapest *bars; /* only, barred and no_buy of it hold */
    double *base;            /* unrestricted */
    uint32_t *base_choice;
    double *value; /* what is known of the problem at hand */
    uint32_t *choice;
    uint32_t *touched; /* molecules that differ from base */
    bool *is_touched;
    uint32_t *stack; /* of molecules */
    uint8_t *state;  /* of the walk at hand */
    uint32_t *met;   /* molecules with a state */
    uint32_t touched_count, stack_count, met_count;
    uint64_t looked; /* ways looked at, ever */
} bs_lazy;

/* Takes over the values of `solved`, a run without bars, whose bars are heeded from then on. */
bs_status bs_lazy__init(bs_lazy *lazy, const bs_cheapest *solved);
void bs_lazy__free(bs_lazy *lazy);

/* Forgets the problem before. */
void bs_lazy__reset(bs_lazy *lazy);

/* Raises the bound of one molecule under the bars; to be called for those that bars concern. */
void bs_lazy__revise(bs_lazy *lazy, uint32_t mol);

/* Solves within `budget` ways looked at. */
bs_lazy_end bs_lazy__solve(bs_lazy *lazy, uint32_t target, double give_up, uint64_t budget);

#endif
