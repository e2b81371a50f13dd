/* Functional groups: definitions, and where they are in a molecule. */
#include "backsaw/group.h"

#include <stdlib.h>
#include <string.h>

#include "backsaw/format.h"
#include "rule/book.h"

enum { HIT_LIMIT = 2000, HIT_STEPS = 1000000 };

/* ---- Wider groups --------------------------------------------------------------------------- */

int bs_group__distance(const bs_group *group, int own, int wider)
{
    if (own == wider)
        return 0;
    for (int i = 0; i < group->wider_count; i++) {
        if (group->wider[i] == wider)
            return group->steps[i];
    }
    return -1;
}

/* Adds a wider group, or brings it nearer, in ascending order. */
static void add_wider(bs_group *group, int wider, int steps)
{
    int at = group->wider_count;

    for (int i = 0; i < group->wider_count; i++) {
        if (group->wider[i] != wider)
            continue;
        if (steps < group->steps[i])
            group->steps[i] = steps;
        return;
    }
    for (; at > 0 && group->wider[at - 1] > wider; at--) {
        group->wider[at] = group->wider[at - 1];
        group->steps[at] = group->steps[at - 1];
    }
    group->wider[at] = wider;
    group->steps[at] = steps;
    group->wider_count++;
}

bs_status bs_group__climb(bs_ctx *cx, bs_rules *rules, bs_group *group)
{
    int room = 1;
    bs_status st;

    for (int i = 0; i < group->parent_count; i++)
        room += 1 + bs_shelves__group(rules, group->parents[i])->wider_count;
    group->wider_count = 0;
    if ((st = bs_new(cx, &rules->arena, room, &group->wider)) != BS_OK ||
        (st = bs_new(cx, &rules->arena, room, &group->steps)) != BS_OK)
        return st;
    for (int i = 0; i < group->parent_count; i++) {
        const bs_group *parent = bs_shelves__group(rules, group->parents[i]);

        add_wider(group, group->parents[i], 1);
        for (int k = 0; k < parent->wider_count; k++)
            add_wider(group, parent->wider[k], parent->steps[k] + 1);
    }
    return BS_OK;
}

/* ---- Definitions ---------------------------------------------------------------------------- */

static bs_status copy_group(bs_ctx *cx, bs_arena *home, bs_group_def *def)
{
    const char **strings[] = {&def->name,   &def->title, &def->smarts,
                              &def->source, &def->pack,  &def->origin};
    bs_group_test *tests;
    bs_status st = bs_new(cx, home, def->test_count + 1, &tests);

    for (size_t i = 0; i < sizeof strings / sizeof *strings && st == BS_OK; i++)
        st = bs_rules__copy_string(cx, home, strings[i]);
    if (st == BS_OK && (st = bs_rules__copy_words(cx, home, &def->parents)) == BS_OK)
        st = bs_rules__copy_words(cx, home, &def->also);
    for (int i = 0; i < def->test_count && st == BS_OK; i++) {
        tests[i] = def->tests[i];
        st = bs_rules__copy_string(cx, home, &tests[i].smiles);
    }
    def->tests = tests;
    return st;
}

/* Finds the parents, which must stand before the group, so that no circle can come about. */
static bs_status find_parents(bs_ctx *cx, bs_rules *rules, bs_group *group, int index)
{
    bs_status st = bs_shelves__resolve(cx, &rules->arena, rules, BS_GROUPS, &group->def.parents,
                                       "parents", &group->parents);

    group->parent_count = st == BS_OK ? group->def.parents.count : 0;
    for (int i = 0; i < group->parent_count; i++) {
        if (group->parents[i] >= index)
            return bs_fail(cx, BS_EVALUE, "parents: \"%s\" was defined after this group",
                           group->def.parents.items[i]);
    }
    return st;
}

static bs_status make_group(bs_ctx *cx, bs_rules *rules, const bs_group_def *def, int *index,
                            bs_group **out)
{
    bs_group *group;
    bs_status st = bs_shelves__place(cx, rules, BS_GROUPS, def->name, def->title, &def->also,
                                     def->pack, index);

    if (st != BS_OK)
        return st;
    if (!def->smarts)
        return bs_fail(cx, BS_EVALUE, "smarts: a pattern is expected");
    if ((st = bs_new(cx, &rules->arena, 1, out)) != BS_OK)
        return st;
    group = *out;
    *group = (bs_group){.def = *def, .rulings = -1};
    if ((st = copy_group(cx, &rules->arena, &group->def)) != BS_OK ||
        (st = find_parents(cx, rules, group, *index)) != BS_OK)
        return st;
    st = bs_pattern_read(cx, &rules->arena, group->def.smarts, strlen(group->def.smarts),
                         &group->pattern);
    if (st != BS_OK)
        return bs_blame(cx, st, "smarts");
    return bs_group__climb(cx, rules, group);
}

bs_status bs_rules_add_group(bs_ctx *cx, bs_rules *rules, const bs_group_def *def)
{
    bs_mark kept = bs_arena_mark(&rules->arena);
    bs_group *group;
    int index;
    bool replaces;
    bs_status st = make_group(cx, rules, def, &index, &group);

    if (st != BS_OK) {
        bs_arena_rewind(&rules->arena, kept);
        return st;
    }
    replaces = index < bs_rules_group_count(rules);
    if (replaces)
        group->rulings = bs_shelves__group(rules, index)->rulings;
    if ((st = bs_shelves__put(cx, rules, BS_GROUPS, index, group)) != BS_OK || !replaces)
        return st;
    for (int i = index + 1; i < bs_rules_group_count(rules) && st == BS_OK; i++)
        st = bs_group__climb(cx, rules, rules->shelves.rows[BS_GROUPS].items[i]);
    return st;
}

