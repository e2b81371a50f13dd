/* Normal valences: how many hydrogens an atom carries that states none. */
#ifndef CHEM_VALENCE_H
#define CHEM_VALENCE_H

#include "backsaw/mol.h"

/*
 * Normal valences of an element with a charge, ascending, ended by 0; empty for elements without
 * (metals, noble gases). Uncharged atoms of B, C, N, O, P, S and halogens are as in OpenSMILES; a
 * charged atom has those of the element with the same number of electrons.
 */
const uint8_t *bs_valence__normal(int element, int charge);

/* Hydrogens that fill the lowest normal valence not below `bonds`; 0 if there is none. */
int bs_valence__implied(int element, int charge, int bonds);

/* Whether chemists meet this total valence commonly; true for elements without normal valences. */
bool bs_valence__is_usual(int element, int charge, int valence);

#endif
