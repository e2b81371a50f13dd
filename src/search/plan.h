/* What the files behind bs_plan() share: the state of one plan. */
#ifndef SEARCH_PLAN_H
#define SEARCH_PLAN_H

#include "backsaw/search.h"
#include "search/explore.h"
#include "search/guess.h"

/* The tag of a way: the index of a rule, or of a known step with this bit. */
#define BS_PLAN_KNOWN ((uint32_t)1 << 31)

/* A known step, read. Precursors are distinct. */
typedef struct bs_known {
    const char *product;
    const char **smiles;
    const bs_mol **mols;
    double *equivalents;
    int count;
    double cost;
    bool has_cost;
    double yield; /* per cent */
    const char *name;
} bs_known;

/* What running the rule of a way again told; kept, since routes share steps. */
typedef struct bs_plan_detail {
    uint32_t way;
    bool checked;
    char **rivals;
    int rival_count;
    char **clashes;
    int clash_count;
} bs_plan_detail;

typedef struct bs_plan_state {
    bs_ctx *cx;
    const bs_plan_opts *opts;
    bs_arena arena;
    bs_known *known;
    bs_map known_index;  /* hash of the product to known step */
    bs_map detail_index; /* way to detail */
    bs_plan_detail *details;
    size_t detail_count, detail_room;
    bool rules_on;
    int depth, best, pool;
    double step_cost, clash_cost;
    double admitted_cost; /* sum over the steps admitted so far, for the unit of guesses */
    double admitted_count;
    bs_guess guess;
    bs_explore x;
    bool kbest_cut;
    uint32_t target;
} bs_plan_state;

/* Reads the known steps of the options. Errors as bs_plan(). */
bs_status bs_known__read(bs_plan_state *plan);

/* The next known step of a product, or NULL; `cursor` starts at 0. */
const bs_known *bs_known__next(const bs_plan_state *plan, const char *product, size_t *cursor,
                               int *index);

/* The calls of the exploration; the payload is the plan. */
bs_status bs_plan__expand(void *payload, bs_ctx *cx, bs_arena *home, int lane,
                          const char *smiles, bool closed, bs_proposals *out);
bs_status bs_plan__admit(void *payload, bs_ctx *cx, const char *product, bs_proposal *proposal,
                         bool *admitted);
bs_status bs_plan__meet(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                        bs_meeting *out);

/* Writes what the definition behind a tag says; strings are those of the definition. */
void bs_plan__fill_way(const bs_plan_state *plan, uint32_t tag, bs_route_way *way);

/* How many clashes a step has; 0 without looking where they are allowed. */
bs_status bs_plan__count_clashes(const bs_plan_state *plan, bs_ctx *cx, const bs_step *step,
                                 int *count);

/* The names of the groups that a step attacks. */
bs_status bs_plan__name_clashes(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                                const bs_step *step, char ***names, int *count);

/* Rivals as text: the products of each outcome joined by dots. */
bs_status bs_plan__rivals(bs_ctx *cx, bs_arena *home, const bs_outcomes *rivals, char ***out,
                          int *count);

/*
 * The routes of the explored graph that limits and `keep` leave, cheapest first, at most the size
 * of the pool. They lie in `home`. At most `tries` are looked at; plan->kbest_cut tells whether
 * the enumeration ended early.
 */
bs_status bs_plan__take_routes(bs_plan_state *plan, bs_arena *home, long tries, bs_route ***routes,
                               int *count);

/* Finds the gaps of the explored graph: at most `most`, strings in `home`. */
bs_status bs_plan__find_gaps(const bs_explore *x, bs_arena *home, uint32_t target, int most,
                             bs_gap **gaps, int *count);

#endif
