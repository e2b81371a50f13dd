/*
 * Layout: flat drawings of molecules, for pictures and for molfiles.
 *
 * A layout gives every atom a place on the page (x to the right, y upwards, bonds about 1 long)
 * and says how stereo shows: wedges for centres, the places themselves for double bonds. It is
 * true to the molecule: whoever reads the drawing finds the same stereo elements. Some need a
 * hydrogen that the molecule only counts; such hydrogens come beside the atoms.
 */
#ifndef BACKSAW_LAYOUT_H
#define BACKSAW_LAYOUT_H

#include "backsaw/mol.h"

typedef struct bs_point {
    double x, y;
} bs_point;

/* Up is towards the viewer (a solid wedge), down away from the viewer (a hashed one). */
typedef enum bs_wedge { BS_WEDGE_NONE, BS_WEDGE_UP, BS_WEDGE_DOWN } bs_wedge;

typedef struct bs_layout_bond {
    uint8_t wedge;  /* bs_wedge; the narrow end is at the centre that it tells of */
    bool from_b;    /* the narrow end is the second end of the bond */
    bool undecided; /* a double bond that has a geometry, but the molecule does not say which */
} bs_layout_bond;

/* A counted hydrogen that is drawn, on a single bond whose narrow end is `atom`. */
typedef struct bs_layout_hydrogen {
    int atom;
    bs_wedge wedge;
    bs_point at;
} bs_layout_hydrogen;

typedef struct bs_layout {
    int atom_count, bond_count, hydrogen_count;
    bs_point *atoms;
    bs_layout_bond *bonds;
    bs_layout_hydrogen *hydrogens;
    int lost; /* stereo elements that a flat drawing cannot show, such as octahedral ones */
} bs_layout;

/*
 * Lays a molecule out. Pieces stand side by side in the order of their first atoms.
 *
 *   home    arena of the result
 *   errors  BS_ENOMEM, BS_ESTOPPED
 *   cost    some milliseconds for 30 atoms, seconds for 200 or for several large rings; pieces of
 *           more than 200 atoms or with too many large rings get a plain drawing in which parts may
 *           overlap, in linear time
 */
bs_status bs_layout_make(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_layout **out);

#endif
