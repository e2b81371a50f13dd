/*
 * Ring systems and rings. The two-connected blocks come from one depth-first walk without
 * recursion (Hopcroft & Tarjan, Commun. ACM 1973, 16, 372); a block that is a single ring is
 * taken as it is, the others go through cycle.c.
 */
#include "chem/ring.h"
#include "chem/draft.h"

#include <string.h>

/* ---- Lists of rings -------------------------------------------------------------------- */

static bs_status grow(bs_rings *rings, uint32_t **array, uint32_t used, uint32_t wanted,
                      uint32_t *room)
{
    uint32_t more = *room ? *room * 2 : 64;
    uint32_t *block;

    if (wanted <= *room)
        return BS_OK;
    if (more < wanted)
        more = wanted;
    block = bs_arena_alloc(rings->home, (size_t)more * sizeof *block);
    if (!block)
        return bs_fail_memory(rings->cx);
    if (used > 0)
        memcpy(block, *array, (size_t)used * sizeof *block);
    *array = block;
    *room = more;
    return BS_OK;
}

bs_status bs_ring__add(bs_rings *rings, uint32_t size, uint32_t **atoms)
{
    uint32_t start = rings->count ? rings->offsets[rings->count] : 0;
    bs_status st;

    st = grow(rings, &rings->offsets, rings->count ? rings->count + 1 : 0, rings->count + 2,
              &rings->ring_room);
    if (st == BS_OK)
        st = grow(rings, &rings->atoms, start, start + size, &rings->atom_room);
    if (st != BS_OK)
        return st;
    rings->offsets[0] = 0;
    rings->offsets[++rings->count] = start + size;
    *atoms = rings->atoms + start;
    return BS_OK;
}

/* ---- Blocks ---------------------------------------------------------------------------- */

/* The depth-first walk: an atom's number of discovery (from 1), its low point, the next link. */
typedef struct bs_walk {
    bs_mol *mol;
    uint32_t *found;
    uint32_t *low;
    uint32_t *next;
    uint32_t *entry; /* bond through which the atom was reached */
    uint32_t *path;
    uint32_t *stack; /* bonds that belong to no block yet */
    uint32_t clock, depth, height;
    uint32_t *bonds; /* bonds of finished blocks */
    uint32_t bond_count;
    bs_block *blocks;
    uint32_t block_count;
} bs_walk;

/* Takes the bonds above and including `bond` from the stack; they are one block. */
static void close_block(bs_walk *w, uint32_t bond)
{
    bs_bond *bonds = bs_mol__bonds_mutable(w->mol);
    uint32_t start = w->height;
    uint32_t size;

    while (w->stack[--start] != bond)
        ;
    size = w->height - start;
    w->height = start;
    if (size < 2)
        return;
    memcpy(w->bonds + w->bond_count, w->stack + start, size * sizeof *w->stack);
    for (uint32_t i = 0; i < size; i++) {
        bs_bond *b = &bonds[w->bonds[w->bond_count + i]];

        b->flags |= BS_BOND_RING;
        w->mol->atoms[b->a].flags |= BS_ATOM_RING;
        w->mol->atoms[b->b].flags |= BS_ATOM_RING;
    }
    w->blocks[w->block_count++] = (bs_block){w->bonds + w->bond_count, size, 0};
    w->bond_count += size;
}

/* Counts the atoms of a block; `seen` holds a stamp for each atom. */
static uint32_t count_atoms(const bs_mol *mol, const bs_block *block, uint32_t *seen,
                            uint32_t stamp)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t count = 0;

    for (uint32_t i = 0; i < block->bond_count; i++) {
        const bs_bond *b = &bonds[block->bonds[i]];

        count += seen[b->a] != stamp;
        seen[b->a] = stamp;
        count += seen[b->b] != stamp;
        seen[b->b] = stamp;
    }
    return count;
}

