/* The matcher: a search with backtracking, without recursion on the pattern, within a budget. */
#include "match/run.h"

#include "core/map.h"

#include <string.h>

#define DEFAULT_STEPS 10000000L
#define POLL_EVERY 4096 /* steps between looks at the stop flag */

/* ---- Runs and searches ----------------------------------------------------------------- */

/* Numbers the connected pieces of a molecule by a walk with a pile of its own. */
static bs_status number_components(bs_match_run *run)
{
    const bs_mol *mol = run->mol;
    uint32_t *pile, pieces = 0;
    bs_status st = bs_new(run->cx, &run->cx->scratch, mol->atom_count, &run->components);

    if (st == BS_OK)
        st = bs_new(run->cx, &run->cx->scratch, mol->atom_count, &pile);
    for (uint32_t start = 0; st == BS_OK && start < mol->atom_count; start++) {
        uint32_t height = 0;

        if (run->components[start] != 0)
            continue;
        run->components[start] = ++pieces;
        pile[height++] = start;
        while (height > 0) {
            uint32_t at = pile[--height];
            const bs_link *links = bs_mol__links(mol, at);

            for (int k = 0; k < mol->atoms[at].degree; k++) {
                if (run->components[links[k].atom] == 0) {
                    run->components[links[k].atom] = pieces;
                    pile[height++] = links[k].atom;
                }
            }
        }
    }
    return st;
}

static bool any_groups(const bs_pattern *pattern)
{
    bool any = pattern->has_groups;

    for (int i = 0; i < pattern->sub_count; i++)
        any = any || pattern->subs[i]->has_groups;
    return any;
}

bs_status bs_match__begin(bs_match_run *run, bs_ctx *cx, const bs_pattern *pattern,
                          const bs_mol *mol, long steps)
{
    bs_status st = BS_OK;

    *run = (bs_match_run){.cx = cx,
                          .mol = mol,
                          .whole = pattern,
                          .steps = steps > 0 ? steps : DEFAULT_STEPS};
    if (pattern->sub_count > 0)
        st = bs_new_array(cx, &cx->scratch, (size_t)pattern->sub_count * mol->atom_count, 1,
                          &run->memo);
    if (st == BS_OK && any_groups(pattern))
        st = number_components(run);
    return st;
}

bs_status bs_match__search(bs_match_search *search, bs_match_run *run, const bs_pattern *pattern)
{
    bs_ctx *cx = run->cx;
    bs_status st;

    *search = (bs_match_search){.run = run, .pattern = pattern, .anchor = UINT32_MAX};
    if ((st = bs_new(cx, &cx->scratch, pattern->atom_count, &search->placed)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, pattern->atom_count, &search->cursor)) != BS_OK)
        return st;
    return bs_new(cx, &cx->scratch, run->mol->atom_count, &search->used);
}

/* ---- The search ------------------------------------------------------------------------ */

/* Takes a step from the budget; false when it ran out or a stop was asked for. */
static bool pay(bs_match_run *run)
{
    if (run->status != BS_OK)
        return false;
    if (--run->steps <= 0)
        run->status = bs_fail(run->cx, BS_ELIMIT, "the pattern needs more steps than it may take");
    else if (run->steps % POLL_EVERY == 0)
        run->status = bs_poll(run->cx);
    return run->status == BS_OK;
}

/* The next candidate for a visit and the bond that leads to it; UINT32_MAX when there is none. */
static uint32_t candidate(bs_match_search *s, const bs_visit *visit)
{
    const bs_mol *mol = s->run->mol;
    uint32_t *cursor = &s->cursor[s->level];

    if (visit->parent < 0) {
        if (s->anchor != UINT32_MAX && visit->atom == s->anchor_atom)
            return (*cursor)++ == 0 ? s->anchor : UINT32_MAX;
        return *cursor < mol->atom_count ? (*cursor)++ : UINT32_MAX;
    }
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t from = s->placed[visit->parent];
    const bs_link *links = bs_mol__links(mol, from);

    while (*cursor < mol->atoms[from].degree) {
        const bs_link *link = &links[(*cursor)++];

        if (visit->bond_mask >> bs_bond__state(&bonds[link->bond]) & 1)
            return link->atom;
    }
    return UINT32_MAX;
}

