/* Between the files that draft a transform from an example. */
#ifndef RULE_EXAMPLE_H
#define RULE_EXAMPLE_H

#include "backsaw/draft.h"
#include "backsaw/example.h"
#include "backsaw/rule.h"

enum { BS_EXAMPLE_ATOMS = 250, BS_EXAMPLE_AROMATIC = 5, BS_EXAMPLE_DATIVE = 6 };

typedef struct bs_example_atom {
    int element, charge, hydrogens, isotope, label;
    bool aromatic;
    int piece, atom; /* which molecule, and which atom of it */
} bs_example_atom;

/* All molecules of one side of the reaction as one graph. */
typedef struct bs_example_side {
    bs_mol **pieces;
    int *compound; /* of each piece: ions that belong together share a number */
    int piece_count, compound_count;
    bs_example_atom *atoms;
    int count;
    int *first; /* of each piece: the number of its atom 0 */
    int *near;  /* neighbours of atom i: near[start[i]] to near[start[i + 1] - 1] */
    int *start;
    uint8_t *order; /* count * count; 0 for no bond */
} bs_example_side;

typedef struct bs_example {
    bs_ctx *cx;
    bs_arena *work;
    bs_example_side reactants, product;
    int *image;    /* of each atom of the product: the atom of the reactants, or -1 */
    int *became;   /* of each atom of the reactants: the atom of the product, or -1 */
    bool *changes; /* of each atom of the product: whether the reaction changes it */
    char **agents; /* SMILES of what stands between the arrows */
    int agent_count;
    char *left_out;    /* SMILES of the products that are not looked at, or NULL */
    char **precursors; /* canonical SMILES of the compounds, in the order of the text */
    int precursor_count;
    char *product_smiles;
} bs_example;

static inline int bs_example__bond(const bs_example_side *side, int a, int b)
{
    return side->order[a * side->count + b];
}

/* How much a draft says. */
typedef struct bs_example_detail {
    int radius;
    bool exact;  /* hydrogens and connections of every atom */
    bool stereo; /* hands of centres and geometry of double bonds that the reaction touches */
} bs_example_detail;

/* Reads the reaction; everything lies in ex->work. Errors as bs_example_draft(). */
bs_status bs_example__read(bs_example *ex, const char *text, size_t length);

/* Finds `image`, `became` and `changes`. */
bs_status bs_example__map(bs_example *ex);

/* Marks the product atoms that the target names. */
bs_status bs_example__surround(const bs_example *ex, int radius, bool **chosen);

/* The two patterns of the transform. */
bs_status bs_example__patterns(const bs_example *ex, const bs_example_detail *detail, char **target,
                               char **from);

/* ---- Sketches: patterns while they are being put together -------------------------------- */

enum { BS_SKETCH_OUTSIDE = -2, BS_SKETCH_HYDROGEN = -1 };

typedef struct bs_sketch_atom {
    char before[32],
        behind[40]; /* text up to the hand and behind it; `behind` ends with the bracket */
    int part;       /* atoms of one part that do not hang together stand in parentheses */
    bs_hand hand;   /* as in mol.h for `around`: atoms of the sketch or one of the two above */
    int around[4];
} bs_sketch_atom;

typedef struct bs_sketch_bond {
    int a, b;
    const char *text;
} bs_sketch_bond;

/* A double bond: bonds `x` and `y`, one at each end, lie on one side of it or on opposite ones. */
typedef struct bs_sketch_slope {
    int x, y;
    int a, b; /* the ends of the double bond; x is at a, y at b */
    bool trans;
} bs_sketch_slope;

typedef struct bs_sketch {
    bs_sketch_atom *atoms;
    bs_sketch_bond *bonds;
    bs_sketch_slope *slopes;
    int atom_count, bond_count, slope_count;
} bs_sketch;

/* Writes a sketch as SMARTS, part after part. */
bs_status bs_sketch__write(bs_ctx *cx, bs_arena *home, const bs_sketch *sketch, char **out);

#endif
