/*
 * Bertz's index of molecular complexity: S. H. Bertz, J. Am. Chem. Soc. 1981, 103, 3599-3601. The
 * atoms are told apart by their distances to the others, see backsaw/mol.h.
 *
 * Distances are kept in twelfths, so that the lengths 1, 1/2, 1/3, 1/4 of bonds and 2/3 of an
 * aromatic one are whole numbers and equal sums are equal. Orders are kept twofold for the same
 * reason. Only the hundred nearest atoms count, so each search from an atom ends early, whatever
 * the size of the molecule. The searches are Dijkstra's (1959) with buckets after Dial (1969).
 */
#include "chem/mol.h"
#include "core/map.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

enum {
    NEAREST = 100, /* distances that tell classes apart */
    LONGEST = 12,  /* a bond in twelfths */
    BUCKETS = 16   /* more than LONGEST, a power of two */
};

#define NOWHERE UINT32_MAX

/* An atom that waits in a bucket. */
typedef struct waiting {
    uint32_t atom, next;
} waiting;

/* What adds up under one kind of connections. */
typedef struct kind {
    uint32_t class[3]; /* end, middle, end; the middle of a multiple bond is NOWHERE */
    uint64_t eighths;
} kind;

typedef struct measure {
    bs_ctx *cx;
    const bs_mol *mol;
    uint32_t heavy;
    uint32_t *class;    /* of each atom */
    uint32_t *distance; /* of each atom in the search at hand, NOWHERE if not met */
    waiting *queue;     /* in the order of coming */
    uint32_t queue_room, queued;
    uint32_t bucket[BUCKETS];
    bs_map classes, kinds;
    uint32_t (*lists)[NEAREST]; /* distances of each class */
    uint32_t list_count, list_room;
    kind *sums;
    uint32_t sum_count, sum_room;
} measure;

static bool is_heavy(const measure *m, uint32_t atom)
{
    return m->mol->atoms[atom].element != 1;
}

/* Twice the order of a bond; a dative bond counts as single. */
static uint32_t twofold_order(const bs_bond *bond)
{
    if (bond->flags & BS_BOND_AROMATIC)
        return 3;
    return bond->order == 0 ? 2 : 2u * bond->order;
}

/* Makes room for one more element of a list that the gate owns. */
static bs_status make_room(measure *m, void *list, uint32_t count, uint32_t *room, size_t size)
{
    uint32_t more = *room ? 2 * *room : 64;
    void *old, *fresh;

    if (count < *room)
        return BS_OK;
    memcpy(&old, list, sizeof old);
    if (*room > UINT32_MAX / 4)
        return bs_fail_memory(m->cx);
    fresh = bs_gate_resize(m->cx->gate, old, *room * size, more * size);
    if (!fresh)
        return bs_fail_memory(m->cx);
    memcpy(list, &fresh, sizeof fresh);
    *room = more;
    return BS_OK;
}

/* ---- Classes of atoms ---------------------------------------------------------------------- */

static bs_status wait_at(measure *m, uint32_t atom, uint32_t distance)
{
    bs_status st = make_room(m, &m->queue, m->queued, &m->queue_room, sizeof *m->queue);

    if (st != BS_OK)
        return st;
    m->distance[atom] = distance;
    m->queue[m->queued] = (waiting){atom, m->bucket[distance % BUCKETS]};
    m->bucket[distance % BUCKETS] = m->queued++;
    return BS_OK;
}

/* An atom is settled: its neighbours are met. */
static bs_status go_on(measure *m, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(m->mol);
    const bs_link *links = bs_mol__links(m->mol, atom);
    bs_status st;

    for (int k = 0; k < m->mol->atoms[atom].degree; k++) {
        uint32_t next = links[k].atom;
        uint32_t there = m->distance[atom] + 2 * LONGEST / twofold_order(&bonds[links[k].bond]);

        if (is_heavy(m, next) && there < m->distance[next] &&
            (st = wait_at(m, next, there)) != BS_OK)
            return st;
    }
    return BS_OK;
}

