/*
 * Finds the stereo marks that mean nothing because ligands are alike, and removes them.
 *
 * An element whose ligands all differ in colour means something; nearly all are of this sort, and
 * one refinement shows it. Any other element is tested by turning it over: let C be the elements
 * that can be turned over, each by a symmetry of the rest that leaves the element in its place. A
 * mark in C is removed if such a symmetry exists that leaves all elements of C in their places,
 * because then each of these marks can be turned over without regard to the others, and all that
 * they say is one molecule. What remains is looked at again, since a centre may have been told
 * apart by marks that meant nothing.
 *
 * The second half of the rule keeps sets that mean something only together: in
 * 1,3,5-trimethylcyclohexane with one methyl group trans to the others, either of the two may be
 * turned over by reflection, but the reflection moves the other one.
 */
#include "chem/canon.h"

#include "chem/stereo.h"

enum { WORK_LIMIT = 20 * 1000 * 1000 };

typedef struct strip {
    bs_ctx *cx;
    bs_mol *mol;
    bs_canon_graph graph;
    uint32_t *open; /* elements whose ligands are not told apart by colour */
    uint32_t open_count;
    uint32_t *turning; /* C above */
    uint32_t turning_count;
    bool *gone; /* by place in `turning`: the mark means nothing */
    uint64_t work_left;
} strip;

static void remove_mark(strip *s, bs_canon_element *element)
{
    bs_bond *bonds = (bs_bond *)((char *)s->mol + s->mol->bonds_at);

    element->perm = 0;
    if (element->kind == BS_CANON_DOUBLE) {
        bonds[element->source].flags &= (uint8_t) ~(BS_BOND_CIS | BS_BOND_TRANS);
        return;
    }
    s->mol->atoms[element->source].stereo = BS_STEREO_NONE;
    s->mol->atoms[element->source].perm = 0;
}

/* Removes marks whose ligands are too few or too many; answers whether any mark is left. */
static bool remove_misfits(bs_mol *mol)
{
    bs_bond *bonds = (bs_bond *)((char *)mol + mol->bonds_at);
    bs_canon_element element;
    bool left = false;

    for (uint32_t i = 0; i < mol->atom_count; i++) {
        if (mol->atoms[i].stereo == BS_STEREO_NONE)
            continue;
        if (bs_canon__atom_element(mol, i, &element)) {
            left = true;
            continue;
        }
        mol->atoms[i].stereo = BS_STEREO_NONE;
        mol->atoms[i].perm = 0;
    }
    for (uint32_t i = 0; i < mol->bond_count; i++) {
        if (!(bonds[i].flags & (BS_BOND_CIS | BS_BOND_TRANS)))
            continue;
        if (bs_canon__bond_element(mol, i, &element))
            left = true;
        else
            bonds[i].flags &= (uint8_t) ~(BS_BOND_CIS | BS_BOND_TRANS);
    }
    return left;
}

/* Lists the elements whose ligands a refinement does not tell apart. */
static bs_status find_open(strip *s)
{
    bs_canon_cells cells;
    bs_status st;

    s->open_count = 0;
    if ((st = bs_new(s->cx, &s->cx->scratch, s->graph.element_count, &s->open)) != BS_OK ||
        (st = bs_canon__cells_new(s->cx, s->graph.atom_count, &cells)) != BS_OK)
        return st;
    bs_canon__set_keys(&s->graph, false);
    bs_canon__cells_start(&cells, &s->graph);
    bs_canon__refine(&cells, &s->graph);
    for (uint32_t k = 0; k < s->graph.element_count; k++)
        if (bs_canon__code(&s->graph.element[k], cells.colour) == 0)
            s->open[s->open_count++] = k;
    return BS_OK;
}

