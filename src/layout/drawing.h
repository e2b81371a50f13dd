/* The inside of layout: a molecule on its way to a drawing. */
#ifndef LAYOUT_DRAWING_H
#define LAYOUT_DRAWING_H

#include "backsaw/layout.h"
#include "chem/mol.h"
#include "layout/hand.h"

/*
 * The molecule and the hydrogens that are drawn. Points of both stand in `at`, the hydrogens
 * behind the atoms; `host` names the atom of each hydrogen.
 */
typedef struct bs_drawing {
    bs_ctx *cx;
    const bs_mol *mol;
    uint32_t atom_count; /* of the molecule */
    uint32_t point_count;
    uint32_t *host;     /* by hydrogen */
    uint32_t *hydrogen; /* by atom: the point of its drawn hydrogen, or UINT32_MAX */
    bs_point *at;
} bs_drawing;

/*
 * Decides which hydrogens are drawn: those on a centre whose bonds all lie in rings, and those
 * that alone tell the geometry of a double bond. Makes the arrays in the scratch arena.
 */
bs_status bs_layout__begin(bs_drawing *d, bs_ctx *cx, const bs_mol *mol);

/*
 * A plain drawing of the connected piece with atom `start`: rings as polygons, chains as zigzags,
 * parts may overlap. `placed` tells which atoms have places and grows.
 */
bs_status bs_layout__plain(bs_drawing *d, uint32_t start, bool *placed);

/* Turns double bonds that are drawn the wrong way round; *wrong is how many stay so. */
bs_status bs_layout__mend_doubles(bs_drawing *d, int *wrong);

/* Chooses wedges for all centres; adds those that cannot be shown to layout->lost. */
bs_status bs_layout__choose_wedges(bs_drawing *d, bs_layout *layout);

/* Marks the double bonds whose geometry is open. */
bs_status bs_layout__mark_undecided(bs_drawing *d, bs_layout *layout);

/* The spokes of a centre in the order of its perm; returns their number, 3 or 4, or 0. */
int bs_layout__spokes(const bs_drawing *d, uint32_t centre, bs_spoke spokes[4], uint32_t ends[4]);

static inline bs_vector bs_layout__vector(const bs_drawing *d, uint32_t point)
{
    return (bs_vector){d->at[point].x, d->at[point].y, 0};
}

#endif
