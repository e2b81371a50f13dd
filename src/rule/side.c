/* Sides of rewritings: parts, facts, and one compiled pattern a part. */
#include "rule/side.h"

#include <string.h>

int bs_side__find(const bs_side *side, int map)
{
    for (int i = 0; i < side->atom_count && map > 0; i++) {
        if (side->atoms[i].map == map)
            return i;
    }
    return -1;
}

const bs_side_bond *bs_side__bond(const bs_side *side, int a, int b)
{
    for (int i = 0; i < side->bond_count; i++) {
        const bs_side_bond *bond = &side->bonds[i];

        if ((bond->a == a && bond->b == b) || (bond->a == b && bond->b == a))
            return bond;
    }
    return NULL;
}

/*
 * Marks with `mark` all atoms that hang together with `first` through the bonds, save bond `not`.
 * Patterns are small: passes over the bonds until nothing changes.
 */
static void spread(const bs_query *query, int first, int not, int mark, int *marks)
{
    bool again = true;

    marks[first] = mark;
    while (again) {
        again = false;
        for (int i = 0; i < query->bond_count; i++) {
            const bs_query_bond *bond = &query->bonds[i];

            if (i == not || (marks[bond->a] == mark) == (marks[bond->b] == mark))
                continue;
            marks[bond->a] = marks[bond->b] = mark;
            again = true;
        }
    }
}

static bs_status find_parts(bs_ctx *cx, bs_arena *home, bs_side *side)
{
    const bs_query *query = side->query;
    int *piece;
    bs_status st;

    if ((st = bs_new(cx, home, query->atom_count + 1, &piece)) != BS_OK)
        return st;
    for (int i = 0; i < query->atom_count; i++)
        piece[i] = -1;
    for (int i = 0; i < query->atom_count; i++) {
        int group = query->atoms[i].component;

        if (piece[i] >= 0)
            continue;
        spread(query, i, -1, side->part_count, piece);
        for (int k = i + 1; k < query->atom_count && group > 0; k++) {
            if (query->atoms[k].component == group && piece[k] < 0)
                spread(query, k, -1, side->part_count, piece);
        }
        side->part_count++;
    }
    if ((st = bs_new(cx, home, side->part_count + 1, &side->part_size)) != BS_OK)
        return st;
    for (int i = 0; i < query->atom_count; i++) {
        side->atoms[i].part = piece[i];
        side->atoms[i].place = side->part_size[piece[i]]++;
    }
    return BS_OK;
}

static bs_status find_rings(bs_ctx *cx, bs_side *side)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int *marks;
    bs_status st = bs_new(cx, &cx->scratch, side->atom_count + 1, &marks);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < side->bond_count; i++) {
        memset(marks, 0, (size_t)side->atom_count * sizeof *marks);
        spread(side->query, side->bonds[i].a, i, 1, marks);
        side->bonds[i].in_ring = marks[side->bonds[i].b] == 1;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return BS_OK;
}

/*
 * Fills in the neighbour that a chirality mark counts but the text does not write: it stands
 * behind the atom before the centre, or first if there is none.
 */
static void complete_around(const bs_query_atom *atom, int self, bs_side_atom *out)
{
    int at = 0;

    if (atom->around_count == 4) {
        memcpy(out->around, atom->around, sizeof out->around);
        return;
    }
    if (atom->around_count == 3 && atom->around[0] >= 0 && atom->around[0] < self)
        at = 1;
    for (int i = 0; i < 3 && atom->around_count == 3; i++) {
        if (atom->around[i] == BS_SIDE_REST)
            out->says.mark = BS_UNSAID; /* two neighbours are not written */
    }
    if (atom->around_count != 3 || out->says.mark == BS_UNSAID) {
        out->says.mark = BS_UNSAID;
        return;
    }
    for (int i = 0, k = 0; i < 4; i++)
        out->around[i] = i == at ? BS_SIDE_REST : atom->around[k++];
}

static bs_status read_atoms(bs_ctx *cx, bs_side *side)
{
    bs_status st;

    for (int i = 0; i < side->atom_count; i++) {
        const bs_query_atom *atom = &side->query->atoms[i];
        bs_side_atom *out = &side->atoms[i];

        if ((st = bs_expr__atom_facts(cx, &atom->expr, &out->says)) != BS_OK)
            return st;
        if (bs_side__find(side, atom->map) >= 0)
            return bs_fail_at(cx, BS_EVALUE, atom->offset,
                              "map number %d stands twice on one side", atom->map);
        out->map = atom->map;
        if (out->says.mark != BS_UNSAID)
            complete_around(atom, i, out);
    }
    return BS_OK;
}

bs_status bs_side__read(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_side *out)
{
    bs_status st;

    *out = (bs_side){.query = query};
    if ((st = bs_new(cx, home, query->atom_count + 1, &out->atoms)) != BS_OK ||
        (st = bs_new(cx, home, query->bond_count + 1, &out->bonds)) != BS_OK)
        return st;
    out->atom_count = query->atom_count;
    out->bond_count = query->bond_count;
    if ((st = read_atoms(cx, out)) != BS_OK)
        return st;
    for (int i = 0; i < query->bond_count; i++) {
        bs_side_bond *bond = &out->bonds[i];

        bond->a = query->bonds[i].a;
        bond->b = query->bonds[i].b;
        if ((st = bs_expr__bond_facts(cx, &query->bonds[i].expr, &bond->says)) != BS_OK)
            return st;
    }
    if ((st = find_parts(cx, home, out)) != BS_OK)
        return st;
    return find_rings(cx, out);
}

/* The query of one part, in scratch memory, without tests for a hand. */
static bs_status part_query(bs_ctx *cx, const bs_side *side, int part, bs_query *out)
{
    const bs_query *query = side->query;
    bs_status st;

    *out = *query;
    out->atom_count = out->bond_count = 0;
    if ((st = bs_new(cx, &cx->scratch, query->atom_count + 1, &out->atoms)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, query->bond_count + 1, &out->bonds)) != BS_OK)
        return st;
    for (int i = 0; i < query->atom_count; i++) {
        bs_query_atom atom = query->atoms[i];

        if (side->atoms[i].part != part)
            continue;
        atom.around = NULL;
        atom.around_count = 0;
        st = bs_query_relax_expr(cx, &cx->scratch, &query->atoms[i].expr, BS_RELAX_CHIRAL,
                                 &atom.expr);
        if (st != BS_OK)
            return st;
        out->atoms[out->atom_count++] = atom;
    }
    for (int i = 0; i < query->bond_count; i++) {
        bs_query_bond bond = query->bonds[i];

        if (side->atoms[bond.a].part != part)
            continue;
        bond.a = side->atoms[bond.a].place;
        bond.b = side->atoms[bond.b].place;
        out->bonds[out->bond_count++] = bond;
    }
    return BS_OK;
}

bs_status bs_side__compile(bs_ctx *cx, bs_arena *home, bs_side *side)
{
    bs_status st = bs_new(cx, home, side->part_count + 1, &side->patterns);

    for (int i = 0; i < side->part_count && st == BS_OK; i++) {
        bs_mark temp = bs_arena_mark(&cx->scratch);
        bs_query query;

        if ((st = part_query(cx, side, i, &query)) == BS_OK)
            st = bs_query_compile(cx, home, &query, &side->patterns[i]);
        bs_arena_rewind(&cx->scratch, temp);
    }
    return st;
}
