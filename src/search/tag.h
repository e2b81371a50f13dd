/*
 * Tags: atoms of the target that are followed through the search, as with isotopic labels.
 *
 * A tagged atom carries an isotope number that no nuclide has, so that rules, canonical SMILES and
 * the graph keep compounds apart that differ in where the atoms of the target lie. What comes in
 * from outside (prices, known steps) and goes out (callbacks, routes) is plain.
 */
#ifndef SEARCH_TAG_H
#define SEARCH_TAG_H

#include "backsaw/mol.h"

#define BS_TAG_FIRST 600 /* isotope number of tag 0; no nuclide has so many nucleons */
#define BS_TAG_MOST 400

typedef struct bs_tags {
    int count;
    uint16_t isotope[BS_TAG_MOST]; /* that the tagged atom has, 0 for none */
} bs_tags;

/* The tag of an atom, or -1. */
int bs_tag__of(const bs_mol *mol, int atom);

/* The atom with this tag, or -1. */
int bs_tag__find(const bs_mol *mol, int tag);

/* Whether two tagged atoms are there, and bonded. */
bool bs_tag__bonded(const bs_mol *mol, int a, int b);

/* A copy in which atom i has isotope[i], where that is not 0. */
bs_status bs_tag__put(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const uint16_t *isotope,
                      bs_mol **out);

/* Whether canonical SMILES has tags. Cheap. */
bool bs_tag__is_tagged(const char *smiles);

/*
 * A molecule without tags; atoms keep their numbers. The SMILES is canonical. Either result may be
 * NULL if it is not wanted.
 */
bs_status bs_tag__strip(bs_ctx *cx, bs_arena *home, const bs_tags *tags, const bs_mol *mol,
                        bs_mol **out, char **smiles);

/* Canonical SMILES without tags: the same text if it has none, else made in `home`. */
bs_status bs_tag__plain(bs_ctx *cx, bs_arena *home, const bs_tags *tags, const char *smiles,
                        const char **out);

#endif
