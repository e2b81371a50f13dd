/* The order in which the atoms of a pattern are placed. */
#include "match/program.h"

/* Bonds of each atom, and how many of them lead to atoms that are placed. */
typedef struct ordering {
    const bs_part *part;
    const bs_query *query;
    int *first;
    int *links;
    int *touch;
    bs_order *out;
    int closure_count;
} ordering;

static bs_status link_bonds(bs_ctx *cx, ordering *o)
{
    const bs_query *q = o->query;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, q->atom_count + 2, &o->first)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, q->atom_count + 1, &o->touch)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, 2 * q->bond_count + 1, &o->links)) != BS_OK)
        return st;
    for (int i = 0; i < q->bond_count; i++) {
        o->first[q->bonds[i].a + 2]++;
        o->first[q->bonds[i].b + 2]++;
    }
    for (int i = 2; i <= q->atom_count; i++)
        o->first[i] += o->first[i - 1];
    for (int i = 0; i < q->bond_count; i++) {
        o->links[o->first[q->bonds[i].a + 1]++] = i;
        o->links[o->first[q->bonds[i].b + 1]++] = i;
    }
    return BS_OK;
}

static bool is_better(const ordering *o, int atom, int than)
{
    if (than < 0)
        return true;
    if (o->touch[atom] != o->touch[than])
        return o->touch[atom] > o->touch[than];
    return o->part->rarity[atom] < o->part->rarity[than];
}

static int choose(const ordering *o)
{
    int best = -1;

    for (int i = 0; i < o->query->atom_count; i++)
        if (o->out->place[i] < 0 && is_better(o, i, best))
            best = i;
    return best;
}

/* The sorts of a bond that fit its expression and its place in the graph. */
static uint32_t sorts_of(const ordering *o, int bond)
{
    return o->part->sorts[bond] & (o->part->shape.cyclic[bond] ? BS_SORTS_IN_RINGS : UINT32_MAX);
}

/* The move goes over the bond to the atom placed last; the other bonds are closures. */
static void place(ordering *o, int atom)
{
    const bs_query *q = o->query;
    int32_t *places = o->out->place;
    bs_move *move = &o->out->moves[o->out->count];
    int via = -1;

    *move = (bs_move){.atom = atom,
                      .from = -1,
                      .opening = o->part->openings[atom],
                      .group = q->atoms[atom].component,
                      .min_degree = o->part->shape.degree[atom],
                      .min_ring_bonds = o->part->shape.ring_bonds[atom],
                      .closure_first = o->closure_count};
    for (int k = o->first[atom]; k < o->first[atom + 1]; k++) {
        const bs_query_bond *bond = &q->bonds[o->links[k]];
        int other = bond->a == atom ? bond->b : bond->a;

        o->touch[other]++;
        if (places[other] > move->from) {
            move->from = places[other];
            via = o->links[k];
        }
    }
    for (int k = o->first[atom]; k < o->first[atom + 1]; k++) {
        const bs_query_bond *bond = &q->bonds[o->links[k]];
        int other = bond->a == atom ? bond->b : bond->a;

        if (places[other] >= 0 && o->links[k] != via)
            o->out->closures[o->closure_count++] =
                (bs_closure){places[other], sorts_of(o, o->links[k])};
    }
    move->sorts = via >= 0 ? sorts_of(o, via) : 0;
    move->closure_count = o->closure_count - move->closure_first;
    places[atom] = o->out->count++;
}

bs_status bs_order__find(bs_ctx *cx, bs_arena *home, const bs_part *part, int root, bs_order *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    ordering o = {.part = part, .query = part->query, .out = out};
    int count = part->query->atom_count;
    bs_status st;

    out->count = 0;
    if ((st = bs_new(cx, home, count, &out->moves)) != BS_OK ||
        (st = bs_new(cx, home, part->query->bond_count, &out->closures)) != BS_OK ||
        (st = bs_new(cx, home, count, &out->place)) != BS_OK || (st = link_bonds(cx, &o)) != BS_OK)
        goto done;
    for (int i = 0; i < count; i++)
        out->place[i] = -1;
    if (root >= 0)
        place(&o, root);
    while (out->count < count)
        place(&o, choose(&o));
done:
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    return st;
}
