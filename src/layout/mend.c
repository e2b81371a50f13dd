/*
 * Mending a drawing: double bonds that are drawn the wrong way round are turned.
 *
 * Outside rings one side of the bond is mirrored. Within a ring one end of the bond moves to the
 * other side of the line between its neighbours in the ring, as far out as is needed.
 */
#include "chem/stereo.h"
#include "layout/drawing.h"

#include <string.h>

/* What mending works with. */
typedef struct mending {
    bs_drawing *d;
    uint32_t *queue; /* atoms that move */
    bool *seen;
    int wrong; /* double bonds that are drawn wrong */
} mending;

/* Whether a double bond with a geometry is drawn as it is; 0 if the drawing does not say. */
static int drawn_geometry(const bs_drawing *d, uint32_t bond)
{
    bs_draft_stereo element;
    uint32_t beside[2];

    if (!bs_stereo__of_bond(d->mol, bond, &element))
        return 0;
    for (int k = 0; k < 2; k++) {
        uint32_t end = k == 0 ? element.centre : element.second;

        beside[k] = element.around[k];
        if (beside[k] == BS_DRAFT_HYDROGEN)
            beside[k] = d->hydrogen[end];
        if (beside[k] == UINT32_MAX)
            return 0;
    }
    return bs_hand__double(bs_layout__vector(d, element.centre),
                           bs_layout__vector(d, element.second), bs_layout__vector(d, beside[0]),
                           bs_layout__vector(d, beside[1]));
}

static bool is_wrong(const bs_drawing *d, uint32_t bond)
{
    int wanted = bs_mol_bond_geometry(d->mol, (int)bond);

    return wanted != BS_GEOMETRY_NONE && drawn_geometry(d, bond) != wanted;
}

static int count_wrong(const bs_drawing *d)
{
    int wrong = 0;

    for (uint32_t i = 0; i < d->mol->bond_count; i++)
        wrong += is_wrong(d, i);
    return wrong;
}

/*
 * Lists the atoms that hang on `atom`, itself first; `border` is left out. With `stay` the bonds
 * of the atom that lie in rings are no way out, so that it takes only side chains along.
 */
static uint32_t list_side(mending *m, uint32_t atom, uint32_t border, bool stay)
{
    const bs_bond *bonds = bs_mol__bonds(m->d->mol);
    uint32_t tail = 0;

    memset(m->seen, 0, m->d->atom_count * sizeof *m->seen);
    m->seen[border] = true;
    m->seen[atom] = true;
    m->queue[tail++] = atom;
    for (uint32_t head = 0; head < tail; head++) {
        const bs_link *links = bs_mol__links(m->d->mol, m->queue[head]);

        for (int k = 0; k < m->d->mol->atoms[m->queue[head]].degree; k++) {
            if (m->seen[links[k].atom] ||
                (stay && head == 0 && bonds[links[k].bond].flags & BS_BOND_RING))
                continue;
            m->seen[links[k].atom] = true;
            m->queue[tail++] = links[k].atom;
        }
    }
    return tail;
}

/* ---- Moving -------------------------------------------------------------------------------- */

/* Mirrors a point at the line through `origin` along `axis`. */
static void mirror(bs_drawing *d, uint32_t point, bs_point origin, bs_point axis)
{
    double x = d->at[point].x - origin.x;
    double y = d->at[point].y - origin.y;
    double along = (x * axis.x + y * axis.y) / (axis.x * axis.x + axis.y * axis.y);

    d->at[point].x = origin.x + 2 * along * axis.x - x;
    d->at[point].y = origin.y + 2 * along * axis.y - y;
}

static void shift(bs_drawing *d, uint32_t point, bs_point by)
{
    d->at[point].x += by.x;
    d->at[point].y += by.y;
}

