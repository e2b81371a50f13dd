/* The plain graphs of the connected pieces of a molecule, for canonical order and symmetry. */
#include "chem/canon.h"

#include <string.h>

/* Marks all atoms that hang together with `seed`; returns how many. */
static uint32_t flood(const bs_mol *mol, uint32_t seed, uint32_t label, uint32_t *piece_of,
                      uint32_t *stack)
{
    uint32_t top = 0, count = 0;

    stack[top++] = seed;
    piece_of[seed] = label;
    while (top > 0) {
        uint32_t atom = stack[--top];
        const bs_link *links = bs_mol__links(mol, atom);

        count++;
        for (uint32_t k = 0; k < mol->atoms[atom].degree; k++) {
            if (piece_of[links[k].atom] != BS_CANON_NONE)
                continue;
            piece_of[links[k].atom] = label;
            stack[top++] = links[k].atom;
        }
    }
    return count;
}

bs_status bs_canon__pieces(bs_ctx *cx, const bs_mol *mol, bs_canon_pieces *pieces)
{
    size_t n = mol->atom_count;
    uint32_t *piece_of;
    bs_status st;

    memset(pieces, 0, sizeof *pieces);
    if ((st = bs_new(cx, &cx->scratch, 4 * n + 1, &pieces->start)) != BS_OK)
        return st;
    pieces->atoms = pieces->start + n + 1;
    pieces->local = pieces->atoms + n;
    piece_of = pieces->local + n;
    memset(piece_of, 0xFF, n * sizeof *piece_of);
    for (uint32_t atom = 0; atom < n; atom++) {
        if (piece_of[atom] != BS_CANON_NONE)
            continue;
        /* `atoms` is free until the sizes are known, and serves as the stack. */
        uint32_t size = flood(mol, atom, pieces->count, piece_of, pieces->atoms);

        pieces->start[pieces->count + 1] = pieces->start[pieces->count] + size;
        pieces->count++;
    }
    for (uint32_t atom = 0; atom < n; atom++) {
        /* start[p] moves on as the piece fills and is set back below. */
        uint32_t p = piece_of[atom];

        pieces->atoms[pieces->start[p]++] = atom;
    }
    for (uint32_t p = pieces->count; p > 0; p--)
        pieces->start[p] = pieces->start[p - 1];
    pieces->start[0] = 0;
    for (uint32_t p = 0; p < pieces->count; p++)
        for (uint32_t k = pieces->start[p]; k < pieces->start[p + 1]; k++)
            pieces->local[pieces->atoms[k]] = k - pieces->start[p];
    return BS_OK;
}

static uint32_t bond_type(const bs_bond *bond)
{
    return bond->flags & BS_BOND_AROMATIC ? (uint32_t)BS_CANON_AROMATIC : bond->order;
}

static bs_status link_atoms(bs_ctx *cx, const uint32_t *local, bs_canon_graph *graph)
{
    const bs_mol *mol = graph->mol;
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t *offset, *edge, ends = 0;
    bs_status st;

    for (uint32_t i = 0; i < graph->atom_count; i++)
        ends += mol->atoms[graph->atoms[i]].degree;
    if ((st = bs_new(cx, &cx->scratch, graph->atom_count + 1, &offset)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, ends, &edge)) != BS_OK)
        return st;
    graph->offset = offset;
    graph->edge = edge;
    graph->edge_count = ends;
    for (uint32_t i = 0; i < graph->atom_count; i++) {
        const bs_link *links = bs_mol__links(mol, graph->atoms[i]);

        for (uint32_t k = 0; k < mol->atoms[graph->atoms[i]].degree; k++)
            *edge++ = local[links[k].atom] << BS_CANON_TYPE_BITS | bond_type(&bonds[links[k].bond]);
        offset[i + 1] = (uint32_t)(edge - graph->edge);
    }
    return BS_OK;
}

static void localise(bs_canon_element *element, const uint32_t *local)
{
    for (uint32_t k = 0; k < element->site_count; k++)
        element->site[k] = local[element->site[k]];
    for (uint32_t k = 0; k < element->ligand_count; k++)
        if (bs_canon__is_atom(element->ligand[k]))
            element->ligand[k] = local[element->ligand[k]];
}

