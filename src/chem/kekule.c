/*
 * Kekulé forms: placing the double bonds of parts written as aromatic.
 *
 * Each atom of such a part has to have a double bond, cannot have one, or may (the unknown atom,
 * radicals). Placing them is a matching in a general graph: J. Edmonds, Can. J. Math. 1965, 17,
 * 449, with the blossoms kept in a union-find as H. N. Gabow does (J. ACM 1976, 23, 221). A greedy
 * start that serves atoms with one free neighbour first (R. M. Karp & M. Sipser 1981) leaves little
 * to the search.
 */
#include "chem/draft.h"
#include "chem/valence.h"

#include <string.h>

#define NOBODY UINT32_MAX

typedef enum need { NEED_NONE, NEED_DOUBLE, NEED_EITHER } need;

typedef struct kekule {
    bs_ctx *cx;
    bs_mol *mol;
    const int16_t *stated;
    uint8_t *needs;  /* by atom */
    uint32_t *mate;  /* by atom: the other end of its double bond */
    uint32_t *parts; /* the atoms with a need, ascending */
    uint32_t part_count;
    /* The search from one atom. */
    uint8_t *colour; /* 0 unseen, 1 outer, 2 inner */
    uint32_t *back;  /* the atom before on the alternating path */
    uint32_t *base;  /* union-find: leads to the base of the blossom */
    uint32_t *stamp;
    uint32_t clock;
    uint32_t *queue;
    uint32_t head, tail;
    uint32_t *seen;
    uint32_t seen_count;
} kekule;

/* ---- What each atom needs ---------------------------------------------------------------- */

/* Bonds of an atom with aromatic ones counted as single. */
static int single_sum(const bs_mol *mol, uint32_t atom, int *aromatic, bool *multiple)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    int sum = 0;

    *aromatic = 0;
    *multiple = false;
    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        unsigned order = bonds[links[k].bond].order;

        if (order == BS_DRAFT_ORDER_AROMATIC) {
            ++*aromatic;
            order = 1;
        }
        *multiple |= order > 1;
        sum += (int)order;
    }
    return sum;
}

/*
 * What an atom needs. An atom without stated hydrogens fills the lowest valence that its bonds
 * leave open, and one place of it goes to the double bond: c with two neighbours is CH.
 */
static need need_of(const kekule *k, uint32_t atom)
{
    const bs_atom *a = &k->mol->atoms[atom];
    const uint8_t *v = bs_valence__normal(a->element, a->charge);
    int aromatic;
    bool multiple;
    int sum = single_sum(k->mol, atom, &aromatic, &multiple);

    if (aromatic == 0)
        return NEED_NONE;
    if (multiple && (a->element == 6 || a->element == 0))
        return NEED_NONE;
    if (a->element == 0)
        return NEED_EITHER;
    sum += a->hydrogens;
    while (*v != 0 && *v < sum)
        v++;
    if (*v == 0 || *v == sum)
        return NEED_NONE;
    if (k->stated[atom] == BS_DRAFT_IMPLIED || *v == sum + 1)
        return NEED_DOUBLE;
    return NEED_EITHER;
}

/* ---- Greedy start --------------------------------------------------------------------------- */

static bool is_open(const kekule *k, uint32_t atom)
{
    return k->needs[atom] != NEED_NONE && k->mate[atom] == NOBODY;
}

static void match(kekule *k, uint32_t a, uint32_t b)
{
    k->mate[a] = b;
    k->mate[b] = a;
}

/* Open neighbours over aromatic bonds; *first is the first of them. */
static int open_neighbours(const kekule *k, uint32_t atom, uint32_t *first)
{
    const bs_bond *bonds = bs_mol__bonds(k->mol);
    const bs_link *links = bs_mol__links(k->mol, atom);
    int count = 0;

    for (int i = 0; i < k->mol->atoms[atom].degree; i++) {
        if (bonds[links[i].bond].order != BS_DRAFT_ORDER_AROMATIC || !is_open(k, links[i].atom))
            continue;
        if (count++ == 0)
            *first = links[i].atom;
    }
    return count;
}

