/*
 * Descriptors: what can be counted and compared on a molecule. Rings of other kinds than the
 * smallest set, hybridisation, the skeleton of rings and linkers, and circular fingerprints.
 */
#ifndef BACKSAW_DESCRIPTOR_H
#define BACKSAW_DESCRIPTOR_H

#include "backsaw/mol.h"

/* ---- Rings ----------------------------------------------------------------------------- */

/* Lists of atoms, one behind the other: list i is atoms[offsets[i]] to atoms[offsets[i + 1]]. */
typedef struct bs_atom_lists {
    int count;
    uint32_t *offsets; /* count + 1 */
    uint32_t *atoms;
} bs_atom_lists;

/*
 * The relevant cycles (P. Vismara, Electron. J. Combin. 1997, 4, R9): every ring that is no sum of
 * shorter ones, each in order around. Other than the smallest set they do not hang on the order of
 * the atoms. Of a family of more than 64 rings through the same two atoms one stands for all.
 *
 *   errors  BS_ENOMEM, BS_ELIMIT, BS_ESTOPPED
 */
bs_status bs_mol_relevant_rings(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_atom_lists *out);

/*
 * The ring systems: rings that share a bond belong to one, so a spiro atom stands in two. Atoms
 * ascend; the systems come in the order of their first atoms.
 */
bs_status bs_mol_ring_systems(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_atom_lists *out);

/* ---- Atoms ----------------------------------------------------------------------------- */

/*
 * Hybridisation as ^ in SMARTS has it: 1 sp, 2 sp2, 3 sp3, 4 sp3d, 5 sp3d2, 0 for a bare atom. By
 * neighbours and lone pairs; a lone pair of nitrogen or oxygen beside a double bond counts to it.
 */
int bs_mol_atom_hybridisation(const bs_mol *mol, int atom);

/* What lies around an atom, or around several, such as the ends of a bond. */
typedef struct bs_environment {
    uint64_t key; /* equal for alike environments, whatever the order of atoms */
    int atom_count;
    uint32_t *atoms;     /* nearest first */
    uint32_t *distances; /* bonds to the nearest centre */
    int bond_count;
    uint32_t *bonds; /* whose nearer end is less than `radius` away */
} bs_environment;

/*
 * The environment of `centres` (1 or more atoms) out to `radius` (0 to 10) bonds. The key tells
 * what bs_mol_surroundings() tells apart.
 *
 *   errors  BS_ERANGE  no such atom, or the radius is out of range
 */
bs_status bs_mol_environment(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const uint32_t *centres,
                             int centre_count, int radius, bs_environment *out);

/* ---- Skeleton -------------------------------------------------------------------------- */

/*
 * The framework of G. W. Bemis and M. A. Murcko, J. Med. Chem. 1996, 39, 2887: the rings and the
 * chains between them, with the atoms that hang on them by double bonds. Hydrogens take the place
 * of what is cut off; a stereo element that loses a neighbour is left out. *out is NULL for a molecule without rings.
 */
bs_status bs_mol_skeleton(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_mol **out);

/* ---- Fingerprints ---------------------------------------------------------------------- */

/* A surrounding of an atom, out to `radius` bonds. Equal keys mean alike surroundings. */
typedef struct bs_surrounding {
    uint64_t key;
    uint32_t atom;
    uint32_t radius;
} bs_surrounding;

/*
 * The circular surroundings of all atoms out to `radius` (0 to 10), after the idea of D. Rogers and
 * M. Hahn, J. Chem. Inf. Model. 2010, 50, 742: of those that hold the same bonds one is kept.
 * Elements, charges, isotopes, hydrogens, degrees, rings and bonds count; stereo does not. Sorted
 * by key; keys come more than once where surroundings are alike.
 */
bs_status bs_mol_surroundings(bs_ctx *cx, bs_arena *home, const bs_mol *mol, int radius,
                              bs_surrounding **out, int *count);

/*
 * Folds surroundings into `bits` bits (64 to 65536, a power of two); `words` has bits / 64 words.
 */
void bs_fingerprint_fold(const bs_surrounding *items, int count, int bits, uint64_t *words);

/* Bits that both have over bits that one has, 0 to 1; 1 if neither has any. */
double bs_fingerprint_tanimoto(const uint64_t *a, const uint64_t *b, int bits);

#endif
