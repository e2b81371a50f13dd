/* The order in which a SMILES goes through a molecule: a depth-first tree and its closures. */
#include "format/smiles_write.h"

#include <string.h>

/* Whether link a comes before link b at an atom. */
static bool comes_first(const smiles_plan *plan, const bs_link *a, const bs_link *b)
{
    const bs_bond *bonds = bs_mol__bonds(plan->mol);

    if (plan->tidy) {
        bool multiple_a = bonds[a->bond].order > 1 && !(bonds[a->bond].flags & BS_BOND_AROMATIC);
        bool multiple_b = bonds[b->bond].order > 1 && !(bonds[b->bond].flags & BS_BOND_AROMATIC);

        if (multiple_a != multiple_b)
            return multiple_a;
    }
    return plan->rank[a->atom] < plan->rank[b->atom];
}

/* Sorts the links of an atom; there are few. */
static void sort_links(const smiles_plan *plan, bs_link *links, int count)
{
    for (int i = 1; i < count; i++) {
        bs_link link = links[i];
        int k = i;

        for (; k > 0 && comes_first(plan, &link, &links[k - 1]); k--)
            links[k] = links[k - 1];
        links[k] = link;
    }
}

/* ---- The tree ------------------------------------------------------------------------------ */

typedef struct tree {
    smiles_plan *plan;
    const uint32_t *offsets;
    uint32_t *found; /* by atom: number of discovery from 1 */
    uint32_t *next;  /* by atom: link to follow next */
    uint32_t *path;
    uint32_t *list; /* atoms as discovered */
    uint32_t *size; /* by atom: atoms of its subtree */
    uint32_t count;
} tree;

static void grow_tree(tree *t, uint32_t root)
{
    const bs_mol *mol = t->plan->mol;
    uint32_t depth = 0;

    t->list[t->count++] = root;
    t->found[root] = t->count;
    t->plan->entry[root] = UINT32_MAX;
    t->path[depth++] = root;
    while (depth > 0) {
        uint32_t atom = t->path[depth - 1];
        bs_link link;

        if (t->next[atom] == mol->atoms[atom].degree) {
            depth--;
            continue;
        }
        link = t->plan->links[t->offsets[atom] + t->next[atom]++];
        if (t->found[link.atom] != 0)
            continue;
        t->list[t->count++] = link.atom;
        t->found[link.atom] = t->count;
        t->plan->entry[link.atom] = link.bond;
        t->path[depth++] = link.atom;
    }
}

/* Where a string should rather start; smaller is better. */
static int start_class(const smiles_plan *plan, uint32_t atom)
{
    const bs_atom *a = &plan->mol->atoms[atom];

    if (!plan->tidy)
        return 0;
    return (a->degree > 1 ? 2 : 0) + (a->element == 6 ? 0 : 1);
}

/*
 * Grows a tree for each piece. Pieces are met in the order of `by_rank`; within a piece the start
 * is the best atom.
 */
