/* Shared preferences: functions by name, and the roles that atoms of a rule have in them. */
#include <string.h>

#include "rule/book.h"

/* The newest of a name; what a script defines anew hides the older one. */
static const bs_preference *find(const bs_rules *rules, const char *name)
{
    for (int i = rules->preference_count - 1; i >= 0; i--) {
        if (bs_book__same_name(name, rules->preferences[i]->key))
            return rules->preferences[i];
    }
    return NULL;
}

static bs_status make(bs_ctx *cx, bs_rules *rules, const bs_preference_def *def,
                      bs_preference **out)
{
    const bs_preference *old;
    bs_status st;

    if (!def->name || !*def->name)
        return bs_fail(cx, BS_EVALUE, "a preference needs a name");
    old = find(rules, def->name);
    /* The upper half of a hook is the pack; 0 is the user's own code. */
    if (old && (old->def.hook >> 16 != 0 || def->hook >> 16 != 0))
        return bs_fail(cx, BS_EVALUE, "the preference \"%s\" is there already", def->name);
    if ((st = bs_new(cx, &rules->arena, 1, out)) != BS_OK)
        return st;
    (*out)->def = *def;
    if ((st = bs_book__fold_name(cx, &rules->arena, def->name, &(*out)->key)) != BS_OK ||
        (st = bs_rules__copy_string(cx, &rules->arena, &(*out)->def.name)) != BS_OK ||
        (st = bs_rules__copy_string(cx, &rules->arena, &(*out)->def.origin)) != BS_OK)
        return st;
    return bs_rules__copy_words(cx, &rules->arena, &(*out)->def.roles);
}

bs_status bs_rules_add_preference(bs_ctx *cx, bs_rules *rules, const bs_preference_def *def)
{
    bs_preference *preference;
    bs_mark kept;
    bs_status st = bs_book__make_room(cx, rules, &rules->preferences, rules->preference_count,
                                      &rules->preference_room);

    if (st != BS_OK)
        return st;
    kept = bs_arena_mark(&rules->arena);
    if ((st = make(cx, rules, def, &preference)) == BS_OK)
        rules->preferences[rules->preference_count++] = preference;
    else
        bs_arena_rewind(&rules->arena, kept);
    return st;
}

static bool has_word(const bs_words *words, const char *word)
{
    for (int i = 0; i < words->count; i++) {
        if (strcmp(words->items[i], word) == 0)
            return true;
    }
    return false;
}

static bool has_map(const bs_transform *tr, int map)
{
    for (int i = 0; i < tr->map_count; i++) {
        if (tr->maps[i] == map)
            return true;
    }
    return false;
}

static bs_status check_roles(bs_ctx *cx, const bs_transform *tr, const bs_preference *preference)
{
    const bs_transform_def *def = &tr->def;

    for (int i = 0; i < def->prefer_roles.count; i++) {
        if (!has_word(&preference->def.roles, def->prefer_roles.items[i]))
            return bs_fail(cx, BS_EVALUE, "prefer: \"%s\" knows no '%.60s'", preference->def.name,
                           def->prefer_roles.items[i]);
        if (!has_map(tr, def->prefer_maps[i]))
            return bs_fail(cx, BS_EVALUE, "prefer: map number %d is not in the target",
                           def->prefer_maps[i]);
    }
    for (int i = 0; i < preference->def.roles.count; i++) {
        if (!has_word(&def->prefer_roles, preference->def.roles.items[i]))
            return bs_fail(cx, BS_EVALUE, "prefer: \"%s\" needs a map number for '%.60s'",
                           preference->def.name, preference->def.roles.items[i]);
    }
    return BS_OK;
}

bs_status bs_preference__resolve(bs_ctx *cx, bs_rules *rules, bs_transform *tr)
{
    bs_transform_def *def = &tr->def;
    const bs_preference *preference;
    int *maps;
    bs_status st;

    if (!def->prefer) {
        def->prefer_roles = (bs_words){0};
        return BS_OK;
    }
    preference = find(rules, def->prefer);
    if (!preference)
        return bs_fail(cx, BS_ENOTFOUND, "prefer: there is no preference \"%.60s\"", def->prefer);
    if ((st = check_roles(cx, tr, preference)) != BS_OK ||
        (st = bs_rules__copy_words(cx, &rules->arena, &def->prefer_roles)) != BS_OK ||
        (st = bs_new(cx, &rules->arena, def->prefer_roles.count + 1, &maps)) != BS_OK)
        return st;
    for (int i = 0; i < def->prefer_roles.count; i++)
        maps[i] = def->prefer_maps[i];
    def->prefer_maps = maps;
    def->hook_prefer = preference->def.hook;
    return BS_OK;
}
