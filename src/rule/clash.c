/* Clashes: what else in a molecule the conditions of a step attack. */
#include <string.h>

#include "backsaw/group.h"
#include "rule/book.h"

/* A word of the transform, `spares` or `also_attacks`, as a group. */
typedef struct remark {
    int group;
    bs_fate fate;
} remark;

/* One molecule under examination. */
typedef struct judge {
    bs_ctx *cx;
    bs_arena *home;
    const bs_rules *rules;
    int precursor;
    int conditions; /* or -1 */
    const remark *remarks;
    int remark_count;
    const bs_mol *mol;
    const bool *reacting; /* or NULL */
    bs_arena own;         /* of the hits of one molecule */
    const bs_group_hits *hits;
    bool *involved;  /* for each hit: it belongs to the wanted change */
    bs_clash *items; /* all that do not survive, in scratch */
    int count, room;
} judge;

/* ---- Collecting ------------------------------------------------------------------------------ */

static bs_status add(judge *j, bs_clash clash)
{
    bs_clash *items;
    int room = j->room ? j->room * 2 : 16;
    bs_status st;

    if (j->count == j->room) {
        if ((st = bs_new(j->cx, &j->cx->scratch, room, &items)) != BS_OK)
            return st;
        if (j->count > 0)
            memcpy(items, j->items, (size_t)j->count * sizeof *items);
        j->items = items;
        j->room = room;
    }
    clash.precursor = j->precursor;
    j->items[j->count++] = clash;
    return BS_OK;
}

static const char *title_of(const bs_rules *rules, int group)
{
    return bs_rules_group(rules, group)->name;
}

static bool takes_part(const judge *j, const bs_group_hit *hit)
{
    for (int i = 0; i < hit->count && j->reacting; i++) {
        if (j->reacting[hit->atoms[i]])
            return true;
    }
    return false;
}

/* ---- Single groups ------------------------------------------------------------------------- */

/* What the transform itself says of a group: its nearest word, the worse of two as near. */
static const remark *nearest_remark(const judge *j, int group)
{
    const bs_group *own = bs_shelves__group(j->rules, group);
    const remark *best = NULL;
    int least = 0;

    for (int i = 0; i < j->remark_count; i++) {
        int distance = bs_group__distance(own, group, j->remarks[i].group);

        if (distance >= 0 &&
            (!best || distance < least || (distance == least && j->remarks[i].fate > best->fate))) {
            best = &j->remarks[i];
            least = distance;
        }
    }
    return best;
}

static bs_status judge_hit(judge *j, const bs_group_hit *hit)
{
    const remark *said = nearest_remark(j, hit->group);
    bs_clash clash = {.group = title_of(j->rules, hit->group),
                      .atoms = hit->atoms,
                      .count = hit->count,
                      .group_index = hit->group};
    bs_status st = BS_OK;

    if (j->conditions >= 0)
        st = bs_rules_fate(j->cx, j->rules, hit->group, j->conditions, &clash.fate, &clash.why);
    if (st != BS_OK)
        return st;
    if (said && said->fate != clash.fate) {
        clash.fate = said->fate;
        clash.why = "attacked by the reagents of this recipe";
    }
    return clash.fate == BS_SURVIVES ? BS_OK : add(j, clash);
}

static bool share_atoms(const bs_group_hit *a, const bs_group_hit *b)
{
    for (int i = 0; i < a->count; i++) {
        for (int k = 0; k < b->count; k++) {
            if (a->atoms[i] == b->atoms[k])
                return true;
        }
    }
    return false;
}

/* Whether two groups are the same, or have a wider group in common. */
static bool are_related(const judge *j, int a, int b)
{
    const bs_group *one = bs_shelves__group(j->rules, a);
    const bs_group *other = bs_shelves__group(j->rules, b);

    if (bs_group__distance(one, a, b) >= 0 || bs_group__distance(other, b, a) >= 0)
        return true;
    for (int i = 0; i < one->wider_count; i++) {
        if (bs_group__distance(other, b, one->wider[i]) >= 0)
            return true;
    }
    return false;
}

/* Whether a group is neither narrower nor wider than any other: a feature such as an enolisable
   ketone, which stands beside the group itself. */
static bool is_feature(const judge *j, int group)
{
    if (bs_shelves__group(j->rules, group)->parent_count > 0)
        return false;
    for (int i = group + 1; i < bs_rules_group_count(j->rules); i++) {
        if (bs_group__distance(bs_shelves__group(j->rules, i), i, group) == 1)
            return false;
    }
    return true;
}

/* Whether a hit is part of a larger group: of its kind, or a feature of several atoms within. */
static bool is_part(const judge *j, const bs_group_hit *hit, const bs_group_hit *larger)
{
    int shared = 0;

    for (int i = 0; i < hit->count; i++) {
        for (int k = 0; k < larger->count; k++)
            shared += hit->atoms[i] == larger->atoms[k];
    }
    if (shared > 0 && are_related(j, hit->group, larger->group))
        return true;
    return shared > 1 && shared == hit->count && is_feature(j, hit->group);
}

