/*
 * Geometry of stereo: from places and wedges to hands, the same for writing and for reading.
 *
 * Perms are those of drafts: 1 is anticlockwise, seen from the first of the atoms around a centre,
 * 2 clockwise; cis is 1, trans is 2. 0 says that the picture tells nothing, or contradicts itself.
 */
#ifndef LAYOUT_HAND_H
#define LAYOUT_HAND_H

#include <stdbool.h>

typedef struct bs_vector {
    double x, y, z;
} bs_vector;

/*
 * A bond as seen from a centre. `wedge` is 1 where the bond rises from the centre towards the
 * viewer, -1 where it falls, else 0. Only bonds whose narrow end is the centre count.
 */
typedef struct bs_spoke {
    double x, y;
    int wedge;
} bs_spoke;

/*
 * The perm of a tetrahedral centre in a flat drawing: the order is that of the four spokes, or an
 * implied hydrogen (or lone pair) and then the three spokes.
 */
int bs_hand__flat(const bs_spoke *spokes, int count);

/* The same from places in space; `around` holds places relative to the centre. */
int bs_hand__solid(const bs_vector *around, int count);

/*
 * How well a wedge on a spoke shows the hand: the sine of the angle that decides, 0 to 1. Below
 * BS_HAND_CLEAR a reader takes it for no statement.
 */
double bs_hand__clarity(const bs_spoke *spokes, int count, int spoke);

#define BS_HAND_CLEAR 0.08

/* The sine of the angle between two bonds, 0 to 1. */
double bs_hand__sine(bs_vector a, bs_vector b);

/* A double bond a=b: whether the places beside them are cis (1) or trans (2); 0 near a line. */
int bs_hand__double(bs_vector a, bs_vector b, bs_vector beside_a, bs_vector beside_b);

/*
 * An allene between the ends `a` and `b`; `a` lies in the plane of the page, `beside_a` is its
 * neighbour there, and `wedge` is the wedge of a bond from `b` to a neighbour. The perm is for the
 * order: neighbour of a, other neighbour of a, neighbour of b, other neighbour of b.
 */
int bs_hand__flat_allene(bs_vector a, bs_vector b, bs_vector beside_a, int wedge);

/* The same in space. */
int bs_hand__solid_allene(bs_vector a, bs_vector b, bs_vector beside_a, bs_vector beside_b);

#endif
