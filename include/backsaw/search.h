/*
 * Planning: explores what a target can be made from, and gives the cheapest routes.
 *
 * The search grows a directed hypergraph: molecules, and steps that make one molecule from
 * several. Leaves are what the shelf sells. It expands first what the cheapest partial routes
 * need, by known cost plus a guess for what is still open, in batches of fixed size that are
 * merged in order (AO*: Martelli & Montanari 1973, Nilsson 1980). On what was explored the answer
 * is exact: the `best` cheapest routes (Knuth 1977; Nielsen, Andersen & Pretolani 2005). The same
 * input gives the same routes in the same order.
 *
 * A search that meets a limit or the stop flag gives what it found, marked incomplete with the
 * reason: that is no error. No route is a list of none.
 *
 * Callbacks get the payload of the options and may fail: their status ends the plan and is passed
 * on, but for BS_ESTOPPED, which ends the search only. All but hooks run on the calling thread.
 * A hook that fails with BS_ESCRIPT takes its rule out of the rest of the search, with a warning in
 * the list of routes; the same search gives the same warnings.
 */
#ifndef BACKSAW_SEARCH_H
#define BACKSAW_SEARCH_H

#include "backsaw/group.h"
#include "backsaw/route.h"

/*
 * A step of the user's own, known to work. `from` and `product` are SMILES. Numbers that are 0 or
 * arrays that are NULL have the default named. A step of its own: two with the same compounds
 * stay two. Map numbers in the SMILES tell which atom of the product comes from where; only
 * constraints on bonds ask for them.
 */
typedef struct bs_known_step {
    const char *product;
    const char *const *from;
    const double *equivalents; /* moles a mole of product; NULL: 1 each */
    int from_count;
    bool has_cost;
    double cost;  /* 0 or more; without has_cost as for a rule's step */
    double yield; /* per cent, above 0 and at most 100; 0: BS_DEFAULT_YIELD */
    const char *name;
    const char *conditions, *recipe, *source; /* or NULL; they are shown with the step */
    bs_words reagents, cautions;
} bs_known_step;

/* Yield of a step that states none, per cent. */
#define BS_DEFAULT_YIELD 85.0

/* Step cost by default, € before it is divided by the yield. */
#define BS_DEFAULT_STEP_COST 50.0

/* What a clash (group.h) costs by default: the steps that put a protecting group on and off again. */
#define BS_DEFAULT_CLASH_STEPS 2.0

/* What becomes of a rule's step whose conditions attack another group of a precursor. */
typedef enum bs_clash_policy {
    BS_CLASH_PENALISE, /* each clash adds clash_cost to its step cost, but not to that of `cost` */
    BS_CLASH_ALLOW,
    BS_CLASH_REFUSE
} bs_clash_policy;

typedef struct bs_plan_limits {
    int depth;      /* steps in line from the target; 0: 16 */
    int steps;      /* distinct steps of a route in all; 0: no limit */
    long molecules; /* in the explored graph; 0: 20000 */
    double seconds; /* wall time of the exploration; 0: no limit */
    size_t memory;  /* bytes that the search holds, checked after each expansion; 0: no limit */
} bs_plan_limits;

/* How far the search is, for a progress line. */
typedef struct bs_plan_progress {
    long molecules, expanded, steps, open;
    double seconds;
    bool solved;     /* there is a route */
    double cheapest; /* what it costs, or INFINITY */
    long routes;     /* counted so far, at most as many as are wanted */
    int depth;       /* of the molecules expanded: steps from the target */
} bs_plan_progress;

/* What a trace is told, in the order in which it happens, whatever the number of threads. */
typedef struct bs_plan_event {
    enum {
        BS_EVENT_MOLECULE, /* met: smiles, price (INFINITY if it is not sold) */
        BS_EVENT_STEP,     /* found: `route` of this one step, `verdict`: "taken", or refused by
                              "constraint" or "allow" */
        BS_EVENT_LOOK,     /* between batches: now */
        BS_EVENT_ROUTE,    /* one of the answer: route */
        BS_EVENT_END       /* routes */
    } kind;
    const char *smiles;
    double price;
    const bs_route *route;
    const char *verdict;
    const bs_plan_progress *now;
    const bs_routes *routes;
} bs_plan_event;

