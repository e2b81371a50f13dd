/*
 * Features: 128 bits of a molecule by which most patterns are refused without a search.
 *
 * Each bit says that something occurs: an atom of a class, such an atom with a hydrogen, a bond
 * between two classes, a number of atoms. A pattern that can only match where a bit is set
 * demands that bit. Bits are functions of few properties, the same for molecules and patterns:
 * a molecule sets those of its atoms and bonds; a pattern demands those that all states which an
 * atom of it allows have in common. So no second table can drift from the first.
 *
 * Atoms fall into classes by element, because what patterns ask for are a few elements.
 */
#ifndef CHEM_FEATURES_H
#define CHEM_FEATURES_H

#include "chem/mol.h"

/* Classes of elements. The first ones hold one element each. */
enum {
    BS_CLASS_C,
    BS_CLASS_N,
    BS_CLASS_O,
    BS_CLASS_S,
    BS_CLASS_F,
    BS_CLASS_CL,
    BS_CLASS_BR,
    BS_CLASS_I,
    BS_CLASS_P,
    BS_CLASS_SI,
    BS_CLASS_B,
    BS_CLASS_H,
    BS_CLASS_SE,
    BS_CLASS_ALKALI, /* groups 1 and 2 */
    BS_CLASS_OTHER,
    BS_CLASS_COUNT,
    BS_CLASS_SINGLE = BS_CLASS_ALKALI /* classes below hold one element */
};

typedef struct bs_features {
    uint64_t word[2];
} bs_features;

int bs_feature__class(int element);

/* An element of the class; the only one below BS_CLASS_SINGLE. */
int bs_feature__element(int class);

/* Bits of an atom by class and aromaticity. */
bs_features bs_feature__atom(int class, bool aromatic);

/* By its hydrogens, folded and not; from 4 on all alike. */
bs_features bs_feature__hydrogens(int class, bool aromatic, int hydrogens);

/* By the sign of its charge: -1, 0, 1. */
bs_features bs_feature__charge(int class, int sign);

/* By its neighbours that are atoms; from 4 on all alike. */
bs_features bs_feature__degree(int class, bool aromatic, int degree);

/* By the size of its smallest ring, 0 for none; from 8 on all alike. */
bs_features bs_feature__ring(int class, bool aromatic, int size);

/* By its ring bonds; from 4 on all alike. */
bs_features bs_feature__ring_bonds(int count);

/* Bits of a bond by its ends, order (0 to 4), aromaticity and ring. Symmetrical in the ends. */
bs_features bs_feature__bond(int class_a, bool aromatic_a, int class_b, bool aromatic_b, int order,
                             bool aromatic, bool ring);

/* Bits by the number of atoms of each class (BS_CLASS_COUNT of them) and of aromatic ones. */
bs_features bs_feature__counts(const int *classes, int aromatic);

/* Bits that stand alone. */
enum {
    BS_FEATURE_HYDROGEN_ATOM = BS_CLASS_H, /* bit of word 0: a hydrogen that is an atom */
    BS_FEATURE_HAND = 62,                  /* a centre with a hand */
    BS_FEATURE_GEOMETRY = 63               /* a double bond with a geometry */
};

/* Fills mol->features. Needs all perception done. O(atoms + bonds). */
void bs_mol__features(bs_mol *mol);

#endif
