/* Reaction SMARTS: reading "L>>R" and applying it. */
#include <string.h>

#include "rule/book.h"

enum { MAX_PLACES = 10000 };

struct bs_rewrite {
    bs_side left, right;
    bs_reading reading;
};

/* The place of ">>", or of the text's end. */
static size_t find_arrow(const char *text, size_t length)
{
    for (size_t i = 0; i + 1 < length; i++) {
        if (text[i] == '>' && text[i + 1] == '>')
            return i;
    }
    return length;
}

bs_status bs_rewrite__read_sides(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                                 bs_query **left, bs_query **right, size_t *right_at)
{
    size_t arrow = find_arrow(text, length);
    bs_status st;

    *right_at = arrow + 2;
    if (arrow == length)
        return bs_fail_at(cx, BS_ESYNTAX, length, "expected '>>' between the two sides");
    if ((st = bs_query_read(cx, home, text, arrow, 0, left)) != BS_OK)
        return st;
    return bs_query_read(cx, home, text + arrow + 2, length - arrow - 2, arrow + 2, right);
}

static bs_status make(bs_ctx *cx, bs_arena *home, const char *text, size_t length, bs_rewrite *rw)
{
    bs_query *left, *right;
    size_t right_at;
    bs_status st;

    st = bs_rewrite__read_sides(cx, home, text, length, &left, &right, &right_at);
    if (st != BS_OK)
        return st;
    if ((st = bs_side__read(cx, home, left, &rw->left)) != BS_OK ||
        (st = bs_side__read(cx, home, right, &rw->right)) != BS_OK ||
        (st = bs_side__compile(cx, home, &rw->left)) != BS_OK)
        return st;
    return bs_reading__make(cx, home, &rw->left, &rw->right, false, &rw->reading);
}

bs_status bs_rewrite_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                          bs_rewrite **out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_status st = bs_new(cx, home, 1, out);

    if (st == BS_OK)
        st = make(cx, home, text, length, *out);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *out = NULL;
    }
    return st;
}

int bs_rewrite_reactant_count(const bs_rewrite *rewrite)
{
    return rewrite->left.part_count;
}

/* ---- Applying ------------------------------------------------------------------------------- */

typedef struct gather {
    bs_arena *home;
    const bs_side *from;
    const uint32_t *reactant;
    bs_seen seen;
    bs_outcome *items;
    int count, room;
} gather;

static bs_status make_room(bs_ctx *cx, gather *g)
{
    int room = g->room ? g->room * 2 : 16;
    bs_outcome *items;
    bs_status st;

    if (g->count < g->room)
        return BS_OK;
    if ((st = bs_new(cx, g->home, room, &items)) != BS_OK)
        return st;
    if (g->count > 0)
        memcpy(items, g->items, (size_t)g->count * sizeof *items);
    g->items = items;
    g->room = room;
    return BS_OK;
}

static bs_status add_outcome(void *payload, bs_ctx *cx, const uint32_t *where,
                             const bs_result *result, bool *keep)
{
    gather *g = payload;
    char **smiles;
    int index;
    bs_status st;

    if ((st = bs_result__smiles(cx, g->home, result, &smiles)) != BS_OK ||
        (st = bs_seen__add(cx, &g->seen, smiles, result->product_count, &index, keep)) != BS_OK ||
        !*keep)
        return st;
    if ((st = make_room(cx, g)) != BS_OK)
        return st;
    return bs_result__outcome(cx, g->home, g->from, where, g->reactant, result, smiles,
                              &g->items[g->count++]);
}

static bs_status apply(bs_ctx *cx, bs_arena *home, const bs_rewrite *rewrite,
                       const bs_mol *const *reactants, gather *g)
{
    bs_run_opts opts = {.limit = MAX_PLACES, .strict = true};
    uint32_t *reactant;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, rewrite->left.part_count + 1, &reactant)) != BS_OK)
        return st;
    for (int i = 0; i < rewrite->left.part_count; i++)
        reactant[i] = (uint32_t)i;
    g->reactant = reactant;
    return bs_run__all(cx, home, &rewrite->reading, reactants, &opts, add_outcome, g);
}

bs_status bs_rewrite_apply(bs_ctx *cx, bs_arena *home, const bs_rewrite *rewrite,
                           const bs_mol *const *reactants, int count, bs_outcomes *out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    gather g = {.home = home, .from = &rewrite->left};
    bs_status st;

    *out = (bs_outcomes){0};
    if (count != rewrite->left.part_count)
        return bs_fail(cx, BS_EVALUE, "this rewriting takes %d molecule%s, %d given",
                       rewrite->left.part_count, rewrite->left.part_count == 1 ? "" : "s", count);
    bs_seen__init(&g.seen, cx);
    st = apply(cx, home, rewrite, reactants, &g);
    bs_seen__free(&g.seen);
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    else
        *out = (bs_outcomes){g.items, g.count};
    return st;
}