/* What a step may be tested for; one of the fields is set. */
typedef struct bs_step_test {
    const bs_mol *mol;         /* it is one of the precursors */
    const bs_pattern *pattern; /* one of the precursors has it */
    const char *word;          /* a word of its name, conditions, recipe, reagents or cautions
                                  begins so, whatever the case */
    const char *transform;     /* it is by this transform */
    int most;                  /* in at_most: steps of a route that may meet it */
} bs_step_test;

/* Two bonded atoms of the target, 0-based. */
typedef struct bs_target_bond {
    int a, b;
} bs_target_bond;

/*
 * What a route must be like. All zero: anything goes. The bonds are those of the target's own
 * atoms, which are followed from step to step; a known step without map numbers is not used on a
 * compound that still has such a bond.
 *
 * Protecting groups go by the names of transforms: "x protection" puts x on, "x removal" or
 * "x deprotection" takes it off.
 */
typedef struct bs_constraints {
    const bs_step_test *avoid;   /* no step meets any of these */
    const bs_step_test *use;     /* each is met by a step */
    const bs_step_test *at_most;
    int avoid_count, use_count, at_most_count;
    const bs_mol *const *start;      /* each is bought; free if nobody sells it */
    const bs_mol *const *not_bought;
    int start_count, not_bought_count;
    const bs_pattern *const *intact; /* no step builds one: it comes whole from what is bought */
    int intact_count;
    const bs_target_bond *keep;  /* no step cuts it */
    const bs_target_bond *cut;   /* some step cuts it */
    const bs_target_bond *first; /* cut, and before it no step takes the compound apart */
    int keep_count, cut_count, first_count;
    bool has_protections;
    int protections;  /* steps that put a protecting group on, at most */
    bool unprotect;   /* what is put on comes off before the target */
    bool convergent;  /* a step is outside of the longest linear sequence */
} bs_constraints;

/* What the search is for, and so which molecule comes next. */
typedef enum bs_strategy {
    BS_STRATEGY_CHEAPEST, /* best-first by known cost and guess */
    BS_STRATEGY_PROOF,    /* whether the target can be made at all; ends with the first route:
                             proof-number search (Allis, van der Meulen & van den Herik, Artif.
                             Intell. 1994, 66, 91), one molecule at a time */
    BS_STRATEGY_BREADTH   /* by depth, then as they were met */
} bs_strategy;

/*
 * What to plan and how. All zero but `shelf` is a sound default without rules. Steps are shown to
 * the callbacks as a route of that one step: steps[0], its product molecules[0], precursors
 * behind; precursors that cannot be bought have the price -1 there. The cost of its ways[0] is
 * what the default gives.
 */
typedef struct bs_plan_opts {
    const bs_rules *rules; /* or NULL */
    const bs_rule_hooks *hooks; /* or NULL */
    /*
     * Threads that expand molecules; 0: 1. The routes do not depend on it. Hooks that are not
     * safe for several threads need one set a lane, `lane_count` of them, in `lane_hooks`: a lane
     * is served by one thread at a time, and which molecule comes to which lane is fixed. With
     * hooks but no `lane_hooks` one thread works.
     */
    int threads;
    const bs_rule_hooks *lane_hooks;
    int lane_count;
    const int *transforms; /* indices of the rules to use; NULL: all */
    int transform_count;   /* 0 with `transforms` set: the rules are off */
    bs_shelf *shelf;       /* or NULL: nothing is sold, only carbon-free compounds are at hand */
    const bs_known_step *known;
    int known_count;
    const bs_constraints *constraints; /* or NULL */
    bs_plan_limits limits;
    bs_strategy strategy;
    /*
     * Routes must differ: a route is left out if of the disconnections of a cheaper one in the
     * list it has more than this share (k shortest paths with limited overlap: Chondrogiannis,
     * Bouros, Gamper & Leser, EDBT 2015). Known steps count if they join two compounds with carbon.
     */
    bool has_overlap;
    double overlap; /* 0 to 1 */
    bs_cost_mode mode;
    bool has_step_cost;
    double step_cost; /* of each step, 0 or more; without has_step_cost BS_DEFAULT_STEP_COST; the
                         step_cost of a transform's definition is added */
    bs_clash_policy clashes;
    bool has_clash_cost;
    double clash_cost; /* 0 or more; without has_clash_cost BS_DEFAULT_CLASH_STEPS times the step cost */
    int best;         /* routes wanted; 0: 10 */
    int batch;        /* molecules expanded at a time; 0: 16 */
    int gaps;         /* gaps listed at most; 0: 10; negative: none */
    void *payload;
    /* Whether a step may be used. */
    bs_status (*allow)(void *payload, bs_ctx *cx, const bs_route *step, bool *allowed);
    /* Step cost, 0 or more, in place of step_cost. Known steps with a cost are not asked. */
    bs_status (*cost)(void *payload, bs_ctx *cx, const bs_route *step, double *cost);
    /* What a mole costs that is sold at `price`, 0 or more, in place of it. */
    bs_status (*leaf)(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                      double price, double *cost);
    /* Cost expected for a molecule that is not explored and not sold, 0 or more. */
    bs_status (*guess)(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                       double *cost);
    /* Whether a route counts. Those left out make room for the next. */
    bs_status (*keep)(void *payload, bs_ctx *cx, const bs_route *route, bool *kept);
    /*
     * Orders the routes, lowest first; routes of the same rank stay in the order of cost. Ten
     * times `best` routes, at most 200, are taken by cost, and the `best` of them by rank stay.
     */
    bs_status (*rank)(void *payload, bs_ctx *cx, const bs_route *route, double *rank);
    /* Called between batches; may be NULL. */
    void (*progress)(void *payload, const bs_plan_progress *now);
    /* Told of everything; NULL for no trace. */
    bs_status (*trace)(void *payload, bs_ctx *cx, const bs_plan_event *event);
} bs_plan_opts;

