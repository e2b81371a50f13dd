/*
 * Proof-number search: L. V. Allis, M. van der Meulen & H. J. van den Herik, Artif. Intell. 1994,
 * 66, 91.
 *
 * The proof number of a molecule is how many open molecules must be had at least for it to be had;
 * it is front->hoped with a leaf of 1 for each, and so heeds circles. The disproof number is how
 * many must turn out not to be had for it not to be. It is summed along steps that lead further
 * from the target only, where there are no circles; it guides the search, and proves nothing.
 */
#ifndef SEARCH_PROOF_H
#define SEARCH_PROOF_H

#include "search/explore.h"

/* Brings the disproof numbers up to date after an expansion. */
bs_status bs_proof__update(bs_explore *x, uint32_t first_new);

/* The most proving molecule, or BS_GRAPH_NONE if the target cannot be had by anything open. */
uint32_t bs_proof__pick(const bs_explore *x);

#endif
