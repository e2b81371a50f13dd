/*
 * The plain drawing, for molecules that are too large for coordgen or that it refuses.
 *
 * Atoms are taken in the order in which they were placed. Around each one its rings are drawn as
 * regular polygons, on a bond that is already there if the ring has one, and the other neighbours
 * go into the widest free angle.
 */
#include "layout/drawing.h"

#include <math.h>

#define PI 3.14159265358979323846
#define ANGLES_MAX 32

typedef struct plain {
    bs_drawing *d;
    bool *placed;
    bool *drawn;        /* by ring */
    uint32_t *rings_at; /* by atom: where its rings stand in `rings` */
    uint32_t *rings;
    uint32_t *queue;
    int8_t *turn; /* by atom: to which side a chain bends next */
    uint32_t head, tail;
} plain;

static double angle_between(bs_point from, bs_point to)
{
    return atan2(to.y - from.y, to.x - from.x);
}

static void put(plain *p, uint32_t atom, double x, double y, int8_t turn)
{
    p->d->at[atom] = (bs_point){x, y};
    p->placed[atom] = true;
    p->turn[atom] = turn;
    p->queue[p->tail++] = atom;
}

static void put_at_angle(plain *p, uint32_t from, uint32_t atom, double angle, int8_t turn)
{
    put(p, atom, p->d->at[from].x + cos(angle), p->d->at[from].y + sin(angle), turn);
}

/* ---- Free angles --------------------------------------------------------------------------- */

/* Angles of the bonds from an atom to placed points, ascending; returns their number. */
static int used_angles(const plain *p, uint32_t atom, double angles[ANGLES_MAX])
{
    const bs_link *links = bs_mol__links(p->d->mol, atom);
    int count = 0;

    for (int k = 0; k < p->d->mol->atoms[atom].degree && count < ANGLES_MAX; k++) {
        double angle;
        int i = count;

        if (!p->placed[links[k].atom])
            continue;
        angle = angle_between(p->d->at[atom], p->d->at[links[k].atom]);
        for (; i > 0 && angles[i - 1] > angle; i--)
            angles[i] = angles[i - 1];
        angles[i] = angle;
        count++;
    }
    return count;
}

/* The widest gap between bonds of an atom: where it starts and how wide it is. */
static void widest_gap(const plain *p, uint32_t atom, double *start, double *width)
{
    double angles[ANGLES_MAX];
    int count = used_angles(p, atom, angles);

    *start = 0;
    *width = 2 * PI;
    if (count == 0)
        return;
    *start = angles[count - 1];
    *width = angles[0] + 2 * PI - angles[count - 1];
    for (int i = 1; i < count; i++) {
        if (angles[i] - angles[i - 1] > *width + 1e-9) {
            *start = angles[i - 1];
            *width = angles[i] - angles[i - 1];
        }
    }
}

static bool is_linear(const bs_mol *mol, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    int doubles = 0;

    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        if (bonds[links[k].bond].order == 3)
            return true;
        doubles += bonds[links[k].bond].order == 2;
    }
    return mol->atoms[atom].degree == 2 && doubles == 2;
}

/* Places the neighbours (and the drawn hydrogen) that are left. */
static void place_rest(plain *p, uint32_t atom)
{
    const bs_mol *mol = p->d->mol;
    const bs_link *links = bs_mol__links(mol, atom);
    uint32_t hydrogen = p->d->hydrogen[atom];
    int left = hydrogen != UINT32_MAX && !p->placed[hydrogen];
    int degree = mol->atoms[atom].degree + left;
    double start;
    double width;
    int place = 0;

    for (int k = 0; k < mol->atoms[atom].degree; k++)
        left += !p->placed[links[k].atom];
    if (left == 0)
        return;
    widest_gap(p, atom, &start, &width);
    for (int k = 0; k <= mol->atoms[atom].degree; k++) {
        uint32_t next = k < mol->atoms[atom].degree ? links[k].atom : hydrogen;
        double angle = start + width * ++place / (left + 1);

        if (next == UINT32_MAX || p->placed[next]) {
            place--;
            continue;
        }
        if (left == 1 && degree == 2 && width > 6 && !is_linear(mol, atom))
            angle = start + PI + p->turn[atom] * PI / 3;
        if (next < p->d->atom_count)
            put_at_angle(p, atom, next, angle, (int8_t)-p->turn[atom]);
        else
            p->d->at[next] =
                (bs_point){p->d->at[atom].x + cos(angle), p->d->at[atom].y + sin(angle)};
    }
}

/* ---- Rings --------------------------------------------------------------------------------- */

