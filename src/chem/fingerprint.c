/*
 * Circular fingerprints. The key of an atom's surrounding grows by one bond a round: it is made of
 * the atom's key and the keys and bonds of its neighbours one round before. Two surroundings that
 * hold the same bonds say the same; the one of the smaller radius, then of the smaller key, stays.
 */
#include "backsaw/descriptor.h"
#include "chem/mol.h"

#include <stdlib.h>
#include <string.h>

enum { MAX_RADIUS = 10 };

/* The mixing function of S. Vigna's splitmix64 (public domain). */
static uint64_t mix(uint64_t x)
{
    x += 0x9e3779b97f4a7c15u;
    x = (x ^ (x >> 30)) * 0xbf58476d1ce4e5b9u;
    x = (x ^ (x >> 27)) * 0x94d049bb133111ebu;
    return x ^ (x >> 31);
}

/* A surrounding that may say the same as others. */
typedef struct scene {
    bs_surrounding item;
    uint64_t bonds; /* tells its set of bonds */
} scene;

typedef struct rounds {
    bs_ctx *cx;
    const bs_mol *mol;
    uint64_t *key, *next; /* by atom */
    scene *scenes;
    uint32_t count;
    uint32_t *queue, *distance; /* for the walk from one atom; distance + 1, 0 if not seen */
    uint32_t *stamp, clock;     /* by bond */
} rounds;

static uint64_t first_key(const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];
    uint64_t key = mix(a->element);

    key = mix(key ^ (uint64_t)(uint8_t)a->charge);
    key = mix(key ^ a->isotope);
    key = mix(key ^ (uint64_t)bs_mol__total_hydrogens(mol, atom));
    key = mix(key ^ a->degree);
    return mix(key ^ ((a->flags & BS_ATOM_RING) != 0));
}

static int compare_keys(const void *a, const void *b)
{
    uint64_t x = *(const uint64_t *)a;
    uint64_t y = *(const uint64_t *)b;

    return (x > y) - (x < y);
}

/* The key one round on: neighbours sorted, since their order says nothing. */
static uint64_t next_key(const rounds *r, uint32_t atom, int radius)
{
    const bs_bond *bonds = bs_mol__bonds(r->mol);
    const bs_link *links = bs_mol__links(r->mol, atom);
    int degree = r->mol->atoms[atom].degree;
    uint64_t around[UINT8_MAX];
    uint64_t key = mix(r->key[atom] ^ (uint64_t)radius);

    for (int k = 0; k < degree; k++) {
        const bs_bond *b = &bonds[links[k].bond];
        unsigned kind = b->flags & BS_BOND_AROMATIC ? 5 : b->order;

        around[k] = mix(r->key[links[k].atom] + kind);
    }
    qsort(around, (size_t)degree, sizeof *around, compare_keys);
    for (int k = 0; k < degree; k++)
        key = mix(key ^ around[k]);
    return key;
}

/* Sums over the bonds within `radius` of an atom; *grew tells whether the last round added any. */
static uint64_t sum_bonds(rounds *r, uint32_t atom, uint32_t radius, bool *grew)
{
    uint32_t head = 0, tail = 0;
    uint64_t sum = 0;

    *grew = false;
    r->clock++;
    r->queue[tail++] = atom;
    r->distance[atom] = 1;
    while (head < tail) {
        uint32_t at = r->queue[head++];
        const bs_link *links = bs_mol__links(r->mol, at);

        for (int k = 0; k < r->mol->atoms[at].degree && r->distance[at] <= radius; k++) {
            if (r->stamp[links[k].bond] != r->clock) {
                sum += mix(links[k].bond);
                *grew = *grew || r->distance[at] == radius;
            }
            r->stamp[links[k].bond] = r->clock;
            if (r->distance[links[k].atom] == 0) {
                r->distance[links[k].atom] = r->distance[at] + 1;
                r->queue[tail++] = links[k].atom;
            }
        }
    }
    for (uint32_t i = 0; i < tail; i++)
        r->distance[r->queue[i]] = 0;
    return sum;
}

