/*
 * Molecules: immutable structures, perceived once when they are made.
 *
 * A `bs_mol` is one block without pointers: bs_mol_bytes() tells its size, memcpy copies it, and
 * the copy is as good as the original. Atoms and bonds are numbered from 0 in the order of the
 * input. A hydrogen is folded into its neighbour's count unless it has an isotope, a charge, a
 * label or no single neighbour; then it is an atom like others.
 *
 * Bonds keep a Kekulé order (1 to 4); aromatic ones carry a mark beside it. Groups that are
 * spelled with and without charges (nitro, azide, N-oxide; sulfoxide, phosphate, ylide,
 * perchlorate) have one form, so that both spellings are one molecule: charges on nitrogen, none
 * on elements that expand their octet.
 *
 * Stereo. A tetrahedral centre says how its neighbours stand, in the order: implied hydrogen or
 * lone pair first if there is one, then the neighbours in the order of bs_mol_neighbour(). Seen
 * from the first, the others run anticlockwise (`@`) or clockwise (`@@`), as in OpenSMILES. A
 * double bond is cis or trans with regard to the first neighbour of each end, in the same order,
 * the other end left out; for an odd chain of double bonds the middle one says it for the two ends
 * of the chain; the nitrogen of an imine without substituent has its hydrogen as the reference. Only
 * marks that mean something are kept.
 */
#ifndef BACKSAW_MOL_H
#define BACKSAW_MOL_H

#include "backsaw/core.h"

typedef struct bs_mol bs_mol;

#define BS_MOL_MAX_ATOMS ((1 << 24) - 2)

/* ---- The whole ------------------------------------------------------------------------- */

size_t bs_mol_bytes(const bs_mol *mol);
int bs_mol_atom_count(const bs_mol *mol);
int bs_mol_bond_count(const bs_mol *mol);

/* Sum of the formal charges. */
int bs_mol_charge(const bs_mol *mol);

/* A copy in `home`. */
bs_status bs_mol_copy(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_mol **out);

/* ---- Atoms ----------------------------------------------------------------------------- */

/* Atomic number; 0 is the unknown atom `*`. */
int bs_mol_atom_element(const bs_mol *mol, int atom);
int bs_mol_atom_charge(const bs_mol *mol, int atom);

/* All hydrogens on the atom, folded ones and those that are atoms. */
int bs_mol_atom_hydrogens(const bs_mol *mol, int atom);

/* Mass number, 0 where none is stated. */
int bs_mol_atom_isotope(const bs_mol *mol, int atom);

/* Atom class (map number), 0 for none. */
int bs_mol_atom_label(const bs_mol *mol, int atom);
bool bs_mol_atom_is_aromatic(const bs_mol *mol, int atom);
bool bs_mol_atom_in_ring(const bs_mol *mol, int atom);

/* Neighbours that are atoms. */
int bs_mol_atom_degree(const bs_mol *mol, int atom);

/* Neighbours that are carbon atoms. */
int bs_mol_atom_carbons(const bs_mol *mol, int atom);

/* The k-th neighbour of an atom (0 to degree - 1) and the bond to it; either out may be NULL. */
void bs_mol_neighbour(const bs_mol *mol, int atom, int k, int *neighbour, int *bond);

typedef enum bs_hand { BS_HAND_NONE, BS_HAND_ANTICLOCKWISE, BS_HAND_CLOCKWISE } bs_hand;

/* The hand of a tetrahedral centre, as explained above. */
bs_hand bs_mol_atom_hand(const bs_mol *mol, int atom);

/* ---- Bonds ----------------------------------------------------------------------------- */

void bs_mol_bond_ends(const bs_mol *mol, int bond, int *a, int *b);

/* The bond between two atoms, or -1. */
int bs_mol_bond_between(const bs_mol *mol, int a, int b);

/* Kekulé order, 1 to 4; 0 for a dative or zero-order bond. */
int bs_mol_bond_order(const bs_mol *mol, int bond);
bool bs_mol_bond_is_aromatic(const bs_mol *mol, int bond);
bool bs_mol_bond_in_ring(const bs_mol *mol, int bond);

typedef enum bs_geometry { BS_GEOMETRY_NONE, BS_GEOMETRY_CIS, BS_GEOMETRY_TRANS } bs_geometry;

bs_geometry bs_mol_bond_geometry(const bs_mol *mol, int bond);

/* ---- Rings ----------------------------------------------------------------------------- */

/* Number of rings of a smallest set of smallest rings. */
int bs_mol_ring_count(const bs_mol *mol);

/* The atoms of a ring in order around it; returns its size. `atoms` points into the molecule. */
int bs_mol_ring(const bs_mol *mol, int ring, const uint32_t **atoms);