/* Where in a ring an atom stands. */
static int place_in_ring(const uint32_t *atoms, int size, uint32_t atom)
{
    int k = 0;

    while (k < size - 1 && atoms[k] != atom)
        k++;
    return k;
}

/*
 * Draws a polygon whose corner `k` is placed. If the next or the previous corner is placed too, it
 * stands on that edge, on the side with more room; else it points into the widest gap.
 */
static void place_ring(plain *p, const uint32_t *atoms, int size, int k)
{
    double radius = 0.5 / sin(PI / size);
    bs_point from = p->d->at[atoms[k]];
    bool after = p->placed[atoms[(k + 1) % size]];
    bool before = p->placed[atoms[(k + size - 1) % size]];
    int step = before && !after ? -1 : 1;
    double start;
    double width;
    double inward;
    double first;
    bs_point centre;
    int side = 1;

    widest_gap(p, atoms[k], &start, &width);
    inward = start + width / 2;
    if (after || before) {
        double edge = angle_between(from, p->d->at[atoms[(k + size + step) % size]]);

        side = sin(inward - edge) >= 0 ? 1 : -1;
        inward = edge + side * (PI / 2 - PI / size);
    }
    centre = (bs_point){from.x + radius * cos(inward), from.y + radius * sin(inward)};
    first = inward + PI;
    for (int i = 1; i < size; i++) {
        uint32_t atom = atoms[((k + step * i) % size + size) % size];
        double angle = first + side * i * 2 * PI / size;

        if (!p->placed[atom])
            put(p, atom, centre.x + radius * cos(angle), centre.y + radius * sin(angle), 1);
    }
}

static void place_rings(plain *p, uint32_t atom)
{
    for (uint32_t i = p->rings_at[atom]; i < p->rings_at[atom + 1]; i++) {
        const uint32_t *atoms;
        int size;

        if (p->drawn[p->rings[i]])
            continue;
        p->drawn[p->rings[i]] = true;
        size = bs_mol_ring(p->d->mol, (int)p->rings[i], &atoms);
        place_ring(p, atoms, size, place_in_ring(atoms, size, atom));
    }
}

/* Lists the rings of each atom. */
static bs_status list_rings(plain *p)
{
    const bs_mol *mol = p->d->mol;
    bs_arena *scratch = &p->d->cx->scratch;
    const uint32_t *atoms;
    size_t total = 0;
    uint32_t *fill;
    bs_status st;

    for (uint32_t r = 0; r < mol->ring_count; r++)
        total += (size_t)bs_mol_ring(mol, (int)r, &atoms);
    if ((st = bs_new(p->d->cx, scratch, mol->atom_count + 1, &p->rings_at)) != BS_OK ||
        (st = bs_new(p->d->cx, scratch, mol->atom_count, &fill)) != BS_OK ||
        (st = bs_new(p->d->cx, scratch, total, &p->rings)) != BS_OK)
        return st;
    for (uint32_t r = 0; r < mol->ring_count; r++) {
        int size = bs_mol_ring(mol, (int)r, &atoms);

        for (int k = 0; k < size; k++)
            p->rings_at[atoms[k] + 1]++;
    }
    for (uint32_t i = 0; i < mol->atom_count; i++)
        p->rings_at[i + 1] += p->rings_at[i];
    for (uint32_t r = 0; r < mol->ring_count; r++) {
        int size = bs_mol_ring(mol, (int)r, &atoms);

        for (int k = 0; k < size; k++)
            p->rings[p->rings_at[atoms[k]] + fill[atoms[k]]++] = r;
    }
    return BS_OK;
}

bs_status bs_layout__plain(bs_drawing *d, uint32_t start, bool *placed)
{
    bs_mark temp = bs_arena_mark(&d->cx->scratch);
    plain p = {.d = d, .placed = placed};
    bs_arena *scratch = &d->cx->scratch;
    bs_status st;

    if ((st = bs_new(d->cx, scratch, d->mol->ring_count, &p.drawn)) != BS_OK ||
        (st = bs_new(d->cx, scratch, d->point_count, &p.queue)) != BS_OK ||
        (st = bs_new(d->cx, scratch, d->point_count, &p.turn)) != BS_OK ||
        (st = list_rings(&p)) != BS_OK)
        goto done;
    put(&p, start, 0, 0, 1);
    while (p.head < p.tail && (st = bs_poll(d->cx)) == BS_OK) {
        uint32_t atom = p.queue[p.head++];

        place_rings(&p, atom);
        place_rest(&p, atom);
    }
done:
    bs_arena_rewind(scratch, temp);
    return st;
}
