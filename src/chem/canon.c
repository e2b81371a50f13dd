/* The canonical order and the symmetry classes of a molecule, found piece by piece. */
#include "chem/canon.h"

#include <string.h>

/* A piece with the order found for it. */
typedef struct ordered_piece {
    uint32_t piece;
    uint32_t size;
    bs_canon_order order;
} ordered_piece;

/* Larger pieces come first, then those with smaller certificates; equal ones may stand anyhow. */
static int compare_pieces(const ordered_piece *a, const ordered_piece *b)
{
    if (a->size != b->size)
        return a->size > b->size ? -1 : 1;
    return bs_canon__compare(&a->order, &b->order);
}

/* Merges two sorted runs of `from` into `to`. */
static void merge(const ordered_piece *from, size_t a, size_t middle, size_t end, ordered_piece *to)
{
    size_t b = middle;

    for (size_t i = a; i < end; i++) {
        bool first = a < middle && (b >= end || compare_pieces(&from[a], &from[b]) <= 0);

        *to++ = from[first ? a++ : b++];
    }
}

/* Sorts the pieces, stable, without recursion. */
static bs_status sort_pieces(bs_ctx *cx, ordered_piece **pieces, size_t count)
{
    ordered_piece *from = *pieces, *to;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, count, &to)) != BS_OK)
        return st;
    for (size_t width = 1; width < count; width *= 2) {
        ordered_piece *spare = from;

        for (size_t at = 0; at < count; at += 2 * width) {
            size_t middle = at + width < count ? at + width : count;
            size_t end = at + 2 * width < count ? at + 2 * width : count;

            merge(from, at, middle, end, to + at);
        }
        from = to;
        to = spare;
    }
    *pieces = from;
    return BS_OK;
}

static bs_status order_piece(bs_ctx *cx, const bs_mol *mol, const bs_canon_pieces *pieces,
                             uint32_t piece, bool labelled, bool orbits, bs_canon_order *order)
{
    bs_canon_task task = {.certificate = pieces->count > 1, .orbits = orbits};
    bs_canon_graph graph;
    bs_status st;

    if ((st = bs_canon__graph(cx, mol, pieces, piece, &graph)) != BS_OK)
        return st;
    graph.labelled = labelled;
    bs_canon__set_keys(&graph, true);
    return bs_canon__search(cx, &graph, &task, order);
}

/* Orders all pieces; `list` gets them in their canonical order, in the scratch arena. */
static bs_status order_pieces(bs_ctx *cx, const bs_mol *mol, bool labelled, bool orbits,
                              bs_canon_pieces *pieces, ordered_piece **list)
{
    bs_status st;

    if ((st = bs_canon__pieces(cx, mol, pieces)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, pieces->count, list)) != BS_OK)
        return st;
    for (uint32_t p = 0; p < pieces->count; p++) {
        (*list)[p].piece = p;
        (*list)[p].size = pieces->start[p + 1] - pieces->start[p];
        if ((st = order_piece(cx, mol, pieces, p, labelled, orbits, &(*list)[p].order)) != BS_OK)
            return st;
    }
    return pieces->count > 1 ? sort_pieces(cx, list, pieces->count) : BS_OK;
}

bs_status bs_mol__order(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bool labelled, int **rank)
{
    bs_mark kept = bs_arena_mark(home), temp;
    bs_canon_pieces pieces;
    ordered_piece *list;
    int next = 0;
    bs_status st;

    if ((st = bs_new(cx, home, mol->atom_count, rank)) != BS_OK)
        return st;
    temp = bs_arena_mark(&cx->scratch);
    if ((st = order_pieces(cx, mol, labelled, false, &pieces, &list)) != BS_OK)
        goto done;
    for (uint32_t p = 0; p < pieces.count; p++) {
        const uint32_t *atoms = pieces.atoms + pieces.start[list[p].piece];

        for (uint32_t i = 0; i < list[p].size; i++)
            (*rank)[atoms[i]] = next + (int)list[p].order.rank[i];
        next += (int)list[p].size;
    }
done:
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *rank = NULL;
    }
    return st;
}

bs_status bs_mol_canonical_order(bs_ctx *cx, bs_arena *home, const bs_mol *mol, int **rank)
{
    return bs_mol__order(cx, home, mol, false, rank);
}

/* ---- Symmetry -------------------------------------------------------------------------- */

/* Makes orbit[i] the smallest rank in the orbit of atom i. */
static bs_status name_orbits_by_rank(bs_ctx *cx, const ordered_piece *piece)
{
    uint32_t n = piece->size, *smallest;
    uint32_t *orbit = piece->order.orbit;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, n, &smallest)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < n; i++)
        smallest[i] = n;
    for (uint32_t i = 0; i < n; i++)
        if (piece->order.rank[i] < smallest[orbit[i]])
            smallest[orbit[i]] = piece->order.rank[i];
    for (uint32_t i = 0; i < n; i++)
        orbit[i] = smallest[orbit[i]];
    return BS_OK;
}

/* Gives the atoms of a piece classes from `base` on, by smallest rank; returns how many. */
static bs_status number_classes(bs_ctx *cx, const ordered_piece *piece, const uint32_t *atoms,
                                int base, int *classes, int *count)
{
    uint32_t n = piece->size, *number;
    bs_status st;

    *count = 0;
    if ((st = name_orbits_by_rank(cx, piece)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, n, &number)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < n; i++)
        number[piece->order.orbit[i]] = 1;
    for (uint32_t r = 0; r < n; r++)
        if (number[r])
            number[r] = (uint32_t)(*count)++;
    for (uint32_t i = 0; i < n; i++)
        classes[atoms[i]] = base + (int)number[piece->order.orbit[i]];
    return BS_OK;
}

bs_status bs_mol_symmetry(bs_ctx *cx, bs_arena *home, const bs_mol *mol, int **classes)
{
    bs_mark kept = bs_arena_mark(home), temp;
    bs_canon_pieces pieces;
    ordered_piece *list;
    int base = 0, count = 0;
    bs_status st;

    if ((st = bs_new(cx, home, mol->atom_count, classes)) != BS_OK)
        return st;
    temp = bs_arena_mark(&cx->scratch);
    if ((st = order_pieces(cx, mol, false, true, &pieces, &list)) != BS_OK)
        goto done;
    for (uint32_t p = 0; p < pieces.count; p++) {
        if (p > 0 && compare_pieces(&list[p - 1], &list[p]) != 0)
            base += count;
        if ((st = number_classes(cx, &list[p], pieces.atoms + pieces.start[list[p].piece], base,
                                 *classes, &count)) != BS_OK)
            goto done;
    }
done:
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *classes = NULL;
    }
    return st;
}