/* Matches an atom, then every atom that is left with one choice; the queue holds those to try. */
static void match_from(kekule *k, uint32_t atom)
{
    uint32_t partner = NOBODY;

    k->tail = 0;
    k->queue[k->tail++] = atom;
    for (bool forced = false; k->tail > 0; forced = true) {
        uint32_t a = k->queue[--k->tail];
        const bs_link *links;

        if (!is_open(k, a))
            continue;
        switch (open_neighbours(k, a, &partner)) {
        case 0:
            continue;
        case 1:
            break;
        default:
            if (forced)
                continue;
        }
        match(k, a, partner);
        links = bs_mol__links(k->mol, partner);
        for (int i = 0; i < k->mol->atoms[partner].degree; i++) {
            if (k->tail < 2 * k->part_count && is_open(k, links[i].atom))
                k->queue[k->tail++] = links[i].atom;
        }
        links = bs_mol__links(k->mol, a);
        for (int i = 0; i < k->mol->atoms[a].degree; i++) {
            if (k->tail < 2 * k->part_count && is_open(k, links[i].atom))
                k->queue[k->tail++] = links[i].atom;
        }
    }
}

static void match_greedily(kekule *k)
{
    uint32_t first;

    for (uint32_t i = 0; i < k->part_count; i++) {
        if (is_open(k, k->parts[i]) && open_neighbours(k, k->parts[i], &first) == 1)
            match_from(k, k->parts[i]);
    }
    for (uint32_t i = 0; i < k->part_count; i++) {
        if (is_open(k, k->parts[i]))
            match_from(k, k->parts[i]);
    }
}

/* ---- Search for an augmenting path ----------------------------------------------------------- */

static uint32_t base_of(kekule *k, uint32_t atom)
{
    while (k->base[atom] != atom) {
        k->base[atom] = k->base[k->base[atom]];
        atom = k->base[atom];
    }
    return atom;
}

static void touch(kekule *k, uint32_t atom, uint8_t colour)
{
    if (k->colour[atom] == 0)
        k->seen[k->seen_count++] = atom;
    k->colour[atom] = colour;
    if (colour == 1)
        k->queue[k->tail++] = atom;
}

/* The base at which the paths from two outer atoms to the root meet. */
static uint32_t meeting_point(kekule *k, uint32_t a, uint32_t b)
{
    k->clock++;
    for (;;) {
        if (a != NOBODY) {
            a = base_of(k, a);
            if (k->stamp[a] == k->clock)
                return a;
            k->stamp[a] = k->clock;
            a = k->mate[a] == NOBODY ? NOBODY : k->back[k->mate[a]];
        }
        if (b != NOBODY) {
            uint32_t swap = a;

            a = b;
            b = swap;
        }
    }
}

/* Contracts one side of a blossom: inner atoms become outer ones. */
static void shrink(kekule *k, uint32_t a, uint32_t b, uint32_t base)
{
    while (base_of(k, a) != base) {
        uint32_t inner = k->mate[a];

        k->back[a] = b;
        if (k->colour[inner] == 2)
            touch(k, inner, 1);
        if (k->base[a] == a)
            k->base[a] = base;
        if (k->base[inner] == inner)
            k->base[inner] = base;
        b = inner;
        a = k->back[inner];
    }
}

/* Flips the path that ends at an open atom. */
static void augment(kekule *k, uint32_t atom)
{
    while (atom != NOBODY) {
        uint32_t before = k->back[atom];
        uint32_t next = k->mate[before];

        match(k, atom, before);
        atom = next;
    }
}

/* Frees an outer atom that need not have a double bond: the path to it is flipped. */
static void release(kekule *k, uint32_t atom)
{
    uint32_t partner = k->mate[atom];

    k->mate[atom] = NOBODY;
    augment(k, partner);
}

