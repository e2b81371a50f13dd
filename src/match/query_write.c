/* Writes queries as SMARTS: the graph of atoms, branches, rings and groups. */
#include "match/write.h"

#include <string.h>

/*
 * Atoms are written in their order (those of a group together). Each is put behind the deepest
 * atom of the branch being written that it is bonded to; its other bonds become ring numbers,
 * even across a dot. So every order of atoms can be written.
 */
typedef struct plan {
    bs_writing *w;
    const bs_query *query;
    int *order;      /* atoms as they are written */
    int *place;      /* inverse of it */
    int *parent;     /* bond to the atom before, -1 for the first atom of a part */
    int *last_child; /* of each atom, -1 for none */
    int *path;       /* atoms from the first of the part to the last one written */
    bool *opened;    /* a '(' stands before the atom */
    int path_count;
    int *number; /* of each bond that is a ring number and open, 0 if not */
    bool used[100];
    int *first; /* bonds of each atom: adjacency in one array */
    int *links;
} plan;

static int other_end(const bs_query_bond *bond, int atom)
{
    return bond->a == atom ? bond->b : bond->a;
}

static bs_status make_plan(plan *p)
{
    const bs_query *q = p->query;
    bs_ctx *cx = p->w->cx;
    bs_arena *scratch = &cx->scratch;
    bs_status st;

    if ((st = bs_new(cx, scratch, q->atom_count + 1, &p->order)) != BS_OK ||
        (st = bs_new(cx, scratch, q->atom_count + 1, &p->place)) != BS_OK ||
        (st = bs_new(cx, scratch, q->atom_count + 1, &p->parent)) != BS_OK ||
        (st = bs_new(cx, scratch, q->atom_count + 1, &p->last_child)) != BS_OK ||
        (st = bs_new(cx, scratch, q->atom_count + 1, &p->path)) != BS_OK ||
        (st = bs_new(cx, scratch, q->atom_count + 1, &p->opened)) != BS_OK ||
        (st = bs_new(cx, scratch, q->atom_count + 2, &p->first)) != BS_OK ||
        (st = bs_new(cx, scratch, q->bond_count + 1, &p->number)) != BS_OK)
        return st;
    return bs_new(cx, scratch, 2 * q->bond_count + 1, &p->links);
}

static void fill_links(plan *p)
{
    const bs_query *q = p->query;

    for (int i = 0; i < q->bond_count; i++) {
        p->first[q->bonds[i].a + 2]++;
        p->first[q->bonds[i].b + 2]++;
    }
    for (int i = 2; i <= q->atom_count; i++)
        p->first[i] += p->first[i - 1];
    for (int i = 0; i < q->bond_count; i++) {
        p->links[p->first[q->bonds[i].a + 1]++] = i;
        p->links[p->first[q->bonds[i].b + 1]++] = i;
    }
}

/* The order of the query, but the atoms of a group follow its first one. */
static void find_order(plan *p)
{
    const bs_query *q = p->query;
    int count = 0;

    for (int i = 0; i < q->atom_count; i++)
        p->place[i] = -1;
    for (int i = 0; i < q->atom_count; i++) {
        int group = q->atoms[i].component;

        for (int k = i; k < q->atom_count && p->place[i] < 0 && group; k++)
            if (q->atoms[k].component == group && k != i) {
                if (p->place[i] < 0) {
                    p->place[i] = count;
                    p->order[count++] = i;
                }
                p->place[k] = count;
                p->order[count++] = k;
            }
        if (p->place[i] < 0) {
            p->place[i] = count;
            p->order[count++] = i;
        }
    }
}

/* The bond to the deepest atom of the path, or -1. The path is cut back to that atom. */
static int find_parent(plan *p, int atom)
{
    const bs_query *q = p->query;

    for (int depth = p->path_count - 1; depth >= 0; depth--)
        for (int k = p->first[atom]; k < p->first[atom + 1]; k++) {
            int other = other_end(&q->bonds[p->links[k]], atom);

            if (other != p->path[depth] || q->atoms[other].component != q->atoms[atom].component)
                continue;
            p->path_count = depth + 1;
            return p->links[k];
        }
    p->path_count = 0;
    return -1;
}

