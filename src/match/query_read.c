/* Reads SMARTS: the graph of atoms, bonds, branches, rings and groups. */
#include "match/parse.h"

#include <stdlib.h>
#include <string.h>

/*
 * A neighbour as it comes by in the text. A chirality test refers to this order. A ring number
 * that was opened holds its place until it is closed.
 */
typedef struct sight {
    int atom;
    int other;
    bool from; /* `other` is the atom before */
} sight;

typedef struct ring_end {
    bool open;
    bool bonded; /* a bond was written before the number */
    int atom;
    int sight;
    bs_query_expr bond;
    size_t at;
} ring_end;

typedef struct branch {
    int atom;
    size_t at;
} branch;

enum { RING_NUMBERS = 100 };

typedef struct graph {
    bs_parse *p;
    bs_query *query;
    int last;     /* atom that the next one is bonded to, or -1 */
    bool bonded;  /* a bond was written and waits for its atom */
    bool fresh;   /* a branch or group has just been opened */
    bool grouped; /* a group has just been closed */
    bool dotted;  /* a dot waits for its atom */
    int group;    /* open group, or 0 */
    int groups;   /* so far */
    size_t group_at;
    bs_query_expr bond;
    size_t bond_at;
    branch *branches;
    int branch_count, branch_room;
    sight *sights;
    int sight_count, sight_room;
    ring_end rings[RING_NUMBERS];
} graph;

static bs_status push_branch(graph *g, branch item)
{
    bs_ctx *cx = g->p->cx;

    if (g->branch_count == g->branch_room) {
        int room = g->branch_room ? g->branch_room * 2 : 8;
        branch *wide;
        bs_status st = bs_new(cx, &cx->scratch, room, &wide);

        if (st != BS_OK)
            return st;
        if (g->branch_count > 0)
            memcpy(wide, g->branches, (size_t)g->branch_count * sizeof *wide);
        g->branches = wide;
        g->branch_room = room;
    }
    g->branches[g->branch_count++] = item;
    return BS_OK;
}

static bs_status push_sight(graph *g, sight item)
{
    bs_ctx *cx = g->p->cx;

    if (g->sight_count == g->sight_room) {
        int room = g->sight_room ? g->sight_room * 2 : 32;
        sight *wide;
        bs_status st = bs_new(cx, &cx->scratch, room, &wide);

        if (st != BS_OK)
            return st;
        if (g->sight_count > 0)
            memcpy(wide, g->sights, (size_t)g->sight_count * sizeof *wide);
        g->sights = wide;
        g->sight_room = room;
    }
    g->sights[g->sight_count++] = item;
    return BS_OK;
}

static bs_status add_bond(graph *g, int a, int b, const bs_query_expr *expr, size_t at)
{
    bs_parse *p = g->p;
    bs_query_bond bond = {a, b, {NULL, 0}, (uint32_t)(p->base + at)};
    bs_status st = BS_OK;

    if (expr)
        bond.expr = *expr;
    else
        st = bs_query_leaf(p->cx, p->home, BS_TEST_BOND_DEFAULT, 0, &bond.expr);
    if (st != BS_OK)
        return st;
    return bs_query_add_bond(p->cx, p->home, g->query, &bond, NULL);
}

static bs_status read_atom(graph *g)
{
    bs_parse *p = g->p;
    size_t at = p->at;
    bs_query_atom atom;
    int index, last = g->last;
    bs_status st;

    if (g->grouped)
        return bs_parse__expected(p, "'.' or the end behind a group");
    if ((st = bs_parse__atom(p, &atom)) != BS_OK)
        return st;
    atom.component = g->group;
    if ((st = bs_query_add_atom(p->cx, p->home, g->query, &atom, &index)) != BS_OK)
        return st;
    if (last >= 0) {
        st = add_bond(g, last, index, g->bonded ? &g->bond : NULL, g->bonded ? g->bond_at : at);
        if (st == BS_OK)
            st = push_sight(g, (sight){last, index, false});
        if (st == BS_OK)
            st = push_sight(g, (sight){index, last, true});
    }
    g->last = index;
    g->bonded = g->fresh = g->dotted = false;
    return st;
}

static bs_status open_bracket(graph *g)
{
    bs_parse *p = g->p;
    bs_status st;

    if (g->bonded || g->fresh)
        return bs_parse__expected(p, "an atom");
    if (g->last < 0) {
        if (g->group || g->grouped || p->depth > 0)
            return bs_parse__expected(p, "an atom");
        g->group = ++g->groups;
        g->group_at = p->at;
    } else if ((st = push_branch(g, (branch){g->last, p->at})) != BS_OK) {
        return st;
    }
    g->fresh = true;
    p->at++;
    return BS_OK;
}

