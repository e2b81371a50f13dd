/*
 * The inside of a rule book.
 *
 * Every transform is compiled into cases. A case is a rewriting between the target and one set of
 * precursors: one for a transform with `from`, one for each pair of equivalents for a
 * disconnection by synthons.
 */
#ifndef RULE_BOOK_H
#define RULE_BOOK_H

#include "rule/run.h"
#include "rule/shelves.h"

typedef struct bs_case {
    bs_side target; /* one part */
    bs_side source; /* the precursors */
    bs_reading back, forth;
    double *equivalents; /* for each part of `source` */
    bs_mol **reagents;   /* for each part the one compound that it can be, or NULL */
} bs_case;

typedef struct bs_synthon {
    bs_synthon_def def;
    char *key; /* the name as names are compared */
    bool retired;
} bs_synthon;

typedef struct bs_preference {
    bs_preference_def def;
    char *key;
} bs_preference;

typedef struct bs_transform {
    bs_transform_def def;
    char **keys; /* the name and the other names, as names are compared */
    int key_count;
    bs_case *cases;
    int case_count;
    /* The author's map numbers, ascending, and the atoms of the target that carry them. */
    int *maps;
    int *map_atoms;
    int map_count;
    bool retired; /* the counts of keys and cases are 0 then, and kept here */
    int kept_keys, kept_cases;
} bs_transform;

struct bs_rules {
    bs_gate *gate;
    bs_arena arena;
    bs_synthon **synthons;
    bs_transform **transforms;
    int synthon_count, synthon_room;
    int transform_count, transform_room;
    bs_shelves shelves;
    bs_preference **preferences;
    int preference_count, preference_room;
};

/* Map numbers from here on are the compiler's; the author's are smaller. */
enum { BS_OWN_MAPS = 1000 };

/* A name as names are compared: no case, spaces and hyphens. */
bs_status bs_book__fold_name(bs_ctx *cx, bs_arena *home, const char *name, char **out);
bool bs_book__same_name(const char *a, const char *b);

/* Room for one more pointer in a list of the book, which `list` points to; what was there moves. */
bs_status bs_book__make_room(bs_ctx *cx, bs_rules *rules, void *list, int count, int *room);

/*
 * Looks up the preference that a transform names, and takes its function; copies the roles.
 *
 *   errors  BS_ENOTFOUND  nobody defined it
 *           BS_EVALUE     a role that it lacks or that is missing, a map that the target lacks
 */
bs_status bs_preference__resolve(bs_ctx *cx, bs_rules *rules, bs_transform *tr);

/*
 * Fills the reagents of a case: for each part of the precursors that the rule writes out in full
 * the compound that it is; counter-ions and other parts get NULL.
 */
bs_status bs_reagent__find(bs_ctx *cx, bs_arena *home, bs_case *kase);

/* Reads both sides of a reaction SMARTS; `*right_at` is the offset of the right one. */
bs_status bs_rewrite__read_sides(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                                 bs_query **left, bs_query **right, size_t *right_at);

/* Makes a case of two queries, which must live as long. */
bs_status bs_case__make(bs_ctx *cx, bs_arena *home, const bs_query *target, const bs_query *source,
                        bs_case *out);

/*
 * Compiles a disconnection: all cases for the equivalents of both synthons, those of the acceptor
 * in the outer loop.
 *
 *   errors  as bs_rules_add_transform(), with the field in the message
 */
bs_status bs_compose__cut(bs_ctx *cx, bs_arena *home, const bs_query *target,
                          const bs_transform_def *def, const bs_synthon *acceptor,
                          const bs_synthon *donor, bs_case **cases, int *count);

/*
 * Where the atoms of a small query lie in a target: `ours` is bound to `anchor`; the others are
 * looked for among the neighbours, not across the bond to `barred`. Each result has for each atom
 * of the query the atom of the target, or -1 where the target names no such atom.
 */
bs_status bs_overlay__find(bs_ctx *cx, bs_arena *home, const bs_query *query, int ours,
                           const bs_query *target, int anchor, int barred, int ***out, int *count);

/* Puts "field: " before the message of the error at hand and returns its code. */
bs_status bs_blame(bs_ctx *cx, bs_status status, const char *field);

/* ---- Pieces of molecules ------------------------------------------------------------------- */

/* A connected piece; atoms[i] is the atom of the whole that atom i was. */
typedef struct bs_piece {
    const bs_mol *mol;
    uint32_t *atoms;
} bs_piece;

bs_status bs_piece__split(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_piece **out,
                          int *count);

