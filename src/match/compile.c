/* Compiles queries to patterns. */
#include "match/program.h"

#include <string.h>

typedef struct compiling {
    bs_ctx *cx;
    bs_arena *home;
    bs_pattern *pattern;
    bs_nodes nodes;
    int part_room;
} compiling;

static bs_status add_part(compiling *c, const bs_query *query, int *index)
{
    bs_pattern *pattern = c->pattern;

    if (pattern->part_count >= INT16_MAX)
        return bs_fail(c->cx, BS_ELIMIT, "too many recursive parts in a pattern");
    if (pattern->part_count == c->part_room) {
        int room = c->part_room ? c->part_room * 2 : 4;
        bs_part *wide;
        bs_status st = bs_new(c->cx, c->home, room, &wide);

        if (st != BS_OK)
            return st;
        if (pattern->part_count > 0)
            memcpy(wide, pattern->parts, (size_t)pattern->part_count * sizeof *wide);
        pattern->parts = wide;
        c->part_room = room;
    }
    *index = pattern->part_count;
    pattern->parts[pattern->part_count++].query = query;
    return BS_OK;
}

/* ---- Checks at the end of a match ------------------------------------------------------ */

static bs_status add_centre(compiling *c, bs_part *part, int index, const int *parts)
{
    const bs_query_atom *atom = &part->query->atoms[index];
    bs_centre *centre = &part->centres[part->centre_count];

    if (atom->around_count > 4)
        return bs_fail_at(c->cx, BS_EVALUE, atom->offset,
                          "a chirality test on an atom with more than four neighbours");
    centre->atom = index;
    centre->around_count = atom->around_count;
    for (int k = 0; k < atom->around_count; k++)
        centre->around[k] = atom->around[k];
    part->centre_count++;
    return bs_nodes__add(&c->nodes, &atom->expr, parts, &centre->entry);
}

/* The direction that a bond demands: 1 for '/', -1 for '\', 0 for none. */
static int direction(const bs_query_bond *bond, int *or_unspecified)
{
    if (bs_query_demands(&bond->expr, BS_TEST_BOND_UP, or_unspecified))
        return 1;
    return bs_query_demands(&bond->expr, BS_TEST_BOND_DOWN, or_unspecified) ? -1 : 0;
}

/*
 * A neighbour of an end of a double bond that has a direction: whether it lies above (1) or below
 * (-1) that end; 0 if there is none.
 */
static int find_side(const bs_query *q, int skip, int end, int *neighbour, int *or_unspecified)
{
    for (int i = 0; i < q->bond_count; i++) {
        const bs_query_bond *bond = &q->bonds[i];
        int up;

        if (i == skip || (bond->a != end && bond->b != end))
            continue;
        if ((up = direction(bond, or_unspecified)) == 0)
            continue;
        *neighbour = bond->a == end ? bond->b : bond->a;
        return bond->a == end ? up : -up;
    }
    return 0;
}

static bool has_directions(const bs_query *q)
{
    for (int i = 0; i < q->bond_count; i++)
        if (direction(&q->bonds[i], NULL) != 0)
            return true;
    return false;
}

/* The end of a chain of double bonds on one side of its middle bond. */
typedef struct chain_end {
    int atom, before; /* `before` is the next atom of the chain */
    int side, neighbour, or_unspecified;
    int steps;
} chain_end;

/* The other double bond at an atom that has two, or -1. */
static int next_double(const bs_query *q, int bond, int atom)
{
    int next = -1;

    for (int i = 0; i < q->bond_count; i++)
        if (i != bond && (q->bonds[i].a == atom || q->bonds[i].b == atom) &&
            bs_query_mentions(&q->bonds[i].expr, BS_TEST_BOND_DOUBLE)) {
            if (next >= 0)
                return -1;
            next = i;
        }
    return next;
}

/* No cumulene is longer on either side; the bound keeps hostile patterns cheap. */
enum { MAX_CHAIN = 8 };

/* Walks from the middle bond to an atom beside which a direction is written. */
static chain_end walk_chain(const bs_query *q, int bond, int atom)
{
    chain_end end = {.atom = atom, .neighbour = -1};

    for (;; end.steps++) {
        const bs_query_bond *b = &q->bonds[bond];

        end.before = b->a == end.atom ? b->b : b->a;
        end.side = find_side(q, bond, end.atom, &end.neighbour, &end.or_unspecified);
        bond = next_double(q, bond, end.atom);
        if (end.side != 0 || bond < 0 || end.steps == MAX_CHAIN)
            return end;
        end.atom = q->bonds[bond].a == end.atom ? q->bonds[bond].b : q->bonds[bond].a;
    }
}

