/* Names and places of groups, classes of conditions and protecting groups in a rule book. */
#include "rule/shelves.h"

#include <string.h>

#include "rule/book.h"

enum { WORD_MAX = 160, KIND_SHIFT = 28, INDEX_MASK = (1 << KIND_SHIFT) - 1 };

void bs_shelves__init(bs_shelves *shelves, bs_gate *gate)
{
    memset(shelves, 0, sizeof *shelves);
    bs_ctx_init(&shelves->own, gate);
    bs_map_init(&shelves->words, &shelves->own);
}

/* ---- Words -------------------------------------------------------------------------------------
 */

/* A word as words are compared; false if it is too long to be one. */
static bool fold(const char *word, char out[WORD_MAX])
{
    size_t length = 0;

    for (const char *c = word; *c; c++) {
        if (*c == ' ' || *c == '-' || *c == '\t')
            continue;
        if (length + 1 == WORD_MAX)
            return false;
        out[length++] = (char)(*c >= 'A' && *c <= 'Z' ? *c + ('a' - 'A') : *c);
    }
    out[length] = 0;
    return length > 0;
}

static uint64_t hash_word(bs_shelf_kind kind, const char *folded)
{
    return bs_hash_bytes(folded, strlen(folded), (uint64_t)kind + 1);
}

static bool is_word(const char *folded, const char *word)
{
    char other[WORD_MAX];

    return word && fold(word, other) && strcmp(folded, other) == 0;
}

/* The words of an item: its name, its title if that is one, and a list. */
static void words_of(bs_shelf_kind kind, const void *item, const char **name, const char **title,
                     bs_words *also)
{
    *title = NULL;
    *also = (bs_words){0};
    if (kind == BS_GROUPS) {
        const bs_group_def *def = &((const bs_group *)item)->def;

        *name = def->name;
        *title = def->title;
        *also = def->also;
    } else if (kind == BS_CONDITIONS) {
        const bs_conditions_def *def = &((const bs_conditions *)item)->def;

        *name = def->name;
        *title = def->title;
        *also = def->also;
    } else if (kind == BS_PROTECTING) {
        *name = ((const bs_protecting *)item)->def.name;
    } else {
        *name = ((const bs_pair *)item)->def.name;
    }
}

static const char *pack_of(bs_shelf_kind kind, const void *item)
{
    switch (kind) {
    case BS_GROUPS:
        return ((const bs_group *)item)->def.pack;
    case BS_CONDITIONS:
        return ((const bs_conditions *)item)->def.pack;
    case BS_PROTECTING:
        return ((const bs_protecting *)item)->def.pack;
    default:
        return ((const bs_pair *)item)->def.pack;
    }
}

static bool answers_to(bs_shelf_kind kind, const void *item, const char *folded)
{
    const char *name, *title;
    bs_words also;

    words_of(kind, item, &name, &title, &also);
    if (is_word(folded, name) || is_word(folded, title))
        return true;
    for (int i = 0; i < also.count; i++) {
        if (is_word(folded, also.items[i]))
            return true;
    }
    return false;
}

int bs_shelves__find(const bs_shelves *shelves, bs_shelf_kind kind, const char *word)
{
    const bs_row *row = &shelves->rows[kind];
    char folded[WORD_MAX];
    size_t cursor = 0;
    uint32_t value;
    uint64_t hash;

    if (!fold(word, folded))
        return -1;
    hash = hash_word(kind, folded);
    while ((value = bs_map_next(&shelves->words, hash, &cursor)) != BS_MAP_NONE) {
        int index = (int)(value & INDEX_MASK);

        if (value >> KIND_SHIFT == (uint32_t)kind && index < row->count &&
            answers_to(kind, row->items[index], folded))
            return index;
    }
    return -1;
}

/* ---- Places -------------------------------------------------------------------------------------
 */

static const char *const kind_names[] = {"group", "class of conditions", "protecting group",
                                         "pair of incompatible groups"};

/* Whether a word is free, or that of the item which is being replaced. */
static bs_status check_word(bs_ctx *cx, const bs_shelves *shelves, bs_shelf_kind kind,
                            const char *word, int index)
{
    int other = word ? bs_shelves__find(shelves, kind, word) : -1;

    if (other < 0 || other == index)
        return BS_OK;
    return bs_fail(cx, BS_EVALUE, "there is a %s \"%.100s\" already", kind_names[kind], word);
}

bs_status bs_shelves__place(bs_ctx *cx, bs_rules *rules, bs_shelf_kind kind, const char *name,
                            const char *title, const bs_words *also, const char *pack, int *index)
{
    const bs_shelves *shelves = &rules->shelves;
    const bs_row *row = &shelves->rows[kind];
    char folded[WORD_MAX];
    bs_status st;
    int old;

    if (!name || !fold(name, folded))
        return bs_fail(cx, BS_EVALUE, "a %s needs a name", kind_names[kind]);
    old = bs_shelves__find(shelves, kind, name);
    *index = row->count;
    if (old >= 0 && !pack && !pack_of(kind, row->items[old]))
        *index = old;
    if ((st = check_word(cx, shelves, kind, name, *index)) != BS_OK ||
        (st = check_word(cx, shelves, kind, title, *index)) != BS_OK)
        return st;
    for (int i = 0; also && i < also->count && st == BS_OK; i++)
        st = check_word(cx, shelves, kind, also->items[i], *index);
    if (st == BS_OK && row->count >= INDEX_MASK)
        st = bs_fail(cx, BS_ELIMIT, "more than %d of a kind", INDEX_MASK);
    return st;
}

