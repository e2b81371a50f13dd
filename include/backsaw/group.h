/*
 * Functional groups, and what classes of conditions do to them: the clash check.
 *
 * A group is a pattern with a name. Its parents are wider groups: each hit of a group contains a
 * hit of each of its parents, and a group is only looked for in molecules that have its parents. A
 * hit counts for nothing where a narrower group has one that covers all its atoms: an enone is no
 * ketone.
 *
 * A class of conditions gives a group one of three fates. A group without a verdict of its own has
 * the worst of its parents' fates, and survives without parents. The last verdict given on a group
 * and a class stands.
 *
 * All of it lies in the rule book, in the order in which it was added; names are compared without
 * regard to case, spaces and hyphens, and a group answers to its name, its title and its other
 * words. What was added without a pack may be added anew under the same name and then replaces the
 * old. Adding is for one thread.
 */
#ifndef BACKSAW_GROUP_H
#define BACKSAW_GROUP_H

#include "backsaw/rule.h"

/* ---- Definitions ----------------------------------------------------------------------- */

typedef enum bs_fate { BS_SURVIVES, BS_SLOW, BS_ATTACKED } bs_fate;

/* "survives", "slow" or "attacked". */
const char *bs_fate_word(bs_fate fate);

/* A self-test: a molecule, and how many hits the group has in it. */
typedef struct bs_group_test {
    const char *smiles;
    int hits;
} bs_group_test;

/* Strings are copied, and NULL where nothing is said; so in the other definitions. */
typedef struct bs_group_def {
    const char *name;
    const char *title; /* in words */
    const char *smarts;
    bs_words parents;
    bs_words also; /* other words for it */
    const bs_group_test *tests;
    int test_count;
    const char *source, *pack, *origin; /* origin: pack and line */
} bs_group_def;

/* What happens to some groups under a class of conditions. */
typedef struct bs_fate_def {
    bs_words groups;
    bs_fate fate;
    const char *why;
} bs_fate_def;

typedef struct bs_conditions_def {
    const char *name;
    const char *title, *reagents, *used_for;
    bs_words also;
    const bs_fate_def *fates;
    int fate_count;
    const char *source, *pack, *origin;
} bs_conditions_def;

/*
 * A protecting group. Its fates are those of the group that it shows, or of one that it is `like`,
 * but for the classes listed in `fates`, whose words are names of classes.
 */
typedef struct bs_protecting_def {
    const char *name, *title;
    const char *group, *like; /* at least one */
    const char *example;      /* SMILES of a protected compound */
    bs_words guards;          /* groups */
    bs_words installed_by, removed_by;
    const char *install_reagents, *removal_reagents, *remarks;
    const bs_fate_def *fates;
    int fate_count;
    const char *source, *pack, *origin;
} bs_protecting_def;

/*
 * Two groups that react with each other if one molecule has both: any of `one` with any of
 * `other`, under the classes of conditions listed, or under all and none.
 */
typedef struct bs_incompatible_def {
    const char *name;
    bs_words one, other;
    bs_words conditions;
    bs_fate fate; /* BS_SLOW or BS_ATTACKED */
    const char *why, *source, *pack, *origin;
} bs_incompatible_def;

/*
 *   errors  BS_ESYNTAX, BS_EVALUE  in a pattern or SMILES; the message names the field
 *           BS_EVALUE     a name or word that is taken, a field that is missing
 *           BS_ENOTFOUND  a group or a class that nobody defined
 *           On any error the book is as before.
 */
bs_status bs_rules_add_group(bs_ctx *cx, bs_rules *rules, const bs_group_def *def);
bs_status bs_rules_add_conditions(bs_ctx *cx, bs_rules *rules, const bs_conditions_def *def);
bs_status bs_rules_add_protecting(bs_ctx *cx, bs_rules *rules, const bs_protecting_def *def);
bs_status bs_rules_add_incompatible(bs_ctx *cx, bs_rules *rules, const bs_incompatible_def *def);

/* Gives a verdict on a class of conditions, in place of an older one. Errors as above. */
bs_status bs_rules_add_fate(bs_ctx *cx, bs_rules *rules, const char *conditions,
                            const bs_fate_def *def);

