/*
 * Rules: rewriting, synthons, transforms, and steps made with them.
 *
 * A rewriting is a pair of graph patterns, `L>>R`, with the usual semantics of reaction SMARTS:
 * atoms that carry the same map number on both sides persist, the others of L go and the others
 * of R come; L only tests; atom properties written in R are set and all others kept; hydrogens
 * follow the valence unless written; bonds between mapped atoms are as written in R. A mapped
 * atom of L that R lacks is removed with what hangs on it only if nothing mapped hangs there.
 *
 * A transform is written backwards: its `target` is a pattern of the product, and running it
 * backwards gives precursors. A disconnection by synthons is compiled into one rewriting for
 * each pair of equivalents (a case); run forwards, the rewriting is read from R to L. Everything
 * below (back, forth, check) works on cases only.
 *
 * Stereo. `@` in a target is no condition: it says that the centre is turned, kept or made. Centres
 * that only the target marks are made as written or all turned, so marks say how they stand to each
 * other (a syn addition), and a product whose centres stand otherwise fails the forward check. `/`
 * and `\` are conditions, and made as written. A centre that the reaction makes without a mark is
 * left open (`stereo_open`).
 *
 * Forwards an azole reacts at either nitrogen, whichever carries the hydrogen.
 *
 * A rule book (`bs_rules`) holds synthons and transforms in the order in which they were added;
 * indices are 0-based and stay. Adding is for one thread; a book that no longer grows can be used
 * by several threads, each with its own context and hooks.
 */
#ifndef BACKSAW_RULE_H
#define BACKSAW_RULE_H

#include "backsaw/match.h"

/* ---- Rewriting ------------------------------------------------------------------------- */

typedef struct bs_rewrite bs_rewrite;

/* Compiles reaction SMARTS, "L>>R". Errors as bs_pattern_read(), offsets in the whole text. */
bs_status bs_rewrite_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                          bs_rewrite **out);

/* Number of reactants that bs_rewrite_apply() wants: dot-separated parts of L, groups counted once.
 */
int bs_rewrite_reactant_count(const bs_rewrite *rewrite);

/*
 * How a product set stands to the wanted one: the same group reacted elsewhere or the other way
 * round (regio), another group reacted (chemo), only stereo differs, or the wanted product reacted
 * again under the same conditions.
 */
typedef enum bs_rival_kind {
    BS_RIVAL_NONE,
    BS_RIVAL_REGIO,
    BS_RIVAL_CHEMO,
    BS_RIVAL_STEREO,
    BS_RIVAL_OVER
} bs_rival_kind;

/* The kind in a word: "regio", "chemo", "stereo", "over-reaction"; NULL for none. */
const char *bs_rival_word(bs_rival_kind kind);

/*
 * One result of a rewriting: a set of product molecules. `site` gives for each atom of L, in the
 * order of the text, where it lay: the number of the reactant and the atom; UINT32_MAX as reactant
 * for atoms of a reagent that was not given.
 */
typedef struct bs_outcome {
    bs_rival_kind kind; /* of product sets of transforms */
    bs_mol **products;
    char **smiles; /* canonical, same order */
    int product_count;
    uint32_t *site_reactant;
    uint32_t *site_atom;
    int site_count;
} bs_outcome;

typedef struct bs_outcomes {
    bs_outcome *items;
    int count;
} bs_outcomes;

/*
 * Applies a rewriting to reactants in the order of its parts. Outcomes with the same products
 * are given once; outcomes whose valences are impossible are left out.
 *
 *   errors  BS_EVALUE  wrong number of reactants
 *           BS_ELIMIT  the step budget ran out, or more than 10000 outcomes
 */
bs_status bs_rewrite_apply(bs_ctx *cx, bs_arena *home, const bs_rewrite *rewrite,
                           const bs_mol *const *reactants, int count, bs_outcomes *out);

/* ---- Definitions ----------------------------------------------------------------------- */

typedef enum bs_synthon_kind { BS_DONOR, BS_ACCEPTOR } bs_synthon_kind;

/*
 * A stable compound that stands in for a synthon. Exactly one of `attach` and `rewrite` is set.
 *
 * attach:  SMILES of a fragment; its first atom is bonded to the cut atom with the order of the
 *          bond that was cut, or the order of a leading bond symbol ("=O"). "[H]" leaves a
 *          hydrogen. With `ionic` the fragment is a cation beside the cut atom, which becomes an
 *          anion: "[Na]" gives [Na+] and a cut atom with one charge less.
 * rewrite: reaction SMARTS on the half; the atom with map 1 on its left side is the cut atom.
 *          Other left atoms are found among the neighbours; where the target names such an atom
 *          too, it is that one.
 */
typedef struct bs_equivalent_def {
    const char *attach;
    const char *rewrite;
    const char *name; /* or NULL */
    bool ionic;
    double equivalents; /* moles a mole of product; 0 stands for 1 */
} bs_equivalent_def;