static bs_status grow_trees(tree *t, const uint32_t *by_rank)
{
    smiles_plan *plan = t->plan;
    uint32_t atoms = plan->mol->atom_count;
    uint32_t *piece;
    bs_status st;

    if ((st = bs_new(plan->cx, &plan->cx->scratch, atoms, &piece)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < atoms; i++) {
        uint32_t root = by_rank[i];
        uint32_t from = t->count;

        if (piece[root] != 0)
            continue;
        grow_tree(t, root);
        for (uint32_t k = from; k < t->count; k++) {
            uint32_t atom = t->list[k];

            piece[atom] = 1;
            if (start_class(plan, atom) < start_class(plan, root) ||
                (start_class(plan, atom) == start_class(plan, root) &&
                 plan->rank[atom] < plan->rank[root]))
                root = atom;
        }
        if (root != by_rank[i]) {
            for (uint32_t k = from; k < t->count; k++) {
                t->found[t->list[k]] = 0;
                t->next[t->list[k]] = 0;
            }
            t->count = from;
            grow_tree(t, root);
        }
        plan->starts[plan->piece_count++] = from;
    }
    plan->starts[plan->piece_count] = t->count;
    return BS_OK;
}

/* ---- The order of links and atoms ----------------------------------------------------------- */

/* 0 the atom before, 1 closure that ends here, 2 one that begins here, 3 branch. */
static int link_class(const tree *t, uint32_t atom, const bs_link *link)
{
    if (t->plan->entry[atom] == link->bond)
        return 0;
    if (t->plan->entry[link->atom] == link->bond)
        return 3;
    return t->found[link->atom] < t->found[atom] ? 1 : 2;
}

/* Puts the links of an atom in written order. */
static void order_links(tree *t, uint32_t atom)
{
    smiles_plan *plan = t->plan;
    bs_link *links = plan->links + t->offsets[atom];
    int degree = plan->mol->atoms[atom].degree;

    for (int i = 0; i < degree; i++) {
        bs_link link = links[i];
        int class = link_class(t, atom, &link);
        int k = i;

        plan->closings[atom] = (uint8_t)(plan->closings[atom] + (class == 1));
        plan->openings[atom] = (uint8_t)(plan->openings[atom] + (class == 2));
        for (; k > 0; k--) {
            int before = link_class(t, atom, &links[k - 1]);

            if (before < class ||
                (before == class &&
                 (class != 3 || !plan->tidy || t->size[links[k - 1].atom] <= t->size[link.atom])))
                break;
            links[k] = links[k - 1];
        }
        links[k] = link;
    }
}

/* Walks the finished tree; branches come before the atom behind. */
static void number_atoms(tree *t)
{
    smiles_plan *plan = t->plan;
    uint32_t next = 0;

    for (uint32_t p = 0; p < plan->piece_count; p++) {
        uint32_t depth = 0;

        t->path[depth++] = t->list[plan->starts[p]];
        while (depth > 0) {
            uint32_t atom = t->path[--depth];
            const bs_link *links = plan->links + t->offsets[atom];

            plan->place[atom] = next;
            plan->order[next++] = atom;
            for (int k = plan->mol->atoms[atom].degree - 1; k >= 0; k--) {
                if (plan->entry[links[k].atom] == links[k].bond &&
                    plan->entry[atom] != links[k].bond)
                    t->path[depth++] = links[k].atom;
            }
        }
    }
}

static void finish_tree(tree *t)
{
    smiles_plan *plan = t->plan;
    const bs_bond *bonds = bs_mol__bonds(plan->mol);

    for (uint32_t i = t->count; i-- > 0;) {
        uint32_t atom = t->list[i];

        t->size[atom]++;
        if (plan->entry[atom] != UINT32_MAX)
            t->size[bs_bond__other(&bonds[plan->entry[atom]], atom)] += t->size[atom];
    }
    for (uint32_t i = 0; i < plan->mol->atom_count; i++)
        order_links(t, i);
    number_atoms(t);
}

static bs_status prepare(tree *t)
{
    smiles_plan *plan = t->plan;
    bs_arena *scratch = &plan->cx->scratch;
    uint32_t atoms = plan->mol->atom_count;
    uint32_t *block;
    uint8_t *bytes;
    bs_status st;

    if ((st = bs_new(plan->cx, scratch, (size_t)9 * atoms + 1, &block)) != BS_OK ||
        (st = bs_new(plan->cx, scratch, (size_t)3 * atoms + plan->mol->bond_count, &bytes)) !=
            BS_OK ||
        (st = bs_new(plan->cx, scratch, 2 * (size_t)plan->mol->bond_count, &plan->links)) != BS_OK)
        return st;
    t->found = block;
    t->next = block + atoms;
    t->path = block + (size_t)2 * atoms;
    t->list = block + (size_t)3 * atoms;
    t->size = block + (size_t)4 * atoms;
    plan->order = block + (size_t)5 * atoms;
    plan->place = block + (size_t)6 * atoms;
    plan->entry = block + (size_t)7 * atoms;
    plan->starts = block + (size_t)8 * atoms;
    plan->closings = bytes;
    plan->openings = bytes + atoms;
    plan->hydrogen = (char *)bytes + (size_t)2 * atoms;
    plan->slants = (char *)bytes + (size_t)3 * atoms;
    memcpy(plan->links, bs_mol__at(plan->mol, plan->mol->links_at),
           2 * (size_t)plan->mol->bond_count * sizeof *plan->links);
    return BS_OK;
}

bs_status smiles_plan_make(smiles_plan *plan)
{
    tree t = {.plan = plan, .offsets = bs_mol__at(plan->mol, plan->mol->offsets_at)};
    uint32_t *by_rank;
    bs_status st;

    if ((st = prepare(&t)) != BS_OK ||
        (st = bs_new(plan->cx, &plan->cx->scratch, plan->mol->atom_count, &by_rank)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < plan->mol->atom_count; i++) {
        by_rank[plan->rank[i]] = i;
        sort_links(plan, plan->links + t.offsets[i], plan->mol->atoms[i].degree);
    }
    if ((st = grow_trees(&t, by_rank)) != BS_OK)
        return st;
    finish_tree(&t);
    return plan->flags & BS_SMILES_NO_STEREO ? BS_OK : smiles_plan_slants(plan);
}