/* ---- Hits ------------------------------------------------------------------------------------ */

static int compare_atoms(const void *a, const void *b)
{
    uint32_t x, y;

    memcpy(&x, a, sizeof x);
    memcpy(&y, b, sizeof y);
    return (x > y) - (x < y);
}

bs_status bs_group_hits_of(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int group,
                           const bs_mol *mol, bs_group_hits *out)
{
    bs_match_opts opts = {.limit = HIT_LIMIT, .steps = HIT_STEPS};
    bs_matches found;
    bs_status st;

    *out = (bs_group_hits){0};
    st = bs_pattern_find(cx, home, bs_shelves__group(rules, group)->pattern, mol, &opts, &found);
    if (st != BS_OK || found.count == 0)
        return st;
    if ((st = bs_new(cx, home, found.count, &out->items)) != BS_OK)
        return st;
    for (int i = 0; i < found.count; i++) {
        uint32_t *atoms = found.atoms + (size_t)i * (size_t)found.width;

        if (found.width > 1)
            qsort(atoms, (size_t)found.width, sizeof *atoms, compare_atoms);
        out->items[out->count++] = (bs_group_hit){group, atoms, found.width};
    }
    return BS_OK;
}

/* Hits while they are collected: those of group g are first[g] to first[g + 1] - 1. */
typedef struct finder {
    bs_ctx *cx;
    const bs_rules *rules;
    const bs_mol *mol;
    bs_group_hit *items;
    int count, room;
    int *first;
} finder;

static bs_status take(finder *f, const bs_group_hits *hits)
{
    bs_group_hit *items;
    int room = f->room ? f->room * 2 : 64;
    bs_status st;

    while (room < f->count + hits->count)
        room *= 2;
    if (f->count + hits->count > f->room) {
        if ((st = bs_new(f->cx, &f->cx->scratch, room, &items)) != BS_OK)
            return st;
        if (f->count > 0)
            memcpy(items, f->items, (size_t)f->count * sizeof *items);
        f->items = items;
        f->room = room;
    }
    if (hits->count > 0)
        memcpy(f->items + f->count, hits->items, (size_t)hits->count * sizeof *f->items);
    f->count += hits->count;
    return BS_OK;
}

static bool has_parents(const finder *f, const bs_group *group)
{
    for (int i = 0; i < group->parent_count; i++) {
        if (f->first[group->parents[i]] == f->first[group->parents[i] + 1])
            return false;
    }
    return true;
}

static bs_status find_all(finder *f)
{
    int count = bs_rules_group_count(f->rules);
    bs_status st = bs_new(f->cx, &f->cx->scratch, count + 1, &f->first);

    for (int g = 0; g < count && st == BS_OK; g++) {
        bs_group_hits hits = {0};

        f->first[g] = f->count;
        if (has_parents(f, bs_shelves__group(f->rules, g)) &&
            (st = bs_group_hits_of(f->cx, &f->cx->scratch, f->rules, g, f->mol, &hits)) == BS_OK)
            st = take(f, &hits);
        f->first[g + 1] = f->count;
    }
    return st;
}

/* Whether the atoms of `a`, ascending, are all in `b`. */
static bool is_within(const bs_group_hit *a, const bs_group_hit *b)
{
    int k = 0;

    for (int i = 0; i < a->count; i++) {
        while (k < b->count && b->atoms[k] < a->atoms[i])
            k++;
        if (k == b->count || b->atoms[k] != a->atoms[i])
            return false;
    }
    return true;
}

/* Narrower groups stand behind wider ones. */
static bool is_covered(const finder *f, int hit)
{
    const bs_group_hit *own = &f->items[hit];

    for (int i = f->first[own->group + 1]; i < f->count; i++) {
        const bs_group_hit *other = &f->items[i];

        if (other->count >= own->count &&
            bs_group__distance(bs_shelves__group(f->rules, other->group), other->group,
                               own->group) > 0 &&
            is_within(own, other))
            return true;
    }
    return false;
}

static bs_status keep_uncovered(const finder *f, bs_arena *home, bs_group_hits *out)
{
    bs_status st = bs_new(f->cx, home, f->count + 1, &out->items);

    for (int i = 0; i < f->count && st == BS_OK; i++) {
        bs_group_hit *kept = &out->items[out->count];

        if (is_covered(f, i))
            continue;
        *kept = f->items[i];
        if ((st = bs_new(f->cx, home, kept->count, &kept->atoms)) != BS_OK)
            break;
        memcpy(kept->atoms, f->items[i].atoms, (size_t)kept->count * sizeof *kept->atoms);
        out->count++;
    }
    return st;
}

bs_status bs_groups_find(bs_ctx *cx, bs_arena *home, const bs_rules *rules, const bs_mol *mol,
                         bs_group_hits *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    finder f = {.cx = cx, .rules = rules, .mol = mol};
    bs_status st = find_all(&f);

    *out = (bs_group_hits){0};
    if (st == BS_OK)
        st = keep_uncovered(&f, home, out);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