static void add_scene(rounds *r, uint32_t atom, int radius, uint64_t bonds)
{
    r->scenes[r->count++] = (scene){.item = {r->key[atom], atom, (uint32_t)radius}, .bonds = bonds};
}

static bs_status grow(rounds *r, int radius)
{
    for (uint32_t i = 0; i < r->mol->atom_count; i++)
        r->next[i] = next_key(r, i, radius);
    memcpy(r->key, r->next, r->mol->atom_count * sizeof *r->key);
    for (uint32_t i = 0; i < r->mol->atom_count; i++) {
        bool grew;
        uint64_t bonds = sum_bonds(r, i, (uint32_t)radius, &grew);

        if (grew)
            add_scene(r, i, radius, bonds);
    }
    return bs_poll(r->cx);
}

/* By bonds, then radius, key and atom: the first of those with the same bonds stays. */
static int compare_scenes(const void *a, const void *b)
{
    const scene *x = a;
    const scene *y = b;

    if (x->bonds != y->bonds)
        return x->bonds < y->bonds ? -1 : 1;
    if (x->item.radius != y->item.radius)
        return x->item.radius < y->item.radius ? -1 : 1;
    if (x->item.key != y->item.key)
        return x->item.key < y->item.key ? -1 : 1;
    return (x->item.atom > y->item.atom) - (x->item.atom < y->item.atom);
}

static int compare_items(const void *a, const void *b)
{
    const bs_surrounding *x = a;
    const bs_surrounding *y = b;

    if (x->key != y->key)
        return x->key < y->key ? -1 : 1;
    return (x->atom > y->atom) - (x->atom < y->atom);
}

static bs_status collect(rounds *r, bs_arena *home, bs_surrounding **out, int *count)
{
    bs_status st = bs_new(r->cx, home, r->count + 1, out);
    int kept = 0;

    if (st != BS_OK)
        return st;
    qsort(r->scenes, r->count, sizeof *r->scenes, compare_scenes);
    for (uint32_t i = 0; i < r->count; i++) {
        const scene *s = &r->scenes[i];

        if (s->item.radius == 0 || i == 0 || s->bonds != s[-1].bonds)
            (*out)[kept++] = s->item;
    }
    qsort(*out, (size_t)kept, sizeof **out, compare_items);
    *count = kept;
    return BS_OK;
}