/* Each double bond is tried as the middle of a chain; most are chains of their own. */
static void add_turns(bs_part *part)
{
    const bs_query *q = part->query;

    for (int i = 0; i < q->bond_count; i++) {
        const bs_query_bond *bond = &q->bonds[i];
        chain_end a, b;

        if (!bs_query_mentions(&bond->expr, BS_TEST_BOND_DOUBLE))
            continue;
        a = walk_chain(q, i, bond->a);
        b = walk_chain(q, i, bond->b);
        if (a.side == 0 || b.side == 0 || a.steps != b.steps)
            continue;
        part->turns[part->turn_count++] = (bs_turn){
            .middle = {bond->a, bond->b},
            .end = {a.atom, b.atom},
            .before = {a.before, b.before},
            .beside = {a.neighbour, b.neighbour},
            .cis = a.side == b.side,
            .or_unspecified = a.or_unspecified || b.or_unspecified,
        };
    }
}

static bs_status add_checks(compiling *c, bs_part *part, const int *parts)
{
    const bs_query *q = part->query;
    bool any_centre = false, any_turn = has_directions(q);
    bs_status st = BS_OK;

    for (int i = 0; i < q->atom_count; i++)
        any_centre |= bs_query_mentions(&q->atoms[i].expr, BS_TEST_CHIRAL);
    if (any_centre)
        st = bs_new(c->cx, c->home, q->atom_count, &part->centres);
    if (st == BS_OK && any_turn)
        st = bs_new(c->cx, c->home, q->bond_count, &part->turns);
    if (st == BS_OK && any_turn)
        add_turns(part);
    for (int i = 0; i < q->atom_count && any_centre && st == BS_OK; i++)
        if (bs_query_mentions(&q->atoms[i].expr, BS_TEST_CHIRAL))
            st = add_centre(c, part, i, parts);
    return st;
}

/* ---- Parts ----------------------------------------------------------------------------- */

/* Chirality needs the neighbours, so an atom is placed without it. */
static bs_status add_entry(compiling *c, const bs_query_expr *expr, const int *parts,
                           int32_t *entry)
{
    bs_query_expr relaxed = *expr;
    bs_status st = BS_OK;

    if (bs_query_mentions(expr, BS_TEST_CHIRAL))
        st = bs_query_relax_expr(c->cx, &c->cx->scratch, expr, BS_RELAX_CHIRAL, &relaxed);
    return st == BS_OK ? bs_nodes__add(&c->nodes, &relaxed, parts, entry) : st;
}

static void set_opening(const compiling *c, int32_t entry, bs_opening *opening)
{
    const bs_node *node = entry >= 0 ? &c->nodes.items[entry] : NULL;

    *opening = (bs_opening){.rest = entry};
    if (!node || node->kind != BS_NODE_FIELDS || node->no != BS_NODE_NO)
        return;
    memcpy(opening->mask, node->mask, sizeof opening->mask);
    memcpy(opening->value, node->value, sizeof opening->value);
    opening->rest = node->yes;
}

static bs_status fill_part(compiling *c, bs_part *part, const int *parts, bool recursive)
{
    const bs_query *q = part->query;
    bs_status st;

    if (q->atom_count == 0)
        return bs_fail(c->cx, BS_EVALUE, "a pattern without atoms");
    if ((st = bs_new(c->cx, c->home, q->atom_count, &part->entries)) != BS_OK ||
        (st = bs_new(c->cx, c->home, q->atom_count, &part->openings)) != BS_OK ||
        (st = bs_new(c->cx, c->home, q->atom_count, &part->rarity)) != BS_OK ||
        (st = bs_new(c->cx, c->home, q->bond_count, &part->sorts)) != BS_OK)
        return st;
    for (int i = 0; i < q->atom_count && st == BS_OK; i++) {
        st = add_entry(c, &q->atoms[i].expr, parts, &part->entries[i]);
        if (st == BS_OK)
            set_opening(c, part->entries[i], &part->openings[i]);
        part->grouped |= q->atoms[i].component != 0;
    }
    for (int i = 0; i < q->bond_count && st == BS_OK; i++)
        st = bs_query_bond_mask(c->cx, &q->bonds[i].expr, &part->sorts[i]);
    if (st == BS_OK)
        st = add_checks(c, part, parts);
    if (st == BS_OK)
        st = bs_shape__find(c->cx, c->home, q, &part->shape);
    if (st == BS_OK)
        st = bs_screen__rarity(c->cx, q, &part->shape, part->rarity);
    if (st == BS_OK)
        st = bs_order__find(c->cx, c->home, part, recursive ? 0 : -1, &part->order);
    part->slot = c->pattern->slot_count;
    c->pattern->slot_count += q->atom_count;
    c->pattern->grouped |= part->grouped;
    return st;
}

