/* Compiles atom expressions to graphs of nodes. */
#include "match/program.h"

#include <stddef.h>
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

/* Where the number of a test lies in an atom, and in how many bytes; none for other tests. */
typedef struct field {
    uint8_t offset, bytes;
} field;

#define FIELD(name)                                                                                \
    {                                                                                              \
        offsetof(bs_atom, name), sizeof((bs_atom *)0)->name                                        \
    }

static const field fields[BS_TEST_BOND_ANY] = {
    [BS_TEST_ELEMENT] = FIELD(element),       [BS_TEST_ALIPHATIC_ELEM] = FIELD(element),
    [BS_TEST_AROMATIC_ELEM] = FIELD(element), [BS_TEST_ISOTOPE] = FIELD(isotope),
    [BS_TEST_DEGREE] = FIELD(degree),         [BS_TEST_HYDROGENS] = FIELD(hydrogens),
    [BS_TEST_RING_COUNT] = FIELD(ring_count), [BS_TEST_RING_SIZE] = FIELD(min_ring),
    [BS_TEST_VALENCE] = FIELD(valence),       [BS_TEST_RING_BONDS] = FIELD(ring_bonds),
    [BS_TEST_CHARGE] = FIELD(charge),
};

/* Compares the number of a test with its field. */
static void fill_number(const field *f, int value, bs_atom *mask, bs_atom *want)
{
    uint8_t byte = (uint8_t)value;
    uint16_t word = (uint16_t)value;

    memset((char *)mask + f->offset, 0xFF, f->bytes);
    memcpy((char *)want + f->offset, f->bytes == 1 ? (void *)&byte : (void *)&word, f->bytes);
}

/* Tests that ask for a flag: its mask, and *set whether it must be set. 0 for others. */
static uint8_t flag_of(int kind, int value, bool *set)
{
    switch (kind) {
    case BS_TEST_AROMATIC:
    case BS_TEST_AROMATIC_ELEM:
        *set = true;
        return BS_ATOM_AROMATIC;
    case BS_TEST_ALIPHATIC:
    case BS_TEST_ALIPHATIC_ELEM:
        *set = false;
        return BS_ATOM_AROMATIC;
    case BS_TEST_RING_COUNT:
    case BS_TEST_RING_SIZE:
    case BS_TEST_RING_BONDS:
        *set = true;
        return value < 0 ? BS_ATOM_RING : 0;
    default:
        return 0;
    }
}

/* Tests that compare one field, a flag, or both. False: the test is of another sort. */
static bool fill_fields(bs_node *node, int kind, int value)
{
    const field *f = kind < BS_TEST_BOND_ANY ? &fields[kind] : NULL;
    bool set = false, in_ring = value < 0 && kind != BS_TEST_CHARGE;
    uint8_t flag = flag_of(kind, value, &set);
    bs_atom mask, want;

    if (!f || (f->bytes == 0 && flag == 0 && kind != BS_TEST_ANY))
        return false;
    memset(&mask, 0, sizeof mask);
    memset(&want, 0, sizeof want);
    mask.flags = flag;
    want.flags = set ? flag : 0;
    if (f->bytes > 0 && !in_ring)
        fill_number(f, value, &mask, &want);
    set_fields(node, &mask, &want);
    if (f->bytes == 1 && value > UINT8_MAX)
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

static void push_pair(const bs_query_expr *expr, const int *size, const bool *costly, const task *t,
                      task *pile, int *height)
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
static bs_status emit(bs_nodes *nodes, const bs_query_expr *expr, const int *parts, const int *size,
                      const bool *costly, task *pile)
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
