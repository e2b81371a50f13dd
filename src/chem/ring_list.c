/* Lists of rings and ring systems, found anew where a molecule keeps the smallest set only. */
#include "backsaw/descriptor.h"
#include "chem/ring.h"

#include <stdlib.h>
#include <string.h>

/* The ring systems of a copy, whose ring marks are set again. */
static bs_status find_blocks(bs_ctx *cx, const bs_mol *mol, bs_mol **copy, bs_blocks *blocks)
{
    bs_status st = bs_mol_copy(cx, &cx->scratch, mol, copy);

    return st == BS_OK ? bs_ring__blocks(cx, &cx->scratch, *copy, blocks) : st;
}

bs_status bs_mol_relevant_rings(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_atom_lists *out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_blocks blocks;
    bs_rings rings;
    bs_mol *copy;
    bs_status st;

    *out = (bs_atom_lists){0};
    if ((st = find_blocks(cx, mol, &copy, &blocks)) == BS_OK &&
        (st = bs_ring__find(cx, home, copy, &blocks, &rings)) == BS_OK && rings.count > 0)
        *out = (bs_atom_lists){(int)rings.count, rings.offsets, rings.atoms};
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}

static int compare_atoms(const void *a, const void *b)
{
    uint32_t x = *(const uint32_t *)a;
    uint32_t y = *(const uint32_t *)b;

    return (x > y) - (x < y);
}

/* Atoms of a block, each once, ascending. */
static uint32_t list_atoms(const bs_mol *mol, const bs_block *block, uint32_t *seen, uint32_t stamp,
                           uint32_t *out)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t count = 0;

    for (uint32_t i = 0; i < block->bond_count; i++) {
        const bs_bond *b = &bonds[block->bonds[i]];
        uint32_t ends[2] = {b->a, b->b};

        for (int k = 0; k < 2; k++) {
            if (seen[ends[k]] != stamp)
                out[count++] = ends[k];
            seen[ends[k]] = stamp;
        }
    }
    qsort(out, count, sizeof *out, compare_atoms);
    return count;
}

/* A ring system while they are sorted. */
typedef struct ring_system {
    uint32_t first[2]; /* its two lowest atoms tell it from all others */
    uint32_t *atoms;
    uint32_t count;
} ring_system;

static int compare_systems(const void *a, const void *b)
{
    const ring_system *x = a;
    const ring_system *y = b;
    int order = compare_atoms(&x->first[0], &y->first[0]);

    return order != 0 ? order : compare_atoms(&x->first[1], &y->first[1]);
}

static bs_status fill_systems(bs_ctx *cx, bs_arena *home, const bs_mol *mol,
                              const bs_blocks *blocks, bs_atom_lists *out)
{
    ring_system *systems;
    uint32_t *seen;
    uint32_t total = 0;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, blocks->count, &systems)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, mol->atom_count, &seen)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < blocks->count; i++) {
        ring_system *s = &systems[i];

        if ((st = bs_new(cx, &cx->scratch, blocks->items[i].atom_count, &s->atoms)) != BS_OK)
            return st;
        s->count = list_atoms(mol, &blocks->items[i], seen, i + 1, s->atoms);
        s->first[0] = s->atoms[0];
        s->first[1] = s->atoms[1];
        total += s->count;
    }
    qsort(systems, blocks->count, sizeof *systems, compare_systems);
    if ((st = bs_new(cx, home, blocks->count + 1, &out->offsets)) != BS_OK ||
        (st = bs_new(cx, home, total, &out->atoms)) != BS_OK)
        return st;
    out->count = (int)blocks->count;
    for (uint32_t i = 0; i < blocks->count; i++) {
        memcpy(out->atoms + out->offsets[i], systems[i].atoms,
               systems[i].count * sizeof *out->atoms);
        out->offsets[i + 1] = out->offsets[i] + systems[i].count;
    }
    return BS_OK;
}

bs_status bs_mol_ring_systems(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_atom_lists *out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_blocks blocks;
    bs_mol *copy;
    bs_status st;

    *out = (bs_atom_lists){0};
    if ((st = find_blocks(cx, mol, &copy, &blocks)) == BS_OK && blocks.count > 0)
        st = fill_systems(cx, home, copy, &blocks, out);
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *out = (bs_atom_lists){0};
    }
    return st;
}
