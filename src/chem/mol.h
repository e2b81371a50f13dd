/*
 * The inside of a molecule: the layout of the block and the fast accessors for the other layers.
 *
 * One block: header, atoms (16 bytes each), bonds (8 each), adjacency offsets, adjacency (8 for
 * each end of a bond), ring offsets, ring atoms. Offsets in the header count bytes from its
 * start. The neighbours of an atom stand in the order of their bonds.
 */
#ifndef CHEM_MOL_H
#define CHEM_MOL_H

#include "backsaw/mol.h"

enum {
    BS_ATOM_AROMATIC = 1,
    BS_ATOM_RING = 2,
    BS_ATOM_BRACKET = 4, /* hydrogens are not those that the valence would imply */
    BS_ATOM_ODD = 8,     /* valence outside the usual ones; see doubts */
    BS_ATOM_UNMARKED = 16 /* was marked as a stereo centre, which means nothing here */
};

/* Kinds of stereo on an atom. `perm` counts from 1 as in @TH1, @AL2, @SP3, @TB20, @OH30. */
enum {
    BS_STEREO_NONE,
    BS_STEREO_TETRAHEDRAL,
    BS_STEREO_ALLENE,
    BS_STEREO_SQUARE,
    BS_STEREO_TRIGONAL_BIPYRAMID,
    BS_STEREO_OCTAHEDRON
};

typedef struct bs_atom {
    uint8_t element;
    int8_t charge;
    uint8_t hydrogens; /* folded ones only */
    uint8_t flags;
    uint16_t isotope;
    uint16_t label;
    uint8_t degree;
    uint8_t valence;    /* sum of Kekulé orders + folded hydrogens */
    uint8_t ring_count; /* rings of the SSSR through the atom */
    uint8_t ring_bonds;
    uint16_t min_ring; /* size of the smallest ring through it, 0 for none */
    uint8_t stereo;    /* BS_STEREO_... */
    uint8_t perm;      /* 1-based, neighbours in adjacency order, implied hydrogen first */
} bs_atom;

enum {
    BS_BOND_AROMATIC = 1,
    BS_BOND_RING = 2,
    BS_BOND_CIS = 4,
    BS_BOND_TRANS = 8,
    BS_BOND_UNMARKED = 16 /* was marked as cis or trans, which means nothing here */
};

typedef struct bs_bond {
    unsigned a : 24;
    unsigned order : 8;
    unsigned b : 24;
    unsigned flags : 8;
} bs_bond;

typedef struct bs_link {
    uint32_t atom;
    uint32_t bond;
} bs_link;

struct bs_mol {
    uint32_t bytes;
    uint32_t atom_count;
    uint32_t bond_count;
    uint32_t ring_count;
    uint32_t bonds_at;
    uint32_t offsets_at;
    uint32_t links_at;
    uint32_t rings_at; /* ring_count + 1 offsets into the ring atoms */
    uint32_t ring_atoms_at;
    int32_t charge;
    uint64_t features[2]; /* for the screens of match; filled by bs_mol__features() */
    bs_atom atoms[];
};

_Static_assert(sizeof(bs_atom) == 16, "an atom has 16 bytes");
_Static_assert(sizeof(bs_bond) == 8, "a bond has 8 bytes");

static inline const void *bs_mol__at(const bs_mol *mol, uint32_t offset)
{
    return (const char *)mol + offset;
}

static inline const bs_bond *bs_mol__bonds(const bs_mol *mol)
{
    return bs_mol__at(mol, mol->bonds_at);
}

/* The neighbours of an atom; there are atoms[atom].degree of them. */
static inline const bs_link *bs_mol__links(const bs_mol *mol, uint32_t atom)
{
    const uint32_t *offsets = bs_mol__at(mol, mol->offsets_at);
    const bs_link *links = bs_mol__at(mol, mol->links_at);

    return links + offsets[atom];
}

static inline uint32_t bs_bond__other(const bs_bond *bond, uint32_t atom)
{
    return bond->a == atom ? bond->b : bond->a;
}

/* Hydrogens in all: folded ones and neighbours that are hydrogen atoms. */
int bs_mol__total_hydrogens(const bs_mol *mol, uint32_t atom);

#endif