/* Looks at the links of an outer atom; true if the matching has grown. */
static bool scan(kekule *k, uint32_t a)
{
    const bs_bond *bonds = bs_mol__bonds(k->mol);
    const bs_link *links = bs_mol__links(k->mol, a);

    for (int i = 0; i < k->mol->atoms[a].degree; i++) {
        uint32_t b = links[i].atom;

        if (bonds[links[i].bond].order != BS_DRAFT_ORDER_AROMATIC || k->needs[b] == NEED_NONE ||
            k->colour[b] == 2 || base_of(k, a) == base_of(k, b))
            continue;
        if (k->colour[b] == 1) {
            uint32_t base = meeting_point(k, a, b);

            shrink(k, a, b, base);
            shrink(k, b, a, base);
            continue;
        }
        k->back[b] = a;
        touch(k, b, 2);
        if (k->mate[b] == NOBODY) {
            augment(k, b);
            return true;
        }
        touch(k, k->mate[b], 1);
    }
    return false;
}

/* Gives the open atom `root` a double bond if that can be done; `*done` tells. */
static bs_status serve(kekule *k, uint32_t root, bool *done)
{
    *done = false;
    k->head = k->tail = 0;
    k->seen_count = 0;
    touch(k, root, 1);
    while (k->head < k->tail && !*done) {
        if ((k->head & 1023) == 1023 && bs_poll(k->cx) != BS_OK)
            return BS_ESTOPPED;
        *done = scan(k, k->queue[k->head++]);
    }
    for (uint32_t i = 0; i < k->tail && !*done && k->needs[root] == NEED_DOUBLE; i++) {
        if (k->needs[k->queue[i]] == NEED_EITHER) {
            release(k, k->queue[i]);
            *done = true;
        }
    }
    for (uint32_t i = 0; i < k->seen_count; i++) {
        uint32_t a = k->seen[i];

        k->colour[a] = 0;
        k->base[a] = a;
        k->back[a] = NOBODY;
    }
    return BS_OK;
}

/* ---- All together ---------------------------------------------------------------------------- */

static bs_status prepare(kekule *k)
{
    bs_arena *scratch = &k->cx->scratch;
    uint32_t atoms = k->mol->atom_count;
    uint32_t *block;
    bs_status st;

    if ((st = bs_new(k->cx, scratch, (size_t)8 * atoms + 8, &block)) != BS_OK ||
        (st = bs_new(k->cx, scratch, atoms, &k->needs)) != BS_OK ||
        (st = bs_new(k->cx, scratch, atoms, &k->colour)) != BS_OK)
        return st;
    k->mate = block;
    k->parts = block + atoms;
    k->back = block + (size_t)2 * atoms;
    k->base = block + (size_t)3 * atoms;
    k->stamp = block + (size_t)4 * atoms;
    k->seen = block + (size_t)5 * atoms;
    k->queue = block + (size_t)6 * atoms; /* twice as long, for the greedy start */
    for (uint32_t i = 0; i < atoms; i++) {
        k->mate[i] = NOBODY;
        k->back[i] = NOBODY;
        k->base[i] = i;
        k->needs[i] = (uint8_t)(k->stated ? need_of(k, i) : NEED_NONE);
        if (k->needs[i] != NEED_NONE)
            k->parts[k->part_count++] = i;
    }
    return BS_OK;
}

static bs_status cannot_place(kekule *k, uint32_t atom)
{
    const bs_atom *a = &k->mol->atoms[atom];
    bool lacks_hydrogen = (a->element == 7 || a->element == 15) && k->stated[atom] <= 0;

    return bs_fail_at(k->cx, BS_EVALUE, atom,
                      "the double bonds of an aromatic part cannot be placed: none is left for "
                      "this %s%s",
                      bs_element_symbol(a->element),
                      lacks_hydrogen ? "; does it lack its hydrogen, as in [nH]?" : "");
}

static void write_orders(kekule *k)
{
    bs_bond *bonds = bs_mol__bonds_mutable(k->mol);

    for (uint32_t i = 0; i < k->mol->bond_count; i++) {
        if (bonds[i].order == BS_DRAFT_ORDER_AROMATIC)
            bonds[i].order = k->mate[bonds[i].a] == bonds[i].b ? 2 : 1;
    }
}

