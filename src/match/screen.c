/*
 * What a pattern demands of a molecule, and how rare its atoms are.
 *
 * Both come from an abstract reading of the expressions (Cousot & Cousot 1977): for each atom of
 * the query the sets of classes, hydrogens, charges, ... that it may have, each set by itself and
 * never too small. A feature is demanded if every state in the sets has it.
 */
#include "match/program.h"

#include <string.h>

enum {
    ALL_KINDS = (1 << 2 * BS_CLASS_COUNT) - 1, /* bit class * 2 + aromatic */
    ALL_COUNTS = 31,                           /* 0 to 3, and 4 or more */
    ALL_CHARGES = 7,                           /* negative, none, positive */
    ALL_RINGS = 511,                           /* none, 3 to 7, 8 or more; bits 0, 3 to 8 */
    ALL_HANDS = 3,                             /* without and with a hand */
    HIGH = 4
};

/* The states that an atom may be in. */
typedef struct box {
    uint32_t kinds;
    uint8_t hydrogens, charges, degrees, ring_bonds, hands;
    uint16_t rings;
} box;

/* The states in which an expression may hold, and those in which it may fail. */
typedef struct sides {
    box yes, no;
} sides;

static const box everything = {ALL_KINDS,  ALL_COUNTS, ALL_CHARGES, ALL_COUNTS,
                               ALL_COUNTS, ALL_HANDS,  ALL_RINGS};

static box meet(box a, box b)
{
    return (box){a.kinds & b.kinds,
                 (uint8_t)(a.hydrogens & b.hydrogens),
                 (uint8_t)(a.charges & b.charges),
                 (uint8_t)(a.degrees & b.degrees),
                 (uint8_t)(a.ring_bonds & b.ring_bonds),
                 (uint8_t)(a.hands & b.hands),
                 (uint16_t)(a.rings & b.rings)};
}

static box join(box a, box b)
{
    return (box){a.kinds | b.kinds,
                 (uint8_t)(a.hydrogens | b.hydrogens),
                 (uint8_t)(a.charges | b.charges),
                 (uint8_t)(a.degrees | b.degrees),
                 (uint8_t)(a.ring_bonds | b.ring_bonds),
                 (uint8_t)(a.hands | b.hands),
                 (uint16_t)(a.rings | b.rings)};
}

static sides element_sides(int kind, int element)
{
    int class = bs_feature__class(element);
    sides s = {everything, everything};

    s.yes.kinds = (uint32_t)3 << 2 * class;
    if (kind == BS_TEST_ALIPHATIC_ELEM)
        s.yes.kinds &= 0x55555555u;
    if (kind == BS_TEST_AROMATIC_ELEM)
        s.yes.kinds &= 0xAAAAAAAAu;
    if (class < BS_CLASS_SINGLE)
        s.no.kinds = ALL_KINDS & ~s.yes.kinds;
    return s;
}

/* Numbers up to 3 are exact; above, a bit stands for several. */
static void number_sides(uint8_t *yes, uint8_t *no, int value)
{
    if (value < 0) {
        *yes = ALL_COUNTS & ~1;
        *no = 1;
    } else {
        *yes = (uint8_t)(1 << (value < HIGH ? value : HIGH));
        *no = value < HIGH ? (uint8_t)(ALL_COUNTS & ~*yes) : ALL_COUNTS;
    }
}

static sides ring_sides(int kind, int value)
{
    sides s = {everything, everything};

    if (value <= 0) {
        s.yes.rings = value < 0 ? ALL_RINGS & ~1 : 1;
        s.no.rings = (uint16_t)(ALL_RINGS & ~s.yes.rings);
    } else {
        s.yes.rings = ALL_RINGS & ~1;
        if (kind == BS_TEST_RING_SIZE)
            s.yes.rings = (uint16_t)(1 << (value < 8 ? value : 8));
    }
    if (kind == BS_TEST_RING_BONDS)
        number_sides(&s.yes.ring_bonds, &s.no.ring_bonds, value);
    return s;
}