/* The distances from an atom to the nearest, itself among them, ascending; NOWHERE behind. */
static bs_status nearest(measure *m, uint32_t from, uint32_t out[NEAREST])
{
    uint32_t found = 0, idle = 0;
    bs_status st;

    memset(out, 0xFF, NEAREST * sizeof *out);
    memset(m->bucket, 0xFF, sizeof m->bucket);
    m->queued = 0;
    if ((st = wait_at(m, from, 0)) != BS_OK)
        return st;
    for (uint32_t now = 0; found < NEAREST && idle < BUCKETS; now++, idle++) {
        while (m->bucket[now % BUCKETS] != NOWHERE && found < NEAREST) {
            waiting entry = m->queue[m->bucket[now % BUCKETS]];

            m->bucket[now % BUCKETS] = entry.next;
            idle = 0;
            if (m->distance[entry.atom] != now)
                continue; /* a shorter way was found meanwhile */
            out[found++] = now;
            if ((st = go_on(m, entry.atom)) != BS_OK)
                return st;
        }
    }
    for (uint32_t i = 0; i < m->queued; i++)
        m->distance[m->queue[i].atom] = NOWHERE;
    return BS_OK;
}

/* The number of the class with these distances. */
static bs_status class_of(measure *m, const uint32_t distances[NEAREST], uint32_t *out)
{
    uint64_t key = bs_hash_bytes(distances, NEAREST * sizeof *distances, 0);
    size_t cursor = 0;
    bs_status st;

    while ((*out = bs_map_next(&m->classes, key, &cursor)) != BS_MAP_NONE) {
        if (memcmp(m->lists[*out], distances, sizeof m->lists[0]) == 0)
            return BS_OK;
    }
    st = make_room(m, &m->lists, m->list_count, &m->list_room, sizeof m->lists[0]);
    if (st != BS_OK || (st = bs_map_add(&m->classes, key, m->list_count)) != BS_OK)
        return st;
    memcpy(m->lists[m->list_count], distances, sizeof m->lists[0]);
    *out = m->list_count++;
    return BS_OK;
}

static bs_status find_classes(measure *m)
{
    uint32_t distances[NEAREST];
    bs_status st;

    for (uint32_t i = 0; i < m->mol->atom_count; i++)
        m->distance[i] = NOWHERE;
    for (uint32_t i = 0; i < m->mol->atom_count; i++) {
        if (!is_heavy(m, i))
            continue;
        m->heavy++;
        if ((st = bs_poll(m->cx)) != BS_OK || (st = nearest(m, i, distances)) != BS_OK ||
            (st = class_of(m, distances, &m->class[i])) != BS_OK)
            return st;
    }
    return BS_OK;
}

/* ---- Connections --------------------------------------------------------------------------- */

/* Adds connections, in eighths, to the kind that these classes make; the ends in either order. */
static bs_status add_connections(measure *m, uint32_t a, uint32_t middle, uint32_t b,
                                 uint32_t eighths)
{
    uint32_t class[3] = {a < b ? a : b, middle, a < b ? b : a};
    uint64_t key = bs_hash_bytes(class, sizeof class, 0);
    size_t cursor = 0;
    uint32_t at;
    bs_status st;

    while ((at = bs_map_next(&m->kinds, key, &cursor)) != BS_MAP_NONE) {
        if (memcmp(m->sums[at].class, class, sizeof class) == 0) {
            m->sums[at].eighths += eighths;
            return BS_OK;
        }
    }
    st = make_room(m, &m->sums, m->sum_count, &m->sum_room, sizeof *m->sums);
    if (st != BS_OK || (st = bs_map_add(&m->kinds, key, m->sum_count)) != BS_OK)
        return st;
    memcpy(m->sums[m->sum_count].class, class, sizeof class);
    m->sums[m->sum_count++].eighths = eighths;
    return BS_OK;
}