int bs_rules_group_count(const bs_rules *rules);
int bs_rules_conditions_count(const bs_rules *rules);
int bs_rules_protecting_count(const bs_rules *rules);

/* The definitions as kept by the book. */
const bs_group_def *bs_rules_group(const bs_rules *rules, int group);
const bs_conditions_def *bs_rules_conditions(const bs_rules *rules, int conditions);
const bs_protecting_def *bs_rules_protecting(const bs_rules *rules, int protecting);

/* By any of its words; -1 if there is none. "other alcohol" is an alcohol. */
int bs_rules_find_group(const bs_rules *rules, const char *word);
int bs_rules_find_conditions(const bs_rules *rules, const char *word);

/* The fate of a group under a class; `why` (or NULL) gets what is said of it, or NULL. */
bs_status bs_rules_fate(bs_ctx *cx, const bs_rules *rules, int group, int conditions, bs_fate *fate,
                        const char **why);

/* ---- Groups of a molecule -------------------------------------------------------------- */

typedef struct bs_group_hit {
    int group;
    uint32_t *atoms; /* ascending */
    int count;
} bs_group_hit;

typedef struct bs_group_hits {
    bs_group_hit *items;
    int count;
} bs_group_hits;

/*
 * The groups of a molecule, in the order of the book, without those that a narrower one covers.
 *
 *   errors  BS_ELIMIT, BS_ESTOPPED as bs_pattern_find()
 */
bs_status bs_groups_find(bs_ctx *cx, bs_arena *home, const bs_rules *rules, const bs_mol *mol,
                         bs_group_hits *out);

/* All hits of one group, covered or not. */
bs_status bs_group_hits_of(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int group,
                           const bs_mol *mol, bs_group_hits *out);

/* ---- Clashes --------------------------------------------------------------------------- */

/* Something elsewhere in a molecule that does not survive as it is. */
typedef struct bs_clash {
    int precursor; /* of a step; 0 where there is one molecule */
    const char *group;
    const char *other; /* the second group of a reaction inside the molecule, or NULL */
    uint32_t *atoms;   /* ascending; of both groups */
    int count;
    bs_fate fate; /* BS_ATTACKED is a clash, BS_SLOW a caution */
    const char *why;
    int group_index; /* in the book */
} bs_clash;

typedef struct bs_clashes {
    bs_clash *items;
    int count;
} bs_clashes;

/*
 * What a class of conditions attacks in a molecule, clashes first. Hits that share an atom with
 * `reacting` (true for each atom of the wanted change; or NULL) are left out, and so are cautions
 * all of whose atoms are attacked anyway.
 */
bs_status bs_clashes_find(bs_ctx *cx, bs_arena *home, const bs_rules *rules, const bs_mol *mol,
                          int conditions, const bool *reacting, bs_clashes *out);

/*
 * The same for the precursors of a step: by its transform's class of conditions, by what the recipe
 * spares and attacks besides, and by pairs of groups that react inside one precursor. Of two words
 * of the transform that fit a group the nearer one holds. A class that nobody defined attacks
 * nothing.
 */
bs_status bs_step_clashes(bs_ctx *cx, bs_arena *home, const bs_rules *rules, const bs_step *step,
                          bs_clashes *out);

/* ---- Protection ------------------------------------------------------------------------ */

/* A protecting group that would help with a clash of a step. */
typedef struct bs_protection {
    int clash;                    /* in the list of the step's clashes */
    int protecting;               /* in the book */
    int installed_by, removed_by; /* classes of conditions that attack nothing else */
    bs_fate fate;                 /* of the protecting group in the step: BS_SURVIVES or BS_SLOW */
} bs_protection;

typedef struct bs_protections {
    bs_protection *items;
    int count;
} bs_protections;

/*
 * Protecting groups for the clashes of a step: each guards the group that is attacked, survives
 * the step, and its installation on the precursor and its removal from the product attack
 * nothing else. For each clash those that survive come before those that may suffer.
 */
bs_status bs_step_protections(bs_ctx *cx, bs_arena *home, const bs_rules *rules,
                              const bs_step *step, const bs_mol *product, const bs_clashes *clashes,
                              bs_protections *out);

#endif
