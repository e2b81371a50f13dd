/*
 * Rings of a molecule: which bonds are in rings, a smallest set of smallest rings, and the other
 * rings that are as good as those.
 */
#ifndef CHEM_RING_H
#define CHEM_RING_H

#include "chem/mol.h"

/*
 * Rings with their atoms in order around. The first `sssr` are a smallest set of smallest rings;
 * those behind it are relevant too: no sum of shorter ones.
 */
typedef struct bs_rings {
    bs_ctx *cx;
    bs_arena *home;
    uint32_t count;
    uint32_t sssr;
    uint32_t *offsets; /* count + 1 */
    uint32_t *atoms;
    uint32_t ring_room, atom_room;
} bs_rings;

/* A two-connected piece of the molecule with more than one bond. */
typedef struct bs_block {
    const uint32_t *bonds;
    uint32_t bond_count;
    uint32_t atom_count;
} bs_block;

/* The ring systems. Blocks point into arrays of their own in `home`. */
typedef struct bs_blocks {
    bs_block *items;
    uint32_t count;
} bs_blocks;

/* Finds the ring systems and sets the ring marks of atoms and bonds. */
bs_status bs_ring__blocks(bs_ctx *cx, bs_arena *home, bs_mol *mol, bs_blocks *out);

/* Finds the rings of all ring systems. Leaves working memory in the scratch arena. */
bs_status bs_ring__find(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const bs_blocks *blocks,
                        bs_rings *out);

/* Adds a ring of `size` atoms whose memory the caller fills through *atoms. */
bs_status bs_ring__add(bs_rings *rings, uint32_t size, uint32_t **atoms);

/*
 * Finds the relevant rings of a ring system that is more than one ring. Members of the smallest
 * set go to `set`, the others to `more`. `local` has room for each atom of the molecule, and is
 * zero before and after. The scratch arena is left for the caller to rewind, as the lists of rings
 * may lie there.
 */
bs_status bs_cycle__find(bs_ctx *cx, const bs_mol *mol, const bs_block *block, uint32_t *local,
                         bs_rings *set, bs_rings *more);

#endif
