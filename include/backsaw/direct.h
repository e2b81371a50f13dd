/*
 * Where a reaction goes: estimates for preferences of rules.
 *
 * The numbers rank places in one molecule, or products of the same reactants; they predict no
 * ratios. A place is looked at as it was before the reaction: `skip` names the neighbour that the
 * reaction has put there (or BS_NO_SKIP), which does not count with all that hangs on it.
 */
#ifndef BACKSAW_DIRECT_H
#define BACKSAW_DIRECT_H

#include "backsaw/mol.h"

#define BS_NO_SKIP (-1)

typedef enum bs_attack { BS_BY_ELECTROPHILE, BS_BY_NUCLEOPHILE } bs_attack;

/*
 * How fast an aromatic carbon is attacked, as a decadic logarithm; a carbon of benzene has 0.
 *
 * The ring system counts by its localisation energy in Hückel's method (Wheland, J. Am. Chem. Soc.
 * 1942, 64, 900), substituents by their constants for meta and para positions (Brown and Okamoto,
 * J. Am. Chem. Soc. 1958, 80, 4979, for electrophiles), the second weighted with the charge that
 * the attack leaves on their atom. Groups beside the place hinder, the more with `bulk` (1 for a
 * small reagent, about 3 for a large one).
 *
 *   errors  BS_EVALUE  the atom is no aromatic carbon
 *           BS_ELIMIT  the aromatic system has more than 60 atoms
 */
bs_status bs_arene_rate(bs_ctx *cx, const bs_mol *mol, int atom, int skip, bs_attack attack,
                        double bulk, double *rate);

typedef enum bs_charge_kind { BS_AS_CATION, BS_AS_RADICAL, BS_AS_ANION } bs_charge_kind;

/*
 * How stable a cation, radical or anion would be at an atom, by what hangs on it; methyl has 0, a
 * tertiary alkyl cation 3. A double bond of the atom to `skip` does not count.
 */
double bs_atom_stability(const bs_mol *mol, int atom, int skip, bs_charge_kind kind);

#endif
