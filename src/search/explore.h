/*
 * Exploration: grows the hypergraph from a target, the most promising molecules first.
 *
 * Molecules are known by their canonical SMILES and met once: the owner then says at what price
 * they are sold and what it may cost to make them. They are expanded in batches; a batch is chosen
 * before any of it is expanded, and merged in order. What chemistry there is lies behind the
 * calls.
 */
#ifndef SEARCH_EXPLORE_H
#define SEARCH_EXPLORE_H

#include "backsaw/search.h"
#include "core/map.h"
#include "search/frontier.h"

/* A way to make the molecule that is being expanded. */
typedef struct bs_proposal {
    const bs_mol *const *mols; /* passed on to `meet`; NULL if that needs none */
    const char *const *smiles; /* canonical, distinct */
    const double *equivalents;
    int count;
    double cost;
    double yield; /* fraction */
    uint32_t tag;
    bool apart;         /* a step of its own even if another has the same compounds */
    const void *origin; /* the owner's */
} bs_proposal;

typedef struct bs_proposals {
    bs_proposal *items;
    int count;
    const void *extra; /* the owner's, for `merged` */
} bs_proposals;

/* What the owner knows of a molecule when it is first met. */
typedef struct bs_meeting {
    double price;  /* INFINITY if it is not sold */
    double guess;  /* cost expected if it is made; finite, 0 or more */
    bool urgent;   /* expand it before all that are not */
    bool closed;   /* not worth expanding: never, or if urgent with that flag passed on */
} bs_meeting;

typedef struct bs_explore_calls {
    void *payload;
    /*
     * The ways to make a molecule, in a fixed order. BS_ELIMIT means that there is no answer for
     * this molecule; the search goes on without. With several threads the calls of different
     * lanes may come at the same time, each with a context of its own.
     */
    bs_status (*expand)(void *payload, bs_ctx *cx, bs_arena *home, int lane, const char *smiles,
                        bool closed, bs_proposals *out);
    /* May refuse a proposal or set its cost; NULL admits all. */
    bs_status (*admit)(void *payload, bs_ctx *cx, const char *product, bs_proposal *proposal,
                       bool *admitted);
    /* Told of each batch before any of it is expanded; may be NULL. */
    void (*begin)(void *payload);
    /* Told of each answer before its proposals are merged, and may strike some; may be NULL. */
    bs_status (*merged)(void *payload, bs_proposals *found);
    bs_status (*meet)(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                      bs_meeting *out);
    /*
     * Whether the search may end, given that no route that is still to be found can cost less
     * than `open_bound`. Asked now and then once the target can be had; NULL never ends it.
     */
    bs_status (*enough)(void *payload, bs_ctx *cx, double open_bound, bool *done);
    void (*progress)(void *payload, const bs_plan_progress *now);
} bs_explore_calls;

typedef struct bs_explore_limits {
    uint32_t depth;     /* molecules at this depth are not expanded */
    uint32_t molecules;
    double seconds;     /* 0: none */
    size_t memory;      /* bytes of the gate; 0: none */
    int batch;
    int lanes;          /* 1 or more; the lane of a molecule is its place in the batch modulo it */
    int threads;        /* 1 or more */
    double least_step;  /* no step costs less */
    bs_strategy strategy;
} bs_explore_limits;

typedef struct bs_explore_node {
    const char *smiles;
    double guess;
    uint32_t depth; /* steps from the target at least; as of the last look at the frontier */
    bool expanded, urgent, closed;
    bool open; /* it could be expanded, as of that look */
} bs_explore_node;

typedef enum bs_explore_end {
    BS_END_EXHAUSTED, /* nothing is left to expand within the depth */
    BS_END_ENOUGH,    /* nothing left could be cheaper than what `enough` has */
    BS_END_PROVED, /* there is a route, and the strategy was to find out */
    BS_END_MOLECULES,
    BS_END_SECONDS,
    BS_END_MEMORY,
    BS_END_STOPPED
} bs_explore_end;

struct bs_explore {
    bs_ctx *cx;
    bs_explore_calls calls;
    bs_explore_limits limits;
    bs_cost_mode mode;
    bs_arena arena; /* SMILES */
    bs_graph graph;
    bs_map index;           /* first half of the hash to node */
    bs_explore_node *nodes; /* by molecule of the graph; 0 is the target */
    uint64_t *check;        /* second half of the hash */
    size_t node_room, check_room;
    size_t used_before; /* of the gate */
    double started;
    uint32_t expanded;
    uint32_t failed;   /* molecules that `expand` had no answer for */
    bs_frontier front;
    bool crowded; /* a proposal was put off for the limit of molecules */
    bool partial; /* the molecule at hand was cut short: its next proposal is ... */
    int next_proposal;
    uint32_t since; /* ... and it may join ways from this on */
    uint32_t next_enough; /* ask `enough` when so many are expanded */
    bs_explore_end end;
};

void bs_explore__init(bs_explore *x, bs_ctx *cx, const bs_explore_calls *calls,
                      const bs_explore_limits *limits, bs_cost_mode mode);
void bs_explore__free(bs_explore *x);

/*
 * Explores from a target until an end is reached, which is in x->end. Called again, perhaps after
 * x->limits were changed, it goes on from there. A search that was cut short by a limit of
 * molecules and goes on grows the graph that it would have grown in one go.
 */
bs_status bs_explore__run(bs_explore *x, const bs_mol *target, const char *smiles);

/* The molecule with this SMILES, or BS_GRAPH_NONE. */
uint32_t bs_explore__find(const bs_explore *x, const char *smiles);

/* Seconds of a monotonic clock. */
double bs_explore__clock(void);

#endif
