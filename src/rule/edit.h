/*
 * One application of a reading to molecules at one place, and what comes out.
 */
#ifndef RULE_EDIT_H
#define RULE_EDIT_H

#include "backsaw/draft.h"
#include "backsaw/rule.h"
#include "chem/mol.h"
#include "rule/reading.h"

/* What a reading works on: one molecule for each part of `from`, all in one draft. */
typedef struct bs_bench {
    const bs_reading *reading;
    const bs_mol *const *mols;
    uint32_t *base; /* for each part: the draft atom that its atom 0 is */
    uint32_t *bond_base;
    uint32_t atom_count, bond_count, stereo_count;
    bs_draft_atom *atoms;
    bs_draft_bond *bonds;
    bs_draft_stereo *stereo;
    const bs_atom **origin; /* for each draft atom the atom that it was */
    bool *aromatic;         /* for each draft bond */
} bs_bench;

/* Where an atom of a side lies: the molecule and the atom in it. BS_NOWHERE if folded. */
#define BS_NOWHERE UINT32_MAX
typedef struct bs_spot {
    uint32_t mol, atom;
} bs_spot;

/* The products, one for each part of `to`, and where each atom of `to` lies in them. */
typedef struct bs_result {
    bs_mol **products;
    int product_count;
    bs_spot *spots;
} bs_result;

/* Puts the molecules on the bench; everything lies in `home`. */
bs_status bs_bench__lay(bs_ctx *cx, bs_arena *home, const bs_reading *reading,
                        const bs_mol *const *mols, bs_bench *out);

/*
 * Applies the reading. `where` gives for each atom of `from` the atom in the molecule of its part.
 *
 *   possible  false if no sensible molecules come out: valences, aromatic parts without Kekulé
 *             form, parts that should be two molecules and are one, or the other way round
 *   errors    BS_ENOMEM, BS_ESTOPPED, BS_ELIMIT
 */
bs_status bs_bench__apply(bs_ctx *cx, bs_arena *home, const bs_bench *bench, const uint32_t *where,
                          bs_result *out, bool *possible);

/* ---- Between edit.c and the files that help it ------------------------------------------- */

enum {
    BS_EDIT_TOUCHED = 1, /* a bond, the charge or the element changed */
    BS_EDIT_STATED = 2,  /* its hydrogens are written by the rule */
    BS_EDIT_CREATED = 4,
    BS_EDIT_SEED = 8, /* an atom of `to` */
    BS_EDIT_RING = 16 /* written as aromatic before and after */
};

enum {
    BS_EDIT_BOND_CHANGED = 1, /* cut, made or of another order than before */
    BS_EDIT_BOND_FRESH = 2,   /* became aromatic by the rule */
    BS_EDIT_BOND_OPEN = 4     /* was aromatic, and its Kekulé order is to be found anew */
};

typedef struct bs_edit {
    bs_ctx *cx;
    const bs_bench *bench;
    bs_draft draft;
    uint32_t *slot;      /* draft atom of each slot */
    uint8_t *atoms;      /* flags */
    uint8_t *bonds;      /* flags */
    uint8_t *kekule;     /* order before the aromatic bonds were opened */
    bool open_all;       /* open every aromatic system with a touched atom */
    bool can_open;       /* there are such systems that are not open */
    int extra_hydrogen;  /* which of the new aromatic nitrogens gets a hydrogen; -1 for none */
    int fresh_nitrogens; /* how many there are */
    bool barred;         /* an addition or elimination cannot run this way */
} bs_edit;

/* Opens the Kekulé forms that the edit disturbs. */
bs_status bs_edit__open_aromatic(bs_edit *edit);

/* Counts the hydrogens of touched atoms. */
bs_status bs_edit__count_hydrogens(bs_edit *edit);

/* Makes the stereo elements of a syn or anti addition, or of its reverse. */
bs_status bs_edit__add_faces(bs_edit *edit);

/* Brings the stereo elements of the draft up to date, and makes those that the rule writes. */
bs_status bs_edit__move_stereo(bs_edit *edit);

#endif
