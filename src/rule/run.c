/* Every place where a reading fits, and the distinct sets of products that come out. */
#include "rule/run.h"

#include <stdlib.h>
#include <string.h>

#include "backsaw/format.h"

/* ---- Places --------------------------------------------------------------------------------- */

/* Matches of one part; `atoms` lists the atoms of `from` in the order of the part's pattern. */
typedef struct places {
    int *atoms;
    int width;
    uint32_t *found; /* count * width */
    int count;
} places;

static int compare_atoms(const void *a, const void *b)
{
    uint32_t x, y;

    memcpy(&x, a, sizeof x);
    memcpy(&y, b, sizeof y);
    return (x > y) - (x < y);
}

/*
 * What the result depends on: where the active atoms lie that persist, in order, and which atoms
 * go, in any order. Returns the length of the key.
 */
static int place_key(const bs_reading *r, const places *p, const uint32_t *match, uint32_t *key)
{
    int length = 0, gone;

    for (int i = 0; i < p->width; i++) {
        if (r->active[p->atoms[i]] && r->from_to[p->atoms[i]] >= 0)
            key[length++] = match[i];
    }
    gone = length;
    for (int i = 0; i < p->width; i++) {
        if (r->from_to[p->atoms[i]] < 0)
            key[length++] = match[i];
    }
    if (length > gone)
        qsort(key + gone, (size_t)(length - gone), sizeof *key, compare_atoms);
    return length;
}

/* Leaves out matches whose results would be the same as those of an earlier one. */
static bs_status drop_repeats(bs_ctx *cx, const bs_reading *r, places *p)
{
    uint32_t *keys; /* of the matches that stay */
    uint32_t *key;
    bs_map map;
    int kept = 0, length = 0;
    size_t width = (size_t)p->width;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, (size_t)p->count * width + 1, &keys)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, width + 1, &key)) != BS_OK)
        return st;
    bs_map_init(&map, cx);
    for (int i = 0; i < p->count && st == BS_OK; i++) {
        size_t bytes, cursor = 0;
        uint64_t hash;
        uint32_t other;

        length = place_key(r, p, p->found + (size_t)i * width, key);
        bytes = (size_t)length * sizeof *key;
        hash = bs_hash_bytes(key, bytes, 0);
        while ((other = bs_map_next(&map, hash, &cursor)) != BS_MAP_NONE) {
            if (memcmp(keys + (size_t)other * width, key, bytes) == 0)
                break;
        }
        if (other != BS_MAP_NONE)
            continue;
        memcpy(keys + (size_t)kept * width, key, bytes);
        memmove(p->found + (size_t)kept * width, p->found + (size_t)i * width,
                width * sizeof *p->found);
        st = bs_map_add(&map, hash, (uint32_t)kept++);
    }
    bs_map_free(&map);
    p->count = kept;
    return st;
}

static bs_status find_places(bs_ctx *cx, const bs_reading *r, int part, const bs_mol *mol,
                             const bs_run_opts *opts, places *out)
{
    const bs_side *from = r->from;
    bs_match_opts match = {.limit = opts->limit + 1, .every_embedding = true,
                           .steps = opts->steps};
    bs_matches found;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, from->part_size[part] + 1, &out->atoms)) != BS_OK)
        return st;
    for (int i = 0; i < from->atom_count; i++) {
        if (from->atoms[i].part == part)
            out->atoms[from->atoms[i].place] = i;
    }
    out->width = from->part_size[part];
    st = bs_pattern_find(cx, &cx->scratch, from->patterns[part], mol, &match, &found);
    if (st != BS_OK)
        return st;
    out->found = found.atoms;
    out->count = found.count;
    return opts->every_place ? BS_OK : drop_repeats(cx, r, out);
}

/* ---- Running ------------------------------------------------------------------------------------ */

typedef struct run {
    bs_ctx *cx;
    bs_arena *home;
    const bs_reading *reading;
    const bs_run_opts *opts;
    places *parts;
    int *chosen; /* for each part the match at hand */
    uint32_t *where;
    bs_run_fn visit;
    void *payload;
} run;

static void fill_where(const run *r)
{
    for (int i = 0; i < r->reading->from->part_count; i++) {
        const places *p = &r->parts[i];
        const uint32_t *match = p->found + (size_t)r->chosen[i] * (size_t)p->width;

        for (int k = 0; k < p->width; k++)
            r->where[p->atoms[k]] = match[k];
    }
}

/* The next combination, the last part running fastest; false after the last one. */
static bool next_choice(const run *r)
{
    for (int i = r->reading->from->part_count - 1; i >= 0; i--) {
        if (++r->chosen[i] < r->parts[i].count)
            return true;
        r->chosen[i] = 0;
    }
    return false;
}

static bs_status try_all(run *r, const bs_bench *bench)
{
    int tried = 0;
    bs_status st;

    do {
        bs_mark kept = bs_arena_mark(r->home);
        bs_result result;
        bool possible = false, keep = false;

        if ((st = bs_poll(r->cx)) != BS_OK)
            return st;
        if (tried++ >= r->opts->limit)
            return BS_OK;
        fill_where(r);
        st = bs_bench__apply(r->cx, r->home, bench, r->where, &result, &possible);
        if (st == BS_OK && possible)
            st = r->visit(r->payload, r->cx, r->where, &result, &keep);
        if (!keep || st != BS_OK)
            bs_arena_rewind(r->home, kept);
        if (st != BS_OK)
            return st;
    } while (next_choice(r));
    return BS_OK;
}