/* Goes one link further from the atom on top of the path. */
static void advance(bs_walk *w)
{
    uint32_t atom = w->path[w->depth - 1];
    const bs_link *links = bs_mol__links(w->mol, atom);

    if (w->next[atom] < w->mol->atoms[atom].degree) {
        bs_link link = links[w->next[atom]++];

        if (link.bond == w->entry[atom])
            return;
        if (w->found[link.atom] == 0) {
            w->found[link.atom] = w->low[link.atom] = ++w->clock;
            w->entry[link.atom] = link.bond;
            w->stack[w->height++] = link.bond;
            w->path[w->depth++] = link.atom;
        } else if (w->found[link.atom] < w->found[atom]) {
            w->stack[w->height++] = link.bond;
            if (w->found[link.atom] < w->low[atom])
                w->low[atom] = w->found[link.atom];
        }
        return;
    }
    if (--w->depth > 0) {
        uint32_t parent = w->path[w->depth - 1];

        if (w->low[atom] < w->low[parent])
            w->low[parent] = w->low[atom];
        if (w->low[atom] >= w->found[parent])
            close_block(w, w->entry[atom]);
    }
}

bs_status bs_ring__blocks(bs_ctx *cx, bs_arena *home, bs_mol *mol, bs_blocks *out)
{
    bs_walk w = {.mol = mol};
    uint32_t atoms = mol->atom_count;
    uint32_t *block;
    bs_status st;

    *out = (bs_blocks){NULL, 0};
    if (mol->bond_count < 3)
        return BS_OK;
    if ((st = bs_new(cx, home, (size_t)5 * atoms + (size_t)2 * mol->bond_count, &block)) != BS_OK ||
        (st = bs_new(cx, home, mol->bond_count / 3 + 1, &w.blocks)) != BS_OK)
        return st;
    w.found = block;
    w.low = block + atoms;
    w.next = block + (size_t)2 * atoms;
    w.entry = block + (size_t)3 * atoms;
    w.path = block + (size_t)4 * atoms;
    w.stack = block + (size_t)5 * atoms;
    w.bonds = w.stack + mol->bond_count;
    for (uint32_t root = 0; root < atoms; root++) {
        if (w.found[root] != 0)
            continue;
        w.found[root] = w.low[root] = ++w.clock;
        w.entry[root] = UINT32_MAX;
        w.path[w.depth++] = root;
        while (w.depth > 0)
            advance(&w);
    }
    memset(w.low, 0, (size_t)atoms * sizeof *w.low);
    for (uint32_t i = 0; i < w.block_count; i++)
        w.blocks[i].atom_count = count_atoms(mol, &w.blocks[i], w.low, i + 1);
    *out = (bs_blocks){w.blocks, w.block_count};
    return BS_OK;
}

/* ---- Rings ----------------------------------------------------------------------------- */

/*
 * Adds a block that is one ring: its bonds were pushed along the walk, so each follows the one
 * before, and the last one closes the ring.
 */
static bs_status add_single(const bs_mol *mol, const bs_block *block, bs_rings *rings)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_bond *last = &bonds[block->bonds[block->bond_count - 1]];
    const bs_bond *first = &bonds[block->bonds[0]];
    uint32_t *ring;
    uint32_t at;
    bs_status st = bs_ring__add(rings, block->bond_count, &ring);

    if (st != BS_OK)
        return st;
    at = first->a == last->a || first->a == last->b ? first->a : first->b;
    for (uint32_t i = 0; i < block->bond_count; i++) {
        ring[i] = at;
        at = bs_bond__other(&bonds[block->bonds[i]], at);
    }
    return BS_OK;
}

/* Puts the rings of `more` behind the smallest set. */
static bs_status append(bs_rings *rings, const bs_rings *more)
{
    for (uint32_t i = 0; i < more->count; i++) {
        uint32_t size = more->offsets[i + 1] - more->offsets[i];
        uint32_t *atoms;
        bs_status st = bs_ring__add(rings, size, &atoms);

        if (st != BS_OK)
            return st;
        memcpy(atoms, more->atoms + more->offsets[i], size * sizeof *atoms);
    }
    return BS_OK;
}

bs_status bs_ring__find(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const bs_blocks *blocks,
                        bs_rings *out)
{
    bs_rings more = {.cx = cx, .home = home};
    uint32_t *local = NULL;
    bs_status st = BS_OK;

    *out = (bs_rings){.cx = cx, .home = home};
    for (uint32_t i = 0; i < blocks->count && st == BS_OK; i++) {
        const bs_block *block = &blocks->items[i];

        if (block->bond_count == block->atom_count)
            st = add_single(mol, block, out);
        else if (local || (st = bs_new(cx, &cx->scratch, mol->atom_count, &local)) == BS_OK)
            st = bs_cycle__find(cx, mol, block, local, out, &more);
    }
    out->sssr = out->count;
    return st == BS_OK ? append(out, &more) : st;
}