static void find_parents(plan *p)
{
    const bs_query *q = p->query;

    for (int i = 0; i < q->atom_count; i++)
        p->last_child[i] = -1;
    for (int i = 0; i < q->atom_count; i++) {
        int atom = p->order[i], bond = find_parent(p, atom);

        p->parent[atom] = bond;
        if (bond >= 0)
            p->last_child[other_end(&q->bonds[bond], atom)] = atom;
        p->path[p->path_count++] = atom;
    }
    p->path_count = 0;
}

/* ---- Order around chiral atoms --------------------------------------------------------- */

static bool is_tree_bond(const plan *p, int bond)
{
    return p->parent[p->query->bonds[bond].a] == bond || p->parent[p->query->bonds[bond].b] == bond;
}

/* Neighbours as they are written: the one before, the hydrogen, ring numbers, branches. */
static int written_around(const plan *p, int atom, bool with_hydrogen, int list[])
{
    const bs_query *q = p->query;
    int count = 0;

    if (p->parent[atom] >= 0)
        list[count++] = other_end(&q->bonds[p->parent[atom]], atom);
    if (with_hydrogen)
        list[count++] = -1;
    for (int pass = 0; pass < 2; pass++)
        for (int k = p->first[atom]; k < p->first[atom + 1] && count < 8; k++) {
            int bond = p->links[k];

            if (bond != p->parent[atom] && is_tree_bond(p, bond) == (pass == 1))
                list[count++] = other_end(&q->bonds[bond], atom);
        }
    /* Branches come in the order in which their first atoms are written. */
    for (int i = 1; i < count; i++)
        for (int k = i; k > 0 && list[k] >= 0 && list[k - 1] >= 0; k--) {
            bool branch = p->parent[list[k]] >= 0 && p->parent[list[k - 1]] >= 0 &&
                          other_end(&q->bonds[p->parent[list[k]]], list[k]) == atom &&
                          other_end(&q->bonds[p->parent[list[k - 1]]], list[k - 1]) == atom;
            int swap = list[k];

            if (!branch || p->place[list[k]] > p->place[list[k - 1]])
                break;
            list[k] = list[k - 1];
            list[k - 1] = swap;
        }
    return count;
}

/* Whether the written order is an odd permutation of the one that the chirality refers to. */
static bool is_mirrored(const plan *p, int index)
{
    const bs_query_atom *atom = &p->query->atoms[index];
    int list[8], count, swaps = 0;
    bool with_hydrogen = false;

    if (atom->around_count == 0 || atom->around_count > 4)
        return false;
    for (int k = 0; k < atom->around_count; k++)
        with_hydrogen |= atom->around[k] < 0;
    count = written_around(p, index, with_hydrogen, list);
    if (count != atom->around_count)
        return false;
    for (int i = 0; i < count; i++)
        for (int k = i; k < count; k++)
            if (list[k] == atom->around[i]) {
                int swap = list[i];

                swaps += k != i;
                list[i] = list[k];
                list[k] = swap;
                break;
            }
    return swaps % 2 != 0;
}

/* ---- Writing --------------------------------------------------------------------------- */

static bs_status put_number(plan *p, int number)
{
    return bs_text_printf(p->w->text, number < 10 ? "%d" : "%%%d", number);
}

static bs_status open_number(plan *p, int bond, int atom)
{
    int number = 1;
    bs_status st;

    while (number < 100 && p->used[number])
        number++;
    if (number == 100)
        return bs_fail(p->w->cx, BS_ELIMIT, "more than 99 rings open at a time in a pattern");
    p->used[number] = true;
    p->number[bond] = number;
    st = bs_write__bond(p->w, &p->query->bonds[bond], p->query->bonds[bond].b == atom);
    return st == BS_OK ? put_number(p, number) : st;
}