/* ---- Derived --------------------------------------------------------------------------- */

/* Hill formula without charge, such as "C2H6O"; isotopes count as their element. */
bs_status bs_mol_formula(bs_ctx *cx, bs_arena *home, const bs_mol *mol, char **out);

/*
 * Average molar mass in g/mol from the abridged standard atomic weights of 2021 (IUPAC CIAAW);
 * a stated isotope counts with its own mass.
 *
 *   errors  BS_EVALUE  an element without standard atomic weight and without stated isotope
 */
bs_status bs_mol_mass(bs_ctx *cx, const bs_mol *mol, double *mass_g_per_mol);

/* Mass of the most abundant isotopes (or the stated ones) in u; AME2020. Electrons count. */
bs_status bs_mol_exact_mass(bs_ctx *cx, const bs_mol *mol, double *mass_u);

/*
 * Bertz's index of molecular complexity (1981), on the graph of heavy atoms with aromatic bonds of
 * order 1.5; a dative bond counts as single. Atoms are alike if they have the same distances to
 * their hundred nearest atoms, a bond being 1/order long; elements make no difference there, only in
 * the second part of the index. 0 for a single atom.
 *
 *   errors  BS_ENOMEM, BS_ESTOPPED
 *   cost    O(atoms), at most a hundred atoms looked at for each
 */
bs_status bs_mol_complexity(bs_ctx *cx, const bs_mol *mol, double *index);

/*
 * What is strange, in lines of text that name atoms by their 1-based numbers: unknown elements,
 * unusual valences, and stereo marks of the input that mean nothing where they stand and were left
 * out. None for most molecules.
 */
bs_status bs_mol_doubts(bs_ctx *cx, bs_arena *home, const bs_mol *mol, char ***texts, int *count);

/* Multiple bonds that their ring is too small for. */
typedef enum bs_strain {
    BS_STRAIN_NONE,
    BS_STRAIN_BRIDGEHEAD, /* a double bond at a bridgehead, against Bredt's rule */
    BS_STRAIN_ALKYNE,     /* a triple bond in a ring of fewer than eight */
    BS_STRAIN_ALLENE      /* cumulated double bonds in a ring of fewer than nine */
} bs_strain;

/*
 * The first bond with number `from` or higher that cannot be where it is: `*bond`, and what is wrong
 * with it. BS_STRAIN_NONE and -1 if there is none. A bridgehead may have a double bond if the larger
 * ring through it has eight members (Wiseman 1967, from memory). Aromatic rings are not looked at.
 */
bs_status bs_mol_strain(bs_ctx *cx, const bs_mol *mol, int from, bs_strain *kind, int *bond);

/*
 * The connected pieces, each with its atoms in the order of the whole, the pieces in the order of
 * their first atoms.
 */
bs_status bs_mol_fragments(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_mol ***pieces,
                           int *count);

/* The symbol of an element ("C"; "*" for 0), or NULL above 118. */
const char *bs_element_symbol(int atomic_number);

/* Atomic number of a symbol of `length` bytes, case as in "Cl"; -1 if there is none. */
int bs_element_number(const char *symbol, size_t length);

/* ---- Identity -------------------------------------------------------------------------- */

/*
 * A canonical order: rank[i] is the place of atom i, 0 to atoms - 1. Two molecules that differ
 * only in the order of atoms get orders under which they are equal, stereo included. Labels
 * (atom classes) take no part.
 *
 *   errors  BS_ELIMIT  the molecule is too symmetrical for the search's bound
 *   cost    about O(n log n) for molecules without high symmetry
 */
bs_status bs_mol_canonical_order(bs_ctx *cx, bs_arena *home, const bs_mol *mol, int **rank);

/*
 * Classes of atoms that are alike by symmetry, 0-based; alike atoms share a number. Exact: orbits
 * of the automorphisms that keep stereo, so the two halves of a meso compound, which are mirror
 * images, are not alike.
 */
bs_status bs_mol_symmetry(bs_ctx *cx, bs_arena *home, const bs_mol *mol, int **classes);

/*
 * CIP labels by the sequence rules 1a to 5 of the IUPAC recommendations of 2013 (P-92): for each
 * atom 'R', 'S', 'r', 's' or 0, for each bond 'E', 'Z' or 0. Centres that are not tetrahedral and
 * allenes get none.
 *
 *   errors  BS_ELIMIT  too many rings or atoms for the bound on the search; no label is given
 */
bs_status bs_mol_cip(bs_ctx *cx, bs_arena *home, const bs_mol *mol, char **atom_labels,
                     char **bond_labels);

#endif
