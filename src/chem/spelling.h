/* Bringing the charged and the uncharged spelling of one bond together. */
#ifndef CHEM_SPELLING_H
#define CHEM_SPELLING_H

#include "backsaw/mol.h"

/* Sum of the Kekulé orders of an atom's bonds. */
int bs_spelling__bond_sum(const bs_mol *mol, uint32_t atom);

/*
 * Rewrites a molecule that is being made, with Kekulé orders placed, so that groups that are
 * written in two ways have one form:
 *
 *   nitrogen of five bonds to O, S, Se or N at an end    charges: C[N+](=O)[O-], CN=[N+]=[N-]
 *   N+ with a triple bond to N, beside N- or C-          azide and diazo: C=[N+]=[N-]
 *   P, S, Cl and the elements below, positive, beside    no charges: CS(C)=O, OCl(=O)(=O)=O,
 *   O-, S-, Se-, N- or C-                                C=P(C)(C)C
 *
 * `stated` has the stated hydrogens of each atom or BS_DRAFT_IMPLIED. Hydrogens do not move.
 */
void bs_spelling__unify(bs_mol *mol, int16_t *stated);

#endif
