/* What the files behind bs_plan() share: the state of one plan. */
#ifndef SEARCH_PLAN_H
#define SEARCH_PLAN_H

#include "backsaw/search.h"
#include "search/constraint.h"
#include "search/explore.h"
#include "search/guess.h"

/* The tag of a way: the index of a rule, or of a known step with this bit. */
#define BS_PLAN_KNOWN ((uint32_t)1 << 31)

/* A known step, read. Precursors are distinct. */
typedef struct bs_known {
    const char *product;
    const bs_mol *product_mol;
    const bs_mol **entries; /* precursors as given, and how much of each */
    double *entry_equivalents;
    int entry_count;
    const char **smiles;
    const bs_mol **mols;
    double *equivalents;
    int count;
    double cost;
    bool has_cost;
    double yield; /* per cent */
    const char *name;
    const bs_known_step *given; /* for its texts */
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

/* What became of the steps found for a molecule. */
typedef struct bs_plan_tally {
    uint32_t found, barred, disallowed;
} bs_plan_tally;

/* What the expansion of a molecule tells beside its proposals. */
typedef struct bs_plan_asked {
    long *tried;           /* sets of precursors, by rule */
    bs_rule_faults faults; /* the rules left out, and those whose function failed */
} bs_plan_asked;

typedef enum bs_verdict_of {
    BS_ADMITTED,
    BS_REFUSED_BY_CONSTRAINT,
    BS_REFUSED_BY_ALLOW
} bs_verdict_of;

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
    bs_constraint con;
    bs_explore x;
    bool kbest_cut;
    bs_plan_tally *tallies; /* by molecule of the graph */
    size_t tally_room;
    bs_transform_count *counts; /* by rule */
    int count_count;
    bs_rule_faults faults;       /* of rules that are out */
    bs_rule_faults batch_faults; /* the same as it was before the batch at hand */
    bs_status trace_status; /* of what is traced where nothing can fail */
    uint32_t deepest;       /* depth of the molecules expanded so far */
    int routes_seen;        /* by the last enumeration */
    long looked_at;         /* routes, by the last enumeration */
    uint32_t target;
    bs_plan_opts own; /* that `opts` points to, but while a change is tried */
    const bs_mol *mol; /* the target, with its SMILES */
    char *smiles;
} bs_plan_state;

/* Checks options. Errors as bs_plan(). */
bs_status bs_plan__check(bs_ctx *cx, const bs_plan_opts *opts);

/* Works out what follows from the options. */
void bs_plan__read_options(bs_plan_state *plan);

/* Explores, or goes on. */
bs_status bs_plan__explore(bs_plan_state *plan);

/*
 * Makes the list of routes from what was explored. After a stop it does so with a stop flag at
 * rest.
 */
bs_status bs_plan__finish(bs_plan_state *plan, bs_routes **out);

/* Reads the known steps of the options. Errors as bs_plan(). */
bs_status bs_known__read(bs_plan_state *plan);

/* The next known step of a product, or NULL; `cursor` starts at 0. */
const bs_known *bs_known__next(const bs_plan_state *plan, const char *product, size_t *cursor,
                               int *index);

/* The calls of the exploration; the payload is the plan. */
bs_status bs_plan__expand(void *payload, bs_ctx *cx, bs_arena *home, int lane, const char *smiles,
                          bool closed, bs_proposals *out);
bs_status bs_plan__admit(void *payload, bs_ctx *cx, const char *product, bs_proposal *proposal,
                         bool *admitted);
bs_status bs_plan__meet(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                        bs_meeting *out);

/* Asks the user's functions whether a step may be used, and what it costs. */
bs_status bs_plan__ask(bs_plan_state *plan, bs_ctx *cx, const char *product,
                       bs_proposal *proposal, bool *admitted);

/* Writes what the definition behind a tag says; strings are those of the definition. */
void bs_plan__fill_way(const bs_plan_state *plan, uint32_t tag, bs_route_way *way);

/* How many clashes a step has; 0 without looking where they are allowed. */
bs_status bs_plan__count_clashes(const bs_plan_state *plan, bs_ctx *cx, const bs_step *step,
                                 int *count);

/* The names of the groups that a step attacks. */
bs_status bs_plan__name_clashes(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                                const bs_step *step, char ***names, int *count);

/* Rivals as text without tags: the products of each outcome joined by dots. */
bs_status bs_plan__rivals(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                          const bs_outcomes *rivals, char ***out, int *count);

/*
 * A proposal of a known step for a product with tags, which go to the precursors by the map
 * numbers of the step. `*usable` is false if an atom of a marked bond has none.
 */
bs_status bs_known__tag(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                        const bs_known *known, const bs_mol *tagged, bs_proposal *proposal,
                        bool *usable);

/*
 * The routes of the explored graph that limits and `keep` leave, cheapest first, at most the size
 * of the pool. They lie in `home`. At most `tries` are looked at; plan->kbest_cut tells whether
 * the enumeration ended early.
 */
bs_status bs_plan__take_routes(bs_plan_state *plan, bs_arena *home, long tries, bs_route ***routes,
                               int *count);

/* Counting what becomes of steps; and what is told of it in the end, which goes into the list. */
bs_status bs_plan__start_counts(bs_plan_state *plan);
bs_status bs_plan__count(bs_plan_state *plan, const char *product, uint32_t tag,
                         bs_verdict_of whose);
bs_status bs_plan__merged(void *payload, bs_proposals *found);
bs_status bs_plan__explain(bs_plan_state *plan, bs_routes *list);

/* Before a batch: the rules that are out by now are not asked in it. */
void bs_plan__begin(void *payload);

/* Puts rules out whose functions failed, unless they are. */
bs_status bs_plan__note_faults(bs_plan_state *plan, const bs_rule_faults *found);

/* Strikes proposals of rules that are out. */
void bs_plan__strike(const bs_plan_state *plan, bs_proposals *found);

/* The warnings of the list: a line for each rule that is out. */
bs_status bs_plan__warn(const bs_plan_state *plan, bs_routes *list);

/* Finds the gaps of the explored graph: at most `most`, strings in `home`. */
bs_status bs_plan__find_gaps(const bs_explore *x, bs_arena *home, uint32_t target, int most,
                             bs_gap **gaps, int *count);

#endif
