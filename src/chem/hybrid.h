/* Hybridisation, for molecules and for the matcher's own copies of their atoms. */
#ifndef CHEM_HYBRID_H
#define CHEM_HYBRID_H

#include "chem/mol.h"

/*
 * Hybridisation as bs_mol_atom_hybridisation() gives it, from the parts of a molecule;
 * `connections` are neighbours and folded hydrogens.
 */
int bs_hybrid__of(const bs_atom *atoms, const bs_bond *bonds, const uint32_t *offsets,
                  const bs_link *links, uint32_t atom, int connections);

#endif