static bs_status run_all(run *r, const bs_mol *const *mols)
{
    const bs_side *from = r->reading->from;
    bs_ctx *cx = r->cx;
    double total = 1;
    bs_bench bench;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, from->part_count + 1, &r->parts)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, from->part_count + 1, &r->chosen)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, from->atom_count + 1, &r->where)) != BS_OK)
        return st;
    for (int i = 0; i < from->part_count; i++) {
        st = find_places(cx, r->reading, i, mols[i], r->opts, &r->parts[i]);
        if (st != BS_OK || r->parts[i].count == 0)
            return st;
        total *= r->parts[i].count;
    }
    if (r->opts->strict && total > r->opts->limit)
        return bs_fail(cx, BS_ELIMIT, "the rewriting fits at more than %d places", r->opts->limit);
    if ((st = bs_bench__lay(cx, &cx->scratch, r->reading, mols, &bench)) != BS_OK)
        return st;
    return try_all(r, &bench);
}

bs_status bs_run__all(bs_ctx *cx, bs_arena *home, const bs_reading *reading,
                      const bs_mol *const *mols, const bs_run_opts *opts, bs_run_fn visit,
                      void *payload)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    run r = {.cx = cx, .home = home, .reading = reading, .opts = opts, .visit = visit,
             .payload = payload};
    bs_status st = run_all(&r, mols);

    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Sets of products --------------------------------------------------------------------------- */

void bs_seen__init(bs_seen *seen, bs_ctx *cx)
{
    *seen = (bs_seen){0};
    bs_map_init(&seen->map, cx);
    bs_arena_init(&seen->arena, cx->gate);
}

void bs_seen__free(bs_seen *seen)
{
    bs_map_free(&seen->map);
    bs_arena_free(&seen->arena);
}

static int compare_strings(const void *a, const void *b)
{
    const char *x, *y;

    memcpy(&x, a, sizeof x);
    memcpy(&y, b, sizeof y);
    return strcmp(x, y);
}

/* The SMILES in order, with a space behind each. */
static bs_status join(bs_ctx *cx, bs_arena *home, char *const *smiles, int count, char **key)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    size_t length = 0;
    const char **sorted;
    bs_status st;

    for (int i = 0; i < count; i++)
        length += strlen(smiles[i]) + 1;
    if ((st = bs_new(cx, home, length + 1, key)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, count + 1, &sorted)) != BS_OK)
        return st;
    for (int i = 0; i < count; i++)
        sorted[i] = smiles[i];
    qsort(sorted, (size_t)count, sizeof *sorted, compare_strings);
    length = 0;
    for (int i = 0; i < count; i++) {
        size_t part = strlen(sorted[i]);

        memcpy(*key + length, sorted[i], part);
        (*key)[length + part] = ' ';
        length += part + 1;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return BS_OK;
}

static bs_status make_room(bs_ctx *cx, bs_seen *seen)
{
    int room = seen->room ? seen->room * 2 : 16;
    char **keys;
    bs_status st;

    if (seen->count < seen->room)
        return BS_OK;
    if ((st = bs_new(cx, &seen->arena, room, &keys)) != BS_OK)
        return st;
    if (seen->count > 0)
        memcpy(keys, seen->keys, (size_t)seen->count * sizeof *keys);
    seen->keys = keys;
    seen->room = room;
    return BS_OK;
}

bs_status bs_seen__add(bs_ctx *cx, bs_seen *seen, char *const *smiles, int count, int *index,
                       bool *fresh)
{
    char *key;
    uint64_t hash;
    uint32_t other;
    size_t cursor = 0;
    bs_status st;

    *fresh = false;
    if ((st = make_room(cx, seen)) != BS_OK ||
        (st = join(cx, &seen->arena, smiles, count, &key)) != BS_OK)
        return st;
    hash = bs_hash_bytes(key, strlen(key), 0);
    while ((other = bs_map_next(&seen->map, hash, &cursor)) != BS_MAP_NONE) {
        if (strcmp(seen->keys[other], key) == 0) {
            *index = (int)other;
            return BS_OK;
        }
    }
    if ((st = bs_map_add(&seen->map, hash, (uint32_t)seen->count)) != BS_OK)
        return st;
    *index = seen->count;
    *fresh = true;
    seen->keys[seen->count++] = key;
    return BS_OK;
}

bs_status bs_result__smiles(bs_ctx *cx, bs_arena *home, const bs_result *result, char ***out)
{
    bs_status st = bs_new(cx, home, result->product_count + 1, out);

    for (int i = 0; i < result->product_count && st == BS_OK; i++)
        st = bs_smiles_canonical(cx, home, result->products[i], 0, &(*out)[i]);
    return st;
}

bs_status bs_result__outcome(bs_ctx *cx, bs_arena *home, const bs_side *from,
                             const uint32_t *where, const uint32_t *reactant,
                             const bs_result *result, char **smiles, bs_outcome *out)
{
    bs_status st;

    *out = (bs_outcome){.products = result->products,
                        .smiles = smiles,
                        .product_count = result->product_count,
                        .site_count = from->atom_count};
    if ((st = bs_new(cx, home, from->atom_count + 1, &out->site_reactant)) != BS_OK ||
        (st = bs_new(cx, home, from->atom_count + 1, &out->site_atom)) != BS_OK)
        return st;
    for (int i = 0; i < from->atom_count; i++) {
        out->site_reactant[i] = reactant[from->atoms[i].part];
        out->site_atom[i] = where[i];
    }
    return BS_OK;
}
