/*
 * What the graph of a query demands of a molecule, whatever its expressions say.
 *
 * Atoms of a match are distinct, so an atom has at least the neighbours that it has in the query,
 * and a ring of the query lies on a ring. Bonds of rings are those that are no bridges (Tarjan
 * 1974).
 */
#include "match/program.h"

/* A depth-first walk; atoms are numbered from 1 as they are entered. */
typedef struct walk {
    const bs_query *query;
    int *first, *links; /* bonds of each atom */
    int *number;
    int *low;    /* the lowest number that is reached from below without the way back */
    int *cursor; /* next bond to go by */
    int *way;    /* bond by which the atom was entered, or -1 */
    int *pile;
    int clock;
} walk;

static bs_status begin(bs_ctx *cx, const bs_query *q, walk *w)
{
    bs_status st;

    *w = (walk){.query = q};
    if ((st = bs_new(cx, &cx->scratch, q->atom_count + 2, &w->first)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, 2 * q->bond_count + 1, &w->links)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, q->atom_count + 1, &w->number)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, q->atom_count + 1, &w->low)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, q->atom_count + 1, &w->cursor)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, q->atom_count + 1, &w->way)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, q->atom_count + 1, &w->pile)) != BS_OK)
        return st;
    for (int i = 0; i < q->bond_count; i++) {
        w->first[q->bonds[i].a + 2]++;
        w->first[q->bonds[i].b + 2]++;
    }
    for (int i = 2; i <= q->atom_count; i++)
        w->first[i] += w->first[i - 1];
    for (int i = 0; i < q->bond_count; i++) {
        w->links[w->first[q->bonds[i].a + 1]++] = i;
        w->links[w->first[q->bonds[i].b + 1]++] = i;
    }
    return BS_OK;
}

static void enter(walk *w, int atom, int way, int *height)
{
    w->number[atom] = w->low[atom] = ++w->clock;
    w->cursor[atom] = w->first[atom];
    w->way[atom] = way;
    w->pile[(*height)++] = atom;
}

static int other_end(const bs_query_bond *bond, int atom)
{
    return bond->a == atom ? bond->b : bond->a;
}

/* Walks over the component of `root` and marks the bonds that are no bridges. */
static void walk_from(walk *w, int root, bool *cyclic)
{
    int height = 0;

    enter(w, root, -1, &height);
    while (height > 0) {
        int atom = w->pile[height - 1], way = w->way[atom];

        if (w->cursor[atom] < w->first[atom + 1]) {
            int bond = w->links[w->cursor[atom]++];
            int other = other_end(&w->query->bonds[bond], atom);

            if (bond == way)
                continue;
            if (w->number[other] == 0) {
                enter(w, other, bond, &height);
                continue;
            }
            cyclic[bond] = true;
            if (w->number[other] < w->low[atom])
                w->low[atom] = w->number[other];
            continue;
        }
        height--;
        if (way < 0)
            continue;
        int above = other_end(&w->query->bonds[way], atom);
        cyclic[way] = w->low[atom] <= w->number[above];
        if (w->low[atom] < w->low[above])
            w->low[above] = w->low[atom];
    }
}

static void count(uint8_t *number)
{
    if (*number < UINT8_MAX)
        (*number)++;
}

bs_status bs_shape__find(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_shape *out)
{
    bs_mark temp;
    walk w;
    bs_status st;

    if ((st = bs_new(cx, home, query->atom_count, &out->degree)) != BS_OK ||
        (st = bs_new(cx, home, query->atom_count, &out->ring_bonds)) != BS_OK ||
        (st = bs_new(cx, home, query->bond_count, &out->cyclic)) != BS_OK)
        return st;
    temp = bs_arena_mark(&cx->scratch);
    if ((st = begin(cx, query, &w)) != BS_OK)
        goto done;
    for (int i = 0; i < query->atom_count; i++) {
        if (w.number[i] == 0)
            walk_from(&w, i, out->cyclic);
    }
    for (int i = 0; i < query->bond_count; i++) {
        const bs_query_bond *bond = &query->bonds[i];

        count(&out->degree[bond->a]);
        count(&out->degree[bond->b]);
        if (!out->cyclic[i])
            continue;
        count(&out->ring_bonds[bond->a]);
        count(&out->ring_bonds[bond->b]);
    }
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
