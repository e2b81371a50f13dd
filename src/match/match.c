/* Finding matches: the calls of the public header and of query.h that need a molecule. */
#include "core/map.h"
#include "match/search.h"

#include <string.h>

/* Matches while they are found, in memory of the gate: `home` may be the scratch arena. */
typedef struct found {
    bs_ctx *cx;
    uint32_t *atoms;
    int count, room, width;
    bs_map sets; /* hash of the set of atoms to match */
    bool unique;
} found;

static uint64_t hash_set(const uint32_t *atoms, int width)
{
    uint64_t sum = 0;

    for (int i = 0; i < width; i++)
        sum += bs_hash_mix(0, atoms[i]);
    return sum;
}

/* Atoms of a match are distinct, so one inclusion makes the sets equal. */
static bool same_set(const uint32_t *a, const uint32_t *b, int width)
{
    for (int i = 0; i < width; i++) {
        int k = 0;

        while (k < width && b[k] != a[i])
            k++;
        if (k == width)
            return false;
    }
    return true;
}

static bool is_known(const found *all, const uint32_t *atoms, uint64_t hash)
{
    size_t cursor = 0;
    uint32_t index;

    while ((index = bs_map_next(&all->sets, hash, &cursor)) != BS_MAP_NONE)
        if (same_set(all->atoms + (size_t)index * (size_t)all->width, atoms, all->width))
            return true;
    return false;
}

static size_t found_bytes(const found *all, int count)
{
    return (size_t)count * (size_t)all->width * sizeof *all->atoms;
}

static bs_status keep(found *all, const bs_frame *f)
{
    uint32_t *atoms;
    uint64_t hash;

    if (all->count == all->room) {
        int room = all->room ? all->room * 2 : 8;

        if (room > INT32_MAX / 4)
            return bs_fail(all->cx, BS_ELIMIT, "too many matches of the pattern");
        atoms = bs_gate_resize(all->cx->gate, all->atoms, found_bytes(all, all->room),
                               found_bytes(all, room));
        if (!atoms)
            return bs_fail_memory(all->cx);
        all->atoms = atoms;
        all->room = room;
    }
    atoms = all->atoms + (size_t)all->count * (size_t)all->width;
    for (int i = 0; i < all->width; i++)
        atoms[i] = f->placed[f->order->place[i]];
    if (all->unique) {
        bs_status st;

        hash = hash_set(atoms, all->width);
        if (is_known(all, atoms, hash))
            return BS_OK;
        if ((st = bs_map_add(&all->sets, hash, (uint32_t)all->count)) != BS_OK)
            return st;
    }
    all->count++;
    return BS_OK;
}

static bs_status check_opts(bs_ctx *cx, const bs_pattern *pattern, const bs_mol *mol,
                            const bs_match_opts *opts)
{
    if (opts->anchored &&
        (opts->anchor_atom < 0 || opts->anchor_atom >= pattern->query->atom_count))
        return bs_fail(cx, BS_ERANGE, "the pattern has no atom %d", opts->anchor_atom);
    if (opts->anchored && opts->anchor >= mol->atom_count)
        return bs_fail(cx, BS_ERANGE, "the molecule has no atom %u", (unsigned)opts->anchor);
    return BS_OK;
}

/* An order that starts at the anchored atom. */
static bs_status anchored_order(bs_ctx *cx, const bs_pattern *pattern, int atom, bs_order *made,
                                const bs_order **order)
{
    const bs_part *part = &pattern->parts[0];

    *order = &part->order;
    if (part->order.moves[0].atom == atom)
        return BS_OK;
    *order = made;
    return bs_order__find(cx, &cx->scratch, part, atom, made);
}

static bs_status run(bs_search *s, const bs_match_opts *opts, found *all)
{
    const bs_order *order = NULL;
    bs_order made;
    bs_frame f;
    bs_status st = BS_OK;

    if (opts->anchored)
        st = anchored_order(s->cx, s->pattern, opts->anchor_atom, &made, &order);
    if (st != BS_OK)
        return st;
    bs_search__frame(s, order, opts->anchored ? opts->anchor : BS_FREE, &f);
    while (st == BS_OK && (opts->limit <= 0 || all->count < opts->limit) && bs_search__next(s, &f))
        st = keep(all, &f);
    return st != BS_OK ? st : s->status;
}

bs_status bs_pattern_find(bs_ctx *cx, bs_arena *home, const bs_pattern *pattern, const bs_mol *mol,
                          const bs_match_opts *opts, bs_matches *out)
{
    static const bs_match_opts defaults = {0};
    bs_mark temp = bs_arena_mark(&cx->scratch);
    found all = {.cx = cx, .width = pattern->query->atom_count};
    bs_search s;
    bs_status st;

    opts = opts ? opts : &defaults;
    *out = (bs_matches){.width = all.width};
    if ((st = check_opts(cx, pattern, mol, opts)) != BS_OK)
        return st;
    if (!bs_search__may_match(pattern, mol))
        return BS_OK;
    all.unique = !opts->every_embedding && all.width > 1;
    bs_map_init(&all.sets, cx);
    st = bs_search__begin(&s, cx, pattern, mol, opts->steps);
    if (st == BS_OK)
        st = run(&s, opts, &all);
    bs_spend(cx, bs_search__work(&s));
    bs_arena_rewind(&cx->scratch, temp);
    if (st == BS_OK && all.count > 0)
        st = bs_new_array(cx, home, (size_t)all.count, (size_t)all.width * sizeof *all.atoms,
                          &out->atoms);
    if (st == BS_OK && all.count > 0) {
        memcpy(out->atoms, all.atoms, found_bytes(&all, all.count));
        out->count = all.count;
    }
    bs_gate_free(cx->gate, all.atoms, found_bytes(&all, all.room));
    bs_map_free(&all.sets);
    return st;
}

bs_status bs_pattern_has(bs_ctx *cx, const bs_pattern *pattern, const bs_mol *mol, bool *yes)
{
    bs_mark temp;
    bs_search s;
    bs_frame f;
    bs_status st;

    *yes = false;
    if (!bs_search__may_match(pattern, mol))
        return BS_OK;
    temp = bs_arena_mark(&cx->scratch);
    st = bs_search__begin(&s, cx, pattern, mol, 0);
    if (st == BS_OK) {
        bs_search__frame(&s, NULL, BS_FREE, &f);
        *yes = bs_search__next(&s, &f);
        st = s.status;
    }
    bs_spend(cx, bs_search__work(&s));
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_pattern__atom_passes(bs_ctx *cx, const bs_pattern *pattern, int atom,
                                  const bs_mol *mol, uint32_t where, bool *passes)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_search s;
    bs_status st = bs_search__begin(&s, cx, pattern, mol, 0);

    if (st == BS_OK) {
        *passes = bs_search__passes(&s, pattern->parts[0].entries[atom], where, NULL, NULL);
        st = s.status;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bool bs_pattern__bond_passes(const bs_pattern *pattern, int bond, const bs_mol *mol, uint32_t where)
{
    const bs_bond *b = &bs_mol__bonds(mol)[where];
    int sort = (int)(b->order & 7) | (int)(b->flags & (BS_BOND_AROMATIC | BS_BOND_RING)) << 3;

    return pattern->parts[0].sorts[bond] >> sort & 1;
}
