/*
 * Text formats of molecules: SMILES in and out, InChI out.
 */
#ifndef BACKSAW_FORMAT_H
#define BACKSAW_FORMAT_H

#include "backsaw/mol.h"

/*
 * Reads one OpenSMILES string. White space ends it; what follows is left to the caller.
 *
 *   home    arena of the result
 *   used    if not NULL, gets the number of bytes read
 *   errors  BS_ESYNTAX, BS_EVALUE  with the byte offset; the message says what was expected
 *           BS_ELIMIT              more atoms, rings or branches than fit
 *   cost    O(length) and perception; no recursion
 */
bs_status bs_smiles_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length, size_t *used,
                         bs_mol **out);

enum {
    BS_SMILES_LABELS = 1,   /* write atom classes */
    BS_SMILES_NO_STEREO = 2 /* leave stereo out */
};

/* Writes SMILES with the atoms in the order of the molecule as far as the tree allows. */
bs_status bs_smiles_write(bs_ctx *cx, bs_arena *home, const bs_mol *mol, unsigned flags, char **out);

/*
 * Writes canonical SMILES: equal for equal molecules, whatever the order of their atoms, and a
 * fixed point of reading and writing. Labels take no part unless asked for.
 *
 *   errors  BS_ELIMIT as bs_mol_canonical_order()
 */
bs_status bs_smiles_canonical(bs_ctx *cx, bs_arena *home, const bs_mol *mol, unsigned flags,
                              char **out);

/*
 * The canonical SMILES, and where its atoms are: order[k] is the atom that was written k-th. The
 * bracket or symbol of that atom starts at byte at[k] if `at` is not NULL. Hydrogens that are atoms
 * for their labels only are not written without labels; they come last, at their neighbour's place.
 */
bs_status bs_smiles_canonical_order(bs_ctx *cx, bs_arena *home, const bs_mol *mol, unsigned flags,
                                    char **out, uint32_t **order, uint32_t **at);

/* Standard InChI, or with `key` the InChIKey, through libinchi; one call at a time, by a lock. */
bs_status bs_inchi(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bool key, char **out);

#endif
