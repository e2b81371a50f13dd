/*
 * Drafts: molecules while they are being put together. Readers and rewriting make a draft and
 * finish it; finishing assigns double bonds to aromatic parts (by matching), counts implied
 * hydrogens, folds hydrogens, finds rings and aromaticity, drops stereo marks that mean nothing,
 * and packs the block.
 *
 * A draft is filled directly or through the calls below. Its arrays live in the arena that was
 * named when it was made. Atoms and bonds are numbered from 0 in the order in which they came.
 */
#ifndef BACKSAW_DRAFT_H
#define BACKSAW_DRAFT_H

#include "backsaw/mol.h"

/* Hydrogens of a draft atom follow the valence. */
#define BS_DRAFT_IMPLIED (-1)

typedef struct bs_draft_atom {
    uint8_t element;
    int8_t charge;
    int16_t hydrogens; /* stated number, or BS_DRAFT_IMPLIED */
    uint16_t isotope;
    uint16_t label;
    bool aromatic; /* written as aromatic; a wish that finishing checks */
    bool gone;     /* removed; finishing leaves it out */
} bs_draft_atom;

enum {
    BS_DRAFT_ORDER_AROMATIC = 5 /* double or single is found by finishing */
};

typedef struct bs_draft_bond {
    uint32_t a, b;
    uint8_t order; /* 0 to 4 or BS_DRAFT_ORDER_AROMATIC */
    bool gone;
} bs_draft_bond;

#define BS_DRAFT_HYDROGEN UINT32_MAX /* in `around`: the implied hydrogen or lone pair */

/*
 * A stereo element, by the atoms around it. Tetrahedral: `centre`, four in `around`, perm 1 is
 * anticlockwise (@), 2 clockwise, seen from around[0]. Allene: the same, around the two ends of
 * the cumulene whose middle is `centre`. Square, bipyramid, octahedron: 4, 5, 6 in `around`,
 * `perm` as in OpenSMILES. Double bond (kind BS_DRAFT_DOUBLE): atoms centre = first end and
 * second = other end, around[0] beside the first, around[1] beside the second; perm 1 is cis,
 * 2 trans. In `around`, BS_DRAFT_HYDROGEN names the implied hydrogen of that end. The ends may be
 * those of an odd chain of double bonds.
 */
enum { BS_DRAFT_DOUBLE = 6 };

typedef struct bs_draft_stereo {
    uint8_t kind; /* BS_STEREO_... of chem/mol.h (1 tetrahedral, 2 allene, ...) or BS_DRAFT_DOUBLE */
    uint8_t perm; /* 0 removes the element */
    uint32_t centre;
    uint32_t second;
    uint32_t around[6];
    bool written; /* someone put it there on purpose: if it means nothing, a doubt remains */
} bs_draft_stereo;

typedef struct bs_draft {
    bs_ctx *cx;
    bs_arena *home;
    bs_draft_atom *atoms;
    bs_draft_bond *bonds;
    bs_draft_stereo *stereo;
    uint32_t atom_count, bond_count, stereo_count;
    uint32_t atom_room, bond_room, stereo_room;
} bs_draft;

/* An empty draft whose arrays live in `home`. Cannot fail. */
void bs_draft_init(bs_draft *draft, bs_ctx *cx, bs_arena *home);

/* Adds an atom; *index may be NULL. BS_ELIMIT above BS_MOL_MAX_ATOMS. */
bs_status bs_draft_add_atom(bs_draft *draft, bs_draft_atom atom, uint32_t *index);

/* Adds a bond between two atoms that are there. */
bs_status bs_draft_add_bond(bs_draft *draft, uint32_t a, uint32_t b, int order, uint32_t *index);

bs_status bs_draft_add_stereo(bs_draft *draft, bs_draft_stereo element);

/*
 * Makes a draft of a finished molecule: same atom and bond numbers, Kekulé orders, hydrogens
 * stated as they are, stereo elements as they are. Rewriting changes it and finishes it again;
 * an atom whose hydrogens shall follow its valence is set to BS_DRAFT_IMPLIED.
 */
bs_status bs_draft_from_mol(bs_draft *draft, const bs_mol *mol);

/*
 * Finishes a draft.
 *
 *   home    arena of the molecule
 *   order   if not NULL: gets an array (in `home`) that tells for each draft atom which atom of
 *           the molecule it became; UINT32_MAX for atoms that are gone or folded
 *   errors  BS_EVALUE  no way to place the double bonds of an aromatic part; a bond from an atom
 *                      to itself, two bonds between the same atoms; error.offset is the draft
 *                      atom, so that readers can turn it into a place in the text
 *           BS_ELIMIT  a count that does not fit
 *           BS_ENOMEM
 */
bs_status bs_draft_finish(bs_draft *draft, bs_arena *home, uint32_t **order, bs_mol **out);

#endif
