/*
 * Explanations: why a transform makes a molecule, or why it does not.
 *
 * A reason names the first thing that stood in the way, in the order in which a step is made: the
 * target pattern does not fit; it fits, but no sensible precursors come out; the precursors could
 * not be kept; the rule's own condition refuses; the precursors do not give the product.
 */
#ifndef BACKSAW_WHY_H
#define BACKSAW_WHY_H

#include "backsaw/rule.h"

typedef enum bs_reason_kind {
    BS_REASON_PATTERN,   /* no match; the text tells what fails where it nearly fits */
    BS_REASON_PRECURSOR, /* a match, but no sensible precursors */
    BS_REASON_STRAIN,    /* precursors with a bond that their rings cannot hold */
    BS_REASON_WHEN,      /* the rule's condition refuses this place */
    BS_REASON_SAME,      /* the precursors contain the product */
    BS_REASON_FORWARD    /* run forwards, the precursors give something else */
} bs_reason_kind;

typedef struct bs_reason {
    bs_reason_kind kind;
    char *text;      /* one line */
    uint32_t *atoms; /* of the product, 0-based: those that the text speaks of */
    int atom_count;
    char *marked;      /* SMILES of the product with these atoms in class 1 */
    char **precursors; /* SMILES; for BS_REASON_FORWARD only */
    int precursor_count;
    char **instead; /* SMILES of what the precursors give, one set each, dotted */
    int instead_count;
} bs_reason;

typedef struct bs_reasons {
    int step_count; /* steps that the transform gives; with any, `items` tells of other places */
    bs_reason *items;
    int count; /* at most 20; equal reasons are given once */
} bs_reasons;

/* Why transform number `transform` gives steps to `product`, or none. Errors as bs_rules_back(). */
bs_status bs_rules_why(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                       const bs_mol *product, const bs_rule_hooks *hooks, bs_reasons *out);

/*
 * Whether the target of a transform fits the product but for one test that is not about an element:
 * a near miss, with its reason. `*size` is the number of the target's atoms: the more there are,
 * the more a near miss says. Transforms whose target fits give none.
 */
bs_status bs_rules_near_miss(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                             const bs_mol *product, bs_reason *out, int *size, bool *near);

#endif