/* The certificate of the graph as it is, with some elements kept in their places. */
static bs_status certify(strip *s, const uint32_t *fixed, uint32_t count, bs_canon_order *order)
{
    bs_canon_task task = {.certificate = true, .fixed = fixed, .fixed_count = count};
    bs_status st;

    task.work_limit = s->work_left;
    if ((st = bs_canon__search(s->cx, &s->graph, &task, order)) != BS_OK)
        return st;
    if (order->work >= s->work_left)
        return bs_fail(s->cx, BS_ELIMIT, "the stereo marks are too many to be compared");
    s->work_left -= order->work;
    return BS_OK;
}

/* Whether an element may have any mark without a difference, while `fixed` stay in their places. */
static bs_status can_turn(strip *s, uint32_t index, const uint32_t *fixed, uint32_t count,
                          bool *turns)
{
    bs_canon_element *element = &s->graph.element[index];
    uint32_t variants =
        element->kind == BS_CANON_DOUBLE ? 2 : (uint32_t)bs_stereo__perm_count(element->kind);
    uint8_t perm = element->perm;
    bs_mark temp = bs_arena_mark(&s->cx->scratch);
    bs_canon_order before, after;
    bs_status st;

    *turns = true;
    if ((st = certify(s, fixed, count, &before)) != BS_OK)
        goto done;
    for (uint32_t other = 1; other <= variants && *turns; other++) {
        if (other == perm)
            continue;
        element->perm = (uint8_t)other;
        if ((st = certify(s, fixed, count, &after)) != BS_OK)
            break;
        *turns = bs_canon__compare(&before, &after) == 0;
    }
done:
    element->perm = perm;
    bs_arena_rewind(&s->cx->scratch, temp);
    return st;
}

/* One round: removes what can be removed at once; *removed counts. */
static bs_status strip_once(strip *s, uint32_t *removed)
{
    bool turns;
    uint32_t kept = 0;
    bs_status st;

    *removed = 0;
    s->turning_count = 0;
    for (uint32_t k = 0; k < s->open_count; k++) {
        if ((st = can_turn(s, s->open[k], &s->open[k], 1, &turns)) != BS_OK)
            return st;
        if (turns)
            s->turning[s->turning_count++] = s->open[k];
    }
    /* Marks are taken away only after all have been judged. */
    for (uint32_t k = 0; k < s->turning_count; k++) {
        if (s->turning_count == 1)
            turns = true;
        else if ((st = can_turn(s, s->turning[k], s->turning, s->turning_count, &turns)) != BS_OK)
            return st;
        s->gone[k] = turns;
    }
    for (uint32_t k = 0; k < s->turning_count; k++) {
        if (!s->gone[k])
            continue;
        remove_mark(s, &s->graph.element[s->turning[k]]);
        (*removed)++;
    }
    for (uint32_t k = 0; k < s->open_count; k++)
        if (s->graph.element[s->open[k]].perm != 0)
            s->open[kept++] = s->open[k];
    s->open_count = kept;
    return BS_OK;
}

/* ---- At a glance --------------------------------------------------------------------------- */

enum { ROUNDS = 6 };

static uint32_t mix(uint32_t sum, uint32_t value)
{
    sum = (sum ^ value) * 0x9E3779B1u;
    return sum ^ sum >> 15;
}

static void colour_atoms(const bs_mol *mol, uint32_t *colour)
{
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        const bs_atom *a = &mol->atoms[i];
        uint32_t value = a->element;

        value = value << 8 | (uint8_t)a->charge;
        value = value << 8 | a->hydrogens;
        value = value << 8 | (uint32_t)(a->degree << 1) | (a->flags & BS_ATOM_AROMATIC);
        colour[i] = mix(mix(0, value), a->isotope);
    }
}

/* Colours each atom by its colour and those of its neighbours. */
static void colour_anew(const bs_mol *mol, const uint32_t *colour, uint32_t *next)
{
    const bs_bond *bonds = bs_mol__bonds(mol);

    for (uint32_t i = 0; i < mol->atom_count; i++) {
        const bs_link *links = bs_mol__links(mol, i);
        uint32_t sum = 0;

        for (uint32_t k = 0; k < mol->atoms[i].degree; k++) {
            const bs_bond *b = &bonds[links[k].bond];
            uint32_t type = b->flags & BS_BOND_AROMATIC ? (uint32_t)BS_CANON_AROMATIC : b->order;

            sum += mix(colour[links[k].atom], type);
        }
        next[i] = mix(colour[i], sum);
    }
}