/* Visits the marks of one atom and of its bonds to later atoms; counts only if `out` is NULL. */
static uint32_t atom_elements(const bs_canon_graph *graph, uint32_t atom, const uint32_t *local,
                              bs_canon_element *out)
{
    const bs_mol *mol = graph->mol;
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    bs_canon_element element;
    uint32_t count = 0;

    if (mol->atoms[atom].stereo != BS_STEREO_NONE && bs_canon__atom_element(mol, atom, &element)) {
        localise(&element, local);
        if (out)
            out[count] = element;
        count++;
    }
    for (uint32_t k = 0; k < mol->atoms[atom].degree; k++) {
        if (links[k].atom < atom || !(bonds[links[k].bond].flags & (BS_BOND_CIS | BS_BOND_TRANS)) ||
            !bs_canon__bond_element(mol, links[k].bond, &element))
            continue;
        localise(&element, local);
        if (out)
            out[count] = element;
        count++;
    }
    return count;
}

static bs_status find_elements(bs_ctx *cx, const uint32_t *local, bs_canon_graph *graph)
{
    uint32_t count = 0;
    bs_status st;

    for (uint32_t i = 0; i < graph->atom_count; i++)
        count += atom_elements(graph, graph->atoms[i], local, NULL);
    if (count == 0)
        return BS_OK;
    if ((st = bs_new(cx, &cx->scratch, count, &graph->element)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, graph->atom_count, &graph->element_head)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, 2 * (size_t)count, &graph->element_next)) != BS_OK)
        return st;
    memset(graph->element_head, 0xFF, graph->atom_count * sizeof *graph->element_head);
    for (uint32_t i = 0; i < graph->atom_count; i++)
        graph->element_count +=
            atom_elements(graph, graph->atoms[i], local, graph->element + graph->element_count);
    for (uint32_t k = 0; k < count; k++) {
        for (uint32_t s = 0; s < graph->element[k].site_count; s++) {
            uint32_t site = graph->element[k].site[s];

            graph->element_next[2 * k + s] = graph->element_head[site];
            graph->element_head[site] = 2 * k + s;
        }
    }
    return BS_OK;
}

bs_status bs_canon__graph(bs_ctx *cx, const bs_mol *mol, const bs_canon_pieces *pieces,
                          uint32_t piece, bs_canon_graph *graph)
{
    bs_status st;

    memset(graph, 0, sizeof *graph);
    graph->mol = mol;
    graph->atoms = pieces->atoms + pieces->start[piece];
    graph->atom_count = pieces->start[piece + 1] - pieces->start[piece];
    if ((st = link_atoms(cx, pieces->local, graph)) != BS_OK ||
        (st = find_elements(cx, pieces->local, graph)) != BS_OK)
        return st;
    if ((st = bs_new(cx, &cx->scratch, graph->atom_count, &graph->number)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, graph->atom_count, &graph->key)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < graph->atom_count; i++)
        graph->number[i] = i;
    return BS_OK;
}

/* Terminal atoms first, then by element: rank 0 is a good place to start writing. */
static uint64_t atom_key(const bs_atom *atom)
{
    uint64_t key = atom->degree;

    key = key << 8 | atom->element;
    key = key << 16 | atom->isotope;
    key = key << 8 | (uint8_t)(atom->charge + 128);
    key = key << 8 | atom->hydrogens;
    return key << 8 | (atom->flags & BS_ATOM_AROMATIC ? 0x80u : 0u);
}

uint32_t bs_canon__label(const bs_canon_graph *graph, uint32_t atom)
{
    return graph->labelled ? graph->mol->atoms[graph->atoms[atom]].label : 0;
}

void bs_canon__set_keys(bs_canon_graph *graph, bool marked)
{
    for (uint32_t i = 0; i < graph->atom_count; i++)
        graph->key[i] = atom_key(&graph->mol->atoms[graph->atoms[i]]);
    if (!marked)
        return;
    for (uint32_t k = 0; k < graph->element_count; k++) {
        const bs_canon_element *element = &graph->element[k];

        /* One bit for each kind but for the atoms of two double bonds, which add up alike. */
        for (uint32_t s = 0; s < element->site_count && element->perm != 0; s++)
            graph->key[element->site[s]] |= (uint64_t)1 << (element->kind - 1);
    }
}