static bs_status make_rounds(rounds *r, int radius)
{
    bs_arena *scratch = &r->cx->scratch;
    size_t atoms = r->mol->atom_count;
    bs_status st;

    if ((st = bs_new(r->cx, scratch, atoms, &r->key)) != BS_OK ||
        (st = bs_new(r->cx, scratch, atoms, &r->next)) != BS_OK ||
        (st = bs_new(r->cx, scratch, atoms, &r->queue)) != BS_OK ||
        (st = bs_new(r->cx, scratch, atoms, &r->distance)) != BS_OK ||
        (st = bs_new(r->cx, scratch, r->mol->bond_count, &r->stamp)) != BS_OK ||
        (st = bs_new(r->cx, scratch, atoms * (size_t)(radius + 1), &r->scenes)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < r->mol->atom_count; i++) {
        r->key[i] = first_key(r->mol, i);
        add_scene(r, i, 0, 0);
    }
    return BS_OK;
}

bs_status bs_mol_surroundings(bs_ctx *cx, bs_arena *home, const bs_mol *mol, int radius,
                              bs_surrounding **out, int *count)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    rounds r = {.cx = cx, .mol = mol};
    bs_status st;

    *out = NULL;
    *count = 0;
    if (radius < 0 || radius > MAX_RADIUS)
        return bs_fail(cx, BS_ERANGE, "a radius must be 0 to %d, not %d", MAX_RADIUS, radius);
    st = make_rounds(&r, radius);
    for (int k = 1; k <= radius && st == BS_OK; k++)
        st = grow(&r, k);
    if (st == BS_OK)
        st = collect(&r, home, out, count);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- One environment ------------------------------------------------------------------------ */

/* Walks from the centres; fills atoms, distances and bonds of `out`. */
static void walk(rounds *r, const uint32_t *centres, int count, uint32_t radius,
                 bs_environment *out)
{
    for (int i = 0; i < count; i++) {
        if (r->distance[centres[i]] == 0)
            out->atoms[out->atom_count++] = centres[i];
        r->distance[centres[i]] = 1;
    }
    for (int head = 0; head < out->atom_count; head++) {
        uint32_t at = out->atoms[head];
        const bs_link *links = bs_mol__links(r->mol, at);

        out->distances[head] = r->distance[at] - 1;
        for (int k = 0; k < r->mol->atoms[at].degree && r->distance[at] <= radius; k++) {
            if (r->stamp[links[k].bond]++ == 0)
                out->bonds[out->bond_count++] = links[k].bond;
            if (r->distance[links[k].atom] == 0) {
                r->distance[links[k].atom] = r->distance[at] + 1;
                out->atoms[out->atom_count++] = links[k].atom;
            }
        }
    }
}

static bs_status find_environment(rounds *r, bs_arena *home, const uint32_t *centres, int count,
                                  int radius, bs_environment *out)
{
    uint64_t *keys;
    bs_status st;

    if ((st = bs_new(r->cx, home, r->mol->atom_count, &out->atoms)) != BS_OK ||
        (st = bs_new(r->cx, home, r->mol->atom_count, &out->distances)) != BS_OK ||
        (st = bs_new(r->cx, home, r->mol->bond_count + 1, &out->bonds)) != BS_OK ||
        (st = bs_new(r->cx, &r->cx->scratch, count, &keys)) != BS_OK ||
        (st = make_rounds(r, 0)) != BS_OK)
        return st;
    for (int k = 1; k <= radius; k++) {
        for (uint32_t i = 0; i < r->mol->atom_count; i++)
            r->next[i] = next_key(r, i, k);
        memcpy(r->key, r->next, r->mol->atom_count * sizeof *r->key);
    }
    walk(r, centres, count, (uint32_t)radius, out);
    for (int i = 0; i < count; i++)
        keys[i] = r->key[centres[i]];
    qsort(keys, (size_t)count, sizeof *keys, compare_keys);
    out->key = keys[0];
    for (int i = 1; i < count; i++)
        out->key = mix(out->key ^ keys[i]);
    return BS_OK;
}

bs_status bs_mol_environment(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const uint32_t *centres,
                             int centre_count, int radius, bs_environment *out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    rounds r = {.cx = cx, .mol = mol};
    bs_status st;

    *out = (bs_environment){0};
    if (radius < 0 || radius > MAX_RADIUS)
        return bs_fail(cx, BS_ERANGE, "a radius must be 0 to %d, not %d", MAX_RADIUS, radius);
    for (int i = 0; i < centre_count; i++) {
        if (centres[i] >= mol->atom_count)
            return bs_fail(cx, BS_ERANGE, "the molecule has no atom %lu",
                           (unsigned long)centres[i] + 1);
    }
    st = find_environment(&r, home, centres, centre_count, radius, out);
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *out = (bs_environment){0};
    }
    return st;
}

/* ---- Folding --------------------------------------------------------------------------------- */

void bs_fingerprint_fold(const bs_surrounding *items, int count, int bits, uint64_t *words)
{
    memset(words, 0, (size_t)bits / 8);
    for (int i = 0; i < count; i++) {
        uint64_t bit = items[i].key & (uint64_t)(bits - 1);

        words[bit / 64] |= (uint64_t)1 << bit % 64;
    }
}

double bs_fingerprint_tanimoto(const uint64_t *a, const uint64_t *b, int bits)
{
    int both = 0;
    int one = 0;

    for (int i = 0; i < bits / 64; i++) {
        both += __builtin_popcountll(a[i] & b[i]);
        one += __builtin_popcountll(a[i] | b[i]);
    }
    return one == 0 ? 1 : (double)both / one;
}
