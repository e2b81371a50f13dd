/*
 * Perms of stereo centres under a change of the order in which the neighbours are named.
 *
 * Classes and their numbers are those of OpenSMILES. For the classes beyond tetrahedral, each perm
 * is kept as an arrangement: which neighbour stands at which corner of a fixed figure. Renaming
 * the neighbours gives another arrangement, and its perm is the one whose arrangement can be
 * turned into it by a rotation of the figure.
 */
#include "chem/stereo.h"

#include <string.h>

/* Square: corners 0 to 3 in order around; the shapes that the neighbours a, b, c, d draw. */
static const uint8_t square[3][4] = {
    {0, 1, 2, 3}, /* U: one after the other */
    {0, 2, 1, 3}, /* 4: a opposite b */
    {0, 1, 3, 2}, /* Z: a opposite d */
};

/* Axis ends as places in the list of neighbours, and whether the others run anticlockwise. */
typedef struct axis {
    uint8_t from, to;
    bool anticlockwise;
} axis;

static const axis bipyramid[20] = {
    {0, 4, true},  {0, 4, false}, {0, 3, true},  {0, 3, false}, {0, 2, true},
    {0, 2, false}, {0, 1, true},  {0, 1, false}, {1, 4, true},  {1, 3, true},
    {1, 4, false}, {1, 3, false}, {1, 2, true},  {1, 2, false}, {2, 4, true},
    {2, 3, true},  {3, 4, true},  {3, 4, false}, {2, 3, false}, {2, 4, false},
};

typedef struct octahedron {
    char shape; /* U, Z or 4: how the four others are visited */
    uint8_t to; /* the axis starts at the first neighbour */
    bool anticlockwise;
} octahedron;

static const octahedron octahedra[30] = {
    {'U', 5, true},  {'U', 5, false}, {'U', 4, true},  {'Z', 5, true},  {'Z', 4, true},
    {'U', 3, true},  {'Z', 3, true},  {'4', 5, true},  {'4', 4, true},  {'4', 5, false},
    {'4', 4, false}, {'4', 3, true},  {'4', 3, false}, {'Z', 5, false}, {'Z', 4, false},
    {'U', 4, false}, {'Z', 3, false}, {'U', 3, false}, {'U', 2, true},  {'Z', 2, true},
    {'4', 2, true},  {'4', 2, false}, {'Z', 2, false}, {'U', 2, false}, {'U', 1, true},
    {'Z', 1, true},  {'4', 1, true},  {'4', 1, false}, {'Z', 1, false}, {'U', 1, false},
};

int bs_stereo__perm_count(int kind)
{
    static const uint8_t counts[] = {0, 2, 2, 3, 20, 30};

    return counts[kind];
}

/*
 * The arrangement of a perm: corner[k] is the corner of neighbour k. Bipyramid: corners 0 and 4
 * are the apices, 1 to 3 run anticlockwise seen from corner 0. Octahedron: 0 and 5 opposite, 1 to 4
 * anticlockwise seen from 0.
 */
static void arrange(int kind, int perm, uint8_t corner[6])
{
    int count = kind == BS_STEREO_SQUARE ? 4 : kind == BS_STEREO_OCTAHEDRON ? 6 : 5;
    int around = count - 2;
    uint8_t visit[4] = {0, 1, 2, 3};
    axis line;
    int next = 0;

    if (kind == BS_STEREO_SQUARE) {
        memcpy(corner, square[perm - 1], 4);
        return;
    }
    if (kind == BS_STEREO_OCTAHEDRON) {
        const octahedron *o = &octahedra[perm - 1];

        line = (axis){0, o->to, o->anticlockwise};
        if (o->shape == 'Z') {
            visit[2] = 3;
            visit[3] = 2;
        } else if (o->shape == '4') {
            visit[1] = 2;
            visit[2] = 1;
        }
    } else {
        line = bipyramid[perm - 1];
    }
    corner[line.from] = 0;
    corner[line.to] = (uint8_t)(count - 1);
    for (int k = 0; k < count; k++) {
        int step;

        if (k == line.from || k == line.to)
            continue;
        step = visit[next++];
        corner[k] = (uint8_t)(1 + (line.anticlockwise ? step : (around - step) % around));
    }
}

/* Turns of the figure that generate its rotations: where each corner goes. */
static const uint8_t turns[3][2][6] = {
    {{1, 2, 3, 0}, {3, 2, 1, 0}},             /* square; it may be turned over */
    {{0, 2, 3, 1, 4}, {4, 1, 3, 2, 0}},       /* bipyramid */
    {{0, 2, 3, 4, 1, 5}, {1, 5, 2, 0, 4, 3}}, /* octahedron */
};

/* A number for an arrangement, least over all rotations: walks them all from the generators. */
static uint32_t least_form(int kind, int count, const uint8_t corner[6])
{
    uint8_t seen[24][6];
    int found = 1;
    uint32_t least = UINT32_MAX;

    memcpy(seen[0], corner, 6);
    for (int i = 0; i < found; i++) {
        uint32_t code = 0;

        for (int k = 0; k < count; k++)
            code = code * 6 + seen[i][k];
        if (code < least)
            least = code;
        for (int t = 0; t < 2; t++) {
            uint8_t turned[6] = {0};
            bool known = false;

            for (int k = 0; k < count; k++)
                turned[k] = turns[kind - BS_STEREO_SQUARE][t][seen[i][k]];
            for (int j = 0; j < found && !known; j++)
                known = memcmp(seen[j], turned, (size_t)count) == 0;
            if (!known && found < 24)
                memcpy(seen[found++], turned, 6);
        }
    }
    return least;
}

int bs_stereo__permute(int kind, int perm, int count, const uint32_t *from, const uint32_t *to)
{
    uint8_t place[6]; /* of each atom of `to` in `from` */
    uint8_t corner[6] = {0};
    uint8_t renamed[6] = {0};
    bool odd = false;
    uint32_t form;

    for (int k = 0; k < count; k++) {
        int at = 0;

        while (at < count && from[at] != to[k])
            at++;
        if (at == count)
            return 0;
        place[k] = (uint8_t)at;
        for (int j = 0; j < k; j++) {
            if (place[j] == at)
                return 0;
            odd ^= place[j] > at;
        }
    }
    if (kind <= BS_STEREO_ALLENE)
        return odd ? 3 - perm : perm;
    arrange(kind, perm, corner);
    for (int k = 0; k < count; k++)
        renamed[k] = corner[place[k]];
    form = least_form(kind, count, renamed);
    for (int p = 1; p <= bs_stereo__perm_count(kind); p++) {
        memset(corner, 0, sizeof corner);
        arrange(kind, p, corner);
        if (least_form(kind, count, corner) == form)
            return p;
    }
    return 0;
}
