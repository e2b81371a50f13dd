/* Bond expressions as sets of the sorts of bond that they accept. */
#include "match/query.h"

/* What a part accepts and what it refuses; a direction may do both. */
typedef struct sides {
    uint32_t yes, no;
} sides;

enum { SORTS = 32 };

static bool accepts(int kind, int order, bool aromatic, bool ring)
{
    switch (kind) {
    case BS_TEST_BOND_SINGLE:
    case BS_TEST_BOND_UP:
    case BS_TEST_BOND_DOWN:
        return order == 1 && !aromatic;
    case BS_TEST_BOND_DOUBLE:
        return order == 2 && !aromatic;
    case BS_TEST_BOND_TRIPLE:
        return order == 3 && !aromatic;
    case BS_TEST_BOND_QUADRUPLE:
        return order == 4 && !aromatic;
    case BS_TEST_BOND_AROMATIC:
        return aromatic;
    case BS_TEST_BOND_RING:
        return ring;
    case BS_TEST_BOND_DEFAULT:
        return order == 1 || aromatic;
    default:
        return true;
    }
}

static sides leaf_sides(int kind)
{
    sides s = {0, 0};

    for (int sort = 0; sort < SORTS; sort++)
        if (accepts(kind, sort & 7, sort & 8, sort & 16))
            s.yes |= (uint32_t)1 << sort;
    s.no = kind == BS_TEST_BOND_UP || kind == BS_TEST_BOND_DOWN ? UINT32_MAX : ~s.yes;
    return s;
}

bs_status bs_query_bond_mask(bs_ctx *cx, const bs_query_expr *expr, uint32_t *mask)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    sides *pile;
    int height = 0, *size;
    bs_status st;

    if ((st = bs_query_sizes(cx, &cx->scratch, expr, &size)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, expr->count, &pile)) != BS_OK)
        goto done;
    for (int i = 0; i < expr->count; i++) {
        int kind = expr->tests[i].kind;

        if (kind == BS_TEST_NOT) {
            sides a = pile[height - 1];
            pile[height - 1] = (sides){a.no, a.yes};
        } else if (kind == BS_TEST_AND || kind == BS_TEST_OR) {
            sides b = pile[--height], a = pile[height - 1];
            pile[height - 1] = kind == BS_TEST_AND ? (sides){a.yes & b.yes, a.no | b.no}
                                                   : (sides){a.yes | b.yes, a.no & b.no};
        } else {
            pile[height++] = leaf_sides(kind);
        }
    }
    *mask = pile[0].yes;
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
