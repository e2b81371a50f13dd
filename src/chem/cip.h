/*
 * The hierarchical digraph of the CIP system: what its expansion, its ranking and the labels share.
 *
 * A digraph is a tree of nodes grown from a root atom along all paths that visit no atom twice. A
 * path that closes a ring ends in a duplicate of the atom it came back to, and a bond of order n
 * gives n - 1 duplicates at both ends. Nodes are numbered sphere by sphere. To rank the ligands of
 * a node other than the root, the same tree is looked at from that node; such a view lists for each
 * node the neighbours that lead away, best first as far as they are told apart.
 *
 * Rules are those of P-92 of the IUPAC recommendations of 2013 (Favre and Powell), after Prelog and
 * Helmchen, Angew. Chem. Int. Ed. 1982, 21, 567; root distances of duplicates, auxiliary descriptors
 * and rule 6 follow Hanson et al., J. Chem. Inf. Model. 2018, 58, 1755.
 */
#ifndef CHEM_CIP_H
#define CHEM_CIP_H

#include "chem/draft.h"

enum { BS_CIP_NODE_LIMIT = 200 * 1000, BS_CIP_WORK_LIMIT = 50 * 1000 * 1000, BS_CIP_LEGS = 16 };

#define BS_CIP_NONE UINT32_MAX

typedef enum bs_cip_kind { BS_CIP_REAL, BS_CIP_BOND_DUPLICATE, BS_CIP_RING_DUPLICATE } bs_cip_kind;

/* Auxiliary descriptors; CIS and TRANS are those of double bonds that a mirror turns over. */
typedef enum bs_cip_label {
    BS_CIP_UNKNOWN,
    BS_CIP_R,
    BS_CIP_S,
    BS_CIP_SMALL_R,
    BS_CIP_SMALL_S,
    BS_CIP_Z,
    BS_CIP_E,
    BS_CIP_CIS,
    BS_CIP_TRANS
} bs_cip_label;

typedef enum bs_cip_rule {
    BS_CIP_TIED,
    BS_CIP_1A,
    BS_CIP_1B,
    BS_CIP_2,
    BS_CIP_3,
    BS_CIP_4A,
    BS_CIP_4B,
    BS_CIP_4C,
    BS_CIP_5,
    BS_CIP_6,
    BS_CIP_LIKE /* no rule: by likeness to the reference descriptor, for 4b and 5 */
} bs_cip_rule;

typedef struct bs_cip_node {
    uint32_t parent;   /* BS_CIP_NONE for the root */
    uint32_t atom;     /* BS_DRAFT_HYDROGEN for an implied hydrogen */
    uint32_t first;    /* its children are nodes first to first + count - 1 */
    uint32_t depth;    /* sphere; 0 for the root */
    uint32_t distance; /* from the root, as rule 1b wants it */
    uint32_t mass;     /* in units of 0.0001 u, 0 for duplicates */
    uint32_t kids_at;  /* the view: its neighbours that lead away, in kids[] */
    uint32_t kid_count;
    uint16_t number; /* six times the atomic number, which may be a fraction for duplicates */
    uint16_t count;
    uint8_t kind;
    uint8_t aux;     /* bs_cip_label */
    uint8_t pending; /* the same, not in force before its sphere is done */
} bs_cip_node;

typedef struct bs_cip {
    bs_ctx *cx;
    const bs_mol *mol;
    bs_arena arena;     /* of the arrays below */
    uint16_t *mancude;  /* by atom: number of its bond duplicate where double bonds move, or 0 */
    bs_cip_node *nodes;
    uint32_t count, room;
    uint32_t grown; /* nodes before this one have their children */
    uint32_t *order; /* the view: its nodes, nearest first */
    uint32_t *kids;
    uint8_t *split;  /* beside kids: the rule that told a kid from the one before it, or BS_CIP_TIED */
    uint32_t *kept_kids;
    uint8_t *kept_split;
    uint32_t *queue; /* two for each node */
    uint32_t reference;  /* descriptor for BS_CIP_LIKE, atom for BS_CIP_6 */
    long work_left;
    uint32_t node_limit;
} bs_cip;

/* The ligands of a node, best first. */
typedef struct bs_cip_ranking {
    uint32_t legs[BS_CIP_LEGS]; /* nodes */
    int count;
    bool distinct;
    bool mirrored; /* a mirror would exchange an odd number of neighbours in the ranking */
} bs_cip_ranking;

/* Starts with an empty digraph. End with bs_cip__close(), also after an error. */
bs_status bs_cip__open(bs_ctx *cx, const bs_mol *mol, bs_cip *cip);
void bs_cip__close(bs_cip *cip);

/* Throws the digraph away and starts another with `atom` as node 0. */
bs_status bs_cip__root(bs_cip *cip, uint32_t atom);

/*
 * Grows the digraph to sphere `depth`; *complete tells whether it has no more to grow.
 *
 *   errors  BS_ELIMIT  more nodes than BS_CIP_NODE_LIMIT
 */
bs_status bs_cip__grow(bs_cip *cip, uint32_t depth, bool *complete);

/*
 * Ranks the ligands of node 0 by rules 1 and 2, growing the digraph as far as needed. `skip` is an
 * atom that is no ligand, or BS_CIP_NONE.
 */
bs_status bs_cip__rank_lazily(bs_cip *cip, uint32_t skip, bs_cip_ranking *out);

/* Ranks the ligands of any node of a complete digraph by all rules. `skip` is a node. */
bs_status bs_cip__rank(bs_cip *cip, uint32_t node, uint32_t skip, bs_cip_ranking *out);

/* Tells the legs of the view's root apart by their descriptors: rules 4b and 5. */
bs_status bs_cip__pair(bs_cip *cip, bs_cip_rule rule);

/* Sorts neighbours that are tied in the view by a rule, the farthest first. */
bs_status bs_cip__refine(bs_cip *cip, bs_cip_rule rule);

#endif