/* Parts are numbered as they are met; the recursion is counted. */
static bs_status add_query(compiling *c, const bs_query *query, int depth, int *index)
{
    bs_part part = {.query = query};
    int *parts;
    bs_status st;

    if (depth > BS_QUERY_MAX_DEPTH)
        return bs_fail(c->cx, BS_ELIMIT, "recursion nested deeper than %d", BS_QUERY_MAX_DEPTH);
    if ((st = add_part(c, query, index)) != BS_OK ||
        (st = bs_new(c->cx, &c->cx->scratch, query->sub_count, &parts)) != BS_OK)
        return st;
    for (int i = 0; i < query->sub_count && st == BS_OK; i++)
        st = add_query(c, query->subs[i], depth + 1, &parts[i]);
    if (st == BS_OK)
        st = fill_part(c, &part, parts, depth > 0);
    c->pattern->parts[*index] = part;
    return st;
}

/* Rings that a match makes in any molecule: bonds that close one, with components counted. */
static int count_rings(const bs_part *part)
{
    int components = 0;

    for (int i = 0; i < part->order.count; i++)
        components += part->order.moves[i].from < 0;
    return part->query->bond_count - part->query->atom_count + components;
}

static bs_status finish(compiling *c)
{
    bs_pattern *pattern = c->pattern;
    bs_status st = bs_new(c->cx, c->home, c->nodes.count, &pattern->nodes);

    if (st != BS_OK)
        return st;
    if (c->nodes.count > 0)
        memcpy(pattern->nodes, c->nodes.items, (size_t)c->nodes.count * sizeof *pattern->nodes);
    pattern->node_count = c->nodes.count;
    pattern->min_atoms = pattern->query->atom_count;
    pattern->min_bonds = pattern->query->bond_count;
    pattern->min_rings = count_rings(&pattern->parts[0]);
    return bs_screen__needs(c->cx, pattern->query, &pattern->needs);
}

/* Compiles a query that lies in `home` and stays. */
static bs_status compile(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_pattern **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    compiling c = {.cx = cx, .home = home, .nodes = {.cx = cx}};
    char *text = NULL;
    int root;
    bs_status st;

    bs_spend(cx, 500 + 200 * (size_t)query->atom_count);
    if ((st = bs_new(cx, home, 1, &c.pattern)) != BS_OK)
        return st;
    c.pattern->query = query;
    st = add_query(&c, query, 0, &root);
    if (st == BS_OK)
        st = finish(&c);
    if (st == BS_OK && !query->text)
        st = bs_query_write(cx, home, query, &text);
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        return st;
    c.pattern->text = query->text ? query->text : text;
    *out = c.pattern;
    return BS_OK;
}

bs_status bs_query_compile(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_pattern **out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_query *copy;
    bs_status st = bs_query_copy(cx, home, query, &copy);

    if (st == BS_OK)
        st = compile(cx, home, copy, out);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}

bs_status bs_pattern_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                          bs_pattern **out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_query *query;
    bs_status st = bs_query_read(cx, home, text, length, 0, &query);

    bs_spend(cx, 20 * length);
    if (st == BS_OK)
        st = compile(cx, home, query, out);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}

const char *bs_pattern_text(const bs_pattern *pattern)
{
    return pattern->text;
}

int bs_pattern_atom_count(const bs_pattern *pattern)
{
    return pattern->query->atom_count;
}

int bs_pattern_map(const bs_pattern *pattern, int atom)
{
    return pattern->query->atoms[atom].map;
}

const bs_query *bs_pattern__query(const bs_pattern *pattern)
{
    return pattern->query;
}