static bool closures_fit(const bs_match_search *s, const bs_visit *visit, uint32_t where)
{
    const bs_mol *mol = s->run->mol;

    for (int i = 0; i < visit->closure_count; i++) {
        const bs_closure *closure = &s->pattern->closures[visit->first_closure + i];
        int bond = bs_mol_bond_between(mol, (int)where, (int)s->placed[closure->other]);

        if (bond < 0 || !(closure->bond_mask >> bs_bond__state(&bs_mol__bonds(mol)[bond]) & 1))
            return false;
    }
    return true;
}

/* Atoms of one group lie in one piece of the molecule, those of two groups in two. */
static bool groups_fit(const bs_match_search *s, const bs_visit *visit, uint32_t where)
{
    if (visit->group == 0)
        return true;
    for (int i = 0; i < s->level; i++) {
        const bs_visit *earlier = &s->pattern->visits[i];

        if (earlier->group == 0)
            continue;
        if ((earlier->group == visit->group) !=
            (s->run->components[s->placed[earlier->atom]] == s->run->components[where]))
            return false;
    }
    return true;
}

static bool fits(bs_match_search *s, const bs_visit *visit, uint32_t where)
{
    if (s->used[where])
        return false;
    if (s->anchor != UINT32_MAX && visit->atom == s->anchor_atom && where != s->anchor)
        return false;
    return bs_match__atom(s->run, &s->pattern->exprs[visit->atom], where, 0) &&
           closures_fit(s, visit, where) && groups_fit(s, visit, where);
}

static void lift(bs_match_search *s)
{
    s->level--;
    s->used[s->placed[s->pattern->visits[s->level].atom]] = false;
}

bool bs_match__next(bs_match_search *s)
{
    int last = s->pattern->atom_count;

    if (s->level == last)
        lift(s);
    for (;;) {
        const bs_visit *visit = &s->pattern->visits[s->level];
        uint32_t where;

        if (!pay(s->run))
            return false;
        where = candidate(s, visit);
        if (where == UINT32_MAX) {
            if (s->level == 0)
                return false;
            s->cursor[s->level] = 0;
            lift(s);
            continue;
        }
        if (!fits(s, visit, where))
            continue;
        s->placed[visit->atom] = where;
        s->used[where] = true;
        if (++s->level < last) {
            s->cursor[s->level] = 0;
            continue;
        }
        if (bs_match__stereo(s))
            return true;
        lift(s);
    }
}

/* ---- Collecting ------------------------------------------------------------------------ */

/*
 * Matches found so far. A row is a match and behind it the same atoms sorted, by which the map
 * tells sets of atoms apart. Rows come from the gate, since the caller may want the result in
 * scratch.
 */
typedef struct collection {
    bs_ctx *cx;
    int width;
    int count, room;
    uint32_t *rows;
    bs_map sets;
} collection;

static size_t row_bytes(const collection *c)
{
    return 2 * (size_t)c->width * sizeof *c->rows;
}

static uint32_t *row(const collection *c, int index)
{
    return c->rows + (size_t)index * 2 * (size_t)c->width;
}

static void sort(uint32_t *items, int count)
{
    for (int i = 1; i < count; i++) {
        uint32_t item = items[i];
        int k = i;

        for (; k > 0 && items[k - 1] > item; k--)
            items[k] = items[k - 1];
        items[k] = item;
    }
}

static bs_status widen(collection *c)
{
    int room = c->room ? 2 * c->room : 8;
    uint32_t *rows = bs_gate_resize(c->cx->gate, c->rows, row_bytes(c) * (size_t)c->room,
                                    row_bytes(c) * (size_t)room);

    if (!rows)
        return bs_fail_memory(c->cx);
    c->rows = rows;
    c->room = room;
    return BS_OK;
}

static bool is_known(const collection *c, uint64_t hash, const uint32_t *set)
{
    size_t cursor = 0;
    uint32_t other;

    while ((other = bs_map_next(&c->sets, hash, &cursor)) != BS_MAP_NONE)
        if (memcmp(row(c, (int)other) + c->width, set, row_bytes(c) / 2) == 0)
            return true;
    return false;
}

