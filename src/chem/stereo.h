/* Stereo elements: the order in which a molecule names the atoms around one. */
#ifndef CHEM_STEREO_H
#define CHEM_STEREO_H

#include "chem/draft.h"

/*
 * The atoms around a centre in the order to which `perm` refers: an implied hydrogen or lone pair
 * (BS_DRAFT_HYDROGEN) first, then the neighbours in the order of the links; for an allene, this
 * for the end to which the first link of the centre leads, then for the other end. Returns their
 * number, or 0 if the kind does not fit the surroundings.
 */
int bs_stereo__around(const bs_mol *mol, uint32_t atom, int kind, uint32_t around[6]);

/* The neighbour of one end of a double bond to which its geometry refers; see backsaw/mol.h. */
uint32_t bs_stereo__reference(const bs_mol *mol, uint32_t end, uint32_t other);

/*
 * The perm that says in the order `to` what `perm` says in the order `from`; both list the same
 * `count` atoms. 0 if they do not, or if an atom stands twice.
 */
int bs_stereo__permute(int kind, int perm, int count, const uint32_t *from, const uint32_t *to);

/* Number of perms of a kind: 2, 2, 3, 20, 30. */
int bs_stereo__perm_count(int kind);

/* Whether an atom can be a centre of a kind, going by its element and its surroundings. */
bool bs_stereo__can_be_centre(const bs_mol *mol, uint32_t atom, int kind);

#endif
