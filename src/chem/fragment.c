/* The connected pieces of a molecule. */
#include "chem/draft.h"
#include "chem/features.h"

#include <string.h>

/* Gives each atom the number of its piece, in the order of first atoms; returns how many. */
static uint32_t number_pieces(const bs_mol *mol, uint32_t *piece, uint32_t *queue)
{
    uint32_t count = 0;

    for (uint32_t root = 0; root < mol->atom_count; root++) {
        uint32_t head = 0;
        uint32_t tail = 0;

        if (piece[root] != UINT32_MAX)
            continue;
        piece[root] = count;
        queue[tail++] = root;
        while (head < tail) {
            uint32_t at = queue[head++];
            const bs_link *links = bs_mol__links(mol, at);

            for (int k = 0; k < mol->atoms[at].degree; k++) {
                if (piece[links[k].atom] == UINT32_MAX) {
                    piece[links[k].atom] = count;
                    queue[tail++] = links[k].atom;
                }
            }
        }
        count++;
    }
    return count;
}

/* Sizes and numbering for cutting the block: by piece, and by atom, bond or ring of the whole. */
typedef struct cut {
    const bs_mol *mol;
    uint32_t *piece;      /* by atom */
    uint32_t *atom;       /* number of each atom within its piece */
    uint32_t *bond;       /* number of each bond within its piece */
    uint32_t *atom_count; /* the rest by piece */
    uint32_t *bond_count;
    uint32_t *ring_count;
    uint32_t *ring_atoms;
    bs_mol **out;
} cut;

static void count_parts(cut *c)
{
    const bs_bond *bonds = bs_mol__bonds(c->mol);

    for (uint32_t i = 0; i < c->mol->atom_count; i++)
        c->atom[i] = c->atom_count[c->piece[i]]++;
    for (uint32_t i = 0; i < c->mol->bond_count; i++)
        c->bond[i] = c->bond_count[c->piece[bonds[i].a]]++;
    for (uint32_t r = 0; r < c->mol->ring_count; r++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(c->mol, (int)r, &atoms);

        c->ring_count[c->piece[atoms[0]]]++;
        c->ring_atoms[c->piece[atoms[0]]] += (uint32_t)size;
    }
}

static void fill_graph(cut *c)
{
    const bs_bond *bonds = bs_mol__bonds(c->mol);

    for (uint32_t i = 0; i < c->mol->atom_count; i++) {
        bs_mol *part = c->out[c->piece[i]];
        uint32_t *offsets = (uint32_t *)(void *)((char *)part + part->offsets_at);
        bs_link *links = (bs_link *)(void *)((char *)part + part->links_at);
        const bs_link *old = bs_mol__links(c->mol, i);
        uint32_t at = offsets[c->atom[i]];

        part->atoms[c->atom[i]] = c->mol->atoms[i];
        part->charge += c->mol->atoms[i].charge;
        for (int k = 0; k < c->mol->atoms[i].degree; k++)
            links[at++] = (bs_link){c->atom[old[k].atom], c->bond[old[k].bond]};
        offsets[c->atom[i] + 1] = at;
    }
    for (uint32_t i = 0; i < c->mol->bond_count; i++) {
        bs_bond *b = bs_mol__bonds_mutable(c->out[c->piece[bonds[i].a]]) + c->bond[i];

        *b = bonds[i];
        b->a = c->atom[bonds[i].a] & 0xffffff;
        b->b = c->atom[bonds[i].b] & 0xffffff;
    }
}

/* Copies the rings; `ring_count` serves as the number of the next ring of each piece. */
static void fill_rings(cut *c)
{
    memset(c->ring_count, 0, c->mol->atom_count * sizeof *c->ring_count);
    for (uint32_t r = 0; r < c->mol->ring_count; r++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(c->mol, (int)r, &atoms);
        uint32_t piece = c->piece[atoms[0]];
        bs_mol *part = c->out[piece];
        uint32_t *offsets = (uint32_t *)(void *)((char *)part + part->rings_at);
        uint32_t *all = (uint32_t *)(void *)((char *)part + part->ring_atoms_at);
        uint32_t at = offsets[c->ring_count[piece]];

        for (int k = 0; k < size; k++)
            all[at++] = c->atom[atoms[k]];
        offsets[++c->ring_count[piece]] = at;
    }
}

static bs_status prepare(bs_ctx *cx, cut *c)
{
    uint32_t atoms = c->mol->atom_count;
    uint32_t *block;
    bs_status st = bs_new(cx, &cx->scratch, (size_t)6 * atoms + c->mol->bond_count, &block);

    if (st != BS_OK)
        return st;
    c->piece = block;
    c->atom = block + atoms;
    c->atom_count = block + (size_t)2 * atoms;
    c->bond_count = block + (size_t)3 * atoms;
    c->ring_count = block + (size_t)4 * atoms;
    c->ring_atoms = block + (size_t)5 * atoms;
    c->bond = block + (size_t)6 * atoms;
    memset(c->piece, 0xff, atoms * sizeof *c->piece);
    return BS_OK;
}

bs_status bs_mol_fragments(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_mol ***pieces,
                           int *count)
{
    cut c = {.mol = mol};
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    uint32_t found = 0;
    bs_status st;

    *pieces = NULL;
    *count = 0;
    if ((st = prepare(cx, &c)) == BS_OK) {
        found = number_pieces(mol, c.piece, c.atom);
        count_parts(&c);
        st = bs_new(cx, home, found, &c.out);
    }
    for (uint32_t i = 0; i < found && st == BS_OK; i++)
        st = bs_mol__new(cx, home, c.atom_count[i], c.bond_count[i], c.ring_count[i],
                         c.ring_atoms[i], &c.out[i]);
    if (st == BS_OK) {
        fill_graph(&c);
        fill_rings(&c);
        for (uint32_t i = 0; i < found; i++)
            bs_mol__features(c.out[i]);
        *pieces = c.out;
        *count = (int)found;
    }
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}