/* Mirrors the listed atoms at the line from `origin` to `end`, then shifts them. */
static void move_side(mending *m, uint32_t count, bs_point origin, bs_point end, bs_point by)
{
    bs_point axis = {end.x - origin.x, end.y - origin.y};

    if (axis.x == 0 && axis.y == 0)
        return;
    for (uint32_t i = 0; i < count; i++) {
        uint32_t hydrogen = m->d->hydrogen[m->queue[i]];

        mirror(m->d, m->queue[i], origin, axis);
        shift(m->d, m->queue[i], by);
        if (hydrogen != UINT32_MAX) {
            mirror(m->d, hydrogen, origin, axis);
            shift(m->d, hydrogen, by);
        }
    }
}

/*
 * Moves `end` to the other side of the line from `a` to `b`, `factor` times as far away from it.
 * Moving back is the same with 1 / factor.
 */
static void swing(mending *m, uint32_t end, uint32_t count, bs_point a, bs_point b, double factor)
{
    bs_point old = m->d->at[end];
    bs_point axis = {b.x - a.x, b.y - a.y};
    double square = axis.x * axis.x + axis.y * axis.y;
    double along = square > 0 ? ((old.x - a.x) * axis.x + (old.y - a.y) * axis.y) / square : 0;
    bs_point foot = {a.x + along * axis.x, a.y + along * axis.y};
    bs_point by = {(factor - 1) * (foot.x - old.x), (factor - 1) * (foot.y - old.y)};

    move_side(m, count, a, b, by);
}

/* Tries to swing one end of a double bond of a ring; undone if it mends nothing. */
static bool swing_end(mending *m, uint32_t end, uint32_t other, double factor)
{
    const bs_bond *bonds = bs_mol__bonds(m->d->mol);
    const bs_link *links = bs_mol__links(m->d->mol, end);

    for (int k = 0; k < m->d->mol->atoms[end].degree; k++) {
        bs_point a = m->d->at[other];
        bs_point b = m->d->at[links[k].atom];
        uint32_t count;
        int now;

        if (links[k].atom == other || !(bonds[links[k].bond].flags & BS_BOND_RING))
            continue;
        count = list_side(m, end, other, true);
        swing(m, end, count, a, b, factor);
        now = count_wrong(m->d);
        if (now < m->wrong) {
            m->wrong = now;
            return true;
        }
        swing(m, end, count, a, b, 1 / factor);
    }
    return false;
}

static void mend_bond(mending *m, const bs_bond *bond)
{
    /* 1 keeps the lengths; the others stretch the bonds that are turned a little. */
    static const double factors[] = {1, 1.8, 0.5, 3};
    bs_point none = {0, 0};

    if (!(bond->flags & BS_BOND_RING)) {
        move_side(m, list_side(m, bond->b, bond->a, false), m->d->at[bond->a], m->d->at[bond->b],
                  none);
        m->wrong = count_wrong(m->d);
        return;
    }
    for (size_t i = 0; i < sizeof factors / sizeof *factors; i++) {
        if (swing_end(m, bond->a, bond->b, factors[i]) ||
            swing_end(m, bond->b, bond->a, factors[i]))
            break;
    }
}

bs_status bs_layout__mend_doubles(bs_drawing *d, int *wrong)
{
    const bs_bond *bonds = bs_mol__bonds(d->mol);
    bs_mark temp = bs_arena_mark(&d->cx->scratch);
    mending m = {.d = d, .wrong = count_wrong(d)};
    bs_status st = BS_OK;

    *wrong = m.wrong;
    if (m.wrong == 0)
        return BS_OK;
    if ((st = bs_new(d->cx, &d->cx->scratch, d->atom_count, &m.queue)) != BS_OK ||
        (st = bs_new(d->cx, &d->cx->scratch, d->atom_count, &m.seen)) != BS_OK)
        goto done;
    for (uint32_t i = 0; i < d->mol->bond_count && m.wrong > 0; i++) {
        if (!is_wrong(d, i))
            continue;
        if ((st = bs_poll(d->cx)) != BS_OK)
            break;
        mend_bond(&m, &bonds[i]);
    }
    *wrong = m.wrong;
done:
    bs_arena_rewind(&d->cx->scratch, temp);
    return st;
}