static bs_status serve_all(kekule *k)
{
    bool done;
    bs_status st;

    for (int round = NEED_DOUBLE; round <= NEED_EITHER; round++) {
        for (uint32_t i = 0; i < k->part_count; i++) {
            if (k->needs[k->parts[i]] != round || k->mate[k->parts[i]] != NOBODY)
                continue;
            if ((st = serve(k, k->parts[i], &done)) != BS_OK)
                return st;
            if (!done && round == NEED_DOUBLE)
                return cannot_place(k, k->parts[i]);
        }
    }
    return BS_OK;
}

/* Aromatic bonds out of rings are single; returns how many stay open. */
static uint32_t settle_chains(bs_mol *mol)
{
    bs_bond *bonds = bs_mol__bonds_mutable(mol);
    uint32_t open = 0;

    for (uint32_t i = 0; i < mol->bond_count; i++) {
        if (bonds[i].order != BS_DRAFT_ORDER_AROMATIC)
            continue;
        if (bonds[i].flags & BS_BOND_RING)
            open++;
        else
            bonds[i].order = 1;
    }
    return open;
}

bs_status bs_kekule__assign(bs_ctx *cx, bs_mol *mol, const int16_t *stated, const bool *wish)
{
    kekule k = {.cx = cx, .mol = mol, .stated = stated};
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_status st;

    for (uint32_t i = 0; i < mol->atom_count; i++) {
        if (wish[i] && !(mol->atoms[i].flags & BS_ATOM_RING))
            return bs_fail_at(cx, BS_EVALUE, i, "an aromatic atom must be in a ring");
    }
    if (settle_chains(mol) == 0)
        return BS_OK;
    if ((st = prepare(&k)) == BS_OK) {
        match_greedily(&k);
        if ((st = serve_all(&k)) == BS_OK)
            write_orders(&k);
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Double bonds inside of aromatic systems --------------------------------------------------
 */

/* Whether a bond is double and not aromatic though it joins aromatic atoms within rings. */
static bool lies_inside(const bs_mol *mol, const bs_bond *b)
{
    return b->order == 2 && (b->flags & (BS_BOND_AROMATIC | BS_BOND_RING)) == BS_BOND_RING &&
           (mol->atoms[b->a].flags & mol->atoms[b->b].flags & BS_ATOM_AROMATIC);
}

/* Opens the aromatic bonds; their double bonds become the matching. */
static void open_aromatic(kekule *k)
{
    bs_bond *bonds = bs_mol__bonds_mutable(k->mol);

    for (uint32_t i = 0; i < k->mol->bond_count; i++) {
        bs_bond *b = &bonds[i];

        if (!(b->flags & BS_BOND_AROMATIC))
            continue;
        if (b->order == 2) {
            k->needs[b->a] = k->needs[b->b] = NEED_DOUBLE;
            match(k, b->a, b->b);
        }
        b->order = BS_DRAFT_ORDER_AROMATIC;
    }
}

bs_status bs_kekule__settle(bs_ctx *cx, bs_mol *mol)
{
    kekule k = {.cx = cx, .mol = mol};
    bs_bond *bonds = bs_mol__bonds_mutable(mol);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    uint32_t inside = 0;
    bs_status st;

    for (uint32_t i = 0; i < mol->bond_count; i++)
        inside += lies_inside(mol, &bonds[i]);
    if (inside == 0)
        return BS_OK;
    if ((st = prepare(&k)) == BS_OK) {
        open_aromatic(&k);
        for (uint32_t i = 0; i < mol->bond_count && st == BS_OK; i++) {
            bool done;
            bs_bond *b = &bonds[i];

            if (!lies_inside(mol, b))
                continue;
            k.needs[b->a] = k.needs[b->b] = NEED_DOUBLE;
            st = serve(&k, b->a, &done);
            if (done)
                b->order = 1;
            else
                k.needs[b->a] = k.needs[b->b] = NEED_NONE;
        }
        write_orders(&k);
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