/*
 * Finds out which hits belong to the wanted change. In a step so do the parts of a larger group
 * that reacts: the esters of a malonate, whose CH is alkylated.
 */
static bs_status find_involved(judge *j, bool of_step)
{
    const bs_group_hits *hits = j->hits;
    bool *direct;
    bs_status st;

    if ((st = bs_new(j->cx, &j->own, hits->count + 1, &direct)) != BS_OK ||
        (st = bs_new(j->cx, &j->own, hits->count + 1, &j->involved)) != BS_OK)
        return st;
    for (int i = 0; i < hits->count; i++)
        j->involved[i] = direct[i] = takes_part(j, &hits->items[i]);
    for (int i = 0; i < hits->count && of_step; i++) {
        for (int k = 0; k < hits->count && !j->involved[i]; k++)
            j->involved[i] = direct[k] && is_part(j, &hits->items[i], &hits->items[k]);
    }
    return BS_OK;
}

/* ---- Pairs of groups ------------------------------------------------------------------------- */

static bool is_one_of(const judge *j, int group, const int *list, int count)
{
    for (int i = 0; i < count; i++) {
        if (bs_group__distance(bs_shelves__group(j->rules, group), group, list[i]) >= 0)
            return true;
    }
    return false;
}

static bool pair_applies(const bs_pair *pair, int conditions)
{
    for (int i = 0; i < pair->def.conditions.count; i++) {
        if (pair->conditions[i] == conditions)
            return true;
    }
    return pair->def.conditions.count == 0;
}

static bs_status add_pair(judge *j, const bs_pair *pair, const bs_group_hit *a,
                          const bs_group_hit *b)
{
    bs_clash clash = {.group = title_of(j->rules, a->group),
                      .other = title_of(j->rules, b->group),
                      .fate = pair->def.fate,
                      .why = pair->def.why,
                      .group_index = a->group};
    int x = 0, y = 0;
    bs_status st = bs_new(j->cx, &j->cx->scratch, a->count + b->count, &clash.atoms);

    while (st == BS_OK && (x < a->count || y < b->count)) {
        bool first = y == b->count || (x < a->count && a->atoms[x] < b->atoms[y]);

        clash.atoms[clash.count++] = first ? a->atoms[x++] : b->atoms[y++];
    }
    return st == BS_OK ? add(j, clash) : st;
}

/* The first partner of each hit of the pair's one side; not where both are the wanted change. */
static bs_status judge_pair(judge *j, const bs_pair *pair)
{
    const bs_incompatible_def *def = &pair->def;
    bs_status st = BS_OK;

    for (int i = 0; i < j->hits->count && st == BS_OK; i++) {
        const bs_group_hit *a = &j->hits->items[i];

        if (!is_one_of(j, a->group, pair->one, def->one.count))
            continue;
        for (int k = 0; k < j->hits->count; k++) {
            const bs_group_hit *b = &j->hits->items[k];

            if (k == i || !is_one_of(j, b->group, pair->other, def->other.count) ||
                share_atoms(a, b) || (j->involved[i] && j->involved[k]))
                continue;
            st = add_pair(j, pair, a, b);
            break;
        }
    }
    return st;
}

/* ---- The list -------------------------------------------------------------------------------- */

static bool same_atoms(const bs_clash *a, const bs_clash *b)
{
    return a->count == b->count &&
           memcmp(a->atoms, b->atoms, (size_t)a->count * sizeof *a->atoms) == 0;
}

/* Whether an item says no more than others: the same atoms, or a caution on attacked ones. */
static bool is_idle(const judge *j, int index)
{
    const bs_clash *own = &j->items[index];

    for (int i = 0; i < j->count; i++) {
        const bs_clash *other = &j->items[i];

        if (i != index && same_atoms(own, other) &&
            (other->fate > own->fate || (other->fate == own->fate && i < index)))
            return true;
    }
    for (int k = 0; k < own->count; k++) {
        bool attacked = false;

        for (int i = 0; i < j->count && !attacked && own->fate == BS_SLOW; i++) {
            for (int n = 0; n < j->items[i].count && j->items[i].fate == BS_ATTACKED; n++)
                attacked |= j->items[i].atoms[n] == own->atoms[k];
        }
        if (!attacked)
            return false;
    }
    return own->count > 0;
}

/* Appends the items of one fate to the list. */
static bs_status keep(const judge *j, bs_fate fate, bs_clashes *out)
{
    bs_clash *items;
    bs_status st = bs_new(j->cx, j->home, out->count + j->count + 1, &items);

    if (st != BS_OK)
        return st;
    if (out->count > 0)
        memcpy(items, out->items, (size_t)out->count * sizeof *items);
    out->items = items;
    for (int i = 0; i < j->count && st == BS_OK; i++) {
        bs_clash *kept = &items[out->count];

        if (j->items[i].fate != fate || is_idle(j, i))
            continue;
        *kept = j->items[i];
        if ((st = bs_new(j->cx, j->home, kept->count + 1, &kept->atoms)) != BS_OK)
            break;
        memcpy(kept->atoms, j->items[i].atoms, (size_t)kept->count * sizeof *kept->atoms);
        out->count++;
    }
    return st;
}