/* Ring numbers of an atom; those that it closes are free again behind it. */
static bs_status write_numbers(plan *p, int atom)
{
    bs_status st = BS_OK;

    for (int k = p->first[atom]; k < p->first[atom + 1] && st == BS_OK; k++) {
        int bond = p->links[k];

        if (is_tree_bond(p, bond))
            continue;
        st = p->number[bond] ? put_number(p, p->number[bond]) : open_number(p, bond, atom);
    }
    for (int k = p->first[atom]; k < p->first[atom + 1]; k++) {
        int bond = p->links[k], other = other_end(&p->query->bonds[bond], atom);

        if (p->number[bond] && p->place[other] < p->place[atom])
            p->used[p->number[bond]] = false;
    }
    return st;
}

/* Closes branches until `atom` is the last of the path; all of them for -1. */
static bs_status cut_path(plan *p, int atom)
{
    while (p->path_count > 0 && p->path[p->path_count - 1] != atom) {
        bs_status st = BS_OK;

        if (p->opened[p->path[--p->path_count]])
            st = bs_text_putc(p->w->text, ')');
        if (st != BS_OK)
            return st;
    }
    return BS_OK;
}

/* The dot between two parts, and the parentheses of groups. */
static bs_status write_gap(plan *p, int before, int after)
{
    const bs_query_atom *atoms = p->query->atoms;
    int left = before < 0 ? 0 : atoms[before].component, right = atoms[after].component;
    const char *close = left && left != right ? ")" : "", *dot = before < 0 ? "" : ".";
    const char *open = right && left != right ? "(" : "";

    return bs_text_printf(p->w->text, "%s%s%s", close, dot, open);
}

static bs_status write_step(plan *p, int before, int atom)
{
    const bs_query *q = p->query;
    int bond = p->parent[atom], from = bond < 0 ? -1 : other_end(&q->bonds[bond], atom);
    bs_status st = cut_path(p, from);

    if (st != BS_OK)
        return st;
    if (bond < 0) {
        st = write_gap(p, before, atom);
    } else {
        if (p->last_child[from] != atom) {
            p->opened[atom] = true;
            st = bs_text_putc(p->w->text, '(');
        }
        if (st == BS_OK)
            st = bs_write__bond(p->w, &q->bonds[bond], q->bonds[bond].b == from);
    }
    if (st == BS_OK)
        st = bs_write__atom(p->w, &q->atoms[atom], is_mirrored(p, atom));
    if (st == BS_OK)
        st = write_numbers(p, atom);
    p->path[p->path_count++] = atom;
    return st;
}

bs_status bs_write__query(bs_writing *w)
{
    bs_mark temp = bs_arena_mark(&w->cx->scratch);
    plan p = {.w = w, .query = w->query};
    int count = w->query->atom_count;
    bs_status st = make_plan(&p);

    if (st != BS_OK)
        goto done;
    fill_links(&p);
    find_order(&p);
    find_parents(&p);
    for (int i = 0; i < count && st == BS_OK; i++)
        st = write_step(&p, i > 0 ? p.order[i - 1] : -1, p.order[i]);
    if (st == BS_OK)
        st = cut_path(&p, -1);
    if (st == BS_OK && count > 0 && w->query->atoms[p.order[count - 1]].component)
        st = bs_text_putc(w->text, ')');
done:
    bs_arena_rewind(&w->cx->scratch, temp);
    return st;
}

bs_status bs_query_write(bs_ctx *cx, bs_arena *home, const bs_query *query, char **out)
{
    bs_text text;
    bs_writing w = {cx, &text, query, 0};
    bs_status st;

    bs_text_init(&text, cx);
    st = bs_write__query(&w);
    if (st == BS_OK)
        st = bs_copy_text(cx, home, text.data ? text.data : "", text.length, out);
    bs_text_free(&text);
    return st;
}
