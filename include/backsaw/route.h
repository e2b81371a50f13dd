/*
 * Routes: from what can be bought to the target, step by step.
 *
 * A route makes each compound in one way. Its molecules are numbered from 0, the target first;
 * each is either made by one step of the route or bought. Steps stand in bench order: a step
 * comes after those that make its precursors, and the last one makes the target. Buying the
 * target is a route of no steps.
 *
 * A step may have several ways to run it: transforms that join the same precursors to the same
 * product. They stand cheapest first, and ways[0] is the one that the numbers of the route are
 * for.
 *
 * A route is self-contained: all that it points at lies in the arena it was made in, and
 * bs_route_copy() moves it to another. Nothing in it is changed after it was made. The search
 * makes routes (search.h); bs_route_build() makes one by hand.
 *
 * Units: costs in the unit of the plan (€ per mole by default), yields in per cent, amounts in
 * moles a mole of target.
 */
#ifndef BACKSAW_ROUTE_H
#define BACKSAW_ROUTE_H

#include "backsaw/catalogue.h"
#include "backsaw/rule.h"

/* How a cost is made of the costs below it. */
typedef enum bs_cost_mode {
    BS_COST_PER_MOLE, /* (sum of equivalents x cost of precursor + step cost) / yield */
    BS_COST_ADDITIVE  /* sum of costs of precursors + step cost; equivalents and yield left out */
} bs_cost_mode;

typedef struct bs_route_molecule {
    const char *smiles; /* canonical */
    bool bought;
    double price;   /* per mole, where it is bought; else negative */
    double cost;    /* of a mole, bought or made */
    double moles;   /* that the route needs for a mole of target; see bs_route_build() */
    int step;       /* the step that makes it, or -1 */
    bs_offer offer; /* its smiles is NULL unless the molecule is bought by an offer of a catalogue */
} bs_route_molecule;

/* One way to run a step. Strings are NULL where the rule says nothing. */
typedef struct bs_route_way {
    const char *transform; /* name of the transform or of the known step */
    int rule;              /* index in the rule book, or -1 for a known step */
    const char *conditions;
    const char *recipe;
    const char *source;
    const char *pack;
    bs_words cautions;
    bs_words reagents;
    double cost;                  /* of the step, before it is divided by the yield */
    double yield_low, yield_high; /* range as given; both 0 if none was given */
    double yield;                 /* that the cost is for: the middle of the range, or the default */
    double *equivalents;          /* moles of each precursor a mole of product, without the yield */
} bs_route_way;

typedef struct bs_route_step {
    int product;      /* a molecule of the route */
    int *precursors;  /* distinct molecules of the route */
    int precursor_count;
    bs_route_way *ways; /* at least one */
    int way_count;
    bool known;   /* a step of the user's own, taken as given */
    bool checked; /* run forwards, it gave the product */
    char **rivals; /* what else it could give: SMILES, products of one run joined by dots */
    int rival_count;
    char **clashes; /* groups that the conditions of ways[0] attack in the precursors, by name */
    int clash_count;
    /*
     * Of the longest linear sequence that ends with this step: its steps, and its overall yields
     * in per cent, at the low end, as used for the cost, and at the high end; where several are
     * longest, the lowest. A way without a range counts with the yield used for its cost.
     */
    int line;
    double line_low, line_yield, line_high;
    double runs; /* steps of the unfolded tree that ends with this one */
} bs_route_step;

typedef struct bs_route {
    bs_cost_mode mode;
    double cost; /* of a mole of target */
    bs_route_molecule *molecules; /* [0] is the target */
    int molecule_count;
    bs_route_step *steps; /* bench order */
    int step_count;
    double rank; /* what the rank function of the plan said; the cost without one */
} bs_route;

/* ---- Making ---------------------------------------------------------------------------- */

/*
 * Makes a route from molecules and steps in any order. Of a molecule `smiles`, `price` and
 * `offer` are read, of a step all but `ways` beyond `way_count`; a molecule without step is
 * bought. Fills cost, moles, bought, step, the lines and the rank, puts the target first, then the
 * others as the steps first need them from the target backwards, the steps in bench order and
 * their ways by cost. In additive mode `moles` still heeds equivalents and yields.
 *
 *   target  index of the target in `molecules`
 *   errors  BS_EVALUE  no molecules, an index out of range, a molecule that two steps make, a
 *                      circle, a molecule that is neither made nor has a price of 0 or more, a
 *                      step that nothing needs, equivalents not above 0, a yield not above 0
 */
bs_status bs_route_build(bs_ctx *cx, bs_arena *home, bs_cost_mode mode,
                         const bs_route_molecule *molecules, int molecule_count,
                         const bs_route_step *steps, int step_count, int target, bs_route **out);

/* A copy in `home`. */
bs_status bs_route_copy(bs_ctx *cx, bs_arena *home, const bs_route *route, bs_route **out);

/* ---- Asking ---------------------------------------------------------------------------- */

typedef struct bs_route_measures {
    int steps;   /* distinct steps */
    double runs; /* steps in the unfolded tree, each use of an intermediate counted */
    int longest; /* longest linear sequence: most steps from an offer to the target */
    int leaves;  /* bought molecules */
    double cost;
    double yield_low, yield, yield_high; /* along the longest line, per cent; 100 without steps */
    bool checked; /* every step was run forwards or is a known step */
} bs_route_measures;

void bs_route_measure(const bs_route *route, bs_route_measures *out);

/*
 * Runs every rule's step forwards again with the rules given: `failed` is the first step that did
 * not give its product, or whose transform the book does not have, or -1. Known steps are taken
 * as given.
 */