/*
 * Plans a target.
 *
 *   out     free with bs_routes_free()
 *   errors  BS_EVALUE, BS_ESYNTAX  in a known step ("known step 3: from 2: ..."), or an option
 *                                  out of its range
 *           BS_ENOMEM; what a callback or the shelf failed with
 */
bs_status bs_plan(bs_ctx *cx, const bs_mol *target, const bs_plan_opts *opts, bs_routes **out);

/* ---- A search that is kept --------------------------------------------------------------- */

/* What was explored, kept for going on and for ranking anew. */
typedef struct bs_search bs_search;

/*
 * Prepares a search. The options and their arrays are copied; what they point to (rules, hooks,
 * the shelf, molecules, patterns, texts) must stay for as long as the search is used. Errors as
 * bs_plan().
 */
bs_status bs_search_new(bs_ctx *cx, const bs_mol *target, const bs_plan_opts *opts,
                        bs_search **out);

/* NULL is allowed. Lists of routes that it gave stay. */
void bs_search_free(bs_search *search);

/* Its options. Limits, `best`, threads, hooks, callbacks and payload may be changed between runs. */
bs_plan_opts *bs_search_options(bs_search *search);

/*
 * Explores and lists the routes. Called again, perhaps with higher limits, it goes on where it
 * stopped; where only the limit of molecules had stopped it, the result is that of one longer run.
 * The limit of seconds counts for each run.
 */
bs_status bs_search_run(bs_search *search, bs_routes **out);

/* What to change when routes are ranked anew. */
typedef struct bs_rerank {
    bool prices; /* ask the shelf of the options again for each molecule */
    bool costs;  /* work the costs of the steps out again by the options */
    bool steps;  /* ask `allow` again */
    const bs_mol *const *without; /* compounds that no route may have */
    int without_count;
} bs_rerank;

/*
 * Lists the routes of what was explored by other options: a copy of the search's own in which
 * shelf, cost, mode, allow, keep, rank, `best` and the limits of depth and steps may differ.
 * Nothing is explored, and the search is as before. What the search's own `allow` refused is not
 * there to be allowed.
 */
bs_status bs_search_rerank(bs_search *search, const bs_plan_opts *opts, const bs_rerank *what,
                           bs_routes **out);

/*
 * The default guess: how many steps it may take to make a molecule, 0 to 40. One for each four
 * heavy atoms beyond six, half a one for each ring beyond the first, three quarters for each
 * stereo mark. The plan multiplies it by the cost of a step.
 *
 * With a shelf of lists alone that holds at most 200 compounds the plan guesses otherwise: three
 * tenths of this number, and a third of a step for each atom that stands in surroundings which no
 * atom of the shelf has.
 */
double bs_guess_steps(const bs_mol *mol);

#endif
