/* The guess for molecules that are not explored; bs_guess_steps() in search.h tells how. */
#ifndef SEARCH_GUESS_H
#define SEARCH_GUESS_H

#include "backsaw/search.h"
#include "core/map.h"

typedef struct bs_guess {
    bs_map listed; /* hashes of the surroundings of atoms on the shelf */
    bool by_list;  /* the shelf is a short list */
} bs_guess;

/* Looks at the shelf, which may be NULL. */
bs_status bs_guess__init(bs_guess *guess, bs_ctx *cx, const bs_shelf *shelf);

/* Allowed on a guess that is all zero. */
void bs_guess__free(bs_guess *guess);

/* Steps that it may take to make a molecule, 0 to 40. */
double bs_guess__steps(const bs_guess *guess, const bs_mol *mol);

#endif