static sides charge_sides(int value)
{
    sides s = {everything, everything};

    s.yes.charges = value < 0 ? 1 : value == 0 ? 2 : 4;
    if (value == 0)
        s.no.charges = 5;
    return s;
}

static sides leaf_sides(const bs_test *test)
{
    sides s = {everything, everything};

    switch (test->kind) {
    case BS_TEST_ELEMENT:
    case BS_TEST_ALIPHATIC_ELEM:
    case BS_TEST_AROMATIC_ELEM:
        return element_sides(test->kind, test->value);
    case BS_TEST_ALIPHATIC:
        s.yes.kinds = ALL_KINDS & 0x55555555u;
        s.no.kinds = ALL_KINDS & ~s.yes.kinds;
        return s;
    case BS_TEST_AROMATIC:
        s.yes.kinds = ALL_KINDS & 0xAAAAAAAAu;
        s.no.kinds = ALL_KINDS & ~s.yes.kinds;
        return s;
    case BS_TEST_HYDROGENS:
        number_sides(&s.yes.hydrogens, &s.no.hydrogens, test->value);
        return s;
    case BS_TEST_DEGREE:
        number_sides(&s.yes.degrees, &s.no.degrees, test->value);
        return s;
    case BS_TEST_RING_COUNT:
    case BS_TEST_RING_SIZE:
    case BS_TEST_RING_BONDS:
        return ring_sides(test->kind, test->value);
    case BS_TEST_CHARGE:
        return charge_sides(test->value);
    case BS_TEST_CHIRAL:
        s.yes.hands = test->value > 2 ? ALL_HANDS : 2;
        return s;
    default:
        return s;
    }
}

/*
 * X counts neighbours and folded hydrogens. Where the hydrogens are known to be none, as in most
 * patterns that care, X is the degree; else the degree is at most X.
 */
static void use_connections(const bs_query_expr *expr, box *states)
{
    int connections, low, high;

    if (!bs_query_demands(expr, BS_TEST_CONNECTIONS, &connections) || connections >= HIGH + 4)
        return;
    for (high = HIGH; high > 0 && !(states->hydrogens >> high & 1); high--)
        ;
    low = high == HIGH ? 0 : connections - high;
    for (int d = 0; d < HIGH; d++)
        if (d < low || d > connections)
            states->degrees &= (uint8_t) ~(1 << d);
    if (connections < HIGH)
        states->degrees &= (uint8_t) ~(1 << HIGH);
}

/* Leaves out what the place in the graph rules out. */
static void use_shape(const bs_shape *shape, int atom, box *states)
{
    int degree = shape->degree[atom], ring_bonds = shape->ring_bonds[atom];

    states->degrees &= (uint8_t)(ALL_COUNTS << (degree < HIGH ? degree : HIGH));
    states->ring_bonds &= (uint8_t)(ALL_COUNTS << (ring_bonds < HIGH ? ring_bonds : HIGH));
    if (ring_bonds > 0)
        states->rings &= ALL_RINGS & ~1;
}

static bs_status find_box(bs_ctx *cx, const bs_query_expr *expr, const bs_shape *shape, int atom,
                          box *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    sides *pile;
    int height = 0;
    bs_status st = bs_new(cx, &cx->scratch, expr->count, &pile);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < expr->count; i++) {
        int kind = expr->tests[i].kind;

        if (kind == BS_TEST_NOT) {
            sides a = pile[height - 1];
            pile[height - 1] = (sides){a.no, a.yes};
        } else if (kind == BS_TEST_AND) {
            sides b = pile[--height], a = pile[height - 1];
            pile[height - 1] = (sides){meet(a.yes, b.yes), join(a.no, b.no)};
        } else if (kind == BS_TEST_OR) {
            sides b = pile[--height], a = pile[height - 1];
            pile[height - 1] = (sides){join(a.yes, b.yes), meet(a.no, b.no)};
        } else {
            pile[height++] = leaf_sides(&expr->tests[i]);
        }
    }
    *out = pile[0].yes;
    use_connections(expr, out);
    use_shape(shape, atom, out);
    bs_arena_rewind(&cx->scratch, temp);
    return BS_OK;
}