/* The pairs of bonds that meet at an atom. */
static bs_status count_pairs(measure *m, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(m->mol);
    const bs_link *links = bs_mol__links(m->mol, atom);
    int degree = m->mol->atoms[atom].degree;
    bs_status st;

    for (int i = 0; i < degree; i++) {
        for (int k = i + 1; k < degree; k++) {
            uint32_t product =
                twofold_order(&bonds[links[i].bond]) * twofold_order(&bonds[links[k].bond]);

            if (!is_heavy(m, links[i].atom) || !is_heavy(m, links[k].atom))
                continue;
            st = add_connections(m, m->class[links[i].atom], m -> class[atom],
                                 m -> class[links[k].atom], 2 * product);
            if (st != BS_OK)
                return st;
        }
    }
    return BS_OK;
}

static bs_status find_connections(measure *m)
{
    const bs_bond *bonds = bs_mol__bonds(m->mol);
    bs_status st;

    for (uint32_t i = 0; i < m->mol->atom_count; i++) {
        if (!is_heavy(m, i))
            continue;
        if ((st = bs_poll(m->cx)) != BS_OK || (st = count_pairs(m, i)) != BS_OK)
            return st;
    }
    for (uint32_t i = 0; i < m->mol->bond_count; i++) {
        uint32_t twice = twofold_order(&bonds[i]);
        uint32_t a = m->class[bonds[i].a], b = m->class[bonds[i].b];

        if (twice <= 2 || !is_heavy(m, bonds[i].a) || !is_heavy(m, bonds[i].b))
            continue;
        /* order x (order - 1) / 2 */
        st = add_connections(m, a, NOWHERE, b, twice * (twice - 2));
        if (st != BS_OK)
            return st;
    }
    return BS_OK;
}

/* ---- The index ----------------------------------------------------------------------------- */

static double x_log2_x(double x)
{
    return x > 0 ? x * log2(x) : 0;
}

static int by_size(const void *a, const void *b)
{
    const kind *x = a, *y = b;

    return (x->eighths > y->eighths) - (x->eighths < y->eighths);
}

/* Ascending, so that the sum is the same to the last bit in whatever order the atoms come. */
static double index_of(measure *m)
{
    uint32_t elements[UINT8_MAX + 1] = {0};
    uint64_t all = 0;
    double bonds, atoms = x_log2_x(m->heavy);

    if (m->sum_count > 0)
        qsort(m->sums, m->sum_count, sizeof *m->sums, by_size);
    for (uint32_t i = 0; i < m->sum_count; i++)
        all += m->sums[i].eighths;
    bonds = 2 * x_log2_x((double)all / 8);
    for (uint32_t i = 0; i < m->sum_count; i++)
        bonds -= x_log2_x((double)m->sums[i].eighths / 8);
    if (all == 0)
        bonds = 0;
    for (uint32_t i = 0; i < m->mol->atom_count; i++)
        elements[m->mol->atoms[i].element]++;
    elements[1] = 0;
    for (int z = 0; z <= UINT8_MAX; z++)
        atoms -= x_log2_x(elements[z]);
    return bonds + atoms;
}

bs_status bs_mol_complexity(bs_ctx *cx, const bs_mol *mol, double *index)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    measure m = {.cx = cx, .mol = mol};
    bs_status st;

    *index = 0;
    bs_map_init(&m.classes, cx);
    bs_map_init(&m.kinds, cx);
    if ((st = bs_new(cx, &cx->scratch, mol->atom_count, &m.class)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, mol->atom_count, &m.distance)) != BS_OK ||
        (st = find_classes(&m)) != BS_OK || (st = find_connections(&m)) != BS_OK)
        goto done;
    *index = index_of(&m);
done:
    bs_gate_free(cx->gate, m.sums, m.sum_room * sizeof *m.sums);
    bs_gate_free(cx->gate, m.lists, m.list_room * sizeof m.lists[0]);
    bs_gate_free(cx->gate, m.queue, m.queue_room * sizeof *m.queue);
    bs_map_free(&m.kinds);
    bs_map_free(&m.classes);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
