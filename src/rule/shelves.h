/*
 * The part of a rule book that holds groups, classes of conditions, protecting groups and pairs of
 * groups that do not go together.
 */
#ifndef RULE_SHELVES_H
#define RULE_SHELVES_H

#include "backsaw/group.h"
#include "core/map.h"

/* A verdict. Those on one group are chained, the newest first. */
typedef struct bs_ruling {
    int group, conditions; /* conditions is -1 where the class was defined anew */
    bs_fate fate;
    const char *why;
    int next; /* index, or -1 */
} bs_ruling;

typedef struct bs_group {
    bs_group_def def;
    bs_pattern *pattern;
    int *parents; /* all smaller than the group's own index */
    int parent_count;
    int *wider; /* parents, their parents, and so on, ascending */
    int *steps; /* how many steps up each of them is */
    int wider_count;
    int rulings; /* the newest, or -1 */
} bs_group;

typedef struct bs_conditions {
    bs_conditions_def def;
} bs_conditions;

typedef struct bs_protecting {
    bs_protecting_def def;
    int group; /* whose fates it has */
    int *guards;
    int *installed_by, *removed_by; /* classes */
    int *classes;                   /* those with a fate of their own */
    bs_fate *fates;
    int class_count;
} bs_protecting;

typedef struct bs_pair {
    bs_incompatible_def def;
    int *one, *other;
    int *conditions;
} bs_pair;

/* What a word may name; the hash of a name depends on it. */
typedef enum bs_shelf_kind {
    BS_GROUPS,
    BS_CONDITIONS,
    BS_PROTECTING,
    BS_PAIRS,
    BS_SHELVES
} bs_shelf_kind;

/* One kind of definitions: an array of pointers. */
typedef struct bs_row {
    void **items;
    int count, room;
} bs_row;

typedef struct bs_shelves {
    bs_row rows[BS_SHELVES];
    bs_ruling *rulings;
    int ruling_count, ruling_room;
    bs_ctx own;   /* for the map: a book outlives the contexts that use it */
    bs_map words; /* hash of a word to kind << 28 | index; words that were taken back stay in it */
} bs_shelves;

void bs_shelves__init(bs_shelves *shelves, bs_gate *gate);
void bs_shelves__free(bs_shelves *shelves);

/* Forgets what was added after a mark. */
void bs_shelves__rewind(bs_shelves *shelves, bs_rules_mark mark);
void bs_shelves__mark(const bs_shelves *shelves, bs_rules_mark *mark);

/* The item that answers to a word, or -1. */
int bs_shelves__find(const bs_shelves *shelves, bs_shelf_kind kind, const char *word);

/*
 * Where a definition named `name` goes: a new place at the end, or that of an older one that it
 * replaces, which only happens without packs.
 *
 *   errors  BS_EVALUE  the name is missing or taken, or one of the other words is
 */
bs_status bs_shelves__place(bs_ctx *cx, bs_rules *rules, bs_shelf_kind kind, const char *name,
                            const char *title, const bs_words *also, const char *pack, int *index);

/* Puts the item into its place and makes its words known. */
bs_status bs_shelves__put(bs_ctx *cx, bs_rules *rules, bs_shelf_kind kind, int index, void *item);

/*
 * The items that words name.
 *
 *   errors  BS_ENOTFOUND  the message begins with `field`
 */
bs_status bs_shelves__resolve(bs_ctx *cx, bs_arena *home, const bs_rules *rules, bs_shelf_kind kind,
                              const bs_words *words, const char *field, int **out);

const bs_group *bs_shelves__group(const bs_rules *rules, int index);
const bs_protecting *bs_shelves__protecting(const bs_rules *rules, int index);
const bs_pair *bs_shelves__pair(const bs_rules *rules, int index);
int bs_shelves__count(const bs_rules *rules, bs_shelf_kind kind);

/* How many steps `wider` is above a group, 0 for itself; -1 if it is no wider group. */
int bs_group__distance(const bs_group *group, int own, int wider);

/* Works out the wider groups of a group from those of its parents. */
bs_status bs_group__climb(bs_ctx *cx, bs_rules *rules, bs_group *group);

/* Adds a verdict on groups that were resolved. */
bs_status bs_shelves__rule(bs_ctx *cx, bs_rules *rules, const int *groups, int count,
                           int conditions, bs_fate fate, const char *why);

/* Takes back all verdicts of a class that is defined anew. */
void bs_shelves__clear(bs_rules *rules, int conditions);

/* Copies of strings and lists into the book's arena. */
bs_status bs_rules__copy_string(bs_ctx *cx, bs_arena *home, const char **string);
bs_status bs_rules__copy_words(bs_ctx *cx, bs_arena *home, bs_words *words);

/* The fate of a protecting group under a class. */
bs_status bs_protecting__fate(bs_ctx *cx, const bs_rules *rules, const bs_protecting *p,
                              int conditions, bs_fate *fate);

#endif
