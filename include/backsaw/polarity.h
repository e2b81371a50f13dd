/*
 * Polarity: which end of a bond is the donor and which the acceptor.
 *
 * The notation is Seebach's (Angew. Chem. Int. Ed. Engl. 1979, 18, 239; from memory). The position
 * of an atom counts from the carbon that bears the nearest heteroatom, which is 1; the heteroatom
 * itself is 0. Odd positions are acceptors by nature (a1, a3, a5), even ones donors (d0, d2, d4); a
 * label against nature (d1, a2, d3, ...) needs umpolung.
 *
 * Two heteroatoms that n carbon atoms join stand in a 1,n relation: consonant if n is odd, since
 * then some bond between them has natural labels at both ends; dissonant if n is even.
 */
#ifndef BACKSAW_POLARITY_H
#define BACKSAW_POLARITY_H

#include "backsaw/mol.h"

/* Positions are looked for up to this far; beyond it an atom counts as alkyl. */
enum { BS_POLE_FAR = 8 };

/* One end of a bond. `position` is -1 if no heteroatom is near: alkyl, with no nature of its own.
 */
typedef struct bs_pole {
    int atom;
    int position;
    int heteroatom; /* from which the position counts; the atom itself at 0; -1 for alkyl */
    bool acceptor;  /* else donor */
    bool umpolung;  /* the label is against nature */
} bs_pole;

/*
 * How a bond is to be cut: a donor and an acceptor, with as few labels against nature as possible.
 * In a dissonant bond one end is against nature: the one that everyday reagents serve (cyanide,
 * nitroalkanes, acyl anion equivalents for d1, alkynes for d3; epoxides, halo esters, halo ketones
 * for a2). Of ends that are alike the second one is.
 */
typedef struct bs_polarity {
    bs_pole ends[2]; /* in the order of the arguments */
    int relation;    /* n of 1,n between the heteroatoms, or 0 if an end is alkyl */
    bool dissonant;
} bs_polarity;

/*
 * Polarity of the bond between atoms `a` and `b`. Heteroatoms are N, O, S, P and Se here, and
 * positions count along carbon atoms on the atom's own side of the bond.
 *
 *   errors  BS_ERANGE  no such atom
 *           BS_EVALUE  the atoms are not bonded
 */
bs_status bs_polarity_of_bond(bs_ctx *cx, const bs_mol *mol, int a, int b, bs_polarity *out);

/*
 * The label of one atom of a bond if its role is known, as in a disconnection.
 *
 *   errors  as bs_polarity_of_bond()
 */
bs_status bs_polarity_of_end(bs_ctx *cx, const bs_mol *mol, int atom, int partner, bool acceptor,
                             bs_pole *out);

/* Two heteroatoms and the carbon chains that join them. */
typedef struct bs_relation {
    int *lengths;   /* n of each chain without repeated atoms, ascending */
    int *chain;     /* the atoms of a shortest one, from the first heteroatom to the second */
    int count;      /* of chains; 0 if no carbon chain joins them */
    bool dissonant; /* of the shortest chain */
} bs_relation;

/*
 * The relation between two heteroatoms (any element but carbon and hydrogen). In cages the chains
 * are without number: of more than 1000 only the first, and a shortest one, are given.
 *
 *   errors  BS_ERANGE  no such atom
 *           BS_EVALUE  an atom is carbon or hydrogen, or both are the same
 */
bs_status bs_polarity_of_pair(bs_ctx *cx, bs_arena *home, const bs_mol *mol, int a, int b,
                              bs_relation *out);

/* Writes a label such as "d2", "a1", "alkyl-a"; `room` of 16 bytes serves. Returns `buffer`. */
char *bs_pole_label(const bs_pole *pole, char *buffer, size_t room);

#endif