static bs_status close_bracket(graph *g)
{
    bs_parse *p = g->p;

    if (g->bonded || g->fresh || g->dotted)
        return bs_parse__expected(p, "an atom");
    if (g->branch_count > 0) {
        g->last = g->branches[--g->branch_count].atom;
    } else if (g->group) {
        g->group = 0;
        g->grouped = true;
        g->last = -1;
    } else {
        return bs_parse__fail(p, p->at, BS_ESYNTAX, "')' closes nothing, no '(' is open");
    }
    p->at++;
    return BS_OK;
}

static bs_status read_dot(graph *g)
{
    bs_parse *p = g->p;

    if (g->bonded || g->fresh || (g->last < 0 && !g->grouped))
        return bs_parse__expected(p, "an atom");
    if (g->branch_count > 0)
        return bs_parse__expected(p, "the end of the branch");
    g->last = -1;
    g->grouped = false;
    g->dotted = true;
    p->at++;
    return BS_OK;
}

static bs_status read_bond(graph *g)
{
    bs_parse *p = g->p;

    if (g->bonded || g->last < 0)
        return bs_parse__expected(p, "an atom");
    g->bond_at = p->at;
    g->bonded = true;
    return bs_parse__bond(p, &g->bond);
}

/* ---- Ring numbers ---------------------------------------------------------------------- */

static bool is_digit(int c)
{
    return c >= '0' && c <= '9';
}

static bs_status read_ring_number(bs_parse *p, int *number)
{
    const char *text = p->text;

    if (text[p->at] != '%') {
        *number = text[p->at++] - '0';
        return BS_OK;
    }
    p->at++;
    for (int i = 0; i < 2; i++)
        if (p->at + (size_t)i >= p->length || !is_digit(text[p->at + (size_t)i]))
            return bs_parse__expected(p, "two digits behind '%'");
    *number = (text[p->at] - '0') * 10 + (text[p->at + 1] - '0');
    p->at += 2;
    return BS_OK;
}

/* Seen from the other end, `/` is `\`. */
static bool same_seen_from_both_ends(const bs_query_expr *a, const bs_query_expr *b)
{
    if (a->count != b->count)
        return false;
    for (int i = 0; i < a->count; i++) {
        bs_test other = b->tests[i];

        if (other.kind == BS_TEST_BOND_UP)
            other.kind = BS_TEST_BOND_DOWN;
        else if (other.kind == BS_TEST_BOND_DOWN)
            other.kind = BS_TEST_BOND_UP;
        if (a->tests[i].kind != other.kind || a->tests[i].value != other.value)
            return false;
    }
    return true;
}

static bool has_bond(const bs_query *query, int a, int b)
{
    for (int i = 0; i < query->bond_count; i++) {
        const bs_query_bond *bond = &query->bonds[i];
        if ((bond->a == a && bond->b == b) || (bond->a == b && bond->b == a))
            return true;
    }
    return false;
}

static bs_status close_ring(graph *g, ring_end *end, size_t at)
{
    bs_status st;

    if (end->atom == g->last)
        return bs_parse__fail(g->p, at, BS_EVALUE, "a ring number bonds an atom to itself");
    if (has_bond(g->query, end->atom, g->last))
        return bs_parse__fail(g->p, at, BS_EVALUE, "a second bond between the same two atoms");
    if (end->bonded && g->bonded && !same_seen_from_both_ends(&end->bond, &g->bond))
        return bs_parse__fail(g->p, at, BS_EVALUE,
                              "the two ends of a ring number write different bonds");
    if (g->bonded && !end->bonded)
        st = add_bond(g, g->last, end->atom, &g->bond, g->bond_at);
    else
        st = add_bond(g, end->atom, g->last, end->bonded ? &end->bond : NULL, end->at);
    if (st != BS_OK)
        return st;
    g->sights[end->sight].other = g->last;
    end->open = false;
    return push_sight(g, (sight){g->last, end->atom, false});
}

static bs_status read_ring(graph *g)
{
    bs_parse *p = g->p;
    size_t at = p->at;
    ring_end *end;
    int number = 0;
    bs_status st;

    if (g->last < 0 || g->fresh)
        return bs_parse__expected(p, "an atom");
    if ((st = read_ring_number(p, &number)) != BS_OK)
        return st;
    end = &g->rings[number];
    if (end->open) {
        st = close_ring(g, end, at);
    } else {
        *end = (ring_end){true, g->bonded, g->last, g->sight_count, g->bond, at};
        st = push_sight(g, (sight){g->last, -1, false});
    }
    g->bonded = false;
    return st;
}