/* ---- Demands --------------------------------------------------------------------------- */

static void both(bs_features *common, bs_features other)
{
    common->word[0] &= other.word[0];
    common->word[1] &= other.word[1];
}

static void also(bs_features *sum, bs_features more)
{
    sum->word[0] |= more.word[0];
    sum->word[1] |= more.word[1];
}

/* What all states of an atom have in common, property by property. */
static bs_features atom_needs(const box *b)
{
    const bs_features all = {{UINT64_MAX, UINT64_MAX}};
    bs_features kind = all, hydrogens = all, charge = all, degree = all, ring = all, bonds = all;
    bs_features sum;

    for (int k = 0; k < 2 * BS_CLASS_COUNT; k++) {
        int class = k / 2;
        bool aromatic = k % 2;

        if (!(b->kinds >> k & 1))
            continue;
        both(&kind, bs_feature__atom(class, aromatic));
        for (int n = 0; n <= HIGH; n++) {
            if (b->hydrogens >> n & 1)
                both(&hydrogens, bs_feature__hydrogens(class, aromatic, n));
            if (b->degrees >> n & 1)
                both(&degree, bs_feature__degree(class, aromatic, n));
        }
        for (int n = 0; n < 3; n++)
            if (b->charges >> n & 1)
                both(&charge, bs_feature__charge(class, n - 1));
        for (int n = 0; n <= 8; n++)
            if (b->rings >> n & 1 && n != 1 && n != 2)
                both(&ring, bs_feature__ring(class, aromatic, n));
    }
    for (int n = 0; n <= HIGH; n++)
        if (b->ring_bonds >> n & 1)
            both(&bonds, bs_feature__ring_bonds(n));
    sum = kind;
    also(&sum, hydrogens);
    also(&sum, charge);
    also(&sum, degree);
    also(&sum, ring);
    also(&sum, bonds);
    if (b->hands == 2)
        sum.word[0] |= (uint64_t)1 << BS_FEATURE_HAND;
    return sum;
}

static bs_features bond_needs(uint32_t sorts, uint32_t kinds_a, uint32_t kinds_b)
{
    bs_features common = {{UINT64_MAX, UINT64_MAX}};

    for (int a = 0; a < 2 * BS_CLASS_COUNT; a++) {
        if (!(kinds_a >> a & 1))
            continue;
        for (int b = 0; b < 2 * BS_CLASS_COUNT; b++) {
            if (!(kinds_b >> b & 1))
                continue;
            for (int sort = 0; sort < 32; sort++) {
                if (!(sorts >> sort & 1) || (sort & 7) > 4)
                    continue;
                both(&common,
                     bs_feature__bond(a / 2, a % 2, b / 2, b % 2, sort & 7, sort & 8, sort & 16));
                if ((common.word[0] | common.word[1]) == 0)
                    return common;
            }
        }
    }
    return common;
}

/* Atoms of the pattern lie on different atoms of the molecule, so their numbers add up. */
static bs_features count_needs(const box *boxes, int count)
{
    int classes[BS_CLASS_COUNT] = {0}, aromatic = 0;

    for (int i = 0; i < count; i++) {
        for (int c = 0; c < BS_CLASS_COUNT; c++)
            classes[c] += boxes[i].kinds != 0 && (boxes[i].kinds & ~((uint32_t)3 << 2 * c)) == 0;
        aromatic += boxes[i].kinds != 0 && (boxes[i].kinds & 0x55555555u) == 0;
    }
    return bs_feature__counts(classes, aromatic);
}

