/* Compiles atom expressions to graphs of nodes. */
#include "match/program.h"

#include <string.h>

static bs_status add_node(bs_nodes *nodes, const bs_node *node)
{
    if (nodes->count == nodes->room) {
        int room = nodes->room ? nodes->room * 2 : 16;
        bs_node *wide;
        bs_status st = bs_new(nodes->cx, &nodes->cx->scratch, room, &wide);

        if (st != BS_OK)
            return st;
        if (nodes->count > 0)
            memcpy(wide, nodes->items, (size_t)nodes->count * sizeof *wide);
        nodes->items = wide;
        nodes->room = room;
    }
    nodes->items[nodes->count++] = *node;
    return BS_OK;
}

/* The words of an atom in which only some bytes count. */
static void set_fields(bs_node *node, const bs_atom *mask, const bs_atom *value)
{
    memcpy(node->mask, mask, sizeof node->mask);
    memcpy(node->value, value, sizeof node->value);
}

/* A value that the field cannot hold is met by no atom. */
static void set_never(bs_node *node)
{
    memset(node->mask, 0, sizeof node->mask);
    node->value[0] = 1;
}

/* Tests that compare one field, or one flag. False: the test is of another sort. */
static bool fill_fields(bs_node *node, int kind, int value)
{
    bs_atom mask, want;
    int limit = UINT8_MAX;

    memset(&mask, 0, sizeof mask);
    memset(&want, 0, sizeof want);
    if (value < 0 && kind != BS_TEST_CHARGE) {
        mask.flags = want.flags = BS_ATOM_RING;
        set_fields(node, &mask, &want);
        return kind == BS_TEST_RING_COUNT || kind == BS_TEST_RING_SIZE ||
               kind == BS_TEST_RING_BONDS;
    }
    switch (kind) {
    case BS_TEST_ANY:
        break;
    case BS_TEST_AROMATIC_ELEM:
        want.flags = BS_ATOM_AROMATIC;
        /* fall through */
    case BS_TEST_ALIPHATIC_ELEM:
        mask.flags = BS_ATOM_AROMATIC;
        /* fall through */
    case BS_TEST_ELEMENT:
        mask.element = UINT8_MAX;
        want.element = (uint8_t)value;
        break;
    case BS_TEST_AROMATIC:
        want.flags = BS_ATOM_AROMATIC;
        /* fall through */
    case BS_TEST_ALIPHATIC:
        mask.flags = BS_ATOM_AROMATIC;
        break;
    case BS_TEST_ISOTOPE:
        mask.isotope = limit = UINT16_MAX;
        want.isotope = (uint16_t)value;
        break;
    case BS_TEST_DEGREE:
        mask.degree = UINT8_MAX;
        want.degree = (uint8_t)value;
        break;
    case BS_TEST_HYDROGENS:
        mask.hydrogens = UINT8_MAX;
        want.hydrogens = (uint8_t)value;
        break;
    case BS_TEST_RING_COUNT:
        mask.ring_count = UINT8_MAX;
        want.ring_count = (uint8_t)value;
        break;
    case BS_TEST_RING_SIZE:
        mask.min_ring = UINT16_MAX;
        limit = UINT16_MAX;
        want.min_ring = (uint16_t)value;
        break;
    case BS_TEST_VALENCE:
        mask.valence = UINT8_MAX;
        want.valence = (uint8_t)value;
        break;
    case BS_TEST_RING_BONDS:
        mask.ring_bonds = UINT8_MAX;
        want.ring_bonds = (uint8_t)value;
        break;
    case BS_TEST_CHARGE:
        mask.charge = -1;
        want.charge = (int8_t)value;
        break;
    default:
        return false;
    }
    set_fields(node, &mask, &want);
    if (value > limit)
        set_never(node);
    return true;
}

/*
 * Joins a comparison with the one that follows on yes, if both go the same way on no. The other
 * node stays, since others may lead to it.
 */
static void merge(const bs_nodes *nodes, bs_node *node)
{
    const bs_node *next = node->yes >= 0 ? &nodes->items[node->yes] : NULL;

    if (!next || next->kind != BS_NODE_FIELDS || node->kind != BS_NODE_FIELDS ||
        next->no != node->no)
        return;
    for (int i = 0; i < 2; i++)
        if ((node->mask[i] & next->mask[i]) & (node->value[i] ^ next->value[i]) ||
            node->value[i] & ~node->mask[i] || next->value[i] & ~next->mask[i])
            return;
    for (int i = 0; i < 2; i++) {
        node->mask[i] |= next->mask[i];
        node->value[i] |= next->value[i];
    }
    node->yes = next->yes;
}