static bs_status collect(collection *c, const uint32_t *atoms, bool every)
{
    uint32_t *set;
    uint64_t hash;
    bs_status st;

    if (c->count == c->room && (st = widen(c)) != BS_OK)
        return st;
    set = row(c, c->count) + c->width;
    memcpy(row(c, c->count), atoms, row_bytes(c) / 2);
    memcpy(set, atoms, row_bytes(c) / 2);
    if (!every) {
        sort(set, c->width);
        hash = bs_hash_bytes(set, row_bytes(c) / 2, 0);
        if (is_known(c, hash, set))
            return BS_OK;
        if ((st = bs_map_add(&c->sets, hash, (uint32_t)c->count)) != BS_OK)
            return st;
    }
    c->count++;
    return BS_OK;
}

static bs_status collect_all(collection *c, bs_match_search *search, const bs_match_opts *opts)
{
    bs_status st = BS_OK;

    while (st == BS_OK && (opts->limit == 0 || c->count < opts->limit) && bs_match__next(search))
        st = collect(c, search->placed, opts->every_embedding);
    return st == BS_OK ? search->run->status : st;
}

/* Copies the matches to where they shall live. */
static bs_status hand_over(const collection *c, bs_arena *home, bs_matches *out)
{
    bs_status st;

    if (c->count == 0)
        return BS_OK;
    if ((st = bs_new(c->cx, home, (size_t)c->count * (size_t)c->width, &out->atoms)) != BS_OK)
        return st;
    for (int i = 0; i < c->count; i++)
        memcpy(out->atoms + (size_t)i * (size_t)c->width, row(c, i), row_bytes(c) / 2);
    out->count = c->count;
    return BS_OK;
}

bs_status bs_pattern_find(bs_ctx *cx, bs_arena *home, const bs_pattern *pattern, const bs_mol *mol,
                          const bs_match_opts *opts, bs_matches *out)
{
    static const bs_match_opts defaults = {0};
    bs_mark mark = bs_arena_mark(&cx->scratch);
    collection c = {.cx = cx, .width = pattern->atom_count};
    bs_match_run run;
    bs_match_search search;
    bs_status st;

    *out = (bs_matches){.width = pattern->atom_count};
    if (!opts)
        opts = &defaults;
    bs_map_init(&c.sets, cx);
    if ((st = bs_match__begin(&run, cx, pattern, mol, opts->steps)) != BS_OK ||
        (st = bs_match__search(&search, &run, pattern)) != BS_OK)
        goto done;
    if (opts->anchored) {
        search.anchor = opts->anchor;
        search.anchor_atom = opts->anchor_atom;
    }
    st = collect_all(&c, &search, opts);
done:
    bs_map_free(&c.sets);
    bs_arena_rewind(&cx->scratch, mark);
    if (st == BS_OK)
        st = hand_over(&c, home, out);
    bs_gate_free(cx->gate, c.rows, row_bytes(&c) * (size_t)c.room);
    return st;
}

bs_status bs_pattern_has(bs_ctx *cx, const bs_pattern *pattern, const bs_mol *mol, bool *found)
{
    bs_mark mark = bs_arena_mark(&cx->scratch);
    bs_match_run run;
    bs_match_search search;
    bs_status st;

    *found = false;
    if ((st = bs_match__begin(&run, cx, pattern, mol, 0)) == BS_OK &&
        (st = bs_match__search(&search, &run, pattern)) == BS_OK) {
        *found = bs_match__next(&search);
        st = run.status;
    }
    bs_arena_rewind(&cx->scratch, mark);
    return st;
}

bs_status bs_pattern__atom_passes(bs_ctx *cx, const bs_pattern *pattern, int atom,
                                  const bs_mol *mol, uint32_t where, bool *passes)
{
    bs_mark mark = bs_arena_mark(&cx->scratch);
    bs_match_run run;
    bs_status st = bs_match__begin(&run, cx, pattern, mol, 0);

    *passes = false;
    if (st == BS_OK) {
        *passes = bs_match__atom(&run, &pattern->exprs[atom], where, 0);
        st = run.status;
    }
    bs_arena_rewind(&cx->scratch, mark);
    return st;
}