/* ---- Azoles ------------------------------------------------------------------------------- */

/* A tautomer with the same atom numbers; `nitrogen` is where the hydrogen went. */
typedef struct bs_azole_form {
    bs_mol *mol;
    uint32_t nitrogen;
} bs_azole_form;

/* The other forms of a molecule in which one azole hydrogen has moved, at most `room`. */
bs_status bs_azole__forms(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_azole_form *out,
                          int room, int *count);

/* ---- Running rules --------------------------------------------------------------------------- */

/* The atoms of a product under the author's map numbers; `atom_of[k]` for atom k of the target. */
bs_status bs_site__fill(bs_ctx *cx, bs_arena *home, const bs_transform *tr, const uint32_t *atom_of,
                        bs_site *out);

/* One set of products of a forward run. Where several places give it, the best of each counts. */
typedef struct bs_made {
    bs_outcome outcome;
    bs_spot *spots; /* of the atoms of the target */
    bool expected;  /* passes the tests of the target */
    double score;
} bs_made;

typedef struct bs_made_list {
    bs_made *items;
    int count, room;
} bs_made_list;

/* A forward run of one transform, over as many cases and reactants as needed. */
typedef struct bs_forward {
    const bs_transform *tr;
    const bs_rule_hooks *hooks; /* NULL: nothing is judged */
    bool judge;                 /* find out which products are expected */
    bool score;                 /* ask the rule which product it favours */
    bs_arena *home;
    bs_seen seen;
    bs_made_list made;
    /* of the run at hand */
    const bs_case *kase;
    const uint32_t *reactant;
    int moved_part;    /* part that is another form of an azole, or -1; */
    uint32_t moved_to; /* results count only if this atom of it reacts */
} bs_forward;

/* Starts and ends a forward run. The rule's preference is asked if it has one and hooks are given.
 */
void bs_forward__init(bs_forward *run, bs_ctx *cx, bs_arena *home, const bs_transform *tr,
                      const bs_rule_hooks *hooks, bool judge);
void bs_forward__free(bs_forward *run);

/*
 * Runs one case on one molecule a part, and on other forms of azoles where these react; new
 * product sets are added.
 */
bs_status bs_forward__run(bs_ctx *cx, bs_forward *run, const bs_case *kase,
                          const bs_mol *const *mols, const uint32_t *reactant);

/* Why a place where the target fits gives no step. */
typedef enum bs_refusal {
    BS_REFUSED_STRAINED, /* a precursor has a bond that its rings cannot hold */
    BS_REFUSED_WHEN,     /* the rule's own condition */
    BS_REFUSED_SAME,     /* the product is among the precursors */
    BS_REFUSED_FORWARD   /* the precursors do not give the product */
} bs_refusal;

/* Is told of each refused place, with the precursors' SMILES where they are known. */
typedef struct bs_watch {
    void *payload;
    bs_status (*refused)(void *payload, bs_ctx *cx, bs_refusal reason, const bs_site *site,
                         char *const *smiles, int count);
} bs_watch;

/* bs_rules_back() with someone who watches, or NULL. */
bs_status bs_back__watched(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                           const bs_mol *product, const bs_rule_hooks *hooks, unsigned flags,
                           const bs_watch *watch, bs_steps *out);

/*
 * How the product set `other` stands to the wanted one. `mols` are the molecules that the numbers
 * in `site_reactant` mean; numbers from `count` on mean reagents.
 */
bs_status bs_rival__kind(bs_ctx *cx, const bs_outcome *wanted, const bs_outcome *other,
                         const bs_mol *const *mols, int count, bs_rival_kind *kind);

/* Products whose scores differ by less form side by side; each is a major one. */
#define BS_SCORE_NOISE 0.25

/* What a forward check found. */
typedef struct bs_verdict {
    bool passed;
    bool stereo_open; /* the reaction leaves open what the product says about stereo */
    bool minor;       /* a rival is favoured */
    bs_outcomes rivals;
} bs_verdict;

/*
 * Runs the precursors of one case forwards and looks for the product.
 *
 *   parts   one molecule for each part of the case's source
 *   where   the atom of the product for each atom of the target
 *   flags   BS_BACK_KINDS counts
 */
bs_status bs_check__step(bs_ctx *cx, bs_arena *home, const bs_transform *tr, const bs_case *kase,
                         const bs_rule_hooks *hooks, unsigned flags, bs_mol *const *parts,
                         char *const *smiles, const bs_mol *product, const char *product_smiles,
                         const uint32_t *where, bs_verdict *out);

#endif