static bs_status add_leaf(bs_nodes *nodes, const bs_test *test, const int *parts, int32_t yes,
                          int32_t no)
{
    bs_node node = {.yes = yes, .no = no, .argument = test->value};

    if (!fill_fields(&node, test->kind, test->value)) {
        memset(node.mask, 0, sizeof node.mask);
        memset(node.value, 0, sizeof node.value);
        switch (test->kind) {
        case BS_TEST_CONNECTIONS:
            node.kind = BS_NODE_CONNECTIONS;
            break;
        case BS_TEST_IMPLICIT_H:
            node.kind = BS_NODE_IMPLICIT_H;
            break;
        case BS_TEST_HYBRID:
            node.kind = BS_NODE_HYBRID;
            break;
        case BS_TEST_CHIRAL:
            node.kind = BS_NODE_CHIRAL;
            break;
        case BS_TEST_RECURSE:
            node.kind = BS_NODE_RECURSE;
            node.argument = (int16_t)parts[test->value];
            break;
        default:
            return bs_fail(nodes->cx, BS_EVALUE, "a bond test on an atom of a pattern");
        }
    }
    merge(nodes, &node);
    return add_node(nodes, &node);
}

/* A tree of the expression and where to go when it is decided. */
typedef struct task {
    int tree;
    int32_t yes, no;
} task;

/* Stands for the node made last, which is the first of the operand that is asked second. */
enum { NEXT = -3 };

/* Recursive parts cost most and are asked last. */
static void mark_costly(const bs_query_expr *expr, const int *size, bool *costly)
{
    for (int i = 0; i < expr->count; i++) {
        int kind = expr->tests[i].kind;

        costly[i] = kind == BS_TEST_RECURSE || (kind == BS_TEST_NOT && costly[i - 1]);
        if (kind == BS_TEST_AND || kind == BS_TEST_OR)
            costly[i] = costly[i - 1] || costly[i - 1 - size[i - 1]];
    }
}

static void push_pair(const bs_query_expr *expr, const int *size, const bool *costly,
                      const task *t, task *pile, int *height)
{
    int first = t->tree - 1 - size[t->tree - 1], second = t->tree - 1;
    bool is_and = expr->tests[t->tree].kind == BS_TEST_AND;

    if (costly[first] && !costly[second]) {
        int swap = first;
        first = second;
        second = swap;
    }
    pile[(*height)++] = (task){first, is_and ? NEXT : t->yes, is_and ? t->no : NEXT};
    pile[(*height)++] = (task){second, t->yes, t->no};
}

/* Works from the last test asked to the first, so that the nodes that follow are there already. */
static bs_status emit(bs_nodes *nodes, const bs_query_expr *expr, const int *parts,
                      const int *size, const bool *costly, task *pile)
{
    int height = 0;
    bs_status st = BS_OK;

    pile[height++] = (task){expr->count - 1, BS_NODE_YES, BS_NODE_NO};
    while (height > 0 && st == BS_OK) {
        task t = pile[--height];
        const bs_test *test = &expr->tests[t.tree];

        if (t.yes == NEXT)
            t.yes = nodes->count - 1;
        if (t.no == NEXT)
            t.no = nodes->count - 1;
        if (test->kind == BS_TEST_NOT)
            pile[height++] = (task){t.tree - 1, t.no, t.yes};
        else if (test->kind == BS_TEST_AND || test->kind == BS_TEST_OR)
            push_pair(expr, size, costly, &t, pile, &height);
        else
            st = add_leaf(nodes, test, parts, t.yes, t.no);
    }
    return st;
}

bs_status bs_nodes__add(bs_nodes *nodes, const bs_query_expr *expr, const int *parts,
                        int32_t *entry)
{
    bs_arena *scratch = &nodes->cx->scratch;
    bool *costly;
    int *size;
    task *pile;
    bs_status st;

    if ((st = bs_query_sizes(nodes->cx, scratch, expr, &size)) != BS_OK ||
        (st = bs_new(nodes->cx, scratch, expr->count, &costly)) != BS_OK ||
        (st = bs_new(nodes->cx, scratch, expr->count + 2, &pile)) != BS_OK)
        return st;
    mark_costly(expr, size, costly);
    st = emit(nodes, expr, parts, size, costly, pile);
    *entry = nodes->count - 1;
    return st;
}
