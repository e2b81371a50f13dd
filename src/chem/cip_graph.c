/* Growing the hierarchical digraph. */
#include "chem/cip.h"

#include "chem/element.h"

#include <string.h>

/* ---- Rings whose double bonds move ----------------------------------------------------------- */

/*
 * Whether an atom has one double bond, and that in a ring. Such atoms make up a mancude ring if
 * each has two of its kind beside it.
 */
static bool has_ring_double(const bs_mol *mol, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    int inside = 0;

    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        const bs_bond *bond = &bonds[links[k].bond];

        if (bond->order > 2 || (bond->order == 2 && !(bond->flags & BS_BOND_RING)))
            return false;
        inside += bond->order == 2;
    }
    return inside == 1;
}

/* Counts the neighbours in rings that are marked, and adds up their atomic numbers. */
static int marked_neighbours(const bs_mol *mol, const uint16_t *mark, uint32_t atom, int *sum)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    int count = 0;

    *sum = 0;
    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        if (!mark[links[k].atom] || !(bonds[links[k].bond].flags & BS_BOND_RING))
            continue;
        *sum += mol->atoms[links[k].atom].element;
        count++;
    }
    return count;
}

/*
 * Unmarks atoms with fewer than two marked neighbours until none is left. An atom enters the stack
 * only when it loses its mark, so each does once.
 */
static void peel(const bs_mol *mol, uint16_t *mark, uint32_t *stack)
{
    uint32_t depth = 0;
    int sum;

    for (uint32_t i = 0; i < mol->atom_count; i++) {
        if (mark[i] && marked_neighbours(mol, mark, i, &sum) < 2) {
            mark[i] = 0;
            stack[depth++] = i;
        }
        while (depth > 0) {
            uint32_t atom = stack[--depth];
            const bs_link *links = bs_mol__links(mol, atom);

            for (int k = 0; k < mol->atoms[atom].degree; k++) {
                uint32_t other = links[k].atom;

                if (mark[other] && marked_neighbours(mol, mark, other, &sum) < 2) {
                    mark[other] = 0;
                    stack[depth++] = other;
                }
            }
        }
    }
}

/*
 * The duplicate on an atom of a mancude ring has the mean atomic number of the atoms to which its
 * double bond may go (P-92.1.4.4): two or three, so that six times it is whole.
 */
static bs_status find_mancude(bs_cip *cip)
{
    const bs_mol *mol = cip->mol;
    bs_ctx *cx = cip->cx;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    uint16_t *mark;
    uint32_t *stack;
    bs_status st;

    if ((st = bs_new(cx, &cip->arena, mol->atom_count + 1, &cip->mancude)) != BS_OK)
        return st;
    if ((st = bs_new(cx, &cx->scratch, mol->atom_count + 1, &mark)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, mol->atom_count + 1, &stack)) != BS_OK)
        goto done;
    for (uint32_t i = 0; i < mol->atom_count; i++)
        mark[i] = has_ring_double(mol, i);
    peel(mol, mark, stack);
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        int sum;
        int count = mark[i] ? marked_neighbours(mol, mark, i, &sum) : 0;

        if (count == 2 || count == 3)
            cip->mancude[i] = (uint16_t)(sum * 6 / count);
    }
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Nodes ------------------------------------------------------------------------------------ */

static bs_status make_room(bs_cip *cip)
{
    uint32_t room = cip->room ? 2 * cip->room : 512;
    bs_cip_node *nodes;
    bs_status st;

    if ((st = bs_new(cip->cx, &cip->arena, room, &nodes)) != BS_OK ||
        (st = bs_new(cip->cx, &cip->arena, room, &cip->order)) != BS_OK ||
        (st = bs_new(cip->cx, &cip->arena, room, &cip->kids)) != BS_OK ||
        (st = bs_new(cip->cx, &cip->arena, room, &cip->split)) != BS_OK ||
        (st = bs_new(cip->cx, &cip->arena, room, &cip->kept_kids)) != BS_OK ||
        (st = bs_new(cip->cx, &cip->arena, room, &cip->kept_split)) != BS_OK ||
        (st = bs_new(cip->cx, &cip->arena, 2 * room, &cip->queue)) != BS_OK)
        return st;
    if (cip->count > 0)
        memcpy(nodes, cip->nodes, cip->count * sizeof *nodes);
    cip->nodes = nodes;
    cip->room = room;
    return BS_OK;
}

static uint32_t mass_of(int element, int isotope)
{
    double mass;

    if (isotope)
        mass = bs_isotope__mass(element, isotope);
    else if ((mass = bs_element__weight(element)) <= 0)
        mass = bs_element__main_mass(element);
    return (uint32_t)(mass * 1e4 + 0.5);
}

/* Adds a child to `parent`; its number and mass are those of the atom until the caller says else. */
static bs_status add_node(bs_cip *cip, uint32_t parent, uint32_t atom, bs_cip_kind kind,
                          bs_cip_node **out)
{
    uint32_t depth = parent == BS_CIP_NONE ? 0 : cip->nodes[parent].depth + 1;
    int element = atom == BS_DRAFT_HYDROGEN ? 1 : cip->mol->atoms[atom].element;
    int isotope = atom == BS_DRAFT_HYDROGEN ? 0 : cip->mol->atoms[atom].isotope;
    bs_status st;

    if (cip->count >= cip->node_limit)
        return bs_fail(cip->cx, BS_ELIMIT,
                       "the molecule has too many rings for CIP labels: more than %lu paths",
                       (unsigned long)cip->node_limit);
    if (cip->count == cip->room && (st = make_room(cip)) != BS_OK)
        return st;
    *out = &cip->nodes[cip->count++];
    **out = (bs_cip_node){.parent = parent, .atom = atom, .depth = depth, .distance = depth};
    (*out)->number = (uint16_t)(6 * element);
    (*out)->kind = (uint8_t)kind;
    (*out)->mass = kind == BS_CIP_REAL ? mass_of(element, isotope) : 0;
    if (parent != BS_CIP_NONE)
        cip->nodes[parent].count++;
    return BS_OK;
}