typedef struct bs_synthon_def {
    const char *name;
    bs_synthon_kind kind;
    const bs_equivalent_def *equivalents;
    int equivalent_count;
    const char *origin; /* pack and line, for messages; or NULL */
} bs_synthon_def;

typedef enum bs_transform_kind { BS_DISCONNECTION, BS_INTERCONVERSION } bs_transform_kind;

/* How two atoms come to a double bond: from the same face or from opposite ones. */
typedef enum bs_addition_way {
    BS_ADDITION_NONE,
    BS_ADDITION_SYN,
    BS_ADDITION_ANTI
} bs_addition_way;

typedef struct bs_words {
    const char *const *items;
    int count;
} bs_words;

/*
 * A transform as its author wrote it. Either `from` is set (rewriting) or `cut` with synthons.
 * Strings are copied. `hook_when`, `hook_prefer` are numbers of functions that the hooks below
 * resolve, or -1. Instead of `hook_prefer` a shared preference may be named: `prefer`, with a map
 * number for each of its roles.
 */
typedef struct bs_transform_def {
    const char *name;
    bs_words also;
    bs_transform_kind kind;
    const char *target;
    const char *from;
    int cut[2]; /* map numbers; 0 if `from` is used */
    int acceptor_map, donor_map;
    const char *acceptor, *donor; /* names of synthons */
    bs_addition_way addition;     /* of the reaction, to the bond between two maps: */
    int addition_maps[2];
    const char *conditions;       /* class of conditions */
    const char *recipe;           /* in words */
    double yield_low, yield_high; /* per cent; 0 if not given */
    double step_cost;             /* extra cost of the step, same unit as the plan's; usually 0 */
    bs_words spares, also_attacks, cautions, reagents;
    const char *source, *rxno, *pack;
    int hook_when, hook_prefer;
    const char *prefer;     /* name of a preference, or NULL */
    bs_words prefer_roles;  /* its roles, and */
    const int *prefer_maps; /* for each of them the map number of an atom of the target */
    const char *origin;     /* pack and line */
} bs_transform_def;

/* A function that says which product is favoured, for use by many rules. */
typedef struct bs_preference_def {
    const char *name;
    bs_words roles; /* names of the atoms that it asks about */
    int hook;
    const char *origin;
} bs_preference_def;

/* ---- The rule book --------------------------------------------------------------------- */

typedef struct bs_rules bs_rules;

/* A new, empty book with an arena of its own. Free it with bs_rules_free(). */
bs_status bs_rules_new(bs_ctx *cx, bs_rules **out);
void bs_rules_free(bs_rules *rules);

/*
 * Adds a synthon or a transform. Names are compared without regard to case, spaces and hyphens.
 *
 *   errors  BS_ESYNTAX, BS_EVALUE  in a pattern, with the offset in it; the message names the
 *                                  field ("target: ...")
 *           BS_EVALUE     a name that is taken, maps that do not balance, a cut that is no bond
 *           BS_ENOTFOUND  a synthon that nobody defined
 *           On any error the book is as before.
 */
bs_status bs_rules_add_synthon(bs_ctx *cx, bs_rules *rules, const bs_synthon_def *def);
bs_status bs_rules_add_transform(bs_ctx *cx, bs_rules *rules, const bs_transform_def *def,
                                 int *index);

/* Adds a preference; errors as for synthons. */
bs_status bs_rules_add_preference(bs_ctx *cx, bs_rules *rules, const bs_preference_def *def);

int bs_rules_count(const bs_rules *rules);

/* Index of a transform by name or by one of its other names; -1 if there is none. */
int bs_rules_find(const bs_rules *rules, const char *name);

/* The definition as kept by the book. */
const bs_transform_def *bs_rules_transform(const bs_rules *rules, int index);

int bs_rules_synthon_count(const bs_rules *rules);

/* The definition of a synthon as kept by the book; NULL if it is out of use. */
const bs_synthon_def *bs_rules_synthon(const bs_rules *rules, int index);

/*
 * How far a book has grown. Rewinding it forgets all that was added later; the names are free
 * again, and the memory stays with the book.
 */
typedef struct bs_rules_mark {
    int synthons, transforms, preferences;
    int shelves[4], rulings; /* what group.h adds */
} bs_rules_mark;

bs_rules_mark bs_rules_grown(const bs_rules *rules);
void bs_rules_rewind(bs_rules *rules, bs_rules_mark mark);

/*
 * Takes a transform or a synthon out of use, or back into it. A retired one answers to no name, and
 * a retired transform gives no step; its index stays. Disconnections keep the synthons that
 * they were made with. Retiring a synthon that is not there does nothing.
 */
void bs_rules_retire_transform(bs_rules *rules, int index, bool retired);
void bs_rules_retire_synthon(bs_rules *rules, const char *name, bool retired);