bs_status bs_route_verify(bs_ctx *cx, const bs_route *route, const bs_rules *rules,
                          const bs_rule_hooks *hooks, int *failed);

/*
 * Whether two routes have the same steps: product and precursors, whatever the ways to run them
 * and the offers.
 */
bool bs_route_same(const bs_route *a, const bs_route *b);

/* Whether step j of b is step i of a in this sense. */
bool bs_route_same_step(const bs_route *a, int i, const bs_route *b, int j);

/*
 * Sets `checked` and the rule of every step anew, as the rules at hand have it (NULL: none): for a
 * route that comes from elsewhere and that nobody else looks at yet.
 */
bs_status bs_route_recheck(bs_ctx *cx, bs_route *route, const bs_rules *rules,
                           const bs_rule_hooks *hooks);

/* ---- Text ------------------------------------------------------------------------------ */

/*
 * Adds the route as an indented tree, plain ASCII, target first, each line ending in a newline.
 * A compound that is used again is not unfolded twice. Behind it stand the hazardous reagents of
 * the steps and the sentence that the supplier's safety data sheet prevails.
 */
bs_status bs_route_text(const bs_route *route, bs_text *text);

/* ---- Lists of routes ------------------------------------------------------------------- */

/* A molecule that blocks routes: nobody sells it and nothing found makes it. */
typedef struct bs_gap {
    const char *smiles;
    int opens;       /* molecules of the explored graph that would become makeable with it alone */
    bool opens_target; /* whether the target would be among them */
    int steps;       /* explored steps that use it */
} bs_gap;

/* What a search knows of one molecule at its end. Numbers that mean nothing are negative. */
typedef struct bs_explored_molecule {
    const char *smiles;
    double price; /* a mole, where it is sold */
    double cost;  /* of the cheapest way to have it */
    int depth;    /* steps from the target, at least */
    long found, barred, disallowed; /* steps that make it; those of them that constraints refused,
                                       and those that `allow` did */
    bool expanded; /* it was asked what makes it */
    bool closed;   /* it never is, being at hand or without carbon */
    bool too_deep; /* it was not, for the limit of depth */
    bool ways;     /* the explored graph has a step that makes it */
    const char *lacks; /* if it cannot be had: a compound that its nearest step lacks, or NULL */
} bs_explored_molecule;

/* How a transform fared in a search. */
typedef struct bs_transform_count {
    const char *name;
    long tried;   /* sets of precursors that it gave */
    long found;   /* of those, steps that gave the product when they were run forwards */
    long refused; /* of those, steps that constraints or `allow` refused */
    long used;    /* steps of the routes listed */
    const char *fault; /* what its function failed with, which took it out of the search; or NULL */
} bs_transform_count;

/* What a search saw. Lists of routes share it; the last one to drop it frees it. */
typedef struct bs_explored {
    int holders;
    bs_arena arena;
    bs_explored_molecule *molecules; /* in the order in which they were met, the target first */
    long molecule_count;
    bs_transform_count *transforms; /* by index in the rule book */
    int transform_count;
} bs_explored;

/* Room for so many entries, held once. */
bs_status bs_explored_new(bs_ctx *cx, long molecules, int transforms, bs_explored **out);

/* Both allow NULL. */
bs_explored *bs_explored_hold(bs_explored *explored);
void bs_explored_drop(bs_ctx *cx, bs_explored *explored);

/* The molecule with this canonical SMILES, or NULL; `explored` may be NULL. */
const bs_explored_molecule *bs_explored_find(const bs_explored *explored, const char *smiles);

/* A pack that steps of the routes come from. */
typedef struct bs_pack_name {
    const char *name;
    const char *version; /* or NULL */
} bs_pack_name;

typedef struct bs_routes {
    bs_arena arena; /* all below lies here */
    bs_route **items;
    int count;
    bool complete;      /* nothing was cut short: these are the best of all routes */
    const char *reason; /* why not, in words, such as "the limit of 20000 molecules was reached";
                           NULL if complete */
    const char **warnings; /* a line for each rule that fell out of the search */
    int warning_count;
    const char *target; /* canonical SMILES */
    long molecules;     /* explored: molecules, those expanded, steps */
    long expanded;
    long steps;
    bs_gap *gaps; /* those that open most first; for the target alone. In a very large graph only
                     molecules that were met early are tried */
    int gap_count;
    bs_pack_name *packs; /* see bs_routes_set_packs() */
    int pack_count;
    bs_explored *saw; /* what the search saw, or NULL; held */
} bs_routes;

/* NULL is allowed. The routes of the list die with it. */
void bs_routes_free(bs_ctx *cx, bs_routes *routes);

/*
 * A new list with copies of `count` routes in the order given; the statements about the search
 * are copied from `like`, or empty if that is NULL.
 */
bs_status bs_routes_pick(bs_ctx *cx, const bs_route *const *items, int count,
                         const bs_routes *like, bs_routes **out);

/* Keeps those of the packs that steps of the routes name. */
bs_status bs_routes_set_packs(bs_ctx *cx, bs_routes *routes, const bs_pack_name *packs, int count);

/*
 * A new list with the routes of both, each once, the cheapest first; among equals those of `a`
 * come first. It is complete if both are, and counts what both explored.
 *
 *   errors  BS_EVALUE  different targets, or costs that mean different things
 */
bs_status bs_routes_merge(bs_ctx *cx, const bs_routes *a, const bs_routes *b, bs_routes **out);

/* Adds a table with one line a route, aligned columns, plain ASCII. */
bs_status bs_routes_table(const bs_routes *routes, bs_text *text);

#endif
