/*
 * The geometry of hand.h.
 *
 * A wedge stands for a step out of the page of the length of a bond. One wedge among four bonds
 * tells the hand by the turn of the other three; one among three bonds by the turn of the other
 * two, the hydrogen lying opposite to the sum of the bonds. Where several wedges
 * contradict each other, nothing is known: readers would differ. This agrees with IUPAC's
 * recommendations of 2006 on drawings of stereochemical configuration.
 */
#include "layout/hand.h"

#include <math.h>

/* Smallest volume of a tetrahedron of unit vectors that is not flat. */
#define SOLID_VOLUME 0.1

/* Shortest sum of three unit vectors that do not lie in a plane. */
#define FLAT_SUM 0.2

static bs_vector minus(bs_vector a, bs_vector b)
{
    return (bs_vector){a.x - b.x, a.y - b.y, a.z - b.z};
}

static bs_vector cross(bs_vector a, bs_vector b)
{
    return (bs_vector){a.y * b.z - a.z * b.y, a.z * b.x - a.x * b.z, a.x * b.y - a.y * b.x};
}

static double dot(bs_vector a, bs_vector b)
{
    return a.x * b.x + a.y * b.y + a.z * b.z;
}

static double length(bs_vector a)
{
    return sqrt(dot(a, a));
}

static bs_vector unit(bs_vector a)
{
    double l = length(a);

    return l > 0 ? (bs_vector){a.x / l, a.y / l, a.z / l} : a;
}

static bs_vector flat_unit(bs_spoke s)
{
    return unit((bs_vector){s.x, s.y, 0});
}

/*
 * How the spokes other than `spoke` turn, taken in their order and seen from the viewer: positive
 * for anticlockwise. For three others this is the area of the triangle between their ends.
 */
static double turn_of_others(const bs_spoke *spokes, int count, int spoke)
{
    bs_vector other[3];
    int n = 0;

    if (count == 3) {
        other[0] = flat_unit(spokes[(spoke + 1) % 3]);
        other[1] = flat_unit(spokes[(spoke + 2) % 3]);
        return cross(other[0], other[1]).z;
    }
    for (int k = 0; k < 4; k++) {
        if (k != spoke)
            other[n++] = flat_unit(spokes[k]);
    }
    return cross(minus(other[1], other[0]), minus(other[2], other[0])).z / 2;
}

double bs_hand__clarity(const bs_spoke *spokes, int count, int spoke)
{
    double least = 1;

    if (count == 3)
        return fmin(1, fabs(turn_of_others(spokes, count, spoke)));
    /* Three bonds turn one way or the other however close they are, unless two coincide. */
    for (int a = 0; a < 4; a++) {
        for (int b = a + 1; b < 4; b++) {
            if (a != spoke && b != spoke)
                least = fmin(least, length(minus(flat_unit(spokes[a]), flat_unit(spokes[b]))));
        }
    }
    return least;
}

int bs_hand__flat(const bs_spoke *spokes, int count)
{
    double sum = 0;
    double total = 0;

    if (count != 3 && count != 4)
        return 0;
    for (int k = 0; k < count; k++) {
        double turn = turn_of_others(spokes, count, k) * spokes[k].wedge;

        if (spokes[k].wedge == 0 || bs_hand__clarity(spokes, count, k) < BS_HAND_CLEAR)
            continue;
        /* Of four, the wedged bond moves to the front; of three, the viewer is the hydrogen. */
        sum += count == 3 || k % 2 == 1 ? -turn : turn;
        total += fabs(turn);
    }
    if (total == 0 || fabs(sum) < 0.9 * total)
        return 0;
    return sum > 0 ? 1 : 2;
}

/* The perm of four places; seen from the first, the others of a positive volume run clockwise. */
static int perm_of_four(bs_vector p, bs_vector q, bs_vector r, bs_vector s)
{
    double volume = dot(minus(q, p), cross(minus(r, p), minus(s, p)));

    if (!(fabs(volume) > SOLID_VOLUME))
        return 0;
    return volume < 0 ? 1 : 2;
}

int bs_hand__solid(const bs_vector *around, int count)
{
    bs_vector u[4];

    if (count != 3 && count != 4)
        return 0;
    for (int k = 0; k < count; k++)
        u[k + 4 - count] = unit(around[k]);
    if (count == 3) {
        bs_vector sum = {u[1].x + u[2].x + u[3].x, u[1].y + u[2].y + u[3].y,
                         u[1].z + u[2].z + u[3].z};

        /* Three bonds in a plane tell nothing. */
        if (length(sum) < FLAT_SUM)
            return 0;
        u[0] = unit((bs_vector){-sum.x, -sum.y, -sum.z});
    }
    return perm_of_four(u[0], u[1], u[2], u[3]);
}

double bs_hand__sine(bs_vector a, bs_vector b)
{
    return length(cross(unit(a), unit(b)));
}

int bs_hand__double(bs_vector a, bs_vector b, bs_vector beside_a, bs_vector beside_b)
{
    bs_vector axis = unit(minus(b, a));
    bs_vector side_a = cross(axis, unit(minus(beside_a, a)));
    bs_vector side_b = cross(axis, unit(minus(beside_b, b)));
    double same;

    if (!(length(side_a) > BS_HAND_CLEAR) || !(length(side_b) > BS_HAND_CLEAR))
        return 0;
    same = dot(unit(side_a), unit(side_b));
    /* In space, a bond twisted by about 90 degrees tells nothing. */
    if (fabs(same) < 0.2)
        return 0;
    return same > 0 ? 1 : 2;
}

/* `a` and `b` become ends of a staggered frame whose axis lies along x. */
static int perm_of_allene(bs_vector axis, bs_vector out_a, bs_vector out_b)
{
    bs_vector back = {-axis.x, -axis.y, -axis.z};

    return perm_of_four(unit((bs_vector){back.x + out_a.x, back.y + out_a.y, back.z + out_a.z}),
                        unit((bs_vector){back.x - out_a.x, back.y - out_a.y, back.z - out_a.z}),
                        unit((bs_vector){axis.x + out_b.x, axis.y + out_b.y, axis.z + out_b.z}),
                        unit((bs_vector){axis.x - out_b.x, axis.y - out_b.y, axis.z - out_b.z}));
}

/* The part of a bond that stands square on the axis, of length 1; zero near a line. */
static bs_vector square_on(bs_vector axis, bs_vector bond)
{
    bs_vector u = unit(bond);
    double along = dot(axis, u);
    bs_vector out = {u.x - along * axis.x, u.y - along * axis.y, u.z - along * axis.z};

    return length(out) > BS_HAND_CLEAR ? unit(out) : (bs_vector){0, 0, 0};
}

int bs_hand__flat_allene(bs_vector a, bs_vector b, bs_vector beside_a, int wedge)
{
    bs_vector axis = unit(minus(b, a));

    return perm_of_allene(axis, square_on(axis, minus(beside_a, a)),
                          (bs_vector){0, 0,
                                      wedge > 0   ? 1
                                      : wedge < 0 ? -1
                                                  : 0});
}

int bs_hand__solid_allene(bs_vector a, bs_vector b, bs_vector beside_a, bs_vector beside_b)
{
    bs_vector axis = unit(minus(b, a));

    return perm_of_allene(axis, square_on(axis, minus(beside_a, a)),
                          square_on(axis, minus(beside_b, b)));
}
