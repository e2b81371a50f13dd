/*
 * Groups on an atom: constants of their electronic effect, and how much they hinder.
 */
#ifndef RULE_SUBSTITUENT_H
#define RULE_SUBSTITUENT_H

#include "backsaw/direct.h"

/* Constants for the meta position and for the para position (sigma plus, or sigma minus). */
typedef struct bs_group_constants {
    double meta, para;
} bs_group_constants;

/*
 * The constants of the group that begins with atom `first` on atom `ring`. Hammett constants from
 * memory of C. Hansch, A. Leo, R. W. Taft, Chem. Rev. 1991, 91, 165.
 */
bs_group_constants bs_substituent__constants(const bs_mol *mol, int ring, int first,
                                             bs_attack attack);

/* How much it hinders a place beside it: 0 for hydrogen, 0.5 for methyl, 2.5 for tert-butyl. */
double bs_substituent__size(const bs_mol *mol, int ring, int first);

#endif
