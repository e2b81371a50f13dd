/*
 * A reading of a rewriting: from one side to the other, as a list of edits.
 *
 * Atoms of both sides share numbers, called slots: the atoms of `from` come first, then those that
 * only `to` has. Atoms with the same map number on both sides are one slot and persist.
 *
 * Read backwards (`reverse`), from the precursors to the target, the tests on hydrogens of `to` do
 * not set hydrogens of atoms that persist: they follow the valence, and the tests tell the wanted
 * product from others afterwards.
 */
#ifndef RULE_READING_H
#define RULE_READING_H

#include "backsaw/rule.h"
#include "rule/side.h"

/* What becomes of an atom; BS_UNSAID leaves a property as it is. Atoms that come have all of it. */
typedef struct bs_atom_edit {
    int slot;
    bool created;
    int element, aromatic, charge, hydrogens, isotope;
    bool stays_aromatic; /* both sides write it so */
    bool recount;        /* one side set its hydrogens, the other leaves them to the ring */
    int hydrogen_hint; /* hydrogens of a nitrogen with two bonds in a new aromatic ring */
} bs_atom_edit;

/* The bond between two slots gets an order: 1 to 4 or BS_DRAFT_ORDER_AROMATIC; 0 cuts it. */
typedef struct bs_bond_edit {
    int x, y, order;
} bs_bond_edit;

typedef enum bs_hand_way { BS_HAND_KEEP, BS_HAND_TURN, BS_HAND_MAKE, BS_HAND_LOSE } bs_hand_way;

/* What becomes of a tetrahedral centre. `mark` and `around` (slots or BS_SIDE_REST) for MAKE. */
typedef struct bs_hand_edit {
    int slot;
    bs_hand_way way;
    int mark;
    int around[4];
} bs_hand_edit;

/* The double bond between x and y becomes cis (1) or trans (2) for rx, ry; 0 loses its geometry. */
typedef struct bs_slope_edit {
    int x, y, rx, ry, perm;
} bs_slope_edit;

/* An addition to the double bond between two slots, or with `adding` false its reverse. */
typedef struct bs_addition {
    bs_addition_way way;
    int x, y;
    bool adding;
} bs_addition;

typedef struct bs_reading {
    const bs_side *from, *to;
    int slot_count;
    int *to_slot; /* for each atom of `to` */
    int *from_to; /* for each atom of `from`: the atom of `to`, or -1 if it goes */
    bool *active; /* for each atom of `from`: whether the result depends on where it lies */
    bs_atom_edit *atoms;
    bs_bond_edit *bonds;
    bs_hand_edit *hands;
    bs_slope_edit *slopes;
    int atom_edits, bond_edits, hand_edits, slope_edits;
    bs_addition addition;
} bs_reading;

/*
 * Works out a reading; both sides must live as long.
 *
 *   errors  BS_EVALUE  an atom would come of which no element is written, with the offset
 */
bs_status bs_reading__make(bs_ctx *cx, bs_arena *home, const bs_side *from, const bs_side *to,
                           bool reverse, bs_reading *out);

#endif
