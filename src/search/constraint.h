/*
 * Constraints of a plan. What a single step or a bought compound shows is judged while the graph
 * grows; what only a whole route shows, when routes are listed in the order of their cost.
 */
#ifndef SEARCH_CONSTRAINT_H
#define SEARCH_CONSTRAINT_H

#include "backsaw/search.h"
#include "search/explore.h"
#include "search/tag.h"

/* A bond of the target between two tagged atoms. */
typedef struct bs_tagged_bond {
    int a, b;
    enum { BS_BOND_KEEP, BS_BOND_CUT, BS_BOND_FIRST } wish;
} bs_tagged_bond;

/* The constraints of a plan, read. All zero: none. */
typedef struct bs_constraint {
    const bs_constraints *given; /* NULL: none */
    bs_tags tags;
    bs_tagged_bond *bonds;
    int bond_count;
    const char **avoid, **use, **at_most; /* SMILES of the tests for molecules */
    const char **start, **not_bought;     /* SMILES */
    bool by_way;     /* depends on the way to run a step, not on its compounds alone */
    bool whole;      /* there is something to judge of whole routes */
    uint64_t *marks; /* by way of the graph: tests of `use`, then of `at_most`, that it meets */
    bool *marked;
    size_t marks_room, marked_room;
    bs_arena product_home; /* the product that was looked at last */
    const char *product;
    bs_mol *product_mol;
    int *intact; /* how often it has each of the patterns */
} bs_constraint;

struct bs_plan_state;

/* Reads the constraints of the options; `tagged` is the target with its tags, in the plan's arena.
 */
bs_status bs_constraint__init(struct bs_plan_state *plan, const bs_mol *target,
                              const bs_mol **tagged);
void bs_constraint__free(struct bs_plan_state *plan);

/* Whether a proposal may become a step. */
bs_status bs_constraint__admit(struct bs_plan_state *plan, bs_ctx *cx, const char *product,
                               const bs_proposal *proposal, bool *admitted);

/*
 * What a route may do with a compound: whether it may be bought, and whether it must be (and is at
 * hand, if nobody sells it). `smiles` is plain, `mol` has its tags.
 */
void bs_constraint__offer(const struct bs_plan_state *plan, const bs_mol *mol, const char *smiles,
                          bool *may, bool *must);

/* A route as the enumeration gives it, plain: numbers of molecules, steps with those before first.
 */
typedef struct bs_outline {
    const bs_route_molecule *molecules;
    int molecule_count;
    const bs_route_step *steps; /* product and precursors */
    const uint32_t *ways;       /* of the graph, one a step */
    int step_count;
    int longest;
} bs_outline;

bs_status bs_constraint__judge(struct bs_plan_state *plan, const bs_outline *outline, bool *good);

#endif