/*
 * Whether a few rounds of colours tell the ligands of every element apart, without regard to
 * stereo. Colours are hashes of what lies around an atom, so those that differ prove a difference.
 */
static bs_status all_apparent(bs_ctx *cx, const bs_mol *mol, bool *apparent)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t *colour, *next, marks = 0, open = 0, kept;
    bs_canon_element *elements;
    bs_status st;

    for (uint32_t i = 0; i < mol->atom_count; i++)
        marks += mol->atoms[i].stereo != BS_STEREO_NONE;
    for (uint32_t i = 0; i < mol->bond_count; i++)
        marks += (bonds[i].flags & (BS_BOND_CIS | BS_BOND_TRANS)) != 0;
    if ((st = bs_new(cx, &cx->scratch, mol->atom_count, &colour)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, mol->atom_count, &next)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, marks, &elements)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < mol->atom_count; i++)
        open += mol->atoms[i].stereo && bs_canon__atom_element(mol, i, &elements[open]);
    for (uint32_t i = 0; i < mol->bond_count; i++)
        open += bonds[i].flags & (BS_BOND_CIS | BS_BOND_TRANS) &&
                bs_canon__bond_element(mol, i, &elements[open]);
    colour_atoms(mol, colour);
    for (int round = 0; round < ROUNDS && open > 0; round++) {
        uint32_t *swap = colour;

        colour_anew(mol, colour, next);
        colour = next;
        next = swap;
        kept = 0;
        for (uint32_t k = 0; k < open; k++) {
            if (bs_canon__code(&elements[k], colour) == 0)
                elements[kept++] = elements[k];
        }
        open = kept;
    }
    *apparent = open == 0;
    return BS_OK;
}

/* ---- By symmetry ---------------------------------------------------------------------------- */

static bs_status strip_piece(strip *s, const bs_canon_pieces *pieces, uint32_t piece)
{
    uint32_t removed = 1;
    bs_status st;

    if ((st = bs_canon__graph(s->cx, s->mol, pieces, piece, &s->graph)) != BS_OK)
        return st;
    if (s->graph.element_count == 0)
        return BS_OK;
    if ((st = find_open(s)) != BS_OK)
        return st;
    if (s->open_count == 0)
        return BS_OK;
    if ((st = bs_new(s->cx, &s->cx->scratch, s->open_count, &s->turning)) != BS_OK ||
        (st = bs_new(s->cx, &s->cx->scratch, s->open_count, &s->gone)) != BS_OK)
        return st;
    while (removed > 0 && s->open_count > 0) {
        bs_canon__set_keys(&s->graph, true);
        if ((st = strip_once(s, &removed)) != BS_OK)
            return st;
    }
    return BS_OK;
}

bs_status bs_mol__strip_meaningless_stereo(bs_ctx *cx, bs_mol *mol)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    strip s = {.cx = cx, .mol = mol, .work_left = WORK_LIMIT};
    bs_canon_pieces pieces;
    bool apparent;
    bs_status st;

    if (!remove_misfits(mol))
        return BS_OK;
    if ((st = all_apparent(cx, mol, &apparent)) != BS_OK || apparent ||
        (st = bs_canon__pieces(cx, mol, &pieces)) != BS_OK)
        goto done;
    for (uint32_t p = 0; p < pieces.count; p++) {
        bs_mark piece_mark = bs_arena_mark(&cx->scratch);

        if ((st = strip_piece(&s, &pieces, p)) != BS_OK)
            break;
        bs_arena_rewind(&cx->scratch, piece_mark);
    }
    /* Beyond the limit the marks that are left stand as they were written. */
    if (st == BS_ELIMIT)
        st = BS_OK;
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