/* Recursive parts that the expression demands, down to `depth`. */
static bs_status add_needs(bs_ctx *cx, const bs_query *query, int depth, bs_features *needs)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_shape shape;
    box *boxes;
    uint32_t sorts;
    bs_status st = bs_new(cx, &cx->scratch, query->atom_count, &boxes);

    if (st == BS_OK)
        st = bs_shape__find(cx, &cx->scratch, query, &shape);

    for (int i = 0; i < query->atom_count && st == BS_OK; i++) {
        const bs_query_expr *expr = &query->atoms[i].expr;
        int sub;

        st = find_box(cx, expr, &shape, i, &boxes[i]);
        if (st == BS_OK)
            also(needs, atom_needs(&boxes[i]));
        if (st == BS_OK && depth > 0 && bs_query_demands(expr, BS_TEST_RECURSE, &sub))
            st = add_needs(cx, query->subs[sub], depth - 1, needs);
    }
    for (int i = 0; i < query->bond_count && st == BS_OK; i++) {
        const bs_query_bond *bond = &query->bonds[i];

        st = bs_query_bond_mask(cx, &bond->expr, &sorts);
        if (st == BS_OK)
            also(needs, bond_needs(shape.cyclic[i] ? sorts & BS_SORTS_IN_RINGS : sorts,
                                   boxes[bond->a].kinds, boxes[bond->b].kinds));
    }
    if (st == BS_OK)
        also(needs, count_needs(boxes, query->atom_count));
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_screen__needs(bs_ctx *cx, const bs_query *query, bs_features *needs)
{
    *needs = (bs_features){{0, 0}};
    return add_needs(cx, query, BS_QUERY_MAX_DEPTH, needs);
}

/* ---- Rarity ---------------------------------------------------------------------------- */

static int share(unsigned set, const uint16_t *weights, int count)
{
    int sum = 0;

    for (int i = 0; i < count; i++)
        if (set >> i & 1)
            sum += weights[i];
    return sum;
}

/* Rough shares among the atoms of organic molecules (common knowledge, no source), in 1/1000. */
static int32_t box_rarity(const box *b)
{
    static const uint16_t kinds[2 * BS_CLASS_COUNT] = {360, 370, 55, 45, 100, 3, 12, 4, 8, 0,
                                                       8,   0,   3,  0,  2,   0, 3,  0, 1, 0,
                                                       1,   0,   3,  0,  1,   1, 3,  0, 5, 0};
    static const uint16_t hydrogens[] = {450, 300, 150, 90, 10}, charges[] = {12, 970, 18};
    static const uint16_t degrees[] = {5, 230, 450, 280, 35}, ring_bonds[] = {400, 0, 500, 95, 5};
    static const uint16_t rings[] = {400, 0, 0, 5, 5, 140, 420, 20, 10};
    double rarity = 1000.0;

    rarity *= share(b->kinds, kinds, 2 * BS_CLASS_COUNT) / 1000.0;
    rarity *= share(b->hydrogens, hydrogens, 5) / 1000.0;
    rarity *= share(b->charges, charges, 3) / 1000.0;
    rarity *= share(b->degrees, degrees, 5) / 1000.0;
    rarity *= share(b->ring_bonds, ring_bonds, 5) / 1000.0;
    rarity *= share(b->rings, rings, 9) / 1000.0;
    return (int32_t)(rarity * 1000.0);
}

bs_status bs_screen__rarity(bs_ctx *cx, const bs_query *query, const bs_shape *shape,
                            int32_t *rarity)
{
    box states;
    bs_status st = BS_OK;

    for (int i = 0; i < query->atom_count && st == BS_OK; i++) {
        const bs_query_expr *expr = &query->atoms[i].expr;

        st = find_box(cx, expr, shape, i, &states);
        if (st != BS_OK)
            break;
        rarity[i] = box_rarity(&states);
        if (bs_query_demands(expr, BS_TEST_RECURSE, NULL))
            rarity[i] /= 2;
        if (bs_query_demands(expr, BS_TEST_ISOTOPE, NULL))
            rarity[i] /= 50;
    }
    return st;
}
