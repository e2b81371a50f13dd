/* Classes of conditions and the fates that they bring. */
#include <string.h>

#include "backsaw/group.h"
#include "rule/book.h"

const char *bs_fate_word(bs_fate fate)
{
    static const char *const words[] = {"survives", "slow", "attacked"};

    return words[fate];
}

/* ---- Verdicts ----------------------------------------------------------------------------------
 */

static bs_status make_room(bs_ctx *cx, bs_rules *rules)
{
    bs_shelves *shelves = &rules->shelves;
    int room = shelves->ruling_room ? shelves->ruling_room * 2 : 512;
    bs_ruling *rulings;
    bs_status st;

    if (shelves->ruling_count < shelves->ruling_room)
        return BS_OK;
    if ((st = bs_new(cx, &rules->arena, room, &rulings)) != BS_OK)
        return st;
    if (shelves->ruling_count > 0)
        memcpy(rulings, shelves->rulings, (size_t)shelves->ruling_count * sizeof *rulings);
    shelves->rulings = rulings;
    shelves->ruling_room = room;
    return BS_OK;
}

bs_status bs_shelves__rule(bs_ctx *cx, bs_rules *rules, const int *groups, int count,
                           int conditions, bs_fate fate, const char *why)
{
    bs_shelves *shelves = &rules->shelves;
    bs_status st = bs_rules__copy_string(cx, &rules->arena, &why);

    for (int i = 0; i < count && st == BS_OK; i++) {
        bs_group *group = rules->shelves.rows[BS_GROUPS].items[groups[i]];

        if ((st = make_room(cx, rules)) != BS_OK)
            return st;
        shelves->rulings[shelves->ruling_count] =
            (bs_ruling){groups[i], conditions, fate, why, group->rulings};
        group->rulings = shelves->ruling_count++;
    }
    return st;
}

void bs_shelves__clear(bs_rules *rules, int conditions)
{
    for (int i = 0; i < rules->shelves.ruling_count; i++) {
        if (rules->shelves.rulings[i].conditions == conditions)
            rules->shelves.rulings[i].conditions = -1;
    }
}

/* The newest verdict on the group itself, or NULL. */
static const bs_ruling *own_ruling(const bs_rules *rules, int group, int conditions)
{
    const bs_shelves *shelves = &rules->shelves;

    for (int i = bs_shelves__group(rules, group)->rulings; i >= 0; i = shelves->rulings[i].next) {
        if (shelves->rulings[i].conditions == conditions)
            return &shelves->rulings[i];
    }
    return NULL;
}

/* The worst verdict of the parents, of which all are among `wider` before `upto`. */
static const bs_ruling *worst_parent(const bs_group *group, const int *wider, int upto,
                                     const bs_ruling *const *found)
{
    const bs_ruling *worst = NULL;

    for (int p = 0; p < group->parent_count; p++) {
        for (int k = 0; k < upto; k++) {
            if (wider[k] == group->parents[p] && found[k] &&
                (!worst || found[k]->fate > worst->fate))
                worst = found[k];
        }
    }
    return worst;
}

bs_status bs_rules_fate(bs_ctx *cx, const bs_rules *rules, int group, int conditions, bs_fate *fate,
                        const char **why)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    const bs_group *own = bs_shelves__group(rules, group);
    const bs_ruling *ruling = own_ruling(rules, group, conditions);
    const bs_ruling **found;
    bs_status st = BS_OK;

    if (!ruling && own->wider_count > 0) {
        if ((st = bs_new(cx, &cx->scratch, own->wider_count, &found)) != BS_OK)
            return st;
        /* Parents have smaller numbers, so each one is known before it is asked for. */
        for (int i = 0; i < own->wider_count; i++) {
            found[i] = own_ruling(rules, own->wider[i], conditions);
            if (!found[i])
                found[i] =
                    worst_parent(bs_shelves__group(rules, own->wider[i]), own->wider, i, found);
        }
        ruling = worst_parent(own, own->wider, own->wider_count, found);
        bs_arena_rewind(&cx->scratch, temp);
    }
    *fate = ruling ? ruling->fate : BS_SURVIVES;
    if (why)
        *why = ruling ? ruling->why : NULL;
    return st;
}

/* ---- Definitions -------------------------------------------------------------------------------
 */

static bs_status copy_conditions(bs_ctx *cx, bs_arena *home, bs_conditions_def *def)
{
    const char **strings[] = {&def->name,   &def->title, &def->reagents, &def->used_for,
                              &def->source, &def->pack,  &def->origin};
    bs_status st = BS_OK;

    for (size_t i = 0; i < sizeof strings / sizeof *strings && st == BS_OK; i++)
        st = bs_rules__copy_string(cx, home, strings[i]);
    def->fates = NULL; /* they become rulings */
    def->fate_count = 0;
    return st == BS_OK ? bs_rules__copy_words(cx, home, &def->also) : st;
}

/* Resolves the groups of all verdicts before the first of them is kept. */
static bs_status resolve_all(bs_ctx *cx, const bs_rules *rules, const bs_fate_def *fates, int count,
                             int ***out)
{
    bs_status st = bs_new(cx, &cx->scratch, count + 1, out);

    for (int i = 0; i < count && st == BS_OK; i++)
        st = bs_shelves__resolve(cx, &cx->scratch, rules, BS_GROUPS, &fates[i].groups,
                                 bs_fate_word(fates[i].fate), &(*out)[i]);
    return st;
}

static bs_status keep_fates(bs_ctx *cx, bs_rules *rules, const bs_fate_def *fates, int count,
                            int *const *groups, int conditions)
{
    bs_status st = BS_OK;

    for (int i = 0; i < count && st == BS_OK; i++)
        st = bs_shelves__rule(cx, rules, groups[i], fates[i].groups.count, conditions,
                              fates[i].fate, fates[i].why);
    return st;
}

bs_status bs_rules_add_conditions(bs_ctx *cx, bs_rules *rules, const bs_conditions_def *def)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_conditions *conditions;
    int **groups;
    int index;
    bs_status st = bs_shelves__place(cx, rules, BS_CONDITIONS, def->name, def->title, &def->also,
                                     def->pack, &index);

    if (st != BS_OK ||
        (st = resolve_all(cx, rules, def->fates, def->fate_count, &groups)) != BS_OK ||
        (st = bs_new(cx, &rules->arena, 1, &conditions)) != BS_OK)
        goto done;
    conditions->def = *def;
    if ((st = copy_conditions(cx, &rules->arena, &conditions->def)) != BS_OK)
        goto done;
    if (index < bs_rules_conditions_count(rules))
        bs_shelves__clear(rules, index);
    if ((st = bs_shelves__put(cx, rules, BS_CONDITIONS, index, conditions)) == BS_OK)
        st = keep_fates(cx, rules, def->fates, def->fate_count, groups, index);
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_rules_add_fate(bs_ctx *cx, bs_rules *rules, const char *conditions,
                            const bs_fate_def *def)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int index = bs_rules_find_conditions(rules, conditions);
    int *groups;
    bs_status st;

    if (index < 0)
        return bs_fail(cx, BS_ENOTFOUND, "conditions: there is no class of conditions \"%.100s\"",
                       conditions);
    st = bs_shelves__resolve(cx, &cx->scratch, rules, BS_GROUPS, &def->groups, "group", &groups);
    if (st == BS_OK)
        st = bs_shelves__rule(cx, rules, groups, def->groups.count, index, def->fate, def->why);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
