/* Splitting molecules into their connected pieces, with the atoms' numbers in the whole. */
#include "backsaw/draft.h"
#include "chem/mol.h"
#include "rule/book.h"

/* Numbers the pieces in the order of their first atoms; returns how many there are. */
static int number_pieces(const bs_mol *mol, int *piece, uint32_t *stack)
{
    int count = 0;

    for (uint32_t i = 0; i < mol->atom_count; i++)
        piece[i] = -1;
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        uint32_t top = 0;

        if (piece[i] >= 0)
            continue;
        piece[i] = count;
        stack[top++] = i;
        while (top > 0) {
            uint32_t atom = stack[--top];
            const bs_link *links = bs_mol__links(mol, atom);

            for (int k = 0; k < mol->atoms[atom].degree; k++) {
                if (piece[links[k].atom] >= 0)
                    continue;
                piece[links[k].atom] = count;
                stack[top++] = links[k].atom;
            }
        }
        count++;
    }
    return count;
}

static bs_status list_atoms(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const int *piece,
                            bs_piece *pieces, int count)
{
    uint32_t *filled;
    bs_mark temp;
    bs_status st;

    for (int i = 0; i < count; i++) {
        if ((st = bs_new(cx, home, pieces[i].mol->atom_count + 1, &pieces[i].atoms)) != BS_OK)
            return st;
    }
    temp = bs_arena_mark(&cx->scratch);
    if ((st = bs_new(cx, &cx->scratch, count + 1, &filled)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < mol->atom_count; i++)
        pieces[piece[i]].atoms[filled[piece[i]]++] = i;
    bs_arena_rewind(&cx->scratch, temp);
    return BS_OK;
}

static bs_status split(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const int *piece,
                       bs_piece **out, int count)
{
    bs_mol **mols;
    int found;
    bs_status st;

    if ((st = bs_new(cx, home, count + 1, out)) != BS_OK)
        return st;
    if (count == 1) {
        (*out)[0].mol = mol;
    } else {
        if ((st = bs_mol_fragments(cx, home, mol, &mols, &found)) != BS_OK)
            return st;
        if (found != count)
            return bs_fail(cx, BS_EBUG, "a molecule fell into other pieces than expected");
        for (int i = 0; i < count; i++)
            (*out)[i].mol = mols[i];
    }
    return list_atoms(cx, home, mol, piece, *out, count);
}

bs_status bs_piece__split(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_piece **out,
                          int *count)
{
    int *piece;
    uint32_t *stack;
    bs_status st;

    *count = 0;
    if ((st = bs_new(cx, home, mol->atom_count + 1, &piece)) != BS_OK ||
        (st = bs_new(cx, home, mol->atom_count + 1, &stack)) != BS_OK)
        return st;
    if (mol->atom_count == 0)
        return BS_OK;
    *count = number_pieces(mol, piece, stack);
    return split(cx, home, mol, piece, out, *count);
}