static bs_status widen(bs_ctx *cx, bs_rules *rules, bs_row *row)
{
    int room = row->room ? row->room * 2 : 64;
    void **items;
    bs_status st;

    if (row->count < row->room)
        return BS_OK;
    if ((st = bs_new(cx, &rules->arena, room, &items)) != BS_OK)
        return st;
    if (row->count > 0)
        memcpy(items, row->items, (size_t)row->count * sizeof *items);
    row->items = items;
    row->room = room;
    return BS_OK;
}

static bs_status know_word(bs_ctx *cx, bs_shelves *shelves, bs_shelf_kind kind, int index,
                           const char *word)
{
    char folded[WORD_MAX];

    if (!word || !fold(word, folded))
        return BS_OK;
    if (bs_map_add(&shelves->words, hash_word(kind, folded),
                   (uint32_t)kind << KIND_SHIFT | (uint32_t)index) != BS_OK)
        return bs_fail_memory(cx);
    return BS_OK;
}

bs_status bs_shelves__put(bs_ctx *cx, bs_rules *rules, bs_shelf_kind kind, int index, void *item)
{
    bs_shelves *shelves = &rules->shelves;
    bs_row *row = &shelves->rows[kind];
    const char *name, *title;
    bs_words also;
    bs_status st;

    if ((st = widen(cx, rules, row)) != BS_OK)
        return st;
    words_of(kind, item, &name, &title, &also);
    if ((st = know_word(cx, shelves, kind, index, name)) != BS_OK ||
        (st = know_word(cx, shelves, kind, index, title)) != BS_OK)
        return st;
    for (int i = 0; i < also.count && st == BS_OK; i++)
        st = know_word(cx, shelves, kind, index, also.items[i]);
    if (st != BS_OK)
        return st;
    row->items[index] = item;
    if (index == row->count)
        row->count++;
    return BS_OK;
}

bs_status bs_shelves__resolve(bs_ctx *cx, bs_arena *home, const bs_rules *rules, bs_shelf_kind kind,
                              const bs_words *words, const char *field, int **out)
{
    bs_status st = bs_new(cx, home, words->count + 1, out);

    for (int i = 0; i < words->count && st == BS_OK; i++) {
        (*out)[i] = bs_shelves__find(&rules->shelves, kind, words->items[i]);
        if ((*out)[i] < 0)
            st = bs_fail(cx, BS_ENOTFOUND, "%s: there is no %s \"%.100s\"", field, kind_names[kind],
                         words->items[i]);
    }
    return st;
}

/* ---- Taking back
 * --------------------------------------------------------------------------------- */

void bs_shelves__mark(const bs_shelves *shelves, bs_rules_mark *mark)
{
    for (int kind = 0; kind < BS_SHELVES; kind++)
        mark->shelves[kind] = shelves->rows[kind].count;
    mark->rulings = shelves->ruling_count;
}

void bs_shelves__rewind(bs_shelves *shelves, bs_rules_mark mark)
{
    bs_row *groups = &shelves->rows[BS_GROUPS];

    while (shelves->ruling_count > mark.rulings) {
        const bs_ruling *ruling = &shelves->rulings[--shelves->ruling_count];

        ((bs_group *)groups->items[ruling->group])->rulings = ruling->next;
    }
    for (int kind = 0; kind < BS_SHELVES; kind++) {
        if (shelves->rows[kind].count > mark.shelves[kind])
            shelves->rows[kind].count = mark.shelves[kind];
    }
}

void bs_shelves__free(bs_shelves *shelves)
{
    bs_map_free(&shelves->words);
    bs_ctx_free(&shelves->own);
}

/* ---- Access
 * ---------------------------------------------------------------------------------------- */

int bs_shelves__count(const bs_rules *rules, bs_shelf_kind kind)
{
    return rules->shelves.rows[kind].count;
}

const bs_group *bs_shelves__group(const bs_rules *rules, int index)
{
    return rules->shelves.rows[BS_GROUPS].items[index];
}

const bs_protecting *bs_shelves__protecting(const bs_rules *rules, int index)
{
    return rules->shelves.rows[BS_PROTECTING].items[index];
}

const bs_pair *bs_shelves__pair(const bs_rules *rules, int index)
{
    return rules->shelves.rows[BS_PAIRS].items[index];
}

int bs_rules_group_count(const bs_rules *rules)
{
    return bs_shelves__count(rules, BS_GROUPS);
}

int bs_rules_conditions_count(const bs_rules *rules)
{
    return bs_shelves__count(rules, BS_CONDITIONS);
}

int bs_rules_protecting_count(const bs_rules *rules)
{
    return bs_shelves__count(rules, BS_PROTECTING);
}

const bs_group_def *bs_rules_group(const bs_rules *rules, int group)
{
    return &bs_shelves__group(rules, group)->def;
}

const bs_conditions_def *bs_rules_conditions(const bs_rules *rules, int conditions)
{
    return &((const bs_conditions *)rules->shelves.rows[BS_CONDITIONS].items[conditions])->def;
}

const bs_protecting_def *bs_rules_protecting(const bs_rules *rules, int protecting)
{
    return &bs_shelves__protecting(rules, protecting)->def;
}

int bs_rules_find_group(const bs_rules *rules, const char *word)
{
    int index = bs_shelves__find(&rules->shelves, BS_GROUPS, word);

    if (index < 0 && strncmp(word, "other ", 6) == 0)
        index = bs_shelves__find(&rules->shelves, BS_GROUPS, word + 6);
    return index;
}

int bs_rules_find_conditions(const bs_rules *rules, const char *word)
{
    return bs_shelves__find(&rules->shelves, BS_CONDITIONS, word);
}