bs_status bs_cip__open(bs_ctx *cx, const bs_mol *mol, bs_cip *cip)
{
    memset(cip, 0, sizeof *cip);
    cip->cx = cx;
    cip->mol = mol;
    cip->work_left = BS_CIP_WORK_LIMIT;
    cip->node_limit = BS_CIP_NODE_LIMIT;
    bs_arena_init(&cip->arena, cx->gate);
    return find_mancude(cip);
}

void bs_cip__close(bs_cip *cip)
{
    bs_arena_free(&cip->arena);
}

bs_status bs_cip__root(bs_cip *cip, uint32_t atom)
{
    bs_cip_node *node;

    cip->count = 0;
    cip->grown = 0;
    return add_node(cip, BS_CIP_NONE, atom, BS_CIP_REAL, &node);
}

/* The node of an atom on the way from a node to the root, or BS_CIP_NONE. */
static uint32_t find_above(bs_cip *cip, uint32_t node, uint32_t atom)
{
    while (node != BS_CIP_NONE && cip->nodes[node].atom != atom) {
        node = cip->nodes[node].parent;
        cip->work_left--;
    }
    return node;
}

/*
 * Whether an atom has four ligands, lone pairs counted, and still double bonds: phosphoryl,
 * sulfinyl, sulfonyl. Prelog and Helmchen neglect what d orbitals are said to add to such bonds.
 */
static bool is_beyond_octet(const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];

    switch (a->element) {
    case 15:
    case 33:
    case 51:
        return a->degree + a->hydrogens == 4;
    case 16:
    case 34:
    case 52:
        return a->degree + a->hydrogens >= 3;
    case 17:
    case 35:
    case 53:
        return a->degree + a->hydrogens >= 2;
    default:
        return false;
    }
}

static bs_status add_bond_duplicates(bs_cip *cip, uint32_t at, const bs_link *link)
{
    const bs_bond *bond = &bs_mol__bonds(cip->mol)[link->bond];
    uint32_t atom = cip->nodes[at].atom;
    bs_cip_node *child;
    bs_status st = BS_OK;

    if (is_beyond_octet(cip->mol, atom) || is_beyond_octet(cip->mol, link->atom))
        return BS_OK;
    for (unsigned n = 1; n < bond->order && st == BS_OK; n++) {
        if ((st = add_node(cip, at, link->atom, BS_CIP_BOND_DUPLICATE, &child)) != BS_OK)
            break;
        child->distance = child->depth - 1;
        if (cip->mancude[atom] && (bond->flags & BS_BOND_RING))
            child->number = cip->mancude[atom];
    }
    return st;
}

/* Gives a node its children. */
static bs_status expand(bs_cip *cip, uint32_t at)
{
    const bs_mol *mol = cip->mol;
    uint32_t atom = cip->nodes[at].atom;
    uint32_t parent = cip->nodes[at].parent;
    const bs_link *links = bs_mol__links(mol, atom);
    bs_cip_node *child;
    bs_status st = BS_OK;

    for (int k = 0; k < mol->atoms[atom].degree && st == BS_OK; k++) {
        bool ring = bs_mol__bonds(mol)[links[k].bond].flags & BS_BOND_RING;
        uint32_t above = BS_CIP_NONE;

        if (parent == BS_CIP_NONE || cip->nodes[parent].atom != links[k].atom) {
            if (ring)
                above = find_above(cip, parent, links[k].atom);
            st = add_node(cip, at, links[k].atom,
                          above == BS_CIP_NONE ? BS_CIP_REAL : BS_CIP_RING_DUPLICATE, &child);
            if (st == BS_OK && above != BS_CIP_NONE)
                child->distance = cip->nodes[above].depth;
        }
        if (st == BS_OK)
            st = add_bond_duplicates(cip, at, &links[k]);
    }
    for (int h = 0; h < mol->atoms[atom].hydrogens && st == BS_OK; h++)
        st = add_node(cip, at, BS_DRAFT_HYDROGEN, BS_CIP_REAL, &child);
    return st;
}

bs_status bs_cip__grow(bs_cip *cip, uint32_t depth, bool *complete)
{
    bs_status st;

    if ((st = bs_poll(cip->cx)) != BS_OK)
        return st;
    for (; cip->grown < cip->count; cip->grown++) {
        bs_cip_node *node = &cip->nodes[cip->grown];

        if (node->depth >= depth)
            break;
        node->first = cip->count;
        if (node->kind == BS_CIP_REAL && node->atom != BS_DRAFT_HYDROGEN &&
            (st = expand(cip, cip->grown)) != BS_OK)
            return st;
        if (cip->work_left < 0)
            return bs_fail(cip->cx, BS_ELIMIT, "the molecule is too large for CIP labels");
    }
    *complete = cip->grown == cip->count;
    return BS_OK;
}
