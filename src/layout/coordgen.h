/*
 * The C face of coordgen, the library that finds places for the atoms of one connected molecule.
 *
 * coordgen orders some of its work by address; coordgen.cpp hands it atoms and bonds whose
 * addresses rise with their numbers, so that equal input gives equal places.
 */
#ifndef LAYOUT_COORDGEN_H
#define LAYOUT_COORDGEN_H

#include <stdbool.h>
#include <stdint.h>

#ifdef __cplusplus
extern "C" {
#endif

typedef struct bs_coordgen_bond {
    uint32_t a, b;
    uint8_t order;    /* 1 to 3 */
    uint8_t geometry; /* 0 none, 1 cis, 2 trans, with regard to the two atoms beside */
    uint32_t beside_a, beside_b;
} bs_coordgen_bond;

typedef enum bs_coordgen_result {
    BS_COORDGEN_DONE,
    BS_COORDGEN_NO_MEMORY,
    BS_COORDGEN_REFUSED /* no usable places; a plainer drawing has to serve */
} bs_coordgen_result;

/*
 * Places `atom_count` connected atoms; bonds become about 1 long. `places` gets x and y of each.
 * `open` draws large rings like chains, which takes seconds where their true form would take hours.
 */
bs_coordgen_result bs_coordgen__place(uint32_t atom_count, const uint8_t *elements,
                                      uint32_t bond_count, const bs_coordgen_bond *bonds, bool open,
                                      double *places);

#ifdef __cplusplus
}
#endif

#endif