/* ---- Order around chiral atoms --------------------------------------------------------- */

static bs_status set_around(graph *g, int index)
{
    bs_parse *p = g->p;
    bs_query_atom *atom = &g->query->atoms[index];
    int list[6], count = 0, hydrogens = 0, first = 0;
    bs_status st;

    for (int i = 0; i < g->sight_count; i++) {
        if (g->sights[i].atom != index)
            continue;
        if (count == 4)
            return bs_fail_at(p->cx, BS_EVALUE, atom->offset,
                              "a chirality test on an atom with more than four neighbours");
        first += g->sights[i].from;
        list[count++] = g->sights[i].other;
    }
    bs_query_demands(&atom->expr, BS_TEST_HYDROGENS, &hydrogens);
    if (hydrogens == 1 && count == 4)
        return bs_fail_at(p->cx, BS_EVALUE, atom->offset,
                          "a chirality test on an atom with four neighbours and a hydrogen");
    if (hydrogens == 1 || count == 3) {
        memmove(list + first + 1, list + first, (size_t)(count - first) * sizeof *list);
        list[first] = -1;
        count++;
    }
    if ((st = bs_new(p->cx, p->home, count, &atom->around)) != BS_OK)
        return st;
    memcpy(atom->around, list, (size_t)count * sizeof *list);
    atom->around_count = count;
    return BS_OK;
}

/* ---- The whole ------------------------------------------------------------------------- */

static bs_status check_end(graph *g)
{
    bs_parse *p = g->p;
    const ring_end *first = NULL;

    if (g->branch_count > 0)
        return bs_parse__fail(p, g->branches[g->branch_count - 1].at, BS_ESYNTAX,
                              "'(' is never closed, expected ')'");
    if (g->bonded || g->dotted || g->fresh || g->query->atom_count == 0)
        return bs_parse__expected(p, "an atom");
    if (g->group)
        return bs_parse__fail(p, g->group_at, BS_ESYNTAX, "'(' is never closed, expected ')'");
    for (int i = 0; i < RING_NUMBERS; i++)
        if (g->rings[i].open && (!first || g->rings[i].at < first->at))
            first = &g->rings[i];
    if (first)
        return bs_parse__fail(p, first->at, BS_ESYNTAX,
                              "a ring number is used once, expected it a second time");
    return BS_OK;
}

static bool ends_here(const graph *g)
{
    int c = bs_parse__peek(g->p);

    return c < 0 || (c == ')' && g->p->depth > 0 && g->branch_count == 0);
}

static bs_status read_next(graph *g)
{
    int c = bs_parse__peek(g->p);

    switch (c) {
    case '(':
        return open_bracket(g);
    case ')':
        return close_bracket(g);
    case '.':
        return read_dot(g);
    default:
        if (is_digit(c) || c == '%')
            return read_ring(g);
        return bs_parse__starts_bond(g->p) ? read_bond(g) : read_atom(g);
    }
}

bs_status bs_parse__query(bs_parse *p, bs_query **out)
{
    graph g = {.p = p, .last = -1};
    bs_status st;

    if ((st = bs_query_new(p->cx, p->home, &g.query)) != BS_OK)
        return st;
    p->query = g.query;
    while (!ends_here(&g))
        if ((st = read_next(&g)) != BS_OK)
            return st;
    if ((st = check_end(&g)) != BS_OK)
        return st;
    for (int i = 0; i < g.query->atom_count; i++)
        if (bs_query_mentions(&g.query->atoms[i].expr, BS_TEST_CHIRAL))
            if ((st = set_around(&g, i)) != BS_OK)
                return st;
    *out = g.query;
    return BS_OK;
}

bs_status bs_query_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length, size_t base,
                        bs_query **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch), kept = bs_arena_mark(home);
    bs_parse p = {.cx = cx, .home = home, .text = text, .length = length, .base = base};
    char *copy = NULL;
    bs_status st;

    if (length > BS_QUERY_MAX_TEXT)
        return bs_fail(cx, BS_ELIMIT, "a pattern of more than %d characters", BS_QUERY_MAX_TEXT);
    st = bs_parse__query(&p, out);
    if (st == BS_OK)
        st = bs_copy_text(cx, home, text, length, &copy);
    if (st == BS_OK)
        (*out)->text = copy;
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}