/* Finds the groups of the molecule and judges them; the items lie in scratch. */
static bs_status examine(judge *j, bool of_step)
{
    bs_group_hits *hits;
    bs_status st;

    j->count = j->room = 0;
    if ((st = bs_new(j->cx, &j->own, 1, &hits)) != BS_OK ||
        (st = bs_groups_find(j->cx, &j->own, j->rules, j->mol, hits)) != BS_OK)
        return st;
    j->hits = hits;
    st = find_involved(j, of_step);
    for (int i = 0; i < hits->count && st == BS_OK; i++) {
        if (!j->involved[i])
            st = judge_hit(j, &hits->items[i]);
    }
    for (int i = 0; of_step && i < bs_shelves__count(j->rules, BS_PAIRS) && st == BS_OK; i++) {
        const bs_pair *pair = bs_shelves__pair(j->rules, i);

        if (pair_applies(pair, j->conditions))
            st = judge_pair(j, pair);
    }
    return st;
}

bs_status bs_clashes_find(bs_ctx *cx, bs_arena *home, const bs_rules *rules, const bs_mol *mol,
                          int conditions, const bool *reacting, bs_clashes *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    judge j = {.cx = cx,
               .home = home,
               .rules = rules,
               .conditions = conditions,
               .mol = mol,
               .reacting = reacting};
    bs_status st;

    *out = (bs_clashes){0};
    bs_arena_init(&j.own, cx->gate);
    if ((st = examine(&j, false)) == BS_OK && (st = keep(&j, BS_ATTACKED, out)) == BS_OK)
        st = keep(&j, BS_SLOW, out);
    bs_arena_free(&j.own);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Steps ----------------------------------------------------------------------------------- */

/* Words that name no group say nothing here; `backsaw check` complains of them. */
static bs_status read_remarks(bs_ctx *cx, const bs_rules *rules, const bs_transform_def *def,
                              remark **out, int *count)
{
    bs_status st = bs_new(cx, &cx->scratch, def->spares.count + def->also_attacks.count + 1, out);

    *count = 0;
    for (int i = 0; i < def->spares.count + def->also_attacks.count && st == BS_OK; i++) {
        bool spared = i < def->spares.count;
        const char *word =
            spared ? def->spares.items[i] : def->also_attacks.items[i - def->spares.count];
        int group = bs_rules_find_group(rules, word);

        if (group >= 0)
            (*out)[(*count)++] = (remark){group, spared ? BS_SURVIVES : BS_ATTACKED};
    }
    return st;
}

/* Appends what is found in one precursor to both lists. */
static bs_status examine_precursor(judge *j, bs_clashes *clashes, bs_clashes *cautions)
{
    bs_mark mark = bs_arena_mark(&j->own);
    bs_status st = examine(j, true);

    if (st == BS_OK && j->count > 0 && (st = keep(j, BS_ATTACKED, clashes)) == BS_OK)
        st = keep(j, BS_SLOW, cautions);
    bs_arena_rewind(&j->own, mark);
    return st;
}

static bs_status join_lists(judge *j, const bs_clashes *clashes, const bs_clashes *cautions,
                            bs_clashes *out)
{
    bs_status st = bs_new(j->cx, j->home, clashes->count + cautions->count + 1, &out->items);

    if (st != BS_OK)
        return st;
    if (clashes->count > 0)
        memcpy(out->items, clashes->items, (size_t)clashes->count * sizeof *out->items);
    if (cautions->count > 0)
        memcpy(out->items + clashes->count, cautions->items,
               (size_t)cautions->count * sizeof *out->items);
    out->count = clashes->count + cautions->count;
    return BS_OK;
}

bs_status bs_step_clashes(bs_ctx *cx, bs_arena *home, const bs_rules *rules, const bs_step *step,
                          bs_clashes *out)
{
    const bs_transform_def *def = bs_rules_transform(rules, step->transform);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    judge j = {.cx = cx, .home = home, .rules = rules, .conditions = -1};
    bs_clashes clashes = {0}, cautions = {0};
    remark *remarks;
    bs_status st;

    *out = (bs_clashes){0};
    if (bs_rules_group_count(rules) == 0)
        return BS_OK;
    bs_arena_init(&j.own, cx->gate);
    if (def->conditions)
        j.conditions = bs_rules_find_conditions(rules, def->conditions);
    if ((st = read_remarks(cx, rules, def, &remarks, &j.remark_count)) != BS_OK)
        goto done;
    j.remarks = remarks;
    for (int i = 0; i < step->precursor_count && st == BS_OK; i++) {
        j.precursor = i;
        j.mol = step->precursors[i];
        j.reacting = step->reacting ? step->reacting[i] : NULL;
        st = examine_precursor(&j, &clashes, &cautions);
    }
    if (st == BS_OK)
        st = join_lists(&j, &clashes, &cautions, out);
done:
    bs_arena_free(&j.own);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