/* ---- Hooks ----------------------------------------------------------------------------- */

/*
 * Where a target pattern lies in a product: atoms by map number, ascending. For a shared preference
 * `roles` are the names that some of the maps have there.
 */
typedef struct bs_site {
    const int *maps;
    const uint32_t *atoms;
    int count;
    bs_words roles;
    const int *role_maps;
} bs_site;

/* A rule whose function failed, and with what. */
typedef struct bs_rule_fault {
    int transform;
    const char *message;
} bs_rule_fault;

/* Adding to the list leaves the array as it was, so that a copy of the list stays what it is. */
typedef struct bs_rule_faults {
    const bs_rule_fault *items;
    int count;
} bs_rule_faults;

/* The fault of a transform, or NULL. */
const bs_rule_fault *bs_rule_faults_find(const bs_rule_faults *faults, int transform);

/* Adds a fault of a transform that has none yet; its message is copied. */
bs_status bs_rule_faults_add(bs_ctx *cx, bs_arena *home, bs_rule_faults *faults, int transform,
                             const char *message);

/* Functions of a rule that live elsewhere (in Lua). Both may be NULL if no rule has a hook. */
typedef struct bs_rule_hooks {
    void *payload;
    /* Whether the transform may be used at this place of the product. */
    bs_status (*when)(void *payload, bs_ctx *cx, int hook, const bs_mol *product,
                      const bs_site *site, bool *allowed);
    /* Score of a product of the forward reaction; the highest wins. */
    bs_status (*prefer)(void *payload, bs_ctx *cx, int hook, const bs_mol *product,
                        const bs_site *site, double *score);
    /* If not NULL, sets of precursors that bs_rules_back() tried are counted here, by transform. */
    long *tried;
    /*
     * If not NULL, bs_rules_back() gives no steps of the transforms in this list, and a function
     * that fails with BS_ESCRIPT puts its transform on it (in the arena of the steps), which is no
     * failure of the call.
     */
    bs_rule_faults *faults;
} bs_rule_hooks;

/* ---- Steps ----------------------------------------------------------------------------- */

/*
 * One use of a transform on a product. Precursors are distinct compounds, each with its canonical
 * SMILES and its moles a mole of product, in the order of their SMILES. A salt is one compound.
 * `rivals` are the other product sets of the forward run. With `stereo_open` the reaction does not
 * settle stereo that the product states (or settles some that it leaves open). With `minor` the
 * rule's preference favours a rival.
 */
typedef struct bs_step {
    int transform;
    bs_mol **precursors;
    char **smiles;
    double *equivalents;
    bool **reacting; /* for each precursor and each of its atoms: whether it takes part */
    int precursor_count;
    bs_site site;
    bs_outcomes rivals;
    bool stereo_open;
    bool minor;
} bs_step;

typedef struct bs_steps {
    bs_step *items;
    int count;
} bs_steps;

enum {
    BS_BACK_UNCHECKED = 1, /* leave out the forward run: no rivals, and steps that fail it stay */
    BS_BACK_MINOR = 2,     /* keep steps of which the product is not the major one */
    BS_BACK_KINDS = 4      /* tell the kinds of rivals */
};

/*
 * The steps that make `product` by one transform (or by all, with -1, in the order of the book).
 * Each step was run forwards and gave the product, and unless asked for, no rival is favoured over
 * it. Precursors with a bond that their rings cannot hold (bs_mol_strain()) make no step, unless the
 * product has one. Steps with the same precursors by the same transform are given once.
 */
bs_status bs_rules_back(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                        const bs_mol *product, const bs_rule_hooks *hooks, unsigned flags,
                        bs_steps *out);

/*
 * The further products that the product of a step gives with the same reagents, by the step's own
 * transform: over-reactions.
 */
bs_status bs_rules_again(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                         const bs_mol *product, const bs_mol *const *precursors, int count,
                         const bs_rule_hooks *hooks, bs_outcomes *out);

/* A set of products of one forward run. `score` is that of `prefer`, 0 without. */
typedef struct bs_product_set {
    int transform;
    bool expected; /* passes all tests of the target, and no other set is favoured more */
    bool major;    /* of the transform's sets none is favoured more */
    double score;
    bs_outcome outcome;
} bs_product_set;

typedef struct bs_product_sets {
    bs_product_set *items;
    int count;
} bs_product_sets;

/*
 * What a transform (or with -1 each one) makes of these reactants, in any order; reactants that
 * the transform does not need may not be given, and reagents that it writes out in full (nitric
 * acid, carbon dioxide) need not be. Asked of each one, a transform whose product sets are rivals
 * only is left out. Expected sets first, by score, then rivals; those of kind BS_RIVAL_OVER last.
 */
bs_status bs_rules_forth(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                         const bs_mol *const *reactants, int count, const bs_rule_hooks *hooks,
                         bs_product_sets *out);

#endif
